from collections.abc import Sequence
from os import PathLike
from typing import Any, ClassVar, Final, Literal, TypeAlias, TypeVar, final, overload

from beamcore._typing import QuantityLike
from beamcore.actions import (
    CombinationFactors as CombinationFactors, Load as Load, self_weight as self_weight,
    uniform as uniform, partial as partial, trapezoidal as trapezoidal, area as area,
    point as point, couple as couple, plan as plan, axial as axial, prestress as prestress,
    settlement as settlement, imposed_rotation as imposed_rotation, temperature as temperature,
    temperature_difference as temperature_difference, free_strain as free_strain, Action as Action,
    permanent as permanent, variable as variable, PartialFactors as PartialFactors,
    OwnCombination as OwnCombination, Combination as Combination,
)
from beamcore.errors import (
    BeamcoreError as BeamcoreError, ValueProblem as ValueProblem, NameProblem as NameProblem,
    KeyProblem as KeyProblem, UnitProblem as UnitProblem, DuplicateProblem as DuplicateProblem,
    GeometryProblem as GeometryProblem, MissingProblem as MissingProblem,
    MechanismProblem as MechanismProblem, PositionProblem as PositionProblem,
    SyntaxProblem as SyntaxProblem, VersionProblem as VersionProblem, FileProblem as FileProblem,
    LookupProblem as LookupProblem, NumericalProblem as NumericalProblem, Problem as Problem,
)
from beamcore.joints import (
    Layer as Layer, MergedLayer as MergedLayer, Band as Band, Joint as Joint,
    PlacedJoint as PlacedJoint,
)
from beamcore.materials import (
    TimberStrength as TimberStrength, MetalStrength as MetalStrength,
    CharacteristicTimberStrength as CharacteristicTimberStrength,
    CharacteristicMetalStrength as CharacteristicMetalStrength,
    CharacteristicConcreteStrength as CharacteristicConcreteStrength,
    TimberFactors as TimberFactors, MetalFactors as MetalFactors, ConcreteCreep as ConcreteCreep,
    ConcreteShrinkage as ConcreteShrinkage, concrete_mean_modulus as concrete_mean_modulus,
    concrete_strength_share as concrete_strength_share,
    concrete_modulus_at_age as concrete_modulus_at_age, Material as Material, timber as timber,
    steel as steel, steel_of_thickness as steel_of_thickness, aluminium as aluminium,
    concrete as concrete,
)
from beamcore.results import (
    Extreme as Extreme, Sides as Sides, Field as Field, StressExtreme as StressExtreme,
    Utilisation as Utilisation, PartStress as PartStress, Ordinate as Ordinate, Camber as Camber,
    Reading as Reading, Reaction as Reaction, JointResponse as JointResponse,
    LayerForces as LayerForces, CompositeAction as CompositeAction, Limit as Limit,
    LimitCheck as LimitCheck, Response as Response,
)
from beamcore.sections import (
    Outline as Outline, rectangle as rectangle, polygon as polygon, disc as disc, ring as ring,
    i_shape as i_shape, tee as tee, channel as channel, angle as angle, hollow_box as hollow_box,
    InitialStrain as InitialStrain, StrainPlane as StrainPlane, Part as Part,
    PlacedPart as PlacedPart, SHEAR_STIFFNESS_DEFINITION as SHEAR_STIFFNESS_DEFINITION,
    Section as Section, SectionForces as SectionForces, PointStress as PointStress,
    Stiffness as Stiffness, Principal as Principal, TransformedPart as TransformedPart,
    TransformedSection as TransformedSection,
)
from beamcore.simplified import (
    ReferenceLength as ReferenceLength, LayerInput as LayerInput, LayerStress as LayerStress,
    ShearStress as ShearStress, EffectiveSpacing as EffectiveSpacing,
    effective_spacing as effective_spacing, Gamma as Gamma, SineLayers as SineLayers,
    SimplifiedSpan as SimplifiedSpan, SimplifiedJoint as SimplifiedJoint,
    SimplifiedLayer as SimplifiedLayer,
)
from beamcore.supports import (
    Support as Support, pin as pin, roller as roller, fixed as fixed, Hinge as Hinge,
    Anchor as Anchor,
)

