// What a member tells of its sections, supports, hinges, anchors, shear and pitch.
#ifndef BEAMCORE_MEMBER_SHAPE_HPP
#define BEAMCORE_MEMBER_SHAPE_HPP

#include "member.hpp"

namespace beamcore {

inline Section Member::section_at(Length at) const {
    return Section(detail::make<bc_section>(bc_section_free, [&](bc_section **out) {
        return bc_member_section_at(get(), at.si(), out);
    }));
}

inline std::vector<std::string> Member::parts() const {
    return detail::texts(get(), bc_member_part_count, bc_member_part_name);
}

inline std::vector<Support> Member::supports() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_member_support_count(get(), out); });
    std::vector<Support> supports;
    for (std::int32_t index = 0; index < count; ++index) {
        supports.push_back(
            Support(detail::make<bc_support>(bc_support_free, [&](bc_support **out) {
                return bc_member_support(get(), index, out);
            })));
    }
    return supports;
}

inline std::vector<SectionChange> Member::changes() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_member_change_count(get(), out); });
    std::vector<SectionChange> changes;
    for (std::int32_t index = 0; index < count; ++index) {
        std::int32_t kind = 0;
        double from = 0.0, to = 0.0;
        detail::check(bc_member_change(get(), index, &kind, &from, &to));
        changes.push_back(SectionChange{static_cast<ChangeKind>(kind), Length::from_si(from),
                                        Length::from_si(to)});
    }
    return changes;
}

inline std::vector<Hinge> Member::hinges() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_member_hinge_count(get(), out); });
    std::vector<Hinge> hinges;
    for (std::int32_t index = 0; index < count; ++index) {
        std::int32_t kind = 0;
        double at = 0.0;
        detail::check(bc_member_hinge(get(), index, &kind, &at));
        std::optional<std::string> layer = detail::optional_text(
            [&](std::int32_t *has, char *buffer, std::int64_t capacity, std::int64_t *length) {
                return bc_member_hinge_layer(get(), index, has, buffer, capacity, length);
            });
        hinges.push_back(
            Hinge{static_cast<HingeKind>(kind), Length::from_si(at), std::move(layer)});
    }
    return hinges;
}

inline std::vector<Anchor> Member::anchors() const {
    const std::vector<std::string> joints =
        detail::texts(get(), bc_member_anchor_count, bc_member_anchor_joint);
    std::vector<Anchor> anchors;
    for (std::string &name : detail::texts(get(), bc_member_anchor_count, bc_member_anchor_name)) {
        const std::size_t index = anchors.size();
        double at = 0.0;
        const auto stiffness = detail::optional_of<FastenerStiffness>(
            [&](std::int32_t *has, double *out) {
                return bc_member_anchor(get(), detail::size(index), &at, has, out);
            });
        anchors.push_back(
            Anchor{std::move(name), joints[index], Length::from_si(at), stiffness});
    }
    return anchors;
}

inline bool Member::has_deflections_of_layers() const {
    return detail::count([&](std::int32_t *out) {
               return bc_member_has_deflections_of_layers(get(), out);
           }) != 0;
}

inline bool Member::has_axial_force() const {
    return detail::count([&](std::int32_t *out) {
               return bc_member_has_axial_force(get(), out);
           }) != 0;
}

inline std::string Member::entered_layer() const {
    return detail::name(get(), bc_member_entered_layer);
}

inline ShearModel Member::shear_model() const {
    const std::int32_t number =
        detail::count([&](std::int32_t *out) { return bc_member_shear(get(), out); });
    return ShearModel(number, detail::optional_of<ShearStiffness>(
                                  [&](std::int32_t *has, double *out) {
                                      return bc_member_given_shear(get(), has, out);
                                  }));
}

inline std::optional<Angle> Member::pitch() const {
    return detail::optional_of<Angle>(
        [&](std::int32_t *has, double *out) { return bc_member_pitch(get(), has, out); });
}

} // namespace beamcore

#endif // BEAMCORE_MEMBER_SHAPE_HPP
