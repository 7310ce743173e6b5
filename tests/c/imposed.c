// Loads along the member, tendons, movements of supports, warming and free strains: every function,
// against formulas by hand.
#include "chain.h"

static const double L = 4.0, E = 200e9, B = 0.1, H = 0.2, ALPHA = 12e-6;
static const double EA = 200e9 * 0.1 * 0.2, EI = 200e9 * 0.1 * 0.2 * 0.2 * 0.2 / 12.0;
static const char *PM = "permanent";

static bc_section *bar(void) {
    bc_material *steel = stuff("steel", E);
    CHANGE(bc_material, steel, bc_material_with_thermal_expansion(steel, ALPHA, &made));
    bc_section *section = rectangle_of(B, H, steel);
    bc_material_free(steel);
    return section;
}

static bc_plan *simple_span(void) {
    bc_section *section = bar();
    bc_plan *plan = NULL;
    DONE(bc_plan_simple_span(section, L, &plan));
    bc_section_free(section);
    return plan;
}

// On supports of these kinds at the left and the right end.
static bc_plan *held(int32_t left, int32_t right) {
    bc_section *section = bar();
    bc_plan *plan = NULL;
    DONE(bc_plan_of_length(section, L, &plan));
    bc_section_free(section);
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "left", left, 0.0, &made));
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "right", right, L, &made));
    return plan;
}

// A roof of 0.5 rad: the level loads of the plan, and a force along it.
static void on_a_pitch(void) {
    const double pitch = 0.5, q = 1500.0;
    bc_plan *plan = simple_span();
    bc_action *snow = nothing();
    double force, couple, along;
    CHANGE(bc_plan, plan, bc_plan_with_pitch(plan, pitch, &made));
    CHANGE(bc_action, snow, bc_action_with_plan_load(snow, q, &made));
    bc_response *r = solved(plan, snow);
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, "right", &force, &couple));
    CHECK(near(force, q * L * cos(pitch) / 2.0));
    // Square to the member: q cos^2.
    CHECK(near(value_at(r, BC_FIELD_MOMENT, L / 2.0), q * cos(pitch) * cos(pitch) * L * L / 8.0));
    bc_response_free(r);
    plan = simple_span();
    snow = nothing();
    CHANGE(bc_plan, plan, bc_plan_with_pitch(plan, pitch, &made));
    CHANGE(bc_action, snow, bc_action_with_partial_plan_load(snow, q, 0.0, L / 2.0, &made));
    r = solved(plan, snow);
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, "right", &force, &couple));
    CHECK(near(force, q * L * cos(pitch) / 8.0));
    bc_response_free(r);
    bc_action *push = nothing();
    CHANGE(bc_action, push, bc_action_with_axial(push, 3e3, L, 0.0, &made));
    r = solved(simple_span(), push);
    DONE(bc_response_reaction_along(r, PM, BC_TIME_INITIAL, "left", &along));
    CHECK(near(along, -3e3) && near(value_at(r, BC_FIELD_AXIAL, 1.0), 3e3));
    bc_response_free(r);
}

// A straight tendon below the axis: N = -P and M = -P e; a parabola and a drape: up with 8 P f/L^2
// and 4 P f/L.
static void tendons(void) {
    const double p = 2e5, e = 0.06;
    const double ends[] = {0.0, L}, below[] = {-e, -e};
    const double places[] = {0.0, L / 2.0, L}, sag[] = {0.0, -e, 0.0};
    bc_action *straight = nothing(), *curved = nothing(), *draped = nothing();
    CHANGE(bc_action, straight,
           bc_action_with_draped_tendon(straight, p, ends, below, 2, &made));
    bc_response *r = solved(simple_span(), straight);
    CHECK(near(value_at(r, BC_FIELD_AXIAL, 1.0), -p));
    CHECK(near(value_at(r, BC_FIELD_MOMENT, 1.0), -p * e));
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L / 2.0), -p * e * L * L / (8.0 * EI)));
    bc_response_free(r);
    CHANGE(bc_action, curved, bc_action_with_parabolic_tendon(curved, p, places, sag, 3, &made));
    r = solved(simple_span(), curved);
    CHECK(near(value_at(r, BC_FIELD_MOMENT, L / 2.0), -p * e));
    CHECK(near(value_at(r, BC_FIELD_MOMENT, 1.0), -p * e * 0.75));
    bc_response_free(r);
    CHANGE(bc_action, draped, bc_action_with_draped_tendon(draped, p, places, sag, 3, &made));
    r = solved(simple_span(), draped);
    CHECK(near(value_at(r, BC_FIELD_MOMENT, L / 2.0), -p * e));
    CHECK(near(value_at(r, BC_FIELD_MOMENT, 1.0), -p * e * 0.5));
    bc_response_free(r);
    bc_action *none = nothing(), *no_action = NULL;
    FAILS(bc_action_with_parabolic_tendon(none, p, ends, below, 2, &no_action), BC_ERROR_COUNT,
          "point_count");
    CHECK(no_action == NULL);
    bc_action_free(none);
}

