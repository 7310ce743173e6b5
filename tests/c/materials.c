// What classes, overrides and strengths give to materials, and concrete's values: every function.
#include "checks.h"

static char text[300];
static int64_t length;

static int is_text(const char *expected) {
    if (strcmp(text, expected) != 0) {
        fprintf(stderr, "    \"%s\"\n", text);
    }
    return strcmp(text, expected) == 0;
}

// Gives a material its next form and frees the one before.
static void become(bc_material **old, bc_material *made) {
    bc_material_free(*old);
    *old = made;
}

static int32_t has_value = -1;
static double number = 123.0;

// The number that a call wrote; NAN where it is not known, and then nothing may be written.
static double known(int32_t status) {
    DONE(status);
    CHECK(has_value == 1 || (has_value == 0 && number == 123.0));
    const double found = has_value == 1 ? number : NAN;
    has_value = -1;
    number = 123.0;
    return found;
}

static double strength(const bc_material *material, int32_t which) {
    return known(bc_material_strength(material, which, &has_value, &number));
}

// Values of EN 10025-2 and EN 1999-1-1 Table 3.2b, from memory, as in the core.
static void metals(void) {
    bc_material *plate, *profile, *designed;
    DONE(bc_material_steel_of_thickness("S275", 0.02, &plate));
    CHECK(strength(plate, BC_STRENGTH_YIELD) == 265e6);
    CHECK(strength(plate, BC_STRENGTH_ULTIMATE) == 410e6);
    CHECK(isnan(strength(plate, BC_STRENGTH_DESIGN_YIELD)));
    CHECK(isnan(strength(plate, BC_STRENGTH_BENDING)));
    DONE(bc_material_with_metal_factor(plate, 1.1, &designed));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_YIELD), 265e6 / 1.1));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_SHEAR), 265e6 / 1.1 / sqrt(3.0)));
    CHECK(isnan(strength(designed, BC_STRENGTH_DESIGN_BENDING)));
    DONE(bc_material_origin(plate, text, (int64_t)sizeof text, &length));
    CHECK(strstr(text, "EN 10025") != NULL);

    DONE(bc_material_aluminium("EN AW-6082 T6", 0.008, &profile));
    double modulus;
    DONE(bc_material_modulus(profile, BC_TIME_INITIAL, &modulus));
    CHECK(modulus == 70e9 && known(bc_material_density(profile, &has_value, &number)) == 2700.0);
    CHECK(known(bc_material_thermal_expansion(profile, &has_value, &number)) == 23e-6);
    bc_material_free(designed);
    bc_material_free(plate);
    bc_material_free(profile);

    bc_material *none = NULL;
    FAILS(bc_material_steel_of_thickness("S275", 0.2, &none), BC_ERROR_VALUE, "thickness");
    FAILS(bc_material_aluminium("EN AW-1", 0.008, &none), BC_ERROR_NAME, "class");
    CHECK(none == NULL);
}

