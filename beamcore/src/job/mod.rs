//! The job: all inputs of one member as one document, TOML or JSON.
//!
//! ```
//! use beamcore::job::{Format, Job};
//! let text = r#"
//! version = 1
//! mark = "J1"
//! title = "Joist of a small platform"
//!
//! [materials.joist]
//! timber = "C24"
//! service_class = 1
//!
//! [[section.parts]]
//! name = "joist"
//! material = "joist"
//! outline = { rectangle = { width = "60 mm", height = "200 mm" } }
//!
//! [member]
//! length = "3.6 m"
//! supports = [
//!     { name = "left", kind = "pin", at = "0 m" },
//!     { name = "right", kind = "roller", at = "3.6 m" },
//! ]
//!
//! [[actions]]
//! name = "floor"
//! kind = "permanent"
//! loads = [{ uniform = { load = "0.5 kN/m" } }]
//! "#;
//! let outcome = Job::read(text, Format::Toml)?.solve()?;
//! let sag = outcome.number(r#"combinations["quasi-permanent"].final.deflection.greatest.value_m"#)?;
//! assert!((sag - 0.00398).abs() < 0.00001);
//! # Ok::<(), beamcore::Error>(())
//! ```

mod described;
mod described_load;
mod document;
mod document_action;
mod document_camber;
mod document_joint;
mod document_load;
mod document_material;
mod document_member;
mod document_section;
#[cfg(test)]
mod joint_tests;
mod lower;
mod lower_action;
mod lower_camber;
mod lower_joint;
mod lower_load;
mod lower_material;
mod lower_member;
mod lower_outline;
mod lower_section;
mod lower_strength;
mod reader;
mod written;

pub use reader::Format;

pub(crate) use document::JobDocument;
pub(crate) use reader::{Step, steps};

use crate::camber::{CamberPlan, Trestles};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::limits::Limit;
use crate::member::Member;
use crate::response::SimplifiedMethod;
use crate::section::SectionForces;
use document::SimplifiedDocument;
use lower::Lowered;
use reader::{Node, NodeValue};
use std::path::Path;
use std::sync::LazyLock;

/// The version of the job document that this library reads and writes.
pub const VERSION: i64 = 1;

/// The schema against which every job is checked.
static SCHEMA: LazyLock<serde_json::Value> =
    LazyLock::new(|| schemars::schema_for!(JobDocument).to_value());

/// A job that was read and found without fault.
#[derive(Clone, Debug)]
pub struct Job {
    document: JobDocument,
    lowered: Lowered,
}

impl Job {
    /// Reads a job from a text.
    ///
    /// # Errors
    /// Everything that is wrong with it: a text that is not a document ([`ErrorKind::Syntax`]),
    /// another version, unknown or missing keys, missing or wrong units, and all mistakes of
    /// meaning; each with its path and line.
    pub fn read(text: &str, format: Format) -> Result<Self> {
        let node = reader::read(text, format)?;
        let found = version(&node)?;
        debug_assert_eq!(found, VERSION);
        let checked = reader::check(&node, &SCHEMA, &written::problem);
        let mut problems = checked.problems;
        if !checked.complete {
            return Err(sorted(problems));
        }
        let document: JobDocument = serde_json::from_value(checked.value).map_err(|error| {
            Problem::new(
                ErrorKind::Syntax,
                "document",
                error.to_string(),
                "a job document",
            )
        })?;
        match lower::lower(&document) {
            Ok(lowered) if problems.is_empty() => Ok(Self { document, lowered }),
            Ok(_) => Err(sorted(problems)),
            Err(more) => {
                problems.extend(more.into_iter().map(|problem| with_line(problem, &node)));
                Err(sorted(problems))
            }
        }
    }

