// Deflections of spans and their components.
#ifndef BEAMCORE_SPAN_HPP
#define BEAMCORE_SPAN_HPP

#include "camber.hpp"

namespace beamcore {

inline Field<Length> Response::span_deflection(const std::string &combination, Time time,
                                               const std::string &span) const {
    detail::c_text(combination, "combination");
    detail::c_text(span, "span");
    const auto response = handle_;
    // A deflection has one value at each place, whatever the side.
    return Field<Length>(
        [=](std::int32_t, const double *x_m, std::int32_t count, double *out) {
            return bc_response_span_values(response.get(), combination.c_str(),
                                           detail::code(time), span.c_str(), x_m, count, out);
        },
        [=](std::int32_t extreme, double *value, double *at) {
            return bc_response_span_extreme(response.get(), combination.c_str(),
                                            detail::code(time), span.c_str(), extreme, value, at);
        });
}

inline Field<Length> Response::component(Component component, const std::string &combination,
                                         const std::string &span,
                                         detail::Shared<bc_camber> camber) const {
    detail::c_text(combination, "combination");
    detail::c_text(span, "span");
    const auto response = handle_;
    return Field<Length>(
        [=](std::int32_t, const double *x_m, std::int32_t count, double *out) {
            return bc_response_component_values(response.get(), detail::code(component),
                                                combination.c_str(), span.c_str(), camber.get(),
                                                x_m, count, out);
        },
        [=](std::int32_t extreme, double *value, double *at) {
            return bc_response_component_extreme(response.get(), detail::code(component),
                                                 combination.c_str(), span.c_str(), camber.get(),
                                                 extreme, value, at);
        });
}

inline Field<Length> Response::deflection_component(Component component,
                                                    const std::string &combination,
                                                    const std::string &span) const {
    return this->component(component, combination, span, nullptr);
}

inline Field<Length> Response::deflection_component(Component component,
                                                    const std::string &combination,
                                                    const std::string &span,
                                                    const Camber &camber) const {
    return this->component(component, combination, span, camber.handle_);
}

} // namespace beamcore

#endif // BEAMCORE_SPAN_HPP
