// What the golden cases of layers read beside the results of every case.
#include "golden.h"

// Prints the greatest value of a field, or another extreme, and frees the field.
static void put_extreme(const struct golden *g, bc_field *field, int32_t extreme, const char *base,
                        const char *key) {
    char path[300];
    double value, at;
    must(bc_field_extreme(field, extreme, &value, &at));
    snprintf(path, sizeof path, "%s.%s", base, key);
    put(g->name, path, value);
    bc_field_free(field);
}

static bc_field *joint_field(const struct golden *g, int32_t which, const char *combination,
                             int32_t time, const char *joint) {
    bc_field *field;
    must(bc_response_joint_field(g->response, which, combination, time, joint, &field));
    return field;
}

static bc_field *layer_field(const struct golden *g, int32_t which, const char *combination,
                             int32_t time, const char *layer) {
    bc_field *field;
    must(bc_response_layer_field(g->response, which, combination, time, layer, &field));
    return field;
}

static void put_joint(const struct golden *g, const char *combination, int32_t time,
                      const char *state, const char *joint) {
    const double left_end = 0.0;
    char base[200], path[300];
    double left;
    snprintf(base, sizeof base, "%s.joints[\"%s\"]", state, joint);
    put_extreme(g, joint_field(g, BC_JOINT_FIELD_SLIP, combination, time, joint),
                BC_EXTREME_GREATEST, base, "slip.greatest.value_m");
    bc_field *slip = joint_field(g, BC_JOINT_FIELD_SLIP, combination, time, joint);
    must(bc_field_values(slip, BC_SIDE_RIGHT, &left_end, 1, &left));
    bc_field_free(slip);
    snprintf(path, sizeof path, "%s.slip.left_m", base);
    put(g->name, path, left);
    put_extreme(g, joint_field(g, BC_JOINT_FIELD_FLOW, combination, time, joint),
                BC_EXTREME_GREATEST, base, "flow.greatest.value_N_per_m");
    put_extreme(g, joint_field(g, BC_JOINT_FIELD_PRESSURE, combination, time, joint),
                BC_EXTREME_MINIMUM, base, "pressure.minimum.value_N_per_m");
}

static void put_layer(const struct golden *g, const char *combination, int32_t time,
                      const char *state, const char *layer, int has_deflection) {
    char base[200];
    snprintf(base, sizeof base, "%s.layers[\"%s\"]", state, layer);
    put_extreme(g, layer_field(g, BC_LAYER_FIELD_AXIAL, combination, time, layer),
                BC_EXTREME_GREATEST, base, "axial.greatest.value_N");
    put_extreme(g, layer_field(g, BC_LAYER_FIELD_MOMENT, combination, time, layer),
                BC_EXTREME_GREATEST, base, "moment.greatest.value_Nm");
    if (has_deflection) {
        put_extreme(g, layer_field(g, BC_LAYER_FIELD_DEFLECTION, combination, time, layer),
                    BC_EXTREME_GREATEST, base, "deflection.greatest.value_m");
    }
}

static void put_state(const struct golden *g, const char *combination, int32_t time,
                      const char *base) {
    char name[100];
    int64_t length;
    int32_t joints, layers, has_value;
    double modulus;
    int has_deflections = 0;
    must(bc_section_joint_count(g->section, &joints));
    must(bc_section_layer_count(g->section, &layers));
    for (int32_t i = 0; i < joints; ++i) {
        bc_joint *joint;
        must(bc_section_joint(g->section, i, &joint));
        must(bc_joint_name(joint, name, (int64_t)sizeof name, &length));
        must(bc_joint_transverse(joint, &has_value, &modulus));
        has_deflections = has_deflections || has_value;
        put_joint(g, combination, time, base, name);
        bc_joint_free(joint);
    }
    for (int32_t i = 0; i < layers; ++i) {
        bc_layer *layer;
        must(bc_section_layer(g->section, i, &layer));
        must(bc_layer_name(layer, name, (int64_t)sizeof name, &length));
        put_layer(g, combination, time, base, name, has_deflections);
        bc_layer_free(layer);
    }
}

void put_layers(const struct golden *g) { put_states(g, put_state); }
