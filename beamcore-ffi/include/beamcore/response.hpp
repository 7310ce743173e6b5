// Responses of members.
#ifndef BEAMCORE_RESPONSE_HPP
#define BEAMCORE_RESPONSE_HPP

#include "component.hpp"
#include "field.hpp"
#include "member.hpp"
#include "simplified.hpp"
#include "stress.hpp"

namespace beamcore {

// The reaction of a support: force positive upward, couple positive clockwise with x to the right
// and z up, level force positive to the right.
struct Reaction {
    Force force;
    Moment couple;
    // Zero where no axial force takes part.
    Force along;
};

class Camber;
struct CamberPlan;
struct CompositeAction;
struct JointResponse;
struct LayerForces;
struct SimplifiedSpan;
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
    // The axial force N, tension positive.
    Field<Force> axial(const std::string &combination, Time time) const {
        return field<Force>(BC_FIELD_AXIAL, combination, time);
    }
    // The rotation of the section, positive clockwise; with shear it is not the slope.
    Field<Angle> rotation(const std::string &combination, Time time) const {
        return field<Angle>(BC_FIELD_ROTATION, combination, time);
    }
    // The curvature, positive sagging, with its free part.
    Field<Curvature> curvature(const std::string &combination, Time time) const {
        return field<Curvature>(BC_FIELD_CURVATURE, combination, time);
    }

    // Slip, flow and contact pressure of a joint that is not rigid.
    JointResponse joint(const std::string &combination, Time time, const std::string &joint) const;

    // Axial force and moment of a layer, with the layers that rigid joints hold to it.
    LayerForces layer(const std::string &combination, Time time, const std::string &layer) const;

    // The deflection of a layer; that of the member unless a transverse modulus gives the layer one
    // of its own.
    Field<Length> layer_deflection(const std::string &combination, Time time,
                                   const std::string &layer) const;

    // The degree of composite action and the effective bending stiffness, from the same member
    // with all its joints loose and with all of them rigid.
    CompositeAction composite_action(const std::string &combination, Time time) const;

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

    // Deflection, flow and stresses of each span by a simplified method, beside the exact ones.
    std::vector<SimplifiedSpan> simplified(const std::string &combination, Time time,
                                           SimplifiedMethod method) const;

    // The reaction of a support.
    Reaction reaction(const std::string &combination, Time time, const std::string &support) const {
        double force = 0.0, couple = 0.0, along = 0.0;
        const char *under = detail::c_text(combination, "combination");
        const char *at = detail::c_text(support, "support");
        detail::check(
            bc_response_reaction(get(), under, detail::code(time), at, &force, &couple));
        detail::check(
            bc_response_reaction_along(get(), under, detail::code(time), at, &along));
        return Reaction{Force::from_si(force), Moment::from_si(couple), Force::from_si(along)};
    }

    // The force with which a support holds a layer along the member by itself, positive to the
    // right.
    Force layer_reaction(const std::string &combination, Time time, const std::string &support,
                         const std::string &layer) const {
        return Force::from_si(detail::number([&](double *out) {
            return bc_response_layer_reaction(get(), detail::c_text(combination, "combination"),
                                              detail::code(time),
                                              detail::c_text(support, "support"),
                                              detail::c_text(layer, "layer"), out);
        }));
    }

    // The force of an anchor; it bears the sign of the slip that it stops.
    Force anchor_force(const std::string &combination, Time time,
                       const std::string &anchor) const {
        return Force::from_si(detail::number([&](double *out) {
            return bc_response_anchor_force(get(), detail::c_text(combination, "combination"),
                                            detail::code(time), detail::c_text(anchor, "anchor"),
                                            out);
        }));
    }

    // The names of the one-way supports that the member leaves under a combination.
    std::vector<std::string> lifted(const std::string &combination, Time time) const;

    // How many linear solutions a combination took: one, unless the member may lift off supports or
    // its joints have clearance.
    std::int32_t steps(const std::string &combination, Time time) const {
        return detail::count([&](std::int32_t *out) {
            return bc_response_steps(get(), detail::c_text(combination, "combination"),
                                     detail::code(time), out);
        });
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

    detail::Shared<bc_field> layer_field(std::int32_t layer_field, const std::string &combination,
                                         Time time, const std::string &layer) const;

    // A component with a camber or, where its handle is empty, without one.
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

#include "composite.hpp"

#include "comparison.hpp"

#endif // BEAMCORE_RESPONSE_HPP
