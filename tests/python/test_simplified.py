"""Simplified methods for layers that slip on each other."""

from typing import Any, Callable

import pytest

import beamcore
from beamcore import (
    BeamcoreError, EffectiveSpacing, Gamma, LayerInput, LayerStress, Quantity, ReferenceLength,
    ShearStress, SineLayers, effective_spacing,
)
from beamcore.units import GPa, MN, MPa, N, kN, m, mm

JOIST = LayerInput.rectangle(11*GPa, width=100*mm, height=220*mm, centroid_z=110*mm)
SLAB = LayerInput.rectangle(31*GPa, 600*mm, 70*mm, "255 mm")
JOINT: Quantity = 20*kN/mm / (150*mm)
GAMMA = Gamma([JOIST, SLAB], [JOINT], ReferenceLength.span(6*m))
# A uniform load of 3 kN/m on a span of 6 m.
MOMENT, SHEAR = 13.5*kN*m, 9*kN


def near(found: Quantity, expected: Quantity, tolerance: float = 1e-12) -> bool:
    return abs(found.si - expected.si) <= tolerance * abs(expected.si)


def problems(make: Callable[[], Any]) -> list[str]:
    with pytest.raises(BeamcoreError) as caught:
        make()
    return [f"{p.path}: found {p.found}; expected {p.expected}" for p in caught.value.problems]


def test_a_slab_on_a_joist() -> None:
    """Values of an independent script of EN 1995-1-1:2004 Annex B (from memory), to its digits."""
    assert GAMMA.layers == (JOIST, SLAB) and GAMMA.base_layer == 0
    assert GAMMA.factors[0] == 1 and abs(GAMMA.factors[1] - 0.27195) <= 0.5e-5
    assert near(GAMMA.arms[0], -86.132*mm, 1e-5) and near(GAMMA.arms[1], 58.868*mm, 1e-5)
    assert near(GAMMA.bending_stiffness, 4.53009*MN*m**2, 1e-5)
    [flow] = GAMMA.flows(SHEAR)
    assert near(flow, 41.41*N/mm, 2e-4)
    assert near(GAMMA.fastener_forces("9 kN", ["75 mm"])[0], flow * (75*mm))
    joist, slab = GAMMA.stresses(MOMENT)
    assert near(slab.axial, -1.479*MPa, 5e-4) and near(slab.bending, 3.233*MPa, 5e-4)
    assert near(joist.axial, 2.823*MPa, 5e-4) and near(joist.bending, 3.606*MPa, 5e-4)
    assert joist.bottom == joist.axial + joist.bending and slab.top == slab.axial - slab.bending
    below, above = GAMMA.axial_forces(MOMENT)
    assert near(below, -above) and near(below, joist.axial * (100*mm * 220*mm))
    greatest = GAMMA.shear_stresses(SHEAR)[0]
    # tau = 0.5 E h^2 V/EI_ef, h the distance of the lower edge from the axis.
    assert near(greatest.z, 196.132*mm, 1e-5)
    assert near(greatest.value, 0.5 * 11*GPa * (196.132*mm)**2 * SHEAR / GAMMA.bending_stiffness,
                1e-4)
    assert len(GAMMA.warnings) == 1 and "half a sine wave" in GAMMA.warnings[0]


def test_three_layers_by_both_methods() -> None:
    """Values of an independent script, to its digits; both methods agree."""
    layers = [
        LayerInput.rectangle(11.6*GPa, 140*mm, 60*mm, 30*mm),
        LayerInput.rectangle(11*GPa, 63*mm, 180*mm, 150*mm),
        LayerInput.rectangle(11*GPa, 140*mm, 45*mm, 262.5*mm),
    ]
    joints = (12*N/mm**2, 8*N/mm**2)
    span = ReferenceLength.span("5 m")
    gamma, sine = Gamma(layers, joints, span), SineLayers(layers, joints, span)
    assert gamma.base_layer == 1
    assert near(gamma.bending_stiffness, 903.484*kN*m**2, 1e-5)
    assert near(abs(gamma.arms[1]), 6.2127*mm, 1e-4)
    assert [round(factor, 5) for factor in gamma.factors] == [0.23778, 1, 0.22625]
    assert near(sine.bending_stiffness, gamma.bending_stiffness)
    assert sine.layers == gamma.layers == tuple(layers) and sine.warnings == gamma.warnings
    for arm, factor, other in zip(sine.arms, gamma.factors, gamma.arms, strict=True):
        assert near(arm, other * factor, 1e-11)
    pairs = [
        *zip(sine.flows(SHEAR), gamma.flows(SHEAR), strict=True),
        *zip(sine.axial_forces(MOMENT), gamma.axial_forces(MOMENT), strict=True),
        *zip(sine.fastener_forces(SHEAR, [1*m, 2*m]), gamma.fastener_forces(SHEAR, [1*m, 2*m]),
             strict=True),
        *((a.bottom, b.bottom) for a, b in
          zip(sine.stresses(MOMENT), gamma.stresses(MOMENT), strict=True)),
        *((a.value, b.value) for a, b in
          zip(sine.shear_stresses(SHEAR), gamma.shear_stresses(SHEAR), strict=True)),
    ]
    assert len(pairs) == 13 and all(near(a, b, 1e-10) for a, b in pairs)


