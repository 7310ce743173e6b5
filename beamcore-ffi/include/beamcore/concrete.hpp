// What the modulus and the shrinkage of concrete follow from.
#ifndef BEAMCORE_CONCRETE_HPP
#define BEAMCORE_CONCRETE_HPP

#include "material.hpp"

#include <cmath>

namespace beamcore {

// What the shrinkage of a concrete depends on.
struct ConcreteShrinkage {
    // Mean compressive strength f_cm at 28 days.
    Stress mean_strength;
    // Relative humidity of the air in percent: 50 means 50 %.
    double relative_humidity_percent;
    // Notional size h0 = 2 A_c/u.
    Length notional_size;
    // Age at which drying begins.
    Duration age_at_drying;
    // Age at which the shrinkage is asked for.
    Duration age_at_end;
    Cement cement;
};

namespace detail {

// The number of a plain function, which is NaN where it failed.
inline double plain(double value) {
    if (std::isnan(value)) {
        std::int32_t status = BC_OK;
        check(bc_error_status(&status));
        check(status);
    }
    return value;
}

} // namespace detail

// The mean modulus of concrete at 28 days, of a mean strength f_cm.
inline Modulus concrete_mean_modulus(Stress mean_strength) {
    return Modulus::from_si(detail::plain(bc_plain_concrete_mean_modulus(mean_strength.si())));
}

// The share of its strength at 28 days that concrete has at an age.
inline double concrete_strength_share(Duration age, Cement cement) {
    return detail::plain(bc_plain_concrete_strength_share(age.si(), detail::code(cement)));
}

// The mean modulus of concrete at an age, from the one at 28 days.
inline Modulus concrete_modulus_at_age(Modulus mean_modulus, Duration age, Cement cement) {
    return Modulus::from_si(detail::plain(
        bc_plain_concrete_modulus_at_age(mean_modulus.si(), age.si(), detail::code(cement))));
}

// The whole shrinkage of concrete, drying and autogenous, positive where it shortens.
inline Strain concrete_shrinkage(const ConcreteShrinkage &of) {
    return Strain::from_si(detail::plain(bc_plain_concrete_shrinkage(
        of.mean_strength.si(), of.relative_humidity_percent, of.notional_size.si(),
        of.age_at_drying.si(), of.age_at_end.si(), detail::code(of.cement))));
}

} // namespace beamcore

#endif // BEAMCORE_CONCRETE_HPP
