"""Quantities of another units package are taken as inputs."""

from typing import Any

import pint
import pytest

import beamcore
from beamcore import Material, Part, rectangle, uniform
from beamcore.units import GPa, N, kN, kg, m, mm

other: Any = pint.UnitRegistry()


def test_quantities_of_another_package() -> None:
    assert rectangle(75 * other.mm, other("0.22 m")) == rectangle(75*mm, 220*mm)
    assert uniform(5 * other.kN / other.m) == uniform(5*kN/m)
    density = 690 * other.kg / other.m**3
    assert Material("a", 9.5 * other.GPa, 0, density=density) == Material(
        "a", 9.5*GPa, 0, density=690*kg/m**3
    )
    assert uniform(1 * other.kip / other.ft) == uniform("1 kip/ft")


def test_bits_are_those_of_the_same_units_here() -> None:
    for x in range(1, 1000):
        assert rectangle(x * other.mm, 1*m).width.si == x / 1000


def test_units_unknown_here_come_through_base_units() -> None:
    # 1 yard = 0.9144 m, 1 dyn = 1e-5 N, exact by definition.
    assert abs(rectangle(2 * other.yard, 1*m).width.to(m) - 1.8288) <= 1e-15
    found = beamcore.point(5 * other.dyne, 0*m)
    assert found == beamcore.point(5e-5*N, 0*m)


def test_other_dimensions_are_named() -> None:
    with pytest.raises(beamcore.UnitProblem) as caught:
        rectangle(2 * other.kN, 1*m)
    assert str(caught.value) == (
        "rectangle.width: found a force of 2000 N; expected a length (m, mm, cm, in, ft)"
    )
    with pytest.raises(beamcore.UnitProblem, match="rectangle.width: found"):
        rectangle(2 * other.ampere, 1*m)
    with pytest.raises(beamcore.UnitProblem):
        rectangle(2 * other.dimensionless, 1*m)
    arrays: Any = [1.0, 2.0] * other.mm
    with pytest.raises(TypeError, match="rectangle.width: a quantity"):
        rectangle(arrays, 1*m)


class Plain:
    """The least that a quantity of another package has: no short form of its units."""

    def __init__(self, magnitude: float, units: str) -> None:
        self.magnitude = magnitude
        self.units = units

    def to_base_units(self) -> "Plain":
        return {"furlong": Plain(self.magnitude * 201.168, "m")}.get(self.units, self)


def test_the_least_that_a_quantity_has() -> None:
    assert rectangle(Plain(75, "mm"), Plain(2, "furlong")) == rectangle(75*mm, 402.336*m)
    with pytest.raises(beamcore.UnitProblem) as caught:
        rectangle(Plain(75, "parsec"), 1*m)
    assert str(caught.value) == (
        'rectangle.width: found "75 parsec" with the unknown unit "parsec"; '
        "expected a length (m, mm, cm, in, ft)"
    )


def test_a_part_of_other_quantities() -> None:
    place = Part("a", rectangle(1*m, 1*m), Material("a", 1*GPa, 0))
    assert place.at(10 * other.mm, 2 * other.cm) == place.at(10*mm, 20*mm)
