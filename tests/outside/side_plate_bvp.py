"""A joist with a side plate that hangs on transverse fasteners: two deflections along one span.

What: joist (94 x 220 mm, E 11 GPa) and plate (10 x 200 mm, E 210 GPa) with the same axis, so without
longitudinal flow; k_t (N/m2) times the difference of their deflections passes from one to the
other. Loads and supports act on the joist only; the plate's ends are free.
Source: two beams coupled by a Winkler layer, own derivation:
    V1' = -q + k_t (w1 - w2)      V2' = -k_t (w1 - w2)      M' = V   theta' = -M/EI   w' = theta
Matrix exponentials with 80 digits (reached accuracy: against 120 digits), compared with Chebyshev
collocation and scipy.integrate.solve_bvp.
How to run: python tests/outside/side_plate_bvp.py (needs mpmath, numpy, scipy); writes
side_plate_bvp.toml.

Signs: w, loads down, M sagging positive, V = dM/dx; the transfer is positive where the joist hands
load to the plate. V at a node is the value just right of it.
"""

import boundary_value as bv
import tables

JOIST = {"E_Pa": 11.0e9, "width_m": 0.094, "height_m": 0.22, "z_m": 0.0}
PLATE = {"E_Pa": 210.0e9, "width_m": 0.01, "height_m": 0.2, "z_m": 0.0}
LENGTH_M = 4.0
NAMES = ("w_{}_m", "theta_{}_rad", "V_{}_N", "M_{}_Nm")


def bending(part):
    return part["E_Pa"] * part["width_m"] * part["height_m"] ** 3 / 12


def build(k, q, load):
    """Pieces and conditions of the span, cut at midspan."""
    a = [[0.0] * 8 for _ in range(8)]
    for first, ei in ((0, bending(JOIST)), (4, bending(PLATE))):
        a[first][first + 1] = 1.0
        a[first + 1][first + 3] = -1.0 / ei
        a[first + 3][first + 2] = 1.0
    a[2][0], a[2][4], a[6][0], a[6][4] = k, -k, -k, k
    b = [0.0, 0.0, -q, 0.0, 0.0, 0.0, 0.0, 0.0]
    half = LENGTH_M / 2
    pieces = [(x0, x0 + half, lambda x: a, lambda x: b) for x0 in (0.0, half)]
    ends = (0, 3, 6, 7)  # w1, M1, V2, M2 vanish at both ends
    rows = [(0, {}, {s: 1.0}, 0.0) for s in ends] + [(2, {s: 1.0}, {}, 0.0) for s in ends]
    rows += [(1, {s: -1.0}, {s: 1.0}, -load if s == 2 else 0.0) for s in range(8)]
    return pieces, rows


def apart(states, other, peaks):
    return max(
        abs(a - b) / p for s, o in zip(states, other) for a, b, p in zip(s, o, peaks) if p > 1e-30
    )


def solve(k, q, load):
    pieces, rows = build(k, q, load)
    stations = [LENGTH_M * n / 32 for n in range(33)]
    states, ends = bv.exact(pieces, rows, stations)
    peaks = [max(abs(s[i]) for s in states) for i in range(8)]
    reached = apart(states, bv.exact(pieces, rows, stations, 120)[0], peaks)
    second = apart(states, bv.collocate(pieces, rows, stations, 40)[0], peaks)
    third = apart(states, bv.scipy_check(pieces, rows, stations, peaks), peaks)
    assert reached < 1e-15 and second < 1e-10 and third < 1e-6, (k, reached, second, third)
    print(f"k_t {k:.1e} q {q} P {load}: {reached:.1e} {second:.1e} {third:.1e}")
    field = {"x_m": stations}
    for strand, first in ((1, 0), (2, 4)):
        for offset, name in enumerate(NAMES):
            field[name.format(strand)] = [s[first + offset] for s in states]
    field["transfer_N_per_m"] = [k * (s[0] - s[4]) for s in states]
    # The plate hangs freely: what it is given and what it gives back add up to nothing.
    assert abs(sum(e[1][6] - e[0][6] for e in ends)) < 1e-9
    for x, s in zip(stations, states):
        whole = q * x * (LENGTH_M - x) / 2 + load * min(x, LENGTH_M - x) / 2
        assert abs(s[3] + s[7] - whole) <= 1e-12 * (abs(whole) + 1), x
    return {
        "accuracy_relative": max(reached, 1e-16),
        "collocation_differs_by": second,
        "scipy_differs_by": third,
        "end_reaction_N": ends[0][0][2],
        "w_1_mid_m": states[16][0],
        "w_2_mid_m": states[16][4],
        "field": field,
    }


def main():
    rows = []
    for k in (6.0e4, 6.0e6, 6.0e7, 6.0e8):
        for name, q, load in (("uniform", 5000.0, 0.0), ("central", 0.0, 12000.0)):
            row = {"name": f"{name}-{k:.0e}", "k_t_N_per_m2": k, "q_N_per_m": q}
            rows.append(row | {"central_load_N": load, "result": solve(k, q, load)})
    # Limits of w of the joist under the uniform load: alone, and together with the plate.
    sag = 5 * 5000.0 * LENGTH_M**4 / 384
    alone, together = bending(JOIST), bending(JOIST) + bending(PLATE)
    soft = solve(100.0, 5000.0, 0.0)["w_1_mid_m"] * alone / sag
    assert 0.999 < soft < 1.0, soft
    stiff = rows[-2]["result"]["w_1_mid_m"] * together / sag
    assert 1.0 < stiff < 1.02, stiff
    tables.write(
        __file__, __doc__, {"length_m": LENGTH_M, "joist": JOIST, "plate": PLATE, "case": rows}
    )


if __name__ == "__main__":
    main()
