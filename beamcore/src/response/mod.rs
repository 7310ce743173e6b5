//! The response of a member: deflection, slope, shear force, moment and reactions along x.

mod share;

use crate::error::{Error, Result};
use crate::field::{Field, Piecewise};
use crate::lookup;
use crate::math::polynomial::Coefficients;
use crate::member::{Combination, Member};
use crate::solve::beam::{Reaction as PlainReaction, Solved};
use crate::solve::polynomial::PieceFields;
use crate::time::Time;
use crate::units::{Angle, Force, Length, Moment, Quantity};
use share::Share;
use std::sync::Arc;

/// The reaction of one support on the member.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Reaction {
    /// The force, positive upward.
    pub force: Force,
    /// The couple, positive clockwise with x to the right and z up; zero unless the support holds
    /// the rotation.
    pub couple: Moment,
}

/// The solved member: every field under every combination, at both times.
///
/// Results at [`Time::Initial`] use short-term moduli. Results at [`Time::Final`] are the sum of
/// (combination - quasi-permanent share) with short-term moduli and the quasi-permanent share with
/// effective moduli E/(1 + creep factor) of each part, so that only what creeps softens.
#[derive(Clone, Debug)]
pub struct Response {
    member: Member,
    stations: Arc<[f64]>,
    /// One solution per action and a last one for the initial strains of the parts, for the initial
    /// and the final stiffness.
    solved: [Vec<Solved>; 2],
}

impl Member {
    /// Solves the member for each action at each time.
    #[must_use]
    pub fn solve(&self) -> Response {
        Response::of(self.clone())
    }
}

impl Response {
    fn of(member: Member) -> Self {
        let solved = Time::ALL.map(|time| {
            let state = member.state(time);
            let beam = &state.beam;
            let case = |action| crate::member::load_case(beam, member.section(), action);
            let actions = member
                .actions()
                .iter()
                .map(|action| beam.solve(&case(action)));
            let free = state.free.curvature_y.si();
            let strains = if free == 0.0 {
                Solved::at_rest(beam.stations().len())
            } else {
                beam.solve(&crate::member::curvature_case(beam, free))
            };
            actions.chain(std::iter::once(strains)).collect()
        });
        let stations = Arc::from(member.state(Time::Initial).beam.stations());
        Self {
            member,
            stations,
            solved,
        }
    }

    /// The member that was solved.
    #[must_use]
    pub const fn member(&self) -> &Member {
        &self.member
    }

    /// The deflection w along the member, positive downward.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination.
    pub fn deflection(&self, combination: &str, time: Time) -> Result<Field<Length>> {
        self.field(combination, time, |piece| &piece.deflection)
    }

    /// The movement sideways along the member, positive towards positive y; zero unless the member
    /// is free sideways and its section has no axis of symmetry.
    ///
    /// v = w `EI_yz`/`EI_zz`, each share of the load with its own moduli.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination.
    pub fn sideways(&self, combination: &str, time: Time) -> Result<Field<Length>> {
        let shares = self.parted(combination, time, |piece| &piece.deflection)?;
        let mut line = shares[0].zeroed();
        for (share, time) in shares.iter().zip(Time::ALL) {
            let stiffness = &self.member.state(time).stiffness;
            let (_, ratio) = stiffness.against_bending(self.member.sideways());
            line.add(share.pieces(), -ratio);
        }
        Ok(Field::new(line))
    }

    /// The slope dw/dx along the member, positive where the deflection grows to the right.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination.
    pub fn slope(&self, combination: &str, time: Time) -> Result<Field<Angle>> {
        self.field(combination, time, |piece| &piece.slope)
    }

    /// The shear force V = dM/dx along the member.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination.
    pub fn shear(&self, combination: &str, time: Time) -> Result<Field<Force>> {
        self.field(combination, time, |piece| &piece.shear)
    }

