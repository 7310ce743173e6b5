// What remains after a camber, and the readings to expect in the shop.
#ifndef BEAMCORE_READING_HPP
#define BEAMCORE_READING_HPP

#include "camber.hpp"

namespace beamcore {

// How the member stands when it is measured.
struct Trestles {
    // The places of the trestles, from the left end of the member.
    Length left;
    Length right;
    // The names of the parts that are there: a slab cast on site is not.
    std::vector<std::string> parts;
};

// What a tape shows at one station, from the chord through the ends of the design chord.
struct Reading {
    // Distance from the left end of the chord.
    Length station;
    // With the member lying on its side.
    Length lying;
    // With the member standing on the trestles under its own weight.
    Length standing;
};

inline Field<Length> Response::remaining(const std::string &combination, Time time,
                                         const Camber &camber) const {
    detail::c_text(combination, "combination");
    const auto response = handle_;
    const auto built = camber.handle_;
    // A deflection has one value at each place, whatever the side.
    return Field<Length>(
        [=](std::int32_t, const double *x_m, std::int32_t count, double *out) {
            return bc_response_remaining_values(response.get(), combination.c_str(),
                                                detail::code(time), built.get(), x_m, count, out);
        },
        [=](std::int32_t extreme, double *value, double *at) {
            return bc_response_remaining_extreme(response.get(), combination.c_str(),
                                                 detail::code(time), built.get(), extreme, value,
                                                 at);
        });
}

inline std::vector<Reading> Response::readings(const Camber &camber,
                                               const Trestles &trestles) const {
    const auto parts = detail::c_texts(trestles.parts, "part_names");
    const auto readings = detail::make<bc_readings>(bc_readings_free, [&](bc_readings **out) {
        return bc_response_readings(get(), camber.get(), trestles.left.si(), trestles.right.si(),
                                    parts.data(), detail::size(parts.size()), out);
    });
    const std::int32_t count = detail::count(
        [&](std::int32_t *out) { return bc_readings_count(readings.get(), out); });
    std::vector<Reading> list;
    for (std::int32_t index = 0; index < count; ++index) {
        double station = 0.0, lying = 0.0, standing = 0.0;
        detail::check(bc_readings_reading(readings.get(), index, &station, &lying, &standing));
        list.push_back(Reading{Length::from_si(station), Length::from_si(lying),
                               Length::from_si(standing)});
    }
    return list;
}

} // namespace beamcore

#endif // BEAMCORE_READING_HPP
