//! `/v1/fluids`: the fluids, and the state of one.

use std::collections::BTreeMap;

use axum::extract::rejection::PathRejection;
use axum::extract::{Path, State};
use axum::http::HeaderMap;
use axum::response::Response;
use serde::Serialize;
use utoipa::openapi::path::{Parameter, ParameterIn};
use utoipa::{IntoParams, ToSchema};

use crate::case::{Entries, Fault, Given, STANDARD_PRESSURE, read_conditions_alone, shown};
use crate::fluids::{Composition, Conditions, Fluid, StatedError};
use crate::geometry::Field;
use crate::http::answer::{PropertiesReply, property_units};
use crate::http::extract::{AcceptsJson, Query, read_query_quantity};
use crate::http::problem::{Problem, ProblemBody, ProblemKind};
use crate::http::reply::{json, tagged};
use crate::http::schema::{Properties, field_schema, parameter, quantity_parameter};
use crate::http::service::Service;
use crate::quantity::{Kind, UnitChoice, nearest};

/// All fluids.
#[derive(Serialize, ToSchema)]
pub struct FluidList<'a> {
    /// Every one of them, in a fixed order.
    fluids: Vec<FluidView<'a>>,
}

/// One fluid.
#[derive(Serialize, ToSchema)]
#[schema(as = Fluid)]
pub struct FluidView<'a> {
    /// Its id in requests.
    #[schema(example = "air")]
    id: &'a str,
    /// Plain words.
    #[schema(example = "dry air")]
    name: &'a str,
    /// gas or liquid.
    #[schema(example = "gas")]
    phase: &'static str,
    /// Where its properties come from.
    #[schema(example = "Lemmon et al. 2000; Lemmon and Jacobsen 2004")]
    source: &'a str,
    /// Remarks on its table.
    #[schema(example = json!([]))]
    notes: &'a [String],
    /// Lowest temperature of the table, K.
    #[schema(example = 150.0)]
    minimum_temperature: f64,
    /// Highest temperature of the table, K.
    #[schema(example = 1500.0)]
    maximum_temperature: f64,
    /// How the table serves pressures: layers, ideal-gas, incompressible or along-saturation.
    #[schema(example = "layers")]
    pressure_rule: &'static str,
    /// The rule in words, with the pressures served.
    #[schema(example = "tabulated from 30000 Pa to 1000000 Pa")]
    pressure_range: String,
    /// Freezing point, K; null where none is known.
    #[schema(example = 273.15)]
    freezing: Option<f64>,
    /// Boiling point at 101325 Pa, K; null where none is known.
    #[schema(example = 373.12)]
    saturation: Option<f64>,
    /// Flash point, K; null where none is known.
    #[schema(example = 408.15)]
    flash_point: Option<f64>,
    /// Temperature of the greatest density, K; null where there is none in the table.
    #[schema(example = 277.13)]
    density_maximum: Option<f64>,
    /// What the composition of a mixture is given by; null for a pure fluid.
    composition: Option<CompositionView<'a>>,
    /// Number of temperatures in the table.
    #[schema(example = 136)]
    rows: usize,
    /// Largest deviation between rows from the source, fractions; null where the source is the rows themselves.
    interpolation_error: Option<ErrorView>,
    /// Largest deviation of the pressure rule over its range, fractions; null where not stated.
    pressure_error: Option<ErrorView>,
}

/// What the composition of a mixture is given by.
#[derive(Serialize, ToSchema)]
#[schema(as = FluidComposition)]
pub struct CompositionView<'a> {
    /// The field that gives it: concentration or relative_humidity.
    #[schema(example = "concentration")]
    field: &'static str,
    /// What the fraction is of.
    #[schema(example = "ethylene glycol")]
    of: &'a str,
    /// Smallest value.
    #[schema(example = 0.1)]
    minimum: f64,
    /// Largest value.
    #[schema(example = 0.6)]
    maximum: f64,
}

