// The golden case `lift-off` through the typed functions.
#include "golden.h"

static bc_section *make_section(void) {
    bc_material *wood;
    bc_part *beam;
    bc_section *section;
    must(bc_material_new("wood", 11e9, 0.0, &wood));
    must(bc_part_rectangle("beam", 0.100, 0.240, wood, &beam));
    const bc_part *parts[] = {beam};
    must(bc_section_new(parts, 1, &section));
    bc_part_free(beam);
    bc_material_free(wood);
    return section;
}

static void put_steps(const struct golden *g, const char *combination, int32_t time,
                      const char *base) {
    const int is_loaded = strcmp(combination, "characteristic") == 0 ||
                          strcmp(combination, "fundamental") == 0;
    char path[200], name[100] = "";
    int64_t length;
    int32_t steps, lifted;
    must(bc_response_steps(g->response, combination, time, &steps));
    snprintf(path, sizeof path, "%s.steps", base);
    put(g->name, path, steps);
    must(bc_response_lifted_count(g->response, combination, time, &lifted));
    if (lifted > 0) {
        must(bc_response_lifted_name(g->response, combination, time, 0, name, (int64_t)sizeof name,
                                     &length));
    }
    if (lifted != is_loaded || strcmp(name, is_loaded ? "post" : "") != 0) {
        fprintf(stderr, "%s: %d supports are left, \"%s\"\n", base, (int)lifted, name);
        exit(EXIT_FAILURE);
    }
}

void lift_off(void) {
    struct golden g = {"lift-off", {"beam", NULL}, {"post", "middle", "end", NULL}, make_section(),
                       NULL};
    bc_support *post;
    bc_action *actions[2];
    bc_plan *plan;
    bc_member *member;
    must(bc_plan_of_length(g.section, 8.0, &plan));
    must(bc_support_new("post", BC_SUPPORT_ROLLER, 0.0, &post));
    CHANGE(bc_support, post, bc_support_one_way(post, &made));
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, post, &made));
    bc_support_free(post);
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "middle", BC_SUPPORT_PIN, 3.0, &made));
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "end", BC_SUPPORT_ROLLER, 8.0, &made));
    must(bc_action_permanent("weight", &actions[0]));
    CHANGE(bc_action, actions[0], bc_action_with_uniform(actions[0], 1200.0, &made));
    must(bc_action_variable("load", 0.7, 0.5, 0.0, &actions[1]));
    CHANGE(bc_action, actions[1], bc_action_with_partial(actions[1], 4000.0, 3.0, 8.0, &made));
    for (int i = 0; i < 2; ++i) {
        CHANGE(bc_plan, plan, bc_plan_with_action(plan, actions[i], &made));
        bc_action_free(actions[i]);
    }
    must(bc_plan_check(plan, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_states(&g, put_steps);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_plan_free(plan);
    bc_section_free(g.section);
}
