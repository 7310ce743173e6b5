// Stresses in the parts of a solved member.
#ifndef BEAMCORE_STRESS_HPP
#define BEAMCORE_STRESS_HPP

#include "field.hpp"

namespace beamcore {

// A greatest stress, tension positive, with its place along the member and its point of the
// section; y is the middle of the part where the member is held sideways.
struct StressExtreme {
    Stress value;
    Length at;
    Length y;
    Length z;
};

// The greatest utilisation of a part, stress over design strength.
struct Utilisation {
    double value;
    Length at;
};

// The stress along one fibre of a part.
class FibreStress : public Line<Stress> {
public:
    FibreStress(detail::Shared<bc_response> response, const std::string &combination, Time time,
                const std::string &part, std::int32_t fibre)
        : Line<Stress>([=](std::int32_t side, const double *x_m, std::int32_t count, double *out) {
              return bc_response_stress_values(response.get(), combination.c_str(),
                                               detail::code(time), part.c_str(), fibre, side, x_m,
                                               count, out);
          }) {}
};

// The normal stress in one part, tension positive.
class PartStress {
public:
    PartStress(detail::Shared<bc_response> response, const std::string &combination, Time time,
               const std::string &part)
        : response_(std::move(response)), combination_(combination), time_(time), part_(part) {
        // Whether there are such a combination and part is said here, where they are named.
        detail::c_text(combination, "combination");
        detail::c_text(part, "part");
        greatest_tension();
    }

    // The algebraically greatest stress with its place.
    StressExtreme greatest_tension() const { return extreme(BC_STRESS_TENSION); }
    // The algebraically least stress with its place.
    StressExtreme greatest_compression() const { return extreme(BC_STRESS_COMPRESSION); }

    // The stress along the bottom edge, the own centroid and the top edge of the part.
    FibreStress bottom() const { return fibre(BC_FIBRE_BOTTOM); }
    FibreStress centroid() const { return fibre(BC_FIBRE_CENTROID); }
    FibreStress top() const { return fibre(BC_FIBRE_TOP); }

private:
    StressExtreme extreme(std::int32_t sign) const {
        double value = 0.0, at = 0.0, y = 0.0, z = 0.0;
        detail::check(bc_response_stress(response_.get(), combination_.c_str(),
                                         detail::code(time_), part_.c_str(), sign, &value, &at,
                                         &y, &z));
        return StressExtreme{Stress::from_si(value), Length::from_si(at), Length::from_si(y),
                             Length::from_si(z)};
    }

    FibreStress fibre(std::int32_t fibre) const {
        return FibreStress(response_, combination_, time_, part_, fibre);
    }

    detail::Shared<bc_response> response_;
    std::string combination_;
    Time time_;
    std::string part_;
};

} // namespace beamcore

#endif // BEAMCORE_STRESS_HPP
