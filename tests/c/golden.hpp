// What the two files of the golden runner in C++ share.
#ifndef GOLDEN_HPP
#define GOLDEN_HPP

#include <beamcore.hpp>

// Prints a line of the answer.
void put(const std::string &name, const std::string &path, double value);

// A case of the typed way in a file of its own.
void roof_beam();

#endif
