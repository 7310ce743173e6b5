// Sections.
#ifndef BEAMCORE_SECTION_HPP
#define BEAMCORE_SECTION_HPP

#include "layer.hpp"
#include "part.hpp"

#include <initializer_list>
#include <optional>

namespace beamcore {

// EA, the elastic centroid, and EI about the axes through it: yy about the horizontal one, zz
// about the upright one, yz the mixed term.
struct Stiffness {
    AxialStiffness axial;
    Length centroid_y;
    Length centroid_z;
    BendingStiffness bending_yy;
    BendingStiffness bending_zz;
    BendingStiffness bending_yz;
};

// The modulus of a part and its share in EI_yy.
struct PartShare {
    Modulus modulus;
    double share;
};

// The edges of a part at its place, and its area.
struct PartEdges {
    Length left;
    Length right;
    Length bottom;
    Length top;
    Area area;
};

// The principal bending stiffnesses.
struct Principal {
    BendingStiffness greater;
    BendingStiffness smaller;
    // From the level axis to the axis of the greater one, positive from y towards z.
    Angle angle;
};

// Forces on a section.
struct SectionForces {
    // Tension positive.
    Force axial;
    // About the level axis, positive where it stretches the bottom.
    Moment moment_y;
    // About the upright axis, positive where it stretches the side of negative y.
    Moment moment_z;
};

// Whether a section may move sideways.
enum class Sideways : std::int32_t {
    // Held, as by a floor: it bends about the level axis only.
    held = BC_SIDEWAYS_HELD,
    // Free: it also bends about the upright axis where it has no axis of symmetry.
    free = BC_SIDEWAYS_FREE,
};

// A stress at a point of a section, tension positive.
struct PointStress {
    Stress value;
    Point at;
};

// The algebraically greatest and least stress in a part.
struct StressRange {
    PointStress greatest;
    PointStress least;
};

// A plane of strain.
struct StrainPlane {
    // At the elastic centroid.
    Strain axial;
    // About the level axis, positive where the bottom grows longer than the top.
    Curvature curvature_y;
    // About the upright axis, positive where the side of negative y grows longer.
    Curvature curvature_z;
};

class PlacedJoint;
class TransformedSection;

// Parts in layers with joints between them, each at its place.
class Section {
public:
    // A section of parts, joined rigidly as one layer; all that is wrong with them is reported at
    // once.
    Section(std::initializer_list<Part> parts) : Section(std::vector<Part>(parts)) {}
    explicit Section(const std::vector<Part> &parts)
        : handle_(detail::make<bc_section>(bc_section_free, [&](bc_section **out) {
              const auto handles = detail::handles<bc_part>(parts);
              return bc_section_new(handles.data(), detail::size(handles.size()), out);
          })) {}

    // A section of parts in layers, with joints between the layers.
    static Section layered(const std::vector<Part> &parts, const std::vector<Layer> &layers,
                           const std::vector<Joint> &joints);

    // The section at a share of the way from this one (0) to a like one (1), as along a taper.
    Section between(const Section &other, double share) const {
        return Section(detail::make<bc_section>(bc_section_free, [&](bc_section **out) {
            return bc_section_between(get(), other.get(), share, out);
        }));
    }

    // The layers and joints as given; of a section without layers, one named "section".
    std::vector<Layer> layers() const;
    std::vector<Joint> joints() const;
    // The joint of a name, at its place.
    PlacedJoint joint(const std::string &name) const;
    // The names of the layers, those together that rigid joints hold together.
    std::vector<std::vector<std::string>> merged_layers() const;

    // The shear stiffness kGA of parts that are glued over their whole height, as one layer; see
    // shear_stiffness_definition().
    ShearStiffness shear_stiffness(Time time) const {
        return ShearStiffness::from_si(detail::number([&](double *out) {
            return bc_section_shear_stiffness(get(), detail::code(time), out);
        }));
    }
    // The same of parts that stand side by side and are only fastened to each other.
    ShearStiffness fastened_shear_stiffness(Time time) const {
        return ShearStiffness::from_si(detail::number([&](double *out) {
            return bc_section_fastened_shear_stiffness(get(), detail::code(time), out);
        }));
    }

    // The stiffness at a time.
    Stiffness stiffness(Time time) const {
        const std::int32_t at = detail::code(time);
        double ea = 0.0, y = 0.0, z = 0.0, yy = 0.0, zz = 0.0, yz = 0.0;
        detail::check(bc_section_axial_stiffness(get(), at, &ea));
        detail::check(bc_section_centroid(get(), at, &y, &z));
        detail::check(bc_section_bending_stiffness(get(), at, &yy, &zz, &yz));
        return Stiffness{AxialStiffness::from_si(ea),   Length::from_si(y),
                         Length::from_si(z),            BendingStiffness::from_si(yy),
                         BendingStiffness::from_si(zz), BendingStiffness::from_si(yz)};
    }

