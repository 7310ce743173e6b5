//! Wrong jobs: each gives its message word for word, no panic, never an outcome.

use beamcore::ErrorKind;
use beamcore::job::{Format, Job};
use std::path::{Path, PathBuf};

fn folder() -> PathBuf {
    Path::new(env!("CARGO_MANIFEST_DIR")).join("tests/bad-jobs")
}

fn read(name: &str) -> String {
    let file = folder().join(name);
    std::fs::read_to_string(&file).unwrap_or_else(|error| panic!("{}: {error}", file.display()))
}

#[test]
fn every_wrong_job_gives_its_message() {
    let cases = read("cases.txt");
    let cases: Vec<_> = cases
        .lines()
        .filter(|line| !line.starts_with('#'))
        .collect();
    assert!(cases.len() >= 50);
    for case in cases {
        let error = match Job::read(&read(&format!("{case}.toml")), Format::Toml) {
            Err(error) => error,
            Ok(_) => panic!("{case} was taken for a good job"),
        };
        assert_eq!(
            error.to_string(),
            read(&format!("{case}.message")).trim_end(),
            "{case}"
        );
    }
}

#[test]
fn the_kinds_are_the_ones_that_bindings_rely_on() {
    let kind = |case: &str| {
        Job::read(&read(&format!("{case}.toml")), Format::Toml)
            .unwrap_err()
            .kind()
    };
    assert_eq!(kind("zero-size"), ErrorKind::Value);
    assert_eq!(kind("unknown-class"), ErrorKind::Name);
    assert_eq!(kind("unknown-key-beside"), ErrorKind::Key);
    assert_eq!(kind("missing-unit-number"), ErrorKind::Unit);
    assert_eq!(kind("two-parts-of-one-name"), ErrorKind::Duplicate);
    assert_eq!(kind("overlapping-parts"), ErrorKind::Geometry);
    assert_eq!(kind("empty-section"), ErrorKind::Missing);
    assert_eq!(kind("one-pin"), ErrorKind::Mechanism);
    assert_eq!(kind("load-outside"), ErrorKind::Position);
    assert_eq!(kind("truncated"), ErrorKind::Syntax);
    assert_eq!(kind("wrong-version"), ErrorKind::Version);
}

#[test]
fn a_file_that_cannot_be_read_is_told_from_a_wrong_one() {
    let error = Job::open(&folder().join("not-there.toml")).unwrap_err();
    assert_eq!(error.kind(), ErrorKind::File);
    assert!(error.to_string().contains("not-there.toml"));
    let error = Job::open(&folder().join("cases.txt")).unwrap_err();
    assert_eq!(error.kind(), ErrorKind::File);
}

/// A document cut off anywhere is an error and never a panic.
#[test]
fn a_truncated_document_is_an_error_at_every_place() {
    let whole = std::fs::read_to_string(
        Path::new(env!("CARGO_MANIFEST_DIR")).join("examples/jobs/garden-wall.toml"),
    )
    .unwrap();
    // Before the actions begin nothing can be a whole job.
    for end in 0..whole.find("[[actions]]").unwrap() {
        if whole.is_char_boundary(end) {
            assert!(
                Job::read(&whole[..end], Format::Toml).is_err(),
                "cut at {end}"
            );
        }
    }
    let json = Job::read(&whole, Format::Toml)
        .unwrap()
        .to_text(Format::Json);
    for end in (0..json.len()).filter(|&end| json.is_char_boundary(end)) {
        let cut = Job::read(&json[..end], Format::Json);
        assert_eq!(cut.unwrap_err().kind(), ErrorKind::Syntax, "cut at {end}");
    }
}

/// A job written back is the same job, in both formats.
#[test]
fn a_job_written_back_reads_the_same() {
    for name in [
        "flitch",
        "two-span",
        "slab-strip",
        "haunched-beam",
        "rafter",
        "side-plates",
        "shrinking-topping",
    ] {
        let file = folder().join(format!("../golden/{name}.toml"));
        let job = Job::open(&file).unwrap();
        let first = job.solve().unwrap().to_json();
        for format in [Format::Toml, Format::Json] {
            let again = Job::read(&job.to_text(format), format).unwrap();
            assert_eq!(again.solve().unwrap().to_json(), first);
        }
    }
}
