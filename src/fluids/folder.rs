//! An operator's folder of tables.

use std::fs;
use std::io;
use std::path::{Path, PathBuf};
use std::sync::Arc;

use super::fault::FolderFault;
use super::fluid::Fluid;

/// The largest file that is read, in bytes: far more than any table of properties.
const LARGEST_FILE: u64 = 16 << 20;

/// Known fluids and those of a folder's `*.csv` files, see [`super::Fluids::with_folder`].
pub(super) fn read(
    folder: &Path,
    known: Vec<Arc<Fluid>>,
) -> Result<Vec<Arc<Fluid>>, Vec<FolderFault>> {
    let files = tables(folder).map_err(|error| vec![unreadable(folder, &error)])?;
    let mut fluids = known;
    let mut faults = Vec::new();
    for file in files {
        match read_file(&file) {
            Ok((text, fluid)) => match fluids.iter().find(|other| other.id() == fluid.id()) {
                Some(other) => faults.push(FolderFault {
                    file: shown(&file),
                    line: line_of_id(&text),
                    detail: format!(
                        "there is a fluid \"{}\" already, {}; choose another id",
                        other.id(),
                        other.name()
                    ),
                }),
                None => fluids.push(Arc::new(fluid)),
            },
            Err(mut found) => faults.append(&mut found),
        }
    }
    if faults.is_empty() {
        Ok(fluids)
    } else {
        Err(faults)
    }
}

fn tables(folder: &Path) -> io::Result<Vec<PathBuf>> {
    let mut files = Vec::new();
    for entry in fs::read_dir(folder)? {
        let path = entry?.path();
        if path.extension().is_some_and(|extension| extension == "csv") {
            files.push(path);
        }
    }
    files.sort();
    Ok(files)
}

fn read_file(file: &Path) -> Result<(String, Fluid), Vec<FolderFault>> {
    let at_fault = |error| vec![unreadable(file, &error)];
    let size = fs::metadata(file).map_err(at_fault)?.len();
    if size > LARGEST_FILE {
        let detail = format!("{size} bytes; a table has at most {LARGEST_FILE}");
        return Err(vec![FolderFault {
            file: shown(file),
            line: None,
            detail,
        }]);
    }
    let text = fs::read_to_string(file).map_err(at_fault)?;
    match Fluid::read(&text) {
        Ok(fluid) => Ok((text, fluid)),
        Err(faults) => Err(faults
            .into_iter()
            .map(|fault| FolderFault {
                file: shown(file),
                line: Some(fault.line),
                detail: fault.detail,
            })
            .collect()),
    }
}

fn unreadable(path: &Path, error: &io::Error) -> FolderFault {
    FolderFault {
        file: shown(path),
        line: None,
        detail: format!("cannot be read: {error}"),
    }
}

fn shown(path: &Path) -> String {
    path.display().to_string()
}

/// Where the header of a table names its id.
fn line_of_id(text: &str) -> Option<usize> {
    let names_id = |line: &str| {
        let comment = line.trim_start_matches('\u{feff}').strip_prefix('#');
        comment.is_some_and(|comment| comment.trim_start().starts_with("id:"))
    };
    text.lines().position(names_id).map(|index| index + 1)
}
