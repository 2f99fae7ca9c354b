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

/// What is wrong with an operator's folder of tables, and where.
#[derive(Clone, PartialEq, Eq, Debug)]
pub struct FolderFault {
    /// The file, or the folder itself.
    pub file: String,
    /// Counted from 1; none where the whole file is at fault.
    pub line: Option<usize>,
    /// What is wrong and what would do.
    pub detail: String,
}

impl fmt::Display for FolderFault {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        let Self { file, line, detail } = self;
        match line {
            Some(line) => write!(out, "{file}:{line}: {detail}"),
            None => write!(out, "{file}: {detail}"),
        }
    }
}

/// What is wrong with a caller's own table, and where.
#[derive(Clone, PartialEq, Eq, Debug)]
pub struct OwnFault {
    /// The field of [`super::OwnTable`].
    pub column: &'static str,
    /// Counted from 0 as the caller wrote them; none where the whole column is at fault.
    pub row: Option<usize>,
    /// What is wrong and what would do.
    pub detail: String,
}

impl fmt::Display for OwnFault {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        let Self {
            column,
            row,
            detail,
        } = self;
        match row {
            Some(row) => write!(out, "{column}, row {row}: {detail}"),
            None => write!(out, "{column}: {detail}"),
        }
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
