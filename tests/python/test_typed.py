"""The typed way: every class, against textbook values and against its own definitions."""

from typing import Any

import golden
import pytest

import beamcore
from beamcore import (
    ConcreteCreep, Material, Member, MetalStrength, Part, Quantity, Section, TimberStrength,
    concrete, fixed, partial, permanent, pin, point, rectangle, roller, self_weight, steel, timber,
    uniform, variable,
)
from beamcore.units import GPa, MPa, N, day, kN, kg, m, mm, s

Time = golden.Time


def near(found: Quantity | float, expected: Quantity | float, tolerance: float = 1e-12) -> bool:
    a = found.si if isinstance(found, Quantity) else found
    b = expected.si if isinstance(expected, Quantity) else expected
    return abs(a - b) <= tolerance * abs(b)


def test_materials() -> None:
    c24 = timber("C24", service_class=2)
    assert (c24.name, c24.modulus, c24.density) == ("C24", 11*GPa, 420*kg/m**3)
    # k_def, EN 1995-1-1:2004 Table 3.2 (from memory).
    assert c24.creep_factor == 0.8 and "service class 2" in c24.creep_basis
    assert c24.modulus_at("final") == 11*GPa / 1.8
    assert c24.modulus_at("initial") == c24.modulus
    assert c24.origin is not None and c24.origin.startswith("C24, EN 338:2016")
    assert c24.design_strength is None

    own = Material("own", "9.5 GPa", creep_factor=0.6)
    assert own.density is None and own.origin is None
    assert own.named("oak").name == "oak" and own.name == "own"
    assert steel("S275").creep_factor == 0
    assert concrete("C30/37", creep=2).creep_factor == 2.0


def test_creep_of_concrete() -> None:
    creep = ConcreteCreep(
        mean_strength="38 MPa", relative_humidity_percent=80, notional_size=200*mm,
        age_at_loading=7*day, age_at_end="1e12 d", cement="R",
    )
    # An independent script of EN 1992-1-1:2004 Annex B, f_cm = 38 MPa as in the core's own test.
    assert abs(creep.coefficient - 2.0303) <= 0.5e-4
    assert concrete("C30/37", creep).creep_factor == creep.coefficient
    assert (creep.mean_strength, creep.notional_size) == (38*MPa, 200*mm)
    assert (creep.age_at_loading, creep.cement) == (7*day, "R")
    assert creep.relative_humidity_percent == 80


def test_strengths() -> None:
    bending, tension, compression = 14.8*MPa, 8.9*MPa, 12.9*MPa
    timber_strength = TimberStrength(bending, tension, compression)
    assert timber_strength.bending == bending
    assert (timber_strength.tension, timber_strength.compression) == (tension, compression)
    strong = timber("C24", 1).with_design_strength(timber_strength)
    assert strong.design_strength == timber_strength
    metal = MetalStrength(yield_stress=275*MPa)
    assert steel("S275").with_design_strength(metal).design_strength == metal


def test_outline_and_part() -> None:
    outline = rectangle(75*mm, 220*mm)
    assert near(outline.area, 16500*mm**2)
    assert near(outline.second_moment_yy, 75*mm * (220*mm)**3 / 12)
    assert near(outline.second_moment_zz, 220*mm * (75*mm)**3 / 12)
    part = Part("joist", outline, timber("C24", 1))
    assert part.name == "joist" and part.outline == outline


def test_places_of_parts() -> None:
    """Two equal squares: the centroid lies half-way between them."""
    square, material = rectangle(100*mm, 100*mm), Material("a", 10*GPa, 0)
    base = Part("base", square, material)
    other = Part("other", square, material)
    for placed, y, z in [
        (other.left_of(base), -50, 0), (other.right_of("base"), 50, 0),
        (other.above(base), 0, 50), (other.below("base"), 0, -50),
        (other.at(100*mm, "200 mm"), 50, 100),
    ]:
        stiffness = Section([base, placed]).stiffness("initial")
        assert abs(stiffness.centroid_y.to(mm) - y) <= 1e-12
        assert abs(stiffness.centroid_z.to(mm) - z) <= 1e-12


