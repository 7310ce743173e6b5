// Actions, supports and members.
#ifndef BEAMCORE_MEMBER_HPP
#define BEAMCORE_MEMBER_HPP

#include "section.hpp"

namespace beamcore {

// The factors by which a variable action enters combinations.
struct CombinationFactors {
    double psi_0;
    double psi_1;
    double psi_2;
};

// A named action: loads that act together, from one cause. Loads are positive downward.
class Action {
public:
    // The same action with the weight of the section, over the whole member.
    Action self_weight() const {
        return made([&](bc_action **out) { return bc_action_with_self_weight(get(), out); });
    }

    // The same action with a line load over the whole member.
    Action uniform(LineLoad load) const {
        return made([&](bc_action **out) { return bc_action_with_uniform(get(), load.si(), out); });
    }

    // The same action with a line load between two places.
    Action partial(LineLoad load, Length from, Length to) const {
        return made([&](bc_action **out) {
            return bc_action_with_partial(get(), load.si(), from.si(), to.si(), out);
        });
    }

    // The same action with a point load.
    Action point(Force load, Length at) const {
        return made([&](bc_action **out) {
            return bc_action_with_point(get(), load.si(), at.si(), out);
        });
    }

    std::string name() const { return detail::name(get(), bc_action_name); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_action *get() const { return handle_.get(); }

private:
    explicit Action(detail::Shared<bc_action> handle) : handle_(std::move(handle)) {}

    template <class Call> static Action made(Call call) {
        return Action(detail::make<bc_action>(bc_action_free, call));
    }

    friend Action permanent(const std::string &name);
    friend Action variable(const std::string &name, CombinationFactors factors);

    detail::Shared<bc_action> handle_;
};

// A permanent action, without loads yet.
inline Action permanent(const std::string &name) {
    return Action::made([&](bc_action **out) {
        return bc_action_permanent(detail::c_text(name, "name"), out);
    });
}

// A variable action with its combination factors, without loads yet.
inline Action variable(const std::string &name, CombinationFactors factors) {
    return Action::made([&](bc_action **out) {
        return bc_action_variable(detail::c_text(name, "name"), factors.psi_0, factors.psi_1,
                                  factors.psi_2, out);
    });
}

// What a support holds.
enum class SupportKind : std::int32_t {
    pin = BC_SUPPORT_PIN,
    roller = BC_SUPPORT_ROLLER,
    fixed = BC_SUPPORT_FIXED,
};

// A support at a distance from the left end of the member, with a name that addresses its
// reactions.
struct Support {
    std::string name;
    SupportKind kind;
    Length at;

    static Support pin(std::string name, Length at) {
        return Support{std::move(name), SupportKind::pin, at};
    }
    static Support roller(std::string name, Length at) {
        return Support{std::move(name), SupportKind::roller, at};
    }
    static Support fixed(std::string name, Length at) {
        return Support{std::move(name), SupportKind::fixed, at};
    }
};

class MemberPlan;
class SimpleSpanPlan;
class Response;

// A member that has passed all checks and is ready to be solved.
class Member {
public:
    // A plan of a member on two supports at its ends: a pin "left" and a roller "right".
    static SimpleSpanPlan simple_span(const Section &section, Length span);
    // A plan of a member of the given length, without supports yet.
    static MemberPlan of_length(const Section &section, Length length);

    // Solves the member for each action at each time.
    Response solve() const;

    Length length() const {
        return Length::from_si(
            detail::number([&](double *out) { return bc_member_length(get(), out); }));
    }

    // The names of the combinations, by which results are addressed.
    std::vector<std::string> combinations() const {
        return detail::texts(get(), bc_member_combination_count, bc_member_combination_name);
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
    friend class SimpleSpanPlan;

    detail::Shared<bc_member> handle_;
};

} // namespace beamcore

#include "plan.hpp"

#include "response.hpp"

#endif // BEAMCORE_MEMBER_HPP
