"""Turns a member of slipping layers into equations and conditions for `boundary_value`.

What: states w, theta, V, M, then per layer (upper first) the axial displacement u_i of the layer
carried on to the common axis z = 0, then per layer the axial force N_i. With theta positive as dw/dx:
    w' = theta + V/kGA           theta' = -kappa            V' = -q            M' = V
    kappa = (M + sum N_i z_i + sum EI_i kappa*_i)/sum EI_i
    u_i' = N_i/EA_i + eps*_i + kappa z_i
    N_i' = k_i (u_i - u_(i+1)) - k_(i-1) (u_(i-1) - u_i)
M is the moment about z = 0, M = sum(EI_i kappa - N_i z_i); slip of joint i = u_i - u_(i+1), upper
minus lower. Heights may vary along x. A layer that is absent keeps u and N constant (N is zero).
Source: virtual work of the layers with one deflection and one rotation for all; own derivation.
How to run: not a program; the other files of this folder import it.
"""

import boundary_value as bv


class Layer:
    """A rectangle; `height_m` and `z_m` may be numbers or (at left, at right) of the whole member."""

    def __init__(self, e_pa, width_m, height_m, z_m, shrinkage=0.0):
        self.e_pa, self.width_m, self.height_m, self.z_m = e_pa, width_m, height_m, z_m
        self.shrinkage = shrinkage

    @staticmethod
    def _along(value, x, length):
        if isinstance(value, tuple):
            return value[0] + (value[1] - value[0]) * x / length
        return value

    def at(self, x, length, height_m=None):
        """EA, EI and height of the centroid at x; `height_m` replaces the layer's own."""
        h = self._along(self.height_m, x, length) if height_m is None else height_m
        area = self.e_pa * self.width_m * h
        return area, area * h * h / 12, self._along(self.z_m, x, length)

    def table(self):
        out = {"E_Pa": self.e_pa, "width_m": self.width_m}
        for name in ("height_m", "z_m"):
            value = getattr(self, name)
            if isinstance(value, tuple):
                out[name + "_ends"] = list(value)
            else:
                out[name] = value
        if self.shrinkage:
            out["shrinkage"] = self.shrinkage
        return out


