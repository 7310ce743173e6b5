"""Layers and joints of a section: what they are given, where they stand, what is wrong with them."""

from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    Band, BeamcoreError, Joint, Layer, Material, MergedLayer, Part, Quantity, Section, rectangle,
    timber,
)
from beamcore.units import GPa, MPa, N, kN, m, mm

WOOD = Material("wood", 11*GPa, creep_factor=0.6).with_values(shear_modulus=690*MPa)
STONE = Material("stone", 31*GPa, creep_factor=2.5)
JOIST = Part("joist", rectangle(100*mm, 220*mm), WOOD)
SLAB = Part("slab", rectangle(600*mm, 70*mm), STONE).above(JOIST)
LOWER, UPPER = Layer("lower", [JOIST]), Layer("upper", ["slab"])


def joined(*joints: Joint, parts: tuple[Part, ...] = (JOIST, SLAB),
           layers: tuple[Layer, ...] = (LOWER, UPPER)) -> Section:
    return Section(parts, layers=layers, joints=joints)


def slipping(**more: Any) -> Joint:
    return Joint.slipping("screws", LOWER, UPPER, modulus="133 N/mm2", **more)


def near(found: Quantity | None, expected: Quantity, tolerance: float = 1e-12) -> bool:
    assert found is not None
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_layers_tell_what_they_are_given() -> None:
    short = Layer("plates", [JOIST, "slab"], from_=0.8*m, to="4.2 m")
    assert (short.name, short.parts, short.extent) == ("plates", ("joist", "slab"), (0.8*m, 4.2*m))
    assert LOWER.extent is None and UPPER.parts == ("slab",)
    assert short != Layer("plates", [JOIST, "slab"]) and UPPER == Layer("upper", [SLAB])
    assert repr(UPPER) == '<Layer "upper" of ["slab"]>'


def test_joints_tell_what_they_are_given() -> None:
    beside: dict[str, Any] = {"gap": 20*mm, "transverse": "9 N/mm2", "clearance": 0.5*mm,
                              "creep": 1.2}
    bands = [Band(0*m, 1*m, 100*mm), Band("1 m", "3 m", spacing="200 mm")]
    made = [
        Joint.rigid("a", LOWER, "upper", gap=20*mm),
        Joint.loose("b", "lower", UPPER, gap=20*mm, transverse="9 N/mm2", creep=1.2),
        slipping(**beside),
        Joint.fasteners("d", LOWER, UPPER, stiffness="10 kN/mm", rows=2, planes=1, spacing=150*mm,
                        **beside),
        Joint.fasteners("e", LOWER, UPPER, stiffness=10*kN/mm, rows=2, planes=3, bands=bands),
        Joint.glue("f", LOWER, UPPER, shear_modulus=4*MPa, width=80*mm, thickness=2*mm),
    ]
    assert [joint.kind for joint in made] == [
        "rigid", "loose", "slipping", "fasteners", "fasteners", "glue"
    ]
    assert all((joint.lower, joint.upper) == ("lower", "upper") for joint in made)
    rigid, loose, slip, nails, banded, glue = made
    assert (rigid.gap, rigid.transverse, rigid.creep) == (20*mm, None, None)
    assert (loose.transverse, loose.clearance, loose.creep) == (9*N/mm**2, None, 1.2)
    assert (slip.name, slip.modulus, slip.clearance) == ("screws", 133*N/mm**2, 0.5*mm)
    assert (nails.rows, nails.planes, nails.spacing, nails.bands) == (2, 1, 150*mm, None)
    assert nails.stiffness == 10*kN/mm and nails.modulus is None
    assert (banded.rows, banded.planes, banded.spacing) == (2, 3, None)
    assert banded.bands == tuple(bands)
    assert (glue.shear_modulus, glue.width, glue.thickness) == (4*MPa, 80*mm, 2*mm)
    assert (glue.rows, glue.stiffness, slip.width, rigid.modulus) == (None, None, None, None)
    # k = rows planes K/spacing, and k = G b/t.
    assert near(nails.modulus_at(2*m), 2 * 10*kN/mm / (150*mm))
    assert near(banded.modulus_at(0.5*m), 6 * 10*kN/mm / (100*mm))
    assert near(banded.modulus_at(2*m), 6 * 10*kN/mm / (200*mm))
    assert banded.modulus_at(3.5*m) == 0*N/m**2
    assert near(glue.modulus_at(2*m), 4*MPa * 80*mm / (2*mm))
    assert rigid.modulus_at(1*m) is None and loose.modulus_at(1*m) is None
    assert (bands[1].from_, bands[1].to, bands[1].spacing) == (1*m, 3*m, 200*mm)
    assert repr(bands[1]) == "Band(from_=1 m, to=3 m, spacing=200 mm)"
    assert repr(rigid) == '<rigid joint "a" from "lower" to "upper">'


