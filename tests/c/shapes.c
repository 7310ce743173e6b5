// Members with supports of every kind, changes of section, hinges, shear and pitch: every function,
// against formulas by hand.
#include "chain.h"

static const double L = 4.0, E = 12e9, B = 0.1, H = 0.2, P = 5e3;
static const char *PM = "permanent";
static char text[300];
static int64_t length;

#define INTO text, (int64_t)sizeof text, &length

static bc_material *wood(void) {
    bc_material *material = stuff("wood", E);
    CHANGE(bc_material, material, bc_material_with_shear_modulus(material, 0.75e9, &made));
    return material;
}

static bc_section *beam(double width, double height) {
    bc_material *material = wood();
    bc_section *section = rectangle_of(width, height, material);
    bc_material_free(material);
    return section;
}

static double ei(double width, double height) {
    return E * width * height * height * height / 12.0;
}

static bc_plan *plan_of(bc_section *section) {
    bc_plan *plan = NULL;
    DONE(bc_plan_of_length(section, L, &plan));
    bc_section_free(section);
    return plan;
}

static bc_support *support(const char *name, int32_t kind, double place) {
    bc_support *made_support = NULL;
    DONE(bc_support_new(name, kind, place, &made_support));
    return made_support;
}

// The plan on one more support; the plan before it and the support are freed.
static bc_plan *on(bc_plan *plan, bc_support *under) {
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, under, &made));
    bc_support_free(under);
    return plan;
}

static bc_action *point(double load, double place) {
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_point(action, load, place, &made));
    return action;
}

static bc_action *uniform(double load) {
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_uniform(action, load, &made));
    return action;
}

static double force_of(const bc_response *r, const char *name) {
    double force = NAN, couple = NAN;
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, name, &force, &couple));
    return force;
}

static double couple_of(const bc_response *r, const char *name) {
    double force = NAN, couple = NAN;
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, name, &force, &couple));
    return couple;
}

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

// A cantilever that is thinner from 1.5 m on: P (L^3 - b^3)/3EI_1 + P b^3/3EI_2, b = 2.5 m.
static void a_step(void) {
    bc_section *thin = beam(B, H / 2.0);
    bc_plan *plan = on(plan_of(beam(B, H)), support("wall", BC_SUPPORT_FIXED, 0.0));
    CHANGE(bc_plan, plan, bc_plan_with_step(plan, 1.5, thin, &made));
    bc_section_free(thin);
    bc_response *r = solved(plan, point(P, L));
    CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L),
               P * (64.0 - 15.625) / (3.0 * ei(B, H)) + P * 15.625 / (3.0 * ei(B, H / 2.0))));
    bc_response_free(r);
}

// A cantilever whose width falls linearly from 2B to B: EI(s) = EI_B (1 + s/L) from the tip on, so
// that w = P L^3/EI_B (ln 2 - 1/2).
static void a_taper(void) {
    bc_section *tip = beam(B, H);
    bc_plan *plan = on(plan_of(beam(2.0 * B, H)), support("wall", BC_SUPPORT_FIXED, 0.0));
    CHANGE(bc_plan, plan, bc_plan_with_taper(plan, 0.0, L, tip, &made));
    bc_section_free(tip);
    bc_response *r = solved(plan, point(P, L));
    const double w = P * L * L * L / ei(B, H) * (log(2.0) - 0.5);
    CHECK(within(value_at(r, BC_FIELD_DEFLECTION, L), w, 1e-10 * w));
    bc_response_free(r);
}

// What a member tells of its shape.
static void what_members_tell(void) {
    bc_section *thick = beam(B, 2.0 * H), *found = NULL;
    bc_plan *plan = on(on(plan_of(beam(B, H)), support("left", BC_SUPPORT_PIN, 0.0)),
                       support("right", BC_SUPPORT_ROLLER, L));
    CHANGE(bc_plan, plan, bc_plan_with_taper(plan, 1.0, 2.0, thick, &made));
    CHANGE(bc_plan, plan, bc_plan_with_step(plan, 3.0, thick, &made));
    CHANGE(bc_plan, plan, bc_plan_with_pitch(plan, 0.25, &made));
    bc_section_free(thick);
    bc_action *load = uniform(P);
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
    bc_action_free(load);
    bc_member *member = NULL;
    bc_support *right = NULL;
    int32_t count = -1, kind = 0, has_value = -1, model = 0;
    double from = -1.0, to = -1.0, pitch = -1.0, left, area, bottom, top;
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_change_count(member, &count));
    CHECK(count == 2);
    DONE(bc_member_change(member, 0, &kind, &from, &to));
    CHECK(kind == BC_CHANGE_TAPER && from == 1.0 && to == 2.0);
    DONE(bc_member_change(member, 1, &kind, &from, &to));
    CHECK(kind == BC_CHANGE_STEP && from == 3.0 && to == 3.0);
    DONE(bc_member_section_at(member, 1.5, &found));
    DONE(bc_section_part_edges(found, "block", &left, &from, &bottom, &top, &area));
    CHECK(near(top - bottom, 1.5 * H));
    bc_section_free(found);
    DONE(bc_member_part_count(member, &count));
    DONE(bc_member_part_name(member, 0, INTO));
    CHECK(count == 1 && strcmp(text, "block") == 0);
    DONE(bc_member_support_count(member, &count));
    DONE(bc_member_support(member, 1, &right));
    DONE(bc_support_name(right, INTO));
    CHECK(count == 2 && strcmp(text, "right") == 0);
    bc_support_free(right);
    DONE(bc_member_pitch(member, &has_value, &pitch));
    CHECK(has_value == 1 && pitch == 0.25);
    DONE(bc_member_shear(member, &model));
    CHECK(model == BC_SHEAR_RIGID);
    DONE(bc_member_given_shear(member, &has_value, &pitch));
    CHECK(has_value == 0 && pitch == 0.25);
    found = NULL;
    FAILS(bc_member_section_at(member, 5.0, &found), BC_ERROR_POSITION, "at");
    CHECK(found == NULL);
    bc_member_free(member);
    bc_plan_free(plan);
}

