//! How deeply a TOML text nests its tables, found before it is parsed.
//!
//! The parser bounds the brackets within brackets and the parts of one dotted key, but not the two
//! together, and walks its tree by recursion: a short text could exhaust the stack.

/// The greatest depth that is read, the same as the JSON parser's.
const LIMIT: usize = 128;

/// The line, counted from 1, on which a text nests more deeply than is read.
///
/// The depth is that of the header, of the brackets around a place and of the dotted keys before
/// them. A fraction's point counts as a key's dot, for it makes no difference to the limit.
pub(super) fn too_deep(text: &str) -> Option<usize> {
    let mut rest = text;
    let mut open: Vec<usize> = Vec::new();
    // `around` is the sum of `open`, `dots` those since the last line, comma or bracket.
    let (mut header, mut around, mut dots, mut in_header) = (0, 0, 0, false);
    let mut line_begins = true;
    while let Some(c) = rest.chars().next() {
        let length = match c {
            '#' => rest.find('\n').unwrap_or(rest.len()),
            '"' | '\'' => quoted_length(rest, c),
            _ => c.len_utf8(),
        };
        match c {
            '[' if line_begins && open.is_empty() => {
                (header, in_header) = (0, true);
                open.push(1);
                around += 1;
            }
            '[' | '{' => {
                open.push(dots + 1);
                around += dots + 1;
                dots = 0;
            }
            ']' | '}' => around -= open.pop().unwrap_or(0),
            ',' => dots = 0,
            '.' => dots += 1,
            '\n' => {
                if in_header {
                    header = dots + 1;
                }
                (dots, in_header) = (0, false);
            }
            _ => {}
        }
        if header + around + dots > LIMIT {
            let read = text.len() - rest.len();
            return Some(1 + text[..read].matches('\n').count());
        }
        line_begins = c == '\n' || (line_begins && matches!(c, ' ' | '\t' | '\r'));
        rest = &rest[length..];
    }
    None
}

/// The length of the quoted text that `text` begins with, up to where it ends or breaks off.
fn quoted_length(text: &str, quote: char) -> usize {
    let bytes = text.as_bytes();
    let is_quote = |at: usize| bytes.get(at) == Some(&(quote as u8));
    let lines = is_quote(1) && is_quote(2);
    let mark = if lines { 3 } else { 1 };
    let mut at = mark;
    while at < bytes.len() {
        match bytes[at] {
            // What is escaped does not end the text; the end of a line cannot be escaped.
            b'\\' if quote == '"' && at + 1 < bytes.len() && bytes[at + 1] != b'\n' => at += 2,
            b'\n' if !lines => return at,
            _ if (at..at + mark).all(is_quote) => {
                // A text of several lines may itself end with up to two quotes.
                let more = (at + mark..at + mark + 2).take_while(|&at| lines && is_quote(at));
                return at + mark + more.count();
            }
            _ => at += 1,
        }
    }
    bytes.len()
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn depth_is_that_of_header_brackets_and_dots_together() {
        let dotted = |parts: usize| vec!["a"; parts].join(".");
        assert_eq!(
            too_deep(&format!("[{}]\n{} = 1", dotted(64), dotted(64))),
            None
        );
        assert_eq!(
            too_deep(&format!("[{}]\n\n{} = 1", dotted(64), dotted(66))),
            Some(3)
        );
        assert_eq!(too_deep(&format!("a = {}", "[".repeat(128))), None);
        assert_eq!(too_deep(&format!("a = {}", "[".repeat(129))), Some(1));
        let nested = format!("{{ {} = ", dotted(10));
        assert_eq!(too_deep(&nested.repeat(11)), None);
        assert_eq!(too_deep(&format!("# dots\n{}", nested.repeat(13))), Some(2));
    }

    #[test]
    fn dots_and_brackets_that_do_not_nest_are_not_counted() {
        let dots = ".[{".repeat(200);
        for text in [
            format!("a = \"{dots}\"\nb = '{dots}' # {dots}\n"),
            format!("a = \"\"\"\n\"{dots}\\\"\"\"\"\" # {dots}\nb = '''{dots}'''' # {dots}"),
            format!("a = [{}]", "1.5, ".repeat(200)),
            format!("a = [\n{}]", "{ b.c = [0.5] },\n".repeat(200)),
            "[a.b]\nc.d = 1.5\n[[e.f]]\n".repeat(200),
        ] {
            assert_eq!(too_deep(&text), None, "{text}");
        }
        // A quoted text that breaks off ends with its line.
        let open = format!("a = 'x\nb = \"\\\nc = {}", "[".repeat(200));
        assert_eq!(too_deep(&open), Some(3));
    }
}
