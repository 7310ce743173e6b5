"""Members of layers that slip: deflection, slip, flow, pressure, forces of layers, anchors."""

from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    Action, Anchor, BeamcoreError, CompositeAction, Hinge, InitialStrain, Joint, Layer, Material,
    Member, Part, Quantity, Section, Support, axial, free_strain, permanent, pin, point, rectangle,
    roller, uniform,
)
from beamcore.units import GPa, MPa, N, kN, m, mm, permille

# A slab of 600 x 70 mm on a joist of 100 x 220 mm, joined by 133.333 N/mm2, on 6 m: values of an
# independent script of the exact solution (Newmark, Siess, Viest 1951), to its digits.
WOOD = Material("wood", 11*GPa, creep_factor=0.6)
STONE = Material("stone", 31*GPa, creep_factor=2.5)
JOIST = Part("joist", rectangle(100*mm, 220*mm), WOOD)
SLAB = Part("slab", rectangle(600*mm, 70*mm), STONE).above(JOIST)
LOWER, UPPER = Layer("lower", [JOIST]), Layer("upper", [SLAB])
K: Quantity = 20*kN/mm / (150*mm)
L, Q = 6*m, 3*kN/m
LOAD = permanent("load", uniform(Q), on=UPPER)
EI_JOIST: Quantity = 11*GPa * 100*mm * (220*mm)**3 / 12
EI_SLAB: Quantity = 31*GPa * 600*mm * (70*mm)**3 / 12


def screws(**more: Any) -> Joint:
    return Joint.slipping("screws", LOWER, UPPER, modulus=K, **{"creep": 0.6, **more})


def floor(*actions: Action, joint: Joint | None = None, supports: tuple[Support, ...] = (),
          **more: Any) -> Member:
    section = Section([JOIST, SLAB], layers=[LOWER, UPPER], joints=[joint or screws()])
    held = supports or (pin("left", 0*m), roller("right", L))
    return Member(section, L, held, actions or (LOAD,), **more)


FLOOR = floor().solve()
JOINT = screws()


def near(found: Quantity, expected: Quantity, tolerance: float = 1e-9) -> bool:
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_a_slab_on_a_joist() -> None:
    deflection = FLOOR.deflection("permanent", "initial").greatest
    assert near(deflection.value, 11.139*mm, 5e-5) and near(deflection.at, 3*m)
    lower = FLOOR.layer("permanent", "initial", LOWER)
    upper = FLOOR.layer("permanent", "initial", "upper")
    assert near(lower.axial.greatest.value, 62906*N, 1e-5)
    assert near(upper.axial.value(2*m), -lower.axial.value(2*m))
    joint = FLOOR.joint("permanent", "initial", "screws")
    assert near(joint.slip.value(0*m), -joint.slip.value(L))
    assert near(abs(joint.flow.value(0*m)), 36.27*N/mm, 2e-4)
    assert near(abs(joint.slip.value(0*m)), 0.272*mm, 2e-3)
    assert near(joint.flow.value(1*m), K * joint.slip.value(1*m))
    # M = sum of the layers' own moments and of N_i times the arms, 145 mm apart.
    whole = lower.moment.value(2*m) + upper.moment.value(2*m) + lower.axial.value(2*m) * (145*mm)
    assert near(whole, FLOOR.moment("permanent", "initial").value(2*m))
    assert near(whole, Q * 2*m * 4*m / 2)
    central = floor(permanent("a", point(10*kN, 3*m), on="upper")).solve()
    assert near(central.deflection("permanent", "initial").greatest.value, 10.075*mm, 5e-5)
    assert near(FLOOR.deflection("permanent", "final").greatest.value, 20.75*mm, 5e-4)
    assert near(FLOOR.curvature("permanent", "initial").value(3*m),
                lower.moment.value(3*m) / EI_JOIST)
    assert FLOOR.steps("permanent", "initial") == 1 and FLOOR.lifted("permanent", "final") == ()


def test_fields_of_joints_and_layers_give_arrays() -> None:
    joint = FLOOR.joint("permanent", "initial", JOINT)
    assert joint.flow.values_N_per_m([0.0])[0] == joint.flow.value(0*m).si
    assert joint.pressure.values_N_per_m([1.0])[0] == joint.pressure.value(1*m).si
    assert joint.slip.values_m([1.0])[0] == joint.slip.value(1*m).si
    curvature = FLOOR.curvature("permanent", "initial")
    assert curvature.values_per_m([3.0])[0] == curvature.value(3*m).si
    forces = FLOOR.layer("permanent", "initial", "upper")
    assert forces.axial.values_N([3.0])[0] == forces.axial.value(3*m).si
    assert forces.moment.values_Nm([3.0])[0] == forces.moment.value(3*m).si
    for wrong in (joint.flow.values_m, curvature.values_rad, forces.axial.values_per_m):
        with pytest.raises(AttributeError, match="its values are values_"):
            wrong([0.0])


