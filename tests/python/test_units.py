"""Units and quantities: exact conversions, arithmetic, comparison and refusals."""

import math
import operator
from fractions import Fraction
from typing import Any, Callable

import pytest

import beamcore
from beamcore import Quantity, Unit, UnitProblem, rectangle
from beamcore.units import (
    GPa, K, MPa, N, Pa, day, deg, ft, h, inch, kN, kg, kip, lb, m, mm, mrad, permille, rad, s, t,
    year,
)


def test_conversion_is_one_division() -> None:
    assert (75*mm).to("m") == 75 / 1000
    for x in range(1, 2000):
        assert (x*mm).si == x / 1000
        assert (x*mm).to(m) == x / 1000
    assert (225*mm).to(mm) == 225.0
    assert (11*GPa).to("MPa") == 11_000.0
    assert (1.5*kN/m).to("N/m") == 1500.0
    assert (180*deg).to(rad) == math.pi
    assert (1*year).to(day) == 365.25


# Exact by definition: foot, inch and pound; pound-force = pound x 9.80665 m/s2.
POUND_FORCE = Fraction(45359237, 10**8) * Fraction(980665, 10**5)


@pytest.mark.parametrize(
    ("quantity", "exact"),
    [
        (1.3*kip/ft, Fraction(1.3) * 1000 * POUND_FORCE / Fraction(3048, 10**4)),
        (7*inch**4, 7 * Fraction(254, 10**4) ** 4),
        (12.3*N/mm**2, Fraction(12.3) * 10**6),
        (480*lb/ft**3, 480 * Fraction(45359237, 10**8) / Fraction(3048, 10**4) ** 3),
        (8e6*mm**4, Fraction(8e6) / 10**12),
    ],
)
def test_units_are_joined_before_the_number(quantity: Quantity, exact: Fraction) -> None:
    # x * num / den is rounded twice at the most.
    assert abs(Fraction(quantity.si) - exact) <= Fraction(exact) * Fraction(1, 2**52)


@pytest.mark.parametrize(
    ("read", "symbols"),
    [
        (lambda given: beamcore.pin("left", given), "m mm cm in ft"),
        (lambda given: beamcore.point(given, 0*m), "N kN MN lbf kip"),
        (beamcore.uniform, "N/m kN/m N/mm plf lbf/ft kip/ft"),
        (beamcore.MetalStrength, "Pa kPa MPa GPa N/mm2 psi ksi"),
        (lambda given: beamcore.Material("a", given, 0), "Pa kPa MPa GPa N/mm2 psi ksi"),
        (lambda given: beamcore.Material("a", GPa*1, 0, density=given), "kg/m3 lb/ft3"),
    ],
)
def test_a_unit_has_the_bits_of_its_text(read: Callable[[Any], Any], symbols: str) -> None:
    for symbol in symbols.split():
        for number in (1.7, 6.5, 0.1, 1234.5678):
            assert read(f"{number} {symbol}") == read(number * Unit(symbol)), symbol


@pytest.mark.parametrize(
    "symbol",
    ["mm2", "in4", "kN m", "kNm", "kip ft", "kN m2", "kip in2", "/m", "1/mm", "deg", "kg/m", "year"],
)
def test_a_unit_prints_what_it_reads(symbol: str) -> None:
    unit = Unit(symbol)
    assert Unit(str(unit)) == unit
    assert hash(Unit(str(unit))) == hash(unit)


def test_kelvin_goes_with_what_is_per_kelvin() -> None:
    assert 12e-6/K == 12e-6*Unit("/K") == 12e-6*Unit("1/K")
    assert (12e-6/K).to("/K") == 12e-6
    assert 12e-6/K * (20*K) == 12e-6 * 20
    assert str(5*K) == "5 K" and Unit("K") == K and Unit(str(m/K)) == m/K
    given = beamcore.steel("S275").with_values
    assert given(thermal_expansion=13e-6/K) == given(thermal_expansion="13e-6 /K")


def test_every_unit_has_its_name() -> None:
    assert set(beamcore.units.__all__) == set(beamcore._units.__all__)
    assert set(beamcore.units.__all__) < set(beamcore.__all__)


def test_products_and_powers() -> None:
    load, span = 5*kN/m, 4.2*m
    moment = load * span**2 / 8
    assert moment.to("kN m") == pytest.approx(11.025, rel=1e-15)
    assert str(moment) == "11.025 kN*m"
    assert load * span == span * load
    assert 225*mm / (4.5*m) == 0.05
    assert isinstance(225*mm / (4.5*m), float)
    assert (2*m)**3 == 8*m**3
    assert (2*m)**-1 == 0.5/m
    assert 3 / (2*m) == 1.5/m
    assert m*2 == 2*m and m/2 == 0.5*m
    assert m / (4*s) == 0.25*m/s
    assert kN/m == N/mm == Unit("kN/m")
    assert str(kg*m/s**2) == "kg*m/s**2"
    assert str(1/m) == "1 1/m"
    assert repr(kN/m) == 'Unit("kN/m")'
    assert (5*mrad).to(permille) == 5.0


