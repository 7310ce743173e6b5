// Simplified methods for layers that slip: every function.
#include "checks.h"

static char text[500];
static int64_t length;

// Joist and slab of the numbers below, in metres and pascals.
static void inputs(bc_layer_input *layers[2]) {
    double axial = 0.0, bending = 0.0;
    DONE(bc_layer_input_rectangle(11e9, 0.1, 0.22, 0.11, &layers[0]));
    DONE(bc_layer_input_stiffness(layers[0], &axial, &bending));
    CHECK(near(axial, 11e9 * 0.022) && near(bending, 11e9 * 0.1 * 0.22 * 0.22 * 0.22 / 12.0));
    // The same as bc_layer_input_rectangle would make it.
    DONE(bc_layer_input_new(31e9 * 0.042, 31e9 * 0.6 * 0.07 * 0.07 * 0.07 / 12.0, 0.07, 0.255, 31e9,
                            0.6, &layers[1]));
}

// Slab 600 x 70 mm (31 GPa) on joist 100 x 220 mm (11 GPa), k 133.333 N/mm2, span 6 m, q 3 kN/m;
// numbers worked out apart from this library from the formulas of EN 1995-1-1 Annex B.
static void gamma_method(const bc_layer_input *const *layers) {
    const double k[] = {133.333e6}, spacings[] = {0.075};
    const double moment = 13.5e3, shear = 9e3;
    bc_simplified *gamma = NULL;
    int32_t count = -1, has_value = -1, base = -1;
    double value, axial, bending, bottom, top, z;
    DONE(bc_simplified_gamma(layers, 2, k, 1, BC_LENGTH_SPAN, 6.0, &gamma));
    DONE(bc_simplified_layer_count(gamma, &count));
    CHECK(count == 2);
    DONE(bc_simplified_base_layer(gamma, &has_value, &base));
    CHECK(has_value == 1 && base == 0);
    DONE(bc_simplified_gamma_factor(gamma, 1, &has_value, &value));
    CHECK(has_value == 1 && within(value, 0.27195, 5e-6));
    DONE(bc_simplified_arm(gamma, 0, &value));
    CHECK(within(value, -86.132e-3, 5e-7));
    DONE(bc_simplified_arm(gamma, 1, &value));
    CHECK(within(value, 58.868e-3, 5e-7));
    DONE(bc_simplified_bending_stiffness(gamma, &value));
    CHECK(within(value, 4.53009e6, 5.0));
    DONE(bc_simplified_stress(gamma, moment, 1, &axial, &bending, &bottom, &top));
    CHECK(within(axial, -1.479e6, 500.0) && within(bending, 3.233e6, 500.0));
    CHECK(near(bottom, axial + bending) && near(top, axial - bending));
    double joist = 0.0, slab = 0.0;
    DONE(bc_simplified_axial_force(gamma, moment, 0, &joist));
    DONE(bc_simplified_axial_force(gamma, moment, 1, &slab));
    CHECK(within(joist / 0.022, 2.823e6, 500.0));
    CHECK(near(slab, -joist));
    DONE(bc_simplified_flow(gamma, shear, 0, &value));
    CHECK(within(value, 41.41e3, 5.0));
    double force = 0.0;
    DONE(bc_simplified_fastener_force(gamma, shear, spacings, 1, 0, &force));
    CHECK(near(force, value * 0.075));
    DONE(bc_simplified_shear_stress(gamma, shear, 0, &value, &z));
    CHECK(value > 0.0 && z >= 0.0 && z <= 0.22);
    DONE(bc_simplified_warning_count(gamma, &count));
    CHECK(count == 1);
    DONE(bc_simplified_warning(gamma, 0, text, (int64_t)sizeof text, &length));
    CHECK(strstr(text, "half a sine wave") != NULL);
    bc_simplified_free(gamma);
}

