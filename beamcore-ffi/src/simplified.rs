//! Simplified methods for layers that slip on each other: the gamma method and sine layers.

use crate::choice_layers::{self, LengthName};
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use beamcore::simplified::{Gamma, LayerInput, ReferenceLength, SineLayers};
use beamcore::units::{AxialStiffness, BendingStiffness, Length, Modulus, SlipModulus};
use std::ffi::c_char;

/// What the simplified methods know of a layer.
pub struct BcLayerInput(LayerInput);

/// Layers by a simplified method: the gamma method, or sine layers.
pub struct BcSimplified(pub(crate) Method);

pub(crate) enum Method {
    Gamma(Gamma),
    Sine(SineLayers),
}

/// A layer for the simplified methods: EA, EI about its own elastic centroid, height with the
/// centroid at its middle, z of the centroid upward from any level that is the same for all layers,
/// modulus of the material whose stresses are asked for, and width.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_input_new(
    axial_stiffness_N: f64,
    bending_stiffness_Nm2: f64,
    height_m: f64,
    centroid_z_m: f64,
    modulus_Pa: f64,
    width_m: f64,
    layer_input_out: *mut *mut BcLayerInput,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(layer_input_out, "layer_input_out")? };
        out.give(BcLayerInput(LayerInput {
            axial: AxialStiffness::from_N(axial_stiffness_N),
            bending: BendingStiffness::from_N_m2(bending_stiffness_Nm2),
            height: Length::from_m(height_m),
            centroid_z: Length::from_m(centroid_z_m),
            modulus: Modulus::from_Pa(modulus_Pa),
            width: Length::from_m(width_m),
        }));
        Ok(())
    })
}

/// A rectangular layer of one material for the simplified methods: EA = E b h, EI = E b h^3/12.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_input_rectangle(
    modulus_Pa: f64,
    width_m: f64,
    height_m: f64,
    centroid_z_m: f64,
    layer_input_out: *mut *mut BcLayerInput,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(layer_input_out, "layer_input_out")? };
        out.give(BcLayerInput(LayerInput::rectangle(
            Modulus::from_Pa(modulus_Pa),
            Length::from_m(width_m),
            Length::from_m(height_m),
            Length::from_m(centroid_z_m),
        )));
        Ok(())
    })
}

/// EA and EI of a layer for the simplified methods.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_input_stiffness(
    layer_input: *const BcLayerInput,
    axial_stiffness_N_out: *mut f64,
    bending_stiffness_Nm2_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (layer, axial_out, bending_out) = unsafe {
            (
                handle::shared(layer_input, "layer_input")?,
                Slot::new(axial_stiffness_N_out, "axial_stiffness_N_out")?,
                Slot::new(bending_stiffness_Nm2_out, "bending_stiffness_Nm2_out")?,
            )
        };
        axial_out.put(layer.0.axial.si());
        bending_out.put(layer.0.bending.si());
        Ok(())
    })
}

/// Frees a layer for the simplified methods; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_input_free(layer_input: *mut BcLayerInput) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(layer_input) });
}

/// A length as the parameters of the ABI name it.
fn reference(length_kind: i32, length_m: f64) -> Result<ReferenceLength, Fault> {
    let length = Length::from_m(length_m);
    Ok(match choice_layers::length(length_kind)? {
        LengthName::Span => ReferenceLength::Span(length),
        LengthName::Continuous => ReferenceLength::Continuous(length),
        LengthName::Cantilever => ReferenceLength::Cantilever(length),
    })
}

/// The length l of the half sine wave that the simplified methods take for a span or cantilever
/// (BC_LENGTH_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_reference_length(
    length_kind: i32,
    length_m: f64,
    reference_length_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(reference_length_m_out, "reference_length_m_out")? };
        out.put(reference(length_kind, length_m)?.length().si());
        Ok(())
    })
}

/// Layers as the parameters of the ABI name them, by a method that `make` applies.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn simplified(
    (layers, layer_count): (*const *const BcLayerInput, i32),
    (slip_moduli_N_per_m2, joint_count): (*const f64, i32),
    (length_kind, length_m): (i32, f64),
    simplified_out: *mut *mut BcSimplified,
    make: fn(&[LayerInput], &[SlipModulus], ReferenceLength) -> beamcore::Result<Method>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (layers, moduli, out) = unsafe {
            (
                handle::handles(layers, layer_count, "layers")?,
                handle::list(slip_moduli_N_per_m2, joint_count, "slip_moduli_N_per_m2")?,
                Slot::new(simplified_out, "simplified_out")?,
            )
        };
        let layers: Vec<_> = layers.into_iter().map(|layer| layer.0).collect();
        let joints: Vec<_> = moduli
            .iter()
            .map(|modulus| SlipModulus::from_N_per_m2(*modulus))
            .collect();
        let length = reference(length_kind, length_m)?;
        out.give(BcSimplified(make(&layers, &joints, length)?));
        Ok(())
    })
}

/// Two or three layers that slip on each other by the gamma method (EN 1995-1-1:2004 Annex B, from
/// memory): layers from the lowest upward, the slip modulus per length of each joint between two of
/// them, and a span or cantilever (BC_LENGTH_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_gamma(
    layers: *const *const BcLayerInput,
    layer_count: i32,
    slip_moduli_N_per_m2: *const f64,
    joint_count: i32,
    length_kind: i32,
    length_m: f64,
    simplified_out: *mut *mut BcSimplified,
) -> i32 {
    let layers = (layers, layer_count);
    let (joints, length) = ((slip_moduli_N_per_m2, joint_count), (length_kind, length_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        simplified(
            layers,
            joints,
            length,
            simplified_out,
            |layers, joints, length| Gamma::of(layers, joints, length).map(Method::Gamma),
        )
    }
}

/// Any number of layers that slip on each other under a load in the form of half a sine wave, for
/// which this is exact; parameters as for bc_simplified_gamma.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_sine_layers(
    layers: *const *const BcLayerInput,
    layer_count: i32,
    slip_moduli_N_per_m2: *const f64,
    joint_count: i32,
    length_kind: i32,
    length_m: f64,
    simplified_out: *mut *mut BcSimplified,
) -> i32 {
    let layers = (layers, layer_count);
    let (joints, length) = ((slip_moduli_N_per_m2, joint_count), (length_kind, length_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        simplified(
            layers,
            joints,
            length,
            simplified_out,
            |layers, joints, length| SineLayers::of(layers, joints, length).map(Method::Sine),
        )
    }
}

/// The number of warnings: where the method does not hold, or only nearly.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_warning_count(
    simplified: *const BcSimplified,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((simplified, "simplified"), count_out, |simplified| {
            Ok(simplified.0.warnings().len())
        })
    }
}

/// A warning in words. Warnings are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_warning(
    simplified: *const BcSimplified,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    let handle = (simplified, "simplified");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(handle, buffer, capacity, length_out, |simplified| {
            Ok(handle::element(simplified.0.warnings(), index)?.text())
        })
    }
}

/// Frees layers by a simplified method; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_simplified_free(simplified: *mut BcSimplified) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(simplified) });
}
