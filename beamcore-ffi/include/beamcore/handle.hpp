// Shared ownership of the handles of the C ABI.
#ifndef BEAMCORE_HANDLE_HPP
#define BEAMCORE_HANDLE_HPP

#include "error.hpp"

#include <memory>
#include <optional>

namespace beamcore {

// When a result holds.
enum class Time : std::int32_t {
    // The day the load comes on: every material with its short-term modulus.
    initial = BC_TIME_INITIAL,
    // The end of the life: the quasi-permanent share of the load with effective moduli.
    final = BC_TIME_FINAL,
};

namespace detail {

template <class C> using Shared = std::shared_ptr<const C>;

// The handle that `call` gives out, freed with its last copy.
template <class C, class Call> Shared<C> make(void (*free)(C *), Call call) {
    C *handle = nullptr;
    check(call(&handle));
    return Shared<C>(handle, [free](const C *last) { free(const_cast<C *>(last)); });
}

// The one number that `call` writes.
template <class Call> double number(Call call) {
    double value = 0.0;
    check(call(&value));
    return value;
}

// The one count that `call` writes.
template <class Call> std::int32_t count(Call call) {
    std::int32_t value = 0;
    check(call(&value));
    return value;
}

// The one number that `call` writes, if there is one.
template <class Call> std::optional<double> optional(Call call) {
    std::int32_t has_value = 0;
    double value = 0.0;
    check(call(&has_value, &value));
    return has_value != 0 ? std::optional(value) : std::nullopt;
}

// The same as a quantity.
template <class Q, class Call> std::optional<Q> optional_of(Call call) {
    const std::optional<double> value = optional(call);
    return value.has_value() ? std::optional(Q::from_si(*value)) : std::nullopt;
}

// The handles of a list of objects, which keep them.
template <class C, class Object>
std::vector<const C *> handles(const std::vector<Object> &objects) {
    std::vector<const C *> handles;
    for (const Object &object : objects) {
        handles.push_back(object.get());
    }
    return handles;
}

// A list of texts for the C ABI; they live as long as the list they are taken from.
inline std::vector<const char *> c_texts(const std::vector<std::string> &texts,
                                         const char *parameter) {
    std::vector<const char *> list;
    for (const std::string &text : texts) {
        list.push_back(c_text(text, parameter));
    }
    return list;
}

// A list of texts out of a function that counts them and one that gives them by index.
template <class C, class Count, class Get>
std::vector<std::string> texts(const C *handle, Count count_of, Get get) {
    const std::int32_t size = count([&](std::int32_t *out) { return count_of(handle, out); });
    std::vector<std::string> list;
    for (std::int32_t index = 0; index < size; ++index) {
        list.push_back(text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
            return get(handle, index, buffer, capacity, length);
        }));
    }
    return list;
}

// The name that `get` gives of a handle.
template <class C, class Get> std::string name(const C *handle, Get get) {
    return text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
        return get(handle, buffer, capacity, length);
    });
}

// The text that `get` writes to a buffer, if there is one.
template <class Get> std::optional<std::string> optional_text(Get get) {
    std::int32_t has_value = 0;
    std::string found = text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
        return get(&has_value, buffer, capacity, length);
    });
    return has_value != 0 ? std::optional(std::move(found)) : std::nullopt;
}

// A choice as it crosses the C ABI.
template <class Choice> constexpr std::int32_t code(Choice choice) {
    return static_cast<std::int32_t>(choice);
}

// A size as the C ABI counts; a list that it cannot count is refused.
inline std::int32_t size(std::size_t size) {
    if (size > static_cast<std::size_t>(INT32_MAX)) {
        const std::string found = std::to_string(size);
        const std::string expected = "at most " + std::to_string(INT32_MAX);
        throw UsageError("count: found " + found + "; expected " + expected,
                         {Problem{Kind::count, "count", found, expected, 0}});
    }
    return static_cast<std::int32_t>(size);
}

} // namespace detail
} // namespace beamcore

#endif // BEAMCORE_HANDLE_HPP