__all__ = [
    "__version__", "Unit", "Quantity", "TimberStrength", "MetalStrength",
    "CharacteristicTimberStrength", "CharacteristicMetalStrength", "CharacteristicConcreteStrength",
    "TimberFactors", "MetalFactors", "ConcreteCreep", "ConcreteShrinkage", "concrete_mean_modulus",
    "concrete_strength_share", "concrete_modulus_at_age", "Material", "timber", "steel",
    "steel_of_thickness", "aluminium", "concrete", "Outline", "rectangle", "polygon", "disc",
    "ring", "i_shape", "tee", "channel", "angle", "hollow_box", "InitialStrain", "StrainPlane",
    "Part", "PlacedPart", "Layer", "MergedLayer", "Band", "Joint", "PlacedJoint",
    "SHEAR_STIFFNESS_DEFINITION", "Section", "SectionForces", "PointStress", "Stiffness",
    "Principal", "TransformedPart", "TransformedSection", "Support", "pin", "roller", "fixed",
    "Hinge", "Anchor", "SectionChange", "step", "taper", "CombinationFactors", "Load",
    "self_weight", "uniform", "partial", "trapezoidal", "area", "point", "couple", "plan", "axial",
    "prestress", "settlement", "imposed_rotation", "temperature", "temperature_difference",
    "free_strain", "Action", "permanent", "variable", "PartialFactors", "OwnCombination",
    "Combination", "Span", "Member", "Job", "Outcome", "run", "job_schema", "outcome_schema",
    "BeamcoreError", "ValueProblem", "NameProblem", "KeyProblem", "UnitProblem", "DuplicateProblem",
    "GeometryProblem", "MissingProblem", "MechanismProblem", "PositionProblem", "SyntaxProblem",
    "VersionProblem", "FileProblem", "LookupProblem", "NumericalProblem", "Problem", "Extreme",
    "Sides", "Field", "StressExtreme", "Utilisation", "PartStress", "Ordinate", "Camber", "Reading",
    "Reaction", "JointResponse", "LayerForces", "CompositeAction", "Limit", "LimitCheck",
    "Response", "ReferenceLength", "LayerInput", "LayerStress", "ShearStress", "EffectiveSpacing",
    "effective_spacing", "Gamma", "SineLayers",
    "SimplifiedSpan", "SimplifiedJoint", "SimplifiedLayer",
]

_T = TypeVar("_T", Unit, Quantity)
_Sideways: TypeAlias = Literal["held", "free"]
_Shear: TypeAlias = Literal["rigid", "flexible"]
_Format: TypeAlias = Literal["toml", "json"]

__version__: str

@final
class Unit:
    __array_ufunc__: ClassVar[None]
    def __new__(cls, symbol: str) -> Unit: ...
    @overload
    def __mul__(self, other: float, /) -> Quantity: ...
    @overload
    def __mul__(self, other: _T, /) -> _T: ...
    def __rmul__(self, other: float, /) -> Quantity: ...
    @overload
    def __truediv__(self, other: float, /) -> Quantity: ...
    @overload
    def __truediv__(self, other: Unit, /) -> Unit: ...
    @overload
    def __truediv__(self, other: Quantity, /) -> Any: ...
    def __rtruediv__(self, other: float, /) -> Quantity: ...
    def __pow__(self, exponent: int, modulo: None = None, /) -> Unit: ...
    def __rpow__(self, base: Any, modulo: Any = None, /) -> Any: ...
    def __eq__(self, other: object, /) -> bool: ...
    def __hash__(self) -> int: ...

