//! Curves: a header, settings, and rows that make a function of one or two quantities.

use std::sync::Arc;

use super::sheet::Key;
use super::table::{Row, Table, TableColumn};
use super::{BlockId, Context};
use crate::diagnostics::codes::{curve_grid, curve_order, curve_too_short};
use crate::model::{Axis, Beyond, Curve, Smoothness};
use crate::source::Span;
use crate::syntax::Statement;

const KEYS: &[Key] = &[
    Key::new("kind", "kind  linear").words(&["smooth", "linear"]),
    Key::new("beyond", "beyond  hold").words(&["hold", "zero", "extend"]),
];

impl<'a> Context<'a> {
    /// The checked curve, worked out on first use; None where it has errors, which have been reported.
    pub(crate) fn curve(&mut self, block: BlockId) -> Option<Arc<Curve>> {
        self.once_checked(block, |context| &mut context.curves, Context::check_curve)
    }

    fn check_curve(&mut self, block: BlockId) -> Option<Arc<Curve>> {
        let mut header = None;
        let mut rows = Vec::new();
        let mut from = None;
        let sheet = self.sheet(block, KEYS, &["from"], |inherited| {
            match &inherited.line.statement {
                Statement::Header { inputs, output } => header = Some((inputs, output, inherited)),
                Statement::Row(values) => rows.push((inherited.line.span, values)),
                Statement::From(path) => from = Some((path, inherited)),
                _ => return false,
            }
            true
        });
        let smoothness = match sheet.get("kind") {
            Some(stated) => self.word_of(&stated, "a kind of curve").map(|word| match word.text.as_str() {
                "linear" => Smoothness::Linear,
                _ => Smoothness::Smooth,
            }),
            None => Some(Smoothness::Smooth),
        };
        let beyond = match sheet.get("beyond") {
            Some(stated) => {
                self.word_of(&stated, "a way to go on beyond the ends").map(|word| match word.text.as_str() {
                    "hold" => Beyond::Hold,
                    "zero" => Beyond::Zero,
                    _ => Beyond::Extend,
                })
            }
            None => Some(Beyond::Refuse),
        };
        let table = match (from, header) {
            (Some((path, inherited)), header) => self.table_from_file(
                path,
                inherited.scope,
                header.map(|(_, _, inherited)| inherited.line.span),
                &rows,
            ),
            (None, Some((inputs, output, inherited))) => {
                self.table_from_rows(inherited.scope, inputs, output, &rows)
            }
            (None, None) => {
                self.missing(block, "its header", "time [s] -> thrust [kN]");
                None
            }
        }?;
        let axes_and_values = match table.columns.as_slice() {
            [_, _] => self.one_axis(&table, sheet.span),
            _ => self.two_axes(&table, sheet.span),
        };
        let (points, values) = axes_and_values?;
        let (output, inputs) = table.columns.split_last()?;
        let axes = inputs.iter().zip(points).map(|(column, points)| axis(column, points)).collect();
        Some(Arc::new(Curve {
            name: sheet.name.to_string(),
            place: self.place(sheet.span),
            smoothness: smoothness?,
            beyond: beyond?,
            axes,
            output: output.name.clone(),
            output_dimension: output.dimension,
            values,
        }))
    }

    /// Points and values of a curve over one quantity.
    fn one_axis(&mut self, table: &Table, name: Span) -> Option<(Vec<Vec<f64>>, Vec<f64>)> {
        let (points, values): (Vec<_>, Vec<_>) =
            table.rows.iter().filter_map(|row| Some((row.values.first()?.0, row.values.get(1)?.0))).unzip();
        if points.len() < 2 {
            self.report(curve_too_short::found(
                name,
                points.len(),
                table.columns.first().map(|column| column.span),
            ));
            return None;
        }
        let mut good = true;
        for pair in table.rows.windows(2) {
            if let [before, row] = pair
                && value(row, 0) <= value(before, 0)
            {
                self.report_order(before, row, 0);
                good = false;
            }
        }
        good.then_some((vec![points], values))
    }

    /// Points and values of a curve over two quantities: every point of the first goes with every
    /// point of the second, which runs fastest.
    fn two_axes(&mut self, table: &Table, name: Span) -> Option<(Vec<Vec<f64>>, Vec<f64>)> {
        let Some(start) = table.rows.first() else {
            self.report(curve_too_short::found(name, 0, None));
            return None;
        };
        let width = table.rows.iter().take_while(|row| value(row, 0) == value(start, 0)).count();
        let second: Vec<f64> = table.rows.iter().take(width).map(|row| value(row, 1)).collect();
        let mut first = Vec::new();
        let mut last: Option<&Row> = None;
        for group in table.rows.chunks(width.max(1)) {
            let head = group.first()?;
            if let Some(before) = last.filter(|before| value(head, 0) <= value(before, 0)) {
                self.report_order(before, head, 0);
                return None;
            }
            for (at, row) in group.iter().enumerate() {
                let step = at.checked_sub(1).and_then(|before| group.get(before));
                if let Some(before) =
                    step.filter(|before| first.is_empty() && value(row, 1) <= value(before, 1))
                {
                    self.report_order(before, row, 1);
                    return None;
                }
                if value(row, 0) != value(head, 0) || second.get(at) != Some(&value(row, 1)) {
                    self.report(curve_grid::found(row.span, start.span));
                    return None;
                }
            }
            if group.len() != width {
                self.report(curve_grid::found(head.span, start.span));
                return None;
            }
            first.push(value(head, 0));
            last = group.last();
        }
        if first.len() < 2 || second.len() < 2 {
            self.report(curve_too_short::found(name, first.len().min(second.len()), None));
            return None;
        }
        let values = table.rows.iter().map(|row| value(row, 2)).collect();
        Some((vec![first, second], values))
    }

    fn report_order(&mut self, before: &Row, row: &Row, column: usize) {
        let span = row.values.get(column).map_or(row.span, |(_, span)| *span);
        let equal = value(row, column) == value(before, column);
        self.report(curve_order::found(span, self.text(span), before.span, equal));
    }
}

fn value(row: &Row, column: usize) -> f64 {
    row.values.get(column).map_or(f64::NAN, |(value, _)| *value)
}

fn axis(column: &TableColumn, points: Vec<f64>) -> Axis {
    Axis { name: column.name.clone(), dimension: column.dimension, points }
}
