// Parts and sections.
#ifndef BEAMCORE_SECTION_HPP
#define BEAMCORE_SECTION_HPP

#include "material.hpp"

#include <initializer_list>
#include <optional>

namespace beamcore {

// The outline of a part: width along y, height along z.
struct Outline {
    Length width;
    Length height;
};

// A rectangle of the given width and height.
constexpr Outline rectangle(Length width, Length height) { return Outline{width, height}; }

// One piece of one material, with a name that addresses its results.
class Part {
public:
    // A part with the middle of its outline at y = 0, z = 0. Checked when used in a section.
    Part(const std::string &name, Outline outline, const Material &material)
        : handle_(detail::make<bc_part>(bc_part_free, [&](bc_part **out) {
              return bc_part_rectangle(detail::c_text(name, "name"), outline.width.si(),
                                       outline.height.si(), material.get(), out);
          })) {}

    // The same part with the middle of its outline at (y, z).
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

class TransformedSection;

// Parts joined rigidly, each at its place.
class Section {
public:
    // A section of parts; all that is wrong with them is reported at once.
    Section(std::initializer_list<Part> parts) : Section(std::vector<Part>(parts)) {}
    explicit Section(const std::vector<Part> &parts)
        : handle_(detail::make<bc_section>(bc_section_free, [&](bc_section **out) {
              std::vector<const bc_part *> handles;
              for (const Part &part : parts) {
                  handles.push_back(part.get());
              }
              return bc_section_new(handles.data(), detail::size(handles.size()), out);
          })) {}

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
    detail::Shared<bc_section> handle_;
};

} // namespace beamcore

#include "transformed.hpp"

#endif // BEAMCORE_SECTION_HPP
