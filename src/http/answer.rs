//! An answer in JSON, written from the list of columns.

use std::sync::LazyLock;

use serde::ser::{Serialize, SerializeMap, SerializeSeq, Serializer};
use serde_json::value::{RawValue, to_raw_value};

use crate::case::{Answer, Case, Cell, Column, Notes, PROPERTIES};
use crate::film::{alternatives, basis, note};
use crate::fluids::{Fluids, State};
use crate::methods::{MethodId, registry_digest};
use crate::quantity::{Kind, UnitChoice};

/// Everything that a single answer is written from.
pub struct FilmReply<'a> {
    /// The case.
    pub case: &'a Case,
    /// Its answer.
    pub answer: &'a Answer,
    /// The fluids it was found with.
    pub fluids: &'a Fluids,
    /// Units of the answer.
    pub units: &'a UnitChoice,
    /// The caller's label.
    pub id: Option<&'a str>,
}

impl Serialize for FilmReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let mut map = serializer.serialize_map(None)?;
        if let Some(id) = self.id {
            map.serialize_entry("id", id)?;
        }
        for &column in Column::ALL {
            let entry = column.entry();
            match (entry.cell)(self.answer) {
                Cell::Number(value) => {
                    let kind = entry.holds.kind().unwrap_or(Kind::Number);
                    let unit = self.units.unit(entry.name, kind);
                    map.serialize_entry(entry.name, &value.map(|value| unit.from_si(value)))?;
                }
                Cell::Word(word) => map.serialize_entry(entry.name, word)?,
                Cell::Notes(notes) => {
                    map.serialize_entry(entry.name, &NotesReply { reply: self, notes })?
                }
            }
        }
        map.serialize_entry(
            "properties",
            &PropertiesReply {
                state: &self.answer.state,
                units: self.units,
            },
        )?;
        map.serialize_entry("alternatives", &AlternativesReply(self))?;
        map.serialize_entry("source", source(self.answer.method))?;
        map.serialize_entry("basis", &basis(self.case, self.answer, self.fluids))?;
        if *self.units == UnitChoice::default() {
            map.serialize_entry("units", &**SI_UNITS)?;
        } else {
            map.serialize_entry("units", &UnitsReply(self.units))?;
        }
        map.serialize_entry(
            "provenance",
            &ProvenanceReply {
                fluids: self.fluids,
                case: Some(self.case),
            },
        )?;
        map.end()
    }
}

struct NotesReply<'a> {
    reply: &'a FilmReply<'a>,
    notes: Notes,
}

impl Serialize for NotesReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let reply = self.reply;
        let mut seq = serializer.serialize_seq(None)?;
        for code in self.notes.iter() {
            let note = note(code, reply.case, reply.answer, reply.fluids);
            seq.serialize_element(&NoteReply {
                code: note.code.as_str(),
                severity: note.severity.as_str(),
                text: &note.text,
                field: note.field.map(|field| field.name()),
            })?;
        }
        seq.end()
    }
}

#[derive(serde::Serialize)]
struct NoteReply<'a> {
    code: &'static str,
    severity: &'static str,
    text: &'a str,
    field: Option<&'static str>,
}

/// A fluid's properties by name.
pub struct PropertiesReply<'a> {
    /// The properties in SI.
    pub state: &'a State,
    /// The units to write them in.
    pub units: &'a UnitChoice,
}

impl Serialize for PropertiesReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let mut map = serializer.serialize_map(Some(PROPERTIES.len()))?;
        for property in PROPERTIES {
            let unit = self.units.unit(property.name, property.kind);
            map.serialize_entry(property.name, &unit.from_si((property.of)(self.state)))?;
        }
        map.end()
    }
}

struct AlternativesReply<'a>(&'a FilmReply<'a>);

impl Serialize for AlternativesReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        #[derive(serde::Serialize)]
        struct AlternativeReply {
            method: &'static str,
            nusselt: f64,
            heat_transfer_coefficient: f64,
            range_status: &'static str,
        }
        let FilmReply {
            case,
            answer,
            fluids,
            units,
            ..
        } = *self.0;
        let column = Column::HeatTransferCoefficient.entry();
        let unit = units.unit(
            column.name,
            column.holds.kind().unwrap_or(Kind::Coefficient),
        );
        serializer.collect_seq(alternatives(case, answer, fluids).iter().map(|other| {
            AlternativeReply {
                method: other.method.as_str(),
                nusselt: other.nusselt,
                heat_transfer_coefficient: unit.from_si(other.heat_transfer_coefficient),
                range_status: other.range_status.as_str(),
            }
        }))
    }
}

/// Where a method was published, and its formula; written once for each method.
fn source(id: MethodId) -> &'static RawValue {
    static WRITTEN: LazyLock<Vec<Box<RawValue>>> = LazyLock::new(|| {
        let write = |id: &MethodId| {
            let method = id.method();
            written(&SourceReply {
                authors: method.source.authors,
                year: method.source.year,
                work: method.source.work,
                locator: method.source.locator,
                formula: method.formula,
            })
        };
        MethodId::ALL.iter().map(write).collect()
    });
    &WRITTEN[id as usize]
}

#[derive(serde::Serialize)]
struct SourceReply {
    authors: &'static str,
    year: u16,
    work: &'static str,
    locator: &'static str,
    formula: &'static str,
}

/// JSON that is the same in every answer.
fn written(value: &impl Serialize) -> Box<RawValue> {
    to_raw_value(value).expect("texts and whole numbers are always written")
}

/// The units of an answer in SI, written once.
static SI_UNITS: LazyLock<Box<RawValue>> =
    LazyLock::new(|| written(&UnitsReply(&UnitChoice::default())));

/// The unit of every figure of an answer that has one.
struct UnitsReply<'a>(&'a UnitChoice);

impl Serialize for UnitsReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let columns = Column::ALL.iter().filter_map(|column| {
            let entry = column.entry();
            let kind = entry.holds.kind().filter(|&kind| kind != Kind::Number)?;
            Some((entry.name, self.0.unit(entry.name, kind).symbol()))
        });
        serializer.collect_map(columns.chain(property_units(self.0)))
    }
}

/// The unit of every property that has one.
pub fn property_units(units: &UnitChoice) -> impl Iterator<Item = (&'static str, &'static str)> {
    let with_units = PROPERTIES
        .iter()
        .filter(|property| property.kind != Kind::Number);
    with_units.map(|property| {
        (
            property.name,
            units.unit(property.name, property.kind).symbol(),
        )
    })
}

/// What an answer rests on.
pub struct ProvenanceReply<'a> {
    /// The fluids.
    pub fluids: &'a Fluids,
    /// The case, where there is one.
    pub case: Option<&'a Case>,
}

impl Serialize for ProvenanceReply<'_> {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let mut map = serializer.serialize_map(None)?;
        map.serialize_entry("service_version", env!("CARGO_PKG_VERSION"))?;
        map.serialize_entry("tables_digest", self.fluids.digest())?;
        map.serialize_entry("registry_digest", registry_digest())?;
        if let Some(case) = self.case {
            map.serialize_entry("case_digest", &case.digest(self.fluids))?;
        }
        map.end()
    }
}
