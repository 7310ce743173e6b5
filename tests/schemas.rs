//! The committed schemas are the ones that the document types give.
//!
//! `UPDATE_SCHEMAS=1 cargo test --test schemas` rewrites them.

use std::path::Path;

fn compare(name: &str, text: &str) {
    let file = Path::new(env!("CARGO_MANIFEST_DIR"))
        .join("beamcore/schemas")
        .join(name);
    let text = format!("{text}\n");
    if std::env::var_os("UPDATE_SCHEMAS").is_some() {
        std::fs::write(&file, &text).unwrap();
    }
    let committed = std::fs::read_to_string(&file).unwrap_or_default();
    assert!(
        committed == text,
        "{name} is not current: run UPDATE_SCHEMAS=1 cargo test --test schemas"
    );
}

#[test]
fn the_schema_of_the_job_is_current() {
    compare("job.schema.json", &beamcore::job::schema());
}

#[test]
fn the_schema_of_the_outcome_is_current() {
    compare("outcome.schema.json", &beamcore::outcome::schema());
}
