// Spans, combinations and members.
#ifndef BEAMCORE_MEMBER_HPP
#define BEAMCORE_MEMBER_HPP

#include "action.hpp"
#include "section.hpp"
#include "shape.hpp"
#include "support.hpp"

namespace beamcore {

// A stretch of a member whose deflection is looked at on its own: between two supports, or an
// overhang.
struct Span {
    // "A to B" between the supports A and B, "before A" and "beyond B" for overhangs.
    std::string name;
    Length from;
    Length to;
    // Whether one of its ends is free.
    bool is_cantilever;

    Length length() const { return to - from; }
};

// The partial factors of the fundamental combination.
struct PartialFactors {
    // Of permanent actions that are unfavourable.
    double permanent;
    // Of permanent actions that are favourable.
    double permanent_favourable;
    // Of variable actions that are unfavourable.
    double variable;
};

// The kind of a combination (EN 1990:2002).
enum class CombinationKind : std::int32_t {
    permanent = BC_COMBINATION_PERMANENT,
    quasi_permanent = BC_COMBINATION_QUASI_PERMANENT,
    characteristic = BC_COMBINATION_CHARACTERISTIC,
    frequent = BC_COMBINATION_FREQUENT,
    fundamental = BC_COMBINATION_FUNDAMENTAL,
    own = BC_COMBINATION_OWN,
    own_ultimate = BC_COMBINATION_OWN_ULTIMATE,
};

// A sum of factored actions.
struct Combination {
    // The name by which results are addressed.
    std::string name;
    CombinationKind kind;
    // Whether design strengths are compared under it.
    bool is_ultimate;
    // One factor per action, in the order of the actions of the member.
    std::vector<double> factors;
};

class MemberPlan;
class Response;

// A member that has passed all checks and is ready to be solved.
class Member {
public:
    // A plan of a member on two supports at its ends: a pin "left" and a roller "right".
    static MemberPlan simple_span(const Section &section, Length span);
    // A plan of a member of the given length, without supports yet.
    static MemberPlan of_length(const Section &section, Length length);

    // Solves the member for each action at each time.
    Response solve() const;

    Length length() const {
        return Length::from_si(
            detail::number([&](double *out) { return bc_member_length(get(), out); }));
    }

    // The section just right of a place (at the right end, just left of it).
    Section section_at(Length at) const;
    // The names of the parts of all sections, in the order in which they come from the left.
    std::vector<std::string> parts() const;
    std::vector<Support> supports() const;
    // The changes of the section, from left to right; section_at() gives the section after one.
    std::vector<SectionChange> changes() const;
    std::vector<Hinge> hinges() const;
    std::vector<Anchor> anchors() const;
    // Whether layers have deflections of their own, by transverse moduli of their joints.
    bool has_deflections_of_layers() const;
    // Whether axial force takes part.
    bool has_axial_force() const;
    // The layer that loads of actions without a named layer enter: the highest one where all layers
    // share one deflection, else the first.
    std::string entered_layer() const;
    // How shear deformation is taken.
    ShearModel shear_model() const;
    // The pitch, if it has one.
    std::optional<Angle> pitch() const;

    // Whether the member is held sideways or free.
    Sideways sideways() const {
        return static_cast<Sideways>(detail::count(
            [&](std::int32_t *out) { return bc_member_sideways(get(), out); }));
    }

    // The combinations of the actions, each with its factors. Where several variable actions can
    // lead, each kind has one per leader, named for example "fundamental, snow leading".
    std::vector<Combination> combinations() const {
        std::vector<Combination> list;
        for (std::string &name :
             detail::texts(get(), bc_member_combination_count, bc_member_combination_name)) {
            list.push_back(combination(std::move(name), detail::size(list.size())));
        }
        return list;
    }

    // The partial factors of the fundamental combination.
    PartialFactors partial_factors() const {
        double permanent = 0.0, favourable = 0.0, variable = 0.0;
        detail::check(bc_member_partial_factors(get(), &permanent, &favourable, &variable));
        return PartialFactors{permanent, favourable, variable};
    }

    // The spans and overhangs, from left to right.
    std::vector<Span> spans() const {
        std::vector<Span> list;
        for (const std::string &name :
             detail::texts(get(), bc_member_span_count, bc_member_span_name)) {
            list.push_back(span(name));
        }
        return list;
    }

    // The span of a name.
    Span span(const std::string &name) const {
        double from = 0.0, to = 0.0;
        std::int32_t is_cantilever = 0;
        detail::check(bc_member_span(get(), detail::c_text(name, "span"), &from, &to,
                                     &is_cantilever));
        return Span{name, Length::from_si(from), Length::from_si(to), is_cantilever != 0};
    }

    // What was noticed, for example places that were merged.
    std::vector<std::string> notes() const {
        return detail::texts(get(), bc_member_note_count, bc_member_note);
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_member *get() const { return handle_.get(); }

private:
    explicit Member(detail::Shared<bc_member> handle) : handle_(std::move(handle)) {}

    friend class MemberPlan;

    Combination combination(std::string name, std::int32_t index) const {
        const auto number = [&](auto get_number) {
            return detail::count(
                [&](std::int32_t *out) { return get_number(get(), index, out); });
        };
        const std::int32_t actions = detail::count(
            [&](std::int32_t *out) { return bc_member_action_count(get(), out); });
        std::vector<double> factors;
        for (std::int32_t action = 0; action < actions; ++action) {
            factors.push_back(detail::number([&](double *out) {
                return bc_member_combination_factor(get(), index, action, out);
            }));
        }
        return Combination{std::move(name),
                           static_cast<CombinationKind>(number(bc_member_combination_kind)),
                           number(bc_member_combination_is_ultimate) != 0, std::move(factors)};
    }

    detail::Shared<bc_member> handle_;
};

} // namespace beamcore

#include "member_shape.hpp"

#include "plan.hpp"

#include "response.hpp"

#endif // BEAMCORE_MEMBER_HPP
