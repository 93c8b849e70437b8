//! The missions that ship with the project, and what each of them promises.

use std::path::{Path, PathBuf};

use stagewright::check::{self, ReadError, Reader};
use stagewright::flight::{Completion, Flight, Settings, fly};
use stagewright::model::{Mission, Model, Origin};

use crate::program::{root, stagewright};

/// Every mission of the repository and the status with which it flies.
const MISSIONS: &[(&str, i32)] = &[
    ("missions/lantern.wright", 0),
    ("missions/causeway.wright", 0),
    ("missions/plover.wright", 0),
    ("missions/slate.wright", 0),
    ("missions/ferry.wright", 0),
    ("missions/overreach.wright", 1),
];

/// Launches to orbit.
const LAUNCHES: &[&str] = &["missions/lantern.wright", "missions/causeway.wright"];

struct Folder(PathBuf);

impl Reader for Folder {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        std::fs::read(self.0.join(path)).map_err(|_| ReadError::Missing)
    }
}

fn model(file: &str) -> Model {
    let compiled = check::compile(file, &Folder(root()));
    let said: Vec<_> = compiled.diagnostics.iter().map(|found| (found.code.name, &found.message)).collect();
    assert!(said.is_empty(), "{file}: {said:?}");
    compiled.model.unwrap()
}

fn flown(mission: &Mission, tolerance: f64) -> Flight {
    let flight = fly(mission, &Settings { tolerance, ..Settings::default() });
    assert_eq!(flight.completion, Completion::Completed, "{}", mission.name);
    flight
}

#[test]
fn every_mission_flies_with_its_status_and_its_report_is_current() {
    for (file, status) in MISSIONS {
        let run = stagewright(&root(), &["report", "--verify", file]);
        assert_eq!(run.status, *status, "{file}: {}", run.err);
    }
}

#[test]
fn no_mission_is_left_out_of_these_tests() {
    for entry in std::fs::read_dir(root().join("missions")).unwrap() {
        let path = entry.unwrap().path();
        if path.extension().is_some_and(|extension| extension == "wright") {
            let name = format!("missions/{}", path.file_name().unwrap().to_str().unwrap());
            assert!(MISSIONS.iter().any(|(file, _)| *file == name), "{name}");
        }
    }
}

/// The columns are quadratures of their own, so that their sum is a check and not a definition.
#[test]
fn the_ledger_closes_and_its_columns_stand_at_a_tighter_tolerance() {
    for (file, _) in MISSIONS {
        let model = model(file);
        for mission in &model.missions {
            let (usual, tight) = (flown(mission, 1e-9), flown(mission, 1e-12));
            for (row, (a, b)) in usual.ledger.rows.iter().zip(&tight.ledger.rows).enumerate() {
                let columns = [
                    ("paid", a.paid, b.paid),
                    ("back pressure", a.back_pressure, b.back_pressure),
                    ("steering", a.steering, b.steering),
                    ("drag", a.drag, b.drag),
                    ("gravity", a.gravity, b.gravity),
                    ("gained", a.gained, b.gained),
                ];
                for (name, a, b) in columns {
                    assert!((a - b).abs() < 1e-5, "{file}, row {row}, {name}: {a} against {b}");
                }
                assert!(a.closure().abs() < 1e-6, "{file}, row {row}: closure {}", a.closure());
                if let Some(ideal) = a.ideal {
                    assert!(
                        (a.paid - ideal).abs() < 1e-6,
                        "{file}, row {row}: paid {} ideal {ideal}",
                        a.paid
                    );
                }
            }
            assert!(usual.ledger.total.closure().abs() < 1e-6, "{file}: {}", usual.ledger.total.closure());
        }
    }
}

#[test]
fn launches_read_like_a_real_programme() {
    for file in LAUNCHES {
        let model = model(file);
        let own: Vec<_> = model
            .facts
            .iter()
            .filter(|fact| matches!(fact.origin, Origin::Stated | Origin::Given))
            .filter(|fact| Path::new(file).ends_with(&fact.place.file))
            .collect();
        let reasoned = own.iter().filter(|fact| fact.because.is_some()).count();
        assert!(own.len() >= 60, "{file} states {} facts", own.len());
        assert!(2 * reasoned >= own.len(), "{file}: {reasoned} of {} facts have a reason", own.len());
        let mission = &model.missions[0];
        let flight = flown(mission, 1e-9);
        assert!(mission.demands.len() >= 3, "{file}");
        let near = flight.demands.iter().any(|found| found.met && found.margin <= 0.05 * found.scale);
        assert!(near, "{file}: no demand is within 5 % of its limit");
        assert!(flight.peaks.iter().any(|peak| peak.corner), "{file}: no peak stands at a corner");
    }
}
