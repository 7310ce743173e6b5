// Limits of the deflection, and how far they are used.
#ifndef BEAMCORE_LIMIT_HPP
#define BEAMCORE_LIMIT_HPP

#include "camber.hpp"

namespace beamcore {

// A limit of a component of the deflection; in all spans and under every characteristic
// combination, unless it says otherwise.
class Limit {
public:
    // The length of the span over a number; the length of an overhang is its own.
    static Limit span_over(Component component, double number) {
        return made([&](bc_limit **out) {
            return bc_limit_span_over(detail::code(component), number, out);
        });
    }

    // A length, whatever the span.
    static Limit value(Component component, Length value) {
        return made([&](bc_limit **out) {
            return bc_limit_value(detail::code(component), value.si(), out);
        });
    }

    // The same limit for one span only.
    Limit in_span(const std::string &span) const {
        return made([&](bc_limit **out) {
            return bc_limit_in_span(get(), detail::c_text(span, "span"), out);
        });
    }

    // The same limit under one combination only.
    Limit under(const std::string &combination) const {
        return made([&](bc_limit **out) {
            return bc_limit_under(get(), detail::c_text(combination, "combination"), out);
        });
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_limit *get() const { return handle_.get(); }

private:
    explicit Limit(detail::Shared<bc_limit> handle) : handle_(std::move(handle)) {}

    template <class Call> static Limit made(Call call) {
        return Limit(detail::make<bc_limit>(bc_limit_free, call));
    }

    detail::Shared<bc_limit> handle_;
};

// A limit compared with the result.
struct LimitCheck {
    Component component;
    // The combination that gives the greatest value.
    std::string combination;
    std::string span;
    // The value of greatest magnitude with its sign and place.
    Extreme<Length> found;
    // The allowed magnitude.
    Length allowed;
    // |found| / allowed; above 1 the limit is not kept.
    double utilisation;
};

namespace detail {

inline LimitCheck limit_check(const bc_checks *checks, std::int32_t index) {
    const std::int32_t component =
        count([&](std::int32_t *out) { return bc_checks_component(checks, index, out); });
    const auto name = [&](auto get) {
        return text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return get(checks, index, buffer, capacity, length);
        });
    };
    double value = 0.0, at = 0.0, allowed = 0.0, utilisation = 0.0;
    check(bc_checks_values(checks, index, &value, &at, &allowed, &utilisation));
    return LimitCheck{static_cast<Component>(component),
                      name(bc_checks_combination),
                      name(bc_checks_span),
                      {Length::from_si(value), Length::from_si(at)},
                      Length::from_si(allowed),
                      utilisation};
}

} // namespace detail

inline std::vector<LimitCheck> Response::checks(const std::vector<Limit> &limits,
                                                const bc_camber *camber) const {
    const auto handles = detail::handles<bc_limit>(limits);
    const auto checks = detail::make<bc_checks>(bc_checks_free, [&](bc_checks **out) {
        return bc_response_check_limits(get(), handles.data(), detail::size(handles.size()),
                                        camber, out);
    });
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_checks_count(checks.get(), out); });
    std::vector<LimitCheck> list;
    for (std::int32_t index = 0; index < count; ++index) {
        list.push_back(detail::limit_check(checks.get(), index));
    }
    return list;
}

inline std::vector<LimitCheck> Response::check_limits(const std::vector<Limit> &limits) const {
    return checks(limits, nullptr);
}

inline std::vector<LimitCheck> Response::check_limits(const std::vector<Limit> &limits,
                                                      const Camber &camber) const {
    return checks(limits, camber.get());
}

} // namespace beamcore

#endif // BEAMCORE_LIMIT_HPP
