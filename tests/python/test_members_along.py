"""Members whose section changes, on springs, with hinges, shear, pitch and forces along them."""

import math
from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    BeamcoreError, Hinge, InitialStrain, Load, Material, Member, Part, Quantity, Section,
    SectionChange, Support, axial, fixed, free_strain, imposed_rotation, partial, permanent, pin,
    plan, point, prestress, rectangle, roller, settlement, step, taper, temperature,
    temperature_difference, uniform,
)
from beamcore.units import GPa, K, MPa, kN, m, mm, permille, rad

B, H, L, Q = 100*mm, 200*mm, 4*m, 3*kN/m
WOOD = Material("wood", 10*GPa, creep_factor=0.5, density="500 kg/m3").with_values(
    shear_modulus=600*MPa, thermal_expansion=5e-6/K
)


def section(height: Quantity = H) -> Section:
    return Section([Part("beam", rectangle(B, height), WOOD)])


EA: Quantity = 10*GPa * B * H
EI: Quantity = 10*GPa * B * H**3 / 12
ENDS = (pin("left", 0*m), roller("right", L))
WALLS = (fixed("left", 0*m), fixed("right", L))
WALL = (fixed("wall", 0*m),)


def solved(*loads: Load, supports: tuple[Support, ...] = ENDS, length: Quantity = L,
           **more: Any) -> beamcore.Response:
    return Member(section(), length, supports, [permanent("a", *loads)], **more).solve()


def near(found: Quantity, expected: Quantity, tolerance: float = 1e-10) -> bool:
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def w(response: beamcore.Response, x: Quantity) -> Quantity:
    return response.deflection("permanent", "initial").value(x)


def moment(response: beamcore.Response, x: Quantity) -> Quantity:
    return response.moment("permanent", "initial").value(x)


def test_steps_and_tapers() -> None:
    """A cantilever under P at its end, by the integral of M^2/EI."""
    force = 2*kN
    stepped = Member(section(2 * H), L, WALL, [permanent("a", point(force, L))],
                     changes=[step(1*m, section())])
    expected = force / (3 * 8 * EI) * (L**3 - (3*m)**3) + force * (3*m)**3 / (3 * EI)
    assert near(w(stepped.solve(), L), expected)
    [change] = stepped.changes
    assert (change.kind, change.from_, change.to) == ("step", 1*m, 1*m)
    assert change.section == section() and change == step("1 m", section())
    assert repr(change) == "<step from 1 m to 1 m>"
    assert stepped.section == section(2 * H)
    assert stepped.section_at(0.5*m) == section(2 * H) and stepped.section_at(1*m) == section()
    [beam] = stepped.parts
    assert beam == section(2 * H).part("beam")

    tapered = Member(section(2 * H), L, WALL, [permanent("a", point(force, L))],
                     changes=[taper(0*m, to=L, section=section())])
    assert tapered.changes[0].kind == "taper" and tapered.changes[0].to == L
    assert isinstance(tapered.changes[0], SectionChange)
    # int P (L - x)^2 / (E b h^3/12) dx with h = 2 H (1 - x/(2 L)), u = 1 - x/(2 L):
    # P L^3/EI int from 1/2 to 1 of (2 u - 1)^2/(8 u^3) 2 du = P L^3/EI (ln 2 - 5/8).
    assert near(w(tapered.solve(), L), force * L**3 / EI * (math.log(2) - 0.625), 1e-9)
    assert near(tapered.section_at(2*m).part("beam").top, 0.75 * H)


def test_parts_of_all_sections() -> None:
    plated = Section([Part("beam", rectangle(B, H), WOOD),
                      Part("plate", rectangle(B, 10*mm), WOOD).below("beam")])
    member = Member(section(), L, ENDS, [permanent("a", uniform(Q))], changes=[
        step(1*m, plated), step(3*m, section())
    ])
    assert [part.name for part in member.parts] == ["beam", "plate"]
    assert member.parts[1] == plated.part("plate")


