"""Two layers whose fasteners have clearance in their holes: a dead band of the joint.

What: the slab and joist of `slip_closed.py` under a uniform load with clearances 0 to 1 mm: the
joint carries nothing while |slip| < c, and k (|slip| - c) against the slip beyond.
Source: equations of Newmark, Siess, Viest 1951 with the dead band put in, own derivation. By
symmetry |slip| falls from the end to zero at midspan, so a stretch about midspan carries no flow:
    ends, x < a:      N'' - lambda^2 N = -k r M/EI0, N(0) = 0, N'(a) = 0, flow = N' = k (|slip| - c)
    middle:           N = N(a), |slip|' = N (1/EAs + r^2/EI0) - r M/EI0
and a follows from |slip| = c at a and 0 at midspan. 50 digits, checked against 80.
How to run: python tests/outside/slip_gap_closed.py (needs mpmath, scipy); writes slip_gap_closed.toml.

Signs: as in `slip_closed.py`; slip = upper minus lower, negative in the left half.
"""

import mpmath
import numpy as np
from mpmath import mp, mpf
from scipy.integrate import solve_bvp

import slip_closed
import tables

K = 400.0e6 / 3.0
Q = 3000.0
CLEARANCES = (0.0, 0.00025, 0.0005, 0.001, 0.002)


class Gap:
    """The solution for one clearance c (m)."""

    def __init__(self, clearance):
        self.c = slip_closed.Composite(slip_closed.SLAB, slip_closed.JOIST, K)
        self.half = mpf(slip_closed.LENGTH_M) / 2
        self.gap = mpf(clearance)
        # |slip|' = give N - pull M
        self.give = 1 / self.c.eas + self.c.r**2 / self.c.ei0
        self.pull = self.c.r / self.c.ei0
        free = self.pull * Q * self.half**3 / 3
        if self.gap >= free:
            raise ValueError(f"clearance {clearance} is never used up; it must be below {free} m")
        if self.gap == 0:
            self.edge = self.half
        else:
            self.edge = mpmath.findroot(
                self._rest, (self.half / 1000, self.half * 999 / 1000), solver="anderson", tol=1e-80
            )

    def moment(self, x):
        return mpf(Q) * x * (2 * self.half - x) / 2

    def _homogeneous(self, edge):
        """Factors of sinh and cosh in N, so that N(0) = 0 and N'(edge) = 0."""
        a, ratio = self.c.decay, self.pull / self.give
        cosh = ratio * mpf(Q) / a**2
        slope = ratio * mpf(Q) * (self.half - edge)
        sinh = -(slope / a + cosh * mpmath.sinh(a * edge)) / mpmath.cosh(a * edge)
        return sinh, cosh

    def force(self, x, edge=None):
        """(N, N') of the lower layer in the left half."""
        edge = self.edge if edge is None else edge
        if x > edge:
            return self.force(edge, edge)[0], mpf(0)
        a, ratio = self.c.decay, self.pull / self.give
        sinh, cosh = self._homogeneous(edge)
        n = ratio * (self.moment(x) - mpf(Q) / a**2)
        n += sinh * mpmath.sinh(a * x) + cosh * mpmath.cosh(a * x)
        dn = ratio * mpf(Q) * (self.half - x)
        dn += a * (sinh * mpmath.cosh(a * x) + cosh * mpmath.sinh(a * x))
        return n, dn

    def _middle_slip(self, x, n):
        """|slip| at x in the middle stretch, from its rate and |slip| = 0 at midspan."""
        area = mpf(Q) * (self.half**3 / 3 - (self.half * x**2 / 2 - x**3 / 6))
        return self.pull * area - self.give * n * (self.half - x)

    def _rest(self, edge):
        return self._middle_slip(edge, self.force(edge, edge)[0]) - self.gap

    def slip(self, x):
        """|slip| in the left half."""
        n, dn = self.force(x)
        return dn / self.c.k + self.gap if x <= self.edge else self._middle_slip(x, n)

    def deflection(self, place):
        """w at a place in the left half, by virtual work with a unit load there."""
        whole = 2 * self.half

        def bent(x):
            near = x if x <= self.half else whole - x  # the curvature is symmetric
            kappa = (self.moment(near) - self.force(near)[0] * self.c.r) / self.c.ei0
            arm = x * (whole - place) / whole if x <= place else (whole - x) * place / whole
            return kappa * arm

        cuts = sorted({mpf(0), place, self.edge, self.half, whole - self.edge, whole})
        return mpmath.quad(bent, cuts)

    def results(self):
        quarter, zero = self.half / 2, mpf(0)
        return {
            "dead_from_m": self.edge,
            "w_mid_m": self.deflection(self.half),
            "w_quarter_m": self.deflection(quarter),
            "n_lower_mid_N": self.force(self.half)[0],
            "n_lower_quarter_N": self.force(quarter)[0],
            "slip_end_m": -self.slip(zero),
            "slip_quarter_m": -self.slip(quarter),
            "dn_lower_dx_end_N_per_m": self.force(zero)[1],
        }


