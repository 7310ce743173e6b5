// Strengths of materials and the factors to design strengths.
#ifndef BEAMCORE_STRENGTH_HPP
#define BEAMCORE_STRENGTH_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

#include <optional>

namespace beamcore {

// Which strength of a material; those of another stuff are not known.
enum class Strength : std::int32_t {
    // Design strengths: f_m,d, f_t,0,d and f_c,0,d of timber, f_y,d of metal, and shear.
    design_bending = BC_STRENGTH_DESIGN_BENDING,
    design_tension = BC_STRENGTH_DESIGN_TENSION,
    design_compression = BC_STRENGTH_DESIGN_COMPRESSION,
    design_yield = BC_STRENGTH_DESIGN_YIELD,
    design_shear = BC_STRENGTH_DESIGN_SHEAR,
    // Characteristic strengths of timber along and across the grain; compression is also f_ck of
    // concrete.
    bending = BC_STRENGTH_BENDING,
    tension = BC_STRENGTH_TENSION,
    compression = BC_STRENGTH_COMPRESSION,
    shear = BC_STRENGTH_SHEAR,
    tension_across = BC_STRENGTH_TENSION_ACROSS,
    compression_across = BC_STRENGTH_COMPRESSION_ACROSS,
    // Characteristic strengths of metal: f_y or f_o, and f_u.
    yield = BC_STRENGTH_YIELD,
    ultimate = BC_STRENGTH_ULTIMATE,
    // Mean strengths of concrete: f_cm and f_ctm.
    mean_compression = BC_STRENGTH_MEAN_COMPRESSION,
    mean_tension = BC_STRENGTH_MEAN_TENSION,
};

// Strengths of timber across the grain: tension f_t,90,k and compression f_c,90,k.
struct AcrossGrain {
    Stress tension;
    Stress compression;
};

// Characteristic strengths of timber: bending f_m,k, along the grain f_t,0,k and f_c,0,k, shear
// f_v,k, and those across the grain where they are known.
struct TimberStrength {
    Stress bending;
    Stress tension;
    Stress compression;
    Stress shear;
    std::optional<AcrossGrain> across = std::nullopt;
};

// Characteristic strengths of metal: f_y or f_o, and f_u where it is known.
struct MetalStrength {
    Stress yield;
    std::optional<Stress> ultimate = std::nullopt;
};

// Factors by which design strengths of timber follow from characteristic ones:
// f_d = k_mod k_h k_sys f_k/gamma_M, k_h for bending and tension only; 1 where there is none.
struct TimberFactors {
    double k_mod;
    double gamma_m;
    double k_h = 1.0;
    double k_sys = 1.0;
};

// The partial factor of metal: gamma_M0 of steel, gamma_M1 of aluminium.
struct MetalFactor {
    double gamma_m;
};

} // namespace beamcore

#endif // BEAMCORE_STRENGTH_HPP
