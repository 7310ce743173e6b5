//! The text of the C++ and the Python units, made from the table.

use super::products::{HALF_PRODUCTS, PRODUCTS, QUOTIENTS};
use super::{TypeRow, Unit, table};
use std::fmt::Write as _;

const HEAD: &str = "Generated from the units table of beamcore; do not edit.";

/// The C++17 header of the units: one class per type, its products, and literals as in `50_mm`.
#[must_use]
pub fn cpp() -> String {
    let classes: String = table().iter().map(cpp_class).collect();
    let products: String = PRODUCTS
        .iter()
        .map(cpp_product)
        .chain(HALF_PRODUCTS.iter().map(cpp_half_product))
        .chain(QUOTIENTS.iter().map(cpp_quotient))
        .collect();
    let literals: String = table().iter().map(cpp_literals).collect();
    format!(
        "\
// {HEAD}
#ifndef BEAMCORE_UNITS_HPP
#define BEAMCORE_UNITS_HPP

namespace beamcore {{
{classes}
// Products and quotients of quantities.
{products}
// Number literals with units: 50_mm, 6.5_kN_per_m.
namespace literals {{
{literals}
}} // namespace literals
}} // namespace beamcore

#endif // BEAMCORE_UNITS_HPP
"
    )
}

fn cpp_class(row: &TypeRow) -> String {
    let TypeRow {
        name,
        noun,
        si_symbol,
        ..
    } = row;
    let conversions: String = row
        .units
        .iter()
        .map(|unit| cpp_conversions(name, unit))
        .collect();
    let comparisons: String = ["==", "!=", "<", "<=", ">", ">="]
        .iter()
        .map(|sign| {
            format!(
                "    friend constexpr bool operator{sign}({name} a, {name} b) \
                 {{ return a.si_ {sign} b.si_; }}\n"
            )
        })
        .collect();
    format!(
        "
// {}: one double in the SI unit {si_symbol}.
class {name} {{
public:
    static constexpr {name} from_si(double si) {{ return {name}(si); }}
    constexpr double si() const {{ return si_; }}
{conversions}
{comparisons}
    friend constexpr {name} operator+({name} a, {name} b) {{ return {name}(a.si_ + b.si_); }}
    friend constexpr {name} operator-({name} a, {name} b) {{ return {name}(a.si_ - b.si_); }}
    friend constexpr {name} operator-({name} a) {{ return {name}(-a.si_); }}
    friend constexpr {name} operator*({name} a, double x) {{ return {name}(a.si_ * x); }}
    friend constexpr {name} operator*(double x, {name} a) {{ return {name}(x * a.si_); }}
    friend constexpr {name} operator/({name} a, double x) {{ return {name}(a.si_ / x); }}
    friend constexpr double operator/({name} a, {name} b) {{ return a.si_ / b.si_; }}

private:
    explicit constexpr {name}(double si) : si_(si) {{}}
    double si_;
}};
",
        capital(noun)
    )
}

fn cpp_conversions(class: &str, unit: &Unit) -> String {
    let Unit {
        symbol,
        name,
        num,
        den,
        ..
    } = unit;
    // {:?} prints the shortest decimal that reads back as the same double, always as a double.
    format!(
        "
    // The unit {symbol}.
    static constexpr {class} from_{name}(double x) {{ return {class}(x * {num:?} / {den:?}); }}
    constexpr double to_{name}() const {{ return si_ * {den:?} / {num:?}; }}
"
    )
}

/// The operator `left sign right = result`.
fn cpp_rule(left: &str, sign: &str, right: &str, result: &str) -> String {
    format!(
        "constexpr {result} operator{sign}({left} a, {right} b) \
         {{ return {result}::from_si(a.si() {sign} b.si()); }}\n"
    )
}

fn cpp_product([a, b, c]: &[&str; 3]) -> String {
    let mut text = cpp_rule(a, "*", b, c) + &cpp_rule(c, "/", b, a);
    if a != b {
        text += &(cpp_rule(b, "*", a, c) + &cpp_rule(c, "/", a, b));
    }
    text
}

fn cpp_half_product([a, b, c]: &[&str; 3]) -> String {
    cpp_rule(a, "*", b, c) + &cpp_rule(b, "*", a, c) + &cpp_rule(c, "/", a, b)
}

fn cpp_quotient([a, b, c]: &[&str; 3]) -> String {
    cpp_rule(a, "/", b, c) + &cpp_rule(a, "/", c, b)
}

fn cpp_literals(row: &TypeRow) -> String {
    let mut text = String::new();
    for Unit { name, .. } in row.units.iter().filter(|unit| unit.literal) {
        for number in ["long double", "unsigned long long"] {
            // Writing to a String does not fail.
            let _ = writeln!(
                text,
                "constexpr {class} operator\"\"_{name}({number} x) \
                 {{ return {class}::from_{name}(static_cast<double>(x)); }}",
                class = row.name
            );
        }
    }
    text
}

fn capital(noun: &str) -> String {
    let (first, rest) = noun.split_at(1);
    first.to_uppercase() + rest
}

/// The Python module of the units: one name per unit without a product, as in `50 * mm`.
#[must_use]
pub fn python() -> String {
    let mut listed: Vec<String> = Vec::new();
    let mut assigned = String::new();
    for row in table() {
        let simple = |unit: &&Unit| unit.literal && unit.symbol.chars().all(char::is_alphabetic);
        for Unit { symbol, .. } in row.units.iter().filter(simple) {
            let name = python_name(symbol);
            listed.push(format!("    \"{name}\",\n"));
            assigned += &format!("{name}: Final[Unit] = Unit(\"{symbol}\")\n");
        }
    }
    format!(
        "\
# {HEAD}
\"\"\"Units to multiply numbers with: ``225 * mm``, ``6.5 * kN / m``, ``8e6 * mm**4``.\"\"\"

from typing import Final

from beamcore._core import Unit

__all__ = [
{}]

{assigned}",
        listed.concat()
    )
}

/// The name of a unit in Python: its symbol, but `in` is a keyword and `d` a frequent variable.
fn python_name(symbol: &str) -> &str {
    match symbol {
        "in" => "inch",
        "d" => "day",
        _ => symbol,
    }
}
