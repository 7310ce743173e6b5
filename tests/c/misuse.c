// Wrong uses of the binding itself: NULL, choices, counts, buffers, texts, order of freeing.
#include "checks.h"

static bc_material *c24;
static bc_part *joist;
static bc_section *section;
static bc_action *load;
static bc_member *member;
static bc_response *response;
static double a, b, c, d;
static int32_t n;
static int64_t length;

static void set_up(void) {
    bc_action *plain;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_part_rectangle("joist", 0.1, 0.2, c24, &joist));
    const bc_part *parts[] = {joist};
    DONE(bc_section_new(parts, 1, &section));
    DONE(bc_action_permanent("floor", &plain));
    DONE(bc_action_with_uniform(plain, 2e3, &load));
    bc_action_free(plain);
    const bc_action *actions[] = {load};
    DONE(bc_member_simple_span(section, 4.0, actions, 1, &member));
    DONE(bc_member_solve(member, &response));
}

#define IS_NULL(call, parameter) FAILS(call, BC_ERROR_NULL, parameter)

static void null_pointers(void) {
    bc_material *m = NULL;
    bc_part *p = NULL;
    bc_section *s = NULL;
    bc_action *q = NULL;
    bc_member *g = NULL;
    bc_response *r = NULL;
    bc_plan *plan = NULL;
    bc_readings *readings = NULL;
    bc_checks *checks = NULL;
    bc_limit *limit = NULL;
    const bc_limit *limits[] = {NULL};
    const bc_part *holes[] = {joist, NULL};
    const bc_action *actions[] = {NULL};
    const char *names[] = {"left", NULL};
    const int32_t kinds[] = {BC_SUPPORT_PIN, BC_SUPPORT_ROLLER};
    const double at[] = {0.0, 4.0};
    char text[10];
    IS_NULL(bc_material_steel(NULL, &m), "class_name");
    IS_NULL(bc_material_steel("S275", NULL), "material_out");
    IS_NULL(bc_material_named(NULL, "x", &m), "material");
    IS_NULL(bc_material_with_density(c24, 420.0, NULL), "material_out");
    IS_NULL(bc_material_modulus(c24, BC_TIME_FINAL, NULL), "modulus_Pa_out");
    IS_NULL(bc_part_rectangle("x", 0.1, 0.1, NULL, &p), "material");
    IS_NULL(bc_part_beside(joist, BC_PLACE_ABOVE, NULL, &p), "other_name");
    IS_NULL(bc_section_new(NULL, 1, &s), "parts");
    IS_NULL(bc_section_new(holes, 2, &s), "parts[1]");
    IS_NULL(bc_section_centroid(section, BC_TIME_FINAL, &a, NULL), "z_m_out");
    IS_NULL(bc_section_bending_stiffness(NULL, BC_TIME_FINAL, &a, &b, &c), "section");
    IS_NULL(bc_action_with_point(NULL, 1e3, 1.0, &q), "action");
    IS_NULL(bc_member_simple_span(section, 4.0, actions, 1, &g), "actions[0]");
    IS_NULL(bc_member_new(section, 4.0, names, kinds, at, 2, NULL, 0, &g), "support_names[1]");
    IS_NULL(bc_member_new(section, 4.0, names, NULL, at, 2, NULL, 0, &g), "support_kinds");
    IS_NULL(bc_member_solve(NULL, &r), "member");
    IS_NULL(bc_plan_of_length(NULL, 4.0, &plan), "section");
    IS_NULL(bc_plan_with_action(NULL, load, &plan), "plan");
    IS_NULL(bc_plan_check(NULL, &g), "plan");
    IS_NULL(bc_action_with_couple(load, 1e3, 1.0, NULL), "action_out");
    IS_NULL(bc_response_remaining_extreme(response, "permanent", BC_TIME_FINAL, NULL, 1, &a, &b),
            "camber");
    IS_NULL(bc_response_readings(response, NULL, 0.0, 4.0, NULL, 0, &readings), "camber");
    IS_NULL(bc_response_check_limits(response, limits, 1, NULL, &checks), "limits[0]");
    IS_NULL(bc_limit_under(NULL, "permanent", &limit), "limit");
    IS_NULL(bc_category_of_name(NULL, &n), "name");
    CHECK(plan == NULL && readings == NULL && checks == NULL && limit == NULL);
    IS_NULL(bc_response_extreme(response, BC_FIELD_SHEAR, NULL, BC_TIME_FINAL, BC_EXTREME_MINIMUM,
                                &a, &b),
            "combination");
    IS_NULL(bc_response_values(response, BC_FIELD_SHEAR, "permanent", BC_TIME_FINAL, BC_SIDE_LEFT,
                               NULL, 2, &a),
            "x_m");
    IS_NULL(bc_response_values(response, BC_FIELD_SHEAR, "permanent", BC_TIME_FINAL, BC_SIDE_LEFT,
                               at, 2, NULL),
            "values_out");
    IS_NULL(bc_job_read(NULL, BC_FORMAT_TOML, NULL), "document");
    IS_NULL(bc_outcome_number(NULL, "x", &a), "outcome");
    IS_NULL(bc_version(text, 10, NULL), "length_out");
    IS_NULL(bc_version(NULL, 10, &length), "buffer");
    CHECK(bc_error_text(text, 10, NULL) == BC_ERROR_NULL);
    CHECK(m == NULL && p == NULL && s == NULL && q == NULL && g == NULL && r == NULL);
}

