"""Single beams with known formulas: hinges, springs, support movements, overhangs, steps, shear.

What: deflections, moments, reactions of common cases.
Source: formulas of the usual handbooks of beams (Roark's Formulas; AISC Manual Table 3-23) from
memory, combined by hand where a case is a sum of others; every value is checked against the
equations of `layered.py` to 1e-13, so none rests on memory alone.
How to run: python tests/outside/beams_closed.py (needs mpmath, numpy, scipy); writes
beams_closed.toml.

Signs: w, loads and settlements down, theta rotation (sense of dw/dx; a positive couple is clockwise,
with x to the right), M sagging positive, reactions up. E 12 GPa, 120 x 300 mm unless a case says
otherwise; no shear part unless a shear modulus is given (kGA = 5/6 G A).
"""

import mpmath
from mpmath import mp, mpf

import tables
from values import E_PA, EI, FIXED, HEIGHT_M, PIN, WIDTH_M, beam, case

Q, P = mpf(3000), mpf(8000)
MEMORY = "handbook formula, from memory"


def hinge():
    """Hinge at 4 m, supports at 0, 5 and 9 m: a simple span hung on an overhang."""
    span, a, hung = mpf(4), mpf(1), Q * 4 / 2
    m = -(hung * a + Q * a**2 / 2)
    right = Q * span / 2 + m / span
    w = hung * a**2 * (span + a) / 3 + Q * a**3 * (4 * span + 3 * a) / 24 - Q * span**3 * a / 24
    w /= mpf(EI)
    nodes = [(0, dict(PIN)), (4, {"hinge": True}), (5, dict(PIN)), (9, dict(PIN))]
    values = [("R_N", 0, hung), ("R_N", 5, 9 * Q - hung - right), ("R_N", 9, right)]
    values += [("M_Nm", 4, mpf(0)), ("M_Nm", 5, m), ("w_m", 4, w)]
    values += [("w_m", 2, 5 * Q * span**4 / 384 / mpf(EI) + w / 2)]
    member = beam([(0, 4, Q), (4, 5, Q), (5, 9, Q)], nodes)
    return case("hinge", MEMORY + ", parts put together", member, values)


def springs():
    length, ei = mpf(6), mpf(EI)
    k1, k2, c = mpf(400000), mpf(900000), mpf(1500000)
    spring = [{"spring_N_per_m": float(k)} for k in (k1, k2)]
    half = length / 2
    w = 5 * Q * length**4 / 384 / ei + Q * half * (1 / k1 + 1 / k2) / 2
    values = [("w_m", 0, Q * half / k1), ("w_m", 3, w), ("w_m", 6, Q * half / k2)]
    values += [("R_N", 0, Q * half), ("R_N", 6, Q * half)]
    member = beam([(0, 6, Q)], [(0, spring[0]), (6, spring[1])])
    yield case("end-springs", MEMORY, member, values)

    r = 5 * Q * length**4 / 384 / ei / (1 / k1 + length**3 / 48 / ei)
    values = [("R_N", 3, r), ("R_N", 0, (Q * length - r) / 2), ("w_m", 3, r / k1)]
    values += [("M_Nm", 3, Q * length**2 / 8 - r * length / 4)]
    nodes = [(0, dict(PIN)), (3, dict(spring[0])), (6, dict(PIN))]
    member = beam([(0, 3, Q), (3, 6, Q)], nodes)
    yield case("middle-spring", MEMORY, member, values)

    turn = {"rotation_spring_Nm_per_rad": float(c)}
    m = -(Q * length**2 / 12) / (1 + 2 * ei / (c * length))
    values = [("M_Nm", 0, m), ("M_Nm", 6, m), ("theta_rad", 0, -m / c), ("theta_rad", 6, m / c)]
    values += [("w_m", 3, 5 * Q * length**4 / 384 / ei + m * length**2 / 8 / ei)]
    member = beam([(0, 6, Q)], [(0, PIN | turn), (6, PIN | turn)])
    yield case("turning-springs", MEMORY, member, values)

    m = -(Q * length**2 / 8) / (1 + 3 * ei / (c * length))
    values = [("M_Nm", 0, m), ("R_N", 6, Q * half + m / length), ("theta_rad", 0, -m / c)]
    values += [("w_m", 3, 5 * Q * length**4 / 384 / ei + m * length**2 / 16 / ei)]
    member = beam([(0, 6, Q)], [(0, PIN | turn), (6, dict(PIN))])
    yield case("one-turning-spring", MEMORY, member, values)


