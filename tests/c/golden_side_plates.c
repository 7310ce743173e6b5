// The golden case `side-plates` through the typed functions.
#include "golden.h"

static const char *const NAMES[] = {"joist", "left plate", "right plate"};

static bc_joint *bolts(const char *name, const char *plate) {
    bc_joint *joint;
    must(bc_joint_loose(name, "joist", plate, &joint));
    CHANGE(bc_joint, joint, bc_joint_with_transverse(joint, 3e6, &made));
    CHANGE(bc_joint, joint, bc_joint_with_creep_factor(joint, 0.6, &made));
    return joint;
}

static bc_section *make_section(void) {
    bc_material *wood, *steel;
    bc_part *parts[3];
    bc_layer *layers[3];
    bc_section *section;
    bc_joint *joints[2] = {bolts("left bolts", NAMES[1]), bolts("right bolts", NAMES[2])};
    must(bc_material_new("wood", 11e9, 0.6, &wood));
    must(bc_material_new("steel", 210e9, 0.0, &steel));
    must(bc_part_rectangle(NAMES[0], 0.094, 0.220, wood, &parts[0]));
    for (int i = 1; i < 3; ++i) {
        must(bc_part_rectangle(NAMES[i], 0.005, 0.200, steel, &parts[i]));
    }
    CHANGE(bc_part, parts[1], bc_part_beside(parts[1], BC_PLACE_LEFT_OF, "joist", &made));
    CHANGE(bc_part, parts[2], bc_part_beside(parts[2], BC_PLACE_RIGHT_OF, "joist", &made));
    for (int i = 0; i < 3; ++i) {
        must(bc_layer_new(NAMES[i], &NAMES[i], 1, &layers[i]));
    }
    const bc_part *part_list[] = {parts[0], parts[1], parts[2]};
    const bc_layer *layer_list[] = {layers[0], layers[1], layers[2]};
    const bc_joint *joint_list[] = {joints[0], joints[1]};
    must(bc_section_layered(part_list, 3, layer_list, 3, joint_list, 2, &section));
    for (int i = 0; i < 3; ++i) {
        bc_part_free(parts[i]);
        bc_layer_free(layers[i]);
    }
    bc_joint_free(joints[0]);
    bc_joint_free(joints[1]);
    bc_material_free(wood);
    bc_material_free(steel);
    return section;
}

// The plan with one more support under the joist.
static bc_plan *on_joist(bc_plan *plan, const char *name, int32_t kind, double at_m) {
    bc_support *support;
    must(bc_support_new(name, kind, at_m, &support));
    CHANGE(bc_support, support, bc_support_under(support, NAMES, 1, &made));
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, support, &made));
    bc_support_free(support);
    return plan;
}

void side_plates(void) {
    struct golden g = {"side-plates", {"joist", "left plate", "right plate", NULL},
                       {"left", "right", NULL}, make_section(), NULL};
    bc_action *floor;
    bc_plan *plan;
    bc_member *member;
    must(bc_plan_of_length(g.section, 4.0, &plan));
    plan = on_joist(plan, "left", BC_SUPPORT_PIN, 0.0);
    plan = on_joist(plan, "right", BC_SUPPORT_ROLLER, 4.0);
    must(bc_action_permanent("floor", &floor));
    CHANGE(bc_action, floor, bc_action_on(floor, "joist", &made));
    CHANGE(bc_action, floor, bc_action_with_uniform(floor, 5000.0, &made));
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, floor, &made));
    bc_action_free(floor);
    must(bc_plan_check(plan, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_layers(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_plan_free(plan);
    bc_section_free(g.section);
}