// Of two layers both methods agree; a cantilever is half as long as its span.
static void sine_layers(const bc_layer_input *const *layers) {
    const double k[] = {133.333e6};
    bc_simplified *gamma = NULL, *sine = NULL;
    int32_t has_value = -1, base = -1, count = -1;
    double one, other = -1.0, a, factor;
    DONE(bc_simplified_gamma(layers, 2, k, 1, BC_LENGTH_SPAN, 6.0, &gamma));
    DONE(bc_simplified_sine_layers(layers, 2, k, 1, BC_LENGTH_CANTILEVER, 3.0, &sine));
    DONE(bc_simplified_gamma_factor(sine, 1, &has_value, &other));
    CHECK(has_value == 0 && other == -1.0);
    DONE(bc_simplified_base_layer(sine, &has_value, &base));
    CHECK(has_value == 0 && base == -1);
    DONE(bc_simplified_bending_stiffness(gamma, &one));
    DONE(bc_simplified_bending_stiffness(sine, &other));
    CHECK(near(one, other));
    DONE(bc_simplified_arm(gamma, 1, &a));
    DONE(bc_simplified_gamma_factor(gamma, 1, &has_value, &factor));
    DONE(bc_simplified_arm(sine, 1, &other));
    CHECK(near(other, factor * a));
    DONE(bc_simplified_warning_count(sine, &count));
    CHECK(count == 2);
    bc_simplified_free(gamma);
    bc_simplified_free(sine);
}

static void lengths(void) {
    double value = 0.0;
    DONE(bc_reference_length(BC_LENGTH_SPAN, 6.0, &value));
    CHECK(value == 6.0);
    DONE(bc_reference_length(BC_LENGTH_CONTINUOUS, 6.0, &value));
    CHECK(near(value, 4.8));
    DONE(bc_reference_length(BC_LENGTH_CANTILEVER, 6.0, &value));
    CHECK(value == 12.0);
}

static void spacings(void) {
    double value = 0.0;
    int32_t count = -1;
    DONE(bc_effective_spacing(0.1, 0.5, &value));
    CHECK(near(value, 0.2));
    DONE(bc_effective_spacing_warning_count(0.1, 0.5, &count));
    CHECK(count == 2);
    DONE(bc_effective_spacing_warning(0.1, 0.5, 1, text, (int64_t)sizeof text, &length));
    CHECK(strstr(text, "more than 4 times") != NULL);
    FAILS(bc_effective_spacing(0.2, 0.1, &value), BC_ERROR_VALUE, "greatest");
    CHECK(near(value, 0.2));
}

static void mistakes(const bc_layer_input *const *layers) {
    const double k[] = {133.333e6, 1e6}, spacing[] = {0.1, 0.1};
    const bc_layer_input *reversed[] = {layers[1], layers[0]};
    bc_simplified *found = NULL, *gamma = NULL;
    double value = -1.0;
    FAILS(bc_simplified_gamma(layers, 2, k, 2, BC_LENGTH_SPAN, 6.0, &found), BC_ERROR_VALUE,
          "joints");
    FAILS(bc_simplified_sine_layers(reversed, 2, k, 1, BC_LENGTH_SPAN, 6.0, &found),
          BC_ERROR_GEOMETRY, "layers[1].centroid_z");
    FAILS(bc_simplified_gamma(layers, 2, k, 1, BC_LENGTH_SPAN, -6.0, &found), BC_ERROR_VALUE,
          "length");
    FAILS(bc_simplified_gamma(layers, 2, k, 1, 4, 6.0, &found), BC_ERROR_CHOICE, "length_kind");
    FAILS(bc_simplified_sine_layers(layers, -2, k, 1, BC_LENGTH_SPAN, 6.0, &found), BC_ERROR_COUNT,
          "count of layers");
    CHECK(found == NULL);
    DONE(bc_simplified_gamma(layers, 2, k, 1, BC_LENGTH_SPAN, 6.0, &gamma));
    FAILS(bc_simplified_axial_force(gamma, NAN, 0, &value), BC_ERROR_VALUE, "moment");
    FAILS(bc_simplified_axial_force(gamma, 1.0, 2, &value), BC_ERROR_COUNT, "index");
    FAILS(bc_simplified_flow(gamma, 1.0, 1, &value), BC_ERROR_COUNT, "index");
    FAILS(bc_simplified_fastener_force(gamma, 1.0, spacing, 2, 0, &value), BC_ERROR_VALUE,
          "spacings");
    FAILS(bc_simplified_arm(NULL, 0, &value), BC_ERROR_NULL, "simplified");
    CHECK(value == -1.0);
    bc_simplified_free(gamma);
}

int main(void) {
    bc_layer_input *layers[2] = {NULL, NULL};
    inputs(layers);
    const bc_layer_input *const list[] = {layers[0], layers[1]};
    gamma_method(list);
    sine_layers(list);
    lengths();
    spacings();
    mistakes(list);
    bc_layer_input_free(layers[0]);
    bc_layer_input_free(layers[1]);
    return finish();
}
