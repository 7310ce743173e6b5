// The golden case `odd-section` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

static const std::string name = "odd-section";
static const std::vector<std::string> parts = {"stem",    "bar",   "foot", "head",
                                               "channel", "cheek", "pipe"};

static Section odd() {
    const Material oak = Material("oak", 9.5_GPa, 0.6).density(690_kg_per_m3);
    const Material steel = Material("steel", 210_GPa, 0.0).density(7850_kg_per_m3);
    const Outline trapezium = polygon({{-60_mm, -150_mm},
                                       {-40_mm, -180_mm},
                                       {40_mm, -180_mm},
                                       {60_mm, -150_mm}});
    const Part stem{"stem", rectangle(120_mm, 300_mm), oak};
    const Part foot{"foot", trapezium, oak};
    return Section{
        stem,
        Part{"bar", disc(24_mm), steel}.set_into(stem, -30_mm, -120_mm),
        foot,
        Part{"head", trapezium, oak}.mirror_of(foot, MirrorAxis::level),
        Part{"channel", channel(100_mm, 40_mm, 8_mm, 6_mm), steel}.at(-80_mm, 0_mm),
        Part{"cheek", angle(90_mm, 70_mm, 8_mm), steel}.right_of(stem),
        Part{"pipe", ring(60_mm, 5_mm), steel}.below(foot).line_mass(9_kg_per_m),
    };
}

static void put_section(const Section &section, Time time, const std::string &word) {
    const Stiffness stiffness = section.stiffness(time);
    const Principal principal = section.principal(time);
    const std::string base = "section." + word;
    put(name, base + ".axial_stiffness_N", stiffness.axial.to_N());
    put(name, base + ".centroid_y_m", stiffness.centroid_y.to_m());
    put(name, base + ".centroid_z_m", stiffness.centroid_z.to_m());
    put(name, base + ".bending_stiffness_yy_Nm2", stiffness.bending_yy.to_N_m2());
    put(name, base + ".bending_stiffness_zz_Nm2", stiffness.bending_zz.to_N_m2());
    put(name, base + ".bending_stiffness_yz_Nm2", stiffness.bending_yz.to_N_m2());
    put(name, base + ".principal_greater_Nm2", principal.greater.to_N_m2());
    put(name, base + ".principal_smaller_Nm2", principal.smaller.to_N_m2());
}

static void put_fields(const Response &response, const std::string &combination, Time time,
                       const std::string &word) {
    const std::string base = "combinations[\"" + combination + "\"]." + word;
    put(name, base + ".deflection.greatest.value_m",
        response.deflection(combination, time).greatest().value.to_m());
    put(name, base + ".sideways.greatest.value_m",
        response.sideways(combination, time).greatest().value.to_m());
    for (const std::string &part : parts) {
        const PartStress stress = response.stress(combination, time, part);
        const std::string at = base + ".stresses[\"" + part + "\"]";
        put(name, at + ".tension.value_Pa", stress.greatest_tension().value.to_Pa());
        put(name, at + ".compression.value_Pa", stress.greatest_compression().value.to_Pa());
    }
}

void odd_section() {
    const Section section = odd();
    const Response response =
        Member::simple_span(section, 5_m)
            .sideways(Sideways::free)
            .action(permanent("dead").self_weight().uniform(4_kN_per_m))
            .action(variable("crane", Category::storage).point(6_kN, 2_m))
            .check()
            .solve();
    const std::pair<Time, const char *> times[] = {{Time::initial, "initial"},
                                                   {Time::final, "final"}};
    for (const auto &[time, word] : times) {
        put_section(section, time, word);
        for (const std::string combination :
             {"permanent", "quasi-permanent", "characteristic", "fundamental"}) {
            put_fields(response, combination, time, word);
        }
    }
}
