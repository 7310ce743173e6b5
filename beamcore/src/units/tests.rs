//! Tests of the units room as a whole.

use super::*;
use crate::error::ErrorKind;

fn all_units() -> impl Iterator<Item = (&'static TypeRow, &'static Unit)> {
    table()
        .iter()
        .flat_map(|row| row.units.iter().map(move |unit| (row, unit)))
}

mod conversion {
    use super::*;

    /// How many doubles lie between two finite doubles of one sign.
    fn ulps(a: f64, b: f64) -> u64 {
        a.to_bits().abs_diff(b.to_bits())
    }

    #[test]
    fn every_unit_comes_back() {
        for (row, unit) in all_units() {
            // A whole number either way rounds once there and once back: 1 ulp. A fraction rounds
            // twice each way, which 2 ulp hold over this range.
            let allowed = if unit.num == 1.0 || unit.den == 1.0 {
                1
            } else {
                2
            };
            let mut x = 1e-3;
            while x < 1e6 {
                let back = unit.from_si(unit.to_si(x));
                assert!(ulps(back, x) <= allowed, "{} {x} {}", row.name, unit.symbol);
                x *= 1.000_137;
            }
        }
    }

    #[test]
    fn whole_millimetres_are_the_nearest_doubles() {
        for mm in 1..=100_000 {
            assert_eq!(mm.mm().si(), f64::from(mm) / 1000.0);
            assert_eq!(mm.mm().si(), format!("{mm}e-3").parse::<f64>().unwrap());
        }
    }

    #[test]
    fn si_units_keep_the_bits() {
        for row in table() {
            let si = &row.units[0];
            assert_eq!(
                (si.symbol, si.num, si.den),
                (row.si_symbol, 1.0, 1.0),
                "{}",
                row.name
            );
            for x in [0.1, -0.0, 1.0 / 3.0, 5e-324, f64::MAX] {
                assert_eq!(si.to_si(x).to_bits(), x.to_bits());
                assert_eq!(si.from_si(x).to_bits(), x.to_bits());
            }
        }
    }

    /// Definitions: international yard and pound agreement (1959), standard gravity (1901).
    #[test]
    fn other_units_by_definition() {
        assert_eq!(1.inch().si(), 0.0254);
        assert_eq!(1.ft().si(), 0.3048);
        assert_eq!(1.lb().si(), 0.453_592_37);
        assert_eq!(1.lbf().si(), 4.448_221_615_260_5);
        assert_eq!(1.year().si(), 365.25 * 86_400.0);
        assert_eq!(180.deg().si(), std::f64::consts::PI);
        assert_eq!(12.inch(), 1.ft());
        assert_eq!(12.kip_in(), 1.kip_ft());
    }

    /// A composite unit of the table has the factor and the dimension of the product of its parts.
    #[test]
    fn composites_are_the_products_of_their_parts() {
        let factor = |text: &str| -> AnyUnit {
            let base = text.trim_end_matches(|c: char| c.is_ascii_digit());
            let power = text[base.len()..].parse().unwrap_or(1);
            AnyUnit::named(base).unwrap().power(power).unwrap()
        };
        let side = |text: &str| {
            text.split_whitespace()
                .fold(AnyUnit::ONE, |unit, f| unit.times(factor(f)).unwrap())
        };
        let mut composites = 0;
        let built_up = |(_, unit): &(_, &Unit)| unit.symbol != "1";
        for (row, unit) in all_units().filter(built_up) {
            let (above, below) = unit.symbol.split_once('/').unwrap_or((unit.symbol, ""));
            let built = side(above).per(side(below)).unwrap();
            assert_eq!(
                built.dimension(),
                row.dimension,
                "{} {}",
                row.name,
                unit.symbol
            );
            assert_eq!(
                (built.num(), built.den()),
                (unit.num, unit.den),
                "{}",
                unit.symbol
            );
            composites += usize::from(!unit.symbol.chars().all(char::is_alphabetic));
        }
        assert!(composites > 30, "{composites}");
    }

    #[test]
    fn thermal_expansion_is_per_kelvin() {
        let per_kelvin = Dimension {
            mass: 0,
            length: 0,
            time: 0,
            temperature: -1,
        };
        assert_eq!(ThermalExpansion::DIMENSION, per_kelvin);
        assert_eq!("12e-6 /K".parse::<ThermalExpansion>(), Ok(12e-6.per_K()));
        assert_eq!("12e-6 1/K".parse::<ThermalExpansion>(), Ok(12e-6.per_K()));
        assert_eq!(12e-6.per_K().to_string(), "1.2e-5 /K");
        assert_eq!(
            "12e-6".parse::<ThermalExpansion>().unwrap_err().to_string(),
            "thermal expansion: found \"12e-6\" without a unit; expected a thermal expansion with \
             one of the units /K, for example \"12e-6 /K\""
        );
        assert_eq!(
            "12e-6 /m".parse::<ThermalExpansion>().unwrap_err().kind(),
            ErrorKind::Unit
        );
    }

    #[test]
    fn equal_symbols_mean_equal_units() {
        for (row, unit) in all_units() {
            let (owner, found) = unit::find(unit.symbol).unwrap();
            assert_eq!(owner.dimension, row.dimension, "{}", unit.symbol);
            assert_eq!(
                (found.num, found.den),
                (unit.num, unit.den),
                "{}",
                unit.symbol
            );
            let owners = all_units()
                .filter(|(_, u)| u.symbol == unit.symbol && u.literal)
                .count();
            assert_eq!(owners, 1, "one literal for {}", unit.symbol);
        }
    }

