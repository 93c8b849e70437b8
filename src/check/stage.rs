//! Stages: dry mass, propellant and engines.

use super::blocks::Bound;
use super::engine_solve::G0;
use super::sheet::{Key, Sheet, Stated};
use super::{BlockId, Context, Want, with_article};
use crate::diagnostics::codes::{dimension_mismatch, impossible_value, impulse_mismatch};
use crate::model::{Curve, Propulsion, Reserve, Thrust, Value};
use crate::quantity::Dimension;
use crate::syntax::{BlockKind, Expr, Name, Statement};

const KEYS: &[Key] = &[
    Key::new("dry", "dry  1420 kg growth 8 %").arguments(&["growth"]),
    Key::new("propellant", "propellant  16.9 t unusable 0.7 %").arguments(&["unusable"]),
    Key::new("reserve", "reserve  60 m/s"),
];

/// How far the impulse of a thrust curve may be from that of the usable propellant.
const IMPULSE_TOLERANCE: f64 = 0.02;

/// What a stage brings into a vehicle, once or several times.
#[derive(Clone, Debug)]
pub(super) struct StageFacts {
    pub dry: Value,
    pub growth: Value,
    pub propulsion: Option<Propulsion>,
}

impl<'a> Context<'a> {
    /// The checked stage, worked out on first use; None where it has errors, which have been reported.
    pub(super) fn stage(&mut self, block: BlockId) -> Option<StageFacts> {
        self.once_checked(block, |context| &mut context.stages, Context::check_stage)
    }

    fn check_stage(&mut self, block: BlockId) -> Option<StageFacts> {
        let mut engines = None;
        let sheet = self.sheet(block, KEYS, &["engines"], |inherited| match &inherited.line.statement {
            Statement::Engines { count, engine } => {
                engines = Some((count, engine, inherited));
                true
            }
            _ => false,
        });
        let masses = self.dry_mass(&sheet);
        let engines = engines.map(|(count, engine, inherited)| {
            let (path, what) = (sheet.path("engines"), "the number of engines");
            let because = inherited.line.because.as_ref();
            let count = self.fact(inherited.scope, &path, count, Want::NUMBER, what, because);
            let count = self.bounded(count, Bound::WholeFrom(1.0), what);
            (self.find_block(inherited.scope, BlockKind::Engine, engine), count)
        });
        let propulsion = match (engines, sheet.get("propellant")) {
            (None, None) => {
                if let Some(reserve) = sheet.get("reserve") {
                    let found = "a stage without propellant has no reserve";
                    self.report(impossible_value::found(
                        reserve.span,
                        found,
                        "a reserve beside `propellant`",
                    ));
                }
                Some(None)
            }
            (Some((engine, count)), Some(propellant)) => {
                self.propulsion(&sheet, engine, count, propellant).map(Some)
            }
            (None, Some(_)) => {
                self.missing(block, "engines to burn its propellant", "engines  7 of Ember");
                None
            }
            (Some(_), None) => {
                self.missing(block, "propellant for its engines", "propellant  16.9 t");
                None
            }
        };
        let (dry, growth) = masses?;
        Some(StageFacts { dry, growth, propulsion: propulsion? })
    }

    fn dry_mass(&mut self, sheet: &Sheet<'a>) -> Option<(Value, Value)> {
        let Some(stated) = sheet.get("dry") else {
            self.missing(sheet.block, "its dry mass", "dry  1420 kg");
            return None;
        };
        let dry = self.number_of(&stated, &sheet.path("dry"), Dimension::MASS, "the dry mass");
        let dry = self.bounded(dry, Bound::NotNegative, "the dry mass");
        let path = sheet.path("growth");
        let growth = match stated.argument("growth") {
            Some(growth) => {
                let what = "the growth allowance";
                let value =
                    self.fact(stated.scope, &path, &growth.value, Want::PERCENT, what, stated.because);
                self.bounded(value, Bound::NotNegative, what)
            }
            None => Some(self.default(&path, 0.0, "%", Dimension::NONE, sheet.span)),
        };
        Some((dry?, growth?))
    }

