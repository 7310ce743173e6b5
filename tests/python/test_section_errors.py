"""Sections of any outline: the words of the core for what is wrong with them."""

from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    BeamcoreError, Member, Outline, Part, Section, SectionForces, disc, i_shape, permanent, polygon,
    rectangle, ring, steel, uniform,
)
from beamcore.units import kN, kg, m, mm

S235 = steel("S235")
HOST = Part("host", rectangle(200*mm, 300*mm), S235)
BAR = Part("bar", disc(20*mm), S235)
BOW = polygon([(0*mm, 0*mm), (50*mm, 50*mm), (50*mm, 0*mm), (0*mm, 50*mm)])
CROSSING = (
    "found edge 1 from point 1 to point 2 and edge 3 from point 3 to point 4, which cross or "
    "touch; expected edges that meet only where one ends and the next begins"
)
# As a caller without a type checker would write them.
ANY: Any = beamcore


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_discs_that_overlap() -> None:
    """The lens of two circles of radius r at the distance r: r^2 (2 pi/3 - sqrt(3)/2)."""
    a, b = (Part(name, disc(100*mm), S235) for name in ("a", "b"))
    assert problems(lambda: Section([a, b.at(50*mm, 0*mm)])) == [
        'section.parts: found the parts "a" and "b", which overlap by 3070.92 mm2; '
        "expected parts that touch but do not overlap"
    ]
    assert Section([a, b.at(100*mm, 0*mm)]).part_names == ("a", "b")


def test_an_insert_that_reaches_out_of_its_host() -> None:
    assert problems(lambda: Section([HOST, BAR.set_into(HOST, 95*mm, 0*mm)])) == [
        'section.parts["bar"].place.set_into: found a part that reaches out of its host "host"; '
        "expected a place wholly within the host"
    ]
    assert problems(lambda: Section([HOST, BAR.set_into("hast", 0*mm, 0*mm)])) == [
        'section.parts["bar"].place.set_into: found the unknown part "hast"; '
        'expected one of the other parts: "host"'
    ]


def test_a_polygon_that_crosses_itself() -> None:
    assert problems(lambda: Section([Part("a", BOW, S235)])) == [
        f'section.parts["a"].outline.polygon.points: {CROSSING}'
    ]


@pytest.mark.parametrize("name", [name for name in vars(Outline) if not name.startswith("_")])
def test_an_impossible_outline_has_no_values(name: str) -> None:
    if name == "kind":
        assert BOW.kind == "polygon"
        return
    assert problems(lambda: getattr(BOW, name)) == [f"outline.polygon.points: {CROSSING}"]
    assert problems(lambda: getattr(polygon([]), name)) == [
        "outline.polygon.points: found 0 points; expected at least 3 points"
    ]
    assert problems(lambda: getattr(ring(60*mm, 30*mm), name)) == [
        "outline.ring.wall_thickness: found 30 mm, which leaves nothing inside; "
        "expected less than half of the diameter, 60 mm"
    ]


def test_all_mistakes_of_units_are_told_at_once() -> None:
    wrong: Any = 5
    found = problems(lambda: i_shape(1*kN, "2", wrong, 4*kg, 5*m, 6*mm))
    assert [problem.split(":")[0] for problem in found] == [
        "i_shape.height", "i_shape.top_width", "i_shape.top_thickness", "i_shape.bottom_width",
    ]
    assert problems(lambda: polygon([("1", 1*m), (1*m, 1*m)], [[(1*m, 1*m), (1*m, 1*kN)]])) == [
        'polygon.points[0][0]: found "1" without a unit; expected a length with one of the units '
        'm, mm, cm, in, ft, for example "1 m"',
        "polygon.holes[0][1][1]: found a force of 1000 N; expected a length (m, mm, cm, in, ft)",
    ]
    found = problems(lambda: BAR.set_into("host", 1*kN, "2"))
    assert [problem.split(":")[0] for problem in found] == [
        "place.set_into.y", "place.set_into.z"
    ]
    assert problems(lambda: BAR.with_line_mass(2*kN/m)) == [
        "line_mass: found a line load of 2000 N/m; expected a line mass (kg/m, lb/ft)"
    ]
    found = problems(lambda: SectionForces(1*m, "2", 3*kN))
    assert [problem.split(":")[0] for problem in found] == [
        "forces.axial", "forces.moment_y", "forces.moment_z"
    ]


def test_a_negative_line_mass() -> None:
    assert problems(lambda: Section([HOST.with_line_mass(-2*kg/m)])) == [
        'section.parts["host"].line_mass: found -2 kg/m; expected a line mass of zero or more'
    ]


def test_words_that_do_not_exist() -> None:
    word: Any = "loose"
    assert problems(lambda: BAR.mirror_of("host", word)) == [
        'place.mirror_of.axis: found "loose"; expected one of "upright", "level"'
    ]
    expected = ['sideways: found "loose"; expected one of "held", "free"']
    section, load = Section([HOST]), [permanent("g", uniform(1*kN/m))]
    assert problems(lambda: Member.simple_span(section, 1*m, load, sideways=word)) == expected
    forces = SectionForces(0*kN, 1*kN*m, 0*kN*m)
    assert problems(
        lambda: section.stress_extremes("host", forces, sideways=word, time="final")
    ) == expected
    assert problems(
        lambda: section.stress_at("x", 0*m, 0*m, forces, sideways="held", time="final")
    ) == ['part: found the unknown part "x"; expected one of "host"']


@pytest.mark.parametrize("point", [(1*mm,), (1*mm, 2*mm, 3*mm), "ab", 1*mm])
def test_what_is_no_point_is_a_type_error(point: Any) -> None:
    with pytest.raises(TypeError, match=r"polygon\.points\[1\]: a point \(y, z\) such as"):
        polygon([(0*mm, 0*mm), point])
    with pytest.raises(TypeError):
        ANY.polygon(1*mm)
