// The golden runner in C++: `golden job FOLDER` answers the golden cases of a folder through job
// text, `golden typed` through the typed classes. A line of an answer is CASE<TAB>PATH<TAB>BITS.
#include "golden.hpp"

#include <cinttypes>
#include <cmath>
#include <cstdio>
#include <cstring>
#include <fstream>
#include <iostream>
#include <sstream>

using namespace beamcore;
using namespace beamcore::literals;

void put(const std::string &name, const std::string &path, double value) {
    std::uint64_t bits = 0;
    std::memcpy(&bits, &value, sizeof bits);
    std::printf("%s\t%s\t%016" PRIx64 "\n", name.c_str(), path.c_str(), bits);
}

static std::ifstream opened(const std::string &path) {
    std::ifstream file(path);
    if (!file) {
        throw std::runtime_error(path + " cannot be opened");
    }
    return file;
}

// The lines of a file that are neither empty nor comments.
static std::vector<std::string> lines(const std::string &path) {
    std::ifstream file = opened(path);
    std::vector<std::string> list;
    for (std::string line; std::getline(file, line);) {
        if (!line.empty() && line[0] != '#') {
            list.push_back(line);
        }
    }
    return list;
}

// Answers one case; the number of results that miss their tolerance.
static int answer(const std::string &folder, const std::string &name) {
    std::ostringstream text;
    text << opened(folder + "/" + name + ".toml").rdbuf();
    const Outcome outcome = Job::read(text.str(), Format::toml).solve();
    int misses = 0;
    for (const std::string &line : lines(folder + "/" + name + ".expect")) {
        std::istringstream words(line);
        std::string expected, peak, tolerance, path;
        words >> expected >> peak >> tolerance >> std::ws;
        if (!std::getline(words, path)) {
            throw std::runtime_error(name + ": a line without three numbers and a path: " + line);
        }
        const double value = outcome.number(path);
        put(name, path, value);
        if (expected == "-") {
            continue;
        }
        const double allowed = std::stod(tolerance) * std::stod(peak);
        if (!(std::fabs(value - std::stod(expected)) <= allowed)) {
            std::cerr << name << " " << path << ": " << value << " is not " << expected
                      << " within " << tolerance << "\n";
            ++misses;
        }
    }
    return misses;
}

static const std::pair<Time, const char *> TIMES[] = {{Time::initial, "initial"},
                                                      {Time::final, "final"}};

std::vector<State> states() {
    std::vector<State> list;
    for (const char *c : {"permanent", "quasi-permanent", "characteristic", "fundamental"}) {
        for (const auto &[time, word] : TIMES) {
            list.push_back(State{c, time, std::string("combinations[\"") + c + "\"]." + word});
        }
    }
    return list;
}

void put_all(const std::string &name, const Section &section, const Response &response,
             const std::vector<std::string> &parts, const std::vector<std::string> &supports) {
    for (const auto &[time, word] : TIMES) {
        const Stiffness stiffness = section.stiffness(time);
        const std::string base = std::string("section.") + word;
        put(name, base + ".bending_stiffness_yy_Nm2", stiffness.bending_yy.to_N_m2());
        put(name, base + ".axial_stiffness_N", stiffness.axial.to_N());
        put(name, base + ".centroid_z_m", stiffness.centroid_z.to_m());
    }
    for (const auto &[c, time, base] : states()) {
        const auto deflection = response.deflection(c, time).greatest();
        put(name, base + ".deflection.greatest.value_m", deflection.value.to_m());
        put(name, base + ".deflection.greatest.at_m", deflection.at.to_m());
        put(name, base + ".slope.greatest.value_rad",
            response.slope(c, time).greatest().value.to_rad());
        put(name, base + ".shear.greatest.value_N",
            response.shear(c, time).greatest().value.to_N());
        put(name, base + ".moment.greatest.value_Nm",
            response.moment(c, time).greatest().value.to_N_m());
        for (const std::string &support : supports) {
            const Reaction reaction = response.reaction(c, time, support);
            const std::string at = base + ".reactions[\"" + support + "\"]";
            put(name, at + ".force_N", reaction.force.to_N());
            put(name, at + ".couple_Nm", reaction.couple.to_N_m());
        }
        for (const std::string &part : parts) {
            const PartStress stress = response.stress(c, time, part);
            const std::string at = base + ".stresses[\"" + part + "\"]";
            put(name, at + ".tension.value_Pa", stress.greatest_tension().value.to_Pa());
            put(name, at + ".compression.value_Pa", stress.greatest_compression().value.to_Pa());
        }
    }
}