// C24 (EN 338): G = 690 MPa, E_05 = 7400 MPa, rho_k = 350 kg/m3, rho_mean = 420 kg/m3.
static void overrides(void) {
    bc_material *m, *made;
    double factor = -1.0;
    int32_t count = -1;
    DONE(bc_material_timber("C24", 1, &m));
    CHECK(known(bc_material_fractile_modulus(m, &has_value, &number)) == 7.4e9);
    CHECK(known(bc_material_density(m, &has_value, &number)) == 420.0);
    CHECK(known(bc_material_fractile_density(m, &has_value, &number)) == 350.0);
    CHECK(isnan(known(bc_material_poisson_ratio(m, &has_value, &number))));
    CHECK(near(known(bc_material_shear_modulus(m, BC_TIME_FINAL, &has_value, &number)),
               690e6 / 1.6));
    DONE(bc_material_override_count(m, &count));
    CHECK(count == 0);
    DONE(bc_material_creep_basis(m, text, (int64_t)sizeof text, &length));
    CHECK(strstr(text, "service class 1") != NULL);

    DONE(bc_material_with_modulus(m, 12e9, &made));
    become(&m, made);
    DONE(bc_material_with_fractile_modulus(m, 8e9, &made));
    become(&m, made);
    DONE(bc_material_with_shear_modulus(m, 700e6, &made));
    become(&m, made);
    DONE(bc_material_with_density(m, 450.0, &made));
    become(&m, made);
    DONE(bc_material_with_fractile_density(m, 380.0, &made));
    become(&m, made);
    DONE(bc_material_with_thermal_expansion(m, 4e-6, &made));
    become(&m, made);
    DONE(bc_material_with_creep_factor(m, 0.9, &made));
    become(&m, made);
    const char *const expected[] = {"modulus 12 GPa instead of 11 GPa",
                                    "5 % fractile of the modulus 8 GPa instead of 7.4 GPa",
                                    "shear modulus 700 MPa instead of 690 MPa",
                                    "density 450 kg/m3 instead of 420 kg/m3",
                                    "5 % fractile of the density 380 kg/m3 instead of 350 kg/m3",
                                    "thermal expansion",
                                    "creep factor 0.9 instead of 0.6"};
    DONE(bc_material_override_count(m, &count));
    CHECK(count == 7);
    for (int32_t i = 0; i < count; ++i) {
        DONE(bc_material_override(m, i, text, (int64_t)sizeof text, &length));
        CHECK(i == 5 ? strstr(text, expected[i]) == text : is_text(expected[i]));
    }
    FAILS(bc_material_override(m, 7, text, (int64_t)sizeof text, &length), BC_ERROR_COUNT, "index");
    DONE(bc_material_creep_factor(m, &factor));
    CHECK(factor == 0.9);
    DONE(bc_material_creep_basis(m, text, (int64_t)sizeof text, &length));
    CHECK(is_text("creep factor as given"));
    bc_material_free(m);
}

static void a_material_of_ones_own(void) {
    bc_material *m, *made;
    int32_t count = -1;
    DONE(bc_material_new("own", 100e9, 0.0, &m));
    CHECK(isnan(known(bc_material_shear_modulus(m, BC_TIME_INITIAL, &has_value, &number))));
    DONE(bc_material_with_poisson_ratio(m, 0.25, &made));
    become(&m, made);
    CHECK(known(bc_material_poisson_ratio(m, &has_value, &number)) == 0.25);
    CHECK(near(known(bc_material_shear_modulus(m, BC_TIME_INITIAL, &has_value, &number)), 40e9));
    CHECK(isnan(known(bc_material_density(m, &has_value, &number))));
    CHECK(isnan(known(bc_material_fractile_density(m, &has_value, &number))));
    CHECK(isnan(known(bc_material_fractile_modulus(m, &has_value, &number))));
    CHECK(isnan(known(bc_material_thermal_expansion(m, &has_value, &number))));
    DONE(bc_material_origin(m, text, (int64_t)sizeof text, &length));
    CHECK(is_text(""));
    DONE(bc_material_override_count(m, &count));
    CHECK(count == 0);
    FAILS(bc_material_strength(m, 0, &has_value, &number), BC_ERROR_CHOICE, "strength");
    FAILS(bc_material_density(m, NULL, &number), BC_ERROR_NULL, "has_value_out");
    bc_material_free(m);
}

