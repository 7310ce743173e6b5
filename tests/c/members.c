// Actions, members, responses, stresses and camber: every function.
#include "checks.h"

static const double L = 4.0, B = 0.1, H = 0.2, E = 11e9, Q = 2e3;

static bc_section *joist(void) {
    bc_material *c24, *strong;
    bc_part *part;
    bc_section *section;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_material_with_timber_strength(c24, 14e6, 8e6, 12e6, &strong));
    DONE(bc_part_rectangle("joist", B, H, strong, &part));
    const bc_part *parts[] = {part};
    DONE(bc_section_new(parts, 1, &section));
    bc_part_free(part);
    bc_material_free(c24);
    bc_material_free(strong);
    return section;
}

static void simple_span(const bc_section *section) {
    bc_action *floor, *loaded;
    bc_member *member;
    bc_response *r;
    DONE(bc_action_permanent("floor", &floor));
    DONE(bc_action_with_uniform(floor, Q, &loaded));
    const bc_action *actions[] = {loaded};
    DONE(bc_member_simple_span(section, L, actions, 1, &member));
    DONE(bc_member_solve(member, &r));
    bc_action_free(floor);
    bc_action_free(loaded);
    bc_member_free(member); // The response keeps what it needs.

    const double ei = E * B * H * H * H / 12.0, moment = Q * L * L / 8.0;
    const char *pm = "permanent";
    double value, at, y, z, force, couple;
    DONE(bc_response_extreme(r, BC_FIELD_DEFLECTION, pm, BC_TIME_INITIAL, BC_EXTREME_GREATEST,
                             &value, &at));
    CHECK(near(value, 5.0 * Q * L * L * L * L / (384.0 * ei)) && near(at, L / 2.0));
    DONE(bc_response_extreme(r, BC_FIELD_DEFLECTION, pm, BC_TIME_FINAL, BC_EXTREME_MAXIMUM, &value,
                             &at));
    CHECK(near(value, 1.6 * 5.0 * Q * L * L * L * L / (384.0 * ei)));
    DONE(bc_response_extreme(r, BC_FIELD_SLOPE, pm, BC_TIME_INITIAL, BC_EXTREME_MINIMUM, &value,
                             &at));
    CHECK(near(value, -Q * L * L * L / (24.0 * ei)) && at == L);
    DONE(bc_response_extreme(r, BC_FIELD_SHEAR, pm, BC_TIME_INITIAL, BC_EXTREME_MAXIMUM, &value,
                             &at));
    CHECK(near(value, Q * L / 2.0) && at == 0.0);
    DONE(bc_response_extreme(r, BC_FIELD_MOMENT, pm, BC_TIME_INITIAL, BC_EXTREME_GREATEST, &value,
                             &at));
    CHECK(near(value, moment));

    double x[] = {1.0, 2.0, 4.0};
    DONE(bc_response_values(r, BC_FIELD_MOMENT, pm, BC_TIME_INITIAL, BC_SIDE_RIGHT, x, 3, x));
    CHECK(near(x[0], Q * 1.0 * 3.0 / 2.0) && near(x[1], moment) && fabs(x[2]) < 1e-9 * moment);
    DONE(bc_response_reaction(r, pm, BC_TIME_INITIAL, "left", &force, &couple));
    CHECK(near(force, Q * L / 2.0) && couple == 0.0);

    const double stress = moment * (H / 2.0) * 12.0 / (B * H * H * H);
    DONE(bc_response_stress(r, pm, BC_TIME_INITIAL, "joist", BC_STRESS_TENSION, &value, &at, &y,
                            &z));
    CHECK(near(value, stress) && near(at, L / 2.0) && y == 0.0 && near(z, -H / 2.0));
    DONE(bc_response_stress(r, pm, BC_TIME_INITIAL, "joist", BC_STRESS_COMPRESSION, &value, &at, &y,
                            &z));
    CHECK(near(value, -stress) && near(z, H / 2.0));
    const double middle[] = {2.0};
    const int32_t fibres[] = {BC_FIBRE_BOTTOM, BC_FIBRE_CENTROID, BC_FIBRE_TOP};
    const double factors[] = {1.0, 0.0, -1.0};
    for (int i = 0; i < 3; ++i) {
        DONE(bc_response_stress_values(r, pm, BC_TIME_INITIAL, "joist", fibres[i], BC_SIDE_LEFT,
                                       middle, 1, &value));
        CHECK(fabs(value - factors[i] * stress) <= 1e-12 * stress);
    }
    int32_t has_value;
    DONE(bc_response_utilisation(r, "fundamental", BC_TIME_INITIAL, "joist", &has_value, &value,
                                 &at));
    CHECK(has_value == 1 && near(value, 1.35 * stress / 14e6) && near(at, L / 2.0));
    DONE(bc_response_residual(r, &value));
    CHECK(value >= 0.0 && value < 1e-12);
    bc_response_free(r);
}

