//! Altitude, speed, dynamic pressure and acceleration against time, with the phases marked.

use super::axis::{Scale, simplified};
use super::labels::{Labels, room};
use super::svg::{Anchor, Paint, Svg};
use crate::flight::{Flight, Snapshot};
use crate::model::{Air, Mission, Quantity};
use crate::quantity::UnitTable;
use crate::report::show::Show;

const WIDTH: f64 = 860.0;
const LEFT: f64 = 74.0;
const RIGHT: f64 = 18.0;
const TOP: f64 = 112.0;
const PANEL: f64 = 132.0;
const GAP: f64 = 34.0;
const BOTTOM: f64 = 44.0;
/// Rows for the names of phases above the first panel.
const ROWS: usize = 3;

/// One panel: its title, its quantities with their names, and the peak that is marked.
struct Panel {
    title: &'static str,
    lines: &'static [(Quantity, &'static str)],
    peak: Option<Quantity>,
}

const PANELS: &[Panel] = &[
    Panel { title: "altitude, geodetic", lines: &[(Quantity::Altitude, "")], peak: None },
    Panel {
        title: "speed",
        lines: &[(Quantity::GroundSpeed, "over ground, body-fixed"), (Quantity::InertialSpeed, "inertial")],
        peak: None,
    },
    Panel {
        title: "dynamic pressure",
        lines: &[(Quantity::DynamicPressure, "")],
        peak: Some(Quantity::DynamicPressure),
    },
    Panel {
        title: "sensed acceleration",
        lines: &[(Quantity::Acceleration, "")],
        peak: Some(Quantity::Acceleration),
    },
];

pub fn draw(mission: &Mission, flight: &Flight, show: &Show) -> String {
    let panels: Vec<&Panel> = PANELS
        .iter()
        .filter(|panel| panel.peak != Some(Quantity::DynamicPressure) || mission.world.air != Air::None)
        .collect();
    let height = TOP + panels.len() as f64 * (PANEL + GAP) - GAP + BOTTOM;
    let title = format!("{}: altitude, speed, dynamic pressure and acceleration against time", mission.name);
    let mut svg = Svg::new(WIDTH, height, &title, "Panels over one axis of time; bands mark the phases.");
    svg.text((LEFT, 24.0), Anchor::Start, Paint::Ink, 15, &mission.name);
    let end = flight.samples.last().map_or(1.0, |state| state.time);
    let time = Scale::exact((0.0, end), (LEFT, WIDTH - RIGHT));
    let bottom = height - BOTTOM;
    phases(&mut svg, mission, flight, &time, bottom);
    for (index, panel) in panels.iter().enumerate() {
        let top = TOP + index as f64 * (PANEL + GAP);
        draw_panel(&mut svg, flight, show, panel, &time, top);
    }
    for (value, text) in time.marks(8) {
        svg.text((time.place(value), bottom + 18.0), Anchor::Middle, Paint::Faint, 12, &text);
    }
    svg.text(((LEFT + WIDTH - RIGHT) / 2.0, bottom + 36.0), Anchor::Middle, Paint::Ink, 12, "time, s");
    svg.finish()
}

/// Bands through all panels, and the names of the phases above them.
fn phases(svg: &mut Svg, mission: &Mission, flight: &Flight, time: &Scale, bottom: f64) {
    let mut labels = Labels::default();
    for (index, flown) in flight.phases.iter().enumerate() {
        let (from, to) = (time.place(flown.start.time), time.place(flown.end.time));
        if index % 2 == 0 {
            svg.rect((from, TOP), (to - from, bottom - TOP), Paint::Band);
        }
        let name = mission.phases.get(flown.phase).map_or("", |phase| phase.name.as_str());
        let half = 0.5 * room(name);
        let middle = 0.5 * (from + to);
        let x = middle.clamp(LEFT + half.min(200.0), (WIDTH - RIGHT - half).max(LEFT));
        let row = (0..ROWS).map(|row| TOP - 28.0 - 15.0 * row as f64).find(|y| labels.take((x, *y), name));
        if let Some(y) = row {
            svg.text((x, y), Anchor::Middle, Paint::Faint, 11, name);
            svg.line((middle, y + 3.0), (middle, TOP - 22.0), Paint::Grid, 1.0);
        }
    }
}

fn draw_panel(svg: &mut Svg, flight: &Flight, show: &Show, panel: &Panel, time: &Scale, top: f64) {
    let Some((first, _)) = panel.lines.first() else { return };
    let unit = show.unit(first.dimension(), first.customary_unit());
    let factor = UnitTable::builtin().parse(unit).map_or(1.0, |unit| unit.factor);
    let value = |state: &Snapshot, quantity: Quantity| state.get(quantity).unwrap_or(0.0) / factor;
    let all = flight
        .samples
        .iter()
        .flat_map(|state| panel.lines.iter().map(move |(quantity, _)| value(state, *quantity)));
    let (low, high) = all.fold((0.0_f64, 0.0_f64), |(low, high), value| (low.min(value), high.max(value)));
    let scale = Scale::nice((low, high), (top + PANEL, top), 4);
    for (value, text) in scale.marks(4) {
        let y = scale.place(value);
        svg.line((LEFT, y), (WIDTH - RIGHT, y), Paint::Grid, 1.0);
        svg.text((LEFT - 8.0, y + 4.0), Anchor::End, Paint::Faint, 12, &text);
    }
    let paints = [Paint::First, Paint::Second];
    for ((quantity, _), (paint, dashed)) in panel.lines.iter().zip(paints.into_iter().zip([false, true])) {
        let points: Vec<(f64, f64)> = flight
            .samples
            .iter()
            .map(|state| (time.place(state.time), scale.place(value(state, *quantity))))
            .collect();
        svg.trace(&simplified(&points), paint, dashed);
    }
    svg.text((LEFT, top - 7.0), Anchor::Start, Paint::Ink, 12, &format!("{}, {unit}", panel.title));
    let mut right = WIDTH - RIGHT;
    for ((_, name), (paint, dash)) in panel.lines.iter().zip(paints.into_iter().zip(["—", "– –"])).rev()
    {
        if !name.is_empty() {
            let text = format!("{dash} {name}");
            svg.text((right, top - 7.0), Anchor::End, paint, 12, &text);
            right -= room(&text) + 12.0;
        }
    }
    let peak = flight.peaks.iter().find(|peak| Some(peak.quantity) == panel.peak);
    if let Some(peak) = peak.filter(|peak| peak.value > 0.0) {
        let at = (time.place(peak.state.time), scale.place(peak.value / factor));
        svg.dot(at, Paint::Third);
        let anchor = if at.0 > 0.8 * WIDTH { Anchor::End } else { Anchor::Start };
        // To the left the line climbs to its peak, so the text stands above it there.
        let (x, y) = if anchor == Anchor::End { (at.0 - 6.0, at.1 - 7.0) } else { (at.0 + 9.0, at.1 + 4.0) };
        let text = format!(
            "{} {unit} at {} s",
            show.number(peak.value, unit, 4),
            crate::quantity::format_fixed(peak.state.time, 1)
        );
        svg.text((x, y), anchor, Paint::Third, 12, text.trim());
    }
}
