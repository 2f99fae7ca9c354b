//! `/v1/methods`: the registry of published methods.

use axum::http::HeaderMap;
use axum::response::Response;
use serde::Serialize;
use utoipa::ToSchema;

use crate::http::extract::AcceptsJson;
use crate::http::problem::Problem;
use crate::http::reply::{json, tagged};
use crate::methods::{Evidence, Method, MethodId, Range, Scatter, evidence};

/// All methods.
#[derive(Serialize, ToSchema)]
pub struct Methods {
    /// Every one of them, in a fixed order.
    methods: Vec<MethodView>,
}

/// One published method.
#[derive(Serialize, ToSchema)]
pub struct MethodView {
    /// Its id in requests.
    #[schema(example = "horizontal-cylinder-churchill-chu")]
    id: &'static str,
    /// The body it is for.
    #[schema(example = "horizontal-cylinder")]
    geometry: &'static str,
    /// The heating it is for: isothermal, uniform-flux or either.
    #[schema(example = "either")]
    heating: &'static str,
    /// The side of a plate it is for: any, unstable (warm facing up, cold facing down) or stable.
    #[schema(example = "any")]
    side: &'static str,
    /// Whether it takes part in its body's automatic choice.
    automatic: bool,
    /// The formula as text.
    #[schema(example = "Nu = 0.53 Ra^(1/4)")]
    formula: &'static str,
    /// Where it was published.
    source: SourceView,
    /// Where it holds; all bounds together.
    ranges: Vec<RangeView>,
    /// Where the fluid's properties are taken.
    #[schema(example = "film: mean of surface and ambient")]
    reference_temperature: String,
    /// The length in its Nusselt and Rayleigh numbers.
    #[schema(example = "outside diameter")]
    characteristic_length: &'static str,
    /// The spread of measurements about it.
    scatter: ScatterView,
    /// Open readings of the source, and how far it is from others; empty when there is nothing to say.
    #[schema(example = "")]
    remark: &'static str,
    /// A worked figure that the service reproduces.
    example: ExampleView,
    /// How it was checked, and how far it is from the check; empty where it was checked against a second typing of its formula alone.
    checks: Vec<CheckView>,
}

/// One figure that a method was checked against.
#[derive(Serialize, ToSchema)]
#[schema(as = MethodCheck)]
pub struct CheckView {
    /// The check's name.
    #[schema(example = "cengel-9-1-formula")]
    check: &'static str,
    /// Where the figure stands.
    #[schema(example = "Cengel, Heat Transfer, example 9-1")]
    source: &'static str,
    /// published value, computed benchmark or common practice.
    #[schema(example = "published value")]
    kind: &'static str,
    /// How the figure came here: found, memory, common practice or computed.
    #[schema(example = "found")]
    read: &'static str,
    /// What it is.
    #[schema(example = "nusselt")]
    figure: &'static str,
    /// The published value; of two cases' ratio where the check compares two.
    #[schema(example = 17.4)]
    value: f64,
    /// How far the service is known to lie from it, a fraction.
    #[schema(example = 0.0)]
    deviation: f64,
    /// The cause of the deviation and of the check's tolerance.
    #[schema(example = "the figure is printed to four figures")]
    reason: &'static str,
}

impl CheckView {
    fn new(found: &'static Evidence) -> Self {
        CheckView {
            check: &found.check,
            source: &found.source,
            kind: match found.read.as_str() {
                "computed" => "computed benchmark",
                "common practice" => "common practice",
                _ => "published value",
            },
            read: &found.read,
            figure: &found.figure,
            value: found.value,
            deviation: found.deviation,
            reason: &found.reason,
        }
    }
}

/// Where a method was published.
#[derive(Serialize, ToSchema)]
#[schema(as = MethodSource)]
pub struct SourceView {
    /// Authors.
    #[schema(example = "Churchill, S. W.; Chu, H. H. S.")]
    authors: &'static str,
    /// Year of publication.
    #[schema(example = 1975)]
    year: u16,
    /// Journal and volume, or book.
    #[schema(example = "Int. J. Heat Mass Transfer 18")]
    work: &'static str,
    /// Pages, chapter or equation.
    #[schema(example = "1049-1053")]
    locator: &'static str,
}

/// The band of one quantity, both ends included.
#[derive(Serialize, ToSchema)]
#[schema(as = MethodRange)]
pub struct RangeView {
    /// What is bounded.
    #[schema(example = "rayleigh")]
    quantity: &'static str,
    /// Its symbol.
    #[schema(example = "Ra")]
    symbol: &'static str,
    /// Lower end.
    #[schema(example = 1e-5)]
    minimum: f64,
    /// Upper end; null where the source sets none.
    #[schema(example = 1e12)]
    maximum: Option<f64>,
    /// Whether any value below the band is answered with a note.
    answered_below: bool,
    /// Whether any value above the band is answered with a note.
    answered_above: bool,
}

