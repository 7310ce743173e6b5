//! What can be wrong with the edges of a loop.

use super::CONTACT;
use super::edge::Edge;
use super::extent::Bounds;
use super::point::Point;
use crate::error::{ErrorKind, Problem};
use crate::path;

pub(super) fn problems(edges: &[Edge]) -> Vec<Problem> {
    if edges.len() < 2 {
        return vec![Problem::new(
            ErrorKind::Geometry,
            "edges",
            format!("{} edges", edges.len()),
            "a loop of at least two edges",
        )];
    }
    let values: Vec<_> = (0..edges.len())
        .filter(|&i| !is_finite(&edges[i]))
        .map(|i| {
            Problem::new(
                ErrorKind::Value,
                path::indexed("edges", i),
                "a coordinate that is not finite",
                "finite coordinates",
            )
        })
        .collect();
    if !values.is_empty() {
        return values;
    }
    let slack = CONTACT * Bounds::around(edges).size();
    let mut problems = Vec::new();
    for (i, edge) in edges.iter().enumerate() {
        let before = if i == 0 { edges.len() - 1 } else { i - 1 };
        let found = [gap(edges[before].to(), edge), shape(edge, slack)];
        problems.extend(found.into_iter().flatten().map(|(found, expected)| {
            Problem::new(
                ErrorKind::Geometry,
                path::indexed("edges", i),
                found,
                expected,
            )
        }));
    }
    problems
}

fn is_finite(edge: &Edge) -> bool {
    let centre = match *edge {
        Edge::Straight { .. } => Point::ORIGIN,
        Edge::Arc { centre, .. } => centre,
    };
    edge.from().is_finite() && edge.to().is_finite() && centre.is_finite()
}

fn gap(end: Point, next: &Edge) -> Option<(String, &'static str)> {
    let gap = (next.from() - end).norm();
    (end != next.from()).then(|| {
        (
            format!("an edge that begins {gap} m from the end of the one before"),
            "an edge that begins exactly where the one before ends",
        )
    })
}

fn shape(edge: &Edge, slack: f64) -> Option<(String, &'static str)> {
    if (edge.to() - edge.from()).norm() <= slack {
        return Some((
            "an edge that ends where it begins".into(),
            "an edge with length; a full circle is two half circles",
        ));
    }
    let Edge::Arc {
        from, to, centre, ..
    } = *edge
    else {
        return None;
    };
    let (first, last) = ((from - centre).norm(), (to - centre).norm());
    ((first - last).abs() > CONTACT * first.max(last)).then(|| {
        (
            format!("an arc that begins {first} m and ends {last} m from its centre"),
            "an arc whose ends are at the same distance from its centre",
        )
    })
}
