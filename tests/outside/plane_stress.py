"""Plane stress by quadratic finite elements: how near beam theory with shear is to elasticity.

What: a member glued of three layers with different E and G on a simple span under a uniform load,
and cantilevers whose depth halves towards the loaded tip (both edges sloping, or the lower only).
Source: plane elasticity with 9-node elements of scikit-fem; every material has E alike in both
directions, a shear modulus G of its own, and the Poisson ratio nu that is stated. Beam theory:
w = int M^2/EI + V^2/kGA by unit loads, kGA = EI^2/int ES^2/(bG).
How to run: python tests/outside/plane_stress.py (needs numpy, scipy, scikit-fem); writes
plane_stress.toml.

End forces enter as shear stresses spread as beam theory has them, so that no point is singular; the
deflection of such a face is the mean weighted by these stresses (the one that does their work).
A fixed face holds u = 0 and is balanced by the same stresses. Deflection is positive down. The
tolerance of a case says how far beam theory may lie from the converged plane solution.
"""

import numpy as np
from skfem import Basis, BilinearForm, ElementQuad2, ElementVector, FacetBasis, Functional
from skfem import LinearForm, MeshQuad, condense, solve

import tables

WIDTH_M = 0.1
LAYERS = [  # from the bottom upwards
    {"E_Pa": 14.0e9, "G_Pa": 0.8e9, "height_m": 0.07},
    {"E_Pa": 8.0e9, "G_Pa": 0.3e9, "height_m": 0.12},
    {"E_Pa": 12.0e9, "G_Pa": 0.7e9, "height_m": 0.05},
]
LENGTH_M, Q = 4.0, 5000.0
TAPERS = [
    {"name": "both-edges", "E_Pa": 11.6e9, "G_Pa": 0.65e9, "nu": 0.0, "lower_edge_only": False},
    {"name": "lower-edge", "E_Pa": 11.6e9, "G_Pa": 0.65e9, "nu": 0.0, "lower_edge_only": True},
    {"name": "both-edges-steel", "E_Pa": 210.0e9, "G_Pa": 210.0e9 / 2.6, "nu": 0.3, "lower_edge_only": False},
]
FINENESS = (2, 4, 8, 16)
DEPTHS_M, ARM_M, TIP_N = (0.5, 0.25), 5.0, 10000.0


def displacements(mesh, stiffness, edges, face, held, body):
    """Solves; `edges` are (boundary, stress(z)) pairs of vertical shear stress, upwards positive."""
    basis = Basis(mesh, ElementVector(ElementQuad2()), intorder=5)

    @BilinearForm
    def energy(u, v, w):
        e, g, nu = stiffness(w.x[1])
        a, b = u.grad, v.grad
        normal = e / (1 - nu * nu)
        work = normal * (a[0, 0] * b[0, 0] + a[1, 1] * b[1, 1])
        work = work + nu * normal * (a[0, 0] * b[1, 1] + a[1, 1] * b[0, 0])
        return WIDTH_M * (work + g * (a[0, 1] + a[1, 0]) * (b[0, 1] + b[1, 0]))

    load = LinearForm(lambda v, w: body * v[1]).assemble(basis)
    for boundary, stress in edges:
        side = FacetBasis(mesh, basis.elem, facets=mesh.boundaries[boundary], intorder=8)
        load = load + LinearForm(lambda v, w: WIDTH_M * stress(w.x[1]) * v[1]).assemble(side)
    fixed = basis.get_dofs(face).all(["u^1"])
    node = int(np.argmin(np.hypot(mesh.p[0] - held[0], mesh.p[1] - held[1])))
    assert np.hypot(mesh.p[0, node] - held[0], mesh.p[1, node] - held[1]) < 1e-12
    one = basis.nodal_dofs[1, node]
    u = solve(*condense(energy.assemble(basis), load, D=np.unique(np.append(fixed, one))))
    return basis, u, one, load


