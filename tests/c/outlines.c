// Outlines, places, principal stiffnesses, stresses at points and sideways freedom: every function.
#include "checks.h"

static const double PI = 3.14159265358979323846, E = 210e9;
static bc_material *steel;

// A section of one part of an outline, which is freed.
static bc_section *section_of(bc_outline *outline) {
    bc_part *part;
    bc_section *section;
    DONE(bc_part_new("part", outline, steel, &part));
    const bc_part *parts[] = {part};
    DONE(bc_section_new(parts, 1, &section));
    bc_part_free(part);
    bc_outline_free(outline);
    return section;
}

// Whether an outline, which is freed, has a word, an area and a height.
static int is(bc_outline *outline, const char *word, double area, double height) {
    char name[20];
    int64_t length;
    double left, right, bottom, top, found;
    DONE(bc_outline_name(outline, name, (int64_t)sizeof name, &length));
    bc_section *section = section_of(outline);
    DONE(bc_section_part_edges(section, "part", &left, &right, &bottom, &top, &found));
    bc_section_free(section);
    return strcmp(name, word) == 0 && near(found, area) && near(top - bottom, height);
}

static bc_outline *square(void) {
    const double y[] = {0.0, 0.2, 0.2, 0.0}, z[] = {0.0, 0.0, 0.2, 0.2};
    bc_outline *made;
    DONE(bc_outline_polygon(y, z, 4, &made));
    return made;
}

static void shapes(void) {
    bc_outline *o;
    DONE(bc_outline_rectangle(0.1, 0.2, &o));
    CHECK(is(o, "rectangle", 0.02, 0.2));
    CHECK(is(square(), "polygon", 0.04, 0.2));
    DONE(bc_outline_disc(0.04, &o));
    CHECK(is(o, "disc", PI * 0.0004, 0.04));
    DONE(bc_outline_ring(0.06, 0.005, &o));
    CHECK(is(o, "ring", PI * (0.03 * 0.03 - 0.025 * 0.025), 0.06));
    DONE(bc_outline_i_shape(0.3, 0.1, 0.01, 0.2, 0.02, 0.008, &o));
    CHECK(is(o, "i_shape", 0.1 * 0.01 + 0.2 * 0.02 + 0.27 * 0.008, 0.3));
    DONE(bc_outline_tee(0.2, 0.15, 0.02, 0.012, &o));
    CHECK(is(o, "tee", 0.15 * 0.02 + 0.18 * 0.012, 0.2));
    DONE(bc_outline_channel(0.1, 0.04, 0.008, 0.006, &o));
    CHECK(is(o, "channel", 2.0 * 0.04 * 0.008 + 0.084 * 0.006, 0.1));
    DONE(bc_outline_angle(0.1, 0.08, 0.01, &o));
    CHECK(is(o, "angle", 0.1 * 0.01 + 0.07 * 0.01, 0.1));
    DONE(bc_outline_box(0.1, 0.2, 0.01, 0.02, &o));
    CHECK(is(o, "box", 0.1 * 0.2 - 0.08 * 0.16, 0.2));
}

