// Beams of one rectangle, their supports, loads and reactions, for tests by hand.
#ifndef BEAMS_H
#define BEAMS_H

#include "chain.h"

static const double L = 4.0, E = 12e9, B = 0.1, H = 0.2, P = 5e3;
static const char *PM = "permanent";
static char text[300];
static int64_t length;

#define INTO text, (int64_t)sizeof text, &length

static inline bc_material *wood(void) {
    bc_material *material = stuff("wood", E);
    CHANGE(bc_material, material, bc_material_with_shear_modulus(material, 0.75e9, &made));
    return material;
}

static inline bc_section *beam(double width, double height) {
    bc_material *material = wood();
    bc_section *section = rectangle_of(width, height, material);
    bc_material_free(material);
    return section;
}

static inline double ei(double width, double height) {
    return E * width * height * height * height / 12.0;
}

static inline bc_plan *plan_of(bc_section *section) {
    bc_plan *plan = NULL;
    DONE(bc_plan_of_length(section, L, &plan));
    bc_section_free(section);
    return plan;
}

static inline bc_support *support(const char *name, int32_t kind, double place) {
    bc_support *made_support = NULL;
    DONE(bc_support_new(name, kind, place, &made_support));
    return made_support;
}

// The plan on one more support; the plan before it and the support are freed.
static inline bc_plan *on(bc_plan *plan, bc_support *under) {
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, under, &made));
    bc_support_free(under);
    return plan;
}

static inline bc_action *point(double load, double place) {
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_point(action, load, place, &made));
    return action;
}

static inline bc_action *uniform(double load) {
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_uniform(action, load, &made));
    return action;
}

static inline double force_of(const bc_response *r, const char *name) {
    double force = NAN, couple = NAN;
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, name, &force, &couple));
    return force;
}

static inline double couple_of(const bc_response *r, const char *name) {
    double force = NAN, couple = NAN;
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, name, &force, &couple));
    return couple;
}

#endif
