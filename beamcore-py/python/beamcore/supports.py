"""Where a member is held, and where it is cut."""

from beamcore._core import (
    Support,
    pin,
    roller,
    fixed,
    Hinge,
    Anchor,
)

__all__ = [
    "Support",
    "pin",
    "roller",
    "fixed",
    "Hinge",
    "Anchor",
]
