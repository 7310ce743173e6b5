//! Small classes that only hold values.

/// A frozen class with the given fields, which compares, prints and pickles by them.
macro_rules! record {
    (
        $(#[$doc:meta])*
        $Name:ident { $($(#[$field_doc:meta])* $field:ident: $Type:ty,)+ }
    ) => {
        $(#[$doc])*
        #[pyo3::pyclass(frozen, eq, get_all, from_py_object, module = "beamcore")]
        #[derive(Clone, Debug, PartialEq)]
        pub(crate) struct $Name {
            $($(#[$field_doc])* pub(crate) $field: $Type,)+
        }

        #[pyo3::pymethods]
        impl $Name {
            #[new]
            #[allow(
                clippy::too_many_arguments,
                reason = "a record is made of all of its fields"
            )]
            const fn new($($field: $Type),+) -> Self {
                Self { $($field),+ }
            }

            fn __reduce__<'py>(
                &self,
                py: pyo3::Python<'py>,
            ) -> pyo3::PyResult<$crate::made::Reduced<'py>> {
                let fields = ($(self.$field.clone(),)+);
                $crate::made::Recipe::call(py, stringify!($Name), fields)?.reduce(py)
            }

            fn __repr__(&self, py: pyo3::Python<'_>) -> pyo3::PyResult<String> {
                use pyo3::{IntoPyObjectExt, types::PyAnyMethods};
                let fields = [$(format!(
                    "{}={}",
                    stringify!($field),
                    self.$field.clone().into_bound_py_any(py)?.repr()?
                )),+];
                Ok(format!("{}({})", stringify!($Name), fields.join(", ")))
            }
        }
    };
}
