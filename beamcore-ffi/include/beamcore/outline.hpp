// Outlines of parts.
#ifndef BEAMCORE_OUTLINE_HPP
#define BEAMCORE_OUTLINE_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

namespace beamcore {

// A point of a section or of an outline: y to the right, z up.
struct Point {
    Length y;
    Length z;
};

// The shape of a part with its sizes, without a place. It has a point by which a part is placed:
// the middle of its bounding box, or the origin of the coordinates of a polygon. Corners are sharp.
// The sizes are checked when a part of the outline is used in a section.
class Outline {
public:
    explicit Outline(detail::Shared<bc_outline> handle) : handle_(std::move(handle)) {}

    // The same polygon with one more hole; other outlines have no holes.
    Outline hole(const std::vector<Point> &points) const {
        const auto [y_m, z_m] = coordinates(points);
        const std::int32_t count = detail::size(points.size());
        return made([&, y = y_m.data(), z = z_m.data()](bc_outline **out) {
            return bc_outline_with_hole(get(), y, z, count, out);
        });
    }

    // The word for the shape in documents, as in "rectangle".
    std::string name() const { return detail::name(get(), bc_outline_name); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_outline *get() const { return handle_.get(); }

private:
    template <class Call> static Outline made(Call call) {
        return Outline(detail::make<bc_outline>(bc_outline_free, call));
    }

    // The numbers of points, as the C ABI takes them.
    static std::pair<std::vector<double>, std::vector<double>>
    coordinates(const std::vector<Point> &points) {
        std::vector<double> y_m, z_m;
        for (const Point &point : points) {
            y_m.push_back(point.y.si());
            z_m.push_back(point.z.si());
        }
        return {std::move(y_m), std::move(z_m)};
    }

    friend Outline polygon(const std::vector<Point> &points);

    detail::Shared<bc_outline> handle_;
};

// A rectangle of the given width (along y) and height (along z).
inline Outline rectangle(Length width, Length height) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_rectangle(width.si(), height.si(), out);
    }));
}

// A polygon through the given points, in its own coordinates; it closes by itself.
inline Outline polygon(const std::vector<Point> &points) {
    const auto [y_m, z_m] = Outline::coordinates(points);
    const std::int32_t count = detail::size(points.size());
    return Outline::made([&, y = y_m.data(), z = z_m.data()](bc_outline **out) {
        return bc_outline_polygon(y, z, count, out);
    });
}

// A full disc: a round bar.
inline Outline disc(Length diameter) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_disc(diameter.si(), out);
    }));
}

// A round tube of the given outer diameter.
inline Outline ring(Length diameter, Length wall_thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_ring(diameter.si(), wall_thickness.si(), out);
    }));
}

// Two flanges joined by a web in their middle; the height is overall.
inline Outline i_shape(Length height, Length top_width, Length top_thickness, Length bottom_width,
                       Length bottom_thickness, Length web_thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_i_shape(height.si(), top_width.si(), top_thickness.si(),
                                  bottom_width.si(), bottom_thickness.si(), web_thickness.si(),
                                  out);
    }));
}

// A flange on top of a web in its middle; the height is overall.
inline Outline tee(Length height, Length width, Length flange_thickness, Length web_thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_tee(height.si(), width.si(), flange_thickness.si(), web_thickness.si(),
                              out);
    }));
}

// A web on the left with two equal flanges to the right; height and width are overall.
inline Outline channel(Length height, Length width, Length flange_thickness,
                       Length web_thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_channel(height.si(), width.si(), flange_thickness.si(),
                                  web_thickness.si(), out);
    }));
}

// Two legs of one thickness with the heel at the bottom left; height and width are overall.
inline Outline angle(Length height, Length width, Length thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_angle(height.si(), width.si(), thickness.si(), out);
    }));
}

// A rectangular tube; width and height are overall.
inline Outline hollow_box(Length width, Length height, Length side_thickness,
                          Length plate_thickness) {
    return Outline(detail::make<bc_outline>(bc_outline_free, [&](bc_outline **out) {
        return bc_outline_box(width.si(), height.si(), side_thickness.si(), plate_thickness.si(),
                              out);
    }));
}

} // namespace beamcore

#endif // BEAMCORE_OUTLINE_HPP
