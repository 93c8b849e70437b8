//! Walks over a tree and checks every place in it.

use super::read;
use crate::source::Span;
use crate::syntax::{
    Argument, Because, Block, BringFrom, Column, Condition, ConditionKind, Expr, ExprKind, Item, Line,
};
use crate::syntax::{
    Literal, Name, Operand, Parsed, Path, PitchLaw, Quoted, Requirement, Statement, Steer, UnitText,
};

/// Every span lies in the text, on the borders of characters, and names say what their span shows.
pub(super) fn check_spans(text: &str, parsed: &Parsed) {
    let walk = Walk { text };
    for item in &parsed.tree.items {
        walk.item(item);
    }
    let mut end = 0;
    for comment in &parsed.tree.comments {
        walk.span(comment.span);
        assert!(text[comment.span.range()].starts_with('#') && !text[comment.span.range()].contains('\n'));
        assert!(comment.span.start >= end, "comments out of order");
        end = comment.span.end;
    }
    let mut start = 0;
    for diagnostic in &parsed.diagnostics {
        assert!(diagnostic.span().start >= start, "diagnostics out of order");
        start = diagnostic.span().start;
        if diagnostic.code.name != "file-too-large" {
            diagnostic.labels.iter().for_each(|label| walk.span(label.span));
        }
    }
}

struct Walk<'t> {
    text: &'t str,
}

