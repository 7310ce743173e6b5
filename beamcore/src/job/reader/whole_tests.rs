//! Whole documents with several mistakes at once, and with a mistake in every place.

use super::*;
use crate::job::reader::shelf::{HEAD, Shelf, WHOLE, checked, quantity, schema};
use crate::job::reader::tree::{Format, line_of, read};

/// Three mistakes of different kinds, in both notations.
const THREE: [(&str, Format); 2] = [
    (
        "title = 'Books'\nlength = '900 mm'\nboards = 'two'\n\n[[brackets]]\nname = 'left'\n\
         at = 4.2\noutline = {circle = {diametre = '9 mm', diameter = '9 mm'}}\n",
        Format::Toml,
    ),
    (
        "{\"title\": \"Books\",\n\"length\": \"900 mm\", \"boards\":\n\"two\",\n\
         \"brackets\": [\n{\"name\": \"left\",\n\n\"at\": 4.2,\n\"outline\": {\"circle\": \
         {\"diametre\": \"9 mm\", \"diameter\": \"9 mm\"}}}]}",
        Format::Json,
    ),
];

#[test]
fn three_mistakes_are_told_at_once() {
    for (text, format) in THREE {
        let checked = checked(text, format);
        assert!(!checked.complete);
        let error = crate::error::Error::from_problems(checked.problems).expect("three mistakes");
        assert_eq!(
            error.to_string(),
            "3 problems:\n\
             - boards (line 3): found the text \"two\"; expected a whole number\n\
             - brackets[\"left\"].at (line 7): found 4.2 without a unit; \
             expected a length with mm or m\n\
             - brackets[\"left\"].outline.circle.diametre (line 8): \
             found the unknown key \"diametre\"; expected the key \"diameter\""
        );
    }
}

#[test]
fn every_problem_stands_on_the_line_of_its_path() {
    for (text, format) in THREE {
        let node = read(text, format).expect("a tree");
        let problems = check(&node, &schema(), &quantity).problems;
        let lines: Vec<_> = problems.iter().map(|problem| problem.line()).collect();
        let found: Vec<_> = problems
            .iter()
            .map(|problem| line_of(&node, problem.path()))
            .collect();
        assert_eq!(lines, [Some(3), Some(7), Some(8)]);
        assert_eq!(found, lines);
    }
}

#[test]
fn problems_are_in_the_order_of_the_lines() {
    // The table of the woods is continued below that of another key.
    let text = format!(
        "{HEAD}[woods.oak]\ndensity = 'x'\n[[brackets]]\nat = 1\noutline = {{}}\n\
         [woods.elm]\ndensity = 'y'\n"
    );
    let lines: Vec<_> = checked(&text, Format::Toml)
        .problems
        .iter()
        .filter_map(Problem::line)
        .collect();
    assert_eq!(lines, [4, 6, 7, 9]);
}

/// The values that differ from `value` in one place: another value there, or a key or an element
/// left out, or a key more.
fn variations(value: &Value) -> Vec<Value> {
    let others = [
        "3",
        "-2.5",
        "1e20",
        "300",
        "true",
        "\"text\"",
        "\"sharp\"",
        "[]",
        "[1]",
        "{}",
    ];
    let read = |text| serde_json::from_str::<Value>(text).expect("good JSON");
    let mut out: Vec<Value> = others.into_iter().map(read).collect();
    match value {
        Value::Object(map) => {
            for (key, value) in map {
                let mut fewer = map.clone();
                fewer.remove(key);
                out.push(fewer.into());
                let with = |value| {
                    let mut map = map.clone();
                    map.insert(key.clone(), value);
                    Value::Object(map)
                };
                out.extend(variations(value).into_iter().map(with));
            }
            for key in ["extra", "name", "circle", "rectangle", "tested", "listed"] {
                let mut more = map.clone();
                more.insert(key.to_owned(), 1.into());
                out.push(more.into());
            }
        }
        Value::Array(list) => {
            for (index, value) in list.iter().enumerate() {
                let mut fewer = list.clone();
                fewer.remove(index);
                out.push(fewer.into());
                let with = |value| {
                    let mut list = list.clone();
                    list[index] = value;
                    Value::Array(list)
                };
                out.extend(variations(value).into_iter().map(with));
            }
        }
        _ => {}
    }
    out
}

#[test]
fn a_complete_document_deserialises_and_no_other_one_does() {
    let whole: Value = serde_json::from_str(WHOLE).expect("good JSON");
    let (mut complete, mut broken) = (0, 0);
    for value in variations(&whole).into_iter().filter(Value::is_object) {
        let text = value.to_string();
        let checked = checked(&text, Format::Json);
        let shelf = serde_json::from_value::<Shelf>(checked.value);
        // Serde alone would take a list of the values, without their keys, for a table.
        let list = |problem: &Problem| {
            problem.found().starts_with("a list") && problem.expected().starts_with("a table")
        };
        if checked.complete || !checked.problems.iter().any(list) {
            assert_eq!(checked.complete, shelf.is_ok(), "{shelf:?}: {text}");
        }
        // And nothing that serde refuses in the text as it stands goes by without a problem.
        let plain = serde_json::from_value::<Shelf>(value);
        assert!(
            plain.is_ok() || !checked.problems.is_empty(),
            "{plain:?}: {text}"
        );
        if checked.complete {
            complete += 1;
        } else {
            broken += 1;
        }
    }
    assert!(complete > 30 && broken > 200, "{complete} {broken}");
}
