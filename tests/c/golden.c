// The golden runner in C: `golden job FOLDER` answers the golden cases of a folder through job
// text, `golden typed` through the typed functions. A line of an answer is
// CASE<TAB>PATH<TAB>BITS, the bits of the number as 16 hexadecimal digits.
#include "golden.h"

static char line[1000];

// The next line of a file that is neither empty nor a comment; 0 at the end.
static int next_line(FILE *file) {
    while (fgets(line, sizeof line, file) != NULL) {
        line[strcspn(line, "\r\n")] = '\0';
        if (line[0] != '\0' && line[0] != '#') {
            return 1;
        }
    }
    return 0;
}

static FILE *opened(const char *folder, const char *name, const char *ending) {
    char path[1000];
    snprintf(path, sizeof path, "%s/%s%s", folder, name, ending);
    FILE *file = fopen(path, "r");
    if (file == NULL) {
        fprintf(stderr, "%s cannot be opened\n", path);
        exit(EXIT_FAILURE);
    }
    return file;
}

static bc_outcome *solved(const char *folder, const char *name) {
    static char text[100000];
    FILE *file = opened(folder, name, ".toml");
    text[fread(text, 1, sizeof text - 1, file)] = '\0';
    fclose(file);
    bc_job *job = NULL;
    bc_outcome *outcome = NULL;
    must(bc_job_read(text, BC_FORMAT_TOML, &job));
    must(bc_job_solve(job, &outcome));
    bc_job_free(job);
    return outcome;
}

// Answers one case; the number of results that miss their tolerance.
static int answer(const char *folder, const char *name) {
    bc_outcome *outcome = solved(folder, name);
    FILE *file = opened(folder, name, ".expect");
    int misses = 0;
    while (next_line(file)) {
        // Three numbers or dashes, then the path.
        char words[3][40];
        int path_at = 0;
        double value;
        if (sscanf(line, "%39s %39s %39s %n", words[0], words[1], words[2], &path_at) != 3 ||
            line[path_at] == '\0') {
            fprintf(stderr, "%s: a line without three numbers and a path: %s\n", name, line);
            exit(EXIT_FAILURE);
        }
        const char *path = line + path_at;
        must(bc_outcome_number(outcome, path, &value));
        put(name, path, value);
        if (strcmp(words[0], "-") != 0) {
            const double expected = strtod(words[0], NULL);
            const double peak = strtod(words[1], NULL), tolerance = strtod(words[2], NULL);
            if (!(fabs(value - expected) <= tolerance * peak)) {
                fprintf(stderr, "%s %s: %.17g is not %s within %s\n", name, path, value, words[0],
                        words[2]);
                ++misses;
            }
        }
    }
    fclose(file);
    bc_outcome_free(outcome);
    return misses;
}

int main(int count, char **arguments) {
    if (count == 2 && strcmp(arguments[1], "typed") == 0) {
        flitch();
        two_span();
        slab_strip();
        roof_beam();
        odd_section();
        shrinking_slab();
        screwed_floor();
        clearance_floor();
        side_plates();
        rafter();
        lift_off();
        haunched_beam();
        return EXIT_SUCCESS;
    }
    if (count == 3 && strcmp(arguments[1], "job") == 0) {
        char name[1000];
        int misses = 0;
        FILE *cases = opened(arguments[2], "cases", ".txt");
        while (next_line(cases)) {
            strcpy(name, line);
            misses += answer(arguments[2], name);
        }
        fclose(cases);
        return misses == 0 ? EXIT_SUCCESS : EXIT_FAILURE;
    }
    fprintf(stderr, "usage: golden job FOLDER | golden typed\n");
    return EXIT_FAILURE;
}
