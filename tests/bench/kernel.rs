//! The kernel alone: time per case, in blocks and as a block of one.

use criterion::{BenchmarkId, Criterion, Throughput, criterion_group, criterion_main};
use plumeline::case::{Case, Column, Entries, Given, Wanted};
use plumeline::film::evaluate;
use plumeline::fluids::Fluids;
use plumeline::geometry::{Field, FieldValue, Geometry, Space};
use plumeline::quantity::{Kind, UnitChoice};

const ROWS: usize = 4096;

/// Cases of every body at many temperatures.
fn mixed() -> Vec<Case> {
    (0..ROWS).map(case).collect()
}

fn case(row: usize) -> Case {
    let geometry = Geometry::ALL[row % Geometry::ALL.len()];
    let mut entries = Entries::default();
    let mut put = |field: Field, given: Given<'static>| {
        entries
            .put(field.name(), Some(given), &[])
            .expect("the field is given once");
    };
    let length = 0.05 + (row % 97) as f64 * 0.02;
    put(Field::Geometry, Given::Text(geometry.as_str().into()));
    for &field in geometry.entry().forms[0].required {
        let given = match field.entry().value {
            FieldValue::Choice(words) => Given::Text(words[row / 16 % words.len()].into()),
            FieldValue::Quantity(Kind::Angle, _) => Given::Number((row % 90) as f64),
            _ if matches!(field, Field::Gap | Field::Spacing) => Given::Number(0.1 * length),
            _ if field == Field::OuterDiameter => Given::Number(1.4 * length),
            _ => Given::Number(length),
        };
        put(field, given);
    }
    let (hot, cold) = (320.0 + (row % 251) as f64, 280.0 + (row % 31) as f64);
    let space = geometry.entry().space;
    match space {
        Space::Closed => {
            put(Field::HotTemperature, Given::Number(hot));
            put(Field::ColdTemperature, Given::Number(cold));
            put(Field::EmissivityHot, Given::Number(0.9));
            put(Field::EmissivityCold, Given::Number(0.8));
        }
        Space::Open | Space::Channel => {
            put(Field::SurfaceTemperature, Given::Number(hot));
            put(Field::AmbientTemperature, Given::Number(cold));
        }
    }
    if space == Space::Open {
        put(Field::Emissivity, Given::Number(0.9));
    }
    put(Field::Extrapolate, Given::Text("any".into()));
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
