"""What acts on a member: loads, actions, and how they are combined."""

from beamcore._core import (
    CombinationFactors,
    Load,
    self_weight,
    uniform,
    partial,
    trapezoidal,
    area,
    point,
    couple,
    Action,
    permanent,
    variable,
    PartialFactors,
    OwnCombination,
    Combination,
)

__all__ = [
    "CombinationFactors",
    "Load",
    "self_weight",
    "uniform",
    "partial",
    "trapezoidal",
    "area",
    "point",
    "couple",
    "Action",
    "permanent",
    "variable",
    "PartialFactors",
    "OwnCombination",
    "Combination",
]
