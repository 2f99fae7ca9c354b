//! Imports point one way.

use std::collections::BTreeMap;
use std::fs;
use std::path::{Path, PathBuf};

/// What each module may import from; a module may always use itself.
const LAYERS: &[(&str, &[&str])] = &[
    ("cli", &["config", "fluids", "geometry", "http"]),
    (
        "http",
        &[
            "case", "digest", "film", "fluids", "geometry", "log", "methods", "quantity",
        ],
    ),
    (
        "film",
        &["case", "fluids", "geometry", "methods", "quantity"],
    ),
    (
        "case",
        &["digest", "fluids", "geometry", "methods", "quantity"],
    ),
    ("methods", &["digest", "geometry"]),
    ("fluids", &["digest"]),
    ("geometry", &["quantity"]),
    ("quantity", &[]),
    ("config", &[]),
    ("digest", &[]),
    ("log", &[]),
];

#[test]
fn imports_point_down() {
    let allowed: BTreeMap<_, _> = LAYERS.iter().copied().collect();
    let root = Path::new(env!("CARGO_MANIFEST_DIR")).join("src");
    let mut breaches = Vec::new();
    let mut seen = 0;
    for file in rust_files(&root) {
        let module = module_of(&root, &file);
        if module == "lib" || module == "main" {
            continue;
        }
        let Some(below) = allowed.get(module.as_str()) else {
            breaches.push(format!("{module} is in no layer"));
            continue;
        };
        let text = fs::read_to_string(&file).unwrap();
        for (number, line) in text.lines().enumerate() {
            for imported in crate_paths(line) {
                seen += 1;
                if imported != module && !below.contains(&imported.as_str()) {
                    let place = file.strip_prefix(&root).unwrap().display();
                    breaches.push(format!(
                        "{place}:{}: {module} imports {imported}",
                        number + 1
                    ));
                }
            }
        }
    }
    assert!(seen > 50, "only {seen} imports were found");
    assert!(breaches.is_empty(), "{}", breaches.join("\n"));
}

fn rust_files(folder: &Path) -> Vec<PathBuf> {
    let mut files = Vec::new();
    for entry in fs::read_dir(folder).unwrap() {
        let path = entry.unwrap().path();
        if path.is_dir() {
            files.extend(rust_files(&path));
        } else if path.extension().is_some_and(|extension| extension == "rs") {
            files.push(path);
        }
    }
    files
}

/// The first part of a file's path below the root, without its ending.
fn module_of(root: &Path, file: &Path) -> String {
    let first = file
        .strip_prefix(root)
        .unwrap()
        .components()
        .next()
        .unwrap();
    let name = first.as_os_str().to_string_lossy().into_owned();
    name.trim_end_matches(".rs").to_owned()
}

/// The modules that a line names after `crate::`.
fn crate_paths(line: &str) -> impl Iterator<Item = String> {
    let code = line.split("//").next().unwrap_or_default();
    code.split("crate::").skip(1).map(|rest| {
        rest.chars()
            .take_while(|c| c.is_ascii_alphanumeric() || *c == '_')
            .collect()
    })
}
