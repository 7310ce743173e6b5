"""The golden cases concrete-timber, shrinking-topping and clearance-floor: a concrete slab screwed to
a joist, by the closed forms of slipping_layers.py."""

import math

from number_tools import greatest
from slipping_layers import Layer, Pair, moments, pressure, strained, stresses, uniform
from write_expect import Case

LENGTH, Q = 6.0, 3000.0
# Closed forms in floating point: rounding of cosh and of differences.
CLOSE = "1e-11"
SUPPORTS, PARTS = ["left", "right"], ["joist", "slab"]


def pair(time: str) -> Pair:
    """Slab 600 x 70 (31 GPa, phi 2.5) on joist 100 x 220 (11 GPa, k_def 0.6), k 400/3 N/mm2, with
    the creep factor 1.2 of the joint."""
    slab, joist, joint = (3.5, 1.6, 2.2) if time == "final" else (1.0, 1.0, 1.0)
    return Pair(Layer(31e9 / slab, 0.6, 0.07, 0.145), Layer(11e9 / joist, 0.1, 0.22, 0.0),
                400e6 / 3 / joint)


def layers(case: Case, at: str, p: Pair, middle, end, peak_slip: float) -> None:
    """Axial forces, moments and stresses at midspan; slip and flow at the left end."""
    upper, lower = moments(p, middle)
    for name, layer, n, m in [("slab", p.upper, -middle.n, upper), ("joist", p.lower, middle.n, lower)]:
        case.add(f'{at}.layers["{name}"].axial.greatest.value_N', n, CLOSE)
        case.add(f'{at}.layers["{name}"].moment.greatest.value_Nm', m, CLOSE)
        sign, index = (-1.0, 0) if name == "slab" else (1.0, 1)

        def edges(x: float) -> tuple[float, float]:
            state = uniform(p, LENGTH, Q, x)
            return stresses(layer, sign * state.n, moments(p, state)[index])

        tension = greatest(lambda x: max(edges(x)), 0.0, LENGTH / 2)
        compression = -greatest(lambda x: -min(edges(x)), 0.0, LENGTH / 2)
        peak = max(abs(tension), abs(compression))
        case.add(f'{at}.stresses["{name}"].tension.value_Pa', tension, CLOSE, peak)
        case.add(f'{at}.stresses["{name}"].compression.value_Pa', compression, CLOSE, peak)
    case.add(f'{at}.joints["screws"].slip.left_m', -end.dn / p.k, CLOSE, peak_slip)
    case.add(f'{at}.joints["screws"].slip.right_m', end.dn / p.k, CLOSE, peak_slip)
    case.add(f'{at}.joints["screws"].flow.greatest.value_N_per_m', -end.dn, CLOSE)


def gamma(case: Case, time: str, p: Pair, exact: float) -> None:
    """The gamma method of EN 1995-1-1 Annex B (from memory) for the slab as layer 1: gamma_1 =
    1/(1 + pi^2 EA_1/(k l^2)), a_2 = gamma_1 EA_1 r/(gamma_1 EA_1 + EA_2), a_1 = r - a_2."""
    factor = 1.0 / (1.0 + math.pi**2 * p.upper.ea / (p.k * LENGTH**2))
    r = p.upper.z - p.lower.z
    lower_arm = factor * p.upper.ea * r / (factor * p.upper.ea + p.lower.ea)
    stiffness = p.ei0 + factor * p.upper.ea * (r - lower_arm) ** 2 + p.lower.ea * lower_arm**2
    deflection = 5 * Q * LENGTH**4 / (384 * stiffness)
    flow = p.lower.ea * lower_arm / stiffness * Q * LENGTH / 2
    span = f'simplified["gamma"].combinations["quasi-permanent"].{time}.spans["left to right"]'
    case.add(f"{span}.factors[0]", 1.0, "1e-15")
    case.add(f"{span}.factors[1]", factor, CLOSE)
    case.add(f"{span}.bending_stiffness_Nm2", stiffness, CLOSE)
    case.add(f"{span}.deflection.value_m", deflection, CLOSE)
    case.add(f"{span}.exact_deflection.value_m", exact, CLOSE)
    case.add(f"{span}.difference", deflection / exact - 1.0, "1e-9")
    case.add(f'{span}.joints["screws"].flow.value_N_per_m', -flow, CLOSE)
    moment = Q * LENGTH**2 / 8
    axial = lower_arm * p.lower.e * moment / stiffness
    case.add(f'{span}.layers["joist"].axial_stress_Pa', axial, CLOSE)


