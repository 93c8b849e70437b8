//! What the flight found, as diagnostics with places in the source.

use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::{
    above_air, curve_range, ground_impact, hold_exceeded, never_ends, never_shed, no_lift_off,
    numerical_failure, ran_dry, true_at_start,
};
use crate::flight::Flight;
use crate::model::{Mission, Place};
use crate::report::{Finding, findings};
use crate::source::{FileId, Sources, Span};

/// The findings of a flight in the order of what happened.
pub fn diagnostics(mission: &Mission, flight: &Flight, sources: &Sources) -> Vec<Diagnostic> {
    findings(mission, flight).iter().map(|finding| diagnostic(finding, sources)).collect()
}

fn diagnostic(finding: &Finding, sources: &Sources) -> Diagnostic {
    let span = span(&finding.place, sources);
    let word = |index: usize| finding.words.get(index).map_or("", String::as_str);
    match finding.code {
        "true-at-start" => true_at_start::found(span, word(0), word(1), word(2)),
        "never-shed" => never_shed::found(span, word(0), word(1)),
        "hold-exceeded" => hold_exceeded::found(span, word(0), word(1), word(2)),
        "above-air" => above_air::found(span, word(0), word(1), word(2)),
        "no-lift-off" => no_lift_off::found(span, word(0), word(1)),
        "ground-impact" => ground_impact::found(span, word(0), word(1), word(2)),
        "never-ends" => never_ends::found(span, word(0), word(1)),
        "ran-dry" => ran_dry::found(span, word(0), word(1), word(2)),
        "curve-range" => curve_range::found(span, word(0), word(1), word(2)),
        _ => numerical_failure::found(span, word(0), word(1), word(2)),
    }
}

fn span(place: &Place, sources: &Sources) -> Span {
    let file = sources.files().iter().position(|file| file.name() == place.file).unwrap_or(0);
    Span::new(FileId(file as u32), place.start as usize, place.end as usize)
}
