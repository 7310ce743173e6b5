"""The golden case roof-beam: statics, exact deflection lines and an arc of least greatest gap."""

from fractions import Fraction as F

from beam_line import Line, Loads, combined, greatest, value_at
from write_expect import Case, Sums, mm

GRAVITY = F("9.80665")
LENGTH, LEFT, RIGHT = F(56, 5), F(6, 5), F(10)
CHORD = RIGHT - LEFT
# psi_0, psi_1, psi_2 of EN 1990:2002 Table A1.1: snow up to 1000 m, category H, wind (from memory).
PSI = {"snow": (F(1, 2), F(1, 5), F(0)), "men": (F(0), F(0), F(0)), "wind": (F(3, 5), F(1, 5), F(0))}
NAMES = ["roof", "tie", "snow", "men", "wind"]


def combinations() -> dict[str, list[F]]:
    """Factors of roof, tie, snow, men, wind; EN 1990:2002 6.5.3 and eq. 6.10 (from memory)."""
    rows = {"permanent": [F(1), F(1), F(0), F(0), F(0)], "quasi-permanent": [F(1), F(1)] + [PSI[n][2] for n in PSI]}
    for kind, permanent, tie, lead, beside in [
            ("characteristic", F(1), F(1), lambda n: F(1), lambda n: PSI[n][0]),
            ("frequent", F(1), F(1), lambda n: PSI[n][1], lambda n: PSI[n][2]),
            ("fundamental", F("1.2"), F("0.9"), lambda n: F("1.6"), lambda n: F("1.6") * PSI[n][0])]:
        for leader in PSI:
            rows[f"{kind}, {leader} leading"] = [permanent, tie] + [
                lead(n) if n == leader else beside(n) for n in PSI]
    rows["erection"] = [F(1), F(0), F(0), F("1.5"), F(0)]
    return rows


def arc(rise: float, u: float) -> float:
    """Height at u from the middle of an arc of the given rise over the chord."""
    half = float(CHORD) / 2
    radius = (half**2 + rise**2) / (2 * rise)
    return rise - u * u / (radius + (radius**2 - u * u) ** 0.5)


def least_gap(line, fraction: float) -> float:
    """The rise whose greatest gap to the line is least, by ternary search on a fine grid whose
    best points are refined with a parabola."""
    n = 2000
    places = [float(LEFT) + float(CHORD) * i / n for i in range(n + 1)]
    wanted = [fraction * float(value_at(line, LEFT + CHORD * F(i, n))) for i in range(n + 1)]
    middle = float(LEFT + CHORD / 2)

    def gap(rise: float) -> float:
        gaps = [w - arc(rise, x - middle) for w, x in zip(wanted, places)]
        worst = 0.0
        for i in range(1, n):
            a, b, c = gaps[i - 1], gaps[i], gaps[i + 1]
            if abs(b) >= abs(a) and abs(b) >= abs(c):
                bend = a - 2 * b + c
                peak = b - (c - a) ** 2 / (8 * bend) if bend else b
                worst = max(worst, abs(peak))
        return worst

    low, high = 0.0, 0.1
    for _ in range(110):
        a, b = low + (high - low) / 3, high - (high - low) / 3
        if gap(a) < gap(b):
            high = b
        else:
            low = a
    return (low + high) / 2


