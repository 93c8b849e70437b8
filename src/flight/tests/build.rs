//! Small missions for the tests, built without a text.

use std::sync::Arc;

use crate::model::{
    Air, Axis, Beyond, Burn, Comparison, Condition, Curve, Drag, Engine, FactId, Formula, Gravity, Hold,
    Light, Mission, Part, Phase, PitchLaw, Place, Propulsion, Quantity, Reading, Role, Shed, Smoothness,
    Start, Steer, Surface, Thrust, Value, Vehicle, World,
};
use crate::quantity::Dimension;

/// Standard gravity, m/s² (3rd CGPM, 1901).
pub const G0: f64 = 9.80665;
/// WGS 84: gravitational parameter m³/s², equatorial radius m, 1/flattening, spin rad/s.
pub const MU: f64 = 3.986_004_418e14;
pub const RADIUS: f64 = 6_378_137.0;
pub const FLATTENING: f64 = 1.0 / 298.257_223_563;
pub const SPIN: f64 = 7.292_115e-5;
/// EGM96, tide free.
pub const J2: f64 = 1.082_626_68e-3;

pub fn value(si: f64) -> Value {
    Value { si, fact: FactId(0) }
}

pub fn number(si: f64) -> Formula {
    Formula::Number { si }
}

pub fn reading(quantity: Quantity) -> Formula {
    Formula::Reading { reading: Reading { quantity, part: None } }
}

pub fn peak(quantity: Quantity) -> Formula {
    Formula::Peak { of: Box::new(reading(quantity)), phase: None }
}

fn place() -> Place {
    Place { file: String::new(), line: 1, column: 1, start: 0, end: 0 }
}

/// An airless flat world that does not turn.
pub fn flat(gravity: f64) -> World {
    World {
        name: "Flat".to_owned(),
        place: place(),
        gravity: Gravity::Uniform { size: value(gravity) },
        surface: Surface::Flat,
        spin: value(0.0),
        air: Air::None,
    }
}

/// An airless sphere of the Earth's size that does not turn.
pub fn sphere() -> World {
    World {
        gravity: Gravity::Central { mu: value(MU), j2: None },
        surface: Surface::Ellipsoid { equatorial_radius: value(RADIUS), flattening: value(0.0) },
        ..flat(0.0)
    }
}

/// The Earth: oblate, turning, with its standard air.
pub fn earth() -> World {
    World {
        gravity: Gravity::Central { mu: value(MU), j2: Some(value(J2)) },
        surface: Surface::Ellipsoid { equatorial_radius: value(RADIUS), flattening: value(FLATTENING) },
        spin: value(SPIN),
        air: Air::Standard1976,
        ..flat(0.0)
    }
}

pub fn exponential(density: f64, pressure: f64, scale_height: f64) -> Air {
    Air::Exponential {
        density: value(density),
        pressure: value(pressure),
        scale_height: value(scale_height),
        sound_speed: value(340.0),
    }
}

/// Thrust in N and isp in s, both in vacuum; no exit area, and no throttling.
pub fn engine(thrust: f64, isp: f64) -> Engine {
    Engine {
        name: "Engine".to_owned(),
        place: place(),
        thrust: Thrust::Steady { vacuum: value(thrust) },
        isp: value(isp),
        exit_area: value(0.0),
        throttle_least: value(1.0),
        throttle_most: value(1.0),
        restarts: None,
    }
}

/// An engine that throttles from `least` to full.
pub fn throttled(thrust: f64, isp: f64, least: f64) -> Engine {
    Engine { throttle_least: value(least), ..engine(thrust, isp) }
}

/// A stage with one engine; masses in kg.
pub fn stage(dry: f64, propellant: f64, engine: Engine) -> Part {
    let propulsion = Propulsion {
        engine,
        engines: value(1.0),
        propellant: value(propellant),
        unusable: value(0.0),
        reserve: None,
    };
    Part { propulsion: Some(propulsion), ..body(dry) }
}

/// A part without engines.
pub fn body(dry: f64) -> Part {
    Part {
        name: "Part".to_owned(),
        definition: "Part".to_owned(),
        place: place(),
        role: Role::Stack { position: 0 },
        count: value(1.0),
        dry: value(dry),
        growth: value(0.0),
        propulsion: None,
    }
}

pub fn curve(points: &[f64], values: &[f64], smoothness: Smoothness, beyond: Beyond) -> Arc<Curve> {
    let plain = Dimension { length: 0, mass: 0, time: 0, temperature: 0, angle: 0 };
    let axis = Axis { name: "mach".to_owned(), dimension: plain, points: points.to_vec() };
    Arc::new(Curve {
        name: "Curve".to_owned(),
        place: place(),
        smoothness,
        beyond,
        axes: vec![axis],
        output: "cd".to_owned(),
        output_dimension: plain,
        values: values.to_vec(),
    })
}

/// Steady drag with this product of coefficient and area, m².
pub fn drag(area: f64) -> Drag {
    Drag::Steady { coefficient: value(1.0), reference_area: value(area) }
}

/// Pitch and heading in rad, in the local frame now.
pub fn pitch(pitch: f64, heading: f64) -> Steer {
    let pitch = PitchLaw::Fixed { pitch: number(pitch) };
    Steer::Pitch { pitch, heading: number(heading), frozen: false }
}

pub fn burn(parts: &[u32], steer: Steer, until: Condition) -> Phase {
    Phase {
        name: "Phase".to_owned(),
        place: place(),
        burns: parts.iter().map(|part| Burn { part: *part, engines: None }).collect(),
        lights: Vec::new(),
        steer,
        throttle: None,
        hold: None,
        until: vec![until],
        sheds: Vec::new(),
    }
}

pub fn coast(until: Condition) -> Phase {
    burn(&[], Steer::Keep, until)
}

pub fn after(duration: f64) -> Condition {
    Condition::After { duration: number(duration) }
}

pub fn spent(part: u32) -> Condition {
    Condition::Spent { part }
}

pub fn compare(quantity: Quantity, comparison: Comparison, limit: f64) -> Condition {
    Condition::Compare {
        quantity: reading(quantity),
        comparison,
        limit: number(limit),
        written: String::new(),
    }
}

pub fn hold(quantity: Quantity, limit: f64) -> Option<Hold> {
    Some(Hold { quantity: reading(quantity), limit: number(limit), place: place() })
}

pub fn shed(part: u32, when: Option<Condition>) -> Shed {
    Shed { part, when, place: place() }
}

pub fn light(part: u32, at: f64) -> Light {
    Light { part, at: value(at) }
}

/// At rest on the ground, latitude in rad.
pub fn pad(latitude: f64, altitude: f64) -> Start {
    Start::Pad { latitude: value(latitude), longitude: value(0.0), altitude: value(altitude) }
}

pub fn state(position: [f64; 3], velocity: [f64; 3]) -> Start {
    Start::State { position: position.map(value), velocity: velocity.map(value) }
}

pub fn mission(world: World, start: Start, parts: Vec<Part>, phases: Vec<Phase>) -> Mission {
    Mission {
        name: "Mission".to_owned(),
        place: place(),
        world,
        vehicle: Vehicle { name: "Vehicle".to_owned(), place: place(), parts, drag: Drag::None },
        start,
        epoch: None,
        payload: value(0.0),
        adapter: None,
        phases,
        demands: Vec::new(),
        figures: Vec::new(),
        aims: Vec::new(),
        knobs: Vec::new(),
        objective: None,
        headline: None,
        facts: Vec::new(),
    }
}
