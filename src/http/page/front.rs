//! The front page: what this is, one example, and where to go on.

use std::sync::LazyLock;

use maud::html;

use crate::geometry::Geometry;
use crate::http::openapi::example_request;

use super::frame;

/// The page, written once.
pub fn front() -> &'static str {
    static PAGE: LazyLock<String> = LazyLock::new(|| {
        let request = example_request(Geometry::HorizontalCylinder);
        let link = "/v1/film?geometry=horizontal-cylinder&diameter=88.9 mm&surface_temperature=160 degC&ambient_temperature=20 degC&emissivity=0.9";
        frame(
            "plumeline",
            html! {
                h1 { "plumeline" }
                p {
                    "Heat that a surface loses to still air, gas, water or oil by free convection and radiation: "
                    "by which published method, within which range, and what to know about the figure."
                }
                p.caution {
                    "Figures are estimates. Hot surfaces burn, pressure and fire kill, old lagging may hold asbestos: "
                    "local codes and licensed practice govern."
                }
                h2 { "One example" }
                p { "A bare steam pipe, 88.9 mm outside diameter at 160 °C in 20 °C air:" }
                pre { "POST /v1/film\n" (serde_json::to_string_pretty(&request).unwrap_or_default()) }
                p { a href=(link) { "the same as a link" } ", and "
                    a href={ (link) "&want=total_heat_flow_per_length" } { "its loss per metre alone" } ", as a cell would ask." }
                h2 { "Where to go on" }
                ul {
                    li { a href="/docs" { "Reference" } ", every call, field, note and error" }
                    li { a href="/v1/geometries" { "Bodies" } ", " a href="/v1/methods" { "methods" } " and " a href="/v1/fluids" { "fluids" } }
                    li { a href="/openapi.json" { "OpenAPI document" } " for programs" }
                }
            },
        )
    });
    &PAGE
}