def roof_beam() -> Case:
    case = Case("roof-beam", """
Statics and exact deflection lines (beam_line.py), factors of EN 1990:2002 (from memory), the
components of EN 1990:2002 A1.4.3 (from memory), the arc of least greatest gap by a search of its own;
its tolerance allows for the arc being followed by polynomials.""")
    e, b, h = F(11_500_000_000), mm(140), mm(480)
    ei = {"initial": Sums([(e, b, h, F(0))]).ei, "final": Sums([(e / F(9, 5), b, h, F(0))]).ei}
    weight = 420 * b * h * GRAVITY
    area = F(620) * F(16, 5)
    loads = {
        "roof": Loads(lines=[(weight + area, weight + area, F(0), LENGTH)]),
        "tie": Loads(couples=[(F(2500), RIGHT)]),
        "snow": Loads(lines=[(F(2400), F(5600), LEFT, RIGHT)]),
        "men": Loads(forces=[(F(1000), F(28, 5))]),
        "wind": Loads(lines=[(F(960), F(960), LEFT, RIGHT)]),
    }
    lines = {name: Line(load, LENGTH, LEFT, RIGHT) for name, load in loads.items()}
    lasting = [F(1), F(1), F(0), F(0), F(0)]
    made = {}
    for name, row in combinations().items():
        for time in ["initial", "final"]:
            slow = [min(f, l) if time == "final" else F(0) for f, l in zip(row, lasting)]
            weights = [(f - s) / ei["initial"] + s / ei["final"] for f, s in zip(row, slow)]
            line = combined([(w, lines[n]) for w, n in zip(weights, NAMES)])
            made[name, time] = line
            at = f'combinations["{name}"].{time}'
            value, place = greatest(line)
            case.exact(f"{at}.deflection.greatest.value_m", value)
            case.exact(f"{at}.deflection.greatest.at_m", place, LENGTH)
            case.exact(f'{at}.spans["left to right"].deflection.greatest.value_m', greatest(line, LEFT, RIGHT)[0])
            for support in ["left", "right"]:
                total = sum((f * getattr(lines[n], support) for f, n in zip(row, NAMES)), F(0))
                case.exact(f'{at}.reactions["{support}"].force_N', total)
            case.bits(f"{at}.moment.greatest.value_Nm")
            case.bits(f'{at}.stresses["beam"].tension.value_Pa')
    chosen = "characteristic, snow leading"

    def difference(first, second):
        return [(a, b, [x - y for x, y in zip(c, d)]) for (a, b, c), (_, _, d) in zip(first, second)]

    permanent, grown = made["permanent", "initial"], made["permanent", "final"]
    total = made[chosen, "final"]
    at = f'components["{chosen}"].spans["left to right"]'
    for symbol, line in [("w_inst", made[chosen, "initial"]), ("w_1", permanent),
                         ("w_2", difference(grown, permanent)), ("w_3", difference(total, grown)),
                         ("w_tot", total)]:
        case.exact(f"{at}.{symbol}.value_m", greatest(line, LEFT, RIGHT)[0])
    rise = F(20, 1000)
    target = least_gap(made["quasi-permanent", "final"], 1.2)
    assert 0.020 < target < 0.025
    case.add("camber.target_m", target, "1e-7")
    case.exact("camber.rise_m", rise)
    case.exact("camber.radius_m", (CHORD**2 / 4 + rise**2) / (2 * rise))
    for i in range(9):
        u = float(CHORD * F(i, 8) - CHORD / 2)
        case.exact(f"camber.ordinates[{i}].ordinate_m", arc(0.02, u), rise)
    case.add(f"{at}.w_c.value_m", rise, "1e-7")
    case.bits(f"{at}.w_max.value_m")
    case.bits(f'camber.remaining["{chosen}"].final.greatest.value_m')
    w_inst = greatest(made[chosen, "initial"], LEFT, RIGHT)[0]
    case.exact("limits[3].value_m", w_inst)
    case.exact("limits[3].utilisation", w_inst / 0.035)
    erection = made["erection", "final"]
    case.exact("limits[5].utilisation", greatest(erection, LEFT, RIGHT)[0] / float(CHORD / 150))
    case.exact("limits[6].value_m", float(value_at(erection, LENGTH)))
    for i in range(7):
        case.bits(f"limits[{i}].value_m")
        case.bits(f"limits[{i}].utilisation")
    own = combined([(1 / ei["initial"], Line(Loads(lines=[(weight, weight, F(0), LENGTH)]), LENGTH, F(2), F(46, 5)))])
    ends = [float(value_at(own, x)) for x in (LEFT, RIGHT)]
    for i in range(9):
        share = i / 8
        sag = float(value_at(own, LEFT + CHORD * F(i, 8)))
        u = float(CHORD * F(i, 8) - CHORD / 2)
        reading = arc(0.02, u) - sag + ends[0] * (1 - share) + ends[1] * share
        case.exact(f"camber.readings[{i}].standing_m", reading, rise)
    return case