// A square of 200 mm with a square hole of 100 mm in its middle.
static void a_hole(void) {
    const double y[] = {0.05, 0.15, 0.15, 0.05}, z[] = {0.05, 0.05, 0.15, 0.15};
    bc_outline *whole = square(), *holed;
    DONE(bc_outline_with_hole(whole, y, z, 4, &holed));
    bc_section *section = section_of(holed);
    double yy, zz, yz;
    DONE(bc_section_bending_stiffness(section, BC_TIME_INITIAL, &yy, &zz, &yz));
    CHECK(near(yy, E * (0.2 * 0.2 * 0.2 * 0.2 - 0.1 * 0.1 * 0.1 * 0.1) / 12.0) && near(zz, yy));
    bc_section_free(section);

    bc_outline *disc, *none = NULL;
    bc_part *part;
    bc_section *nothing = NULL;
    DONE(bc_outline_disc(0.2, &disc));
    FAILS(bc_outline_with_hole(disc, y, z, 4, &none), BC_ERROR_GEOMETRY, "outline");
    FAILS(bc_outline_with_hole(whole, y, NULL, 4, &none), BC_ERROR_NULL, "z_m");
    FAILS(bc_outline_polygon(y, z, -1, &none), BC_ERROR_COUNT, "count of y_m");
    FAILS(bc_outline_disc(0.2, NULL), BC_ERROR_NULL, "outline_out");
    FAILS(bc_part_new("part", NULL, steel, &part), BC_ERROR_NULL, "outline");
    CHECK(none == NULL);
    bc_outline_free(disc);
    bc_outline_free(whole);
    bc_outline_free(NULL);

    // A polygon of two points, and a wall that leaves no room: told when they are used.
    const struct {
        int is_polygon;
        const char *path, *expected;
    } wrong[] = {{1, "section.parts[\"part\"].outline.polygon.points", "at least 3 points"},
                 {0, "section.parts[\"part\"].outline.ring.wall_thickness",
                  "less than half of the diameter, 60 mm"}};
    for (int i = 0; i < 2; ++i) {
        DONE(wrong[i].is_polygon ? bc_outline_polygon(y, z, 2, &none)
                                 : bc_outline_ring(0.06, 0.04, &none));
        DONE(bc_part_new("part", none, steel, &part));
        const bc_part *parts[] = {part};
        CHECK(bc_section_new(parts, 1, &nothing) != BC_OK && nothing == NULL);
        char path[200], expected[300];
        int64_t length;
        DONE(bc_error_problem_path(0, path, (int64_t)sizeof path, &length));
        DONE(bc_error_problem_expected(0, expected, (int64_t)sizeof expected, &length));
        CHECK(strcmp(path, wrong[i].path) == 0 && strstr(expected, wrong[i].expected) != NULL);
        bc_part_free(part);
        bc_outline_free(none);
    }
}

// A host with a bar near its bottom, and the mirror image of a block beside it.
static void places(void) {
    bc_outline *disc;
    bc_part *host, *bar, *set, *heavy, *block, *placed, *image, *none = NULL;
    bc_section *section;
    double left, right, bottom, top, area, mass;
    int32_t has_value = 0;
    DONE(bc_part_rectangle("host", 0.1, 0.2, steel, &host));
    DONE(bc_outline_disc(0.02, &disc));
    DONE(bc_part_new("bar", disc, steel, &bar));
    DONE(bc_part_set_into(bar, "host", 0.01, -0.07, &set));
    DONE(bc_part_with_line_mass(set, 3.0, &heavy));
    DONE(bc_part_rectangle("block", 0.02, 0.02, steel, &block));
    DONE(bc_part_at(block, 0.06, 0.05, &placed));
    DONE(bc_part_mirror_of(block, "block", BC_MIRROR_LEVEL, &image));
    FAILS(bc_part_mirror_of(block, "block", 3, &none), BC_ERROR_CHOICE, "axis");
    FAILS(bc_part_set_into(bar, NULL, 0.0, 0.0, &none), BC_ERROR_NULL, "host_name");
    CHECK(none == NULL);
    const bc_part *parts[] = {host, heavy, placed};
    DONE(bc_section_new(parts, 3, &section));
    DONE(bc_section_part_edges(section, "host", &left, &right, &bottom, &top, &area));
    CHECK(near(area, 0.02 - PI * 0.0001) && near(top, 0.1));
    DONE(bc_section_part_edges(section, "bar", &left, &right, &bottom, &top, &area));
    CHECK(fabs(left) < 1e-15 && near(bottom, -0.08) && near(area, PI * 0.0001));
    DONE(bc_section_line_mass(section, &has_value, &mass));
    CHECK(has_value == 1 && near(mass, 7850.0 * (0.02 - PI * 0.0001 + 0.0004) + 3.0));
    bc_section_free(section);

    // A part cannot be its own mirror image: the core says why.
    const bc_part *own[] = {host, image};
    section = NULL;
    FAILS(bc_section_new(own, 2, &section), BC_ERROR_NAME,
          "section.parts[\"block\"].place.mirror_of");
    CHECK(section == NULL);
    // The image of a block at the right stands at the left.
    bc_part *other, *mirrored;
    DONE(bc_part_rectangle("other", 0.02, 0.02, steel, &other));
    DONE(bc_part_mirror_of(other, "block", BC_MIRROR_UPRIGHT, &mirrored));
    const bc_part *pair[] = {placed, mirrored, host};
    DONE(bc_section_new(pair, 3, &section));
    DONE(bc_section_part_edges(section, "other", &left, &right, &bottom, &top, &area));
    CHECK(near(left, -0.07) && near(right, -0.05) && near(bottom, 0.04) && near(top, 0.06));
    bc_section_free(section);
    bc_outline_free(disc);
    bc_part *all[] = {host, bar, set, heavy, block, placed, image, other, mirrored};
    for (size_t i = 0; i < sizeof all / sizeof all[0]; ++i) {
        bc_part_free(all[i]);
    }
}

