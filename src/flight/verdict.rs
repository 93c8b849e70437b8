//! What was asked of the flight, and how it came out.

use super::history::History;
use super::peaks::{Summit, Wanted, search};
use super::program::{Program, Whole, evaluate};
use super::result::{AimResult, DemandResult, FigureResult, PhaseFlown, Snapshot};
use crate::math::Scalar;
use crate::model::{Edge, Formula, Mission, Reading, Requirement};

/// Demands, aims and figures of a flown mission.
pub struct Verdict {
    pub demands: Vec<DemandResult>,
    pub aims: Vec<AimResult>,
    pub figures: Vec<FigureResult>,
}

/// Judges the flight by the mission. `end` is the state at its end.
pub fn judge<S: Scalar>(
    mission: &Mission,
    history: &History<S>,
    phases: &[PhaseFlown],
    end: &Snapshot,
) -> Verdict {
    let mut asked = Vec::new();
    for formula in formulas(mission) {
        collect(formula, &mut asked);
    }
    let wanted: Vec<Wanted<S>> =
        asked.iter().map(|(of, phase)| Wanted { program: Program::new(of), phase: *phase }).collect();
    let summits = search(history, &wanted);
    let mut flown = Flown { asked, summits, phases, end, figures: Vec::new() };
    for figure in &mission.figures {
        let value = evaluate(&figure.value, &flown, &mut None);
        flown.figures.push(value);
    }
    let demands =
        mission.demands.iter().map(|asked| demand(&asked.quantity, &asked.requirement, &flown)).collect();
    let aims = mission.aims.iter().map(|aim| {
        let number = |formula: &Formula| evaluate(formula, &flown, &mut None).unwrap_or(f64::NAN);
        let value = evaluate(&aim.quantity, &flown, &mut None);
        let (target, tolerance) = (number(&aim.target), number(&aim.tolerance));
        AimResult {
            value,
            target,
            tolerance,
            hit: value.is_some_and(|value| (value - target).abs() <= tolerance),
        }
    });
    let aims = aims.collect();
    let figures = flown.figures.iter().map(|value| FigureResult { value: *value }).collect();
    Verdict { demands, aims, figures }
}

/// Every formula that speaks of the whole flight.
fn formulas(mission: &Mission) -> impl Iterator<Item = &Formula> {
    let demands = mission.demands.iter().flat_map(|demand| {
        let bounds = match &demand.requirement {
            Requirement::AtLeast { limit } | Requirement::AtMost { limit } => [Some(limit), None],
            Requirement::Between { low, high } => [Some(low), Some(high)],
            Requirement::Within { target, tolerance } => [Some(target), Some(tolerance)],
        };
        std::iter::once(&demand.quantity).chain(bounds.into_iter().flatten())
    });
    let aims = mission.aims.iter().flat_map(|aim| [&aim.quantity, &aim.target, &aim.tolerance]);
    demands.chain(aims).chain(mission.figures.iter().map(|figure| &figure.value))
}

/// The peaks in a formula.
fn collect<'m>(formula: &'m Formula, asked: &mut Vec<(&'m Formula, Option<usize>)>) {
    match formula {
        Formula::Peak { of, phase } => {
            let one = (&**of, phase.map(|phase| phase as usize));
            if !asked.contains(&one) {
                asked.push(one);
            }
        }
        Formula::Negate { of } => collect(of, asked),
        Formula::Binary { left, right, .. } => {
            collect(left, asked);
            collect(right, asked);
        }
        Formula::Call { of, .. } => of.iter().for_each(|argument| collect(argument, asked)),
        Formula::Number { .. }
        | Formula::Fact { .. }
        | Formula::Reading { .. }
        | Formula::Figure { .. }
        | Formula::At { .. } => {}
    }
}

struct Flown<'m, 'h> {
    asked: Vec<(&'m Formula, Option<usize>)>,
    summits: Vec<Option<Summit>>,
    phases: &'h [PhaseFlown],
    end: &'h Snapshot,
    figures: Vec<Option<f64>>,
}

impl Whole for Flown<'_, '_> {
    fn at(&self, of: &Formula, edge: Edge, phase: usize) -> Option<f64> {
        let flown = self.phases.iter().find(|flown| flown.phase == phase)?;
        let state = match edge {
            Edge::Start => &flown.start,
            Edge::End => &flown.end,
        };
        let value = Program::<f64>::new(of).run(|reading| state.read(reading).unwrap_or(f64::NAN));
        value.is_finite().then_some(value)
    }

    fn peak(&self, of: &Formula, phase: Option<usize>) -> Option<(f64, f64)> {
        let index = self.asked.iter().position(|asked| *asked == (of, phase))?;
        self.summits.get(index).copied().flatten().map(|summit| (summit.value, summit.time))
    }

    fn figure(&self, index: usize) -> Option<f64> {
        self.figures.get(index).copied().flatten()
    }

    fn last(&self, reading: Reading) -> Option<f64> {
        self.end.read(reading)
    }
}

/// A demand's value with its margin, which is positive when it is met.
fn demand(quantity: &Formula, requirement: &Requirement, flown: &Flown) -> DemandResult {
    let number = |formula: &Formula| evaluate(formula, flown, &mut None).unwrap_or(f64::NAN);
    let mut time = None;
    let value = evaluate(quantity, flown, &mut time);
    let found = value.unwrap_or(f64::NAN);
    let limit = |limit: f64, margin: f64| (limit, margin, limit.abs());
    let band = |low: f64, high: f64| {
        let (end, margin) =
            if found - low < high - found { (low, found - low) } else { (high, high - found) };
        (end, margin, 0.5 * (high - low))
    };
    let (limit, margin, scale) = match requirement {
        Requirement::AtLeast { limit: least } => limit(number(least), found - number(least)),
        Requirement::AtMost { limit: most } => limit(number(most), number(most) - found),
        Requirement::Between { low, high } => band(number(low), number(high)),
        Requirement::Within { target, tolerance } => {
            band(number(target) - number(tolerance), number(target) + number(tolerance))
        }
    };
    DemandResult { value, limit, margin, scale, met: margin >= 0.0, time }
}
