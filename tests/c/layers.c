// Layers, joints, and what a section says of them: every function.
#include "chain.h"

static char text[1000];
static int64_t length;

#define TEXT(call, expected)                                                                       \
    do {                                                                                           \
        DONE(call);                                                                                \
        CHECK(strcmp(text, (expected)) == 0);                                                      \
    } while (0)
#define INTO text, (int64_t)sizeof text, &length

static void layers(void) {
    const char *names[] = {"left plate", "right plate"};
    bc_layer *layer = NULL;
    int32_t count = 0, has_value = -1;
    double from = -1.0, to = -1.0;
    DONE(bc_layer_new("plates", names, 2, &layer));
    DONE(bc_layer_extent(layer, &has_value, &from, &to));
    CHECK(has_value == 0 && from == -1.0 && to == -1.0);
    CHANGE(bc_layer, layer, bc_layer_between(layer, 0.8, 4.2, &made));
    DONE(bc_layer_extent(layer, &has_value, &from, &to));
    CHECK(has_value == 1 && from == 0.8 && to == 4.2);
    TEXT(bc_layer_name(layer, INTO), "plates");
    DONE(bc_layer_part_count(layer, &count));
    CHECK(count == 2);
    TEXT(bc_layer_part_name(layer, 1, INTO), "right plate");
    bc_layer_free(layer);
}

static bc_joint *screws(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_of_fasteners("screws", "joist", "slab", 10e6, 2, 1, 0.15, &joint));
    return joint;
}

static void joints(void) {
    bc_joint *joint = screws();
    int32_t kind = 0, has_value = -1;
    double value = -1.0;
    TEXT(bc_joint_name(joint, INTO), "screws");
    TEXT(bc_joint_lower(joint, INTO), "joist");
    TEXT(bc_joint_upper(joint, INTO), "slab");
    DONE(bc_joint_kind(joint, &kind));
    CHECK(kind == BC_JOINT_SLIPPING);
    DONE(bc_joint_gap(joint, &has_value, &value));
    CHECK(has_value == 0 && value == -1.0);
    DONE(bc_joint_transverse(joint, &has_value, &value));
    CHECK(has_value == 0 && value == -1.0);
    DONE(bc_joint_clearance(joint, &has_value, &value));
    CHECK(has_value == 0 && value == -1.0);
    DONE(bc_joint_creep_factor(joint, &has_value, &value));
    CHECK(has_value == 0 && value == -1.0);
    CHANGE(bc_joint, joint, bc_joint_with_gap(joint, 0.02, &made));
    CHANGE(bc_joint, joint, bc_joint_with_transverse(joint, 3e7, &made));
    CHANGE(bc_joint, joint, bc_joint_with_clearance(joint, 5e-4, &made));
    CHANGE(bc_joint, joint, bc_joint_with_creep_factor(joint, 1.2, &made));
    DONE(bc_joint_gap(joint, &has_value, &value));
    CHECK(has_value == 1 && value == 0.02);
    DONE(bc_joint_transverse(joint, &has_value, &value));
    CHECK(has_value == 1 && value == 3e7);
    DONE(bc_joint_clearance(joint, &has_value, &value));
    CHECK(has_value == 1 && value == 5e-4);
    DONE(bc_joint_creep_factor(joint, &has_value, &value));
    CHECK(has_value == 1 && value == 1.2);
    bc_joint_free(joint);
    DONE(bc_joint_rigid("glue", "joist", "slab", &joint));
    DONE(bc_joint_kind(joint, &kind));
    CHECK(kind == BC_JOINT_RIGID);
    bc_joint_free(joint);
    DONE(bc_joint_loose("paper", "joist", "slab", &joint));
    DONE(bc_joint_kind(joint, &kind));
    CHECK(kind == BC_JOINT_LOOSE);
    bc_joint_free(joint);
}

// The slip modulus of a joint at a place and a time; -1 where there is none.
static double slip_modulus(const bc_section *section, const char *joint, double x, int32_t time) {
    double modulus = -1.0;
    int32_t has_value = -1;
    DONE(bc_section_joint_slip_modulus(section, joint, x, time, &has_value, &modulus));
    CHECK(has_value == (modulus != -1.0));
    return modulus;
}

