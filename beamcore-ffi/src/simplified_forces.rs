//! What the simplified methods give: stiffness, forces and stresses of layers and joints.

use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::simplified::{BcSimplified, Method};
use beamcore::simplified::{LayerInput, LayerStress, ShearStress, Warning};
use beamcore::units::{BendingStiffness, Force, Length, Moment, ShearFlow};

/// Forwards a question to whichever method it is.
macro_rules! either {
    ($method:expr, $found:ident => $answer:expr) => {
        match $method {
            Method::Gamma($found) => $answer,
            Method::Sine($found) => $answer,
        }
    };
}

impl Method {
    fn layers(&self) -> &[LayerInput] {
        either!(self, found => found.layers())
    }

    fn arms(&self) -> &[Length] {
        either!(self, found => found.arms())
    }

    const fn bending_stiffness(&self) -> BendingStiffness {
        either!(self, found => found.bending_stiffness())
    }

    fn axial_forces(&self, moment: Moment) -> beamcore::Result<Vec<Force>> {
        either!(self, found => found.axial_forces(moment))
    }

    fn stresses(&self, moment: Moment) -> beamcore::Result<Vec<LayerStress>> {
        either!(self, found => found.stresses(moment))
    }

    fn flows(&self, shear: Force) -> beamcore::Result<Vec<ShearFlow>> {
        either!(self, found => found.flows(shear))
    }

    fn fastener_forces(&self, shear: Force, spacings: &[Length]) -> beamcore::Result<Vec<Force>> {
        either!(self, found => found.fastener_forces(shear, spacings))
    }

    fn shear_stresses(&self, shear: Force) -> beamcore::Result<Vec<ShearStress>> {
        either!(self, found => found.shear_stresses(shear))
    }

    pub(crate) fn warnings(&self) -> &[Warning] {
        either!(self, found => found.warnings())
    }
}

/// Writes one number of a method.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn number(
    simplified: *const BcSimplified,
    out: (*mut f64, &str),
    of: impl FnOnce(&Method) -> Result<f64, Fault>,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        get::value((simplified, "simplified"), out, |simplified| {
            of(&simplified.0)
        })
    }
}

/// The number of layers.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_layer_count(
    simplified: *const BcSimplified,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((simplified, "simplified"), count_out, |simplified| {
            Ok(simplified.0.layers().len())
        })
    }
}

/// The effective bending stiffness EI_ef.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_bending_stiffness(
    simplified: *const BcSimplified,
    bending_stiffness_Nm2_out: *mut f64,
) -> i32 {
    let out = (bending_stiffness_Nm2_out, "bending_stiffness_Nm2_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        number(simplified, out, |method| {
            Ok(method.bending_stiffness().si())
        })
    }
}

/// The arm of a layer, positive upward: a_i of the gamma method, the effective arm e_i of sine
/// layers (which is gamma_i a_i). Layers are counted from 0, from the lowest upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_arm(
    simplified: *const BcSimplified,
    layer_index: i32,
    arm_m_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        number(simplified, (arm_m_out, "arm_m_out"), |method| {
            Ok(handle::element(method.arms(), layer_index)?.si())
        })
    }
}

/// The factor gamma_i of a layer: 1 for a rigid joint, 0 for a loose one. Of sine layers, which
/// have none, has_value_out is 0 and the factor is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_gamma_factor(
    simplified: *const BcSimplified,
    layer_index: i32,
    has_value_out: *mut i32,
    factor_out: *mut f64,
) -> i32 {
    let out = (factor_out, "factor_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional(
            (simplified, "simplified"),
            has_value_out,
            out,
            |simplified| {
                Ok(match &simplified.0 {
                    Method::Gamma(gamma) => Some(*handle::element(gamma.factors(), layer_index)?),
                    Method::Sine(_) => None,
                })
            },
        )
    }
}