def test_sums_and_order() -> None:
    assert 75*mm + 0.125*m == 200*mm
    assert str(75*mm + 0.125*m) == "200 mm"
    assert 1*m - 1*mm == 999*mm
    assert -(3*kN) == -3*kN == 0*kN - 3*kN
    assert abs(-3*kN) == +(3*kN)
    assert 74*mm < 75*mm <= 75*mm < 0.076*m
    assert 1*t > 999*kg and 1*h >= 3600*s
    assert max(3*m, 40*mm, 2*m) == 3*m
    assert 1*m != 1*kN and 1*m != 1
    assert hash(1*m) == hash(1000*mm)
    assert len({0.0*m, -0.0*m}) == 1


def test_printing() -> None:
    assert repr(75*mm) == "75 mm"
    assert str(5*kN/m) == "5 kN/m"
    assert str(1.23456789*MPa) == "1.23457 MPa"
    assert str(8e6*mm**4) == "8e6 mm**4"


@pytest.mark.parametrize("join", [operator.add, operator.sub, operator.lt, operator.ge])
def test_other_dimensions_are_refused(join: Callable[[Any, Any], Any]) -> None:
    with pytest.raises(UnitProblem) as caught:
        join(75*mm, 2*kN)
    assert str(caught.value) == (
        "quantity: found a force of 2000 N; expected a length (m, mm, cm, in, ft)"
    )


@pytest.mark.parametrize("join", [operator.add, operator.sub, operator.lt])
@pytest.mark.parametrize("other", [1, 1.5, "1 m", None, m])
def test_a_sum_needs_two_quantities(join: Callable[[Any, Any], Any], other: Any) -> None:
    with pytest.raises(TypeError):
        join(1*m, other)
    with pytest.raises(TypeError):
        join(other, 1*m)


@pytest.mark.parametrize("other", [True, "2", None, 2j, {}])
def test_a_unit_takes_numbers_only(other: Any) -> None:
    with pytest.raises(TypeError):
        other * mm
    with pytest.raises(TypeError):
        mm * other


@pytest.mark.parametrize("given", [True, "2", None, 2*mm, [1.0]])
def test_numbers_are_plain_numbers(given: Any) -> None:
    for make in (
        lambda: Quantity(given, mm),
        lambda: beamcore.Material("a", 1*GPa, given),
        lambda: beamcore.concrete("C30/37", given),
        lambda: beamcore.variable("a", psi_0=given, psi_1=0, psi_2=0),
    ):
        with pytest.raises(TypeError):
            make()


def test_unknown_and_wrong_units() -> None:
    with pytest.raises(UnitProblem) as caught:
        Unit("furlong")
    assert str(caught.value).startswith('unit: found the unknown unit "furlong"')
    with pytest.raises(UnitProblem):
        Unit("mm//m")
    with pytest.raises(UnitProblem) as caught:
        (1*m).to("kN")
    assert str(caught.value) == (
        "quantity: found a length of 1 m; expected a force (N, kN, MN, lbf, kip)"
    )


def test_inputs_are_quantities_or_texts() -> None:
    outline = rectangle("225 mm", 0.05*m)
    assert outline.width == 225*mm and outline.height == 50*mm
    assert outline == rectangle(225*mm, "50 mm")
    assert outline.area == (225*mm) * (0.05*m)


@pytest.mark.parametrize(("given", "found"), [(75, '"75"'), (4.2, '"4.2"'), ("75", '"75"')])
def test_a_bare_number_says_which_units_fit(given: Any, found: str) -> None:
    with pytest.raises(UnitProblem) as caught:
        rectangle(given, 1*m)
    number = found.strip('"')
    assert str(caught.value) == (
        f"rectangle.width: found {found} without a unit; expected a length with one of the units "
        f'm, mm, cm, in, ft, for example "{number} m"'
    )


@pytest.mark.parametrize("given", [None, [1], mm, True, (1*m, 2*m), {"m": 1}])
def test_what_is_no_quantity_is_a_type_error(given: Any) -> None:
    with pytest.raises(TypeError, match="rectangle.width: a quantity"):
        rectangle(given, 1*m)


@pytest.mark.parametrize("number", [math.nan, math.inf, -math.inf])
def test_numbers_must_be_finite(number: float) -> None:
    for given in (number*mm, f"{number} mm"):
        with pytest.raises(beamcore.ValueProblem):
            rectangle(given, 1*m)
