"""Errors: a class per kind, all problems at once, the words of the core."""

import re
from pathlib import Path
from typing import Any, Callable

import golden
import pytest

import beamcore
from beamcore import (
    BeamcoreError, ConcreteCreep, Job, Member, Part, Section, partial, permanent, pin, point,
    rectangle, roller, self_weight, steel, timber, uniform, variable,
)
from beamcore.units import GPa, MPa, day, kN, m, mm

BAD_JOBS = Path(__file__).parents[1] / "bad-jobs"
GOOD_JOB = (BAD_JOBS.parent / "golden" / "flitch.toml").read_text(encoding="utf-8")
JOIST = Part("joist", rectangle(75*mm, 225*mm), timber("C24", 1))
SECTION = Section([JOIST])
DEAD = permanent("dead", uniform(1*kN/m))


def span(*actions: beamcore.Action) -> Member:
    return Member.simple_span(SECTION, 4.2*m, actions=actions)


def lookup() -> Any:
    return span(DEAD).solve().deflection("permament", "final")


# One cause of every kind.
CAUSES: dict[str, Callable[[], Any]] = {
    "Value": lambda: Section([Part("a", rectangle(-75*mm, 1*m), steel("S235"))]),
    "Name": lambda: steel("S999"),
    "Key": lambda: beamcore.run(GOOD_JOB + "\n[camper]\n"),
    "Unit": lambda: rectangle("75", 1*m),
    "Duplicate": lambda: Section([JOIST, JOIST.right_of("joist")]),
    "Geometry": lambda: Section([JOIST, Part("b", rectangle(9*mm, 9*mm), steel("S235"))]),
    "Missing": lambda: Section([]),
    "Mechanism": lambda: Member(SECTION, 4*m, supports=[roller("a", 1*m)], actions=[DEAD]),
    "Position": lambda: span(permanent("dead", point(1*kN, 5*m))),
    "Syntax": lambda: beamcore.run("version = "),
    "Version": lambda: beamcore.run(GOOD_JOB.replace("version = 1", "version = 99", 1)),
    "File": lambda: Job.open("missing.toml"),
    "Lookup": lookup,
    "Numerical": lambda: beamcore.run(GOOD_JOB.replace('"5 N/mm"', '"1e305 N/mm"')),
}


@pytest.mark.parametrize("kind", CAUSES)
def test_every_kind_has_its_class(kind: str) -> None:
    with pytest.raises(BeamcoreError) as caught:
        CAUSES[kind]()
    error = caught.value
    assert type(error) is getattr(beamcore, f"{kind}Problem")
    assert error.kind == error.problems[0].kind == kind
    assert error.path == error.problems[0].path
    assert isinstance(error, ValueError) == (kind not in ("File", "Lookup", "Numerical"))
    assert isinstance(error, OSError) == (kind == "File")
    assert isinstance(error, LookupError) == (kind == "Lookup")


def test_there_is_a_cause_for_every_class() -> None:
    names = {name for name in beamcore.__all__ if name.endswith("Problem")} - {"Problem"}
    assert names == {f"{kind}Problem" for kind in CAUSES}


CASES = [case for case in golden.lines(BAD_JOBS / "cases.txt")]


