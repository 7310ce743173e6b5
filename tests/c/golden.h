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

// The cases of the typed way.
void flitch(void);
void two_span(void);
void slab_strip(void);
void roof_beam(void);
void odd_section(void);
void shrinking_slab(void);

#endif
