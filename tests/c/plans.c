// Actions of every kind of load, categories, plans, combinations and spans: every function.
#include "checks.h"

static const double L = 4.0;
static char text[1000];
static int64_t length;

static bc_section *joist(void) {
    bc_material *c24;
    bc_part *part;
    bc_section *section;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_part_rectangle("joist", 0.1, 0.2, c24, &part));
    const bc_part *parts[] = {part};
    DONE(bc_section_new(parts, 1, &section));
    bc_part_free(part);
    bc_material_free(c24);
    return section;
}

// The reactions of a simple span under one load, which is freed.
static void reactions(const bc_section *section, bc_action *load, double left, double right) {
    const bc_action *actions[] = {load};
    bc_member *member;
    bc_response *response;
    double force, couple;
    DONE(bc_member_simple_span(section, L, actions, 1, &member));
    DONE(bc_member_solve(member, &response));
    DONE(bc_response_reaction(response, "permanent", BC_TIME_FINAL, "left", &force, &couple));
    CHECK(near(force, left));
    DONE(bc_response_reaction(response, "permanent", BC_TIME_FINAL, "right", &force, &couple));
    CHECK(near(force, right));
    bc_response_free(response);
    bc_member_free(member);
    bc_action_free(load);
}

static void loads(const bc_section *section) {
    bc_action *none, *load;
    DONE(bc_action_permanent("g", &none));
    // A triangle that grows to the right: q L/6 and q L/3.
    DONE(bc_action_with_trapezoidal(none, 0.0, 3e3, 0.0, L, &load));
    reactions(section, load, 3e3 * L / 6.0, 3e3 * L / 3.0);
    DONE(bc_action_with_area(none, 2e3, 1.5, &load));
    reactions(section, load, 3e3 * L / 2.0, 3e3 * L / 2.0);
    DONE(bc_action_with_partial_area(none, 2e3, 1.5, 0.0, 2.0, &load));
    reactions(section, load, 3e3 * 2.0 * 3.0 / L, 3e3 * 2.0 * 1.0 / L);
    // A clockwise couple presses the right end down.
    DONE(bc_action_with_couple(none, 2e3, 1.0, &load));
    reactions(section, load, -2e3 / L, 2e3 / L);
    bc_action_free(none);
}

static void categories(void) {
    const char *words[] = {"A", "B", "C", "D", "E", "F", "G", "H", "snow", "snow_high", "wind",
                           "temperature"};
    int32_t category = 0;
    double a, b, c;
    for (int32_t i = 0; i < 12; ++i) {
        DONE(bc_category_of_name(words[i], &category));
        CHECK(category == BC_CATEGORY_DOMESTIC + i);
    }
    CHECK(category == BC_CATEGORY_TEMPERATURE);
    // EN 1990:2002 Table A1.1, from memory.
    DONE(bc_category_factors(BC_CATEGORY_STORAGE, &a, &b, &c));
    CHECK(a == 1.0 && b == 0.9 && c == 0.8);
    DONE(bc_category_factors(BC_CATEGORY_WIND, &a, &b, &c));
    CHECK(a == 0.6 && b == 0.2 && c == 0.0);
}

// A roof with an overhang, by a plan; each step frees the plan before it.
static bc_plan *next(bc_plan *plan, bc_plan *made) {
    bc_plan_free(plan);
    return made;
}

