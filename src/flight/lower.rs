//! From the checked model to the numeric plan, once for each flight.

use super::plan::{
    Burn, Condition, Drag, G0, Hold, Motor, Part, Phase, PitchLaw, Plan, Reserve, Second, Shed, Start, Steer,
    Thrust,
};
use super::program::Program;
use super::table::Table;
use crate::math::{Scalar, Vector};
use crate::model::{self, Formula, Mission, Operator, Value};
use crate::world::{
    Air, Central, Elements, Ellipsoid, Exponential, Geodetic, Gravity, Spin, Surface, earth_rotation_angle,
};

/// The one place where a value of the model becomes a number of the flight.
fn lower<S: Scalar>(value: Value) -> S {
    S::from(value.si)
}

/// A formula without readings; the checker admits no other where this is used.
fn fixed<S: Scalar>(formula: &Formula) -> S {
    Program::new(formula).constant().unwrap_or_else(|| S::from(f64::NAN))
}

pub fn plan<S: Scalar>(mission: &Mission) -> Plan<S> {
    let world = &mission.world;
    let (surface, equatorial_radius) = match world.surface {
        model::Surface::Flat => (Surface::Flat, None),
        model::Surface::Ellipsoid { equatorial_radius, flattening } => {
            let radius = lower(equatorial_radius);
            let ellipsoid = Ellipsoid { equatorial_radius: radius, flattening: lower(flattening) };
            (Surface::Ellipsoid(ellipsoid), Some(radius))
        }
    };
    let (gravity, mu) = match world.gravity {
        model::Gravity::Uniform { size } => (Gravity::Uniform(lower(size)), None),
        model::Gravity::Central { mu, j2 } => {
            let zonals: Vec<S> = j2.map(lower).into_iter().collect();
            let radius = equatorial_radius.unwrap_or_else(S::one);
            (Gravity::Central(Central::new(lower(mu), radius, &zonals)), Some(lower(mu)))
        }
    };
    let angle = mission.epoch.as_ref().map_or(0.0, |epoch| earth_rotation_angle(epoch.julian_date));
    let spin = Spin { rate: lower(world.spin), angle: S::from(angle) };
    let air = match world.air {
        model::Air::None => Air::None,
        model::Air::Standard1976 => Air::Standard1976,
        model::Air::Exponential { density, pressure, scale_height, sound_speed } => {
            Air::Exponential(Exponential {
                density: lower(density),
                pressure: lower(pressure),
                scale_height: lower(scale_height),
                sound_speed: lower(sound_speed),
            })
        }
    };
    let payload = mission.adapter.map_or_else(S::zero, lower) + lower::<S>(mission.payload);
    let parts: Vec<Part<S>> = mission.vehicle.parts.iter().map(part).collect();
    let phases = mission.phases.iter().map(|from| phase(from, &parts)).collect();
    let start = start(&mission.start, &surface, &spin, mu, equatorial_radius);
    Plan {
        gravity,
        mu,
        equatorial_radius,
        surface,
        spin,
        air,
        drag: drag(&mission.vehicle.drag),
        parts,
        payload,
        phases,
        start,
    }
}

fn drag<S: Scalar>(drag: &model::Drag) -> Drag<S> {
    match drag {
        model::Drag::None => Drag::None,
        model::Drag::Steady { coefficient, reference_area } => {
            Drag::Steady(lower::<S>(*coefficient) * lower::<S>(*reference_area))
        }
        model::Drag::Curve { curve, reference_area } => {
            let second = match curve.axes.get(1).map(|axis| axis.name.as_str()) {
                None => Second::None,
                Some("angle_of_attack") => Second::AngleOfAttack,
                Some(_) => Second::Altitude,
            };
            Drag::Curve { table: Table::new(curve, 1.0), area: lower(*reference_area), second }
        }
    }
}

fn part<S: Scalar>(part: &model::Part) -> Part<S> {
    let count: S = lower(part.count);
    let dry_basic = count * lower::<S>(part.dry);
    let dry_growth = dry_basic * lower::<S>(part.growth);
    let Some(propulsion) = &part.propulsion else {
        return Part { dry_basic, dry_growth, loaded: S::zero(), usable: S::zero(), motor: None };
    };
    let engine = &propulsion.engine;
    let loaded = count * lower::<S>(propulsion.propellant);
    let motor = Motor {
        engines: count * lower::<S>(propulsion.engines),
        count,
        thrust: match &engine.thrust {
            model::Thrust::Steady { vacuum } => Thrust::Steady(lower(*vacuum)),
            model::Thrust::Curve { curve } => Thrust::Curve(Table::new(curve, 1.0)),
        },
        exhaust: lower::<S>(engine.isp) * G0,
        exit_area: lower(engine.exit_area),
        least: lower(engine.throttle_least),
        most: lower(engine.throttle_most),
        reserve: match propulsion.reserve {
            None => Reserve::Mass(S::zero()),
            Some(model::Reserve::Mass { mass }) => Reserve::Mass(count * lower::<S>(mass)),
            Some(model::Reserve::Speed { speed }) => Reserve::Speed(lower(speed)),
        },
    };
    Part {
        dry_basic,
        dry_growth,
        loaded,
        usable: loaded - count * lower::<S>(propulsion.unusable),
        motor: Some(motor),
    }
}

