//! A text given to a parser byte by byte, so that the line it has come to is known.

use std::cell::Cell;
use std::io::{self, Read};

/// The text, given out byte by byte.
pub(super) struct Source<'a> {
    text: &'a [u8],
    /// Newlines given out since the last byte that was not white space.
    newlines: usize,
    line: &'a Cell<usize>,
}

impl<'a> Source<'a> {
    /// A source that keeps in `line` the line, counted from 1, of the last byte that it gave out
    /// and that was not white space.
    pub(super) fn new(text: &'a str, line: &'a Cell<usize>) -> Self {
        line.set(1);
        Self {
            text: text.as_bytes(),
            newlines: 0,
            line,
        }
    }
}

impl Read for Source<'_> {
    /// Gives one byte. The line moves on only with the next byte that is not white space, because
    /// the parser looks one byte past the end of a number before it hands the number over.
    fn read(&mut self, buffer: &mut [u8]) -> io::Result<usize> {
        let (Some(slot), Some((&byte, rest))) = (buffer.first_mut(), self.text.split_first())
        else {
            return Ok(0);
        };
        *slot = byte;
        self.text = rest;
        match byte {
            b'\n' => self.newlines += 1,
            b' ' | b'\t' | b'\r' => {}
            _ => {
                self.line.set(self.line.get() + self.newlines);
                self.newlines = 0;
            }
        }
        Ok(1)
    }
}
