"""Small numerical tools of the golden cases, without beamcore."""

# Nodes and weights of the Gauss-Legendre rule of 5 points on (-1, 1) (Abramowitz and Stegun, Handbook of
# Mathematical Functions, table 25.4, from memory).
GAUSS = [(0.0, 128 / 225)] + [
    (sign * (5 + root * 2 * (10 / 7) ** 0.5) ** 0.5 / 3, (322 - root * 13 * 70**0.5) / 900)
    for root in (-1, 1) for sign in (-1, 1)]


def integral(function, cuts: list[float], panels: int = 60) -> float:
    """The integral over all the stretches between cuts, within which the function is smooth."""
    total = 0.0
    for a, b in zip(cuts, cuts[1:]):
        half = (b - a) / panels / 2
        for i in range(panels):
            middle = a + (2 * i + 1) * half
            total += half * sum(weight * function(middle + half * node) for node, weight in GAUSS)
    return total


def solved(matrix: list[list[float]], right: list[float]) -> list[float]:
    """The solution of linear equations, by elimination with row pivots."""
    rows = [list(row) + [value] for row, value in zip(matrix, right)]
    size = len(rows)
    for i in range(size):
        pivot = max(range(i, size), key=lambda j: abs(rows[j][i]))
        rows[i], rows[pivot] = rows[pivot], rows[i]
        for j in range(i + 1, size):
            factor = rows[j][i] / rows[i][i]
            rows[j] = [x - factor * y for x, y in zip(rows[j], rows[i])]
    answer = [0.0] * size
    for i in reversed(range(size)):
        rest = sum(rows[i][j] * answer[j] for j in range(i + 1, size))
        answer[i] = (rows[i][size] - rest) / rows[i][i]
    return answer


def greatest(line, low: float, high: float, steps: int = 600) -> float:
    """The greatest value from low to high: a scan, then a search that narrows down to the place."""
    places = [low + (high - low) * i / steps for i in range(steps + 1)]
    best = max(range(steps + 1), key=lambda i: line(places[i]))
    low, high = places[max(best - 1, 0)], places[min(best + 1, steps)]
    for _ in range(200):
        third = (high - low) / 3
        if line(low + third) < line(high - third):
            low += third
        else:
            high -= third
    return max(line((low + high) / 2), line(places[best]))