    #[test]
    fn names_follow_from_symbols() {
        for (_, unit) in all_units() {
            let name = match unit.symbol {
                "in" => "inch".to_owned(),
                "1" => "ratio".to_owned(),
                symbol => symbol.replace('/', " per ").trim().replace(' ', "_"),
            };
            assert_eq!(unit.name, name);
        }
    }
}

mod dynamic {
    use super::*;

    fn any(text: &str) -> AnyQuantity {
        AnyQuantity::parse(text).unwrap_or_else(|problem| panic!("{problem}"))
    }

    #[test]
    fn calculates_and_names_what_does_not_fit() {
        assert_eq!(any("4 ft 3 in"), 51.inch().into());
        assert_eq!(
            any("2 m").plus(any("30 mm")).unwrap(),
            AnyQuantity::from(Length::from_si(2.03))
        );
        assert_eq!(any("2 kN").per(any("4 m")).unwrap(), 0.5.kN_per_m().into());
        assert_eq!(
            any("2 m").number_in(AnyUnit::named("mm").unwrap()),
            Ok(2000.0)
        );
        let message = |found: Result<AnyQuantity, crate::Problem>| found.unwrap_err().to_string();
        assert_eq!(
            message(any("2 m").minus(any("3 kN"))),
            "quantity: found a force of 3000 N; expected a length (m, mm, cm, in, ft)"
        );
        assert_eq!(
            message(any("2 m").per(any("3 m")).unwrap().plus(any("1 s"))),
            "quantity: found a duration of 1 s; expected a plain number"
        );
        assert_eq!(
            message(AnyQuantity::parse("4.2")),
            "quantity: found \"4.2\" without a unit; \
             expected a finite decimal number with a unit, for example \"225 mm\""
        );
        assert_eq!(
            message(AnyQuantity::parse("4.2 furlong")),
            "quantity: found \"4.2 furlong\" with the unknown unit \"furlong\"; \
             expected a finite decimal number with a unit, for example \"225 mm\""
        );
        assert_eq!(
            AnyQuantity::parse("nan m").unwrap_err().kind(),
            ErrorKind::Value
        );
        let square = any("3 N").times(any("2 N")).unwrap();
        assert_eq!(
            square.to::<Moment>("couple").unwrap_err().to_string(),
            "couple: found a quantity of 6 kg2 m2/s4; \
             expected a moment (N m, kN m, N mm, kip ft, kip in, lbf ft)"
        );
        let endless = any("1 m").per(any("0 s").per(any("1 s")).unwrap()).unwrap();
        assert_eq!(
            endless.to::<Length>("span").unwrap_err().kind(),
            ErrorKind::Value
        );
    }

    #[test]
    fn units_stay_exact_or_are_refused() {
        let named = |symbol| AnyUnit::named(symbol).unwrap();
        let unit = named("N").per(named("mm")).unwrap();
        assert_eq!((unit.num(), unit.den()), (1000.0, 1.0));
        assert_eq!(unit.dimension(), LineLoad::DIMENSION);
        assert_eq!(named("deg").per(named("deg")), Ok(AnyUnit::ONE));
        assert_eq!(
            named("mm").power(-2).unwrap(),
            AnyUnit::ONE.per(named("mm2")).unwrap()
        );
        assert_eq!(named("mm").power(0), Ok(AnyUnit::ONE));
        assert_eq!(named("m").power(127).unwrap().dimension().length, 127);
        assert_eq!(
            named("m2").power(64).unwrap_err().to_string(),
            "unit: found a unit with a power or a factor that is too large; \
             expected powers from -128 to 127 and a factor that a double can hold"
        );
        assert_eq!(named("mm").power(127).unwrap_err().kind(), ErrorKind::Value);
        assert_eq!(
            AnyUnit::named("furlong").unwrap_err().to_string(),
            "unit: found the unknown unit \"furlong\"; \
             expected the symbol of a unit, for example \"mm\", \"kN\" or \"kN/m\""
        );
    }
}

mod generated {
    use super::*;

    #[test]
    fn cpp_and_python_hold_the_whole_table() {
        let (cpp, python) = (generate::cpp(), generate::python());
        let head = "Generated from the units table of beamcore; do not edit.";
        assert!(cpp.starts_with(&format!("// {head}\n#ifndef BEAMCORE_UNITS_HPP\n")));
        assert!(python.starts_with(&format!("# {head}\n")));
        for (row, unit) in all_units() {
            let Unit { name, num, den, .. } = unit;
            let class = row.name;
            let from = format!(
                "static constexpr {class} from_{name}(double x) \
                 {{ return {class}(x * {num:?} / {den:?}); }}"
            );
            assert!(cpp.contains(&from), "{from}");
            let literal = format!("constexpr {class} operator\"\"_{name}(long double x)");
            assert_eq!(cpp.contains(&literal), unit.literal, "{literal}");
        }
        assert!(cpp.contains("x * 8896443230521.0 / 2000000000000.0"));
        assert!(cpp.contains("constexpr Force operator/(Moment a, Length b)"));
        for line in [
            "inch: Final[Unit] = Unit(\"in\")\n",
            "day: Final[Unit] = Unit(\"d\")\n",
        ] {
            assert_eq!(python.matches(line).count(), 1, "{line}");
        }
        assert!(!python.contains("Unit(\"kN/m\")"));
    }
}
