"""Rectangles whose depth varies in a straight line, with shear deformation and without slip.

What: end fixed and simple, both ends fixed, cantilever, two spans, support movement; the depth
shrinks from left to right, kGA = 5/6 G A(x).
Source: w' = theta + V/kGA, theta' = -M/EI (a fixed end holds the rotation theta at zero, not the slope
of the axis); solved by Chebyshev collocation of order 56 (reached accuracy: against order 28),
scipy.integrate.solve_bvp, and a third time by the force method: virtual work integrals with 30
digits in mpmath, for the redundant reaction and the deflection at one place.
How to run: python tests/outside/taper_shear_bvp.py (needs mpmath, numpy, scipy); writes
taper_shear_bvp.toml.

Signs: w, loads and settlements down, theta rotation (sense of dw/dx), M sagging positive, V = dM/dx,
reactions up. V at a node is the value just right of it.
"""

import mpmath
from mpmath import mp, mpf

import tables
from layered import Layer, Member

E_PA, G_PA, WIDTH_M = 11.6e9, 0.65e9, 0.14
DEPTHS_M, LENGTH_M = (0.6, 0.3), 5.0
Q, P = 4000.0, 9000.0
PIN = {"settlement_m": 0.0}
FIXED = PIN | {"rotation_rad": 0.0}


def flexibilities(x):
    """(1/EI, 1/kGA) at x."""
    h = mpf(DEPTHS_M[0]) + (mpf(DEPTHS_M[1]) - mpf(DEPTHS_M[0])) * x / mpf(LENGTH_M)
    area = mpf(WIDTH_M) * h
    return 12 / (mpf(E_PA) * area * h**2), 6 / (5 * mpf(G_PA) * area)


def work(one, other, cuts):
    """Virtual work of two states given as functions that give (M, V)."""

    def density(x):
        (m1, v1), (m2, v2) = one(x), other(x)
        bend, shear = flexibilities(x)
        return m1 * m2 * bend + v1 * v2 * shear

    return mpmath.quad(density, cuts)


def cantilever_load(x):
    """(M, V) of the cantilever fixed at the left, uniform load and a load at 2 m."""
    rest = mpf(LENGTH_M) - x
    near = mpf(2) - x
    m, v = -mpf(Q) * rest**2 / 2, mpf(Q) * rest
    return (m - P * near, v + P) if near > 0 else (m, v)


def unit_at(place):
    """(M, V) of the same cantilever under a unit load downward at `place`."""
    return lambda x: (-(place - x), mpf(1)) if x < place else (mpf(0), mpf(0))


def force_method(settlement):
    """Reaction of the propped cantilever and the deflection at 2 m."""
    with mp.workdps(30):
        end, cuts = mpf(LENGTH_M), [0, 2, mpf(LENGTH_M)]
        tip = unit_at(end)
        reaction = (work(cantilever_load, tip, cuts) - mpf(settlement)) / work(tip, tip, cuts)
        here = unit_at(mpf(2))
        w = work(cantilever_load, here, cuts) - reaction * work(tip, here, cuts)
        free = work(cantilever_load, tip, cuts)
        return float(reaction), float(w), float(free)


def cases():
    layer = Layer(E_PA, WIDTH_M, DEPTHS_M, 0.0)
    loaded = [
        {"from_m": 0.0, "to_m": 2.0, "q_N_per_m": Q},
        {"from_m": 2.0, "to_m": 5.0, "q_N_per_m": Q},
    ]
    bare = [{"from_m": 0.0, "to_m": 2.0}, {"from_m": 2.0, "to_m": 5.0}]
    held = {"x_m": 0.0, "axial_held": True}
    middle = {"x_m": 2.0, "load_N": P}
    for name, about, pieces, nodes in (
        ("fixed-simple", "deep end fixed, shallow end on a support", loaded,
         [held | FIXED, middle, {"x_m": 5.0} | PIN]),
        ("simple-fixed", "shallow end fixed, deep end on a support", loaded,
         [held | PIN, middle, {"x_m": 5.0} | FIXED]),
        ("fixed-fixed", "both ends fixed", loaded, [held | FIXED, middle, {"x_m": 5.0} | FIXED]),
        ("simple-simple", "simple span", loaded, [held | PIN, middle, {"x_m": 5.0} | PIN]),
        ("cantilever", "fixed at the deep end", loaded, [held | FIXED, middle, {"x_m": 5.0}]),
        ("two-spans", "supports at 0, 2 and 5 m, uniform load", loaded,
         [held | PIN, {"x_m": 2.0} | PIN, {"x_m": 5.0} | PIN]),
        ("settlement", "deep end fixed, shallow end settles 6 mm, no load", bare,
         [held | FIXED, {"x_m": 2.0}, {"x_m": 5.0, "settlement_m": 0.006}]),
    ):
        yield name, about, Member([layer], pieces, nodes, G_PA)


def main():
    rows, found = [], {}
    for name, about, member in cases():
        stations = sorted({LENGTH_M * n / 16 for n in range(17)} | {2.0})
        result = member.solve(stations, constant=False, order=28)
        print(name, *(f"{result[key]:.1e}" for key in result if key.endswith(("_by", "_relative"))))
        assert result["accuracy_relative"] < 1e-11, name
        found[name] = result
        rows.append({"name": name, "about": about} | member.table() | {"result": result})
    reaction, w, free = force_method(0.0)
    at_two = found["fixed-simple"]["field"]["x_m"].index(2.0)
    assert abs(found["fixed-simple"]["reaction"][1]["R_N"] / reaction - 1) < 1e-12
    assert abs(found["fixed-simple"]["field"]["w_m"][at_two] / w - 1) < 1e-12
    assert abs(found["cantilever"]["field"]["w_m"][-1] / free - 1) < 1e-12
    moved = force_method(0.006)[0] - reaction
    assert abs(found["settlement"]["reaction"][1]["R_N"] / moved - 1) < 1e-11
    tables.write(__file__, __doc__, {"E_Pa": E_PA, "G_Pa": G_PA, "case": rows})


if __name__ == "__main__":
    main()
