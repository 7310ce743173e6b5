"""Calculation core for beams of more than one material.

Signs: x runs left to right, z up; a section is drawn as seen against x, with y to the right.
Deflection and loads are positive downward, slope is dw/dx, V = dM/dx, a positive (sagging) moment
stretches the bottom, tension is positive; a couple is positive clockwise.

>>> from beamcore import *
>>> joist = Part("joist", rectangle(80*mm, 220*mm), timber("C24", service_class=1))
>>> plate = Part("plate", rectangle(10*mm, 220*mm), steel("S275")).right_of(joist)
>>> member = Member.simple_span(Section([joist, plate]), 4.2*m,
...                             actions=[permanent("wall", uniform(5*kN/m))])
>>> deflection = member.solve().deflection("quasi-permanent", "final")
>>> f"{deflection.greatest.value.to(mm):.1f} mm at {deflection.greatest.at.to(m):.2f} m"
'8.6 mm at 2.10 m'
>>> deflection.values_m([0, 1.05, 2.1]).round(4)
array([0.    , 0.0061, 0.0086])
"""

from beamcore._core import *
from beamcore._core import __version__ as __version__
from beamcore.units import *

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
    # Units
    "m", "mm", "cm", "inch", "ft", "N", "kN", "MN", "lbf", "kip", "plf", "psf", "Pa", "kPa", "MPa",
    "psi", "ksi", "GPa", "permille", "rad", "mrad", "deg", "kg", "t", "lb", "s", "h", "day",
    "year", "K", "degF",
]