def scipy_difference(gap, found):
    """Relative difference in w_mid of a direct solution with the kinked joint law."""
    give, pull = float(gap.give), float(gap.pull)
    ei0, r, half, c = float(gap.c.ei0), float(gap.c.r), float(gap.half), float(gap.gap)
    scale = np.array([0.01, 0.01, 1e5, 1e-3])  # w, slope, N, |slip|

    def rate(x, y):
        w, slope, n, slip = y * scale[:, None]
        moment = Q * x * (2 * half - x) / 2
        flow = K * np.maximum(slip - c, 0.0)
        out = np.array([slope, -(moment - n * r) / ei0, flow, give * n - pull * moment])
        return out / scale[:, None]

    def ends(first, last):
        return np.array([first[0], first[2], last[1], last[3]])

    grid = np.unique(np.append(np.linspace(0.0, half, 201), float(gap.edge)))
    answer = solve_bvp(rate, ends, grid, np.ones((4, len(grid))), tol=1e-9, max_nodes=20000)
    assert answer.success, answer.message
    return abs(answer.y[0][-1] * scale[0] / float(found["w_mid_m"]) - 1)


def main():
    rows = []
    for clearance in CLEARANCES:
        with mp.workdps(50):
            gap = Gap(clearance)
            found = gap.results()
        with mp.workdps(80):
            again = Gap(clearance).results()
        reached = max(abs(found[key] / again[key] - 1) for key in found)
        assert reached < 1e-30, (clearance, reached)
        other = scipy_difference(gap, found)
        print(clearance, mpmath.nstr(found["w_mid_m"], 17), float(reached), other)
        assert other < 1e-7, (clearance, other)
        rows.append({"clearance_m": clearance} | found | {"scipy_differs_by": other})
    closed = slip_closed.uniform(gap.c, 2 * gap.half, mpf(Q), gap.half)
    assert abs(rows[0]["w_mid_m"] / closed[0] - 1) < 1e-14
    # An earlier computation gave 11.1, 14.0, 16.6, 21.5 mm; all but the third agree to the digit
    # shown (here 16.652 mm, by both ways of this program), so 0.1 mm is what can be asked.
    for row, known in zip(rows, (11.1, 14.0, 16.6, 21.5)):
        assert abs(row["w_mid_m"] * 1000 - known) < 0.1, row
    tables.write(
        __file__,
        __doc__,
        {
            "length_m": slip_closed.LENGTH_M,
            "q_N_per_m": Q,
            "k_N_per_m2": K,
            "accuracy_relative": 1e-15,
            "upper": slip_closed.SLAB,
            "lower": slip_closed.JOIST,
            "case": rows,
        },
    )


if __name__ == "__main__":
    main()