    // The principal bending stiffnesses at a time.
    Principal principal(Time time) const {
        double greater = 0.0, smaller = 0.0, angle = 0.0;
        detail::check(
            bc_section_principal(get(), detail::code(time), &greater, &smaller, &angle));
        return Principal{BendingStiffness::from_si(greater), BendingStiffness::from_si(smaller),
                         Angle::from_si(angle)};
    }

    // The stress in a part at a point of it under section forces.
    Stress stress_at(const std::string &part, Point point, const SectionForces &forces,
                     Sideways sideways, Time time) const {
        return Stress::from_si(detail::number([&](double *out) {
            return bc_section_stress_at(get(), detail::code(time), detail::code(sideways),
                                        detail::c_text(part, "part"), point.y.si(), point.z.si(),
                                        forces.axial.si(), forces.moment_y.si(),
                                        forces.moment_z.si(), out);
        }));
    }

    // The greatest and the least stress in a part under section forces, with their points.
    StressRange stress_extremes(const std::string &part, const SectionForces &forces,
                                Sideways sideways, Time time) const {
        const auto extreme = [&](std::int32_t sign) {
            double value = 0.0, y = 0.0, z = 0.0;
            detail::check(bc_section_stress_extreme(
                get(), detail::code(time), detail::code(sideways), detail::c_text(part, "part"),
                forces.axial.si(), forces.moment_y.si(), forces.moment_z.si(), sign, &value, &y,
                &z));
            return PointStress{Stress::from_si(value), {Length::from_si(y), Length::from_si(z)}};
        };
        return StressRange{extreme(BC_STRESS_TENSION), extreme(BC_STRESS_COMPRESSION)};
    }

    // The modulus of a part at a time and its share in EI_yy.
    PartShare part_share(Time time, const std::string &part) const {
        double modulus = 0.0, share = 0.0;
        detail::check(bc_section_part_share(get(), detail::code(time),
                                            detail::c_text(part, "part"), &modulus, &share));
        return PartShare{Modulus::from_si(modulus), share};
    }

    // The edges of a part at its place, and its area.
    PartEdges part_edges(const std::string &part) const {
        double left = 0.0, right = 0.0, bottom = 0.0, top = 0.0, area = 0.0;
        detail::check(bc_section_part_edges(get(), detail::c_text(part, "part"), &left, &right,
                                            &bottom, &top, &area));
        return PartEdges{Length::from_si(left), Length::from_si(right), Length::from_si(bottom),
                         Length::from_si(top), Area::from_si(area)};
    }

    // The initial strain that a part bears; of a mirror image it is mirrored too.
    InitialStrain initial_strain(const std::string &part) const {
        double axial = 0.0, y = 0.0, z = 0.0;
        detail::check(bc_section_part_initial_strain(get(), detail::c_text(part, "part"), &axial,
                                                     &y, &z));
        return InitialStrain{Strain::from_si(axial), Curvature::from_si(y), Curvature::from_si(z)};
    }

    // The plane of strain that the section takes freely under the initial strains of its parts.
    StrainPlane free_plane(Time time, Sideways sideways) const {
        double axial = 0.0, y = 0.0, z = 0.0;
        detail::check(bc_section_free_plane(get(), detail::code(time), detail::code(sideways),
                                            &axial, &y, &z));
        return StrainPlane{Strain::from_si(axial), Curvature::from_si(y), Curvature::from_si(z)};
    }

    // Mass per length; nothing where a part has no density.
    std::optional<LineMass> line_mass() const {
        std::int32_t has_value = 0;
        double mass = 0.0;
        detail::check(bc_section_line_mass(get(), &has_value, &mass));
        return has_value != 0 ? std::optional(LineMass::from_si(mass)) : std::nullopt;
    }

    // The section at a time as if made of one of its materials; presentation only.
    TransformedSection transformed_to(const std::string &material, Time time) const;

    // What an engineer should know of this section, for example that parts do not touch.
    std::vector<std::string> notes() const {
        return detail::texts(get(), bc_section_note_count, bc_section_note);
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_section *get() const { return handle_.get(); }

private:
    explicit Section(detail::Shared<bc_section> handle) : handle_(std::move(handle)) {}

    friend class Member;

    detail::Shared<bc_section> handle_;
};

} // namespace beamcore

#include "layered.hpp"

#include "transformed.hpp"

#endif // BEAMCORE_SECTION_HPP