@final
class Quantity:
    __array_ufunc__: ClassVar[None]
    si: Final[float]
    def __new__(cls, number: float, unit: Unit | str) -> Quantity: ...
    @staticmethod
    def from_si(si: float, unit: Unit) -> Quantity: ...
    def to(self, unit: Unit | str) -> float: ...
    # Two quantities whose units cancel give a number.
    @overload
    def __mul__(self, other: float | Unit, /) -> Quantity: ...
    @overload
    def __mul__(self, other: Quantity, /) -> Any: ...
    def __rmul__(self, other: float | Unit, /) -> Quantity: ...
    @overload
    def __truediv__(self, other: float | Unit, /) -> Quantity: ...
    @overload
    def __truediv__(self, other: Quantity, /) -> Any: ...
    def __rtruediv__(self, other: float, /) -> Quantity: ...
    def __add__(self, other: Quantity, /) -> Quantity: ...
    def __sub__(self, other: Quantity, /) -> Quantity: ...
    def __radd__(self, other: Any, /) -> Any: ...
    def __rsub__(self, other: Any, /) -> Any: ...
    def __pow__(self, exponent: int, modulo: None = None, /) -> Quantity: ...
    def __rpow__(self, base: Any, modulo: Any = None, /) -> Any: ...
    def __neg__(self) -> Quantity: ...
    def __pos__(self) -> Quantity: ...
    def __abs__(self) -> Quantity: ...
    def __lt__(self, other: Quantity, /) -> bool: ...
    def __le__(self, other: Quantity, /) -> bool: ...
    def __gt__(self, other: Quantity, /) -> bool: ...
    def __ge__(self, other: Quantity, /) -> bool: ...
    def __eq__(self, other: object, /) -> bool: ...
    def __hash__(self) -> int: ...

@final
class Span:
    name: Final[str]
    from_: Final[Quantity]
    to: Final[Quantity]
    length: Final[Quantity]
    cantilever: Final[bool]
    def __new__(
        cls, name: str, from_: Quantity, to: Quantity, length: Quantity, cantilever: bool
    ) -> Span: ...

@final
class SectionChange:
    kind: Final[Literal["step", "taper"]]
    from_: Final[Quantity]
    to: Final[Quantity]
    section: Final[Section]

def step(at: QuantityLike, section: Section) -> SectionChange: ...
def taper(from_: QuantityLike, to: QuantityLike, section: Section) -> SectionChange: ...

@final
class Member:
    section: Final[Section]
    changes: Final[tuple[SectionChange, ...]]
    parts: Final[tuple[PlacedPart, ...]]
    hinges: Final[tuple[Hinge, ...]]
    anchors: Final[tuple[Anchor, ...]]
    shear: Final[_Shear | Quantity]
    pitch: Final[Quantity | None]
    has_deflections_of_layers: Final[bool]
    has_axial_force: Final[bool]
    length: Final[Quantity]
    support_names: Final[tuple[str, ...]]
    combinations: Final[tuple[str, ...]]
    partial_factors: Final[PartialFactors]
    spans: Final[tuple[Span, ...]]
    sideways: Final[_Sideways]
    notes: Final[tuple[str, ...]]
    def __new__(
        cls,
        section: Section,
        length: QuantityLike,
        supports: Sequence[Support],
        actions: Sequence[Action],
        *,
        partial_factors: PartialFactors | None = None,
        own_combinations: Sequence[OwnCombination] = ...,
        sideways: _Sideways | None = None,
        changes: Sequence[SectionChange] = ...,
        hinges: Sequence[Hinge] = ...,
        anchors: Sequence[Anchor] = ...,
        shear: _Shear | QuantityLike | None = None,
        pitch: QuantityLike | None = None,
    ) -> Member: ...
    @staticmethod
    def simple_span(
        section: Section,
        span: QuantityLike,
        actions: Sequence[Action],
        *,
        partial_factors: PartialFactors | None = None,
        own_combinations: Sequence[OwnCombination] = ...,
        sideways: _Sideways | None = None,
        changes: Sequence[SectionChange] = ...,
        hinges: Sequence[Hinge] = ...,
        anchors: Sequence[Anchor] = ...,
        shear: _Shear | QuantityLike | None = None,
        pitch: QuantityLike | None = None,
    ) -> Member: ...
    def span(self, name: str) -> Span: ...
    def section_at(self, at: QuantityLike) -> Section: ...
    def solve(self) -> Response: ...

@final
class Job:
    @staticmethod
    def read(text: str, format: _Format = "toml") -> Job: ...
    @staticmethod
    def open(path: str | PathLike[str]) -> Job: ...
    def to_text(self, format: _Format = "toml") -> str: ...
    def solve(self) -> Outcome: ...

@final
class Outcome:
    json: Final[str]
    def summary(self) -> str: ...
    def number(self, path: str) -> float: ...
    def text(self, path: str) -> str: ...
    def as_dict(self) -> dict[str, Any]: ...

def run(text: str, format: _Format = "toml") -> Outcome: ...
def job_schema() -> str: ...
def outcome_schema() -> str: ...