static void a_joint_at_its_place(void) {
    bc_joint *joint = screws();
    CHANGE(bc_joint, joint, bc_joint_with_creep_factor(joint, 1.2, &made));
    CHANGE(bc_joint, joint, bc_joint_with_transverse(joint, 3e7, &made));
    CHANGE(bc_joint, joint, bc_joint_with_clearance(joint, 5e-4, &made));
    bc_section *section = slab_on_joist(joint);
    double distance, z, width, value = -1.0;
    int32_t count = -1, has_value = -1;
    DONE(bc_section_joint_place(section, "screws", &distance, &z, &width));
    CHECK(distance == 0.0 && near(z, 0.22) && near(width, 0.1));
    // k = 2 * 1 * 10 kN/mm / 150 mm, and over 1 + 1.2 at the end.
    CHECK(near(slip_modulus(section, "screws", 1.0, BC_TIME_INITIAL), 2e7 / 0.15));
    CHECK(near(slip_modulus(section, "screws", 1.0, BC_TIME_FINAL), 2e7 / 0.15 / 2.2));
    DONE(bc_section_joint_transverse_modulus(section, "screws", 1.0, BC_TIME_FINAL, &has_value,
                                             &value));
    CHECK(has_value == 1 && near(value, 3e7 / 2.2));
    DONE(bc_section_joint_creep_factor(section, "screws", &value));
    CHECK(value == 1.2);
    TEXT(bc_section_joint_creep_basis(section, "screws", INTO),
         "creep factor of the joint as given");
    DONE(bc_section_joint_clearance(section, "screws", &value));
    CHECK(value == 5e-4);
    DONE(bc_section_joint_station_count(section, "screws", &count));
    CHECK(count == 0);
    FAILS(bc_section_joint_place(section, "nails", &distance, &z, &width), BC_ERROR_LOOKUP,
          "joint");
    bc_section_free(section);
}

static void bands_and_glue(void) {
    const double from[] = {0.0, 4.5}, to[] = {1.5, 6.0}, spacing[] = {0.1, 0.2};
    bc_joint *joint = NULL;
    double at = -1.0;
    int32_t count = -1;
    DONE(bc_joint_of_fasteners_in_bands("screws", "joist", "slab", 10e6, 1, 2, from, to, spacing, 2,
                                        &joint));
    bc_section *section = slab_on_joist(joint);
    CHECK(near(slip_modulus(section, "screws", 1.0, BC_TIME_INITIAL), 2e8));
    CHECK(slip_modulus(section, "screws", 3.0, BC_TIME_INITIAL) == 0.0);
    CHECK(near(slip_modulus(section, "screws", 5.0, BC_TIME_INITIAL), 1e8));
    DONE(bc_section_joint_station_count(section, "screws", &count));
    CHECK(count == 4);
    DONE(bc_section_joint_station(section, "screws", 2, &at));
    CHECK(at == 4.5);
    bc_section_free(section);
    // k = G b/t = 2 MPa * 100 mm / 4 mm.
    DONE(bc_joint_of_glue("glue", "joist", "slab", 2e6, 0.1, 0.004, &joint));
    section = slab_on_joist(joint);
    CHECK(near(slip_modulus(section, "glue", 1.0, BC_TIME_FINAL), 5e7));
    bc_section_free(section);
    DONE(bc_joint_rigid("glue", "joist", "slab", &joint));
    section = slab_on_joist(joint);
    CHECK(slip_modulus(section, "glue", 1.0, BC_TIME_INITIAL) == -1.0);
    bc_section_free(section);
}

