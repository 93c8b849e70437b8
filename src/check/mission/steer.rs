//! The attitude law of a phase.

use super::Site;
use super::formula::{Speaks, constant};
use crate::check::{Context, ScopeId};
use crate::diagnostics::codes::angle_out_of_range;
use crate::model::{Formula, PitchLaw, Steer, Value};
use crate::quantity::Dimension;
use crate::syntax::{self, Because, Expr};

impl<'a> Context<'a> {
    pub(super) fn steer(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        steer: &syntax::Steer,
        because: Option<&Because>,
    ) -> Option<Steer> {
        Some(match steer {
            syntax::Steer::Upright => Steer::Upright,
            syntax::Steer::IntoAirflow => Steer::IntoAirflow,
            syntax::Steer::FromAirflow => Steer::FromAirflow,
            syntax::Steer::Motion { against, over_ground } => {
                Steer::Motion { against: *against, over_ground: *over_ground }
            }
            syntax::Steer::Keep => Steer::Keep,
            syntax::Steer::Pitch { law, heading, frozen } => {
                let mut part = |expr: &Expr, name: &str, dimension: Dimension, what: &str| {
                    let path = format!("{phase}.steer.{name}");
                    self.limit(site, scope, (&path, expr), Speaks::Constant, (dimension, what), because)
                };
                let angle = Dimension::ANGLE;
                let pitch = match law {
                    syntax::PitchLaw::Fixed(pitch) => {
                        part(pitch, "pitch", angle, "the pitch").map(|pitch| PitchLaw::Fixed { pitch })
                    }
                    syntax::PitchLaw::Rate { from, rate } => {
                        let from = part(from, "from", angle, "the pitch at the start");
                        let rate = part(rate, "rate", Dimension::ANGULAR_RATE, "the pitch rate");
                        from.zip(rate).map(|(from, rate)| PitchLaw::Rate { from, rate })
                    }
                    syntax::PitchLaw::Over { from, by, over } => {
                        let from = part(from, "from", angle, "the pitch at the start");
                        let by = part(by, "by", angle, "the change of pitch");
                        let over = part(over, "over", Dimension::TIME, "the time of the change");
                        from.zip(by).zip(over).map(|((from, by), over)| PitchLaw::Over { from, by, over })
                    }
                    syntax::PitchLaw::Tangent { a, b } => {
                        let a = part(a, "tangent", Dimension::NONE, "the tangent at the start");
                        let b = part(b, "tangent_rate", Dimension::FREQUENCY, "the rate of the tangent");
                        a.zip(b).map(|(a, b)| PitchLaw::Tangent { a, b })
                    }
                };
                let of_heading = part(heading, "heading", angle, "the heading");
                let (pitch, of_heading) = (pitch?, of_heading?);
                if let (syntax::PitchLaw::Over { over: stated, .. }, PitchLaw::Over { over, .. }) =
                    (law, &pitch)
                {
                    let words = ("the time of the change", "more than zero");
                    self.require((stated, over), |time| time > 0.0, words)?;
                }
                self.steep(law, &pitch)?;
                self.angle_of(&of_heading, 360.0, heading, "a heading")?;
                Steer::Pitch { pitch, heading: of_heading, frozen: *frozen }
            }
        })
    }

    /// A pitch beyond the vertical is a heading the other way round.
    fn steep(&mut self, law: &syntax::PitchLaw, pitch: &PitchLaw) -> Option<()> {
        match (law, pitch) {
            (syntax::PitchLaw::Fixed(expr), PitchLaw::Fixed { pitch }) => {
                self.angle_of(pitch, 90.0, expr, "a pitch")
            }
            (syntax::PitchLaw::Rate { from: expr, .. }, PitchLaw::Rate { from, .. })
            | (syntax::PitchLaw::Over { from: expr, .. }, PitchLaw::Over { from, .. }) => {
                self.angle_of(from, 90.0, expr, "a pitch")
            }
            _ => Some(()),
        }
    }

    fn angle_of(&mut self, formula: &Formula, most: f64, expr: &Expr, what: &str) -> Option<()> {
        let Some(radians) = constant(formula) else { return Some(()) };
        if radians.abs() * (180.0 / std::f64::consts::PI) <= most + 1e-9 {
            return Some(());
        }
        self.report(angle_out_of_range::found(expr.span, what, self.text(expr.span), most));
        None
    }

    /// An angle of the start that has to lie within ± `most` degrees.
    pub(super) fn angle_within(&mut self, value: Value, most: f64, what: &str) -> Option<()> {
        if value.si.abs() * (180.0 / std::f64::consts::PI) <= most + 1e-9 {
            return Some(());
        }
        let record = self.records.get(value.fact.0 as usize).map(|record| record.span)?;
        self.report(angle_out_of_range::found(record, what, self.text(record), most));
        None
    }
}
