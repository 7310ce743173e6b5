//! Numbers as an engineer writes them: digits by quantity, and no small number shown as zero.

/// The number with the given decimals; one that would be shown as zero but is not gets two
/// significant digits instead, and one that rounds to zero from below loses its sign only if it is
/// zero.
pub(super) fn figure(value: f64, decimals: usize) -> String {
    if value == 0.0 {
        return format!("{:.decimals$}", 0.0);
    }
    // Two results that differ by rounding only must be written alike: 18.75 and 18.749999999999.
    let value: f64 = format!("{value:.11e}").parse().unwrap_or(value);
    let plain = format!("{value:.decimals$}");
    if plain.bytes().any(|b| (b'1'..=b'9').contains(&b)) {
        plain
    } else {
        format!("{value:.1e}")
    }
}

#[cfg(test)]
mod tests {
    use super::figure;

    #[test]
    fn small_numbers_are_not_shown_as_zero() {
        assert_eq!(figure(12.345, 1), "12.3");
        assert_eq!(figure(-0.04, 1), "-4.0e-2");
        assert_eq!(figure(0.0, 2), "0.00");
        assert_eq!(figure(18.75, 1), figure(18.749_999_999_999_9, 1));
        assert_eq!(figure(-0.0, 2), "0.00");
        assert_eq!(figure(0.000_012, 3), "1.2e-5");
    }
}
