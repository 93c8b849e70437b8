//! Engines: the least set of facts, what follows from it, and what contradicts it.

use std::sync::Arc;

use super::blocks::Bound;
use super::engine_lines::Line;
use super::engine_solve::{self, Slot};
use super::sheet::{Key, Sheet, Stated};
use super::{BlockId, Context, Want};
use crate::diagnostics::codes::{
    foreign_fact, impossible_value, missing_ambient, missing_fact, unfit_curve, unlikely_value,
};
use crate::model::{Curve, Engine, Thrust, Value};
use crate::quantity::Dimension;
use crate::syntax::{Ambient, BlockKind, Name};

const KEYS: &[Key] = &[
    Key::new("thrust", "thrust  43.0 kN in vacuum").ambient(),
    Key::new("isp", "isp  304 s in vacuum").ambient(),
    Key::new("exhaust_speed", "exhaust_speed  2981 m/s in vacuum").ambient(),
    Key::new("exit_area", "exit_area  0.047 m^2"),
    Key::new("mass_flow", "mass_flow  14.4 kg/s"),
    Key::new("throttle", "throttle  55 % .. 100 %").range(),
    Key::new("restarts", "restarts  2"),
];

/// Above this a chemical engine does not go, s.
const UNLIKELY_ISP: f64 = 2000.0;

impl<'a> Context<'a> {
    /// The checked engine, worked out on first use; None where it has errors, which have been reported.
    pub(crate) fn engine(&mut self, block: BlockId) -> Option<Engine> {
        self.once_checked(block, |context| &mut context.engines, Context::check_engine)
    }

    fn check_engine(&mut self, block: BlockId) -> Option<Engine> {
        let sheet = self.sheet(block, KEYS, &[], |_| false);
        let throttle = self.throttle(&sheet);
        let restarts = match sheet.get("restarts") {
            Some(stated) => {
                let value =
                    self.number_of(&stated, &sheet.path("restarts"), Want::NUMBER, "the number of restarts");
                self.bounded(value, Bound::WholeFrom(0.0), "the number of restarts").map(Some)
            }
            None => Some(None),
        };
        let curve = self.thrust_curve(&sheet);
        let performance = match curve {
            Some((stated, curve)) => self.curve_performance(&sheet, stated, curve),
            None => self.steady_performance(&sheet),
        };
        let (thrust, isp, exit_area) = performance?;
        let (throttle_least, throttle_most) = throttle?;
        if isp.si > UNLIKELY_ISP {
            let span = self.records.get(isp.fact.0 as usize).map_or(sheet.span, |record| record.span);
            self.report(unlikely_value::found(
                span,
                "a specific impulse above 2000 s",
                "chemical engines stay below 500 s",
            ));
        }
        Some(Engine {
            name: sheet.name.to_string(),
            place: self.place(sheet.span),
            thrust,
            isp,
            exit_area,
            throttle_least,
            throttle_most,
            restarts: restarts?,
        })
    }

    fn throttle(&mut self, sheet: &Sheet<'a>) -> Option<(Value, Value)> {
        let paths = (sheet.path("throttle.least"), sheet.path("throttle.most"));
        let Some(stated) = sheet.get("throttle") else {
            let least = self.default(&paths.0, 1.0, "%", Dimension::NONE, sheet.span);
            return Some((least, self.default(&paths.1, 1.0, "%", Dimension::NONE, sheet.span)));
        };
        let Some(upto) = &stated.setting.upto else {
            let what = "the end of the throttle's range";
            self.report(missing_fact::no_value(stated.setting.key.span, what, stated.key.example));
            return None;
        };
        let least = self.number_of(&stated, &paths.0, Want::PERCENT, "the least throttle");
        let most =
            self.fact(stated.scope, &paths.1, upto, Want::PERCENT, "the greatest throttle", stated.because);
        let least = self.bounded(least, Bound::NotNegative, "the least throttle");
        let most = self.bounded(most, Bound::Positive, "the greatest throttle");
        let (least, most) = (least?, most?);
        if least.si > most.si {
            let found = "the range of the throttle ends below its start";
            self.report(impossible_value::found(upto.span, found, "the least throttle first"));
            return None;
        }
        Some((least, most))
    }

    /// A thrust that names a curve: the curve, or None where that has errors.
    fn thrust_curve(&mut self, sheet: &Sheet<'a>) -> Option<(Stated<'a>, Option<Arc<Curve>>)> {
        let stated = sheet.get_in("thrust", Ambient::Vacuum).or_else(|| sheet.get("thrust"))?;
        let name = stated.name().filter(|name| self.find_given(stated.scope, &name.text).is_none())?;
        let curve = self.find_block(stated.scope, BlockKind::Curve, name).and_then(|curve| self.curve(curve));
        let curve = curve.filter(|curve| self.check_thrust_curve(name, curve));
        Some((stated, curve))
    }