fn phase<S: Scalar>(phase: &model::Phase, parts: &[Part<S>]) -> Phase<S> {
    let burn = |index: u32, engines: Option<Value>| {
        let part = index as usize;
        let motor = parts.get(part).and_then(|part| part.motor.as_ref());
        let engines = match (engines, motor) {
            (Some(engines), Some(motor)) => lower::<S>(engines) * motor.count,
            (None, Some(motor)) => motor.engines,
            (_, None) => S::zero(),
        };
        Burn { part, engines }
    };
    Phase {
        burns: phase.burns.iter().map(|lit| burn(lit.part, lit.engines)).collect(),
        lights: phase.lights.iter().map(|light| (burn(light.part, None), lower(light.at))).collect(),
        steer: steer(&phase.steer),
        throttle: phase.throttle.map_or_else(S::one, lower),
        hold: phase.hold.as_ref().and_then(|hold| {
            let quantity = Program::<S>::new(&hold.quantity).reading()?.quantity;
            Some(Hold { quantity, limit: fixed(&hold.limit) })
        }),
        until: phase.until.iter().map(condition).collect(),
        sheds: phase
            .sheds
            .iter()
            .map(|shed| Shed { part: shed.part as usize, when: shed.when.as_ref().map(condition) })
            .collect(),
    }
}

fn steer<S: Scalar>(steer: &model::Steer) -> Steer<S> {
    match steer {
        model::Steer::Upright => Steer::Upright,
        model::Steer::IntoAirflow => Steer::Airflow { against: false },
        model::Steer::FromAirflow => Steer::Airflow { against: true },
        model::Steer::Motion { against, over_ground } => {
            Steer::Motion { against: *against, over_ground: *over_ground }
        }
        model::Steer::Keep => Steer::Keep,
        model::Steer::Pitch { pitch, heading, frozen } => Steer::Pitch {
            law: match pitch {
                model::PitchLaw::Fixed { pitch } => PitchLaw::Fixed(fixed(pitch)),
                model::PitchLaw::Rate { from, rate } => {
                    PitchLaw::Rate { from: fixed(from), rate: fixed(rate) }
                }
                model::PitchLaw::Over { from, by, over } => {
                    PitchLaw::Over { from: fixed(from), by: fixed(by), over: fixed(over) }
                }
                model::PitchLaw::Tangent { a, b } => PitchLaw::Tangent { a: fixed(a), b: fixed(b) },
            },
            heading: fixed(heading),
            frozen: *frozen,
        },
    }
}

fn condition<S: Scalar>(condition: &model::Condition) -> Condition<S> {
    match condition {
        model::Condition::After { duration } => Condition::After(fixed(duration)),
        model::Condition::Compare { quantity, comparison, limit, .. } => {
            let difference = Formula::Binary {
                operator: Operator::Subtract,
                left: Box::new(quantity.clone()),
                right: Box::new(limit.clone()),
            };
            Condition::Compare(Program::new(&difference), *comparison)
        }
        model::Condition::Spent { part } => Condition::Spent(*part as usize),
        model::Condition::Apex => Condition::Apex,
        model::Condition::Touchdown => Condition::Touchdown,
    }
}

fn start<S: Scalar>(
    start: &model::Start,
    surface: &Surface<S>,
    spin: &Spin<S>,
    mu: Option<S>,
    equatorial_radius: Option<S>,
) -> Start<S> {
    let turn = spin.at(S::zero());
    let (pad, position, velocity) = match start {
        model::Start::Pad { latitude, longitude, altitude } => {
            let at = Geodetic {
                latitude: lower(*latitude),
                longitude: lower(*longitude),
                altitude: lower(*altitude),
            };
            let position = turn.to_inertial(surface.position(at));
            (true, position, spin.velocity(position))
        }
        model::Start::Orbit { perigee, apogee, inclination, node, argument, anomaly } => {
            let radius = equatorial_radius.unwrap_or_else(S::zero);
            let apsides = Elements::from_apsides(radius + lower::<S>(*perigee), radius + lower::<S>(*apogee));
            let elements = Elements {
                inclination: lower(*inclination),
                node: lower(*node),
                argument_of_perigee: lower(*argument),
                true_anomaly: lower(*anomaly),
                ..apsides
            };
            let (position, velocity) = elements.state(mu.unwrap_or_else(S::one));
            (false, position, velocity)
        }
        model::Start::State { position, velocity } => {
            (false, Vector(position.map(lower)), Vector(velocity.map(lower)))
        }
    };
    let local = surface.local(position);
    Start {
        pad,
        position,
        velocity,
        axes: local.axes,
        altitude: local.altitude,
        fixed: turn.to_fixed(position),
    }
}
