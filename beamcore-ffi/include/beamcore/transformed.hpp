// The transformed section: presentation only.
#ifndef BEAMCORE_TRANSFORMED_HPP
#define BEAMCORE_TRANSFORMED_HPP

#include "section.hpp"

namespace beamcore {

// One part of a transformed section: its modular ratio n = E/E_ref and its width n b.
struct TransformedPart {
    double ratio;
    Length width;
    // The corners of the transformed outline, loop by loop, for drawing; arcs are given by chords
    // of at most 12 degrees.
    std::vector<std::vector<Point>> loops;
};

// A section as if made of one chosen material.
class TransformedSection {
public:
    TransformedSection(const Section &section, const std::string &material, Time time)
        : section_(section), material_(material), time_(detail::code(time)) {
        double reference = 0.0, area = 0.0, centroid = 0.0, moment = 0.0;
        detail::check(bc_section_transformed(section.get(), time_,
                                             detail::c_text(material, "material"), &reference,
                                             &area, &centroid, &moment));
        reference_modulus_ = Modulus::from_si(reference);
        area_ = Area::from_si(area);
        centroid_z_ = Length::from_si(centroid);
        second_moment_ = SecondMoment::from_si(moment);
    }

    // The modulus of the chosen material.
    Modulus reference_modulus() const { return reference_modulus_; }
    // Area: sum of n b h.
    Area area() const { return area_; }
    // z of the centroid.
    Length centroid_z() const { return centroid_z_; }
    // Second moment of area about the horizontal axis through the centroid.
    SecondMoment second_moment() const { return second_moment_; }

    // One part of it.
    TransformedPart part(const std::string &part) const {
        double ratio = 0.0, width = 0.0;
        detail::check(bc_section_transformed_part(section_.get(), time_, material_.c_str(),
                                                  detail::c_text(part, "part"), &ratio, &width));
        const std::int32_t count = detail::count([&](std::int32_t *out) {
            return bc_section_transformed_loop_count(section_.get(), time_, material_.c_str(),
                                                     part.c_str(), out);
        });
        std::vector<std::vector<Point>> loops;
        for (std::int32_t index = 0; index < count; ++index) {
            loops.push_back(corners(part, index));
        }
        return TransformedPart{ratio, Length::from_si(width), std::move(loops)};
    }

    // The stress in the real material of a part at height z under a moment (positive sagging),
    // tension positive.
    Stress stress(const std::string &part, Length z, Moment moment) const {
        return Stress::from_si(detail::number([&](double *out) {
            return bc_section_transformed_stress(section_.get(), time_, material_.c_str(),
                                                 detail::c_text(part, "part"), z.si(), moment.si(),
                                                 out);
        }));
    }

private:
    // The corners of a loop of a part whose name was checked.
    std::vector<Point> corners(const std::string &part, std::int32_t index) const {
        const std::int32_t count = detail::count([&](std::int32_t *out) {
            return bc_section_transformed_corner_count(section_.get(), time_, material_.c_str(),
                                                       part.c_str(), index, out);
        });
        std::vector<double> y(static_cast<std::size_t>(count)), z(y.size());
        detail::check(bc_section_transformed_corners(section_.get(), time_, material_.c_str(),
                                                     part.c_str(), index, count, y.data(),
                                                     z.data()));
        std::vector<Point> list;
        for (std::size_t i = 0; i < y.size(); ++i) {
            list.push_back(Point{Length::from_si(y[i]), Length::from_si(z[i])});
        }
        return list;
    }

    Section section_;
    std::string material_;
    std::int32_t time_;
    Modulus reference_modulus_ = Modulus::from_si(0.0);
    Area area_ = Area::from_si(0.0);
    Length centroid_z_ = Length::from_si(0.0);
    SecondMoment second_moment_ = SecondMoment::from_si(0.0);
};

inline TransformedSection Section::transformed_to(const std::string &material, Time time) const {
    return TransformedSection(*this, material, time);
}

} // namespace beamcore

#endif // BEAMCORE_TRANSFORMED_HPP
