"""Members of slipping layers whose joint, layers or supports have no simple closed form.

What: stepped spacing of fasteners, two spans, three layers, an anchored end, an upper layer that
ends within the member, fixed ends, support movements, a varying depth with slip.
Source: equations of `layered.py` (own derivation). Prismatic cases are solved by matrix exponentials
with 80 digits (reached accuracy: against 120 digits); every case is solved again by Chebyshev
collocation and by scipy.integrate.solve_bvp, and the differences are written down. The case with
varying depth rests on collocation of order 56 (reached accuracy: against order 28).
How to run: python tests/outside/slip_bvp.py (needs mpmath, numpy, scipy); writes slip_bvp.toml.

Signs: w, loads and settlements down, theta = slope of w, M sagging positive, V = dM/dx, N tension
positive, reactions up, slip = upper minus lower layer. Layer 1 is the uppermost; joint j lies under
layer j. Axial forces at the nodes act towards +x. V at a node is the value just right of it.
"""

import mpmath
from mpmath import mpf

import slip_closed
import tables
from layered import Layer, Member

SLAB = (31.0e9, 0.6, 0.07, 0.035)
JOIST = (11.0e9, 0.1, 0.22, -0.11)
K = 133.0e6
PIN = {"settlement_m": 0.0}
# A fixed end that keeps the slip free: the layers turn together but slide along each other.
TURN_HELD = {"settlement_m": 0.0, "rotation_rad": 0.0}
FIXED = TURN_HELD | {"slip_held": True, "axial_held": True}


def piece(start, end, k, q=0.0, absent=None):
    out = {"from_m": start, "to_m": end, "k_N_per_m2": k, "q_N_per_m": q}
    return out | ({"absent": absent} if absent else {})


def nodes(*rows):
    """Nodes with the axial hold put on the first one that does not say how it is held."""
    out = [{"x_m": x} | row for x, row in rows]
    if not any(row.get("axial_held") for row in out):
        out[0]["axial_held"] = True
    return out


def two_layers():
    return [Layer(*SLAB), Layer(*JOIST)]


def three_layers():
    return [
        Layer(11.0e9, 0.14, 0.045, 0.1125),
        Layer(11.0e9, 0.063, 0.18, 0.0),
        Layer(11.6e9, 0.14, 0.06, -0.12),
    ]


def cases():
    """(name, about, member, inner stations)"""
    even = [piece(0.0, 6.0, [K], 3000.0)]
    yield "simple-uniform", "one span, one spacing: closed form known", Member(
        two_layers(), even, nodes((0.0, PIN), (6.0, PIN))
    )
    yield "stepped-spacing", "three bands, the middle one without fasteners", Member(
        two_layers(),
        [
            piece(0.0, 1.5, [200.0e6], 3000.0),
            piece(1.5, 4.0, [0.0], 3000.0),
            piece(4.0, 6.0, [80.0e6], 3000.0),
        ],
        nodes((0.0, PIN), (1.5, {}), (4.0, {}), (6.0, PIN)),
    )
    yield "two-spans", "continuous over unequal spans, uniform load and one point load", Member(
        two_layers(),
        [piece(0.0, 4.0, [K], 3000.0), piece(4.0, 6.5, [K], 3000.0), piece(6.5, 9.0, [K], 3000.0)],
        nodes((0.0, PIN), (4.0, PIN), (6.5, {"load_N": 8000.0}), (9.0, PIN)),
    )
    yield "three-layers", "two joints of different stiffness, uniform load and a point load", Member(
        three_layers(),
        [piece(0.0, 2.0, [8.0e6, 12.0e6], 1200.0), piece(2.0, 5.0, [8.0e6, 12.0e6], 1200.0)],
        nodes((0.0, PIN), (2.0, {"load_N": 1500.0}), (5.0, PIN)),
    )
    yield "anchored-end", "no slip at the left end, free slip at the right", Member(
        two_layers(), even, nodes((0.0, PIN | {"slip_held": True}), (6.0, PIN))
    )
    yield "anchored-end-shrinkage", "the same, shrinkage 3e-4 of the upper layer, no load", Member(
        [Layer(*SLAB, 3.0e-4), Layer(*JOIST)],
        [piece(0.0, 6.0, [K])],
        nodes((0.0, PIN | {"slip_held": True}), (6.0, PIN)),
    )
    yield "short-upper-layer", "upper layer only from 0.8 to 4.2 m, N = 0 at its ends", Member(
        two_layers(),
        [
            piece(0.0, 0.8, [0.0], 2500.0, [0]),
            piece(0.8, 4.2, [K], 2500.0),
            piece(4.2, 5.0, [0.0], 2500.0, [0]),
        ],
        nodes((0.0, PIN), (0.8, {}), (4.2, {}), (5.0, PIN)),
    )
    yield "fixed-slip-held", "rotation, slip and axial displacement held at both ends", Member(
        two_layers(),
        [piece(0.0, 2.0, [K], 3000.0), piece(2.0, 6.0, [K], 3000.0)],
        nodes((0.0, FIXED), (2.0, {"load_N": 5000.0}), (6.0, FIXED)),
    )
    yield "fixed-slip-free", "rotation held at both ends, layers free to slide there", Member(
        two_layers(),
        [piece(0.0, 2.0, [K], 3000.0), piece(2.0, 6.0, [K], 3000.0)],
        nodes((0.0, TURN_HELD), (2.0, {"load_N": 5000.0}), (6.0, TURN_HELD)),
    )
    yield "support-movements", "left end turns by 0.002, inner support settles 8 mm, no load", Member(
        two_layers(),
        [piece(0.0, 4.0, [K]), piece(4.0, 9.0, [K])],
        nodes(
            (0.0, FIXED | {"rotation_rad": 0.002}), (4.0, {"settlement_m": 0.008}), (9.0, PIN)
        ),
    )
    yield "cantilever", "left end held fully, point load at the tip, slip free at the tip", Member(
        two_layers(),
        [piece(0.0, 2.5, [K], 1000.0)],
        nodes((0.0, FIXED), (2.5, {"load_N": 2000.0})),
    )
    yield "layer-end-forces", "100 kN pressed into the lower layer's centroid at both ends", Member(
        two_layers(),
        [piece(0.0, 6.0, [K])],
        # M is taken about z = 0: a force F towards +x at height z changes M by F z, see `layered.py`.
        nodes(
            (0.0, PIN | {"axial_N": [0.0, 1.0e5], "couple_Nm": 1.0e5 * JOIST[3]}),
            (6.0, PIN | {"axial_N": [0.0, -1.0e5], "couple_Nm": -1.0e5 * JOIST[3]}),
        ),
    )
    yield "taper-slip", "lower layer from 0.30 to 0.18 m deep, its top straight", Member(
        [Layer(*SLAB), Layer(11.0e9, 0.1, (0.30, 0.18), (-0.15, -0.09))],
        even,
        nodes((0.0, PIN), (6.0, PIN)),
    )
    yield "taper-slip-shrinkage", "the same, shrinkage 3e-4 of the upper layer, no load", Member(
        [Layer(*SLAB, 3.0e-4), Layer(11.0e9, 0.1, (0.30, 0.18), (-0.15, -0.09))],
        [piece(0.0, 6.0, [K])],
        nodes((0.0, PIN), (6.0, PIN)),
    )
    yield "taper-slip-two-spans", "the same depths over two spans of 3.5 and 2.5 m", Member(
        [Layer(*SLAB), Layer(11.0e9, 0.1, (0.30, 0.18), (-0.15, -0.09))],
        [piece(0.0, 3.5, [K], 3000.0), piece(3.5, 6.0, [K], 3000.0)],
        nodes((0.0, PIN), (3.5, PIN), (6.0, PIN)),
    )


