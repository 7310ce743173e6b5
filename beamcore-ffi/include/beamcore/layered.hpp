// What a section says of its layers and joints.
#ifndef BEAMCORE_LAYERED_HPP
#define BEAMCORE_LAYERED_HPP

#include "section.hpp"

namespace beamcore {

// A joint at its place in a section.
class PlacedJoint {
public:
    PlacedJoint(detail::Shared<bc_section> section, const std::string &joint)
        : section_(std::move(section)), joint_(joint) {
        // Whether there is such a joint is said here, where it is named.
        detail::c_text(joint, "joint");
        place();
    }

    // The clear distance of the two layers; zero where they touch.
    Length distance() const { return Length::from_si(place().distance); }
    // The z of the middle of the contact or of the gap.
    Length z() const { return Length::from_si(place().z); }
    // The length of the contact line in the section, or of what faces across the gap.
    Length width() const { return Length::from_si(place().width); }

    // The creep factor: at the end the moduli are divided by (1 + factor).
    double creep() const {
        return detail::number([&](double *out) {
            return bc_section_joint_creep_factor(section_.get(), joint_.c_str(), out);
        });
    }

    // Where the creep factor comes from.
    std::string creep_basis() const {
        return detail::text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return bc_section_joint_creep_basis(section_.get(), joint_.c_str(), buffer, capacity,
                                                length);
        });
    }

    // The clearance; zero unless it was given.
    Length clearance() const {
        return Length::from_si(detail::number([&](double *out) {
            return bc_section_joint_clearance(section_.get(), joint_.c_str(), out);
        }));
    }

    // The slip modulus at a place along the member: k on the first day, k/(1 + creep factor) at the
    // end; zero where there is nothing to slip on. Nothing of a rigid joint.
    std::optional<SlipModulus> slip_modulus_at(Length at, Time time) const {
        return modulus(bc_section_joint_slip_modulus, at, time);
    }

    // The modulus square to the member at a place along it; nothing where the two layers share
    // their deflection.
    std::optional<SlipModulus> transverse_modulus_at(Length at, Time time) const {
        return modulus(bc_section_joint_transverse_modulus, at, time);
    }

    // Where along the member a modulus of the joint changes, from left to right.
    std::vector<Length> places() const {
        const std::int32_t count = detail::count([&](std::int32_t *out) {
            return bc_section_joint_station_count(section_.get(), joint_.c_str(), out);
        });
        std::vector<Length> places;
        for (std::int32_t index = 0; index < count; ++index) {
            places.push_back(Length::from_si(detail::number([&](double *out) {
                return bc_section_joint_station(section_.get(), joint_.c_str(), index, out);
            })));
        }
        return places;
    }

private:
    struct Place {
        double distance;
        double z;
        double width;
    };

    Place place() const {
        Place place{0.0, 0.0, 0.0};
        detail::check(bc_section_joint_place(section_.get(), joint_.c_str(), &place.distance,
                                             &place.z, &place.width));
        return place;
    }

    template <class Get>
    std::optional<SlipModulus> modulus(Get get, Length at, Time time) const {
        return detail::optional_of<SlipModulus>([&](std::int32_t *has, double *out) {
            return get(section_.get(), joint_.c_str(), at.si(), detail::code(time), has, out);
        });
    }

    detail::Shared<bc_section> section_;
    std::string joint_;
};

inline PlacedJoint Section::joint(const std::string &name) const {
    return PlacedJoint(handle_, name);
}

inline std::vector<Layer> Section::layers() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_section_layer_count(get(), out); });
    std::vector<Layer> layers;
    for (std::int32_t index = 0; index < count; ++index) {
        layers.push_back(Layer(detail::make<bc_layer>(bc_layer_free, [&](bc_layer **out) {
            return bc_section_layer(get(), index, out);
        })));
    }
    return layers;
}

inline std::vector<Joint> Section::joints() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_section_joint_count(get(), out); });
    std::vector<Joint> joints;
    for (std::int32_t index = 0; index < count; ++index) {
        joints.push_back(Joint(detail::make<bc_joint>(bc_joint_free, [&](bc_joint **out) {
            return bc_section_joint(get(), index, out);
        })));
    }
    return joints;
}

inline std::vector<std::vector<std::string>> Section::merged_layers() const {
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_section_merged_layer_count(get(), out); });
    std::vector<std::vector<std::string>> merged;
    for (std::int32_t index = 0; index < count; ++index) {
        merged.push_back(detail::texts(
            get(),
            [&](const bc_section *section, std::int32_t *out) {
                return bc_section_merged_layer_size(section, index, out);
            },
            [&](const bc_section *section, std::int32_t layer, char *buffer, std::int64_t capacity,
                std::int64_t *length) {
                return bc_section_merged_layer_name(section, index, layer, buffer, capacity,
                                                    length);
            }));
    }
    return merged;
}

inline Section Section::layered(const std::vector<Part> &parts, const std::vector<Layer> &layers,
                                const std::vector<Joint> &joints) {
    return Section(detail::make<bc_section>(bc_section_free, [&](bc_section **out) {
        const auto part_handles = detail::handles<bc_part>(parts);
        const auto layer_handles = detail::handles<bc_layer>(layers);
        const auto joint_handles = detail::handles<bc_joint>(joints);
        return bc_section_layered(part_handles.data(), detail::size(part_handles.size()),
                                  layer_handles.data(), detail::size(layer_handles.size()),
                                  joint_handles.data(), detail::size(joint_handles.size()), out);
    }));
}

// What is meant by kGA, in words, for definitions of the shear coefficient differ.
inline std::string shear_stiffness_definition() {
    return detail::text(bc_shear_stiffness_definition);
}

} // namespace beamcore

#endif // BEAMCORE_LAYERED_HPP