#define NO_CHOICE(call, parameter) FAILS(call, BC_ERROR_CHOICE, parameter)

static void choices(void) {
    bc_material *m = NULL;
    bc_part *p = NULL;
    bc_member *g = NULL;
    bc_camber *k = NULL;
    bc_action *q = NULL;
    bc_limit *w = NULL;
    bc_plan *plan, *made = NULL;
    bc_job *j = NULL;
    DONE(bc_plan_simple_span(section, 4.0, &plan));
    const char *names[] = {"left"};
    const int32_t kinds[] = {4};
    const double at[] = {0.0};
    const char *pm = "permanent";
    NO_CHOICE(bc_material_modulus(c24, 0, &a), "time");
    NO_CHOICE(bc_material_concrete_with_creep("C30/37", 38e6, 50, 0.1, 1e6, 1e9, -1, &m), "cement");
    NO_CHOICE(bc_part_beside(joist, 5, "other", &p), "place");
    NO_CHOICE(bc_member_new(section, 4.0, names, kinds, at, 1, NULL, 0, &g), "support_kind");
    NO_CHOICE(bc_response_extreme(response, 0, pm, BC_TIME_FINAL, 1, &a, &b), "field");
    NO_CHOICE(bc_response_extreme(response, 1, pm, 3, 1, &a, &b), "time");
    NO_CHOICE(bc_response_extreme(response, 1, pm, 1, INT32_MIN, &a, &b), "extreme");
    NO_CHOICE(bc_response_values(response, 1, pm, 1, 3, at, 1, &a), "side");
    NO_CHOICE(bc_response_stress(response, pm, 1, "joist", 0, &a, &b, &c, &d), "sign");
    NO_CHOICE(bc_response_stress_values(response, pm, 1, "joist", 0, 1, at, 1, &a), "fibre");
    NO_CHOICE(bc_camber_new(response, 1, pm, 1, 1.0, "left", "right", 0.001, 0, 0, 4, &k),
              "rounding");
    NO_CHOICE(bc_camber_new(response, 0, pm, 1, 1.0, "left", "right", 0.001, 1, 0, 4, &k),
              "shape");
    NO_CHOICE(bc_category_factors(0, &a, &b, &c), "category");
    NO_CHOICE(bc_action_variable_of_category("snow", 13, &q), "category");
    NO_CHOICE(bc_limit_value(7, 0.01, &w), "component");
    NO_CHOICE(bc_response_component_extreme(response, 0, pm, "left to right", NULL, 1, &a, &b),
              "component");
    NO_CHOICE(bc_plan_with_support(plan, "left", 0, 0.0, &made), "support_kind");
    NO_CHOICE(bc_plan_with_combination(plan, "own", NULL, NULL, 0, 2, &made), "is_ultimate");
    bc_plan_free(plan);
    CHECK(m == NULL && p == NULL && g == NULL && k == NULL && q == NULL && w == NULL);
    CHECK(made == NULL);
    NO_CHOICE(bc_job_read("", 0, &j), "format");
}

#define NO_COUNT(call, parameter) FAILS(call, BC_ERROR_COUNT, parameter)

