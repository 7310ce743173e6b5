"""The golden case `roof-beam` through the typed way."""

from collections.abc import Iterator
from typing import Literal

from beamcore import (
    Camber, Limit, Member, OwnCombination, Part, PartialFactors, Response, Section, area, couple,
    permanent, pin, point, rectangle, roller, self_weight, timber, trapezoidal, variable,
)
from beamcore.units import kN, m, mm

Found = Iterator[tuple[str, float]]
TIMES: tuple[Literal["initial"], Literal["final"]] = ("initial", "final")
COMPONENTS: tuple[Literal["w_inst", "w_1", "w_2", "w_3", "w_tot", "w_max"], ...] = (
    "w_inst", "w_1", "w_2", "w_3", "w_tot", "w_max",
)
SPAN = "left to right"
SNOW = "characteristic, snow leading"
LIMITS = [
    Limit("w_max", span_over=300),
    Limit("w_inst", value=35*mm, span=SPAN),
    Limit("w_tot", span_over=150, combination="erection"),
]


def roof_beam() -> tuple[Section, Member]:
    section = Section([Part("beam", rectangle(140*mm, 480*mm), timber("GL24h", service_class=2))])
    member = Member(
        section,
        11.2*m,
        supports=[pin("left", 1.2*m), roller("right", 10*m)],
        actions=[
            permanent("roof", self_weight(), area(0.62*kN/m**2, tributary_width=3.2*m)),
            permanent("tie", couple(2.5*kN*m, at=10*m), favourable=True),
            variable(
                "snow", trapezoidal(2.4*kN/m, 5.6*kN/m, from_=1.2*m, to=10*m), category="snow"
            ),
            variable("men", point(1.0*kN, at=5.6*m), category="H"),
            variable(
                "wind",
                area(0.3*kN/m**2, tributary_width=3.2*m, from_=1.2*m, to=10*m),
                category="wind",
            ),
        ],
        partial_factors=PartialFactors(permanent=1.2, permanent_favourable=0.9, variable=1.6),
        own_combinations=[OwnCombination("erection", {"roof": 1, "men": 1.5}, ultimate=False)],
    )
    return section, member


def camber(response: Response) -> Camber:
    return response.camber(
        shape="arc_least_gap",
        combination="quasi-permanent",
        time="final",
        fraction=1.2,
        from_="left",
        to="right",
        step=5*mm,
        rounding="down",
        least=10*mm,
        divisions=8,
    )


def answers() -> Found:
    _, member = roof_beam()
    response = member.solve()
    yield from fields(member, response)
    built = camber(response)
    for component in COMPONENTS:
        found = response.deflection_component(component, SNOW, SPAN, built).greatest
        yield f'components["{SNOW}"].spans["{SPAN}"].{component}.value_m', found.value.si
    for i, check in enumerate(response.check_limits(LIMITS, built)):
        yield f"limits[{i}].value_m", check.value.si
        yield f"limits[{i}].utilisation", check.utilisation
    yield "camber.target_m", built.target.si
    yield "camber.rise_m", built.rise.si
    assert built.radius is not None
    yield "camber.radius_m", built.radius.si
    for i, ordinate in enumerate(built.ordinates):
        yield f"camber.ordinates[{i}].ordinate_m", ordinate.ordinate.si
    remaining = response.remaining(SNOW, "final", built).greatest
    yield f'camber.remaining["{SNOW}"].final.greatest.value_m', remaining.value.si
    readings = response.readings(built, left=2*m, right=9.2*m, parts=["beam"])
    for i, reading in enumerate(readings):
        yield f"camber.readings[{i}].standing_m", reading.standing.si


def fields(member: Member, response: Response) -> Found:
    for combination in member.combinations:
        for time in TIMES:
            at = f'combinations["{combination}"].{time}'
            deflection = response.deflection(combination, time).greatest
            yield f"{at}.deflection.greatest.value_m", deflection.value.si
            yield f"{at}.deflection.greatest.at_m", deflection.at.si
            moment = response.moment(combination, time).greatest
            yield f"{at}.moment.greatest.value_Nm", moment.value.si
            for support in member.support_names:
                reaction = response.reaction(combination, time, support)
                yield f'{at}.reactions["{support}"].force_N', reaction.force.si
            tension = response.stress(combination, time, "beam").greatest_tension
            yield f'{at}.stresses["beam"].tension.value_Pa', tension.value.si
            span = response.span_deflection(combination, time, SPAN).greatest
            yield f'{at}.spans["{SPAN}"].deflection.greatest.value_m', span.value.si