def movements():
    length, ei, down, turn = mpf(6), mpf(EI), mpf(0.005), mpf(0.003)
    r = 3 * Q * length / 8 - 3 * ei * down / length**3
    m = r * length - Q * length**2 / 2
    # Uniform load 2qL^4/384EI at midspan, and 5/16 of the settlement.
    w = Q * length**4 / 192 / ei + 5 * down / 16
    values = [("R_N", 6, r), ("M_Nm", 0, m), ("w_m", 3, w), ("w_m", 6, down)]
    nodes = [(0, dict(FIXED)), (6, {"settlement_m": float(down)})]
    yield case("prop-settles", MEMORY, beam([(0, 6, Q)], nodes), values)

    values = [("M_Nm", 0, 4 * ei * turn / length), ("M_Nm", 6, -2 * ei * turn / length)]
    values += [("R_N", 0, -6 * ei * turn / length**2), ("w_m", 3, turn * length / 8)]
    values += [("w_m", 1.5, turn * mpf(1.5) * mpf(0.75) ** 2)]
    nodes = [(0, FIXED | {"rotation_rad": float(turn)}), (6, dict(FIXED))]
    yield case("fixed-end-turns", MEMORY, beam([(0, 6, 0)], nodes), values)

    m = 6 * ei * down / length**2
    values = [("M_Nm", 0, -m), ("M_Nm", 6, m), ("R_N", 0, 2 * m / length), ("w_m", 3, down / 2)]
    nodes = [(0, dict(FIXED)), (6, FIXED | {"settlement_m": float(down)})]
    yield case("fixed-end-settles", MEMORY, beam([(0, 6, 0)], nodes), values)


def overhangs():
    span, a, ei = mpf(5), mpf(2), mpf(EI)
    nodes = [(0, dict(PIN)), (5, dict(PIN)), (7, {"load_N": float(P)})]
    values = [("w_m", 7, P * a**2 * (span + a) / 3 / ei), ("M_Nm", 5, -P * a)]
    values += [("R_N", 0, -P * a / span), ("R_N", 5, P * (span + a) / span)]
    values += [("w_m", 2.5, -P * a * span**2 / 16 / ei)]
    yield case("overhang-tip-load", MEMORY, beam([(0, 5, 0), (5, 7, 0)], nodes), values)

    nodes[2] = (7, {})
    w = Q * a * (4 * a**2 * span - span**3 + 3 * a**3) / 24 / ei
    values = [("w_m", 7, w), ("M_Nm", 5, -Q * a**2 / 2)]
    values += [("R_N", 0, Q * (span**2 - a**2) / (2 * span))]
    values += [("R_N", 5, Q * (span + a) ** 2 / (2 * span))]
    w = 5 * Q * span**4 / 384 / ei - Q * a**2 / 2 * span**2 / 16 / ei
    values += [("w_m", 2.5, w)]
    yield case("overhang-uniform", MEMORY, beam([(0, 5, Q), (5, 7, Q)], nodes), values)


def classics():
    length, ei, a, b = mpf(6), mpf(EI), mpf(2), mpf(4)
    load = {"load_N": float(P)}
    cut = [(0, 2, 0), (2, 6, 0)]
    values = [("M_Nm", 0, -P * a * b**2 / length**2), ("M_Nm", 6, -P * a**2 * b / length**2)]
    values += [("R_N", 0, P * b**2 * (3 * a + b) / length**3)]
    values += [("w_m", 2, P * a**3 * b**3 / (3 * ei * length**3))]
    member = beam(cut, [(0, dict(FIXED)), (2, load), (6, dict(FIXED))])
    yield case("fixed-point-load", MEMORY, member, values)

    r = P * a**2 * (b + 2 * length) / (2 * length**3)
    w = P * a**3 * b**2 * (3 * length + b) / (12 * ei * length**3)
    values = [("R_N", 6, r), ("M_Nm", 0, r * length - P * a), ("w_m", 2, w)]
    member = beam(cut, [(0, dict(FIXED)), (2, load), (6, dict(PIN))])
    yield case("propped-point-load", MEMORY, member, values)

    couple, x = mpf(5000), mpf(1.5)
    values = [("w_m", 1.5, -couple * x * (length**2 - 4 * x**2) / (24 * ei * length))]
    values += [("w_m", 3, mpf(0)), ("R_N", 0, -couple / length), ("R_N", 6, couple / length)]
    values += [("theta_rad", 3, couple * length / 12 / ei)]
    nodes = [(0, dict(PIN)), (3, {"couple_Nm": float(couple)}), (6, dict(PIN))]
    member = beam([(0, 3, 0), (3, 6, 0)], nodes)
    yield case("couple-at-midspan", MEMORY, member, values)

    # Load on the stretch from 1 to 3 m: w at midspan by the influence line of a point load.
    w = mpmath.quad(lambda s: Q * s * (3 * length**2 - 4 * s**2) / (48 * ei), [1, 3])
    values = [("R_N", 0, Q * 2 * 4 / length), ("R_N", 6, Q * 2 * 2 / length), ("w_m", 3, w)]
    member = beam([(0, 1, 0), (1, 3, Q), (3, 6, 0)], [(0, dict(PIN)), (1, {}), (3, {}), (6, dict(PIN))])
    yield case("partial-uniform", MEMORY + ", influence line", member, values)


