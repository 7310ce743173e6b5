// Wrong uses of the functions for layers, supports and fields: NULL, choices, counts, freeing.
#include "chain.h"

static double a, b, c;
static int32_t n;
static int64_t length;
static char text[10];
static bc_section *section;
static bc_support *support;
static bc_action *load;
static bc_plan *plan;
static bc_member *member;
static bc_response *response;
static bc_field *field;

static void set_up(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_slipping("screws", "joist", "slab", 1e8, &joint));
    section = slab_on_joist(joint);
    DONE(bc_support_new("post", BC_SUPPORT_ROLLER, 2.0, &support));
    load = nothing();
    CHANGE(bc_action, load, bc_action_with_uniform(load, 2e3, &made));
    DONE(bc_plan_simple_span(section, 4.0, &plan));
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_solve(member, &response));
    DONE(bc_response_field(response, BC_FIELD_MOMENT, "permanent", BC_TIME_FINAL, &field));
}

#define IS_NULL(call, parameter) FAILS(call, BC_ERROR_NULL, parameter)

static void null_pointers(void) {
    const char *pm = "permanent";
    const char *names[] = {NULL};
    const bc_layer *layers[] = {NULL};
    const double places[] = {0.0};
    bc_layer *layer = NULL;
    bc_joint *joint = NULL;
    bc_section *s = NULL;
    bc_support *p = NULL;
    bc_action *q = NULL;
    bc_plan *g = NULL;
    bc_field *f = NULL;
    IS_NULL(bc_layer_new("x", names, 1, &layer), "part_names[0]");
    IS_NULL(bc_layer_new("x", NULL, 1, &layer), "part_names");
    IS_NULL(bc_layer_between(NULL, 0.0, 1.0, &layer), "layer");
    IS_NULL(bc_layer_extent(NULL, &n, &a, &b), "layer");
    IS_NULL(bc_joint_rigid("x", NULL, "slab", &joint), "lower");
    IS_NULL(bc_joint_slipping("x", "joist", NULL, 1e8, &joint), "upper");
    IS_NULL(bc_joint_of_fasteners_in_bands("x", "joist", "slab", 1e6, 1, 1, places, NULL, places, 1,
                                           &joint),
            "band_to_m");
    IS_NULL(bc_joint_with_gap(NULL, 0.1, &joint), "joint");
    IS_NULL(bc_joint_kind(NULL, &n), "joint");
    IS_NULL(bc_section_layered(NULL, 0, layers, 1, NULL, 0, &s), "layers[0]");
    IS_NULL(bc_section_between(section, NULL, 0.5, &s), "other");
    IS_NULL(bc_section_shear_stiffness(section, BC_TIME_FINAL, NULL), "shear_stiffness_N_out");
    IS_NULL(bc_section_joint_place(section, "screws", &a, &b, NULL), "width_m_out");
    IS_NULL(bc_section_joint_slip_modulus(section, NULL, 1.0, BC_TIME_FINAL, &n, &a), "joint");
    IS_NULL(bc_section_joint_slip_modulus(section, "screws", 1.0, BC_TIME_FINAL, NULL, &a),
            "has_value_out");
    IS_NULL(bc_support_new(NULL, BC_SUPPORT_PIN, 0.0, &p), "name");
    IS_NULL(bc_support_under(support, names, 1, &p), "layer_names[0]");
    IS_NULL(bc_support_holding(support, NULL, 0.0, &p), "layer");
    IS_NULL(bc_support_one_way(NULL, &p), "support");
    IS_NULL(bc_action_on(load, NULL, &q), "layer");
    IS_NULL(bc_action_with_draped_tendon(load, 1e3, NULL, places, 1, &q), "at_m");
    IS_NULL(bc_action_with_parabolic_tendon(load, 1e3, places, NULL, 1, &q), "height_m");
    IS_NULL(bc_action_with_settlement(load, NULL, 0.01, &q), "support");
    IS_NULL(bc_action_with_free_strain(load, NULL, 0.0, 0.0, 0.0, &q), "part");
    IS_NULL(bc_plan_on_support(plan, NULL, &g), "support");
    IS_NULL(bc_plan_with_step(plan, 1.0, NULL, &g), "section");
    IS_NULL(bc_plan_with_taper(NULL, 1.0, 2.0, section, &g), "plan");
    IS_NULL(bc_plan_with_butt_joint(plan, NULL, 1.0, &g), "layer");
    IS_NULL(bc_plan_with_anchor(plan, "x", NULL, 1.0, &g), "joint");
    IS_NULL(bc_plan_with_pitch(plan, 0.1, NULL), "plan_out");
    IS_NULL(bc_member_section_at(NULL, 1.0, &s), "member");
    IS_NULL(bc_member_pitch(member, &n, NULL), "pitch_rad_out");
    IS_NULL(bc_member_change(NULL, 0, &n, &a, &b), "member");
    IS_NULL(bc_response_joint_field(response, 1, pm, 1, NULL, &f), "joint");
    IS_NULL(bc_response_layer_field(response, 1, NULL, 1, "slab", &f), "combination");
    IS_NULL(bc_field_extreme(NULL, 1, &a, &b), "field");
    IS_NULL(bc_field_values(field, 1, NULL, 1, &a), "x_m");
    IS_NULL(bc_field_values(field, 1, places, 1, NULL), "values_out");
    IS_NULL(bc_response_composite_action(response, pm, 1, &a, &b, &c, NULL, &b, &c),
            "deflection_m_out");
    IS_NULL(bc_response_layer_reaction(response, pm, 1, "left", NULL, &a), "layer");
    IS_NULL(bc_response_anchor_force(response, pm, 1, NULL, &a), "anchor");
    IS_NULL(bc_response_lifted_name(response, pm, 1, 0, text, 10, NULL), "length_out");
    IS_NULL(bc_response_steps(response, pm, 1, NULL), "count_out");
    CHECK(layer == NULL && joint == NULL && s == NULL && p == NULL && q == NULL && g == NULL);
    CHECK(f == NULL);
}

