//! The fields of a response as plain numbers along the member.

use super::drawn::{ALL, Drawn, FIRST};
use beamcore::field::Field;
use beamcore::response::Response;
use beamcore::units::{Length, Quantity};

/// A field of a response by its name, with values in SI units.
pub struct Line {
    pub name: String,
    pub peak: f64,
    value: Box<dyn Fn(f64) -> [f64; 2]>,
}

impl Line {
    fn of<Q: Quantity + 'static>(name: impl Into<String>, field: Field<Q>) -> Self {
        // Places are worked out, and may pass an end by a rounding.
        let end = *field.stations().last().unwrap();
        Self {
            name: name.into(),
            peak: field.greatest().value.si().abs(),
            value: Box::new(move |x| {
                let sides = field
                    .sides(Length::from_m(x).max(Length::ZERO).min(end))
                    .unwrap();
                [sides.left.si(), sides.right.si()]
            }),
        }
    }

    pub fn at(&self, x: f64) -> f64 {
        (self.value)(x)[1]
    }

    pub fn left_of(&self, x: f64) -> f64 {
        (self.value)(x)[0]
    }
}

pub fn deflection(r: &Response) -> Line {
    Line::of("w", r.deflection(ALL, FIRST).unwrap())
}

pub fn rotation(r: &Response) -> Line {
    Line::of("theta", r.rotation(ALL, FIRST).unwrap())
}

pub fn moment(r: &Response) -> Line {
    Line::of("M", r.moment(ALL, FIRST).unwrap())
}

pub fn shear(r: &Response) -> Line {
    Line::of("V", r.shear(ALL, FIRST).unwrap())
}

pub fn axial_of(r: &Response, layer: &str) -> Line {
    let name = format!("N of {layer}");
    Line::of(name, r.layer(ALL, FIRST, layer).unwrap().axial)
}

pub fn moment_of(r: &Response, layer: &str) -> Line {
    let name = format!("M of {layer}");
    Line::of(name, r.layer(ALL, FIRST, layer).unwrap().moment)
}

pub fn slip_of(r: &Response, joint: &str) -> Line {
    Line::of(
        format!("slip of {joint}"),
        r.joint(ALL, FIRST, joint).unwrap().slip,
    )
}

pub fn flow_of(r: &Response, joint: &str) -> Line {
    Line::of(
        format!("flow of {joint}"),
        r.joint(ALL, FIRST, joint).unwrap().flow,
    )
}

/// All fields of a response with so many layers.
pub fn lines(r: &Response, drawn: &Drawn) -> Vec<Line> {
    let mut lines = vec![deflection(r), rotation(r), moment(r), shear(r)];
    for i in 0..drawn.layers.len() {
        let name = Drawn::layer_name(i);
        lines.extend([axial_of(r, &name), moment_of(r, &name)]);
    }
    for j in 0..drawn.moduli.len() {
        let name = Drawn::joint_name(j);
        lines.extend([slip_of(r, &name), flow_of(r, &name)]);
    }
    lines
}

/// Places along the member, none of them likely to be a station.
pub fn places(length: f64) -> impl Iterator<Item = f64> {
    (0..=37).map(move |i| (length * f64::from(i) / 37.0).min(length))
}
