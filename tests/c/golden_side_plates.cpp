// The golden case `side-plates` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

static Joint bolts(const std::string &name, const std::string &plate) {
    return Joint::loose(name, "joist", plate)
        .transverse(SlipModulus::from_N_per_mm2(3))
        .creep(0.6);
}

void side_plates() {
    const std::string name = "side-plates";
    const std::vector<std::string> names{"joist", "left plate", "right plate"};
    const Material wood{"wood", 11_GPa, 0.6}, steel{"steel", 210_GPa, 0.0};
    const Part joist{names[0], rectangle(94_mm, 220_mm), wood};
    const Outline plate = rectangle(5_mm, 200_mm);
    std::vector<Layer> layers;
    for (const std::string &part : names) {
        layers.push_back(Layer{part, {part}});
    }
    const Section section = Section::layered(
        {joist, Part{names[1], plate, steel}.left_of(joist),
         Part{names[2], plate, steel}.right_of(joist)},
        layers, {bolts("left bolts", names[1]), bolts("right bolts", names[2])});
    const Member member =
        Member::of_length(section, 4_m)
            .support(Support::pin("left", 0_m).under({"joist"}))
            .support(Support::roller("right", 4_m).under({"joist"}))
            .action(permanent("floor").on("joist").uniform(5_kN_per_m))
            .check();
    const Response response = member.solve();
    put_all(name, section, response, names, {"left", "right"});
    put_layers(name, section, response, member.has_deflections_of_layers());
}
