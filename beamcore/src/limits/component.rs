//! The parts of a deflection by EN 1990:2002 A1.4.3, and their limits.

use crate::camber::Camber;
use crate::error::Result;
use crate::field::{Field, Piecewise};
use crate::member::{Member, Span};
use crate::response::Response;
use crate::time::Time;
use crate::units::Length;

/// A component of the deflection of a span.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Component {
    /// w_inst: characteristic combination, initial.
    Instant,
    /// w_1: permanent actions, initial.
    Permanent,
    /// w_2: what creep adds under permanent actions only.
    Creep,
    /// w_3: what variable actions add, with the creep under their quasi-permanent part.
    Variable,
    /// w_tot = w_1 + w_2 + w_3.
    Total,
    /// w_max = w_tot - w_c: what is left after the camber w_c.
    Remaining,
}

impl Component {
    /// All components, in the order of EN 1990.
    pub const ALL: [Self; 6] = [
        Self::Instant,
        Self::Permanent,
        Self::Creep,
        Self::Variable,
        Self::Total,
        Self::Remaining,
    ];

    /// The symbol used in documents, for example `w_tot`.
    #[must_use]
    pub const fn symbol(self) -> &'static str {
        match self {
            Self::Instant => "w_inst",
            Self::Permanent => "w_1",
            Self::Creep => "w_2",
            Self::Variable => "w_3",
            Self::Total => "w_tot",
            Self::Remaining => "w_max",
        }
    }
}

impl Response {
    /// The line of a component along a span, under the named combination, after the given
    /// camber. EN 1990 means a characteristic combination; any other is taken as it is.
    ///
    /// Source: EN 1990:2002 A1.4.3, from memory: w_2 is creep under permanent load only; creep under
    /// psi_2 Q belongs to w_3.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or span.
    pub fn deflection_component(
        &self,
        component: Component,
        combination: &str,
        span: &str,
        camber: Option<&Camber>,
    ) -> Result<Field<Length>> {
        let line = |name: &str, time: Time| self.deflection_line(name, time);
        let mut sum = match component {
            Component::Instant => line(combination, Time::Initial)?,
            Component::Permanent => line("permanent", Time::Initial)?,
            Component::Creep => {
                let mut creep = line("permanent", Time::Final)?;
                creep.add(&line("permanent", Time::Initial)?, -1.0);
                creep
            }
            Component::Variable => {
                let mut variable = line(combination, Time::Final)?;
                variable.add(&line("permanent", Time::Final)?, -1.0);
                variable
            }
            Component::Total | Component::Remaining => line(combination, Time::Final)?,
        };
        if let (Component::Remaining, Some(camber)) = (component, camber) {
            sum.add(&camber.line(&sum), -1.0);
        }
        let span = self.member().span(span)?;
        let own = sum.between(span.from().si(), span.to().si());
        Ok(Field::new(from_chord(self.member(), span, own)))
    }

    /// w_c: the camber line over a span, positive upward; zero everywhere without a camber.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such span.
    #[cfg(feature = "document")]
    pub(crate) fn camber_of_span(
        &self,
        camber: Option<&Camber>,
        span: &str,
    ) -> Result<Field<Length>> {
        let span = self.member().span(span)?;
        let mut line = self.deflection_line("permanent", Time::Initial)?.zeroed();
        if let Some(camber) = camber {
            line.add(&camber.line(&line), 1.0);
        }
        Ok(Field::new(line.between(span.from().si(), span.to().si())))
    }

    /// The deflection of one span under a combination: between two supports from the chord through
    /// them, of an overhang from its support.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or span.
    pub fn span_deflection(
        &self,
        combination: &str,
        time: Time,
        span: &str,
    ) -> Result<Field<Length>> {
        let span = self.member().span(span)?;
        let line: Piecewise = self.deflection_line(combination, time)?;
        let (from, to) = (span.from().si(), span.to().si());
        let own = line.between(from, to);
        Ok(Field::new(from_chord(self.member(), span, own)))
    }
}

/// A line over a span, counted from the chord between its two supports, or from the support of an
/// overhang: supports on springs, and those that settle, move. Rigid ones leave it as it is.
fn from_chord(member: &Member, span: &Span, mut line: Piecewise) -> Piecewise {
    if !member.has_moving_supports() {
        return line;
    }
    let at = |x: f64| line.sides(x).map_or(0.0, |sides| sides.0);
    let (from, to) = (span.from().si(), span.to().si());
    let (left, right) = match (span.is_cantilever(), span.from() == Length::ZERO) {
        (false, _) => (at(from), at(to)),
        (true, true) => (at(to), at(to)),
        (true, false) => (at(from), at(from)),
    };
    let places = line.stations().to_vec();
    for (k, ends) in places.windows(2).enumerate() {
        let chord = |x: f64| left + (right - left) * ((x - from) / (to - from));
        let (start, end) = (chord(ends[0]), chord(ends[1]));
        line.add_to_piece(k, &[-start, start - end]);
    }
    line
}
