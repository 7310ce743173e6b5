"""Curvature without load: warmed strips, prestress, eccentric end forces, held ends.

What: two- and three-strip curvature and stresses, parabolic and draped prestress on one and two
spans, eccentric end forces, uniform warming of a member that cannot lengthen.
Source: Timoshenko 1925, J. Opt. Soc. Am. 11, 233 (two strips); layer forces and compatibility of
strains, by hand (three strips); load balancing: equivalent load 8 P e/L^2, from memory; the prestress
and end-force cases are checked against the equations of `layered.py`, the strips by a second route
(plane strain of the whole section in exact fractions).
How to run: python tests/outside/strain_closed.py (needs mpmath, numpy, scipy); writes
strain_closed.toml.

Signs: strain eps = eps0 - kappa z with z up from the bottom of the strips, kappa and M sagging
positive, w down, tension positive. Eccentricity e is positive below the centroid; the prestressing
force P is a positive number that compresses. M is what the section carries, tendon effect included.
The pieces and nodes of a prestress case are the balancing loads and end thrusts it was checked with;
its values are those of the member with the tendon inside, so that reactions are the secondary ones.
"""

from fractions import Fraction as F

import mpmath
from mpmath import mp, mpf

import tables
from values import E_PA, EI, HEIGHT_M, PIN, WIDTH_M, beam, case

# name: (E GPa, alpha 1e-6/K, height mm) from the bottom upwards, width, warming
STRIPS = {
    "steel-over-aluminium": (((70, 23, 2), (210, 12, 1)), F(1, 100), F(80)),
    "equal-strips": (((200, 10, 3), (200, 15, 3)), F(1, 50), F(40)),
    "copper-timber": (((110, 17, 2), (11, 5, 45)), F(1, 20), F(-25)),
    "three-strips": (((70, 23, 2), (3, 60, 5), (210, 12, 1)), F(1, 100), F(50)),
    "three-strips-balanced": (((70, 23, 2), (10, 5, 20), (70, 23, 2)), F(1, 10), F(30)),
}


def plane_strain(strips, width, warming):
    """(eps0, kappa) of the whole free section in fractions: N = 0 and M = 0 with one plane."""
    ea, es, ei, n, m, bottom = F(0), F(0), F(0), F(0), F(0), F(0)
    for e, alpha, height in strips:
        e, free, h = F(e) * 10**9, F(alpha, 10**6) * warming, F(height, 1000)
        z = bottom + h / 2
        a = e * width * h
        ea, es, ei = ea + a, es + a * z, ei + a * (h * h / 12 + z * z)
        n, m, bottom = n + a * free, m + a * z * free, bottom + h
    # EA eps0 - ES kappa = n, ES eps0 - EI kappa = m
    det = ea * ei - es * es
    return (n * ei - m * es) / det, (n * es - m * ea) / det


def layer_forces(strips, width, warming):
    """(kappa, axial forces) by compatibility at each interface and equilibrium of the strips."""
    count, bottom, rows = len(strips), mpf(0), []
    for e, alpha, height in strips:
        e, h = mpf(e) * 10**9, mpf(height) / 1000
        area = e * mpf(width.numerator) / width.denominator * h
        free = mpf(alpha) / 10**6 * mpf(warming.numerator) / warming.denominator
        rows.append((area, area * h * h / 12, free, h, bottom + h / 2))
        bottom += h
    left, right = mpmath.zeros(count + 1), mpmath.zeros(count + 1, 1)
    for i in range(count - 1):
        (a1, _, f1, h1, _), (a2, _, f2, h2, _) = rows[i], rows[i + 1]
        left[i, i], left[i, i + 1] = 1 / a1, -1 / a2
        left[i, count] = -(h1 + h2) / 2
        right[i] = f2 - f1
    for i, (_, ei, _, _, z) in enumerate(rows):
        left[count - 1, i] = mpf(1)
        left[count, i] = -z
        left[count, count] += ei
    # The unknown curvature is much smaller than the forces: solve as it is, digits are plenty.
    answer = mpmath.lu_solve(left, right)
    return answer[count], [answer[i] for i in range(count)]


def timoshenko(strips, warming):
    (e2, a2, t2), (e1, a1, t1) = strips  # 1 is the upper strip
    m, n, h = F(t1, t2), F(e1, e2), F(t1 + t2, 1000)
    top = 6 * F(a2 - a1, 10**6) * warming * (1 + m) ** 2
    return top / (h * (3 * (1 + m) ** 2 + (1 + m * n) * (m * m + 1 / (m * n))))


def strips_case(name, strips, width, warming):
    eps0, kappa = plane_strain(strips, width, warming)
    other, forces = layer_forces(strips, width, warming)
    size = abs(F(strips[0][1], 10**6) * warming / F(strips[0][2], 1000))
    number = mpf(kappa.numerator) / kappa.denominator
    assert abs(number - other) < mpf(10) ** -30 * (mpf(size.numerator) / size.denominator), name
    if len(strips) == 2:
        assert timoshenko(strips, warming) == kappa, name
    rows, bottom = [], F(0)
    for (e, alpha, height), force in zip(strips, forces):
        h, free, e = F(height, 1000), F(alpha, 10**6) * warming, F(e) * 10**9
        stress = [e * (eps0 - kappa * z - free) for z in (bottom, bottom + h)]
        rows.append(
            {
                "E_Pa": e,
                "alpha_per_K": F(alpha, 10**6),
                "width_m": width,
                "height_m": h,
                "z_m": bottom + h / 2,
                "N_N": force,
                "stress_bottom_Pa": stress[0],
                "stress_top_Pa": stress[1],
            }
        )
        assert abs(mpf(float(sum(stress) / 2 * width * h)) - force) <= 1e-13 * abs(force) + 1e-15
        bottom += h
    return {"name": name, "warming_K": warming, "eps0": eps0, "kappa_per_m": kappa, "strip": rows}


