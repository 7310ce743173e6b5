"""Loads that vary, categories, combinations of one's own, spans, limits and camber shapes."""

from typing import Any, Callable

import golden_roof_beam
import pytest

import beamcore
from beamcore import (
    Action, BeamcoreError, Camber, Combination, CombinationFactors, Limit, Load, Material, Member,
    OwnCombination, Part, PartialFactors, Quantity, Section, area, couple, partial, permanent, pin,
    point, rectangle, roller, trapezoidal, uniform, variable,
)
from beamcore.units import GPa, MPa, kN, kg, m, mm

B, H, L = 100*mm, 200*mm, 4*m
WOOD = Material("wood", 10*GPa, creep_factor=0.5, density=500*kg/m**3)
SECTION = Section([Part("joist", rectangle(B, H), WOOD)])
EI = 10*GPa * B * H**3 / 12
ROOF = golden_roof_beam.roof_beam()[1].solve()


def span(*actions: Action, **more: Any) -> Member:
    return Member.simple_span(SECTION, L, actions, **more)


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def near(found: Quantity, expected: Quantity, tolerance: float = 1e-12) -> bool:
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def moment(load: Load, x: Quantity) -> Quantity:
    return span(permanent("a", load)).solve().moment("permanent", "initial").value(x)


def test_loads_that_vary() -> None:
    """Statics: a triangular load q on L gives q L/6 and q L/3; a couple C gives C/L."""
    assert [load.kind for load in (trapezoidal(0*kN/m, 1*kN/m, 0*m, 1*m), area("1 kN/m2", 1*m),
                                   couple(1*kN*m, 1*m))] == ["trapezoidal", "area", "couple"]
    triangle = trapezoidal(0*kN/m, "6 kN/m", from_=0*m, to=L)
    response = span(permanent("a", triangle)).solve()
    assert near(response.reaction("permanent", "initial", "left").force, 4*kN)
    assert near(response.reaction("permanent", "initial", "right").force, 8*kN)
    assert near(response.moment("permanent", "initial").value(2*m), 6*kN*m)
    level = trapezoidal(3*kN/m, 3*kN/m, 1*m, 3*m)
    assert near(moment(level, 2*m), moment(partial(3*kN/m, 1*m, 3*m), 2*m))

    whole, stretch = area(0.5*kN/m**2, 6*m), area("0.5 kN/m2", "6 m", from_=1*m, to=3*m)
    assert moment(whole, 1*m) == moment(uniform(0.5*kN/m**2 * (6*m)), 1*m)
    assert near(moment(stretch, 2*m), moment(partial(3*kN/m, 1*m, 3*m), 2*m))
    turned = span(permanent("a", couple(2*kN*m, at=1*m))).solve()
    # Clockwise: it lifts at the left support and presses on the right one.
    assert near(turned.reaction("permanent", "initial", "left").force, -0.5*kN)
    assert near(turned.reaction("permanent", "initial", "right").force, 0.5*kN)


def test_categories_have_their_factors() -> None:
    """EN 1990:2002 Table A1.1 (from memory)."""
    assert variable("a", category="E").factors == CombinationFactors(1.0, 0.9, 0.8)
    assert variable("a", category="snow_high").factors == CombinationFactors(0.7, 0.5, 0.2)
    assert variable("a", category="A") == variable("a", psi_0=0.7, psi_1=0.5, psi_2=0.3)
    assert permanent("a").factors is None and not permanent("a").favourable
    assert permanent("a", favourable=True).favourable
    assert permanent("a", favourable=True) != permanent("a")


