// Tendons: how a prestress runs along a member.
#ifndef BEAMCORE_TENDON_HPP
#define BEAMCORE_TENDON_HPP

#include "../beamcore_units.hpp"

#include <array>
#include <vector>

namespace beamcore {

// A point of a tendon: a place along the member and a height of the section.
struct TendonPoint {
    Length at;
    Length height;
};

// Straight between its points, the first and last of which are the anchors: a straight tendon has
// two points, a draped one more.
struct Draped {
    std::vector<TendonPoint> points;
};

// The parabola through three points, the first and last of which are the anchors.
struct Parabolic {
    std::array<TendonPoint, 3> points;
};

} // namespace beamcore

#endif // BEAMCORE_TENDON_HPP
