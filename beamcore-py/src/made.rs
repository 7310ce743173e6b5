//! How an object was made, from which it is made again when it is unpickled.

use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};
use std::ops::Deref;

/// What `__reduce__` returns: a callable and its arguments.
pub(crate) type Reduced<'py> = (Bound<'py, PyAny>, Bound<'py, PyTuple>);

/// The call that made an object.
#[derive(Debug)]
pub(crate) struct Recipe {
    of: Source,
    name: &'static str,
    args: Py<PyTuple>,
    keywords: Option<Py<PyDict>>,
}

/// What bears the name of a recipe.
#[derive(Debug)]
enum Source {
    /// The module `beamcore`: a class, a function or, after a point, a static method.
    Module,
    /// A method of an object.
    Method(Py<PyAny>),
    /// A property of an object.
    Property(Py<PyAny>),
}

impl Recipe {
    fn new<'py, A>(py: Python<'py>, of: Source, name: &'static str, args: A) -> PyResult<Self>
    where
        A: IntoPyObject<'py, Target = PyTuple, Output = Bound<'py, PyTuple>>,
        PyErr: From<A::Error>,
    {
        Ok(Self {
            of,
            name,
            args: args.into_pyobject(py)?.unbind(),
            keywords: None,
        })
    }

    /// A call of what the module `beamcore` holds under this name, as "rectangle" or "Job.read".
    pub(crate) fn call<'py, A>(py: Python<'py>, name: &'static str, args: A) -> PyResult<Self>
    where
        A: IntoPyObject<'py, Target = PyTuple, Output = Bound<'py, PyTuple>>,
        PyErr: From<A::Error>,
    {
        Self::new(py, Source::Module, name, args)
    }

    /// A call of a method of an object.
    pub(crate) fn method<'py, T, A>(
        this: &Bound<'py, T>,
        name: &'static str,
        args: A,
    ) -> PyResult<Self>
    where
        A: IntoPyObject<'py, Target = PyTuple, Output = Bound<'py, PyTuple>>,
        PyErr: From<A::Error>,
    {
        let of = Source::Method(this.clone().into_any().unbind());
        Self::new(this.py(), of, name, args)
    }

    /// A property of an object.
    pub(crate) fn property<T>(this: &Bound<'_, T>, name: &'static str) -> PyResult<Self> {
        let of = Source::Property(this.clone().into_any().unbind());
        Self::new(this.py(), of, name, PyTuple::empty(this.py()))
    }

    /// The same call with keyword arguments.
    pub(crate) fn with(self, keywords: &Bound<'_, PyDict>) -> Self {
        Self {
            keywords: Some(keywords.clone().unbind()),
            ..self
        }
    }

    /// The answer of `__reduce__`.
    pub(crate) fn reduce<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let operator = py.import("operator")?;
        let keywords = self.keywords.as_ref().map(|keywords| keywords.bind(py));
        let args = self.args.bind(py);
        match &self.of {
            Source::Module => {
                let path = self.name.split('.');
                let module = py.import("beamcore")?.into_any();
                let callable = path
                    .into_iter()
                    .try_fold(module, |of, name| of.getattr(name))?;
                let callable = match keywords {
                    None => callable,
                    Some(_) => {
                        let partial = py.import("functools")?.getattr("partial")?;
                        partial.call((callable,), keywords)?
                    }
                };
                Ok((callable, args.clone()))
            }
            // methodcaller(name, *args)(this) is this.name(*args).
            Source::Method(this) => {
                let name = self.name.into_pyobject(py)?.into_any();
                let named = PyTuple::new(
                    py,
                    [name].into_iter().chain(args.iter()).collect::<Vec<_>>(),
                )?;
                let caller = operator.getattr("methodcaller")?.call(named, keywords)?;
                Ok((caller, (this,).into_pyobject(py)?))
            }
            Source::Property(this) => {
                let getter = operator.getattr("attrgetter")?.call1((self.name,))?;
                Ok((getter, (this,).into_pyobject(py)?))
            }
        }
    }
}

/// A value of the core with the call that made it; two are equal if their values are.
#[derive(Debug)]
pub(crate) struct Made<T> {
    pub(crate) inner: T,
    recipe: Recipe,
}

impl<T> Made<T> {
    pub(crate) const fn new(inner: T, recipe: Recipe) -> Self {
        Self { inner, recipe }
    }

    /// The answer of `__reduce__`.
    pub(crate) fn reduce<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.recipe.reduce(py)
    }
}

impl<T> Deref for Made<T> {
    type Target = T;

    fn deref(&self) -> &T {
        &self.inner
    }
}

impl<T: PartialEq> PartialEq for Made<T> {
    fn eq(&self, other: &Self) -> bool {
        self.inner == other.inner
    }
}
