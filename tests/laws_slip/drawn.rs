//! Random members of one to four layers over one to three spans.

use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Load, Member, MemberPlan, ShearModel, Support};
use beamcore::response::Response;
use beamcore::section::{Joint, JointKind, Layer, Part, Section, Slip, rectangle};
use beamcore::time::Time;
use beamcore::units::{Force, Length, LineLoad, Modulus, Moment, SlipModulus};
use proptest::prelude::*;

/// The only combination that is looked at.
pub const ALL: &str = "permanent";
pub const FIRST: Time = Time::Initial;

/// A member as it was drawn.
#[derive(Clone, Debug)]
pub struct Drawn {
    /// Width and height in m and modulus in Pa of each layer, from the lowest up.
    pub layers: Vec<[f64; 3]>,
    /// The slip modulus of each joint in N/m2.
    pub moduli: Vec<f64>,
    /// The lengths of the spans in m.
    pub spans: Vec<f64>,
    /// An overhang at the right in m.
    pub overhang: f64,
    /// Whether the left end is fixed.
    pub is_fixed: bool,
    /// Shear modulus over modulus, if the member yields in shear.
    pub shear: Option<f64>,
    /// The heights at the right end, as a share of those at the left, if they vary.
    pub taper: Option<f64>,
    pub loads: Vec<Load>,
}

fn m(x: f64) -> Length {
    Length::from_m(x)
}

/// A load with its places as shares of the length.
#[derive(Clone, Debug)]
enum Share {
    Point(f64, f64),
    Couple(f64, f64),
    Line(f64, f64, f64, f64),
}

impl Share {
    fn load(&self, length: f64) -> Load {
        match *self {
            Self::Point(p, at) => Load::Point {
                load: Force::from_kN(p),
                at: m(at * length),
            },
            Self::Couple(c, at) => Load::Couple {
                couple: Moment::from_kN_m(c),
                at: m(at * length),
            },
            Self::Line(left, right, from, to) => Load::Trapezoidal {
                load_from: LineLoad::from_kN_per_m(left),
                load_to: LineLoad::from_kN_per_m(right),
                from: m(from * length),
                to: m(to * length),
            },
        }
    }
}

fn share() -> impl Strategy<Value = Share> {
    prop_oneof![
        (-9.0..9.0f64, 0.0..1.0f64).prop_map(|(p, at)| Share::Point(p, at)),
        (-9.0..9.0f64, 0.0..1.0f64).prop_map(|(c, at)| Share::Couple(c, at)),
        (-9.0..9.0f64, -9.0..9.0f64, 0.0..0.5f64, 0.01..0.5f64)
            .prop_map(|(a, b, from, more)| Share::Line(a, b, from, from + more)),
    ]
}

/// Members with slip moduli of the given powers of ten, varying depth or not.
pub fn drawn(powers: std::ops::Range<f64>, tapers: bool) -> impl Strategy<Value = Drawn> {
    let layer = [0.03..0.4f64, 0.01..0.2f64, 1e9..2e11f64];
    let layers = prop::collection::vec(layer, 1..5);
    let moduli = prop::collection::vec(powers, 3);
    let spans = prop::collection::vec(1.0..5.0f64, 1..4);
    let overhang = prop_oneof![Just(0.0), 0.2..1.0f64];
    let shear = prop::option::of(0.02..0.4f64);
    let taper = if tapers {
        (0.5..2.0f64).prop_map(Some).boxed()
    } else {
        Just(None).boxed()
    };
    let loads = prop::collection::vec(share(), 1..4);
    (
        layers,
        moduli,
        spans,
        overhang,
        any::<bool>(),
        shear,
        taper,
        loads,
    )
        .prop_map(
            |(layers, powers, spans, overhang, is_fixed, shear, taper, shares)| {
                let length = spans.iter().sum::<f64>() + overhang;
                let powers = &powers[..layers.len() - 1];
                Drawn {
                    moduli: powers.iter().map(|p| libm::pow(10.0, *p)).collect(),
                    layers,
                    spans,
                    overhang,
                    is_fixed,
                    shear,
                    taper,
                    loads: shares.iter().map(|share| share.load(length)).collect(),
                }
            },
        )
}

