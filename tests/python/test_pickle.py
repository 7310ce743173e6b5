"""Pickling: what comes back is equal, and gives the same bits."""

import copy
import pickle
from pathlib import Path
from typing import Any

import golden
import golden_odd_section
import golden_roof_beam
import golden_shrinking_slab
import numpy as np
import pytest
import values_of_layers

import beamcore
from beamcore import (
    Camber, CharacteristicConcreteStrength, CharacteristicMetalStrength,
    CharacteristicTimberStrength, ConcreteCreep, ConcreteShrinkage, Extreme, Field, InitialStrain,
    Job, Limit, MetalFactors, MetalStrength, OwnCombination, Part, PartialFactors, Problem,
    Quantity, Section, SectionForces, TimberFactors, TimberStrength, Unit, aluminium, angle, area,
    channel, concrete, couple, disc, fixed, hollow_box, i_shape, partial, permanent, pin, point,
    polygon, rectangle, ring, roller, self_weight, steel, steel_of_thickness, tee, timber,
    trapezoidal, uniform, variable,
)
from beamcore.units import K, MPa, day, kN, m, mm, permille

JOB = Path(__file__).parents[1] / "golden" / "slab-strip.toml"
CREEP = ConcreteCreep(38*MPa, 50, 150*mm, 28*day, 18250*day, "N")
TIMBER = TimberStrength(14.8*MPa, 8.9*MPa, 12.9*MPa)
METAL = MetalStrength("275 MPa")
SECTION, MEMBER = golden.slab_strip()
RESPONSE = MEMBER.solve()
ODD, ODD_MEMBER = golden_odd_section.odd_section()
ODD_RESPONSE = ODD_MEMBER.solve()
SHRINKING, SHRINKING_MEMBER = golden_shrinking_slab.shrinking_slab()
FORCES = SectionForces("10 kN", 5*kN*m, moment_z=-1*kN*m)
TRIANGLE = [(0*mm, 0*mm), (1*m, 0*mm), (0*mm, 1*m)]
ROOF = golden_roof_beam.roof_beam()[1]
SHRINKAGE = ConcreteShrinkage(38*MPa, 50, 150*mm, 3*day, 18250*day, "N")
OAK = CharacteristicTimberStrength(30*MPa, 18*MPa, 23*MPa, 4*MPa, 0.6*MPa)


def camber() -> Camber:
    return RESPONSE.camber(
        shape="parabola", combination="quasi-permanent", time="final", fraction=0.8,
        from_="left", to="right",
        step="1 mm", rounding="up", divisions=4,
    )


def again(value: Any) -> Any:
    for protocol in range(2, pickle.HIGHEST_PROTOCOL):
        pickle.loads(pickle.dumps(value, protocol))
    return pickle.loads(pickle.dumps(value))


