//! The exception classes: one per kind of problem of the core, under one base.

use beamcore::{Error, ErrorKind};
use pyo3::exceptions::{PyException, PyLookupError, PyOSError, PyValueError};
use pyo3::prelude::*;
use pyo3::sync::PyOnceLock;
use pyo3::types::{PyDict, PyTuple, PyType};

static CLASSES: PyOnceLock<Classes> = PyOnceLock::new();

struct Classes {
    base: Py<PyType>,
    kinds: Vec<(ErrorKind, Py<PyType>)>,
}

record! {
    /// One thing that is wrong with an input.
    ///
    /// >>> try:
    /// ...     rectangle("75", 220*mm)
    /// ... except UnitProblem as error:
    /// ...     [problem] = error.problems
    /// >>> problem.path
    /// 'rectangle.width'
    /// >>> problem.found
    /// '"75" without a unit'
    Problem {
        /// The name of the kind, for example "Unit".
        kind: String,
        /// The field at fault, for example `section.parts["plate"].outline.rectangle.width`.
        path: String,
        /// What was found, with its unit.
        found: String,
        /// What would be right.
        expected: String,
        /// The line of the document, counted from 1, or None where there is no document.
        line: Option<usize>,
    }
}

/// A result of the core, whose error is raised as an exception.
pub(crate) trait OrRaise<T> {
    /// The value, or the exception of the error.
    fn or_raise(self, py: Python<'_>) -> PyResult<T>;
}

impl<T, E: Into<Error>> OrRaise<T> for Result<T, E> {
    fn or_raise(self, py: Python<'_>) -> PyResult<T> {
        self.map_err(|error| raised(py, &error.into()))
    }
}

/// The exception of an error of the core, with its text as it is there.
pub(crate) fn raised(py: Python<'_>, error: &Error) -> PyErr {
    exception(py, error).unwrap_or_else(|failure| failure)
}

fn exception(py: Python<'_>, error: &Error) -> PyResult<PyErr> {
    let classes = classes(py)?;
    let class = classes.kinds.iter().find(|(kind, _)| *kind == error.kind());
    let class = class.map_or(&classes.base, |(_, class)| class);
    let instance = class.bind(py).call1((error.to_string(),))?;
    let problems = error.problems().iter().map(|problem| Problem {
        kind: problem.kind().name().to_owned(),
        path: problem.path().to_owned(),
        found: problem.found().to_owned(),
        expected: problem.expected().to_owned(),
        line: problem.line(),
    });
    instance.setattr("kind", error.kind().name())?;
    instance.setattr("path", error.path())?;
    instance.setattr("problems", PyTuple::new(py, problems.collect::<Vec<_>>())?)?;
    Ok(PyErr::from_value(instance))
}

fn classes(py: Python<'_>) -> PyResult<&Classes> {
    CLASSES.get_or_try_init(py, || {
        // A class has empty values of what each instance bears.
        let blank = PyDict::new(py);
        blank.set_item("kind", "")?;
        blank.set_item("path", "")?;
        blank.set_item("problems", PyTuple::empty(py))?;
        let doc = "The base of all errors: kind and path of the first problem, and all problems.";
        let base = class(
            py,
            "BeamcoreError",
            doc,
            &[py.get_type::<PyException>()],
            &blank,
        )?;
        let kinds = ErrorKind::ALL.map(|kind| Ok((kind, class_of(py, kind, &base)?)));
        let kinds = kinds.into_iter().collect::<PyResult<_>>()?;
        Ok(Classes {
            base: base.unbind(),
            kinds,
        })
    })
}

/// The class of a kind: also a `ValueError` where the input is at fault, an `OSError` for files, a
/// `LookupError` for results that do not exist.
fn class_of(py: Python<'_>, kind: ErrorKind, base: &Bound<'_, PyType>) -> PyResult<Py<PyType>> {
    let also = match kind {
        ErrorKind::File => Some(py.get_type::<PyOSError>()),
        ErrorKind::Lookup => Some(py.get_type::<PyLookupError>()),
        kind if kind.is_input() => Some(py.get_type::<PyValueError>()),
        _ => None,
    };
    let bases: Vec<_> = [base.clone()].into_iter().chain(also).collect();
    let doc = format!("An error of the kind {}.", kind.name());
    Ok(class(py, &class_name(kind), &doc, &bases, &PyDict::new(py))?.unbind())
}

fn class<'py>(
    py: Python<'py>,
    name: &str,
    doc: &str,
    bases: &[Bound<'py, PyType>],
    attributes: &Bound<'py, PyDict>,
) -> PyResult<Bound<'py, PyType>> {
    attributes.set_item("__module__", "beamcore")?;
    attributes.set_item("__doc__", doc)?;
    let class = py
        .get_type::<PyType>()
        .call1((name, PyTuple::new(py, bases)?, attributes))?;
    Ok(class.cast_into()?)
}

fn class_name(kind: ErrorKind) -> String {
    format!("{}Problem", kind.name())
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    let py = module.py();
    let classes = classes(py)?;
    module.add("BeamcoreError", classes.base.bind(py))?;
    for (kind, class) in &classes.kinds {
        module.add(class_name(*kind), class.bind(py))?;
    }
    module.add_class::<Problem>()
}
