//! Expressions over flight quantities.

use super::Site;
use crate::check::operators::{apply_function, apply_operator};
use crate::check::{Context, ScopeId, Want};
use crate::diagnostics::codes::{
    absent_quantity, after_the_flight, impossible_value, no_place, not_constant, unknown_name,
};
use crate::model::{Edge, Formula, Gravity, Operator, Quantity, QuantityKind, Reading, Surface, Value};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{self, Expr, ExprKind, Name, Path};

/// A formula with what its place has to know of it.
pub(super) struct Built {
    pub formula: Formula,
    pub dimension: Dimension,
    /// A flight quantity that stands without a place in the flight.
    pub reading: Option<(Span, Quantity)>,
    /// A part that is known only after the flight: a peak, a state at a phase's edge, a figure.
    pub whole: Option<Span>,
    /// The unit that the trade shows its first quantity in.
    pub customary: Option<&'static str>,
}

impl Built {
    fn plain(formula: Formula, dimension: Dimension) -> Self {
        Built { formula, dimension, reading: None, whole: None, customary: None }
    }
}

/// What a formula may speak of where it stands.
#[derive(Clone, Copy, PartialEq, Eq)]
pub(super) enum Speaks {
    /// Numbers, givens and facts alone.
    Constant,
    /// Of the flight at one instant.
    Instant,
    /// Of the flight as a whole.
    Whole,
}

impl<'a> Context<'a> {
    /// A formula that may speak of `speaks`; what else it speaks of is reported.
    pub(super) fn formula(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        expr: &Expr,
        speaks: Speaks,
    ) -> Option<Built> {
        let built = self.formula_part(site, scope, expr)?;
        if constant(&built.formula).is_some_and(|value| !value.is_finite()) {
            self.report(impossible_value::found(expr.span, "this has no finite value", "a finite number"));
            return None;
        }
        match (speaks, built.whole, built.reading) {
            (Speaks::Constant | Speaks::Instant, Some(span), _) => {
                self.report(after_the_flight::found(span, self.text(span)));
                None
            }
            (Speaks::Constant, _, Some((span, _))) => {
                self.report(not_constant::found(span, self.text(span)));
                None
            }
            (Speaks::Whole, _, Some((span, _))) => {
                let phase = site.phases.last().map(|phase| phase.block.name.text.as_str());
                self.report(no_place::found(span, self.text(span), phase));
                None
            }
            _ => Some(built),
        }
    }

    /// The same with a dimension that it has to have.
    pub(super) fn formula_of(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        expr: &Expr,
        speaks: Speaks,
        (want, what): (impl Into<Want>, &str),
    ) -> Option<Formula> {
        let built = self.formula(site, scope, expr, speaks)?;
        self.fits(scope, expr, built.dimension, want, what).then_some(built.formula)
    }

    fn build(&mut self, site: &Site<'a>, scope: ScopeId, expr: &Expr) -> Option<Built> {
        match &expr.kind {
            ExprKind::Number(literal) => {
                let value = self.literal(scope, literal)?;
                Some(Built::plain(Formula::Number { si: value.si }, value.dimension))
            }
            ExprKind::Path(path) => self.build_path(site, scope, path),
            ExprKind::Negate(of) => {
                let of = self.formula_part(site, scope, of)?;
                Some(Built { formula: Formula::Negate { of: Box::new(of.formula) }, ..of })
            }
            ExprKind::Binary { left, operator, operator_span, right } => {
                let sides = (self.formula_part(site, scope, left), self.formula_part(site, scope, right));
                let (a, b) = (sides.0?, sides.1?);
                let exponent = constant(&b.formula);
                let dimension = self.binary(
                    scope,
                    (left, a.dimension),
                    (*operator, *operator_span),
                    (right, b.dimension),
                    exponent,
                )?;
                Some(Built {
                    formula: Formula::Binary {
                        operator: lowered(*operator),
                        left: Box::new(a.formula),
                        right: Box::new(b.formula),
                    },
                    dimension,
                    reading: a.reading.or(b.reading),
                    whole: a.whole.or(b.whole),
                    customary: a.customary.or(b.customary),
                })
            }
            ExprKind::Call { function, arguments } => {
                let built: Vec<_> =
                    arguments.iter().map(|argument| self.formula_part(site, scope, argument)).collect();
                let built: Vec<Built> = built.into_iter().collect::<Option<_>>()?;
                let dimensions: Vec<_> = built.iter().map(|built| built.dimension).collect();
                let (function, dimension) = self.call(scope, function, arguments, &dimensions)?;
                Some(Built {
                    reading: built.iter().find_map(|built| built.reading),
                    whole: built.iter().find_map(|built| built.whole),
                    customary: built.iter().find_map(|built| built.customary),
                    dimension,
                    formula: Formula::Call {
                        function,
                        of: built.into_iter().map(|built| built.formula).collect(),
                    },
                })
            }
            ExprKind::Peak { quantity, phase } => {
                let of = self.formula(site, scope, quantity, Speaks::Instant);
                let phase = match phase {
                    Some(name) => Some(self.phase_named(site, name)? as u32),
                    None => None,
                };
                let of = of?;
                let formula = Formula::Peak { of: Box::new(of.formula), phase };
                Some(Built { formula, reading: None, whole: Some(expr.span), ..of })
            }
            ExprKind::At { quantity, end, phase } => {
                let of = self.formula(site, scope, quantity, Speaks::Instant);
                let phase = self.phase_named(site, phase)? as u32;
                let of = of?;
                self.not_yet_shed(site, expr.span, &of.formula, phase)?;
                let edge = if *end { Edge::End } else { Edge::Start };
                let formula = Formula::At { of: Box::new(of.formula), edge, phase };
                Some(Built { formula, reading: None, whole: Some(expr.span), ..of })
            }
            ExprKind::Broken => None,
        }
    }

