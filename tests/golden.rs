//! The golden cases in Rust: outside values within their tolerance, and the typed way equal to job
//! text to the last bit.

use std::collections::HashMap;
use std::path::Path;

#[path = "golden/runner.rs"]
mod runner;

fn folder() -> &'static Path {
    Path::new(concat!(env!("CARGO_MANIFEST_DIR"), "/tests/golden"))
}

#[test]
fn job_text_gives_the_outside_values() {
    let (answers, misses) = runner::job(folder()).unwrap();
    assert!(misses.is_empty(), "{}", misses.join("\n"));
    assert!(answers.lines().count() > 900);
    for case in runner::cases(folder()) {
        let outside = runner::expected(folder(), &case)
            .iter()
            .filter(|e| e.numbers.is_some())
            .count();
        assert!(outside >= 4, "{case} has too few outside values");
    }
}

#[test]
fn the_typed_way_gives_the_same_bits() {
    let (answers, _) = runner::job(folder()).unwrap();
    let split = |line: &str| {
        line.rsplit_once('\t')
            .map(|(k, b)| (k.to_owned(), b.to_owned()))
    };
    let by_path: HashMap<_, _> = answers.lines().filter_map(split).collect();
    let typed = runner::typed().unwrap();
    assert!(typed.lines().count() > 250);
    for line in typed.lines() {
        let (key, bits) = line.rsplit_once('\t').unwrap();
        assert_eq!(by_path.get(key).map(String::as_str), Some(bits), "{key}");
    }
}
