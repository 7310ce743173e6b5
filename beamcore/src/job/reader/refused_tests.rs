//! Texts that are broken, truncated, or hold what a document may not hold.

use super::*;

/// The kind and the words of the error of a text.
fn refusal(text: &str, format: Format) -> (ErrorKind, String) {
    let error = read(text, format).expect_err(text);
    (error.kind(), error.to_string())
}

/// Asserts that each text is one problem of the kind and the words beside it.
fn refused_as(format: Format, kind: ErrorKind, cases: &[(&str, &str)]) {
    for (text, words) in cases {
        assert_eq!(refusal(text, format), (kind, (*words).to_owned()), "{text}");
    }
}

#[test]
fn a_broken_toml_text_is_one_problem_with_its_line() {
    refused_as(
        Format::Toml,
        ErrorKind::Syntax,
        &[
            (
                "",
                "document (line 1): found an empty text; expected a complete TOML document",
            ),
            (
                " \n\n",
                "document (line 1): found an empty text; expected a complete TOML document",
            ),
            (
                "a = 1\nb = [1,\n\n",
                "document (line 2): found broken text: unclosed array, expected `]`; \
                 expected a complete TOML document",
            ),
            (
                "a = 1\nb =\n",
                "document (line 2): found broken text: a key without a value; \
                 expected a complete TOML document",
            ),
            (
                "a = x\n",
                "document (line 1): found broken text: string values must be quoted, \
                 expected literal string; expected a complete TOML document",
            ),
            (
                "a = 1\nb = 01\nc = [",
                "document (line 2): found broken text: unexpected leading zero; \
                 expected a complete TOML document",
            ),
            (
                "\na = 2026-05-27\n",
                "a (line 2): found the date 2026-05-27; expected a text in quotes",
            ),
        ],
    );
}

#[test]
fn a_broken_json_text_is_one_problem_with_its_line() {
    refused_as(
        Format::Json,
        ErrorKind::Syntax,
        &[
            (
                "",
                "document (line 1): found an empty text; expected a complete JSON document",
            ),
            (
                "{\n\"a\": [1,\n\n",
                "document (line 2): found a text that ends within a value; \
                 expected a complete JSON document",
            ),
            (
                "{\"a\": null,\n\"b\": 1,}\n",
                "document (line 2): found broken text: trailing comma; \
                 expected a complete JSON document",
            ),
            (
                "{\"a\": [{\"b\": tru}\n]\n}\n",
                "document (line 1): found broken text: expected true, false or null; \
                 expected a complete JSON document",
            ),
            (
                "{}\n\nx",
                "document (line 3): found broken text: trailing characters; \
                 expected a complete JSON document",
            ),
            ("\n[1]", "document (line 2): found a list; expected a table"),
            (
                "3",
                "document (line 1): found the number 3; expected a table",
            ),
            (
                "{\"a\":\n{\"b\": null}}",
                "a.b (line 2): found nothing (null); expected a value, or that the key is left out",
            ),
        ],
    );
}

#[test]
fn a_text_nested_too_deeply_is_refused() {
    let list = "[".repeat(100_000);
    let expected =
        "document (line 1): found tables and lists nested too deeply; expected a complete";
    let (_, words) = refusal(&format!("a = {list}"), Format::Toml);
    assert_eq!(words, format!("{expected} TOML document"));
    // Less than the parser's bounds in brackets and in dots, but 79 times 79 together.
    let inline = format!("{{ {} = ", ["a"; 79].join("."));
    let text = format!("{}1{}", inline.repeat(79), "}".repeat(79));
    let (_, words) = refusal(&format!("a = {text}"), Format::Toml);
    assert_eq!(words, format!("{expected} TOML document"));
    let (_, words) = refusal(&list, Format::Json);
    assert_eq!(words, format!("{expected} JSON document"));
}

