// The golden cases `screwed-floor` and `clearance-floor` through the typed functions.
#include "golden.h"

// A slab of this width and height on a joist, joined as told; the joint is freed.
static bc_section *section_of(double width, double height, double creep, bc_joint *joint) {
    static const char *const joist[] = {"joist"}, *const slab[] = {"slab"};
    bc_material *wood, *concrete;
    bc_part *parts[2];
    bc_layer *layers[2];
    bc_section *section;
    must(bc_material_new("wood", 11e9, 0.6, &wood));
    must(bc_material_new("concrete", 31e9, creep, &concrete));
    must(bc_part_rectangle("joist", 0.100, 0.220, wood, &parts[0]));
    must(bc_part_rectangle("slab", width, height, concrete, &parts[1]));
    CHANGE(bc_part, parts[1], bc_part_beside(parts[1], BC_PLACE_ABOVE, "joist", &made));
    must(bc_layer_new("joist", joist, 1, &layers[0]));
    must(bc_layer_new("slab", slab, 1, &layers[1]));
    const bc_part *part_list[] = {parts[0], parts[1]};
    const bc_layer *layer_list[] = {layers[0], layers[1]};
    const bc_joint *joint_list[] = {joint};
    must(bc_section_layered(part_list, 2, layer_list, 2, joint_list, 1, &section));
    for (int i = 0; i < 2; ++i) {
        bc_part_free(parts[i]);
        bc_layer_free(layers[i]);
    }
    bc_joint_free(joint);
    bc_material_free(wood);
    bc_material_free(concrete);
    return section;
}

static bc_action *uniform(bc_action *action, double load) {
    CHANGE(bc_action, action, bc_action_with_uniform(action, load, &made));
    return action;
}

static void put_composite_action(const struct golden *g) {
    static const int32_t times[] = {BC_TIME_INITIAL, BC_TIME_FINAL};
    static const char *const words[] = {"initial", "final"};
    char path[200];
    for (int i = 0; i < 2; ++i) {
        double degree, stiffness, at, deflection, loose, rigid;
        must(bc_response_composite_action(g->response, "characteristic", times[i], &degree,
                                          &stiffness, &at, &deflection, &loose, &rigid));
        snprintf(path, sizeof path, "combinations[\"characteristic\"].%s.composite_action.degree",
                 words[i]);
        put(g->name, path, degree);
        snprintf(path, sizeof path,
                 "combinations[\"characteristic\"].%s.composite_action.effective_stiffness_Nm2",
                 words[i]);
        put(g->name, path, stiffness);
    }
}

void screwed_floor(void) {
    const double from[] = {0.0, 1.2, 4.2}, to[] = {1.2, 4.2, 5.4}, spacing[] = {0.1, 0.2, 0.1};
    bc_joint *screws;
    bc_action *actions[2];
    bc_member *member;
    must(bc_joint_of_fasteners_in_bands("screws", "joist", "slab", 10e6, 1, 1, from, to, spacing, 3,
                                        &screws));
    CHANGE(bc_joint, screws, bc_joint_with_creep_factor(screws, 1.0, &made));
    struct golden g = {"screwed-floor", {"joist", "slab", NULL}, {"left", "right", NULL},
                       section_of(0.600, 0.060, 2.0, screws), NULL};
    must(bc_action_permanent("dead", &actions[0]));
    must(bc_action_variable("live", 0.7, 0.5, 0.3, &actions[1]));
    actions[0] = uniform(actions[0], 2000.0);
    actions[1] = uniform(actions[1], 1700.0);
    for (int i = 0; i < 2; ++i) {
        CHANGE(bc_action, actions[i], bc_action_on(actions[i], "slab", &made));
    }
    const bc_action *list[] = {actions[0], actions[1]};
    must(bc_member_simple_span(g.section, 5.4, list, 2, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_layers(&g);
    put_composite_action(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_action_free(actions[0]);
    bc_action_free(actions[1]);
    bc_section_free(g.section);
}

void clearance_floor(void) {
    bc_joint *screws;
    bc_action *load;
    bc_member *member;
    must(bc_joint_of_fasteners("screws", "joist", "slab", 10e6, 2, 1, 0.150, &screws));
    CHANGE(bc_joint, screws, bc_joint_with_clearance(screws, 0.5 / 1000.0, &made));
    CHANGE(bc_joint, screws, bc_joint_with_creep_factor(screws, 1.2, &made));
    struct golden g = {"clearance-floor", {"joist", "slab", NULL}, {"left", "right", NULL},
                       section_of(0.600, 0.070, 2.5, screws), NULL};
    must(bc_action_permanent("load", &load));
    load = uniform(load, 3000.0);
    const bc_action *list[] = {load};
    must(bc_member_simple_span(g.section, 6.0, list, 1, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_layers(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_action_free(load);
    bc_section_free(g.section);
}
