// What the golden cases of layers read beside the results of every case.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

void put_layers(const std::string &name, const Section &section, const Response &response,
                bool has_deflections_of_layers) {
    for (const auto &[combination, time, path] : states()) {
        for (const Joint &joint : section.joints()) {
            const std::string at = path + ".joints[\"" + joint.name() + "\"]";
            const JointResponse found = response.joint(combination, time, joint.name());
            put(name, at + ".slip.greatest.value_m", found.slip.greatest().value.to_m());
            put(name, at + ".slip.left_m", found.slip.value(0_m).to_m());
            put(name, at + ".flow.greatest.value_N_per_m",
                found.flow.greatest().value.to_N_per_m());
            put(name, at + ".pressure.minimum.value_N_per_m",
                found.pressure.minimum().value.to_N_per_m());
        }
        for (const Layer &layer : section.layers()) {
            const std::string at = path + ".layers[\"" + layer.name() + "\"]";
            const LayerForces found = response.layer(combination, time, layer.name());
            put(name, at + ".axial.greatest.value_N", found.axial.greatest().value.to_N());
            put(name, at + ".moment.greatest.value_Nm", found.moment.greatest().value.to_N_m());
            if (has_deflections_of_layers) {
                const Field<Length> line =
                    response.layer_deflection(combination, time, layer.name());
                put(name, at + ".deflection.greatest.value_m", line.greatest().value.to_m());
            }
        }
    }
}