    /// The moment M along the member, positive where it stretches the bottom (sagging).
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination.
    pub fn moment(&self, combination: &str, time: Time) -> Result<Field<Moment>> {
        self.field(combination, time, |piece| &piece.moment)
    }

    /// The reaction of a support.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or support.
    pub fn reaction(&self, combination: &str, time: Time, support: &str) -> Result<Reaction> {
        let supports = self.member.supports();
        let at = supports
            .iter()
            .find(|s| s.name() == support)
            .map(|s| s.at().si());
        let Some(at) = at else {
            let names: Vec<_> = supports.iter().map(|s| s.name()).collect();
            return Err(lookup::unknown("support", support, &names).into());
        };
        let station = self.stations.partition_point(|&x| x < at);
        let mut total = PlainReaction::default();
        for (share, [initial, end]) in self.shares(combination, time)?.into_iter().zip(self.both())
        {
            let (a, b) = (initial.reactions[station], end.reactions[station]);
            total.force += share.short_term * a.force + share.effective * b.force;
            total.couple += share.short_term * a.couple + share.effective * b.couple;
        }
        Ok(Reaction {
            force: Force::from_si(total.force),
            couple: Moment::from_si(total.couple),
        })
    }

    /// What is left of equilibrium and continuity in the solutions, relative to their greatest
    /// terms: the error estimate of exact polynomial pieces.
    #[must_use]
    pub fn residual(&self) -> f64 {
        self.solved
            .iter()
            .flatten()
            .map(|solved| solved.residual)
            .fold(0.0, f64::max)
    }

    /// The combination of a name.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is none.
    pub fn combination(&self, name: &str) -> Result<&Combination> {
        let all = self.member.combinations();
        all.iter()
            .find(|combination| combination.name() == name)
            .ok_or_else(|| {
                let names: Vec<_> = all.iter().map(Combination::name).collect();
                Error::from(lookup::unknown("combination", name, &names))
            })
    }

    fn field<Q: Quantity>(
        &self,
        combination: &str,
        time: Time,
        of: impl Fn(&PieceFields) -> &Coefficients,
    ) -> Result<Field<Q>> {
        let [mut line, effective] = self.parted(combination, time, of)?;
        line.add(effective.pieces(), 1.0);
        Ok(Field::new(line))
    }

    /// A field in its two shares: under short-term moduli and under effective moduli.
    fn parted(
        &self,
        combination: &str,
        time: Time,
        of: impl Fn(&PieceFields) -> &Coefficients,
    ) -> Result<[Piecewise; 2]> {
        let mut lines = [(); 2].map(|()| Piecewise::zero(Arc::clone(&self.stations)));
        for (share, [initial, end]) in self.shares(combination, time)?.into_iter().zip(self.both())
        {
            lines[0].add(initial.fields.iter().map(&of), share.short_term);
            lines[1].add(end.fields.iter().map(&of), share.effective);
        }
        Ok(lines)
    }

    /// The deflection line under a combination.
    pub(crate) fn deflection_line(&self, combination: &str, time: Time) -> Result<Piecewise> {
        let [mut line, effective] = self.parted(combination, time, |piece| &piece.deflection)?;
        line.add(effective.pieces(), 1.0);
        Ok(line)
    }

    /// The moment in its two shares, from which stresses follow.
    pub(crate) fn parted_moment(&self, combination: &str, time: Time) -> Result<[Piecewise; 2]> {
        self.parted(combination, time, |piece| &piece.moment)
    }

    fn shares(&self, combination: &str, time: Time) -> Result<Vec<Share>> {
        Ok(share::of(
            self.combination(combination)?,
            self.member.actions(),
            time,
        ))
    }

    /// For each action, and last for the initial strains, its solution with short-term and with
    /// effective moduli.
    fn both(&self) -> impl Iterator<Item = [&Solved; 2]> {
        self.solved[0]
            .iter()
            .zip(&self.solved[1])
            .map(|(initial, end)| [initial, end])
    }
}
