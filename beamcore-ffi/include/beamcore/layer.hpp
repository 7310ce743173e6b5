// Layers and joints of sections.
#ifndef BEAMCORE_LAYER_HPP
#define BEAMCORE_LAYER_HPP

#include "part.hpp"

#include <optional>
#include <variant>

namespace beamcore {

// A stretch along the member, from its left end.
struct Stretch {
    Length from;
    Length to;
};

// The parts that act as one piece, without slip between them.
class Layer {
public:
    // A layer over the whole length of the member, of the parts of these names. Checked when used
    // in a section.
    Layer(const std::string &name, const std::vector<std::string> &parts)
        : handle_(detail::make<bc_layer>(bc_layer_free, [&](bc_layer **out) {
              const auto names = detail::c_texts(parts, "part_names");
              return bc_layer_new(detail::c_text(name, "name"), names.data(),
                                  detail::size(names.size()), out);
          })) {}

    // The same layer, there only from one place along the member to another.
    Layer between(Length from, Length to) const {
        return Layer(detail::make<bc_layer>(bc_layer_free, [&](bc_layer **out) {
            return bc_layer_between(get(), from.si(), to.si(), out);
        }));
    }

    std::string name() const { return detail::name(get(), bc_layer_name); }

    // The names of the parts.
    std::vector<std::string> parts() const {
        return detail::texts(get(), bc_layer_part_count, bc_layer_part_name);
    }

    // From where to where it is there; nothing for the whole length.
    std::optional<Stretch> extent() const {
        std::int32_t has_value = 0;
        double from = 0.0, to = 0.0;
        detail::check(bc_layer_extent(get(), &has_value, &from, &to));
        return has_value != 0
                   ? std::optional(Stretch{Length::from_si(from), Length::from_si(to)})
                   : std::nullopt;
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_layer *get() const { return handle_.get(); }

private:
    explicit Layer(detail::Shared<bc_layer> handle) : handle_(std::move(handle)) {}

    friend class Section;

    detail::Shared<bc_layer> handle_;
};

// How a joint holds its two layers along the member.
enum class JointKind : std::int32_t {
    // Without slip: the two layers are one piece.
    rigid = BC_JOINT_RIGID,
    // With slip in proportion to the flow.
    slipping = BC_JOINT_SLIPPING,
    // Not at all: the layers share their deflection only.
    loose = BC_JOINT_LOOSE,
};

// A length of the member with one spacing of fasteners.
struct Band {
    Length from;
    Length to;
    Length spacing;
};

// The spacing of fasteners along a row: the same all along, or one in each band, with no fasteners
// outside of the bands.
using Spacing = std::variant<Length, std::vector<Band>>;

// Fasteners in rows along the member: k = rows planes stiffness/spacing.
struct Fasteners {
    // The slip modulus K of one fastener in one shear plane.
    FastenerStiffness stiffness;
    std::int32_t rows;
    std::int32_t planes;
    Spacing spacing;
};

// A soft layer of glue: k = G width/thickness.
struct Glue {
    Modulus shear_modulus;
    // Of the glue line, across the member.
    Length width;
    Length thickness;
};

// What holds two layers, given by their names, together along the member. The slip of a joint is
// the displacement along x of its upper layer minus that of its lower one; of layers side by side
// either may be called the upper one, which only fixes that sign. Checked when used in a section.
class Joint {
public:
    // A joint without slip.
    static Joint rigid(const std::string &name, const std::string &lower,
                       const std::string &upper) {
        return made([&](bc_joint **out) {
            const Names names(name, lower, upper);
            return bc_joint_rigid(names.name, names.lower, names.upper, out);
        });
    }

    // A joint in which the layers slip freely.
    static Joint loose(const std::string &name, const std::string &lower,
                       const std::string &upper) {
        return made([&](bc_joint **out) {
            const Names names(name, lower, upper);
            return bc_joint_loose(names.name, names.lower, names.upper, out);
        });
    }

    // A joint that slips in proportion to the flow, with its slip modulus k.
    static Joint slipping(const std::string &name, const std::string &lower,
                          const std::string &upper, SlipModulus modulus) {
        return made([&](bc_joint **out) {
            const Names names(name, lower, upper);
            return bc_joint_slipping(names.name, names.lower, names.upper, modulus.si(), out);
        });
    }