// N/A - M_y z/I_y - M_z y/I_z at the points of a rectangle.
static void stresses(void) {
    bc_outline *outline;
    DONE(bc_outline_rectangle(0.1, 0.2, &outline));
    bc_section *section = section_of(outline);
    const int32_t t = BC_TIME_INITIAL, free_ = BC_SIDEWAYS_FREE;
    const double n = 5e3, my = 4e3, mz = 1e3, y = 0.02, z = 0.07;
    const double iy = 0.1 * 0.008 / 12.0, iz = 0.2 * 0.001 / 12.0;
    double value, at_y, at_z;
    DONE(bc_section_stress_at(section, t, free_, "part", y, z, n, my, mz, &value));
    CHECK(near(value, n / 0.02 - my * z / iy - mz * y / iz));
    DONE(bc_section_stress_at(section, t, BC_SIDEWAYS_HELD, "part", y, z, n, my, mz, &value));
    CHECK(near(value, n / 0.02 - my * z / iy));
    DONE(bc_section_stress_extreme(section, t, free_, "part", n, my, mz, BC_STRESS_TENSION, &value,
                                   &at_y, &at_z));
    CHECK(near(value, n / 0.02 + my * 0.1 / iy + mz * 0.05 / iz));
    CHECK(near(at_y, -0.05) && near(at_z, -0.1));
    DONE(bc_section_stress_extreme(section, t, free_, "part", n, my, mz, BC_STRESS_COMPRESSION,
                                   &value, &at_y, &at_z));
    CHECK(near(value, n / 0.02 - my * 0.1 / iy - mz * 0.05 / iz));
    CHECK(near(at_y, 0.05) && near(at_z, 0.1));

    value = 123.0;
    FAILS(bc_section_stress_at(section, t, free_, "part", y, z, n, NAN, mz, &value),
          BC_ERROR_VALUE, "forces.moment_y");
    FAILS(bc_section_stress_at(section, t, free_, "x", y, z, n, my, mz, &value), BC_ERROR_LOOKUP,
          "part");
    FAILS(bc_section_stress_at(section, t, 0, "part", y, z, n, my, mz, &value), BC_ERROR_CHOICE,
          "sideways");
    CHECK(value == 123.0);
    bc_section_free(section);
}

