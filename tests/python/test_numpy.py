"""NumPy: arrays are plain SI numbers; units are never silently spread over them."""

from typing import Any

import golden
import numpy as np
import pytest

import beamcore
from beamcore import Field, rectangle
from beamcore.units import m, mm

REFUSAL = "give an array as plain SI numbers, with the unit in its name"


@pytest.mark.parametrize("array", [np.array([1.0, 2.0]), np.array(3), [1, 2], (1, 2)])
@pytest.mark.parametrize("other", [mm, 2*mm])
def test_arrays_do_not_take_units(array: Any, other: Any) -> None:
    with pytest.raises(TypeError, match=REFUSAL):
        array * other
    with pytest.raises(TypeError, match=REFUSAL):
        other * array
    with pytest.raises(TypeError, match=REFUSAL):
        array / other
    with pytest.raises(TypeError, match=REFUSAL):
        other / array


def test_arrays_are_not_added_to_quantities() -> None:
    array: Any = np.array([1.0, 2.0])
    distance: Any = 2*mm
    with pytest.raises(TypeError):
        array + distance
    with pytest.raises(TypeError, match=REFUSAL):
        distance + array
    with pytest.raises(TypeError):
        np.add(array, distance)


def test_scalars_of_numpy_are_numbers() -> None:
    scalars: list[Any] = [np.float64(75), np.int32(75), np.float32(75)]
    for scalar in scalars:
        assert scalar * mm == mm * scalar == 75*mm
        assert type(scalar * mm) is beamcore.Quantity
    with pytest.raises(beamcore.UnitProblem):
        rectangle(np.float64(75), 1*m)  # type: ignore[arg-type]
    with pytest.raises(TypeError):
        rectangle(np.array([1.0, 2.0]), 1*m)  # type: ignore[arg-type]


@pytest.fixture(scope="module")
def deflection() -> Field:
    _, member = golden.flitch()
    return member.solve().deflection("quasi-permanent", "final")


@pytest.mark.parametrize(
    "places",
    [[0, 1, 2], (0.0, 1.0, 2.0), np.array([0.0, 1.0, 2.0]), np.arange(3), np.arange(6.0)[::2] / 2],
)
def test_values_at_lists_and_arrays(deflection: Field, places: Any) -> None:
    values = deflection.values_m(places)
    assert isinstance(values, np.ndarray)
    assert values.dtype == np.float64 and values.shape == (3,)
    assert values.tolist() == [deflection.value(x*m).si for x in (0, 1, 2)]


def test_empty_and_large_arrays(deflection: Field) -> None:
    assert deflection.values_m([]).shape == (0,)
    x_m = np.linspace(0, 4, 10_001)
    values_m = deflection.values_m(x_m)
    peak = deflection.greatest.value.si
    assert abs(values_m.max() - peak) <= 1e-12 * peak
    assert values_m[5000] == deflection.value(2*m).si
    assert np.allclose(values_m, values_m[::-1], rtol=0, atol=1e-12 * peak)


def test_arrays_that_do_not_fit(deflection: Field) -> None:
    with pytest.raises(beamcore.PositionProblem, match="found 4.1 m; expected a place on the line"):
        deflection.values_m([0, 4.1])
    with pytest.raises(beamcore.PositionProblem):
        deflection.values_m([float("nan")])
    wrong: list[Any] = [[[0, 1], [2, 3]], ["a"], ["1.5"], [1j], [True], [None], [1*m], 1.5]
    for given in wrong:
        with pytest.raises(TypeError, match="numbers, of one dimension"):
            deflection.values_m(given)


def test_each_field_has_values_in_its_unit() -> None:
    _, member = golden.flitch()
    response = member.solve()
    fields = {
        "m": response.deflection("permanent", "initial"),
        "rad": response.slope("permanent", "initial"),
        "N": response.shear("permanent", "initial"),
        "Nm": response.moment("permanent", "initial"),
        "Pa": response.stress("permanent", "initial", "plate").bottom,
    }
    for unit, field in fields.items():
        [value] = getattr(field, f"values_{unit}")([1.5])
        assert value == field.value(1.5*m).si != 0
        for other in fields.keys() - {unit}:
            with pytest.raises(AttributeError) as caught:
                getattr(field, f"values_{other}")([1.5])
            assert str(caught.value) == (
                f"this field has no values_{other}: its values are values_{unit}"
            )
