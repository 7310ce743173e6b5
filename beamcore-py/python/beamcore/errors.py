"""The exceptions: one class per kind of problem, under one base."""

from beamcore._core import (
    BeamcoreError,
    ValueProblem,
    NameProblem,
    KeyProblem,
    UnitProblem,
    DuplicateProblem,
    GeometryProblem,
    MissingProblem,
    MechanismProblem,
    PositionProblem,
    SyntaxProblem,
    VersionProblem,
    FileProblem,
    LookupProblem,
    NumericalProblem,
    Problem,
)

__all__ = [
    "BeamcoreError",
    "ValueProblem",
    "NameProblem",
    "KeyProblem",
    "UnitProblem",
    "DuplicateProblem",
    "GeometryProblem",
    "MissingProblem",
    "MechanismProblem",
    "PositionProblem",
    "SyntaxProblem",
    "VersionProblem",
    "FileProblem",
    "LookupProblem",
    "NumericalProblem",
    "Problem",
]
