"""One value or more of every class of layers, joints, supports, loads and simplified methods."""

from typing import Any

from beamcore import (
    Anchor, Band, Gamma, Hinge, InitialStrain, Joint, Layer, LayerInput, LayerStress, Material,
    Member, Part, ReferenceLength, Section, SineLayers, axial, effective_spacing, fixed,
    free_strain, imposed_rotation, partial, permanent, pin, plan, prestress, rectangle, roller,
    settlement, step, taper, temperature, temperature_difference, variable,
)
from beamcore.units import GPa, K, MPa, N, kN, m, mm, permille, rad

WOOD = Material("wood", 11*GPa, creep_factor=0.6).with_values(shear_modulus=690*MPa)
JOIST = Part("joist", rectangle(100*mm, 220*mm), WOOD)
SLAB = Part("slab", rectangle(600*mm, 70*mm), WOOD).above(JOIST)
LOWER, UPPER = Layer("lower", [JOIST]), Layer("upper", [SLAB], from_=0*m, to=(1*m) / 0.17)
BANDS = [Band(0*m, "1.3 m", 0.1*m), Band(1.3*m, 6*m, (1*m) / 7)]
JOINT = Joint.fasteners("nails", LOWER, UPPER, stiffness="1.7 kN/mm", rows=2, planes=1,
                        bands=BANDS, creep=1.1)
SECTION = Section([JOIST, SLAB], layers=[LOWER, UPPER], joints=[JOINT])
LOAD = permanent("load", partial(3*kN/m, 0*m, 5*m), on=UPPER)
SUPPORTS = [
    pin("left", 0*m, spring=0.7*kN/mm, axial_spring="3 kN/mm", height=20*mm,
        holding={"upper": 0.1*m}),
    roller("middle", 3*m, one_way=True, under=[LOWER], rotational_spring=(900*kN*m) / 7),
    fixed("right", (1*m) / 0.15),
]
ANCHORS = [Anchor("notch", JOINT, at=0.3*m), Anchor("plate", "nails", 6*m, 0.7*kN/mm)]
HINGES = [Hinge.moment(1.1*m), Hinge.moment(1*m, "upper"), Hinge.shear(2*m), Hinge.butt(2*m, LOWER)]
MEMBER = Member(SECTION, (1*m) / 0.15, SUPPORTS, [LOAD], anchors=ANCHORS, hinges=[HINGES[3]],
                shear="flexible")
LOW, HIGH = (Section([Part("beam", rectangle(100*mm, h), WOOD)]) for h in (200*mm, "0.3 m"))
CHANGES = [step(1*m, HIGH), taper(2*m, "3.3 m", LOW)]
RAFTER = Member(LOW, 4*m, [pin("a", 0*m), roller("b", 4*m)], [permanent("snow", plan(1*kN/m))],
                changes=CHANGES, pitch="20 deg", shear="12 MN")
RESPONSE = MEMBER.solve()
FLOOR = Member(
    Section([JOIST, SLAB], layers=[LOWER, Layer("upper", [SLAB])], joints=[JOINT]), 6*m,
    [pin("a", 0*m), roller("b", 6*m)], [LOAD],
).solve()
[SPAN_BY_GAMMA] = FLOOR.simplified("permanent", "final", "gamma")
LAYERS = [LayerInput.rectangle(11*GPa, 0.1*m, 220*mm, 110*mm),
          LayerInput.rectangle(31*GPa, 600*mm, 70*mm, 255*mm)]
SPAN = ReferenceLength.span(6*m)
METHODS: list[Any] = [Gamma(LAYERS, [9*N/mm**2], SPAN), SineLayers(LAYERS, ["9 N/mm2"], SPAN)]

VALUES: list[Any] = [
    LOWER, UPPER, *BANDS, JOINT, SECTION, *SECTION.placed_joints, *SECTION.merged_layers,
    Joint.rigid("a", "b", "c", gap=0.1*mm), Joint.loose("a", "b", "c", transverse=3*N/mm**2),
    Joint.slipping("a", "b", "c", modulus=(1*N/mm**2) / 3, clearance="0.1 mm", gap=7*mm),
    Joint.fasteners("a", "b", "c", stiffness=1*kN/mm, rows=1, planes=2, spacing=0.1*m),
    Joint.glue("a", "b", "c", shear_modulus=4*MPa, width=0.1*m, thickness="0.3 mm", creep=2),
    SECTION.only([SLAB]), LOW.between(HIGH, 1 / 3), *SUPPORTS, *ANCHORS, *HINGES, *CHANGES,
    CHANGES[1].section, MEMBER.section, MEMBER.section_at(1*m), RAFTER.section_at(2.9*m),
    *MEMBER.parts, *RAFTER.parts,
    plan(1*kN/m), plan(1*kN/m, 1*m, to="2 m"), axial(1*kN, 1*m, 0.1*m), settlement("a", 0.1*mm),
    prestress(7*kN, draped=[(0*m, 1*mm), ("1 m", "2 mm")]),
    prestress(7*kN, parabolic=((0*m, 1*mm), (1*m, 2*mm), [2*m, 0*mm])),
    imposed_rotation(SUPPORTS[2], 0.1*rad), temperature(5*K, [SLAB]), temperature(5*K),
    temperature_difference("5 K"), free_strain(SLAB, InitialStrain(0.1*permille)),
    LOAD, variable("snow", plan(1*kN/m), category="snow", on="upper"),
    FLOOR.composite_action("permanent", "final"),
    SPAN_BY_GAMMA, *SPAN_BY_GAMMA.joints, *SPAN_BY_GAMMA.layers,
    RESPONSE.reaction("permanent", "final", SUPPORTS[0]),
    SPAN, ReferenceLength.continuous("5 m"), ReferenceLength.cantilever((1*m) / 3), *LAYERS,
    LayerStress(1*MPa, "2 MPa"), effective_spacing(0.1*m, 0.5*m), *METHODS,
    *(method.shear_stresses(7*kN)[1] for method in METHODS), *METHODS[0].stresses(7*kN*m),
]

# Objects without equality.
OBJECTS: list[Any] = [
    MEMBER, RESPONSE.joint("permanent", "final", JOINT), RESPONSE.layer("permanent", "final", LOWER)
]

# Fields by name, each with the method that gives its values as an array.
FIELDS = {
    "axial": (RESPONSE.axial("permanent", "final"), "values_N"),
    "rotation": (RESPONSE.rotation("permanent", "final"), "values_rad"),
    "curvature": (RESPONSE.curvature("permanent", "final"), "values_per_m"),
    "layer deflection": (RESPONSE.layer_deflection("permanent", "final", UPPER), "values_m"),
    "slip": (RESPONSE.joint("permanent", "final", JOINT).slip, "values_m"),
    "flow": (RESPONSE.joint("permanent", "final", JOINT).flow, "values_N_per_m"),
    "pressure": (RESPONSE.joint("permanent", "final", JOINT).pressure, "values_N_per_m"),
    "layer force": (RESPONSE.layer("permanent", "final", LOWER).axial, "values_N"),
    "layer moment": (RESPONSE.layer("permanent", "final", "upper").moment, "values_Nm"),
}
