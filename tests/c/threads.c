// Several threads share handles, and each has its own last error.
#include "checks.h"

#include <pthread.h>

enum { THREADS = 4, ROUNDS = 50 };

static bc_response *response;
static double expected;

struct work {
    char class_name[16];
    int failed;
};

static void *run(void *argument) {
    struct work *work = argument;
    for (int round = 0; round < ROUNDS; ++round) {
        bc_material *material = NULL;
        char text[300];
        int64_t length;
        double value, at;
        int32_t status = bc_material_steel(work->class_name, &material);
        work->failed += status != BC_ERROR_NAME || material != NULL;
        status = bc_response_extreme(response, BC_FIELD_DEFLECTION, "permanent", BC_TIME_FINAL,
                                     BC_EXTREME_GREATEST, &value, &at);
        work->failed += status != BC_OK || value != expected;
        status = bc_error_text(text, (int64_t)sizeof text, &length);
        work->failed += status != BC_OK || strstr(text, work->class_name) == NULL;
    }
    return NULL;
}

int main(void) {
    bc_material *c24;
    bc_part *joist;
    bc_section *section;
    bc_action *plain, *load;
    bc_member *member;
    double at;
    DONE(bc_material_timber("C24", 1, &c24));
    DONE(bc_part_rectangle("joist", 0.1, 0.2, c24, &joist));
    const bc_part *parts[] = {joist};
    DONE(bc_section_new(parts, 1, &section));
    DONE(bc_action_permanent("floor", &plain));
    DONE(bc_action_with_uniform(plain, 2e3, &load));
    const bc_action *actions[] = {load};
    DONE(bc_member_simple_span(section, 4.0, actions, 1, &member));
    DONE(bc_member_solve(member, &response));
    DONE(bc_response_extreme(response, BC_FIELD_DEFLECTION, "permanent", BC_TIME_FINAL,
                             BC_EXTREME_GREATEST, &expected, &at));

    pthread_t threads[THREADS];
    struct work work[THREADS];
    for (int i = 0; i < THREADS; ++i) {
        snprintf(work[i].class_name, sizeof work[i].class_name, "thread-%d", i);
        work[i].failed = 0;
        CHECK(pthread_create(&threads[i], NULL, run, &work[i]) == 0);
    }
    for (int i = 0; i < THREADS; ++i) {
        pthread_join(threads[i], NULL);
        CHECK(work[i].failed == 0);
    }
    // No thread has left its error here.
    CHECK(last_error(BC_OK, ""));

    bc_response_free(response);
    bc_member_free(member);
    bc_action_free(load);
    bc_action_free(plain);
    bc_section_free(section);
    bc_part_free(joist);
    bc_material_free(c24);
    return finish();
}
