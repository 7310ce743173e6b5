// Handles that are replaced by what is made of them, as C programs build them step by step.
#ifndef CHAIN_H
#define CHAIN_H

#include "checks.h"

// Replaces a handle by the one that `call` gives out in `made`, and frees the old one.
#define CHANGE(type, handle, call)                                                                 \
    do {                                                                                           \
        type *made = NULL;                                                                         \
        DONE(call);                                                                                \
        type##_free(handle);                                                                       \
        (handle) = made;                                                                           \
    } while (0)

// A material of a modulus that does not creep.
static inline bc_material *stuff(const char *name, double modulus_Pa) {
    bc_material *material = NULL;
    DONE(bc_material_new(name, modulus_Pa, 0.0, &material));
    return material;
}

static inline bc_part *block(const char *name, double width, double height, double z,
                             const bc_material *material) {
    bc_part *part = NULL;
    DONE(bc_part_rectangle(name, width, height, material, &part));
    CHANGE(bc_part, part, bc_part_at(part, 0.0, z, &made));
    return part;
}

// A section of one rectangle, its middle at z = 0.
static inline bc_section *rectangle_of(double width, double height, const bc_material *material) {
    bc_part *part = block("block", width, height, 0.0, material);
    const bc_part *parts[] = {part};
    bc_section *section = NULL;
    DONE(bc_section_new(parts, 1, &section));
    bc_part_free(part);
    return section;
}

// Two layers, "joist" and "slab", each of one part of its name, and a joint between them, which is
// freed.
static inline bc_section *two_layers(bc_part *joist, bc_part *slab, bc_joint *joint) {
    const char *lower[] = {"joist"}, *upper[] = {"slab"};
    bc_layer *layers[2] = {NULL, NULL};
    bc_section *section = NULL;
    DONE(bc_layer_new("joist", lower, 1, &layers[0]));
    DONE(bc_layer_new("slab", upper, 1, &layers[1]));
    const bc_part *parts[] = {joist, slab};
    const bc_layer *const_layers[] = {layers[0], layers[1]};
    const bc_joint *joints[] = {joint};
    DONE(bc_section_layered(parts, 2, const_layers, 2, joints, 1, &section));
    bc_layer_free(layers[0]);
    bc_layer_free(layers[1]);
    bc_joint_free(joint);
    bc_part_free(joist);
    bc_part_free(slab);
    return section;
}

// A slab of 600 x 70 mm on a joist of 100 x 220 mm, E 31 and 11 GPa.
static inline bc_section *slab_on_joist(bc_joint *joint) {
    bc_material *wood = stuff("wood", 11e9), *stone = stuff("stone", 31e9);
    bc_section *section = two_layers(block("joist", 0.1, 0.22, 0.11, wood),
                                     block("slab", 0.6, 0.07, 0.255, stone), joint);
    bc_material_free(wood);
    bc_material_free(stone);
    return section;
}

// A permanent action "load", without loads yet.
static inline bc_action *nothing(void) {
    bc_action *action = NULL;
    DONE(bc_action_permanent("load", &action));
    return action;
}

// The response of a plan under an action; both are freed.
static inline bc_response *solved(bc_plan *plan, bc_action *action) {
    bc_member *member = NULL;
    bc_response *response = NULL;
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, action, &made));
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_solve(member, &response));
    bc_member_free(member);
    bc_plan_free(plan);
    bc_action_free(action);
    return response;
}

// The value of a field of a member at a place, on its right side, on the first day.
static inline double value_at(const bc_response *response, int32_t field, double x) {
    double value = NAN;
    DONE(bc_response_values(response, field, "permanent", BC_TIME_INITIAL, BC_SIDE_RIGHT, &x, 1,
                            &value));
    return value;
}

#endif
