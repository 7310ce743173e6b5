//! Choices that cross as `int32_t`: categories, durations, combinations, components, shapes.

use crate::choice::choice;
use crate::fault::Fault;
use beamcore::camber::Shape;
use beamcore::limits::Component;
use beamcore::member::{Category, CombinationKind, LoadDuration};

/// Category A: homes.
pub const BC_CATEGORY_DOMESTIC: i32 = 1;
/// Category B: offices.
pub const BC_CATEGORY_OFFICE: i32 = 2;
/// Category C: where people gather.
pub const BC_CATEGORY_CONGREGATION: i32 = 3;
/// Category D: shops.
pub const BC_CATEGORY_SHOPPING: i32 = 4;
/// Category E: storage.
pub const BC_CATEGORY_STORAGE: i32 = 5;
/// Category F: traffic of vehicles up to 30 kN.
pub const BC_CATEGORY_LIGHT_TRAFFIC: i32 = 6;
/// Category G: traffic of vehicles from 30 kN to 160 kN.
pub const BC_CATEGORY_HEAVY_TRAFFIC: i32 = 7;
/// Category H: roofs that are only walked on for upkeep.
pub const BC_CATEGORY_ROOF: i32 = 8;
/// Category: snow at 1000 m above the sea or lower.
pub const BC_CATEGORY_SNOW: i32 = 9;
/// Category: snow above 1000 m, and everywhere in Finland, Iceland, Norway, Sweden.
pub const BC_CATEGORY_SNOW_HIGH: i32 = 10;
/// Category: wind.
pub const BC_CATEGORY_WIND: i32 = 11;
/// Category: temperature, not fire.
pub const BC_CATEGORY_TEMPERATURE: i32 = 12;

/// Duration of an action: more than ten years.
pub const BC_DURATION_PERMANENT: i32 = 1;
/// Duration of an action: six months to ten years.
pub const BC_DURATION_LONG: i32 = 2;
/// Duration of an action: a week to six months.
pub const BC_DURATION_MEDIUM: i32 = 3;
/// Duration of an action: less than a week.
pub const BC_DURATION_SHORT: i32 = 4;
/// Duration of an action: moments.
pub const BC_DURATION_INSTANTANEOUS: i32 = 5;

/// Combination: permanent actions only.
pub const BC_COMBINATION_PERMANENT: i32 = 1;
/// Combination: quasi-permanent, EN 1990:2002 eq. 6.16b.
pub const BC_COMBINATION_QUASI_PERMANENT: i32 = 2;
/// Combination: characteristic, EN 1990:2002 eq. 6.14b.
pub const BC_COMBINATION_CHARACTERISTIC: i32 = 3;
/// Combination: frequent, EN 1990:2002 eq. 6.15b.
pub const BC_COMBINATION_FREQUENT: i32 = 4;
/// Combination: fundamental, EN 1990:2002 eq. 6.10; design strengths are compared under it.
pub const BC_COMBINATION_FUNDAMENTAL: i32 = 5;
/// Combination of one's own that looks at deflections.
pub const BC_COMBINATION_OWN: i32 = 6;
/// Combination of one's own under which design strengths are compared.
pub const BC_COMBINATION_OWN_ULTIMATE: i32 = 7;

/// Component of the deflection, w_inst: characteristic combination, initial.
pub const BC_COMPONENT_INSTANT: i32 = 1;
/// Component of the deflection, w_1: permanent actions, initial.
pub const BC_COMPONENT_PERMANENT: i32 = 2;
/// Component of the deflection, w_2: what creep adds under permanent actions only.
pub const BC_COMPONENT_CREEP: i32 = 3;
/// Component of the deflection, w_3: what variable actions add, with the creep under their
/// quasi-permanent part.
pub const BC_COMPONENT_VARIABLE: i32 = 4;
/// Component of the deflection, w_tot = w_1 + w_2 + w_3.
pub const BC_COMPONENT_TOTAL: i32 = 5;
/// Component of the deflection, w_max = w_tot - w_c: what is left after the camber w_c.
pub const BC_COMPONENT_REMAINING: i32 = 6;

