// The golden case `odd-section` through the typed functions.
#include "golden.h"

static const char *const CASE = "odd-section";
static const char *const PARTS[] = {"stem",    "bar",   "foot", "head",
                                    "channel", "cheek", "pipe"};

static bc_material *material(const char *name, double modulus_Pa, double creep, double density) {
    bc_material *light, *made;
    must(bc_material_new(name, modulus_Pa, creep, &light));
    must(bc_material_with_density(light, density, &made));
    bc_material_free(light);
    return made;
}

// A part of an outline, which is freed.
static bc_part *part(const char *name, bc_outline *outline, const bc_material *stuff) {
    bc_part *made;
    must(bc_part_new(name, outline, stuff, &made));
    bc_outline_free(outline);
    return made;
}

static void become(bc_part **old, bc_part *made) {
    bc_part_free(*old);
    *old = made;
}

static bc_section *make_section(void) {
    const double y[] = {-0.060, -0.040, 0.040, 0.060}, z[] = {-0.150, -0.180, -0.180, -0.150};
    bc_material *oak = material("oak", 9.5e9, 0.6, 690.0);
    bc_material *steel = material("steel", 210e9, 0.0, 7850.0);
    bc_outline *outline;
    bc_part *parts[7], *made;
    bc_section *section;
    must(bc_outline_rectangle(0.120, 0.300, &outline));
    parts[0] = part(PARTS[0], outline, oak);
    must(bc_outline_disc(0.024, &outline));
    parts[1] = part(PARTS[1], outline, steel);
    must(bc_part_set_into(parts[1], "stem", -0.030, -0.120, &made));
    become(&parts[1], made);
    must(bc_outline_polygon(y, z, 4, &outline));
    parts[2] = part(PARTS[2], outline, oak);
    must(bc_outline_polygon(y, z, 4, &outline));
    parts[3] = part(PARTS[3], outline, oak);
    must(bc_part_mirror_of(parts[3], "foot", BC_MIRROR_LEVEL, &made));
    become(&parts[3], made);
    must(bc_outline_channel(0.100, 0.040, 0.008, 0.006, &outline));
    parts[4] = part(PARTS[4], outline, steel);
    must(bc_part_at(parts[4], -0.080, 0.0, &made));
    become(&parts[4], made);
    must(bc_outline_angle(0.090, 0.070, 0.008, &outline));
    parts[5] = part(PARTS[5], outline, steel);
    must(bc_part_beside(parts[5], BC_PLACE_RIGHT_OF, "stem", &made));
    become(&parts[5], made);
    must(bc_outline_ring(0.060, 0.005, &outline));
    parts[6] = part(PARTS[6], outline, steel);
    must(bc_part_beside(parts[6], BC_PLACE_BELOW, "foot", &made));
    become(&parts[6], made);
    must(bc_part_with_line_mass(parts[6], 9.0, &made));
    become(&parts[6], made);
    const bc_part *list[7];
    for (int i = 0; i < 7; ++i) {
        list[i] = parts[i];
    }
    must(bc_section_new(list, 7, &section));
    for (int i = 0; i < 7; ++i) {
        bc_part_free(parts[i]);
    }
    bc_material_free(oak);
    bc_material_free(steel);
    return section;
}

static bc_response *solved(const bc_section *section) {
    bc_action *dead, *crane, *loaded, *made;
    bc_plan *plan, *next;
    bc_member *member;
    bc_response *response;
    must(bc_plan_simple_span(section, 5.0, &plan));
    must(bc_plan_with_sideways(plan, BC_SIDEWAYS_FREE, &next));
    bc_plan_free(plan);
    must(bc_action_permanent("dead", &dead));
    must(bc_action_with_self_weight(dead, &made));
    must(bc_action_with_uniform(made, 4000.0, &loaded));
    must(bc_plan_with_action(next, loaded, &plan));
    bc_action_free(dead);
    bc_action_free(made);
    bc_action_free(loaded);
    bc_plan_free(next);
    must(bc_action_variable_of_category("crane", BC_CATEGORY_STORAGE, &crane));
    must(bc_action_with_point(crane, 6000.0, 2.0, &loaded));
    must(bc_plan_with_action(plan, loaded, &next));
    bc_action_free(crane);
    bc_action_free(loaded);
    bc_plan_free(plan);
    must(bc_plan_check(next, &member));
    must(bc_member_solve(member, &response));
    bc_plan_free(next);
    bc_member_free(member);
    return response;
}

static void put_section(const bc_section *section, int32_t time, const char *word) {
    static const char *const names[] = {
        "axial_stiffness_N",        "centroid_y_m",             "centroid_z_m",
        "bending_stiffness_yy_Nm2", "bending_stiffness_zz_Nm2", "bending_stiffness_yz_Nm2",
        "principal_greater_Nm2",    "principal_smaller_Nm2"};
    double values[8], angle;
    char path[300];
    must(bc_section_axial_stiffness(section, time, &values[0]));
    must(bc_section_centroid(section, time, &values[1], &values[2]));
    must(bc_section_bending_stiffness(section, time, &values[3], &values[4], &values[5]));
    must(bc_section_principal(section, time, &values[6], &values[7], &angle));
    for (int i = 0; i < 8; ++i) {
        snprintf(path, sizeof path, "section.%s.%s", word, names[i]);
        put(CASE, path, values[i]);
    }
}

static void put_fields(const bc_response *r, const char *combination, int32_t time,
                       const char *word) {
    double value, at, y, z;
    char base[100], path[300];
    snprintf(base, sizeof base, "combinations[\"%s\"].%s", combination, word);
    must(bc_response_extreme(r, BC_FIELD_DEFLECTION, combination, time, BC_EXTREME_GREATEST, &value,
                             &at));
    snprintf(path, sizeof path, "%s.deflection.greatest.value_m", base);
    put(CASE, path, value);
    must(bc_response_sideways_extreme(r, combination, time, BC_EXTREME_GREATEST, &value, &at));
    snprintf(path, sizeof path, "%s.sideways.greatest.value_m", base);
    put(CASE, path, value);
    for (int i = 0; i < 7; ++i) {
        must(bc_response_stress(r, combination, time, PARTS[i], BC_STRESS_TENSION, &value, &at, &y,
                                &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].tension.value_Pa", base, PARTS[i]);
        put(CASE, path, value);
        must(bc_response_stress(r, combination, time, PARTS[i], BC_STRESS_COMPRESSION, &value, &at,
                                &y, &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].compression.value_Pa", base, PARTS[i]);
        put(CASE, path, value);
    }
}

void odd_section(void) {
    static const int32_t times[] = {BC_TIME_INITIAL, BC_TIME_FINAL};
    static const char *const words[] = {"initial", "final"};
    static const char *const combinations[] = {"permanent", "quasi-permanent", "characteristic",
                                               "fundamental"};
    bc_section *section = make_section();
    bc_response *response = solved(section);
    for (int t = 0; t < 2; ++t) {
        put_section(section, times[t], words[t]);
        for (int c = 0; c < 4; ++c) {
            put_fields(response, combinations[c], times[t], words[t]);
        }
    }
    bc_response_free(response);
    bc_section_free(section);
}