def prestress():
    length, ei, force, e = mpf(6), mpf(EI), mpf(150000), mpf(0.1)
    up = 8 * force * e / length**2
    inputs = {"force_N": force, "eccentricity_m": e}
    # The tendon's force is put on as an end thrust at the centroid and its balancing load.
    left, right = {"axial_N": [float(force)]}, {"axial_N": [-float(force)]}

    w = [-5 * force * e * length**2 / (48 * ei), -up * mpf(1.5) * 4.5 * (36 + 9 - 2.25) / (24 * ei)]
    values = [("w_m", 3, w[0]), ("w_m", 1.5, w[1]), ("M_Nm", 3, -force * e), ("R_N", 0, mpf(0))]
    values += [("M_Nm", 1.5, -force * e * 3 / 4)]
    member = beam([(0, 6, -up)], [(0, PIN | left), (6, PIN | right)])
    # The balancing load hangs on the tendon's ends, which the reactions of the model contain.
    model = [v if v[0] != "R_N" else ("R_N", 0, -up * length / 2) for v in values]
    row = case("parabolic-simple", "load balancing, from memory", member, model)
    yield row | inputs | external(values, "parabola, zero at the supports, e at midspan")

    point = 4 * force * e / length
    values = [("w_m", 3, -force * e * length**2 / (12 * ei)), ("M_Nm", 3, -force * e)]
    values += [("M_Nm", 1.5, -force * e / 2), ("R_N", 0, mpf(0))]
    model = [v if v[0] != "R_N" else ("R_N", 0, -point / 2) for v in values]
    nodes = [(0, PIN | left), (3, {"load_N": -float(point)}), (6, PIN | right)]
    row = case("draped-simple", "load balancing, from memory", beam([(0, 3, 0), (3, 6, 0)], nodes), model)
    yield row | inputs | external(values, "two straight lines, zero at the supports, e at midspan")

    # Two equal spans, a parabola in each: M over the middle support is all secondary.
    second = force * e / length
    values = [("M_Nm", 6, force * e), ("M_Nm", 3, -force * e / 2)]
    values += [("w_m", 3, -2 * up * length**4 / (384 * ei))]
    values += [("R_N", 0, second), ("R_N", 6, -2 * second), ("R_N", 12, second)]
    model = [v for v in values if v[0] != "R_N"]
    model += [("R_N", 0, second - up * length / 2), ("R_N", 6, -2 * second - up * length)]
    nodes = [(0, PIN | left), (6, dict(PIN)), (12, PIN | right)]
    member = beam([(0, 6, -up), (6, 12, -up)], nodes)
    row = case("parabolic-two-spans", "load balancing, from memory", member, model)
    about = "a parabola in each span, zero at all supports, e at each midspan"
    yield row | inputs | external(values, about)


def external(values, tendon):
    """The values as the member shows them: reactions without the tendon's own end forces."""
    rows = [{"quantity": q, "x_m": float(x), "value": v} for q, x, v in values]
    return {"tendon": tendon, "value": rows}


def end_forces():
    length, ei, force, e = mpf(6), mpf(EI), mpf(80000), mpf(0.06)
    for name, sign in (("eccentric-thrust", 1), ("eccentric-pull", -1)):
        p = sign * force
        values = [("w_m", 3, -p * e * length**2 / 8 / ei), ("M_Nm", 3, -p * e)]
        values += [("theta_rad", 0, -p * e * length / 2 / ei), ("R_N", 0, mpf(0))]
        left = {"axial_N": [float(p)], "couple_Nm": -float(p * e)}
        right = {"axial_N": [-float(p)], "couple_Nm": float(p * e)}
        member = beam([(0, 6, 0)], [(0, PIN | left), (6, PIN | right)])
        row = case(name, "constant moment, by hand", member, values)
        yield row | {"thrust_N": p, "eccentricity_m": e}


def held_ends():
    """Uniform warming of one rectangle between two pins at the height z_pin from the centroid."""
    alpha, warming, length = mpf(5e-6), mpf(30), mpf(6)
    ea = mpf(E_PA) * mpf(WIDTH_M) * mpf(HEIGHT_M)
    for name, z in (("held-at-centroid", mpf(0)), ("held-at-bottom", -mpf(HEIGHT_M) / 2)):
        # The pins' distance stays: alpha dT + N/EA - kappa z = 0 with kappa = -N z/EI.
        n = -alpha * warming / (1 / ea + z**2 / mpf(EI))
        assert z == 0 or abs(n / (-ea * alpha * warming / 4) - 1) < 1e-12
        kappa = -n * z / mpf(EI)
        yield {
            "name": name,
            "E_Pa": E_PA,
            "width_m": WIDTH_M,
            "height_m": HEIGHT_M,
            "length_m": length,
            "alpha_per_K": alpha,
            "warming_K": warming,
            "z_pin_m": z,
            "N_N": n,
            "M_about_centroid_Nm": -n * z,
            "w_mid_m": kappa * length**2 / 8,
        }


def main():
    mp.dps = 50
    strips = [strips_case(name, *given) for name, given in STRIPS.items()]
    assert abs(float(strips[0]["kappa_per_m"]) - 0.43797) < 5e-6  # 4.3797e-4 per mm is known
    tables.write(
        __file__,
        __doc__,
        {
            "EI_Nm2": EI,
            "strips": strips,
            "prestress": list(prestress()),
            "end_force": list(end_forces()),
            "held": list(held_ends()),
        },
    )


if __name__ == "__main__":
    main()
