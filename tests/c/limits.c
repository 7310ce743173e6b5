// Spans' deflections, their components and limits, shapes of camber and readings: every function.
#include "checks.h"

// A joist of C24 (creep factor 0.6) under a permanent and a variable line load (psi_2 0.3).
static const double L = 4.0, B = 0.1, H = 0.2, E = 11e9, G = 2e3, Q = 3e3;
static const char *const CHARACTERISTIC = "characteristic", *const SPAN = "left to right";
static char text[1000];
static int64_t length;

// The deflection at the middle under a line load: 5 q L^4/(384 EI).
static double sag(double q) {
    return 5.0 * q * L * L * L * L / (384.0 * E * B * H * H * H / 12.0);
}

static bc_response *solved(void) {
    bc_material *c24;
    bc_part *part;
    bc_section *section;
    bc_action *none[2], *loads[2];
    bc_member *member;
    bc_response *response;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_part_rectangle("joist", B, H, c24, &part));
    const bc_part *parts[] = {part};
    DONE(bc_section_new(parts, 1, &section));
    DONE(bc_action_permanent("floor", &none[0]));
    DONE(bc_action_variable("live", 0.7, 0.5, 0.3, &none[1]));
    DONE(bc_action_with_uniform(none[0], G, &loads[0]));
    DONE(bc_action_with_uniform(none[1], Q, &loads[1]));
    const bc_action *actions[] = {loads[0], loads[1]};
    DONE(bc_member_simple_span(section, L, actions, 2, &member));
    DONE(bc_member_solve(member, &response));
    for (int i = 0; i < 2; ++i) {
        bc_action_free(none[i]);
        bc_action_free(loads[i]);
    }
    bc_member_free(member);
    bc_section_free(section);
    bc_part_free(part);
    bc_material_free(c24);
    return response;
}

static bc_camber *cambered(const bc_response *r, int32_t shape, double least_m) {
    bc_camber *camber = NULL;
    DONE(bc_camber_new(r, shape, "quasi-permanent", BC_TIME_FINAL, 1.0, "left", "right", 0.001,
                       BC_ROUNDING_NEAREST, least_m, 8, &camber));
    return camber;
}

static void spans(const bc_response *r) {
    double value, at;
    const double middle[] = {L / 2.0};
    DONE(bc_response_span_extreme(r, CHARACTERISTIC, BC_TIME_INITIAL, SPAN, BC_EXTREME_GREATEST,
                                  &value, &at));
    CHECK(near(value, sag(G + Q)) && near(at, L / 2.0));
    DONE(bc_response_span_values(r, "permanent", BC_TIME_FINAL, SPAN, middle, 1, &value));
    CHECK(near(value, 1.6 * sag(G)));
}

static void components(const bc_response *r, const bc_camber *camber) {
    const double w_1 = sag(G), w_2 = 0.6 * sag(G), w_3 = (1.0 + 0.3 * 0.6) * sag(Q);
    const double expected[] = {sag(G + Q), w_1, w_2, w_3, w_1 + w_2 + w_3, w_1 + w_2 + w_3};
    const double middle[] = {L / 2.0};
    double value, at, rise;
    for (int32_t i = 0; i < 6; ++i) {
        DONE(bc_response_component_extreme(r, BC_COMPONENT_INSTANT + i, CHARACTERISTIC, SPAN, NULL,
                                           BC_EXTREME_MAXIMUM, &value, &at));
        CHECK(near(value, expected[i]) && near(at, L / 2.0));
    }
    DONE(bc_camber_rise(camber, &rise));
    DONE(bc_response_component_values(r, BC_COMPONENT_REMAINING, CHARACTERISTIC, SPAN, camber,
                                      middle, 1, &value));
    CHECK(near(value, w_1 + w_2 + w_3 - rise));
    DONE(bc_response_component_values(r, BC_COMPONENT_TOTAL, CHARACTERISTIC, SPAN, camber, middle,
                                      1, &value));
    CHECK(near(value, w_1 + w_2 + w_3));
    DONE(bc_response_remaining_values(r, CHARACTERISTIC, BC_TIME_FINAL, camber, middle, 1, &value));
    CHECK(near(value, w_1 + w_2 + w_3 - rise));
    DONE(bc_response_remaining_extreme(r, CHARACTERISTIC, BC_TIME_FINAL, camber,
                                       BC_EXTREME_MAXIMUM, &value, &at));
    CHECK(near(value, w_1 + w_2 + w_3 - rise) && near(at, L / 2.0));
}

static void shapes(const bc_response *r) {
    double rise, radius = 123.0;
    int32_t has_value = -1, shape = 0;
    for (int32_t i = BC_SHAPE_PARABOLA; i <= BC_SHAPE_ARC_LEAST_GAP; ++i) {
        bc_camber *camber = cambered(r, i, 0.0);
        DONE(bc_camber_shape(camber, &shape));
        CHECK(shape == i);
        DONE(bc_camber_rise(camber, &rise));
        DONE(bc_camber_radius(camber, &has_value, &radius));
        if (i == BC_SHAPE_PARABOLA || i == BC_SHAPE_MIRROR) {
            CHECK(has_value == 0 && radius == 123.0);
        } else {
            CHECK(has_value == 1 && near(radius, (L * L / 4.0 + rise * rise) / (2.0 * rise)));
        }
        bc_camber_free(camber);
    }
    // No rise, since it would be less than the least worth building.
    bc_camber *none = cambered(r, BC_SHAPE_ARC_THROUGH_MIDDLE, 1.0);
    DONE(bc_camber_rise(none, &rise));
    DONE(bc_camber_radius(none, &has_value, &radius));
    CHECK(rise == 0.0 && has_value == 0);
    bc_camber_free(none);
}

