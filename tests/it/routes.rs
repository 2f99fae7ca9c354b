//! The routes, called without a port.

use axum::body::Body;
use axum::http::{HeaderMap, Request, StatusCode, header};
use http_body_util::BodyExt;
use plumeline::fluids::Fluids;
use plumeline::http::{RequestLimits, Service, router};
use serde_json::{Value, json};
use tower::ServiceExt;

struct Reply {
    status: StatusCode,
    headers: HeaderMap,
    text: String,
}

impl Reply {
    fn json(&self) -> Value {
        serde_json::from_str(&self.text).unwrap()
    }

    fn content_type(&self) -> &str {
        self.headers[header::CONTENT_TYPE].to_str().unwrap()
    }

    /// Pointer and code of every fault.
    fn faults(&self) -> Vec<(String, String)> {
        assert_eq!(self.content_type(), "application/problem+json");
        assert_eq!(self.json()["status"], self.status.as_u16());
        let errors = self.json()["errors"].as_array().unwrap().clone();
        let text = |value: &Value| value.as_str().unwrap().to_owned();
        errors
            .iter()
            .map(|fault| (text(&fault["pointer"]), text(&fault["code"])))
            .collect()
    }
}

fn call(request: Request<Body>) -> Reply {
    let runtime = tokio::runtime::Builder::new_current_thread()
        .enable_all()
        .build()
        .unwrap();
    runtime.block_on(async {
        let service = Service::new(Fluids::built_in(), RequestLimits::default());
        let response = router(service).oneshot(request).await.unwrap();
        let (parts, body) = response.into_parts();
        let bytes = body.collect().await.unwrap().to_bytes();
        Reply {
            status: parts.status,
            headers: parts.headers,
            text: String::from_utf8(bytes.to_vec()).unwrap(),
        }
    })
}

fn post_bytes(body: impl Into<Body>) -> Reply {
    call(
        Request::post("/v1/film")
            .header(header::CONTENT_TYPE, "application/json")
            .body(body.into())
            .unwrap(),
    )
}

fn post(case: &Value) -> Reply {
    post_bytes(case.to_string())
}

fn get(uri: &str) -> Reply {
    call(Request::get(uri).body(Body::empty()).unwrap())
}

/// Fails unless a case is answered.
pub fn assert_answered(case: &Value) {
    let reply = post(case);
    assert_eq!(reply.status, StatusCode::OK, "{case}: {}", reply.text);
}

fn pipe() -> Value {
    json!({
        "geometry": "horizontal-cylinder", "diameter": "88.9 mm", "emissivity": 0.9,
        "surface_temperature": "160 degC", "ambient_temperature": "20 degC",
    })
}

fn with(mut case: Value, name: &str, value: Value) -> Value {
    case[name] = value;
    case
}

const PIPE_QUERY: &str = "/v1/film?geometry=horizontal-cylinder&diameter=88.9%20mm&emissivity=0.9&surface_temperature=160%20degC&ambient_temperature=20%20degC";

fn near(value: &Value, expected: f64, tolerance: f64) {
    let value = value.as_f64().unwrap();
    assert!(
        (value - expected).abs() <= tolerance,
        "{value} instead of {expected}"
    );
}

#[test]
fn a_bare_steam_pipe() {
    let reply = post(&pipe());
    assert_eq!(reply.status, StatusCode::OK);
    assert_eq!(reply.content_type(), "application/json");
    let answer = reply.json();
    near(&answer["heat_transfer_coefficient"], 7.41, 0.01);
    near(&answer["convective_heat_flow_per_length"], 290.0, 1.0);
    near(&answer["radiative_heat_flow_per_length"], 396.0, 1.0);
    assert_eq!(answer["method"], "horizontal-cylinder-churchill-chu");
    assert_eq!(answer["range_status"], "within");
    assert_eq!(answer["total_heat_flow"], Value::Null);
    assert_eq!(answer["units"]["total_heat_flow_per_length"], "W/m");
    let codes: Vec<_> = answer["notes"]
        .as_array()
        .unwrap()
        .iter()
        .map(|note| &note["code"])
        .collect();
    assert!(codes.contains(&&json!("burn-hazard")));
    assert!(answer["alternatives"].as_array().unwrap().len() >= 4);
}

