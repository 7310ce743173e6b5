// A door lintel: two joists on both sides of a steel plate, under a wall.
#include <beamcore.h>

#include <stdio.h>

// Prints the error of the last call, if it failed.
static int failed(int32_t status) {
    if (status != BC_OK) {
        char text[2000];
        int64_t length;
        bc_error_text(text, (int64_t)sizeof text, &length);
        fprintf(stderr, "%s\n", text);
    }
    return status != BC_OK;
}

int main(void) {
    bc_material *c24 = NULL, *s235 = NULL;
    bc_part *plate = NULL, *joist[2] = {NULL, NULL}, *placed[2] = {NULL, NULL};
    bc_section *section = NULL;
    bc_action *wall = NULL, *loaded = NULL, *heavy = NULL;
    bc_member *lintel = NULL;
    bc_response *response = NULL;
    double deflection_m = 0.0, at_m = 0.0;

    int fault = failed(bc_material_timber("C24", 1, &c24)) ||
                failed(bc_material_steel("S235", &s235)) ||
                failed(bc_part_rectangle("plate", 0.008, 0.180, s235, &plate)) ||
                failed(bc_part_rectangle("front joist", 0.047, 0.195, c24, &joist[0])) ||
                failed(bc_part_rectangle("back joist", 0.047, 0.195, c24, &joist[1])) ||
                failed(bc_part_beside(joist[0], BC_PLACE_LEFT_OF, "plate", &placed[0])) ||
                failed(bc_part_beside(joist[1], BC_PLACE_RIGHT_OF, "plate", &placed[1])) ||
                failed(bc_action_permanent("wall above", &wall)) ||
                failed(bc_action_with_uniform(wall, 4500.0, &loaded)) ||
                failed(bc_action_with_self_weight(loaded, &heavy));
    if (!fault) {
        const bc_part *parts[] = {placed[0], plate, placed[1]};
        const bc_action *actions[] = {heavy};
        fault = failed(bc_section_new(parts, 3, &section)) ||
                failed(bc_member_simple_span(section, 3.6, actions, 1, &lintel)) ||
                failed(bc_member_solve(lintel, &response)) ||
                failed(bc_response_extreme(response, BC_FIELD_DEFLECTION, "quasi-permanent",
                                           BC_TIME_FINAL, BC_EXTREME_GREATEST, &deflection_m,
                                           &at_m));
    }
    if (!fault) {
        printf("deflection %.2f mm at %.2f m\n", deflection_m * 1000.0, at_m);
    }

    bc_response_free(response);
    bc_member_free(lintel);
    bc_action_free(heavy);
    bc_action_free(loaded);
    bc_action_free(wall);
    bc_section_free(section);
    for (int i = 0; i < 2; ++i) {
        bc_part_free(placed[i]);
        bc_part_free(joist[i]);
    }
    bc_part_free(plate);
    bc_material_free(s235);
    bc_material_free(c24);
    return fault;
}
