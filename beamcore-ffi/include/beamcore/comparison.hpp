// What a simplified method gives for each span of a member, beside the exact solution.
#ifndef BEAMCORE_COMPARISON_HPP
#define BEAMCORE_COMPARISON_HPP

#include "response.hpp"

namespace beamcore {

// The greatest flow of a joint over a span, with the sign of the slip.
struct SimplifiedJoint {
    std::string joint;
    // By the method.
    Extreme<ShearFlow> flow;
    Extreme<ShearFlow> exact_flow;
};

// The stresses of a layer by the method at the place of the span's greatest moment.
struct SimplifiedLayer {
    std::string layer;
    Length at;
    // At the middle of its height, and what bending of the layer adds at its lower edge.
    Stress axial;
    Stress bending;
    // The axial force and the moment of the layer there by the exact solution.
    Force exact_axial;
    Moment exact_moment;
};

// What a simplified method gives for one span, beside the exact solution.
struct SimplifiedSpan {
    std::string span;
    // Of the half sine wave.
    Length length;
    // gamma of each layer from the lowest upward; none of sine layers.
    std::vector<double> factors;
    // The effective one, with the moduli of the time.
    BendingStiffness bending_stiffness;
    // The greatest deflection of the span by the method, by the exact solution, and their ratio
    // less one.
    Extreme<Length> deflection;
    Extreme<Length> exact_deflection;
    double difference;
    std::vector<SimplifiedJoint> joints;
    std::vector<SimplifiedLayer> layers;
    // Whether the combination holds free strains, which are left out of both sides here.
    bool leaves_out_strains;
    // Where the method does not hold, or only nearly.
    std::vector<std::string> warnings;
};

namespace detail {

// One span of a comparison.
class ComparedSpan {
public:
    ComparedSpan(const bc_comparison *comparison, std::int32_t span)
        : comparison_(comparison), span_(span) {}

    SimplifiedSpan whole(std::string name) const {
        double length = 0.0, bending = 0.0;
        std::int32_t strains = 0;
        check(bc_comparison_span(comparison_, span_, &length, &bending, &strains));
        double value = 0.0, at = 0.0, exact = 0.0, exact_at = 0.0, difference = 0.0;
        check(bc_comparison_deflection(comparison_, span_, &value, &at, &exact, &exact_at,
                                       &difference));
        return SimplifiedSpan{std::move(name),
                              Length::from_si(length),
                              factors(),
                              BendingStiffness::from_si(bending),
                              {Length::from_si(value), Length::from_si(at)},
                              {Length::from_si(exact), Length::from_si(exact_at)},
                              difference,
                              joints(),
                              layers(),
                              strains != 0,
                              named(bc_comparison_warning_count, bc_comparison_warning)};
    }

private:
    // The texts that two functions count and give for this span.
    template <class Count, class Get>
    std::vector<std::string> named(Count count_of, Get get) const {
        return texts(
            comparison_,
            [&](const bc_comparison *comparison, std::int32_t *out) {
                return count_of(comparison, span_, out);
            },
            [&](const bc_comparison *comparison, std::int32_t index, char *buffer,
                std::int64_t capacity, std::int64_t *length) {
                return get(comparison, span_, index, buffer, capacity, length);
            });
    }

    std::vector<double> factors() const {
        const std::int32_t size = count([&](std::int32_t *out) {
            return bc_comparison_factor_count(comparison_, span_, out);
        });
        std::vector<double> list;
        for (std::int32_t layer = 0; layer < size; ++layer) {
            list.push_back(number([&](double *out) {
                return bc_comparison_factor(comparison_, span_, layer, out);
            }));
        }
        return list;
    }

    std::vector<SimplifiedJoint> joints() const {
        std::vector<SimplifiedJoint> list;
        for (std::string &joint : named(bc_comparison_joint_count, bc_comparison_joint_name)) {
            double flow = 0.0, at = 0.0, exact = 0.0, exact_at = 0.0;
            check(bc_comparison_flow(comparison_, span_, size(list.size()), &flow, &at, &exact,
                                     &exact_at));
            list.push_back(SimplifiedJoint{std::move(joint),
                                           {ShearFlow::from_si(flow), Length::from_si(at)},
                                           {ShearFlow::from_si(exact), Length::from_si(exact_at)}});
        }
        return list;
    }

    std::vector<SimplifiedLayer> layers() const {
        std::vector<SimplifiedLayer> list;
        for (std::string &layer : named(bc_comparison_layer_count, bc_comparison_layer_name)) {
            double axial = 0.0, bending = 0.0, at = 0.0, exact_axial = 0.0, exact_moment = 0.0;
            check(bc_comparison_stress(comparison_, span_, size(list.size()), &axial, &bending,
                                       &at, &exact_axial, &exact_moment));
            list.push_back(SimplifiedLayer{std::move(layer), Length::from_si(at),
                                           Stress::from_si(axial), Stress::from_si(bending),
                                           Force::from_si(exact_axial),
                                           Moment::from_si(exact_moment)});
        }
        return list;
    }

    const bc_comparison *comparison_;
    std::int32_t span_;
};

} // namespace detail

inline std::vector<SimplifiedSpan> Response::simplified(const std::string &combination, Time time,
                                                        SimplifiedMethod method) const {
    const auto comparison =
        detail::make<bc_comparison>(bc_comparison_free, [&](bc_comparison **out) {
            return bc_response_compare(get(), detail::c_text(combination, "combination"),
                                       detail::code(time), detail::code(method), out);
        });
    std::vector<SimplifiedSpan> spans;
    for (std::string &span :
         detail::texts(comparison.get(), bc_comparison_span_count, bc_comparison_span_name)) {
        const detail::ComparedSpan compared(comparison.get(), detail::size(spans.size()));
        spans.push_back(compared.whole(std::move(span)));
    }
    return spans;
}

} // namespace beamcore

#endif // BEAMCORE_COMPARISON_HPP
