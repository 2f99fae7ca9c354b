//! Requests that earn no note about their method, to be changed.

use serde_json::{Value, json};

use crate::support::request;

/// A request with the members of another on top; null takes one away.
pub fn with(base: &Value, changes: &Value) -> Value {
    let mut merged = request(base.clone());
    merged.extend(request(changes.clone()));
    Value::Object(merged)
}

/// A bare pipe in a room.
pub fn pipe() -> Value {
    json!({
        "geometry": "horizontal-cylinder", "diameter": "88.9 mm", "emissivity": 0.9,
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}

/// A wall.
pub fn wall() -> Value {
    json!({
        "geometry": "vertical-plate", "height": "3 m", "emissivity": 0.9,
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}

/// An upright pipe.
pub fn riser() -> Value {
    json!({
        "geometry": "vertical-cylinder", "diameter": "60 mm", "height": "2 m", "emissivity": 0.9,
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}

/// A ball.
pub fn ball() -> Value {
    json!({
        "geometry": "sphere", "diameter": "1 m", "emissivity": 0.9,
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}

/// A level face.
pub fn lid() -> Value {
    json!({
        "geometry": "horizontal-plate", "facing": "up", "length": "1 m", "width": "1 m",
        "emissivity": 0.9, "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}

/// A leaning face by a method for some tilts.
pub fn slope() -> Value {
    json!({
        "geometry": "inclined-plate", "facing": "up", "length": "1 m", "width": "1 m",
        "emissivity": 0.9, "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
        "method": "inclined-plate-vliet",
    })
}

/// A pipe in water.
pub fn bath() -> Value {
    json!({
        "geometry": "horizontal-cylinder", "diameter": "88.9 mm", "fluid": "water",
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    })
}
