from collections.abc import Sequence
from typing import Final, Literal, TypeAlias, final

from beamcore._core import Joint, Layer, Material, MergedLayer, PlacedJoint, Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "Outline",
    "rectangle",
    "polygon",
    "disc",
    "ring",
    "i_shape",
    "tee",
    "channel",
    "angle",
    "hollow_box",
    "InitialStrain",
    "StrainPlane",
    "Part",
    "PlacedPart",
    "SHEAR_STIFFNESS_DEFINITION",
    "Section",
    "SectionForces",
    "PointStress",
    "Stiffness",
    "Principal",
    "TransformedPart",
    "TransformedSection",
]

_Time: TypeAlias = Literal["initial", "final"]
_Sideways: TypeAlias = Literal["held", "free"]
_Axis: TypeAlias = Literal["upright", "level"]
_Point: TypeAlias = Sequence[QuantityLike]

SHEAR_STIFFNESS_DEFINITION: Final[str]

@final
class Outline:
    kind: Final[str]
    width: Final[Quantity]
    height: Final[Quantity]
    area: Final[Quantity]
    centroid_y: Final[Quantity]
    centroid_z: Final[Quantity]
    second_moment_yy: Final[Quantity]
    second_moment_zz: Final[Quantity]
    second_moment_yz: Final[Quantity]
    perimeter: Final[Quantity]

def rectangle(width: QuantityLike, height: QuantityLike) -> Outline: ...
def polygon(points: Sequence[_Point], holes: Sequence[Sequence[_Point]] = ...) -> Outline: ...
def disc(diameter: QuantityLike) -> Outline: ...
def ring(diameter: QuantityLike, wall_thickness: QuantityLike) -> Outline: ...
def i_shape(
    height: QuantityLike,
    top_width: QuantityLike,
    top_thickness: QuantityLike,
    bottom_width: QuantityLike,
    bottom_thickness: QuantityLike,
    web_thickness: QuantityLike,
) -> Outline: ...
def tee(
    height: QuantityLike,
    width: QuantityLike,
    flange_thickness: QuantityLike,
    web_thickness: QuantityLike,
) -> Outline: ...
def channel(
    height: QuantityLike,
    width: QuantityLike,
    flange_thickness: QuantityLike,
    web_thickness: QuantityLike,
) -> Outline: ...
def angle(height: QuantityLike, width: QuantityLike, thickness: QuantityLike) -> Outline: ...
def hollow_box(
    width: QuantityLike,
    height: QuantityLike,
    side_thickness: QuantityLike,
    plate_thickness: QuantityLike,
) -> Outline: ...

@final
class InitialStrain:
    axial: Final[Quantity]
    curvature_y: Final[Quantity]
    curvature_z: Final[Quantity]
    def __new__(
        cls,
        axial: QuantityLike | float,
        curvature_y: QuantityLike | None = None,
        curvature_z: QuantityLike | None = None,
    ) -> InitialStrain: ...

@final
class StrainPlane:
    axial: Final[Quantity]
    curvature_y: Final[Quantity]
    curvature_z: Final[Quantity]
    def strain_at(self, y: QuantityLike, z: QuantityLike) -> Quantity: ...

@final
class Part:
    name: Final[str]
    outline: Final[Outline]
    material: Final[Material]
    given_line_mass: Final[Quantity | None]
    given_initial_strain: Final[InitialStrain]
    def __new__(cls, name: str, outline: Outline, material: Material) -> Part: ...
    def at(self, y: QuantityLike, z: QuantityLike) -> Part: ...
    def left_of(self, other: Part | str) -> Part: ...
    def right_of(self, other: Part | str) -> Part: ...
    def above(self, other: Part | str) -> Part: ...
    def below(self, other: Part | str) -> Part: ...
    def mirror_of(self, other: Part | str, axis: _Axis) -> Part: ...
    def set_into(self, host: Part | str, y: QuantityLike, z: QuantityLike) -> Part: ...
    def with_line_mass(self, mass: QuantityLike) -> Part: ...
    def with_initial_strain(self, strain: InitialStrain) -> Part: ...

