//! The class `Span`.

use crate::quantity::Quantity;
use beamcore::member;

record! {
    /// A stretch of a member whose deflection is looked at on its own: between neighbouring
    /// supports, or an overhang beyond the outer ones.
    Span {
        /// The name: "A to B" between the supports A and B, "before A" and "beyond B" for
        /// overhangs.
        name: String,
        /// Its left end, from the left end of the member.
        from_: Quantity,
        /// Its right end, from the left end of the member.
        to: Quantity,
        /// Its length, to - from_.
        length: Quantity,
        /// Whether one of its ends is free.
        cantilever: bool,
    }
}

impl Span {
    pub(crate) fn of(span: &member::Span) -> Self {
        Self {
            name: span.name().to_owned(),
            from_: Quantity::of(span.from()),
            to: Quantity::of(span.to()),
            length: Quantity::of(span.length()),
            cantilever: span.is_cantilever(),
        }
    }
}