def check_statics(name, member, result):
    """Layer forces and bending must add up to M, slips must vanish where they are held."""
    field = result["field"]
    total = sum(r["R_N"] for r in result["reaction"])
    load = sum(p["q_N_per_m"] * (p["to_m"] - p["from_m"]) for p in member.pieces)
    load += sum(n.get("load_N", 0.0) for n in member.nodes)
    size = max(abs(r["R_N"]) for r in result["reaction"]) + abs(load) + 1.0
    assert abs(total - load) < 1e-10 * size, name
    free = [n for n in member.nodes if n.get("axial_N") or n.get("slip_held")]
    if not free:
        for forces in zip(*(field[f"N_{i + 1}_N"] for i in range(member.count))):
            assert abs(sum(forces)) < 1e-7, name


def check_limits():
    """The engine against the closed form, and a very stiff joint against one glued section."""
    span = nodes((0.0, PIN), (6.0, PIN))
    length, q = mpf(6), mpf(3000)
    for k in (1.0e3, 1.0e6, 1.0e9):
        member = Member(two_layers(), [piece(0.0, 6.0, [k], 3000.0)], span)
        field = member.solve([0.0, 1.5, 3.0])["field"]
        with mpmath.workdps(60):
            c = slip_closed.Composite(slip_closed.SLAB, slip_closed.JOIST, k)
            for at, x in enumerate((mpf(0), mpf("1.5"), mpf(3))):
                w, slope, n, dn, _ = slip_closed.uniform(c, length, q, x)
                assert abs(field["w_m"][at] - w) <= 1e-14 * abs(w) + 1e-30, (k, x)
                assert abs(field["theta_rad"][at] - slope) <= 1e-14 * abs(slope) + 1e-30
                assert abs(field["N_2_N"][at] - n) <= 1e-13 * abs(n) + 1e-30
                assert abs(field["slip_1_m"][at] + dn / c.k) <= 1e-13 * abs(dn / c.k) + 1e-30
    # One timber in three thirds: as the joints stiffen, w = w_glued + c/k + c2/k^2 ...
    thirds = [Layer(11.0e9, 0.1, 0.1, z) for z in (0.1, 0.0, -0.1)]
    ends = nodes((0.0, PIN), (4.0, PIN))
    sags = []
    for k in (2.5e9, 5.0e9, 10.0e9):
        member = Member(thirds, [piece(0.0, 4.0, [k, k], 2000.0)], ends)
        sags.append(member.solve([0.0, 2.0], order=64, scipy_limit=None)["field"]["w_m"][1])
    once = [2 * fine - rough for rough, fine in zip(sags, sags[1:])]
    whole = 5 * 2000.0 * 4.0**4 / (384 * 11.0e9 * 0.1 * 0.3**3 / 12)
    assert abs((4 * once[1] - once[0]) / 3 / whole - 1) < 1e-6


def main():
    check_limits()
    rows = []
    for name, about, member in cases():
        varying = any(isinstance(layer.height_m, tuple) for layer in member.layers)
        inner = [member.length * n / 16 for n in range(17)]
        stations = sorted(set(inner + [node["x_m"] for node in member.nodes]))
        result = member.solve(stations, constant=not varying, order=28)
        check_statics(name, member, result)
        print(name, *(f"{result[key]:.1e}" for key in result if key.endswith(("_by", "_relative"))))
        assert result["accuracy_relative"] < 1e-10, name
        rows.append({"name": name, "about": about} | member.table() | {"result": result})
    tables.write(__file__, __doc__, {"case": rows})


if __name__ == "__main__":
    main()
