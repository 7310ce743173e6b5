"""Simplified methods for layers that slip on each other: hand formulas, without a member."""

from beamcore._core import (
    ReferenceLength,
    LayerInput,
    LayerStress,
    ShearStress,
    EffectiveSpacing,
    effective_spacing,
    Gamma,
    SineLayers,
    SimplifiedSpan,
    SimplifiedJoint,
    SimplifiedLayer,
)

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
