//! What a mission asks for: demands, figures, aims, objective, headline.

use std::collections::BTreeMap;

use super::Site;
use super::formula::{Built, Speaks, constant};
use crate::check::{Context, Inherited, ScopeId};
use crate::diagnostics::codes::{
    duplicate_name, empty_band, objective_without_knob, unknown_name, unreachable_inclination,
};
use crate::model::{Aim, Demand, Figure, Formula, Headline, Knob, Objective, Quantity, Requirement};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{self, Because, Expr, Path, Statement};

/// What a mission asks for.
#[derive(Default)]
pub(super) struct Asked {
    pub demands: Vec<Demand>,
    pub figures: Vec<Figure>,
    pub aims: Vec<Aim>,
    pub knobs: Vec<Knob>,
    pub objective: Option<Objective>,
    pub headline: Option<Headline>,
}

impl<'a> Context<'a> {
    pub(super) fn asked(&mut self, site: &mut Site<'a>, lines: &[Inherited<'a>]) -> Option<Asked> {
        let mut asked = Asked::default();
        let mut sound = true;
        let mut names: BTreeMap<&'a str, Span> = BTreeMap::new();
        site.figure_names = lines
            .iter()
            .filter_map(|line| match &line.line.statement {
                Statement::Figure { name, .. } => Some((name.text.as_str(), name.span)),
                _ => None,
            })
            .collect();
        // Figures first: demands and aims may name them, wherever they stand.
        for line in lines {
            if let Statement::Figure { name, value } = &line.line.statement {
                let built = self.figure(site, line, name, value);
                sound &= built.is_some();
                asked.figures.extend(built);
            }
        }
        for line in lines {
            let because = line.line.because.as_ref();
            let name = match &line.line.statement {
                Statement::Demand { name: Some(name), .. } | Statement::Figure { name, .. } => Some(name),
                _ => None,
            };
            if let Some(name) = name
                && let Some(first) = names.insert(&name.text, name.span)
            {
                self.report(duplicate_name::found(name.span, &name.text, first));
            }
            match &line.line.statement {
                Statement::Demand { name, quantity, requirement } => {
                    let demand =
                        self.demand(site, line.scope, (name.as_ref(), quantity, requirement), because);
                    sound &= demand.is_some();
                    asked.demands.extend(demand);
                }
                Statement::Aim { quantity, target, within } => {
                    let aim = self.aim(site, line.scope, (quantity, target, within), because);
                    sound &= aim.is_some();
                    asked.aims.extend(aim);
                }
                Statement::Knob { path, low, high } => {
                    let knob = self.knob(site, line.scope, (path, low, high));
                    sound &= knob.is_some();
                    asked.knobs.extend(knob);
                }
                Statement::Objective { most, quantity } => {
                    let built = self.formula(site, line.scope, quantity, Speaks::Whole);
                    sound &= built.is_some();
                    asked.objective = built.map(|built| Objective {
                        most: *most,
                        written: self.text(quantity.span).to_string(),
                        unit: self.shown_in(site, line.scope, quantity, &built),
                        dimension: built.dimension,
                        quantity: built.formula,
                    });
                    if !lines.iter().any(|line| matches!(line.line.statement, Statement::Knob { .. })) {
                        self.report(objective_without_knob::found(line.line.span));
                    }
                }
                Statement::Headline(path) => {
                    let headline = self.headline(site, line.scope, path);
                    sound &= headline.is_some();
                    asked.headline = headline;
                }
                _ => {}
            }
        }
        sound.then_some(asked)
    }

    fn figure(
        &mut self,
        site: &mut Site<'a>,
        line: &Inherited<'a>,
        name: &syntax::Name,
        value: &Expr,
    ) -> Option<Figure> {
        if Quantity::ALL.iter().any(|quantity| quantity.name() == name.text) {
            self.report(duplicate_name::quantity(name.span, &name.text));
        }
        let Some(built) = self.formula(site, line.scope, value, Speaks::Whole) else {
            site.figures.push((name.text.clone(), None, String::new()));
            return None;
        };
        let unit = self.shown_in(site, line.scope, value, &built);
        site.figures.push((name.text.clone(), Some(built.dimension), unit.clone()));
        Some(Figure {
            name: name.text.clone(),
            written: self.text(value.span).to_string(),
            value: built.formula,
            dimension: built.dimension,
            unit,
            because: line.line.because.as_ref().map(|because| because.text.text.clone()),
            place: self.place(line.line.span),
        })
    }

    fn demand(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        (name, quantity, requirement): (Option<&syntax::Name>, &Expr, &syntax::Requirement),
        because: Option<&Because>,
    ) -> Option<Demand> {
        let written = self.text(quantity.span).to_string();
        let built = self.formula(site, scope, quantity, Speaks::Whole);
        let name = name.map_or_else(|| written.clone(), |name| name.text.clone());
        let dimension = built.as_ref().map(|built| built.dimension);
        let mut bound = |expr: &Expr, part: &str| {
            let what = format!("the limit of `{written}`");
            let path = if part.is_empty() { format!("{name}.limit") } else { format!("{name}.{part}") };
            let asked = (quantity.span, dimension?, what.as_str());
            self.limit_of(site, scope, (&path, expr), Speaks::Whole, asked, because)
        };
        let (requirement, shown) = match requirement {
            syntax::Requirement::AtLeast(limit) => {
                (bound(limit, "").map(|limit| Requirement::AtLeast { limit }), limit)
            }
            syntax::Requirement::AtMost(limit) => {
                (bound(limit, "").map(|limit| Requirement::AtMost { limit }), limit)
            }
            syntax::Requirement::Between(low, high) => {
                let bounds = bound(low, "low").zip(bound(high, "high"));
                if let Some((low_bound, high_bound)) = &bounds
                    && let (Some(from), Some(to)) = (constant(low_bound), constant(high_bound))
                    && from > to
                {
                    self.report(empty_band::found(
                        low.span.to(high.span),
                        "the lower end is above the upper one",
                    ));
                    return None;
                }
                (bounds.map(|(low, high)| Requirement::Between { low, high }), low)
            }
            syntax::Requirement::Within { target, tolerance } => {
                let bounds = bound(target, "target").zip(bound(tolerance, "tolerance"));
                if let Some((_, tolerance_bound)) = &bounds {
                    self.positive(tolerance_bound, tolerance.span)?;
                }
                (bounds.map(|(target, tolerance)| Requirement::Within { target, tolerance }), target)
            }
        };
        let built = built?;
        if let Some(
            Requirement::AtMost { limit: most }
            | Requirement::Between { high: most, .. }
            | Requirement::Within { target: most, .. },
        ) = &requirement
        {
            self.reachable(site, scope, (quantity.span, &built.formula), most);
        }
        let unit = self.unit_of(scope, shown, built.dimension);
        let unit = if unit.is_empty() { self.shown_in(site, scope, quantity, &built) } else { unit };
        Some(Demand {
            name,
            written,
            quantity: built.formula,
            dimension: built.dimension,
            unit,
            requirement: requirement?,
            because: because.map(|because| because.text.text.clone()),
            place: self.place(quantity.span),
        })
    }

    fn aim(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        (quantity, target, within): (&Expr, &Expr, &Expr),
        because: Option<&Because>,
    ) -> Option<Aim> {
        let written = self.text(quantity.span).to_string();
        let built = self.formula(site, scope, quantity, Speaks::Whole)?;
        let what = format!("the target of `{written}`");
        let path = format!("aim.{}", written.replace(' ', "_"));
        let asked = (quantity.span, built.dimension, what.as_str());
        let aimed = self.limit_of(site, scope, (&path, target), Speaks::Whole, asked, because);
        let path = format!("{path}.within");
        let asked = (quantity.span, built.dimension, "the tolerance of the aim");
        let tolerance = self.limit_of(site, scope, (&path, within), Speaks::Whole, asked, because);
        let (aimed, tolerance) = (aimed?, tolerance?);
        self.positive(&tolerance, within.span)?;
        self.reachable(site, scope, (quantity.span, &built.formula), &aimed);
        let unit = self.unit_of(scope, target, built.dimension);
        let unit = if unit.is_empty() { self.shown_in(site, scope, quantity, &built) } else { unit };
        Some(Aim {
            written,
            quantity: built.formula,
            target: aimed,
            tolerance,
            dimension: built.dimension,
            unit,
            place: self.place(quantity.span),
        })
    }

    fn positive(&mut self, tolerance: &Formula, span: Span) -> Option<()> {
        if constant(tolerance).is_none_or(|tolerance| tolerance > 0.0) {
            return Some(());
        }
        self.report(empty_band::found(span, "the tolerance is not above zero"));
        None
    }

    /// Warns of an inclination below the latitude of the pad, which a flight reaches only by a turn.
    /// The latitude is geodetic; the plane passes over the geocentric one, up to 0.2 deg lower.
    fn reachable(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        (span, quantity): (Span, &Formula),
        most: &Formula,
    ) {
        let Formula::At { of, .. } = quantity else { return };
        let inclined =
            matches!(**of, Formula::Reading { reading } if reading.quantity == Quantity::Inclination);
        let (Some(latitude), Some(wanted), true) = (site.latitude, constant(most), inclined) else { return };
        let slack = 0.2_f64.to_radians();
        if wanted < latitude.abs() - slack {
            let shown = (self.show(scope, wanted, "deg"), self.show(scope, latitude.abs(), "deg"));
            self.report(unreachable_inclination::found(span, &shown.0, &shown.1));
        }
    }

    /// The unit in which to show a quantity: that of a fact in it, else the trade's.
    fn shown_in(&mut self, site: &Site<'a>, scope: ScopeId, expr: &Expr, built: &Built) -> String {
        let unit = self.unit_of(scope, expr, built.dimension);
        if !unit.is_empty() {
            return unit;
        }
        let fact = match &built.formula {
            Formula::Fact { value } => self.facts.get(value.fact.0 as usize).map(|fact| fact.unit.clone()),
            Formula::Figure { index } => site.figures.get(*index as usize).map(|(_, _, unit)| unit.clone()),
            _ => None,
        };
        let customary = built.customary.filter(|unit| {
            crate::quantity::UnitTable::builtin()
                .parse(unit)
                .is_ok_and(|unit| unit.dimension == built.dimension)
        });
        fact.or(customary.map(str::to_string)).unwrap_or_else(|| si_unit(built.dimension))
    }

    fn headline(&mut self, site: &Site<'a>, scope: ScopeId, path: &Path) -> Option<Headline> {
        let text = self.text(path.span);
        if let Some(index) = site.figures.iter().position(|(name, ..)| name == text) {
            return Some(Headline::Figure { index: index as u32 });
        }
        if let Some(fact) = self.fact_at(site, scope, path) {
            return Some(Headline::Fact { fact });
        }
        let near = self.nearest(text, |_| site.figures.iter().map(|(name, ..)| name.as_str()).collect());
        let near = near.map(|near| (near, None));
        let found = unknown_name::found(path.span, "a figure or a fact", text, near);
        self.report(match near {
            Some(_) => found,
            None => found.help("name a `figure` of this mission, or a fact such as `payload`"),
        });
        None
    }
}

/// A unit of the SI for any dimension, as a source would write it.
fn si_unit(dimension: Dimension) -> String {
    let exponents = [
        ("kg", dimension.mass),
        ("m", dimension.length),
        ("s", dimension.time),
        ("K", dimension.temperature),
        ("rad", dimension.angle),
    ];
    let factors: Vec<String> = exponents
        .into_iter()
        .filter(|(_, exponent)| *exponent != 0)
        .map(
            |(symbol, exponent)| {
                if exponent == 1 { symbol.to_string() } else { format!("{symbol}^{exponent}") }
            },
        )
        .collect();
    factors.join("*")
}
