//! What the schemas of requests and answers share.

use serde_json::{Value, json};
use utoipa::openapi::schema::{AnyOfBuilder, ObjectBuilder, Schema, SchemaType, Type};
use utoipa::openapi::{Ref, RefOr};

use crate::methods::MethodId;
use crate::quantity::Kind;

/// A list of schemas with their names, as utoipa collects them.
pub(super) type Schemas = Vec<(String, RefOr<Schema>)>;

pub(super) fn types(types: &[Type]) -> SchemaType {
    SchemaType::Array(types.to_vec())
}

pub(super) fn reference(name: &str) -> RefOr<Schema> {
    RefOr::Ref(Ref::from_schema_name(name))
}

/// The name of a kind's schema: `heat_flow` is `HeatFlow`.
pub(super) fn kind_schema_name(kind: Kind) -> String {
    kind.name()
        .split('_')
        .map(|word| word[..1].to_uppercase() + &word[1..])
        .collect()
}

/// A closed set of words; with `null` where a request may leave it out.
pub(super) fn closed(words: &[&str], nullable: bool) -> ObjectBuilder {
    let mut values: Vec<Value> = words.iter().map(|word| json!(word)).collect();
    let mut kinds = vec![Type::String];
    if nullable {
        values.push(Value::Null);
        kinds.push(Type::Null);
    }
    ObjectBuilder::new()
        .schema_type(types(&kinds))
        .enum_values(Some(values))
}

/// A set of words that may grow.
pub(super) fn open<'a>(words: impl Iterator<Item = &'a str>, nullable: bool) -> AnyOfBuilder {
    let known: Vec<&str> = words.collect();
    let free = if nullable {
        types(&[Type::String, Type::Null])
    } else {
        types(&[Type::String])
    };
    AnyOfBuilder::new()
        .item(closed(&known, false).build())
        .item(ObjectBuilder::new().schema_type(free).build())
}

pub(super) fn method_ids() -> impl Iterator<Item = &'static str> {
    MethodId::TEXTS.iter().copied()
}

pub(super) fn example(text: &str) -> Value {
    // Examples in the lists are JSON, which a test proves.
    serde_json::from_str(text).unwrap_or_default()
}

pub(super) fn described(schema: AnyOfBuilder, text: &str, example: Value) -> RefOr<Schema> {
    schema.description(Some(text)).examples([example]).into()
}
