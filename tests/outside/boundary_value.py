"""Three ways to solve y' = A y + b on a row of pieces with conditions at their ends.

What: `exact` (constant pieces; matrix exponentials in mpmath with many digits), `collocate`
(varying pieces; Chebyshev polynomials through Gauss points, in doubles) and `scipy_check`
(scipy.integrate.solve_bvp, for comparison only). They share nothing but the equations.
Source: matrix exponential and rectangular spectral collocation, general numerical practice.
How to run: not a program; the other files of this folder import it.

A piece is (x0, x1, A, b): A(x) gives a square list of lists, b(x) a list. For `exact` both must be
constant within the piece. A condition is (node, before, after, right side): node n lies at the
start of piece n, `before` and `after` map a state's number to its factor on either side.
"""

import mpmath
import numpy as np
from mpmath import mp
from numpy.polynomial.legendre import leggauss
from scipy.integrate import solve_bvp


def _exponential(matrix, length):
    """exp(matrix * length) by halving the length until the Taylor series is short."""
    scaled = matrix * length
    size = scaled.rows
    # A diagonal similarity would change the norm; with spare digits the plain row norm will do.
    norm = max(sum(abs(scaled[i, j]) for j in range(size)) for i in range(size))
    halvings = max(0, int(mpmath.ceil(mpmath.log(norm + 1, 2))) + 3)
    scaled = scaled / mp.mpf(2) ** halvings
    total = mpmath.eye(size)
    term = mpmath.eye(size)
    count = 0
    while True:
        count += 1
        term = term * scaled / count
        total = total + term
        if max(abs(entry) for entry in term) < mp.mpf(10) ** (-mp.dps - 10):
            break
    for _ in range(halvings):
        total = total * total
    return total


def _piece_of(pieces, x):
    """Number of the piece that holds x; at a node the piece that starts there."""
    for number in range(len(pieces) - 1, -1, -1):
        if x >= pieces[number][0]:
            return number
    raise ValueError(f"station {x} lies before the first piece")


def exact(pieces, conditions, stations, digits=80):
    """States at the stations and at both ends of every piece, by matrix exponentials."""
    with mp.workdps(digits):
        size = len(pieces[0][2](pieces[0][0]))
        grown = []
        for x0, _, a, b in pieces:
            matrix = mpmath.zeros(size + 1)
            for i, row in enumerate(a(x0)):
                for j, entry in enumerate(row):
                    matrix[i, j] = mp.mpf(entry)
                matrix[i, size] = mp.mpf(b(x0)[i])
            grown.append(matrix)
        through = [_exponential(m, mp.mpf(p[1]) - mp.mpf(p[0])) for m, p in zip(grown, pieces)]
        count = size * len(pieces)
        left, right = mpmath.zeros(count), mpmath.zeros(count, 1)
        if len(conditions) != count:
            raise ValueError(f"{len(conditions)} conditions for {count} unknowns")
        for row, (node, before, after, value) in enumerate(conditions):
            right[row] = mp.mpf(value)
            for state, factor in after.items():
                left[row, node * size + state] += mp.mpf(factor)
            for state, factor in before.items():
                transfer = through[node - 1]
                for j in range(size):
                    left[row, (node - 1) * size + j] += mp.mpf(factor) * transfer[state, j]
                right[row] -= mp.mpf(factor) * transfer[state, size]
        # Rows and columns of very different units: equal them out before the elimination.
        columns = [max(abs(left[i, j]) for i in range(count)) for j in range(count)]
        for j in range(count):
            for i in range(count):
                left[i, j] /= columns[j]
        for i in range(count):
            peak = max(abs(left[i, j]) for j in range(count))
            for j in range(count):
                left[i, j] /= peak
            right[i] /= peak
        start = mpmath.lu_solve(left, right)
        start = [start[j] / columns[j] for j in range(count)]

        def state(number, length):
            vector = mpmath.matrix(start[number * size : (number + 1) * size] + [mp.mpf(1)])
            moved = _exponential(grown[number], length) * vector
            return [moved[i] for i in range(size)]

        at = [_piece_of(pieces, x) for x in stations]
        fields = [state(n, mp.mpf(x) - mp.mpf(pieces[n][0])) for n, x in zip(at, stations)]
        ends = [
            (state(n, mp.mpf(0)), state(n, mp.mpf(p[1]) - mp.mpf(p[0])))
            for n, p in enumerate(pieces)
        ]
    return [[float(v) for v in s] for s in fields], [
        ([float(v) for v in s], [float(v) for v in e]) for s, e in ends
    ]


def _interpolation(nodes, weights, targets):
    """Barycentric interpolation matrix from `nodes` to `targets`."""
    out = np.zeros((len(targets), len(nodes)))
    for row, x in enumerate(targets):
        gap = x - nodes
        hit = np.flatnonzero(gap == 0.0)
        if len(hit):
            out[row, hit[0]] = 1.0
        else:
            terms = weights / gap
            out[row] = terms / terms.sum()
    return out


