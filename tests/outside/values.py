"""Single reference values of a member, each checked against a solution of the equations.

What: `case` compares hand formulas (a quantity, a place, a value) with the matrix exponentials of
`layered.py`, so that a formula written from memory cannot be wrong unnoticed, and puts member and
values into one table.
Source: none of its own.
How to run: not a program; the other files of this folder import it.
"""

import boundary_value as bv
from layered import Layer, Member

E_PA, WIDTH_M, HEIGHT_M = 12.0e9, 0.12, 0.3
EI = 12000000000 * 0.12 * 0.3**3 / 12  # 3.24e6 N m2, in doubles; formulas take it as it is
PIN = {"settlement_m": 0.0}
FIXED = PIN | {"rotation_rad": 0.0}


def beam(pieces, nodes, layers=None, shear_modulus_pa=None):
    """A member of one rectangle, or of the given layers; `pieces` are (from, to, q)."""
    rows = [{"from_m": float(a), "to_m": float(b), "q_N_per_m": float(q)} for a, b, q in pieces]
    held = [{"x_m": float(x)} | node for x, node in nodes]
    if not any(node.get("axial_held") for node in held):
        held[0]["axial_held"] = True
    layers = layers or [Layer(E_PA, WIDTH_M, HEIGHT_M, 0.0)]
    return Member(layers, rows, held, shear_modulus_pa)


def computed(member, quantity, x):
    """One number of the member by matrix exponentials."""
    states, ends = bv.exact(member.equations(), member.conditions(), [x])
    if quantity == "R_N":
        return next(r["R_N"] for r in member.reactions(ends) if r["x_m"] == x)
    return member.fields([x], states)[quantity][0]


def case(name, source, member, values):
    """A table of the member with its values; (quantity, x, value) each, checked to 1e-13."""
    peaks = {}
    for quantity, _, value in values:
        peaks[quantity] = max(peaks.get(quantity, 0.0), abs(float(value)))
    for quantity, x, value in values:
        other = computed(member, quantity, float(x))
        size = peaks[quantity] or 1.0
        assert abs(other - float(value)) <= 1e-13 * size, (name, quantity, x, float(value), other)
    rows = [{"quantity": q, "x_m": float(x), "value": v} for q, x, v in values]
    return {"name": name, "source": source} | member.table() | {"value": rows}
