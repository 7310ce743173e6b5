// Plans of members: everything given, nothing checked yet.
#ifndef BEAMCORE_PLAN_HPP
#define BEAMCORE_PLAN_HPP

#include "member.hpp"

namespace beamcore {

// A combination of one's own: a factor for each action that takes part.
struct OwnCombination {
    std::string name;
    // Names of actions and their factors; an action that is not named has the factor 0.
    std::vector<std::pair<std::string, double>> factors;
    // Whether design strengths are compared under it.
    bool is_ultimate;
};

// A member as it is being described.
class MemberPlan {
public:
    // The same plan with one more support.
    MemberPlan support(const Support &support) const {
        return made(
            [&](bc_plan **out) { return bc_plan_on_support(get(), support.get(), out); });
    }

    // The same plan with one more action.
    MemberPlan action(const Action &action) const {
        return made(
            [&](bc_plan **out) { return bc_plan_with_action(get(), action.get(), out); });
    }

    // The same plan with other partial factors for the fundamental combination than the
    // recommended ones.
    MemberPlan partial_factors(PartialFactors factors) const {
        return made([&](bc_plan **out) {
            return bc_plan_with_partial_factors(get(), factors.permanent,
                                                factors.permanent_favourable, factors.variable,
                                                out);
        });
    }

    // The same plan with one more combination, of one's own.
    MemberPlan combination(const OwnCombination &combination) const {
        std::vector<const char *> actions;
        std::vector<double> factors;
        for (const auto &[action, factor] : combination.factors) {
            actions.push_back(detail::c_text(action, "action_names"));
            factors.push_back(factor);
        }
        return made([&](bc_plan **out) {
            return bc_plan_with_combination(get(), detail::c_text(combination.name, "name"),
                                            actions.data(), factors.data(),
                                            detail::size(actions.size()),
                                            combination.is_ultimate ? 1 : 0, out);
        });
    }

    // The same plan of a member that is held sideways or free to move; without this it is held.
    MemberPlan sideways(Sideways sideways) const {
        return made([&](bc_plan **out) {
            return bc_plan_with_sideways(get(), detail::code(sideways), out);
        });
    }

    // The same plan with another section from a place on, to the right of all changes before.
    MemberPlan step(Length at, const Section &section) const {
        return made([&](bc_plan **out) {
            return bc_plan_with_step(get(), at.si(), section.get(), out);
        });
    }

    // The same plan with a section that changes linearly between two places, to the right of all
    // changes before, to a like one: the same parts, shapes and materials with other sizes.
    MemberPlan taper(Length from, Length to, const Section &section) const {
        return made([&](bc_plan **out) {
            return bc_plan_with_taper(get(), from.si(), to.si(), section.get(), out);
        });
    }

    // The same plan with an internal hinge.
    MemberPlan hinge(const Hinge &hinge) const {
        const double at = hinge.at.si();
        const std::string layer = hinge.layer.value_or("");
        return made([&](bc_plan **out) {
            switch (hinge.kind) {
            case HingeKind::shear:
                return bc_plan_with_shear_hinge(get(), at, out);
            case HingeKind::butt:
                return bc_plan_with_butt_joint(get(), detail::c_text(layer, "layer"), at, out);
            case HingeKind::moment:
                break;
            }
            return hinge.layer.has_value()
                       ? bc_plan_with_layer_hinge(get(), detail::c_text(layer, "layer"), at, out)
                       : bc_plan_with_moment_hinge(get(), at, out);
        });
    }

    // The same plan with something that stops the slip of a joint at a place.
    MemberPlan anchor(const Anchor &anchor) const {
        return made([&](bc_plan **out) {
            const char *name = detail::c_text(anchor.name, "name");
            const char *joint = detail::c_text(anchor.joint, "joint");
            return anchor.stiffness.has_value()
                       ? bc_plan_with_elastic_anchor(get(), name, joint, anchor.at.si(),
                                                     anchor.stiffness->si(), out)
                       : bc_plan_with_anchor(get(), name, joint, anchor.at.si(), out);
        });
    }

    // The same plan with shear deformation taken as told; without this it is left out.
    MemberPlan shear(const ShearModel &shear) const {
        return made([&](bc_plan **out) {
            const auto given = shear.stiffness();
            return given.has_value()
                       ? bc_plan_with_given_shear(get(), given->si(), out)
                       : bc_plan_with_shear(
                             get(), shear.is_rigid() ? BC_SHEAR_RIGID : BC_SHEAR_FLEXIBLE, out);
        });
    }

    // The same plan of a member that rises to the right by an angle: its length and all places are
    // measured along it, its deflection is square to it.
    MemberPlan pitch(Angle angle) const {
        return made([&](bc_plan **out) { return bc_plan_with_pitch(get(), angle.si(), out); });
    }

    // Checks the plan; all that is wrong is reported at once.
    Member check() const {
        return Member(detail::make<bc_member>(
            bc_member_free, [&](bc_member **out) { return bc_plan_check(get(), out); }));
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_plan *get() const { return handle_.get(); }

private:
    explicit MemberPlan(detail::Shared<bc_plan> handle) : handle_(std::move(handle)) {}

    template <class Call> static MemberPlan made(Call call) {
        return MemberPlan(detail::make<bc_plan>(bc_plan_free, call));
    }

    friend class Member;

    detail::Shared<bc_plan> handle_;
};

inline MemberPlan Member::simple_span(const Section &section, Length span) {
    return MemberPlan::made([&](bc_plan **out) {
        return bc_plan_simple_span(section.get(), span.si(), out);
    });
}

inline MemberPlan Member::of_length(const Section &section, Length length) {
    return MemberPlan::made([&](bc_plan **out) {
        return bc_plan_of_length(section.get(), length.si(), out);
    });
}

} // namespace beamcore

#endif // BEAMCORE_PLAN_HPP
