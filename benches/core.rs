//! Times of the core beside what a user would write by hand for the same task, in one run.
//!
//! `cargo bench` measures; each group holds `beamcore` and `by hand`. The hand-written versions do
//! only the arithmetic of the one case, without checks, names, units or places of extremes.

use beamcore::job::{Format, Job};
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Member, Support};
use beamcore::response::Response;
use beamcore::section::{Joint, Layer, Part, Section, Slip, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, Number, SlipModulus};
use criterion::{Criterion, criterion_group};
use std::hint::black_box;

#[path = "by_hand/mod.rs"]
mod by_hand;

fn parts() -> [Part; 3] {
    let material = |name: &str, e: f64| Material::new(name, e.GPa(), Creep::none());
    let core = Part::new(
        "core",
        rectangle(100.mm(), 220.mm()),
        material("wood", 11.0),
    );
    let plate = |name: &str| Part::new(name, rectangle(8.mm(), 200.mm()), material("steel", 210.0));
    let (left, right) = (plate("left").left_of(&core), plate("right").right_of(&core));
    [left, core, right]
}

fn transform(c: &mut Criterion) {
    let mut group = c.benchmark_group("EA, centroid and EI of three parts");
    let section = Section::of(parts()).unwrap();
    group.bench_function("beamcore", |b| {
        b.iter(|| black_box(&section).stiffness(Time::Initial))
    });
    let layers = [
        [210e9, 0.008, 0.2, 0.0],
        [11e9, 0.1, 0.22, 0.0],
        [210e9, 0.008, 0.2, 0.0],
    ];
    group.bench_function("by hand", |b| {
        b.iter(|| by_hand::stiffness(black_box(&layers)))
    });
    group.finish();
}

fn simple_span(c: &mut Criterion) {
    let mut group = c.benchmark_group("simple span, all fields and the greatest deflection");
    let member = Member::simple_span(Section::of(parts()).unwrap(), 4.m())
        .action(Action::permanent("load").uniform(5.kN_per_m()))
        .check()
        .unwrap();
    group.bench_function("beamcore", |b| {
        b.iter(|| {
            let response = black_box(&member).solve();
            response
                .deflection("permanent", Time::Initial)
                .unwrap()
                .greatest()
        });
    });
    group.bench_function("by hand", |b| {
        b.iter(|| by_hand::simple_span(black_box(5e3), black_box(4.0), black_box(3e6)));
    });
    group.finish();
}

/// The greatest values of the fields that every member has.
fn peaks(response: &Response) -> f64 {
    let (name, time) = ("permanent", Time::Initial);
    let deflection = response.deflection(name, time).unwrap().greatest();
    let slope = response.slope(name, time).unwrap().greatest();
    let shear = response.shear(name, time).unwrap().greatest();
    let moment = response.moment(name, time).unwrap().greatest();
    deflection.value.to_m() + slope.value.to_rad() + shear.value.to_N() + moment.value.to_N_m()
}

fn on_spans(section: Section, spans: i32) -> Member {
    let plan = Member::of_length(section, Length::from_m(4.0 * f64::from(spans)))
        .support(Support::pin("s0", 0.m()))
        .action(Action::permanent("load").uniform(5.kN_per_m()));
    let support = |i: i32| Support::roller(format!("s{i}"), Length::from_m(4.0 * f64::from(i)));
    (1..=spans)
        .fold(plan, |plan, i| plan.support(support(i)))
        .check()
        .unwrap()
}

fn many_spans(c: &mut Criterion) {
    let mut group = c.benchmark_group("spans, one load case, all fields and extremes");
    for spans in [10, 100, 1000, 10_000] {
        let member = on_spans(Section::of(parts()).unwrap(), spans);
        group.bench_function(format!("beamcore, {spans}"), |b| {
            b.iter(|| peaks(&black_box(&member).solve()));
        });
        let lengths = vec![4.0; usize::try_from(spans).unwrap()];
        group.bench_function(format!("by hand, {spans}"), |b| {
            b.iter(|| by_hand::three_moments(black_box(&lengths), black_box(5e3), black_box(3e6)));
        });
    }
    group.finish();
}