static bc_plan *roof(const bc_section *section) {
    bc_action *plain, *made_action, *actions[4];
    bc_plan *plan, *made;
    int32_t is_favourable = -1;
    DONE(bc_action_permanent("roof", &plain));
    DONE(bc_action_with_area(plain, 500.0, 2.0, &actions[0]));
    bc_action_free(plain);
    DONE(bc_action_permanent("tie", &plain));
    DONE(bc_action_is_favourable(plain, &is_favourable));
    CHECK(is_favourable == 0);
    DONE(bc_action_favourable(plain, &made_action));
    bc_action_free(plain);
    DONE(bc_action_with_couple(made_action, 1e3, 5.0, &actions[1]));
    bc_action_free(made_action);
    DONE(bc_action_is_favourable(actions[1], &is_favourable));
    CHECK(is_favourable == 1);
    DONE(bc_action_variable_of_category("snow", BC_CATEGORY_SNOW, &plain));
    DONE(bc_action_with_uniform(plain, 1e3, &actions[2]));
    bc_action_free(plain);
    DONE(bc_action_variable_of_category("wind", BC_CATEGORY_WIND, &plain));
    DONE(bc_action_with_uniform(plain, -2e2, &actions[3]));
    bc_action_free(plain);
    DONE(bc_plan_of_length(section, 5.0, &plan));
    DONE(bc_plan_with_support(plan, "left", BC_SUPPORT_PIN, 1.0, &made));
    plan = next(plan, made);
    DONE(bc_plan_with_support(plan, "right", BC_SUPPORT_ROLLER, 5.0, &made));
    plan = next(plan, made);
    for (int i = 0; i < 4; ++i) {
        DONE(bc_plan_with_action(plan, actions[i], &made));
        plan = next(plan, made);
        bc_action_free(actions[i]);
    }
    return plan;
}

static void combinations(const bc_section *section) {
    static const struct {
        const char *name;
        int32_t kind, is_ultimate;
        double factors[4];
    } expected[] = {
        {"permanent", BC_COMBINATION_PERMANENT, 0, {1.0, 1.0, 0.0, 0.0}},
        {"quasi-permanent", BC_COMBINATION_QUASI_PERMANENT, 0, {1.0, 1.0, 0.0, 0.0}},
        {"characteristic, snow leading", BC_COMBINATION_CHARACTERISTIC, 0, {1.0, 1.0, 1.0, 0.6}},
        {"characteristic, wind leading", BC_COMBINATION_CHARACTERISTIC, 0, {1.0, 1.0, 0.5, 1.0}},
        {"frequent, snow leading", BC_COMBINATION_FREQUENT, 0, {1.0, 1.0, 0.2, 0.0}},
        {"frequent, wind leading", BC_COMBINATION_FREQUENT, 0, {1.0, 1.0, 0.0, 0.2}},
        {"fundamental, snow leading", BC_COMBINATION_FUNDAMENTAL, 1, {1.2, 0.9, 1.6, 1.6 * 0.6}},
        {"fundamental, wind leading", BC_COMBINATION_FUNDAMENTAL, 1, {1.2, 0.9, 1.6 * 0.5, 1.6}},
        {"erection", BC_COMBINATION_OWN, 0, {1.0, 0.0, 0.0, 0.5}},
        {"collapse", BC_COMBINATION_OWN_ULTIMATE, 1, {0.0, 0.0, 2.0, 0.0}},
    };
    const char *erection[] = {"wind", "roof"}, *collapse[] = {"snow"};
    const double erection_factors[] = {0.5, 1.0}, collapse_factors[] = {2.0};
    bc_plan *plan = roof(section), *made;
    bc_member *member;
    int32_t count, kind, is_ultimate;
    double a, b, c, factor;
    DONE(bc_plan_with_partial_factors(plan, 1.2, 0.9, 1.6, &made));
    plan = next(plan, made);
    DONE(bc_plan_with_combination(plan, "erection", erection, erection_factors, 2, 0, &made));
    plan = next(plan, made);
    DONE(bc_plan_with_combination(plan, "collapse", collapse, collapse_factors, 1, 1, &made));
    plan = next(plan, made);
    DONE(bc_plan_check(plan, &member));
    bc_plan_free(plan);
    DONE(bc_member_partial_factors(member, &a, &b, &c));
    CHECK(a == 1.2 && b == 0.9 && c == 1.6);
    DONE(bc_member_action_count(member, &count));
    CHECK(count == 4);
    DONE(bc_member_combination_count(member, &count));
    CHECK(count == (int32_t)(sizeof expected / sizeof expected[0]));
    for (int32_t i = 0; i < count; ++i) {
        DONE(bc_member_combination_name(member, i, text, (int64_t)sizeof text, &length));
        DONE(bc_member_combination_kind(member, i, &kind));
        DONE(bc_member_combination_is_ultimate(member, i, &is_ultimate));
        CHECK(strcmp(text, expected[i].name) == 0 && kind == expected[i].kind);
        CHECK(is_ultimate == expected[i].is_ultimate);
        for (int32_t action = 0; action < 4; ++action) {
            DONE(bc_member_combination_factor(member, i, action, &factor));
            CHECK(factor == expected[i].factors[action]);
        }
    }
    bc_member_free(member);
}

