//! The known name that is nearest to a mistyped one.

/// The candidate nearest to `name`, or `None` where none is near.
///
/// Near means: at most two slips, or one for every three letters of a long name, and never more
/// than half of the longer name, for otherwise any two short names would be near. A slip is a
/// letter too many, missing, wrong, or swapped with its neighbour (the restricted
/// Damerau-Levenshtein distance). Capital and small letters are the same here. The first of
/// equally near candidates wins.
pub(crate) fn nearest<'a>(
    name: &str,
    candidates: impl IntoIterator<Item = &'a str>,
) -> Option<&'a str> {
    let name = letters(name);
    let limit = (name.len() / 3).max(2);
    let mut best: Option<(usize, &str)> = None;
    for candidate in candidates {
        let known = letters(candidate);
        // The distance is at least the difference in length: spare the work for a long text.
        if known.len().abs_diff(name.len()) > limit {
            continue;
        }
        let slips = distance(&name, &known);
        let near = slips <= limit && 2 * slips <= name.len().max(known.len());
        if near && best.is_none_or(|(least, _)| slips < least) {
            best = Some((slips, candidate));
        }
    }
    best.map(|(_, candidate)| candidate)
}

/// The letters of a name, small.
fn letters(name: &str) -> Vec<char> {
    name.to_lowercase().chars().collect()
}

/// The number of slips between two names, row by row over the table of their beginnings.
fn distance(a: &[char], b: &[char]) -> usize {
    let mut before = vec![0; b.len() + 1];
    let mut above: Vec<usize> = (0..=b.len()).collect();
    for i in 1..=a.len() {
        let mut row = vec![i; b.len() + 1];
        for j in 1..=b.len() {
            let wrong = usize::from(a[i - 1] != b[j - 1]);
            let mut least = (above[j] + 1).min(row[j - 1] + 1).min(above[j - 1] + wrong);
            if i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1] {
                least = least.min(before[j - 2] + 1);
            }
            row[j] = least;
        }
        before = std::mem::replace(&mut above, row);
    }
    above[b.len()]
}

#[cfg(test)]
mod tests {
    use super::*;

    fn slips(a: &str, b: &str) -> usize {
        distance(&letters(a), &letters(b))
    }

    // Counted by hand from the definition of the distance.
    #[test]
    fn slips_are_counted() {
        assert_eq!(slips("", ""), 0);
        assert_eq!(slips("", "abc"), 3);
        assert_eq!(slips("lenght", "length"), 1);
        assert_eq!(slips("wdth", "width"), 1);
        assert_eq!(slips("heigth", "height"), 1);
        assert_eq!(slips("kitten", "sitting"), 3);
        // Swapping and then inserting between the two is not one slip each in the restricted form.
        assert_eq!(slips("ca", "abc"), 3);
    }

    #[test]
    fn a_near_name_is_found() {
        let known = ["height", "width", "weight"];
        assert_eq!(nearest("heigth", known), Some("height"));
        assert_eq!(nearest("WIDTH", known), Some("width"));
        assert_eq!(nearest("wieght", known), Some("weight"));
        assert_eq!(nearest("colour", known), None);
        assert_eq!(nearest("width", []), None);
    }

    #[test]
    fn short_names_are_not_all_near_to_each_other() {
        assert_eq!(nearest("to", ["at"]), None);
        assert_eq!(nearest("G", ["E"]), None);
        assert_eq!(nearest("ta", ["at"]), Some("at"));
    }

    #[test]
    fn a_long_name_may_have_more_slips() {
        let known = ["coefficient_of_expansion"];
        assert_eq!(nearest("coeficient_off_expantion", known), Some(known[0]));
    }
}
