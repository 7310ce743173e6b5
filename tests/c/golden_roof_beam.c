// The golden case `roof-beam` through the typed functions.
#include "golden.h"

static const char *const CASE = "roof-beam", *const SPAN = "left to right";
static const char *const SNOW = "characteristic, snow leading";

// Gives an action its next form and frees the one before.
static void become(bc_action **action, bc_action *made) {
    bc_action_free(*action);
    *action = made;
}

static void grow(bc_plan **plan, bc_plan *made) {
    bc_plan_free(*plan);
    *plan = made;
}

static void make_actions(bc_action *actions[5]) {
    bc_action *made;
    must(bc_action_permanent("roof", &actions[0]));
    must(bc_action_with_self_weight(actions[0], &made));
    become(&actions[0], made);
    must(bc_action_with_area(actions[0], 620.0, 3.2, &made));
    become(&actions[0], made);
    must(bc_action_permanent("tie", &actions[1]));
    must(bc_action_favourable(actions[1], &made));
    become(&actions[1], made);
    must(bc_action_with_couple(actions[1], 2500.0, 10.0, &made));
    become(&actions[1], made);
    must(bc_action_variable_of_category("snow", BC_CATEGORY_SNOW, &actions[2]));
    must(bc_action_with_trapezoidal(actions[2], 2400.0, 5600.0, 1.2, 10.0, &made));
    become(&actions[2], made);
    must(bc_action_variable_of_category("men", BC_CATEGORY_ROOF, &actions[3]));
    must(bc_action_with_point(actions[3], 1000.0, 5.6, &made));
    become(&actions[3], made);
    must(bc_action_variable_of_category("wind", BC_CATEGORY_WIND, &actions[4]));
    must(bc_action_with_partial_area(actions[4], 300.0, 3.2, 1.2, 10.0, &made));
    become(&actions[4], made);
}

static bc_member *make_member(void) {
    bc_material *gl24h;
    bc_part *beam;
    bc_section *section;
    bc_action *actions[5];
    bc_plan *plan, *made;
    bc_member *member;
    const char *names[] = {"roof", "men"};
    const double factors[] = {1.0, 1.5};
    must(bc_material_timber("GL24h", 2, &gl24h));
    must(bc_part_rectangle("beam", 0.140, 0.480, gl24h, &beam));
    const bc_part *parts[] = {beam};
    must(bc_section_new(parts, 1, &section));
    must(bc_plan_of_length(section, 11.2, &plan));
    must(bc_plan_with_support(plan, "left", BC_SUPPORT_PIN, 1.2, &made));
    grow(&plan, made);
    must(bc_plan_with_support(plan, "right", BC_SUPPORT_ROLLER, 10.0, &made));
    grow(&plan, made);
    make_actions(actions);
    for (int i = 0; i < 5; ++i) {
        must(bc_plan_with_action(plan, actions[i], &made));
        grow(&plan, made);
        bc_action_free(actions[i]);
    }
    must(bc_plan_with_partial_factors(plan, 1.2, 0.9, 1.6, &made));
    grow(&plan, made);
    must(bc_plan_with_combination(plan, "erection", names, factors, 2, 0, &made));
    grow(&plan, made);
    must(bc_plan_check(plan, &member));
    bc_plan_free(plan);
    bc_section_free(section);
    bc_part_free(beam);
    bc_material_free(gl24h);
    return member;
}

static void put_fields(const bc_response *r, const char *combination, int32_t time) {
    static const char *const supports[] = {"left", "right"};
    char base[100], path[300];
    double value, at, y, z;
    snprintf(base, sizeof base, "combinations[\"%s\"].%s", combination,
             time == BC_TIME_INITIAL ? "initial" : "final");
    must(bc_response_extreme(r, BC_FIELD_DEFLECTION, combination, time, BC_EXTREME_GREATEST, &value,
                             &at));
    snprintf(path, sizeof path, "%s.deflection.greatest.value_m", base);
    put(CASE, path, value);
    snprintf(path, sizeof path, "%s.deflection.greatest.at_m", base);
    put(CASE, path, at);
    must(bc_response_extreme(r, BC_FIELD_MOMENT, combination, time, BC_EXTREME_GREATEST, &value,
                             &at));
    snprintf(path, sizeof path, "%s.moment.greatest.value_Nm", base);
    put(CASE, path, value);
    for (int i = 0; i < 2; ++i) {
        must(bc_response_reaction(r, combination, time, supports[i], &value, &at));
        snprintf(path, sizeof path, "%s.reactions[\"%s\"].force_N", base, supports[i]);
        put(CASE, path, value);
    }
    must(bc_response_stress(r, combination, time, "beam", BC_STRESS_TENSION, &value, &at, &y,
                            &z));
    snprintf(path, sizeof path, "%s.stresses[\"beam\"].tension.value_Pa", base);
    put(CASE, path, value);
    must(bc_response_span_extreme(r, combination, time, SPAN, BC_EXTREME_GREATEST, &value, &at));
    snprintf(path, sizeof path, "%s.spans[\"%s\"].deflection.greatest.value_m", base, SPAN);
    put(CASE, path, value);
}