def stepped():
    """Simple span, depth 0.2 m outside and 0.3 m from 1.5 to 4 m; unit-load integrals."""
    length = mpf(6)
    depths = (0.2, HEIGHT_M, 0.2)
    cuts = (0.0, 1.5, 4.0, 6.0)
    stiffness = [mpf(E_PA) * mpf(WIDTH_M) * mpf(h) ** 3 / 12 for h in depths]

    def w(place):
        total, place = mpf(0), mpf(place)
        for start, end, ei in zip(cuts, cuts[1:], stiffness):
            inner = [s for s in (place, mpf(2)) if start < s < end]

            def bent(x):
                m = Q * x * (length - x) / 2 + P * min(x * 4, (length - x) * 2) / length
                return m * min(x * (length - place), (length - x) * place) / length / ei

            total += mpmath.quad(bent, sorted([mpf(start), *inner, mpf(end)]))
        return total

    nodes = [(0, dict(PIN)), (1.5, {}), (2, {"load_N": float(P)}), (4, {}), (6, dict(PIN))]
    member = beam([(0, 1.5, Q), (1.5, 2, Q), (2, 4, Q), (4, 6, Q)], nodes)
    for piece, depth in zip(member.pieces, (depths[0], depths[1], depths[1], depths[2])):
        piece["height_m"] = [depth]
    values = [("w_m", x, w(x)) for x in (1.5, 2, 3, 4, 5)]
    values += [("R_N", 0, Q * length / 2 + P * 4 / length)]
    return case("stepped", "unit-load integrals by hand and quadrature", member, values)


def shear():
    length, ei, g = mpf(6), mpf(EI), mpf(0.7e9)
    kga = 5 * g * mpf(WIDTH_M) * mpf(HEIGHT_M) / 6
    phi = 12 * ei / (kga * length**2)
    r = 3 * Q * length / 8 * (1 + phi / 3) / (1 + phi / 4)
    values = [("R_N", 6, r), ("M_Nm", 0, r * length - Q * length**2 / 2)]
    member = beam([(0, 6, Q)], [(0, dict(FIXED)), (6, dict(PIN))], None, float(g))
    yield case("shear-propped", "Timoshenko, force method by hand", member, values)

    values = [("M_Nm", 0, -Q * length**2 / 12), ("M_Nm", 3, Q * length**2 / 24)]
    values += [("w_m", 3, Q * length**4 / 384 / ei + Q * length**2 / 8 / kga)]
    member = beam([(0, 6, Q)], [(0, dict(FIXED)), (6, dict(FIXED))], None, float(g))
    yield case("shear-fixed-uniform", "Timoshenko, by hand", member, values)

    a, b = mpf(2), mpf(4)
    m_a = -P * a * b**2 / length**2 * (1 + phi * length / (2 * b)) / (1 + phi)
    m_b = -P * a**2 * b / length**2 * (1 + phi * length / (2 * a)) / (1 + phi)
    values = [("M_Nm", 0, m_a), ("M_Nm", 6, m_b), ("R_N", 0, P * b / length + (m_b - m_a) / length)]
    nodes = [(0, dict(FIXED)), (2, {"load_N": float(P)}), (6, dict(FIXED))]
    member = beam([(0, 2, 0), (2, 6, 0)], nodes, None, float(g))
    yield case("shear-fixed-point-load", "Timoshenko, by hand", member, values)

    values = [("w_m", 3, 5 * Q * length**4 / 384 / ei + Q * length**2 / 8 / kga)]
    values += [("theta_rad", 0, Q * length**3 / 24 / ei)]
    member = beam([(0, 6, Q)], [(0, dict(PIN)), (6, dict(PIN))], None, float(g))
    yield case("shear-simple-uniform", "Timoshenko, by hand", member, values)


def main():
    mp.dps = 40
    rows = [hinge(), *springs(), *movements(), *overhangs(), *classics(), stepped(), *shear()]
    tables.write(__file__, __doc__, {"EI_Nm2": EI, "case": rows})


if __name__ == "__main__":
    main()