static void limits(const bc_response *r) {
    const double total = 1.6 * sag(G) + (1.0 + 0.3 * 0.6) * sag(Q);
    bc_limit *over, *plain, *in_span, *under;
    bc_checks *checks;
    int32_t count, component;
    double value, at, allowed, utilisation;
    DONE(bc_limit_span_over(BC_COMPONENT_TOTAL, 250.0, &over));
    DONE(bc_limit_value(BC_COMPONENT_INSTANT, 0.02, &plain));
    DONE(bc_limit_in_span(plain, SPAN, &in_span));
    DONE(bc_limit_under(in_span, "quasi-permanent", &under));
    const bc_limit *all[] = {over, in_span, under};
    DONE(bc_response_check_limits(r, all, 3, NULL, &checks));
    bc_limit *made[] = {over, plain, in_span, under};
    for (int i = 0; i < 4; ++i) {
        bc_limit_free(made[i]);
    }
    const int32_t components[] = {BC_COMPONENT_TOTAL, BC_COMPONENT_INSTANT, BC_COMPONENT_INSTANT};
    const char *combinations[] = {CHARACTERISTIC, CHARACTERISTIC, "quasi-permanent"};
    const double values[] = {total, sag(G + Q), sag(G + 0.3 * Q)};
    const double allowances[] = {L / 250.0, 0.02, 0.02};
    DONE(bc_checks_count(checks, &count));
    CHECK(count == 3);
    for (int32_t i = 0; i < 3; ++i) {
        DONE(bc_checks_component(checks, i, &component));
        CHECK(component == components[i]);
        DONE(bc_checks_span(checks, i, text, (int64_t)sizeof text, &length));
        CHECK(strcmp(text, SPAN) == 0);
        DONE(bc_checks_combination(checks, i, text, (int64_t)sizeof text, &length));
        CHECK(strcmp(text, combinations[i]) == 0);
        DONE(bc_checks_values(checks, i, &value, &at, &allowed, &utilisation));
        CHECK(near(value, values[i]) && near(at, L / 2.0) && allowed == allowances[i]);
        CHECK(near(utilisation, values[i] / allowances[i]));
    }
    bc_checks_free(checks);
}

// On trestles at its ends the joist hangs by its own weight.
static void readings(const bc_response *r, const bc_camber *camber) {
    const char *parts[] = {"joist"};
    bc_readings *readings;
    int32_t count;
    double station, lying, standing, rise;
    DONE(bc_response_readings(r, camber, 0.0, L, parts, 1, &readings));
    DONE(bc_camber_rise(camber, &rise));
    DONE(bc_readings_count(readings, &count));
    CHECK(count == 9);
    DONE(bc_readings_reading(readings, 4, &station, &lying, &standing));
    CHECK(station == L / 2.0 && lying == rise);
    CHECK(near(standing, rise - sag(420.0 * B * H * 9.80665)));
    bc_readings_free(readings);
}

static void says(const char *message) {
    DONE(bc_error_text(text, (int64_t)sizeof text, &length));
    if (strcmp(text, message) != 0) {
        ++failures;
        fprintf(stderr, "found\n%s\nexpected\n%s\n", text, message);
    }
}

// The core refuses, in its own words; all that is wrong is told at once.
static void mistakes(const bc_response *r, const bc_camber *camber) {
    bc_limit *negative, *plain, *elsewhere;
    bc_checks *checks = NULL;
    DONE(bc_limit_value(BC_COMPONENT_INSTANT, -0.02, &negative));
    DONE(bc_limit_span_over(BC_COMPONENT_TOTAL, 300.0, &plain));
    DONE(bc_limit_in_span(plain, "cellar", &elsewhere));
    const bc_limit *all[] = {negative, elsewhere};
    CHECK(bc_response_check_limits(r, all, 2, camber, &checks) == BC_ERROR_VALUE && checks == NULL);
    says("2 problems:\n"
         "- limits[0].value: found -20 mm; expected a length greater than zero\n"
         "- limits[1].span: found the unknown span \"cellar\"; expected one of \"left to right\"");
    bc_limit_free(negative);
    bc_limit_free(plain);
    bc_limit_free(elsewhere);

    const char *parts[] = {"joist"};
    bc_readings *readings = NULL;
    CHECK(bc_response_readings(r, camber, 1.0, 4.5, parts, 1, &readings) == BC_ERROR_POSITION);
    CHECK(readings == NULL);
    says("camber.trestles.right: found 4.5 m; expected a place on the member, from 0 m to 4 m");
    FAILS(bc_response_readings(r, camber, 1.0, 3.0, NULL, 0, &readings), BC_ERROR_MISSING,
          "camber.trestles.parts");
    double value, at;
    FAILS(bc_response_span_extreme(r, "permanent", BC_TIME_FINAL, "cellar", BC_EXTREME_GREATEST,
                                   &value, &at),
          BC_ERROR_LOOKUP, "span");
    bc_camber *none = NULL;
    FAILS(bc_camber_new(r, BC_SHAPE_PARABOLA, "permanent", BC_TIME_FINAL, 1.0, "left", "right",
                        0.001, BC_ROUNDING_UP, -0.001, 4, &none),
          BC_ERROR_VALUE, "camber.least");
    CHECK(none == NULL);
}

int main(void) {
    bc_response *response = solved();
    bc_camber *camber = cambered(response, BC_SHAPE_PARABOLA, 0.0);
    spans(response);
    components(response, camber);
    shapes(response);
    limits(response);
    readings(response, camber);
    mistakes(response, camber);
    bc_camber_free(camber);
    bc_response_free(response);
    return finish();
}
