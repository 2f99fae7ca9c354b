//! The reference page, written from the OpenAPI document and the lists behind it.

use std::sync::LazyLock;

use maud::{Markup, html};
use serde_json::Value;

use crate::case::{CODES, NoteCode};
use crate::http::openapi::document;
use crate::http::problem::ProblemKind;

use super::frame;

/// The page, written once.
pub fn docs() -> &'static str {
    static PAGE: LazyLock<String> = LazyLock::new(|| {
        // The document was written by this program.
        let document: Value = serde_json::from_str(document()).unwrap_or_default();
        frame("plumeline: reference", content(&document))
    });
    &PAGE
}

fn content(document: &Value) -> Markup {
    html! {
        h1 { "Reference" }
        p { (text(&document["info"]["description"])) }
        p { "Version " (text(&document["info"]["version"])) ". " a href="/openapi.json" { "OpenAPI document" } " · " a href="/" { "front page" } }
        h2 { "Calls" }
        @for tag in document["tags"].as_array().into_iter().flatten() {
            @for (path, verb, call) in calls(document).filter(|(_, _, call)| call["tags"][0] == tag["name"]) {
                (operation(path, verb, call))
            }
        }
        h2 { "Shapes" }
        @for (name, schema) in members(&document["components"]["schemas"]) { (shape(name, schema)) }
        h2 { "Notes" }
        p { "A note has a code, a severity (info, caution, warning), a text and the field it is about." }
        ul { @for code in NoteCode::TEXTS { li { code { (code) } } } }
        h2 { "Errors" }
        p { "Errors are problem details (RFC 9457). All faults of a request are told at once, each with a pointer." }
        table {
            tr { th { "type" } th { "status" } th { "meaning" } }
            @for &kind in ProblemKind::ALL {
                tr id={ "problem-" (kind.as_str()) } {
                    td { code { "/docs#problem-" (kind.as_str()) } }
                    td { (kind.status().as_u16()) }
                    td { (kind.title()) }
                }
            }
        }
        table {
            tr { th { "fault" } th { "meaning" } }
            @for (code, meaning) in CODES { tr { td { code { (code) } } td { (meaning) } } }
        }
    }
}

fn text(value: &Value) -> &str {
    value.as_str().unwrap_or_default()
}

fn members(value: &Value) -> impl Iterator<Item = (&String, &Value)> {
    value.as_object().into_iter().flatten()
}

fn calls(document: &Value) -> impl Iterator<Item = (&String, &String, &Value)> {
    members(&document["paths"])
        .flat_map(|(path, item)| members(item).map(move |(verb, call)| (path, verb, call)))
}

fn operation(path: &str, verb: &str, call: &Value) -> Markup {
    let parameters = call["parameters"].as_array().into_iter().flatten();
    let body = &call["requestBody"]["content"]["application/json"];
    html! {
        h3 id=(text(&call["operationId"])) { span.verb { (verb.to_uppercase()) } " " code { (path) } }
        p { (text(&call["summary"])) }
        @if let Some(description) = call["description"].as_str() { p { (description) } }
        @if let Some(name) = reference_name(&body["schema"]) { p { "Body: " a href={ "#" (name) } { (name) } } }
        @for (_, example) in members(&body["examples"]) {
            details {
                summary { (text(&example["summary"])) }
                pre { (serde_json::to_string_pretty(&example["value"]).unwrap_or_default()) }
            }
        }
        @if call["parameters"].is_array() {
            div.wide { table {
                tr { th { "parameter" } th { "meaning" } }
                @for parameter in parameters {
                    tr {
                        td { code { (text(&parameter["name"])) } @if parameter["required"] == true { " *" } }
                        td { (text(&parameter["description"])) }
                    }
                }
            } }
        }
        div.wide { table {
            tr { th { "status" } th { "meaning" } }
            @for (status, response) in members(&call["responses"]) {
                tr { td { (status) } td { (text(&response["description"])) } }
            }
        } }
    }
}

fn reference_name(schema: &Value) -> Option<&str> {
    schema["$ref"].as_str()?.rsplit('/').next()
}

fn shape(name: &str, schema: &Value) -> Markup {
    let required = schema["required"].as_array();
    let is_required =
        |member: &String| required.is_some_and(|all| all.iter().any(|one| one == member));
    html! {
        h3 id=(name) { code { (name) } }
        @if let Some(description) = schema["description"].as_str() { p { (description) } }
        @if schema["properties"].is_object() {
            div.wide { table {
                tr { th { "member" } th { "meaning" } th { "example" } }
                @for (member, schema) in members(&schema["properties"]) {
                    tr {
                        td { code { (member) } @if is_required(member) { " *" } }
                        td { (text(&schema["description"])) }
                        td { @if let Some(example) = example(schema) { code { (example) } } }
                    }
                }
            } }
        }
    }
}

fn example(schema: &Value) -> Option<String> {
    let shown = schema["examples"].get(0).or(schema.get("example"))?;
    Some(shown.to_string())
}
