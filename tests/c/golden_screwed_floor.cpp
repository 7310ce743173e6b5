// The golden cases `screwed-floor` and `clearance-floor` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

// A slab of this width and height on a joist, joined as told.
static Section section_of(Length width, Length height, double creep, const Joint &joint) {
    const Material wood{"wood", 11_GPa, 0.6}, concrete{"concrete", 31_GPa, creep};
    const Part joist{"joist", rectangle(100_mm, 220_mm), wood};
    return Section::layered({joist, Part{"slab", rectangle(width, height), concrete}.above(joist)},
                            {Layer{"joist", {"joist"}}, Layer{"slab", {"slab"}}}, {joint});
}

void screwed_floor() {
    const std::string name = "screwed-floor";
    const std::vector<Band> bands{
        {0_m, 1.2_m, 100_mm}, {1.2_m, 4.2_m, 200_mm}, {4.2_m, 5.4_m, 100_mm}};
    const Joint screws =
        Joint::slipping("screws", "joist", "slab", Fasteners{10_kN_per_mm, 1, 1, bands}).creep(1.0);
    const Section section = section_of(600_mm, 60_mm, 2.0, screws);
    const Member member =
        Member::simple_span(section, 5.4_m)
            .action(permanent("dead").on("slab").uniform(2_kN_per_m))
            .action(variable("live", {0.7, 0.5, 0.3}).on("slab").uniform(1.7_kN_per_m))
            .check();
    const Response response = member.solve();
    put_all(name, section, response, {"joist", "slab"}, {"left", "right"});
    put_layers(name, section, response, member.has_deflections_of_layers());
    for (const auto &[combination, time, path] : states()) {
        if (combination == "characteristic") {
            const CompositeAction action = response.composite_action(combination, time);
            put(name, path + ".composite_action.degree", action.degree);
            put(name, path + ".composite_action.effective_stiffness_Nm2",
                action.effective_stiffness.to_N_m2());
        }
    }
}

void clearance_floor() {
    const std::string name = "clearance-floor";
    const Joint screws =
        Joint::slipping("screws", "joist", "slab", Fasteners{10_kN_per_mm, 2, 1, 150_mm})
            .clearance(0.5_mm)
            .creep(1.2);
    const Section section = section_of(600_mm, 70_mm, 2.5, screws);
    const Member member = Member::simple_span(section, 6_m)
                              .action(permanent("load").uniform(3_kN_per_m))
                              .check();
    const Response response = member.solve();
    put_all(name, section, response, {"joist", "slab"}, {"left", "right"});
    put_layers(name, section, response, member.has_deflections_of_layers());
}
