// What the files of the golden runner in C share.
#ifndef GOLDEN_H
#define GOLDEN_H

#include <beamcore.h>

#include <inttypes.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

// A call that must succeed; ends the program with the error if it does not.
void must(int32_t status);

// Prints a line of the answer.
void put(const char *name, const char *path, double value);

// Replaces a handle by the one that `call` gives out in `made`, and frees the old one.
#define CHANGE(type, handle, call)                                                                 \
    do {                                                                                           \
        type *made = NULL;                                                                         \
        must(call);                                                                                \
        type##_free(handle);                                                                       \
        (handle) = made;                                                                           \
    } while (0)

// A case: what its results are printed of.
struct golden {
    const char *name;
    const char *parts[4];    // ends with NULL
    const char *supports[4]; // ends with NULL
    bc_section *section;
    bc_response *response;
};

// Prints what every case prints.
void put_all(const struct golden *g);

// Calls `put_state` for every combination at both times, with its path.
typedef void put_state_fn(const struct golden *g, const char *combination, int32_t time,
                          const char *base);
void put_states(const struct golden *g, put_state_fn *put_state);

// Prints the joints that slip and the layers of a case.
void put_layers(const struct golden *g);

// The cases of the typed way.
void flitch(void);
void two_span(void);
void slab_strip(void);
void roof_beam(void);
void odd_section(void);
void shrinking_slab(void);
void screwed_floor(void);
void clearance_floor(void);
void haunched_beam(void);
void rafter(void);
void side_plates(void);
void lift_off(void);

#endif
