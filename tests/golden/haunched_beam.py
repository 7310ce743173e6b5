"""The golden case haunched-beam by the force method, with shear, without beamcore.

Spans 6 m and 4 m; the moment M0 over the wall, which a rotational spring holds, is the redundant
force, found from the least complementary energy; a hinge at 8 m gives the moment over the column by
statics. Integrals of m M/EI, m kappa_T and v V/kGA by Gauss's rule over stretches without kinks.
Deflections by the unit-load theorem. The column stands on a spring and sinks. Springs do not creep.
"""

from number_tools import greatest, integral
from write_expect import Case

COLUMN, HINGE, END = 6.0, 8.0, 10.0
TURN, SPRING = 4e6, 8e6
WIDTH, HEIGHT, DEEP = 0.14, 0.36, 0.6
E, G, ALPHA, CREEP = 11.6e9, 0.65e9, 5e-6, 0.6
CUTS = [0.0, 4.0, COLUMN, HINGE, END]
LOAD, SUNK, WARM = 4000.0, 0.005, 15.0
CLOSE = "1e-10"


def height(x: float) -> float:
    """The taper from 4 m to the column; right of the column the first section again."""
    return HEIGHT + (DEEP - HEIGHT) * (x - 4.0) / 2.0 if 4.0 < x < COLUMN else HEIGHT


class Statics:
    """Forces from a line load q and the moment M0 over the wall."""

    def __init__(self, q: float, m0: float) -> None:
        self.q, self.m0 = q, m0
        over_column = -4 * q
        self.left = (over_column - m0 + 18 * q) / 6
        self.column = 9 * q - self.left
        self.end = q

    def moment(self, x: float) -> float:
        total = self.m0 + self.left * x - self.q * x**2 / 2
        return total if x < COLUMN else total + self.column * (x - COLUMN)

    def shear(self, x: float) -> float:
        return self.left - self.q * x + (self.column if x > COLUMN else 0.0)


class Solved:
    """One load case at one time: line load, settlement of the column, temperature difference."""

    def __init__(self, q: float, sunk: float, warm: float, soft: float) -> None:
        self.soft, self.sunk, self.warm = soft, sunk, warm
        unit, without = Statics(0.0, 1.0), Statics(q, 0.0)
        self.forces = without
        gap = self.work(unit) + unit.column * self.sink()
        # A unit of M0 strains the member and both springs.
        stiff = Solved.__new__(Solved)
        stiff.soft, stiff.sunk, stiff.warm, stiff.forces = soft, 0.0, 0.0, unit
        give = stiff.work(unit) + unit.column * stiff.sink() + 1 / TURN
        self.forces = Statics(q, -gap / give)

    def sink(self) -> float:
        return self.sunk + self.forces.column / SPRING

    def work(self, virtual) -> float:
        """The internal work of virtual forces."""
        def inside(x: float) -> float:
            h = height(x)
            bent = self.forces.moment(x) * self.soft / (E * WIDTH * h**3 / 12) - ALPHA * self.warm / h
            slid = self.forces.shear(x) * self.soft / (5 / 6 * G * WIDTH * h)
            return virtual.moment(x) * bent + virtual.shear(x) * slid
        return integral(inside, CUTS)

    def at_hinge(self) -> float:
        """The deflection of the hinge: the unit load there lifts the wall and is borne by the column."""
        return self.work(UnitAtHinge) + 4 / 3 * self.sink()


class UnitAtHinge:
    """A unit load on the tip of the part left of the hinge."""

    @staticmethod
    def moment(x: float) -> float:
        return -x / 3 if x < COLUMN else (x - HINGE if x < HINGE else 0.0)

    @staticmethod
    def shear(x: float) -> float:
        return -1 / 3 if x < COLUMN else (1.0 if x < HINGE else 0.0)


def haunched_beam() -> Case:
    case = Case("haunched-beam", """
Force method with bending, shear and springs, integrals by Gauss's rule (haunched_beam.py, own derivation). kGA = 5/6 G b h;
a temperature difference dT bends a free member by alpha dT/h. Load and sinking are permanent, the sun has psi_2 = 0.""")
    lasting = {"initial": [(1.0, Solved(LOAD, SUNK, 0.0, 1.0))],
               "final": [(1.0, Solved(LOAD, SUNK, 0.0, 1.0 + CREEP))]}
    sun = Solved(0.0, 0.0, WARM, 1.0)
    for combination, psi in [("permanent", 0.0), ("quasi-permanent", 0.0), ("characteristic", 1.0)]:
        for time in ["initial", "final"]:
            terms = lasting[time] + [(psi, sun)]
            at = f'combinations["{combination}"].{time}'

            def total(of) -> float:
                return sum(factor * of(term) for factor, term in terms)

            case.add(f'{at}.reactions["wall"].force_N', total(lambda s: s.forces.left), CLOSE)
            case.add(f'{at}.reactions["wall"].couple_Nm', total(lambda s: s.forces.m0), CLOSE)
            case.add(f'{at}.reactions["column"].force_N', total(lambda s: s.forces.column), CLOSE)
            case.add(f'{at}.reactions["end"].force_N', LOAD, CLOSE)
            moments = [total(lambda s: s.forces.moment(x)) for x in (0.0, COLUMN)]
            case.add(f"{at}.moment.minimum.value_Nm", min(moments), CLOSE)
            sagging = greatest(lambda x: total(lambda s: s.forces.moment(x)), 0.0, COLUMN)
            case.add(f"{at}.moment.maximum.value_Nm", sagging, CLOSE)
            case.add(f"{at}.deflection.greatest.value_m", total(Solved.at_hinge), CLOSE)
            case.add(f"{at}.deflection.greatest.at_m", HINGE, "1e-12")
            # The greatest moment over the smallest section stands just right of the column.
            stress = -moments[1] * (HEIGHT / 2) / (WIDTH * HEIGHT**3 / 12)
            case.add(f'{at}.stresses["beam"].tension.value_Pa', stress, CLOSE)
    for time, soft in [("initial", 1.0), ("final", 1.6)]:
        case.add(f"section.{time}.shear_stiffness_N", 5 / 6 * G / soft * WIDTH * HEIGHT, "1e-12")
        case.add(f"member.changes[0].{time}.bending_stiffness_yy_Nm2",
                 E / soft * WIDTH * DEEP**3 / 12, "1e-12")
    case.fields(["wall", "column", "end"], ["beam"])
    case.more(["rotation.greatest.value_rad"])
    return case
