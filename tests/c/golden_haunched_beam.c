// The golden case `haunched-beam` through the typed functions.
#include "golden.h"

static bc_section *section_of(double height, double z) {
    bc_material *glulam;
    bc_part *beam;
    bc_section *section;
    must(bc_material_new("glulam", 11.6e9, 0.6, &glulam));
    CHANGE(bc_material, glulam, bc_material_with_shear_modulus(glulam, 0.65e9, &made));
    CHANGE(bc_material, glulam, bc_material_with_thermal_expansion(glulam, 5e-6, &made));
    must(bc_part_rectangle("beam", 0.140, height, glulam, &beam));
    CHANGE(bc_part, beam, bc_part_at(beam, 0.0, z, &made));
    const bc_part *parts[] = {beam};
    must(bc_section_new(parts, 1, &section));
    bc_part_free(beam);
    bc_material_free(glulam);
    return section;
}

// The plan with one more support, which is freed as the plan before it.
static bc_plan *on(bc_plan *plan, bc_support *support) {
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, support, &made));
    bc_support_free(support);
    return plan;
}

static bc_plan *with_action(bc_plan *plan, bc_action *action) {
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, action, &made));
    bc_action_free(action);
    return plan;
}

static bc_plan *supported(bc_plan *plan) {
    bc_support *support;
    must(bc_support_new("wall", BC_SUPPORT_PIN, 0.0, &support));
    CHANGE(bc_support, support, bc_support_with_rotational_spring(support, 4e6, &made));
    plan = on(plan, support);
    must(bc_support_new("column", BC_SUPPORT_ROLLER, 6.0, &support));
    CHANGE(bc_support, support, bc_support_with_spring(support, 8e6, &made));
    plan = on(plan, support);
    must(bc_support_new("end", BC_SUPPORT_ROLLER, 10.0, &support));
    return on(plan, support);
}

static bc_plan *loaded(bc_plan *plan) {
    bc_action *action;
    must(bc_action_permanent("load", &action));
    CHANGE(bc_action, action, bc_action_with_uniform(action, 4000.0, &made));
    plan = with_action(plan, action);
    must(bc_action_permanent("sinking", &action));
    CHANGE(bc_action, action, bc_action_with_settlement(action, "column", 0.005, &made));
    plan = with_action(plan, action);
    must(bc_action_variable("sun", 0.6, 0.5, 0.0, &action));
    CHANGE(bc_action, action, bc_action_with_temperature_difference(action, 15.0, &made));
    return with_action(plan, action);
}

static void put_rotation(const struct golden *g, const char *combination, int32_t time,
                         const char *base) {
    char path[200];
    double value, at;
    must(bc_response_extreme(g->response, BC_FIELD_ROTATION, combination, time,
                             BC_EXTREME_GREATEST, &value, &at));
    snprintf(path, sizeof path, "%s.rotation.greatest.value_rad", base);
    put(g->name, path, value);
}

void haunched_beam(void) {
    struct golden g = {"haunched-beam", {"beam", NULL}, {"wall", "column", "end", NULL},
                       section_of(0.360, 0.0), NULL};
    bc_section *deep = section_of(0.600, -0.120);
    bc_plan *plan;
    bc_member *member;
    must(bc_plan_of_length(g.section, 10.0, &plan));
    plan = supported(plan);
    CHANGE(bc_plan, plan, bc_plan_with_shear(plan, BC_SHEAR_FLEXIBLE, &made));
    CHANGE(bc_plan, plan, bc_plan_with_taper(plan, 4.0, 6.0, deep, &made));
    CHANGE(bc_plan, plan, bc_plan_with_step(plan, 6.0, g.section, &made));
    CHANGE(bc_plan, plan, bc_plan_with_moment_hinge(plan, 8.0, &made));
    plan = loaded(plan);
    must(bc_plan_check(plan, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_states(&g, put_rotation);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_plan_free(plan);
    bc_section_free(deep);
    bc_section_free(g.section);
}
