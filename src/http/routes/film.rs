//! `/v1/film`: one case, one answer.

use std::borrow::Cow;

use axum::extract::State;
use axum::http::HeaderMap;
use axum::response::{IntoResponse, Response};
use utoipa::IntoParams;
use utoipa::openapi::path::{Parameter, ParameterIn};
use utoipa::openapi::{ObjectBuilder, Type};

use crate::case::{Answer, Case, Cell, Column, Entries, Fault, Given, Wanted};
use crate::film::evaluate;
use crate::fluids::Fluids;
use crate::geometry::Field;
use crate::http::answer::FilmReply;
use crate::http::extract::{AcceptsJson, FilmInput, JsonBody, Query, QueryOptions, read_film_body};
use crate::http::problem::{Problem, ProblemBody};
use crate::http::reply::{Body, internal, json, tagged, text};
use crate::http::schema::{FilmAnswer, FilmRequest, field_schema, parameter};
use crate::http::service::Service;
use crate::quantity::{Kind, Unit, UnitChoice, number_text};

/// Answer one case.
#[utoipa::path(
    post, path = "/v1/film", operation_id = "create_film", tag = "film",
    description = "Coefficient, heat flows, alternatives and notes for one surface in one fluid.",
    request_body(content = FilmRequest, description = "the case"),
    responses(
        (status = 200, description = "the answer", body = FilmAnswer),
        (status = 400, description = "the body is not JSON", body = ProblemBody, content_type = "application/problem+json"),
        (status = 406, description = "the caller does not accept JSON", body = ProblemBody, content_type = "application/problem+json"),
        (status = 408, description = "the body did not arrive in time", body = ProblemBody, content_type = "application/problem+json"),
        (status = 413, description = "the body is too large", body = ProblemBody, content_type = "application/problem+json"),
        (status = 415, description = "the body is not application/json", body = ProblemBody, content_type = "application/problem+json"),
        (status = 422, description = "the case has faults, all of them told", body = ProblemBody, content_type = "application/problem+json"),
    )
)]
pub async fn create_film(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    JsonBody(bytes): JsonBody,
) -> Result<Response, Problem> {
    let mut input = read_film_body(&bytes)?;
    let solved = solve(&mut input, service, Wanted::ALL)?;
    Ok(json(&solved.reply(&input))?.into_response())
}

/// The parameters of `GET /v1/film`.
pub struct FilmQuery;

impl IntoParams for FilmQuery {
    fn into_params(_: impl Fn() -> Option<ParameterIn>) -> Vec<Parameter> {
        let fields = Field::ALL.iter().map(|&field| {
            let required = matches!(field, Field::Geometry | Field::AmbientTemperature);
            parameter(
                field.name(),
                field.entry().text,
                required,
                field_schema(field),
            )
        });
        let texts = [
            (
                "units",
                "units of bare numbers, by kind or field",
                "temperature:degC,length:mm",
            ),
            (
                "answer_units",
                "units of the answer, by kind or figure",
                "temperature:degC,heat_flow:kW",
            ),
            (
                "want",
                "figures wanted as bare text/plain: one number, or one line with commas",
                "heat_transfer_coefficient",
            ),
            ("as", "unit of the one figure wanted", "W/(m2 K)"),
        ];
        let options = texts.map(|(name, text, example)| {
            let schema = ObjectBuilder::new()
                .schema_type(Type::String)
                .examples([example]);
            parameter(name, text, false, schema)
        });
        fields.chain(options).collect()
    }
}

/// Answer one case from a query, whole or as a bare figure.
#[utoipa::path(
    get, path = "/v1/film", operation_id = "read_film", tag = "film",
    description = "The same as POST /v1/film from a query. With want= the answer is plain text for a cell of a calculation sheet. errors=cell turns an error into a short text with status 200, for sheets that show nothing of a refused call.",
    params(FilmQuery),
    responses(
        (status = 200, description = "the answer, or the figures wanted", content(
            (FilmAnswer = "application/json"),
            (String = "text/plain", example = "7.409912"),
        )),
        (status = 304, description = "the answer is the one that If-None-Match names"),
        (status = 406, description = "the caller does not accept JSON", body = ProblemBody, content_type = "application/problem+json"),
        (status = 422, description = "the case has faults, all of them told", body = ProblemBody, content_type = "application/problem+json"),
    )
)]
pub async fn read_film(
    State(service): State<Service>,
    accepts: Result<AcceptsJson, Problem>,
    query: Query,
    headers: HeaderMap,
) -> Response {
    let (mut input, options) = query.read_film();
    match answer_query(&mut input, &options, service, accepts) {
        Ok(body) => tagged(body, &headers),
        Err(problem) if query.wants_error_cells() => text(problem.cell_text()).into_response(),
        Err(problem) => problem.into_response(),
    }
}