    fn propulsion(
        &mut self,
        sheet: &Sheet<'a>,
        engine: Option<BlockId>,
        engines: Option<Value>,
        stated: Stated<'a>,
    ) -> Option<Propulsion> {
        let engine = engine.and_then(|engine| self.engine(engine));
        let propellant =
            self.number_of(&stated, &sheet.path("propellant"), Dimension::MASS, "the propellant");
        let propellant = self.bounded(propellant, Bound::Positive, "the propellant")?;
        let unusable = match stated.argument("unusable") {
            Some(argument) => self.unusable(sheet, &stated, &argument.value, propellant),
            None => Some(self.default(&sheet.path("unusable"), 0.0, "kg", Dimension::MASS, sheet.span)),
        }?;
        let reserve = match sheet.get("reserve") {
            Some(reserve) => Some(self.reserve(sheet, &reserve, propellant.si - unusable.si)?),
            None => None,
        };
        let propulsion = Propulsion { engine: engine?, engines: engines?, propellant, unusable, reserve };
        self.check_impulse(&stated, &propulsion);
        Some(propulsion)
    }

    /// A share of the loaded propellant, or a mass; in kg, under the fact that states it.
    fn unusable(
        &mut self,
        sheet: &Sheet<'a>,
        stated: &Stated<'a>,
        expr: &Expr,
        loaded: Value,
    ) -> Option<Value> {
        let (path, what) = (sheet.path("unusable"), "the unusable propellant");
        let found = self.infer(stated.scope, expr)?;
        let value = if found.dimension == Dimension::MASS {
            self.fact(stated.scope, &path, expr, Dimension::MASS, what, stated.because)
        } else {
            let share = self.fact(stated.scope, &path, expr, Want::PERCENT, what, stated.because)?;
            Some(Value { si: share.si * loaded.si, ..share })
        };
        let value = self.bounded(value, Bound::NotNegative, what)?;
        if value.si >= loaded.si {
            self.report(impossible_value::found(
                expr.span,
                "none of the propellant is usable",
                "less than is loaded",
            ));
            return None;
        }
        Some(value)
    }

    fn reserve(&mut self, sheet: &Sheet<'a>, stated: &Stated<'a>, usable: f64) -> Option<Reserve> {
        let (path, what) = (sheet.path("reserve"), "the reserve");
        let expr = stated.expr();
        let found = expr.and_then(|expr| self.infer(stated.scope, expr)).map(|found| found.dimension);
        match (expr, found) {
            (_, Some(Dimension::SPEED)) => {
                let speed = self.number_of(stated, &path, Dimension::SPEED, what);
                Some(Reserve::Speed { speed: self.bounded(speed, Bound::NotNegative, what)? })
            }
            (Some(expr), Some(other)) if other != Dimension::MASS && other != Dimension::NONE => {
                let expected = "a mass of propellant or a delta-v (speed)";
                self.report(dimension_mismatch::found(
                    expr.span,
                    what,
                    self.text(expr.span),
                    &with_article(other),
                    expected,
                ));
                None
            }
            _ => {
                let mass = self.number_of(stated, &path, Dimension::MASS, what);
                let mass = self.bounded(mass, Bound::NotNegative, what)?;
                if mass.si > usable {
                    let found = "the reserve is more than the usable propellant";
                    self.report(impossible_value::found(stated.span, found, "a reserve within it"));
                    return None;
                }
                Some(Reserve::Mass { mass })
            }
        }
    }

    /// An engine with a thrust curve burns a certain mass: it has to be about what the stage carries.
    fn check_impulse(&mut self, stated: &Stated<'a>, propulsion: &Propulsion) {
        let Thrust::Curve { curve } = &propulsion.engine.thrust else { return };
        let usable = propulsion.propellant.si - propulsion.unusable.si;
        let burnt = propulsion.engines.si * impulse(curve) / (propulsion.engine.isp.si * G0);
        if (burnt - usable).abs() > IMPULSE_TOLERANCE * usable {
            let (burnt, usable) =
                (self.show(stated.scope, burnt, "kg"), self.show(stated.scope, usable, "kg"));
            let name = Name { span: stated.span, text: curve.name.clone() };
            let defined = self.block_named(stated.scope, &name.text).and_then(Result::ok);
            let defined = defined.map(|block| self.definition(block).block.name.span);
            self.report(impulse_mismatch::found(stated.span, &curve.name, &burnt, &usable, defined));
        }
    }
}

/// N·s, by the trapezium rule: exact for straight lines, within the tolerance for smooth curves.
fn impulse(curve: &Curve) -> f64 {
    let Some(axis) = curve.axes.first() else { return 0.0 };
    let times = axis.points.windows(2);
    let thrusts = curve.values.windows(2);
    times
        .zip(thrusts)
        .map(|(t, f)| match (t, f) {
            ([from, to], [first, last]) => (to - from) * (first + last) / 2.0,
            _ => 0.0,
        })
        .sum()
}
