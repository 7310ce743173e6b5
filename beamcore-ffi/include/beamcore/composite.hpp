// Results of members of layers: joints, layers, composite action.
#ifndef BEAMCORE_COMPOSITE_HPP
#define BEAMCORE_COMPOSITE_HPP

#include "response.hpp"

namespace beamcore {

// What happens in a joint that is not rigid.
struct JointResponse {
    // Displacement along x of the upper layer minus that of the lower one.
    Field<Length> slip;
    // Force per length with which the joint pulls the upper layer to the left and the lower one to
    // the right; it bears the sign of the slip.
    Field<ShearFlow> flow;
    // What the layers above press with on those below, per length; negative where they would part.
    Field<LineLoad> pressure;
};

// The forces of one layer.
struct LayerForces {
    // Tension positive.
    Field<Force> axial;
    // About the layer's own centroid, positive sagging.
    Field<Moment> moment;
};

// The composite action of a member of layers under one combination, seen at the place of its
// greatest deflection.
struct CompositeAction {
    // (w loose - w)/(w loose - w rigid): 0 where the joints do nothing, 1 where they do not slip.
    double degree;
    // The bending stiffness with which a member without slip would deflect as much.
    BendingStiffness effective_stiffness;
    Length at;
    Length deflection;
    // The deflection there with all joints loose, and with all of them rigid.
    Length loose;
    Length rigid;
};

inline JointResponse Response::joint(const std::string &combination, Time time,
                                     const std::string &joint) const {
    const auto field = [&](std::int32_t joint_field) {
        return detail::make<bc_field>(bc_field_free, [&](bc_field **out) {
            return bc_response_joint_field(get(), joint_field,
                                           detail::c_text(combination, "combination"),
                                           detail::code(time), detail::c_text(joint, "joint"),
                                           out);
        });
    };
    return JointResponse{Field<Length>(field(BC_JOINT_FIELD_SLIP)),
                         Field<ShearFlow>(field(BC_JOINT_FIELD_FLOW)),
                         Field<LineLoad>(field(BC_JOINT_FIELD_PRESSURE))};
}

inline detail::Shared<bc_field> Response::layer_field(std::int32_t layer_field,
                                                      const std::string &combination, Time time,
                                                      const std::string &layer) const {
    return detail::make<bc_field>(bc_field_free, [&](bc_field **out) {
        return bc_response_layer_field(get(), layer_field,
                                       detail::c_text(combination, "combination"),
                                       detail::code(time), detail::c_text(layer, "layer"), out);
    });
}

inline LayerForces Response::layer(const std::string &combination, Time time,
                                   const std::string &layer) const {
    return LayerForces{
        Field<Force>(layer_field(BC_LAYER_FIELD_AXIAL, combination, time, layer)),
        Field<Moment>(layer_field(BC_LAYER_FIELD_MOMENT, combination, time, layer))};
}

inline Field<Length> Response::layer_deflection(const std::string &combination, Time time,
                                                const std::string &layer) const {
    return Field<Length>(layer_field(BC_LAYER_FIELD_DEFLECTION, combination, time, layer));
}

inline CompositeAction Response::composite_action(const std::string &combination,
                                                  Time time) const {
    double degree = 0.0, stiffness = 0.0, at = 0.0, deflection = 0.0, loose = 0.0, rigid = 0.0;
    detail::check(bc_response_composite_action(get(), detail::c_text(combination, "combination"),
                                               detail::code(time), &degree, &stiffness, &at,
                                               &deflection, &loose, &rigid));
    return CompositeAction{degree,
                           BendingStiffness::from_si(stiffness),
                           Length::from_si(at),
                           Length::from_si(deflection),
                           Length::from_si(loose),
                           Length::from_si(rigid)};
}

inline std::vector<std::string> Response::lifted(const std::string &combination,
                                                 Time time) const {
    const char *under = detail::c_text(combination, "combination");
    return detail::texts(
        get(),
        [&](const bc_response *response, std::int32_t *out) {
            return bc_response_lifted_count(response, under, detail::code(time), out);
        },
        [&](const bc_response *response, std::int32_t index, char *buffer, std::int64_t capacity,
            std::int64_t *length) {
            return bc_response_lifted_name(response, under, detail::code(time), index, buffer,
                                           capacity, length);
        });
}

} // namespace beamcore

#endif // BEAMCORE_COMPOSITE_HPP
