"""The golden runner in Python: `golden.py job FOLDER` answers the golden cases through job text,
`golden.py typed` through the typed way.

A line of an answer is CASE<TAB>PATH<TAB>BITS, the bits of the number as 16 hexadecimal digits.
"""

import struct
import sys
from collections.abc import Callable, Iterator
from functools import partial as partial_of
from pathlib import Path
from typing import Literal

import golden_along
import golden_layers
import golden_odd_section
import golden_roof_beam
import golden_shrinking_slab

from beamcore import Job, Member, Response, Section
from beamcore import ConcreteCreep, Material, concrete, steel, timber
from beamcore import Part, fixed, partial, permanent, point, rectangle, roller, self_weight
from beamcore import uniform, variable
from beamcore.units import GPa, MPa, N, day, kN, kg, m, mm

Time = Literal["initial", "final"]
TIMES: tuple[Time, Time] = ("initial", "final")


def line(case: str, path: str, value: float) -> str:
    return f"{case}\t{path}\t{struct.pack('>d', value).hex()}"


def lines(file: Path) -> list[str]:
    text = file.read_text(encoding="utf-8")
    return [line for line in text.splitlines() if line and not line.startswith("#")]


def job(folder: Path) -> tuple[list[str], list[str]]:
    """The answers through job text, and what misses its tolerance."""
    answers, misses = [], []
    for case in lines(folder / "cases.txt"):
        outcome = Job.open(folder / f"{case}.toml").solve()
        for expectation in lines(folder / f"{case}.expect"):
            *numbers, path = expectation.split(" ", 3)
            value = outcome.number(path)
            answers.append(line(case, path, value))
            if numbers == ["-", "-", "-"]:
                continue
            expected, peak, tolerance = map(float, numbers)
            if not abs(value - expected) <= tolerance * peak:
                misses.append(f"{case} {path}: {value} is not {expected} within {tolerance}")
    return answers, misses


def flitch() -> tuple[Section, Member]:
    c24, s275 = timber("C24", service_class=1), steel("S275")
    left = Part("left joist", rectangle(47*mm, 220*mm), c24).left_of("plate")
    plate = Part("plate", rectangle(10*mm, 200*mm), s275)
    right = Part("right joist", rectangle(47*mm, 220*mm), c24).right_of(plate)
    section = Section([left, plate, right])
    floor = permanent("floor", uniform(5*N/mm))
    return section, Member.simple_span(section, 4*m, actions=[floor])


def two_span() -> tuple[Section, Member]:
    oak = Material("oak", 9.5*GPa, creep_factor=0.6, density=690*kg/m**3)
    brass = Material("brass", 100*GPa, creep_factor=0, density=8500*kg/m**3)
    beam = Part("beam", rectangle(120*mm, 240*mm), oak)
    strip = Part("strip", rectangle(100*mm, 6*mm), brass).below(beam)
    section = Section([beam, strip])
    member = Member(
        section,
        7.5*m,
        supports=[fixed("wall", 0*m), roller("post", 3.2*m), roller("end", 6.9*m)],
        actions=[
            permanent("own weight", self_weight()),
            permanent("partition", partial(2.4*kN/m, 1.1*m, 5.3*m), point(3.5*kN, 7.5*m)),
            variable(
                "store", uniform(3.1*kN/m), point(4.2*kN, 1.6*m), psi_0=1.0, psi_1=0.9, psi_2=0.8
            ),
        ],
    )
    return section, member


def slab_strip() -> tuple[Section, Member]:
    creep = ConcreteCreep(
        mean_strength=38*MPa,
        relative_humidity_percent=55,
        notional_size=140*mm,
        age_at_loading=28*day,
        age_at_end=18250*day,
        cement="N",
    )
    joist = Part("joist", rectangle(100*mm, 220*mm), timber("C24", service_class=1))
    slab = Part("slab", rectangle(600*mm, 70*mm), concrete("C30/37", creep)).above(joist)
    section = Section([joist, slab])
    dead = permanent("dead", self_weight(), uniform(0.9*kN/m))
    live = variable("live", uniform(1.7*kN/m), psi_0=0.7, psi_1=0.5, psi_2=0.3)
    return section, Member.simple_span(section, 5.4*m, actions=[dead, live])


