//! The OpenAPI document: kept in the repository, complete and without dangling references.

use std::collections::BTreeSet;
use std::fs;
use std::path::Path;

use plumeline::geometry::Geometry;
use plumeline::http::document;
use serde_json::Value;

fn parsed() -> Value {
    serde_json::from_str(document()).unwrap()
}

/// Calls a visitor on every value of a document with its path.
fn walk(value: &Value, path: &str, visit: &mut impl FnMut(&str, &Value)) {
    visit(path, value);
    match value {
        Value::Object(members) => {
            for (name, member) in members {
                walk(member, &format!("{path}/{name}"), visit);
            }
        }
        Value::Array(items) => {
            for (index, item) in items.iter().enumerate() {
                walk(item, &format!("{path}/{index}"), visit);
            }
        }
        _ => {}
    }
}

/// `PLUMELINE_WRITE=1 cargo test` rewrites the file.
#[test]
fn the_kept_document_is_the_served_one() {
    let path = Path::new(env!("CARGO_MANIFEST_DIR")).join("openapi/openapi.json");
    if std::env::var_os("PLUMELINE_WRITE").is_some() {
        fs::write(&path, document()).unwrap();
    }
    let kept = fs::read_to_string(&path).unwrap_or_default();
    assert!(
        kept == document(),
        "openapi/openapi.json is not what the service serves: run PLUMELINE_WRITE=1 cargo test --test it openapi"
    );
}

#[test]
fn it_is_openapi_3_1() {
    assert!(parsed()["openapi"].as_str().unwrap().starts_with("3.1"));
}

#[test]
fn every_reference_resolves() {
    let document = parsed();
    let mut dangling = Vec::new();
    let mut count = 0;
    walk(&document, "#", &mut |path, value| {
        if let Some(reference) = value.get("$ref").and_then(Value::as_str) {
            count += 1;
            if document
                .pointer(reference.trim_start_matches('#'))
                .is_none()
            {
                dangling.push(format!("{path}: {reference}"));
            }
        }
    });
    assert!(count > 50, "only {count} references");
    assert!(dangling.is_empty(), "{}", dangling.join("\n"));
}

#[test]
fn every_member_has_a_meaning_and_an_example() {
    let document = parsed();
    let mut bare = Vec::new();
    for (name, schema) in document["components"]["schemas"].as_object().unwrap() {
        for (member, schema) in schema["properties"].as_object().into_iter().flatten() {
            let holds_others = schema.get("$ref").is_some()
                || schema["items"].get("$ref").is_some()
                || schema.to_string().contains("#/components/schemas/");
            let exempt = schema["type"] == "boolean";
            let said =
                schema["description"].is_string() || schema["oneOf"][0]["description"].is_string();
            if !said && schema.get("$ref").is_none() {
                bare.push(format!("{name}.{member} has no description"));
            }
            if schema["examples"].get(0).is_none()
                && schema.get("example").is_none()
                && !holds_others
                && !exempt
            {
                bare.push(format!("{name}.{member} has no example"));
            }
        }
    }
    assert!(bare.is_empty(), "{}", bare.join("\n"));
}

#[test]
fn every_body_has_an_example_that_is_answered() {
    let document = parsed();
    let content =
        &document["paths"]["/v1/film"]["post"]["requestBody"]["content"]["application/json"];
    let examples = content["examples"].as_object().unwrap();
    let named: BTreeSet<&str> = examples.keys().map(String::as_str).collect();
    assert_eq!(named, Geometry::TEXTS.iter().copied().collect());
    for (name, example) in examples {
        assert_eq!(example["value"]["geometry"], name.as_str());
        assert!(!example["summary"].as_str().unwrap().is_empty());
        crate::routes::assert_answered(&example["value"]);
    }
}

#[test]
fn closed_words_are_closed_and_open_words_open() {
    let document = parsed();
    let request = &document["components"]["schemas"]["FilmRequest"]["properties"];
    for closed in ["geometry", "facing", "extrapolate"] {
        assert!(request[closed]["enum"].is_array(), "{closed}");
    }
    for open in ["fluid", "method"] {
        let choices = request[open]["anyOf"].as_array().unwrap();
        assert!(
            choices.iter().any(|choice| choice["enum"].is_array()),
            "{open}"
        );
        assert!(
            choices.iter().any(|choice| choice.get("enum").is_none()),
            "{open}"
        );
    }
}

#[test]
fn operation_ids_are_unique() {
    let document = parsed();
    let mut ids = BTreeSet::new();
    for item in document["paths"].as_object().unwrap().values() {
        for call in item.as_object().unwrap().values() {
            let id = call["operationId"].as_str().unwrap().to_owned();
            assert!(ids.insert(id.clone()), "{id} stands twice");
        }
    }
}
