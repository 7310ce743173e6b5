"""The golden case `odd-section` through the typed way."""

from collections.abc import Iterator
from typing import Literal

from beamcore import (
    Material, Member, Part, Response, Section, angle, channel, disc, permanent, point, polygon,
    rectangle, ring, self_weight, uniform, variable,
)
from beamcore.units import GPa, kg, kN, m, mm

Found = Iterator[tuple[str, float]]
Time = Literal["initial", "final"]
Sideways = Literal["held", "free"]
TIMES: tuple[Time, Time] = ("initial", "final")


def odd_section() -> tuple[Section, Member]:
    oak = Material("oak", 9.5*GPa, creep_factor=0.6, density=690*kg/m**3)
    steel = Material("steel", 210*GPa, creep_factor=0, density=7850*kg/m**3)
    trapezium = polygon([(y*mm, z*mm) for y, z in ((-60, -150), (-40, -180), (40, -180),
                                                   (60, -150))])
    stem = Part("stem", rectangle(120*mm, 300*mm), oak)
    foot = Part("foot", trapezium, oak)
    section = Section([
        stem,
        Part("bar", disc(24*mm), steel).set_into("stem", -30*mm, -120*mm),
        foot,
        Part("head", trapezium, oak).mirror_of(foot, "level"),
        Part("channel", channel(100*mm, 40*mm, 8*mm, 6*mm), steel).at(-80*mm, 0*mm),
        Part("cheek", angle(90*mm, 70*mm, 8*mm), steel).right_of(stem),
        Part("pipe", ring(60*mm, 5*mm), steel).below("foot").with_line_mass(9*kg/m),
    ])
    actions = [
        permanent("dead", self_weight(), uniform(4*kN/m)),
        variable("crane", point(6*kN, 2*m), category="E"),
    ]
    return section, Member.simple_span(section, 5*m, actions, sideways="free")


def answers() -> Found:
    section, member = odd_section()
    response = member.solve()
    for time in TIMES:
        yield from stiffness(section, time)
        for combination in ("permanent", "quasi-permanent", "characteristic", "fundamental"):
            yield from fields(section, response, combination, time)


def stiffness(section: Section, time: Time) -> Found:
    found, at = section.stiffness(time), f"section.{time}"
    yield f"{at}.axial_stiffness_N", found.axial.si
    yield f"{at}.centroid_y_m", found.centroid_y.si
    yield f"{at}.centroid_z_m", found.centroid_z.si
    yield f"{at}.bending_stiffness_yy_Nm2", found.bending_yy.si
    yield f"{at}.bending_stiffness_zz_Nm2", found.bending_zz.si
    yield f"{at}.bending_stiffness_yz_Nm2", found.bending_yz.si
    yield f"{at}.principal_greater_Nm2", found.principal.greater.si
    yield f"{at}.principal_smaller_Nm2", found.principal.smaller.si


def fields(section: Section, response: Response, combination: str, time: Time) -> Found:
    at = f'combinations["{combination}"].{time}'
    deflection = response.deflection(combination, time).greatest
    yield f"{at}.deflection.greatest.value_m", deflection.value.si
    sideways = response.sideways(combination, time).greatest
    yield f"{at}.sideways.greatest.value_m", sideways.value.si
    for part in section.part_names:
        stress = response.stress(combination, time, part)
        tension, compression = stress.greatest_tension, stress.greatest_compression
        yield f'{at}.stresses["{part}"].tension.value_Pa', tension.value.si
        yield f'{at}.stresses["{part}"].compression.value_Pa', compression.value.si
