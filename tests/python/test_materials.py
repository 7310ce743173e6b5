"""Materials at full width: classes, values of one's own, strengths, shrinkage and age."""

from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    BeamcoreError, CharacteristicConcreteStrength, CharacteristicMetalStrength,
    CharacteristicTimberStrength, ConcreteCreep, ConcreteShrinkage, Material, MetalFactors,
    MetalStrength, Part, Section, TimberFactors, TimberStrength, aluminium, concrete,
    concrete_mean_modulus, concrete_modulus_at_age, concrete_strength_share, rectangle, steel,
    steel_of_thickness, timber,
)
from beamcore.units import GPa, K, MPa, day, kN, kg, m, mm, permille


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def used(material: Material) -> Section:
    return Section([Part("a", rectangle(75*mm, 225*mm), material)])


def test_classes_bear_all_their_values() -> None:
    """EN 338:2016 Table 1 (C24), EN 10025-2:2004, EN 1999-1-1:2007 (from memory)."""
    c24 = timber("C24", service_class=1)
    assert c24.fractile_modulus == 7.4*GPa and c24.fractile_density == 350*kg/m**3
    assert c24.shear_modulus == 690*MPa and c24.poisson_ratio is None
    assert c24.shear_modulus_at("initial") == 690*MPa
    assert c24.shear_modulus_at("final") == 690*MPa / 1.6
    strength = c24.characteristic_strength
    assert isinstance(strength, CharacteristicTimberStrength)
    assert (strength.bending, strength.tension) == (24*MPa, 14.5*MPa)
    assert (strength.compression, strength.shear) == (21*MPa, 4*MPa)
    assert (strength.tension_across, strength.compression_across) == (0.4*MPa, 2.5*MPa)
    assert c24.thermal_expansion == 5e-6/K
    assert c24.thermal_expansion_origin == "timber along the grain, common practice, no source"

    plate = steel_of_thickness("S355", 20*mm)
    assert plate.characteristic_strength == CharacteristicMetalStrength(345*MPa, "470 MPa")
    assert steel("S355").characteristic_strength is None
    profile = aluminium("EN AW-6082 T6", "8 mm")
    assert (profile.modulus, profile.shear_modulus) == (70*GPa, 27*GPa)
    assert (profile.density, profile.thermal_expansion) == (2700*kg/m**3, 23e-6/K)
    assert profile.characteristic_strength == CharacteristicMetalStrength(260*MPa, 310*MPa)
    slab = concrete("C30/37", creep=2.5)
    assert slab.poisson_ratio == 0.2 and slab.shear_modulus == 33*GPa / 2.4
    assert slab.characteristic_strength == CharacteristicConcreteStrength(30*MPa, 38*MPa, 2.9*MPa)


def test_values_of_ones_own() -> None:
    c24 = timber("C24", service_class=1)
    own = c24.with_values(
        modulus=12*GPa, fractile_modulus="8 GPa", shear_modulus=750*MPa, density=450*kg/m**3,
        fractile_density=380*kg/m**3, thermal_expansion=6e-6/K, creep=0.9,
    )
    assert (own.modulus, own.fractile_modulus, own.shear_modulus) == (12*GPa, 8*GPa, 750*MPa)
    assert (own.density, own.fractile_density) == (450*kg/m**3, 380*kg/m**3)
    assert (own.thermal_expansion, own.creep_factor) == (6e-6/K, 0.9)
    assert own.thermal_expansion_origin is None
    assert own.overrides == (
        "modulus 12 GPa instead of 11 GPa",
        "5 % fractile of the modulus 8 GPa instead of 7.4 GPa",
        "shear modulus 750 MPa instead of 690 MPa",
        "density 450 kg/m3 instead of 420 kg/m3",
        "5 % fractile of the density 380 kg/m3 instead of 350 kg/m3",
        "thermal expansion 6e-6 /K instead of 5e-6 /K",
        "creep factor 0.9 instead of 0.6",
    )
    assert c24.overrides == () and c24.with_values() == c24
    glass = Material("glass", 70*GPa, 0).with_values(poisson_ratio=0.22)
    assert glass.shear_modulus == 70*GPa / 2.44 and glass.overrides == ()
    assert Material("own", 10*GPa, 0).shear_modulus is None
    creep = ConcreteCreep(38*MPa, 50, 150*mm, 28*day, 18250*day, "N")
    assert own.with_values(creep=creep).creep_factor == creep.coefficient


