//! Operators' folders of tables.

use std::fs;
use std::path::{Path, PathBuf};
use std::process;

use super::*;

/// A folder of its own for one test, taken away with it.
struct Folder(PathBuf);

impl Folder {
    fn new(name: &str, files: &[(&str, &str)]) -> Self {
        let path = std::env::temp_dir().join(format!("fluids-{name}-{}", process::id()));
        fs::create_dir_all(&path).expect("a folder for the test");
        for (name, text) in files {
            fs::write(path.join(name), text).expect("a file for the test");
        }
        Self(path)
    }
}

impl Drop for Folder {
    fn drop(&mut self) {
        fs::remove_dir_all(&self.0).expect("the folder is the test's own");
    }
}

fn oil(id: &str) -> String {
    include_str!("../tables/transformer-oil.csv")
        .replace("# id: transformer-oil", &format!("# id: {id}"))
}

/// The faults of a folder, each from its file name on.
fn faults(folder: &Folder) -> Vec<String> {
    let faults = Fluids::with_folder(&folder.0).err().unwrap_or_default();
    let shown = faults.iter().map(ToString::to_string);
    shown
        .map(|fault| fault.replace(&format!("{}/", folder.0.display()), ""))
        .collect()
}

#[test]
fn tables_join_the_built_in_ones_by_name_of_file() {
    let folder = Folder::new(
        "join",
        &[
            ("b.csv", &oil("oil-a")),
            ("a.csv", &oil("oil-b")),
            ("c.txt", "not a table"),
        ],
    );
    let fluids = Fluids::with_folder(&folder.0).expect("tables");
    let ids: Vec<&str> = fluids.iter().map(|(_, fluid)| fluid.id()).collect();
    let built_in = Fluids::built_in();
    assert_eq!(
        ids[..15],
        built_in
            .iter()
            .map(|(_, fluid)| fluid.id())
            .collect::<Vec<_>>()
    );
    assert_eq!(ids[15..], ["oil-b", "oil-a"]);
    assert_ne!(fluids.digest(), built_in.digest());
    let added = fluids.find("oil-a").expect("an added fluid");
    assert_eq!(fluids.get(added).id(), "oil-a");
}

#[test]
fn an_empty_folder_adds_nothing() {
    let folder = Folder::new("empty", &[]);
    let fluids = Fluids::with_folder(&folder.0).expect("no tables");
    assert_eq!(fluids.digest(), Fluids::built_in().digest());
}

#[test]
fn all_faults_of_all_files_are_told() {
    let twice = oil("oil-a");
    let broken = oil("oil-b")
        .replace("892.5", "dense")
        .replace("# name", "# nmae");
    let folder = Folder::new(
        "faults",
        &[
            ("1.csv", &twice),
            ("2.csv", &twice),
            ("3.csv", &broken),
            ("4.csv", &oil("water")),
        ],
    );
    fs::write(folder.0.join("5.csv"), [0xff, 0xfe]).expect("a file for the test");
    fs::create_dir(folder.0.join("6.csv")).expect("a folder for the test");
    let faults = faults(&folder);
    assert_eq!(faults.len(), 7, "{faults:#?}");
    assert!(faults[0].starts_with("2.csv:1: there is a fluid \"oil-a\" already"));
    assert!(faults[1].starts_with("3.csv:2: unknown key \"nmae\""));
    assert!(faults[2].starts_with("3.csv:1: the header lacks"));
    assert!(faults[3].starts_with("3.csv:12: density"), "{}", faults[3]);
    assert!(faults[4].starts_with("4.csv:1: there is a fluid \"water\" already, liquid water"));
    assert!(faults[5].starts_with("5.csv: cannot be read"));
    assert!(faults[6].starts_with("6.csv: cannot be read"));
}

#[test]
fn a_missing_folder_is_told() {
    let faults = Fluids::with_folder(Path::new("no such folder")).err();
    let faults = faults.expect("a fault");
    assert_eq!(faults.len(), 1);
    assert!(
        faults[0]
            .to_string()
            .starts_with("no such folder: cannot be read")
    );
}
