//! Evaluates the registry's formulas for programs that check them.
//!
//! Reads one JSON object a line with a `method` and the members of `Groups` (missing numbers are 0), and writes `{"nusselt": x}` for each. With `--list` it writes every id and ends.

use std::io::{self, BufRead, Write};

use plumeline::methods::{Groups, MethodId};
use serde::Deserialize;

#[derive(Default, Deserialize)]
#[serde(default)]
struct Line {
    method: String,
    rayleigh: f64,
    prandtl: f64,
    tilt: f64,
    slenderness: f64,
    length_ratio: f64,
    aspect: f64,
    block_length: f64,
    block_width: f64,
    block_height: f64,
    heated_walls: f64,
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
            aspect: line.aspect,
            block_length: line.block_length,
            block_width: line.block_width,
            block_height: line.block_height,
            heated_walls: line.heated_walls,
        };
        let nusselt = (id.method().nusselt)(&groups);
        writeln!(out, "{}", serde_json::json!({ "nusselt": nusselt }))?;
    }
    out.flush()
}