class Member:
    """Layers, pieces (from, to, k of each joint, q, absent layers, other heights) and nodes."""

    def __init__(self, layers, pieces, nodes, shear_modulus_pa=None):
        self.layers, self.pieces, self.nodes = layers, pieces, nodes
        self.length = pieces[-1]["to_m"]
        self.count = len(layers)
        # Shear stiffness 5/6 G A, only for members of one layer.
        self.shear_modulus_pa = shear_modulus_pa

    def equations(self):
        """The pieces in the form that `boundary_value` reads."""
        return [self._piece(piece) for piece in self.pieces]

    def _piece(self, piece):
        n, length = self.count, self.length
        absent = piece.get("absent", [])
        k = piece.get("k_N_per_m2", [])
        heights = piece.get("height_m", [None] * n)

        def parts(x):
            found = [layer.at(x, length, h) for layer, h in zip(self.layers, heights)]
            here = [i for i in range(n) if i not in absent]
            return found, here, sum(found[i][1] for i in here)

        def a(x):
            found, here, bending = parts(x)
            m = [[0.0] * (4 + 2 * n) for _ in range(4 + 2 * n)]
            m[0][1] = 1.0
            if self.shear_modulus_pa is not None:
                area = found[0][0] / self.layers[0].e_pa
                m[0][2] = 6.0 / (5.0 * self.shear_modulus_pa * area)
            m[1][3] = -1.0 / bending
            m[3][2] = 1.0
            for i in here:
                m[1][4 + n + i] = -found[i][2] / bending
            for i in here:
                m[4 + i][4 + n + i] += 1.0 / found[i][0]
                for s in range(4 + 2 * n):
                    m[4 + i][s] -= m[1][s] * found[i][2]
            for j, stiffness in enumerate(k):
                for layer, sign in ((j, 1.0), (j + 1, -1.0)):
                    m[4 + n + layer][4 + j] += sign * stiffness
                    m[4 + n + layer][4 + j + 1] -= sign * stiffness
            return m

        def b(x):
            _, here, _ = parts(x)
            out = [0.0] * (4 + 2 * n)
            out[2] = -piece.get("q_N_per_m", 0.0)
            for i in here:
                out[4 + i] = -self.layers[i].shrinkage
            return out

        return piece["from_m"], piece["to_m"], a, b

    def conditions(self):
        """Continuity, supports and loads at every node, in the form `boundary_value` reads."""
        n, last, rows = self.count, len(self.nodes) - 1, []

        def jump(at, state, value, spring=None):
            before = {state: -1.0} if at > 0 else {}
            after = {state: 1.0} if at < last else {}
            if spring:  # (state, factor): the jump of the force is factor times that state
                side = after if at < last else before
                side[spring[0]] = side.get(spring[0], 0.0) - spring[1]
            rows.append((at, before, after, value))

        def held(at, state, value):
            after, before = ({state: 1.0}, {}) if at < last else ({}, {state: 1.0})
            rows.append((at, before, after, value))

        for at, node in enumerate(self.nodes):
            inner = 0 < at < last
            hinge = node.get("hinge", False)
            for state in range(4, 4 + n) if inner else ():
                jump(at, state, 0.0)
            if inner:
                jump(at, 0, 0.0)
                if not hinge:
                    jump(at, 1, 0.0)
            if "settlement_m" in node:
                held(at, 0, node["settlement_m"])
            else:
                spring = node.get("spring_N_per_m")
                load = node.get("load_N", 0.0)
                jump(at, 2, -load, (0, spring) if spring else None)
            if hinge:
                rows.append((at, {3: 1.0}, {}, 0.0))
                rows.append((at, {}, {3: 1.0}, 0.0))
            elif "rotation_rad" in node:
                held(at, 1, node["rotation_rad"])
            else:
                spring = node.get("rotation_spring_Nm_per_rad")
                jump(at, 3, node.get("couple_Nm", 0.0), (1, -spring) if spring else None)
            self._axial(at, node, jump, held, rows)
        return rows

    def _axial(self, at, node, jump, held, rows):
        """Axial conditions: `slip_held` ties the layers, `axial_held` holds the lowest one."""
        n, last = self.count, len(self.nodes) - 1
        forces = node.get("axial_N", [0.0] * n)  # acting towards +x at the layers' centroids
        for i in range(n - 1):
            if node.get("slip_held", False):
                side = {4 + i: 1.0, 5 + i: -1.0}
                rows.append((at, {}, side, 0.0) if at < last else (at, side, {}, 0.0))
            else:
                jump(at, 4 + n + i, -forces[i])
        if node.get("axial_held", False):
            held(at, 4 + n - 1, 0.0)
        elif node.get("slip_held", False):
            states = range(4 + n, 4 + 2 * n)
            before = {s: -1.0 for s in states} if at > 0 else {}
            after = {s: 1.0 for s in states} if at < last else {}
            rows.append((at, before, after, -sum(forces)))
        else:
            jump(at, 4 + 2 * n - 1, -forces[n - 1])

    def reactions(self, ends):
        """Upward reaction at every node that has a support, from the jump of V and the load."""
        out, last = [], len(self.nodes) - 1
        for at, node in enumerate(self.nodes):
            if "settlement_m" not in node and not node.get("spring_N_per_m"):
                continue
            before = ends[at - 1][1][2] if at > 0 else 0.0
            after = ends[at][0][2] if at < last else 0.0
            out.append({"x_m": node["x_m"], "R_N": after - before + node.get("load_N", 0.0)})
        return out

    def fields(self, stations, states):
        """Lists of the fields at the stations under names with units."""
        n = self.count
        columns = list(zip(*states))
        out = {"x_m": list(stations), "w_m": columns[0], "theta_rad": columns[1]}
        out |= {"V_N": columns[2], "M_Nm": columns[3]}
        for i in range(n if n > 1 else 0):
            out[f"N_{i + 1}_N"] = columns[4 + n + i]
        for j in range(n - 1):
            out[f"slip_{j + 1}_m"] = [a - b for a, b in zip(columns[4 + j], columns[5 + j])]
        return out

    def accuracy(self, fields, other):
        """Greatest difference of two sets of fields, relative to the peak of each field."""
        worst = 0.0
        for name, values in fields.items():
            peak = max(abs(v) for v in values)
            # Fields that are zero by symmetry or statics hold nothing but rounding.
            if name != "x_m" and peak > 1e-14 * (1.0 if name[0] != "N" else 1e6):
                worst = max(worst, max(abs(v - o) for v, o in zip(values, other[name])) / peak)
        return worst

    def solve(self, stations, constant=True, order=24, scipy_limit=1e-6):
        """Fields, reactions and the reached accuracy; compared with the other two ways.

        `scipy_limit` None leaves out scipy, whose mesh grows without end for very stiff joints.
        """
        pieces, rows = self.equations(), self.conditions()
        rough, _ = bv.collocate(pieces, rows, stations, order)
        rough = self.fields(stations, rough)
        if constant:
            states, ends = bv.exact(pieces, rows, stations)
            finer = bv.exact(pieces, rows, stations, 120)[0]
            fields = self.fields(stations, states)
            reached = self.accuracy(fields, self.fields(stations, finer))
        else:
            states, ends = bv.collocate(pieces, rows, stations, 2 * order)
            fields = self.fields(stations, states)
            reached = self.accuracy(fields, rough)
        second = self.accuracy(fields, rough)
        peaks = [max(abs(s[i]) for s in states) for i in range(len(states[0]))]
        assert second < 1e-9, f"collocation differs by {second}"
        third = None
        if scipy_limit is not None:
            third = bv.scipy_check(pieces, rows, stations, peaks)
            third = self.accuracy(fields, self.fields(stations, third))
            assert third < scipy_limit, f"scipy differs by {third}"
        return {
            "accuracy_relative": max(reached, 1e-16),
            "collocation_differs_by": second,
            "scipy_differs_by": third,
            "reaction": self.reactions(ends),
            "field": fields,
        }

    def table(self):
        """All input, to be written beside the results."""
        return {
            "length_m": self.length,
            "shear_modulus_Pa": self.shear_modulus_pa,
            "layer": [layer.table() for layer in self.layers],
            "piece": self.pieces,
            "node": self.nodes,
        }
