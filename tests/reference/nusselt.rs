//! Evaluates the registry's formulas for programs that check them.
//!
//! Reads one JSON object a line, `{"method": id, "rayleigh": x, "prandtl": x, "tilt": degrees, "slenderness": x, "length_ratio": x}`
//! (missing numbers are 0), and writes `{"nusselt": x}` for each. With `--list` it writes every id and ends.

use std::io::{self, BufRead, Write};

use plumeline::methods::{Groups, MethodId};
use serde::Deserialize;

#[derive(Deserialize)]
struct Line {
    method: String,
    rayleigh: f64,
    prandtl: f64,
    #[serde(default)]
    tilt: f64,
    #[serde(default)]
    slenderness: f64,
    #[serde(default)]
    length_ratio: f64,
}

fn main() -> io::Result<()> {
    let mut out = io::BufWriter::new(io::stdout().lock());
    if std::env::args().any(|argument| argument == "--list") {
        for id in MethodId::TEXTS {
            writeln!(out, "{id}")?;
        }
        return out.flush();
    }
    for line in io::stdin().lock().lines() {
        let line: Line = serde_json::from_str(&line?)?;
        let Some(id) = MethodId::from_text(&line.method) else {
            return Err(io::Error::other(format!("no method {}", line.method)));
        };
        let groups = Groups {
            rayleigh: line.rayleigh,
            prandtl: line.prandtl,
            tilt: line.tilt,
            slenderness: line.slenderness,
            length_ratio: line.length_ratio,
        };
        let nusselt = (id.method().nusselt)(&groups);
        writeln!(out, "{}", serde_json::json!({ "nusselt": nusselt }))?;
    }
    out.flush()
}