static void counts(void) {
    bc_section *s = NULL;
    bc_camber *k = NULL;
    bc_checks *checks = NULL;
    char text[100];
    const bc_part *parts[] = {joist};
    const char *pm = "permanent";
    NO_COUNT(bc_section_new(parts, -1, &s), "count of parts");
    NO_COUNT(bc_response_values(response, 1, pm, 1, 1, &a, 0, &b), "count");
    NO_COUNT(bc_response_values(response, 1, pm, 1, 1, &a, -3, &b), "count of x_m");
    NO_COUNT(bc_response_station(response, 2, &a), "index");
    NO_COUNT(bc_member_combination_name(member, -1, text, 100, &length), "index");
    NO_COUNT(bc_camber_new(response, 1, pm, 1, 1.0, "left", "right", 0.001, 1, 0, -4, &k),
             "divisions");
    FAILS(bc_camber_new(response, 1, pm, 1, 1.0, "left", "right", 0.001, 1, 0, 0, &k),
          BC_ERROR_VALUE, "camber.divisions");
    NO_COUNT(bc_member_span_name(member, 1, text, 100, &length), "index");
    NO_COUNT(bc_member_combination_kind(member, -1, &n), "index");
    NO_COUNT(bc_member_combination_factor(member, 0, 1, &a), "index");
    NO_COUNT(bc_response_check_limits(response, NULL, -1, NULL, &checks), "count of limits");
    NO_COUNT(bc_version(text, -1, &length), "capacity");
    CHECK(bc_error_problem_kind(1, &n) == BC_ERROR_COUNT);
}

static void texts(void) {
    bc_material *m = NULL;
    char text[6] = "?????";
    FAILS(bc_material_steel("S\xff", &m), BC_ERROR_UTF8, "class_name");
    // "joist" has five letters: its NUL needs a sixth place.
    length = -1;
    FAILS(bc_part_name(joist, text, 5, &length), BC_ERROR_BUFFER, "capacity");
    CHECK(length == 5 && strcmp(text, "?????") == 0);
    length = -1;
    CHECK(bc_part_name(joist, NULL, 0, &length) == BC_ERROR_BUFFER && length == 5);
    DONE(bc_part_name(joist, text, 6, &length));
    CHECK(strcmp(text, "joist") == 0);
}

// Reading an error, even into a buffer that is too small, leaves the error as it is.
static void the_error_stays(void) {
    bc_material *m = NULL;
    char text[200];
    CHECK(bc_material_steel("S1", &m) == BC_ERROR_NAME);
    CHECK(bc_error_text(text, 3, &length) == BC_ERROR_BUFFER && length > 3);
    CHECK(bc_error_problem_found(7, text, 200, &length) == BC_ERROR_COUNT);
    CHECK(bc_error_status(NULL) == BC_ERROR_NULL);
    CHECK(last_error(BC_ERROR_NAME, "class"));
    DONE(bc_version(text, 200, &length));
    CHECK(last_error(BC_ERROR_NAME, "class"));
}

static void free_in_any_order(void) {
    bc_material_free(c24);
    bc_member_free(member);
    bc_section_free(section);
    DONE(bc_response_residual(response, &a));
    bc_part_free(joist);
    bc_response_free(response);
    bc_action_free(load);
    bc_material_free(NULL);
    bc_part_free(NULL);
    bc_section_free(NULL);
    bc_action_free(NULL);
    bc_member_free(NULL);
    bc_response_free(NULL);
    bc_camber_free(NULL);
    bc_plan_free(NULL);
    bc_limit_free(NULL);
    bc_checks_free(NULL);
    bc_readings_free(NULL);
    bc_job_free(NULL);
    bc_outcome_free(NULL);
}

int main(void) {
    char text[10] = "?";
    // Before anything failed there is no error.
    DONE(bc_error_status(&n));
    DONE(bc_error_text(text, 10, &length));
    CHECK(n == BC_OK && length == 0 && text[0] == '\0');
    DONE(bc_error_path(text, 10, &length));
    CHECK(length == 0);
    DONE(bc_error_problem_count(&n));
    CHECK(n == 0 && bc_error_problem_kind(0, &n) == BC_ERROR_COUNT);

    set_up();
    null_pointers();
    choices();
    counts();
    texts();
    the_error_stays();
    free_in_any_order();
    return finish();
}
