// Initial strains of parts, durations of actions, transformed outlines: every function.
#include "checks.h"

static const int32_t T = BC_TIME_INITIAL, HELD = BC_SIDEWAYS_HELD;

static bc_part *strip(const char *name, double height, double modulus, double strain) {
    bc_material *stuff;
    bc_part *plain, *made;
    DONE(bc_material_new(name, modulus, 0.0, &stuff));
    DONE(bc_part_rectangle(name, 0.01, height, stuff, &plain));
    DONE(bc_part_with_initial_strain(plain, strain, 0.0, 0.0, &made));
    bc_material_free(stuff);
    bc_part_free(plain);
    return made;
}

// Steel of 1 mm under aluminium of 2 mm, both 80 K warmer.
static bc_section *two_strips(void) {
    bc_part *lower = strip("steel", 0.001, 210e9, 12e-6 * 80.0), *upper;
    bc_part *loose = strip("aluminium", 0.002, 70e9, 23e-6 * 80.0);
    bc_section *section;
    DONE(bc_part_beside(loose, BC_PLACE_ABOVE, "steel", &upper));
    const bc_part *parts[] = {lower, upper};
    DONE(bc_section_new(parts, 2, &section));
    bc_part_free(lower);
    bc_part_free(loose);
    bc_part_free(upper);
    return section;
}

// kappa = 6 d (1+m)^2/(h (3 (1+m)^2 + (1 + m n)(m^2 + 1/(m n)))), d the difference of the free
// strains, m = h_1/h_2, n = E_1/E_2 (Timoshenko, J. Opt. Soc. Am. 11, 1925, 233, from memory). The
// strip that grows more is on top: the section bends upward.
static void strips_bend(const bc_section *section) {
    const double m = 0.5, n = 3.0, d = 11e-6 * 80.0, h = 0.003;
    const double square = (1.0 + m) * (1.0 + m);
    const double kappa =
        6.0 * d * square / (h * (3.0 * square + (1.0 + m * n) * (m * m + 1.0 / (m * n))));
    double axial = 1.0, y = 1.0, z = 1.0;
    DONE(bc_section_free_plane(section, T, HELD, &axial, &y, &z));
    CHECK(fabs(y + kappa) < 1e-10 * kappa && z == 0.0);
    CHECK(fabs(y + 0.43797) < 5e-6);
    // EA eps0 = sum of E A eps*.
    CHECK(near(axial, (210.0 * 12e-6 + 140.0 * 23e-6) * 80.0 / 350.0));
    DONE(bc_section_part_initial_strain(section, "aluminium", &axial, &y, &z));
    CHECK(axial == 23e-6 * 80.0 && y == 0.0 && z == 0.0);
    FAILS(bc_section_part_initial_strain(section, "x", &axial, &y, &z), BC_ERROR_LOOKUP, "part");
    FAILS(bc_section_free_plane(section, T, 3, &axial, &y, &z), BC_ERROR_CHOICE, "sideways");
    FAILS(bc_section_free_plane(section, T, HELD, &axial, &y, NULL), BC_ERROR_NULL,
          "curvature_z_per_m_out");
}

