from collections.abc import Sequence
from typing import Final, Literal, TypeAlias, final, overload

from beamcore._core import Part, Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "Layer",
    "MergedLayer",
    "Band",
    "Joint",
    "PlacedJoint",
]

_Time: TypeAlias = Literal["initial", "final"]
_Kind: TypeAlias = Literal["rigid", "loose", "slipping", "fasteners", "glue"]

@final
class Layer:
    name: Final[str]
    parts: Final[tuple[str, ...]]
    extent: Final[tuple[Quantity, Quantity] | None]
    @overload
    def __new__(
        cls, name: str, parts: Sequence[Part | str], *, from_: None = None, to: None = None
    ) -> Layer: ...
    @overload
    def __new__(
        cls, name: str, parts: Sequence[Part | str], *, from_: QuantityLike, to: QuantityLike
    ) -> Layer: ...

@final
class MergedLayer:
    layers: Final[list[str]]
    parts: Final[list[str]]
    def __new__(cls, layers: Sequence[str], parts: Sequence[str]) -> MergedLayer: ...

@final
class Band:
    from_: Final[Quantity]
    to: Final[Quantity]
    spacing: Final[Quantity]
    def __new__(cls, from_: QuantityLike, to: QuantityLike, spacing: QuantityLike) -> Band: ...

@final
class Joint:
    name: Final[str]
    lower: Final[str]
    upper: Final[str]
    kind: Final[_Kind]
    gap: Final[Quantity | None]
    transverse: Final[Quantity | None]
    clearance: Final[Quantity | None]
    creep: Final[float | None]
    modulus: Final[Quantity | None]
    stiffness: Final[Quantity | None]
    rows: Final[int | None]
    planes: Final[int | None]
    spacing: Final[Quantity | None]
    bands: Final[tuple[Band, ...] | None]
    shear_modulus: Final[Quantity | None]
    width: Final[Quantity | None]
    thickness: Final[Quantity | None]
    @staticmethod
    def rigid(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        gap: QuantityLike | None = None,
    ) -> Joint: ...
    @staticmethod
    def loose(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        gap: QuantityLike | None = None,
        transverse: QuantityLike | None = None,
        creep: float | None = None,
    ) -> Joint: ...
    @staticmethod
    def slipping(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        modulus: QuantityLike,
        gap: QuantityLike | None = None,
        transverse: QuantityLike | None = None,
        clearance: QuantityLike | None = None,
        creep: float | None = None,
    ) -> Joint: ...
    @overload
    @staticmethod
    def fasteners(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        stiffness: QuantityLike,
        rows: int,
        planes: int,
        spacing: QuantityLike,
        bands: None = None,
        gap: QuantityLike | None = None,
        transverse: QuantityLike | None = None,
        clearance: QuantityLike | None = None,
        creep: float | None = None,
    ) -> Joint: ...
    @overload
    @staticmethod
    def fasteners(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        stiffness: QuantityLike,
        rows: int,
        planes: int,
        spacing: None = None,
        bands: Sequence[Band],
        gap: QuantityLike | None = None,
        transverse: QuantityLike | None = None,
        clearance: QuantityLike | None = None,
        creep: float | None = None,
    ) -> Joint: ...
    @staticmethod
    def glue(
        name: str,
        lower: Layer | str,
        upper: Layer | str,
        *,
        shear_modulus: QuantityLike,
        width: QuantityLike,
        thickness: QuantityLike,
        gap: QuantityLike | None = None,
        transverse: QuantityLike | None = None,
        clearance: QuantityLike | None = None,
        creep: float | None = None,
    ) -> Joint: ...
    def modulus_at(self, at: QuantityLike) -> Quantity | None: ...

@final
class PlacedJoint:
    joint: Final[Joint]
    distance: Final[Quantity]
    z: Final[Quantity]
    width: Final[Quantity]
    creep_factor: Final[float]
    creep_basis: Final[str]
    clearance: Final[Quantity]
    extent: Final[tuple[Quantity, Quantity] | None]
    places: Final[tuple[Quantity, ...]]
    def slip_modulus_at(self, at: QuantityLike, time: _Time) -> Quantity | None: ...
    def transverse_modulus_at(self, at: QuantityLike, time: _Time) -> Quantity | None: ...
