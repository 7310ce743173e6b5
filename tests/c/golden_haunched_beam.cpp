// The golden case `haunched-beam` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

static Section section_of(Length height, Length z) {
    const Material glulam = Material("glulam", 11.6_GPa, 0.6)
                                .shear_modulus(0.65_GPa)
                                .thermal_expansion(ThermalExpansion::from_per_K(5e-6));
    return Section{Part{"beam", rectangle(140_mm, height), glulam}.at(0_mm, z)};
}

void haunched_beam() {
    const std::string name = "haunched-beam";
    const Section main = section_of(360_mm, 0_mm), deep = section_of(600_mm, -120_mm);
    const Response response =
        Member::of_length(main, 10_m)
            .shear(ShearModel::flexible())
            .support(Support::pin("wall", 0_m).rotational_spring(4000_kN_m_per_rad))
            .support(Support::roller("column", 6_m).spring(SpringStiffness::from_kN_per_mm(8)))
            .support(Support::roller("end", 10_m))
            .taper(4_m, 6_m, deep)
            .step(6_m, main)
            .hinge(Hinge::moment(8_m))
            .action(permanent("load").uniform(4_kN_per_m))
            .action(permanent("sinking").settlement("column", 5_mm))
            .action(variable("sun", {0.6, 0.5, 0.0}).temperature_difference(15_K))
            .check()
            .solve();
    put_all(name, main, response, {"beam"}, {"wall", "column", "end"});
    for (const auto &[combination, time, path] : states()) {
        put(name, path + ".rotation.greatest.value_rad",
            response.rotation(combination, time).greatest().value.to_rad());
    }
}
