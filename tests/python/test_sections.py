"""Sections of any outline: closed forms of shapes, places, principal axes, stress at a point."""

import math

import golden_odd_section
import pytest

import beamcore
from beamcore import (
    Material, Member, Outline, Part, PointStress, Quantity, Section, SectionForces, angle, channel,
    disc, hollow_box, i_shape, permanent, polygon, rectangle, ring, steel, tee, uniform,
)
from beamcore.units import GPa, MPa, kN, kg, m, mm

PLAIN = Material("plain", 1*GPa, creep_factor=0.5, density=1000*kg/m**3)
HARD = Material("hard", 200*GPa, creep_factor=0, density=8000*kg/m**3)
ANGLE = angle(100*mm, 100*mm, 10*mm)


def near(found: Quantity, expected: Quantity, tolerance: float = 1e-12) -> bool:
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def in_mm(outline: Outline) -> list[float]:
    """Area, centroid, second moments and perimeter in powers of mm."""
    return [
        outline.area.to("mm2"), outline.centroid_y.to(mm), outline.centroid_z.to(mm),
        outline.second_moment_yy.to("mm4"), outline.second_moment_zz.to("mm4"),
        outline.second_moment_yz.to("mm4"), outline.perimeter.to(mm),
    ]


def plates(*plates: tuple[float, float, float, float]) -> list[float]:
    """The same of plates (b, h, y, z), but the perimeter, by the parallel axes theorem."""
    a = sum(b * h for b, h, _, _ in plates)
    y = sum(b * h * y for b, h, y, _ in plates) / a
    z = sum(b * h * z for b, h, _, z in plates) / a
    return [
        a, y, z,
        sum(b * h**3 / 12 + b * h * (zi - z) ** 2 for b, h, _, zi in plates),
        sum(h * b**3 / 12 + b * h * (yi - y) ** 2 for b, h, yi, _ in plates),
        sum(b * h * (yi - y) * (zi - z) for b, h, yi, zi in plates),
    ]


ROUND = math.pi / 64
# Area, centroid, second moments and perimeter of each kind, worked out by hand.
SHAPES: dict[str, tuple[Outline, list[float]]] = {
    "rectangle": (rectangle(75*mm, 220*mm), [*plates((75, 220, 0, 0)), 590]),
    "polygon": (
        polygon([(10*mm, 0*mm), ("40 mm", "0 mm"), (10*mm, 60*mm)]),
        # b h/2, the centroid at a third, b h^3/36 and -b^2 h^2/72.
        [900, 20, 20, 30 * 60**3 / 36, 60 * 30**3 / 36, -(30**2) * 60**2 / 72,
         90 + math.hypot(30, 60)],
    ),
    "disc": (disc(20*mm), [100 * math.pi, 0, 0, ROUND * 20**4, ROUND * 20**4, 0, 20 * math.pi]),
    "ring": (
        ring(60*mm, wall_thickness=5*mm),
        [math.pi * 275, 0, 0, ROUND * (60**4 - 50**4), ROUND * (60**4 - 50**4), 0, 110 * math.pi],
    ),
    "i_shape": (
        i_shape(200*mm, 100*mm, 10*mm, 120*mm, 14*mm, 6*mm),
        [*plates((100, 10, 0, 95), (120, 14, 0, -93), (6, 176, 0, 2)), 828],
    ),
    "tee": (
        tee(150*mm, 200*mm, flange_thickness=20*mm, web_thickness=12*mm),
        [*plates((200, 20, 0, 65), (12, 130, 0, -10)), 700],
    ),
    "channel": (
        channel(100*mm, 40*mm, flange_thickness=8*mm, web_thickness=6*mm),
        [*plates((6, 100, -17, 0), (34, 8, 3, 46), (34, 8, 3, -46)), 348],
    ),
    "angle": (
        angle(90*mm, 70*mm, thickness=8*mm),
        [*plates((8, 90, -31, 0), (62, 8, 4, -41)), 320],
    ),
    "box": (
        hollow_box(100*mm, 200*mm, side_thickness=5*mm, plate_thickness=8*mm),
        [100 * 200 - 90 * 184, 0, 0, (100 * 200**3 - 90 * 184**3) / 12,
         (200 * 100**3 - 184 * 90**3) / 12, 0, 600 + 548],
    ),
}


@pytest.mark.parametrize("kind", SHAPES)
def test_shapes_have_their_closed_forms(kind: str) -> None:
    outline, expected = SHAPES[kind]
    assert outline.kind == kind
    for found, value in zip(in_mm(outline), expected, strict=True):
        assert abs(found - value) <= 1e-12 * max(abs(value), 1)