/// The layer with gamma = 1 of the gamma method, counted from 0. Of sine layers, which have none,
/// has_value_out is 0 and the layer is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_base_layer(
    simplified: *const BcSimplified,
    has_value_out: *mut i32,
    layer_index_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (simplified, has_out, out) = unsafe {
            (
                handle::shared(simplified, "simplified")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(layer_index_out, "layer_index_out")?,
            )
        };
        let base = match &simplified.0 {
            Method::Gamma(gamma) => Some(handle::count(gamma.base_layer())?),
            Method::Sine(_) => None,
        };
        has_out.put(i32::from(base.is_some()));
        if let Some(base) = base {
            out.put(base);
        }
        Ok(())
    })
}

/// The axial force of a layer under a moment, tension positive.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_axial_force(
    simplified: *const BcSimplified,
    moment_Nm: f64,
    layer_index: i32,
    force_N_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        number(simplified, (force_N_out, "force_N_out"), |method| {
            let forces = method.axial_forces(Moment::from_N_m(moment_Nm))?;
            Ok(handle::element(&forces, layer_index)?.si())
        })
    }
}

/// The normal stresses of a layer under a moment, tension positive: at the middle of its height,
/// what bending of the layer adds at its lower edge, and their sums at its lower and its upper edge.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_stress(
    simplified: *const BcSimplified,
    moment_Nm: f64,
    layer_index: i32,
    axial_Pa_out: *mut f64,
    bending_Pa_out: *mut f64,
    bottom_Pa_out: *mut f64,
    top_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (simplified, axial_out, bending_out, bottom_out, top_out) = unsafe {
            (
                handle::shared(simplified, "simplified")?,
                Slot::new(axial_Pa_out, "axial_Pa_out")?,
                Slot::new(bending_Pa_out, "bending_Pa_out")?,
                Slot::new(bottom_Pa_out, "bottom_Pa_out")?,
                Slot::new(top_Pa_out, "top_Pa_out")?,
            )
        };
        let stresses = simplified.0.stresses(Moment::from_N_m(moment_Nm))?;
        let stress = handle::element(&stresses, layer_index)?;
        axial_out.put(stress.axial.si());
        bending_out.put(stress.bending.si());
        bottom_out.put(stress.bottom().si());
        top_out.put(stress.top().si());
        Ok(())
    })
}

/// The flow of a joint under a shear force. Joints are counted from 0, from the lowest upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_flow(
    simplified: *const BcSimplified,
    shear_N: f64,
    joint_index: i32,
    flow_N_per_m_out: *mut f64,
) -> i32 {
    let out = (flow_N_per_m_out, "flow_N_per_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        number(simplified, out, |method| {
            let flows = method.flows(Force::from_N(shear_N))?;
            Ok(handle::element(&flows, joint_index)?.si())
        })
    }
}

/// The force of a fastener of a joint under a shear force: flow x spacing. Spacings are those of
/// all joints, as of one row: with n rows, the spacing along the member over n.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_fastener_force(
    simplified: *const BcSimplified,
    shear_N: f64,
    spacings_m: *const f64,
    spacing_count: i32,
    joint_index: i32,
    force_N_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        number(simplified, (force_N_out, "force_N_out"), |method| {
            let spacings = handle::list(spacings_m, spacing_count, "spacings_m")?;
            let spacings: Vec<_> = spacings.iter().map(|s| Length::from_m(*s)).collect();
            let forces = method.fastener_forces(Force::from_N(shear_N), &spacings)?;
            Ok(handle::element(&forces, joint_index)?.si())
        })
    }
}

/// The greatest shear stress of a layer under a shear force, with its sign, and its place in the z
/// of the layers.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_shear_stress(
    simplified: *const BcSimplified,
    shear_N: f64,
    layer_index: i32,
    value_Pa_out: *mut f64,
    z_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (simplified, value_out, z_out) = unsafe {
            (
                handle::shared(simplified, "simplified")?,
                Slot::new(value_Pa_out, "value_Pa_out")?,
                Slot::new(z_m_out, "z_m_out")?,
            )
        };
        let stresses = simplified.0.shear_stresses(Force::from_N(shear_N))?;
        let stress = handle::element(&stresses, layer_index)?;
        value_out.put(stress.value.si());
        z_out.put(stress.z.si());
        Ok(())
    })
}