static void camber(const bc_response *r) {
    bc_camber *camber;
    double sag, at, target, rise, from, to, station, ordinate, height;
    int32_t count;
    DONE(bc_response_extreme(r, BC_FIELD_DEFLECTION, "quasi-permanent", BC_TIME_FINAL,
                             BC_EXTREME_GREATEST, &sag, &at));
    DONE(bc_camber_new(r, BC_SHAPE_PARABOLA, "quasi-permanent", BC_TIME_FINAL, 0.5, "a", "b", 0.001,
                       BC_ROUNDING_UP, 0.0, 4, &camber));
    DONE(bc_camber_target(camber, &target));
    DONE(bc_camber_rise(camber, &rise));
    CHECK(target > 0.0 && rise >= target && rise - target < 0.001);
    CHECK(fabs(target - 0.5 * sag) < 0.1 * sag);
    DONE(bc_camber_chord(camber, &from, &to));
    CHECK(from == 0.0 && to == 3.0);
    DONE(bc_camber_ordinate_count(camber, &count));
    CHECK(count == 5);
    for (int32_t i = 0; i < count; ++i) {
        DONE(bc_camber_ordinate(camber, i, &station, &ordinate));
        DONE(bc_camber_ordinate_at(camber, from + station, &height));
        CHECK(near(station, 0.75 * i) && near(ordinate, rise * i * (4 - i) / 4.0));
        CHECK(near(height, ordinate));
    }
    bc_camber_free(camber);
}

static void two_spans(const bc_section *section) {
    bc_action *own, *weight, *plain, *line, *live;
    DONE(bc_action_permanent("own weight", &own));
    DONE(bc_action_with_self_weight(own, &weight));
    DONE(bc_action_variable("live", 0.7, 0.5, 0.3, &plain));
    DONE(bc_action_with_partial(plain, 3e3, 0.5, 2.5, &line));
    DONE(bc_action_with_point(line, 4e3, 1.0, &live));
    char text[100];
    int64_t length;
    DONE(bc_action_name(live, text, 100, &length));
    CHECK(strcmp(text, "live") == 0);

    const char *names[] = {"a", "b", "wall"};
    const int32_t kinds[] = {BC_SUPPORT_PIN, BC_SUPPORT_ROLLER, BC_SUPPORT_FIXED};
    const double places[] = {0.0, 3.0, 5.0};
    const bc_action *actions[] = {weight, live};
    bc_member *member;
    bc_response *r;
    DONE(bc_member_new(section, 5.0, names, kinds, places, 3, actions, 2, &member));
    bc_action *all[] = {own, weight, plain, line, live};
    for (size_t i = 0; i < sizeof all / sizeof all[0]; ++i) {
        bc_action_free(all[i]);
    }
    double value, couple, sum = 0.0;
    int32_t count;
    DONE(bc_member_length(member, &value));
    CHECK(value == 5.0);
    DONE(bc_member_combination_count(member, &count));
    CHECK(count == 5);
    DONE(bc_member_combination_name(member, 1, text, 100, &length));
    CHECK(strcmp(text, "quasi-permanent") == 0);
    DONE(bc_member_note_count(member, &count));
    CHECK(count == 0);

    DONE(bc_member_solve(member, &r));
    for (int i = 0; i < 3; ++i) {
        DONE(bc_response_reaction(r, "characteristic", BC_TIME_INITIAL, names[i], &value, &couple));
        sum += value;
        CHECK((couple != 0.0) == (i == 2));
    }
    CHECK(near(sum, 420.0 * B * H * 9.80665 * 5.0 + 3e3 * 2.0 + 4e3));

    // The shear force drops by the point load.
    const double at[] = {1.0};
    double left, right;
    DONE(bc_response_values(r, BC_FIELD_SHEAR, "characteristic", BC_TIME_INITIAL, BC_SIDE_LEFT, at,
                            1, &left));
    DONE(bc_response_values(r, BC_FIELD_SHEAR, "characteristic", BC_TIME_INITIAL, BC_SIDE_RIGHT, at,
                            1, &right));
    CHECK(near(left - right, 4e3));

    const double stations[] = {0.0, 0.5, 1.0, 2.5, 3.0, 5.0};
    DONE(bc_response_station_count(r, &count));
    CHECK(count == 6);
    for (int32_t i = 0; i < count; ++i) {
        DONE(bc_response_station(r, i, &value));
        CHECK(value == stations[i]);
    }
    camber(r);
    bc_response_free(r);
    bc_member_free(member);
}

static void a_place_that_is_merged(const bc_section *section) {
    bc_action *plain, *point;
    bc_member *member;
    char note[300];
    int64_t length;
    int32_t count;
    DONE(bc_action_permanent("post", &plain));
    DONE(bc_action_with_point(plain, 1e3, 3.9999999999, &point));
    const bc_action *actions[] = {point};
    DONE(bc_member_simple_span(section, L, actions, 1, &member));
    DONE(bc_member_note_count(member, &count));
    CHECK(count == 1);
    DONE(bc_member_note(member, 0, note, 300, &length));
    CHECK(strstr(note, "3.9999999999") != NULL);
    bc_action_free(point);
    bc_action_free(plain);
    bc_member_free(member);
}

int main(void) {
    bc_section *section = joist();
    simple_span(section);
    two_spans(section);
    a_place_that_is_merged(section);
    bc_section_free(section);
    return finish();
}
