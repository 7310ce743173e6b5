//! Runs a job document and prints the summary of its outcome.
//!
//! `cargo run --release --example run_job -- examples/jobs/garden-wall.toml` prints the summary;
//! with `--json` after the name, the whole outcome as JSON.

use beamcore::job::Job;
use std::path::Path;
use std::process::ExitCode;

fn main() -> ExitCode {
    let arguments: Vec<String> = std::env::args().skip(1).collect();
    let (name, as_json) = match arguments.iter().map(String::as_str).collect::<Vec<_>>()[..] {
        [name] => (name, false),
        [name, "--json"] => (name, true),
        _ => {
            eprintln!("usage: run_job JOB.toml|JOB.json [--json]");
            return ExitCode::FAILURE;
        }
    };
    match Job::open(Path::new(name)).and_then(|job| job.solve()) {
        Ok(outcome) if as_json => println!("{}", outcome.to_json()),
        Ok(outcome) => print!("{}", outcome.summary()),
        Err(error) => {
            eprintln!("{error}");
            return ExitCode::FAILURE;
        }
    }
    ExitCode::SUCCESS
}
