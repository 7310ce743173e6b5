from collections.abc import Mapping, Sequence
from typing import Final, Literal, final

from beamcore._core import Joint, Layer, Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "Support",
    "pin",
    "roller",
    "fixed",
    "Hinge",
    "Anchor",
]

@final
class Support:
    name: Final[str]
    kind: Final[str]
    at: Final[Quantity]
    spring: Final[Quantity | None]
    axial_spring: Final[Quantity | None]
    rotational_spring: Final[Quantity | None]
    one_way: Final[bool]
    height: Final[Quantity | None]
    under: Final[tuple[str, ...]]
    holding: Final[dict[str, Quantity]]

def pin(
    name: str,
    at: QuantityLike,
    *,
    spring: QuantityLike | None = None,
    axial_spring: QuantityLike | None = None,
    rotational_spring: QuantityLike | None = None,
    one_way: bool = False,
    height: QuantityLike | None = None,
    under: Sequence[Layer | str] = ...,
    holding: Mapping[str, QuantityLike] | None = None,
) -> Support: ...
def roller(
    name: str,
    at: QuantityLike,
    *,
    spring: QuantityLike | None = None,
    axial_spring: QuantityLike | None = None,
    rotational_spring: QuantityLike | None = None,
    one_way: bool = False,
    height: QuantityLike | None = None,
    under: Sequence[Layer | str] = ...,
    holding: Mapping[str, QuantityLike] | None = None,
) -> Support: ...
def fixed(
    name: str,
    at: QuantityLike,
    *,
    spring: QuantityLike | None = None,
    axial_spring: QuantityLike | None = None,
    rotational_spring: QuantityLike | None = None,
    one_way: bool = False,
    height: QuantityLike | None = None,
    under: Sequence[Layer | str] = ...,
    holding: Mapping[str, QuantityLike] | None = None,
) -> Support: ...

@final
class Hinge:
    kind: Final[Literal["moment", "shear", "butt"]]
    at: Final[Quantity]
    layer: Final[str | None]
    @staticmethod
    def moment(at: QuantityLike, layer: Layer | str | None = None) -> Hinge: ...
    @staticmethod
    def shear(at: QuantityLike) -> Hinge: ...
    @staticmethod
    def butt(at: QuantityLike, layer: Layer | str) -> Hinge: ...

@final
class Anchor:
    name: Final[str]
    joint: Final[str]
    at: Final[Quantity]
    stiffness: Final[Quantity | None]
    def __new__(
        cls,
        name: str,
        joint: Joint | str,
        at: QuantityLike,
        stiffness: QuantityLike | None = None,
    ) -> Anchor: ...