#define NO_CHOICE(call, parameter) FAILS(call, BC_ERROR_CHOICE, parameter)

static void choices(void) {
    const char *pm = "permanent";
    const double places[] = {0.0};
    bc_support *p = NULL;
    bc_plan *g = NULL;
    bc_field *f = NULL;
    NO_CHOICE(bc_support_new("x", 4, 0.0, &p), "support_kind");
    NO_CHOICE(bc_plan_with_shear(plan, BC_SHEAR_GIVEN, &g), "shear_model");
    NO_CHOICE(bc_section_shear_stiffness(section, 0, &a), "time");
    NO_CHOICE(bc_response_field(response, 8, pm, 1, &f), "field");
    NO_CHOICE(bc_response_joint_field(response, 0, pm, 1, "screws", &f), "joint_field");
    NO_CHOICE(bc_response_layer_field(response, 4, pm, 1, "slab", &f), "layer_field");
    NO_CHOICE(bc_field_extreme(field, 0, &a, &b), "extreme");
    NO_CHOICE(bc_field_values(field, 0, places, 1, &a), "side");
    NO_CHOICE(bc_reference_length(0, 1.0, &a), "length_kind");
    CHECK(p == NULL && g == NULL && f == NULL);
}

#define NO_COUNT(call, parameter) FAILS(call, BC_ERROR_COUNT, parameter)

static void counts(void) {
    bc_layer *layer = NULL;
    bc_joint *joint = NULL;
    bc_support *p = NULL;
    bc_action *q = NULL;
    NO_COUNT(bc_layer_new("x", NULL, -1, &layer), "count of part_names");
    NO_COUNT(bc_section_layer(section, 2, &layer), "index");
    NO_COUNT(bc_section_joint(section, -1, &joint), "index");
    NO_COUNT(bc_section_merged_layer_size(section, 2, &n), "index");
    NO_COUNT(bc_section_joint_station(section, "screws", 0, &a), "index");
    NO_COUNT(bc_support_layer_name(support, 0, text, 10, &length), "index");
    NO_COUNT(bc_support_held_layer_height(support, 0, &a), "index");
    NO_COUNT(bc_action_with_temperature(load, 1.0, NULL, -1, &q), "count of part_names");
    NO_COUNT(bc_member_support(member, 2, &p), "index");
    NO_COUNT(bc_member_change(member, 0, &n, &a, &b), "index");
    NO_COUNT(bc_member_hinge(member, 0, &n, &a), "index");
    NO_COUNT(bc_member_anchor(member, 0, &a, &n, &b), "index");
    NO_COUNT(bc_field_values(field, 1, &a, 0, &b), "count");
    NO_COUNT(bc_field_station(field, -1, &a), "index");
    NO_COUNT(bc_effective_spacing_warning(0.1, 0.1, 0, text, 10, &length), "index");
    CHECK(layer == NULL && joint == NULL && p == NULL && q == NULL);
}

static void free_in_any_order(void) {
    bc_section_free(section);
    bc_member_free(member);
    bc_response_free(response);
    DONE(bc_field_extreme(field, BC_EXTREME_GREATEST, &a, &b));
    CHECK(near(a, 2e3 * 4.0 * 4.0 / 8.0) && near(b, 2.0));
    bc_field_free(field);
    bc_plan_free(plan);
    bc_support_free(support);
    bc_action_free(load);
    bc_layer_free(NULL);
    bc_joint_free(NULL);
    bc_support_free(NULL);
    bc_field_free(NULL);
    bc_layer_input_free(NULL);
    bc_simplified_free(NULL);
}

int main(void) {
    set_up();
    null_pointers();
    choices();
    counts();
    free_in_any_order();
    return finish();
}
