// Actions and their loads.
#ifndef BEAMCORE_ACTION_HPP
#define BEAMCORE_ACTION_HPP

#include "category.hpp"
#include "part.hpp"
#include "tendon.hpp"

namespace beamcore {

// A named action: what acts together, from one cause. Loads are positive downward, forces along the
// member to the right.
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

    // The same action with a line load per length of the plan, as snow on a pitched member; over
    // the whole member or between two places along it.
    Action plan(LineLoad load) const {
        return made(
            [&](bc_action **out) { return bc_action_with_plan_load(get(), load.si(), out); });
    }
    Action plan(LineLoad load, Length from, Length to) const {
        return made([&](bc_action **out) {
            return bc_action_with_partial_plan_load(get(), load.si(), from.si(), to.si(), out);
        });
    }

    // The same action with a force along the member at a height of the section.
    Action axial(Force load, Length at, Length height) const {
        return made([&](bc_action **out) {
            return bc_action_with_axial(get(), load.si(), at.si(), height.si(), out);
        });
    }

    // The same action with a tendon that pulls its two anchors towards each other.
    Action prestress(Force force, const Draped &tendon) const {
        return with_tendon(bc_action_with_draped_tendon, force, tendon.points);
    }
    Action prestress(Force force, const Parabolic &tendon) const {
        return with_tendon(bc_action_with_parabolic_tendon, force, tendon.points);
    }

    // The same action with a support that sinks, positive downward.
    Action settlement(const std::string &support, Length settlement) const {
        return made([&](bc_action **out) {
            return bc_action_with_settlement(get(), detail::c_text(support, "support"),
                                             settlement.si(), out);
        });
    }

    // The same action with a support that turns the section with it, positive clockwise.
    Action imposed_rotation(const std::string &support, Angle rotation) const {
        return made([&](bc_action **out) {
            return bc_action_with_imposed_rotation(get(), detail::c_text(support, "support"),
                                                   rotation.si(), out);
        });
    }

    // The same action with a change of temperature, positive where warmer, of the parts of these
    // names; of none means of all.
    Action temperature(TemperatureChange change,
                       const std::vector<std::string> &parts = {}) const {
        return made([&](bc_action **out) {
            const auto names = detail::c_texts(parts, "part_names");
            return bc_action_with_temperature(get(), change.si(), names.data(),
                                              detail::size(names.size()), out);
        });
    }

    // The same action with a top of the section that is warmer than its bottom, linearly between
    // them, with the mean over the height unchanged.
    Action temperature_difference(TemperatureChange difference) const {
        return made([&](bc_action **out) {
            return bc_action_with_temperature_difference(get(), difference.si(), out);
        });
    }

    // The same action with a free strain of a part: moisture, shrinkage, a built-in curvature.
    Action free_strain(const std::string &part, const InitialStrain &strain) const {
        return made([&](bc_action **out) {
            return bc_action_with_free_strain(get(), detail::c_text(part, "part"),
                                              strain.axial.si(), strain.curvature_y.si(),
                                              strain.curvature_z.si(), out);
        });
    }

    // The same action with all its loads entering the layer of this name; without it, they enter
    // Member::entered_layer().
    Action on(const std::string &layer) const {
        return made([&](bc_action **out) {
            return bc_action_on(get(), detail::c_text(layer, "layer"), out);
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

    // The layer that its loads enter, if one was named.
    std::optional<std::string> layer() const {
        return detail::optional_text(
            [&](std::int32_t *has, char *buffer, std::int64_t capacity, std::int64_t *length) {
                return bc_action_layer(get(), has, buffer, capacity, length);
            });
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

    template <class Call, class Points>
    Action with_tendon(Call call, Force force, const Points &points) const {
        std::vector<double> at, height;
        for (const TendonPoint &point : points) {
            at.push_back(point.at.si());
            height.push_back(point.height.si());
        }
        return made([&](bc_action **out) {
            return call(get(), force.si(), at.data(), height.data(), detail::size(at.size()), out);
        });
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