    /// Force over the time since it was lit, nowhere below zero.
    fn check_thrust_curve(&mut self, name: &Name, curve: &Curve) -> bool {
        let axis = curve.axes.first().filter(|axis| axis.name == "time" && axis.dimension == Dimension::TIME);
        let Some(axis) = axis.filter(|_| curve.axes.len() == 1 && curve.output_dimension == Dimension::FORCE)
        else {
            let header = "time [s] -> thrust [kN]";
            self.report(unfit_curve::found(name.span, &name.text, "thrust over time", header));
            return false;
        };
        let found = if curve.values.iter().any(|thrust| *thrust < 0.0) {
            "a thrust below zero"
        } else if axis.points.first().is_none_or(|start| *start != 0.0) {
            "no thrust at 0 s, when it is lit"
        } else {
            return true;
        };
        let found = format!("`{}` has {found}", name.text);
        self.report(impossible_value::found(name.span, &found, "thrust from 0 s on, zero or more"));
        false
    }

    /// A thrust over time goes with an isp in vacuum and an exit area; nothing else can be told from it.
    fn curve_performance(
        &mut self,
        sheet: &Sheet<'a>,
        thrust: Stated<'a>,
        curve: Option<Arc<Curve>>,
    ) -> Option<(Thrust, Value, Value)> {
        if thrust.ambient() == Some(Ambient::SeaLevel) {
            self.report(missing_ambient::found(thrust.span, "thrust", "in vacuum"));
        }
        let others = [
            sheet.get_in("thrust", Ambient::SeaLevel).filter(|other| other.span != thrust.span),
            sheet.get_in("isp", Ambient::SeaLevel),
            sheet.get_in("exhaust_speed", Ambient::SeaLevel),
            sheet.get("mass_flow"),
        ];
        for other in others.into_iter().flatten() {
            self.report(foreign_fact::beside_thrust_curve(other.span, thrust.span));
        }
        let lines = self.lines_of_engine(sheet);
        let solution = engine_solve::solve(&lines.iter().map(|line| line.statement).collect::<Vec<_>>());
        let area = lines.iter().find(|line| line.statement.slot == Slot::ExitArea).map(|line| line.value);
        let isp = match solution.get(Slot::IspVacuum) {
            Some(si) => self.value_or_derived(sheet, &lines, "isp", si),
            None => {
                self.missing_unless_broken(sheet, "isp", "its specific impulse", "isp  304 s in vacuum");
                None
            }
        };
        let exit_area = match area {
            Some(area) => area,
            None => self.no_exit_area(sheet),
        };
        Some((Thrust::Curve { curve: curve? }, isp?, exit_area))
    }

    fn steady_performance(&mut self, sheet: &Sheet<'a>) -> Option<(Thrust, Value, Value)> {
        let lines = self.lines_of_engine(sheet);
        let statements: Vec<_> = lines.iter().map(|line| line.statement).collect();
        if self.is_unchanged() && self.report_contradictions(&lines, &statements) {
            return None;
        }
        let solution = engine_solve::solve(&statements);
        let (thrust, isp) = (solution.get(Slot::ThrustVacuum), solution.get(Slot::IspVacuum));
        let (Some(thrust), Some(isp)) = (thrust, isp) else {
            self.report_lack(sheet, &lines);
            return None;
        };
        let area = solution.get(Slot::ExitArea);
        if area.is_some_and(|area| area < 0.0) {
            let at_sea_level = lines.iter().find(|line| line.stated.ambient() == Some(Ambient::SeaLevel));
            let span = at_sea_level.map_or(sheet.span, |line| line.stated.span);
            let found = "an engine cannot do better at sea level than in vacuum";
            self.report(impossible_value::found(
                span,
                found,
                "less than in vacuum, by the pressure on the exit area",
            ));
            return None;
        }
        let vacuum = self.value_or_derived(sheet, &lines, "thrust", thrust)?;
        let isp = self.value_or_derived(sheet, &lines, "isp", isp)?;
        let exit_area = match area {
            Some(area) => self.value_or_derived(sheet, &lines, "exit_area", area)?,
            None => self.no_exit_area(sheet),
        };
        Some((Thrust::Steady { vacuum }, isp, exit_area))
    }

    fn no_exit_area(&mut self, sheet: &Sheet<'a>) -> Value {
        self.vacuum_only.insert(sheet.block);
        self.default(&sheet.path("exit_area"), 0.0, "m^2", Dimension::AREA, sheet.span)
    }

    /// The fact that states a quantity in vacuum, or one that is derived.
    fn value_or_derived(
        &mut self,
        sheet: &Sheet<'a>,
        lines: &[Line<'a>],
        key: &str,
        si: f64,
    ) -> Option<Value> {
        let stated = lines
            .iter()
            .find(|line| line.stated.key.name == key && line.stated.ambient() != Some(Ambient::SeaLevel));
        if let Some(line) = stated {
            return Some(line.value);
        }
        let (unit, dimension) = match key {
            "thrust" => ("kN", Dimension::FORCE),
            "isp" => ("s", Dimension::TIME),
            _ => ("m^2", Dimension::AREA),
        };
        Some(self.derived(&sheet.path(key), si, unit, dimension, sheet.span))
    }
}
