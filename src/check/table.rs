//! The points of a curve as a table in SI: from the rows of a block, or from a file of values
//! separated by commas (RFC 4180 without quotes) whose first line names the columns.

use super::{Context, ScopeId};
use crate::diagnostics::codes::{curve_header, curve_width, impossible_value};
use crate::quantity::{Dimension, Unit};
use crate::source::{FileId, Span};
use crate::syntax::{Column, Literal, Quoted, UnitText};

#[derive(Clone, Debug)]
pub(super) struct TableColumn {
    pub name: String,
    pub span: Span,
    pub dimension: Dimension,
    unit: Option<Unit>,
}

/// Values in SI with their places.
#[derive(Clone, Debug)]
pub(super) struct Row {
    pub span: Span,
    pub values: Vec<(f64, Span)>,
}

/// Two columns or three, the last of which is the output; rows as wide as that.
#[derive(Clone, Debug)]
pub(super) struct Table {
    pub columns: Vec<TableColumn>,
    pub rows: Vec<Row>,
}

/// Widest curve: two inputs and an output.
const MOST_COLUMNS: usize = 3;

impl<'a> Context<'a> {
    pub(super) fn table_from_rows(
        &mut self,
        scope: ScopeId,
        inputs: &[Column],
        output: &Column,
        rows: &[(Span, &'a Vec<Literal>)],
    ) -> Option<Table> {
        let columns: Vec<_> = inputs
            .iter()
            .chain([output])
            .map(|column| self.column(scope, &column.name.text, column.name.span, column.unit.as_ref()))
            .collect();
        let mut good = true;
        for literal in rows.iter().flat_map(|(_, row)| row.iter()) {
            if let Some(unit) = &literal.unit {
                self.report(curve_header::unit_in_row(unit.span));
                good = false;
            }
        }
        let rows = rows.iter().map(|(span, row)| Row {
            span: *span,
            values: row.iter().map(|literal| (literal.value, literal.span)).collect(),
        });
        let rows = rows.collect();
        let columns = columns.into_iter().collect::<Option<Vec<_>>>()?;
        self.table(columns, rows).filter(|_| good)
    }

    /// Reads the file that `from` names; the curve then has no header and no rows of its own.
    pub(super) fn table_from_file(
        &mut self,
        path: &Quoted,
        scope: ScopeId,
        header: Option<Span>,
        rows: &[(Span, &'a Vec<Literal>)],
    ) -> Option<Table> {
        if let Some(span) = header.or(rows.first().map(|(span, _)| *span)) {
            self.report(curve_header::beside_file(span, path.span));
        }
        let file = *self.links.get(&path.span)?;
        let text: &'a str = self.sources.file(file).text();
        let mut lines = lines_of(text).filter(|(_, line)| !line.trim().is_empty());
        let Some((start, names)) = lines.next() else {
            self.report(curve_header::empty(path.span));
            return None;
        };
        let columns: Vec<_> =
            cells(file, start, names).map(|(span, cell)| self.file_column(scope, span, cell)).collect();
        let columns = columns.into_iter().collect::<Option<Vec<_>>>()?;
        let mut rows = Vec::new();
        let mut good = true;
        for (start, line) in lines {
            let mut values = Vec::new();
            for (span, cell) in cells(file, start, line) {
                match cell.parse::<f64>() {
                    Ok(value) => values.push((value, span)),
                    Err(_) => {
                        self.report(impossible_value::found(
                            span,
                            &format!("`{cell}` is not a number"),
                            "a number",
                        ));
                        good = false;
                    }
                }
            }
            rows.push(Row { span: Span::new(file, start, start + line.len()), values });
        }
        if good { self.table(columns, rows) } else { None }
    }

    /// `time [s]`
    fn file_column(&mut self, scope: ScopeId, span: Span, cell: &str) -> Option<TableColumn> {
        let (name, unit) = match cell.split_once('[') {
            None => (cell, None),
            Some((name, rest)) => match rest.strip_suffix(']') {
                Some(unit) => (name.trim_end(), Some(UnitText { span, text: unit.trim().to_string() })),
                None => {
                    self.report(curve_header::malformed(span, cell));
                    return None;
                }
            },
        };
        let is_name = name.chars().all(|c| c.is_alphanumeric() || c == '_');
        if !is_name || name.is_empty() || name.starts_with(|c: char| c.is_ascii_digit()) {
            self.report(curve_header::malformed(span, cell));
            return None;
        }
        self.column(scope, name, span, unit.as_ref())
    }

    fn column(
        &mut self,
        scope: ScopeId,
        name: &str,
        span: Span,
        unit: Option<&UnitText>,
    ) -> Option<TableColumn> {
        let unit = match unit {
            Some(text) => Some(self.unit(scope, text)?),
            None => None,
        };
        let dimension = unit.as_ref().map_or(Dimension::NONE, |unit| unit.dimension);
        Some(TableColumn { name: name.to_string(), span, dimension, unit })
    }

    /// Checks widths and turns values into SI.
    fn table(&mut self, columns: Vec<TableColumn>, mut rows: Vec<Row>) -> Option<Table> {
        let (first, last) = (columns.first()?.span, columns.last()?.span);
        if !(2..=MOST_COLUMNS).contains(&columns.len()) {
            self.report(curve_header::width(first.to(last), columns.len()));
            return None;
        }
        let mut good = true;
        for row in &mut rows {
            if row.values.len() != columns.len() {
                self.report(curve_width::found(row.span, row.values.len(), columns.len(), first.to(last)));
                good = false;
                continue;
            }
            for ((value, span), column) in row.values.iter_mut().zip(&columns) {
                if let Some(unit) = &column.unit {
                    *value = unit.to_si(*value);
                }
                if !value.is_finite() {
                    self.report(impossible_value::found(
                        *span,
                        "this has no finite value",
                        "a finite number",
                    ));
                    good = false;
                }
            }
        }
        good.then_some(Table { columns, rows })
    }
}

/// The lines of a text with the offsets of their starts.
fn lines_of(text: &str) -> impl Iterator<Item = (usize, &str)> {
    let mut start = text.len() - text.trim_start_matches('\u{feff}').len();
    text.trim_start_matches('\u{feff}').split('\n').map(move |line| {
        let at = start;
        start += line.len() + 1;
        (at, line.trim_end_matches('\r'))
    })
}

/// The cells of a line, without blanks around them, and their places.
fn cells(file: FileId, start: usize, line: &str) -> impl Iterator<Item = (Span, &str)> {
    let mut at = start;
    line.split(',').map(move |cell| {
        let begin = at + (cell.len() - cell.trim_start().len());
        at += cell.len() + 1;
        let cell = cell.trim();
        (Span::new(file, begin, begin + cell.len()), cell)
    })
}