// Fixed at the left, with a hinge at 1 m: what is right of it is a simple span of 3 m.
static void hinges(void) {
    bc_plan *plan = on(on(plan_of(beam(B, H)), support("wall", BC_SUPPORT_FIXED, 0.0)),
                       support("right", BC_SUPPORT_ROLLER, L));
    bc_plan *sheared = NULL;
    DONE(bc_plan_with_shear_hinge(plan, 1.0, &sheared));
    CHANGE(bc_plan, plan, bc_plan_with_moment_hinge(plan, 1.0, &made));
    bc_action *load = uniform(P);
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
    bc_action_free(load);
    bc_member *member = NULL;
    bc_response *r = NULL;
    int32_t count = -1, kind = 0, has_value = -1;
    double place = -1.0;
    DONE(bc_plan_check(plan, &member));
    bc_plan_free(plan);
    DONE(bc_member_hinge_count(member, &count));
    DONE(bc_member_hinge(member, 0, &kind, &place));
    CHECK(count == 1 && kind == BC_HINGE_MOMENT && place == 1.0);
    strcpy(text, "as it was");
    DONE(bc_member_hinge_layer(member, 0, &has_value, INTO));
    CHECK(has_value == 0 && strcmp(text, "as it was") == 0);
    DONE(bc_member_solve(member, &r));
    bc_member_free(member);
    CHECK(near(force_of(r, "right"), 1.5 * P));
    CHECK(within(value_at(r, BC_FIELD_MOMENT, 1.0), 0.0, 1e-9 * P));
    bc_response_free(r);
    // Through the shear release nothing passes: the point load goes to the wall alone.
    r = solved(sheared, point(P, 0.5));
    CHECK(near(force_of(r, "wall"), P) && within(force_of(r, "right"), 0.0, 1e-9 * P));
    bc_response_free(r);
}

// 5 q L^4/384EI + q L^2/8kGA, kGA = 5/6 G A, by each way of telling it.
static void shear(void) {
    const double kga = 5.0 / 6.0 * 0.75e9 * B * H;
    const double w = 5.0 * P * L * L * L * L / (384.0 * ei(B, H)) + P * L * L / (8.0 * kga);
    for (int given = 0; given < 2; ++given) {
        bc_section *section = beam(B, H);
        bc_plan *plan = NULL;
        DONE(bc_plan_simple_span(section, L, &plan));
        bc_section_free(section);
        if (given) {
            CHANGE(bc_plan, plan, bc_plan_with_given_shear(plan, kga, &made));
        } else {
            CHANGE(bc_plan, plan, bc_plan_with_shear(plan, BC_SHEAR_FLEXIBLE, &made));
        }
        bc_action *load = uniform(P);
        CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
        bc_action_free(load);
        bc_member *member = NULL;
        bc_response *r = NULL;
        int32_t model = 0, has_value = -1;
        double value = -1.0;
        DONE(bc_plan_check(plan, &member));
        DONE(bc_member_shear(member, &model));
        CHECK(model == (given ? BC_SHEAR_GIVEN : BC_SHEAR_FLEXIBLE));
        DONE(bc_member_given_shear(member, &has_value, &value));
        CHECK(has_value == given && value == (given ? kga : -1.0));
        DONE(bc_member_solve(member, &r));
        CHECK(near(value_at(r, BC_FIELD_DEFLECTION, L / 2.0), w));
        bc_response_free(r);
        bc_member_free(member);
        bc_plan_free(plan);
    }
}

int main(void) {
    what_supports_tell();
    springs();
    along();
    pins_at_a_height();
    lift_off();
    a_step();
    a_taper();
    what_members_tell();
    hinges();
    shear();
    return finish();
}
