//! Categories of variable actions and the factors by which they are combined.

use crate::error::{ErrorKind, Problem, Result};
use crate::lookup;

/// The factors by which a variable action enters combinations (EN 1990:2002 Table A1.1).
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct CombinationFactors {
    /// psi_0: beside another, leading variable action.
    pub psi_0: f64,
    /// psi_1: the frequent value, as leading action.
    pub psi_1: f64,
    /// psi_2: the quasi-permanent value, which makes creep.
    pub psi_2: f64,
}

/// A category of EN 1990:2002 Table A1.1 with its recommended factors, from memory.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Category {
    /// A: homes.
    Domestic,
    /// B: offices.
    Office,
    /// C: where people gather.
    Congregation,
    /// D: shops.
    Shopping,
    /// E: storage.
    Storage,
    /// F: traffic of vehicles up to 30 kN.
    LightTraffic,
    /// G: traffic of vehicles from 30 kN to 160 kN.
    HeavyTraffic,
    /// H: roofs that are only walked on for upkeep.
    Roof,
    /// Snow at 1000 m above the sea or lower.
    Snow,
    /// Snow above 1000 m, and everywhere in Finland, Iceland, Norway, Sweden.
    SnowHigh,
    /// Wind.
    Wind,
    /// Temperature, not fire.
    Temperature,
}

impl Category {
    /// All categories.
    pub const ALL: [Self; 12] = [
        Self::Domestic,
        Self::Office,
        Self::Congregation,
        Self::Shopping,
        Self::Storage,
        Self::LightTraffic,
        Self::HeavyTraffic,
        Self::Roof,
        Self::Snow,
        Self::SnowHigh,
        Self::Wind,
        Self::Temperature,
    ];

    /// The word used in documents: the letter of the table, or the cause.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Domestic => "A",
            Self::Office => "B",
            Self::Congregation => "C",
            Self::Shopping => "D",
            Self::Storage => "E",
            Self::LightTraffic => "F",
            Self::HeavyTraffic => "G",
            Self::Roof => "H",
            Self::Snow => "snow",
            Self::SnowHigh => "snow_high",
            Self::Wind => "wind",
            Self::Temperature => "temperature",
        }
    }

    /// The category of a word.
    ///
    /// # Errors
    /// [`ErrorKind::Name`] for any other text.
    pub fn from_name(name: &str) -> Result<Self> {
        Self::ALL
            .into_iter()
            .find(|category| category.name() == name)
            .ok_or_else(|| {
                let names = Self::ALL.map(Self::name);
                Problem::new(
                    ErrorKind::Name,
                    "category",
                    format!("the unknown category \"{name}\""),
                    format!("one of {}", lookup::listed(&names)),
                )
                .into()
            })
    }

    /// The recommended factors, EN 1990:2002 Table A1.1, from memory.
    #[must_use]
    pub const fn factors(self) -> CombinationFactors {
        let (psi_0, psi_1, psi_2) = match self {
            Self::Domestic | Self::Office => (0.7, 0.5, 0.3),
            Self::Congregation | Self::Shopping | Self::LightTraffic => (0.7, 0.7, 0.6),
            Self::Storage => (1.0, 0.9, 0.8),
            Self::HeavyTraffic => (0.7, 0.5, 0.3),
            Self::Roof => (0.0, 0.0, 0.0),
            Self::Snow => (0.5, 0.2, 0.0),
            Self::SnowHigh => (0.7, 0.5, 0.2),
            Self::Wind => (0.6, 0.2, 0.0),
            Self::Temperature => (0.6, 0.5, 0.0),
        };
        CombinationFactors {
            psi_0,
            psi_1,
            psi_2,
        }
    }
}
