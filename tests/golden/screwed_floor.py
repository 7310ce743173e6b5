"""The golden case screwed-floor: a slab on a joist whose screws stand closer near the supports.

The equations of slipping_layers.py hold in each band; at the ends of bands N and the slip -N'/k are
the same on both sides. By symmetry N' = 0 at midspan.
"""

import math

from number_tools import greatest, integral, solved
from slipping_layers import Layer, Pair, stresses
from write_expect import Case

HALF, BAND = 2.7, 1.2
DEAD, LIVE, PSI_2 = 2000.0, 1700.0, 0.3
CLOSE = "1e-11"


class Banded:
    """N, its derivatives and the curvature under a unit load per length, on the left half."""

    def __init__(self, time: str) -> None:
        slab, joist, joint = (3.0, 1.6, 2.0) if time == "final" else (1.0, 1.0, 1.0)
        upper = Layer(31e9 / slab, 0.6, 0.06, 0.14)
        lower = Layer(11e9 / joist, 0.1, 0.22, 0.0)
        # One row of screws, 10 kN/mm each, at 100 mm and at 200 mm.
        self.bands = [(0.0, BAND, Pair(upper, lower, 100e6 / joint)),
                      (BAND, HALF, Pair(upper, lower, 50e6 / joint))]
        self.pair = self.bands[0][2]
        self.share = self.pair.eas * self.pair.r / self.pair.ei_rigid
        (_, _, one), (_, _, two) = self.bands
        a, b = one.decay, two.decay
        fade, fade_two = math.exp(-a * BAND), math.exp(-b * (HALF - BAND))
        moment, force, share = self.moment(BAND), HALF - BAND, self.share
        p1, p2 = share * (moment - 1 / a**2), share * (moment - 1 / b**2)
        # Unknown A1, B1, A2, B2 of A e^(-lambda (x - x0)) + B e^(lambda (x - x1)) in each band.
        matrix = [[1, fade, 0, 0],
                  [fade, 1, -1, -fade_two],
                  [-a * fade / one.k, a / one.k, b / two.k, -b * fade_two / two.k],
                  [0, 0, -fade_two, 1]]
        right = [share / a**2, p2 - p1, share * force * (1 / two.k - 1 / one.k), 0]
        self.constants = solved(matrix, right)

    @staticmethod
    def moment(x: float) -> float:
        return x * (2 * HALF - x) / 2

    def n(self, x: float, band: int) -> tuple[float, float, float]:
        """N and its first two derivatives."""
        start, end, pair = self.bands[band]
        lam = pair.decay
        left = self.constants[2 * band] * math.exp(-lam * (x - start))
        right = self.constants[2 * band + 1] * math.exp(lam * (x - end))
        smooth = self.share * (self.moment(x) - 1 / lam**2)
        return (smooth + left + right, self.share * (HALF - x) + lam * (right - left),
                -self.share + lam**2 * (left + right))

    def curvature(self, x: float) -> float:
        return (self.moment(x) - self.n(x, 0 if x < BAND else 1)[0] * self.pair.r) / self.pair.ei0

    def deflection(self) -> float:
        """At midspan: the integral of x kappa over the left half."""
        return integral(lambda x: x * self.curvature(x), [0.0, BAND, HALF])

    def pressure(self, x: float, band: int) -> float:
        """As in slipping_layers.py."""
        _, _, bent = self.n(x, band)
        upper = self.pair.upper
        return 1 - upper.ei * (1 + bent * self.pair.r) / self.pair.ei0 + bent * upper.height / 2


def screwed_floor() -> Case:
    case = Case("screwed-floor", """
Equations of slipping layers band by band (screwed_floor.py, own derivation on Newmark, Siess and Viest 1951).
Final values: (combination - quasi-permanent share) with short-term moduli plus that share with long-term ones.""")
    short, long = Banded("initial"), Banded("final")
    quasi = DEAD + PSI_2 * LIVE
    factors = {"permanent": DEAD, "quasi-permanent": quasi, "characteristic": DEAD + LIVE,
               "fundamental": 1.35 * DEAD + 1.5 * LIVE}
    for combination, q in factors.items():
        lasting = DEAD if combination == "permanent" else quasi
        for time, terms in [("initial", [(q, short)]), ("final", [(q - lasting, short), (lasting, long)])]:
            at = f'combinations["{combination}"].{time}'

            def total(of) -> float:
                return sum(factor * of(member) for factor, member in terms)

            case.add(f"{at}.deflection.greatest.value_m", total(Banded.deflection), CLOSE)
            n = total(lambda m: m.n(HALF, 1)[0])
            case.add(f'{at}.layers["joist"].axial.greatest.value_N', n, CLOSE)
            case.add(f'{at}.layers["slab"].axial.minimum.value_N', -n, CLOSE)
            for name, layer in [("slab", lambda m: m.pair.upper), ("joist", lambda m: m.pair.lower)]:
                case.add(f'{at}.layers["{name}"].moment.greatest.value_Nm',
                         total(lambda m: layer(m).ei * m.curvature(HALF)), CLOSE)
            slip = total(lambda m: -m.n(0.0, 0)[1] / m.bands[0][2].k)
            case.add(f'{at}.joints["screws"].slip.left_m', slip, CLOSE)
            case.add(f'{at}.joints["screws"].slip.right_m', -slip, CLOSE)
            case.add(f'{at}.joints["screws"].flow.greatest.value_N_per_m',
                     total(lambda m: -m.n(0.0, 0)[1]), CLOSE)
            press = [greatest(lambda x: total(lambda m: m.pressure(x, band)), low, high)
                     for band, (low, high, _) in enumerate(short.bands)]
            case.add(f'{at}.joints["screws"].pressure.maximum.value_N_per_m', max(press), "1e-10")

            def edge(x: float) -> float:
                return total(lambda m: max(stresses(m.pair.lower, m.n(x, 0 if x < BAND else 1)[0],
                                                    m.pair.lower.ei * m.curvature(x))))

            case.add(f'{at}.stresses["joist"].tension.value_Pa', greatest(edge, BAND, HALF), CLOSE)
    for i, k in enumerate([100e6, 50e6, 100e6]):
        at = f'section.joints["screws"].stretches[{i}]'
        case.add(f"{at}.modulus_initial_N_per_m2", k, "1e-14")
        case.add(f"{at}.modulus_final_N_per_m2", k / 2, "1e-14")
    case.fields(["left", "right"], ["joist", "slab"])
    case.layered(["screws"], ["joist", "slab"])
    for time in ["initial", "final"]:
        for name in ["degree", "effective_stiffness_Nm2"]:
            case.bits(f'combinations["characteristic"].{time}.composite_action.{name}')
    return case