def test_springs() -> None:
    """A spring gives by its reaction over its stiffness."""
    springs = (pin("left", 0*m, spring=2*kN/mm), roller("right", L, spring="4 kN/mm"))
    response = solved(uniform(Q), supports=springs)
    assert near(w(response, 0*m), 6*kN / (2*kN/mm)) and near(w(response, L), 6*kN / (4*kN/mm))
    assert (springs[0].spring, ENDS[0].spring) == (2*kN/mm, None)
    turning = fixed("wall", 0*m, rotational_spring="900 kN m/rad")
    assert turning.rotational_spring == 900*kN*m/rad
    expected = 2*kN * L**3 / (3 * EI) + 2*kN * L * L / (900*kN*m)
    assert near(w(solved(point(2*kN, L), supports=(turning,)), L), expected)
    soft = (pin("left", 0*m, axial_spring=5*kN/mm), roller("right", L))
    assert soft[0].axial_spring == 5*kN/mm
    pulled = solved(axial(10*kN, at=L, height=0*mm), supports=soft)
    assert near(pulled.reaction("permanent", "initial", soft[0]).along, -10*kN)


def test_a_support_may_be_left() -> None:
    """The far support lifts off, and the first span is a simple one."""
    supports = (pin("left", 0*m), roller("middle", L), roller("end", 8*m, one_way=True))
    assert [support.one_way for support in supports] == [False, False, True]
    response = solved(partial(Q, 0*m, L), supports=supports, length=8*m)
    assert response.lifted("permanent", "initial") == ("end",)
    assert response.steps("permanent", "initial") > 1
    assert near(moment(response, 2*m), Q * L**2 / 8)
    assert response.reaction("permanent", "initial", "end").force == 0*kN
    kept = solved(uniform(Q), supports=supports, length=8*m)
    assert kept.lifted("permanent", "initial") == ()


def test_hinges() -> None:
    """Statics of a span with an overhang that bears a hung span."""
    supports = (pin("left", 0*m), roller("middle", L), roller("end", 9*m))
    hinged = solved(uniform(Q), supports=supports, length=9*m, hinges=[Hinge.moment(5*m)])
    assert abs(moment(hinged, 5*m).si) <= 1e-9
    # The hung span of 4 m brings q 4 m/2 on the overhang of 1 m.
    assert near(moment(hinged, L), -(Q * 2*m * 1*m + Q * (1*m)**2 / 2))
    assert (Hinge.moment("5 m").kind, Hinge.moment(5*m).at, Hinge.moment(5*m).layer) == (
        "moment", 5*m, None
    )
    assert repr(Hinge.shear(1*m)) == "<shear hinge at 1 m>"
    cut = solved(uniform(Q), supports=WALLS, hinges=[Hinge.shear(2*m)])
    # Two halves that cannot pass a shear force, as by symmetry.
    whole = solved(uniform(Q), supports=WALLS)
    assert near(w(cut, 2*m), w(whole, 2*m)) and near(moment(cut, 0*m), -Q * L**2 / 12)


def test_shear() -> None:
    """P L^3/48EI + P L/4kGA (Timoshenko), kGA = 5/6 G b h of a rectangle."""
    kga: Quantity = 600*MPa * B * H * 5 / 6
    bent: Quantity = 2*kN * L**3 / (48 * EI)
    loads = point(2*kN, 2*m)
    assert near(w(solved(loads), 2*m), bent)
    assert near(w(solved(loads, shear="rigid"), 2*m), bent)
    flexible = solved(loads, shear="flexible")
    assert near(w(flexible, 2*m), bent + 2*kN * L / (4 * kga))
    assert near(w(solved(loads, shear="12 MN"), 2*m), bent + 2*kN * L / (4 * 12000*kN))
    slope = flexible.slope("permanent", "initial").value(0*m)
    rotation = flexible.rotation("permanent", "initial")
    assert near(slope - rotation.value(0*m), rad * (1*kN / kga))
    assert rotation.values_rad([0.0])[0] == rotation.value(0*m).si
    words = [Member(section(), L, ENDS, [permanent("a", loads)], shear=word).shear
             for word in (None, "flexible", 5*kN * 1000)]
    assert words == ["rigid", "flexible", 5000*kN]
    assert problems(lambda: solved(loads, shear="flexibel")) == [
        'member.shear: found "flexibel"; expected one of "rigid", "flexible"'
    ]
    assert problems(lambda: solved(loads, shear=1*mm))[0].startswith("member.shear: found a length")