// An angle of equal legs: its axis of symmetry is that of the greater stiffness. Free sideways, it
// bends about both axes: w = 5 q L^4/(384 EI), EI = EI_yy - EI_yz^2/EI_zz, v = w EI_yz/EI_zz.
static void an_angle(void) {
    const double q = 1e3, span = 3.0, middle[] = {1.5};
    bc_outline *outline;
    bc_action *none, *load;
    bc_plan *plan, *held, *sided, *loaded, *made = NULL;
    bc_member *member;
    bc_response *response;
    int32_t sideways = 0;
    double yy, zz, yz, greater, smaller, turn, value, at, y, z, expected, expected_y, expected_z;
    DONE(bc_outline_angle(0.1, 0.1, 0.01, &outline));
    bc_section *section = section_of(outline);
    DONE(bc_section_bending_stiffness(section, BC_TIME_INITIAL, &yy, &zz, &yz));
    DONE(bc_section_principal(section, BC_TIME_INITIAL, &greater, &smaller, &turn));
    CHECK(near(greater, yy + fabs(yz)) && near(smaller, yy - fabs(yz)) && near(turn, PI / 4.0));

    DONE(bc_action_permanent("load", &none));
    DONE(bc_action_with_uniform(none, q, &load));
    DONE(bc_plan_simple_span(section, span, &plan));
    DONE(bc_plan_with_action(plan, load, &held));
    FAILS(bc_plan_with_sideways(held, 3, &made), BC_ERROR_CHOICE, "sideways");
    DONE(bc_plan_check(held, &member));
    DONE(bc_member_sideways(member, &sideways));
    CHECK(sideways == BC_SIDEWAYS_HELD && made == NULL);
    DONE(bc_member_solve(member, &response));
    DONE(bc_response_sideways_extreme(response, "permanent", BC_TIME_INITIAL, BC_EXTREME_GREATEST,
                                      &value, &at));
    CHECK(value == 0.0);
    bc_response_free(response);
    bc_member_free(member);

    DONE(bc_plan_with_sideways(held, BC_SIDEWAYS_FREE, &sided));
    DONE(bc_plan_check(sided, &member));
    DONE(bc_member_sideways(member, &sideways));
    CHECK(sideways == BC_SIDEWAYS_FREE);
    DONE(bc_member_solve(member, &response));
    const double w = 5.0 * q * 81.0 / (384.0 * (yy - yz * yz / zz));
    DONE(bc_response_extreme(response, BC_FIELD_DEFLECTION, "permanent", BC_TIME_INITIAL,
                             BC_EXTREME_GREATEST, &value, &at));
    CHECK(near(value, w) && near(at, 1.5));
    DONE(bc_response_sideways_extreme(response, "permanent", BC_TIME_INITIAL, BC_EXTREME_GREATEST,
                                      &value, &at));
    CHECK(near(value, w * yz / zz) && near(at, 1.5));
    DONE(bc_response_sideways_values(response, "permanent", BC_TIME_INITIAL, middle, 1, &value));
    CHECK(near(value, w * yz / zz));
    FAILS(bc_response_sideways_values(response, "snow", BC_TIME_INITIAL, middle, 1, &value),
          BC_ERROR_LOOKUP, "combination");

    // The stress stands at the corner that the section finds under the moment q L^2/8.
    DONE(bc_response_stress(response, "permanent", BC_TIME_INITIAL, "part", BC_STRESS_TENSION,
                            &value, &at, &y, &z));
    DONE(bc_section_stress_extreme(section, BC_TIME_INITIAL, BC_SIDEWAYS_FREE, "part", 0.0,
                                   q * 9.0 / 8.0, 0.0, BC_STRESS_TENSION, &expected, &expected_y,
                                   &expected_z));
    CHECK(near(value, expected) && y == expected_y && z == expected_z && near(at, 1.5));
    DONE(bc_plan_with_action(sided, load, &loaded));
    FAILS(bc_plan_check(loaded, &member), BC_ERROR_DUPLICATE, "actions");
    bc_response_free(response);
    bc_member_free(member);
    bc_plan *plans[] = {plan, held, sided, loaded};
    for (size_t i = 0; i < sizeof plans / sizeof plans[0]; ++i) {
        bc_plan_free(plans[i]);
    }
    bc_action_free(none);
    bc_action_free(load);
    bc_section_free(section);
}

int main(void) {
    DONE(bc_material_steel("S275", &steel));
    shapes();
    a_hole();
    places();
    stresses();
    an_angle();
    bc_material_free(steel);
    return finish();
}
