// Exceptions that carry the errors of the calculation core.
#ifndef BEAMCORE_ERROR_HPP
#define BEAMCORE_ERROR_HPP

#include "../beamcore.h"

#include <cstdint>
#include <stdexcept>
#include <string>
#include <utility>
#include <vector>

namespace beamcore {

// The kind of a problem: a status of the C ABI. Later versions may have more.
enum class Kind : std::int32_t {
    value = BC_ERROR_VALUE,
    name = BC_ERROR_NAME,
    key = BC_ERROR_KEY,
    unit = BC_ERROR_UNIT,
    duplicate = BC_ERROR_DUPLICATE,
    geometry = BC_ERROR_GEOMETRY,
    missing = BC_ERROR_MISSING,
    mechanism = BC_ERROR_MECHANISM,
    position = BC_ERROR_POSITION,
    syntax = BC_ERROR_SYNTAX,
    version = BC_ERROR_VERSION,
    file = BC_ERROR_FILE,
    lookup = BC_ERROR_LOOKUP,
    numerical = BC_ERROR_NUMERICAL,
    null = BC_ERROR_NULL,
    utf8 = BC_ERROR_UTF8,
    panic = BC_ERROR_PANIC,
    buffer = BC_ERROR_BUFFER,
    choice = BC_ERROR_CHOICE,
    count = BC_ERROR_COUNT,
};

// One thing that is wrong: at which field, what was found there and what would be right.
struct Problem {
    Kind kind;
    std::string path;
    std::string found;
    std::string expected;
    // The line of the document, counted from 1; 0 where there is none.
    std::int64_t line;
};

// Everything that is wrong; what() is the whole text.
class Error : public std::runtime_error {
public:
    Error(const std::string &text, std::vector<Problem> problems)
        : std::runtime_error(text), problems_(std::move(problems)) {}

    // The kind of the first problem.
    Kind kind() const { return problems_.front().kind; }
    // The path of the first problem.
    const std::string &path() const { return problems_.front().path; }
    // All problems, never empty.
    const std::vector<Problem> &problems() const { return problems_; }

private:
    std::vector<Problem> problems_;
};

// The input is at fault.
class InputError : public Error {
public:
    using Error::Error;
};

// A file cannot be read.
class FileError : public Error {
public:
    using Error::Error;
};

// A result was asked for that does not exist.
class LookupError : public Error {
public:
    using Error::Error;
};

// A calculation did not reach its accuracy.
class NumericalError : public Error {
public:
    using Error::Error;
};

// The library was called in a wrong way (text that is not UTF-8, an index past the end), or it
// failed itself (Kind::panic).
class UsageError : public Error {
public:
    using Error::Error;
};

namespace detail {

// A text that `get` writes to a buffer, by the rule for texts in beamcore.h.
template <class Get> std::string raw_text(Get get, std::int32_t &status) {
    std::string text(256, '\0');
    std::int64_t length = 0;
    const auto capacity = [&text] { return static_cast<std::int64_t>(text.size()); };
    status = get(text.data(), capacity(), &length);
    if (status == BC_ERROR_BUFFER) {
        text.resize(static_cast<std::size_t>(length) + 1);
        status = get(text.data(), capacity(), &length);
    }
    text.resize(status == BC_OK ? static_cast<std::size_t>(length) : 0);
    return text;
}

// A text about the last error; what cannot be had stays empty, there is an error to throw already.
template <class Get> std::string error_text(Get get) {
    std::int32_t status = BC_OK;
    return raw_text(get, status);
}

inline Problem problem(std::int32_t index) {
    std::int32_t kind = BC_OK;
    std::int64_t line = 0;
    bc_error_problem_kind(index, &kind);
    bc_error_problem_line(index, &line);
    const auto text = [index](auto get) {
        return error_text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return get(index, buffer, capacity, length);
        });
    };
    return Problem{static_cast<Kind>(kind), text(bc_error_problem_path),
                   text(bc_error_problem_found), text(bc_error_problem_expected), line};
}

// Throws the last error of this thread.
[[noreturn]] inline void raise(std::int32_t status) {
    const std::string text = error_text(bc_error_text);
    std::int32_t count = 0;
    bc_error_problem_count(&count);
    std::vector<Problem> problems;
    for (std::int32_t index = 0; index < count; ++index) {
        problems.push_back(problem(index));
    }
    if (problems.empty()) { // A thread that is ending has lost its error; the status is left.
        problems.push_back(Problem{static_cast<Kind>(status), "", "", "", 0});
    }
    std::int32_t is_input = 0;
    bc_status_is_input(status, &is_input);
    if (is_input != 0) {
        throw InputError(text, std::move(problems));
    }
    switch (status) {
    case BC_ERROR_FILE:
        throw FileError(text, std::move(problems));
    case BC_ERROR_LOOKUP:
        throw LookupError(text, std::move(problems));
    case BC_ERROR_NUMERICAL:
        throw NumericalError(text, std::move(problems));
    case BC_ERROR_NULL:
    case BC_ERROR_UTF8:
    case BC_ERROR_PANIC:
    case BC_ERROR_BUFFER:
    case BC_ERROR_CHOICE:
    case BC_ERROR_COUNT:
        throw UsageError(text, std::move(problems));
    default: // A kind of a later version of the library.
        throw Error(text, std::move(problems));
    }
}

// Throws unless a call succeeded.
inline void check(std::int32_t status) {
    if (status != BC_OK) {
        raise(status);
    }
}

// A text that `get` writes to a buffer; throws where there is none.
template <class Get> std::string text(Get get) {
    std::int32_t status = BC_OK;
    std::string text = raw_text(get, status);
    check(status);
    return text;
}

// A text for the C ABI, whose texts end at the first NUL: one inside would be cut off silently.
inline const char *c_text(const std::string &text, const char *parameter) {
    if (text.find('\0') != std::string::npos) {
        const std::string found = "a text with a NUL inside";
        const std::string expected = "a text without NUL";
        throw UsageError(std::string(parameter) + ": found " + found + "; expected " + expected,
                         {Problem{Kind::utf8, parameter, found, expected, 0}});
    }
    return text.c_str();
}

} // namespace detail
} // namespace beamcore

#endif // BEAMCORE_ERROR_HPP