// The strain of a mirror image is mirrored; one that is no number is told by the section.
static void images_and_wrong_strains(void) {
    bc_part *plain = strip("block", 0.01, 10e9, 0.0), *placed, *bent, *other, *image, *wrong;
    bc_section *section = NULL;
    double axial, y, z;
    DONE(bc_part_at(plain, 0.0, 0.02, &placed));
    DONE(bc_part_with_initial_strain(placed, -1e-3, 0.2, 0.3, &bent));
    other = strip("image", 0.01, 10e9, 0.0);
    DONE(bc_part_with_initial_strain(other, -1e-3, 0.2, 0.3, &wrong));
    DONE(bc_part_mirror_of(wrong, "block", BC_MIRROR_LEVEL, &image));
    const bc_part *parts[] = {bent, image};
    DONE(bc_section_new(parts, 2, &section));
    DONE(bc_section_part_initial_strain(section, "block", &axial, &y, &z));
    CHECK(axial == -1e-3 && y == 0.2 && z == 0.3);
    DONE(bc_section_part_initial_strain(section, "image", &axial, &y, &z));
    CHECK(axial == -1e-3 && y == -0.2 && z == 0.3);
    bc_section_free(section);
    bc_part_free(wrong);
    section = NULL;
    DONE(bc_part_with_initial_strain(plain, NAN, 0.0, 0.0, &wrong));
    const bc_part *alone[] = {wrong};
    FAILS(bc_section_new(alone, 1, &section), BC_ERROR_VALUE,
          "section.parts[\"block\"].initial_strain.axial");
    FAILS(bc_part_with_initial_strain(NULL, 0.0, 0.0, 0.0, &wrong), BC_ERROR_NULL, "part");
    CHECK(section == NULL);
    bc_part *all[] = {plain, placed, bent, other, image, wrong};
    for (size_t i = 0; i < sizeof all / sizeof all[0]; ++i) {
        bc_part_free(all[i]);
    }
}

// A simple span bends freely, w = kappa L^2/8; free sideways it is refused with the core's message.
static void a_member(const bc_section *section) {
    bc_action *none, *load, *late;
    bc_plan *plan, *held, *sideways, *wrong;
    bc_member *member = NULL;
    bc_response *response;
    double axial, curvature, z, value, at;
    char found[100], expected[100];
    int64_t length;
    DONE(bc_action_permanent("load", &none));
    DONE(bc_action_with_uniform(none, 0.0, &load));
    DONE(bc_plan_simple_span(section, 1.0, &plan));
    DONE(bc_plan_with_action(plan, load, &held));
    DONE(bc_plan_check(held, &member));
    DONE(bc_member_solve(member, &response));
    DONE(bc_section_free_plane(section, T, HELD, &axial, &curvature, &z));
    DONE(bc_response_extreme(response, BC_FIELD_DEFLECTION, "permanent", T, BC_EXTREME_GREATEST,
                             &value, &at));
    CHECK(near(value, curvature / 8.0) && near(at, 0.5));
    bc_response_free(response);
    bc_member_free(member);
    member = NULL;
    DONE(bc_plan_with_sideways(held, BC_SIDEWAYS_FREE, &sideways));
    FAILS(bc_plan_check(sideways, &member), BC_ERROR_VALUE,
          "section.parts[\"steel\"].initial_strain");
    DONE(bc_error_problem_found(0, found, (int64_t)sizeof found, &length));
    DONE(bc_error_problem_expected(0, expected, (int64_t)sizeof expected, &length));
    CHECK(strcmp(found, "an initial strain in a member that is free sideways") == 0);
    CHECK(strcmp(expected, "a member that is held sideways") == 0);
    // A start before the first day.
    DONE(bc_action_starting(load, -1.0, &late));
    DONE(bc_plan_with_action(plan, late, &wrong));
    FAILS(bc_plan_check(wrong, &member), BC_ERROR_VALUE, "actions[\"load\"].start");
    CHECK(member == NULL);
    bc_plan *plans[] = {plan, held, sideways, wrong};
    for (size_t i = 0; i < sizeof plans / sizeof plans[0]; ++i) {
        bc_plan_free(plans[i]);
    }
    bc_action_free(none);
    bc_action_free(load);
    bc_action_free(late);
}

