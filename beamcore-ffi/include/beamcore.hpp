// beamcore for C++17: value types with units over the C ABI in beamcore.h.
//
// Every object is a value: copies share an unchangeable handle and cost nothing, and methods that
// seem to change an object return a new one. Failures are exceptions derived from
// beamcore::Error, with the text of the calculation core. Quantities are types
// (beamcore_units.hpp); `using namespace beamcore::literals;` gives 50_mm and 6.5_kN_per_m.
// Signs and the rules for threads are those at the head of beamcore.h.
#ifndef BEAMCORE_HPP
#define BEAMCORE_HPP

#include "beamcore/action.hpp"
#include "beamcore/camber.hpp"
#include "beamcore/concrete.hpp"
#include "beamcore/error.hpp"
#include "beamcore/job.hpp"
#include "beamcore/layer.hpp"
#include "beamcore/limit.hpp"
#include "beamcore/material.hpp"
#include "beamcore/member.hpp"
#include "beamcore/outline.hpp"
#include "beamcore/part.hpp"
#include "beamcore/reading.hpp"
#include "beamcore/response.hpp"
#include "beamcore/section.hpp"
#include "beamcore/simplified.hpp"
#include "beamcore/support.hpp"
#include "beamcore_units.hpp"

namespace beamcore {

// The version of the library, as in "0.1.0".
inline std::string version() {
    return detail::text([](char *buffer, std::int64_t capacity, std::int64_t *length) {
        return bc_version(buffer, capacity, length);
    });
}

} // namespace beamcore

#endif // BEAMCORE_HPP
