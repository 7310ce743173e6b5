from typing import Final, Literal, TypeAlias, final

from beamcore._core import Quantity
from beamcore._typing import QuantityLike

__all__ = [
    "TimberStrength",
    "MetalStrength",
    "CharacteristicTimberStrength",
    "CharacteristicMetalStrength",
    "CharacteristicConcreteStrength",
    "TimberFactors",
    "MetalFactors",
    "ConcreteCreep",
    "ConcreteShrinkage",
    "concrete_mean_modulus",
    "concrete_strength_share",
    "concrete_modulus_at_age",
    "Material",
    "timber",
    "steel",
    "steel_of_thickness",
    "aluminium",
    "concrete",
]

_Time: TypeAlias = Literal["initial", "final"]
_Cement: TypeAlias = Literal["S", "N", "R"]

@final
class TimberStrength:
    bending: Final[Quantity]
    tension: Final[Quantity]
    compression: Final[Quantity]
    def __new__(
        cls, bending: QuantityLike, tension: QuantityLike, compression: QuantityLike
    ) -> TimberStrength: ...

@final
class MetalStrength:
    yield_stress: Final[Quantity]
    def __new__(cls, yield_stress: QuantityLike) -> MetalStrength: ...

@final
class CharacteristicTimberStrength:
    bending: Final[Quantity]
    tension: Final[Quantity]
    compression: Final[Quantity]
    shear: Final[Quantity]
    tension_across: Final[Quantity | None]
    compression_across: Final[Quantity | None]
    def __new__(
        cls,
        bending: QuantityLike,
        tension: QuantityLike,
        compression: QuantityLike,
        shear: QuantityLike,
        tension_across: QuantityLike | None = None,
        compression_across: QuantityLike | None = None,
    ) -> CharacteristicTimberStrength: ...

@final
class CharacteristicMetalStrength:
    yield_stress: Final[Quantity]
    ultimate: Final[Quantity | None]
    def __new__(
        cls, yield_stress: QuantityLike, ultimate: QuantityLike | None = None
    ) -> CharacteristicMetalStrength: ...

@final
class CharacteristicConcreteStrength:
    compression: Final[Quantity]
    mean_compression: Final[Quantity]
    mean_tension: Final[Quantity]
    def __new__(
        cls, compression: QuantityLike, mean_compression: QuantityLike, mean_tension: QuantityLike
    ) -> CharacteristicConcreteStrength: ...

_Characteristic: TypeAlias = (
    CharacteristicTimberStrength | CharacteristicMetalStrength | CharacteristicConcreteStrength
)

@final
class TimberFactors:
    k_mod: Final[float]
    gamma_m: Final[float]
    k_h: Final[float | None]
    k_sys: Final[float | None]
    def __new__(
        cls, k_mod: float, gamma_m: float, k_h: float | None = None, k_sys: float | None = None
    ) -> TimberFactors: ...

@final
class MetalFactors:
    gamma_m: Final[float]
    def __new__(cls, gamma_m: float) -> MetalFactors: ...

@final
class ConcreteCreep:
    coefficient: Final[float]
    mean_strength: Final[Quantity]
    relative_humidity_percent: Final[float]
    notional_size: Final[Quantity]
    age_at_loading: Final[Quantity]
    age_at_end: Final[Quantity]
    cement: Final[_Cement]
    def __new__(
        cls,
        mean_strength: QuantityLike,
        relative_humidity_percent: float,
        notional_size: QuantityLike,
        age_at_loading: QuantityLike,
        age_at_end: QuantityLike,
        cement: _Cement,
    ) -> ConcreteCreep: ...

@final
class ConcreteShrinkage:
    basic_drying: Final[Quantity]
    drying: Final[Quantity]
    autogenous: Final[Quantity]
    total: Final[Quantity]
    mean_strength: Final[Quantity]
    relative_humidity_percent: Final[float]
    notional_size: Final[Quantity]
    age_at_drying: Final[Quantity]
    age_at_end: Final[Quantity]
    cement: Final[_Cement]
    def __new__(
        cls,
        mean_strength: QuantityLike,
        relative_humidity_percent: float,
        notional_size: QuantityLike,
        age_at_drying: QuantityLike,
        age_at_end: QuantityLike,
        cement: _Cement,
    ) -> ConcreteShrinkage: ...

def concrete_mean_modulus(mean_strength: QuantityLike) -> Quantity: ...
def concrete_strength_share(age: QuantityLike, cement: _Cement) -> float: ...
def concrete_modulus_at_age(
    mean_modulus: QuantityLike, age: QuantityLike, cement: _Cement
) -> Quantity: ...

@final
class Material:
    name: Final[str]
    modulus: Final[Quantity]
    fractile_modulus: Final[Quantity | None]
    shear_modulus: Final[Quantity | None]
    poisson_ratio: Final[float | None]
    density: Final[Quantity | None]
    fractile_density: Final[Quantity | None]
    thermal_expansion: Final[Quantity | None]
    thermal_expansion_origin: Final[str | None]
    creep_factor: Final[float]
    creep_basis: Final[str]
    characteristic_strength: Final[_Characteristic | None]
    design_factors: Final[TimberFactors | MetalFactors | None]
    design_strength: Final[TimberStrength | MetalStrength | None]
    design_shear_strength: Final[Quantity | None]
    origin: Final[str | None]
    overrides: Final[tuple[str, ...]]
    def __new__(
        cls,
        name: str,
        modulus: QuantityLike,
        creep_factor: float,
        density: QuantityLike | None = None,
        design_strength: TimberStrength | MetalStrength | None = None,
    ) -> Material: ...
    def modulus_at(self, time: _Time) -> Quantity: ...
    def shear_modulus_at(self, time: _Time) -> Quantity | None: ...
    def design_values(self) -> TimberStrength | MetalStrength | None: ...
    def named(self, name: str) -> Material: ...
    def with_values(
        self,
        *,
        modulus: QuantityLike | None = None,
        fractile_modulus: QuantityLike | None = None,
        shear_modulus: QuantityLike | None = None,
        poisson_ratio: float | None = None,
        density: QuantityLike | None = None,
        fractile_density: QuantityLike | None = None,
        thermal_expansion: QuantityLike | None = None,
        creep: float | ConcreteCreep | None = None,
    ) -> Material: ...
    def with_characteristic_strength(self, strength: _Characteristic) -> Material: ...
    def with_design_factors(self, factors: TimberFactors | MetalFactors) -> Material: ...
    def with_design_strength(self, strength: TimberStrength | MetalStrength) -> Material: ...
    def with_design_shear_strength(self, strength: QuantityLike) -> Material: ...

def timber(strength_class: str, service_class: int) -> Material: ...
def steel(strength_class: str) -> Material: ...
def steel_of_thickness(strength_class: str, thickness: QuantityLike) -> Material: ...
def aluminium(alloy_and_temper: str, thickness: QuantityLike) -> Material: ...
def concrete(strength_class: str, creep: float | ConcreteCreep) -> Material: ...
