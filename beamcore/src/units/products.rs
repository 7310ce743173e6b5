//! The products of quantities that make sense, with the quotients that follow from them.

use super::quantity::*;
use std::ops::{Div, Mul};

/// `a: A` times (or by) `b: B` is a `C`.
macro_rules! rule {
    ($A:ident $Op:ident $method:ident $sign:tt $B:ident = $C:ident) => {
        impl $Op<$B> for $A {
            type Output = $C;
            fn $method(self, other: $B) -> $C {
                $C::from_si(self.si() $sign other.si())
            }
        }
    };
}

macro_rules! products {
    (
        square $Root:ident = $Square:ident;
        whole { $($A:ident * $B:ident = $C:ident;)+ }
        half { $($D:ident * $E:ident = $F:ident;)+ }
        quotients { $($G:ident / $H:ident = $I:ident;)+ }
    ) => {
        rule!($Root Mul mul * $Root = $Square);
        rule!($Square Div div / $Root = $Root);
        $(
            rule!($A Mul mul * $B = $C);
            rule!($B Mul mul * $A = $C);
            rule!($C Div div / $A = $B);
            rule!($C Div div / $B = $A);
        )+
        $(
            rule!($D Mul mul * $E = $F);
            rule!($E Mul mul * $D = $F);
            rule!($F Div div / $D = $E);
        )+
        $(
            rule!($G Div div / $H = $I);
            rule!($G Div div / $I = $H);
        )+

        /// The names of all products `A * B = C` with both their quotients, for the generated
        /// bindings.
        pub(super) const PRODUCTS: &[[&str; 3]] = &[
            [stringify!($Root), stringify!($Root), stringify!($Square)],
            $([stringify!($A), stringify!($B), stringify!($C)]),+
        ];

        /// The names of the products `A * B = C` of which `C / B` means another quantity.
        pub(super) const HALF_PRODUCTS: &[[&str; 3]] =
            &[$([stringify!($D), stringify!($E), stringify!($F)]),+];

        /// The names of the quotients `A / B = C` of which `C * B` means another quantity.
        pub(super) const QUOTIENTS: &[[&str; 3]] =
            &[$([stringify!($G), stringify!($H), stringify!($I)]),+];
    };
}

products! {
    square Length = Area;
    whole {
        Area * Length = FirstMoment;
        FirstMoment * Length = SecondMoment;
        Force * Length = Moment;
        LineLoad * Length = Force;
        AreaLoad * Length = LineLoad;
        Modulus * Strain = Stress;
        Stress * Area = Force;
        Modulus * Area = AxialStiffness;
        AxialStiffness * Strain = Force;
        Modulus * SecondMoment = BendingStiffness;
        BendingStiffness * Curvature = Moment;
        Curvature * Length = Strain;
        Density * Area = LineMass;
        LineMass * Length = Mass;
        ThermalExpansion * TemperatureChange = Strain;
        SlipModulus * Length = ShearFlow;
        RotationalStiffness * Angle = Moment;
    }
    half {
        ShearFlow * Length = Force;
        FastenerStiffness * Length = Force;
        SpringStiffness * Length = Force;
    }
    quotients {
        FastenerStiffness / Length = SlipModulus;
    }
}

#[cfg(test)]
mod tests {
    use super::super::*;
    use super::{HALF_PRODUCTS, PRODUCTS, QUOTIENTS};

    #[test]
    fn products_have_the_dimension_of_their_factors() {
        let dimension = |name: &str| {
            table()
                .iter()
                .find(|row| row.name == name)
                .unwrap()
                .dimension
        };
        assert_eq!(
            (PRODUCTS.len(), HALF_PRODUCTS.len(), QUOTIENTS.len()),
            (18, 3, 1)
        );
        for [a, b, c] in PRODUCTS.iter().chain(HALF_PRODUCTS) {
            assert_eq!(
                dimension(a).times(dimension(b)),
                Some(dimension(c)),
                "{a} * {b} = {c}"
            );
        }
        for [a, b, c] in QUOTIENTS {
            assert_eq!(
                dimension(a).per(dimension(b)),
                Some(dimension(c)),
                "{a} / {b} = {c}"
            );
        }
    }

    #[test]
    fn quantities_calculate() {
        let stiffness: BendingStiffness = 11.0.GPa() * (75.mm() * 220.mm() * 220.mm() * 220.mm());
        let curvature: Curvature = 10.kN_m() / stiffness;
        assert_eq!(curvature.si(), 10_000.0 / stiffness.si());
        let bending: Moment = stiffness * curvature;
        assert_eq!(bending.si(), stiffness.si() * curvature.si());
        let stress: Stress = 11.0.GPa() * 0.5.permille();
        assert_eq!(stress, 5.5.MPa());
        let mass: Mass = 420.kg_per_m3() * (0.1.m() * 0.2.m()) * 5.m();
        assert_eq!(mass.si(), 420.0 * (0.1 * 0.2) * 5.0);
        let joint: SlipModulus = 2.0 * 4.kN_per_mm() / 160.mm();
        assert_eq!(joint, SlipModulus::from_N_per_mm2(50.0));
        let flow: ShearFlow = joint * 0.2.mm();
        assert_eq!(flow, ShearFlow::from_N_per_mm(10.0));
        assert_eq!(flow * 160.mm(), 1.6.kN());
        let strain: Strain = 12e-6.per_K() * 30.K();
        assert_eq!(strain, 0.000_36.ratio());
        assert_eq!(9.degF(), 5.K());

        assert_eq!(2.0 * 3.m() - 1.m() + -(2.m()), 3.m());
        assert_eq!(6.m() / 2.0, 3.m());
        assert_eq!(6.m() / 4.m(), 1.5);
        assert_eq!([1.m(), 2.m()].iter().sum::<Length>(), 3.m());
        assert_eq!([1.m(), 2.m()].into_iter().sum::<Length>(), 3.m());
        assert_eq!((-3).kN().abs(), 3.kN());
        assert_eq!(1.m().max(2.m()), 2.m());
        assert_eq!(1.m().min(2.m()), 1.m());
        let mut total = Force::ZERO;
        total += 5.kN();
        total -= 2.kN();
        assert_eq!(total, 3.kN());
        assert!(
            Length::from_mm(f64::NAN)
                .partial_cmp(&Length::ZERO)
                .is_none()
        );
        assert!(!Length::from_mm(f64::INFINITY).is_finite());
    }
}
