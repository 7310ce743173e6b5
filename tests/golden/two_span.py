"""The golden case two-span by the force method, in exact fractions.

The beam is released to a cantilever fixed at the wall; the two rollers are the redundant forces,
found from zero deflection at both (e.g. Gere and Goodno, Mechanics of Materials, statically
indeterminate beams, from memory). No equation of it is shared with beamcore's solver.
"""

from fractions import Fraction as F

from write_expect import Case, Sums, mm

LENGTH, POST, END = F(15, 2), F(16, 5), F(69, 10)
GRAVITY = F("9.80665")


def point(p: F, a: F, x: F) -> F:
    """EI w of a cantilever at x under a force p at a."""
    return p * x**2 * (3 * a - x) / 6 if x <= a else p * a**2 * (3 * x - a) / 6


def stretch(q: F, a: F, b: F, x: F) -> F:
    """EI w of a cantilever at x under a line load q from a to b: the integral of `point`."""
    total = F(0)
    left, right = min(max(x, a), b), b
    # Forces right of x.
    total += q * x**2 * (3 * (right**2 - left**2) / 2 - x * (right - left)) / 6
    # Forces left of x.
    low, high = a, min(max(x, a), b)
    total += q * ((high**3 - low**3) * x - (high**4 - low**4) / 4) / 6
    return total


class Loads:
    """Forces (p, a) and line loads (q, a, b)."""

    def __init__(self, forces: list[tuple[F, F]], lines: list[tuple[F, F, F]]) -> None:
        self.forces, self.lines = forces, lines

    def deflection(self, x: F) -> F:
        return sum((point(p, a, x) for p, a in self.forces), F(0)) + sum(
            (stretch(q, a, b, x) for q, a, b in self.lines), F(0))

    def force(self) -> F:
        return sum((p for p, _ in self.forces), F(0)) + sum((q * (b - a) for q, a, b in self.lines), F(0))

    def moment_at_wall(self) -> F:
        return -sum((p * a for p, a in self.forces), F(0)) - sum(
            (q * (b - a) * (a + b) / 2 for q, a, b in self.lines), F(0))


class Solved:
    """EI w, reactions and the couple at the wall."""

    def __init__(self, loads: Loads) -> None:
        w1, w2 = loads.deflection(POST), loads.deflection(END)
        f11, f12, f22 = point(F(1), POST, POST), point(F(1), END, POST), point(F(1), END, END)
        det = f11 * f22 - f12 * f12
        self.post = (w1 * f22 - w2 * f12) / det
        self.end = (w2 * f11 - w1 * f12) / det
        self.loads = Loads(loads.forces + [(-self.post, POST), (-self.end, END)], loads.lines)
        self.wall = loads.force() - self.post - self.end
        self.couple = self.loads.moment_at_wall()

    def deflection(self, x: F) -> F:
        return self.loads.deflection(x)


def greatest(deflection, steps: int = 4000) -> tuple[float, float]:
    """Greatest magnitude over a fine grid, refined by thirds around the best point."""
    grid = [LENGTH * i / steps for i in range(steps + 1)]
    best = max(grid, key=lambda x: abs(deflection(x)))
    if best in (0, LENGTH):
        return float(best), float(deflection(best))
    low, high = best - LENGTH / steps, best + LENGTH / steps
    for _ in range(60):
        a, b = low + (high - low) / 3, high - (high - low) / 3
        a, b = a.limit_denominator(10**15), b.limit_denominator(10**15)
        if abs(deflection(a)) < abs(deflection(b)):
            low = a
        else:
            high = b
    return float(low), float(deflection(low))


def two_span() -> Case:
    case = Case("two-span", """
Force method on a cantilever with two redundant forces, exact fractions (two_span.py).""")
    parts = {"beam": (F(9_500_000_000), mm(120), mm(240), F(0), F(690), F(8, 5)),
             "strip": (F(100_000_000_000), mm(100), mm(6), mm(-123), F(8500), F(1))}
    sums = {}
    for time in ["initial", "final"]:
        sums[time] = Sums([(e / (soft if time == "final" else 1), b, h, z)
                           for e, b, h, z, _, soft in parts.values()])
        case.exact(f"section.{time}.bending_stiffness_yy_Nm2", sums[time].ei)
        case.exact(f"section.{time}.axial_stiffness_N", sums[time].ea)
        case.exact(f"section.{time}.centroid_z_m", sums[time].z)
    weight = sum((rho * b * h for _, b, h, _, rho, _ in parts.values()), F(0)) * GRAVITY
    own = Solved(Loads([], [(weight, F(0), LENGTH)]))
    partition = Solved(Loads([(F(3500), LENGTH)], [(F(2400), F(11, 10), F(53, 10))]))
    store = Solved(Loads([(F(4200), F(8, 5))], [(F(3100), F(0), LENGTH)]))
    solved = [own, partition, store]
    lasting = [F(1), F(1), F(4, 5)]
    factors = {"permanent": [F(1), F(1), F(0)], "quasi-permanent": lasting,
               "characteristic": [F(1), F(1), F(1)],
               "fundamental": [F("1.35"), F("1.35"), F("1.5")]}
    for combination, row in factors.items():
        def total(name: str) -> F:
            return sum((f * getattr(s, name) for f, s in zip(row, solved)), F(0))

        peak = max(abs(total(name)) for name in ["wall", "post", "end"])
        for time in ["initial", "final"]:
            at = f'combinations["{combination}"].{time}'
            for name in ["wall", "post", "end"]:
                case.exact(f'{at}.reactions["{name}"].force_N', total(name), peak)
            case.exact(f'{at}.reactions["wall"].couple_Nm', total("couple"))
            slow = [min(f, l) if time == "final" else F(0) for f, l in zip(row, lasting)]

            def deflection(x: F, row=row, slow=slow) -> F:
                return sum(((f - s) / sums["initial"].ei + s / sums["final"].ei) * one.deflection(x)
                           for f, s, one in zip(row, slow, solved))

            place, value = greatest(deflection)
            case.exact(f"{at}.deflection.greatest.value_m", value)
            case.exact(f"{at}.deflection.greatest.at_m", place, LENGTH)
    case.fields(["wall", "post", "end"], list(parts))
    return case
