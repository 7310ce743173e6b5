// Jobs and outcomes: all inputs and all results as documents.
#ifndef BEAMCORE_JOB_HPP
#define BEAMCORE_JOB_HPP

#include "handle.hpp"

namespace beamcore {

// The notation of a document.
enum class Format : std::int32_t { toml = BC_FORMAT_TOML, json = BC_FORMAT_JSON };

// All results of a job.
class Outcome {
public:
    // The number at a path, in the SI unit that the path ends with, for example
    // combinations["quasi-permanent"].final.deflection.greatest.value_m
    double number(const std::string &path) const {
        return detail::number([&](double *out) {
            return bc_outcome_number(get(), detail::c_text(path, "path"), out);
        });
    }

    // The text at a path.
    std::string text(const std::string &path) const {
        const char *c_path = detail::c_text(path, "path");
        return detail::text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return bc_outcome_text(get(), c_path, buffer, capacity, length);
        });
    }

    // The outcome as JSON.
    std::string json() const { return detail::name(get(), bc_outcome_json); }
    // The outcome as a plain text of 80 columns, for reading.
    std::string summary() const { return detail::name(get(), bc_outcome_summary); }
    // The JSON schema of the outcome document.
    static std::string schema() { return detail::text(bc_outcome_schema); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_outcome *get() const { return handle_.get(); }

private:
    explicit Outcome(detail::Shared<bc_outcome> handle) : handle_(std::move(handle)) {}

    friend class Job;

    detail::Shared<bc_outcome> handle_;
};

// All inputs of a calculation, read and found without fault.
class Job {
public:
    // Reads a job from a text; all that is wrong is reported at once.
    static Job read(const std::string &document, Format format) {
        return Job(detail::make<bc_job>(bc_job_free, [&](bc_job **out) {
            return bc_job_read(detail::c_text(document, "document"), detail::code(format), out);
        }));
    }

    // Reads a job from a file whose name ends in .toml or .json.
    static Job open(const std::string &file_name) {
        return Job(detail::make<bc_job>(bc_job_free, [&](bc_job **out) {
            return bc_job_open(detail::c_text(file_name, "file_name"), out);
        }));
    }

    // The job written back as a text.
    std::string text(Format format) const {
        return detail::text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return bc_job_text(get(), detail::code(format), buffer, capacity, length);
        });
    }

    // Solves the job.
    Outcome solve() const {
        return Outcome(detail::make<bc_outcome>(
            bc_outcome_free, [&](bc_outcome **out) { return bc_job_solve(get(), out); }));
    }

    // The JSON schema of the job document.
    static std::string schema() { return detail::text(bc_job_schema); }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_job *get() const { return handle_.get(); }

private:
    explicit Job(detail::Shared<bc_job> handle) : handle_(std::move(handle)) {}

    detail::Shared<bc_job> handle_;
};

} // namespace beamcore

#endif // BEAMCORE_JOB_HPP
