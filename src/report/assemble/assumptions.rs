//! What the numbers rest on.

use crate::flight::{Flight, Frame};
use crate::model::{self, Drag, Gravity, Mission, Origin, Place};
use crate::report::content::{Assumptions, Fact};

pub fn assumptions(mission: &Mission, facts: &[model::Fact], flight: &Flight, tolerance: f64) -> Assumptions {
    let used: Vec<&model::Fact> = mission.facts.iter().filter_map(|id| facts.get(id.0 as usize)).collect();
    let line = |fact: &&model::Fact| Fact {
        path: fact.path.clone(),
        si: fact.si,
        written: if fact.written.is_empty() { default_text(fact) } else { fact.written.clone() },
        place: place(&mission.place, &fact.place),
        because: fact.because.clone(),
    };
    let written = |fact: &&&model::Fact| matches!(fact.origin, Origin::Stated | Origin::Given);
    Assumptions {
        reasoned: used.iter().filter(written).filter(|fact| fact.because.is_some()).map(line).collect(),
        unreasoned: used.iter().filter(written).filter(|fact| fact.because.is_none()).map(line).collect(),
        defaults: used.iter().filter(|fact| fact.origin == Origin::Default).map(line).collect(),
        conventions: conventions(mission, flight, tolerance),
    }
}

/// File and line, the file as it is called from the folder of the mission's.
fn place(mission: &Place, fact: &Place) -> String {
    let folder = mission.file.rfind('/').and_then(|slash| mission.file.get(..=slash)).unwrap_or("");
    let file = fact.file.strip_prefix(folder).unwrap_or(&fact.file);
    format!("{file}:{}", fact.line)
}

fn default_text(fact: &model::Fact) -> String {
    crate::report::show::Show { system: crate::quantity::System::Written }.with_unit(fact.si, &fact.unit, 6)
}

fn conventions(mission: &Mission, flight: &Flight, tolerance: f64) -> Vec<String> {
    let world = &mission.world;
    let gravity = match world.gravity {
        Gravity::Uniform { .. } => "Gravity is uniform and downward.",
        Gravity::Central { j2: Some(_), .. } => {
            "Gravity is that of a point mass with the oblateness term J2."
        }
        Gravity::Central { j2: None, .. } => "Gravity is that of a point mass.",
    };
    let air = match world.air {
        model::Air::None => "There is no air.",
        model::Air::Standard1976 => {
            "Air is the U.S. Standard Atmosphere, 1976, to 1000 km; it turns with the body, without wind. Above 86 km \
             the Mach number uses the speed of sound at 86 km."
        }
        model::Air::Exponential { .. } => "Air thins exponentially and turns with the body, without wind.",
    };
    let drag = match mission.vehicle.drag {
        Drag::None => "No aerodynamic force acts.",
        Drag::Steady { .. } | Drag::Curve { .. } => {
            "Drag is dynamic pressure times reference area times coefficient, against the airspeed, in every phase, \
             with one area and one coefficient for whatever is left of the vehicle; there is no lift."
        }
    };
    let frame = match flight.frame {
        Frame::BodyFixed => "The ledger is kept in the body-fixed frame, in which the ground is at rest.",
        Frame::Inertial => "The ledger is kept in the inertial frame.",
    };
    let fixed = [
        "Inertial frame: origin at the body's centre, z along the spin axis. Body-fixed frame: turns with the body.",
        "Altitude is geodetic. Apogee and perigee altitudes are radii less the equatorial radius. Elements osculate.",
        "Acceleration is sensed: thrust plus aerodynamic force over mass. g0 is 9.80665 m/s².",
        "Thrust is throttle times vacuum thrust less pressure times exit area; mass flow does not depend on pressure.",
        "Dry mass flies with its growth allowance. Shedding is instantaneous and without impulse.",
        frame,
        gravity,
        air,
        drag,
    ];
    let mut said: Vec<String> = fixed.map(str::to_owned).to_vec();
    said.push(format!(
        "Integrated by Dormand and Prince's method of order 8(5,3) at a relative tolerance of {tolerance:e}."
    ));
    said
}
