//! Fixed names and tables of one key.

use crate::error::ErrorKind;
use crate::job::reader::shelf::{HEAD, assert_problems};

#[test]
fn a_name_that_is_none_of_the_fixed_ones_is_refused() {
    use ErrorKind::Name;
    let refused = |line: &str, words: &str| {
        assert_problems(&format!("{HEAD}{line}\n"), false, &[(Name, words)]);
    };
    refused(
        "edge = 'sharpe'",
        "edge (line 3): found the name \"sharpe\"; expected \"sharp\"",
    );
    refused(
        "edge = 'round'",
        "edge (line 3): found the name \"round\"; expected one of \"sharp\", \"bevelled\"",
    );
    refused(
        "modulus = 'unknwon'",
        "modulus (line 3): found the name \"unknwon\"; expected \"unknown\"",
    );
    refused(
        "modulus = 'tested'",
        "modulus (line 3): found the name \"tested\"; expected \"unknown\" \
         or a table with exactly one of the keys tested, listed",
    );
    refused(
        "brackets = [{at = '1 mm', outline = {circel = {diameter = '1 mm'}}}]",
        "brackets[0].outline.circel (line 3): found the unknown key \"circel\"; \
         expected the key \"circle\"",
    );
    refused(
        "brackets = [{at = '1 mm', outline = {star = {}}}]",
        "brackets[0].outline.star (line 3): found the unknown key \"star\"; \
         expected one of the keys circle, rectangle",
    );
}

#[test]
fn a_table_of_one_key_has_one_key() {
    let bracket = |outline: &str| format!("{HEAD}[[brackets]]\nat = '1 mm'\noutline = {outline}\n");
    assert_problems(
        &bracket("{}"),
        false,
        &[(
            ErrorKind::Missing,
            "brackets[0].outline (line 5): found a table without a key; \
             expected exactly one of the keys circle, rectangle",
        )],
    );
    // Both are looked into all the same.
    assert_problems(
        &bracket("{rectangle = {width = '1 mm', height = 2}, circle = {diameter = '1 mm'}}"),
        false,
        &[
            (
                ErrorKind::Key,
                "brackets[0].outline (line 5): found the keys rectangle, circle; \
                 expected exactly one of the keys circle, rectangle",
            ),
            (
                ErrorKind::Unit,
                "brackets[0].outline.rectangle.height (line 5): found 2 without a unit; \
                 expected a length with mm or m",
            ),
        ],
    );
    assert_problems(
        &bracket("{circle = {diameter = '1 mm'}, colour = 3}"),
        true,
        &[(
            ErrorKind::Key,
            "brackets[0].outline.colour (line 5): found the unknown key \"colour\"; \
             expected one of the keys circle, rectangle",
        )],
    );
    assert_problems(
        &bracket("'circle'"),
        false,
        &[(
            ErrorKind::Syntax,
            "brackets[0].outline (line 5): found the text \"circle\"; \
             expected a table with exactly one of the keys circle, rectangle",
        )],
    );
}
