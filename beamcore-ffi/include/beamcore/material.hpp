// Materials.
#ifndef BEAMCORE_MATERIAL_HPP
#define BEAMCORE_MATERIAL_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"
#include "strength.hpp"

namespace beamcore {

// The climate a timber member stands in (EN 1995-1-1:2004, 2.3.1.3).
enum class ServiceClass : std::int32_t { one = 1, two = 2, three = 3 };

// How fast the cement hardens.
enum class Cement : std::int32_t { s = BC_CEMENT_S, n = BC_CEMENT_N, r = BC_CEMENT_R };

// What the creep of a concrete depends on.
struct ConcreteCreep {
    // Mean compressive strength f_cm at 28 days.
    Stress mean_strength;
    // Relative humidity of the air in percent: 50 means 50 %.
    double relative_humidity_percent;
    // Notional size h0 = 2 A_c/u.
    Length notional_size;
    // Age at which the load comes on.
    Duration age_at_loading;
    // Age at which the creep is asked for.
    Duration age_at_end;
    Cement cement;
};

// Elastic values, density, creep and design strengths of one stuff.
class Material {
public:
    // A material by its values; creep_factor is 0 for none. Checked when used in a section.
    Material(const std::string &name, Modulus modulus, double creep_factor)
        : handle_(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
              return bc_material_new(detail::c_text(name, "name"), modulus.si(), creep_factor, out);
          })) {}

    explicit Material(detail::Shared<bc_material> handle) : handle_(std::move(handle)) {}

    // The same material under another name.
    Material named(const std::string &name) const {
        return changed([&](bc_material **out) {
            return bc_material_named(get(), detail::c_text(name, "name"), out);
        });
    }

    // The same material with a mean density, from which self-weight follows.
    Material density(Density density) const {
        return changed([&](bc_material **out) {
            return bc_material_with_density(get(), density.si(), out);
        });
    }

    // The same material with design strengths of timber: f_m,d, f_t,0,d and f_c,0,d.
    Material timber_strength(Stress bending, Stress tension, Stress compression) const {
        return changed([&](bc_material **out) {
            return bc_material_with_timber_strength(get(), bending.si(), tension.si(),
                                                    compression.si(), out);
        });
    }

    // The same material with the design yield strength f_y,d of a metal.
    Material metal_strength(Stress yield) const {
        return changed([&](bc_material **out) {
            return bc_material_with_metal_strength(get(), yield.si(), out);
        });
    }

    // The same material with a design shear strength, as f_v,d of timber.
    Material shear_strength(Stress shear) const {
        return with(bc_material_with_shear_strength, shear.si());
    }

    // The same material with characteristic strengths; stresses are compared with design
    // strengths only, which need design factors.
    Material characteristic_strength(const TimberStrength &s) const {
        const double m = s.bending.si(), t = s.tension.si(), c = s.compression.si();
        return changed([&](bc_material **out) {
            return s.across.has_value()
                       ? bc_material_with_characteristic_timber_across(
                             get(), m, t, c, s.shear.si(), s.across->tension.si(),
                             s.across->compression.si(), out)
                       : bc_material_with_characteristic_timber(get(), m, t, c, s.shear.si(), out);
        });
    }
    Material characteristic_strength(const MetalStrength &s) const {
        return changed([&](bc_material **out) {
            return s.ultimate.has_value()
                       ? bc_material_with_characteristic_metal_ultimate(get(), s.yield.si(),
                                                                        s.ultimate->si(), out)
                       : bc_material_with_characteristic_metal(get(), s.yield.si(), out);
        });
    }

    // The same material with the factors that make design strengths of the characteristic ones.
    Material design_factors(const TimberFactors &factors) const {
        return changed([&](bc_material **out) {
            return bc_material_with_timber_factors(get(), factors.k_mod, factors.gamma_m,
                                                   factors.k_h, factors.k_sys, out);
        });
    }
    Material design_factors(const MetalFactor &factor) const {
        return with(bc_material_with_metal_factor, factor.gamma_m);
    }

    // The same material with another mean modulus E, fractile E_05, shear modulus G, Poisson's
    // ratio (not for timber), fractile of the density rho_k, thermal expansion or creep factor.
    Material modulus_override(Modulus modulus) const {
        return with(bc_material_with_modulus, modulus.si());
    }
    Material fractile_modulus(Modulus modulus) const {
        return with(bc_material_with_fractile_modulus, modulus.si());
    }
    Material shear_modulus(Modulus modulus) const {
        return with(bc_material_with_shear_modulus, modulus.si());
    }
    Material poisson_ratio(double ratio) const {
        return with(bc_material_with_poisson_ratio, ratio);
    }
    Material fractile_density(Density density) const {
        return with(bc_material_with_fractile_density, density.si());
    }
    Material thermal_expansion(ThermalExpansion expansion) const {
        return with(bc_material_with_thermal_expansion, expansion.si());
    }
    Material creep_override(double creep_factor) const {
        return with(bc_material_with_creep_factor, creep_factor);
    }

    // A strength, if it is known.
    std::optional<Stress> strength(Strength strength) const {
        return known<Stress>([&](std::int32_t *has_value, double *out) {
            return bc_material_strength(get(), detail::code(strength), has_value, out);
        });
    }

    // The shear modulus at a time: G at first, G/(1 + creep factor) at the end; if it is known.
    std::optional<Modulus> shear_modulus_at(Time time) const {
        return known<Modulus>([&](std::int32_t *has_value, double *out) {
            return bc_material_shear_modulus(get(), detail::code(time), has_value, out);
        });
    }

    // The fractile E_05, Poisson's ratio, the mean density, its fractile rho_k and the thermal
    // expansion, if they are known.
    std::optional<Modulus> modulus_05() const {
        return value<Modulus>(bc_material_fractile_modulus);
    }
    std::optional<double> poisson() const {
        std::int32_t has_value = 0;
        double ratio = 0.0;
        detail::check(bc_material_poisson_ratio(get(), &has_value, &ratio));
        return has_value != 0 ? std::optional(ratio) : std::nullopt;
    }
    std::optional<Density> mean_density() const { return value<Density>(bc_material_density); }
    std::optional<Density> density_05() const {
        return value<Density>(bc_material_fractile_density);
    }
    std::optional<ThermalExpansion> expansion() const {
        return value<ThermalExpansion>(bc_material_thermal_expansion);
    }

    // The creep factor, 0 for no creep, and where it comes from.
    double creep_factor() const {
        return detail::number([&](double *out) { return bc_material_creep_factor(get(), out); });
    }
    std::string creep_basis() const { return detail::name(get(), bc_material_creep_basis); }

    // The standard, edition and class that the values come from; an empty text without a class.
    std::string origin() const { return detail::name(get(), bc_material_origin); }

    // The values of the class that were overridden, as in "density 450 kg/m3 instead of 420 kg/m3".
    std::vector<std::string> overrides() const {
        return detail::texts(get(), bc_material_override_count, bc_material_override);
    }

    // The modulus at a time: E at first, E/(1 + creep factor) at the end.
    Modulus modulus_at(Time time) const {
        return Modulus::from_si(detail::number([&](double *out) {
            return bc_material_modulus(get(), detail::code(time), out);
        }));
    }

    std::string name() const { return detail::name(get(), bc_material_name); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_material *get() const { return handle_.get(); }

private:
    template <class Call> static Material changed(Call call) {
        return Material(detail::make<bc_material>(bc_material_free, call));
    }

    // The same material changed by one number.
    template <class Call> Material with(Call call, double number) const {
        return changed([&](bc_material **out) { return call(get(), number, out); });
    }

    template <class Q, class Call> static std::optional<Q> known(Call call) {
        std::int32_t has_value = 0;
        double value = 0.0;
        detail::check(call(&has_value, &value));
        return has_value != 0 ? std::optional(Q::from_si(value)) : std::nullopt;
    }

    template <class Q, class Get> std::optional<Q> value(Get get_value) const {
        return known<Q>([&](std::int32_t *has_value, double *out) {
            return get_value(get(), has_value, out);
        });
    }

    detail::Shared<bc_material> handle_;
};

