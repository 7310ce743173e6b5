//! A unit and a type as rows of the table, and the search for a unit by its symbol.

use super::{Dimension, Quantity, table};

/// A unit of one type: `si = x * num / den`.
///
/// # Examples
/// ```
/// use beamcore::units::{Length, Quantity};
/// let mm = &Length::UNITS[1];
/// assert_eq!((mm.symbol, mm.name, mm.num, mm.den), ("mm", "mm", 1.0, 1000.0));
/// assert_eq!(mm.to_si(50.0), 0.05);
/// ```
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Unit {
    /// The symbol, as in "kN/m".
    pub symbol: &'static str,
    /// The symbol as a part of a name, as in `from_kN_per_m`: "kN_per_m".
    pub name: &'static str,
    /// The numerator of the factor to SI.
    pub num: f64,
    /// The denominator of the factor to SI.
    pub den: f64,
    /// Whether `1.0.name()` is a quantity of this type (and not of another with this symbol).
    pub literal: bool,
}

impl Unit {
    /// The SI number of `x` of this unit, x * num / den.
    #[must_use]
    pub const fn to_si(&self, x: f64) -> f64 {
        x * self.num / self.den
    }

    /// How many of this unit the SI number `si` is, si * den / num.
    #[must_use]
    pub const fn from_si(&self, si: f64) -> f64 {
        si * self.den / self.num
    }

    /// The unit of `symbol` out of `units`; a symbol that is missing does not compile.
    pub(super) const fn of(units: &[Self], symbol: &str) -> Self {
        let mut place = 0;
        while place < units.len() {
            if same(units[place].symbol, symbol) {
                return units[place];
            }
            place += 1;
        }
        panic!("a unit to print with is not in the table")
    }

    /// Whether `text`, already [`normal`], means this unit: "kN m" also as "kNm".
    fn reads(&self, text: &str) -> bool {
        text == self.symbol || (self.symbol.contains(' ') && text == self.symbol.replace(' ', ""))
    }
}

/// Whether two texts are the same (string comparison is not yet possible in constants).
const fn same(a: &str, b: &str) -> bool {
    let (a, b) = (a.as_bytes(), b.as_bytes());
    let mut place = 0;
    while place < a.len() && place < b.len() && a[place] == b[place] {
        place += 1;
    }
    place == a.len() && place == b.len()
}

/// A type of quantity as a row of the [`table`](super::table()).
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct TypeRow {
    /// The name of the type: "LineLoad".
    pub name: &'static str,
    /// The name in a sentence: "line load".
    pub noun: &'static str,
    /// The symbol of the SI unit: "N/m".
    pub si_symbol: &'static str,
    /// The dimension.
    pub dimension: Dimension,
    /// All units, the SI unit first.
    pub units: &'static [Unit],
}

impl TypeRow {
    /// The row of the type `Q`.
    #[must_use]
    pub const fn of<Q: Quantity>() -> Self {
        Self {
            name: Q::NAME,
            noun: Q::NOUN,
            si_symbol: Q::UNITS[0].symbol,
            dimension: Q::DIMENSION,
            units: Q::UNITS,
        }
    }

    /// The noun with its article: "a line load", "an area".
    pub(super) fn one(&self) -> String {
        let article = if self.noun.starts_with(['a', 'e', 'i', 'o', 'u']) {
            "an"
        } else {
            "a"
        };
        format!("{article} {}", self.noun)
    }

    /// The symbols of all units: "m, mm, cm, in, ft".
    pub(super) fn symbols(&self) -> String {
        self.units
            .iter()
            .map(|unit| unit.symbol)
            .collect::<Vec<_>>()
            .join(", ")
    }

    /// What is expected where a quantity of this type is: "a length (m, mm, cm, in, ft)".
    pub(super) fn expected(&self) -> String {
        format!("{} ({})", self.one(), self.symbols())
    }

    /// The unit of this type that the text `symbol` means.
    pub(super) fn unit(&self, symbol: &str) -> Option<&'static Unit> {
        let symbol = normal(symbol);
        self.units.iter().find(|unit| unit.reads(&symbol))
    }
}

/// The type and the unit that `symbol` means; of types that share it, the one with the literal.
pub(super) fn find(symbol: &str) -> Option<(&'static TypeRow, &'static Unit)> {
    let all = || {
        table()
            .iter()
            .filter_map(|row| row.unit(symbol).map(|unit| (row, unit)))
    };
    all()
        .find(|(_, unit)| unit.literal)
        .or_else(|| all().next())
}

/// The first type in the table of this dimension; `None` for plain numbers, which mean nothing.
pub(super) fn meaning(dimension: Dimension) -> Option<&'static TypeRow> {
    table()
        .iter()
        .find(|row| row.dimension == dimension && dimension != Dimension::NONE)
}

/// A unit as written by a person, in the table's writing: "kN·m" is "kN m", "mm^2" is "mm2".
fn normal(symbol: &str) -> String {
    let mut plain = String::with_capacity(symbol.len());
    let mut rest = symbol.chars().peekable();
    while let Some(mark) = rest.next() {
        match mark {
            '²' => plain.push('2'),
            '³' => plain.push('3'),
            '⁴' => plain.push('4'),
            '*' | '·' | '⋅' => plain.push(' '),
            '^' if rest.peek().is_some_and(char::is_ascii_digit) => {}
            _ => plain.push(mark),
        }
    }
    let spaced = plain.split_whitespace().collect::<Vec<_>>().join(" ");
    spaced
        .split('/')
        .map(str::trim)
        .collect::<Vec<_>>()
        .join("/")
}
