//! The joints of a section as a tree of its layers.

/// Joints by the positions of the two layers that they hold together.
pub(super) type Links = Vec<(usize, usize)>;

/// The group of each layer, groups numbered in the order of their first layer, where the links
/// hold layers together.
pub(super) fn groups(count: usize, links: impl IntoIterator<Item = (usize, usize)>) -> Vec<usize> {
    let mut group: Vec<usize> = (0..count).collect();
    for (a, b) in links {
        let (kept, gone) = (group[a].min(group[b]), group[a].max(group[b]));
        for g in &mut group {
            if *g == gone {
                *g = kept;
            }
        }
    }
    let mut firsts: Vec<usize> = Vec::new();
    group
        .into_iter()
        .map(|g| {
            firsts
                .iter()
                .position(|first| *first == g)
                .unwrap_or_else(|| {
                    firsts.push(g);
                    firsts.len() - 1
                })
        })
        .collect()
}

/// The layers on the way from one layer to another along the links; `None` if there is no way.
pub(super) fn way(links: &[(usize, usize)], from: usize, to: usize) -> Option<Vec<usize>> {
    let mut ways = vec![vec![from]];
    let mut seen = vec![from];
    while let Some(way) = ways.pop() {
        let end = way[way.len() - 1];
        if end == to {
            return Some(way);
        }
        for &(a, b) in links {
            for (here, there) in [(a, b), (b, a)] {
                if here == end && !seen.contains(&there) {
                    seen.push(there);
                    ways.push([way.as_slice(), &[there]].concat());
                }
            }
        }
    }
    None
}

/// The layers that hang on the second end of the link `cut` when it is taken out, in their order.
pub(super) fn beyond(count: usize, links: &[(usize, usize)], cut: usize) -> Vec<usize> {
    let left = links.iter().enumerate().filter(|(i, _)| *i != cut);
    let group = groups(count, left.map(|(_, link)| *link));
    let side = group[links[cut].1];
    (0..count).filter(|&layer| group[layer] == side).collect()
}

#[cfg(test)]
mod tests {
    use super::*;

    /// 0 - 1 - 2 and 1 - 3.
    const TREE: [(usize, usize); 3] = [(0, 1), (1, 2), (3, 1)];

    #[test]
    fn a_tree_by_hand() {
        assert_eq!(groups(5, [(3, 1), (4, 2)]), [0, 1, 2, 1, 2]);
        assert_eq!(groups(4, TREE), [0, 0, 0, 0]);
        assert_eq!(way(&TREE, 0, 3), Some(vec![0, 1, 3]));
        assert_eq!(way(&TREE[..2], 0, 3), None);
        assert_eq!(beyond(4, &TREE, 0), [1, 2, 3]);
        assert_eq!(beyond(4, &TREE, 1), [2]);
        assert_eq!(beyond(4, &TREE, 2), [0, 1, 2]);
    }
}
