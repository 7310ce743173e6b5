//! The extremes of a field in the outcome, with the unit in the name of the value.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use crate::field::{Extreme, Field};
use crate::units::Quantity;
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// Makes the three extremes of a field, with the unit in the name of the value.
macro_rules! extremes {
    ($($(#[$doc:meta])* $extremes:ident of $extreme:ident, $value:ident;)*) => {$(
        $(#[$doc])*
        #[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
        #[serde(deny_unknown_fields)]
        pub(super) struct $extremes {
            /// The value of greatest magnitude.
            pub(super) greatest: $extreme,
            /// The algebraically greatest value.
            pub(super) maximum: $extreme,
            /// The algebraically least value.
            pub(super) minimum: $extreme,
        }

        /// A value and its place.
        #[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
        #[serde(deny_unknown_fields)]
        pub(super) struct $extreme {
            pub(super) $value: f64,
            pub(super) at_m: f64,
        }

        impl<Q: Quantity> From<Extreme<Q>> for $extreme {
            fn from(found: Extreme<Q>) -> Self {
                Self {
                    $value: found.value.si(),
                    at_m: found.at.si(),
                }
            }
        }

        impl<Q: Quantity> From<&Field<Q>> for $extremes {
            fn from(field: &Field<Q>) -> Self {
                Self {
                    greatest: field.greatest().into(),
                    maximum: field.maximum().into(),
                    minimum: field.minimum().into(),
                }
            }
        }
    )*};
}

extremes! {
    /// Extremes of the deflection.
    LengthExtremes of LengthExtreme, value_m;
    /// Extremes of the slope.
    AngleExtremes of AngleExtreme, value_rad;
    /// Extremes of the shear force.
    ForceExtremes of ForceExtreme, value_N;
    /// Extremes of the moment.
    MomentExtremes of MomentExtreme, value_Nm;
    /// Extremes of a force per length.
    LineExtremes of LineExtreme, value_N_per_m;
}
