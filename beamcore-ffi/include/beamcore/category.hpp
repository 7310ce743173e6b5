// Categories of variable actions, and how long actions act.
#ifndef BEAMCORE_CATEGORY_HPP
#define BEAMCORE_CATEGORY_HPP

#include "handle.hpp"

namespace beamcore {

// The factors by which a variable action enters combinations.
struct CombinationFactors {
    double psi_0;
    double psi_1;
    double psi_2;
};

// A category of variable actions (EN 1990:2002 Table A1.1).
enum class Category : std::int32_t {
    domestic = BC_CATEGORY_DOMESTIC,           // A: homes
    office = BC_CATEGORY_OFFICE,               // B: offices
    congregation = BC_CATEGORY_CONGREGATION,   // C: where people gather
    shopping = BC_CATEGORY_SHOPPING,           // D: shops
    storage = BC_CATEGORY_STORAGE,             // E: storage
    light_traffic = BC_CATEGORY_LIGHT_TRAFFIC, // F: vehicles up to 30 kN
    heavy_traffic = BC_CATEGORY_HEAVY_TRAFFIC, // G: vehicles from 30 kN to 160 kN
    roof = BC_CATEGORY_ROOF,                   // H: roofs that are only walked on for upkeep
    snow = BC_CATEGORY_SNOW,                   // at 1000 m above the sea or lower
    snow_high = BC_CATEGORY_SNOW_HIGH,         // above 1000 m, and everywhere in the north
    wind = BC_CATEGORY_WIND,
    temperature = BC_CATEGORY_TEMPERATURE, // not fire
};

// The category of a word of documents: "A" to "H", "snow", "snow_high", "wind", "temperature".
inline Category category_of_name(const std::string &name) {
    return static_cast<Category>(detail::count([&](std::int32_t *out) {
        return bc_category_of_name(detail::c_text(name, "name"), out);
    }));
}

// The recommended combination factors of a category.
inline CombinationFactors combination_factors(Category category) {
    double psi_0 = 0.0, psi_1 = 0.0, psi_2 = 0.0;
    detail::check(bc_category_factors(detail::code(category), &psi_0, &psi_1, &psi_2));
    return CombinationFactors{psi_0, psi_1, psi_2};
}

// How long an action acts at a time (EN 1995-1-1:2004 2.3.1.2, from memory).
enum class LoadDuration : std::int32_t {
    permanent = BC_DURATION_PERMANENT,         // more than ten years
    long_term = BC_DURATION_LONG,              // six months to ten years
    medium_term = BC_DURATION_MEDIUM,          // a week to six months
    short_term = BC_DURATION_SHORT,            // less than a week
    instantaneous = BC_DURATION_INSTANTANEOUS, // moments
};

} // namespace beamcore

#endif // BEAMCORE_CATEGORY_HPP
