//! Choices that cross as `int32_t`. They start at 1, so that a forgotten value is an error.

use crate::fault::Fault;
use beamcore::camber::Rounding;
use beamcore::job::Format;
use beamcore::material::concrete::Cement;
use beamcore::member::SupportKind;
use beamcore::section::Side;
use beamcore::time::Time;

/// Time: the day the load comes on, every material with its short-term modulus.
pub const BC_TIME_INITIAL: i32 = 1;
/// Time: the end of the life, the quasi-permanent share of the load with effective moduli.
pub const BC_TIME_FINAL: i32 = 2;

/// Cement: hardens slowly.
pub const BC_CEMENT_S: i32 = 1;
/// Cement: hardens normally.
pub const BC_CEMENT_N: i32 = 2;
/// Cement: hardens rapidly.
pub const BC_CEMENT_R: i32 = 3;

/// Place of a part: at smaller y than the other, touching it, centred on its height.
pub const BC_PLACE_LEFT_OF: i32 = 1;
/// Place of a part: at greater y than the other, touching it, centred on its height.
pub const BC_PLACE_RIGHT_OF: i32 = 2;
/// Place of a part: at greater z than the other, touching it, centred on its width.
pub const BC_PLACE_ABOVE: i32 = 3;
/// Place of a part: at smaller z than the other, touching it, centred on its width.
pub const BC_PLACE_BELOW: i32 = 4;

/// Support: holds the deflection and the displacement along the axis.
pub const BC_SUPPORT_PIN: i32 = 1;
/// Support: holds the deflection only.
pub const BC_SUPPORT_ROLLER: i32 = 2;
/// Support: holds the deflection, the displacement along the axis and the rotation.
pub const BC_SUPPORT_FIXED: i32 = 3;

/// Rounding: to the nearest step, halves away from zero.
pub const BC_ROUNDING_NEAREST: i32 = 1;
/// Rounding: to the step below in magnitude.
pub const BC_ROUNDING_DOWN: i32 = 2;
/// Rounding: to the step above in magnitude.
pub const BC_ROUNDING_UP: i32 = 3;

/// Field: deflection in m, positive downward.
pub const BC_FIELD_DEFLECTION: i32 = 1;
/// Field: slope dw/dx in rad.
pub const BC_FIELD_SLOPE: i32 = 2;
/// Field: shear force V = dM/dx in N.
pub const BC_FIELD_SHEAR: i32 = 3;
/// Field: moment in N m, positive where it stretches the bottom.
pub const BC_FIELD_MOMENT: i32 = 4;
/// Field: axial force in N, tension positive.
pub const BC_FIELD_AXIAL: i32 = 5;
/// Field: rotation of the section in rad, positive clockwise; with shear it is not the slope.
pub const BC_FIELD_ROTATION: i32 = 6;
/// Field: curvature in 1/m, positive sagging, with its free part.
pub const BC_FIELD_CURVATURE: i32 = 7;

/// Extreme: the value of greatest magnitude, with its sign.
pub const BC_EXTREME_GREATEST: i32 = 1;
/// Extreme: the algebraically greatest value.
pub const BC_EXTREME_MAXIMUM: i32 = 2;
/// Extreme: the algebraically least value.
pub const BC_EXTREME_MINIMUM: i32 = 3;

/// Side of a place along the member: just left of it.
pub const BC_SIDE_LEFT: i32 = 1;
/// Side of a place along the member: just right of it.
pub const BC_SIDE_RIGHT: i32 = 2;

/// Fibre of a part: its bottom edge.
pub const BC_FIBRE_BOTTOM: i32 = 1;
/// Fibre of a part: its own centroid.
pub const BC_FIBRE_CENTROID: i32 = 2;
/// Fibre of a part: its top edge.
pub const BC_FIBRE_TOP: i32 = 3;

/// Sign of a stress: tension, positive.
pub const BC_STRESS_TENSION: i32 = 1;
/// Sign of a stress: compression, negative.
pub const BC_STRESS_COMPRESSION: i32 = 2;

/// Format of a document: TOML, for documents that are written by hand.
pub const BC_FORMAT_TOML: i32 = 1;
/// Format of a document: JSON, for documents that are written by programs.
pub const BC_FORMAT_JSON: i32 = 2;

/// Which field of a response.
#[derive(Clone, Copy)]
pub(crate) enum FieldName {
    Deflection,
    Slope,
    Shear,
    Moment,
    Axial,
    Rotation,
    Curvature,
}

/// Which extreme of a field.
#[derive(Clone, Copy)]
pub(crate) enum ExtremeName {
    Greatest,
    Maximum,
    Minimum,
}

/// Which side of a place along the member.
#[derive(Clone, Copy)]
pub(crate) enum PlaceSide {
    Left,
    Right,
}

/// Which fibre of a part.
#[derive(Clone, Copy)]
pub(crate) enum Fibre {
    Bottom,
    Centroid,
    Top,
}

/// Which sign of a stress.
#[derive(Clone, Copy)]
pub(crate) enum StressSign {
    Tension,
    Compression,
}

