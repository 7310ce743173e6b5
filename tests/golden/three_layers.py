"""The golden case three-layer-nailed: three nailed layers under a uniform load, by Fourier's series.

Under a load q_n sin(a x), a = n pi/L, every deflection is w_n sin(a x) and every displacement along x
is u_n cos(a x). The equations of each term are solved one by one; a uniform load is the sum of
4 q/(n pi) sin(a x) over odd n. No equation is shared with beamcore's solver, and no boundary condition
has to be set.
"""

import math

from number_tools import solved
from write_expect import Case

SPAN, Q, TERMS = 5.0, 1500.0, 2001
# E, width, height and z of the middle, from the lowest upward; slip moduli between them.
LAYERS = [(11e9, 0.140, 0.045, 0.0225), (11e9, 0.063, 0.180, 0.135), (11.6e9, 0.140, 0.060, 0.255)]
SLIP = [8e6, 12e6]


class Term:
    """The amplitudes of one term: deflection, the axial forces and the moments of the layers."""

    def __init__(self, n: int, creep: float, joint_creep: float) -> None:
        self.a = a = n * math.pi / SPAN
        load = 4 * Q / (n * math.pi)
        soft, k = 1 + creep, [value / (1 + joint_creep) for value in SLIP]
        self.ea = [e / soft * b * h for e, b, h, _ in LAYERS]
        self.ei = [ea * h**2 / 12 for ea, (_, _, h, _) in zip(self.ea, LAYERS)]
        # A layer moves by u + (z - z_i) w' at the height z. Slip of joint j: u_(j+1) - u_j - r_j w'
        # with r_j the distance of the centroids; in amplitudes of cos: u_(j+1) - u_j - r_j a w.
        r = [LAYERS[j + 1][3] - LAYERS[j][3] for j in (0, 1)]
        # Unknown u_1, u_2, u_3, w: energy of the term.
        matrix = [[0.0] * 4 for _ in range(4)]
        for i in range(3):
            matrix[i][i] += self.ea[i] * a**2
        matrix[3][3] += sum(self.ei) * a**4
        for j in (0, 1):
            way = [0.0] * 4
            way[j + 1], way[j], way[3] = 1.0, -1.0, -r[j] * a
            for p in range(4):
                for q in range(4):
                    matrix[p][q] += k[j] * way[p] * way[q]
        *self.u, self.w = solved(matrix, [0.0, 0.0, 0.0, load])
        self.slip = [self.u[j + 1] - self.u[j] - r[j] * a * self.w for j in (0, 1)]

    def axial(self, i: int) -> float:
        """N = EA u' = -EA a u sin."""
        return -self.ea[i] * self.a * self.u[i]

    def moment(self, i: int) -> float:
        return self.ei[i] * self.a**2 * self.w


def three_layers() -> Case:
    case = Case("three-layer-nailed", """
Fourier's series of the three layers (three_layers.py, own derivation), summed to n = 2001; joints of timber on timber
creep with 2 k_def = 1.2. Left over: below 1e-12 for deflection and moments, below 1e-8 of the axial forces.""")
    for time, creep, joint in [("initial", 0.0, 0.0), ("final", 0.6, 1.2)]:
        terms = [Term(n, creep, joint) for n in range(1, TERMS, 2)]
        at = f'combinations["permanent"].{time}'

        def middle(of) -> float:
            return math.fsum(of(term) * (-1) ** i for i, term in enumerate(terms))

        case.add(f"{at}.deflection.greatest.value_m", middle(lambda t: t.w), "1e-11")
        for i, name in enumerate(["bottom", "web", "top"]):
            value = middle(lambda t: t.axial(i))
            peak = abs(middle(lambda t: t.axial(0)))
            end = "maximum" if value > 0 else "minimum"
            case.add(f'{at}.layers["{name}"].axial.{end}.value_N', value, "1e-8", peak)
            case.add(f'{at}.layers["{name}"].moment.greatest.value_Nm', middle(lambda t: t.moment(i)),
                     "1e-8")
        for j, name in enumerate(["lower nails", "upper nails"]):
            slip = math.fsum(term.slip[j] for term in terms)
            case.add(f'{at}.joints["{name}"].slip.left_m', slip, "1e-6")
        loose = sum(terms[0].ei)
        case.add(f'combinations["quasi-permanent"].{time}.composite_action.loose_m',
                 5 * Q * SPAN**4 / (384 * loose), "1e-11")
    case.fields(["left", "right"], ["bottom", "web", "top"])
    case.layered(["lower nails", "upper nails"], ["bottom", "web", "top"])
    return case
