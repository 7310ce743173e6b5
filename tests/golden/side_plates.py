"""The golden case side-plates: two plates bolted to the sides of a joist that alone rests on supports.

Joist (1) and plates (2, together) share the axis, so nothing flows along it; the bolts pass
k (w1 - w2) per length (own derivation):
    EI1 w1'''' = q - k (w1 - w2),   EI2 w2'''' = k (w1 - w2).
With S = EI1 w1 + EI2 w2 and d = w1 - w2, in xi from midspan and h half the span:
    S'''' = q,   d'''' + 4 b^4 d = q/EI1,   4 b^4 = k (1/EI1 + 1/EI2),
    d = q/(4 b^4 EI1) + A cosh(b xi) cos(b xi) + B sinh(b xi) sin(b xi).
At the ends w1 = 0 and no part has a moment (S'' = d'' = 0); the plates have no shear force there, so
that d''' = S'''/EI1, with S''' = q xi.
"""

import math

from number_tools import greatest, solved
from write_expect import Case

SPAN, Q, BOLTS = 4.0, 5000.0, 6e6
# Deflections; moments and stresses of layers that part come from a curvature between points.
CLOSE, CURVED = "1e-11", "1e-9"


class Plated:
    def __init__(self, time: str) -> None:
        wood, joint = (1.6, 1.6) if time == "final" else (1.0, 1.0)
        self.joist = 11e9 / wood * 0.094 * 0.22**3 / 12
        self.plates = 2 * 210e9 * 0.005 * 0.2**3 / 12
        self.both = self.joist + self.plates
        k = BOLTS / joint
        self.b = (k * (1 / self.joist + 1 / self.plates) / 4) ** 0.25
        self.flat = Q / (4 * self.b**4 * self.joist)
        h, b = SPAN / 2, self.b
        c, s, ch, sh = math.cos(b * h), math.sin(b * h), math.cosh(b * h), math.sinh(b * h)
        # d'' = 2 b^2 (-A sinh sin + B cosh cos)
        # d''' = 2 b^3 (-A (cosh sin + sinh cos) + B (sinh cos - cosh sin))
        matrix = [[-sh * s, ch * c], [-(ch * s + sh * c), sh * c - ch * s]]
        self.constants = solved(matrix, [0.0, Q * h / self.joist / (2 * b**3)])

    def apart(self, xi: float) -> float:
        """w1 - w2."""
        a, b = self.constants
        x = self.b * xi
        return self.flat + a * math.cosh(x) * math.cos(x) + b * math.sinh(x) * math.sin(x)

    def apart_bent(self, xi: float) -> float:
        """Its second derivative."""
        a, b = self.constants
        x = self.b * xi
        return 2 * self.b**2 * (b * math.cosh(x) * math.cos(x) - a * math.sinh(x) * math.sin(x))

    def sum(self, xi: float) -> float:
        """EI1 w1 + EI2 w2: that of a simple beam, moved so that w1 is zero at the ends."""
        h = SPAN / 2
        simple = Q * (5 * h**4 - 6 * h**2 * xi**2 + xi**4) / 24
        return simple - self.plates * self.apart(h)

    def deflections(self, xi: float) -> tuple[float, float]:
        whole, apart = self.sum(xi), self.apart(xi)
        return (whole + self.plates * apart) / self.both, (whole - self.joist * apart) / self.both

    def moments(self, xi: float) -> tuple[float, float]:
        """Of the joist and of both plates."""
        total = Q * ((SPAN / 2) ** 2 - xi**2) / 2
        joist = self.joist * (total - self.plates * self.apart_bent(xi)) / self.both
        return joist, total - joist


def side_plates() -> Case:
    case = Case("side-plates", """
Two beams coupled by bolts square to them (side_plates.py, own derivation). Loads and supports act on the joist only;
the plates hang on their bolts.""")
    for time in ["initial", "final"]:
        m = Plated(time)
        at = f'combinations["permanent"].{time}'
        joist, plates = m.deflections(0.0)
        case.add(f"{at}.deflection.greatest.value_m", joist, CLOSE)
        case.add(f'{at}.layers["joist"].deflection.greatest.value_m', joist, CLOSE)
        of_joist, of_plates = (greatest(lambda xi: m.moments(xi)[i], 0.0, SPAN / 2) for i in (0, 1))
        case.add(f'{at}.layers["joist"].moment.greatest.value_Nm', of_joist, CURVED)
        case.add(f'{at}.stresses["joist"].tension.value_Pa',
                 of_joist * 0.11 / (0.094 * 0.22**3 / 12), CURVED)
        for side in ["left", "right"]:
            plate = f"{side} plate"
            case.add(f'{at}.layers["{plate}"].deflection.greatest.value_m', plates, CLOSE)
            case.add(f'{at}.layers["{plate}"].deflection.minimum.value_m',
                     m.deflections(SPAN / 2)[1], CLOSE)
            case.add(f'{at}.layers["{plate}"].moment.greatest.value_Nm', of_plates / 2, CURVED)
            case.add(f'{at}.stresses["{plate}"].tension.value_Pa',
                     of_plates / 2 * 0.1 / (0.005 * 0.2**3 / 12), CURVED)
            case.add(f'{at}.reactions["{side}"].force_N', Q * SPAN / 2, CLOSE)
    names = ["joist", "left plate", "right plate"]
    case.fields(["left", "right"], names)
    case.layered(["left bolts", "right bolts"], names, deflections=True)
    return case
