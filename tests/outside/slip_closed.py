"""Two layers with a slipping joint on a simple span: closed forms with 60 digits.

What: the slab and joist of the timber-concrete check (600 x 70 mm, E 31 GPa, on 100 x 220 mm,
E 11 GPa, 6 m) under a uniform load, a midspan load and shrinkage of the upper layer, with the slip
modulus varied so that lambda L runs from 1e-3 to 1e4.
Source: Newmark, Siess, Viest 1951; Girhammar and Gopu 1993; the deflection along x is integrated
from kappa = (M - N r)/EI0 with w'' = -kappa, by hand; both are checked here by differentiation.
How to run: python tests/outside/slip_closed.py (needs mpmath); writes slip_closed.toml.

Signs: w down, slope dw/dx, N tension in the lower layer (the upper carries -N), slip = upper minus
lower, so slip = -N'/k: under a downward load the slip at the left end is negative.
"""

import mpmath
from mpmath import mp, mpf

import tables

SLAB = {"E_Pa": 31.0e9, "width_m": 0.6, "height_m": 0.07, "z_m": 0.035}
JOIST = {"E_Pa": 11.0e9, "width_m": 0.1, "height_m": 0.22, "z_m": -0.11}
LENGTH_M = 6.0
LOADS = {"uniform": 3000.0, "central": 10000.0, "shrinkage": 3.0e-4}


class Composite:
    """The stiffness numbers of two layers and the slip modulus k (N/m2), as mpmath numbers."""

    def __init__(self, upper, lower, k):
        ea = [mpf(p["E_Pa"]) * mpf(p["width_m"]) * mpf(p["height_m"]) for p in (upper, lower)]
        ei = [a * mpf(p["height_m"]) ** 2 / 12 for a, p in zip(ea, (upper, lower))]
        self.k = mpf(k)
        self.r = mpf(upper["z_m"]) - mpf(lower["z_m"])
        self.ei0 = ei[0] + ei[1]
        self.eas = ea[0] * ea[1] / (ea[0] + ea[1])
        self.eiinf = self.ei0 + self.eas * self.r**2
        self.decay = mpmath.sqrt(self.k * (1 / self.eas + self.r**2 / self.ei0))
        self.soft = 1 / self.ei0 - 1 / self.eiinf


def uniform(c, length, q, x):
    """(w, dw/dx, N, dN/dx, M) at x under the uniform load q."""
    a, h = c.decay, length / 2
    cosh, sinh, whole = mpmath.cosh(a * (h - x)), mpmath.sinh(a * (h - x)), mpmath.cosh(a * h)
    moment = q * x * (length - x) / 2
    w = q * x * (length**3 - 2 * length * x**2 + x**3) / (24 * c.eiinf)
    w += c.soft * q / a**2 * (x * (length - x) / 2 - (1 - cosh / whole) / a**2)
    slope = q * (length**3 - 6 * length * x**2 + 4 * x**3) / (24 * c.eiinf)
    slope += c.soft * q / a**2 * (h - x - sinh / whole / a)
    share = c.eas * c.r / c.eiinf
    n = share * (moment - q / a**2 * (1 - cosh / whole))
    dn = share * (q * (h - x) - q / a * sinh / whole)
    return w, slope, n, dn, moment


def central(c, length, p, x):
    """The same under the load p at midspan, for x up to midspan."""
    a, h = c.decay, length / 2
    sinh, cosh, whole = mpmath.sinh(a * x), mpmath.cosh(a * x), mpmath.cosh(a * h)
    moment = p * x / 2
    w = p * x * (3 * length**2 - 4 * x**2) / (48 * c.eiinf)
    w += c.soft * p / (2 * a**2) * (x - sinh / (a * whole))
    slope = p * (length**2 - 4 * x**2) / (16 * c.eiinf)
    slope += c.soft * p / (2 * a**2) * (1 - cosh / whole)
    share = c.eas * c.r / c.eiinf
    return w, slope, share * (moment - p / 2 * sinh / (a * whole)), (
        share * p / 2 * (1 - cosh / whole)
    ), moment


def shrinkage(c, length, e, x):
    """The same for the shrinkage e of the upper layer, without load."""
    a, h = c.decay, length / 2
    cosh, sinh, whole = mpmath.cosh(a * (h - x)), mpmath.sinh(a * (h - x)), mpmath.cosh(a * h)
    bend = c.eas * c.r * e / c.eiinf
    w = bend * (x * (length - x) / 2 - (1 - cosh / whole) / a**2)
    slope = bend * (h - x - sinh / whole / a)
    force = c.eas * c.ei0 / c.eiinf * e
    return w, slope, -force * (1 - cosh / whole), -force * a * sinh / whole, mpf(0)


FORMS = {"uniform": uniform, "central": central, "shrinkage": shrinkage}


