// The golden case `shrinking-slab` through the typed functions.
#include "golden.h"

static const char *const CASE = "shrinking-slab", *const P = "permanent";

static bc_section *make_section(void) {
    bc_material *concrete, *c24;
    bc_part *joist, *slab, *above, *shrinking;
    bc_section *section;
    must(bc_material_new("concrete", 31e9, 2.0, &concrete));
    must(bc_material_timber("C24", 1, &c24));
    must(bc_part_rectangle("joist", 0.120, 0.240, c24, &joist));
    must(bc_part_rectangle("slab", 0.500, 0.060, concrete, &slab));
    must(bc_part_beside(slab, BC_PLACE_ABOVE, "joist", &above));
    must(bc_part_with_initial_strain(above, -0.3 / 1000.0, 0.0005, 0.0, &shrinking));
    const bc_part *parts[] = {joist, shrinking};
    must(bc_section_new(parts, 2, &section));
    bc_material_free(concrete);
    bc_material_free(c24);
    bc_part_free(joist);
    bc_part_free(slab);
    bc_part_free(above);
    bc_part_free(shrinking);
    return section;
}

static bc_action *make_load(void) {
    bc_action *plain, *lasting, *late, *load;
    must(bc_action_permanent("load", &plain));
    must(bc_action_with_duration(plain, BC_DURATION_PERMANENT, &lasting));
    must(bc_action_starting(lasting, 28.0 * 86400.0, &late));
    must(bc_action_with_uniform(late, 1000.0, &load));
    bc_action_free(plain);
    bc_action_free(lasting);
    bc_action_free(late);
    return load;
}

static bc_response *solved(void) {
    const char *names[] = {"left", "middle", "right"};
    const int32_t kinds[] = {BC_SUPPORT_PIN, BC_SUPPORT_ROLLER, BC_SUPPORT_ROLLER};
    const double places[] = {0.0, 4.0, 8.0};
    bc_section *section = make_section();
    bc_action *load = make_load();
    const bc_action *actions[] = {load};
    bc_member *member;
    bc_response *response;
    must(bc_member_new(section, 8.0, names, kinds, places, 3, actions, 1, &member));
    must(bc_member_solve(member, &response));
    bc_member_free(member);
    bc_action_free(load);
    bc_section_free(section);
    return response;
}

static void put_results(const bc_response *r, int32_t time, const char *word) {
    static const char *const supports[] = {"left", "middle"}, *const parts[] = {"joist", "slab"};
    double value, at, y, z;
    char base[100], path[300];
    snprintf(base, sizeof base, "combinations[\"%s\"].%s", P, word);
    must(bc_response_extreme(r, BC_FIELD_MOMENT, P, time, BC_EXTREME_MINIMUM, &value, &at));
    snprintf(path, sizeof path, "%s.moment.minimum.value_Nm", base);
    put(CASE, path, value);
    for (int i = 0; i < 2; ++i) {
        must(bc_response_reaction(r, P, time, supports[i], &value, &at));
        snprintf(path, sizeof path, "%s.reactions[\"%s\"].force_N", base, supports[i]);
        put(CASE, path, value);
    }
    for (int i = 0; i < 2; ++i) {
        must(bc_response_stress(r, P, time, parts[i], BC_STRESS_TENSION, &value, &at, &y, &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].tension.value_Pa", base, parts[i]);
        put(CASE, path, value);
        must(bc_response_stress(r, P, time, parts[i], BC_STRESS_COMPRESSION, &value, &at, &y, &z));
        snprintf(path, sizeof path, "%s.stresses[\"%s\"].compression.value_Pa", base, parts[i]);
        put(CASE, path, value);
    }
}

void shrinking_slab(void) {
    bc_response *response = solved();
    put_results(response, BC_TIME_INITIAL, "initial");
    put_results(response, BC_TIME_FINAL, "final");
    bc_response_free(response);
}
