from collections.abc import Sequence
from typing import Final, Literal, final

from beamcore._core import Extreme, Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "ReferenceLength",
    "LayerInput",
    "LayerStress",
    "ShearStress",
    "EffectiveSpacing",
    "effective_spacing",
    "Gamma",
    "SineLayers",
    "SimplifiedSpan",
    "SimplifiedJoint",
    "SimplifiedLayer",
]

@final
class ReferenceLength:
    kind: Final[Literal["span", "continuous", "cantilever"]]
    given: Final[Quantity]
    length: Final[Quantity]
    @staticmethod
    def span(length: QuantityLike) -> ReferenceLength: ...
    @staticmethod
    def continuous(length: QuantityLike) -> ReferenceLength: ...
    @staticmethod
    def cantilever(length: QuantityLike) -> ReferenceLength: ...

@final
class LayerInput:
    axial: Final[Quantity]
    bending: Final[Quantity]
    height: Final[Quantity]
    centroid_z: Final[Quantity]
    modulus: Final[Quantity]
    width: Final[Quantity]
    def __new__(
        cls,
        *,
        axial: QuantityLike,
        bending: QuantityLike,
        height: QuantityLike,
        centroid_z: QuantityLike,
        modulus: QuantityLike,
        width: QuantityLike,
    ) -> LayerInput: ...
    @staticmethod
    def rectangle(
        modulus: QuantityLike,
        width: QuantityLike,
        height: QuantityLike,
        centroid_z: QuantityLike,
    ) -> LayerInput: ...

@final
class LayerStress:
    axial: Final[Quantity]
    bending: Final[Quantity]
    bottom: Final[Quantity]
    top: Final[Quantity]
    def __new__(cls, axial: QuantityLike, bending: QuantityLike) -> LayerStress: ...

@final
class ShearStress:
    value: Final[Quantity]
    z: Final[Quantity]
    def __new__(cls, value: Quantity, z: Quantity) -> ShearStress: ...

@final
class EffectiveSpacing:
    spacing: Final[Quantity]
    warnings: Final[list[str]]
    def __new__(cls, spacing: Quantity, warnings: Sequence[str]) -> EffectiveSpacing: ...

def effective_spacing(least: QuantityLike, greatest: QuantityLike) -> EffectiveSpacing: ...

@final
class Gamma:
    layers: Final[tuple[LayerInput, ...]]
    base_layer: Final[int]
    factors: Final[tuple[float, ...]]
    arms: Final[tuple[Quantity, ...]]
    bending_stiffness: Final[Quantity]
    warnings: Final[tuple[str, ...]]
    def __new__(
        cls,
        layers: Sequence[LayerInput],
        joints: Sequence[QuantityLike],
        length: ReferenceLength,
    ) -> Gamma: ...
    def axial_forces(self, moment: QuantityLike) -> tuple[Quantity, ...]: ...
    def stresses(self, moment: QuantityLike) -> tuple[LayerStress, ...]: ...
    def flows(self, shear: QuantityLike) -> tuple[Quantity, ...]: ...
    def fastener_forces(
        self, shear: QuantityLike, spacings: Sequence[QuantityLike]
    ) -> tuple[Quantity, ...]: ...
    def shear_stresses(self, shear: QuantityLike) -> tuple[ShearStress, ...]: ...

@final
class SineLayers:
    layers: Final[tuple[LayerInput, ...]]
    arms: Final[tuple[Quantity, ...]]
    bending_stiffness: Final[Quantity]
    warnings: Final[tuple[str, ...]]
    def __new__(
        cls,
        layers: Sequence[LayerInput],
        joints: Sequence[QuantityLike],
        length: ReferenceLength,
    ) -> SineLayers: ...
    def axial_forces(self, moment: QuantityLike) -> tuple[Quantity, ...]: ...
    def stresses(self, moment: QuantityLike) -> tuple[LayerStress, ...]: ...
    def flows(self, shear: QuantityLike) -> tuple[Quantity, ...]: ...
    def fastener_forces(
        self, shear: QuantityLike, spacings: Sequence[QuantityLike]
    ) -> tuple[Quantity, ...]: ...
    def shear_stresses(self, shear: QuantityLike) -> tuple[ShearStress, ...]: ...

@final
class SimplifiedJoint:
    joint: Final[str]
    flow: Final[Extreme]
    exact_flow: Final[Extreme]
    def __new__(cls, joint: str, flow: Extreme, exact_flow: Extreme) -> SimplifiedJoint: ...

@final
class SimplifiedLayer:
    layer: Final[str]
    at: Final[Quantity]
    stress: Final[LayerStress]
    exact_axial: Final[Quantity]
    exact_moment: Final[Quantity]
    def __new__(
        cls,
        layer: str,
        at: Quantity,
        stress: LayerStress,
        exact_axial: Quantity,
        exact_moment: Quantity,
    ) -> SimplifiedLayer: ...

@final
class SimplifiedSpan:
    span: Final[str]
    length: Final[Quantity]
    factors: Final[list[float]]
    bending_stiffness: Final[Quantity]
    deflection: Final[Extreme]
    exact_deflection: Final[Extreme]
    difference: Final[float]
    joints: Final[list[SimplifiedJoint]]
    layers: Final[list[SimplifiedLayer]]
    warnings: Final[list[str]]
    def __new__(
        cls,
        span: str,
        length: Quantity,
        factors: Sequence[float],
        bending_stiffness: Quantity,
        deflection: Extreme,
        exact_deflection: Extreme,
        difference: float,
        joints: Sequence[SimplifiedJoint],
        layers: Sequence[SimplifiedLayer],
        warnings: Sequence[str],
    ) -> SimplifiedSpan: ...
