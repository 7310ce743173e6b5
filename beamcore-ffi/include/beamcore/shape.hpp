// What a member is made of along its length: changes of section, hinges, anchors, shear.
#ifndef BEAMCORE_SHAPE_HPP
#define BEAMCORE_SHAPE_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

namespace beamcore {

// How the section of a member changes.
enum class ChangeKind : std::int32_t {
    step = BC_CHANGE_STEP,
    taper = BC_CHANGE_TAPER,
};

// A change of the section along a member; a step begins and ends at one place.
struct SectionChange {
    ChangeKind kind;
    Length from;
    Length to;
};

// What a hinge releases.
enum class HingeKind : std::int32_t {
    moment = BC_HINGE_MOMENT,
    shear = BC_HINGE_SHEAR,
    butt = BC_HINGE_BUTT,
};

// An internal hinge of a member.
struct Hinge {
    HingeKind kind;
    Length at;
    // The layer that it is in; nothing where it goes through all.
    std::optional<std::string> layer;

    // A hinge through all layers: no moment passes.
    static Hinge moment(Length at) { return Hinge{HingeKind::moment, at, std::nullopt}; }
    // A hinge in one layer, which must have a deflection of its own.
    static Hinge moment_of(std::string layer, Length at) {
        return Hinge{HingeKind::moment, at, std::move(layer)};
    }
    // A shear release: no shear force passes.
    static Hinge shear(Length at) { return Hinge{HingeKind::shear, at, std::nullopt}; }
    // A butt joint of one layer: no axial force of it passes.
    static Hinge butt(std::string layer, Length at) {
        return Hinge{HingeKind::butt, at, std::move(layer)};
    }
};

// What stops the slip of a joint at a place, as an end plate or a notch does.
struct Anchor {
    // The name by which its force is asked for.
    std::string name;
    std::string joint;
    Length at;
    // Force per slip; nothing where it lets no slip at all.
    std::optional<FastenerStiffness> stiffness = std::nullopt;
};

// How the shear deformation of a member is taken.
class ShearModel {
public:
    // Left out.
    static ShearModel rigid() { return ShearModel(BC_SHEAR_RIGID); }
    // With kGA of each section, from the energy of its shear stress.
    static ShearModel flexible() { return ShearModel(BC_SHEAR_FLEXIBLE); }
    // With the kGA that is given, the same all along the member and its life.
    static ShearModel given(ShearStiffness stiffness) {
        return ShearModel(BC_SHEAR_GIVEN, stiffness);
    }

    bool is_rigid() const { return number_ == BC_SHEAR_RIGID; }
    bool is_flexible() const { return number_ == BC_SHEAR_FLEXIBLE; }
    // The kGA that is given, if it is.
    std::optional<ShearStiffness> stiffness() const { return stiffness_; }

private:
    explicit ShearModel(std::int32_t number,
                        std::optional<ShearStiffness> stiffness = std::nullopt)
        : number_(number), stiffness_(stiffness) {}

    friend class Member;

    std::int32_t number_;
    std::optional<ShearStiffness> stiffness_;
};

} // namespace beamcore

#endif // BEAMCORE_SHAPE_HPP
