//! The classes `Job` and `Outcome`: inputs and results as documents.

use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::run::run;
use beamcore::job::{self, Format};
use beamcore::outcome;
use pyo3::prelude::*;
use pyo3::types::PyTuple;
use std::path::PathBuf;

/// All inputs of one member as one document, TOML or JSON.
///
/// >>> Job.read("version = 1", format="yaml")
/// Traceback (most recent call last):
/// beamcore.NameProblem: format: found "yaml"; expected one of "toml", "json"
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Job(Made<job::Job>);

#[pymethods]
impl Job {
    /// Reads a job from a text in the format "toml" or "json".
    ///
    /// Everything that is wrong with it is raised at once, each problem with its path and line.
    #[staticmethod]
    #[pyo3(signature = (text, format="toml"))]
    fn read(py: Python<'_>, text: &str, format: &str) -> PyResult<Self> {
        let notation: Format = format.parse::<Format>().or_raise(py)?;
        let job = run(py, || job::Job::read(text, notation))?;
        let recipe = Recipe::call(py, "Job.read", (text, format))?;
        Ok(Self(Made::new(job, recipe)))
    }

    /// Reads a job from a file whose name ends in `.toml` or `.json`.
    #[staticmethod]
    fn open(py: Python<'_>, path: PathBuf) -> PyResult<Self> {
        let job = run(py, || job::Job::open(&path))?;
        // The job is made again from what it holds, for its file may have changed or gone.
        let notation = Format::Json;
        let recipe = Recipe::call(py, "Job.read", (job.to_text(notation), notation.name()))?;
        Ok(Self(Made::new(job, recipe)))
    }

    /// The job written back as a text in the format "toml" or "json".
    #[pyo3(signature = (format="toml"))]
    fn to_text(&self, py: Python<'_>, format: &str) -> PyResult<String> {
        Ok(self.0.to_text(format.parse::<Format>().or_raise(py)?))
    }

    /// Solves the job.
    fn solve(slf: &Bound<'_, Self>) -> PyResult<Outcome> {
        let py = slf.py();
        let job = &slf.get().0.inner;
        let outcome = run(py, || job.solve())?;
        let recipe = Recipe::method(slf, "solve", PyTuple::empty(py))?;
        Ok(Outcome(Made::new(outcome, recipe)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// All results of a job as one document.
///
/// A result is addressed by its path, in the SI unit that the path ends with:
/// `combinations["quasi-permanent"].final.deflection.greatest.value_m`.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Outcome(Made<outcome::Outcome>);

#[pymethods]
impl Outcome {
    /// The outcome as a JSON text.
    #[getter]
    fn json(&self) -> String {
        self.0.to_json()
    }

    /// The outcome as a plain text of 80 columns, for reading.
    fn summary(&self) -> String {
        self.0.summary()
    }

    /// The number at a path, in the SI unit that the path ends with.
    fn number(&self, py: Python<'_>, path: &str) -> PyResult<f64> {
        self.0.number(path).or_raise(py)
    }

    /// The text at a path, for example `warnings[0]`.
    fn text(&self, py: Python<'_>, path: &str) -> PyResult<String> {
        self.0.text(path).or_raise(py)
    }

    /// The outcome as dictionaries, lists, texts and numbers.
    fn as_dict<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyAny>> {
        py.import("json")?.call_method1("loads", (self.json(),))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// Reads a job from a text in the format "toml" or "json" and solves it.
#[pyfunction]
#[pyo3(name = "run", signature = (text, format="toml"))]
fn run_job(py: Python<'_>, text: &str, format: &str) -> PyResult<Outcome> {
    Job::solve(&Bound::new(py, Job::read(py, text, format)?)?)
}

/// The JSON schema of the job document.
#[pyfunction]
fn job_schema() -> String {
    job::schema()
}

/// The JSON schema of the outcome document.
#[pyfunction]
fn outcome_schema() -> String {
    outcome::schema()
}

/// Adds the classes and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Job>()?;
    module.add_class::<Outcome>()?;
    module.add_function(wrap_pyfunction!(run_job, module)?)?;
    module.add_function(wrap_pyfunction!(job_schema, module)?)?;
    module.add_function(wrap_pyfunction!(outcome_schema, module)?)
}
