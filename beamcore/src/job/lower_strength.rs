//! Strengths of the document and the factors that go with them.

use super::document_material::{CharacteristicDocument, FactorsDocument, StrengthDocument};
use crate::material::{
    CharacteristicStrength, DesignFactors, DesignStrength, MetalStrength, TimberFactors,
    TimberStrength,
};

pub(super) fn characteristic(strength: &CharacteristicDocument) -> Option<CharacteristicStrength> {
    Some(match strength {
        CharacteristicDocument::Timber {
            bending,
            tension,
            compression,
            shear,
        } => CharacteristicStrength::Timber(TimberStrength::new(
            bending.value()?,
            tension.value()?,
            compression.value()?,
            shear.value()?,
        )),
        CharacteristicDocument::Metal { yield_stress } => {
            CharacteristicStrength::Metal(MetalStrength::new(yield_stress.value()?))
        }
    })
}

pub(super) fn factors(factors: &FactorsDocument) -> DesignFactors {
    match *factors {
        FactorsDocument::Timber {
            k_mod,
            gamma_m,
            k_h,
            k_sys,
        } => {
            let factors = TimberFactors::new(k_mod, gamma_m);
            let factors = k_h.map_or(factors, |k_h| factors.size(k_h));
            DesignFactors::Timber(k_sys.map_or(factors, |k_sys| factors.sharing(k_sys)))
        }
        FactorsDocument::Metal { gamma_m } => DesignFactors::metal(gamma_m),
    }
}

pub(super) fn design(strength: &StrengthDocument) -> Option<DesignStrength> {
    Some(match strength {
        StrengthDocument::Timber {
            bending,
            tension,
            compression,
        } => DesignStrength::Timber {
            bending: bending.value()?,
            tension: tension.value()?,
            compression: compression.value()?,
        },
        StrengthDocument::Metal { yield_stress } => DesignStrength::Metal {
            yield_stress: yield_stress.value()?,
        },
    })
}