def test_a_joint_at_its_place() -> None:
    section = joined(slipping(creep=1.2, clearance="0.5 mm"))
    [placed] = section.placed_joints
    assert placed == section.joint("screws") == section.joint(section.joints[0])
    assert placed.joint == section.joints[0] == slipping(creep=1.2, clearance=0.5*mm)
    assert (placed.z, placed.width, placed.distance) == (110*mm, 100*mm, 0*mm)
    assert (placed.creep_factor, placed.clearance) == (1.2, 0.5*mm)
    assert placed.creep_basis == "creep factor of the joint as given"
    assert placed.places == () and placed.extent is None
    assert placed.transverse_modulus_at(1*m, "final") is None
    assert placed.slip_modulus_at(1*m, "initial") == 133*N/mm**2
    assert near(placed.slip_modulus_at(1*m, "final"), 133*N/mm**2 / 2.2)
    assert repr(placed) == '<PlacedJoint "screws" at z = 110 mm, 100 mm wide>'
    assert (section.layers, [layer.name for layer in Section([JOIST]).layers]) == (
        (LOWER, UPPER), ["section"]
    )

    short = Layer("upper", ["slab"], from_=1*m, to=3*m)
    band = Band(2*m, 4*m, 100*mm)
    nails = Joint.fasteners("nails", "lower", "upper", stiffness=1*kN/mm, rows=1, planes=1,
                            bands=[band], creep=0.5, transverse=3*N/mm**2)
    placed = joined(nails, layers=(LOWER, short)).joint("nails")
    assert placed.places == (1*m, 2*m, 3*m, 4*m) and placed.extent == (1*m, 3*m)
    assert [placed.slip_modulus_at(x*m, "initial") for x in (1.5, 2.5, 3.5)] == [
        0*N/mm**2, 10*N/mm**2, 0*N/mm**2
    ]
    assert near(placed.transverse_modulus_at(1.5*m, "final"), 2*N/mm**2)
    assert joined(Joint.rigid("a", LOWER, UPPER)).joint("a").slip_modulus_at(1*m, "final") is None
    wood = timber("C24", service_class=1)
    both = (Part("joist", rectangle(1*m, 1*m), wood), Part("slab", rectangle(1*m, 1*m), wood))
    creep = joined(slipping(), parts=(both[0], both[1].above("joist"))).joint("screws")
    # 2 k_def of equal wood-based layers, EN 1995-1-1:2004 2.3.2.2 (from memory).
    assert creep.creep_factor == 1.2 and "2 k_def" in creep.creep_basis


def test_rigid_joints_merge_layers() -> None:
    topping = Part("topping", rectangle(600*mm, 20*mm), STONE).above(SLAB)
    section = joined(slipping(creep=1), Joint.rigid("bond", UPPER, "top"),
                     parts=(JOIST, SLAB, topping), layers=(LOWER, UPPER, Layer("top", [topping])))
    assert section.merged_layers == (
        MergedLayer(["lower"], ["joist"]), MergedLayer(["upper", "top"], ["slab", "topping"])
    )
    assert (section.merged_layers[1].layers, section.merged_layers[1].parts) == (
        ["upper", "top"], ["slab", "topping"]
    )
    some = section.only([SLAB, "topping"])
    assert some.part_names == ("slab", "topping") and [j.name for j in some.joints] == ["bond"]
    assert some.part("slab").bottom == 110*mm
    with pytest.raises(beamcore.GeometryProblem):
        section.only(["joist", "topping"])
    with pytest.raises(beamcore.LookupProblem):
        section.only(["joyst"])


