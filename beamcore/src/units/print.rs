//! Printing a quantity: at most six significant digits, in a unit that suits its size.

use super::unit::Unit;
use std::fmt::{self, Alignment};

/// Prints the SI number `si` in the first of `units` in which it is at least 1, else in the last;
/// zero in the first.
pub(super) fn quantity(f: &mut fmt::Formatter<'_>, si: f64, units: &[Unit]) -> fmt::Result {
    let large = |unit: &&Unit| si == 0.0 || unit.from_si(si).abs() >= 1.0;
    let unit = units.iter().find(large).unwrap_or(&units[units.len() - 1]);
    let value = unit.from_si(si);
    let number = match f.precision() {
        Some(decimals) => format!("{value:.decimals$}"),
        None => six_digits(value),
    };
    let text = format!("{number} {}", unit.symbol);
    // `Formatter::pad` would cut the text at the precision.
    match (f.width(), f.align()) {
        (None, _) => f.write_str(&text),
        (Some(width), Some(Alignment::Left)) => write!(f, "{text:<width$}"),
        (Some(width), Some(Alignment::Center)) => write!(f, "{text:^width$}"),
        (Some(width), _) => write!(f, "{text:>width$}"),
    }
}

/// The number with at most six significant digits; very large and very small ones as "1.2e-7".
pub(super) fn six_digits(value: f64) -> String {
    if value == 0.0 {
        return "0".to_owned();
    }
    let rounded = format!("{value:.5e}");
    let Some((mantissa, exponent)) = rounded.split_once('e') else {
        return rounded; // NaN and infinity have no exponent.
    };
    match exponent.parse::<i32>() {
        Ok(power @ -4..=5) => {
            // As many decimals as leave six significant digits, and then no trailing zeros.
            let decimals = usize::try_from(5 - power).unwrap_or(0);
            let fixed = format!("{value:.decimals$}");
            without_zeros(&fixed).to_owned()
        }
        _ => format!("{}e{exponent}", without_zeros(mantissa)),
    }
}

/// The number without the zeros at the end of its decimals.
fn without_zeros(number: &str) -> &str {
    if number.contains('.') {
        number.trim_end_matches('0').trim_end_matches('.')
    } else {
        number
    }
}

#[cfg(test)]
mod tests {
    use super::super::*;
    use super::six_digits;

    #[test]
    fn prints_in_a_unit_that_suits() {
        let printed = [
            ((-10).mm().to_string(), "-10 mm"),
            (4.2.m().to_string(), "4.2 m"),
            (6.5.kN_per_m().to_string(), "6.5 kN/m"),
            (900.N_per_m().to_string(), "900 N/m"),
            (0.25.mm().to_string(), "0.25 mm"),
            (Length::ZERO.to_string(), "0 m"),
            ((-0.0).kN().to_string(), "0 kN"),
            (11.GPa().to_string(), "11 GPa"),
            (690.MPa().to_string(), "690 MPa"),
            (Modulus::from_MPa(690.0).to_string(), "690 MPa"),
            (66_550_000.mm4().to_string(), "6.655e7 mm4"),
            (1.2e-9.per_m().to_string(), "1.2e-9 /m"),
            (0.5.permille().to_string(), "0.5 permille"),
            (50.year().to_string(), "50 year"),
            (28.d().to_string(), "28 d"),
            (1e30.kN().to_string(), "1e30 kN"),
            (Length::from_m(f64::NAN).to_string(), "NaN mm"),
            (Length::from_m(f64::INFINITY).to_string(), "inf m"),
        ];
        for (found, expected) in printed {
            assert_eq!(found, expected);
        }
    }

    #[test]
    fn keeps_to_precision_and_width() {
        assert_eq!(format!("{:.1}", 14.3325.kN_m()), "14.3 kN m");
        assert_eq!(format!("{:.2}", 4.m()), "4.00 m");
        assert_eq!(format!("[{:8}]", 4.m()), "[     4 m]");
        assert_eq!(format!("[{:<8.1}]", 4.m()), "[4.0 m   ]");
        assert_eq!(format!("[{:^9}]", 4.m()), "[   4 m   ]");
    }

    #[test]
    fn rounds_to_six_digits() {
        let printed = [
            (123_456.7, "123457"),
            (999_999.5, "1e6"),
            (1_234_567.0, "1.23457e6"),
            (9.999_996, "10"),
            (100.0, "100"),
            (0.1 + 0.2, "0.3"),
            (-1234.5678, "-1234.57"),
            (0.000_123_456_78, "0.000123457"),
            (0.000_012_345_678, "1.23457e-5"),
            (5e-324, "4.94066e-324"),
        ];
        for (value, expected) in printed {
            assert_eq!(six_digits(value), expected);
        }
    }

    #[test]
    fn what_is_printed_reads_back() {
        for load in [
            6.5.kN_per_m(),
            0.125.kN_per_m(),
            (-3).N_per_m(),
            LineLoad::ZERO,
        ] {
            assert_eq!(load.to_string().parse::<LineLoad>(), Ok(load));
        }
    }
}
