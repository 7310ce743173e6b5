// The golden case `rafter` through the typed functions.
#include "golden.h"

static bc_section *make_section(void) {
    bc_material *wood;
    bc_part *rafter;
    bc_section *section;
    must(bc_material_new("wood", 11e9, 0.6, &wood));
    must(bc_part_rectangle("rafter", 0.080, 0.220, wood, &rafter));
    const bc_part *parts[] = {rafter};
    must(bc_section_new(parts, 1, &section));
    bc_part_free(rafter);
    bc_material_free(wood);
    return section;
}

static bc_plan *with_action(bc_plan *plan, bc_action *action) {
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, action, &made));
    bc_action_free(action);
    return plan;
}

static bc_plan *loaded(bc_plan *plan) {
    const double ends[] = {0.0, 5.0}, below[] = {-0.050, -0.050};
    bc_action *action;
    must(bc_action_permanent("roof", &action));
    CHANGE(bc_action, action, bc_action_with_uniform(action, 400.0, &made));
    CHANGE(bc_action, action, bc_action_with_axial(action, -6000.0, 5.0, 0.0, &made));
    plan = with_action(plan, action);
    must(bc_action_permanent("tendon", &action));
    CHANGE(bc_action, action,
           bc_action_with_draped_tendon(action, 10e3, ends, below, 2, &made));
    plan = with_action(plan, action);
    must(bc_action_variable("snow", 0.5, 0.2, 0.0, &action));
    CHANGE(bc_action, action, bc_action_with_plan_load(action, 1500.0, &made));
    return with_action(plan, action);
}

static void put_along(const struct golden *g, const char *combination, int32_t time,
                      const char *base) {
    char path[200];
    double value, at;
    must(bc_response_extreme(g->response, BC_FIELD_AXIAL, combination, time, BC_EXTREME_GREATEST,
                             &value, &at));
    snprintf(path, sizeof path, "%s.axial.greatest.value_N", base);
    put(g->name, path, value);
    must(bc_response_reaction_along(g->response, combination, time, "foot", &value));
    snprintf(path, sizeof path, "%s.reactions[\"foot\"].along_N", base);
    put(g->name, path, value);
}

void rafter(void) {
    // 20 degrees: by the one rounded factor that turns degrees into radians.
    const double pi = 3.14159265358979323846, pitch = 20.0 * pi / 180.0;
    struct golden g = {"rafter", {"rafter", NULL}, {"foot", "top", NULL}, make_section(), NULL};
    bc_support *foot;
    bc_plan *plan;
    bc_member *member;
    must(bc_plan_of_length(g.section, 5.0, &plan));
    CHANGE(bc_plan, plan, bc_plan_with_pitch(plan, pitch, &made));
    must(bc_support_new("foot", BC_SUPPORT_PIN, 0.0, &foot));
    CHANGE(bc_support, foot, bc_support_at_height(foot, 0.0, &made));
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, foot, &made));
    bc_support_free(foot);
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "top", BC_SUPPORT_ROLLER, 5.0, &made));
    plan = loaded(plan);
    must(bc_plan_check(plan, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_states(&g, put_along);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_plan_free(plan);
    bc_section_free(g.section);
}
