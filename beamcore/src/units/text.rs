//! Reading a quantity from text: a decimal number, then a unit.

use super::unit::{TypeRow, Unit, find};
use crate::error::{ErrorKind, Problem};

/// The SI number of the `text`, which must be a quantity of the type `row`.
pub(super) fn read(text: &str, path: &str, row: &TypeRow) -> Result<f64, Problem> {
    let text = text.trim();
    let problem = |kind, found: String, expected: String| {
        Err(Problem::new(kind, path.to_owned(), found, expected))
    };
    let no_number = || {
        let unit = row
            .units
            .iter()
            .find(|unit| unit.symbol != "1")
            .unwrap_or(&row.units[0]);
        problem(
            ErrorKind::Value,
            format!("{text:?}"),
            format!(
                "{} as a finite decimal number with one of the units {}, for example \"4.2 {}\"",
                row.one(),
                row.symbols(),
                unit.symbol
            ),
        )
    };
    let Some((value, symbol)) = split(text) else {
        return no_number();
    };
    if let Some(unit) = row.unit(if symbol.is_empty() { "1" } else { symbol }) {
        return si(value, unit).map_or_else(no_number, Ok);
    }
    if symbol.is_empty() {
        return problem(
            ErrorKind::Unit,
            format!("{text:?} without a unit"),
            format!(
                "{} with one of the units {}, for example \"{text} {}\"",
                row.one(),
                row.symbols(),
                row.si_symbol
            ),
        );
    }
    let found = match find(symbol) {
        Some((other, _)) => format!("{text:?}, which is {}", other.one()),
        None => format!("{text:?} with the unknown unit {symbol:?}"),
    };
    problem(ErrorKind::Unit, found, row.expected())
}

/// The SI number of `value` in `unit`, unless a double cannot hold it.
pub(super) fn si(value: f64, unit: &Unit) -> Option<f64> {
    let si = unit.to_si(value);
    (si.is_finite() && (si != 0.0 || value == 0.0)).then_some(si)
}

/// The number and the symbol of the unit of a text such as "225 mm", "3 kN/m" or "4 ft 3 in".
pub(super) fn split(text: &str) -> Option<(f64, &str)> {
    let (value, symbol) = number_and_rest(text)?;
    Some(feet_and_inches(value, symbol).unwrap_or((value, symbol)))
}

fn number_and_rest(text: &str) -> Option<(f64, &str)> {
    let text = text.trim();
    let (number, rest) = text.split_at(number_length(text.as_bytes())?);
    let value: f64 = number.parse().ok()?;
    let mantissa = number.split(['e', 'E']).next()?;
    let lost = value == 0.0 && mantissa.contains(|mark: char| ('1'..='9').contains(&mark));
    let rest = rest.trim_start();
    // "0.002 1/m" is "0.002 /m".
    let symbol = match rest.strip_prefix('1').map(str::trim_start) {
        Some(inverse) if inverse.starts_with('/') => inverse,
        _ => rest,
    };
    // Anything else after the number, such as the comma of "4,2 m", makes it no decimal number.
    let clear = symbol.is_empty() || symbol.starts_with(|c: char| c.is_alphabetic() || c == '/');
    (value.is_finite() && !lost && clear).then_some((value, symbol))
}

/// The length of the decimal number at the start: sign, digits with a point, exponent.
fn number_length(text: &[u8]) -> Option<usize> {
    let digits = |start: usize| {
        text[start..]
            .iter()
            .take_while(|c| c.is_ascii_digit())
            .count()
    };
    let sign = |at: usize| usize::from(matches!(text.get(at), Some(b'+' | b'-')));
    let mut end = sign(0);
    let whole = digits(end);
    end += whole;
    let mut broken = 0;
    if text.get(end) == Some(&b'.') {
        broken = digits(end + 1);
        end += 1 + broken;
    }
    if whole + broken == 0 {
        return None;
    }
    if matches!(text.get(end), Some(b'e' | b'E')) {
        let start = end + 1 + sign(end + 1);
        let exponent = digits(start);
        if exponent > 0 {
            end = start + exponent;
        }
    }
    Some(end)
}

/// "4 ft 3 in" as 51 in: whole feet, and inches from 0 to below 12, under one sign.
fn feet_and_inches(feet: f64, rest: &str) -> Option<(f64, &str)> {
    let rest = rest
        .strip_prefix("ft")
        .filter(|rest| rest.starts_with(char::is_whitespace))?;
    let unsigned = rest
        .trim_start()
        .starts_with(|c: char| c.is_ascii_digit() || c == '.');
    let (inches, symbol) = number_and_rest(rest)?;
    let fits = symbol == "in" && unsigned && feet.fract() == 0.0 && inches < 12.0;
    fits.then(|| ((feet.abs() * 12.0 + inches).copysign(feet), symbol))
}

#[cfg(test)]
mod tests {
    use super::super::*;
    use crate::error::ErrorKind;

    fn read<Q: Quantity>(text: &str) -> Q {
        Q::parse_at(text, "x").unwrap_or_else(|problem| panic!("{problem}"))
    }

    /// The kind and the wording of the refusal of `text`.
    fn refused<Q: Quantity>(text: &str) -> (ErrorKind, String) {
        let problem = Q::parse_at(text, "span").expect_err(text);
        (problem.kind(), problem.to_string())
    }

