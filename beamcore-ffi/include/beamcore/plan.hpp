// Plans of members: everything given, nothing checked yet.
#ifndef BEAMCORE_PLAN_HPP
#define BEAMCORE_PLAN_HPP

#include "member.hpp"

namespace beamcore {

namespace detail {

// The handles of actions, as a list for the C ABI.
inline std::vector<const bc_action *> handles(const std::vector<Action> &actions) {
    std::vector<const bc_action *> list;
    for (const Action &action : actions) {
        list.push_back(action.get());
    }
    return list;
}

} // namespace detail

// A member on two supports at its ends, as it is being described.
class SimpleSpanPlan {
public:
    SimpleSpanPlan(const Section &section, Length span) : section_(section), span_(span) {}

    // The same plan with one more action.
    SimpleSpanPlan action(const Action &action) const {
        SimpleSpanPlan plan = *this;
        plan.actions_.push_back(action);
        return plan;
    }

    // Checks the plan; all that is wrong is reported at once.
    Member check() const {
        return Member(detail::make<bc_member>(bc_member_free, [&](bc_member **out) {
            const auto actions = detail::handles(actions_);
            return bc_member_simple_span(section_.get(), span_.si(), actions.data(),
                                         detail::size(actions.size()), out);
        }));
    }

private:
    Section section_;
    Length span_;
    std::vector<Action> actions_;
};

// A member of any supports, as it is being described.
class MemberPlan {
public:
    MemberPlan(const Section &section, Length length) : section_(section), length_(length) {}

    // The same plan with one more support.
    MemberPlan support(const Support &support) const {
        MemberPlan plan = *this;
        plan.supports_.push_back(support);
        return plan;
    }

    // The same plan with one more action.
    MemberPlan action(const Action &action) const {
        MemberPlan plan = *this;
        plan.actions_.push_back(action);
        return plan;
    }

    // Checks the plan; all that is wrong is reported at once.
    Member check() const {
        return Member(detail::make<bc_member>(bc_member_free, [&](bc_member **out) {
            std::vector<const char *> names;
            std::vector<std::int32_t> kinds;
            std::vector<double> places;
            for (const Support &support : supports_) {
                names.push_back(detail::c_text(support.name, "support_names"));
                kinds.push_back(detail::code(support.kind));
                places.push_back(support.at.si());
            }
            const auto actions = detail::handles(actions_);
            return bc_member_new(section_.get(), length_.si(), names.data(), kinds.data(),
                                 places.data(), detail::size(names.size()), actions.data(),
                                 detail::size(actions.size()), out);
        }));
    }

private:
    Section section_;
    Length length_;
    std::vector<Support> supports_;
    std::vector<Action> actions_;
};

inline SimpleSpanPlan Member::simple_span(const Section &section, Length span) {
    return SimpleSpanPlan(section, span);
}

inline MemberPlan Member::of_length(const Section &section, Length length) {
    return MemberPlan(section, length);
}

} // namespace beamcore

#endif // BEAMCORE_PLAN_HPP
