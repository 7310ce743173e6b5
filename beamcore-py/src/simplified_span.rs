//! The classes `SimplifiedSpan`, `SimplifiedJoint` and `SimplifiedLayer`, and the words of methods.

use crate::error::OrRaise;
use crate::field::{Extreme, extreme};
use crate::quantity::Quantity;
use crate::response::Response;
use crate::run::run;
use crate::simplified_layer::LayerStress;
use crate::time::TimeText;
use beamcore::choice::chosen;
use beamcore::response::{self, SimplifiedMethod};
use pyo3::prelude::*;
use pyo3::types::PyTuple;

record! {
    /// The greatest flow of a joint over a span, with the sign of the slip.
    SimplifiedJoint {
        /// The name of the joint.
        joint: String,
        /// By the method.
        flow: Extreme,
        /// By the exact solution.
        exact_flow: Extreme,
    }
}

record! {
    /// The stresses of a layer by a simplified method.
    SimplifiedLayer {
        /// The name of the layer.
        layer: String,
        /// The place along the member.
        at: Quantity,
        /// Axial and bending stress by the method.
        stress: LayerStress,
        /// The axial force of the layer there by the exact solution.
        exact_axial: Quantity,
        /// The moment of the layer there by the exact solution.
        exact_moment: Quantity,
    }
}

record! {
    /// What a simplified method gives for one span, beside the exact solution.
    SimplifiedSpan {
        /// The name of the span.
        span: String,
        /// The length of the half sine wave.
        length: Quantity,
        /// gamma of each layer from the lowest upward; none for the sine-load method.
        factors: Vec<f64>,
        /// The effective bending stiffness with the moduli of the time.
        bending_stiffness: Quantity,
        /// The greatest deflection of the span by the method.
        deflection: Extreme,
        /// The greatest deflection of the span by the exact solution.
        exact_deflection: Extreme,
        /// Deflection by the method over the exact one, less one.
        difference: f64,
        /// The flow of each joint.
        joints: Vec<SimplifiedJoint>,
        /// The stresses of each layer from the lowest upward at the place of the span's greatest
        /// moment.
        layers: Vec<SimplifiedLayer>,
        /// The limits of the method.
        warnings: Vec<String>,
    }
}

impl SimplifiedSpan {
    fn of(found: &response::SimplifiedSpan) -> Self {
        let joint = |joint: &response::SimplifiedJoint| SimplifiedJoint {
            joint: joint.joint.clone(),
            flow: extreme(joint.flow),
            exact_flow: extreme(joint.exact_flow),
        };
        let layer = |layer: &response::SimplifiedLayer| SimplifiedLayer {
            layer: layer.layer.clone(),
            at: Quantity::of(layer.at),
            stress: LayerStress(layer.stress),
            exact_axial: Quantity::of(layer.exact_axial),
            exact_moment: Quantity::of(layer.exact_moment),
        };
        Self {
            span: found.span.clone(),
            length: Quantity::of(found.length),
            factors: found.factors.clone(),
            bending_stiffness: Quantity::of(found.bending_stiffness),
            deflection: extreme(found.deflection),
            exact_deflection: extreme(found.exact_deflection),
            difference: found.difference(),
            joints: found.joints.iter().map(joint).collect(),
            layers: found.layers.iter().map(layer).collect(),
            warnings: found.warnings.iter().map(ToString::to_string).collect(),
        }
    }
}

#[pymethods]
impl Response {
    /// Deflection, flow and stresses of each span by a simplified method, beside the exact ones: one
    /// SimplifiedSpan for each.
    ///
    /// method: "gamma" (EN 1995-1-1 Annex B, for two or three layers) or "sine_layers" (for any
    /// number of layers)
    ///
    /// The method's deflection is that of a member without slip whose spans have the effective
    /// bending stiffness of the method, each with its own reference length: the span where it is
    /// the only one, 0.8 of it in a continuous member, twice the length of a cantilever.
    fn simplified<'py>(
        &self,
        py: Python<'py>,
        combination: &str,
        time: TimeText,
        method: &str,
    ) -> PyResult<Bound<'py, PyTuple>> {
        let all = [SimplifiedMethod::Gamma, SimplifiedMethod::SineLayers];
        let method = chosen(method, "method", &all, SimplifiedMethod::name).or_raise(py)?;
        let (time, response) = (time.into(), &self.0.inner);
        let found = run(py, || response.simplified(combination, time, method))?;
        let spans: Vec<_> = found.iter().map(SimplifiedSpan::of).collect();
        PyTuple::new(py, spans)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<SimplifiedSpan>()?;
    module.add_class::<SimplifiedJoint>()?;
    module.add_class::<SimplifiedLayer>()
}
