// The golden case `lift-off` through the typed classes.
#include "golden.hpp"

#include <stdexcept>

using namespace beamcore;
using namespace beamcore::literals;

void lift_off() {
    const std::string name = "lift-off";
    const Section section{Part{"beam", rectangle(100_mm, 240_mm), Material{"wood", 11_GPa, 0.0}}};
    const Response response =
        Member::of_length(section, 8_m)
            .support(Support::roller("post", 0_m).one_way())
            .support(Support::pin("middle", 3_m))
            .support(Support::roller("end", 8_m))
            .action(permanent("weight").uniform(1.2_kN_per_m))
            .action(variable("load", {0.7, 0.5, 0.0}).partial(4_kN_per_m, 3_m, 8_m))
            .check()
            .solve();
    put_all(name, section, response, {"beam"}, {"post", "middle", "end"});
    for (const auto &[combination, time, path] : states()) {
        put(name, path + ".steps", response.steps(combination, time));
        const bool is_loaded = combination == "characteristic" || combination == "fundamental";
        const std::vector<std::string> expected(is_loaded ? 1 : 0, "post");
        if (response.lifted(combination, time) != expected) {
            throw std::runtime_error(path + ": other supports are left than \"post\"");
        }
    }
}
