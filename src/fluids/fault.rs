//! What is wrong with a table.

use std::fmt;

/// What is wrong with the text of a table, and where.
#[derive(Clone, PartialEq, Eq, Debug)]
pub struct TableFault {
    /// Counted from 1.
    pub line: usize,
    /// What is wrong and what would do.
    pub detail: String,
}

impl fmt::Display for TableFault {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(out, "line {}: {}", self.line, self.detail)
    }
}

/// Faults as they are found.
#[derive(Default)]
pub(super) struct Faults(Vec<TableFault>);

impl Faults {
    pub(super) fn add(&mut self, line: usize, detail: impl Into<String>) {
        self.0.push(TableFault {
            line,
            detail: detail.into(),
        });
    }

    /// The result of a reading, unless there are faults.
    pub(super) fn or<T>(self, result: Option<T>) -> Result<T, Vec<TableFault>> {
        match result {
            Some(result) if self.0.is_empty() => Ok(result),
            _ => Err(self.0),
        }
    }

    pub(super) fn is_empty(&self) -> bool {
        self.0.is_empty()
    }
}
