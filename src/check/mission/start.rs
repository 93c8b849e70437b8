//! The state at the start.

use super::Site;
use crate::check::{Context, Inherited};
use crate::diagnostics::codes::{impossible_orbit, missing_fact, unexpected_part};
use crate::model::{Start, Surface, Value};
use crate::quantity::Dimension;
use crate::syntax::{Argument, StartKind, Statement};

/// The arguments of one form of `start`, with the dimension of each.
type Form = &'static [(&'static str, Dimension)];

const PAD: Form =
    &[("latitude", Dimension::ANGLE), ("longitude", Dimension::ANGLE), ("altitude", Dimension::LENGTH)];
const ORBIT: Form = &[
    ("perigee", Dimension::LENGTH),
    ("apogee", Dimension::LENGTH),
    ("inclination", Dimension::ANGLE),
    ("node", Dimension::ANGLE),
    ("argument", Dimension::ANGLE),
    ("anomaly", Dimension::ANGLE),
];
const STATE: Form = &[
    ("x", Dimension::LENGTH),
    ("y", Dimension::LENGTH),
    ("z", Dimension::LENGTH),
    ("vx", Dimension::SPEED),
    ("vy", Dimension::SPEED),
    ("vz", Dimension::SPEED),
];

const PAD_EXAMPLE: &str = "start  pad latitude 58.2 deg longitude -11.6 deg altitude 45 m";
const ORBIT_EXAMPLE: &str =
    "start  orbit perigee 180 km apogee 240 km inclination 51 deg node 10 deg argument 0 deg anomaly 0 deg";
const STATE_EXAMPLE: &str = "start  state x 7000 km y 0 km z 0 km vx 0 km/s vy 7.5 km/s vz 0 km/s";

impl<'a> Context<'a> {
    pub(super) fn start(&mut self, site: &Site<'a>, line: Inherited<'a>) -> Option<Start> {
        let Statement::Start { kind, kind_span, arguments } = &line.line.statement else { return None };
        let flat = matches!(site.world.surface, Surface::Flat);
        let (form, example) = match kind {
            StartKind::Pad => (PAD, PAD_EXAMPLE),
            StartKind::Orbit => (ORBIT, ORBIT_EXAMPLE),
            StartKind::State => (STATE, STATE_EXAMPLE),
        };
        let words: Vec<&str> = form.iter().map(|(name, _)| *name).collect();
        for argument in arguments.iter().filter(|argument| !words.contains(&argument.name.text.as_str())) {
            let part = format!("`{}`", argument.name.text);
            self.report(unexpected_part::found(argument.name.span, &part, "start", example, &words));
        }
        let mut values = Vec::new();
        for (name, dimension) in form {
            let path = format!("start.{name}");
            let stated = arguments.iter().find(|argument| argument.name.text == *name);
            let value = match stated {
                Some(Argument { value, .. }) => {
                    let what = format!("the {name} of the start");
                    self.fact(line.scope, &path, value, *dimension, &what, line.line.because.as_ref())
                }
                // A flat world has no angles.
                None if *kind == StartKind::Pad && flat => Some(self.default(
                    &path,
                    0.0,
                    if *dimension == Dimension::ANGLE { "deg" } else { "m" },
                    *dimension,
                    *kind_span,
                )),
                None => {
                    self.report(missing_fact::beside(*kind_span, &format!("`{name}`"), example));
                    None
                }
            };
            values.push(value);
        }
        let values: Vec<Value> = values.into_iter().collect::<Option<_>>()?;
        match (kind, values.as_slice()) {
            (StartKind::Pad, [latitude, longitude, altitude]) => {
                self.angle_within(*latitude, 90.0, "the latitude")?;
                self.angle_within(*longitude, 360.0, "the longitude")?;
                Some(Start::Pad { latitude: *latitude, longitude: *longitude, altitude: *altitude })
            }
            (StartKind::Orbit, [perigee, apogee, inclination, node, argument, anomaly]) => {
                let start = Start::Orbit {
                    perigee: *perigee,
                    apogee: *apogee,
                    inclination: *inclination,
                    node: *node,
                    argument: *argument,
                    anomaly: *anomaly,
                };
                let fault = match () {
                    () if flat => Some("a flat world has no orbits"),
                    () if perigee.si > apogee.si => Some("the perigee is above the apogee"),
                    () if perigee.si <= 0.0 => Some("the perigee is below the ground"),
                    () if !(0.0..=std::f64::consts::PI).contains(&inclination.si) => {
                        Some("an inclination is between 0 deg and 180 deg")
                    }
                    () => None,
                };
                if let Some(fault) = fault {
                    self.report(impossible_orbit::found(line.line.span, fault));
                    return None;
                }
                Some(start)
            }
            (StartKind::State, [x, y, z, vx, vy, vz]) => {
                let radius_squared = x.si * x.si + y.si * y.si + z.si * z.si;
                if !flat && radius_squared == 0.0 {
                    self.report(impossible_orbit::found(line.line.span, "this is the centre of the body"));
                    return None;
                }
                Some(Start::State { position: [*x, *y, *z], velocity: [*vx, *vy, *vz] })
            }
            _ => None,
        }
    }
}
