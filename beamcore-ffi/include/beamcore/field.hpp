// Results along the member.
#ifndef BEAMCORE_FIELD_HPP
#define BEAMCORE_FIELD_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

#include <functional>

namespace beamcore {

// A greatest or least value and the place where it stands.
template <class Q> struct Extreme {
    Q value;
    Length at;
};

// The values just left and just right of a place.
template <class Q> struct Sides {
    Q left;
    Q right;
};

// One side of a place along the member.
enum class Side : std::int32_t { left = BC_SIDE_LEFT, right = BC_SIDE_RIGHT };

// A quantity along the member, exact everywhere.
//
// At a support or a point load a shear force has two values; sides() gives both.
template <class Q> class Line {
public:
    // The values at places in m from the left end, as SI numbers; where there are two, on `side`.
    std::vector<double> values_si(const std::vector<double> &x_m, Side side = Side::right) const {
        std::vector<double> values(x_m.size());
        detail::check(values_(detail::code(side), x_m.data(), detail::size(x_m.size()),
                              values.data()));
        return values;
    }

    // The values on both sides of a place.
    Sides<Q> sides(Length at) const {
        return Sides<Q>{Q::from_si(values_si({at.si()}, Side::left).front()),
                        Q::from_si(values_si({at.si()}, Side::right).front())};
    }

    // The value at a place: where there are two, the one just right of it (at the right end of
    // the member, the one just left of it).
    Q value(Length at) const { return Q::from_si(values_si({at.si()}).front()); }

protected:
    using Values =
        std::function<std::int32_t(std::int32_t side, const double *x_m, std::int32_t count,
                                   double *values_out)>;

    explicit Line(Values values) : values_(std::move(values)) {}

private:
    Values values_;
};

// A quantity along the member, a layer, a joint or a span of it, with its extremes.
template <class Q> class Field : public Line<Q> {
public:
    using Extremes =
        std::function<std::int32_t(std::int32_t extreme, double *value_out, double *at_m_out)>;

    // The field that two calls of the C ABI give.
    Field(typename Line<Q>::Values values, Extremes extremes)
        : Line<Q>(std::move(values)), extremes_(std::move(extremes)) {
        // Whether there is such a field is said here, where its names are given.
        greatest();
    }

    // The field of a handle of the C ABI.
    explicit Field(const detail::Shared<bc_field> &field)
        : Field(
              [field](std::int32_t side, const double *x_m, std::int32_t count, double *out) {
                  return bc_field_values(field.get(), side, x_m, count, out);
              },
              [field](std::int32_t extreme, double *value, double *at) {
                  return bc_field_extreme(field.get(), extreme, value, at);
              }) {}

    // The value of greatest magnitude, with its sign and place; the leftmost of equals.
    Extreme<Q> greatest() const { return extreme(BC_EXTREME_GREATEST); }
    // The algebraically greatest value.
    Extreme<Q> maximum() const { return extreme(BC_EXTREME_MAXIMUM); }
    // The algebraically least value.
    Extreme<Q> minimum() const { return extreme(BC_EXTREME_MINIMUM); }

private:
    Extreme<Q> extreme(std::int32_t extreme) const {
        double value = 0.0, at = 0.0;
        detail::check(extremes_(extreme, &value, &at));
        return Extreme<Q>{Q::from_si(value), Length::from_si(at)};
    }

    Extremes extremes_;
};

} // namespace beamcore

#endif // BEAMCORE_FIELD_HPP
