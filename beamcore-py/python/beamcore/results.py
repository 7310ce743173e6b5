"""What comes of a solved member: fields, reactions, stresses, limits and camber."""

from beamcore._core import (
    Extreme,
    Sides,
    Field,
    StressExtreme,
    Utilisation,
    PartStress,
    Ordinate,
    Camber,
    Reading,
    Reaction,
    JointResponse,
    LayerForces,
    CompositeAction,
    Limit,
    LimitCheck,
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
    "Reading",
    "Reaction",
    "JointResponse",
    "LayerForces",
    "CompositeAction",
    "Limit",
    "LimitCheck",
    "Response",
]