static void put_components(const bc_response *r, const bc_camber *camber) {
    static const char *const symbols[] = {"w_inst", "w_1", "w_2", "w_3", "w_tot", "w_max"};
    static const int32_t components[] = {BC_COMPONENT_INSTANT,  BC_COMPONENT_PERMANENT,
                                         BC_COMPONENT_CREEP,    BC_COMPONENT_VARIABLE,
                                         BC_COMPONENT_TOTAL,    BC_COMPONENT_REMAINING};
    char path[300];
    double value, at;
    for (int i = 0; i < 6; ++i) {
        must(bc_response_component_extreme(r, components[i], SNOW, SPAN, camber,
                                           BC_EXTREME_GREATEST, &value, &at));
        snprintf(path, sizeof path, "components[\"%s\"].spans[\"%s\"].%s.value_m", SNOW, SPAN,
                 symbols[i]);
        put(CASE, path, value);
    }
}

static void put_limits(const bc_response *r, const bc_camber *camber) {
    bc_limit *limits[3], *plain;
    bc_checks *checks;
    int32_t count;
    char path[100];
    must(bc_limit_span_over(BC_COMPONENT_REMAINING, 300.0, &limits[0]));
    must(bc_limit_value(BC_COMPONENT_INSTANT, 0.035, &plain));
    must(bc_limit_in_span(plain, SPAN, &limits[1]));
    bc_limit_free(plain);
    must(bc_limit_span_over(BC_COMPONENT_TOTAL, 150.0, &plain));
    must(bc_limit_under(plain, "erection", &limits[2]));
    bc_limit_free(plain);
    const bc_limit *all[] = {limits[0], limits[1], limits[2]};
    must(bc_response_check_limits(r, all, 3, camber, &checks));
    must(bc_checks_count(checks, &count));
    for (int32_t i = 0; i < count; ++i) {
        double value, at, allowed, utilisation;
        must(bc_checks_values(checks, i, &value, &at, &allowed, &utilisation));
        snprintf(path, sizeof path, "limits[%d].value_m", (int)i);
        put(CASE, path, value);
        snprintf(path, sizeof path, "limits[%d].utilisation", (int)i);
        put(CASE, path, utilisation);
    }
    bc_checks_free(checks);
    for (int i = 0; i < 3; ++i) {
        bc_limit_free(limits[i]);
    }
}

static void put_camber(const bc_response *r, const bc_camber *camber) {
    const char *parts[] = {"beam"};
    bc_readings *readings;
    int32_t count, has_value;
    double value, at, lying;
    char path[100];
    must(bc_camber_target(camber, &value));
    put(CASE, "camber.target_m", value);
    must(bc_camber_rise(camber, &value));
    put(CASE, "camber.rise_m", value);
    must(bc_camber_radius(camber, &has_value, &value));
    put(CASE, "camber.radius_m", has_value == 1 ? value : NAN);
    must(bc_camber_ordinate_count(camber, &count));
    for (int32_t i = 0; i < count; ++i) {
        must(bc_camber_ordinate(camber, i, &at, &value));
        snprintf(path, sizeof path, "camber.ordinates[%d].ordinate_m", (int)i);
        put(CASE, path, value);
    }
    must(bc_response_remaining_extreme(r, SNOW, BC_TIME_FINAL, camber, BC_EXTREME_GREATEST, &value,
                                       &at));
    snprintf(path, sizeof path, "camber.remaining[\"%s\"].final.greatest.value_m", SNOW);
    put(CASE, path, value);
    must(bc_response_readings(r, camber, 2.0, 9.2, parts, 1, &readings));
    must(bc_readings_count(readings, &count));
    for (int32_t i = 0; i < count; ++i) {
        must(bc_readings_reading(readings, i, &at, &lying, &value));
        snprintf(path, sizeof path, "camber.readings[%d].standing_m", (int)i);
        put(CASE, path, value);
    }
    bc_readings_free(readings);
}

void roof_beam(void) {
    bc_member *member = make_member();
    bc_response *response;
    bc_camber *camber;
    int32_t count;
    must(bc_member_solve(member, &response));
    must(bc_member_combination_count(member, &count));
    for (int32_t i = 0; i < count; ++i) {
        char name[100];
        int64_t length;
        must(bc_member_combination_name(member, i, name, (int64_t)sizeof name, &length));
        put_fields(response, name, BC_TIME_INITIAL);
        put_fields(response, name, BC_TIME_FINAL);
    }
    must(bc_camber_new(response, BC_SHAPE_ARC_LEAST_GAP, "quasi-permanent", BC_TIME_FINAL, 1.2,
                       "left", "right", 0.005, BC_ROUNDING_DOWN, 0.010, 8, &camber));
    put_components(response, camber);
    put_limits(response, camber);
    put_camber(response, camber);
    bc_camber_free(camber);
    bc_response_free(response);
    bc_member_free(member);
}
