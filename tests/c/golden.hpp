// What the files of the golden runner in C++ share.
#ifndef GOLDEN_HPP
#define GOLDEN_HPP

#include <beamcore.hpp>

// Prints a line of the answer.
void put(const std::string &name, const std::string &path, double value);

// A combination at a time, with its path.
struct State {
    std::string combination;
    beamcore::Time time;
    std::string path;
};

// Every combination at both times.
std::vector<State> states();

// Prints what every case prints.
void put_all(const std::string &name, const beamcore::Section &section,
             const beamcore::Response &response, const std::vector<std::string> &parts,
             const std::vector<std::string> &supports);

// Prints the joints that slip and the layers of a case.
void put_layers(const std::string &name, const beamcore::Section &section,
                const beamcore::Response &response, bool has_deflections_of_layers);

// The cases of the typed way in files of their own.
void roof_beam();
void odd_section();
void shrinking_slab();
void screwed_floor();
void clearance_floor();
void haunched_beam();
void rafter();
void side_plates();
void lift_off();

#endif