#[test]
fn a_key_given_twice_is_refused() {
    refused_as(
        Format::Toml,
        ErrorKind::Duplicate,
        &[
            (
                "a = 1\na = 2",
                "a (line 2): found the key \"a\" a second time; expected each key once",
            ),
            (
                "[t]\n'b c' = 1\n\"b c\" = 2",
                "[\"b c\"] (line 3): found the key \"b c\" a second time; expected each key once",
            ),
            (
                "[t]\n[t]",
                "t (line 2): found the key \"t\" a second time; expected each key once",
            ),
        ],
    );
    let text = "{\"t\": [{\"b\": 1,\n\"name\": \"x\",\n\"b\":\n2}]}";
    let words = "t[\"x\"].b (line 3): found the key \"b\" a second time; expected each key once";
    refused_as(Format::Json, ErrorKind::Duplicate, &[(text, words)]);
}

#[test]
fn a_number_that_is_not_finite_is_refused() {
    refused_as(
        Format::Toml,
        ErrorKind::Value,
        &[
            (
                "a = 1\nb = nan",
                "b (line 2): found nan; expected a finite number",
            ),
            (
                "[[t]]\nb = -inf",
                "t[0].b (line 2): found -inf; expected a finite number",
            ),
            (
                "[[t]]\nb = 1e999\nname = 'x'",
                "t[\"x\"].b (line 2): found 1e999; expected a finite number",
            ),
            (
                "a = 9223372036854775808",
                "a (line 1): found 9223372036854775808; expected a whole number \
                 from -9223372036854775808 to 9223372036854775807",
            ),
        ],
    );
    refused_as(
        Format::Json,
        ErrorKind::Value,
        &[
            (
                "{\"a\":\n1e999\n}\n",
                "a (line 2): found 1e999; expected a finite number",
            ),
            (
                "{\"a\":[0,-1E999]}",
                "a[1] (line 1): found -1E999; expected a finite number",
            ),
            (
                "{\"a\":[{\"name\":\"x\",\"b\": 1e99999999999}]\n}",
                "a[\"x\"].b (line 1): found 1e99999999999; expected a finite number",
            ),
        ],
    );
}

#[test]
fn values_that_are_refused_are_found_all_at_once() {
    let (_, words) = refusal("z = nan\n[a]\nd = 10:30:00\n[[l]]\nf = inf\n", Format::Toml);
    assert_eq!(
        words,
        "3 problems:\n\
         - z (line 1): found nan; expected a finite number\n\
         - a.d (line 3): found the date 10:30:00; expected a text in quotes\n\
         - l[0].f (line 5): found inf; expected a finite number"
    );
    let text = "{\"l\": [{\"b\": null,\n \"name\": \"x\"}],\n\"c\": null}";
    let (_, words) = refusal(text, Format::Json);
    assert_eq!(
        words,
        "2 problems:\n\
         - l[\"x\"].b (line 1): found nothing (null); expected a value, or that the key is left out\n\
         - c (line 3): found nothing (null); expected a value, or that the key is left out"
    );
}

#[test]
fn a_text_truncated_anywhere_is_broken_or_complete() {
    let in_toml = "# job\nversion = 1\n[member]\nspan = \"4 m\" # länge\nflags = [true, 2.5e0]\n\
                   [[member.supports]]\nname = 'links'\nat = { x = \"\"\"\n0 mm\"\"\" }\n";
    let in_json = "{\n \"version\": 1,\n \"länge\": {\"a\": [true, -2.5e0, \"\\u00e4\"],\n\
                   \"b\": {}, \"c\": false}\n}\n";
    let mut complete = [0, 0];
    for (text, format) in [(in_toml, Format::Toml), (in_json, Format::Json)] {
        for end in 0..=text.len() {
            // Between the bytes of one character there is no text to be read.
            let Some(part) = text.get(..end) else {
                continue;
            };
            match read(part, format) {
                Ok(node) => {
                    assert!(matches!(node.value, NodeValue::Table(_)));
                    complete[usize::from(format == Format::Json)] += 1;
                }
                Err(error) => {
                    assert_eq!(error.problems().len(), 1, "{part}");
                    assert_eq!(error.kind(), ErrorKind::Syntax, "{part}");
                    let line = error.problems()[0].line().expect(part);
                    let last = part.trim_end().lines().count().max(1);
                    assert!((1..=last).contains(&line), "{line}: {part}");
                    assert!(!error.to_string().contains('\n'), "{error}");
                }
            }
        }
    }
    // JSON is complete with its closing brace, and with the newline after it.
    assert_eq!(complete[1], 2);
    assert!(
        complete[0] > 20,
        "a TOML text is complete after each whole line"
    );
}