/// Shape of a camber: a parabola with the rise of the deflection line at the middle of the chord.
pub const BC_SHAPE_PARABOLA: i32 = 1;
/// Shape of a camber: the mirror image of the deflection line, scaled to the rounded rise.
pub const BC_SHAPE_MIRROR: i32 = 2;
/// Shape of a camber: a circular arc with the rise of the deflection line at the middle.
pub const BC_SHAPE_ARC_THROUGH_MIDDLE: i32 = 3;
/// Shape of a camber: the circular arc whose greatest gap to the deflection line is least.
pub const BC_SHAPE_ARC_LEAST_GAP: i32 = 4;

choice!(
    category,
    category_number,
    Category,
    "category",
    "BC_CATEGORY_DOMESTIC, BC_CATEGORY_OFFICE, BC_CATEGORY_CONGREGATION, BC_CATEGORY_SHOPPING, \
     BC_CATEGORY_STORAGE, BC_CATEGORY_LIGHT_TRAFFIC, BC_CATEGORY_HEAVY_TRAFFIC, BC_CATEGORY_ROOF, \
     BC_CATEGORY_SNOW, BC_CATEGORY_SNOW_HIGH, BC_CATEGORY_WIND, BC_CATEGORY_TEMPERATURE",
    Domestic = BC_CATEGORY_DOMESTIC,
    Office = BC_CATEGORY_OFFICE,
    Congregation = BC_CATEGORY_CONGREGATION,
    Shopping = BC_CATEGORY_SHOPPING,
    Storage = BC_CATEGORY_STORAGE,
    LightTraffic = BC_CATEGORY_LIGHT_TRAFFIC,
    HeavyTraffic = BC_CATEGORY_HEAVY_TRAFFIC,
    Roof = BC_CATEGORY_ROOF,
    Snow = BC_CATEGORY_SNOW,
    SnowHigh = BC_CATEGORY_SNOW_HIGH,
    Wind = BC_CATEGORY_WIND,
    Temperature = BC_CATEGORY_TEMPERATURE
);
choice!(
    duration,
    duration_number,
    LoadDuration,
    "duration",
    "BC_DURATION_PERMANENT, BC_DURATION_LONG, BC_DURATION_MEDIUM, BC_DURATION_SHORT, \
     BC_DURATION_INSTANTANEOUS",
    Permanent = BC_DURATION_PERMANENT,
    Long = BC_DURATION_LONG,
    Medium = BC_DURATION_MEDIUM,
    Short = BC_DURATION_SHORT,
    Instantaneous = BC_DURATION_INSTANTANEOUS
);
choice!(
    component,
    component_number,
    Component,
    "component",
    "BC_COMPONENT_INSTANT, BC_COMPONENT_PERMANENT, BC_COMPONENT_CREEP, BC_COMPONENT_VARIABLE, \
     BC_COMPONENT_TOTAL, BC_COMPONENT_REMAINING",
    Instant = BC_COMPONENT_INSTANT,
    Permanent = BC_COMPONENT_PERMANENT,
    Creep = BC_COMPONENT_CREEP,
    Variable = BC_COMPONENT_VARIABLE,
    Total = BC_COMPONENT_TOTAL,
    Remaining = BC_COMPONENT_REMAINING
);
choice!(
    shape,
    shape_number,
    Shape,
    "shape",
    "BC_SHAPE_PARABOLA, BC_SHAPE_MIRROR, BC_SHAPE_ARC_THROUGH_MIDDLE, BC_SHAPE_ARC_LEAST_GAP",
    Parabola = BC_SHAPE_PARABOLA,
    Mirror = BC_SHAPE_MIRROR,
    ArcThroughMiddle = BC_SHAPE_ARC_THROUGH_MIDDLE,
    ArcLeastGap = BC_SHAPE_ARC_LEAST_GAP
);

/// The constant of a kind of combination; callers only read it.
pub(crate) const fn combination_number(kind: CombinationKind) -> i32 {
    match kind {
        CombinationKind::Permanent => BC_COMBINATION_PERMANENT,
        CombinationKind::QuasiPermanent => BC_COMBINATION_QUASI_PERMANENT,
        CombinationKind::Characteristic => BC_COMBINATION_CHARACTERISTIC,
        CombinationKind::Frequent => BC_COMBINATION_FREQUENT,
        CombinationKind::Fundamental => BC_COMBINATION_FUNDAMENTAL,
        CombinationKind::Own => BC_COMBINATION_OWN,
        CombinationKind::OwnUltimate => BC_COMBINATION_OWN_ULTIMATE,
    }
}
