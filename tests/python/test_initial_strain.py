"""Initial strains of parts, durations of actions, outlines of transformed sections."""

import math
from typing import Any

import golden_shrinking_slab
import pytest

import beamcore
from beamcore import (
    BeamcoreError, InitialStrain, Material, Member, Part, Quantity, Section, angle, disc, permanent,
    rectangle, uniform, variable,
)
from beamcore.units import GPa, K, day, kN, m, mm, permille, year

WOOD = Material("wood", 10*GPa, creep_factor=0.5)
STEEL = Material("steel", 210*GPa, creep_factor=0)
NONE = InitialStrain(0*permille)
# As a caller without a type checker would write them.
ANY: Any = beamcore


def problems(make: Any) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_two_warm_strips_bend() -> None:
    """Steel 1 mm below aluminium 2 mm, warmer by 80 K: 4.3797e-4 per mm, a value of an independent
    script from Timoshenko's formula (J. Opt. Soc. Am. 11, 1925, 233)."""
    steel = Part("steel", rectangle(10*mm, 1*mm), STEEL)
    aluminium = Part("aluminium", rectangle(10*mm, 2*mm), Material("aluminium", 70*GPa, 0))
    steel = steel.with_initial_strain(InitialStrain(12e-6/K * (80*K)))
    aluminium = aluminium.with_initial_strain(InitialStrain(23e-6/K * (80*K))).above(steel)
    section = Section([steel, aluminium])
    plane = section.free_plane("initial", "held")
    # The strip that grows more is on top: the member bends upward.
    assert abs(plane.curvature_y.to("/mm") - -4.3797e-4) <= 5e-9
    assert plane.curvature_z.si == 0
    # Creep of no part, and no product moment: nothing changes with time or freedom sideways.
    later = section.free_plane("final", sideways="free").curvature_y
    assert abs((later - plane.curvature_y).si) <= 1e-12 * abs(later.si)


def test_the_strain_of_a_plane_at_a_point() -> None:
    """A section of one part takes all of its initial strain: no stress stays."""
    given = InitialStrain("0.4 permille", curvature_y="0.002 /m", curvature_z=-0.001/m)
    part = Part("a", angle(100*mm, 80*mm, 10*mm), WOOD).with_initial_strain(given)
    section = Section([part])
    plane = section.free_plane("final", "free")
    for found, expected in (
        (plane.axial, given.axial), (plane.curvature_y, given.curvature_y),
        (plane.curvature_z, given.curvature_z),
    ):
        assert abs(found.si - expected.si) <= 1e-12 * abs(expected.si)
    placed = section.part("a")
    strain = plane.strain_at(placed.centroid_y + 20*mm, placed.centroid_z - 30*mm)
    assert abs(strain.to(permille) - (0.4 + 0.002 * 30 + 0.001 * 20)) <= 1e-12
    assert repr(section.free_plane("final", "held")).startswith("<StrainPlane axial ")


def test_parts_tell_their_initial_strain() -> None:
    given = InitialStrain(-0.3*permille, curvature_y=0.0005/m, curvature_z="0.0002 /mm")
    assert given == InitialStrain("-0.3 permille", "0.0005 /m", "0.2 /m")
    assert given == InitialStrain(-0.0003, 0.0005/m, 0.2/m)
    assert (given.axial, given.curvature_y, given.curvature_z) == (-0.3*permille, 0.0005/m, 0.2/m)
    plain = Part("a", rectangle(10*mm, 20*mm), WOOD).at(40*mm, 30*mm)
    part = plain.with_initial_strain(given)
    assert plain.given_initial_strain == NONE and part.given_initial_strain == given
    assert plain != part
    mirrored = Part("b", rectangle(10*mm, 20*mm), WOOD).with_initial_strain(given)
    # A mirror image about the upright axis turns the curvature about that axis.
    section = Section([part, mirrored.mirror_of(part, "upright")])
    assert section.part("a").initial_strain == given
    assert section.part("b").initial_strain == InitialStrain(-0.3*permille, 0.0005/m, -0.2/m)