impl<'a> CompositionView<'a> {
    fn new(composition: &'a Composition) -> Option<Self> {
        match composition {
            Composition::Pure => None,
            Composition::MassFraction {
                of,
                minimum,
                maximum,
            } => Some(CompositionView {
                field: Field::Concentration.name(),
                of,
                minimum: *minimum,
                maximum: *maximum,
            }),
            Composition::Humidity => Some(CompositionView {
                field: Field::RelativeHumidity.name(),
                of: "water vapour at the ambient temperature",
                minimum: 0.0,
                maximum: 1.0,
            }),
        }
    }
}

/// Largest deviations of a fluid's properties, fractions.
#[derive(Serialize, ToSchema)]
#[schema(as = StatedError)]
pub struct ErrorView {
    /// Of density.
    #[schema(example = 0.0001)]
    density: f64,
    /// Of specific heat.
    #[schema(example = 0.0001)]
    specific_heat: f64,
    /// Of viscosity.
    #[schema(example = 0.0001)]
    viscosity: f64,
    /// Of conductivity.
    #[schema(example = 0.0001)]
    conductivity: f64,
    /// Of expansion.
    #[schema(example = 0.0001)]
    expansion: f64,
}

impl ErrorView {
    fn new(stated: StatedError) -> Self {
        let StatedError {
            density,
            specific_heat,
            viscosity,
            conductivity,
            expansion,
        } = stated;
        ErrorView {
            density,
            specific_heat,
            viscosity,
            conductivity,
            expansion,
        }
    }
}

impl<'a> FluidView<'a> {
    fn new(fluid: &'a Fluid) -> Self {
        let (minimum_temperature, maximum_temperature) = fluid.temperatures();
        let conditions = Conditions::pure(STANDARD_PRESSURE);
        let limits = fluid.limits_at(&conditions);
        FluidView {
            id: fluid.id(),
            name: fluid.name(),
            phase: fluid.phase().name(),
            source: fluid.source(),
            notes: fluid.notes(),
            minimum_temperature,
            maximum_temperature,
            pressure_rule: fluid.pressure_rule().name(),
            pressure_range: fluid.pressure_rule().to_string(),
            freezing: limits.freezing,
            saturation: fluid.saturation_temperature(&conditions),
            flash_point: limits.flash_point,
            density_maximum: fluid.density_maximum(&conditions),
            composition: CompositionView::new(fluid.composition()),
            rows: fluid.nodes(),
            interpolation_error: fluid.interpolation_error().map(ErrorView::new),
            pressure_error: fluid.pressure_error().map(ErrorView::new),
        }
    }
}

/// All fluids, with sources, limits and stated errors.
#[utoipa::path(
    get, path = "/v1/fluids", operation_id = "list_fluids", tag = "catalogue",
    responses((status = 200, description = "all fluids", body = FluidList))
)]
pub async fn list_fluids(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    let fluids = service
        .fluids
        .iter()
        .map(|(_, fluid)| FluidView::new(fluid))
        .collect();
    Ok(tagged(json(&FluidList { fluids })?, &headers))
}

/// A fluid at one temperature and pressure.
#[derive(Serialize, ToSchema)]
pub struct FluidState<'a> {
    /// The fluid's id.
    #[schema(example = "air")]
    fluid: &'a str,
    /// Temperature, K.
    #[schema(example = 300.0)]
    temperature: f64,
    /// Absolute pressure, Pa.
    #[schema(example = 101325.0)]
    pressure: f64,
    /// Mass fraction of a mixture's named part, humidity ratio of air in kg/kg; 0 for pure fluids.
    #[schema(example = 0.0)]
    composition: f64,
    /// The properties, SI.
    #[schema(value_type = Properties)]
    properties: PropertiesReply<'a>,
    /// The unit of each property that has one.
    #[schema(example = json!({"density": "kg/m3"}))]
    units: BTreeMap<&'static str, &'static str>,
}