def test_a_pitched_member() -> None:
    """Snow on the plan: q (L cos a)^2/8, and half its weight on each support, upright."""
    response = solved(plan(Q), pitch="30 deg")
    level = L * math.cos(math.pi / 6)
    assert near(moment(response, 2*m), Q * level**2 / 8)
    for name in ("left", "right"):
        reaction = response.reaction("permanent", "initial", name)
        assert near(reaction.force, Q * level / 2) and abs(reaction.along.si) <= 1e-9
    # Compression below, where the weight leans on the pin, to tension at the upper half.
    assert near(response.axial("permanent", "initial").value(0*m), -Q * level / 2 * 0.5)
    assert Member(section(), L, ENDS, [permanent("a", plan(Q))], pitch="0.5 rad").pitch == 0.5*rad
    assert Member(section(), L, ENDS, [permanent("a", plan(Q))]).pitch is None
    part = solved(plan(Q, from_=0*m, to="2 m"), pitch="30 deg")
    assert near(part.reaction("permanent", "initial", "left").force, Q * level / 2 * 0.75)


def test_forces_along_the_member() -> None:
    """Statics: N = F, M = -F z of a pull at a height z; a tendon presses with P below."""
    pulled = solved(axial(10*kN, at=L, height="50 mm"))
    assert near(pulled.axial("permanent", "initial").value(1*m), 10*kN)
    assert near(pulled.reaction("permanent", "initial", "left").along, -10*kN)
    assert near(moment(pulled, L), -10*kN * 50*mm)
    members = [Member(section(), L, ENDS, [permanent("a", load)])
               for load in (uniform(Q), axial(1*kN, L, 0*mm))]
    assert [member.has_axial_force for member in members] == [False, True]
    held = (pin("left", 0*m, height=50*mm), roller("right", L))
    assert held[0].height == 50*mm
    assert near(moment(solved(axial(10*kN, L, 50*mm), supports=held), 1*m), -0.5*kN*m)
    points = [(0*m, 0*mm), ("2 m", -60*mm), (L, 0*mm)]
    for shape, quarter in (("draped", 30*mm), ("parabolic", 45*mm)):
        tendon: dict[str, Any] = {shape: points}
        pressed = solved(prestress(40*kN, **tendon))
        assert near(pressed.axial("permanent", "initial").value(1*m), -40*kN)
        assert near(moment(pressed, 2*m), -40*kN * 60*mm)
        assert near(moment(pressed, 1*m), -40*kN * quarter)


def test_what_is_imposed() -> None:
    """3 EI d/L^2 over a support that sinks by d; a wall that turns; EA and EI times strains."""
    supports = (pin("left", 0*m), roller("middle", L), roller("end", 8*m))
    sunk = solved(settlement(supports[1], "5 mm"), supports=supports, length=8*m)
    assert near(moment(sunk, L), 3 * EI * (5*mm) / L**2) and near(w(sunk, L), 5*mm)
    turned = solved(imposed_rotation("wall", 0.002*rad), supports=WALL)
    assert near(w(turned, L), 8*mm)
    warm = solved(temperature(20*K), supports=WALLS)
    assert near(warm.axial("permanent", "initial").value(1*m), -EA * 5e-6 * 20)
    assert near(solved(temperature("20 K", parts=["beam"]), supports=WALLS).axial(
        "permanent", "initial").value(1*m), -EA * 5e-6 * 20)
    # The top is warmer and wants to be longer: held, it is compressed.
    held = solved(temperature_difference(10*K), supports=WALLS)
    assert near(moment(held, 1*m), EI * (5e-6 * 10 / H))
    free = solved(temperature_difference(10*K))
    assert near(w(free, 2*m), -5e-6 * 10 / H * L**2 / 8)
    assert near(free.curvature("permanent", "initial").value(1*m), -5e-6 * 10 / H)
    shrunk = solved(free_strain("beam", InitialStrain(-0.3*permille)), supports=WALLS)
    assert near(shrunk.axial("permanent", "initial").value(1*m), EA * 3e-4)