fn two_layers(c: &mut Criterion) {
    let mut group = c.benchmark_group("two slipping layers, one span, all fields and extremes");
    let material = |name: &str, e: f64| Material::new(name, e.GPa(), Creep::none());
    let joist = Part::new(
        "joist",
        rectangle(100.mm(), 220.mm()),
        material("wood", 11.0),
    );
    let concrete = material("concrete", 31.0);
    let slab = Part::new("slab", rectangle(600.mm(), 70.mm()), concrete).above(&joist);
    let modulus = SlipModulus::from_N_per_mm2(133.0);
    let screws = Joint::slipping("screws", "joist", "slab", Slip::Modulus(modulus)).creep(0.0);
    let layers = ["joist", "slab"].map(|name| Layer::new(name, [name]));
    let section = Section::layered([joist, slab], layers, [screws]).unwrap();
    let member = Member::simple_span(section, 6.m())
        .action(Action::permanent("load").uniform(3.kN_per_m()))
        .check()
        .unwrap();
    group.bench_function("beamcore", |b| {
        b.iter(|| {
            let response = black_box(&member).solve();
            let joint = response
                .joint("permanent", Time::Initial, "screws")
                .unwrap();
            let slab = response.layer("permanent", Time::Initial, "slab").unwrap();
            let own = joint.slip.greatest().value.to_m()
                + joint.flow.greatest().value.to_N_per_m()
                + slab.axial.greatest().value.to_N();
            own + peaks(&response)
        });
    });
    let (ea, ei) = ([11e9 * 0.022, 31e9 * 0.042], [976_066.0, 531_650.0]);
    group.bench_function("by hand, closed form", |b| {
        b.iter(|| by_hand::two_layers(black_box(3e3), black_box(6.0), 133e6, ea, ei, 0.145));
    });
    group.finish();
}

fn five_layers(c: &mut Criterion) {
    let mut group = c.benchmark_group("five slipping layers, ten spans");
    let wood = Material::new("wood", 11.0.GPa(), Creep::none());
    let name = |i: i32| format!("board {i}");
    let board = |i: i32| {
        Part::new(name(i), rectangle(100.mm(), 40.mm()), wood.clone()).at(0.mm(), (40 * i).mm())
    };
    let layer = |i: i32| Layer::new(name(i), [name(i)]);
    let joint = |i: i32| {
        let slip = Slip::Modulus(SlipModulus::from_N_per_mm2(f64::from(8 * i)));
        Joint::slipping(format!("nails {i}"), name(i - 1), name(i), slip).creep(0.0)
    };
    let section = Section::layered((0..5).map(board), (0..5).map(layer), (1..5).map(joint));
    let member = on_spans(section.unwrap(), 10);
    group.bench_function("beamcore, all fields and extremes", |b| {
        b.iter(|| {
            let response = black_box(&member).solve();
            let slips = (1..5).map(|i| {
                let joint = response.joint("permanent", Time::Initial, &format!("nails {i}"));
                joint.unwrap().slip.greatest().value.to_m()
            });
            slips.sum::<f64>() + peaks(&response)
        });
    });
    let board = (
        11e9 * 0.1 * 0.04,
        11e9 * 0.1 * 0.04 * 0.04 * 0.04 / 12.0,
        0.04,
    );
    group.bench_function("by hand, 20 differences per span", |b| {
        b.iter(|| by_hand::equal_layers(10, 20, 4.0, 5e3, board, &[8e6, 16e6, 24e6, 32e6]));
    });
    group.finish();
}

/// The hand-written versions solve the same problems: a bench of something else would mean nothing.
fn same_problems() {
    let near = |a: f64, b: f64, tolerance: f64| assert!((a / b - 1.0).abs() < tolerance, "{a} {b}");
    let ei = 11e9 * 0.1 * 0.04 * 0.04 * 0.04 / 12.0;
    let board = (11e9 * 0.1 * 0.04, ei, 0.04);
    // Two boards on one span by differences and in closed form.
    let exact = by_hand::two_layers(5e3, 4.0, 8e6, [board.0; 2], [ei; 2], 0.04)[0];
    near(
        by_hand::equal_layers(1, 80, 4.0, 5e3, board, &[8e6]),
        exact,
        1e-3,
    );
}

fn whole_job(c: &mut Criterion) {
    let mut group = c.benchmark_group("example job");
    let text = include_str!("../examples/jobs/garden-wall.toml");
    let job = Job::read(text, Format::Toml).unwrap();
    let outcome = job.solve().unwrap();
    group.bench_function("read", |b| {
        b.iter(|| Job::read(black_box(text), Format::Toml).unwrap())
    });
    group.bench_function("solve", |b| b.iter(|| black_box(&job).solve().unwrap()));
    group.bench_function("print", |b| b.iter(|| black_box(&outcome).summary()));
    group.finish();
}

criterion_group!(
    benches,
    transform,
    simple_span,
    many_spans,
    two_layers,
    five_layers,
    whole_job
);

fn main() {
    same_problems();
    benches();
    Criterion::default().configure_from_args().final_summary();
}