def vertical(basis):
    """Numbers of all vertical displacements (shape functions add up to one on each)."""
    return basis.get_dofs(elements=True).all(["u^2"])


def face_mean(mesh, basis, u, boundary, stress):
    """Upward displacement of a face, weighted by its shear stress."""
    side = FacetBasis(mesh, basis.elem, facets=mesh.boundaries[boundary], intorder=8)
    top = Functional(lambda w: stress(w.x[1]) * w["u"][1]).assemble(side, u=side.interpolate(u))
    return top / Functional(lambda w: stress(w.x[1])).assemble(side)


class Glued:
    """Beam numbers of the layers; z from the elastic axis."""

    def __init__(self):
        h = np.array([p["height_m"] for p in LAYERS])
        self.e = np.array([p["E_Pa"] for p in LAYERS])
        self.g = np.array([p["G_Pa"] for p in LAYERS])
        cuts = np.concatenate([[0.0], np.cumsum(h)])
        middle = (cuts[1:] + cuts[:-1]) / 2
        self.axis = (self.e * h * middle).sum() / (self.e * h).sum()
        self.cuts = cuts - self.axis
        middle = middle - self.axis
        self.ei = (self.e * WIDTH_M * (h**3 / 12 + h * middle**2)).sum()
        points, weights = np.polynomial.legendre.leggauss(5)
        flexibility = 0.0
        for i in range(len(h)):
            z = middle[i] + h[i] / 2 * points
            flow = self.first(z) ** 2 / (WIDTH_M * self.g[i])
            flexibility += (weights * flow).sum() * h[i] / 2
        self.kga = self.ei**2 / flexibility

    def number(self, z):
        return np.clip(np.searchsorted(self.cuts, z) - 1, 0, len(self.e) - 1)

    def first(self, z):
        """ES of all that lies above z."""
        total = np.zeros_like(z)
        for e, low, high in zip(self.e, self.cuts, self.cuts[1:]):
            start = np.clip(z, low, high)
            total = total + e * WIDTH_M * (high**2 - start**2) / 2
        return total

    def stress(self, z):
        """Shear stress for V = 1."""
        return self.first(z) / (self.ei * WIDTH_M)


def glued(fineness):
    """Midspan deflection of half the span, symmetric about its right face."""
    beam = Glued()
    levels = np.unique(np.concatenate([beam.cuts, [0.0]]))
    counts = [max(1, round(fineness * (b - a) / 0.06)) for a, b in zip(levels, levels[1:])]
    z = [np.linspace(a, b, n + 1)[:-1] for a, b, n in zip(levels, levels[1:], counts)]
    x = np.linspace(0.0, LENGTH_M / 2, 20 * fineness + 1)
    mesh = MeshQuad.init_tensor(x, np.concatenate([*z, levels[-1:]]))
    mesh = mesh.with_boundaries({
        "end": lambda p: np.isclose(p[0], 0.0),
        "middle": lambda p: np.isclose(p[0], LENGTH_M / 2),
    })
    reaction, depth = Q * LENGTH_M / 2, beam.cuts[-1] - beam.cuts[0]

    def stiffness(z):
        at = beam.number(z)
        return beam.e[at], beam.g[at], 0.0

    edges = [("end", lambda z: reaction * beam.stress(z))]
    basis, u, one, load = displacements(
        mesh, stiffness, edges, "middle", (LENGTH_M / 2, 0.0), -Q / depth
    )
    assert abs(load[vertical(basis)].sum()) < 1e-9 * reaction
    return face_mean(mesh, basis, u, "end", beam.stress) - u[one]


def rectangle_stress(low, high):
    """Shear stress of a rectangle for V = 1."""
    depth = high - low
    return lambda z: 6.0 * (z - low) * (high - z) / (depth**3 * WIDTH_M)