def test_any_number_of_layers() -> None:
    """A single layer is a plain beam; loose layers add their own EI."""
    alone = SineLayers([JOIST], [], ReferenceLength.span(6*m))
    assert near(alone.bending_stiffness, JOIST.bending) and alone.flows(SHEAR) == ()
    boards = [LayerInput.rectangle(11*GPa, 200*mm, 40*mm, z*mm) for z in (20, 60, 100, 140)]
    loose = SineLayers(boards, ["0 N/mm2"] * 3, ReferenceLength.span(6*m))
    assert near(loose.bending_stiffness, 4 * boards[0].bending)


def test_layers_by_their_values() -> None:
    given = LayerInput(axial="230 MN", bending=JOIST.bending, height=220*mm,
                       centroid_z="110 mm", modulus=11*GPa, width=100*mm)
    assert (given.axial, given.bending) == (230*MN, JOIST.bending)
    assert (given.height, given.width, given.centroid_z) == (220*mm, 100*mm, 110*mm)
    assert given.modulus == 11*GPa and given != JOIST
    again = LayerInput(axial=JOIST.axial, bending=JOIST.bending, height=220*mm,
                       centroid_z="110 mm", modulus=11*GPa, width=100*mm)
    assert again == JOIST and near(JOIST.axial, 242*MN)
    assert repr(JOIST) == "<LayerInput EA 242 MN, EI 976.067 kN*m**2, centroid at z = 110 mm>"
    assert repr(LayerStress("1 MPa", 2*MPa)) == "LayerStress(axial=1 MPa, bending=2 MPa)"
    assert LayerStress(1*MPa, 2*MPa).bottom == 3*MPa
    assert ShearStress(1*MPa, z=2*mm).z == 2*mm


def test_lengths_and_spacings() -> None:
    lengths = [ReferenceLength.span(5*m), ReferenceLength.continuous("5 m"),
               ReferenceLength.cantilever(5*m)]
    assert [length.length for length in lengths] == [5*m, 4*m, 10*m]
    assert [length.kind for length in lengths] == ["span", "continuous", "cantilever"]
    assert lengths[2].given == 5*m and repr(lengths[1]) == "ReferenceLength.continuous(5 m)"
    assert [len(Gamma([JOIST, SLAB], [JOINT], length).warnings) for length in lengths] == [1, 2, 2]
    found = effective_spacing(100*mm, greatest="400 mm")
    assert near(found.spacing, 175*mm) and len(found.warnings) == 1
    assert isinstance(found, EffectiveSpacing)
    assert effective_spacing(100*mm, 100*mm) == EffectiveSpacing(100*mm, [])
    assert any("4 times" in text for text in effective_spacing(100*mm, 401*mm).warnings)


def test_mistakes_are_told() -> None:
    span = ReferenceLength.span(6*m)
    assert problems(lambda: Gamma([SLAB, JOIST], [], ReferenceLength.span(0*m))) == [
        "layers[1].centroid_z: found 110 mm; expected more than 255 mm, as the layers are listed "
        "from the lowest upward",
        "joints: found 0 joints of 2 layers; expected one joint fewer than layers",
        *problems(lambda: SineLayers([JOIST], [], ReferenceLength.span(0*m))),
    ]
    assert problems(lambda: Gamma([JOIST], [], span))[0] == (
        "layers: found 1 layers; expected two or three layers"
    )
    wrong: list[Any] = [1*kN, "1"]
    assert [problem.split(":")[0] for problem in problems(lambda: Gamma([JOIST], wrong, span))] == [
        "joints[0]", "joints[1]"
    ]
    assert problems(lambda: GAMMA.flows(1*m))[0].startswith("shear: found a length of 1 m")
    assert problems(lambda: GAMMA.stresses(1*m))[0].startswith("moment: ")
    assert problems(lambda: GAMMA.fastener_forces(SHEAR, []))[0].startswith("spacings: ")
    assert len(problems(lambda: LayerInput.rectangle(1*m, 1*kN, 1*kN, 1*kN))) == 4
    assert problems(lambda: effective_spacing(2*m, 1*m))[0].startswith("greatest: found 1 m")
    with pytest.raises(TypeError):
        beamcore.Gamma([JOIST, SLAB], [JOINT], "6 m")  # type: ignore[arg-type]
