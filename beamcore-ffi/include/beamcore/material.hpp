// Materials.
#ifndef BEAMCORE_MATERIAL_HPP
#define BEAMCORE_MATERIAL_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

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