def test_section() -> None:
    joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", 1))
    plate = Part("plate", rectangle(8*mm, 200*mm), steel("S275")).right_of(joist)
    section = Section([joist, plate])
    assert section.part_names == ("joist", "plate")
    assert section.notes == ()
    assert section.line_mass is not None
    assert near(section.line_mass, 420*kg/m**3 * (80*mm*200*mm) + 7850*kg/m**3 * (8*mm*200*mm))
    for time, modulus in {"initial": 11*GPa, "final": 11*GPa / 1.6}.items():
        when: Any = time
        stiffness = section.stiffness(when)
        timber_share: Quantity = modulus * 80*mm * (200*mm)**3 / 12
        steel_share: Quantity = 210*GPa * 8*mm * (200*mm)**3 / 12
        assert near(stiffness.axial, modulus*80*mm*200*mm + 210*GPa*8*mm*200*mm)
        assert near(stiffness.bending_yy, timber_share + steel_share)
        assert stiffness.bending_zz > 0*N*m**2
        assert abs(stiffness.bending_yz.si) <= 1e-12 * stiffness.bending_yy.si
        assert stiffness.moduli == (modulus, 210*GPa)
        assert near(stiffness.shares[0], timber_share / stiffness.bending_yy)
        assert near(sum(stiffness.shares), 1.0)
    gap = Section([joist, plate.at(1*m, 0*m)])
    assert len(gap.notes) == 1 and "joist" in gap.notes[0]
    assert Section([Part("a", rectangle(1*m, 1*m), Material("a", 1*GPa, 0))]).line_mass is None


def test_transformed_section() -> None:
    joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", 1))
    plate = Part("plate", rectangle(80*mm, 10*mm), steel("S275")).below(joist)
    section = Section([joist, plate])
    for name in ("C24", "S275"):
        transformed = section.transformed_to(name, "final")
        stiffness = section.stiffness("final")
        assert near(transformed.reference_modulus * transformed.area, stiffness.axial)
        assert near(transformed.centroid_z, stiffness.centroid_z)
        bending = transformed.reference_modulus * transformed.second_moment
        assert near(bending, stiffness.bending_yy)
    in_timber = section.transformed_to("C24", "initial")
    assert [part.name for part in in_timber.parts] == ["joist", "plate"]
    assert in_timber.parts[1].ratio == 210 / 11
    assert near(in_timber.parts[1].width, 80*mm * (210 / 11))
    assert near(in_timber.parts[1].top, -100*mm) and near(in_timber.parts[1].bottom, -110*mm)
    stress = in_timber.stress("plate", -110*mm, "1 kN m")
    arm = -110*mm - in_timber.centroid_z
    assert near(stress, -(210 / 11) * (1*kN*m) * arm / in_timber.second_moment)


E1, B, H, L = 10*GPa, 100*mm, 200*mm, 4*m
JOIST = Part("joist", rectangle(B, H), Material("wood", E1, creep_factor=0.5, density=500*kg/m**3))
EI = E1 * B * H**3 / 12


def test_simple_span_under_uniform_load() -> None:
    """5 q L^4/(384 EI), q L^3/(24 EI), q L^2/8, q L/2 (Roark Table 8.1 case 2e, from memory)."""
    q = 3*kN/m
    member = Member.simple_span(Section([JOIST]), L, actions=[permanent("floor", uniform(q))])
    assert (member.length, member.support_names, member.notes) == (4*m, ("left", "right"), ())
    response = member.solve()
    assert response.combinations == member.combinations
    assert response.residual < 1e-10
    for when, factor in {"initial": 1.0, "final": 1.5}.items():
        time: Any = when
        deflection = response.deflection("permanent", time)
        assert near(deflection.greatest.value, factor * 5 * q * L**4 / (384 * EI))
        assert near(deflection.greatest.at, 2*m)
        assert deflection.maximum == deflection.greatest
        assert abs(deflection.minimum.value.si) <= 1e-15
        slope = response.slope("permanent", time)
        assert near(slope.maximum.value, factor * q * L**3 / (24 * EI))
        assert near(slope.minimum.value, -factor * q * L**3 / (24 * EI))
    moment = response.moment("fundamental", "initial")
    assert near(moment.greatest.value, 1.35 * q * L**2 / 8)
    assert near(moment.value(1*m), 1.35 * q * 1*m * (L - 1*m) / 2)
    assert near(response.reaction("permanent", "initial", "left").force, q * L / 2)
    assert response.reaction("permanent", "initial", "left").couple == 0*N*m


def test_point_load_and_its_two_shears() -> None:
    """P a b/L and P b/L (Roark Table 8.1 case 1e, from memory)."""
    force, a = 8*kN, 1*m
    member = Member.simple_span(Section([JOIST]), L, actions=[permanent("a", point(force, a))])
    shear = member.solve().shear("permanent", "initial")
    sides = shear.sides(a)
    assert near(sides.left, 6*kN) and near(sides.right, -2*kN)
    assert shear.value(a) == sides.right
    assert shear.stations_m.tolist() == [0, 1, 4]
    moment = member.solve().moment("permanent", "initial").greatest
    assert near(moment.value, 6*kN*m) and moment.at == a


def test_cantilever_with_partial_load() -> None:
    member = Member(
        Section([JOIST]), L, supports=[fixed("wall", 0*m)],
        actions=[permanent("a", partial(2*kN/m, 1*m, 3*m), self_weight())],
    )
    response = member.solve()
    weight: Quantity = 500*kg/m**3 * B * H * (9.80665*m/s**2)
    reaction = response.reaction("permanent", "initial", "wall")
    assert near(reaction.force, 4*kN + weight * L)
    moment = response.moment("permanent", "initial").minimum
    assert near(moment.value, -(4*kN * 2*m + weight * L**2 / 2)) and moment.at == 0*m
    # Positive clockwise, with x to the right and z up: the wall turns the member up at its end.
    assert near(abs(reaction.couple), abs(moment.value))