def test_a_slab_that_shrinks() -> None:
    """The values of the same script; the slip is opposite to that under the load."""
    shrinkage = permanent("shrinkage", free_strain(SLAB, InitialStrain(-0.3*permille)))
    response = floor(shrinkage).solve()
    assert near(response.deflection("permanent", "initial").greatest.value, 6.291*mm, 1e-4)
    joist = response.layer("permanent", "initial", "lower").axial.greatest.value
    assert near(joist, -15645*N, 5e-5)
    slip = response.joint("permanent", "initial", "screws").slip.value(0*m)
    assert near(abs(slip), 0.1892*mm, 5e-4)
    assert slip.si * FLOOR.joint("permanent", "initial", "screws").slip.value(0*m).si < 0


def test_composite_action() -> None:
    found = FLOOR.composite_action("permanent", "initial")
    assert isinstance(found, CompositeAction)
    loose: Quantity = 5 * Q * L**4 / (384 * (EI_JOIST + EI_SLAB))
    whole = floor().section.stiffness("initial").bending_yy
    assert near(found.loose, loose) and near(found.rigid, 5 * Q * L**4 / (384 * whole))
    assert near(found.deflection, 11.139*mm, 5e-5) and near(found.at, 3*m)
    assert found.degree == pytest.approx(
        (found.loose - found.deflection) / (found.loose - found.rigid), rel=1e-12
    )
    assert near(found.effective_stiffness, 5 * Q * L**4 / (384 * found.deflection))
    plain = Member.simple_span(Section([JOIST]), L, [permanent("a", uniform(Q))]).solve()
    with pytest.raises(beamcore.ValueProblem, match="section.joints: found a section whose layers"):
        plain.composite_action("permanent", "initial")


def test_simplified_methods_beside_the_exact_solution() -> None:
    """Gamma of the same floor: 11.175 mm and 41.41 N/mm against 11.139 mm and 36.27 N/mm."""
    [gamma] = FLOOR.simplified("permanent", "initial", "gamma")
    [sine] = FLOOR.simplified("permanent", "initial", "sine_layers")
    assert (gamma.span, gamma.length, sine.factors) == ("left to right", L, [])
    assert near(gamma.bending_stiffness, 4530.09*kN*m**2, 1e-5)
    assert gamma.factors == [1, pytest.approx(0.27195, abs=0.5e-5)]
    assert near(gamma.deflection.value, 11.175*mm, 5e-5)
    assert near(gamma.exact_deflection.value, 11.139*mm, 5e-5)
    assert gamma.difference == pytest.approx(11.175 / 11.139 - 1, rel=2e-2)
    assert near(sine.deflection.value, gamma.deflection.value)
    [joint], [joist, slab] = gamma.joints, gamma.layers
    assert (joint.joint, joist.layer, slab.layer) == ("screws", "lower", "upper")
    assert near(abs(joint.flow.value), 41.41*N/mm, 2e-4)
    assert near(abs(joint.exact_flow.value), 36.27*N/mm, 2e-4)
    assert near(joist.stress.axial, 2.823*MPa, 5e-4) and near(joist.at, 3*m)
    assert near(joist.exact_axial, 62906*N, 1e-5) and near(slab.exact_axial, -joist.exact_axial)
    assert joist.exact_moment > 0*N*m and gamma.warnings == sine.warnings != []
    wrong: Any = "beta"
    assert problems(lambda: FLOOR.simplified("permanent", "initial", wrong)) == [
        'method: found "beta"; expected one of "gamma", "sine_layers"'
    ]
    with pytest.raises(beamcore.ValueProblem, match="simplified methods do not cover"):
        floor(anchors=[Anchor("a", "screws", 0*m)]).solve().simplified(
            "permanent", "initial", "gamma")


def test_loose_layers_share_the_load() -> None:
    """Bent alike, each bears its share of EI, which presses on the joist."""
    response = floor(joint=Joint.loose("gap", LOWER, UPPER)).solve()
    joint = response.joint("permanent", "initial", "gap")
    share = EI_JOIST / (EI_JOIST + EI_SLAB)
    assert near(joint.pressure.value(2*m), Q * share)
    assert joint.flow.greatest.value == 0*N/m
    assert near(response.layer("permanent", "initial", LOWER).moment.value(3*m),
                Q * L**2 / 8 * share)


