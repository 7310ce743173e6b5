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
        $($A:ident * $B:ident = $C:ident;)+
    ) => {
        rule!($Root Mul mul * $Root = $Square);
        rule!($Square Div div / $Root = $Root);
        $(
            rule!($A Mul mul * $B = $C);
            rule!($B Mul mul * $A = $C);
            rule!($C Div div / $A = $B);
            rule!($C Div div / $B = $A);
        )+

        /// The names of all products `A * B = C`, for the generated bindings.
        pub(super) const PRODUCTS: &[[&str; 3]] = &[
            [stringify!($Root), stringify!($Root), stringify!($Square)],
            $([stringify!($A), stringify!($B), stringify!($C)]),+
        ];
    };
}

products! {
    square Length = Area;
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
}

#[cfg(test)]
mod tests {
    use super::super::*;
    use super::PRODUCTS;

    #[test]
    fn products_have_the_dimension_of_their_factors() {
        let dimension = |name: &str| {
            table()
                .iter()
                .find(|row| row.name == name)
                .unwrap()
                .dimension
        };
        assert_eq!(PRODUCTS.len(), 15);
        for [a, b, c] in PRODUCTS {
            assert_eq!(
                dimension(a).times(dimension(b)),
                Some(dimension(c)),
                "{a} * {b} = {c}"
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