#[test]
fn get_and_post_give_the_same_bytes() {
    let posted = post(&pipe());
    let got = get(PIPE_QUERY);
    assert_eq!(got.status, StatusCode::OK);
    assert_eq!(got.text, posted.text);
    let in_si = json!({
        "geometry": "horizontal-cylinder", "diameter": 0.0889, "emissivity": 0.9,
        "surface_temperature": 433.15, "ambient_temperature": 293.15,
    });
    assert_eq!(post(&in_si).text, posted.text);
}

#[test]
fn units_of_the_request_and_of_the_answer() {
    let case = json!({
        "geometry": "horizontal-cylinder", "diameter": 88.9, "emissivity": 0.9,
        "surface_temperature": 160, "ambient_temperature": 20,
        "units": {"temperature": "degC", "length": "mm"},
        "answer_units": {"temperature": "degF", "total_heat_flow_per_length": "Btu/(h ft)"},
    });
    let answer = post(&case).json();
    near(&answer["surface_temperature"], 320.0, 1e-9);
    near(
        &answer["total_heat_flow_per_length"],
        686.022_342 / 0.961_519,
        1e-2,
    );
    near(&answer["convective_heat_flow_per_length"], 289.565, 1e-3);
    assert_eq!(answer["units"]["surface_temperature"], "degF");
    let query = "/v1/film?geometry=horizontal-cylinder&diameter=88.9&emissivity=0.9&surface_temperature=160&ambient_temperature=20&units=temperature:degC,length:mm&answer_units=temperature:degF,total_heat_flow_per_length:Btu/(h%20ft)";
    assert_eq!(get(query).text, post(&case).text);
}

#[test]
fn one_figure_for_a_cell() {
    let reply = get(&format!("{PIPE_QUERY}&want=heat_transfer_coefficient"));
    assert_eq!(reply.content_type(), "text/plain; charset=utf-8");
    near(&json!(reply.text.parse::<f64>().unwrap()), 7.41, 0.01);
    let other = get(&format!(
        "{PIPE_QUERY}&want=heat_transfer_coefficient&as=Btu/(h%20ft2%20degF)"
    ));
    near(
        &json!(other.text.parse::<f64>().unwrap()),
        7.4057 / 5.678_263,
        1e-4,
    );
    let line = get(&format!(
        "{PIPE_QUERY}&want=nusselt,method,notes,total_heat_flow"
    ));
    let cells: Vec<_> = line.text.split(',').collect();
    assert_eq!(
        cells[1..],
        [
            "horizontal-cylinder-churchill-chu",
            "methods-disagree;burn-hazard",
            ""
        ]
    );
}

#[test]
fn a_cell_shows_its_error() {
    let refused = get("/v1/film?geometry=sphere&want=nusselt");
    assert_eq!(refused.status, StatusCode::UNPROCESSABLE_ENTITY);
    let shown = get(
        "/v1/film?geometry=sphere&diameter=0.1&surface_temperature=400&want=nusselt&errors=cell",
    );
    assert_eq!(shown.status, StatusCode::OK);
    assert_eq!(shown.content_type(), "text/plain; charset=utf-8");
    assert!(
        shown
            .text
            .starts_with("error: ambient_temperature is not given"),
        "{}",
        shown.text
    );
}