def test_design_strengths_out_of_characteristic_ones() -> None:
    """f_d = k_mod k_h k_sys f_k/gamma_M of C24, worked by hand."""
    factors = TimberFactors(0.8, gamma_m=1.25, k_h=1.1, k_sys=1.05)
    assert (factors.k_mod, factors.gamma_m, factors.k_h, factors.k_sys) == (0.8, 1.25, 1.1, 1.05)
    joist = timber("C24", 1).with_design_factors(factors)
    assert joist.design_factors == factors
    design = joist.design_values()
    assert isinstance(design, TimberStrength) and design == joist.design_strength
    assert design.bending.to(MPa) == pytest.approx(17.7408, rel=1e-12)
    assert design.tension.to(MPa) == pytest.approx(10.7184, rel=1e-12)
    assert design.compression.to(MPa) == pytest.approx(14.112, rel=1e-12)
    assert joist.design_shear_strength is not None
    assert joist.design_shear_strength.to(MPa) == pytest.approx(2.688, rel=1e-12)

    plate = steel_of_thickness("S355", 10*mm).with_design_factors(MetalFactors(1.1))
    assert plate.design_strength == MetalStrength(355*MPa / 1.1)
    assert plate.design_shear_strength is not None
    assert plate.design_shear_strength.to(MPa) == pytest.approx(355 / 1.1 / 3**0.5, rel=1e-12)
    given = timber("C24", 1).with_design_shear_strength(2.5*MPa)
    assert given.design_shear_strength == 2.5*MPa and given.design_strength is None
    oak = Material("oak", 10*GPa, 0.6).with_characteristic_strength(
        CharacteristicTimberStrength(30*MPa, 18*MPa, 23*MPa, 4*MPa)
    )
    made = oak.with_design_factors(TimberFactors(0.5, 1.0))
    assert made.design_strength == TimberStrength(15*MPa, 9*MPa, 11.5*MPa)
    assert used(made).part_names == ("a",)


def test_mistakes_in_strengths_are_told() -> None:
    assert problems(timber("C24", 1).design_values) == [
        'materials["C24"].design_factors: found characteristic strengths of timber without '
        "design factors; expected k_mod and gamma_M, or design strengths"
    ]
    assert problems(lambda: used(steel("S275").with_design_factors(MetalFactors(1)))) == [
        'materials["S275"].characteristic_strength: found design factors without characteristic '
        "strengths; expected the characteristic strengths that the factors are for"
    ]
    assert problems(lambda: used(timber("C24", 1).with_design_factors(TimberFactors(8, 1.3)))) == [
        'materials["C24"].design_factors.timber.k_mod: found 8; expected a number from 0.1 to 1.1'
    ]
    twice = timber("C24", 1).with_design_factors(TimberFactors(0.8, 1.3))
    [problem] = problems(lambda: used(twice.with_design_shear_strength(2*MPa)))
    assert problem.startswith('materials["C24"].design_factors: found design factors beside ')
    assert len(problems(lambda: CharacteristicMetalStrength(1*m, "1 kN"))) == 2
    assert len(problems(lambda: CharacteristicTimberStrength(1*m, "1 kN", 1*m, 1*m, 1*m))) == 5
    wrong: Any = MetalStrength(1*MPa)
    with pytest.raises(TypeError):
        steel("S275").with_characteristic_strength(wrong)


def test_mistakes_in_values_are_told_at_once() -> None:
    wrong: Any = 12e-6
    found = problems(lambda: steel("S275").with_values(
        modulus=1*kN, density=3*m, thermal_expansion=wrong
    ))
    assert [problem.split(": found ")[0] for problem in found] == [
        "material.modulus", "material.density", "material.thermal_expansion",
    ]
    assert found[2].endswith('expected a thermal expansion with one of the units /K, '
                             'for example "0.000012 /K"')
    hot = steel("S275").with_values(thermal_expansion=12/K)
    [problem] = problems(lambda: used(hot))
    assert problem.startswith('materials["S275"].thermal_expansion: found 12 /K; ')
    both = Material("own", 10*GPa, 0).with_values(shear_modulus=6*GPa, poisson_ratio=0.25)
    [problem] = problems(lambda: used(both))
    assert problem.startswith('materials["own"].shear_modulus: found 6 GPa beside Poisson')
    assert problems(lambda: aluminium("EN AW-6082 T6", 16*mm))[0].startswith("thickness: found ")
    with pytest.raises(beamcore.NameProblem):
        steel_of_thickness("S999", 10*mm)


def test_shrinkage_and_age_of_concrete() -> None:
    """An independent script of EN 1992-1-1:2004 3.1.2 to 3.1.4, as in the core's own tests."""
    slab = ConcreteShrinkage(
        mean_strength=38*MPa, relative_humidity_percent=50, notional_size="150 mm",
        age_at_drying=3*day, age_at_end=1e12*day, cement="N",
    )
    for found, expected in [
        (slab.basic_drying, 0.4822), (slab.drying, 0.4461), (slab.autogenous, 0.05),
        (slab.total, 0.4961),
    ]:
        assert abs(found.to(permille) - expected) <= 0.5e-4
    assert (slab.mean_strength, slab.notional_size, slab.cement) == (38*MPa, 150*mm, "N")
    assert (slab.age_at_drying, slab.relative_humidity_percent) == (3*day, 50)
    assert abs(concrete_mean_modulus(33*MPa).to(MPa) - 31_476) < 0.5
    assert abs(concrete_modulus_at_age(33*GPa, 3*day, "N").to(MPa) - 28_286) < 0.5
    assert concrete_strength_share(28*day, "R") == 1.0
    wrong: Any = "X"
    assert [p.split(":")[0] for p in problems(
        lambda: ConcreteShrinkage(12*MPa, 0.5, -1*mm, 7*day, 3*day, "R")
    )] == ["mean_strength", "relative_humidity_percent", "notional_size", "age_at_end"]
    assert len(problems(lambda: concrete_modulus_at_age(1*m, 1*m, wrong))) == 3
    assert len(problems(lambda: concrete_modulus_at_age(-33*GPa, 0*day, "N"))) == 2
    assert len(problems(lambda: concrete_mean_modulus(0*MPa))) == 1