/// What a state depends on beside its temperature.
const CONDITIONS: [Field; 4] = [
    Field::Pressure,
    Field::Altitude,
    Field::Concentration,
    Field::RelativeHumidity,
];

/// The parameters of a state.
pub struct StateQuery;

impl IntoParams for StateQuery {
    fn into_params(_: impl Fn() -> Option<ParameterIn>) -> Vec<Parameter> {
        let temperature = quantity_parameter(
            "temperature",
            "temperature of the fluid",
            true,
            Kind::Temperature,
        );
        let others = CONDITIONS
            .map(|field| parameter(field.name(), field.entry().text, false, field_schema(field)));
        [temperature].into_iter().chain(others).collect()
    }
}

/// The properties of a fluid at a temperature and a pressure.
#[utoipa::path(
    get, path = "/v1/fluids/{id}/state", operation_id = "read_fluid_state", tag = "catalogue",
    params(
        ("id" = String, Path, description = "one of the ids of /v1/fluids", example = "air"),
        StateQuery,
    ),
    responses(
        (status = 200, description = "the properties", body = FluidState),
        (status = 404, description = "no fluid has this id", body = ProblemBody, content_type = "application/problem+json"),
        (status = 422, description = "the query has faults, or the fluid is not known there", body = ProblemBody, content_type = "application/problem+json"),
    )
)]
pub async fn read_fluid_state(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    id: Result<Path<String>, PathRejection>,
    query: Query,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    // An id that is not UTF-8 names no fluid.
    let id = id.map(|Path(id)| id).unwrap_or_default();
    let Some(fluid) = service.fluids.find(&id).map(|id| service.fluids.get(id)) else {
        return Err(unknown_fluid(&id, service));
    };
    let mut faults = Vec::new();
    let names = CONDITIONS.map(Field::name);
    let [temperature, given @ ..] = query.read_named(
        ["temperature", names[0], names[1], names[2], names[3]],
        &mut faults,
    );
    let temperature = match temperature {
        Some(text) => read_query_quantity("temperature", Kind::Temperature, &text, &mut faults),
        None => {
            faults.push(Fault::under(
                &["temperature"],
                "missing-field",
                "temperature is not given; for example temperature=300 or temperature=20 degC",
            ));
            None
        }
    };
    let mut entries = Entries::default();
    for (field, text) in CONDITIONS.into_iter().zip(given) {
        let value = text.filter(|text| !text.is_empty()).map(Given::Text);
        faults.extend(entries.put(field.name(), value, &[]).err());
    }
    let conditions =
        read_conditions_alone(&entries, service.fluids, fluid, temperature, &mut faults);
    let (Some(temperature), Some(conditions), []) = (temperature, conditions, faults.as_slice())
    else {
        return Err(Problem::invalid(faults));
    };
    match fluid.state(temperature, &conditions) {
        Ok(state) => {
            let reply = FluidState {
                fluid: fluid.id(),
                temperature,
                pressure: conditions.pressure,
                composition: conditions.composition,
                properties: PropertiesReply {
                    state: &state,
                    units: &UnitChoice::default(),
                },
                units: property_units(&UnitChoice::default()).collect(),
            };
            Ok(tagged(json(&reply)?, &headers))
        }
        Err(error) => Err(Problem::invalid(vec![Fault::under(
            &["temperature"],
            "outside-table",
            format!(
                "{} at {temperature} K and {} Pa: {error}",
                fluid.id(),
                conditions.pressure
            ),
        )])),
    }
}

fn unknown_fluid(id: &str, service: Service) -> Problem {
    let known = service.fluids.iter().map(|(_, fluid)| fluid.id());
    let hint = match nearest(id, known) {
        Some(near) => format!("did you mean {near}?"),
        None => "they are listed in /v1/fluids".to_owned(),
    };
    Problem::new(
        ProblemKind::NotFound,
        format!("there is no fluid {}; {hint}", shown(id)),
    )
}
