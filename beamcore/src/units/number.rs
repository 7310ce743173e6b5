//! Number literals with units: `50.mm()`, `11.0.GPa()`.

use super::quantity::*;

mod sealed {
    /// Keeps [`Number`](super::Number) to two types, so that the type of a literal is inferred.
    pub trait Sealed {}
    impl Sealed for f64 {}
    impl Sealed for i32 {}
}

macro_rules! numbers {
    ($(
        $(#[$doc:meta])*
        $Name:ident $noun:literal [$mass:expr, $length:expr, $time:expr $(, $temperature:expr)?]
        prints [$($print:literal),+] {
            $($symbol:literal ($num:expr, $den:expr) $from:ident $to:ident $($literal:ident)?;)+
        }
    )+) => {
        /// A number, `f64` or `i32`, that a unit makes a quantity of.
        ///
        /// Where two types share a symbol, one of them has the literal: `MPa` is a [`Stress`] and
        /// `GPa` a [`Modulus`], `kN` is a [`Force`]. The others are written with their
        /// constructors, as in `Stress::from_GPa(1.2)`.
        ///
        /// # Examples
        /// ```
        /// use beamcore::units::{Length, Modulus, Number};
        /// assert_eq!(50.mm(), Length::from_mm(50.0));
        /// assert_eq!(11.0.GPa(), Modulus::from_GPa(11.0));
        /// assert_eq!(6.5.kN_per_m().si(), 6500.0);
        /// ```
        #[allow(non_snake_case)]
        pub trait Number: Copy + Into<f64> + sealed::Sealed {
            $($($(
                #[doc = concat!("The ", $noun, " of this number in the unit ", $symbol, ".")]
                #[must_use]
                fn $literal(self) -> $Name {
                    $Name::$from(self.into())
                }
            )?)+)+
        }
    };
}

with_table!(numbers);

impl Number for f64 {}
impl Number for i32 {}