def test_partial_factors_and_own_combinations() -> None:
    actions = [
        permanent("dead", uniform(1*kN/m)), permanent("tie", uniform(1*kN/m), favourable=True),
        variable("live", uniform(2*kN/m), category="A"),
        variable("lift", uniform(9*kN/m), category="wind", favourable=True),
    ]
    own = OwnCombination("lifting", {"dead": 1.5}, ultimate=True)
    member = span(*actions, own_combinations=[own],
                  partial_factors=PartialFactors(permanent=1.2, variable=1.6))
    assert member.partial_factors == PartialFactors(permanent=1.2, variable=1.6)
    assert member.partial_factors.permanent_favourable == 1.0
    assert span(*actions).partial_factors == PartialFactors()
    assert member.combinations[-1] == "lifting"
    response = member.solve()
    factors = {name: response.combination(name).factors for name in member.combinations}
    assert factors == {
        "permanent": [1, 1, 0, 0], "quasi-permanent": [1, 1, 0.3, 0],
        "characteristic": [1, 1, 1, 0], "frequent": [1, 1, 0.5, 0],
        "fundamental": [1.2, 1.0, 1.6, 0], "lifting": [1.5, 0, 0, 0],
    }
    assert response.combination("lifting") == Combination("lifting", "own", [1.5, 0, 0, 0], True)
    assert not response.combination("frequent").ultimate
    assert [response.combination(name).kind for name in member.combinations[:-1]] == list(
        member.combinations[:-1]
    )
    assert near(response.moment("lifting", "initial").greatest.value, 1.5 * 2*kN*m)


def test_spans_and_their_deflection() -> None:
    member = ROOF
    names = ["before left", "left to right", "beyond right"]
    spans = golden_roof_beam.roof_beam()[1].spans
    assert [found.name for found in spans] == names
    assert [found.cantilever for found in spans] == [True, False, True]
    middle = golden_roof_beam.roof_beam()[1].span("left to right")
    assert (middle.from_, middle.to) == (1.2*m, 10*m) and near(middle.length, 8.8*m)
    inner = member.span_deflection("quasi-permanent", "final", "left to right")
    assert inner.stations_m[0] == 1.2 and inner.stations_m[-1] == 10
    assert inner.value(5*m) == member.deflection("quasi-permanent", "final").value(5*m)


def camber(member: Member, **changed: Any) -> Camber:
    given: dict[str, Any] = {
        "shape": "parabola", "combination": "permanent", "time": "final", "fraction": 1,
        "from_": "left", "to": "right", "step": 1*mm, "rounding": "nearest", "divisions": 4,
    }
    return member.solve().camber(**given | changed)


def test_components_and_limits() -> None:
    """w = 5 q L^4/(384 EI), of permanent load 1 and variable load 2 kN/m with psi_2 = 0.3."""
    member = span(permanent("dead", uniform(1*kN/m)),
                  variable("live", uniform(2*kN/m), category="A"))
    response = member.solve()
    unit = 5 * (1*kN/m) * L**4 / (384 * EI)
    built = camber(member)
    expected = {
        "w_inst": 3 * unit, "w_1": unit, "w_2": 0.5 * unit, "w_3": (2 + 0.5 * 0.6) * unit,
        "w_tot": 3.8 * unit, "w_max": 3.8 * unit - built.rise,
    }
    for component, value in expected.items():
        symbol: Any = component
        line = response.deflection_component(symbol, "characteristic", "left to right", built)
        assert near(line.value(2*m), value, 1e-11), component
    whole = response.deflection_component("w_max", "characteristic", "left to right")
    assert near(whole.greatest.value, 3.8 * unit)
    remaining = response.remaining("characteristic", "final", built)
    assert near(remaining.value(2*m), 3.8 * unit - built.rise, 1e-11)

    limits = [Limit("w_inst", span_over=300), Limit("w_tot", value="20 mm", span="left to right")]
    instant, total = response.check_limits(limits, camber=built)
    assert (instant.component, instant.span) == ("w_inst", "left to right")
    assert instant.combination == "characteristic" and near(instant.at, 2*m)
    assert near(instant.value, 3 * unit) and near(instant.allowed, L / 300)
    assert instant.utilisation == instant.value / instant.allowed
    assert total.allowed == 20*mm and near(total.value, 3.8 * unit)
    assert (limits[0].component, limits[0].span_over, limits[0].value) == ("w_inst", 300, None)
    assert (limits[1].value, limits[1].span, limits[1].combination) == (
        20*mm, "left to right", None
    )


