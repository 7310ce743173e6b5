from typing import Final, Literal, TypeAlias, final

import numpy as np
from numpy.typing import ArrayLike, NDArray

from beamcore._core import Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "Extreme",
    "Sides",
    "Field",
    "StressExtreme",
    "Utilisation",
    "PartStress",
    "Ordinate",
    "Camber",
    "Reaction",
    "Response",
]

_Time: TypeAlias = Literal["initial", "final"]
_Array: TypeAlias = NDArray[np.float64]

@final
class Extreme:
    value: Final[Quantity]
    at: Final[Quantity]
    def __new__(cls, value: Quantity, at: Quantity) -> Extreme: ...

@final
class Sides:
    left: Final[Quantity]
    right: Final[Quantity]
    def __new__(cls, left: Quantity, right: Quantity) -> Sides: ...

@final
class Field:
    greatest: Final[Extreme]
    maximum: Final[Extreme]
    minimum: Final[Extreme]
    stations_m: Final[_Array]
    def value(self, at: QuantityLike) -> Quantity: ...
    def sides(self, at: QuantityLike) -> Sides: ...
    def values_m(self, x_m: ArrayLike) -> _Array: ...
    def values_rad(self, x_m: ArrayLike) -> _Array: ...
    def values_N(self, x_m: ArrayLike) -> _Array: ...
    def values_Nm(self, x_m: ArrayLike) -> _Array: ...
    def values_Pa(self, x_m: ArrayLike) -> _Array: ...

@final
class StressExtreme:
    value: Final[Quantity]
    at: Final[Quantity]
    z: Final[Quantity]
    def __new__(cls, value: Quantity, at: Quantity, z: Quantity) -> StressExtreme: ...

@final
class Utilisation:
    value: Final[float]
    at: Final[Quantity]
    def __new__(cls, value: float, at: Quantity) -> Utilisation: ...

@final
class PartStress:
    bottom: Final[Field]
    centroid: Final[Field]
    top: Final[Field]
    greatest_tension: Final[StressExtreme]
    greatest_compression: Final[StressExtreme]

@final
class Ordinate:
    station: Final[Quantity]
    ordinate: Final[Quantity]
    def __new__(cls, station: Quantity, ordinate: Quantity) -> Ordinate: ...

@final
class Camber:
    target: Final[Quantity]
    rise: Final[Quantity]
    chord: Final[tuple[Quantity, Quantity]]
    ordinates: Final[tuple[Ordinate, ...]]
    def ordinate(self, at: QuantityLike) -> Quantity: ...

@final
class Reaction:
    force: Final[Quantity]
    couple: Final[Quantity]
    def __new__(cls, force: Quantity, couple: Quantity) -> Reaction: ...

@final
class Response:
    combinations: Final[tuple[str, ...]]
    residual: Final[float]
    def deflection(self, combination: str, time: _Time) -> Field: ...
    def slope(self, combination: str, time: _Time) -> Field: ...
    def shear(self, combination: str, time: _Time) -> Field: ...
    def moment(self, combination: str, time: _Time) -> Field: ...
    def reaction(self, combination: str, time: _Time, support: str) -> Reaction: ...
    def stress(self, combination: str, time: _Time, part: str) -> PartStress: ...
    def utilisation(self, combination: str, time: _Time, part: str) -> Utilisation | None: ...
    def camber(
        self,
        *,
        combination: str,
        time: _Time,
        fraction: float,
        from_: str,
        to: str,
        step: QuantityLike,
        rounding: Literal["nearest", "down", "up"],
        divisions: int,
    ) -> Camber: ...