// The middle of three supports sinks by s: it loses 6 EI s/l^3, l = L/2. A fixed end turns by a:
// M = 3 EI a/L.
static void movements(void) {
    const double s = 0.01, a = 0.002, l = L / 2.0;
    bc_plan *plan = simple_span();
    bc_action *sinks = nothing(), *turns = nothing();
    double force, couple;
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "middle", BC_SUPPORT_ROLLER, l, &made));
    CHANGE(bc_action, sinks, bc_action_with_settlement(sinks, "middle", s, &made));
    bc_response *r = solved(plan, sinks);
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, "middle", &force, &couple));
    CHECK(near(force, -6.0 * EI * s / (l * l * l)));
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, l), s));
    bc_response_free(r);
    CHANGE(bc_action, turns, bc_action_with_imposed_rotation(turns, "left", a, &made));
    r = solved(held(BC_SUPPORT_FIXED, BC_SUPPORT_ROLLER), turns);
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, "left", &force, &couple));
    CHECK(near(couple, 3.0 * EI * a / L) && near(value_at(r, BC_FIELD_ROTATION, 0.0), a));
    bc_response_free(r);
}

// Held at both ends, 30 K warmer: N = -EA alpha dT. Warmer at the top by 30 K and free: it rises by
// alpha dT L^2/8h. The same curvature as a free strain.
static void strains(void) {
    const double rise = ALPHA * 30.0 * L * L / (8.0 * H);
    const char *parts[] = {"block"};
    for (int32_t named = 0; named < 2; ++named) {
        bc_action *warm = nothing();
        CHANGE(bc_action, warm, bc_action_with_temperature(warm, 30.0, parts, named, &made));
        bc_response *r = solved(held(BC_SUPPORT_PIN, BC_SUPPORT_PIN), warm);
        CHECK(near(value_at(r, BC_FIELD_AXIAL, 1.0), -EA * ALPHA * 30.0));
        bc_response_free(r);
    }
    bc_action *warmer = nothing(), *curved = nothing();
    CHANGE(bc_action, warmer, bc_action_with_temperature_difference(warmer, 30.0, &made));
    bc_response *r = solved(simple_span(), warmer);
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L / 2.0), -rise));
    CHECK(near(value_at(r, BC_FIELD_CURVATURE, 1.0), -ALPHA * 30.0 / H));
    bc_response_free(r);
    CHANGE(bc_action, curved,
           bc_action_with_free_strain(curved, "block", 1e-4, ALPHA * 30.0 / H, 0.0, &made));
    r = solved(simple_span(), curved);
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L / 2.0), rise));
    bc_response_free(r);
}

static void layers_of_actions(void) {
    char text[100] = "as it was";
    int64_t length = -1;
    int32_t has_value = -1;
    bc_action *action = nothing();
    DONE(bc_action_layer(action, &has_value, text, (int64_t)sizeof text, &length));
    CHECK(has_value == 0 && length == -1 && strcmp(text, "as it was") == 0);
    CHANGE(bc_action, action, bc_action_on(action, "slab", &made));
    has_value = -1;
    FAILS(bc_action_layer(action, &has_value, text, 4, &length), BC_ERROR_BUFFER, "capacity");
    CHECK(has_value == -1 && length == 4);
    DONE(bc_action_layer(action, &has_value, text, (int64_t)sizeof text, &length));
    CHECK(has_value == 1 && strcmp(text, "slab") == 0);
    bc_action_free(action);
}

// The core refuses, in its own words; all that is wrong is told at once.
static void mistakes(void) {
    const double places[] = {3.0, 1.0}, heights[] = {0.0, 0.0};
    const char *parts[] = {"beam"};
    bc_plan *plan = simple_span();
    bc_action *action = nothing();
    bc_member *member = NULL;
    char text[2000];
    int64_t length;
    CHANGE(bc_action, action, bc_action_with_settlement(action, "post", 0.01, &made));
    CHANGE(bc_action, action, bc_action_with_imposed_rotation(action, "left", 0.01, &made));
    CHANGE(bc_action, action, bc_action_with_temperature(action, 30.0, parts, 1, &made));
    CHANGE(bc_action, action,
           bc_action_with_draped_tendon(action, 1e5, places, heights, 2, &made));
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, action, &made));
    CHECK(bc_plan_check(plan, &member) == BC_ERROR_NAME && member == NULL);
    DONE(bc_error_text(text, (int64_t)sizeof text, &length));
    CHECK(strstr(text, "4 problems:") == text);
    CHECK(strstr(text, "the unknown support \"post\"") != NULL);
    CHECK(strstr(text, "nothing holds the rotation") != NULL);
    CHECK(strstr(text, "the unknown part \"beam\"") != NULL);
    CHECK(strstr(text, "a place to the right of the point before, at 3 m") != NULL);
    bc_action_free(action);
    bc_plan_free(plan);
}

int main(void) {
    on_a_pitch();
    tendons();
    movements();
    strains();
    layers_of_actions();
    mistakes();
    return finish();
}
