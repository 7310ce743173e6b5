"""Types for annotations."""

from typing import Any, Protocol, TypeAlias

from beamcore._core import Quantity

__all__ = ["ForeignQuantity", "QuantityLike"]


class ForeignQuantity(Protocol):
    """A quantity of another units package: a number `magnitude` in `units`."""

    @property
    def magnitude(self) -> Any: ...

    @property
    def units(self) -> Any: ...

    def to_base_units(self) -> Any: ...


QuantityLike: TypeAlias = Quantity | str | ForeignQuantity
"""What a quantity may be given as: `225 * mm`, "225 mm", or of another units package."""
