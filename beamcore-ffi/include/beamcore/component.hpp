// Components of the deflection of a span.
#ifndef BEAMCORE_COMPONENT_HPP
#define BEAMCORE_COMPONENT_HPP

#include "../beamcore.h"

#include <cstdint>

namespace beamcore {

// A component of the deflection of a span (EN 1990:2002 A1.4.3).
enum class Component : std::int32_t {
    // w_inst: characteristic combination, initial.
    instant = BC_COMPONENT_INSTANT,
    // w_1: permanent actions, initial.
    permanent = BC_COMPONENT_PERMANENT,
    // w_2: what creep adds under permanent actions only.
    creep = BC_COMPONENT_CREEP,
    // w_3: what variable actions add, with the creep under their quasi-permanent part.
    variable = BC_COMPONENT_VARIABLE,
    // w_tot = w_1 + w_2 + w_3.
    total = BC_COMPONENT_TOTAL,
    // w_max = w_tot - w_c: what is left after the camber w_c.
    remaining = BC_COMPONENT_REMAINING,
};

} // namespace beamcore

#endif // BEAMCORE_COMPONENT_HPP
