// The golden case `rafter` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

void rafter() {
    const std::string name = "rafter";
    const Section section{
        Part{"rafter", rectangle(80_mm, 220_mm), Material{"wood", 11_GPa, 0.6}}};
    const Draped tendon{{{0_m, -50_mm}, {5_m, -50_mm}}};
    const Response response =
        Member::of_length(section, 5_m)
            .pitch(20_deg)
            .support(Support::pin("foot", 0_m).at_height(0_mm))
            .support(Support::roller("top", 5_m))
            .action(permanent("roof").uniform(0.4_kN_per_m).axial(-6_kN, 5_m, 0_mm))
            .action(permanent("tendon").prestress(10_kN, tendon))
            .action(variable("snow", {0.5, 0.2, 0.0}).plan(1.5_kN_per_m))
            .check()
            .solve();
    put_all(name, section, response, {"rafter"}, {"foot", "top"});
    for (const auto &[combination, time, path] : states()) {
        put(name, path + ".axial.greatest.value_N",
            response.axial(combination, time).greatest().value.to_N());
        put(name, path + ".reactions[\"foot\"].along_N",
            response.reaction(combination, time, "foot").along.to_N());
    }
}
