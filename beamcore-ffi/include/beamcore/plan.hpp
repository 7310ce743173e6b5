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
        return made([&](bc_plan **out) {
            return bc_plan_with_support(get(), detail::c_text(support.name, "name"),
                                        detail::code(support.kind), support.at.si(), out);
        });
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