#[test]
fn an_entity_tag_saves_the_answer() {
    let first = get(PIPE_QUERY);
    let tag = first.headers[header::ETAG].clone();
    let request = Request::get(PIPE_QUERY).header(header::IF_NONE_MATCH, &tag);
    let second = call(request.body(Body::empty()).unwrap());
    assert_eq!(second.status, StatusCode::NOT_MODIFIED);
    assert_eq!(second.text, "");
    assert_eq!(second.headers[header::ETAG], tag);
}

#[test]
fn head_and_options_are_answered() {
    let head = call(Request::head(PIPE_QUERY).body(Body::empty()).unwrap());
    assert_eq!((head.status, head.text.as_str()), (StatusCode::OK, ""));
    let options = call(Request::options("/v1/film").body(Body::empty()).unwrap());
    assert_eq!(options.status, StatusCode::NO_CONTENT);
    let allowed = options.headers[header::ALLOW].to_str().unwrap();
    assert!(
        allowed.contains("GET") && allowed.contains("POST"),
        "{allowed}"
    );
    let other = call(Request::delete("/v1/film").body(Body::empty()).unwrap());
    assert_eq!(other.status, StatusCode::METHOD_NOT_ALLOWED);
    assert_eq!(other.faults(), []);
}

#[test]
fn all_faults_are_told_at_once() {
    let case = json!({
        "geometry": "vertical-plate", "hieght": 1, "width": "0,5", "area": -2, "surface_temperature": [80],
        "heat_flux": "3 kg", "emissivity": 1.5, "fluid": "wter", "method": "sphere-yuge", "facing": "left",
        "pressure": 1e5, "altitude": 0, "id": 7, "units": {"temprature": "degC"},
    });
    let reply = post(&case);
    assert_eq!(reply.status, StatusCode::UNPROCESSABLE_ENTITY);
    let mut faults = reply.faults();
    faults.sort();
    let expected = [
        ("#/altitude", "conflicting-fields"),
        ("#/ambient_temperature", "missing-field"),
        ("#/area", "conflicting-fields"),
        ("#/area", "outside-limits"),
        ("#/emissivity", "outside-limits"),
        ("#/facing", "unexpected-field"),
        ("#/facing", "unknown-value"),
        ("#/fluid", "unknown-value"),
        ("#/heat_flux", "conflicting-fields"),
        ("#/heat_flux", "wrong-kind"),
        ("#/height", "missing-field"),
        ("#/hieght", "unknown-field"),
        ("#/id", "wrong-type"),
        ("#/method", "method-does-not-fit"),
        ("#/surface_temperature", "wrong-type"),
        ("#/units/temprature", "unknown-key"),
        ("#/width", "decimal-comma"),
    ];
    let expected: Vec<_> = expected.map(|(p, c)| (p.to_owned(), c.to_owned())).into();
    assert_eq!(faults, expected);
    assert!(reply.text.contains("did you mean height?"));
    assert!(reply.text.contains("did you mean water?"));
}

#[test]
fn a_flood_of_faults_is_cut_short() {
    let members: Vec<_> = (0..5000).map(|i| format!("\"x{i}\":1")).collect();
    let reply = post_bytes(format!("{{{}}}", members.join(",")));
    let faults = reply.faults();
    assert_eq!(faults.len(), 101);
    assert_eq!(faults[100], ("#".to_owned(), "too-many-faults".to_owned()));
    let rows = vec!["x"; 5000];
    let table = json!({"temperature": rows, "density": rows});
    let faults = post(&with(pipe(), "fluid", table)).faults();
    assert!(faults.len() < 110, "{}", faults.len());
    assert!(faults.iter().any(|(_, code)| code == "too-many-faults"));
}

