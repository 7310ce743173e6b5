"""Two layers with a slipping joint on a simple span, in closed form, without beamcore.

Newmark, Siess and Viest 1951; Girhammar and Gopu 1993 (from memory): with N the tension of the lower
layer, r the distance of the centroids and t = -N' the flow,
    N'' - lambda^2 N = -k r M/EI0,   lambda^2 = k (1/EA1 + 1/EA2 + r^2/EI0),
    kappa = (M - N r)/EI0,   slip = -N'/k.
A free strain e of the upper layer adds -k e to the right side of the first equation.
"""

import math


class Layer:
    """A rectangle with its modulus (Pa), width, height and the z of its middle (m)."""

    def __init__(self, e: float, width: float, height: float, z: float) -> None:
        self.e, self.width, self.height, self.z = e, width, height, z
        self.ea = e * width * height
        self.ei = self.ea * height**2 / 12


class Pair:
    """Two layers, and the slip modulus k (N/m2) between them."""

    def __init__(self, upper: Layer, lower: Layer, k: float) -> None:
        self.upper, self.lower, self.k = upper, lower, k
        self.r = upper.z - lower.z
        self.ei0 = upper.ei + lower.ei
        self.eas = 1 / (1 / upper.ea + 1 / lower.ea)
        self.ei_rigid = self.ei0 + self.eas * self.r**2
        self.decay = math.sqrt(k * (1 / self.eas + self.r**2 / self.ei0))
        self.soft = 1 / self.ei0 - 1 / self.ei_rigid


class State:
    """What is asked for at one place: w, N of the lower layer and its first two derivatives, M."""

    def __init__(self, w: float, n: float, dn: float, ddn: float, moment: float) -> None:
        self.w, self.n, self.dn, self.ddn, self.moment = w, n, dn, ddn, moment

    def times(self, factor: float) -> "State":
        return State(*(factor * x for x in (self.w, self.n, self.dn, self.ddn, self.moment)))

    def plus(self, other: "State") -> "State":
        mine = (self.w, self.n, self.dn, self.ddn, self.moment)
        theirs = (other.w, other.n, other.dn, other.ddn, other.moment)
        return State(*(a + b for a, b in zip(mine, theirs)))


def uniform(pair: Pair, length: float, q: float, x: float) -> State:
    """Under a uniform load q."""
    a, h = pair.decay, length / 2
    whole = math.cosh(a * h)
    cosh, sinh = math.cosh(a * (h - x)) / whole, math.sinh(a * (h - x)) / whole
    w = q * x * (length**3 - 2 * length * x**2 + x**3) / (24 * pair.ei_rigid)
    w += pair.soft * q / a**2 * (x * (length - x) / 2 - (1 - cosh) / a**2)
    moment = q * x * (length - x) / 2
    share = pair.eas * pair.r / pair.ei_rigid
    n = share * (moment - q / a**2 * (1 - cosh))
    return State(w, n, share * q * (h - x - sinh / a), share * q * (cosh - 1), moment)


def strained(pair: Pair, length: float, e: float, x: float) -> State:
    """Under a free strain -e (a shrinkage e) of the upper layer."""
    a, h = pair.decay, length / 2
    whole = math.cosh(a * h)
    cosh, sinh = math.cosh(a * (h - x)) / whole, math.sinh(a * (h - x)) / whole
    w = pair.eas * pair.r * e / pair.ei_rigid * (x * (length - x) / 2 - (1 - cosh) / a**2)
    force = pair.eas * pair.ei0 / pair.ei_rigid * e
    return State(w, -force * (1 - cosh), -force * a * sinh, force * a**2 * cosh, 0.0)


def moments(pair: Pair, state: State) -> tuple[float, float]:
    """The moments of the upper and the lower layer about their own centroids."""
    bent = (state.moment - state.n * pair.r) / pair.ei0
    return pair.upper.ei * bent, pair.lower.ei * bent


def pressure(pair: Pair, q: float, state: State) -> float:
    """What the upper layer presses with on the lower one, from its own equilibrium:
    M_u'' = -(q - p) + t' h/2 with t = -N'."""
    bent = (-q - state.ddn * pair.r) / pair.ei0
    return q + pair.upper.ei * bent + state.ddn * pair.upper.height / 2


def stresses(layer: Layer, n: float, moment: float) -> tuple[float, float]:
    """The stress at the bottom and at the top of a layer."""
    middle, edge = n / (layer.width * layer.height), layer.e * moment / layer.ei * layer.height / 2
    return middle + edge, middle - edge
