//! From raw fields to a case or to all its faults; answers and notes.

mod answer;
mod entries;
mod fault;
mod fields;
mod fluid_check;
mod form;
mod model;
mod note;
mod parts;
mod size;

pub use answer::{
    Answer, Cell, Column, ColumnEntry, ColumnType, DraughtResult, Heat, PROPERTIES, Property,
    Regime, Wanted, answer_kinds,
};
pub use entries::{Entries, Given, duplicate_field, shown, unknown_field};
pub use fault::{CODES, Fault, pointer};
pub use fields::Fields;
pub use model::{Case, Draught, STANDARD_GRAVITY, STANDARD_PRESSURE, Surface};
pub use note::{NoteCode, Notes, Severity};
pub use parts::read_conditions_alone;
pub use size::{Across, Flow, Size};
