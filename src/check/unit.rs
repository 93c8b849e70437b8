//! Units as sources write and define them.

use std::collections::{BTreeMap, BTreeSet};

use super::{Context, ScopeId};
use crate::diagnostics::codes::{duplicate_name, impossible_value, unknown_unit};
use crate::quantity::{Dimension, System, Unit, UnitErrorKind, UnitTable, format_number, format_si};
use crate::source::{FileId, Span};
use crate::syntax::{UnitDefinition, UnitText};

impl<'a> Context<'a> {
    /// Works out the units that files define. A definition may use those above it and those that
    /// its file brings.
    pub(super) fn read_units(&mut self) {
        self.units = self.scopes.iter().map(|_| UnitTable::builtin()).collect();
        let mut values: BTreeMap<Span, Option<Unit>> = BTreeMap::new();
        let mut open: Vec<(ScopeId, bool)> =
            (0..self.scopes.len() as u32).rev().map(|number| (ScopeId(number), false)).collect();
        let mut seen = BTreeSet::new();
        // Each file after those from which it brings units, and in it the brought ones first.
        while let Some((scope, ready)) = open.pop() {
            if !ready {
                if seen.insert(scope) {
                    open.push((scope, true));
                    let sources = self.scope(scope).units.iter().map(|(_, file)| (ScopeId(file.0), false));
                    open.extend(sources.filter(|(source, _)| !seen.contains(source)));
                }
                continue;
            }
            let mut units = self.scope(scope).units.clone();
            units.sort_by_key(|(_, file)| file.0 == scope.0);
            for (definition, file) in units {
                self.define_unit(scope, definition, file, &mut values);
            }
        }
    }

    fn define_unit(
        &mut self,
        scope: ScopeId,
        definition: &'a UnitDefinition,
        file: FileId,
        values: &mut BTreeMap<Span, Option<Unit>>,
    ) {
        let name = &definition.name;
        let unit = match values.get(&name.span) {
            Some(known) => *known,
            None => {
                let span = definition.value.span;
                let value = self.infer(ScopeId(file.0), &definition.value);
                if value.is_some_and(|value| value.si <= 0.0) {
                    let found = format!("a unit cannot be {}", self.text(span));
                    self.report(impossible_value::found(span, &found, "more than zero"));
                }
                let value = value.filter(|value| value.si > 0.0);
                value.map(|value| Unit {
                    dimension: value.dimension,
                    factor: value.si,
                    offset: 0.0,
                    percent: false,
                })
            }
        };
        values.insert(name.span, unit);
        let Some(unit) = unit else {
            self.broken_units.insert((scope, name.text.clone()));
            return;
        };
        let taken = self.units.get_mut(scope.0 as usize).is_some_and(|table| !table.define(&name.text, unit));
        if taken {
            self.report(duplicate_name::unit(name.span, &name.text));
        }
    }

    /// The unit of a text; reports one that is unknown or ambiguous.
    pub(crate) fn unit(&mut self, scope: ScopeId, text: &UnitText) -> Option<Unit> {
        let file = self.scope(scope).file;
        let table = self.units.get(file.0 as usize)?;
        let error = match table.parse(&text.text) {
            Ok(unit) => return Some(unit),
            Err(error) => error,
        };
        let (why, help) = match error.kind {
            UnitErrorKind::Unknown(name) if self.broken_units.contains(&(file, name.clone())) => return None,
            UnitErrorKind::Unknown(name) => {
                let near = crate::diagnostics::nearest(&name, table.symbols());
                let help = match near {
                    Some(near) => format!("did you mean `{near}`?"),
                    None => format!("define it, such as `unit {name} = 1.7018 m`"),
                };
                (format!("`{name}` is unknown"), help)
            }
            UnitErrorKind::Ambiguous(name, advice) => {
                (format!("`{name}` does not say which"), advice.to_string())
            }
            UnitErrorKind::BadPower => {
                ("its power is not a whole number".to_string(), "write it like `m^2` or `s^-1`".to_string())
            }
            UnitErrorKind::TemperatureInProduct => (
                "the reading of a thermometer has no place in a product".to_string(),
                "write `K`, or `degR`, in a product".to_string(),
            ),
            UnitErrorKind::Overflow => {
                ("its powers are too large".to_string(), "use smaller powers".to_string())
            }
            UnitErrorKind::Empty => ("a factor is missing".to_string(), "write it like `W/m^2`".to_string()),
        };
        let mut span = text.span;
        if span.len() == text.text.len() {
            span.end = span.start + error.end as u32;
            span.start += error.start as u32;
        }
        self.report(unknown_unit::found(span, &text.text, &why, help));
        None
    }

    /// Some units of a dimension, the usual ones first.
    pub(crate) fn units_of(&self, scope: ScopeId, dimension: Dimension) -> Vec<&'static str> {
        let Some(table) = self.units.get(self.scope(scope).file.0 as usize) else { return Vec::new() };
        let systems = [System::Si.unit(dimension, ""), System::UsCustomary.unit(dimension, "")];
        let rows = table.rows().filter(|row| row.dimension == dimension).map(|row| row.symbol);
        let mut units: Vec<&str> = Vec::new();
        for unit in systems.into_iter().chain(rows) {
            if !unit.is_empty() && !units.contains(&unit) && units.len() < MOST_UNITS {
                units.push(unit);
            }
        }
        units
    }

    /// A number in SI as people read it, in a unit (none where that is empty).
    pub(crate) fn show(&self, scope: ScopeId, si: f64, unit: &str) -> String {
        let table = self.units.get(self.scope(scope).file.0 as usize);
        match table.and_then(|table| table.parse(unit).ok()) {
            Some(known) => format!("{} {unit}", format_si(si, &known, DIGITS)),
            None => format_number(si, DIGITS),
        }
    }
}

/// As many units as are offered in advice.
const MOST_UNITS: usize = 5;
/// Significant digits of a number in advice.
const DIGITS: usize = 5;
