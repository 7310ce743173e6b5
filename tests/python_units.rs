//! The Python module of the units is what the units table makes of it.

use std::path::Path;

#[test]
fn python_units_are_current() {
    let file = Path::new(env!("CARGO_MANIFEST_DIR")).join("beamcore-py/python/beamcore/_units.py");
    let generated = beamcore::units::generate::python();
    if std::env::var_os("UPDATE_UNITS").is_some() {
        std::fs::write(&file, &generated).expect("the file can be written");
    }
    let committed = std::fs::read_to_string(&file).expect("the file can be read");
    assert_eq!(
        committed, generated,
        "run UPDATE_UNITS=1 cargo test --test python_units"
    );
}
