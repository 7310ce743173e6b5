//! Unknown and missing keys, values of another type, quantities.

use super::*;
use crate::job::reader::shelf::{HEAD, Shelf, WHOLE, assert_problems, checked, schema};
use crate::job::reader::tree::{Format, read};

#[test]
fn a_good_document_deserialises_as_it_stands() {
    let checked = checked(WHOLE, Format::Json);
    assert_eq!(checked.problems, []);
    assert!(checked.complete);
    let plain: Value = serde_json::from_str(WHOLE).expect("good JSON");
    assert_eq!(checked.value, plain);
    let shelf: Shelf = serde_json::from_value(checked.value).expect("a shelf");
    assert_eq!((shelf.boards, shelf.share), (Some(4), Some(1.0)));
    assert_problems(HEAD, true, &[]);
}

#[test]
fn an_unknown_key_names_the_nearest_one() {
    use ErrorKind::{Key, Missing};
    assert_problems(
        &format!("{HEAD}polishd = true\n[woods.oak]\ndensity = 700\nprice = 3\n"),
        true,
        &[
            (
                Key,
                "polishd (line 3): found the unknown key \"polishd\"; expected the key \"polished\"",
            ),
            (
                Key,
                "woods[\"oak\"].price (line 6): found the unknown key \"price\"; \
                 expected the key density",
            ),
        ],
    );
    assert_problems(
        &format!("{HEAD}colour = 'red'\n"),
        true,
        &[(
            Key,
            "colour (line 3): found the unknown key \"colour\"; expected one of the keys boards, \
             brackets, corner, depth, edge, length, modulus, polished, share, title, woods",
        )],
    );
    assert_problems(
        "title = 'Books'\nlenght = '900 mm'\n",
        false,
        &[
            (
                Missing,
                "length (line 1): found nothing; expected the length of the board",
            ),
            (
                Key,
                "lenght (line 2): found the unknown key \"lenght\"; expected the key \"length\"",
            ),
        ],
    );
}

#[test]
fn a_missing_key_says_what_it_is_for() {
    use ErrorKind::Missing;
    assert_problems(
        "boards = 2\n[[brackets]]\nname = 'left'\n[woods.oak]\n",
        false,
        &[
            (
                Missing,
                "title (line 1): found nothing; expected the title of the shelf",
            ),
            (
                Missing,
                "length (line 1): found nothing; expected the length of the board",
            ),
            (
                Missing,
                "brackets[\"left\"].at (line 2): found nothing; \
                 expected the place of the bracket from the left end",
            ),
            (
                Missing,
                "brackets[\"left\"].outline (line 2): found nothing; \
                 expected a table with exactly one of the keys circle, rectangle",
            ),
            (
                Missing,
                "woods[\"oak\"].density (line 4): found nothing; expected a number",
            ),
        ],
    );
}

#[test]
fn a_value_of_another_type_is_told_apart() {
    use ErrorKind::Syntax;
    assert_problems(
        "title = 3\nlength = ['1 mm']\nboards = 2.5\nshare = 'half'\npolished = 1\nedge = 2\n\
         brackets = 'none'\nwoods = []\ncorner = ['1 mm']\nmodulus = false\n",
        false,
        &[
            (
                Syntax,
                "title (line 1): found the number 3; expected a text",
            ),
            (
                Syntax,
                "length (line 2): found a list; expected a text with a number and its unit",
            ),
            (
                Syntax,
                "boards (line 3): found the number 2.5; expected a whole number",
            ),
            (
                Syntax,
                "share (line 4): found the text \"half\"; expected a number",
            ),
            (
                Syntax,
                "polished (line 5): found the number 1; expected true or false",
            ),
            (
                Syntax,
                "edge (line 6): found the number 2; expected one of \"sharp\", \"bevelled\"",
            ),
            (
                Syntax,
                "brackets (line 7): found the text \"none\"; expected a list",
            ),
            (Syntax, "woods (line 8): found a list; expected a table"),
            (
                Syntax,
                "corner (line 9): found a list of 1; expected a list of 2",
            ),
            (
                Syntax,
                "modulus (line 10): found the value false; expected \"unknown\" \
                 or a table with exactly one of the keys tested, listed",
            ),
        ],
    );
}

#[test]
fn a_number_out_of_bounds_is_refused() {
    use ErrorKind::Value;
    let bound = |number: &str, bound: &str| {
        let words = format!("boards (line 3): found the number {number}; expected {bound}");
        assert_problems(
            &format!("{HEAD}boards = {number}\n"),
            false,
            &[(Value, &words)],
        );
    };
    bound("-1", "a whole number of at least 0");
    bound("256", "a whole number of at most 255");
}

#[test]
fn a_bare_number_has_no_unit() {
    use ErrorKind::Unit;
    let text = "title = 'Books'\nlength = 4.2\ndepth = 300\ncorner = ['1 mm', '2 kN']\n";
    assert_problems(
        text,
        true,
        &[
            (
                Unit,
                "length (line 2): found 4.2 without a unit; expected a length with mm or m",
            ),
            (
                Unit,
                "depth (line 3): found 300 without a unit; expected a length with mm or m",
            ),
            (
                Unit,
                "corner[1] (line 4): found \"2 kN\"; expected a length with mm or m",
            ),
        ],
    );
    // Even where the units would take the number, the document must write the unit.
    let node = read(&format!("{HEAD}depth = 300\n"), Format::Toml).expect("a tree");
    let checked = check(&node, &schema(), &|_, _, _| None);
    assert_eq!(
        checked.problems[0].to_string(),
        "depth (line 3): found 300 without a unit; expected a text with a number and its unit"
    );
}

#[test]
fn the_units_are_asked_for_every_quantity() {
    let node = read(WHOLE, Format::Json).expect("a tree");
    let asked = std::cell::RefCell::new(Vec::new());
    check(&node, &schema(), &|kind, text, path| {
        asked.borrow_mut().push(format!("{kind} {path} = {text}"));
        None
    });
    assert_eq!(
        asked.into_inner(),
        [
            "Length length = 900 mm",
            "Length depth = 0.3 m",
            "Length brackets[\"left\"].at = 0 mm",
            "Length brackets[\"left\"].outline.circle.diameter = 9 mm",
            "Length brackets[1].at = 900 mm",
            "Length brackets[1].outline.rectangle.width = 9 mm",
            "Length brackets[1].outline.rectangle.height = 20 mm",
            "Length corner[0] = 1 mm",
            "Length corner[1] = 2 mm",
        ]
    );
}
