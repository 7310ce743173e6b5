//! A page of 80 columns.

/// The width of the page.
const WIDTH: usize = 80;

/// Lines of text, wrapped at 80 columns.
#[derive(Debug, Default)]
pub(super) struct Page {
    text: String,
}

impl Page {
    /// The title, underlined over the whole width.
    pub(super) fn title(&mut self, title: &str) {
        self.line(title);
        self.line(&"=".repeat(WIDTH));
    }

    /// A heading, after a blank line.
    pub(super) fn heading(&mut self, heading: &str) {
        self.blank();
        self.line(heading);
        self.line(&"-".repeat(heading.chars().count()));
    }

    /// An empty line.
    pub(super) fn blank(&mut self) {
        self.text.push('\n');
    }

    /// A line, wrapped between words where it is too long.
    pub(super) fn line(&mut self, line: &str) {
        if line.chars().count() <= WIDTH {
            self.text.push_str(line.trim_end());
            self.text.push('\n');
        } else {
            self.wrapped(line, "", "  ");
        }
    }

    /// A heading with a list under it; nothing where the list is empty.
    pub(super) fn list(&mut self, heading: &str, items: &[String]) {
        if items.is_empty() {
            return;
        }
        self.heading(heading);
        for item in items {
            self.wrapped(item, "- ", "  ");
        }
    }

    /// Words set one after the other, the first line and the others with their own indent.
    fn wrapped(&mut self, text: &str, first: &str, indent: &str) {
        let mut line = first.to_owned();
        let mut is_empty = true;
        for word in text.split_whitespace() {
            let longer = line.chars().count() + usize::from(!is_empty) + word.chars().count();
            if longer > WIDTH && !is_empty {
                self.text.push_str(&line);
                self.text.push('\n');
                line = indent.to_owned();
                is_empty = true;
            }
            if !is_empty {
                line.push(' ');
            }
            line.push_str(word);
            is_empty = false;
        }
        self.text.push_str(&line);
        self.text.push('\n');
    }

    /// The finished page.
    pub(super) fn text(self) -> String {
        self.text
    }
}
