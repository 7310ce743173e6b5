//! The golden runner: answers the golden cases through job text or through the typed way.
//!
//! A line of an answer is `CASE<TAB>PATH<TAB>BITS`, the bits of the number as 16 hexadecimal
//! digits. The C, C++ and Python runners print the same lines.

use beamcore::Result;
use beamcore::job::{Format, Job};
use std::fmt::Write as _;
use std::path::Path;

#[path = "typed.rs"]
mod typed;

pub use typed::answers as typed;

/// One expected result: the number, the peak and the tolerance, or nothing but the path.
pub struct Expected {
    /// The path in the outcome.
    pub path: String,
    /// Expected value, peak and relative tolerance, where there is an outside value.
    pub numbers: Option<[f64; 3]>,
}

/// A line of an answer.
pub fn line(case: &str, path: &str, value: f64) -> String {
    format!("{case}\t{path}\t{:016x}\n", value.to_bits())
}

/// The names of the cases.
pub fn cases(folder: &Path) -> Vec<String> {
    lines(&folder.join("cases.txt"))
}

/// The expected results of a case.
pub fn expected(folder: &Path, case: &str) -> Vec<Expected> {
    let parse = |line: String| {
        let mut rest = line.splitn(4, ' ');
        let numbers: Vec<_> = rest
            .by_ref()
            .take(3)
            .map(|word| word.parse::<f64>().ok())
            .collect();
        let numbers = match numbers[..] {
            [Some(value), Some(peak), Some(tolerance)] => Some([value, peak, tolerance]),
            [None, None, None] => None,
            _ => panic!("{case}: a line must have three numbers or three dashes: {line}"),
        };
        Expected {
            path: rest.next().expect("a line ends with a path").to_owned(),
            numbers,
        }
    };
    lines(&folder.join(format!("{case}.expect")))
        .into_iter()
        .map(parse)
        .collect()
}

fn lines(file: &Path) -> Vec<String> {
    let text = std::fs::read_to_string(file).unwrap_or_else(|e| panic!("{}: {e}", file.display()));
    let keep = |line: &&str| !line.is_empty() && !line.starts_with('#');
    text.lines().filter(keep).map(str::to_owned).collect()
}

/// Answers all cases through job text: the lines, and what misses its tolerance.
pub fn job(folder: &Path) -> Result<(String, Vec<String>)> {
    let (mut answers, mut misses) = (String::new(), Vec::new());
    for case in cases(folder) {
        let text = std::fs::read_to_string(folder.join(format!("{case}.toml"))).expect("a job");
        let outcome = Job::read(&text, Format::Toml)?.solve()?;
        for Expected { path, numbers } in expected(folder, &case) {
            let value = outcome.number(&path)?;
            let _ = write!(answers, "{}", line(&case, &path, value));
            let Some([expected, peak, tolerance]) = numbers else {
                continue;
            };
            let is_near = (value - expected).abs() <= tolerance * peak;
            if !is_near {
                misses.push(format!(
                    "{case} {path}: {value} is not {expected} within {tolerance}"
                ));
            }
        }
    }
    Ok((answers, misses))
}
