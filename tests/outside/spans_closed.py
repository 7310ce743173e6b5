"""Continuous beams of two to five unequal spans by the three-moment equation, and a lifting support.

What: support moments, reactions and midspan deflections with uniform loads on some spans.
Source: three-moment equation of Clapeyron,
    M_(i-1) L_i + 2 M_i (L_i + L_(i+1)) + M_(i+1) L_(i+1) = -(q_i L_i^3 + q_(i+1) L_(i+1)^3)/4,
solved in exact fractions; midspan deflection 5 q L^4/384EI + (M_left + M_right) L^2/16EI.
The lifting support by superposition of a simple span and a straight overhang. Every value is
checked against the equations of `layered.py`.
How to run: python tests/outside/spans_closed.py (needs mpmath, numpy, scipy); writes
spans_closed.toml.

Signs: w and loads down, M sagging positive, reactions up. E 12 GPa, 120 x 300 mm, no shear part.
"""

from fractions import Fraction

import tables
from values import EI, PIN, beam, case

BEAMS = {
    "two-spans": (((4, 5), 0), ((6, 1), 3)),
    "two-equal-spans": (((5, 1), 2), ((5, 1), 2)),
    "three-spans": (((4, 1), 3), ((6, 1), 0), ((5, 1), 2)),
    "three-spans-middle": (((3, 1), 0), ((7, 1), 4), ((4, 1), 0)),
    "four-spans": (((7, 2), 3), ((5, 1), 1), ((9, 2), 0), ((6, 1), 2)),
    "five-spans": (((4, 1), 2), ((5, 1), 0), ((3, 1), 4), ((6, 1), 1), ((9, 2), 3)),
}


def support_moments(lengths, loads):
    """Moments at all supports (zero at the ends), by elimination in fractions."""
    count = len(lengths) - 1
    rows = []
    for i in range(count):
        row = [Fraction(0)] * (count + 1)
        row[i] = 2 * (lengths[i] + lengths[i + 1])
        if i > 0:
            row[i - 1] = lengths[i]
        if i < count - 1:
            row[i + 1] = lengths[i + 1]
        row[count] = -(loads[i] * lengths[i] ** 3 + loads[i + 1] * lengths[i + 1] ** 3) / 4
        rows.append(row)
    for i in range(count):
        for j in range(i + 1, count):
            factor = rows[j][i] / rows[i][i]
            rows[j] = [a - factor * b for a, b in zip(rows[j], rows[i])]
    inner = [Fraction(0)] * count
    for i in reversed(range(count)):
        rest = sum(rows[i][j] * inner[j] for j in range(i + 1, count))
        inner[i] = (rows[i][count] - rest) / rows[i][i]
    return [Fraction(0)] + inner + [Fraction(0)]


def continuous(name, spans):
    lengths = [Fraction(*length) for length, _ in spans]
    loads = [Fraction(1000 * q) for _, q in spans]
    moments = support_moments(lengths, loads)
    supports = [sum(lengths[:i], Fraction(0)) for i in range(len(lengths) + 1)]
    reactions = [Fraction(0)] * len(supports)
    values = []
    stiffness = Fraction(EI)
    for i, (length, q) in enumerate(zip(lengths, loads)):
        step = (moments[i + 1] - moments[i]) / length
        reactions[i] += q * length / 2 + step
        reactions[i + 1] += q * length / 2 - step
        w = 5 * q * length**4 / 384 + (moments[i] + moments[i + 1]) * length**2 / 16
        values.append(("w_m", supports[i] + length / 2, w / stiffness))
    assert sum(reactions) == sum(q * length for q, length in zip(loads, lengths))
    values += [("M_Nm", x, m) for x, m in zip(supports, moments)]
    values += [("R_N", x, r) for x, r in zip(supports, reactions)]
    member = beam(
        [(a, b, q) for a, b, q in zip(supports, supports[1:], loads)],
        [(x, dict(PIN)) for x in supports],
    )
    return case(name, "three-moment equation, exact fractions", member, values)


def lifting():
    """Supports at 0, 4, 8 m, the last one takes pressure only; loads on the two spans given."""
    length, stiffness = Fraction(4), Fraction(EI)
    rows = []
    for name, q1, q2 in (("last-support-lifts", 3000, 0), ("last-support-holds", 3000, 1000)):
        if_held = Fraction(7 * q2 - q1, 16) * length
        if if_held < 0:
            # Nothing holds the second span, which is without load: it stays straight.
            slope = -Fraction(q1) * length**3 / 24 / stiffness
            values = [
                ("w_m", 2, 5 * Fraction(q1) * length**4 / 384 / stiffness),
                ("w_m", 6, slope * 2),
                ("w_m", 8, slope * 4),
                ("M_Nm", 4, Fraction(0)),
                ("R_N", 0, Fraction(q1) * length / 2),
                ("R_N", 4, Fraction(q1) * length / 2),
            ]
            last = {}
        else:
            values = [
                ("M_Nm", 4, -Fraction(q1 + q2) * length**2 / 16),
                ("R_N", 0, Fraction(7 * q1 - q2, 16) * length),
                ("R_N", 4, Fraction(5 * (q1 + q2), 8) * length),
                ("R_N", 8, if_held),
                ("w_m", 8, Fraction(0)),
            ]
            last = dict(PIN)
        member = beam([(0, 4, q1), (4, 8, q2)], [(0, dict(PIN)), (4, dict(PIN)), (8, last)])
        row = case(name, "superposition by hand", member, values)
        row["node"][2]["pressure_only"] = True
        row["R_if_held_both_ways_N"] = if_held
        row["lifts"] = if_held < 0
        rows.append(row)
    return rows


def main():
    rows = [continuous(name, spans) for name, spans in BEAMS.items()]
    tables.write(__file__, __doc__, {"EI_Nm2": EI, "case": rows + lifting()})


if __name__ == "__main__":
    main()
