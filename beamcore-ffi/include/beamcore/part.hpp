// Parts of sections.
#ifndef BEAMCORE_PART_HPP
#define BEAMCORE_PART_HPP

#include "material.hpp"
#include "outline.hpp"

namespace beamcore {

// An axis of a section about which a part is mirrored.
enum class MirrorAxis : std::int32_t {
    // The upright axis y = 0: left and right change.
    upright = BC_MIRROR_UPRIGHT,
    // The level axis z = 0: top and bottom change.
    level = BC_MIRROR_LEVEL,
};

// The plane of strain that a part bears from the first day, about its own centroid (y_i, z_i):
// axial - curvature_y (z - z_i) - curvature_z (y - y_i), positive where the part alone would grow
// longer.
struct InitialStrain {
    // At the part's own centroid; shrinkage is negative.
    Strain axial = Strain::from_si(0.0);
    // About the level axis, positive where the bottom would grow longer than the top.
    Curvature curvature_y = Curvature::from_si(0.0);
    // About the upright axis, positive where the side of negative y would grow longer.
    Curvature curvature_z = Curvature::from_si(0.0);
};

// One piece of one material, with a name that addresses its results.
class Part {
public:
    // A part with the point by which its outline is placed at y = 0, z = 0. Checked when used in a
    // section.
    Part(const std::string &name, const Outline &outline, const Material &material)
        : handle_(detail::make<bc_part>(bc_part_free, [&](bc_part **out) {
              return bc_part_new(detail::c_text(name, "name"), outline.get(), material.get(), out);
          })) {}

    // The same part with the point by which its outline is placed at (y, z).
    Part at(Length y, Length z) const {
        return changed([&](bc_part **out) { return bc_part_at(get(), y.si(), z.si(), out); });
    }

    // The same part touching another one, given by itself or by its name.
    Part left_of(const std::string &other) const { return beside(BC_PLACE_LEFT_OF, other); }
    Part left_of(const Part &other) const { return left_of(other.name()); }
    Part right_of(const std::string &other) const { return beside(BC_PLACE_RIGHT_OF, other); }
    Part right_of(const Part &other) const { return right_of(other.name()); }
    Part above(const std::string &other) const { return beside(BC_PLACE_ABOVE, other); }
    Part above(const Part &other) const { return above(other.name()); }
    Part below(const std::string &other) const { return beside(BC_PLACE_BELOW, other); }
    Part below(const Part &other) const { return below(other.name()); }

    // The same part as the mirror image of another one, given by itself or by its name, about an
    // axis: at the mirrored place, with its own outline mirrored.
    Part mirror_of(const std::string &other, MirrorAxis axis) const {
        return changed([&](bc_part **out) {
            return bc_part_mirror_of(get(), detail::c_text(other, "other_name"),
                                     detail::code(axis), out);
        });
    }
    Part mirror_of(const Part &other, MirrorAxis axis) const {
        return mirror_of(other.name(), axis);
    }

    // The same part set into another one, its host, at (y, z): it displaces the host exactly.
    Part set_into(const std::string &host, Length y, Length z) const {
        return changed([&](bc_part **out) {
            return bc_part_set_into(get(), detail::c_text(host, "host_name"), y.si(), z.si(), out);
        });
    }
    Part set_into(const Part &host, Length y, Length z) const {
        return set_into(host.name(), y, z);
    }

    // The same part with a mass per length of its own, instead of density x area.
    Part line_mass(LineMass mass) const {
        return changed(
            [&](bc_part **out) { return bc_part_with_line_mass(get(), mass.si(), out); });
    }

    // The same part with an initial strain from the first day, which makes the section bend and its
    // parts press on each other.
    Part initial_strain(const InitialStrain &strain) const {
        return changed([&](bc_part **out) {
            return bc_part_with_initial_strain(get(), strain.axial.si(), strain.curvature_y.si(),
                                               strain.curvature_z.si(), out);
        });
    }

    std::string name() const { return detail::name(get(), bc_part_name); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_part *get() const { return handle_.get(); }

private:
    explicit Part(detail::Shared<bc_part> handle) : handle_(std::move(handle)) {}

    template <class Call> static Part changed(Call call) {
        return Part(detail::make<bc_part>(bc_part_free, call));
    }

    Part beside(std::int32_t place, const std::string &other) const {
        return changed([&](bc_part **out) {
            return bc_part_beside(get(), place, detail::c_text(other, "other_name"), out);
        });
    }

    detail::Shared<bc_part> handle_;
};

} // namespace beamcore

#endif // BEAMCORE_PART_HPP