def concrete_timber() -> Case:
    case = Case("concrete-timber", """
Closed forms of slipping layers (slipping_layers.py). Rounded values of an independent script: w 11.139 mm,
N 62906 N, end flow 36.27 N/mm, slip 0.272 mm; long term with a joint creep of 1.2: w 22.10 mm.""")
    rounded = {"initial": (11.139e-3, "5e-5"), "final": (22.10e-3, "3e-4")}
    for time in ["initial", "final"]:
        p = pair(time)
        middle, end = uniform(p, LENGTH, Q, LENGTH / 2), uniform(p, LENGTH, Q, 0.0)
        at = f'combinations["permanent"].{time}'
        case.add(f"{at}.deflection.greatest.value_m", middle.w, CLOSE)
        case.add(f'combinations["quasi-permanent"].{time}.deflection.greatest.value_m', *rounded[time])
        layers(case, at, p, middle, end, abs(end.dn / p.k))
        press = [pressure(p, Q, uniform(p, LENGTH, Q, x)) for x in (0.0, LENGTH / 2)]
        case.add(f'{at}.joints["screws"].pressure.maximum.value_N_per_m', max(press), CLOSE)
        loose, rigid = (5 * Q * LENGTH**4 / (384 * ei) for ei in (p.ei0, p.ei_rigid))
        action = f'combinations["quasi-permanent"].{time}.composite_action'
        case.add(f"{action}.loose_m", loose, CLOSE)
        case.add(f"{action}.rigid_m", rigid, CLOSE)
        case.add(f"{action}.degree", (loose - middle.w) / (loose - rigid), CLOSE)
        case.add(f"{action}.effective_stiffness_Nm2", p.ei_rigid * rigid / middle.w, CLOSE)
        gamma(case, time, p, middle.w)
        case.add(f"section.{time}.bending_stiffness_yy_Nm2", p.ei_rigid, CLOSE)
    case.add('section.joints["screws"].stretches[0].modulus_final_N_per_m2', 400e6 / 3 / 2.2, "1e-14")
    case.fields(SUPPORTS, PARTS)
    case.layered(["screws"], PARTS)
    return case


def shrinking_topping() -> Case:
    case = Case("shrinking-topping", """
Closed forms of slipping layers (slipping_layers.py) for a shrinkage 3e-4 of the slab. Rounded values of an
independent script: N -15645 N, w 6.291 mm, end slip 0.1892 mm.""")
    e = 3e-4
    for time in ["initial", "final"]:
        p = pair(time)
        middle, end = strained(p, LENGTH, e, LENGTH / 2), strained(p, LENGTH, e, 0.0)
        at = f'combinations["permanent"].{time}'
        case.add(f"{at}.deflection.greatest.value_m", middle.w, CLOSE)
        case.add(f'{at}.layers["joist"].axial.greatest.value_N', middle.n, CLOSE)
        case.add(f'{at}.layers["slab"].axial.greatest.value_N', -middle.n, CLOSE)
        case.add(f'{at}.joints["screws"].slip.left_m', -end.dn / p.k, CLOSE)
        case.add(f'{at}.joints["screws"].flow.maximum.value_N_per_m', abs(end.dn), CLOSE)
        # The free strain of the slab makes no stress of its own where the slab follows it.
        edges = stresses(p.lower, middle.n, moments(p, middle)[1])
        case.add(f'{at}.stresses["joist"].tension.value_Pa', max(edges), CLOSE, max(map(abs, edges)))
    at = 'combinations["quasi-permanent"].initial'
    case.add(f"{at}.deflection.greatest.value_m", 6.291e-3, "1e-4")
    case.add(f'{at}.layers["joist"].axial.greatest.value_N', -15645.0, "4e-5")
    case.add(f'{at}.joints["screws"].slip.greatest.value_m', 0.1892e-3, "3e-4")
    case.fields(SUPPORTS, PARTS)
    case.layered(["screws"], PARTS)
    return case


