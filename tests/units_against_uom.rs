//! The table of units against a general units library (uom).
//!
//! Each row names a type and a symbol of ours, and the size of the same unit in uom's base units.
//! uom rounds the factors of some units to seven digits; what rests on those is compared to half a
//! unit of the seventh digit, all else to the last bits.

use beamcore::units::table;
use uom::si::f64::{
    Angle, Area, Force, Length, Mass, MassDensity, Pressure, Ratio, TemperatureInterval, Time,
    Torque, Volume,
};
use uom::si::{
    angle, area, force, length, mass, mass_density, pressure, ratio, temperature_interval, time,
    torque, volume,
};

fn rows() -> Vec<(&'static str, &'static str, f64)> {
    let m = |value: Length| value.get::<length::meter>();
    let inch = m(Length::new::<length::inch>(1.0));
    let foot = m(Length::new::<length::foot>(1.0));
    let newton = |value: Force| value.get::<force::newton>();
    let lbf = newton(Force::new::<force::pound_force>(1.0));
    let pascal = |value: Pressure| value.get::<pressure::pascal>();
    let psi = pascal(Pressure::new::<pressure::pound_force_per_square_inch>(1.0));
    let kg = |value: Mass| value.get::<mass::kilogram>();
    let pound = kg(Mass::new::<mass::pound>(1.0));
    let mut rows = vec![
        ("Length", "mm", m(Length::new::<length::millimeter>(1.0))),
        ("Length", "cm", m(Length::new::<length::centimeter>(1.0))),
        ("Length", "in", inch),
        ("Length", "ft", foot),
        (
            "Area",
            "mm2",
            Area::new::<area::square_millimeter>(1.0).get::<area::square_meter>(),
        ),
        (
            "Area",
            "in2",
            Area::new::<area::square_inch>(1.0).get::<area::square_meter>(),
        ),
        (
            "Area",
            "ft2",
            Area::new::<area::square_foot>(1.0).get::<area::square_meter>(),
        ),
        (
            "FirstMoment",
            "cm3",
            Volume::new::<volume::cubic_centimeter>(1.0).get::<volume::cubic_meter>(),
        ),
        (
            "FirstMoment",
            "in3",
            Volume::new::<volume::cubic_inch>(1.0).get::<volume::cubic_meter>(),
        ),
        ("SecondMoment", "mm4", 1e-12),
        ("SecondMoment", "in4", inch * inch * inch * inch),
        ("Force", "kN", newton(Force::new::<force::kilonewton>(1.0))),
        ("Force", "MN", newton(Force::new::<force::meganewton>(1.0))),
        ("Force", "lbf", lbf),
        ("Force", "kip", newton(Force::new::<force::kip>(1.0))),
        ("LineLoad", "plf", lbf / foot),
        ("LineLoad", "kip/ft", 1000.0 * lbf / foot),
        ("AreaLoad", "psf", lbf / (foot * foot)),
        (
            "Moment",
            "lbf ft",
            Torque::new::<torque::pound_force_foot>(1.0).get::<torque::newton_meter>(),
        ),
        ("Moment", "kip in", 1000.0 * lbf * inch),
        ("Moment", "kip ft", 1000.0 * lbf * foot),
        (
            "Density",
            "kg/m3",
            MassDensity::new::<mass_density::kilogram_per_cubic_meter>(1.0).value,
        ),
        (
            "Density",
            "lb/ft3",
            MassDensity::new::<mass_density::pound_per_cubic_foot>(1.0).value,
        ),
        ("BendingStiffness", "kip in2", 1000.0 * lbf * inch * inch),
        (
            "Strain",
            "permille",
            Ratio::new::<ratio::per_mille>(1.0).get::<ratio::ratio>(),
        ),
        (
            "Angle",
            "deg",
            Angle::new::<angle::degree>(1.0).get::<angle::radian>(),
        ),
        (
            "TemperatureChange",
            "degF",
            TemperatureInterval::new::<temperature_interval::degree_fahrenheit>(1.0)
                .get::<temperature_interval::kelvin>(),
        ),
        (
            "SpringStiffness",
            "kN/mm",
            newton(Force::new::<force::kilonewton>(1.0))
                / m(Length::new::<length::millimeter>(1.0)),
        ),
        ("Mass", "t", kg(Mass::new::<mass::ton>(1.0))),
        ("Mass", "lb", pound),
        ("LineMass", "lb/ft", pound / foot),
        (
            "Duration",
            "h",
            Time::new::<time::hour>(1.0).get::<time::second>(),
        ),
        (
            "Duration",
            "d",
            Time::new::<time::day>(1.0).get::<time::second>(),
        ),
    ];
    for name in ["Stress", "Modulus"] {
        rows.extend([
            (
                name,
                "kPa",
                pascal(Pressure::new::<pressure::kilopascal>(1.0)),
            ),
            (
                name,
                "MPa",
                pascal(Pressure::new::<pressure::megapascal>(1.0)),
            ),
            (
                name,
                "GPa",
                pascal(Pressure::new::<pressure::gigapascal>(1.0)),
            ),
            (name, "psi", psi),
            (name, "ksi", 1000.0 * psi),
        ]);
    }
    rows
}

#[test]
fn the_factors_are_those_of_a_general_units_library() {
    let rows = rows();
    assert!(rows.len() >= 40);
    for (name, symbol, expected) in rows {
        let row = table().iter().find(|row| row.name == name).expect(name);
        let unit = row
            .units
            .iter()
            .find(|unit| unit.symbol == symbol)
            .expect(symbol);
        let found = unit.to_si(1.0);
        let is_rounded = ["lb", "kip", "plf", "psf", "psi", "ksi", "in2", "ft2", "in3"]
            .iter()
            .any(|rounded| symbol.contains(rounded));
        let tolerance = if is_rounded { 5e-7 } else { 1e-14 };
        assert!(
            (found - expected).abs() <= tolerance * expected,
            "{name} {symbol}: {found} {expected}"
        );
    }
}