// f_d = k_mod k_h k_sys f_k/gamma_M, k_h for bending and tension only.
static void strengths(void) {
    bc_material *oak, *along, *across, *designed, *sheared, *metal;
    DONE(bc_material_new("oak", 9.5e9, 0.6, &oak));
    DONE(bc_material_with_characteristic_timber(oak, 30e6, 18e6, 24e6, 4e6, &along));
    DONE(bc_material_with_characteristic_timber_across(oak, 30e6, 18e6, 24e6, 4e6, 0.6e6, 5e6,
                                                       &across));
    CHECK(strength(along, BC_STRENGTH_BENDING) == 30e6);
    CHECK(strength(along, BC_STRENGTH_TENSION) == 18e6);
    CHECK(strength(along, BC_STRENGTH_COMPRESSION) == 24e6);
    CHECK(strength(along, BC_STRENGTH_SHEAR) == 4e6);
    CHECK(isnan(strength(along, BC_STRENGTH_TENSION_ACROSS)));
    CHECK(strength(across, BC_STRENGTH_TENSION_ACROSS) == 0.6e6);
    CHECK(strength(across, BC_STRENGTH_COMPRESSION_ACROSS) == 5e6);
    CHECK(isnan(strength(along, BC_STRENGTH_DESIGN_BENDING)));
    DONE(bc_material_with_timber_factors(along, 0.8, 1.25, 1.1, 1.05, &designed));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_BENDING), 0.8 * 1.1 * 1.05 * 30e6 / 1.25));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_TENSION), 0.8 * 1.1 * 1.05 * 18e6 / 1.25));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_COMPRESSION), 0.8 * 1.05 * 24e6 / 1.25));
    CHECK(near(strength(designed, BC_STRENGTH_DESIGN_SHEAR), 0.8 * 1.05 * 4e6 / 1.25));
    DONE(bc_material_with_shear_strength(oak, 2.5e6, &sheared));
    CHECK(strength(sheared, BC_STRENGTH_DESIGN_SHEAR) == 2.5e6);

    // Characteristic strengths without factors are refused when they are used.
    bc_part *part;
    bc_section *none = NULL;
    DONE(bc_part_rectangle("part", 0.1, 0.2, along, &part));
    const bc_part *parts[] = {part};
    FAILS(bc_section_new(parts, 1, &none), BC_ERROR_MISSING, "materials[\"oak\"].design_factors");
    DONE(bc_error_problem_expected(0, text, (int64_t)sizeof text, &length));
    CHECK(is_text("k_mod and gamma_M, or design strengths") && none == NULL);
    bc_part_free(part);

    DONE(bc_material_with_characteristic_metal(oak, 200e6, &metal));
    CHECK(strength(metal, BC_STRENGTH_YIELD) == 200e6);
    CHECK(isnan(strength(metal, BC_STRENGTH_ULTIMATE)));
    bc_material_free(metal);
    DONE(bc_material_with_characteristic_metal_ultimate(oak, 200e6, 300e6, &metal));
    CHECK(strength(metal, BC_STRENGTH_ULTIMATE) == 300e6);
    bc_material *all[] = {oak, along, across, designed, sheared, metal};
    for (size_t i = 0; i < sizeof all / sizeof all[0]; ++i) {
        bc_material_free(all[i]);
    }
}

// C30/37, and concrete's plain functions: values by an independent calculation of the core's tests.
static void concretes(void) {
    const double day = 86400.0;
    bc_material *c30;
    DONE(bc_material_concrete("C30/37", 2.0, &c30));
    CHECK(strength(c30, BC_STRENGTH_COMPRESSION) == 30e6);
    CHECK(strength(c30, BC_STRENGTH_MEAN_COMPRESSION) == 38e6);
    CHECK(strength(c30, BC_STRENGTH_MEAN_TENSION) == 2.9e6);
    CHECK(known(bc_material_poisson_ratio(c30, &has_value, &number)) == 0.2);
    bc_material_free(c30);

    CHECK(fabs(bc_plain_concrete_mean_modulus(33e6) - 31.476e9) < 0.5e6);
    CHECK(bc_plain_concrete_strength_share(28.0 * day, BC_CEMENT_N) == 1.0);
    CHECK(near(bc_plain_concrete_strength_share(7.0 * day, BC_CEMENT_N), exp(-0.25)));
    CHECK(fabs(bc_plain_concrete_modulus_at_age(33e9, 3.0 * day, BC_CEMENT_N) - 28286e6) < 0.5e6);
    const double shrinkage = bc_plain_concrete_shrinkage(38e6, 50.0, 0.15, 3.0 * day,
                                                         50.0 * 365.25 * day, BC_CEMENT_N);
    CHECK(fabs(shrinkage - 0.49e-3) < 0.005e-3);
    CHECK(isnan(bc_plain_concrete_mean_modulus(-1.0)) &&
          last_error(BC_ERROR_VALUE, "mean_strength"));
    CHECK(isnan(bc_plain_concrete_strength_share(day, 9)) && last_error(BC_ERROR_CHOICE, "cement"));
    CHECK(isnan(bc_plain_concrete_modulus_at_age(33e9, 0.0, BC_CEMENT_N)) &&
          last_error(BC_ERROR_VALUE, "age"));
    CHECK(isnan(bc_plain_concrete_shrinkage(38e6, 0.5, 0.15, day, day, BC_CEMENT_N)) &&
          last_error(BC_ERROR_VALUE, "relative_humidity_percent"));
}

int main(void) {
    metals();
    overrides();
    a_material_of_ones_own();
    strengths();
    concretes();
    return finish();
}