def test_layers_with_deflections_of_their_own() -> None:
    """EI (w_1 + w_2)'''' = q of two alike layers, whatever the modulus between them."""
    one = Part("one", rectangle(100*mm, 220*mm), WOOD)
    two = Part("two", rectangle(100*mm, 220*mm), WOOD).right_of(one)
    layers = [Layer("one", [one]), Layer("two", [two])]
    joint = Joint.loose("bolts", "one", "two", transverse="0.5 N/mm2", creep=0.6)
    section = Section([one, two], layers=layers, joints=[joint])
    supports = [pin("left", 0*m), roller("right", L)]
    member = Member(section, L, supports, [permanent("load", uniform(Q), on="one")],
                    hinges=[Hinge.moment(2*m, layers[1])])
    assert member.hinges == (Hinge.moment(2*m, "two"),)
    response = member.solve()
    moment = response.layer("permanent", "initial", "two").moment
    assert abs(moment.value(2*m).si) <= 1e-9 * abs(moment.greatest.value.si)
    whole = Member(section, L, supports, [permanent("load", uniform(Q), on=layers[0])]).solve()
    first, second = (whole.layer_deflection("permanent", "initial", layer).value(3*m)
                     for layer in ("one", layers[1]))
    assert first > second > 0*mm
    assert near((first + second) / 2, 5 * Q / 2 * L**4 / (384 * EI_JOIST))
    assert first == whole.deflection("permanent", "initial").value(3*m)
    assert member.has_deflections_of_layers and not floor().has_deflections_of_layers


def test_anchors_stop_the_slip() -> None:
    anchors = [Anchor("near", "screws", at=0*m), Anchor("far", screws(), at=L,
                                                        stiffness="200 kN/mm")]
    member = floor(anchors=anchors)
    assert member.anchors == tuple(anchors)
    assert (anchors[1].name, anchors[1].joint, anchors[1].at) == ("far", "screws", L)
    assert anchors[0].stiffness is None and anchors[1].stiffness == 200*kN/mm
    assert repr(anchors[0]) == '<Anchor "near" of "screws" at 0 m>'
    response = member.solve()
    slip = response.joint("permanent", "initial", "screws").slip
    assert abs(slip.value(0*m).si) <= 1e-15
    far = response.anchor_force("permanent", "initial", "far")
    assert near(far, 200*kN/mm * slip.value(L))
    # What the anchor takes is the axial force that the slab has at its end.
    end = response.layer("permanent", "initial", "upper").axial.value(0*m)
    assert near(abs(response.anchor_force("permanent", "initial", "near")), abs(end))
    assert response.deflection("permanent", "initial").greatest.value < 11.1*mm
    with pytest.raises(beamcore.LookupProblem, match='"near", "far"'):
        response.anchor_force("permanent", "initial", "middle")


def test_a_butt_joint_passes_no_axial_force() -> None:
    member = floor(hinges=[Hinge.butt(2*m, UPPER)])
    upper = member.solve().layer("permanent", "initial", UPPER)
    assert abs(upper.axial.value(2*m).si) <= 1e-9 * abs(upper.axial.greatest.value.si)
    assert abs(upper.moment.value(2*m)) > 1*N*m


def test_a_support_may_hold_one_layer() -> None:
    supports = (pin("left", 0*m, holding={"upper": 145*mm}), roller("right", L, under=[LOWER]))
    push = permanent("push", axial(50*kN, at=L, height=145*mm), on=UPPER)
    response = floor(push, joint=Joint.loose("gap", LOWER, UPPER), supports=supports).solve()
    held = response.layer_reaction("permanent", "initial", supports[0], UPPER)
    assert near(held, -50*kN)
    assert near(response.layer("permanent", "initial", "upper").axial.value(3*m), 50*kN)
    with pytest.raises(beamcore.LookupProblem):
        response.layer_reaction("permanent", "initial", "right", "upper")


def test_clearance_of_fasteners() -> None:
    """No. 10 with 0.5 mm: 16.652 mm by a closed form and by a boundary-value solver of SciPy."""
    response = floor(joint=screws(clearance="0.5 mm")).solve()
    assert near(response.deflection("permanent", "initial").greatest.value, 16.652*mm, 5e-5)
    assert response.steps("permanent", "initial") > 1


def test_mistakes_are_told() -> None:
    found = problems(lambda: floor(
        permanent("load", uniform(Q), axial(1*kN, 0*m, 0*m), on="uper"),
        supports=(pin("left", 0*m, under=["lwer"]), roller("right", L, holding={"side": 0*m})),
        anchors=[Anchor("a", "nails", 1*m, stiffness=-1*kN/mm)],
        hinges=[Hinge.butt(1*m, "lowr")],
    ))
    assert [problem.split(":")[0] for problem in found] == [
        'actions["load"].on', "member.hinges[0].butt.layer", 'member.anchors["a"].joint',
        'member.anchors["a"].stiffness', 'member.supports["left"].under',
        'member.supports["right"].holding[0].layer',
    ]
    assert problems(lambda: floor(permanent("a", axial(1*kN, 0*m, 0*m))))[0].startswith(
        'actions["a"].on: found a force along a member of several layers that slip'
    )
    with pytest.raises(BeamcoreError, match="nails"):
        FLOOR.joint("permanent", "initial", "nails")
    with pytest.raises(BeamcoreError, match="middle"):
        FLOOR.layer("permanent", "initial", "middle")
    assert len(problems(lambda: Anchor("a", "b", 1*kN, 1*MPa))) == 2