VALUES: list[Any] = [
    mm, kN/m, Unit("kip in2"), 75*mm, 5*kN/m * (4.2*m), (1*mm) / 3,
    K, 12e-6/K, 12e-6/K * (5*m),
    CREEP, TIMBER, METAL, SHRINKAGE, OAK, CharacteristicMetalStrength(275*MPa, 430*MPa),
    CharacteristicConcreteStrength(30*MPa, 38*MPa, 2.9*MPa),
    TimberFactors(0.8, 1.25, k_sys=1.1), MetalFactors(1.1),
    steel_of_thickness("S355", 20*mm).with_design_factors(MetalFactors(1.1)),
    aluminium("EN AW-6082 T6", "8 mm").with_design_shear_strength(90*MPa),
    timber("C24", 2).with_values(density="450 kg/m3", thermal_expansion=6e-6/K, creep=CREEP),
    timber("C24", 2).with_values(poisson_ratio=0.3).with_characteristic_strength(OAK),
    timber("C24", 2), steel("S355"), concrete("C30/37", CREEP), concrete("C25/30", 2.5),
    timber("GL24h", 1).named("ridge").with_design_strength(TIMBER),
    beamcore.Material("a", "10 GPa", 0.5, density="500 kg/m3", design_strength=METAL),
    beamcore.Material("a", "10 GPa", 0.5),
    rectangle(75*mm, 220*mm), disc("0.1 mm"), ring(60*mm, 5*mm), tee(9*mm, 8*mm, 2*mm, 1*mm),
    i_shape(200*mm, 100*mm, 10*mm, 120*mm, 12*mm, 6*mm), channel(9*mm, 8*mm, 2*mm, 1*mm),
    angle(9*mm, 8*mm, 1*mm), hollow_box(9*mm, 8*mm, 2*mm, 1*mm), polygon(TRIANGLE),
    polygon(TRIANGLE, [[(0.1*m, 0.1*m), (0.2*m, 0.1*m), (0.1*m, 0.2*m)]]),
    Part("a", disc(1*mm), steel("S235")).mirror_of("b", "upright").with_line_mass("9 kg/m"),
    Part("a", disc(1*mm), steel("S235")).set_into("b", 1*mm, "2 mm"),
    Part("a", disc(1*mm), timber("C24", 2)).material,
    InitialStrain(-0.3*permille, "0.1 /m", 0.7/m / 3), InitialStrain(12e-6/K * (80*K)),
    Part("a", disc(1*mm), steel("S235")).with_initial_strain(InitialStrain("1 permille")),
    SHRINKING, *SHRINKING.placed, SHRINKING.free_plane("final", "free"),
    SHRINKING.part("slab").initial_strain,
    ODD, *ODD.placed, ODD.part("bar").material, FORCES, ODD.stiffness("final").principal,
    *ODD.stress_extremes("channel", FORCES, sideways="free", time="final"),
    Part("a", rectangle(75*mm, 220*mm), steel("S235")),
    Part("a", rectangle(75*mm, 220*mm), steel("S235")).at(1*m, "2 m").above("b"),
    SECTION, SECTION.stiffness("final"), SECTION.transformed_to("C24", "final"),
    SECTION.transformed_to("C24", "final").parts[1],
    pin("left", 0*m), roller("r", 1*m), fixed("f", 2*m),
    self_weight(), uniform(1*kN/m), partial(1*kN/m, 1*m, 2*m), point(1*kN, 1*m),
    trapezoidal(1*kN/m, 2*kN/m, 1*m, 2*m), area("1 kN/m2", 3*m), couple(1*kN*m, 1*m),
    area(1*kN/m**2, 3*m, from_=1*m, to="2 m"),
    permanent("g", uniform(1*kN/m), favourable=True), variable("s", category="snow"),
    permanent("g", uniform(1*kN/m), duration="long", start="28 d"),
    variable("s", category="snow", duration="short", start=0.1*day),
    variable("s", category="snow").factors, PartialFactors(variable=1.6),
    OwnCombination("a", {"g": 1, "q": 0.5}, ultimate=True),
    ROOF.spans[0], ROOF.solve().combination("erection"), *golden_roof_beam.LIMITS,
    *ROOF.solve().check_limits(golden_roof_beam.LIMITS),
    golden_roof_beam.camber(ROOF.solve()),
    ROOF.solve().readings(
        golden_roof_beam.camber(ROOF.solve()), left=2*m, right=9*m, parts=["beam"]
    )[2],
    permanent("g", self_weight(), uniform(1*kN/m)),
    variable("q", point(1*kN, 2*m), psi_0=0.7, psi_1=0.5, psi_2=0.3),
    camber(), camber().ordinates[2],
    RESPONSE.deflection("fundamental", "final").greatest,
    RESPONSE.shear("fundamental", "final").sides(1*m),
    RESPONSE.reaction("fundamental", "final", "left"),
    RESPONSE.stress("fundamental", "final", "slab").greatest_tension,
    beamcore.Utilisation(0.5, 2*m),
    Problem("Unit", "a.b", "x", "y", 3),
    *values_of_layers.VALUES,
]


@pytest.mark.parametrize("value", VALUES)
def test_values_come_back_equal(value: Any) -> None:
    found = again(value)
    assert type(found) is type(value)
    assert found == value
    assert copy.deepcopy(value) == value
    assert str(found) == str(value) or " object at 0x" in str(value)


OBJECTS = [MEMBER, RESPONSE, Job.open(JOB), Job.open(JOB).solve(), *values_of_layers.OBJECTS]


@pytest.mark.parametrize("value", [*VALUES, *OBJECTS])
def test_objects_are_frozen(value: Any) -> None:
    assert type(value).__module__ == "beamcore"
    for name in ("extra", *(name for name in dir(value) if not name.startswith("_"))):
        with pytest.raises(AttributeError):
            setattr(value, name, 1)
    with pytest.raises(TypeError, match="not an acceptable base type"):
        type("Derived", (type(value),), {})


