//! Level slabs of outlines with level and upright edges: within a slab, all widths are constant.

use crate::outline::{CONTACT, Region};

/// An upright edge of an outline, with what the width that it bounds counts for.
#[derive(Clone, Copy, Debug)]
pub(super) struct Flank {
    bottom: f64,
    top: f64,
    /// What it adds to the width at its heights: its y with the sign of the side on which it
    /// bounds the material, from the middle of the outline.
    width: f64,
    /// E, in Pa.
    modulus: f64,
    /// G, in Pa.
    shear: f64,
}

/// A stretch of height of constant widths.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(super) struct Slab {
    /// The least z in m.
    pub bottom: f64,
    /// The greatest z in m.
    pub top: f64,
    /// Sum of b E, in N/m.
    pub axial: f64,
    /// Sum of b G, in N/m.
    pub shear: f64,
}

/// The upright edges of a region of moduli E and G; `None` if an edge slopes or is curved.
pub(super) fn flanks(region: &Region, modulus: f64, shear: f64) -> Option<Vec<Flank>> {
    let bounds = region.bounds();
    let slack = bounds.width().max(bounds.height()) * CONTACT;
    let middle = bounds.middle().y;
    let mut flanks = Vec::new();
    for edge in region.edges() {
        let (from, to) = (edge.from(), edge.to());
        if edge.radius().is_some() {
            return None;
        }
        if (to.z - from.z).abs() <= slack {
            continue;
        }
        if (to.y - from.y).abs() > slack {
            return None;
        }
        // The material lies to the left of an edge, so below the greater y where the edge rises.
        let side = if to.z > from.z { 1.0 } else { -1.0 };
        flanks.push(Flank {
            bottom: from.z.min(to.z),
            top: from.z.max(to.z),
            width: side * (from.y.midpoint(to.y) - middle),
            modulus,
            shear,
        });
    }
    Some(flanks)
}

/// The slabs between the ends of the edges, from the lowest upward, or the heights between which
/// there is no edge and so no material.
pub(super) fn slabs(flanks: &[Flank]) -> Result<Vec<Slab>, (f64, f64)> {
    let mut slabs = Vec::new();
    for pair in heights(flanks).windows(2) {
        let (bottom, top) = (pair[0], pair[1]);
        let middle = bottom.midpoint(top);
        let here = || {
            flanks
                .iter()
                .filter(|flank| flank.bottom < middle && middle < flank.top)
        };
        if here().next().is_none() {
            return Err((bottom, top));
        }
        slabs.push(Slab {
            bottom,
            top,
            axial: here().map(|flank| flank.width * flank.modulus).sum(),
            shear: here().map(|flank| flank.width * flank.shear).sum(),
        });
    }
    Ok(slabs)
}

/// The heights at which edges end, from the lowest upward; heights that differ by less than
/// [`CONTACT`] of the whole are one, for parts that touch may miss each other by a rounding.
fn heights(flanks: &[Flank]) -> Vec<f64> {
    let mut heights: Vec<f64> = flanks
        .iter()
        .flat_map(|flank| [flank.bottom, flank.top])
        .collect();
    heights.sort_by(f64::total_cmp);
    if let (Some(first), Some(last)) = (heights.first(), heights.last()) {
        let slack = (last - first) * CONTACT;
        heights.dedup_by(|next, kept| *next - *kept <= slack);
    }
    heights
}