    // A joint of fasteners.
    static Joint slipping(const std::string &name, const std::string &lower,
                          const std::string &upper, const Fasteners &fasteners) {
        return made([&](bc_joint **out) {
            const Names names(name, lower, upper);
            const double stiffness = fasteners.stiffness.si();
            if (const Length *spacing = std::get_if<Length>(&fasteners.spacing)) {
                return bc_joint_of_fasteners(names.name, names.lower, names.upper, stiffness,
                                             fasteners.rows, fasteners.planes, spacing->si(), out);
            }
            std::vector<double> from, to, spacing;
            for (const Band &band : std::get<std::vector<Band>>(fasteners.spacing)) {
                from.push_back(band.from.si());
                to.push_back(band.to.si());
                spacing.push_back(band.spacing.si());
            }
            return bc_joint_of_fasteners_in_bands(
                names.name, names.lower, names.upper, stiffness, fasteners.rows, fasteners.planes,
                from.data(), to.data(), spacing.data(), detail::size(spacing.size()), out);
        });
    }

    // A joint of glue.
    static Joint slipping(const std::string &name, const std::string &lower,
                          const std::string &upper, const Glue &glue) {
        return made([&](bc_joint **out) {
            const Names names(name, lower, upper);
            return bc_joint_of_glue(names.name, names.lower, names.upper, glue.shear_modulus.si(),
                                    glue.width.si(), glue.thickness.si(), out);
        });
    }

    // The same joint across a gap, which must be stated where the layers do not touch.
    Joint gap(Length gap) const {
        return made([&](bc_joint **out) { return bc_joint_with_gap(get(), gap.si(), out); });
    }

    // The same joint with a modulus square to the member: the two layers then have a deflection
    // each.
    Joint transverse(SlipModulus modulus) const {
        return made(
            [&](bc_joint **out) { return bc_joint_with_transverse(get(), modulus.si(), out); });
    }

    // The same slipping joint with a clearance: it carries nothing until the slip, in either sense,
    // has used it up.
    Joint clearance(Length clearance) const {
        return made(
            [&](bc_joint **out) { return bc_joint_with_clearance(get(), clearance.si(), out); });
    }

    // The same joint with a creep factor of its own. Without it, the factor follows from wood-based
    // layers; beside any other material it must be given.
    Joint creep(double factor) const {
        return made(
            [&](bc_joint **out) { return bc_joint_with_creep_factor(get(), factor, out); });
    }

    std::string name() const { return detail::name(get(), bc_joint_name); }
    // The name of the lower layer.
    std::string lower() const { return detail::name(get(), bc_joint_lower); }
    // The name of the upper layer.
    std::string upper() const { return detail::name(get(), bc_joint_upper); }

    JointKind kind() const {
        return static_cast<JointKind>(
            detail::count([&](std::int32_t *out) { return bc_joint_kind(get(), out); }));
    }

    // What was given, if it was.
    std::optional<Length> stated_gap() const { return given<Length>(bc_joint_gap); }
    std::optional<SlipModulus> transverse_modulus() const {
        return given<SlipModulus>(bc_joint_transverse);
    }
    std::optional<Length> given_clearance() const { return given<Length>(bc_joint_clearance); }
    std::optional<double> given_creep() const {
        return detail::optional(
            [&](std::int32_t *has, double *out) { return bc_joint_creep_factor(get(), has, out); });
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_joint *get() const { return handle_.get(); }

private:
    // The three names as the C ABI takes them.
    struct Names {
        Names(const std::string &name, const std::string &lower, const std::string &upper)
            : name(detail::c_text(name, "name")), lower(detail::c_text(lower, "lower")),
              upper(detail::c_text(upper, "upper")) {}
        const char *name;
        const char *lower;
        const char *upper;
    };

    explicit Joint(detail::Shared<bc_joint> handle) : handle_(std::move(handle)) {}

    template <class Call> static Joint made(Call call) {
        return Joint(detail::make<bc_joint>(bc_joint_free, call));
    }

    template <class Q, class Get> std::optional<Q> given(Get get_value) const {
        return detail::optional_of<Q>(
            [&](std::int32_t *has, double *out) { return get_value(get(), has, out); });
    }

    friend class Section;

    detail::Shared<bc_joint> handle_;
};

} // namespace beamcore

#endif // BEAMCORE_LAYER_HPP