static void sections(void) {
    bc_section *section = slab_on_joist(screws());
    bc_layer *layer = NULL;
    bc_joint *joint = NULL;
    int32_t count = -1;
    DONE(bc_section_layer_count(section, &count));
    CHECK(count == 2);
    DONE(bc_section_layer(section, 1, &layer));
    TEXT(bc_layer_name(layer, INTO), "slab");
    bc_layer_free(layer);
    DONE(bc_section_joint_count(section, &count));
    CHECK(count == 1);
    DONE(bc_section_joint(section, 0, &joint));
    TEXT(bc_joint_name(joint, INTO), "screws");
    bc_joint_free(joint);
    DONE(bc_section_merged_layer_count(section, &count));
    CHECK(count == 2);
    bc_section_free(section);
    DONE(bc_joint_rigid("glue", "joist", "slab", &joint));
    section = slab_on_joist(joint);
    DONE(bc_section_merged_layer_count(section, &count));
    CHECK(count == 1);
    DONE(bc_section_merged_layer_size(section, 0, &count));
    CHECK(count == 2);
    TEXT(bc_section_merged_layer_name(section, 0, 1, INTO), "slab");
    FAILS(bc_section_merged_layer_name(section, 0, 2, INTO), BC_ERROR_COUNT, "index");
    bc_section_free(section);
}

static void shear_stiffness(void) {
    bc_material *stone = stuff("stone", 30e9);
    CHANGE(bc_material, stone, bc_material_with_shear_modulus(stone, 12e9, &made));
    bc_section *section = rectangle_of(0.1, 0.2, stone), *higher = rectangle_of(0.1, 0.4, stone);
    bc_section *middle = NULL;
    double value = 0.0, left, right, bottom, top, area;
    // 5/6 G A of a rectangle, alone or fastened to nothing.
    DONE(bc_section_shear_stiffness(section, BC_TIME_INITIAL, &value));
    CHECK(near(value, 5.0 / 6.0 * 12e9 * 0.02));
    DONE(bc_section_fastened_shear_stiffness(section, BC_TIME_FINAL, &value));
    CHECK(near(value, 5.0 / 6.0 * 12e9 * 0.02));
    DONE(bc_shear_stiffness_definition(INTO));
    CHECK(strstr(text, "5/6") != NULL);
    DONE(bc_section_between(section, higher, 0.25, &middle));
    DONE(bc_section_part_edges(middle, "block", &left, &right, &bottom, &top, &area));
    CHECK(near(top - bottom, 0.25) && near(area, 0.025));
    bc_section_free(middle);
    bc_section_free(higher);
    // Of layers that slip there is no one shear stiffness.
    bc_section *layered = slab_on_joist(screws());
    FAILS(bc_section_shear_stiffness(layered, BC_TIME_INITIAL, &value), BC_ERROR_GEOMETRY,
          "section.joints");
    FAILS(bc_section_between(section, layered, 0.5, &middle), BC_ERROR_GEOMETRY, "section.parts");
    bc_section_free(layered);
    bc_section_free(section);
    bc_material_free(stone);
}

// The core refuses, in its own words.
static void mistakes(void) {
    bc_material *wood = stuff("wood", 11e9);
    bc_part *part = block("joist", 0.1, 0.22, 0.11, wood);
    const bc_part *parts[] = {part};
    bc_section *section = NULL;
    bc_layer *layer = NULL;
    bc_joint *joint = NULL;
    const char *names[] = {"beam"};
    DONE(bc_layer_new("joist", names, 1, &layer));
    const bc_layer *layers[] = {layer};
    CHECK(bc_section_layered(parts, 1, layers, 1, NULL, 0, &section) == BC_ERROR_NAME);
    DONE(bc_error_text(INTO));
    CHECK(strstr(text, "\"beam\"") != NULL && strstr(text, "section.layers[\"joist\"]") != NULL);
    FAILS(bc_joint_of_fasteners("screws", "joist", "slab", 10e6, -2, 1, 0.15, &joint),
          BC_ERROR_COUNT, "rows");
    FAILS(bc_joint_of_fasteners("screws", "joist", "slab", 10e6, 2, -1, 0.15, &joint),
          BC_ERROR_COUNT, "planes");
    CHECK(section == NULL && joint == NULL);
    bc_layer_free(layer);
    bc_part_free(part);
    bc_material_free(wood);
}

int main(void) {
    layers();
    joints();
    a_joint_at_its_place();
    bands_and_glue();
    sections();
    shear_stiffness();
    mistakes();
    return finish();
}