// Solid or glued laminated timber of a strength class ("C24", "GL28h").
inline Material timber(const std::string &class_name, ServiceClass service_class) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_timber(detail::c_text(class_name, "class_name"),
                                  detail::code(service_class), out);
    }));
}

// Structural steel of a class ("S275").
inline Material steel(const std::string &class_name) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_steel(detail::c_text(class_name, "class_name"), out);
    }));
}

// Structural steel of a class with the characteristic strengths of a nominal thickness.
inline Material steel_of_thickness(const std::string &class_name, Length thickness) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_steel_of_thickness(detail::c_text(class_name, "class_name"),
                                              thickness.si(), out);
    }));
}

// Aluminium of an alloy and temper ("EN AW-6082 T6") as an extruded profile of a thickness.
inline Material aluminium(const std::string &alloy_and_temper, Length thickness) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_aluminium(detail::c_text(alloy_and_temper, "class_name"),
                                     thickness.si(), out);
    }));
}

// Concrete of a class ("C30/37") with its creep factor phi as a number.
inline Material concrete(const std::string &class_name, double creep_factor) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_concrete(detail::c_text(class_name, "class_name"), creep_factor, out);
    }));
}

// Concrete of a class with its creep factor calculated.
inline Material concrete(const std::string &class_name, const ConcreteCreep &creep) {
    return Material(detail::make<bc_material>(bc_material_free, [&](bc_material **out) {
        return bc_material_concrete_with_creep(
            detail::c_text(class_name, "class_name"), creep.mean_strength.si(),
            creep.relative_humidity_percent, creep.notional_size.si(), creep.age_at_loading.si(),
            creep.age_at_end.si(), detail::code(creep.cement), out);
    }));
}

} // namespace beamcore

#endif // BEAMCORE_MATERIAL_HPP
