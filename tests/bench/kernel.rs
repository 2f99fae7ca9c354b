//! The kernel alone: time per case, in blocks and as a block of one.

use criterion::{BenchmarkId, Criterion, Throughput, criterion_group, criterion_main};
use plumeline::case::{Case, Column, Entries, Given, Wanted};
use plumeline::film::evaluate;
use plumeline::fluids::Fluids;
use plumeline::geometry::{Facing, Geometry};
use plumeline::quantity::UnitChoice;

const ROWS: usize = 4096;

/// Cases of every body at many temperatures.
fn mixed() -> Vec<Case> {
    (0..ROWS).map(case).collect()
}

fn case(row: usize) -> Case {
    let geometry = Geometry::ALL[row % Geometry::ALL.len()];
    let mut entries = Entries::default();
    let mut put = |name: &str, given: Given<'static>| {
        entries
            .put(name, Some(given), &[])
            .expect("the field is given once");
    };
    put("geometry", Given::Text(geometry.as_str().into()));
    for field in geometry.entry().forms[0].required {
        let given = match field.name() {
            "facing" => Given::Text(Facing::ALL[row / 7 % 2].as_str().into()),
            "tilt_from_vertical" => Given::Number((row % 90) as f64),
            _ => Given::Number(0.05 + (row % 97) as f64 * 0.02),
        };
        put(field.name(), given);
    }
    put(
        "surface_temperature",
        Given::Number(320.0 + (row % 251) as f64),
    );
    put(
        "ambient_temperature",
        Given::Number(280.0 + (row % 31) as f64),
    );
    put("emissivity", Given::Number(0.9));
    put("extrapolate", Given::Text("any".into()));
    Case::read(&entries, &UnitChoice::default(), Fluids::built_in())
        .expect("the case is well-formed")
}

fn kernel(criterion: &mut Criterion) {
    let fluids = Fluids::built_in();
    let rows = mixed();
    let mut out = Vec::with_capacity(ROWS);
    let mut group = criterion.benchmark_group("kernel");
    group.throughput(Throughput::Elements(ROWS as u64));
    let sets = [
        (
            "coefficient",
            Wanted::of(&[Column::HeatTransferCoefficient]),
        ),
        ("whole answer", Wanted::ALL),
    ];
    for (name, wanted) in sets {
        group.bench_with_input(
            BenchmarkId::new("block", name),
            &wanted,
            |bencher, &wanted| {
                bencher.iter(|| {
                    out.clear();
                    evaluate(&rows, fluids, wanted, &mut out);
                    out.len()
                });
            },
        );
    }
    group.finish();
    let mut group = criterion.benchmark_group("one case");
    group.throughput(Throughput::Elements(1));
    for (name, wanted) in sets {
        group.bench_with_input(
            BenchmarkId::new("evaluate", name),
            &wanted,
            |bencher, &wanted| {
                bencher.iter(|| {
                    out.clear();
                    evaluate(&rows[3..4], fluids, wanted, &mut out);
                    out.len()
                });
            },
        );
    }
    group.finish();
}

criterion_group!(benches, kernel);
criterion_main!(benches);