static void spans(const bc_section *section) {
    bc_plan *plan = roof(section);
    bc_member *member;
    int32_t count, is_cantilever;
    double from, to;
    DONE(bc_plan_check(plan, &member));
    bc_plan_free(plan);
    DONE(bc_member_span_count(member, &count));
    CHECK(count == 2);
    DONE(bc_member_span_name(member, 0, text, (int64_t)sizeof text, &length));
    CHECK(strcmp(text, "before left") == 0);
    DONE(bc_member_span(member, text, &from, &to, &is_cantilever));
    CHECK(from == 0.0 && to == 1.0 && is_cantilever == 1);
    DONE(bc_member_span(member, "left to right", &from, &to, &is_cantilever));
    CHECK(from == 1.0 && to == 5.0 && is_cantilever == 0);
    FAILS(bc_member_span(member, "beyond right", &from, &to, &is_cantilever), BC_ERROR_LOOKUP,
          "span");
    CHECK(from == 1.0);
    bc_member_free(member);
}

// A plan of a simple span makes the member that the function of that name makes.
static void simple_span(const bc_section *section) {
    bc_plan *plan, *made;
    bc_action *none, *load;
    bc_member *member;
    double at;
    DONE(bc_action_permanent("g", &none));
    DONE(bc_action_with_self_weight(none, &load));
    bc_action_free(none);
    DONE(bc_plan_simple_span(section, L, &plan));
    DONE(bc_plan_with_action(plan, load, &made));
    bc_action_free(load);
    bc_plan_free(plan);
    DONE(bc_plan_check(made, &member));
    bc_plan_free(made);
    DONE(bc_member_length(member, &at));
    CHECK(at == L);
    bc_member_free(member);
}

static void says(const char *message) {
    DONE(bc_error_text(text, (int64_t)sizeof text, &length));
    if (strcmp(text, message) != 0) {
        ++failures;
        fprintf(stderr, "found\n%s\nexpected\n%s\n", text, message);
    }
}

// The core refuses, in its own words; all that is wrong is told at once.
static void mistakes(const bc_section *section) {
    int32_t category = 7;
    CHECK(bc_category_of_name("Z", &category) == BC_ERROR_NAME && category == 7);
    says("category: found the unknown category \"Z\"; expected one of \"A\", \"B\", \"C\", \"D\", "
         "\"E\", \"F\", \"G\", \"H\", \"snow\", \"snow_high\", \"wind\", \"temperature\"");
    const char *actions[] = {"rood"};
    const double factors[] = {1.0};
    bc_plan *plan = roof(section), *made;
    bc_member *member = NULL;
    DONE(bc_plan_with_combination(plan, "erection", actions, factors, 1, 0, &made));
    plan = next(plan, made);
    DONE(bc_plan_with_partial_factors(plan, -1.2, 1.0, 1.5, &made));
    plan = next(plan, made);
    CHECK(bc_plan_check(plan, &member) == BC_ERROR_VALUE && member == NULL);
    says("2 problems:\n"
         "- partial_factors.permanent: found -1.2; expected a number from 0 to 3\n"
         "- combinations[\"erection\"].factors[\"rood\"]: found the unknown action \"rood\"; "
         "expected one of the actions \"roof\", \"tie\", \"snow\", \"wind\"");
    bc_plan_free(plan);
}

int main(void) {
    bc_section *section = joist();
    loads(section);
    categories();
    combinations(section);
    spans(section);
    simple_span(section);
    mistakes(section);
    bc_section_free(section);
    return finish();
}
