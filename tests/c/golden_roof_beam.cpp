// The golden case `roof-beam` through the typed classes.
#include "golden.hpp"

using namespace beamcore;
using namespace beamcore::literals;

static const std::string name = "roof-beam", span = "left to right";
static const std::string leading = "characteristic, snow leading";

static Member roof() {
    const Part beam{"beam", rectangle(140_mm, 480_mm), timber("GL24h", ServiceClass::two)};
    return Member::of_length(Section{beam}, 11.2_m)
        .support(Support::pin("left", 1.2_m))
        .support(Support::roller("right", 10_m))
        .action(permanent("roof").self_weight().area(0.62_kN_per_m2, 3.2_m))
        .action(permanent("tie").favourable().couple(2.5_kN_m, 10_m))
        .action(variable("snow", Category::snow)
                    .trapezoidal(2.4_kN_per_m, 5.6_kN_per_m, 1.2_m, 10_m))
        .action(variable("men", Category::roof).point(1_kN, 5.6_m))
        .action(variable("wind", Category::wind).area(0.3_kN_per_m2, 3.2_m, 1.2_m, 10_m))
        .partial_factors({1.2, 0.9, 1.6})
        .combination({"erection", {{"roof", 1.0}, {"men", 1.5}}, false})
        .check();
}

static void put_fields(const Response &response, const std::string &combination, Time time) {
    const std::string base = "combinations[\"" + combination + "\"]." +
                             (time == Time::initial ? "initial" : "final");
    const auto deflection = response.deflection(combination, time).greatest();
    put(name, base + ".deflection.greatest.value_m", deflection.value.to_m());
    put(name, base + ".deflection.greatest.at_m", deflection.at.to_m());
    put(name, base + ".moment.greatest.value_Nm",
        response.moment(combination, time).greatest().value.to_N_m());
    for (const std::string support : {"left", "right"}) {
        put(name, base + ".reactions[\"" + support + "\"].force_N",
            response.reaction(combination, time, support).force.to_N());
    }
    put(name, base + ".stresses[\"beam\"].tension.value_Pa",
        response.stress(combination, time, "beam").greatest_tension().value.to_Pa());
    put(name, base + ".spans[\"" + span + "\"].deflection.greatest.value_m",
        response.span_deflection(combination, time, span).greatest().value.to_m());
}

static void put_components(const Response &response, const Camber &camber) {
    const std::pair<Component, const char *> components[] = {
        {Component::instant, "w_inst"}, {Component::permanent, "w_1"},
        {Component::creep, "w_2"},      {Component::variable, "w_3"},
        {Component::total, "w_tot"},    {Component::remaining, "w_max"}};
    for (const auto &[component, symbol] : components) {
        const auto line = response.deflection_component(component, leading, span, camber);
        put(name, "components[\"" + leading + "\"].spans[\"" + span + "\"]." + symbol + ".value_m",
            line.greatest().value.to_m());
    }
}

static void put_limits(const Response &response, const Camber &camber) {
    const auto checks = response.check_limits(
        {Limit::span_over(Component::remaining, 300.0),
         Limit::value(Component::instant, 35_mm).in_span(span),
         Limit::span_over(Component::total, 150.0).under("erection")},
        camber);
    for (std::size_t i = 0; i < checks.size(); ++i) {
        const std::string base = "limits[" + std::to_string(i) + "]";
        put(name, base + ".value_m", checks[i].found.value.to_m());
        put(name, base + ".utilisation", checks[i].utilisation);
    }
}

static void put_camber(const Response &response, const Camber &camber) {
    put(name, "camber.target_m", camber.target().to_m());
    put(name, "camber.rise_m", camber.rise().to_m());
    put(name, "camber.radius_m", camber.radius().value().to_m());
    const auto ordinates = camber.ordinates();
    for (std::size_t i = 0; i < ordinates.size(); ++i) {
        put(name, "camber.ordinates[" + std::to_string(i) + "].ordinate_m",
            ordinates[i].ordinate.to_m());
    }
    put(name, "camber.remaining[\"" + leading + "\"].final.greatest.value_m",
        response.remaining(leading, Time::final, camber).greatest().value.to_m());
    const auto readings = response.readings(camber, {2_m, 9.2_m, {"beam"}});
    for (std::size_t i = 0; i < readings.size(); ++i) {
        put(name, "camber.readings[" + std::to_string(i) + "].standing_m",
            readings[i].standing.to_m());
    }
}

void roof_beam() {
    const Member member = roof();
    const Response response = member.solve();
    for (const Combination &combination : member.combinations()) {
        put_fields(response, combination.name, Time::initial);
        put_fields(response, combination.name, Time::final);
    }
    const Camber camber = response.camber({Shape::arc_least_gap, "quasi-permanent", Time::final,
                                           1.2, "left", "right", 5_mm, Rounding::down, 10_mm, 8});
    put_components(response, camber);
    put_limits(response, camber);
    put_camber(response, camber);
}
