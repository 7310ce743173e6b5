// Errors of the core as a caller sees them: every kind, all problems at once, nothing written.
#include "checks.h"
#include "jobs.h"

static char text[4000];
static int64_t length;
static bc_material *c24;
static bc_part *joist;
static bc_section *section;
static bc_action *load;

static void set_up(void) {
    bc_action *plain;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_part_rectangle("joist", 0.1, 0.2, c24, &joist));
    const bc_part *parts[] = {joist};
    DONE(bc_section_new(parts, 1, &section));
    DONE(bc_action_permanent("floor", &plain));
    DONE(bc_action_with_uniform(plain, 2e3, &load));
    bc_action_free(plain);
}

static void tear_down(void) {
    bc_action_free(load);
    bc_section_free(section);
    bc_part_free(joist);
    bc_material_free(c24);
}

static void kinds_of_the_typed_way(void) {
    const bc_action *actions[] = {load};
    bc_material *material = NULL;
    bc_section *none = NULL;
    bc_member *member = NULL;
    bc_part *wide, *same;
    double value = 123.0, at = 456.0;

    FAILS(bc_material_timber("C99", 1, &material), BC_ERROR_NAME, "class");
    FAILS(bc_material_timber("C24", 4, &material), BC_ERROR_VALUE, "service_class");
    CHECK(material == NULL);

    DONE(bc_part_rectangle("wide", -0.1, NAN, c24, &wide));
    const bc_part *bad[] = {wide};
    FAILS(bc_section_new(bad, 1, &none), BC_ERROR_VALUE,
          "section.parts[\"wide\"].outline.rectangle.width");
    DONE(bc_part_rectangle("other", 0.1, 0.2, c24, &same));
    const bc_part *twice[] = {joist, joist};
    FAILS(bc_section_new(twice, 2, &none), BC_ERROR_DUPLICATE, "section.parts");
    const bc_part *over[] = {joist, same};
    FAILS(bc_section_new(over, 2, &none), BC_ERROR_GEOMETRY, "section.parts");
    FAILS(bc_section_new(NULL, 0, &none), BC_ERROR_MISSING, "section.parts");
    CHECK(none == NULL);
    bc_part_free(wide);
    bc_part_free(same);

    const char *names[] = {"left", "right"};
    const int32_t kinds[] = {BC_SUPPORT_PIN, BC_SUPPORT_ROLLER};
    const double places[] = {0.0, 9.0};
    FAILS(bc_member_new(section, 4.0, names, kinds, places, 1, actions, 1, &member),
          BC_ERROR_MECHANISM, "member.supports");
    FAILS(bc_member_new(section, 4.0, names, kinds, places, 2, actions, 1, &member),
          BC_ERROR_POSITION, "member.supports[\"right\"].at");
    FAILS(bc_member_new(section, 4.0, NULL, NULL, NULL, 0, actions, 1, &member),
          BC_ERROR_MISSING, "member.supports");
    FAILS(bc_member_simple_span(section, 4.0, NULL, 0, &member), BC_ERROR_MISSING, "actions");
    FAILS(bc_member_simple_span(section, INFINITY, actions, 1, &member), BC_ERROR_VALUE,
          "member.length");
    CHECK(member == NULL);

    bc_response *response;
    DONE(bc_member_simple_span(section, 4.0, actions, 1, &member));
    DONE(bc_member_solve(member, &response));
    FAILS(bc_response_extreme(response, BC_FIELD_MOMENT, "snow", BC_TIME_FINAL,
                              BC_EXTREME_GREATEST, &value, &at),
          BC_ERROR_LOOKUP, "combination");
    CHECK(value == 123.0 && at == 456.0);
    double x[] = {1.0, 4.1}, values[] = {7.0, 8.0};
    FAILS(bc_response_values(response, BC_FIELD_MOMENT, "permanent", BC_TIME_FINAL, BC_SIDE_LEFT, x,
                             2, values),
          BC_ERROR_POSITION, "at");
    CHECK(values[0] == 7.0 && values[1] == 8.0);
    bc_response_free(response);
    bc_member_free(member);
}

static void read_fails(const char *document, int32_t status, const char *path) {
    bc_job *job = NULL;
    FAILS(bc_job_read(document, BC_FORMAT_TOML, &job), status, path);
    CHECK(job == NULL);
}

