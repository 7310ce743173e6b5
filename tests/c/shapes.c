// Members with changes of section, hinges, shear and pitch, against formulas by hand.
#include "beams.h"

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
    a_step();
    a_taper();
    what_members_tell();
    hinges();
    shear();
    return finish();
}