    fn formula_part(&mut self, site: &Site<'a>, scope: ScopeId, expr: &Expr) -> Option<Built> {
        self.deeper(1, expr.span, |context| context.build(site, scope, expr))
    }

    fn build_path(&mut self, site: &Site<'a>, scope: ScopeId, path: &Path) -> Option<Built> {
        match path.parts.as_slice() {
            [name] => self.build_name(site, scope, name),
            [part, quantity] if quantity.text == Quantity::Left.name() && site.part(&part.text).is_some() => {
                let index = site.part(&part.text)?;
                if site.vehicle.parts[index].propulsion.is_none() {
                    let why = format!("`{}` carries no propellant", part.text);
                    self.report(absent_quantity::found(path.span, self.text(path.span), &why, None));
                    return None;
                }
                Some(self.reading(path.span, Reading { quantity: Quantity::Left, part: Some(index as u32) }))
            }
            _ => {
                let typed = self.path_value(scope, path)?;
                let formula = match self.path_fact(scope, path) {
                    Some(fact) => self.fact_formula(Value { si: typed.si, fact }),
                    None => Formula::Number { si: typed.si },
                };
                Some(Built::plain(formula, typed.dimension))
            }
        }
    }

    fn build_name(&mut self, site: &Site<'a>, scope: ScopeId, name: &Name) -> Option<Built> {
        if let Some(value) = self.given(scope, name) {
            let value = value?;
            let dimension = self.dimension(value.fact);
            return Some(Built::plain(self.fact_formula(value), dimension));
        }
        if let Some(index) = site.figures.iter().position(|(figure, ..)| *figure == name.text) {
            let (_, dimension, _) = site.figures[index];
            let formula = Formula::Figure { index: index as u32 };
            return Some(Built { whole: Some(name.span), ..Built::plain(formula, dimension?) });
        }
        if let Some(quantity) = Quantity::ALL.iter().copied().find(|quantity| quantity.name() == name.text) {
            if quantity == Quantity::Left {
                let why = "propellant is left in a part of the vehicle";
                self.report(
                    absent_quantity::found(name.span, &name.text, why, None).help("write `Sorrel.left`"),
                );
                return None;
            }
            self.exists(site, name.span, quantity)?;
            return Some(self.reading(name.span, Reading { quantity, part: None }));
        }
        if let Some(fact) = self.fact_of(site.block, &name.text) {
            let (si, dimension) = self.facts.get(fact.0 as usize).map(|fact| (fact.si, fact.dimension))?;
            return Some(Built::plain(self.fact_formula(Value { si, fact }), dimension));
        }
        if let Some(defined) = site.figure_names.get(name.text.as_str()) {
            let kind = "a figure that stands further up";
            self.report(
                unknown_name::found(name.span, kind, &name.text, None)
                    .and(*defined, "it stands here")
                    .help("a figure names only those above it: move this one down"),
            );
            return None;
        }
        let near =
            self.nearest(&name.text, |_| Quantity::ALL.iter().map(|quantity| quantity.name()).collect());
        match near {
            Some(near) => {
                self.report(unknown_name::found(
                    name.span,
                    "a flight quantity",
                    &name.text,
                    Some((near, None)),
                ));
            }
            None => self.unknown_in_expression(scope, name),
        }
        None
    }