@pytest.mark.parametrize("case", CASES)
def test_wrong_jobs_give_the_words_of_the_core(case: str) -> None:
    message = (BAD_JOBS / f"{case}.message").read_text(encoding="utf-8").rstrip()
    text = (BAD_JOBS / f"{case}.toml").read_text(encoding="utf-8")
    with pytest.raises(BeamcoreError) as caught:
        beamcore.run(text)
    assert str(caught.value) == message
    problems = caught.value.problems
    assert len(problems) == max(1, message.count("\n- "))
    for problem in problems:
        line = f" (line {problem.line})" if problem.line else ""
        text = f"{problem.path}{line}: found {problem.found}; expected {problem.expected}"
        assert text in message


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_two_mistakes_of_units_give_both() -> None:
    assert problems(lambda: rectangle("75", 220*kN)) == [
        'rectangle.width: found "75" without a unit; expected a length with one of the units '
        'm, mm, cm, in, ft, for example "75 m"',
        "rectangle.height: found a force of 220000 N; expected a length (m, mm, cm, in, ft)",
    ]
    assert len(problems(lambda: point(1*m, 1*kN))) == 2
    assert len(problems(lambda: partial(1*m, 1*kN, 2))) == 3  # type: ignore[arg-type]
    assert len(problems(lambda: beamcore.TimberStrength(1*m, "1 kN", MPa*1))) == 2
    assert len(problems(lambda: beamcore.Material("a", 1*m, 0, density=1*kN))) == 2
    wrong: Any = "X"
    assert [p.split(":")[0] for p in problems(
        lambda: ConcreteCreep(38*GPa*m, 50, 1*m, 28*day, 1*m, wrong)
    )] == ["mean_strength", "age_at_end", "cement"]


def test_two_mistakes_of_meaning_give_both() -> None:
    bad = Part("bad", rectangle(0*mm, -1*mm), beamcore.Material("dream", 0*GPa, 30))
    found = problems(lambda: Section([bad, JOIST.above("bed")]))
    assert [problem.split(": found ")[0] for problem in found] == [
        'section.parts["bad"].outline.rectangle.width',
        'section.parts["bad"].outline.rectangle.height',
        'materials["dream"].modulus',
        'materials["dream"].creep_factor',
        'section.parts["joist"].place.above',
    ]
    own = beamcore.Material("own", 10*GPa, 0)
    section = Section([Part("a", rectangle(75*mm, 225*mm), own)])
    found = problems(lambda: Member(
        section, 4.2*m,
        supports=[pin("left", 0*m), roller("right", 4.9*m)],
        actions=[permanent("dead", self_weight()),
                 variable("live", point(1*kN, -1*m), psi_0=0.7, psi_1=1.5, psi_2=0.3)],
    ))
    assert found == [
        'member.supports["right"].at: found 4.9 m; '
        "expected a place on the member, from 0 m to 4.2 m",
        'actions["live"].kind.variable.psi_1: found 1.5; expected a number from 0 to 1',
        'actions["live"].loads[0].point.at: found -1 m; '
        "expected a place on the member, from 0 m to 4.2 m",
        'materials["own"].density: found no density; '
        'expected a density, since the action "dead" carries the self-weight',
    ]


def test_mistakes_in_camber_are_told_at_once() -> None:
    def camber(step: Any, rounding: Any, to: str = "right") -> Any:
        return span(DEAD).solve().camber(
            shape="mirror", combination="dead", time="final", fraction=3, from_="left", to=to,
            step=step,
            rounding=rounding, divisions=0,
        )

    assert len(problems(lambda: camber(1, "off"))) == 2
    assert len(problems(lambda: camber(1*mm, "up", to="post"))) == 4


def test_results_that_do_not_exist() -> None:
    response = span(DEAD).solve()
    wrong: Any = "end"
    assert problems(lambda: response.deflection("permanent", wrong)) == [
        'time: found "end"; expected one of "initial", "final"'
    ]
    for name, missing in {
        "combination": lambda: response.shear("x", "final"),
        "support": lambda: response.reaction("permanent", "final", "x"),
        "part": lambda: response.stress("permanent", "final", "x"),
        "material": lambda: SECTION.transformed_to("x", "final"),
    }.items():
        [problem] = problems(missing)
        assert problem.startswith(f'{name}: found the unknown {name} "x"; expected one of "')
    outcome = beamcore.run(GOOD_JOB)
    with pytest.raises(beamcore.LookupProblem):
        outcome.number("section.inital.axial_stiffness_N")
    with pytest.raises(beamcore.LookupProblem):
        outcome.text("section.initial.axial_stiffness_N")
