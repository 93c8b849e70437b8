//! Demands, aims and figures, and the sentence over them all.

use crate::flight::{Completion, Flight, Notice};
use crate::model::{Fact, Formula, Headline, Mission, Requirement};
use crate::quantity::System;
use crate::report::content::{Aim, Demand, Figure, Status, Verdict};
use crate::report::notices::Finding;
use crate::report::show::{DIGITS, Show};

/// A demand with a smaller share of its limit to spare is called close.
const CLOSE: f64 = 0.05;

pub fn verdict(
    mission: &Mission,
    facts: &[Fact],
    flight: &Flight,
    system: System,
    found: &[Finding],
) -> Verdict {
    let show = Show { system };
    let demands: Vec<Demand> = mission
        .demands
        .iter()
        .zip(&flight.demands)
        .map(|(asked, result)| {
            let unit = show.unit(asked.dimension, &asked.unit).to_owned();
            let margin = result.value.map(|_| result.margin);
            let share = margin.filter(|_| result.scale > 0.0).map(|margin| margin / result.scale);
            Demand {
                name: asked.name.clone(),
                quantity: asked.written.clone(),
                requirement: requirement(&asked.requirement, facts, &show, &unit),
                value: result.value,
                limit: result.limit,
                margin,
                margin_percent: share.map(|share| 100.0 * share),
                met: result.met,
                close: result.met && share.is_some_and(|share| share < CLOSE),
                time_s: result.time,
                because: asked.because.clone(),
                unit,
            }
        })
        .collect();
    let aims: Vec<Aim> = mission
        .aims
        .iter()
        .zip(&flight.aims)
        .map(|(asked, result)| Aim {
            quantity: asked.written.clone(),
            unit: show.unit(asked.dimension, &asked.unit).to_owned(),
            value: result.value,
            target: result.target,
            tolerance: result.tolerance,
            hit: result.hit,
        })
        .collect();
    let (status, sentence) = status(flight, &demands, &aims, found);
    Verdict { status, sentence, demands, aims }
}

fn status(flight: &Flight, demands: &[Demand], aims: &[Aim], found: &[Finding]) -> (Status, String) {
    if let Completion::Failed(_) = flight.completion {
        let why = found.last().map_or_else(String::new, Finding::sentence);
        return (Status::Failed, format!("The flight could not be completed. {why}"));
    }
    let unmet: Vec<&str> =
        demands.iter().filter(|demand| !demand.met).map(|demand| demand.name.as_str()).collect();
    let missed = aims.iter().filter(|aim| !aim.hit).count();
    let exceeded = flight.notices.iter().any(|notice| matches!(notice, Notice::HoldExceeded { .. }));
    let mut faults = Vec::new();
    if !unmet.is_empty() {
        faults.push(format!("{} of {} demands unmet ({})", unmet.len(), demands.len(), unmet.join(", ")));
    }
    if missed > 0 {
        faults.push(format!("{missed} of {} aims missed", aims.len()));
    }
    if exceeded {
        faults.push("a hold exceeded".to_owned());
    }
    if !faults.is_empty() {
        return (Status::Unmet, format!("Not met: {}.", faults.join("; ")));
    }
    let mut said = match demands.len() {
        0 => "The flight is complete; nothing is demanded of it".to_owned(),
        1 => "The one demand is met".to_owned(),
        count => format!("All {count} demands are met"),
    };
    match aims.len() {
        0 => {}
        1 => said.push_str(" and the aim is hit"),
        count => said.push_str(&format!(" and all {count} aims are hit")),
    }
    let nearest = demands.iter().filter(|demand| demand.close).min_by(|a, b| {
        let share = |demand: &Demand| demand.margin_percent.unwrap_or(f64::INFINITY);
        share(a).total_cmp(&share(b))
    });
    if let Some((demand, percent)) = nearest.and_then(|demand| Some((demand, demand.margin_percent?))) {
        let percent = crate::quantity::format_number(percent, 2);
        said.push_str(&format!("; the closest is {}, with {percent} % to spare", demand.name));
    }
    (Status::Met, format!("{said}."))
}

/// A requirement in words, its numbers in the unit of the demand.
fn requirement(requirement: &Requirement, facts: &[Fact], show: &Show, unit: &str) -> String {
    let number = |formula: &Formula| match formula {
        Formula::Number { si } => show.with_unit(*si, unit, DIGITS),
        Formula::Fact { value } => match facts.get(value.fact.0 as usize) {
            // As the author wrote it, where the report keeps the author's units.
            Some(fact) if show.system == System::Written && !fact.written.is_empty() => fact.written.clone(),
            _ => show.with_unit(value.si, unit, DIGITS),
        },
        _ => "an expression".to_owned(),
    };
    match requirement {
        Requirement::AtLeast { limit } => format!(">= {}", number(limit)),
        Requirement::AtMost { limit } => format!("<= {}", number(limit)),
        Requirement::Between { low, high } => format!("between {} and {}", number(low), number(high)),
        Requirement::Within { target, tolerance } => {
            format!("= {} within {}", number(target), number(tolerance))
        }
    }
}

pub fn figures(mission: &Mission, facts: &[Fact], flight: &Flight) -> Vec<Figure> {
    let headline = |index: usize| matches!(mission.headline, Some(Headline::Figure { index: chosen }) if chosen as usize == index);
    let mut figures = Vec::new();
    if let Some(Headline::Fact { fact }) = mission.headline
        && let Some(fact) = facts.get(fact.0 as usize)
    {
        figures.push(Figure {
            name: fact.path.clone(),
            quantity: "as stated".to_owned(),
            unit: fact.unit.clone(),
            value: Some(fact.si),
            headline: true,
            because: fact.because.clone(),
        });
    }
    figures.extend(mission.figures.iter().zip(&flight.figures).enumerate().map(
        |(index, (asked, result))| Figure {
            name: asked.name.clone(),
            quantity: asked.written.clone(),
            unit: asked.unit.clone(),
            value: result.value,
            headline: headline(index),
            because: asked.because.clone(),
        },
    ));
    figures
}