def _chebyshev(order):
    """Nodes on [-1, 1], their barycentric weights and the differentiation matrix."""
    nodes = -np.cos(np.pi * np.arange(order + 1) / order)
    weights = (-1.0) ** np.arange(order + 1)
    weights[0] *= 0.5
    weights[-1] *= 0.5
    gap = nodes[:, None] - nodes[None, :] + np.eye(order + 1)
    slope = weights[None, :] / weights[:, None] / gap
    np.fill_diagonal(slope, 0.0)
    np.fill_diagonal(slope, -slope.sum(axis=1))
    return nodes, weights, slope


def collocate(pieces, conditions, stations, order=24):
    """The same, for pieces that may vary along x, by Chebyshev polynomials of the given order."""
    size = len(pieces[0][2](pieces[0][0]))
    nodes, weights, slope = _chebyshev(order)
    points, _ = leggauss(order)
    into = _interpolation(nodes, weights, points)
    slope = into @ slope
    block = size * (order + 1)
    count = block * len(pieces)
    left, right = np.zeros((count, count)), np.zeros(count)
    row = 0
    for number, (x0, x1, a, b) in enumerate(pieces):
        for g, point in enumerate(points):
            x = x0 + (x1 - x0) * (point + 1.0) / 2.0
            matrix, load = np.array(a(x), float), np.array(b(x), float)
            for i in range(size):
                # States are blocks of nodal values, one state after another.
                view = left[row].reshape(len(pieces), size, order + 1)[number]
                view[i] += slope[g] * 2.0 / (x1 - x0)
                view -= matrix[i][:, None] * into[g][None, :]
                right[row] = load[i]
                row += 1
    for node, before, after, value in conditions:
        for state, factor in after.items():
            left[row, node * block + state * (order + 1)] += factor
        for state, factor in before.items():
            left[row, (node - 1) * block + state * (order + 1) + order] += factor
        right[row] = value
        row += 1
    if row != count:
        raise ValueError(f"{row} equations for {count} unknowns")
    scale = np.ones(count)
    for _ in range(3):  # the first solution tells the size of each state
        scaled = left * scale
        peak = np.abs(scaled).max(axis=1)
        scaled, side = scaled / peak[:, None], right / peak
        values = np.linalg.solve(scaled, side)
        rest = side - (scaled.astype(np.longdouble) @ values.astype(np.longdouble))
        values = (values + np.linalg.solve(scaled, rest.astype(float))) * scale
        table = values.reshape(len(pieces), size, order + 1)
        peaks = np.abs(table).max(axis=(0, 2))
        peaks[peaks == 0.0] = 1.0
        scale = np.broadcast_to(peaks[None, :, None], table.shape).reshape(count).copy()
    fields = []
    for x in stations:
        number = _piece_of(pieces, x)
        x0, x1 = pieces[number][:2]
        line = _interpolation(nodes, weights, [2.0 * (x - x0) / (x1 - x0) - 1.0])[0]
        fields.append([float(v) for v in table[number] @ line])
    ends = [([float(v) for v in t[:, 0]], [float(v) for v in t[:, -1]]) for t in table]
    return fields, ends


def scipy_check(pieces, conditions, stations, peaks, tolerance=1e-8):
    """States at the stations by scipy's solver; all pieces run side by side on 0 to 1."""
    size, number = len(peaks), len(pieces)
    # A state that vanishes leaves rounding of 80 digits behind, which is no measure of anything.
    peaks = np.where(np.array(peaks) < 1e-30, 1.0, peaks)

    def derivative(t, y):
        out = np.empty_like(y)
        for n, (x0, x1, a, b) in enumerate(pieces):
            part = y[n * size : (n + 1) * size] * peaks[:, None]
            for c, tc in enumerate(t):
                x = x0 + (x1 - x0) * tc
                change = np.array(a(x), float) @ part[:, c] + np.array(b(x), float)
                out[n * size : (n + 1) * size, c] = change * (x1 - x0) / peaks
        return out

    def ends(first, last):
        rest = []
        for node, before, after, value in conditions:
            terms = [f * last[(node - 1) * size + s] * peaks[s] for s, f in before.items()]
            terms += [f * first[node * size + s] * peaks[s] for s, f in after.items()]
            weight = max([abs(f) * peaks[s] for s, f in {**before, **after}.items()])
            rest.append((sum(terms) - value) / weight)
        return np.array(rest)

    grid = np.linspace(0.0, 1.0, 41)
    answer = solve_bvp(
        derivative, ends, grid, np.zeros((size * number, 41)), tol=tolerance, max_nodes=20000
    )
    if not answer.success:
        raise ArithmeticError(answer.message)
    fields = []
    for x in stations:
        n = _piece_of(pieces, x)
        t = (x - pieces[n][0]) / (pieces[n][1] - pieces[n][0])
        fields.append(answer.sol(t)[n * size : (n + 1) * size] * peaks)
    return fields

