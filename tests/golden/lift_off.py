"""The golden case lift-off: an overhang that stands on a post as long as it presses on it.

Where it presses, three moments over spans a and b: with M the moment over the middle support,
2 M (a + b) = -(q1 a^3 + q2 b^3)/4. Where it does not, statics of a span with an overhang.
"""

from fractions import Fraction as F

from beam_line import Line, Loads, greatest, value_at
from write_expect import Case, mm

A, B = F(3), F(5)
WEIGHT, LOAD = F(1200), F(4000)
EI = F(11_000_000_000) * mm(100) * mm(240) ** 3 / 12


def lift_off() -> Case:
    case = Case("lift-off", """
Three moments where the post bears, statics of a span with an overhang where it does not (lift_off.py). The load on
the long span lifts the overhang off its post; psi_2 is 0, and nothing creeps.""")
    length = A + B
    for combination, g, q in [("permanent", F(1), F(0)), ("quasi-permanent", F(1), F(0)),
                              ("characteristic", F(1), F(1)), ("fundamental", F(27, 20), F(3, 2))]:
        short, long = g * WEIGHT, g * WEIGHT + q * LOAD
        hogging = -(short * A**3 + long * B**3) / (8 * (A + B))
        post = short * A / 2 + hogging / A
        lifts = post < 0
        assert lifts == (q > 0)
        if lifts:
            post, hogging = F(0), -short * A**2 / 2
        end = long * B / 2 + hogging / B
        middle = short * A + long * B - post - end
        for time in ["initial", "final"]:
            at = f'combinations["{combination}"].{time}'
            if lifts:
                case.put(f'{at}.reactions["post"].force_N', f"0.0 {float(middle)!r} 1e-12")
            else:
                case.exact(f'{at}.reactions["post"].force_N', post)
            case.exact(f'{at}.reactions["middle"].force_N', middle)
            case.exact(f'{at}.reactions["end"].force_N', end)
            case.exact(f"{at}.moment.minimum.value_Nm", hogging)
            case.exact(f"{at}.moment.maximum.value_Nm", end**2 / (2 * long))
            line = Line(Loads(forces=[(-post, F(0))], lines=[(short, short, F(0), A), (long, long, A, length)]),
                        length, A, length)
            value, place = greatest(line.pieces)
            case.add(f"{at}.deflection.greatest.value_m", value / float(EI), "1e-11")
            case.add(f"{at}.deflection.greatest.at_m", place, "1e-9", 8.0)
            if lifts:
                lifted = value_at(line.pieces, F(0)) / EI
                case.exact(f'{at}.deflection.minimum.value_m', lifted)
                case.add(f'{at}.deflection.minimum.at_m', 0.0, "1e-12", 8.0)
            stress = max(-hogging, end**2 / (2 * long)) * mm(120) / (EI / 11_000_000_000)
            case.exact(f'{at}.stresses["beam"].tension.value_Pa', stress)
    case.fields(["post", "middle", "end"], ["beam"])
    case.more(["steps"])
    return case
