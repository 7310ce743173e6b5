from collections.abc import Sequence
from typing import Final, Literal, TypeAlias, final, overload

import numpy as np
from numpy.typing import ArrayLike, NDArray

from beamcore._core import Joint, Layer, Part, Quantity, SimplifiedSpan, Support
from beamcore.actions import Combination
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
    "Reading",
    "Reaction",
    "JointResponse",
    "LayerForces",
    "CompositeAction",
    "Limit",
    "LimitCheck",
    "Response",
]

_Time: TypeAlias = Literal["initial", "final"]
_Component: TypeAlias = Literal["w_inst", "w_1", "w_2", "w_3", "w_tot", "w_max"]
_Shape: TypeAlias = Literal["parabola", "mirror", "arc_through_middle", "arc_least_gap"]
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
    def values_per_m(self, x_m: ArrayLike) -> _Array: ...
    def values_N(self, x_m: ArrayLike) -> _Array: ...
    def values_Nm(self, x_m: ArrayLike) -> _Array: ...
    def values_Pa(self, x_m: ArrayLike) -> _Array: ...
    def values_N_per_m(self, x_m: ArrayLike) -> _Array: ...

@final
class StressExtreme:
    value: Final[Quantity]
    at: Final[Quantity]
    y: Final[Quantity]
    z: Final[Quantity]
    def __new__(
        cls, value: Quantity, at: Quantity, y: Quantity, z: Quantity
    ) -> StressExtreme: ...

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
    shape: Final[_Shape]
    radius: Final[Quantity | None]
    target: Final[Quantity]
    rise: Final[Quantity]
    chord: Final[tuple[Quantity, Quantity]]
    ordinates: Final[tuple[Ordinate, ...]]
    def ordinate(self, at: QuantityLike) -> Quantity: ...

@final
class Reading:
    station: Final[Quantity]
    lying: Final[Quantity]
    standing: Final[Quantity]
    def __new__(cls, station: Quantity, lying: Quantity, standing: Quantity) -> Reading: ...

@final
class Limit:
    component: Final[_Component]
    span_over: Final[float | None]
    value: Final[Quantity | None]
    span: Final[str | None]
    combination: Final[str | None]
    @overload
    def __new__(
        cls,
        component: _Component,
        *,
        span_over: float,
        value: None = None,
        span: str | None = None,
        combination: str | None = None,
    ) -> Limit: ...
    @overload
    def __new__(
        cls,
        component: _Component,
        *,
        span_over: None = None,
        value: QuantityLike,
        span: str | None = None,
        combination: str | None = None,
    ) -> Limit: ...

@final
class LimitCheck:
    component: Final[str]
    combination: Final[str]
    span: Final[str]
    value: Final[Quantity]
    at: Final[Quantity]
    allowed: Final[Quantity]
    utilisation: Final[float]
    def __new__(
        cls,
        component: str,
        combination: str,
        span: str,
        value: Quantity,
        at: Quantity,
        allowed: Quantity,
        utilisation: float,
    ) -> LimitCheck: ...

@final
class Reaction:
    force: Final[Quantity]
    couple: Final[Quantity]
    along: Final[Quantity]
    def __new__(cls, force: Quantity, couple: Quantity, along: Quantity) -> Reaction: ...

@final
class JointResponse:
    slip: Final[Field]
    flow: Final[Field]
    pressure: Final[Field]

@final
class LayerForces:
    axial: Final[Field]
    moment: Final[Field]

@final
class CompositeAction:
    degree: Final[float]
    effective_stiffness: Final[Quantity]
    at: Final[Quantity]
    deflection: Final[Quantity]
    loose: Final[Quantity]
    rigid: Final[Quantity]
    def __new__(
        cls,
        degree: float,
        effective_stiffness: Quantity,
        at: Quantity,
        deflection: Quantity,
        loose: Quantity,
        rigid: Quantity,
    ) -> CompositeAction: ...

@final
class Response:
    combinations: Final[tuple[str, ...]]
    residual: Final[float]
    def combination(self, name: str) -> Combination: ...
    def deflection(self, combination: str, time: _Time) -> Field: ...
    def sideways(self, combination: str, time: _Time) -> Field: ...
    def axial(self, combination: str, time: _Time) -> Field: ...
    def slope(self, combination: str, time: _Time) -> Field: ...
    def rotation(self, combination: str, time: _Time) -> Field: ...
    def curvature(self, combination: str, time: _Time) -> Field: ...
    def shear(self, combination: str, time: _Time) -> Field: ...
    def moment(self, combination: str, time: _Time) -> Field: ...
    def layer_deflection(self, combination: str, time: _Time, layer: Layer | str) -> Field: ...
    def joint(self, combination: str, time: _Time, joint: Joint | str) -> JointResponse: ...
    def layer(self, combination: str, time: _Time, layer: Layer | str) -> LayerForces: ...
    def composite_action(self, combination: str, time: _Time) -> CompositeAction: ...
    def simplified(
        self, combination: str, time: _Time, method: Literal["gamma", "sine_layers"]
    ) -> tuple[SimplifiedSpan, ...]: ...
    def reaction(self, combination: str, time: _Time, support: Support | str) -> Reaction: ...
    def layer_reaction(
        self, combination: str, time: _Time, support: Support | str, layer: Layer | str
    ) -> Quantity: ...
    def anchor_force(self, combination: str, time: _Time, anchor: str) -> Quantity: ...
    def lifted(self, combination: str, time: _Time) -> tuple[str, ...]: ...
    def steps(self, combination: str, time: _Time) -> int: ...
    def stress(self, combination: str, time: _Time, part: str) -> PartStress: ...
    def utilisation(self, combination: str, time: _Time, part: str) -> Utilisation | None: ...
    def span_deflection(self, combination: str, time: _Time, span: str) -> Field: ...
    def deflection_component(
        self, component: _Component, combination: str, span: str, camber: Camber | None = None
    ) -> Field: ...
    def check_limits(
        self, limits: Sequence[Limit], camber: Camber | None = None
    ) -> tuple[LimitCheck, ...]: ...
    def camber(
        self,
        *,
        shape: _Shape,
        combination: str,
        time: _Time,
        fraction: float,
        from_: str,
        to: str,
        step: QuantityLike,
        rounding: Literal["nearest", "down", "up"],
        divisions: int,
        least: QuantityLike | None = None,
    ) -> Camber: ...
    def remaining(self, combination: str, time: _Time, camber: Camber) -> Field: ...
    def readings(
        self,
        camber: Camber,
        *,
        left: QuantityLike,
        right: QuantityLike,
        parts: Sequence[Part | str],
    ) -> tuple[Reading, ...]: ...
