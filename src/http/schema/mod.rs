//! OpenAPI schemas written from the lists that compute: fields, columns, kinds, notes and ids.

mod answer;
mod parts;
mod request;

pub use answer::{FilmAnswer, Properties, fault_code};
pub use request::{FilmRequest, field_schema, parameter, quantity_parameter};