def test_combinations_with_two_variable_actions() -> None:
    member = Member(
        Section([JOIST]), L, supports=[pin("a", 0*m), roller("b", 4*m)],
        actions=[
            permanent("dead", uniform(1*kN/m)),
            variable("snow", uniform(2*kN/m), psi_0=0.5, psi_1=0.2, psi_2=0.0),
            variable("live", uniform(3*kN/m), psi_0=0.7, psi_1=0.5, psi_2=0.3),
        ],
    )
    loads = {
        "permanent": 1.0, "quasi-permanent": 1 + 0.3*3,
        "characteristic, snow leading": 1 + 2 + 0.7*3,
        "characteristic, live leading": 1 + 3 + 0.5*2,
        "frequent, snow leading": 1 + 0.2*2 + 0.3*3,
        "frequent, live leading": 1 + 0.5*3,
        "fundamental, snow leading": 1.35 + 1.5*(2 + 0.7*3),
        "fundamental, live leading": 1.35 + 1.5*(3 + 0.5*2),
    }
    assert member.combinations == tuple(loads)
    response = member.solve()
    for combination, load in loads.items():
        greatest = response.moment(combination, "final").greatest.value
        assert near(greatest, load * 2*kN*m), combination


def test_stress_and_utilisation() -> None:
    strong = Material("wood", E1, 0, design_strength=TimberStrength(14*MPa, 8*MPa, 12*MPa))
    member = Member.simple_span(
        Section([Part("joist", rectangle(B, H), strong)]), L,
        actions=[permanent("floor", uniform(3*kN/m))],
    )
    response = member.solve()
    stress = response.stress("permanent", "initial", "joist")
    edge = (6*kN*m) / (B * H**2 / 6)
    assert near(stress.greatest_tension.value, edge)
    assert near(stress.greatest_compression.value, -edge)
    assert stress.greatest_tension.at == 2*m and stress.greatest_tension.z == -100*mm
    assert stress.greatest_compression.z == 100*mm
    assert near(stress.bottom.greatest.value, edge) and near(stress.top.greatest.value, -edge)
    assert abs(stress.centroid.greatest.value.si) <= 1e-12 * edge.si
    utilisation = response.utilisation("fundamental", "initial", "joist")
    assert utilisation is not None
    assert near(utilisation.value, 1.35 * edge / (14*MPa)) and utilisation.at == 2*m
    weak = Member.simple_span(Section([JOIST]), L, [permanent("floor", uniform(3*kN/m))])
    assert weak.solve().utilisation("fundamental", "final", "joist") is None


def test_camber() -> None:
    member = Member.simple_span(Section([JOIST]), L, [permanent("floor", uniform(3*kN/m))])
    response = member.solve()
    sag = response.deflection("permanent", "final").greatest.value
    camber = response.camber(
        shape="parabola", combination="permanent", time="final", fraction=0.5,
        from_="left", to="right",
        step=1*mm, rounding="up", divisions=4,
    )
    assert near(camber.target, sag / 2)
    assert 0*mm <= camber.rise - camber.target < 1*mm
    assert abs(camber.rise.to(mm) - round(camber.rise.to(mm))) <= 1e-9
    assert camber.chord == (0*m, 4*m)
    assert [near(o.ordinate, camber.rise * share, 1e-12) for o, share in
            zip(camber.ordinates[1:4], (0.75, 1, 0.75), strict=True)] == [True] * 3
    assert [o.station for o in camber.ordinates] == [0*m, 1*m, 2*m, 3*m, 4*m]
    assert camber.ordinate(2*m) == camber.rise
    with pytest.raises(beamcore.PositionProblem):
        camber.ordinate(4.1*m)


def test_supports_actions_and_loads_tell_what_they_are() -> None:
    assert [make(name, 1*m).kind for make, name in ((pin, "a"), (roller, "b"), (fixed, "c"))] == [
        "pin", "roller", "fixed"
    ]
    assert pin("a", "1 m").at == 1*m and pin("a", 1*m).name == "a"
    loads = [self_weight(), uniform(1*N/m), partial(1*N/m, 0*m, 1*m), point(1*N, 0*m)]
    assert [load.kind for load in loads] == ["self_weight", "uniform", "partial", "point"]
    dead = permanent("dead", *loads)
    live = variable("live", *loads, psi_0=0.7, psi_1=0.5, psi_2=0.3)
    assert (dead.name, dead.kind, live.name, live.kind) == ("dead", "permanent", "live", "variable")
