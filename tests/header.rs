//! The headers in the repository are those that the source makes.
//!
//! `UPDATE_HEADER=1 cargo test --test header` writes them anew.

use std::path::{Path, PathBuf};

fn crate_directory() -> PathBuf {
    Path::new(env!("CARGO_MANIFEST_DIR")).join("beamcore-ffi")
}

/// Compares a header with its new text, or writes it where that is asked for.
fn keep(name: &str, text: &str) {
    let path = crate_directory().join("include").join(name);
    if std::env::var_os("UPDATE_HEADER").is_some() {
        std::fs::write(&path, text).unwrap_or_else(|error| panic!("{}: {error}", path.display()));
    }
    let kept = std::fs::read_to_string(&path)
        .unwrap_or_else(|error| panic!("{}: {error}", path.display()));
    let different = kept
        .lines()
        .zip(text.lines())
        .position(|(kept, new)| kept != new);
    assert!(
        kept == text,
        "{} is out of date from line {} on; run UPDATE_HEADER=1 cargo test --test header",
        path.display(),
        different.unwrap_or(kept.lines().count().min(text.lines().count())) + 1,
    );
}

#[test]
fn the_c_header_is_made_from_the_source() {
    let directory = crate_directory();
    let config = cbindgen::Config::from_file(directory.join("cbindgen.toml"))
        .expect("cbindgen.toml is readable");
    let mut text = Vec::new();
    cbindgen::Builder::new()
        .with_crate(directory)
        .with_config(config)
        .generate()
        .expect("cbindgen makes a header")
        .write(&mut text);
    keep("beamcore.h", &String::from_utf8(text).expect("UTF-8"));
}

#[test]
fn the_header_of_the_units_is_made_from_their_table() {
    keep("beamcore_units.hpp", &beamcore::units::generate::cpp());
}
