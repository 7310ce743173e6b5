// Responses of members.
#ifndef BEAMCORE_RESPONSE_HPP
#define BEAMCORE_RESPONSE_HPP

#include "field.hpp"
#include "member.hpp"
#include "stress.hpp"

namespace beamcore {

// The reaction of a support: force positive upward, couple positive clockwise with x to the right
// and z up.
struct Reaction {
    Force force;
    Moment couple;
};

class Camber;
struct CamberPlan;

// The solved member: every field under every combination, at both times.
class Response {
public:
    // The deflection, positive downward.
    Field<Length> deflection(const std::string &combination, Time time) const {
        return Field<Length>(handle_, BC_FIELD_DEFLECTION, combination, time);
    }
    // The slope dw/dx.
    Field<Angle> slope(const std::string &combination, Time time) const {
        return Field<Angle>(handle_, BC_FIELD_SLOPE, combination, time);
    }
    // The shear force V = dM/dx.
    Field<Force> shear(const std::string &combination, Time time) const {
        return Field<Force>(handle_, BC_FIELD_SHEAR, combination, time);
    }
    // The moment, positive where it stretches the bottom (sagging).
    Field<Moment> moment(const std::string &combination, Time time) const {
        return Field<Moment>(handle_, BC_FIELD_MOMENT, combination, time);
    }

    // The reaction of a support.
    Reaction reaction(const std::string &combination, Time time, const std::string &support) const {
        double force = 0.0, couple = 0.0;
        detail::check(bc_response_reaction(get(), detail::c_text(combination, "combination"),
                                           detail::code(time), detail::c_text(support, "support"),
                                           &force, &couple));
        return Reaction{Force::from_si(force), Moment::from_si(couple)};
    }

    // The normal stress in a part.
    PartStress stress(const std::string &combination, Time time, const std::string &part) const {
        return PartStress(handle_, combination, time, part);
    }

    // The greatest utilisation of a part; nothing if its material has no design strengths.
    std::optional<Utilisation> utilisation(const std::string &combination, Time time,
                                           const std::string &part) const {
        std::int32_t has_value = 0;
        double value = 0.0, at = 0.0;
        detail::check(bc_response_utilisation(get(), detail::c_text(combination, "combination"),
                                              detail::code(time), detail::c_text(part, "part"),
                                              &has_value, &value, &at));
        return has_value != 0 ? std::optional(Utilisation{value, Length::from_si(at)})
                              : std::nullopt;
    }

    // The stations: ends of the member, supports, point loads and ends of line loads.
    std::vector<Length> stations() const {
        const std::int32_t count = detail::count(
            [&](std::int32_t *out) { return bc_response_station_count(get(), out); });
        std::vector<Length> stations;
        for (std::int32_t index = 0; index < count; ++index) {
            stations.push_back(Length::from_si(detail::number(
                [&](double *out) { return bc_response_station(get(), index, out); })));
        }
        return stations;
    }

    // What is left of equilibrium and continuity, relative to the greatest terms.
    double residual() const {
        return detail::number([&](double *out) { return bc_response_residual(get(), out); });
    }

    // The camber for a plan.
    Camber camber(const CamberPlan &plan) const;

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_response *get() const { return handle_.get(); }

private:
    explicit Response(detail::Shared<bc_response> handle) : handle_(std::move(handle)) {}

    friend class Member;

    detail::Shared<bc_response> handle_;
};

inline Response Member::solve() const {
    return Response(detail::make<bc_response>(
        bc_response_free, [&](bc_response **out) { return bc_member_solve(get(), out); }));
}

} // namespace beamcore

#include "camber.hpp"

#endif // BEAMCORE_RESPONSE_HPP
