//! The lines of an engine that follow from each other, and what is wrong with them together.

use super::Context;
use super::blocks::Bound;
use super::engine_solve::{self, Slot, Statement};
use super::sheet::{Sheet, Stated};
use crate::diagnostics::codes::{contradiction, isp_as_speed, missing_ambient};
use crate::model::Value;
use crate::quantity::{Dimension, digits_written};
use crate::source::Span;
use crate::syntax::{Ambient, Expr, ExprKind};

/// A line that states one of the quantities that follow from each other.
pub(super) struct Line<'a> {
    pub stated: Stated<'a>,
    pub value: Value,
    /// What the solver is told: of an exhaust speed, the specific impulse.
    pub statement: Statement,
    /// SI of the line for one of the solver.
    scale: f64,
}

impl<'a> Context<'a> {
    /// The lines that the solver takes, as facts.
    pub(super) fn lines_of_engine(&mut self, sheet: &Sheet<'a>) -> Vec<Line<'a>> {
        let mut lines = Vec::new();
        for key in ["thrust", "isp", "exhaust_speed"] {
            if let Some(stated) = sheet.get(key).filter(|stated| stated.ambient().is_none()) {
                self.report(missing_ambient::found(
                    stated.setting.key.span,
                    key,
                    "in vacuum` or `at sea_level",
                ));
            }
        }
        let kinds: [(&str, Option<Ambient>, Slot, Dimension, &str); 8] = [
            ("thrust", Some(Ambient::Vacuum), Slot::ThrustVacuum, Dimension::FORCE, "the thrust in vacuum"),
            (
                "isp",
                Some(Ambient::Vacuum),
                Slot::IspVacuum,
                Dimension::TIME,
                "the specific impulse in vacuum",
            ),
            (
                "exhaust_speed",
                Some(Ambient::Vacuum),
                Slot::IspVacuum,
                Dimension::SPEED,
                "the exhaust speed in vacuum",
            ),
            ("exit_area", None, Slot::ExitArea, Dimension::AREA, "the exit area"),
            ("thrust", Some(Ambient::SeaLevel), Slot::ThrustSea, Dimension::FORCE, "the thrust at sea level"),
            (
                "isp",
                Some(Ambient::SeaLevel),
                Slot::IspSea,
                Dimension::TIME,
                "the specific impulse at sea level",
            ),
            (
                "exhaust_speed",
                Some(Ambient::SeaLevel),
                Slot::IspSea,
                Dimension::SPEED,
                "the exhaust speed at sea level",
            ),
            ("mass_flow", None, Slot::MassFlow, Dimension::MASS_FLOW, "the mass flow"),
        ];
        for (key, ambient, slot, dimension, what) in kinds {
            let found = match ambient {
                Some(ambient) => sheet.get_in(key, ambient),
                None => sheet.get(key),
            };
            if let Some(stated) = found {
                lines.extend(self.engine_line(sheet, stated, (slot, dimension, what)));
            }
        }
        lines
    }

    fn engine_line(
        &mut self,
        sheet: &Sheet<'a>,
        stated: Stated<'a>,
        (slot, dimension, what): (Slot, Dimension, &str),
    ) -> Option<Line<'a>> {
        let key = stated.key.name;
        if key == "thrust"
            && stated.name().is_some_and(|name| self.find_given(stated.scope, &name.text).is_none())
        {
            return None;
        }
        if self.isp_mistaken_for_speed(&stated) {
            return None;
        }
        let path = match stated.ambient() {
            Some(Ambient::SeaLevel) => sheet.path(&format!("{key}.sea_level")),
            _ => sheet.path(key),
        };
        let bound = if key == "exit_area" { Bound::NotNegative } else { Bound::Positive };
        let value = self.number_of(&stated, &path, dimension, what);
        let value = self.bounded(value, bound, what)?;
        let half = self.half_last_digit(&stated, stated.expr()?);
        let scale = if key == "exhaust_speed" { engine_solve::G0 } else { 1.0 };
        let statement = Statement { slot, si: value.si / scale, half: half / scale };
        Some(Line { stated, value, statement, scale })
    }