    fn reading(&self, span: Span, reading: Reading) -> Built {
        let quantity = reading.quantity;
        Built {
            reading: Some((span, quantity)),
            customary: Some(quantity.customary_unit()),
            ..Built::plain(Formula::Reading { reading }, quantity.dimension())
        }
    }

    /// A fact within a formula: the mission uses it.
    fn fact_formula(&mut self, value: Value) -> Formula {
        if let Some(subject) = self.subjects.last() {
            self.owned.entry(*subject).or_default().facts.push(value.fact);
        }
        Formula::Fact { value }
    }

    /// Reports a part that is read in a phase after the one that sheds it.
    fn not_yet_shed(&mut self, site: &Site<'a>, span: Span, of: &Formula, phase: u32) -> Option<()> {
        for part in parts_read(of) {
            let name = &site.vehicle.parts.get(part as usize)?.name;
            if let Some((_, shed)) =
                site.sheds.get(name.as_str()).filter(|(before, _)| *before < phase as usize)
            {
                self.report(absent_quantity::after_shed(span, name, *shed));
                return None;
            }
        }
        Some(())
    }

    /// Reports a quantity that the mission's world has not.
    fn exists(&mut self, site: &Site<'a>, span: Span, quantity: Quantity) -> Option<()> {
        let world = &site.world;
        let why = match quantity.kind() {
            QuantityKind::Orbital if matches!(world.gravity, Gravity::Uniform { .. }) => {
                "its gravity is uniform"
            }
            QuantityKind::Round if matches!(world.surface, Surface::Flat) => "it is flat",
            QuantityKind::Air if world.air == crate::model::Air::None => "it has no air",
            _ => return Some(()),
        };
        let why = format!("`{}` has none: {why}", world.name);
        self.report(absent_quantity::found(span, self.text(span), &why, Some(site.within)));
        None
    }
}

fn lowered(operator: syntax::Operator) -> Operator {
    match operator {
        syntax::Operator::Add => Operator::Add,
        syntax::Operator::Subtract => Operator::Subtract,
        syntax::Operator::Multiply => Operator::Multiply,
        syntax::Operator::Divide => Operator::Divide,
        syntax::Operator::Power => Operator::Power,
    }
}

/// The value of a formula that reads nothing of the flight.
pub(super) fn constant(formula: &Formula) -> Option<f64> {
    match formula {
        Formula::Number { si } => Some(*si),
        Formula::Fact { value } => Some(value.si),
        Formula::Negate { of } => constant(of).map(|of| -of),
        Formula::Binary { operator, left, right } => {
            Some(apply_operator(raised(*operator), constant(left)?, constant(right)?))
        }
        Formula::Call { function, of } => {
            let of: Option<Vec<f64>> = of.iter().map(constant).collect();
            Some(apply_function(*function, &of?))
        }
        Formula::Reading { .. } | Formula::Figure { .. } | Formula::At { .. } | Formula::Peak { .. } => None,
    }
}

fn raised(operator: Operator) -> syntax::Operator {
    match operator {
        Operator::Add => syntax::Operator::Add,
        Operator::Subtract => syntax::Operator::Subtract,
        Operator::Multiply => syntax::Operator::Multiply,
        Operator::Divide => syntax::Operator::Divide,
        Operator::Power => syntax::Operator::Power,
    }
}

/// The parts of which a formula reads something at its own instant.
pub(super) fn parts_read(formula: &Formula) -> Vec<u32> {
    match formula {
        Formula::Reading { reading } => reading.part.into_iter().collect(),
        Formula::Negate { of } => parts_read(of),
        Formula::Binary { left, right, .. } => [parts_read(left), parts_read(right)].concat(),
        Formula::Call { of, .. } => of.iter().flat_map(parts_read).collect(),
        _ => Vec::new(),
    }
}

/// Whether an expression is made of numbers alone, so that it is a fact of its own.
pub(super) fn is_literal(expr: &Expr) -> bool {
    match &expr.kind {
        ExprKind::Number(_) => true,
        ExprKind::Negate(of) => is_literal(of),
        ExprKind::Binary { left, right, .. } => is_literal(left) && is_literal(right),
        ExprKind::Call { arguments, .. } => arguments.iter().all(is_literal),
        ExprKind::Path(_) | ExprKind::Peak { .. } | ExprKind::At { .. } | ExprKind::Broken => false,
    }
}
