//! Times of the core beside what a user would write by hand for the same task, in one run.
//!
//! `cargo bench` measures; each group holds `beamcore` and `by hand`. The hand-written versions do
//! only the arithmetic of the one case, without checks, names, units or places of extremes.

use beamcore::job::{Format, Job};
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Member, Support};
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, Number};
use criterion::{Criterion, criterion_group, criterion_main};
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

fn ten_spans(c: &mut Criterion) {
    let mut group = c.benchmark_group("ten spans, one load case");
    let plan = Member::of_length(Section::of(parts()).unwrap(), 40.m())
        .support(Support::pin("s0", 0.m()))
        .action(Action::permanent("load").uniform(5.kN_per_m()));
    let member = (1..=10)
        .fold(plan, |plan, i| {
            plan.support(Support::roller(
                format!("s{i}"),
                Length::from_m(4.0 * f64::from(i)),
            ))
        })
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
        b.iter(|| by_hand::three_moments(black_box(&[4.0; 10]), black_box(5e3), black_box(3e6)));
    });
    group.finish();
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

criterion_group!(benches, transform, simple_span, ten_spans, whole_job);
criterion_main!(benches);