def test_sizes_of_outlines() -> None:
    i = SHAPES["i_shape"][0]
    assert (i.width, i.height) == (120*mm, 200*mm)
    triangle = SHAPES["polygon"][0]
    assert near(triangle.width, 30*mm) and near(triangle.height, 60*mm)
    assert repr(triangle) == "<polygon of 3 points, 0 holes>"
    assert repr(ring(60*mm, 5*mm)) == "<ring 60 mm x 60 mm>"


def test_holes_of_a_polygon() -> None:
    def loop(width: float, height: float) -> list[list[Quantity]]:
        return [[y * width*mm, z * height*mm] for y, z in ((-1, -1), (1, -1), (1, 1), (-1, 1))]

    box = polygon(loop(50, 100), holes=[loop(45, 92)])
    for found, value in zip(in_mm(box), SHAPES["box"][1], strict=True):
        assert abs(found - value) <= 1e-12 * max(abs(value), 1)
    assert box != polygon(loop(50, 100))


def test_parts_tell_what_they_are_given() -> None:
    part = Part("bar", disc(24*mm), steel("S275"))
    assert part.material == steel("S275") and part.outline == disc(24*mm)
    assert part.given_line_mass is None
    assert part.with_line_mass("9 kg/m").given_line_mass == 9*kg/m


def test_a_mirror_image_stands_opposite() -> None:
    cheek = Part("cheek", angle(90*mm, 70*mm, 8*mm), HARD).at(50*mm, 20*mm)
    across = Part("across", angle(90*mm, 70*mm, 8*mm), HARD).mirror_of(cheek, "upright")
    under = Part("under", angle(90*mm, 70*mm, 8*mm), HARD).mirror_of("cheek", axis="level")
    section = Section([cheek, across])
    assert near(section.part("across").centroid_y, -section.part("cheek").centroid_y)
    assert section.part("across").centroid_z == section.part("cheek").centroid_z
    assert near(section.part("across").right, -15*mm)
    assert abs(section.stiffness("initial").bending_yz.si) <= 1e-12
    pair = [part.centroid_z for part in Section([cheek.at(0*mm, 60*mm), under]).placed]
    assert near(pair[1], -pair[0])


def test_what_is_set_in_displaces_its_host() -> None:
    host = Part("host", rectangle(200*mm, 300*mm), PLAIN)
    bar = Part("bar", disc(20*mm), HARD).set_into(host, 60*mm, "-110 mm")
    section = Section([host, bar])
    placed, inserted = section.placed
    assert (placed.name, placed.host, inserted.host) == ("host", None, "host")
    assert inserted == section.part("bar")
    assert (inserted.material, inserted.outline) == (HARD, disc(20*mm))
    round_: Quantity = math.pi * (10*mm) ** 2
    area: Quantity = 200*mm * (300*mm) - round_
    assert near(placed.area, area)
    assert near(placed.centroid_y, -(round_ * (60*mm)) / area)
    assert near(placed.centroid_z, round_ * (110*mm) / area)
    assert (placed.left, placed.right) == (-100*mm, 100*mm)
    assert (placed.bottom, placed.top) == (-150*mm, 150*mm)
    assert placed.line_mass is not None and near(placed.line_mass, 1000*kg/m**3 * area)
    assert near(section.stiffness("initial").axial, 1*GPa * area + 200*GPa * round_)
    assert section.notes == ()
    heavy = Section([host, bar.with_line_mass(3*kg/m)]).line_mass
    assert heavy is not None and near(heavy, 1000*kg/m**3 * area + 3*kg/m)


def test_principal_stiffnesses() -> None:
    """Mohr's circle keeps sum and determinant; an equal angle leans by 45 degrees."""
    stiffness = Section([Part("a", ANGLE, PLAIN)]).stiffness("initial")
    yy, zz, yz = stiffness.bending_yy, stiffness.bending_zz, stiffness.bending_yz
    principal = stiffness.principal
    assert abs(principal.angle.to("deg") - 45) <= 1e-9
    assert near(principal.greater + principal.smaller, yy + zz)
    product: float = principal.greater.si * principal.smaller.si
    assert abs(product - (yy.si * zz.si - yz.si**2)) <= 1e-12 * product
    # An independent script: 2.86583e6 and 0.73425e6 mm4, times 1 GPa.
    assert abs(principal.greater.si - 2865.83) <= 5e-3
    assert abs(principal.smaller.si - 734.25) <= 5e-3
    standing = Section([Part("a", rectangle(100*mm, 300*mm), PLAIN)]).stiffness("final").principal
    assert standing.angle.si == 0 and standing.greater > standing.smaller


