// Supports of every kind, against formulas by hand.
#include "beams.h"

static void what_supports_tell(void) {
    const char *layers[] = {"joist"};
    bc_support *s = support("post", BC_SUPPORT_ROLLER, 1.5);
    int32_t kind = 0, has_value = -1, count = -1, is_one_way = -1;
    double value = -1.0;
    DONE(bc_support_name(s, INTO));
    CHECK(strcmp(text, "post") == 0);
    DONE(bc_support_kind(s, &kind));
    DONE(bc_support_place(s, &value));
    CHECK(kind == BC_SUPPORT_ROLLER && value == 1.5);
    DONE(bc_support_spring(s, &has_value, &value));
    CHECK(has_value == 0 && value == 1.5);
    CHANGE(bc_support, s, bc_support_with_spring(s, 1e6, &made));
    CHANGE(bc_support, s, bc_support_with_axial_spring(s, 2e6, &made));
    CHANGE(bc_support, s, bc_support_with_rotational_spring(s, 3e6, &made));
    CHANGE(bc_support, s, bc_support_one_way(s, &made));
    CHANGE(bc_support, s, bc_support_at_height(s, -0.1, &made));
    CHANGE(bc_support, s, bc_support_under(s, layers, 1, &made));
    CHANGE(bc_support, s, bc_support_holding(s, "slab", 0.255, &made));
    DONE(bc_support_spring(s, &has_value, &value));
    CHECK(has_value == 1 && value == 1e6);
    DONE(bc_support_axial_spring(s, &has_value, &value));
    CHECK(has_value == 1 && value == 2e6);
    DONE(bc_support_rotational_spring(s, &has_value, &value));
    CHECK(has_value == 1 && value == 3e6);
    DONE(bc_support_is_one_way(s, &is_one_way));
    CHECK(is_one_way == 1);
    DONE(bc_support_height(s, &has_value, &value));
    CHECK(has_value == 1 && value == -0.1);
    DONE(bc_support_layer_count(s, &count));
    DONE(bc_support_layer_name(s, 0, INTO));
    CHECK(count == 1 && strcmp(text, "joist") == 0);
    DONE(bc_support_held_layer_count(s, &count));
    DONE(bc_support_held_layer_name(s, 0, INTO));
    DONE(bc_support_held_layer_height(s, 0, &value));
    CHECK(count == 1 && strcmp(text, "slab") == 0 && value == 0.255);
    bc_support_free(s);
}

// A cantilever on springs: the tip sinks by P/k + P L^2/c + P L^3/3EI.
static void springs(void) {
    bc_support *wall = support("wall", BC_SUPPORT_FIXED, 0.0);
    CHANGE(bc_support, wall, bc_support_with_spring(wall, 1e6, &made));
    CHANGE(bc_support, wall, bc_support_with_rotational_spring(wall, 4e6, &made));
    bc_response *r = solved(on(plan_of(beam(B, H)), wall), point(P, L));
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L),
               P / 1e6 + P * L * L / 4e6 + P * L * L * L / (3.0 * ei(B, H))));
    CHECK(near(value_at(r, BC_FIELD_ROTATION, 0.0), P * L / 4e6));
    CHECK(near(value_at(r, BC_FIELD_CURVATURE, 0.0), -P * L / ei(B, H)));
    // The couple that holds a load on the right turns the other way.
    CHECK(near(force_of(r, "wall"), P) && near(couple_of(r, "wall"), -P * L));
    bc_response_free(r);
}

// A force along the member goes half to each of two equal springs at its ends.
static void along(void) {
    bc_plan *plan = plan_of(beam(B, H));
    for (int i = 0; i < 2; ++i) {
        bc_support *end = support(i == 0 ? "left" : "right", BC_SUPPORT_PIN, i * L);
        CHANGE(bc_support, end, bc_support_with_axial_spring(end, 1e6, &made));
        plan = on(plan, end);
    }
    bc_action *pull = nothing();
    CHANGE(bc_action, pull, bc_action_with_axial(pull, 2.0 * P, L / 2.0, 0.0, &made));
    bc_response *r = solved(plan, pull);
    double left = 0.0, right = 0.0;
    DONE(bc_response_reaction_along(r, PM, BC_TIME_INITIAL, "left", &left));
    DONE(bc_response_reaction_along(r, PM, BC_TIME_INITIAL, "right", &right));
    CHECK(near(left, -P) && near(right, -P));
    CHECK(near(value_at(r, BC_FIELD_AXIAL, 1.0), P) && near(value_at(r, BC_FIELD_AXIAL, 3.0), -P));
    bc_response_free(r);
}

// Pins at the bottom keep it from spreading: their thrust N bends the beam up by N e.
static void pins_at_a_height(void) {
    bc_plan *plan = plan_of(beam(B, H));
    for (int i = 0; i < 2; ++i) {
        bc_support *end = support(i == 0 ? "left" : "right", BC_SUPPORT_PIN, i * L);
        CHANGE(bc_support, end, bc_support_at_height(end, -H / 2.0, &made));
        plan = on(plan, end);
    }
    bc_response *r = solved(plan, uniform(P));
    // The bottom would spread by e theta at both ends: N (L/EA + e^2 L/EI) = -e q L^3/12EI.
    const double e = H / 2.0, spread = e * P * L * L * L / (12.0 * ei(B, H));
    const double n = -spread / (L / (E * B * H) + e * e * L / ei(B, H));
    CHECK(near(value_at(r, BC_FIELD_AXIAL, 1.0), n));
    CHECK(near(value_at(r, BC_FIELD_MOMENT, L / 2.0), P * L * L / 8.0 + n * e));
    bc_response_free(r);
}

// Of a beam on three supports, a load on the overhang lifts the far end.
static void lift_off(void) {
    bc_support *left = support("left", BC_SUPPORT_PIN, 0.0);
    CHANGE(bc_support, left, bc_support_one_way(left, &made));
    bc_plan *plan = on(on(on(plan_of(beam(B, H)), left), support("middle", BC_SUPPORT_PIN, 1.0)),
                       support("right", BC_SUPPORT_ROLLER, 3.0));
    bc_response *r = solved(plan, point(P, 2.0));
    int32_t count = -1;
    DONE(bc_response_lifted_count(r, PM, BC_TIME_INITIAL, &count));
    CHECK(count == 1);
    DONE(bc_response_lifted_name(r, PM, BC_TIME_INITIAL, 0, INTO));
    CHECK(strcmp(text, "left") == 0 && force_of(r, "left") == 0.0);
    CHECK(near(force_of(r, "right"), P / 2.0));
    FAILS(bc_response_lifted_name(r, PM, BC_TIME_INITIAL, 1, INTO), BC_ERROR_COUNT, "index");
    bc_response_free(r);
}

int main(void) {
    what_supports_tell();
    springs();
    along();
    pins_at_a_height();
    lift_off();
    return finish();
}
