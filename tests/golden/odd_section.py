"""The golden case odd-section: integrals of the shapes by the shoelace formula in exact fractions
(pi enters for the round ones), bending about both axes, the extremes among all corners."""

import math
from fractions import Fraction as F

from write_expect import Case, mm

GRAVITY = F("9.80665")
Point = tuple[F, F]


class Shape:
    """Area, centroid and second moments about the own centroid; corners, or circles (y, z, r)."""

    def __init__(self, area, y, z, iyy, izz, iyz, corners=(), circle=None) -> None:
        self.area, self.y, self.z = area, y, z
        self.iyy, self.izz, self.iyz = iyy, izz, iyz
        self.corners, self.circle = list(corners), circle

    def about(self, y, z):
        dy, dz = self.y - y, self.z - z
        return (self.iyy + self.area * dz * dz, self.izz + self.area * dy * dy, self.iyz + self.area * dy * dz)


def polygon(points: list[Point]) -> Shape:
    """Shoelace sums about the origin, moved to the centroid."""
    area = sy = sz = iyy = izz = iyz = F(0)
    for (y1, z1), (y2, z2) in zip(points, points[1:] + points[:1]):
        c = y1 * z2 - y2 * z1
        area += c / 2
        sy += (z1 + z2) * c / 6
        sz += (y1 + y2) * c / 6
        iyy += (z1 * z1 + z1 * z2 + z2 * z2) * c / 12
        izz += (y1 * y1 + y1 * y2 + y2 * y2) * c / 12
        iyz += (y1 * z2 + 2 * y1 * z1 + 2 * y2 * z2 + y2 * z1) * c / 24
    if area < 0:
        return polygon(points[::-1])
    y, z = sz / area, sy / area
    return Shape(area, y, z, iyy - area * z * z, izz - area * y * y, iyz - area * y * z, points)


def disc(d: float, y: float, z: float, hole: float = 0.0) -> Shape:
    area = math.pi * (d * d - hole * hole) / 4
    second = math.pi * (d**4 - hole**4) / 64
    return Shape(area, y, z, second, second, 0.0, circle=(y, z, d / 2))


def without(host: Shape, insert: Shape) -> Shape:
    area = float(host.area) - insert.area
    y = (float(host.area * host.y) - insert.area * insert.y) / area
    z = (float(host.area * host.z) - insert.area * insert.z) / area
    a, b = host.about(F(y), F(z)), insert.about(y, z)
    return Shape(area, y, z, *(float(p) - q for p, q in zip(a, b)), host.corners)


def points(*pairs) -> list[Point]:
    return [(mm(y), mm(z)) for y, z in pairs]


def odd_section() -> Case:
    case = Case("odd-section", """
Shoelace sums in exact fractions, discs by pi d^2/4 and pi d^4/64, a bar that displaces its host;
bending about both axes with EI_yz (Gere and Goodno, unsymmetric bending, from memory):
EI = EI_yy - EI_yz^2/EI_zz, extremes among the corners.""")
    foot = points((-60, -150), (-40, -180), (40, -180), (60, -150))
    bar = disc(0.024, -0.03, -0.12)
    shapes = {
        "stem": without(polygon(points((-60, -150), (60, -150), (60, 150), (-60, 150))), bar),
        "bar": bar,
        "foot": polygon(foot),
        "head": polygon([(y, -z) for y, z in foot]),
        "channel": polygon(points((-100, -50), (-60, -50), (-60, -42), (-94, -42), (-94, 42), (-60, 42),
                                  (-60, 50), (-100, 50))),
        "cheek": polygon(points((60, -45), (130, -45), (130, -37), (68, -37), (68, 45), (60, 45))),
        "pipe": disc(0.06, 0.0, -0.21, 0.05),
    }
    oak = {"stem", "foot", "head"}
    length, a, p = 5.0, 2.0, 6000.0
    mass = sum(float(s.area) * (690 if n in oak else 7850) for n, s in shapes.items() if n != "pipe") + 9
    q = mass * float(GRAVITY) + 4000
    case.exact("member.mass_kg", mass * length)
    made = {}
    for time, soft in [("initial", 1.0), ("final", 1.6)]:
        e = {n: 9.5e9 / soft if n in oak else 210e9 for n in shapes}
        ea = math.fsum(e[n] * float(s.area) for n, s in shapes.items())
        y = math.fsum(e[n] * float(s.area * s.y) for n, s in shapes.items()) / ea
        z = math.fsum(e[n] * float(s.area * s.z) for n, s in shapes.items()) / ea
        about = {n: s.about(y if s.circle or n == "stem" else F(y), z if s.circle or n == "stem" else F(z))
                 for n, s in shapes.items()}
        yy, zz, yz = (math.fsum(e[n] * float(about[n][i]) for n in shapes) for i in range(3))
        at = f"section.{time}"
        case.exact(f"{at}.axial_stiffness_N", ea)
        case.exact(f"{at}.centroid_y_m", y, 0.3)
        case.exact(f"{at}.centroid_z_m", z, 0.3)
        case.exact(f"{at}.bending_stiffness_yy_Nm2", yy)
        case.exact(f"{at}.bending_stiffness_zz_Nm2", zz)
        case.exact(f"{at}.bending_stiffness_yz_Nm2", yz, yy)
        middle, radius = (yy + zz) / 2, math.hypot((yy - zz) / 2, yz)
        case.exact(f"{at}.principal_greater_Nm2", middle + radius)
        case.exact(f"{at}.principal_smaller_Nm2", middle - radius, middle + radius)
        made[time] = (e, y, z, yy - yz * yz / zz, -yz / zz)
    # Greatest moment under the characteristic combination: where the shear force is zero.
    reaction = q * length / 2 + p * (length - a) / length
    x = (reaction - p) / q if reaction - q * a > p else min(reaction / q, a)
    m = reaction * x - q * x * x / 2 - p * max(x - a, 0.0)
    at = 'combinations["characteristic"].initial'
    case.exact(f"{at}.moment.greatest.value_Nm", m)
    case.exact(f"{at}.moment.greatest.at_m", x, length)
    e, y, z, ei, r = made["initial"]
    for name, shape in shapes.items():
        strains = [-(m / ei) * (float(pz) - z + r * (float(py) - y)) for py, pz in shape.corners]
        if shape.circle:
            cy, cz, radius = shape.circle
            centre, reach = cz - z + r * (cy - y), radius * math.hypot(1.0, r)
            strains = [-(m / ei) * (centre + reach), -(m / ei) * (centre - reach)]
        peak = e[name] * max(map(abs, strains))
        # No stress is below zero tension or above zero compression: the unloaded ends give zero.
        case.exact(f'{at}.stresses["{name}"].tension.value_Pa', max(0.0, e[name] * max(strains)), peak)
        case.exact(f'{at}.stresses["{name}"].compression.value_Pa', min(0.0, e[name] * min(strains)), peak)
    # Sag under the permanent action: 5 q L^4/(384 EI), and the movement sideways with it.
    for time in ["initial", "final"]:
        _, _, _, ei, r = made[time]
        w = 5 * q * length**4 / (384 * ei)
        at = f'combinations["permanent"].{time}'
        case.exact(f"{at}.deflection.greatest.value_m", w)
        case.exact(f"{at}.sideways.greatest.value_m", -r * w)
    case.fields(["left", "right"], list(shapes))
    for combination in ["quasi-permanent", "characteristic", "fundamental"]:
        for time in ["initial", "final"]:
            case.bits(f'combinations["{combination}"].{time}.sideways.greatest.value_m')
    return case