def test_equality_tells_values_apart() -> None:
    assert rectangle(75*mm, 220*mm) != rectangle(220*mm, 75*mm)
    assert timber("C24", 1) != timber("C24", 2)
    assert timber("C24", 1).named("a") != timber("C24", 1)
    assert pin("left", 0*m) != roller("left", 0*m)
    assert uniform(1*kN/m) != uniform(2*kN/m)
    assert permanent("g", uniform(1*kN/m)) != permanent("g")
    assert Extreme(1*mm, 2*m) != Extreme(1*mm, 1*m)
    assert SECTION.stiffness("initial") != SECTION.stiffness("final")


def test_a_quantity_keeps_its_bits_and_its_unit() -> None:
    for quantity in ((1*m) / 3, 0.1*mm, 7*kN/m * (0.3*m)):
        found: Quantity = again(quantity)
        assert found.si == quantity.si
        assert str(found) == str(quantity)
    # Both go on with the same bits.
    assert (again(1.3*kN) / mm).si == (1.3*kN / mm).si


FIELDS = {
    "deflection": (RESPONSE.deflection("fundamental", "final"), "values_m"),
    "span": (RESPONSE.span_deflection("fundamental", "final", "left to right"), "values_m"),
    "remaining": (RESPONSE.remaining("fundamental", "final", camber()), "values_m"),
    "component": (
        RESPONSE.deflection_component("w_max", "characteristic", "left to right", camber()),
        "values_m",
    ),
    "sideways": (ODD_RESPONSE.sideways("fundamental", "final"), "values_m"),
    "slope": (RESPONSE.slope("fundamental", "final"), "values_rad"),
    "shear": (RESPONSE.shear("fundamental", "final"), "values_N"),
    "moment": (RESPONSE.moment("fundamental", "final"), "values_Nm"),
    "bottom": (RESPONSE.stress("fundamental", "final", "slab").bottom, "values_Pa"),
    "centroid": (RESPONSE.stress("fundamental", "final", "slab").centroid, "values_Pa"),
    "top": (RESPONSE.stress("fundamental", "final", "slab").top, "values_Pa"),
    **values_of_layers.FIELDS,
}


@pytest.mark.parametrize("name", FIELDS)
def test_fields_come_back_with_their_bits(name: str) -> None:
    field, values = FIELDS[name]
    found: Field = again(field)
    x_m = np.linspace(0, field.stations_m[-1], 101)
    assert getattr(found, values)(x_m).tobytes() == getattr(field, values)(x_m).tobytes()
    assert found.greatest == field.greatest


def test_members_and_responses_come_back() -> None:
    for _, member in (golden.two_span(), golden.slab_strip(), golden_roof_beam.roof_beam(),
                      (ODD, ODD_MEMBER), (SHRINKING, SHRINKING_MEMBER),
                      (None, values_of_layers.MEMBER), (None, values_of_layers.RAFTER)):
        found = again(member)
        assert found.sideways == member.sideways
        assert found.length == member.length
        assert found.support_names == member.support_names
        assert found.partial_factors == member.partial_factors
        assert (found.section, found.changes) == (member.section, member.changes)
        assert (found.hinges, found.anchors) == (member.hinges, member.anchors)
        assert (found.shear, found.pitch) == (member.shear, member.pitch)
        response = again(member.solve())
        assert response.combinations == member.combinations
        for combination in member.combinations:
            peak = member.solve().moment(combination, "final").greatest
            assert response.moment(combination, "final").greatest == peak
    stress = RESPONSE.stress("fundamental", "final", "slab")
    assert again(stress).greatest_compression == stress.greatest_compression


def test_jobs_and_outcomes_come_back() -> None:
    for job in (Job.open(JOB), Job.read(JOB.read_text(encoding="utf-8"))):
        assert again(job).to_text() == job.to_text()
        assert again(job.solve()).json == job.solve().json


def test_errors_come_back() -> None:
    with pytest.raises(beamcore.UnitProblem) as caught:
        rectangle("75", "200 kN")
    found = again(caught.value)
    assert type(found) is beamcore.UnitProblem
    assert str(found) == str(caught.value)
    assert found.problems == caught.value.problems and len(found.problems) == 2
    assert (found.kind, found.path) == ("Unit", "rectangle.width")
