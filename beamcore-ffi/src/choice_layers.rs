//! Choices that cross as `int32_t`: joints and layers, changes of the section, hinges, shear.

use crate::choice::choice;
use crate::fault::Fault;
use beamcore::response::SimplifiedMethod;
use beamcore::section::JointKind;

/// Joint: without slip; the two layers are one piece.
pub const BC_JOINT_RIGID: i32 = 1;
/// Joint: with slip in proportion to the flow.
pub const BC_JOINT_SLIPPING: i32 = 2;
/// Joint: the layers slip freely and share their deflection only.
pub const BC_JOINT_LOOSE: i32 = 3;

/// Field of a joint: slip in m, displacement along x of the upper layer minus the lower one's.
pub const BC_JOINT_FIELD_SLIP: i32 = 1;
/// Field of a joint: flow in N/m, with the sign of the slip.
pub const BC_JOINT_FIELD_FLOW: i32 = 2;
/// Field of a joint: pressure of the layers above on those below in N/m, negative where they would
/// part.
pub const BC_JOINT_FIELD_PRESSURE: i32 = 3;

/// Field of a layer: axial force in N, tension positive.
pub const BC_LAYER_FIELD_AXIAL: i32 = 1;
/// Field of a layer: moment about its own centroid in N m, positive where it stretches the bottom.
pub const BC_LAYER_FIELD_MOMENT: i32 = 2;
/// Field of a layer: deflection in m, positive downward; that of the member unless a transverse
/// modulus gives the layer one of its own.
pub const BC_LAYER_FIELD_DEFLECTION: i32 = 3;

/// Change of the section: another one from a place on.
pub const BC_CHANGE_STEP: i32 = 1;
/// Change of the section: linear between two places.
pub const BC_CHANGE_TAPER: i32 = 2;

/// Hinge: no moment passes.
pub const BC_HINGE_MOMENT: i32 = 1;
/// Hinge: no shear force passes.
pub const BC_HINGE_SHEAR: i32 = 2;
/// Hinge: one layer is butted, no axial force of it passes.
pub const BC_HINGE_BUTT: i32 = 3;

/// Shear deformation: left out.
pub const BC_SHEAR_RIGID: i32 = 1;
/// Shear deformation: with kGA of each section, from the energy of its shear stress.
pub const BC_SHEAR_FLEXIBLE: i32 = 2;
/// Shear deformation: with the kGA that is given (bc_plan_with_given_shear).
pub const BC_SHEAR_GIVEN: i32 = 3;

/// Length of the simplified methods: a single span L, l = L.
pub const BC_LENGTH_SPAN: i32 = 1;
/// Length of the simplified methods: a span L of several, l = 0.8 L.
pub const BC_LENGTH_CONTINUOUS: i32 = 2;
/// Length of the simplified methods: a cantilever of length L, l = 2 L.
pub const BC_LENGTH_CANTILEVER: i32 = 3;

/// Simplified method: gamma, EN 1995-1-1:2004 Annex B, for two or three layers.
pub const BC_METHOD_GAMMA: i32 = 1;
/// Simplified method: sine layers, for any number of layers.
pub const BC_METHOD_SINE_LAYERS: i32 = 2;

/// Which field of a joint.
#[derive(Clone, Copy)]
pub(crate) enum JointField {
    Slip,
    Flow,
    Pressure,
}

/// Which field of a layer.
#[derive(Clone, Copy)]
pub(crate) enum LayerField {
    Axial,
    Moment,
    Deflection,
}

/// How shear deformation is taken where no value is given.
#[derive(Clone, Copy)]
pub(crate) enum ShearName {
    Rigid,
    Flexible,
}

/// What a length of the simplified methods is.
#[derive(Clone, Copy)]
pub(crate) enum LengthName {
    Span,
    Continuous,
    Cantilever,
}

choice!(
    joint_field,
    joint_field_number,
    JointField,
    "joint_field",
    "BC_JOINT_FIELD_SLIP, BC_JOINT_FIELD_FLOW, BC_JOINT_FIELD_PRESSURE",
    Slip = BC_JOINT_FIELD_SLIP,
    Flow = BC_JOINT_FIELD_FLOW,
    Pressure = BC_JOINT_FIELD_PRESSURE
);
choice!(
    layer_field,
    layer_field_number,
    LayerField,
    "layer_field",
    "BC_LAYER_FIELD_AXIAL, BC_LAYER_FIELD_MOMENT, BC_LAYER_FIELD_DEFLECTION",
    Axial = BC_LAYER_FIELD_AXIAL,
    Moment = BC_LAYER_FIELD_MOMENT,
    Deflection = BC_LAYER_FIELD_DEFLECTION
);
choice!(
    shear,
    shear_number,
    ShearName,
    "shear_model",
    "BC_SHEAR_RIGID, BC_SHEAR_FLEXIBLE",
    Rigid = BC_SHEAR_RIGID,
    Flexible = BC_SHEAR_FLEXIBLE
);
choice!(
    length,
    length_number,
    LengthName,
    "length_kind",
    "BC_LENGTH_SPAN, BC_LENGTH_CONTINUOUS, BC_LENGTH_CANTILEVER",
    Span = BC_LENGTH_SPAN,
    Continuous = BC_LENGTH_CONTINUOUS,
    Cantilever = BC_LENGTH_CANTILEVER
);
choice!(
    method,
    method_number,
    SimplifiedMethod,
    "method",
    "BC_METHOD_GAMMA, BC_METHOD_SINE_LAYERS",
    Gamma = BC_METHOD_GAMMA,
    SineLayers = BC_METHOD_SINE_LAYERS
);

/// The constant of a kind of joint; callers only read it.
pub(crate) const fn joint_number(kind: &JointKind) -> i32 {
    match kind {
        JointKind::Rigid => BC_JOINT_RIGID,
        JointKind::Slipping(_) => BC_JOINT_SLIPPING,
        JointKind::Loose => BC_JOINT_LOOSE,
    }
}