def test_stress_at_a_point() -> None:
    """An angle under 2 kN m: values of an independent script, in MPa, from the heel."""
    section = Section([Part("a", ANGLE, PLAIN)])
    forces = SectionForces(0*kN, moment_y="2 kN m", moment_z=0*kN*m)
    for y, z, sideways, expected in [
        (0, 100, "free", -92.95), (10, 100, "free", -103.08), (0, 0, "free", 78.13),
        (100, 0, "free", -23.17), (0, 100, "held", -79.24),
    ]:
        word: golden_odd_section.Sideways = "free" if sideways == "free" else "held"
        stress = section.stress_at(
            "a", (y - 50)*mm, (z - 50)*mm, forces, sideways=word, time="initial"
        )
        assert abs(stress.to(MPa) - expected) <= 5e-3
    part = Part("a", ANGLE, PLAIN)
    greatest, least = section.stress_extremes(part, forces, sideways="free", time="final")
    assert isinstance(greatest, PointStress)
    assert abs(greatest.value.to(MPa) - 78.13) <= 5e-3
    assert near(least.y, -40*mm) and near(least.z, 50*mm)


def test_stress_under_all_section_forces() -> None:
    """N/A - M_y z/I_yy - M_z y/I_zz in each part, times its share of the modulus."""
    core = Part("core", rectangle(100*mm, 200*mm), PLAIN)
    section = Section([core, Part("bar", disc(20*mm), HARD).set_into(core, 0*mm, 0*mm)])
    forces = SectionForces(axial=30*kN, moment_y=4*kN*m, moment_z=1.5*kN*m)
    assert (forces.axial, forces.moment_y, forces.moment_z) == (30*kN, 4*kN*m, 1.5*kN*m)
    for modulus, time in ((1*GPa, "initial"), (1*GPa / 1.5, "final")):
        when: golden_odd_section.Time = "initial" if time == "initial" else "final"
        found = section.stiffness(when)
        y, z = 50*mm, -100*mm
        strain: float = (
            30*kN / found.axial - 4*kN*m * z / found.bending_yy - 1.5*kN*m * y / found.bending_zz
        )
        assert near(section.stress_at("core", y, z, forces, sideways="free", time=when),
                    strain * modulus)
        [_, least] = section.stress_extremes("bar", forces, sideways="held", time=when)
        strain = 30*kN / found.axial - 4*kN*m * (10*mm) / found.bending_yy
        assert near(least.value, 200*GPa * strain) and near(least.z, 10*mm)


def test_a_member_that_is_free_sideways() -> None:
    """w = 5 q L^4/(384 (EI_yy - EI_yz^2/EI_zz)) and v = w EI_yz/EI_zz."""
    section, load = Section([Part("a", ANGLE, PLAIN)]), [permanent("g", uniform(10*kN/m))]
    stiffness = section.stiffness("initial")
    yy, zz, yz = stiffness.bending_yy, stiffness.bending_zz, stiffness.bending_yz
    member = Member.simple_span(section, 2*m, load, sideways="free")
    assert member.sideways == "free" and Member.simple_span(section, 2*m, load).sideways == "held"
    response = member.solve()
    w: Quantity = 5 * (10*kN/m) * (2*m) ** 4 / (384 * (yy - yz * yz / zz))
    for time, factor in (("initial", 1), ("final", 1.5)):
        when: golden_odd_section.Time = "initial" if time == "initial" else "final"
        down = response.deflection("permanent", when).greatest
        aside = response.sideways("permanent", when).greatest
        assert near(down.value, factor * w)
        assert near(aside.value, factor * w * (yz / zz)) and aside.value < 0*mm
        assert response.sideways("permanent", when).values_m([1.0])[0] == aside.value.si
    # q L^2/8 = 5 kN m, two and a half times the moment of the angle above.
    tension = response.stress("permanent", "initial", "a").greatest_tension
    compression = response.stress("permanent", "initial", "a").greatest_compression
    assert abs(tension.value.to(MPa) - 2.5 * 78.13) <= 2.5 * 5e-3
    assert near(tension.y, -50*mm) and near(tension.z, -50*mm) and near(tension.at, 1*m)
    assert near(compression.y, -40*mm) and near(compression.z, 50*mm)


def test_a_member_that_is_held_sideways() -> None:
    section, load = Section([Part("a", ANGLE, PLAIN).at(30*mm, 0*mm)]), uniform(10*kN/m)
    response = Member.simple_span(section, 2*m, [permanent("g", load)]).solve()
    assert response.sideways("permanent", "final").greatest.value == 0*mm
    tension = response.stress("permanent", "final", "a").greatest_tension
    assert near(tension.y, 30*mm) and near(tension.z, -50*mm)
    w: Quantity = 5 * (10*kN/m) * (2*m) ** 4 / (384 * section.stiffness("initial").bending_yy)
    assert near(response.deflection("permanent", "initial").greatest.value, w)


def test_the_part_that_is_not_there() -> None:
    section, _ = golden_odd_section.odd_section()
    with pytest.raises(beamcore.LookupProblem):
        section.part("sole")
    assert [part.name for part in section.placed] == list(section.part_names)