fn answer_query(
    input: &mut FilmInput,
    options: &QueryOptions,
    service: Service,
    accepts: Result<AcceptsJson, Problem>,
) -> Result<Body, Problem> {
    let unit = read_unit(options, &mut input.faults);
    let wanted = if options.want.is_empty() {
        Wanted::ALL
    } else {
        Wanted::of(&options.want)
    };
    let solved = solve(input, service, wanted)?;
    if options.want.is_empty() {
        accepts?;
        return json(&solved.reply(input));
    }
    let cells = options.want.iter().map(|&column| {
        let unit = unit.unwrap_or_else(|| column_unit(column, &input.answer_units));
        cell_text((column.entry().cell)(&solved.answer), unit)
    });
    Ok(text(cells.collect::<Vec<_>>().join(",")))
}

fn column_unit(column: Column, units: &UnitChoice) -> Unit {
    units.unit(
        column.name(),
        column.entry().holds.kind().unwrap_or(Kind::Number),
    )
}

/// The unit of `as`, which goes with one figure that has units.
fn read_unit(options: &QueryOptions, faults: &mut Vec<Fault>) -> Option<Unit> {
    let symbol = options.unit.as_deref()?;
    let kind = match options.want.as_slice() {
        [column] => column.entry().holds.kind(),
        _ => None,
    };
    let Some(kind) = kind else {
        faults.push(Fault::under(
            &["as"],
            "unexpected-field",
            "as is given, but want does not name one figure that has a unit; name one, or use answer_units",
        ));
        return None;
    };
    match Unit::find(kind, symbol) {
        Ok(unit) => Some(unit),
        Err(error) => {
            faults.push(Fault::under(&["as"], error.code(), format!("as: {error}")));
            None
        }
    }
}

fn cell_text(cell: Cell, unit: Unit) -> String {
    match cell {
        Cell::Number(value) => {
            value.map_or_else(String::new, |value| number_text(unit.from_si(value)))
        }
        Cell::Word(word) => word.to_owned(),
        Cell::Notes(notes) => notes
            .iter()
            .map(|code| code.as_str())
            .collect::<Vec<_>>()
            .join(";"),
    }
}

/// A case with its answer and the fluids it was found with.
struct Solved {
    case: Case,
    answer: Answer,
    fluids: Cow<'static, Fluids>,
}

impl Solved {
    fn reply<'a>(&'a self, input: &'a FilmInput) -> FilmReply<'a> {
        FilmReply {
            case: &self.case,
            answer: &self.answer,
            fluids: &self.fluids,
            units: &input.answer_units,
            id: label(&input.entries),
        }
    }
}

/// Makes a case of the input and evaluates it as a block of one.
fn solve(input: &mut FilmInput, service: Service, wanted: Wanted) -> Result<Solved, Problem> {
    let mut faults = std::mem::take(&mut input.faults);
    if input.unread {
        return Err(Problem::invalid(faults));
    }
    let fluids = match input.own_fluid.take() {
        Some(own) => Cow::Owned(service.fluids.with_own(own).0),
        None => Cow::Borrowed(service.fluids),
    };
    let case = match Case::read(&input.entries, &input.units, &fluids) {
        Ok(case) if faults.is_empty() => case,
        read => {
            let found = read.err().unwrap_or_default();
            // A table that is not in order has been told already.
            let told = |fault: &Fault| input.bad_own_fluid && fault.pointer == "#/fluid";
            faults.extend(found.into_iter().filter(|fault| !told(fault)));
            return Err(Problem::invalid(faults));
        }
    };
    let mut outcomes = Vec::with_capacity(1);
    evaluate(&[case], &fluids, wanted, &mut outcomes);
    match outcomes.pop() {
        Some(Ok(answer)) => Ok(Solved {
            case,
            answer,
            fluids,
        }),
        Some(Err(failure)) => Err(Problem::invalid(vec![failure.fault(&case, &fluids)])),
        None => Err(internal("no outcome")),
    }
}

fn label<'a>(entries: &'a Entries) -> Option<&'a str> {
    match entries.get(Field::Id) {
        Some(Given::Text(text)) => Some(text),
        _ => None,
    }
}
