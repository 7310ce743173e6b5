// The golden cases through the typed functions.
#include "golden.h"

void must(int32_t status) {
    if (status != BC_OK) {
        char text[4000] = "";
        int64_t length;
        bc_error_text(text, (int64_t)sizeof text, &length);
        fprintf(stderr, "%s\n", text);
        exit(EXIT_FAILURE);
    }
}

void put(const char *name, const char *path, double value) {
    uint64_t bits;
    memcpy(&bits, &value, sizeof bits);
    printf("%s\t%s\t%016" PRIx64 "\n", name, path, bits);
}

static void put_field(const struct golden *g, const char *base, int32_t field,
                      const char *combination, int32_t time, const char *key, int with_place) {
    char path[300];
    double value, at;
    must(bc_response_extreme(g->response, field, combination, time, BC_EXTREME_GREATEST, &value,
                             &at));
    snprintf(path, sizeof path, "%s.%s", base, key);
    put(g->name, path, value);
    if (with_place) {
        snprintf(path, sizeof path, "%s.deflection.greatest.at_m", base);
        put(g->name, path, at);
    }
}

static void put_state(const struct golden *g, const char *combination, int32_t time,
                      const char *base) {
    char path[300];
    put_field(g, base, BC_FIELD_DEFLECTION, combination, time, "deflection.greatest.value_m", 1);
    put_field(g, base, BC_FIELD_SLOPE, combination, time, "slope.greatest.value_rad", 0);
    put_field(g, base, BC_FIELD_SHEAR, combination, time, "shear.greatest.value_N", 0);
    put_field(g, base, BC_FIELD_MOMENT, combination, time, "moment.greatest.value_Nm", 0);
    for (int i = 0; g->supports[i] != NULL; ++i) {
        double force, couple;
        must(bc_response_reaction(g->response, combination, time, g->supports[i], &force, &couple));
        snprintf(path, sizeof path, "%s.reactions[\"%s\"].force_N", base, g->supports[i]);
        put(g->name, path, force);
        snprintf(path, sizeof path, "%s.reactions[\"%s\"].couple_Nm", base, g->supports[i]);
        put(g->name, path, couple);
    }
    for (int i = 0; g->parts[i] != NULL; ++i) {
        double value, at, y, z;
        must(bc_response_stress(g->response, combination, time, g->parts[i], BC_STRESS_TENSION,
                                &value, &at, &y, &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].tension.value_Pa", base, g->parts[i]);
        put(g->name, path, value);
        must(bc_response_stress(g->response, combination, time, g->parts[i], BC_STRESS_COMPRESSION,
                                &value, &at, &y, &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].compression.value_Pa", base, g->parts[i]);
        put(g->name, path, value);
    }
}

void put_states(const struct golden *g, put_state_fn *put_state) {
    static const int32_t times[] = {BC_TIME_INITIAL, BC_TIME_FINAL};
    static const char *const combinations[] = {"permanent", "quasi-permanent", "characteristic",
                                               "fundamental"};
    char base[100];
    for (int c = 0; c < 4; ++c) {
        for (int i = 0; i < 2; ++i) {
            snprintf(base, sizeof base, "combinations[\"%s\"].%s", combinations[c],
                     times[i] == BC_TIME_INITIAL ? "initial" : "final");
            put_state(g, combinations[c], times[i], base);
        }
    }
}

void put_all(const struct golden *g) {
    static const int32_t times[] = {BC_TIME_INITIAL, BC_TIME_FINAL};
    static const char *const words[] = {"initial", "final"};
    char path[100];
    for (int i = 0; i < 2; ++i) {
        double ea, y, z, yy, zz, yz;
        must(bc_section_bending_stiffness(g->section, times[i], &yy, &zz, &yz));
        must(bc_section_axial_stiffness(g->section, times[i], &ea));
        must(bc_section_centroid(g->section, times[i], &y, &z));
        snprintf(path, sizeof path, "section.%s.bending_stiffness_yy_Nm2", words[i]);
        put(g->name, path, yy);
        snprintf(path, sizeof path, "section.%s.axial_stiffness_N", words[i]);
        put(g->name, path, ea);
        snprintf(path, sizeof path, "section.%s.centroid_z_m", words[i]);
        put(g->name, path, z);
    }
    put_states(g, put_state);
}

// Replaces a handle by the one that was made of it.
static void replace_part(bc_part **part, bc_part *made) {
    bc_part_free(*part);
    *part = made;
}

static void replace_action(bc_action **action, bc_action *made) {
    bc_action_free(*action);
    *action = made;
}

static void uniform(bc_action **action, double load_N_per_m) {
    bc_action *made;
    must(bc_action_with_uniform(*action, load_N_per_m, &made));
    replace_action(action, made);
}

static void point(bc_action **action, double load_N, double at_m) {
    bc_action *made;
    must(bc_action_with_point(*action, load_N, at_m, &made));
    replace_action(action, made);
}

static void self_weight(bc_action **action) {
    bc_action *made;
    must(bc_action_with_self_weight(*action, &made));
    replace_action(action, made);
}

static void beside(bc_part **part, int32_t place, const char *other) {
    bc_part *made;
    must(bc_part_beside(*part, place, other, &made));
    replace_part(part, made);
}

// A section of new parts, which are freed.
static bc_section *section_of(bc_part **parts, int32_t count) {
    const bc_part *list[3];
    bc_section *section;
    for (int32_t i = 0; i < count; ++i) {
        list[i] = parts[i];
    }
    must(bc_section_new(list, count, &section));
    for (int32_t i = 0; i < count; ++i) {
        bc_part_free(parts[i]);
    }
    return section;
}

void flitch(void) {
    bc_material *c24, *s275;
    bc_part *parts[3];
    bc_action *floor;
    bc_member *member;
    must(bc_material_timber("C24", 1, &c24));
    must(bc_material_steel("S275", &s275));
    must(bc_part_rectangle("left joist", 0.047, 0.220, c24, &parts[0]));
    beside(&parts[0], BC_PLACE_LEFT_OF, "plate");
    must(bc_part_rectangle("plate", 0.010, 0.200, s275, &parts[1]));
    must(bc_part_rectangle("right joist", 0.047, 0.220, c24, &parts[2]));
    beside(&parts[2], BC_PLACE_RIGHT_OF, "plate");
    struct golden g = {"flitch", {"left joist", "plate", "right joist", NULL},
                       {"left", "right", NULL}, section_of(parts, 3), NULL};
    must(bc_action_permanent("floor", &floor));
    uniform(&floor, 5000.0);
    const bc_action *actions[] = {floor};
    must(bc_member_simple_span(g.section, 4.0, actions, 1, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_action_free(floor);
    bc_section_free(g.section);
    bc_material_free(s275);
    bc_material_free(c24);
}

static bc_material *own_material(const char *name, double modulus_Pa, double creep, double density) {
    bc_material *light, *material;
    must(bc_material_new(name, modulus_Pa, creep, &light));
    must(bc_material_with_density(light, density, &material));
    bc_material_free(light);
    return material;
}

void two_span(void) {
    bc_material *oak = own_material("oak", 9.5e9, 0.6, 690.0);
    bc_material *brass = own_material("brass", 100e9, 0.0, 8500.0);
    bc_part *parts[2];
    bc_action *weight, *partition, *store, *made;
    bc_member *member;
    must(bc_part_rectangle("beam", 0.120, 0.240, oak, &parts[0]));
    must(bc_part_rectangle("strip", 0.100, 0.006, brass, &parts[1]));
    beside(&parts[1], BC_PLACE_BELOW, "beam");
    struct golden g = {"two-span", {"beam", "strip", NULL}, {"wall", "post", "end", NULL},
                       section_of(parts, 2), NULL};
    must(bc_action_permanent("own weight", &weight));
    self_weight(&weight);
    must(bc_action_permanent("partition", &partition));
    must(bc_action_with_partial(partition, 2400.0, 1.1, 5.3, &made));
    replace_action(&partition, made);
    point(&partition, 3500.0, 7.5);
    must(bc_action_variable("store", 1.0, 0.9, 0.8, &store));
    uniform(&store, 3100.0);
    point(&store, 4200.0, 1.6);
    const int32_t kinds[] = {BC_SUPPORT_FIXED, BC_SUPPORT_ROLLER, BC_SUPPORT_ROLLER};
    const double places[] = {0.0, 3.2, 6.9};
    const bc_action *actions[] = {weight, partition, store};
    must(bc_member_new(g.section, 7.5, g.supports, kinds, places, 3, actions, 3, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_action_free(weight);
    bc_action_free(partition);
    bc_action_free(store);
    bc_section_free(g.section);
    bc_material_free(oak);
    bc_material_free(brass);
}

static void put_camber(const struct golden *g) {
    bc_camber *camber;
    double target, rise, station, ordinate;
    int32_t count;
    char path[100];
    must(bc_camber_new(g->response, BC_SHAPE_PARABOLA, "quasi-permanent", BC_TIME_FINAL, 1.0,
                       "left", "right", 0.001, BC_ROUNDING_NEAREST, 0.0, 6, &camber));
    must(bc_camber_target(camber, &target));
    must(bc_camber_rise(camber, &rise));
    must(bc_camber_ordinate_count(camber, &count));
    put(g->name, "camber.target_m", target);
    put(g->name, "camber.rise_m", rise);
    for (int32_t i = 0; i < count; ++i) {
        must(bc_camber_ordinate(camber, i, &station, &ordinate));
        snprintf(path, sizeof path, "camber.ordinates[%d].ordinate_m", (int)i);
        put(g->name, path, ordinate);
    }
    bc_camber_free(camber);
}

void slab_strip(void) {
    const double day_s = 86400.0;
    bc_material *c24, *c30;
    bc_part *parts[2];
    bc_action *dead, *live;
    bc_member *member;
    must(bc_material_timber("C24", 1, &c24));
    must(bc_material_concrete_with_creep("C30/37", 38e6, 55.0, 0.140, 28.0 * day_s, 18250.0 * day_s,
                                         BC_CEMENT_N, &c30));
    must(bc_part_rectangle("joist", 0.100, 0.220, c24, &parts[0]));
    must(bc_part_rectangle("slab", 0.600, 0.070, c30, &parts[1]));
    beside(&parts[1], BC_PLACE_ABOVE, "joist");
    struct golden g = {"slab-strip", {"joist", "slab", NULL}, {"left", "right", NULL},
                       section_of(parts, 2), NULL};
    must(bc_action_permanent("dead", &dead));
    self_weight(&dead);
    uniform(&dead, 900.0);
    must(bc_action_variable("live", 0.7, 0.5, 0.3, &live));
    uniform(&live, 1700.0);
    const bc_action *actions[] = {dead, live};
    must(bc_member_simple_span(g.section, 5.4, actions, 2, &member));
    must(bc_member_solve(member, &g.response));
    put_all(&g);
    put_camber(&g);
    bc_response_free(g.response);
    bc_member_free(member);
    bc_action_free(live);
    bc_action_free(dead);
    bc_section_free(g.section);
    bc_material_free(c30);
    bc_material_free(c24);
}
