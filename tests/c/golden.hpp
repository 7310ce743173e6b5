// What the files of the golden runner in C++ share.
#ifndef GOLDEN_HPP
#define GOLDEN_HPP

#include <beamcore.hpp>

// Prints a line of the answer.
void put(const std::string &name, const std::string &path, double value);

// The cases of the typed way in files of their own.
void roof_beam();
void odd_section();
void shrinking_slab();

#endif