static void durations(void) {
    bc_action *plain, *made = NULL, *late;
    int32_t has_value = -1, duration = 123;
    double start = 123.0;
    DONE(bc_action_permanent("load", &plain));
    DONE(bc_action_duration(plain, &has_value, &duration));
    CHECK(has_value == 0 && duration == 123);
    DONE(bc_action_start(plain, &has_value, &start));
    CHECK(has_value == 0 && start == 123.0);
    for (int32_t d = BC_DURATION_PERMANENT; d <= BC_DURATION_INSTANTANEOUS; ++d) {
        DONE(bc_action_with_duration(plain, d, &made));
        DONE(bc_action_duration(made, &has_value, &duration));
        CHECK(has_value == 1 && duration == d);
        bc_action_free(made);
    }
    made = NULL;
    FAILS(bc_action_with_duration(plain, 0, &made), BC_ERROR_CHOICE, "duration");
    FAILS(bc_action_with_duration(plain, 6, &made), BC_ERROR_CHOICE, "duration");
    FAILS(bc_action_duration(plain, NULL, &duration), BC_ERROR_NULL, "has_value_out");
    FAILS(bc_action_starting(NULL, 0.0, &made), BC_ERROR_NULL, "action");
    CHECK(made == NULL);
    DONE(bc_action_starting(plain, 28.0 * 86400.0, &late));
    DONE(bc_action_start(late, &has_value, &start));
    CHECK(has_value == 1 && start == 2419200.0);
    bc_action_free(plain);
    bc_action_free(late);
}

// A steel box as if of timber: its two loops are wider by n = 210/10 about its own centroid.
static void transformed_outlines(void) {
    bc_part *timber = strip("timber", 0.02, 10e9, 0.0), *box, *placed;
    bc_material *steel;
    bc_outline *outline;
    bc_section *section;
    double y[4], z[4], ratio, width, area[2] = {0.0, 0.0}, greatest = 0.0;
    int32_t count = 0;
    DONE(bc_material_steel("S275", &steel));
    DONE(bc_outline_box(0.1, 0.2, 0.01, 0.02, &outline));
    DONE(bc_part_new("box", outline, steel, &box));
    DONE(bc_part_beside(box, BC_PLACE_BELOW, "timber", &placed));
    const bc_part *parts[] = {timber, placed};
    DONE(bc_section_new(parts, 2, &section));
    DONE(bc_section_transformed_part(section, T, "timber", "box", &ratio, &width));
    DONE(bc_section_transformed_loop_count(section, T, "timber", "box", &count));
    CHECK(count == 2 && near(ratio, 21.0));
    for (int32_t loop = 0; loop < 2; ++loop) {
        DONE(bc_section_transformed_corner_count(section, T, "timber", "box", loop, &count));
        CHECK(count == 4);
        DONE(bc_section_transformed_corners(section, T, "timber", "box", loop, 4, y, z));
        for (int i = 0; i < 4; ++i) {
            const int next = (i + 1) % 4;
            area[loop] += (y[i] * z[next] - y[next] * z[i]) / 2.0;
            greatest = fmax(greatest, y[i]);
        }
    }
    CHECK(near(greatest, width / 2.0) && near(width, 2.1));
    CHECK(near(fabs(area[0] + area[1]), 21.0 * (0.1 * 0.2 - 0.08 * 0.16)));

    y[0] = 123.0;
    FAILS(bc_section_transformed_corners(section, T, "timber", "box", 0, 3, y, z), BC_ERROR_COUNT,
          "capacity");
    FAILS(bc_section_transformed_corners(section, T, "timber", "box", 2, 4, y, z), BC_ERROR_COUNT,
          "index");
    FAILS(bc_section_transformed_corners(section, T, "timber", "box", 0, 4, y, NULL), BC_ERROR_NULL,
          "z_m_out");
    FAILS(bc_section_transformed_corner_count(section, T, "timber", "box", -1, &count),
          BC_ERROR_COUNT, "index");
    FAILS(bc_section_transformed_loop_count(section, T, "timber", "x", &count), BC_ERROR_LOOKUP,
          "part");
    FAILS(bc_section_transformed_loop_count(section, T, "oak", "box", &count), BC_ERROR_LOOKUP,
          "material");
    CHECK(y[0] == 123.0);
    bc_section_free(section);
    bc_outline_free(outline);
    bc_material_free(steel);
    bc_part_free(timber);
    bc_part_free(box);
    bc_part_free(placed);
}

int main(void) {
    bc_section *section = two_strips();
    strips_bend(section);
    a_member(section);
    bc_section_free(section);
    images_and_wrong_strains();
    durations();
    transformed_outlines();
    return finish();
}
