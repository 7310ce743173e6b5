"""What comes of a solved member: fields along it, reactions, stresses and camber."""

from beamcore._core import (
    Extreme,
    Sides,
    Field,
    StressExtreme,
    Utilisation,
    PartStress,
    Ordinate,
    Camber,
    Reaction,
    Response,
)

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