static void kinds_of_documents(void) {
    read_fails(JOB "colour = \"red\"\n", BC_ERROR_KEY, "actions[\"floor\"].colour");
    read_fails(JOB_HEAD JOB_MATERIAL JOB_PART JOB_MEMBER JOB_ACTION("2 kN"), BC_ERROR_UNIT,
               "actions[\"floor\"].loads[0].uniform.load");
    read_fails("version = [", BC_ERROR_SYNTAX, "document");
    read_fails("version = 99\n", BC_ERROR_VERSION, "version");
    bc_job *job = NULL;
    FAILS(bc_job_open("no such file.toml", &job), BC_ERROR_FILE, "no such file.toml");
    CHECK(job == NULL);

    bc_outcome *outcome = NULL;
    DONE(bc_job_read(JOB_HEAD JOB_MATERIAL JOB_PART JOB_MEMBER JOB_ACTION("1e305 kN/m"),
                     BC_FORMAT_TOML, &job));
    CHECK(bc_job_solve(job, &outcome) == BC_ERROR_NUMERICAL && outcome == NULL);
    bc_job_free(job);

    double value = 123.0;
    DONE(bc_job_read(JOB, BC_FORMAT_TOML, &job));
    DONE(bc_job_solve(job, &outcome));
    CHECK(bc_outcome_number(outcome, "section.colour", &value) == BC_ERROR_LOOKUP);
    CHECK(bc_outcome_number(outcome, "", &value) == BC_ERROR_LOOKUP && value == 123.0);
    bc_outcome_free(outcome);
    bc_job_free(job);
}

// A section with three mistakes: all are told, one by one and as one text.
static void all_problems_at_once(void) {
    bc_material *nothing;
    bc_part *a, *b;
    bc_section *none = NULL;
    DONE(bc_material_new("air", 0.0, 0.0, &nothing));
    DONE(bc_part_rectangle("a", -0.1, 0.2, nothing, &a));
    DONE(bc_part_rectangle("b", 0.1, INFINITY, nothing, &b));
    const bc_part *parts[] = {a, b};
    CHECK(bc_section_new(parts, 2, &none) == BC_ERROR_VALUE);
    int32_t count = 0, kind = 0;
    int64_t line = -1;
    DONE(bc_error_problem_count(&count));
    CHECK(count >= 3);
    const char *paths[] = {"section.parts[\"a\"].outline.rectangle.width",
                           "section.parts[\"b\"].outline.rectangle.height",
                           "materials[\"air\"].modulus"};
    for (int32_t i = 0; i < 3; ++i) {
        DONE(bc_error_problem_kind(i, &kind));
        DONE(bc_error_problem_line(i, &line));
        DONE(bc_error_problem_path(i, text, (int64_t)sizeof text, &length));
        CHECK(kind == BC_ERROR_VALUE && line == 0 && strcmp(text, paths[i]) == 0);
    }
    DONE(bc_error_problem_found(0, text, (int64_t)sizeof text, &length));
    CHECK(strcmp(text, "-100 mm") == 0);
    DONE(bc_error_problem_expected(0, text, (int64_t)sizeof text, &length));
    CHECK(strcmp(text, "a length greater than zero") == 0);
    DONE(bc_error_text(text, (int64_t)sizeof text, &length));
    for (int i = 0; i < 3; ++i) {
        CHECK(strstr(text, paths[i]) != NULL);
    }
    bc_part_free(a);
    bc_part_free(b);
    bc_material_free(nothing);
}

// A mistake in a document is told with its line.
static void lines_of_documents(void) {
    bc_job *job = NULL;
    int64_t line = 0;
    FAILS(bc_job_read(JOB_HEAD "colour = 1\n" JOB_MATERIAL JOB_PART JOB_MEMBER
                          JOB_ACTION("2 kN/m"),
                      BC_FORMAT_TOML, &job),
          BC_ERROR_KEY, "colour");
    DONE(bc_error_problem_line(0, &line));
    CHECK(line == 4);
}

int main(void) {
    set_up();
    kinds_of_the_typed_way();
    kinds_of_documents();
    all_problems_at_once();
    lines_of_documents();
    tear_down();
    return finish();
}