def test_shapes_of_camber() -> None:
    member = span(permanent("dead", uniform(3*kN/m)))
    sag = member.solve().deflection("permanent", "final").value(2*m)
    assert [camber(member, shape=shape).shape for shape in ("mirror", "parabola")] == [
        "mirror", "parabola"
    ]
    assert camber(member).radius is None
    arc = camber(member, shape="arc_through_middle")
    assert arc.radius is not None
    assert near(arc.radius, (L**2 / 4 + arc.rise**2) / (2 * arc.rise))
    assert arc.target == sag and arc.ordinate(2*m) == arc.rise
    assert camber(member, least=1*m).rise == 0*mm
    assert camber(member, shape="mirror") != camber(member)
    assert camber(member) == camber(member)


def test_readings_in_the_shop() -> None:
    """Standing at its supports it shows the camber less the deflection by its own weight."""
    member = span(permanent("dead", uniform(3*kN/m)))
    built = camber(member)
    joist = Part("joist", rectangle(B, H), WOOD)
    readings = member.solve().readings(built, left=0*m, right="4 m", parts=[joist])
    weight: Quantity = 500*kg/m**3 * B * H * (9.80665*m/Quantity(1, "s")**2)
    sag = 5 * weight * L**4 / (384 * EI)
    assert [reading.lying for reading in readings] == [o.ordinate for o in built.ordinates]
    assert readings[2].station == 2*m and near(readings[2].standing, built.rise - sag)


def test_mistakes_are_told() -> None:
    dead = permanent("dead", uniform(1*kN/m))
    bad = OwnCombination("permanent", {"dad": 4}, ultimate=False)
    found = problems(lambda: span(
        dead, own_combinations=[bad], partial_factors=PartialFactors(variable=-1)
    ))
    assert 'partial_factors.variable: found -1; expected a number from 0 to 3' in found
    assert ('combinations["permanent"].factors["dad"]: found the unknown action "dad"; expected '
            'one of the actions "dead"') in found
    assert len(found) == 4
    assert len(problems(lambda: trapezoidal(1*m, 1*kN, 1*kN, 1*kN))) == 4
    assert len(problems(lambda: area(1*kN, 1*kN, 1*kN, "1"))) == 4
    assert len(problems(lambda: couple(1*kN, 1*kN))) == 2
    wrong: Any = "w_9"
    assert problems(lambda: Limit(wrong, span_over=300)) == [
        'component: found "w_9"; expected one of "w_inst", "w_1", "w_2", "w_3", "w_tot", "w_max"'
    ]
    response = span(dead).solve()
    assert problems(lambda: response.check_limits([Limit("w_tot", span_over=0, span="x")])) == [
        "limits[0].span_over: found 0; expected a number from 1 to 100000",
        'limits[0].span: found the unknown span "x"; expected one of "left to right"',
    ]
    with pytest.raises(beamcore.LookupProblem):
        response.span_deflection("permanent", "final", "x")
    assert len(problems(lambda: camber(span(dead), shape="bow", least=1*MPa))) == 2
    assert problems(lambda: camber(span(dead), least=-1*mm)) == [
        "camber.least: found -1 mm; expected a length of zero or more"
    ]
    built = camber(span(dead))
    found = problems(lambda: response.readings(built, left=5*m, right=1*m, parts=["x"]))
    assert [problem.split(":")[0] for problem in found] == [
        "camber.trestles.left", "camber.trestles.parts"
    ]


# As a caller without a type checker would write them.
ANY: Any = beamcore


@pytest.mark.parametrize("make", [
    lambda: ANY.area(1*kN/m**2, 1*m, from_=1*m),
    lambda: ANY.area(1*kN/m**2, 1*m, to=1*m),
    lambda: ANY.variable("a"),
    lambda: ANY.variable("a", psi_0=0.5),
    lambda: ANY.variable("a", category="A", psi_0=0.7, psi_1=0.5, psi_2=0.3),
    lambda: ANY.Limit("w_tot"),
    lambda: ANY.Limit("w_tot", span_over=300, value=1*mm),
    lambda: ANY.OwnCombination("a", {"b": "1"}, ultimate=False),
])
def test_half_given_is_a_type_error(make: Callable[[], Any]) -> None:
    with pytest.raises(TypeError):
        make()