#[test]
fn a_bare_number_taken_as_kelvin_is_hinted_at() {
    let reply = post(&json!({
        "geometry": "sphere", "diameter": 0.2, "surface_temperature": 85, "ambient_temperature": 20,
    }));
    let table = "outside-table".to_owned();
    assert_eq!(
        reply.faults(),
        [
            ("#/surface_temperature".to_owned(), table.clone()),
            ("#/ambient_temperature".to_owned(), table)
        ]
    );
    assert!(reply.text.contains(r#"\"85 degC\""#), "{}", reply.text);
}

#[test]
fn what_is_no_json_is_a_400_and_what_is_no_case_a_422() {
    for bytes in [
        &b"{"[..],
        b"",
        b"{\"a\":\"\xff\"}",
        b"{}x",
        b"nul",
        b"{\"a\":NaN}",
        b"{\"a\" 1}",
    ] {
        let reply = post_bytes(bytes.to_vec());
        assert_eq!(
            reply.status,
            StatusCode::BAD_REQUEST,
            "{bytes:?} {}",
            reply.text
        );
        assert_eq!(reply.faults(), []);
    }
    for text in ["[]", "1", "\"x\"", "null", "{}", &"[".repeat(5)] {
        let reply = post_bytes(text.to_owned());
        assert!(reply.status.is_client_error(), "{text}");
    }
    let huge = r#"{"geometry":"sphere","diameter":1e400,"surface_temperature":300,"ambient_temperature":280}"#;
    let reply = post_bytes(huge);
    assert_eq!(
        reply.faults(),
        [("#/diameter".to_owned(), "not-finite".to_owned())]
    );
    let twice = r#"{"geometry":"sphere","geometry":"sphere","diameter":1,"surface_temperature":300,"ambient_temperature":280}"#;
    assert_eq!(
        post_bytes(twice).faults(),
        [("#/geometry".to_owned(), "duplicate-field".to_owned())]
    );
}

#[test]
fn media_types_and_sizes_are_checked() {
    let text = Request::post("/v1/film").header(header::CONTENT_TYPE, "text/plain");
    assert_eq!(
        call(text.body(Body::from("{}")).unwrap()).status,
        StatusCode::UNSUPPORTED_MEDIA_TYPE
    );
    let none = Request::post("/v1/film").body(Body::from("{}")).unwrap();
    let reply = call(none);
    assert_eq!(reply.status, StatusCode::UNSUPPORTED_MEDIA_TYPE);
    assert!(reply.text.contains("send application/json"));
    let large = post_bytes(" ".repeat(2 << 20));
    assert_eq!(large.status, StatusCode::PAYLOAD_TOO_LARGE);
    assert_eq!(large.headers[header::CONNECTION], "close");
    let picture = Request::get("/v1/fluids").header(header::ACCEPT, "image/png");
    assert_eq!(
        call(picture.body(Body::empty()).unwrap()).status,
        StatusCode::NOT_ACCEPTABLE
    );
}

#[test]
fn a_heat_flux_finds_its_surface_temperature() {
    let known = post(&pipe()).json();
    let mut case = with(pipe(), "heat_flux", known["total_heat_flux"].clone());
    case.as_object_mut().unwrap().remove("surface_temperature");
    let found = post(&case).json();
    near(&found["surface_temperature"], 433.15, 1e-6);
    let impossible = post(&with(case, "heat_flux", json!(9e7)));
    assert_eq!(
        impossible.faults(),
        [("#/heat_flux".to_owned(), "no-solution".to_owned())]
    );
}

#[test]
fn a_glass_wall_by_a_forced_method_and_by_choice() {
    let wall = json!({
        "geometry": "vertical-plate", "height": 1.5, "width": 2.8, "surface_temperature": "26 degC",
        "ambient_temperature": "18 degC", "method": "vertical-plate-churchill-chu",
    });
    let forced = post(&wall).json();
    near(&forced["nusselt"], 167.5, 0.5);
    let free = post(&with(wall, "method", json!("auto"))).json();
    assert_eq!(free["method"], "vertical-plate-raithby-hollands");
    let others = free["alternatives"].as_array().unwrap();
    let full = others
        .iter()
        .find(|other| other["method"] == "vertical-plate-churchill-chu")
        .unwrap();
    assert_eq!(full["nusselt"], forced["nusselt"]);
    assert!(free["high"].as_f64() >= full["heat_transfer_coefficient"].as_f64());
}

#[test]
fn a_method_far_out_of_range_is_refused_or_warned_of() {
    let far = with(pipe(), "method", json!("horizontal-cylinder-power-law"));
    let thin = with(far, "diameter", json!("0.5 mm"));
    let refused = post(&thin);
    assert_eq!(
        refused.faults(),
        [("#/method".to_owned(), "outside-method-range".to_owned())]
    );
    let warned = post(&with(thin, "extrapolate", json!("any"))).json();
    assert_eq!(warned["range_status"], "beyond");
    assert_eq!(warned["notes"][0]["code"], "rayleigh-below-range");
}

#[test]
fn water_across_its_greatest_density_is_refused() {
    let case = json!({
        "geometry": "vertical-plate", "height": 0.5, "fluid": "water",
        "surface_temperature": "10 degC", "ambient_temperature": "1 degC",
    });
    assert_eq!(
        post(&case).faults(),
        [(
            "#/surface_temperature".to_owned(),
            "density-maximum".to_owned()
        )]
    );
}

#[test]
fn catalogues_come_from_the_registry() {
    let methods = get("/v1/methods").json();
    let ids = plumeline::methods::MethodId::TEXTS;
    let listed: Vec<_> = methods["methods"]
        .as_array()
        .unwrap()
        .iter()
        .map(|m| m["id"].as_str().unwrap())
        .collect();
    assert_eq!(listed, ids);
    let geometries = get("/v1/geometries").json();
    assert_eq!(
        geometries["geometries"].as_array().unwrap().len(),
        plumeline::geometry::Geometry::ALL.len()
    );
    let fluids = get("/v1/fluids").json();
    for fluid in fluids["fluids"].as_array().unwrap() {
        let middle = 0.5
            * (fluid["minimum_temperature"].as_f64().unwrap()
                + fluid["maximum_temperature"].as_f64().unwrap());
        let uri = format!(
            "/v1/fluids/{}/state?temperature={middle}&pressure=20%20bar",
            fluid["id"].as_str().unwrap()
        );
        let at_middle = get(&uri);
        assert!(
            matches!(at_middle.status.as_u16(), 200 | 422),
            "{uri} {}",
            at_middle.text
        );
    }
    let air = get("/v1/fluids/air/state?temperature=300").json();
    near(&air["properties"]["density"], 1.1770, 1e-3);
    assert_eq!(
        get("/v1/fluids/ait/state?temperature=300").status,
        StatusCode::NOT_FOUND
    );
    let faults = get("/v1/fluids/air/state?temperature=3&presure=1").faults();
    assert_eq!(
        faults,
        [("#/presure".to_owned(), "unknown-field".to_owned())]
    );
}

#[test]
fn pages_and_operations() {
    for (path, kind) in [
        ("/", "text/html; charset=utf-8"),
        ("/docs", "text/html; charset=utf-8"),
        ("/openapi.json", "application/json"),
        ("/favicon.ico", "image/svg+xml"),
        ("/health/live", "application/json"),
        ("/health/ready", "application/json"),
        ("/v1/version", "application/json"),
    ] {
        let reply = get(path);
        assert_eq!(
            (reply.status, reply.content_type()),
            (StatusCode::OK, kind),
            "{path}"
        );
        assert!(!reply.text.is_empty());
    }
    let missing = get("/v2/film");
    assert_eq!(missing.status, StatusCode::NOT_FOUND);
    assert_eq!(missing.faults(), []);
}

#[test]
fn a_request_keeps_its_id_when_it_is_a_short_word() {
    let given = |id: &str| {
        let request = Request::get("/health/live").header("x-request-id", id);
        let reply = call(request.body(Body::empty()).unwrap());
        reply.headers["x-request-id"].to_str().unwrap().to_owned()
    };
    assert_eq!(given("sheet-7"), "sheet-7");
    assert_ne!(given("two words"), "two words");
    assert_ne!(given(""), "");
}

fn glazing() -> Value {
    json!({
        "geometry": "vertical-cavity", "gap": "16 mm", "height": "1.4 m", "hot_temperature": "17.5 degC",
        "cold_temperature": "2.5 degC", "emissivity_hot": 0.84, "emissivity_cold": 0.84,
    })
}

#[test]
fn every_body_answers_from_a_query_too() {
    for geometry in get("/v1/geometries").json()["geometries"]
        .as_array()
        .unwrap()
    {
        let example = &geometry["example"];
        let pairs = example.as_object().unwrap().iter().map(|(name, value)| {
            let text = value
                .as_str()
                .map_or_else(|| value.to_string(), str::to_owned);
            format!("{name}={}", text.replace(' ', "%20"))
        });
        let uri = format!("/v1/film?{}", pairs.collect::<Vec<_>>().join("&"));
        let reply = get(&uri);
        assert_eq!(reply.status, StatusCode::OK, "{uri}: {}", reply.text);
        assert_eq!(reply.text, post(example).text);
    }
}

#[test]
fn a_gap_has_a_resistance_and_takes_no_surface_temperature() {
    let answer = post(&glazing()).json();
    let resistance = answer["thermal_resistance"].as_f64().unwrap();
    near(&answer["total_heat_flux"], 15.0 / resistance, 1e-9);
    assert_eq!(answer["method"], "vertical-cavity-elsherbiny");
    let odd = with(glazing(), "surface_temperature", json!(300));
    let one = with(odd, "emissivity_cold", Value::Null);
    let faults = post(&one).faults();
    let expected = [
        (
            "#/surface_temperature".to_owned(),
            "unexpected-field".to_owned(),
        ),
        ("#/emissivity_cold".to_owned(), "missing-field".to_owned()),
    ];
    assert_eq!(faults, expected);
}

#[test]
fn a_nominal_size_is_its_outside_diameter() {
    let named = post(&with(pipe(), "diameter", json!("NPS 3"))).json();
    assert_eq!(named["characteristic_length"], 0.0889);
    assert_eq!(
        post(&with(pipe(), "diameter", json!("DN 80"))).text,
        post(&pipe()).text
    );
    let inches = post(&with(pipe(), "diameter", json!("3 in"))).json();
    assert_eq!(inches["notes"][0]["code"], "nominal-size");
    let wrong = post(&with(pipe(), "diameter", json!("DN 81"))).faults();
    assert_eq!(
        wrong,
        [("#/diameter".to_owned(), "unknown-value".to_owned())]
    );
}

#[test]
fn a_draught_raises_the_loss() {
    let still = post(&pipe()).json();
    let blown = post(&with(pipe(), "draught_speed", json!("2 m/s"))).json();
    assert_eq!(
        blown["heat_transfer_coefficient"],
        still["heat_transfer_coefficient"]
    );
    assert!(blown["combined_coefficient"].as_f64() > blown["forced_coefficient"].as_f64());
    assert_eq!(blown["notes"][0]["code"], "draught-governs");
    let flux = |answer: &Value| answer["total_heat_flux"].as_f64().unwrap();
    assert!((flux(&blown) / flux(&still) - 1.53).abs() < 0.01);

    let ball = json!({
        "geometry": "sphere", "diameter": 0.5, "surface_temperature": "90 degC",
        "ambient_temperature": "20 degC", "emissivity": 0.9, "draught_speed": "10 m/s",
    });
    let text = post(&ball).text;
    assert!(
        text.contains("outside its range: Re is") && text.contains("above 7.6e4"),
        "{text}"
    );
    assert!(
        !post(&with(pipe(), "draught_speed", json!("2 m/s")))
            .text
            .contains("outside its range")
    );
}

#[test]
fn mixtures_and_humid_air_take_their_composition() {
    let glycol = json!({
        "geometry": "vertical-plate", "height": 1, "fluid": "propylene-glycol-water",
        "surface_temperature": "40 degC", "ambient_temperature": "20 degC",
    });
    let missing = post(&glycol).faults();
    assert_eq!(
        missing,
        [("#/concentration".to_owned(), "missing-field".to_owned())]
    );
    assert_eq!(
        post(&with(glycol, "concentration", json!("30 %"))).status,
        StatusCode::OK
    );
    let cold = json!({
        "geometry": "horizontal-cylinder", "diameter": 0.05, "surface_temperature": "5 degC",
        "ambient_temperature": "20 degC", "relative_humidity": 0.7, "emissivity": 0.9,
    });
    assert!(post(&cold).text.contains("may-condense"));
    let odd = with(cold, "fluid", json!("nitrogen"));
    assert_eq!(
        post(&odd).faults(),
        [(
            "#/relative_humidity".to_owned(),
            "unexpected-field".to_owned()
        )]
    );
    let state =
        get("/v1/fluids/ethylene-glycol-water/state?temperature=20%20degC&concentration=0.3");
    assert_eq!(state.status, StatusCode::OK, "{}", state.text);
}

fn own_oil() -> Value {
    json!({
        "temperature": ["20 degC", "60 degC", "100 degC"], "density": [880, 855, 830],
        "specific_heat": [1800, 1950, "2.1 kJ/(kg K)"], "kinematic_viscosity": ["60 cSt", "15 cSt", "6 cSt"],
        "conductivity": [0.13, 0.128, 0.126], "flash_point": "70 degC", "source": "data sheet of the supplier",
    })
}

#[test]
fn a_caller_brings_an_oil() {
    let case = json!({
        "geometry": "vertical-plate", "height": 1, "fluid": own_oil(),
        "surface_temperature": "80 degC", "ambient_temperature": "40 degC",
    });
    let reply = post(&case);
    assert_eq!(reply.status, StatusCode::OK, "{}", reply.text);
    assert!(reply.text.contains("above-flash-point"));
    near(
        &reply.json()["properties"]["kinematic_viscosity"],
        15e-6,
        1e-12,
    );
    let thicker = with(
        case.clone(),
        "fluid",
        with(own_oil(), "density", json!([890, 865, 840])),
    );
    assert_ne!(
        post(&thicker).json()["provenance"]["case_digest"],
        reply.json()["provenance"]["case_digest"]
    );

    let mut broken = with(own_oil(), "density", json!([880, "x", null]));
    broken["colour"] = json!("brown");
    broken.as_object_mut().unwrap().remove("conductivity");
    let mut faults = post(&with(case.clone(), "fluid", broken)).faults();
    faults.sort();
    let expected = [
        ("#/fluid/colour", "unknown-field"),
        ("#/fluid/conductivity", "missing-field"),
        ("#/fluid/density/1", "not-a-quantity"),
        ("#/fluid/density/2", "wrong-type"),
    ];
    assert_eq!(faults, expected.map(|(p, c)| (p.to_owned(), c.to_owned())));
    let falling = with(
        own_oil(),
        "temperature",
        json!(["20 degC", "100 degC", "60 degC"]),
    );
    let faults = post(&with(case, "fluid", falling)).faults();
    assert!(
        faults.iter().all(
            |(pointer, code)| pointer.starts_with("#/fluid/temperature") && code == "bad-table"
        )
    );
}

#[test]
fn methods_show_how_they_were_checked() {
    let methods = get("/v1/methods").json();
    let all = methods["methods"].as_array().unwrap();
    let checked = all
        .iter()
        .filter(|method| !method["checks"].as_array().unwrap().is_empty())
        .count();
    assert!(checked >= 16, "{checked}");
}
