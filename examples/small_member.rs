//! A door lintel of two joists with a steel plate between them.

use beamcore::material::{ServiceClass, steel, timber};
use beamcore::member::{Action, Member};
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::Number;

fn main() -> beamcore::Result<()> {
    let timber = timber("C24", ServiceClass::One)?;
    let plate = Part::new("plate", rectangle(8.mm(), 180.mm()), steel("S235")?);
    let left =
        Part::new("left joist", rectangle(47.mm(), 195.mm()), timber.clone()).left_of(&plate);
    let right = Part::new("right joist", rectangle(47.mm(), 195.mm()), timber).right_of(&plate);
    let member = Member::simple_span(Section::of([plate, left, right])?, 3.6.m())
        .action(
            Action::permanent("wall above")
                .uniform(4.5.kN_per_m())
                .self_weight(),
        )
        .check()?;
    let deflection = member
        .solve()
        .deflection("quasi-permanent", Time::Final)?
        .greatest();
    println!(
        "deflection {:.2} mm at {:.2} m",
        deflection.value.to_mm(),
        deflection.at.to_m()
    );
    Ok(())
}
