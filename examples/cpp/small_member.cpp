// A door lintel: two joists on both sides of a steel plate, under a wall.
#include <beamcore.hpp>

#include <cstdio>

int main() {
    using namespace beamcore;
    using namespace beamcore::literals;
    try {
        const Material c24 = timber("C24", ServiceClass::one);
        const Part plate{"plate", rectangle(8_mm, 180_mm), steel("S235")};
        const auto front = Part{"front joist", rectangle(47_mm, 195_mm), c24}.left_of(plate);
        const auto back = Part{"back joist", rectangle(47_mm, 195_mm), c24}.right_of(plate);

        const auto lintel =
            Member::simple_span(Section{front, plate, back}, 3.6_m)
                .action(permanent("wall above").uniform(4.5_kN_per_m).self_weight())
                .check();
        const auto peak = lintel.solve().deflection("quasi-permanent", Time::final).greatest();
        std::printf("deflection %.2f mm at %.2f m\n", peak.value.to_mm(), peak.at.to_m());
    } catch (const Error &error) {
        std::fprintf(stderr, "%s\n", error.what());
        return 1;
    }
    return 0;
}