@final
class PlacedPart:
    name: Final[str]
    outline: Final[Outline]
    material: Final[Material]
    initial_strain: Final[InitialStrain]
    host: Final[str | None]
    left: Final[Quantity]
    right: Final[Quantity]
    bottom: Final[Quantity]
    top: Final[Quantity]
    centroid_y: Final[Quantity]
    centroid_z: Final[Quantity]
    area: Final[Quantity]
    line_mass: Final[Quantity | None]

@final
class Section:
    part_names: Final[tuple[str, ...]]
    line_mass: Final[Quantity | None]
    notes: Final[tuple[str, ...]]
    placed: Final[tuple[PlacedPart, ...]]
    layers: Final[tuple[Layer, ...]]
    joints: Final[tuple[Joint, ...]]
    placed_joints: Final[tuple[PlacedJoint, ...]]
    merged_layers: Final[tuple[MergedLayer, ...]]
    def __new__(
        cls,
        parts: Sequence[Part],
        *,
        layers: Sequence[Layer] | None = None,
        joints: Sequence[Joint] | None = None,
    ) -> Section: ...
    def part(self, name: str) -> PlacedPart: ...
    def joint(self, joint: Joint | str) -> PlacedJoint: ...
    def only(self, parts: Sequence[Part | str]) -> Section: ...
    def between(self, other: Section, share: float) -> Section: ...
    def stiffness(self, time: _Time) -> Stiffness: ...
    def shear_stiffness(self, time: _Time) -> Quantity: ...
    def fastened_shear_stiffness(self, time: _Time) -> Quantity: ...
    def free_plane(self, time: _Time, sideways: _Sideways) -> StrainPlane: ...
    def transformed_to(self, material: str, time: _Time) -> TransformedSection: ...
    def stress_at(
        self,
        part: Part | str,
        y: QuantityLike,
        z: QuantityLike,
        forces: SectionForces,
        *,
        sideways: _Sideways,
        time: _Time,
    ) -> Quantity: ...
    def stress_extremes(
        self, part: Part | str, forces: SectionForces, *, sideways: _Sideways, time: _Time
    ) -> tuple[PointStress, PointStress]: ...

@final
class SectionForces:
    axial: Final[Quantity]
    moment_y: Final[Quantity]
    moment_z: Final[Quantity]
    def __new__(
        cls, axial: QuantityLike, moment_y: QuantityLike, moment_z: QuantityLike
    ) -> SectionForces: ...

@final
class PointStress:
    value: Final[Quantity]
    y: Final[Quantity]
    z: Final[Quantity]
    def __new__(cls, value: Quantity, y: Quantity, z: Quantity) -> PointStress: ...

@final
class Stiffness:
    axial: Final[Quantity]
    centroid_y: Final[Quantity]
    centroid_z: Final[Quantity]
    bending_yy: Final[Quantity]
    bending_zz: Final[Quantity]
    bending_yz: Final[Quantity]
    principal: Final[Principal]
    moduli: Final[tuple[Quantity, ...]]
    shares: Final[tuple[float, ...]]

@final
class Principal:
    greater: Final[Quantity]
    smaller: Final[Quantity]
    angle: Final[Quantity]
    def __new__(cls, greater: Quantity, smaller: Quantity, angle: Quantity) -> Principal: ...

@final
class TransformedPart:
    name: Final[str]
    ratio: Final[float]
    width: Final[Quantity]
    bottom: Final[Quantity]
    top: Final[Quantity]
    loops: Final[list[list[tuple[Quantity, Quantity]]]]
    def __new__(
        cls,
        name: str,
        ratio: float,
        width: Quantity,
        bottom: Quantity,
        top: Quantity,
        loops: Sequence[Sequence[tuple[Quantity, Quantity]]],
    ) -> TransformedPart: ...

@final
class TransformedSection:
    reference_modulus: Final[Quantity]
    area: Final[Quantity]
    centroid_z: Final[Quantity]
    second_moment: Final[Quantity]
    parts: Final[tuple[TransformedPart, ...]]
    def stress(self, part: str, z: QuantityLike, moment: QuantityLike) -> Quantity: ...
