//! What can be wrong with the points of a polygon.

use super::CONTACT;
use super::edge::Edge;
use super::extent::Bounds;
use super::inside::{Location, point_in_region};
use super::meeting::meet;
use super::point::Point;
use super::region::Region;
use super::shape::Vertex;
use super::shape_region::{point, through};
use crate::error::{ErrorKind, Problem};
use crate::path;

/// One loop of a polygon.
struct Loop<'a> {
    name: String,
    path: String,
    vertices: &'a [Vertex],
    edges: Vec<Edge>,
}

pub(super) fn problems(points: &[Vertex], holes: &[Vec<Vertex>], base: &str) -> Vec<Problem> {
    let outer = Loop::new("the outer loop".into(), path::key(base, "points"), points);
    let list = path::key(base, "holes");
    let holes: Vec<_> = holes
        .iter()
        .enumerate()
        .map(|(i, hole)| Loop::new(format!("hole {}", i + 1), path::indexed(&list, i), hole))
        .collect();
    // A length below which two points of this polygon are one.
    let slack = CONTACT * Bounds::around(&outer.edges).size();
    let loops = std::iter::once(&outer).chain(&holes);
    let mut problems: Vec<_> = loops.flat_map(|l| l.problems(slack)).collect();
    // Only sound loops have an inside.
    if problems.is_empty() {
        problems = misplaced(&outer, &holes, slack);
    }
    problems
}

impl<'a> Loop<'a> {
    fn new(name: String, path: String, vertices: &'a [Vertex]) -> Self {
        let next = vertices.iter().cycle().skip(1);
        let edges = vertices
            .iter()
            .zip(next)
            .map(|(&from, &to)| Edge::Straight {
                from: point(from),
                to: point(to),
            })
            .collect();
        Self {
            name,
            path,
            vertices,
            edges,
        }
    }

    /// Edge i, counted from 0 as here, in words that count from 1.
    fn edge(&self, i: usize) -> String {
        let last = if i + 1 == self.edges.len() { 1 } else { i + 2 };
        format!("edge {} from point {} to point {last}", i + 1, i + 1)
    }

    fn first(&self) -> Point {
        self.edges[0].from()
    }

    fn problem(&self, found: String, expected: &str) -> Problem {
        Problem::new(ErrorKind::Geometry, &self.path, found, expected)
    }

    fn problems(&self, slack: f64) -> Vec<Problem> {
        let count = self.vertices.len();
        if count < 3 {
            return vec![self.problem(
                format!("{count} point{}", if count == 1 { "" } else { "s" }),
                "at least 3 points",
            )];
        }
        let values = self.not_finite();
        if !values.is_empty() {
            return values;
        }
        let short: Vec<_> = (0..count)
            .filter(|&i| (self.edges[i].to() - self.edges[i].from()).norm() <= slack)
            .map(|i| {
                self.problem(
                    format!("{} without length", self.edge(i)),
                    "points that differ, without the first again at the end",
                )
            })
            .collect();
        if short.is_empty() {
            self.crossings(slack).into_iter().collect()
        } else {
            short
        }
    }

    fn not_finite(&self) -> Vec<Problem> {
        self.vertices
            .iter()
            .enumerate()
            .filter(|(_, (y, z))| !(y.is_finite() && z.is_finite()))
            .map(|(i, (y, z))| {
                Problem::new(
                    ErrorKind::Value,
                    path::indexed(&self.path, i),
                    format!("the point ({y}, {z})"),
                    "finite lengths",
                )
            })
            .collect()
    }

    /// The first pair of edges that cross or touch, and how many more there are.
    fn crossings(&self, slack: f64) -> Option<Problem> {
        let count = self.edges.len();
        let mut pairs = (0..count)
            .flat_map(|i| (i + 1..count).map(move |j| (i, j)))
            .filter(|&(i, j)| self.collide(i, j, slack));
        let (i, j) = pairs.next()?;
        let more = match pairs.count() {
            0 => String::new(),
            1 => ", and one more pair".into(),
            n => format!(", and {n} more pairs"),
        };
        Some(self.problem(
            format!(
                "{} and {}, which cross or touch{more}",
                self.edge(i),
                self.edge(j)
            ),
            "edges that meet only where one ends and the next begins",
        ))
    }

    /// Whether edges i < j meet elsewhere than at the point that two neighbours share.
    fn collide(&self, i: usize, j: usize, slack: f64) -> bool {
        let (a, b) = (&self.edges[i], &self.edges[j]);
        let folds = |before: &Edge, after: &Edge| {
            before.distance(after.to()) <= slack || after.distance(before.from()) <= slack
        };
        if j == i + 1 {
            folds(a, b)
        } else if i == 0 && j + 1 == self.edges.len() {
            folds(b, a)
        } else {
            meet(a, b, slack)
        }
    }
}

/// Holes that are not inside the outer loop and apart from each other.
fn misplaced(outer: &Loop<'_>, holes: &[Loop<'_>], slack: f64) -> Vec<Problem> {
    let mut problems = Vec::new();
    let solid = Region::of(through(outer.vertices), Vec::new());
    for hole in holes {
        let found = if let Some((i, j)) = first_meeting(hole, outer, slack) {
            format!(
                "{} and {} of the outer loop, which cross or touch",
                hole.edge(i),
                outer.edge(j)
            )
        } else if point_in_region(&solid, hole.first(), 0.0) != Location::Inside {
            format!("{}, which does not lie in the outer loop", hole.name)
        } else {
            continue;
        };
        problems.push(hole.problem(found, "a hole inside the outer loop that does not touch it"));
    }
    for (i, hole) in holes.iter().enumerate() {
        for other in &holes[i + 1..] {
            if first_meeting(hole, other, slack).is_some() || nested(hole, other) {
                problems.push(other.problem(
                    format!("{} and {}, which overlap or touch", hole.name, other.name),
                    "holes apart from each other",
                ));
            }
        }
    }
    problems
}

fn first_meeting(a: &Loop<'_>, b: &Loop<'_>, slack: f64) -> Option<(usize, usize)> {
    (0..a.edges.len())
        .flat_map(|i| (0..b.edges.len()).map(move |j| (i, j)))
        .find(|&(i, j)| meet(&a.edges[i], &b.edges[j], slack))
}

/// Whether one of two loops that do not meet lies within the other.
fn nested(a: &Loop<'_>, b: &Loop<'_>) -> bool {
    let holds = |host: &Loop<'_>, point| {
        let host = Region::of(through(host.vertices), Vec::new());
        point_in_region(&host, point, 0.0) == Location::Inside
    };
    holds(a, b.first()) || holds(b, a.first())
}
