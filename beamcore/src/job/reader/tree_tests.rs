//! Reading of whole, broken and truncated texts.

use super::*;

fn toml(text: &str) -> Node {
    read(text, Format::Toml).unwrap_or_else(|error| panic!("{error}\nin\n{text}"))
}

fn json(text: &str) -> Node {
    read(text, Format::Json).unwrap_or_else(|error| panic!("{error}\nin\n{text}"))
}

/// Every node with its path and line, keys before their values.
fn lines(node: &Node, path: &str, out: &mut Vec<(String, usize)>) {
    match &node.value {
        NodeValue::Table(entries) => {
            for (key, node) in entries {
                let path = path::key(path, &key.name);
                out.push((format!("{path}:"), key.line));
                out.push((path.clone(), node.line));
                lines(node, &path, out);
            }
        }
        NodeValue::Array(list) => {
            for (index, node) in list.iter().enumerate() {
                let path = path::indexed(path, index);
                out.push((path.clone(), node.line));
                lines(node, &path, out);
            }
        }
        _ => {}
    }
}

fn assert_lines(node: &Node, expected: &[(&str, usize)]) {
    let mut found = Vec::new();
    lines(node, "", &mut found);
    let found: Vec<_> = found.iter().map(|(path, line)| (&**path, *line)).collect();
    assert_eq!(found, expected);
}

#[test]
fn toml_values_keep_their_lines() {
    let text =
        "# head\nz = 1\na = [\n  2.5,\n  'x',\n]\n\n[t]\nd.e = true\n[[l]]\nn = 0x10\n[[l]]\n";
    assert_lines(
        &toml(text),
        &[
            ("z:", 2),
            ("z", 2),
            ("a:", 3),
            ("a", 3),
            ("a[0]", 4),
            ("a[1]", 5),
            ("t:", 8),
            ("t", 8),
            ("t.d:", 9),
            ("t.d", 9),
            ("t.d.e:", 9),
            ("t.d.e", 9),
            ("l:", 10),
            ("l", 10),
            ("l[0]", 10),
            ("l[0].n:", 11),
            ("l[0].n", 11),
            ("l[1]", 12),
        ],
    );
}

#[test]
fn json_values_keep_their_lines() {
    // Numbers end at the newline, and values stand below their keys.
    let text = "\n{\n \"z\": 1\n,\"a\":\n[\n2.5\n\n,\n\"x\", true\n\n],\n\"t\"\n:\n{ \"e\"\n:\r\n7\n}}\n\n";
    assert_lines(
        &json(text),
        &[
            ("z:", 3),
            ("z", 3),
            ("a:", 4),
            ("a", 5),
            ("a[0]", 6),
            ("a[1]", 9),
            ("a[2]", 9),
            ("t:", 12),
            ("t", 14),
            ("t.e:", 14),
            ("t.e", 16),
        ],
    );
}

#[test]
fn both_notations_give_the_same_values() {
    let from_toml = toml("a = 1\nb = [2.5, -0.1, 1e21]\nc = { d = 'x\"y', e = true }\n");
    let from_json =
        json("{\"a\": 1,\n\"b\": [2.5, -0.1, 1e21],\n\"c\": { \"d\": \"x\\\"y\", \"e\": true }}");
    assert_eq!(from_toml, from_json);
    let whole = |node: &Node| node.get("a").map(|node| node.value.clone());
    // 2^63 is one more than the greatest whole number that is held exactly.
    assert_eq!(
        whole(&json("{\"a\": 9223372036854775807}")),
        Some(NodeValue::Integer(9_223_372_036_854_775_807))
    );
    assert_eq!(
        whole(&json("{\"a\": 9223372036854775808}")),
        Some(NodeValue::Number(9_223_372_036_854_775_808.0))
    );
    assert_eq!(whole(&toml("a = 0b101")), Some(NodeValue::Integer(5)));
    assert_eq!(whole(&toml("a = 1_000.5")), Some(NodeValue::Number(1000.5)));
}

#[test]
fn json_numbers_are_read_to_the_nearest_double() {
    for text in [
        "0.1",
        "4.35",
        "1.7976931348623157e308",
        "5e-324",
        "2.2250738585072011e-308",
    ] {
        let node = json(&format!("{{\"a\":{text}}}"));
        let expected = text.parse().map(NodeValue::Number);
        assert_eq!(Ok(node.get("a").expect("a").value.clone()), expected);
    }
}

#[test]
fn the_line_of_a_path_is_that_of_its_deepest_node() {
    let text = "[member]\nspan = '4 m'\n[[member.supports]]\nname = 'left'\nat = '0 m'\n\
                [[member.supports]]\nat = '4 m'\n[woods.'live oak']\ndensity = 600\n";
    let node = toml(text);
    for (path, line) in [
        ("member.span", Some(2)),
        ("member.span.deeper[3].still", Some(2)),
        ("member.supports", Some(3)),
        ("member.supports[\"left\"].at", Some(5)),
        ("member.supports[0].at", Some(5)),
        ("member.supports[1].at", Some(7)),
        ("member.supports[1].stiffness", Some(6)),
        ("member.supports[\"right\"].at", Some(3)),
        ("member.supports[7]", Some(3)),
        ("member.depth", Some(1)),
        ("woods[\"live oak\"].density", Some(9)),
        ("woods[\"live oak\"].price", Some(8)),
        ("", Some(1)),
        ("document", Some(1)),
        ("beam", None),
        ("[0]", None),
    ] {
        assert_eq!(line_of(&node, path), line, "{path}");
    }
}

#[test]
fn a_long_text_is_cut_in_messages() {
    let text = "ä".repeat(61);
    assert_eq!(shortened(&text), format!("\"{}...\"", "ä".repeat(60)));
    assert_eq!(shortened(&text[2..]), format!("\"{}\"", "ä".repeat(60)));
    assert_eq!(shortened("two\nlines"), "\"two\\u{a}lines\"");
}

#[test]
fn every_word_for_a_notation_is_read_back() {
    for format in Format::ALL {
        assert_eq!(format.name().parse(), Ok(format));
    }
    let error = "yaml".parse::<Format>().unwrap_err();
    assert_eq!(
        error.to_string(),
        "format: found \"yaml\"; expected one of \"toml\", \"json\""
    );
}