def test_initial_strains_that_are_none() -> None:
    assert problems(lambda: InitialStrain("-0.3 mm", curvature_z=2*kN)) == [
        'initial_strain.axial: found "-0.3 mm", which is a length; expected a strain (1, permille)',
        "initial_strain.curvature_z: found a force of 2000 N; expected a curvature (/m, /mm)",
    ]
    with pytest.raises(TypeError, match=r"initial_strain\.axial: a quantity such as"):
        ANY.InitialStrain(None)
    assert problems(lambda: InitialStrain(math.inf * permille)) == [
        "initial_strain.axial: found the plain number inf; expected a strain (1, permille)"
    ]
    with pytest.raises(TypeError):
        ANY.Part("a", rectangle(10*mm, 20*mm), WOOD).with_initial_strain("-0.3 permille")


def test_a_member_that_is_free_sideways_bears_no_initial_strain() -> None:
    section, load = golden_shrinking_slab.shrinking_slab()[0], [permanent("g", uniform(1*kN/m))]
    assert problems(lambda: Member.simple_span(section, 4*m, load, sideways="free")) == [
        'section.parts["slab"].initial_strain: found an initial strain in a member that is free '
        "sideways; expected a member that is held sideways"
    ]


def test_actions_tell_their_duration_and_start() -> None:
    plain = permanent("g", uniform(1*kN/m))
    assert plain.duration is None and plain.start is None
    dead = permanent("g", uniform(1*kN/m), duration="permanent", start="28 d")
    assert (dead.duration, dead.start) == ("permanent", 28*day)
    assert dead != plain and dead != permanent("g", uniform(1*kN/m), duration="permanent")
    live = variable("q", uniform(1*kN/m), category="A", duration="medium", start=1*year)
    assert (live.duration, live.start) == ("medium", 1*year)
    words = ("permanent", "long", "medium", "short", "instantaneous")
    assert [ANY.permanent("g", duration=word).duration for word in words] == list(words)


def test_durations_and_starts_that_are_none() -> None:
    assert problems(lambda: ANY.permanent("g", duration="brief")) == [
        'duration: found "brief"; expected one of "permanent", "long", "medium", "short", '
        '"instantaneous"'
    ]
    [problem] = problems(lambda: variable("q", category="A", start=2*m))
    assert problem.startswith("start: found a length of 2 m; expected a duration (")
    section = Section([Part("a", rectangle(10*mm, 20*mm), WOOD)])
    early = permanent("g", uniform(1*kN/m), start=-1*day)
    [problem] = problems(lambda: Member.simple_span(section, 1*m, [early]))
    assert problem == 'actions["g"].start: found -1 d; expected a duration of zero or more'


def test_transformed_outlines_have_the_transformed_area() -> None:
    """Exactly for straight edges, by chords for a disc."""
    wood = Part("wood", rectangle(90*mm, 200*mm), WOOD)
    rod = Part("rod", disc(30*mm), STEEL).below(wood)
    parts = Section([wood, rod]).transformed_to("wood", "initial").parts

    def area(corners: list[tuple[Quantity, Quantity]]) -> float:
        pairs = zip(corners, corners[1:] + corners[:1], strict=True)
        total: float = sum((a[0] * b[1] - b[0] * a[1]).to("mm2") for a, b in pairs)
        return total / 2

    [[square], [round_]] = [part.loops for part in parts]
    assert len(square) == 4 and abs(area(square) - 90 * 200) <= 1e-9
    exact = 21 * math.pi * 225
    assert 0.998 * exact <= area(round_) < exact
    width = max(y.si for y, _ in round_) - min(y.si for y, _ in round_)
    assert abs(width - parts[1].width.si) <= 1e-12
