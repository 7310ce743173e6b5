// Responses of members.
#ifndef BEAMCORE_RESPONSE_HPP
#define BEAMCORE_RESPONSE_HPP

#include "component.hpp"
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
class Limit;
struct LimitCheck;
struct Reading;
struct Trestles;

// The solved member: every field under every combination, at both times.
class Response {
public:
    // The deflection, positive downward.
    Field<Length> deflection(const std::string &combination, Time time) const {
        return field<Length>(BC_FIELD_DEFLECTION, combination, time);
    }
    // The slope dw/dx.
    Field<Angle> slope(const std::string &combination, Time time) const {
        return field<Angle>(BC_FIELD_SLOPE, combination, time);
    }
    // The shear force V = dM/dx.
    Field<Force> shear(const std::string &combination, Time time) const {
        return field<Force>(BC_FIELD_SHEAR, combination, time);
    }
    // The moment, positive where it stretches the bottom (sagging).
    Field<Moment> moment(const std::string &combination, Time time) const {
        return field<Moment>(BC_FIELD_MOMENT, combination, time);
    }

    // The movement sideways, positive towards positive y; zero unless the member is free sideways
    // and its section has no axis of symmetry.
    Field<Length> sideways(const std::string &combination, Time time) const {
        detail::c_text(combination, "combination");
        const auto response = handle_;
        // A movement has one value at each place, whatever the side.
        return Field<Length>(
            [=](std::int32_t, const double *x_m, std::int32_t count, double *out) {
                return bc_response_sideways_values(response.get(), combination.c_str(),
                                                   detail::code(time), x_m, count, out);
            },
            [=](std::int32_t extreme, double *value, double *at) {
                return bc_response_sideways_extreme(response.get(), combination.c_str(),
                                                    detail::code(time), extreme, value, at);
            });
    }

    // The deflection of one span: between two supports from the chord through them, of an overhang
    // from its support.
    Field<Length> span_deflection(const std::string &combination, Time time,
                                  const std::string &span) const;

    // A component of the deflection of a span under a characteristic combination or one of one's
    // own; the camber counts for Component::remaining.
    Field<Length> deflection_component(Component component, const std::string &combination,
                                       const std::string &span) const;
    Field<Length> deflection_component(Component component, const std::string &combination,
                                       const std::string &span, const Camber &camber) const;

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

    // The line that remains after a camber, positive below the straight line.
    Field<Length> remaining(const std::string &combination, Time time, const Camber &camber) const;

    // The readings to expect at the stations of a camber, lying and standing on trestles.
    std::vector<Reading> readings(const Camber &camber, const Trestles &trestles) const;

    // Compares limits with the results, one check per limit and span, each under the combination
    // that uses it most; the camber counts for Component::remaining.
    std::vector<LimitCheck> check_limits(const std::vector<Limit> &limits) const;
    std::vector<LimitCheck> check_limits(const std::vector<Limit> &limits,
                                         const Camber &camber) const;

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_response *get() const { return handle_.get(); }

private:
    explicit Response(detail::Shared<bc_response> handle) : handle_(std::move(handle)) {}

    friend class Member;

    template <class Q>
    Field<Q> field(std::int32_t field, const std::string &combination, Time time) const {
        detail::c_text(combination, "combination");
        const auto response = handle_;
        return Field<Q>(
            [=](std::int32_t side, const double *x_m, std::int32_t count, double *out) {
                return bc_response_values(response.get(), field, combination.c_str(),
                                          detail::code(time), side, x_m, count, out);
            },
            [=](std::int32_t extreme, double *value, double *at) {
                return bc_response_extreme(response.get(), field, combination.c_str(),
                                           detail::code(time), extreme, value, at);
            });
    }

    // The same with a camber or, where its handle is empty, without one.
    Field<Length> component(Component component, const std::string &combination,
                            const std::string &span, detail::Shared<bc_camber> camber) const;
    std::vector<LimitCheck> checks(const std::vector<Limit> &limits,
                                   const bc_camber *camber) const;

    detail::Shared<bc_response> handle_;
};

inline Response Member::solve() const {
    return Response(detail::make<bc_response>(
        bc_response_free, [&](bc_response **out) { return bc_member_solve(get(), out); }));
}

} // namespace beamcore

#include "camber.hpp"

#endif // BEAMCORE_RESPONSE_HPP