def test_loads_tell_what_they_are() -> None:
    loads = [plan(Q), axial(1*kN, 0*m, 0*m), prestress(1*kN, draped=[]), settlement("a", 1*mm),
             imposed_rotation("a", 1*rad), temperature(1*K), temperature_difference(1*K),
             free_strain("a", InitialStrain(1*permille))]
    assert [load.kind for load in loads] == [
        "plan", "axial", "prestress", "settlement", "imposed_rotation", "temperature",
        "temperature_difference", "free_strain"
    ]
    assert permanent("a", plan(Q), on="slab").on == "slab"
    assert beamcore.variable("a", plan(Q), category="snow", on="slab").on == "slab"
    assert permanent("a", plan(Q)).on is None


def test_mistakes_are_told() -> None:
    tendon = [(0*m, 0*mm), (5*m, 1*mm), (4*m, 0*mm)]
    found = problems(lambda: solved(
        settlement("middle", 1*mm), imposed_rotation("left", 1*rad), prestress(1*kN, draped=tendon),
        temperature(1*K, parts=["bean"]), free_strain("bean", InitialStrain(1*permille)),
    ))
    assert [problem.split(":")[0] for problem in found] == [
        f'actions["a"].loads[{path}' for path in (
            "2].prestress.tendon.draped[1].at", "0].settlement.support",
            "1].imposed_rotation.support", "2].prestress.tendon.draped[2].at",
            "3].temperature.parts", "4].free_strain.part",
        )
    ]
    found = problems(lambda: solved(
        plan(Q), hinges=[Hinge.moment(0*m)], changes=[step(5*m, section()), step(1*m, section())],
        supports=(pin("left", 0*m, spring=-1*kN/mm, axial_spring=-1*kN/mm), roller("right", L)),
    ))
    assert [problem.split(":")[0] for problem in found] == [
        'member.supports["left"].spring', 'member.supports["left"].axial_spring',
        "member.hinges[0].moment.at", "member.changes[0].step.at", "member.changes[1].step.at",
    ]
    with pytest.raises(beamcore.GeometryProblem, match="a taper between"):
        solved(plan(Q), changes=[taper(0*m, L, Section([Part("c", rectangle(B, H), WOOD)]))])
    with pytest.raises(beamcore.PositionProblem, match="^at: found 5 m"):
        Member(section(), L, ENDS, [permanent("a", plan(Q))]).section_at(5*m)
    given: dict[str, Any] = {key: 1*kN for key in (
        "spring", "axial_spring", "rotational_spring", "height")}
    found = problems(lambda: fixed("a", 1*kN, **given, holding={"b": 1*kN}))
    assert [problem.split(":")[0] for problem in found] == [
        f"fixed.{key}" for key in ("at", *given, "holding[0].height")
    ]
    assert len(problems(lambda: plan(1*kN, 1*kN, 1*kN))) == 3
    assert len(problems(lambda: axial(1*m, 1*kN, 1*kN))) == 3
    assert len(problems(lambda: taper(1*kN, 1*kN, section()))) == 2
    found = problems(lambda: prestress(1*m, draped=[(1*kN, "1")]))
    assert [problem.split(":")[0] for problem in found] == [
        "prestress.force", "prestress.tendon.draped[0].at", "prestress.tendon.draped[0].height"
    ]


# As a caller without a type checker would write them.
ANY: Any = beamcore


@pytest.mark.parametrize("make", [
    lambda: ANY.plan(Q, from_=1*m),
    lambda: ANY.prestress(1*kN),
    lambda: ANY.prestress(1*kN, draped=[], parabolic=[]),
    lambda: ANY.prestress(1*kN, parabolic=[(0*m, 0*m)]),
    lambda: ANY.prestress(1*kN, draped=["0 m"]),
    lambda: ANY.prestress(1*kN, draped=[(0*m,)]),
    lambda: ANY.pin("a", 0*m, 1*kN/mm),
    lambda: ANY.Hinge(1*m),
    lambda: ANY.Hinge.butt(1*m),
])
def test_half_given_is_a_type_error(make: Callable[[], Any]) -> None:
    with pytest.raises(TypeError):
        make()