static void flitch() {
    const Material c24 = timber("C24", ServiceClass::one);
    const Part plate{"plate", rectangle(10_mm, 200_mm), steel("S275")};
    const Section section{Part{"left joist", rectangle(47_mm, 220_mm), c24}.left_of("plate"), plate,
                          Part{"right joist", rectangle(47_mm, 220_mm), c24}.right_of(plate)};
    const Member member = Member::simple_span(section, 4_m)
                              .action(permanent("floor").uniform(5_N_per_mm))
                              .check();
    put_all("flitch", section, member.solve(), {"left joist", "plate", "right joist"},
            {"left", "right"});
}

static void two_span() {
    const Material oak = Material("oak", 9.5_GPa, 0.6).density(690_kg_per_m3);
    const Material brass = Material("brass", 100_GPa, 0.0).density(8500_kg_per_m3);
    const Part beam{"beam", rectangle(120_mm, 240_mm), oak};
    const Section section{beam, Part{"strip", rectangle(100_mm, 6_mm), brass}.below(beam)};
    const Action partition =
        permanent("partition").partial(2.4_kN_per_m, 1.1_m, 5.3_m).point(3.5_kN, 7.5_m);
    const Action store =
        variable("store", {1.0, 0.9, 0.8}).uniform(3.1_kN_per_m).point(4.2_kN, 1.6_m);
    const Member member = Member::of_length(section, 7.5_m)
                              .support(Support::fixed("wall", 0_m))
                              .support(Support::roller("post", 3.2_m))
                              .support(Support::roller("end", 6.9_m))
                              .action(permanent("own weight").self_weight())
                              .action(partition)
                              .action(store)
                              .check();
    put_all("two-span", section, member.solve(), {"beam", "strip"}, {"wall", "post", "end"});
}

static void slab_strip() {
    const ConcreteCreep creep{38_MPa, 55.0, 140_mm, 28_d, 18250_d, Cement::n};
    const Part joist{"joist", rectangle(100_mm, 220_mm), timber("C24", ServiceClass::one)};
    const Part slab{"slab", rectangle(600_mm, 70_mm), concrete("C30/37", creep)};
    const Section section{joist, slab.above(joist)};
    const Response response =
        Member::simple_span(section, 5.4_m)
            .action(permanent("dead").self_weight().uniform(0.9_kN_per_m))
            .action(variable("live", {0.7, 0.5, 0.3}).uniform(1.7_kN_per_m))
            .check()
            .solve();
    put_all("slab-strip", section, response, {"joist", "slab"}, {"left", "right"});
    const Camber camber = response.camber({Shape::parabola, "quasi-permanent", Time::final, 1.0,
                                           "left", "right", 1_mm, Rounding::nearest, 0_m, 6});
    put("slab-strip", "camber.target_m", camber.target().to_m());
    put("slab-strip", "camber.rise_m", camber.rise().to_m());
    const auto ordinates = camber.ordinates();
    for (std::size_t i = 0; i < ordinates.size(); ++i) {
        put("slab-strip", "camber.ordinates[" + std::to_string(i) + "].ordinate_m",
            ordinates[i].ordinate.to_m());
    }
}

int main(int count, char **arguments) {
    try {
        const std::vector<std::string> words(arguments + 1, arguments + count);
        if (words.size() == 2 && words[0] == "job") {
            int misses = 0;
            for (const std::string &name : lines(words[1] + "/cases.txt")) {
                misses += answer(words[1], name);
            }
            return misses == 0 ? 0 : 1;
        }
        if (words.size() == 1 && words[0] == "typed") {
            flitch();
            two_span();
            slab_strip();
            roof_beam();
            odd_section();
            shrinking_slab();
            screwed_floor();
            clearance_floor();
            side_plates();
            rafter();
            lift_off();
            haunched_beam();
            return 0;
        }
        std::cerr << "usage: golden job FOLDER | golden typed\n";
    } catch (const std::exception &error) {
        std::cerr << error.what() << "\n";
    }
    return 1;
}
