// Supports: where a member is held, and how.
#ifndef BEAMCORE_SUPPORT_HPP
#define BEAMCORE_SUPPORT_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

namespace beamcore {

// What a support holds.
enum class SupportKind : std::int32_t {
    pin = BC_SUPPORT_PIN,
    roller = BC_SUPPORT_ROLLER,
    fixed = BC_SUPPORT_FIXED,
};

// A layer that a support holds along the member by itself.
struct LayerHold {
    std::string layer;
    Length height;
};

// A support at a distance from the left end of the member, with a name that addresses its
// reactions. What it holds is rigid unless a spring is given for it; a fixed support holds the
// rotation of the section. Checked when used in a member.
class Support {
public:
    Support(const std::string &name, SupportKind kind, Length at)
        : handle_(detail::make<bc_support>(bc_support_free, [&](bc_support **out) {
              return bc_support_new(detail::c_text(name, "name"), detail::code(kind), at.si(),
                                    out);
          })) {}

    static Support pin(const std::string &name, Length at) {
        return Support(name, SupportKind::pin, at);
    }
    static Support roller(const std::string &name, Length at) {
        return Support(name, SupportKind::roller, at);
    }
    static Support fixed(const std::string &name, Length at) {
        return Support(name, SupportKind::fixed, at);
    }

    // The same support, holding the deflection by a spring instead of rigidly.
    Support spring(SpringStiffness stiffness) const {
        return made([&](bc_support **out) {
            return bc_support_with_spring(get(), stiffness.si(), out);
        });
    }

    // The same support with a spring along the axis: of a pin or a fixed support in place of its
    // rigid hold, of a roller in addition.
    Support axial_spring(SpringStiffness stiffness) const {
        return made([&](bc_support **out) {
            return bc_support_with_axial_spring(get(), stiffness.si(), out);
        });
    }

    // The same support with a spring against rotation: of a fixed support in place of its rigid
    // hold, of a pin or roller in addition.
    Support rotational_spring(RotationalStiffness stiffness) const {
        return made([&](bc_support **out) {
            return bc_support_with_rotational_spring(get(), stiffness.si(), out);
        });
    }

    // The same support, which can push up but not pull down: the member may lift off it.
    Support one_way() const {
        return made([&](bc_support **out) { return bc_support_one_way(get(), out); });
    }

    // The same support with its hold along the axis at a height of the section, on the first of the
    // layers that bear on it. Without it, all layers together are held at the elastic centroid of
    // the section at the left end.
    Support at_height(Length z) const {
        return made([&](bc_support **out) { return bc_support_at_height(get(), z.si(), out); });
    }

    // The same support as a bearing of the layers of these names only; without it, of all. Its hold
    // along the axis, if it has one, is then on the first of them.
    Support under(const std::vector<std::string> &layers) const {
        return made([&](bc_support **out) {
            const auto names = detail::c_texts(layers, "layer_names");
            return bc_support_under(get(), names.data(), detail::size(names.size()), out);
        });
    }

    // The same support, holding a layer along the member by itself, at a height of the section.
    Support holding(const std::string &layer, Length height) const {
        return made([&](bc_support **out) {
            return bc_support_holding(get(), detail::c_text(layer, "layer"), height.si(), out);
        });
    }

    std::string name() const { return detail::name(get(), bc_support_name); }

    SupportKind kind() const {
        return static_cast<SupportKind>(
            detail::count([&](std::int32_t *out) { return bc_support_kind(get(), out); }));
    }

    // Its distance from the left end of the member.
    Length at() const {
        return Length::from_si(
            detail::number([&](double *out) { return bc_support_place(get(), out); }));
    }

    // What was given, if it was.
    std::optional<SpringStiffness> given_spring() const {
        return given<SpringStiffness>(bc_support_spring);
    }
    std::optional<SpringStiffness> given_axial_spring() const {
        return given<SpringStiffness>(bc_support_axial_spring);
    }
    std::optional<RotationalStiffness> given_rotational_spring() const {
        return given<RotationalStiffness>(bc_support_rotational_spring);
    }
    std::optional<Length> given_height() const { return given<Length>(bc_support_height); }

    // Whether the member may lift off.
    bool is_one_way() const {
        return detail::count([&](std::int32_t *out) {
                   return bc_support_is_one_way(get(), out);
               }) != 0;
    }

    // The layers that bear on it; none means all.
    std::vector<std::string> layers() const {
        return detail::texts(get(), bc_support_layer_count, bc_support_layer_name);
    }

    // The layers that it holds along the member by themselves.
    std::vector<LayerHold> held_layers() const {
        std::vector<LayerHold> held;
        for (std::string &layer :
             detail::texts(get(), bc_support_held_layer_count, bc_support_held_layer_name)) {
            const std::int32_t index = detail::size(held.size());
            const double height = detail::number([&](double *out) {
                return bc_support_held_layer_height(get(), index, out);
            });
            held.push_back(LayerHold{std::move(layer), Length::from_si(height)});
        }
        return held;
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_support *get() const { return handle_.get(); }

private:
    explicit Support(detail::Shared<bc_support> handle) : handle_(std::move(handle)) {}

    template <class Call> static Support made(Call call) {
        return Support(detail::make<bc_support>(bc_support_free, call));
    }

    template <class Q, class Get> std::optional<Q> given(Get get_value) const {
        return detail::optional_of<Q>(
            [&](std::int32_t *has, double *out) { return get_value(get(), has, out); });
    }

    friend class Member;

    detail::Shared<bc_support> handle_;
};

} // namespace beamcore

#endif // BEAMCORE_SUPPORT_HPP
