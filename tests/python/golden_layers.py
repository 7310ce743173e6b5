"""The golden cases of layers that slip through the typed way."""

from collections.abc import Iterator
from typing import Literal

from beamcore import (
    Band, Joint, Layer, Material, Member, Part, Response, Section, permanent, pin, rectangle,
    roller, uniform, variable,
)
from beamcore.units import GPa, kN, m, mm

Found = Iterator[tuple[str, float]]
Time = Literal["initial", "final"]
TIMES: tuple[Time, Time] = ("initial", "final")
COMBINATIONS = ("permanent", "quasi-permanent", "characteristic", "fundamental")


def states() -> Iterator[tuple[str, Time, str]]:
    """Every combination at both times, with its path."""
    for combination in COMBINATIONS:
        for time in TIMES:
            yield combination, time, f'combinations["{combination}"].{time}'


def section(height: int, creep: float, joint: Joint) -> Section:
    """A slab of this height in mm on a joist, joined as told."""
    wood = Material("wood", 11*GPa, creep_factor=0.6)
    concrete = Material("concrete", 31*GPa, creep_factor=creep)
    joist = Part("joist", rectangle(100*mm, 220*mm), wood)
    slab = Part("slab", rectangle(600*mm, height*mm), concrete).above(joist)
    layers = [Layer("joist", [joist]), Layer("slab", [slab])]
    return Section([joist, slab], layers=layers, joints=[joint])


def screwed_floor() -> Member:
    bands = [Band(0*m, 1.2*m, 100*mm), Band(1.2*m, 4.2*m, 200*mm), Band(4.2*m, 5.4*m, 100*mm)]
    joint = Joint.fasteners("screws", "joist", "slab", stiffness=10*kN/mm, rows=1, planes=1,
                            bands=bands, creep=1.0)
    actions = [
        permanent("dead", uniform(2*kN/m), on="slab"),
        variable("live", uniform(1.7*kN/m), psi_0=0.7, psi_1=0.5, psi_2=0.3, on="slab"),
    ]
    return Member.simple_span(section(60, 2, joint), 5.4*m, actions)


def clearance_floor() -> Member:
    joint = Joint.fasteners("screws", "joist", "slab", stiffness="10 kN/mm", rows=2, planes=1,
                            spacing=150*mm, clearance=0.5*mm, creep=1.2)
    load = permanent("load", uniform(3*kN/m))
    return Member.simple_span(section(70, 2.5, joint), 6*m, [load])


def side_plates() -> Member:
    wood = Material("wood", 11*GPa, creep_factor=0.6)
    steel = Material("steel", 210*GPa, creep_factor=0)
    plate = rectangle(5*mm, 200*mm)
    joist = Part("joist", rectangle(94*mm, 220*mm), wood)
    parts = [joist, Part("left plate", plate, steel).left_of(joist),
             Part("right plate", plate, steel).right_of(joist)]
    layers = [Layer(part.name, [part]) for part in parts]
    joints = [
        Joint.loose(f"{side} bolts", layers[0], f"{side} plate", transverse="3 N/mm2", creep=0.6)
        for side in ("left", "right")
    ]
    supports = [pin("left", 0*m, under=["joist"]), roller("right", 4*m, under=[layers[0]])]
    floor = permanent("floor", uniform(5*kN/m), on=layers[0])
    return Member(Section(parts, layers=layers, joints=joints), 4*m, supports, [floor])


def layered(member: Member, response: Response) -> Found:
    """The joints that slip and the layers of a member."""
    for combination, time, state in states():
        for joint in member.section.joints:
            at, found = f'{state}.joints["{joint.name}"]', response.joint(combination, time, joint)
            yield f"{at}.slip.greatest.value_m", found.slip.greatest.value.si
            yield f"{at}.slip.left_m", found.slip.value(0*m).si
            yield f"{at}.flow.greatest.value_N_per_m", found.flow.greatest.value.si
            yield f"{at}.pressure.minimum.value_N_per_m", found.pressure.minimum.value.si
        for layer in member.section.layers:
            at, forces = f'{state}.layers["{layer.name}"]', response.layer(combination, time, layer)
            yield f"{at}.axial.greatest.value_N", forces.axial.greatest.value.si
            yield f"{at}.moment.greatest.value_Nm", forces.moment.greatest.value.si
            if member.has_deflections_of_layers:
                line = response.layer_deflection(combination, time, layer)
                yield f"{at}.deflection.greatest.value_m", line.greatest.value.si


def composite_action(response: Response) -> Found:
    for time in TIMES:
        at = f'combinations["characteristic"].{time}.composite_action'
        action = response.composite_action("characteristic", time)
        yield f"{at}.degree", action.degree
        yield f"{at}.effective_stiffness_Nm2", action.effective_stiffness.si
