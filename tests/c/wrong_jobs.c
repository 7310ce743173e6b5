// Each wrong job of the folder given as the argument gives its message word for word.
#include "checks.h"

static void read_file(const char *folder, const char *name, const char *ending, char *text,
                      size_t size) {
    char path[1000];
    snprintf(path, sizeof path, "%s/%s%s", folder, name, ending);
    FILE *file = fopen(path, "r");
    if (file == NULL) {
        fprintf(stderr, "%s cannot be opened\n", path);
        exit(EXIT_FAILURE);
    }
    text[fread(text, 1, size - 1, file)] = '\0';
    fclose(file);
}

int main(int count, char **arguments) {
    static char list[20000], document[50000], expected[20000], found[20000];
    const char *folder = count == 2 ? arguments[1] : ".";
    int jobs = 0;
    read_file(folder, "cases", ".txt", list, sizeof list);
    for (char *name = strtok(list, "\n"); name != NULL; name = strtok(NULL, "\n")) {
        if (name[0] == '#') {
            continue;
        }
        ++jobs;
        bc_job *job = NULL;
        int64_t length;
        read_file(folder, name, ".toml", document, sizeof document);
        read_file(folder, name, ".message", expected, sizeof expected);
        const size_t last = strlen(expected) - 1;
        if (expected[last] == '\n') {
            expected[last] = '\0';
        }
        const int32_t status = bc_job_read(document, BC_FORMAT_TOML, &job);
        int32_t is_input = 0;
        DONE(bc_status_is_input(status, &is_input));
        DONE(bc_error_text(found, (int64_t)sizeof found, &length));
        if (is_input != 1 || job != NULL || strcmp(found, expected) != 0) {
            fprintf(stderr, "%s: found\n%s\nexpected\n%s\n", name, found, expected);
            ++failures;
        }
    }
    CHECK(jobs >= 50);
    return finish();
}