/// A yes or no, which crosses as 1 or 0.
pub(crate) fn yes(number: i32, parameter: &str) -> Result<bool, Fault> {
    match number {
        0 => Ok(false),
        1 => Ok(true),
        _ => Err(Fault::choice(parameter, number, "0, 1")),
    }
}

/// One choice: its parameter, the constants in words, and what each constant stands for.
///
/// The numbers come from a match over all variants, so that a new variant of the core does not
/// compile until it has its constant.
macro_rules! choice {
    ($read:ident, $number:ident, $Type:ident, $parameter:literal, $constants:literal,
     $($Variant:ident = $constant:ident),+) => {
        pub(crate) fn $read(number: i32) -> Result<$Type, Fault> {
            [$($Type::$Variant),+]
                .into_iter()
                .find(|variant| $number(*variant) == number)
                .ok_or_else(|| Fault::choice($parameter, number, $constants))
        }

        pub(crate) const fn $number(variant: $Type) -> i32 {
            match variant {
                $($Type::$Variant => $constant),+
            }
        }
    };
}
pub(crate) use choice;

choice!(
    time,
    time_number,
    Time,
    "time",
    "BC_TIME_INITIAL, BC_TIME_FINAL",
    Initial = BC_TIME_INITIAL,
    Final = BC_TIME_FINAL
);
choice!(
    cement,
    cement_number,
    Cement,
    "cement",
    "BC_CEMENT_S, BC_CEMENT_N, BC_CEMENT_R",
    S = BC_CEMENT_S,
    N = BC_CEMENT_N,
    R = BC_CEMENT_R
);
choice!(
    place,
    place_number,
    Side,
    "place",
    "BC_PLACE_LEFT_OF, BC_PLACE_RIGHT_OF, BC_PLACE_ABOVE, BC_PLACE_BELOW",
    Left = BC_PLACE_LEFT_OF,
    Right = BC_PLACE_RIGHT_OF,
    Above = BC_PLACE_ABOVE,
    Below = BC_PLACE_BELOW
);
choice!(
    support,
    support_number,
    SupportKind,
    "support_kind",
    "BC_SUPPORT_PIN, BC_SUPPORT_ROLLER, BC_SUPPORT_FIXED",
    Pin = BC_SUPPORT_PIN,
    Roller = BC_SUPPORT_ROLLER,
    Fixed = BC_SUPPORT_FIXED
);
choice!(
    rounding,
    rounding_number,
    Rounding,
    "rounding",
    "BC_ROUNDING_NEAREST, BC_ROUNDING_DOWN, BC_ROUNDING_UP",
    Nearest = BC_ROUNDING_NEAREST,
    Down = BC_ROUNDING_DOWN,
    Up = BC_ROUNDING_UP
);
choice!(
    field,
    field_number,
    FieldName,
    "field",
    "BC_FIELD_DEFLECTION, BC_FIELD_SLOPE, BC_FIELD_SHEAR, BC_FIELD_MOMENT, BC_FIELD_AXIAL, \
     BC_FIELD_ROTATION, BC_FIELD_CURVATURE",
    Deflection = BC_FIELD_DEFLECTION,
    Slope = BC_FIELD_SLOPE,
    Shear = BC_FIELD_SHEAR,
    Moment = BC_FIELD_MOMENT,
    Axial = BC_FIELD_AXIAL,
    Rotation = BC_FIELD_ROTATION,
    Curvature = BC_FIELD_CURVATURE
);
choice!(
    extreme,
    extreme_number,
    ExtremeName,
    "extreme",
    "BC_EXTREME_GREATEST, BC_EXTREME_MAXIMUM, BC_EXTREME_MINIMUM",
    Greatest = BC_EXTREME_GREATEST,
    Maximum = BC_EXTREME_MAXIMUM,
    Minimum = BC_EXTREME_MINIMUM
);
choice!(
    side,
    side_number,
    PlaceSide,
    "side",
    "BC_SIDE_LEFT, BC_SIDE_RIGHT",
    Left = BC_SIDE_LEFT,
    Right = BC_SIDE_RIGHT
);
choice!(
    fibre,
    fibre_number,
    Fibre,
    "fibre",
    "BC_FIBRE_BOTTOM, BC_FIBRE_CENTROID, BC_FIBRE_TOP",
    Bottom = BC_FIBRE_BOTTOM,
    Centroid = BC_FIBRE_CENTROID,
    Top = BC_FIBRE_TOP
);
choice!(
    stress_sign,
    stress_sign_number,
    StressSign,
    "sign",
    "BC_STRESS_TENSION, BC_STRESS_COMPRESSION",
    Tension = BC_STRESS_TENSION,
    Compression = BC_STRESS_COMPRESSION
);
choice!(
    format,
    format_number,
    Format,
    "format",
    "BC_FORMAT_TOML, BC_FORMAT_JSON",
    Toml = BC_FORMAT_TOML,
    Json = BC_FORMAT_JSON
);