def edges_at(case, x):
    """Lower and upper edge at x (0 at the fixed face)."""
    depth = DEPTHS_M[0] + (DEPTHS_M[1] - DEPTHS_M[0]) * x / ARM_M
    top = np.full_like(x, DEPTHS_M[0] / 2) if case["lower_edge_only"] else depth / 2
    return top - depth, top


def haunch(case, fineness):
    x = np.linspace(0.0, ARM_M, 20 * fineness + 1)
    mesh = MeshQuad.init_tensor(x, np.linspace(0.0, 1.0, 2 * fineness + 1))
    low, high = edges_at(case, mesh.p[0])
    mesh = MeshQuad(np.array([mesh.p[0], low + (high - low) * mesh.p[1]]), mesh.t)
    mesh = mesh.with_boundaries({
        "root": lambda p: np.isclose(p[0], 0.0),
        "tip": lambda p: np.isclose(p[0], ARM_M),
    })
    root, tip = (
        rectangle_stress(*(float(v) for v in edges_at(case, np.array(x)))) for x in (0.0, ARM_M)
    )
    edges = [("root", lambda z: TIP_N * root(z)), ("tip", lambda z: -TIP_N * tip(z))]
    basis, u, _, load = displacements(
        mesh, lambda z: (case["E_Pa"], case["G_Pa"], case["nu"]), edges, "root", (0.0, 0.0), 0.0
    )
    assert abs(load[vertical(basis)].sum()) < 1e-9 * TIP_N
    return face_mean(mesh, basis, u, "root", root) - face_mean(mesh, basis, u, "tip", tip)


def haunch_beam(case):
    """Beam theory with shear: integrals over the length by Gauss points."""
    points, weights = np.polynomial.legendre.leggauss(40)
    x = ARM_M * (points + 1) / 2
    low, high = edges_at(case, x)
    area = WIDTH_M * (high - low)
    bend = TIP_N * (ARM_M - x) ** 2 * 12 / (case["E_Pa"] * area * (high - low) ** 2)
    return float((weights * (bend + 6 * TIP_N / (5 * case["G_Pa"] * area))).sum() * ARM_M / 2)


def row(found, theory, tolerance):
    """Values by rising fineness, with the distance of beam theory from the finest."""
    print([f"{v:.10e}" for v in found], f"{theory:.10e}", f"{theory / found[-1] - 1:.2e}")
    assert abs(found[-1] / found[-2] - 1) < 1e-6
    assert abs(theory / found[-1] - 1) < tolerance
    return {
        "w_by_fineness_m": found,
        "w_plane_m": found[-1],
        "mesh_change_relative": abs(found[-1] / found[-2] - 1),
        "w_beam_theory_m": theory,
        "beam_theory_off_by": theory / found[-1] - 1,
        "tolerance_relative": tolerance,
    }


def main():
    beam = Glued()
    theory = 5 * Q * LENGTH_M**4 / (384 * beam.ei) + Q * LENGTH_M**2 / (8 * beam.kga)
    whole = {"length_m": LENGTH_M, "q_N_per_m": Q, "width_m": WIDTH_M, "nu": 0.0}
    whole |= {"EI_Nm2": float(beam.ei), "kGA_N": float(beam.kga), "layer_from_bottom": LAYERS}
    whole |= {"shear_share": Q * LENGTH_M**2 / (8 * beam.kga) / theory}
    whole |= row([float(glued(n)) for n in FINENESS], float(theory), 0.01)
    tapers = []
    for case in TAPERS:
        values = row([float(haunch(case, n)) for n in FINENESS], haunch_beam(case), 0.01)
        tapers.append(case | values)
    taper = {"width_m": WIDTH_M, "depth_ends_m": DEPTHS_M, "length_m": ARM_M, "tip_load_N": TIP_N}
    tables.write(__file__, __doc__, {"glued": whole, "haunch": taper | {"case": tapers}})


if __name__ == "__main__":
    main()
