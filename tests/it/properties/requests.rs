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

/// The air between two panes.
pub fn glazing() -> Value {
    json!({
        "geometry": "vertical-cavity", "gap": "16 mm", "height": "1 m",
        "emissivity_hot": 0.9, "emissivity_cold": 0.9,
        "hot_temperature": "20 degC", "cold_temperature": "10 degC",
    })
}

/// The air between two level plates, warm below.
pub fn attic() -> Value {
    json!({
        "geometry": "horizontal-layer", "gap": "50 mm", "heated_from": "below",
        "emissivity_hot": 0.9, "emissivity_cold": 0.9,
        "hot_temperature": "20 degC", "cold_temperature": "10 degC",
    })
}

/// The air between a pipe and its jacket.
pub fn jacket() -> Value {
    json!({
        "geometry": "concentric-cylinders", "inner_diameter": "50 mm", "outer_diameter": "100 mm",
        "emissivity_hot": 0.9, "emissivity_cold": 0.9,
        "hot_temperature": "54 degC", "cold_temperature": "26 degC",
    })
}

/// The air between two fins.
pub fn fins() -> Value {
    json!({
        "geometry": "parallel-plates", "spacing": "8 mm", "height": "180 mm",
        "heated_walls": "both", "surface_temperature": "80 degC", "ambient_temperature": "30 degC",
    })
}
