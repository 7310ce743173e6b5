"""Layers of a section, and the joints between them."""

from beamcore._core import (
    Layer,
    MergedLayer,
    Band,
    Joint,
    PlacedJoint,
)

__all__ = [
    "Layer",
    "MergedLayer",
    "Band",
    "Joint",
    "PlacedJoint",
]
