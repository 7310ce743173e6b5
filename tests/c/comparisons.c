// Simplified methods beside the exact solution of a member, and how layers act in it.
#include "chain.h"

static char text[500];
static int64_t length;

#define INTO text, (int64_t)sizeof text, &length

static bc_plan *floor_of(bc_joint *joint) {
    bc_section *section = slab_on_joist(joint);
    bc_plan *plan = NULL;
    bc_action *load = nothing();
    DONE(bc_plan_simple_span(section, 6.0, &plan));
    bc_section_free(section);
    CHANGE(bc_action, load, bc_action_with_uniform(load, 3e3, &made));
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
    bc_action_free(load);
    return plan;
}

static bc_joint *screws(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_slipping("screws", "joist", "slab", 1e9 / 7.5, &joint));
    return joint;
}

// The numbers of simplified.c and slips.c, worked out apart from this library.
static void gamma_beside_exact(const bc_response *r) {
    bc_comparison *found = NULL;
    int32_t count = -1, strains = -1;
    double value, at, exact, exact_at, difference, factor, axial, bending, force, moment;
    DONE(bc_response_compare(r, "permanent", BC_TIME_INITIAL, BC_METHOD_GAMMA, &found));
    DONE(bc_comparison_span_count(found, &count));
    CHECK(count == 1);
    DONE(bc_comparison_span_name(found, 0, INTO));
    CHECK(strcmp(text, "left to right") == 0);
    DONE(bc_comparison_span(found, 0, &value, &bending, &strains));
    CHECK(value == 6.0 && within(bending, 4.53009e6, 5.0) && strains == 0);
    DONE(bc_comparison_factor_count(found, 0, &count));
    DONE(bc_comparison_factor(found, 0, 1, &factor));
    CHECK(count == 2 && within(factor, 0.27195, 5e-6));
    DONE(bc_comparison_deflection(found, 0, &value, &at, &exact, &exact_at, &difference));
    CHECK(within(value, 11.175e-3, 5e-7) && within(exact, 11.139e-3, 5e-7));
    CHECK(near(at, 3.0) && near(exact_at, 3.0) && near(difference, value / exact - 1.0));
    DONE(bc_comparison_joint_count(found, 0, &count));
    DONE(bc_comparison_joint_name(found, 0, 0, INTO));
    CHECK(count == 1 && strcmp(text, "screws") == 0);
    DONE(bc_comparison_flow(found, 0, 0, &value, &at, &exact, &exact_at));
    CHECK(within(fabs(value), 41.41e3, 5.0) && within(fabs(exact), 36.27e3, 5.0));
    DONE(bc_comparison_layer_count(found, 0, &count));
    DONE(bc_comparison_layer_name(found, 0, 1, INTO));
    CHECK(count == 2 && strcmp(text, "slab") == 0);
    DONE(bc_comparison_stress(found, 0, 1, &axial, &bending, &at, &force, &moment));
    CHECK(within(axial, -1.479e6, 500.0) && within(bending, 3.233e6, 500.0) && near(at, 3.0));
    CHECK(within(force, -62906.0, 0.5) && moment > 0.0);
    DONE(bc_comparison_warning_count(found, 0, &count));
    DONE(bc_comparison_warning(found, 0, 0, INTO));
    CHECK(count == 1 && strstr(text, "half a sine wave") != NULL);
    FAILS(bc_comparison_span_name(found, 1, INTO), BC_ERROR_COUNT, "index");
    FAILS(bc_comparison_flow(found, 0, 1, &value, &at, &exact, &exact_at), BC_ERROR_COUNT, "index");
    bc_comparison_free(found);
    DONE(bc_response_compare(r, "permanent", BC_TIME_INITIAL, BC_METHOD_SINE_LAYERS, &found));
    DONE(bc_comparison_factor_count(found, 0, &count));
    DONE(bc_comparison_span(found, 0, &value, &bending, &strains));
    CHECK(count == 0 && within(bending, 4.53009e6, 5.0));
    bc_comparison_free(found);
}

static void misuse(const bc_response *r) {
    bc_comparison *found = NULL;
    FAILS(bc_response_compare(r, "permanent", BC_TIME_INITIAL, 3, &found), BC_ERROR_CHOICE,
          "method");
    FAILS(bc_response_compare(r, NULL, BC_TIME_INITIAL, BC_METHOD_GAMMA, &found), BC_ERROR_NULL,
          "combination");
    FAILS(bc_response_compare(r, "own", BC_TIME_INITIAL, BC_METHOD_GAMMA, &found), BC_ERROR_LOOKUP,
          "combination");
    FAILS(bc_comparison_span_name(NULL, 0, INTO), BC_ERROR_NULL, "comparison");
    CHECK(found == NULL);
    bc_comparison_free(NULL);
}

// What the methods do not cover is said.
static void not_covered(void) {
    bc_joint *joint = screws();
    CHANGE(bc_joint, joint, bc_joint_with_clearance(joint, 5e-4, &made));
    bc_plan *plan = floor_of(joint);
    bc_member *member = NULL;
    bc_response *r = NULL;
    bc_comparison *found = NULL;
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_solve(member, &r));
    FAILS(bc_response_compare(r, "permanent", BC_TIME_INITIAL, BC_METHOD_GAMMA, &found),
          BC_ERROR_VALUE, "member");
    CHECK(found == NULL);
    bc_response_free(r);
    bc_member_free(member);
    bc_plan_free(plan);
}

// One deflection or two, axial force or none, and where loads enter.
static void how_layers_act(void) {
    for (int32_t own = 0; own < 2; ++own) {
        bc_joint *joint = screws();
        if (own) {
            CHANGE(bc_joint, joint, bc_joint_with_transverse(joint, 1e8, &made));
        }
        bc_plan *plan = floor_of(joint);
        if (own) {
            CHANGE(bc_plan, plan, bc_plan_with_pitch(plan, 0.1, &made));
        }
        bc_member *member = NULL;
        int32_t has = -1;
        DONE(bc_plan_check(plan, &member));
        DONE(bc_member_has_deflections_of_layers(member, &has));
        CHECK(has == own);
        DONE(bc_member_has_axial_force(member, &has));
        CHECK(has == own);
        DONE(bc_member_entered_layer(member, INTO));
        CHECK(strcmp(text, own ? "joist" : "slab") == 0);
        bc_member_free(member);
        bc_plan_free(plan);
    }
}

int main(void) {
    bc_plan *plan = floor_of(screws());
    bc_member *member = NULL;
    bc_response *r = NULL;
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_solve(member, &r));
    gamma_beside_exact(r);
    misuse(r);
    bc_response_free(r);
    bc_member_free(member);
    bc_plan_free(plan);
    not_covered();
    how_layers_act();
    return finish();
}