    /// Reports an isp in m/s or an exhaust speed in s, with the number that was meant.
    fn isp_mistaken_for_speed(&mut self, stated: &Stated<'a>) -> bool {
        let Some(expr) = stated.expr() else { return false };
        let (is, wrong, factor, unit) = match stated.key.name {
            "isp" => ("isp", Dimension::SPEED, 1.0 / engine_solve::G0, "s"),
            "exhaust_speed" => ("exhaust_speed", Dimension::TIME, engine_solve::G0, "m/s"),
            _ => return false,
        };
        match self.infer(stated.scope, expr) {
            Some(found) if found.dimension == wrong => {
                let meant = self.show(stated.scope, found.si * factor, unit);
                self.report(isp_as_speed::found(expr.span, is, self.text(expr.span), &meant));
                true
            }
            _ => false,
        }
    }

    /// Half a unit of the last digit of a plain number, in SI; zero for an expression.
    fn half_last_digit(&mut self, stated: &Stated<'a>, expr: &Expr) -> f64 {
        let ExprKind::Number(literal) = &expr.kind else { return 0.0 };
        let half = digits_written(self.text(literal.digits)).map_or(0.0, |written| written.last / 2.0);
        let factor =
            literal.unit.as_ref().and_then(|unit| self.unit(stated.scope, unit)).map(|unit| unit.factor);
        half * factor.unwrap_or(1.0)
    }

    /// True where statements do not agree; each is shown with what the others make of it.
    pub(super) fn report_contradictions(&mut self, lines: &[Line<'a>], statements: &[Statement]) -> bool {
        let mut places: Vec<(Span, String)> = Vec::new();
        for (index, line) in lines.iter().enumerate() {
            if let Some(expected) = engine_solve::contradiction(statements, index) {
                let unit = self
                    .facts
                    .get(line.value.fact.0 as usize)
                    .map(|fact| fact.unit.clone())
                    .unwrap_or_default();
                let shown = self.show(line.stated.scope, expected * line.scale, &unit);
                places.push((line.stated.span, format!("the other facts make this {shown}")));
            }
        }
        if let Some((first, rest)) = places.split_first() {
            self.report(contradiction::found(first, rest));
        }
        !places.is_empty()
    }

    /// Says which of thrust and isp an engine lacks, unless a line for it is there and wrong.
    pub(super) fn report_lack(&mut self, sheet: &Sheet<'a>, lines: &[Line<'a>]) {
        let has = |slots: [Slot; 2]| lines.iter().any(|line| slots.contains(&line.statement.slot));
        let thrust = has([Slot::ThrustVacuum, Slot::ThrustSea]);
        let isp = has([Slot::IspVacuum, Slot::IspSea]);
        let flow = has([Slot::MassFlow, Slot::MassFlow]);
        if !(thrust || isp && flow) {
            self.missing_unless_broken(sheet, "thrust", "its thrust", "thrust  43.0 kN in vacuum");
        }
        if !(isp || thrust && flow) {
            self.missing_unless_broken(sheet, "isp", "its specific impulse", "isp  304 s in vacuum");
        }
        if flow || thrust && isp {
            self.missing_unless_broken(
                sheet,
                "exit_area",
                "what links sea level and vacuum",
                "exit_area  0.047 m^2",
            );
        }
    }

    pub(super) fn missing_unless_broken(&mut self, sheet: &Sheet<'a>, key: &str, what: &str, example: &str) {
        let stated = sheet.get(key).or_else(|| (key == "isp").then(|| sheet.get("exhaust_speed")).flatten());
        if stated.is_none() {
            self.missing(sheet.block, what, example);
        }
    }
}
