//! Altitude against downrange.

use super::axis::{Scale, simplified};
use super::labels::Labels;
use super::svg::{Anchor, Paint, Svg};
use crate::flight::{Flight, Snapshot};
use crate::model::{Mission, Quantity};
use crate::quantity::{Dimension, UnitTable};
use crate::report::show::Show;

const WIDTH: f64 = 860.0;
const HEIGHT: f64 = 380.0;
const LEFT: f64 = 74.0;
const RIGHT: f64 = 24.0;
const TOP: f64 = 58.0;
const BOTTOM: f64 = 50.0;

pub fn draw(mission: &Mission, flight: &Flight, show: &Show) -> String {
    let unit = show.unit(Dimension::LENGTH, "km");
    let factor = UnitTable::builtin().parse(unit).map_or(1.0, |unit| unit.factor);
    let value = |state: &Snapshot, quantity: Quantity| state.get(quantity).unwrap_or(0.0) / factor;
    let range = |quantity: Quantity| {
        let values = flight.samples.iter().map(|state| value(state, quantity));
        values.fold((0.0_f64, 0.0_f64), |(low, high), value| (low.min(value), high.max(value)))
    };
    let across = Scale::nice(range(Quantity::Downrange), (LEFT, WIDTH - RIGHT), 7);
    let up = Scale::nice(range(Quantity::Altitude), (HEIGHT - BOTTOM, TOP), 5);
    let title = format!("{}: altitude against downrange", mission.name);
    let mut svg = Svg::new(
        WIDTH,
        HEIGHT,
        &title,
        "The two axes have scales of their own; dots mark the starts of phases.",
    );
    svg.text((16.0, 24.0), Anchor::Start, Paint::Ink, 15, &mission.name);
    for (value, text) in up.marks(5) {
        let y = up.place(value);
        svg.line((LEFT, y), (WIDTH - RIGHT, y), Paint::Grid, 1.0);
        svg.text((LEFT - 8.0, y + 4.0), Anchor::End, Paint::Faint, 12, &text);
    }
    for (value, text) in across.marks(7) {
        let x = across.place(value);
        svg.line((x, TOP), (x, HEIGHT - BOTTOM), Paint::Grid, 1.0);
        svg.text((x, HEIGHT - BOTTOM + 18.0), Anchor::Middle, Paint::Faint, 12, &text);
    }
    svg.text((LEFT, TOP - 12.0), Anchor::Start, Paint::Ink, 12, &format!("altitude, geodetic, {unit}"));
    let middle = (LEFT + WIDTH - RIGHT) / 2.0;
    svg.text(
        (middle, HEIGHT - 12.0),
        Anchor::Middle,
        Paint::Ink,
        12,
        &format!("downrange along the ground, {unit}"),
    );
    let place = |state: &Snapshot| {
        (across.place(value(state, Quantity::Downrange)), up.place(value(state, Quantity::Altitude)))
    };
    let paints = [Paint::First, Paint::Second];
    for (index, flown) in flight.phases.iter().enumerate() {
        let within = |state: &&Snapshot| state.phase == flown.phase;
        let points: Vec<(f64, f64)> = flight.samples.iter().filter(within).map(place).collect();
        svg.trace(&simplified(&points), paints[index % 2], false);
    }
    let mut labels = Labels::default();
    for (index, flown) in flight.phases.iter().enumerate() {
        let name = mission.phases.get(flown.phase).map_or("", |phase| phase.name.as_str());
        let at = place(&flown.start);
        svg.dot(at, paints[index % 2]);
        // Beside the dot, where nothing else is written.
        let half = 0.5 * super::labels::room(name);
        let beside = [
            (at.0 + half + 8.0, at.1 + 12.0),
            (at.0 - half - 8.0, at.1 - 6.0),
            (at.0 + half + 8.0, at.1 - 6.0),
        ];
        let free = beside.into_iter().find(|place| {
            place.0 - half > LEFT && place.0 + half < WIDTH - RIGHT && labels.take(*place, name)
        });
        if let Some(place) = free {
            svg.text(place, Anchor::Middle, Paint::Faint, 11, name);
        }
    }
    svg.finish()
}
