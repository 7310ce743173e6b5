// Actions and their loads.
#ifndef BEAMCORE_ACTION_HPP
#define BEAMCORE_ACTION_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

#include <optional>

namespace beamcore {

// The factors by which a variable action enters combinations.
struct CombinationFactors {
    double psi_0;
    double psi_1;
    double psi_2;
};

// A category of variable actions (EN 1990:2002 Table A1.1).
enum class Category : std::int32_t {
    domestic = BC_CATEGORY_DOMESTIC,           // A: homes
    office = BC_CATEGORY_OFFICE,               // B: offices
    congregation = BC_CATEGORY_CONGREGATION,   // C: where people gather
    shopping = BC_CATEGORY_SHOPPING,           // D: shops
    storage = BC_CATEGORY_STORAGE,             // E: storage
    light_traffic = BC_CATEGORY_LIGHT_TRAFFIC, // F: vehicles up to 30 kN
    heavy_traffic = BC_CATEGORY_HEAVY_TRAFFIC, // G: vehicles from 30 kN to 160 kN
    roof = BC_CATEGORY_ROOF,                   // H: roofs that are only walked on for upkeep
    snow = BC_CATEGORY_SNOW,                   // at 1000 m above the sea or lower
    snow_high = BC_CATEGORY_SNOW_HIGH,         // above 1000 m, and everywhere in the north
    wind = BC_CATEGORY_WIND,
    temperature = BC_CATEGORY_TEMPERATURE, // not fire
};

// The category of a word of documents: "A" to "H", "snow", "snow_high", "wind", "temperature".
inline Category category_of_name(const std::string &name) {
    return static_cast<Category>(detail::count([&](std::int32_t *out) {
        return bc_category_of_name(detail::c_text(name, "name"), out);
    }));
}

// The recommended combination factors of a category.
inline CombinationFactors combination_factors(Category category) {
    double psi_0 = 0.0, psi_1 = 0.0, psi_2 = 0.0;
    detail::check(bc_category_factors(detail::code(category), &psi_0, &psi_1, &psi_2));
    return CombinationFactors{psi_0, psi_1, psi_2};
}

// How long an action acts at a time (EN 1995-1-1:2004 2.3.1.2, from memory).
enum class LoadDuration : std::int32_t {
    permanent = BC_DURATION_PERMANENT,         // more than ten years
    long_term = BC_DURATION_LONG,              // six months to ten years
    medium_term = BC_DURATION_MEDIUM,          // a week to six months
    short_term = BC_DURATION_SHORT,            // less than a week
    instantaneous = BC_DURATION_INSTANTANEOUS, // moments
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

    // The same action with a line load that changes linearly between two places.
    Action trapezoidal(LineLoad load_from, LineLoad load_to, Length from, Length to) const {
        return made([&](bc_action **out) {
            return bc_action_with_trapezoidal(get(), load_from.si(), load_to.si(), from.si(),
                                              to.si(), out);
        });
    }

    // The same action with a load per area of floor or roof over the whole member: the line load
    // is load x tributary width.
    Action area(AreaLoad load, Length tributary_width) const {
        return made([&](bc_action **out) {
            return bc_action_with_area(get(), load.si(), tributary_width.si(), out);
        });
    }

    // The same action with a load per area of floor or roof between two places.
    Action area(AreaLoad load, Length tributary_width, Length from, Length to) const {
        return made([&](bc_action **out) {
            return bc_action_with_partial_area(get(), load.si(), tributary_width.si(), from.si(),
                                               to.si(), out);
        });
    }

    // The same action with a couple, positive clockwise.
    Action couple(Moment couple, Length at) const {
        return made([&](bc_action **out) {
            return bc_action_with_couple(get(), couple.si(), at.si(), out);
        });
    }

    // The same action, known to relieve what is being checked; without this, an action is taken as
    // unfavourable.
    Action favourable() const {
        return made([&](bc_action **out) { return bc_action_favourable(get(), out); });
    }

    // The same action with its duration, by which the engineer chooses k_mod; no result depends on
    // it.
    Action duration(LoadDuration duration) const {
        return made([&](bc_action **out) {
            return bc_action_with_duration(get(), detail::code(duration), out);
        });
    }

    // The same action with its start, counted from the first day of the member. It is kept with the
    // action; the final state takes the creep of the whole life.
    Action starting(Duration start) const {
        return made([&](bc_action **out) { return bc_action_starting(get(), start.si(), out); });
    }

    // How long it acts at a time, if that was said.
    std::optional<LoadDuration> load_duration() const {
        std::int32_t has_value = 0, duration = 0;
        detail::check(bc_action_duration(get(), &has_value, &duration));
        return has_value != 0 ? std::optional(static_cast<LoadDuration>(duration)) : std::nullopt;
    }

    // When it starts, if that was said.
    std::optional<Duration> start() const {
        std::int32_t has_value = 0;
        double start = 0.0;
        detail::check(bc_action_start(get(), &has_value, &start));
        return has_value != 0 ? std::optional(Duration::from_si(start)) : std::nullopt;
    }

    bool is_favourable() const {
        return detail::count([&](std::int32_t *out) {
                   return bc_action_is_favourable(get(), out);
               }) != 0;
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
    friend Action variable(const std::string &name, Category category);

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

// A variable action with the recommended combination factors of a category, without loads yet.
inline Action variable(const std::string &name, Category category) {
    return Action::made([&](bc_action **out) {
        return bc_action_variable_of_category(detail::c_text(name, "name"), detail::code(category),
                                              out);
    });
}

} // namespace beamcore

#endif // BEAMCORE_ACTION_HPP