def test_shear_stiffness() -> None:
    """5/6 G b h by energy; of two alike side by side, the sum."""
    assert "energy" in beamcore.SHEAR_STIFFNESS_DEFINITION
    one: Quantity = 690*MPa * 100*mm * 220*mm * 5 / 6
    assert near(Section([JOIST]).shear_stiffness("initial"), one)
    assert near(Section([JOIST]).shear_stiffness("final"), one / 1.6)
    second = Part("second", rectangle(100*mm, 220*mm), WOOD).right_of(JOIST)
    assert near(Section([JOIST, second]).fastened_shear_stiffness("initial"), 2 * one)
    # Practice: faces 2 x 1 mm of 70 GPa (G 26 GPa), core 40 mm, E 10, G 5 MPa: 210.2 N per mm.
    face = Material("face", 70*GPa, 0).with_values(shear_modulus=26*GPa)
    core = Material("core", 10*MPa, 0).with_values(shear_modulus=5*MPa)
    middle = Part("middle", rectangle(1*mm, 40*mm), core)
    skin = rectangle(1*mm, 1*mm)
    panel = Section([middle, Part("a", skin, face).above(middle),
                     Part("b", skin, face).below(middle)])
    assert near(panel.shear_stiffness("initial"), 210.2*N, 5e-4)
    assert problems(lambda: Section([SLAB.at(0*m, 0*m)]).shear_stiffness("initial")) == [
        'materials["stone"].shear_modulus: found no shear modulus; expected a shear modulus or '
        "Poisson's ratio, without which there is no shear stiffness"
    ]
    with pytest.raises(beamcore.GeometryProblem, match="section.joints: found joints that let 2"):
        joined(slipping(creep=1)).shear_stiffness("initial")


def test_a_section_between_two() -> None:
    high = Section([Part("joist", rectangle(140*mm, 300*mm), WOOD)])
    between = Section([JOIST]).between(high, 0.25)
    assert near(between.part("joist").top, 120*mm)
    assert near(between.part("joist").right, 55*mm)
    unlike = Section([Part("other", rectangle(140*mm, 300*mm), WOOD)])
    with pytest.raises(beamcore.GeometryProblem, match="section.parts: found a taper between"):
        high.between(unlike, 0.5)


def test_mistakes_are_told() -> None:
    assert problems(lambda: joined(slipping(gap=1*mm, creep=1))) == [
        'section.joints["screws"].gap: found a gap of 1 mm, with a clear distance of 0 m between '
        'the layers "lower" and "upper"; expected the clear distance to 0.1 mm, or other places of '
        "the parts"
    ]
    assert problems(lambda: joined(slipping()))[0].startswith(
        'section.joints["screws"].creep: found no creep factor, with "wood", "stone", not known'
    )
    bad = Joint.fasteners("nails", LOWER, UPPER, stiffness=-1*kN/mm, rows=0, planes=1,
                          bands=[Band(2*m, 1*m, 0*mm)], creep=1)
    assert [problem.split(":")[0] for problem in problems(lambda: joined(bad))] == [
        f'section.joints["nails"].kind.fasteners.{key}'
        for key in ("stiffness", "rows", "bands[0].to", "bands[0].spacing")
    ]
    assert problems(lambda: joined()) == problems(lambda: Section([JOIST, SLAB], layers=[LOWER,
                                                                                        UPPER]))
    with pytest.raises(beamcore.BeamcoreError, match="layer"):
        Section([JOIST, SLAB], layers=[LOWER])
    with pytest.raises(beamcore.LookupProblem):
        joined(slipping(creep=1)).joint("nails")
    found = problems(lambda: Joint.glue("a", LOWER, UPPER, shear_modulus=1*kN, width="1",
                                        thickness=1*kN, gap=1*kN, transverse=1*kN, clearance=1*kN))
    assert [problem.split(":")[0] for problem in found] == [
        f"joint.{key}" for key in ("glue.shear_modulus", "glue.width", "glue.thickness", "gap",
                                   "transverse", "clearance")
    ]
    assert len(problems(lambda: Band("1", 1*kN, 1*kN))) == 3
    assert len(problems(lambda: Layer("a", ["b"], from_=1*kN, to="1"))) == 2


# As a caller without a type checker would write them.
ANY: Any = beamcore


@pytest.mark.parametrize("make", [
    lambda: ANY.Layer("a", ["b"], from_=1*m),
    lambda: ANY.Layer("a", ["b"], to=1*m),
    lambda: ANY.Joint("a", "b", "c"),
    lambda: ANY.Joint.slipping("a", "b", "c"),
    lambda: ANY.Joint.rigid("a", "b", "c", clearance=1*mm),
    lambda: ANY.Joint.fasteners("a", "b", "c", stiffness=1*N/m, rows=1, planes=1),
    lambda: ANY.Joint.fasteners("a", "b", "c", stiffness=1*N/m, rows=1, planes=1, spacing=1*m,
                                bands=[]),
    lambda: ANY.Joint.fasteners("a", "b", "c", stiffness=1*N/m, rows=1.5, planes=1, spacing=1*m),
])
def test_half_given_is_a_type_error(make: Callable[[], Any]) -> None:
    with pytest.raises(TypeError):
        make()
