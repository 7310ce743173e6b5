"""The golden case `shrinking-slab` through the typed way."""

from collections.abc import Iterator
from typing import Literal

from beamcore import (
    InitialStrain, Material, Member, Part, Section, permanent, pin, rectangle, roller, timber,
    uniform,
)
from beamcore.units import GPa, day, kN, m, mm, permille

Found = Iterator[tuple[str, float]]
Time = Literal["initial", "final"]
TIMES: tuple[Time, Time] = ("initial", "final")


def shrinking_slab() -> tuple[Section, Member]:
    concrete = Material("concrete", 31*GPa, creep_factor=2)
    joist = Part("joist", rectangle(120*mm, 240*mm), timber("C24", service_class=1))
    shrinkage = InitialStrain(-0.3*permille, curvature_y=0.0005/m)
    slab = Part("slab", rectangle(500*mm, 60*mm), concrete).above(joist)
    section = Section([joist, slab.with_initial_strain(shrinkage)])
    member = Member(
        section,
        8*m,
        supports=[pin("left", 0*m), roller("middle", 4*m), roller("right", 8*m)],
        actions=[permanent("load", uniform(1*kN/m), duration="permanent", start=28*day)],
    )
    return section, member


def answers() -> Found:
    response = shrinking_slab()[1].solve()
    for time in TIMES:
        at = f'combinations["permanent"].{time}'
        minimum = response.moment("permanent", time).minimum
        yield f"{at}.moment.minimum.value_Nm", minimum.value.si
        for support in ("left", "middle"):
            force = response.reaction("permanent", time, support).force
            yield f'{at}.reactions["{support}"].force_N', force.si
        for part in ("joist", "slab"):
            stress = response.stress("permanent", time, part)
            tension, compression = stress.greatest_tension, stress.greatest_compression
            yield f'{at}.stresses["{part}"].tension.value_Pa', tension.value.si
            yield f'{at}.stresses["{part}"].compression.value_Pa', compression.value.si