    #[test]
    fn reads_numbers_with_units() {
        assert_eq!(read::<Length>("225 mm"), 225.mm());
        assert_eq!(read::<Length>(" 225mm "), 225.mm());
        assert_eq!(read::<Length>("+.5 m"), 0.5.m());
        assert_eq!(read::<Length>("5. m"), 5.m());
        assert_eq!(read::<Length>("0 m"), Length::ZERO);
        assert_eq!(read::<Modulus>("11 GPa"), 11.GPa());
        assert_eq!(read::<Stress>("11 GPa"), Stress::from_GPa(11.0));
        assert_eq!(read::<LineLoad>("6.5 kN/m"), 6.5.kN_per_m());
        assert_eq!(read::<LineLoad>("6.5kN / m"), 6.5.kN_per_m());
        assert_eq!(read::<Density>("420 kg/m^3"), 420.kg_per_m3());
        assert_eq!(read::<Density>("420 kg/m³"), 420.kg_per_m3());
        assert_eq!(read::<BendingStiffness>("12e3 N mm2"), 12e3.N_mm2());
        assert_eq!(read::<BendingStiffness>("12E+3 N*mm²"), 12e3.N_mm2());
        assert_eq!(read::<Force>("-3 kN"), (-3).kN());
        assert_eq!(read::<Curvature>("0.002 1/m"), 0.002.per_m());
        assert_eq!(read::<Curvature>("0.002 /m"), 0.002.per_m());
        assert_eq!(read::<Strain>("0.5 permille"), 0.5.permille());
        assert_eq!(read::<Strain>("0.0005"), 0.0005.ratio());
        for text in ["3 kN m", "3 kN*m", "3 kN·m", "3 kN⋅m", "3 kNm", "3 kN  m"] {
            assert_eq!(read::<Moment>(text), 3.kN_m());
        }
        for text in ["3 mm2", "3 mm^2", "3 mm²"] {
            assert_eq!(read::<Area>(text), 3.mm2());
        }
    }

    #[test]
    fn reads_every_unit_of_the_table() {
        for row in table() {
            for unit in row.units.iter().filter(|unit| unit.symbol != "1") {
                let text = format!("1.5 {}", unit.symbol);
                assert_eq!(super::read(&text, "x", row), Ok(unit.to_si(1.5)), "{text}");
            }
        }
    }

    #[test]
    fn reads_feet_and_inches() {
        assert_eq!(read::<Length>("4 ft 3 in"), 51.inch());
        assert_eq!(read::<Length>("-4 ft 3.5 in"), (-51.5).inch());
        assert_eq!(read::<Length>("-0 ft 6 in"), (-6).inch());
        for text in [
            "4.5 ft 3 in",
            "4 ft 12 in",
            "4 ft -3 in",
            "4 ft 3 mm",
            "4 ft 3",
            "4 ft3 in",
        ] {
            assert_eq!(refused::<Length>(text).0, ErrorKind::Unit, "{text}");
        }
        assert_eq!(
            refused::<Force>("4 ft 3 in").1,
            "span: found \"4 ft 3 in\", which is a length; \
             expected a force (N, kN, MN, lbf, kip)"
        );
    }

    #[test]
    fn only_finite_decimal_numbers() {
        for text in [
            "nan mm",
            "inf mm",
            "-inf mm",
            "1e999 mm",
            "1e-400 mm",
            "5e-324 mm",
            "",
            "mm",
            "4,2 m",
            "1 000 mm",
            "0x10 mm",
            "--1 mm",
            ". mm",
            "1e mm2",
            "-",
            "1.2.3 m",
            "1/2 in",
            "4.2 %",
        ] {
            let kind = refused::<Length>(text).0;
            let unit = ["0x10 mm", "1e mm2", "1/2 in"].contains(&text);
            assert_eq!(
                kind,
                if unit {
                    ErrorKind::Unit
                } else {
                    ErrorKind::Value
                },
                "{text}"
            );
        }
        assert_eq!(
            refused::<Length>(" nan mm").1,
            "span: found \"nan mm\"; expected a length as a finite decimal number \
             with one of the units m, mm, cm, in, ft, for example \"4.2 m\""
        );
        assert_eq!(
            refused::<Strain>("inf").1,
            "span: found \"inf\"; expected a strain as a finite decimal number \
             with one of the units 1, permille, for example \"4.2 permille\""
        );
    }

    #[test]
    fn says_which_units_fit() {
        let unit = |message: &str| (ErrorKind::Unit, message.to_owned());
        assert_eq!(
            refused::<Length>("4.2"),
            unit(
                "span: found \"4.2\" without a unit; expected a length with one of the units \
                 m, mm, cm, in, ft, for example \"4.2 m\""
            )
        );
        assert_eq!(
            refused::<Length>("4.2 kN"),
            unit(
                "span: found \"4.2 kN\", which is a force; \
                 expected a length (m, mm, cm, in, ft)"
            )
        );
        assert_eq!(
            refused::<Length>("4.2 furlong"),
            unit(
                "span: found \"4.2 furlong\" with the unknown unit \"furlong\"; \
                 expected a length (m, mm, cm, in, ft)"
            )
        );
        assert_eq!(
            refused::<Force>("10 mm²"),
            unit(
                "span: found \"10 mm²\", which is an area; expected a force (N, kN, MN, lbf, kip)"
            )
        );
        // The case of a letter and a space have a meaning: "m m" is no millimetre.
        for text in ["4.2 MM", "4.2 m m", "4.2 m/m", "4.2 m ^ 2"] {
            assert!(refused::<Length>(text).1.contains("unknown unit"), "{text}");
        }
        assert_eq!(
            "4.2".parse::<LineLoad>().unwrap_err().to_string(),
            "line load: found \"4.2\" without a unit; expected a line load with one of the units \
             N/m, kN/m, N/mm, plf, lbf/ft, kip/ft, for example \"4.2 N/m\""
        );
    }
}