class Banded:
    """A pair of layers whose joint carries nothing until it has slipped by c, under a uniform load.

    By symmetry the slip falls to zero at midspan, so a stretch about midspan carries nothing. From
    the end to the place a the joint carries: N'' - lambda^2 N = -k r M/EI0 with N(0) = 0 and
    N'(a) = 0; from a on N is constant. The slip follows from -slip' = r M/EI0 - N (1/EAs + r^2/EI0)
    with slip(midspan) = 0, and a from slip(a) = -c.
    """

    def __init__(self, p: Pair, length: float, q: float, clearance: float) -> None:
        self.p, self.half, self.q = p, length / 2, q
        low, high = 0.0, self.half
        for _ in range(200):
            self.place(f := (low + high) / 2)
            low, high = (f, high) if self.slip_at_place() > clearance else (low, f)
        self.place((low + high) / 2)

    def moment(self, x: float) -> float:
        return self.q * x * (2 * self.half - x) / 2

    def place(self, a: float) -> None:
        """Sets a and the constants of N = share (M - q/lambda^2) + A e^(-lambda x) + B e^(lambda (x - a))."""
        p, self.a = self.p, a
        lam, self.share = p.decay, p.eas * p.r / p.ei_rigid
        first = self.share * self.q / lam**2
        slope = self.share * self.q * (self.half - a)
        fade = math.exp(-lam * a)
        # A + B fade = first;  -A fade + B = -slope/lambda
        det = 1 + fade**2
        self.left = (first + fade * slope / lam) / det
        self.right = (-slope / lam + fade * first) / det

    def n(self, x: float) -> float:
        x, lam = min(x, self.a), self.p.decay
        polynomial = self.share * (self.moment(x) - self.q / lam**2)
        return polynomial + self.left * math.exp(-lam * x) + self.right * math.exp(lam * (x - self.a))

    def dn_at_end(self) -> float:
        lam = self.p.decay
        slope = self.share * self.q * self.half
        return slope - lam * self.left + lam * self.right * math.exp(-lam * self.a)

    def slip_at_place(self) -> float:
        """The magnitude of the slip at a: the integral of r M/EI0 - N (1/EAs + r^2/EI0) to midspan."""
        p, h, a = self.p, self.half, self.a
        area = self.q / 2 * (h * (h**2 - a**2) - (h**3 - a**3) / 3)
        return p.r / p.ei0 * area - self.n(a) * (1 / p.eas + p.r**2 / p.ei0) * (h - a)

    def deflection(self) -> float:
        """At midspan: the integral of x kappa from the end to midspan, with kappa = (M - N r)/EI0."""
        p, h, a, lam = self.p, self.half, self.a, self.p.decay
        def moment_arm(b: float) -> float:
            return self.q / 2 * (2 * h * b**3 / 3 - b**4 / 4)
        total = self.share * (moment_arm(a) - self.q / lam**2 * a**2 / 2)
        fade = math.exp(-lam * a)
        total += self.left * (1 - (1 + lam * a) * fade) / lam**2
        total += self.right * ((lam * a - 1) + fade) / lam**2
        total += self.n(a) * (h**2 - a**2) / 2
        return (moment_arm(h) - p.r * total) / p.ei0


def clearance_floor() -> Case:
    case = Case("clearance-floor", """
The slab and joist of concrete-timber with a clearance of 0.5 mm in its joint; closed form of the stretch that
carries (concrete_timber.py, own derivation). Rounded value of an independent script: w 16.6 mm.""")
    c = 0.5e-3
    p = pair("initial")
    found = Banded(p, LENGTH, Q, c)
    at = 'combinations["permanent"].initial'
    case.add(f"{at}.deflection.greatest.value_m", found.deflection(), "1e-9")
    n = found.n(LENGTH / 2)
    case.add(f'{at}.layers["joist"].axial.greatest.value_N', n, "1e-9")
    case.add(f'{at}.layers["slab"].axial.minimum.value_N', -n, "1e-9")
    flow = found.dn_at_end()
    case.add(f'{at}.joints["screws"].flow.greatest.value_N_per_m', -flow, "1e-9")
    case.add(f'{at}.joints["screws"].slip.left_m', -(flow / p.k + c), "1e-9")
    case.add('combinations["quasi-permanent"].initial.deflection.greatest.value_m', 16.6e-3, "5e-3")
    case.fields(SUPPORTS, PARTS)
    case.layered(["screws"], PARTS)
    return case
