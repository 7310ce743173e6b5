from collections.abc import Mapping, Sequence
from typing import Final, Literal, TypeAlias, final, overload

from beamcore._core import InitialStrain, Layer, Part, Quantity, Support
from beamcore._typing import QuantityLike

__all__ = [
    "CombinationFactors",
    "Load",
    "self_weight",
    "uniform",
    "partial",
    "trapezoidal",
    "area",
    "point",
    "couple",
    "plan",
    "axial",
    "prestress",
    "settlement",
    "imposed_rotation",
    "temperature",
    "temperature_difference",
    "free_strain",
    "Action",
    "permanent",
    "variable",
    "PartialFactors",
    "OwnCombination",
    "Combination",
]

_Category: TypeAlias = Literal[
    "A", "B", "C", "D", "E", "F", "G", "H", "snow", "snow_high", "wind", "temperature"
]
_Point: TypeAlias = Sequence[QuantityLike]
_Duration: TypeAlias = Literal["permanent", "long", "medium", "short", "instantaneous"]

@final
class Load:
    kind: Final[str]

def self_weight() -> Load: ...
def uniform(load: QuantityLike) -> Load: ...
def partial(load: QuantityLike, from_: QuantityLike, to: QuantityLike) -> Load: ...
def trapezoidal(
    load_from: QuantityLike, load_to: QuantityLike, from_: QuantityLike, to: QuantityLike
) -> Load: ...
@overload
def area(
    load: QuantityLike, tributary_width: QuantityLike, from_: None = None, to: None = None
) -> Load: ...
@overload
def area(
    load: QuantityLike, tributary_width: QuantityLike, from_: QuantityLike, to: QuantityLike
) -> Load: ...
def point(load: QuantityLike, at: QuantityLike) -> Load: ...
def couple(couple: QuantityLike, at: QuantityLike) -> Load: ...
@overload
def plan(load: QuantityLike, from_: None = None, to: None = None) -> Load: ...
@overload
def plan(load: QuantityLike, from_: QuantityLike, to: QuantityLike) -> Load: ...
def axial(load: QuantityLike, at: QuantityLike, height: QuantityLike) -> Load: ...
@overload
def prestress(
    force: QuantityLike, *, draped: Sequence[_Point], parabolic: None = None
) -> Load: ...
@overload
def prestress(
    force: QuantityLike, *, draped: None = None, parabolic: tuple[_Point, _Point, _Point]
) -> Load: ...
def settlement(support: Support | str, settlement: QuantityLike) -> Load: ...
def imposed_rotation(support: Support | str, rotation: QuantityLike) -> Load: ...
def temperature(change: QuantityLike, parts: Sequence[Part | str] = ...) -> Load: ...
def temperature_difference(difference: QuantityLike) -> Load: ...
def free_strain(part: Part | str, strain: InitialStrain) -> Load: ...

@final
class CombinationFactors:
    psi_0: Final[float]
    psi_1: Final[float]
    psi_2: Final[float]
    def __new__(cls, psi_0: float, psi_1: float, psi_2: float) -> CombinationFactors: ...

@final
class Action:
    name: Final[str]
    kind: Final[str]
    favourable: Final[bool]
    duration: Final[_Duration | None]
    start: Final[Quantity | None]
    on: Final[str | None]
    factors: Final[CombinationFactors | None]

def permanent(
    name: str,
    *loads: Load,
    favourable: bool = False,
    duration: _Duration | None = None,
    start: QuantityLike | None = None,
    on: Layer | str | None = None,
) -> Action: ...
@overload
def variable(
    name: str,
    *loads: Load,
    category: _Category,
    psi_0: None = None,
    psi_1: None = None,
    psi_2: None = None,
    favourable: bool = False,
    duration: _Duration | None = None,
    start: QuantityLike | None = None,
    on: Layer | str | None = None,
) -> Action: ...
@overload
def variable(
    name: str,
    *loads: Load,
    category: None = None,
    psi_0: float,
    psi_1: float,
    psi_2: float,
    favourable: bool = False,
    duration: _Duration | None = None,
    start: QuantityLike | None = None,
    on: Layer | str | None = None,
) -> Action: ...

@final
class PartialFactors:
    permanent: Final[float]
    permanent_favourable: Final[float]
    variable: Final[float]
    def __new__(
        cls,
        *,
        permanent: float | None = None,
        permanent_favourable: float | None = None,
        variable: float | None = None,
    ) -> PartialFactors: ...

@final
class OwnCombination:
    name: Final[str]
    factors: Final[dict[str, float]]
    ultimate: Final[bool]
    def __new__(
        cls, name: str, factors: Mapping[str, float], *, ultimate: bool
    ) -> OwnCombination: ...

@final
class Combination:
    name: Final[str]
    kind: Final[str]
    factors: Final[list[float]]
    ultimate: Final[bool]
    def __new__(
        cls, name: str, kind: str, factors: Sequence[float], ultimate: bool
    ) -> Combination: ...
