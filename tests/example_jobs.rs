//! The example jobs: each runs, and its summary reads on 80 columns.

use beamcore::job::Job;
use std::path::Path;

fn summaries() -> Vec<(String, String)> {
    let folder = Path::new(env!("CARGO_MANIFEST_DIR")).join("examples/jobs");
    let mut files: Vec<_> = std::fs::read_dir(folder)
        .unwrap()
        .map(|entry| entry.unwrap().path())
        .collect();
    files.sort();
    files
        .iter()
        .map(|file| {
            let outcome = Job::open(file).unwrap().solve().unwrap();
            (file.display().to_string(), outcome.summary())
        })
        .collect()
}

#[test]
fn every_summary_fits_the_page_and_holds_its_headings() {
    let summaries = summaries();
    assert!(summaries.len() >= 3);
    for (file, summary) in summaries {
        for line in summary.lines() {
            assert!(line.chars().count() <= 80, "{file}: {line}");
        }
        for heading in [
            "GOVERNING",
            "MEMBER",
            "REACTIONS",
            "ASSUMED",
            "RULES",
            "NOT CHECKED",
        ] {
            assert!(
                summary.contains(&format!("\n{heading}")),
                "{file} has no {heading}"
            );
        }
        // The governing results come first.
        let place = |heading: &str| summary.find(heading).unwrap();
        assert!(place("GOVERNING") < place("MEMBER"));
        assert!(
            !summary.contains("OVERSTRESSED") && !summary.contains("NOT KEPT"),
            "{file}"
        );
    }
}

#[test]
fn what_a_job_assumes_stands_in_its_outcome() {
    let (_, summary) = summaries()
        .into_iter()
        .find(|(file, _)| file.ends_with("oak-joist.toml"))
        .unwrap();
    let flat = summary.split_whitespace().collect::<Vec<_>>().join(" ");
    assert!(flat.contains("For this job: The joist was jacked clear of its load"));
    assert!(flat.contains("For this job: The plate is bonded over the full length"));
}
