//! Free-convection heat loss of plant surfaces, by published methods, over HTTP.
//!
//! Data flows one way: text, quantity, case, fluid state and method, answer, text.
//! Everything between the two ends is plain values in SI.
//!
//! | module | what it owns |
//! |---|---|
//! | [`cli`] | what the program does |
//! | [`http`] | the service: routes, problems, pages, OpenAPI; the only module that knows HTTP |
//! | [`film`] | evaluates a block of cases: chooses the method, convection, radiation, notes |
//! | [`case`] | raw fields to a case or all its faults; answers and their columns; notes |
//! | [`methods`] | the registry of published methods, from dimensionless groups to Nusselt numbers |
//! | [`fluids`] | fluids as tables, and their state at a temperature and pressure |
//! | [`geometry`] | the bodies and the fields that each asks for |
//! | [`quantity`] | units: the only place with a conversion factor |
//! | [`config`] | flags and environment |
//! | [`log`] | the log on standard error |
//! | [`digest`] | digests of tables, registry, cases and answers |
//!
//! Modules import only from modules below them in this table; `methods` and `fluids` do not know each other.

pub mod case;
pub mod cli;
pub mod config;
pub mod digest;
pub mod film;
pub mod fluids;
pub mod geometry;
pub mod http;
pub mod log;
pub mod methods;
pub mod quantity;
