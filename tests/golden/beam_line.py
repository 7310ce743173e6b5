"""Deflection lines of beams on two supports, in exact fractions, without beamcore.

The line is that of a cantilever clamped at x = 0 under all loads and reactions (whose clamp then
carries nothing), moved and turned so that it is zero at both supports. Between the places where
loads begin, end or stand it is a polynomial of degree five at most, found by exact interpolation.
"""

from fractions import Fraction as F


def point(p: F, a: F, x: F) -> F:
    """EI w at x of a cantilever under a force p down at a."""
    return p * x**2 * (3 * a - x) / 6 if x <= a else p * a**2 * (3 * x - a) / 6


def couple(c: F, a: F, x: F) -> F:
    """EI w at x of a cantilever under a clockwise couple c at a."""
    return c * x**2 / 2 if x <= a else c * a**2 / 2 + c * a * (x - a)


def power(n: int, low: F, high: F) -> F:
    """Integral of s^n from low to high."""
    return (high ** (n + 1) - low ** (n + 1)) / (n + 1)


def stretch(q_a: F, q_b: F, a: F, b: F, x: F) -> F:
    """EI w at x of a cantilever under a line load from q_a at a to q_b at b."""
    slope = (q_b - q_a) / (b - a)
    base = q_a - slope * a
    middle = min(max(x, a), b)
    total = F(0)
    for factor, n in [(base, 0), (slope, 1)]:
        # Forces right of x, then forces left of x, both as integrals of `point`.
        total += factor * x**2 * (3 * power(n + 1, middle, b) - x * power(n, middle, b)) / 6
        total += factor * (3 * x * power(n + 2, a, middle) - power(n + 3, a, middle)) / 6
    return total


class Loads:
    """Forces (p, a), couples (c, a) and line loads (q_a, q_b, a, b), times a factor."""

    def __init__(self, forces=(), couples=(), lines=()) -> None:
        self.forces, self.couples, self.lines = list(forces), list(couples), list(lines)

    def cantilever(self, x: F) -> F:
        return (sum((point(p, a, x) for p, a in self.forces), F(0))
                + sum((couple(c, a, x) for c, a in self.couples), F(0))
                + sum((stretch(*line, x) for line in self.lines), F(0)))

    def moment_about(self, place: F) -> F:
        """Clockwise moment of all loads about a place."""
        total = sum((p * (a - place) for p, a in self.forces), F(0))
        total += sum((c for c, _ in self.couples), F(0))
        for q_a, q_b, a, b in self.lines:
            third = (b - a) / 3
            total += q_a * 3 * third / 2 * (a + third - place)
            total += q_b * 3 * third / 2 * (a + 2 * third - place)
        return total

    def force(self) -> F:
        return sum((p for p, _ in self.forces), F(0)) + sum(
            ((q_a + q_b) / 2 * (b - a) for q_a, q_b, a, b in self.lines), F(0))

    def places(self) -> list[F]:
        return ([a for _, a in self.forces] + [a for _, a in self.couples]
                + [end for line in self.lines for end in line[2:]])


class Line:
    """EI w(x), the reactions and the moment of a beam on two supports."""

    def __init__(self, loads: Loads, length: F, left: F, right: F) -> None:
        self.right = loads.moment_about(left) / (right - left)
        self.left = loads.force() - self.right
        whole = Loads(loads.forces + [(-self.left, left), (-self.right, right)], loads.couples, loads.lines)
        at_left, at_right = whole.cantilever(left), whole.cantilever(right)
        turn = (at_right - at_left) / (right - left)
        self.loads = whole
        cuts = sorted({F(0), length, left, right, *whole.places()})
        self.pieces = [(a, b, polynomial(lambda x: whole.cantilever(x) - at_left - turn * (x - left), a, b))
                       for a, b in zip(cuts, cuts[1:])]


def polynomial(function, a: F, b: F) -> list[F]:
    """Coefficients in t = (x - a)/(b - a) of the polynomial of degree five through six points."""
    nodes = [F(i, 5) for i in range(6)]
    table = [function(a + (b - a) * t) for t in nodes]
    for order in range(1, 6):
        for i in range(5, order - 1, -1):
            table[i] = (table[i] - table[i - 1]) / (nodes[i] - nodes[i - order])
    c = [F(0)] * 6
    for i in range(5, -1, -1):
        c = [table[i] - nodes[i] * c[0]] + [c[k - 1] - nodes[i] * c[k] for k in range(1, 6)]
    return c


def combined(lines: list[tuple[F, Line]]) -> list[tuple[F, F, list[F]]]:
    """The weighted sum of several lines, over all their places."""
    cuts = sorted({end for _, line in lines for a, b, _ in line.pieces for end in (a, b)})

    def value(x: F, a: F) -> F:
        return sum((factor * at(line.pieces, x, a) for factor, line in lines), F(0))

    return [(a, b, polynomial(lambda x, a=a: value(x, a), a, b)) for a, b in zip(cuts, cuts[1:])]


def at(pieces, x: F, inside: F) -> F:
    """The value at x of the polynomial that holds right of `inside`."""
    for a, b, c in pieces:
        if a <= inside < b:
            t = (x - a) / (b - a)
            return sum((term * t**i for i, term in enumerate(c)), F(0))
    raise ValueError(inside)


def value_at(pieces, x: F) -> F:
    """The value at x."""
    last = pieces[-1][1]
    return at(pieces, x, x if x < last else pieces[-1][0])


def greatest(pieces, low: F | None = None, high: F | None = None) -> tuple[float, float]:
    """Value and place of greatest magnitude, from the roots of the derivative in each piece."""
    best = (0.0, 0.0)
    for a, b, c in pieces:
        if (low is not None and a < low) or (high is not None and b > high):
            continue
        derivative = [k * c[k] for k in range(1, 6)]
        for t in [F(0), *roots(derivative), F(1)]:
            value = float(sum((term * t**i for i, term in enumerate(c)), F(0)))
            if abs(value) > abs(best[0]) * (1 + 1e-13):
                best = (value, float(a + (b - a) * t))
    return best


def roots(c: list[F], parts: int = 64) -> list[F]:
    """Sign changes on (0, 1), bracketed on a grid and halved in exact fractions."""
    def value(t: F) -> F:
        return sum((term * t**i for i, term in enumerate(c)), F(0))

    found = []
    for i in range(parts):
        low, high = F(i, parts), F(i + 1, parts)
        if value(low) == 0 and 0 < i:
            found.append(low)
        elif value(low) * value(high) < 0:
            sign = value(low) > 0
            for _ in range(60):
                middle = (low + high) / 2
                if (value(middle) > 0) == sign:
                    low = middle
                else:
                    high = middle
            found.append(low)
    return found
