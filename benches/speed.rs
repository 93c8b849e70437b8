//! How long the main work takes: one flight to orbit, checking a page, checking a large project.

use std::fmt::Write;
use std::hint::black_box;
use std::path::PathBuf;

use criterion::{Criterion, Throughput, criterion_group, criterion_main};
use stagewright::check::{self, Compiled, ReadError, Reader};
use stagewright::flight::{Completion, Settings, fly};

/// The package's folder, and one file that stands only here.
struct Folder {
    generated: String,
}

impl Reader for Folder {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        match path {
            "generated.wright" => Ok(self.generated.clone().into_bytes()),
            _ => std::fs::read(PathBuf::from(env!("CARGO_MANIFEST_DIR")).join(path))
                .map_err(|_| ReadError::Missing),
        }
    }
}

fn compile(entry: &str, folder: &Folder) -> Compiled {
    check::compile(entry, folder)
}

/// A project of about so many lines: engines and stages by the thousand, each with facts and reasons.
fn generated(lines: usize) -> String {
    let mut text = String::new();
    for number in 0..lines / 12 {
        let _ = write!(
            text,
            "engine Engine{number} {{\n    thrust     {thrust}.5 kN in vacuum   because \"run {number}\"\n    \
             isp        304 s in vacuum\n    exit_area  0.047 m^2\n    throttle   55 % .. 100 %\n}}\n\
             stage Stage{number} {{\n    engines     2 of Engine{number}\n    \
             dry         {thrust} kg + 2 * 7 kg\n    propellant  16.9 t   unusable 0.7 %\n}}\n\n",
            thrust = 40 + number % 50,
        );
    }
    text
}

fn speed(criterion: &mut Criterion) {
    let folder = Folder { generated: String::new() };
    let model = compile("missions/lantern.wright", &folder).model.expect("the mission compiles");
    let mission = &model.missions[0];
    let settings = Settings { tolerance: 1e-9, samples: false, ..Settings::default() };
    assert_eq!(fly(mission, &settings).completion, Completion::Completed);
    criterion.bench_function("fly lantern to orbit at 1e-9", |bencher| {
        bencher.iter(|| fly(black_box(mission), &settings));
    });
    criterion.bench_function("check lantern", |bencher| {
        bencher.iter(|| compile(black_box("missions/lantern.wright"), &folder));
    });

    let mut group = criterion.benchmark_group("check a generated project");
    group.sample_size(10);
    for lines in [10_000, 100_000] {
        let folder = Folder { generated: generated(lines) };
        assert!(compile("generated.wright", &folder).diagnostics.is_empty());
        group.throughput(Throughput::Elements(lines as u64));
        group.bench_function(format!("{lines} lines"), |bencher| {
            bencher.iter(|| compile(black_box("generated.wright"), &folder));
        });
    }
    group.finish();
}

criterion_group!(benches, speed);
criterion_main!(benches);
