// Checks of the C test programs.
#ifndef CHECKS_H
#define CHECKS_H

#include <beamcore.h>

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static int failures = 0;

static inline void check(int holds, const char *what, const char *file, int line) {
    if (!holds) {
        ++failures;
        fprintf(stderr, "%s:%d: not so: %s\n", file, line, what);
    }
}

// A call that must succeed; says what is wrong if it does not.
static inline void check_done(int32_t status, const char *what, const char *file, int line) {
    check(status == BC_OK, what, file, line);
    if (status != BC_OK) {
        char text[1000];
        int64_t length;
        if (bc_error_text(text, (int64_t)sizeof text, &length) == BC_OK) {
            fprintf(stderr, "    %s\n", text);
        }
    }
}

// Equal within 1e-12 of the expected value.
static inline int near(double found, double expected) {
    const int equal = fabs(found - expected) <= 1e-12 * fabs(expected);
    if (!equal) {
        fprintf(stderr, "    %.17g is not %.17g\n", found, expected);
    }
    return equal;
}

// Equal within a tolerance, for values with few published digits and for those that may be zero.
static inline int within(double found, double expected, double tolerance) {
    const int equal = fabs(found - expected) <= tolerance;
    if (!equal) {
        fprintf(stderr, "    %.17g is not %.17g within %g\n", found, expected, tolerance);
    }
    return equal;
}

// Whether the last error of this thread is of a status and speaks of a path.
static inline int last_error(int32_t status, const char *path) {
    char found[300] = "";
    int64_t length = 0;
    int32_t kept = -1;
    bc_error_status(&kept);
    bc_error_path(found, (int64_t)sizeof found, &length);
    const int right = kept == status && strcmp(found, path) == 0;
    if (!right) {
        fprintf(stderr, "    status %d at \"%s\"\n", (int)kept, found);
    }
    return right;
}

#define CHECK(holds) check((holds), #holds, __FILE__, __LINE__)
#define DONE(call) check_done((call), #call, __FILE__, __LINE__)
// A call that must fail with a status, its error speaking of a path.
#define FAILS(call, status, path) CHECK((call) == (status) && last_error((status), (path)))

static inline int finish(void) { return failures == 0 ? EXIT_SUCCESS : EXIT_FAILURE; }

#endif
