// The golden case `shrinking-slab` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

static const std::string name = "shrinking-slab";

static Response solved() {
    const Material concrete{"concrete", 31_GPa, 2.0};
    const Part joist{"joist", rectangle(120_mm, 240_mm), timber("C24", ServiceClass::one)};
    const Part slab = Part{"slab", rectangle(500_mm, 60_mm), concrete}.above(joist).initial_strain(
        {Strain::from_permille(-0.3), Curvature::from_per_m(0.0005)});
    const Action load = permanent("load")
                            .duration(LoadDuration::permanent)
                            .starting(28_d)
                            .uniform(1_kN_per_m);
    return Member::of_length(Section{joist, slab}, 8_m)
        .support(Support::pin("left", 0_m))
        .support(Support::roller("middle", 4_m))
        .support(Support::roller("right", 8_m))
        .action(load)
        .check()
        .solve();
}

void shrinking_slab() {
    const Response response = solved();
    const std::pair<Time, const char *> times[] = {{Time::initial, "initial"},
                                                   {Time::final, "final"}};
    for (const auto &[time, word] : times) {
        const std::string base = std::string("combinations[\"permanent\"].") + word;
        put(name, base + ".moment.minimum.value_Nm",
            response.moment("permanent", time).minimum().value.to_N_m());
        for (const std::string support : {"left", "middle"}) {
            put(name, base + ".reactions[\"" + support + "\"].force_N",
                response.reaction("permanent", time, support).force.to_N());
        }
        for (const std::string part : {"joist", "slab"}) {
            const PartStress stress = response.stress("permanent", time, part);
            const std::string at = base + ".stresses[\"" + part + "\"]";
            put(name, at + ".tension.value_Pa", stress.greatest_tension().value.to_Pa());
            put(name, at + ".compression.value_Pa", stress.greatest_compression().value.to_Pa());
        }
    }
}