impl Walk<'_> {
    fn span(&self, span: Span) {
        assert!(self.text.get(span.range()).is_some(), "{span:?} in {:?}", self.text);
    }

    fn within(&self, outer: Span, inner: Span) {
        assert!(outer.start <= inner.start && inner.end <= outer.end, "{inner:?} in {outer:?}");
    }

    fn name(&self, name: &Name) {
        assert_eq!(self.text.get(name.span.range()), Some(name.text.as_str()));
    }

    fn unit(&self, unit: &UnitText) {
        assert_eq!(self.text.get(unit.span.range()), Some(unit.text.as_str()));
    }

    fn quoted(&self, quoted: &Quoted) {
        let written = &self.text[quoted.span.range()];
        assert!(written.len() >= 2 && written.starts_with('"') && written.ends_with('"'), "{written}");
    }

    fn path(&self, path: &Path) {
        self.span(path.span);
        path.parts.iter().for_each(|part| {
            self.within(path.span, part.span);
            self.name(part);
        });
    }

    fn literal(&self, literal: &Literal) {
        self.within(literal.span, literal.digits);
        let digits = &self.text[literal.digits.range()];
        assert_eq!(digits.parse::<f64>().ok(), Some(literal.value));
        literal.unit.iter().for_each(|unit| self.unit(unit));
    }

    fn because(&self, because: &Option<Because>) {
        because.iter().for_each(|because| {
            self.within(because.span, because.text.span);
            self.quoted(&because.text);
        });
    }

    fn expr(&self, expr: &Expr) {
        self.span(expr.span);
        assert!(!expr.span.is_empty());
        let inside = |part: &Expr| {
            self.within(expr.span, part.span);
            self.expr(part);
        };
        match &expr.kind {
            ExprKind::Number(literal) => self.literal(literal),
            ExprKind::Path(path) => self.path(path),
            ExprKind::Negate(inner) => inside(inner),
            ExprKind::Binary { left, operator_span, right, .. } => {
                inside(left);
                inside(right);
                assert!(left.span.end <= operator_span.start && operator_span.end <= right.span.start);
            }
            ExprKind::Call { function, arguments } => {
                self.name(function);
                arguments.iter().for_each(inside);
            }
            ExprKind::Peak { quantity, phase } => {
                inside(quantity);
                phase.iter().for_each(|phase| self.name(phase));
            }
            ExprKind::At { quantity, phase, .. } => {
                inside(quantity);
                self.name(phase);
            }
            ExprKind::Broken => {}
        }
    }

    fn exprs<'e>(&self, exprs: impl IntoIterator<Item = &'e Expr>) {
        exprs.into_iter().for_each(|expr| self.expr(expr));
    }

    fn names<'n>(&self, names: impl IntoIterator<Item = &'n Name>) {
        names.into_iter().for_each(|name| self.name(name));
    }

    fn arguments(&self, arguments: &[Argument]) {
        for argument in arguments {
            self.name(&argument.name);
            self.expr(&argument.value);
        }
    }

    fn condition(&self, condition: &Condition) {
        self.span(condition.span);
        match &condition.kind {
            ConditionKind::After(time) => self.expr(time),
            ConditionKind::Compare { quantity, limit, .. } => self.exprs([quantity, limit]),
            ConditionKind::Spent(name) => self.name(name),
            ConditionKind::Apex | ConditionKind::Touchdown => {}
        }
    }

    fn item(&self, item: &Item) {
        match item {
            Item::Bring(bring) => {
                self.span(bring.span);
                self.names(&bring.names);
                match &bring.from {
                    BringFrom::Builtin(span) => assert_eq!(&self.text[span.range()], "builtin"),
                    BringFrom::File(file) => self.quoted(file),
                }
            }
            Item::Unit(unit) => {
                self.within(unit.span, unit.value.span);
                self.name(&unit.name);
                self.expr(&unit.value);
                self.because(&unit.because);
            }
            Item::Given(given, because) => {
                self.name(&given.name);
                self.expr(&given.value);
                self.because(because);
            }
            Item::Block(block) => self.block(block),
            Item::Broken(span) => self.span(*span),
        }
    }

    fn block(&self, block: &Block) {
        self.span(block.span);
        self.within(block.span, block.name.span);
        self.names([&block.name].into_iter().chain(&block.like).chain(&block.was));
        let mut start = block.span.start;
        for line in &block.lines {
            self.within(block.span, line.span);
            assert!(line.span.start >= start, "lines out of order");
            start = line.span.start;
            self.line(line);
        }
    }

    fn line(&self, line: &Line) {
        self.span(line.span);
        let written = &self.text[line.span.range()];
        assert_eq!(written.trim_end_matches([' ', '\t', '\n', '\r']), written, "{:?}", line.statement);
        self.because(&line.because);
        match &line.statement {
            Statement::Setting(setting) => {
                self.names([&setting.key].into_iter().chain(&setting.word));
                match &setting.value {
                    Some(Operand::Expr(value)) => self.expr(value),
                    Some(Operand::Instant(span)) => self.span(*span),
                    None => {}
                }
                self.exprs(&setting.upto);
                setting.ambient.iter().for_each(|(_, span)| self.within(line.span, *span));
                self.arguments(&setting.arguments);
            }
            Statement::Given(given) => {
                self.name(&given.name);
                self.expr(&given.value);
            }
            Statement::Engines { count, engine } => {
                self.expr(count);
                self.name(engine);
            }
            Statement::Stack(names) => self.names(names),
            Statement::Beside { carrier, group, count, stage } => {
                self.names([carrier, group, stage]);
                self.expr(count);
            }
            Statement::Shroud { name, mass } => {
                self.name(name);
                self.expr(mass);
            }
            Statement::Start { kind_span, arguments, .. } => {
                self.span(*kind_span);
                self.arguments(arguments);
            }
            Statement::Block(block) => self.block(block),
            Statement::Burn(burns) => burns.iter().for_each(|burn| {
                self.name(&burn.part);
                burn.engines.iter().for_each(|(some, of)| self.exprs([some, of]));
            }),
            Statement::Light { part, at, .. } => {
                self.name(part);
                self.expr(at);
            }
            Statement::Coast | Statement::Broken => {}
            Statement::Steer(steer) => self.steer(steer),
            Statement::Hold { quantity, limit } => self.exprs([quantity, limit]),
            Statement::Until(conditions) => conditions.iter().for_each(|condition| self.condition(condition)),
            Statement::Shed { part, when } => {
                self.name(part);
                when.iter().for_each(|condition| self.condition(condition));
            }
            Statement::Knob { path, low, high } => {
                self.path(path);
                self.exprs([low, high]);
            }
            Statement::Aim { quantity, target, within } => self.exprs([quantity, target, within]),
            Statement::Objective { quantity, .. } => self.expr(quantity),
            Statement::Demand { name, quantity, requirement } => {
                self.names(name);
                self.expr(quantity);
                match requirement {
                    Requirement::AtLeast(limit) | Requirement::AtMost(limit) => self.expr(limit),
                    Requirement::Between(low, high) => self.exprs([low, high]),
                    Requirement::Within { target, tolerance } => self.exprs([target, tolerance]),
                }
            }
            Statement::Figure { name, value } => {
                self.name(name);
                self.expr(value);
            }
            Statement::Headline(path) => self.path(path),
            Statement::Header { inputs, output } => {
                inputs.iter().chain([output]).for_each(|column| self.column(column));
            }
            Statement::Row(row) => row.iter().for_each(|literal| self.literal(literal)),
            Statement::From(file) => self.quoted(file),
        }
    }

    fn steer(&self, steer: &Steer) {
        let Steer::Pitch { law, heading, .. } = steer else { return };
        self.expr(heading);
        match law {
            PitchLaw::Fixed(pitch) => self.expr(pitch),
            PitchLaw::Rate { from, rate } => self.exprs([from, rate]),
            PitchLaw::Over { from, by, over } => self.exprs([from, by, over]),
            PitchLaw::Tangent { a, b } => self.exprs([a, b]),
        }
    }

    fn column(&self, column: &Column) {
        self.name(&column.name);
        column.unit.iter().for_each(|unit| self.unit(unit));
    }
}

#[test]
fn the_places_of_the_example_are_true() {
    let text = include_str!("lantern.wright");
    check_spans(text, &read(text));
}
