"""The golden case rafter: a pitched member by statics.

The member rises by a to the right; a pin holds its foot, a roller the vertical movement of its top.
Loads: q per length and s per length of the plan, both downward; a force F along the member at its
top; a straight tendon P at the eccentricity e below the axis. With p = q + s cos a the load per
length, the parts square to and along the member are p cos a and -p sin a, both supports bear p L/2
upward, and F is borne by the foot alone.
"""

import math

from number_tools import greatest
from write_expect import Case

LENGTH, PITCH = 5.0, math.radians(20.0)
DEAD, BRACE, TENDON, BELOW, SNOW = 400.0, -6000.0, 10000.0, 0.05, 1500.0
WIDTH, HEIGHT, MODULUS, CREEP = 0.08, 0.22, 11e9, 0.6
AREA, SECOND = WIDTH * HEIGHT, WIDTH * HEIGHT**3 / 12
CLOSE = "1e-12"


class Loaded:
    """Forces under (dead and prestress and brace) x g and snow x s."""

    def __init__(self, g: float, s: float) -> None:
        sine, cosine = math.sin(PITCH), math.cos(PITCH)
        self.load = g * DEAD + s * SNOW * cosine
        self.push, self.pull = g * BRACE, g * TENDON
        self.up = self.load * LENGTH / 2
        self.foot = self.up - self.push * sine
        self.level = -self.push * cosine

    def axial(self, x: float) -> float:
        """The foot pushes up along the member, the load pulls back."""
        sine = math.sin(PITCH)
        return self.push - self.pull - self.up * sine + self.load * sine * x

    def moment(self, x: float) -> float:
        return self.load * math.cos(PITCH) * x * (LENGTH - x) / 2 - self.pull * BELOW

    def sag(self) -> float:
        """EI times the deflection of midspan from the chord."""
        square = self.load * math.cos(PITCH)
        return 5 * square * LENGTH**4 / 384 - self.pull * BELOW * LENGTH**2 / 8

    def stress(self, x: float, z: float) -> float:
        return self.axial(x) / AREA - self.moment(x) * z / SECOND


def rafter() -> Case:
    case = Case("rafter", """
Statics of a pitched member (rafter.py); w = 5 q L^4/(384 EI) - P e L^2/(8 EI) from the chord. Every action but the
snow is permanent, and psi_2 of the snow is 0.""")
    for combination, g, s in [("permanent", 1.0, 0.0), ("quasi-permanent", 1.0, 0.0),
                              ("characteristic", 1.0, 1.0), ("fundamental", 1.35, 1.5)]:
        found = Loaded(g, s)
        for time in ["initial", "final"]:
            at = f'combinations["{combination}"].{time}'
            case.add(f'{at}.reactions["foot"].force_N', found.foot, CLOSE)
            case.add(f'{at}.reactions["foot"].along_N', found.level, CLOSE)
            case.add(f'{at}.reactions["top"].force_N', found.up, CLOSE)
            case.add(f"{at}.axial.minimum.value_N", found.axial(0.0), CLOSE)
            ends = [found.axial(0.0), found.axial(LENGTH)]
            case.add(f"{at}.axial.maximum.value_N", max(ends), CLOSE, max(map(abs, ends)))
            case.add(f"{at}.moment.maximum.value_Nm", found.moment(LENGTH / 2), CLOSE, found.pull * BELOW)
            case.add(f"{at}.moment.minimum.value_Nm", -found.pull * BELOW, CLOSE)
            # The quasi-permanent share creeps.
            lasting = Loaded(1.0, 0.0)
            sag = found.sag() + (CREEP * lasting.sag() if time == "final" else 0.0)
            case.add(f'{at}.spans["foot to top"].deflection.{"maximum" if sag > 0 else "minimum"}.value_m',
                     sag / (MODULUS * SECOND), "1e-11")
            edges = [-HEIGHT / 2, HEIGHT / 2]
            tension = max(greatest(lambda x: found.stress(x, z), 0.0, LENGTH) for z in edges)
            press = -max(greatest(lambda x: -found.stress(x, z), 0.0, LENGTH) for z in edges)
            peak = max(abs(tension), abs(press))
            case.add(f'{at}.stresses["rafter"].tension.value_Pa', tension, CLOSE, peak)
            case.add(f'{at}.stresses["rafter"].compression.value_Pa', press, CLOSE, peak)
    case.add("member.pitch_rad", PITCH, "1e-15")
    case.fields(["foot", "top"], ["rafter"])
    case.more(["axial.greatest.value_N", 'reactions["foot"].along_N'])
    return case