    /// Reads a job from a file whose name ends in `.toml` or `.json`.
    ///
    /// # Errors
    /// [`ErrorKind::File`] if the file cannot be read or has another ending; else as
    /// [`Job::read`].
    pub fn open(path: &Path) -> Result<Self> {
        let format = match path.extension().and_then(|extension| extension.to_str()) {
            Some("toml") => Format::Toml,
            Some("json") => Format::Json,
            _ => {
                return Err(file(
                    path,
                    "a name without a known ending",
                    "a name in .toml or .json",
                ));
            }
        };
        let text = std::fs::read_to_string(path)
            .map_err(|error| file(path, &error.to_string(), "a file that can be read"))?;
        Self::read(&text, format)
    }

    /// The job written back as a text.
    #[must_use]
    pub fn to_text(&self, format: Format) -> String {
        match format {
            Format::Toml => toml::to_string_pretty(&self.document)
                .expect("a job holds texts and finite numbers only"),
            Format::Json => serde_json::to_string_pretty(&self.document)
                .expect("a job holds texts and finite numbers only"),
        }
    }

    /// The member that the job describes.
    #[must_use]
    pub const fn member(&self) -> &Member {
        &self.lowered.member
    }

    /// The camber that the job asks for.
    #[must_use]
    pub const fn camber(&self) -> Option<&CamberPlan> {
        self.lowered.camber.as_ref()
    }

    /// The simplified methods whose results are wanted beside the exact ones.
    #[must_use]
    pub fn simplified(&self) -> Vec<SimplifiedMethod> {
        let method = |written: &SimplifiedDocument| match written {
            SimplifiedDocument::Gamma => SimplifiedMethod::Gamma,
            SimplifiedDocument::SineLayers => SimplifiedMethod::SineLayers,
        };
        self.document.simplified.iter().map(method).collect()
    }

    /// How the member stands when its camber is measured, if the job says so.
    #[must_use]
    pub const fn trestles(&self) -> Option<&Trestles> {
        self.lowered.trestles.as_ref()
    }

    /// The limits of the deflection.
    #[must_use]
    pub fn limits(&self) -> &[Limit] {
        &self.lowered.limits
    }

    /// The named forces on the section whose stresses are asked for.
    #[must_use]
    pub fn section_forces(&self) -> &[(String, SectionForces)] {
        &self.lowered.forces
    }

    pub(crate) const fn document(&self) -> &JobDocument {
        &self.document
    }
}

/// The JSON schema of the job document.
#[must_use]
pub fn schema() -> String {
    serde_json::to_string_pretty(&*SCHEMA).expect("a schema is plain data")
}

/// The version that the document states; any other than ours is an error of its own, because
/// nothing else in the document can be judged then.
fn version(node: &Node) -> Result<i64> {
    match node.get("version").map(|value| (integer(value), value)) {
        Some((Some(VERSION), _)) => Ok(VERSION),
        Some((_, value)) => Err(Problem::new(
            ErrorKind::Version,
            "version",
            reader::describe(&value.value),
            format!("{VERSION}, the version of the job document that this library reads"),
        )
        .on_line(value.line)
        .into()),
        None => Err(Problem::new(
            ErrorKind::Version,
            "version",
            "no version",
            format!("version = {VERSION} at the head of the document"),
        )
        .into()),
    }
}

fn integer(node: &Node) -> Option<i64> {
    if let NodeValue::Integer(number) = node.value {
        Some(number)
    } else {
        None
    }
}

fn with_line(problem: Problem, node: &Node) -> Problem {
    match reader::line_of(node, problem.path()) {
        Some(line) => problem.on_line(line),
        None => problem,
    }
}

/// The problems in the order of the lines.
fn sorted(mut problems: Vec<Problem>) -> Error {
    problems.sort_by_key(Problem::line);
    Error::from_problems(problems).expect("called with at least one problem")
}

fn file(path: &Path, found: &str, expected: &str) -> Error {
    Problem::new(ErrorKind::File, path.display().to_string(), found, expected).into()
}