def typed() -> list[str]:
    """The answers through the typed way."""
    answers = []
    for case, (section, member) in {
        "flitch": flitch(),
        "two-span": two_span(),
        "slab-strip": slab_strip(),
    }.items():
        response = member.solve()
        answers += [line(case, *found) for found in stiffnesses(section)]
        answers += [line(case, *found) for found in fields(section, member, response)]
        if case == "slab-strip":
            answers += [line(case, *found) for found in camber(response)]
    answers += [line("roof-beam", *found) for found in golden_roof_beam.answers()]
    answers += [line("odd-section", *found) for found in golden_odd_section.answers()]
    answers += [line("shrinking-slab", *found) for found in golden_shrinking_slab.answers()]
    for case, member, more in along():
        response = member.solve()
        answers += [line(case, *found) for found in stiffnesses(member.section)]
        answers += [line(case, *found) for found in fields(member.section, member, response)]
        answers += [line(case, *found) for reader in more for found in reader(response)]
    return answers


Found = Iterator[tuple[str, float]]
Reader = Callable[[Response], Found]


def along() -> Iterator[tuple[str, Member, list[Reader]]]:
    """Members of layers and members that change along their length, with what is read beside the
    fields of every case."""
    for case, member, more in [
        ("screwed-floor", golden_layers.screwed_floor(), [golden_layers.composite_action]),
        ("clearance-floor", golden_layers.clearance_floor(), []),
        ("side-plates", golden_layers.side_plates(), []),
    ]:
        yield case, member, [partial_of(golden_layers.layered, member), *more]
    yield "rafter", golden_along.rafter(), [golden_along.of_rafter]
    yield "lift-off", golden_along.lift_off(), [golden_along.of_lift_off]
    yield "haunched-beam", golden_along.haunched_beam(), [golden_along.of_haunched_beam]


def stiffnesses(section: Section) -> Found:
    for time in TIMES:
        stiffness, at = section.stiffness(time), f"section.{time}"
        yield f"{at}.bending_stiffness_yy_Nm2", stiffness.bending_yy.si
        yield f"{at}.axial_stiffness_N", stiffness.axial.si
        yield f"{at}.centroid_z_m", stiffness.centroid_z.si


def fields(section: Section, member: Member, response: Response) -> Found:
    for combination in ["permanent", "quasi-permanent", "characteristic", "fundamental"]:
        for time in TIMES:
            at = f'combinations["{combination}"].{time}'
            deflection = response.deflection(combination, time).greatest
            yield f"{at}.deflection.greatest.value_m", deflection.value.si
            yield f"{at}.deflection.greatest.at_m", deflection.at.si
            slope = response.slope(combination, time).greatest
            yield f"{at}.slope.greatest.value_rad", slope.value.si
            shear = response.shear(combination, time).greatest
            yield f"{at}.shear.greatest.value_N", shear.value.si
            moment = response.moment(combination, time).greatest
            yield f"{at}.moment.greatest.value_Nm", moment.value.si
            for name in member.support_names:
                reaction = response.reaction(combination, time, name)
                yield f'{at}.reactions["{name}"].force_N', reaction.force.si
                yield f'{at}.reactions["{name}"].couple_Nm', reaction.couple.si
            for name in section.part_names:
                stress = response.stress(combination, time, name)
                tension, compression = stress.greatest_tension, stress.greatest_compression
                yield f'{at}.stresses["{name}"].tension.value_Pa', tension.value.si
                yield f'{at}.stresses["{name}"].compression.value_Pa', compression.value.si


def camber(response: Response) -> Found:
    camber = response.camber(
        shape="parabola",
        combination="quasi-permanent",
        time="final",
        fraction=1,
        from_="left",
        to="right",
        step=1*mm,
        rounding="nearest",
        divisions=6,
    )
    yield "camber.target_m", camber.target.si
    yield "camber.rise_m", camber.rise.si
    for i, ordinate in enumerate(camber.ordinates):
        yield f"camber.ordinates[{i}].ordinate_m", ordinate.ordinate.si


def main(arguments: list[str]) -> int:
    match arguments:
        case ["job", folder]:
            answers, misses = job(Path(folder))
        case ["typed"]:
            answers, misses = typed(), []
        case _:
            print("usage: golden.py job FOLDER | golden.py typed", file=sys.stderr)
            return 2
    print(*answers, sep="\n")
    for miss in misses:
        print(miss, file=sys.stderr)
    return 1 if misses else 0


if __name__ == "__main__":
    sys.exit(main(sys.argv[1:]))