def check_by_differentiation(name, c, length, load):
    """The governing equations at an inner point and the end conditions, to 25 digits."""
    form, x = FORMS[name], length * mpf("0.2137")
    w, slope, n, dn, moment = form(c, length, load, x)
    with mp.workdps(120):
        second = mpmath.diff(lambda t: form(c, length, load, t)[0], x, 2)
        first = mpmath.diff(lambda t: form(c, length, load, t)[0], x)
        n_first = mpmath.diff(lambda t: form(c, length, load, t)[2], x)
        n_second = mpmath.diff(lambda t: form(c, length, load, t)[3], x)
    small = mpf(10) ** -25
    free = -load if name == "shrinkage" else mpf(0)
    size = abs(c.decay**2 * n) + abs(c.k * c.r * moment / c.ei0) + abs(c.k * free)
    assert abs(n_second - c.decay**2 * n + c.k * c.r * moment / c.ei0 + c.k * free) < small * size
    bend = (abs(moment) + abs(n * c.r)) / c.ei0
    assert abs(second + (moment - n * c.r) / c.ei0) < small * bend
    assert abs(first - slope) < small * abs(slope)
    assert abs(n_first - dn) < small * (abs(dn) + abs(n) * c.decay)
    assert form(c, length, load, mpf(0))[0] == 0 and form(c, length, load, mpf(0))[2] == 0
    assert abs(form(c, length, load, length / 2)[1]) < small * abs(slope)


def results(c, length, load, form):
    """The numbers of one case, ready to be written."""
    end, quarter, mid = (form(c, length, load, x) for x in (mpf(0), length / 4, length / 2))
    return {
        "w_mid_m": mid[0],
        "w_quarter_m": quarter[0],
        "slope_end_rad": end[1],
        "n_lower_mid_N": mid[2],
        "n_lower_quarter_N": quarter[2],
        "slip_end_m": -end[3] / c.k,
        "slip_quarter_m": -quarter[3] / c.k,
        "dn_lower_dx_end_N_per_m": end[3],
        "dn_lower_dx_quarter_N_per_m": quarter[3],
    }


def main():
    mp.dps = 60
    length = mpf(LENGTH_M)
    unit = Composite(SLAB, JOIST, 1)
    exponents = [mpf(n) / 2 for n in range(-6, 9)]
    moduli = [float((mpf(10) ** e / length / unit.decay) ** 2) for e in exponents]
    moduli.append(400.0e6 / 3.0)  # the joint of the published example, 133.333 N/mm2
    rows = []
    for k in moduli:
        c = Composite(SLAB, JOIST, k)
        row = {"k_N_per_m2": k, "lambda_length": c.decay * length}
        for name, form in FORMS.items():
            check_by_differentiation(name, c, length, mpf(LOADS[name]))
            row[name] = results(c, length, mpf(LOADS[name]), form)
        # The same from twice the digits: what is left of the cancelling of soft joints.
        with mp.workdps(120):
            again = Composite(SLAB, JOIST, k)
            for name, form in FORMS.items():
                for key, value in results(again, mpf(LENGTH_M), mpf(LOADS[name]), form).items():
                    assert abs(value - row[name][key]) <= mpf(10) ** -40 * abs(value), (k, name, key)
        rows.append(row)
    # Limits: loose and rigid joint under the uniform load.
    sag = 5 * mpf(LOADS["uniform"]) * length**4 / 384
    assert abs(rows[0]["uniform"]["w_mid_m"] * unit.ei0 / sag - 1) < 1e-6
    assert abs(rows[14]["uniform"]["w_mid_m"] * unit.eiinf / sag - 1) < 1e-6
    # The numbers of the check this member comes from, as rounded there (mm, N, N/mm).
    known = rows[-1]
    assert abs(known["uniform"]["w_mid_m"] - 0.011139) < 5e-7
    assert abs(known["uniform"]["n_lower_mid_N"] - 62906) < 0.5
    assert abs(known["uniform"]["dn_lower_dx_end_N_per_m"] - 36270) < 5
    assert abs(known["central"]["w_mid_m"] - 0.010075) < 5e-7
    assert abs(known["shrinkage"]["w_mid_m"] - 0.006291) < 5e-7
    assert abs(known["shrinkage"]["slip_end_m"] - 0.1892e-3) < 5e-8
    tables.write(
        __file__,
        __doc__,
        {
            "length_m": LENGTH_M,
            "q_N_per_m": LOADS["uniform"],
            "central_load_N": LOADS["central"],
            "upper_shrinkage": LOADS["shrinkage"],
            "accuracy_relative": 1e-15,
            "upper": SLAB,
            "lower": JOIST,
            "case": rows,
        },
    )


if __name__ == "__main__":
    main()