/// The spread of measurements about a method, a fraction.
#[derive(Serialize, ToSchema)]
#[schema(as = MethodScatter)]
pub struct ScatterView {
    /// While laminar.
    #[schema(example = 0.15)]
    laminar: f64,
    /// Beyond.
    #[schema(example = 0.25)]
    turbulent: f64,
    /// Whether the source states it; common practice otherwise.
    stated: bool,
}

/// A worked figure.
#[derive(Serialize, ToSchema)]
#[schema(as = MethodExample)]
pub struct ExampleView {
    /// Rayleigh number.
    #[schema(example = 1869000.0)]
    rayleigh: f64,
    /// Prandtl number.
    #[schema(example = 0.7241)]
    prandtl: f64,
    /// Angle of a plate or cylinder from the vertical, of a layer from the horizontal, degrees.
    #[schema(example = 0.0)]
    tilt: f64,
    /// Height or length of a cylinder over its diameter.
    #[schema(example = 0.0)]
    slenderness: f64,
    /// Area over perimeter of an inclined plate, over its length.
    #[schema(example = 0.0)]
    length_ratio: f64,
    /// Height of a layer, cavity or channel over its gap.
    #[schema(example = 0.0)]
    aspect: f64,
    /// Longer horizontal side of a block over the root of its whole area.
    #[schema(example = 0.0)]
    block_length: f64,
    /// Shorter horizontal side, likewise.
    #[schema(example = 0.0)]
    block_width: f64,
    /// Height, likewise.
    #[schema(example = 0.0)]
    block_height: f64,
    /// How many walls of a channel are heated.
    #[schema(example = 0.0)]
    heated_walls: f64,
    /// The Nusselt number.
    #[schema(example = 17.4)]
    nusselt: f64,
    /// Where the figure comes from.
    #[schema(example = "Cengel, Heat Transfer, example 9-1")]
    from: &'static str,
}

impl MethodView {
    fn new(id: MethodId) -> Self {
        let Method {
            geometry,
            heating,
            side,
            automatic,
            formula,
            source,
            ranges,
            reference,
            scatter,
            remark,
            example,
            ..
        } = *id.method();
        let groups = example.groups;
        MethodView {
            id: id.as_str(),
            geometry: geometry.as_str(),
            heating: heating.as_str(),
            side: side.as_str(),
            automatic,
            formula,
            source: SourceView {
                authors: source.authors,
                year: source.year,
                work: source.work,
                locator: source.locator,
            },
            ranges: ranges.iter().map(RangeView::new).collect(),
            reference_temperature: reference.text(),
            characteristic_length: geometry.entry().characteristic_length,
            scatter: ScatterView {
                laminar: scatter.fraction(true),
                turbulent: scatter.fraction(false),
                stated: matches!(scatter, Scatter::Stated(_)),
            },
            remark,
            example: ExampleView {
                rayleigh: groups.rayleigh,
                prandtl: groups.prandtl,
                tilt: groups.tilt,
                slenderness: groups.slenderness,
                length_ratio: groups.length_ratio,
                aspect: groups.aspect,
                block_length: groups.block_length,
                block_width: groups.block_width,
                block_height: groups.block_height,
                heated_walls: groups.heated_walls,
                nusselt: example.nusselt,
                from: example.from,
            },
            checks: evidence(id).iter().map(CheckView::new).collect(),
        }
    }
}

impl RangeView {
    fn new(range: &Range) -> Self {
        RangeView {
            quantity: range.quantity.as_str(),
            symbol: range.quantity.symbol(),
            minimum: range.minimum,
            maximum: range.maximum.is_finite().then_some(range.maximum),
            answered_below: range.answered_below,
            answered_above: range.answered_above,
        }
    }
}

/// All methods, with formula, source and ranges.
#[utoipa::path(
    get, path = "/v1/methods", operation_id = "list_methods", tag = "catalogue",
    responses((status = 200, description = "all methods", body = Methods))
)]
pub async fn list_methods(_accepts: AcceptsJson, headers: HeaderMap) -> Result<Response, Problem> {
    let methods = MethodId::ALL
        .iter()
        .map(|&id| MethodView::new(id))
        .collect();
    Ok(tagged(json(&Methods { methods })?, &headers))
}
