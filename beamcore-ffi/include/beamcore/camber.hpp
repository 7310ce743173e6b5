// Camber: the rise to build in and its ordinates.
#ifndef BEAMCORE_CAMBER_HPP
#define BEAMCORE_CAMBER_HPP

#include "response.hpp"

namespace beamcore {

// The direction of rounding; it works on the magnitude.
enum class Rounding : std::int32_t {
    nearest = BC_ROUNDING_NEAREST,
    down = BC_ROUNDING_DOWN,
    up = BC_ROUNDING_UP,
};

// The shape of a camber.
enum class Shape : std::int32_t {
    // A parabola whose rise at the middle of the chord is that of the deflection line there.
    parabola = BC_SHAPE_PARABOLA,
    // The mirror image of the deflection line, scaled to the rounded rise.
    mirror = BC_SHAPE_MIRROR,
    // A circular arc with the rise of the deflection line at the middle of the chord.
    arc_through_middle = BC_SHAPE_ARC_THROUGH_MIDDLE,
    // The circular arc whose greatest gap to the deflection line is least.
    arc_least_gap = BC_SHAPE_ARC_LEAST_GAP,
};

// A wish for camber: which deflection to build against, how much of it, in which steps.
struct CamberPlan {
    Shape shape;
    std::string combination;
    Time time;
    // The share of the deflection that is built in; 1 is all of it.
    double fraction;
    // The supports at the ends of the chord.
    std::string from;
    std::string to;
    // The step to which the rise is rounded, and the direction.
    Length step;
    Rounding rounding;
    // The least rise worth building; a smaller one becomes none.
    Length least;
    // The number of equal divisions of the chord; ordinates are given at their ends.
    std::int32_t divisions;
};

// One ordinate: distance from the left end of the chord, and height above the chord.
struct Ordinate {
    Length station;
    Length ordinate;
};

// The ends of a chord, from the left end of the member.
struct Chord {
    Length from;
    Length to;
};

// The camber to build.
class Camber {
public:
    Shape shape() const {
        return static_cast<Shape>(
            detail::count([&](std::int32_t *out) { return bc_camber_shape(get(), out); }));
    }

    // The radius of an arc, negative where it hangs; nothing for other shapes and for no rise.
    std::optional<Length> radius() const {
        std::int32_t has_value = 0;
        double radius = 0.0;
        detail::check(bc_camber_radius(get(), &has_value, &radius));
        return has_value != 0 ? std::optional(Length::from_si(radius)) : std::nullopt;
    }

    // The rise before rounding.
    Length target() const { return length(bc_camber_target); }
    // The rise at the middle of the chord, rounded; positive upward.
    Length rise() const { return length(bc_camber_rise); }

    // The ends of the chord.
    Chord chord() const {
        double from = 0.0, to = 0.0;
        detail::check(bc_camber_chord(get(), &from, &to));
        return Chord{Length::from_si(from), Length::from_si(to)};
    }

    // The ordinates, from the left end of the chord to the right end.
    std::vector<Ordinate> ordinates() const {
        const std::int32_t count = detail::count(
            [&](std::int32_t *out) { return bc_camber_ordinate_count(get(), out); });
        std::vector<Ordinate> list;
        for (std::int32_t index = 0; index < count; ++index) {
            double station = 0.0, ordinate = 0.0;
            detail::check(bc_camber_ordinate(get(), index, &station, &ordinate));
            list.push_back(Ordinate{Length::from_si(station), Length::from_si(ordinate)});
        }
        return list;
    }

    // The height above the chord at a place of the member.
    Length ordinate(Length at) const {
        return Length::from_si(detail::number(
            [&](double *out) { return bc_camber_ordinate_at(get(), at.si(), out); }));
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_camber *get() const { return handle_.get(); }

private:
    explicit Camber(detail::Shared<bc_camber> handle) : handle_(std::move(handle)) {}

    Length length(std::int32_t (*get_length)(const bc_camber *, double *)) const {
        return Length::from_si(
            detail::number([&](double *out) { return get_length(get(), out); }));
    }

    friend class Response;

    detail::Shared<bc_camber> handle_;
};

inline Camber Response::camber(const CamberPlan &plan) const {
    return Camber(detail::make<bc_camber>(bc_camber_free, [&](bc_camber **out) {
        return bc_camber_new(get(), detail::code(plan.shape),
                             detail::c_text(plan.combination, "combination"),
                             detail::code(plan.time), plan.fraction,
                             detail::c_text(plan.from, "from_support"),
                             detail::c_text(plan.to, "to_support"), plan.step.si(),
                             detail::code(plan.rounding), plan.least.si(), plan.divisions, out);
    }));
}

} // namespace beamcore

#include "limit.hpp"
#include "reading.hpp"
#include "span.hpp"

#endif // BEAMCORE_CAMBER_HPP