impl Drawn {
    pub fn length(&self) -> f64 {
        self.spans.iter().sum::<f64>() + self.overhang
    }

    /// The places of the supports.
    pub fn supports(&self) -> Vec<f64> {
        let ends = self.spans.iter().scan(0.0, |x, span| {
            *x += span;
            Some(*x)
        });
        std::iter::once(0.0).chain(ends).collect()
    }

    pub fn layer_name(i: usize) -> String {
        format!("layer {i}")
    }

    pub fn joint_name(j: usize) -> String {
        format!("joint {j}")
    }

    /// The parts with their heights times a factor.
    fn parts(&self, factor: f64) -> Vec<Part> {
        let mut bottom = 0.0;
        let layers = self.layers.iter().enumerate();
        layers
            .map(|(i, [width, height, modulus])| {
                let name = Self::layer_name(i);
                let mut material = Material::new(&name, Modulus::from_Pa(*modulus), Creep::none());
                if let Some(ratio) = self.shear {
                    material = material.shear_modulus(Modulus::from_Pa(ratio * modulus));
                }
                let height = factor * height;
                let z = bottom + height / 2.0;
                bottom += height;
                Part::new(name, rectangle(m(*width), m(height)), material).at(m(0.0), m(z))
            })
            .collect()
    }

    /// The section with joints of the given kinds.
    pub fn section_with(&self, factor: f64, kinds: &[JointKind]) -> Section {
        let parts = self.parts(factor);
        let layers = (0..parts.len()).map(|i| {
            let name = Self::layer_name(i);
            Layer::new(&name, [name.as_str()])
        });
        let layers: Vec<_> = layers.collect();
        let joints = kinds.iter().enumerate().map(|(j, kind)| {
            let (lower, upper) = (Self::layer_name(j), Self::layer_name(j + 1));
            let joint = Joint::new(Self::joint_name(j), lower, upper, kind.clone());
            match kind {
                JointKind::Slipping(_) => joint.creep(0.0),
                JointKind::Rigid | JointKind::Loose => joint,
            }
        });
        let joints: Vec<_> = joints.collect();
        Section::layered(parts, layers, joints).unwrap()
    }

    pub fn kinds(&self) -> Vec<JointKind> {
        let slip = |k: &f64| JointKind::Slipping(Slip::Modulus(SlipModulus::from_N_per_m2(*k)));
        self.moduli.iter().map(slip).collect()
    }

    /// The plan without actions, with joints of the given kinds.
    pub fn plan_with(&self, kinds: &[JointKind]) -> MemberPlan {
        let length = m(self.length());
        let mut plan = Member::of_length(self.section_with(1.0, kinds), length);
        if let Some(factor) = self.taper {
            plan = plan.taper(m(0.0), length, self.section_with(factor, kinds));
        }
        if self.shear.is_some() {
            plan = plan.shear(ShearModel::Flexible);
        }
        for (i, x) in self.supports().iter().enumerate() {
            let (name, at) = (format!("support {i}"), m(*x));
            plan = plan.support(match (i, self.is_fixed) {
                (0, true) => Support::fixed(name, at),
                (0, false) => Support::pin(name, at),
                _ => Support::roller(name, at),
            });
        }
        plan
    }

    pub fn plan(&self) -> MemberPlan {
        self.plan_with(&self.kinds())
    }

    /// The response to loads.
    pub fn under(&self, loads: &[Load]) -> Response {
        solved(self.plan(), loads)
    }

    pub fn response(&self) -> Response {
        self.under(&self.loads)
    }
}

/// The response of a plan to loads as one action.
pub fn solved(plan: MemberPlan, loads: &[Load]) -> Response {
    let action = loads
        .iter()
        .cloned()
        .fold(Action::permanent("g"), Action::load);
    plan.action(action).check().unwrap().solve()
}

pub fn point(load: f64, at: f64) -> Load {
    Load::Point {
        load: Force::from_N(load),
        at: m(at),
    }
}

/// A load of nothing over a stretch, whose ends cut the member.
pub fn nothing(from: f64, to: f64) -> Load {
    Load::Partial {
        load: LineLoad::ZERO,
        from: m(from),
        to: m(to),
    }
}
