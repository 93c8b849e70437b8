//! The ledger as a picture: from what the propellant paid down to the speed gained.

use super::axis::Scale;
use super::svg::{Anchor, Paint, Svg};
use crate::flight::{Flight, Frame};
use crate::model::Mission;
use crate::quantity::{Dimension, UnitTable};
use crate::report::show::Show;

const WIDTH: f64 = 860.0;
const LEFT: f64 = 150.0;
const RIGHT: f64 = 96.0;
const TOP: f64 = 64.0;
const BAR: f64 = 26.0;
const GAP: f64 = 12.0;
/// Half a unit of the last digit shown: less is neither gain nor loss.
const SHOWN: f64 = 0.05;

pub fn draw(mission: &Mission, flight: &Flight, show: &Show) -> String {
    let total = &flight.ledger.total;
    let losses = [
        ("back pressure", total.back_pressure),
        ("steering", total.steering),
        ("drag", total.drag),
        ("gravity", total.gravity),
    ];
    let unit = show.unit(Dimension::SPEED, "m/s");
    let factor = UnitTable::builtin().parse(unit).map_or(1.0, |unit| unit.factor);
    // Each bar from where the one before ended; the first and the last stand on zero.
    let mut bars = vec![("paid by propellant", 0.0, total.paid, total.paid, Paint::First)];
    let mut rest = total.paid;
    for (name, loss) in losses {
        let paint = if loss / factor >= -SHOWN { Paint::Second } else { Paint::Third };
        bars.push((name, rest, rest - loss, -loss, paint));
        rest -= loss;
    }
    bars.push(("speed gained", 0.0, total.gained, total.gained, Paint::First));
    let ends = bars.iter().flat_map(|(_, from, to, ..)| [*from, *to]);
    let (low, high) = ends.fold((0.0_f64, 0.0_f64), |(low, high), end| (low.min(end), high.max(end)));
    let height = TOP + bars.len() as f64 * (BAR + GAP) + 40.0;
    let frame = match flight.frame {
        Frame::BodyFixed => "body-fixed",
        Frame::Inertial => "inertial",
    };
    let title = format!("{}: the delta-v ledger in the {frame} frame", mission.name);
    let mut svg =
        Svg::new(WIDTH, height, &title, "Bars from what the propellant paid, by loss, to the speed gained.");
    svg.text((16.0, 24.0), Anchor::Start, Paint::Ink, 15, &mission.name);
    svg.text(
        (16.0, 44.0),
        Anchor::Start,
        Paint::Faint,
        12,
        &format!("delta-v ledger, {frame} frame, {unit}"),
    );
    let scale = Scale::nice((low / factor, high / factor), (LEFT, WIDTH - RIGHT), 6);
    let bottom = height - 34.0;
    for (value, text) in scale.marks(6) {
        let x = scale.place(value);
        svg.line((x, TOP - 6.0), (x, bottom), Paint::Grid, 1.0);
        svg.text((x, bottom + 18.0), Anchor::Middle, Paint::Faint, 12, &text);
    }
    for (index, (name, from, to, change, paint)) in bars.iter().enumerate() {
        let y = TOP + index as f64 * (BAR + GAP);
        let (a, b) = (scale.place(from / factor), scale.place(to / factor));
        // A loss too small for a bar keeps a line that can be seen.
        svg.rect((a.min(b), y), ((a - b).abs().max(1.5), BAR), *paint);
        svg.text((LEFT - 10.0, y + 17.0), Anchor::End, Paint::Ink, 12, name);
        let text = crate::quantity::format_fixed(change / factor, 1);
        let text = if *change / factor > SHOWN && index > 0 && index + 1 < bars.len() {
            format!("+{text}")
        } else {
            text
        };
        svg.text((a.max(b) + 8.0, y + 17.0), Anchor::Start, Paint::Ink, 12, &text);
        if index + 1 < bars.len() {
            svg.line((b, y + BAR), (b, y + BAR + GAP), Paint::Faint, 1.0);
        }
    }
    svg.finish()
}
