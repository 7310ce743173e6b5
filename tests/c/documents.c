// Jobs, outcomes, versions, statuses and the plain functions: every function.
#include "checks.h"
#include "jobs.h"

static char buffer[200000];
static int64_t length;

static void jobs(void) {
    bc_job *job, *again;
    bc_outcome *outcome;
    double value;
    const char *deflection = "combinations[\"permanent\"].initial.deflection.greatest.value_m";
    DONE(bc_job_read(JOB, BC_FORMAT_TOML, &job));
    DONE(bc_job_text(job, BC_FORMAT_JSON, buffer, (int64_t)sizeof buffer, &length));
    CHECK(buffer[0] == '{' && length == (int64_t)strlen(buffer));
    DONE(bc_job_read(buffer, BC_FORMAT_JSON, &again));
    bc_job_free(job);
    DONE(bc_job_solve(again, &outcome));
    bc_job_free(again); // The outcome keeps what it needs.
    DONE(bc_outcome_number(outcome, deflection, &value));
    CHECK(near(value, 5.0 * 2e3 * 256.0 / (384.0 * 11e9 * 0.1 * 0.008 / 12.0)));

    DONE(bc_outcome_text(outcome, "beamcore", buffer, (int64_t)sizeof buffer, &length));
    CHECK(length > 0 && buffer[length] == '\0');
    DONE(bc_outcome_summary(outcome, buffer, (int64_t)sizeof buffer, &length));
    CHECK(strstr(buffer, "joist") != NULL);
    DONE(bc_outcome_json(outcome, buffer, (int64_t)sizeof buffer, &length));
    static char run[200000];
    int64_t run_length;
    DONE(bc_job_run(JOB, BC_FORMAT_TOML, run, (int64_t)sizeof run, &run_length));
    CHECK(run_length == length && strcmp(run, buffer) == 0);
    bc_outcome_free(outcome);

    DONE(bc_job_schema(buffer, (int64_t)sizeof buffer, &length));
    CHECK(strstr(buffer, "\"$schema\"") != NULL);
    DONE(bc_outcome_schema(buffer, (int64_t)sizeof buffer, &length));
    CHECK(strstr(buffer, "\"$schema\"") != NULL);
}

// The file is written by the test itself, in the folder given as the program's argument.
static void a_file(const char *folder) {
    char name[1000];
    snprintf(name, sizeof name, "%s/documents-job.toml", folder);
    FILE *file = fopen(name, "w");
    CHECK(file != NULL);
    if (file == NULL) {
        return;
    }
    fputs(JOB, file);
    fclose(file);
    bc_job *job = NULL;
    DONE(bc_job_open(name, &job));
    bc_job_free(job);
}

static void versions(void) {
    int32_t abi = -1, is_input = -1;
    DONE(bc_version(buffer, (int64_t)sizeof buffer, &length));
    int major, minor, patch;
    CHECK(sscanf(buffer, "%d.%d.%d", &major, &minor, &patch) == 3);
    DONE(bc_abi_version(&abi));
    CHECK(abi == BC_ABI_VERSION);
    DONE(bc_status_name(BC_ERROR_GEOMETRY, buffer, (int64_t)sizeof buffer, &length));
    CHECK(strcmp(buffer, "Geometry") == 0);
    DONE(bc_status_name(BC_ERROR_NULL, buffer, (int64_t)sizeof buffer, &length));
    CHECK(strcmp(buffer, "Null") == 0);
    DONE(bc_status_name(99, buffer, (int64_t)sizeof buffer, &length));
    CHECK(length == 0 && buffer[0] == '\0');
    DONE(bc_status_is_input(BC_ERROR_GEOMETRY, &is_input));
    CHECK(is_input == 1);
    DONE(bc_status_is_input(BC_ERROR_LOOKUP, &is_input));
    CHECK(is_input == 0);
}

static void plain_functions(void) {
    const double e[] = {210e9, 11e9}, b[] = {0.1, 0.1}, h[] = {0.01, 0.2};
    const double ea[] = {e[0] * b[0] * h[0], e[1] * b[1] * h[1]};
    const double z[] = {0.005, 0.11};
    const double z0 = (ea[0] * z[0] + ea[1] * z[1]) / (ea[0] + ea[1]);
    double ei = 0.0;
    for (int i = 0; i < 2; ++i) {
        ei += ea[i] * (h[i] * h[i] / 12.0 + (z[i] - z0) * (z[i] - z0));
    }
    CHECK(near(bc_plain_stack_axial_stiffness(e, b, h, 2), ea[0] + ea[1]));
    CHECK(near(bc_plain_stack_centroid(e, b, h, 2), z0));
    CHECK(near(bc_plain_stack_bending_stiffness(e, b, h, 2), ei));
    CHECK(near(bc_plain_simple_span_uniform_deflection(4.0, ei, 3e3),
               5.0 * 3e3 * 256.0 / (384.0 * ei)));
    CHECK(near(bc_plain_simple_span_point_deflection(4.0, ei, 3e3, 2.0), 3e3 * 64.0 / (48.0 * ei)));
    CHECK(bc_plain_effective_modulus(12e9, 0.5) == 8e9);
    const double day = 86400.0;
    const double phi =
        bc_plain_concrete_creep(38e6, 50.0, 0.15, 28.0 * day, 18250.0 * day, BC_CEMENT_N);
    CHECK(fabs(phi - 2.4542) < 1e-4);
    CHECK(bc_plain_convert(50.0, "mm", "m") == 0.05);
    CHECK(bc_plain_convert(6.5, "kN/m", "N/mm") == 6.5);

    // What fails is NaN, with the error kept.
    CHECK(isnan(bc_plain_stack_centroid(e, b, NULL, 2)) && last_error(BC_ERROR_NULL, "height_m"));
    CHECK(isnan(bc_plain_stack_centroid(e, b, h, -1)) &&
          last_error(BC_ERROR_COUNT, "count of modulus_Pa"));
    CHECK(isnan(bc_plain_stack_bending_stiffness(e, b, h, 0)) &&
          last_error(BC_ERROR_MISSING, "section.parts"));
    CHECK(isnan(bc_plain_simple_span_uniform_deflection(-4.0, ei, 3e3)) &&
          last_error(BC_ERROR_VALUE, "span_m"));
    CHECK(isnan(bc_plain_simple_span_point_deflection(4.0, ei, 3e3, 5.0)) &&
          last_error(BC_ERROR_POSITION, "at_m"));
    CHECK(isnan(bc_plain_effective_modulus(NAN, 0.5)));
    CHECK(isnan(bc_plain_concrete_creep(38e6, 0.5, 0.15, day, day, BC_CEMENT_N)) &&
          last_error(BC_ERROR_VALUE, "relative_humidity_percent"));
    CHECK(isnan(bc_plain_concrete_creep(38e6, 50.0, 0.15, day, day, 0)) &&
          last_error(BC_ERROR_CHOICE, "cement"));
    CHECK(isnan(bc_plain_convert(1.0, "mm", "kN")) && last_error(BC_ERROR_UNIT, "quantity"));
    CHECK(isnan(bc_plain_convert(1.0, "mm", NULL)) && last_error(BC_ERROR_NULL, "to_unit"));
}

int main(int count, char **arguments) {
    jobs();
    a_file(count > 1 ? arguments[1] : ".");
    versions();
    plain_functions();
    return finish();
}
