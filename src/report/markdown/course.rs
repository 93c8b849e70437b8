//! How the flight went: timeline, peaks, and the state and orbit at its end.

use super::table::{Table, plain};
use crate::model::Quantity;
use crate::quantity::{Dimension, format_fixed, format_number};
use crate::report::content::{Report, State};
use crate::report::show::{DIGITS, Show};

pub fn timeline(report: &Report, show: &Show) -> String {
    let quantities = [
        Quantity::Altitude,
        Quantity::Downrange,
        Quantity::GroundSpeed,
        Quantity::InertialSpeed,
        Quantity::FlightPathAngle,
        Quantity::Mach,
        Quantity::DynamicPressure,
        Quantity::Acceleration,
        Quantity::Mass,
    ];
    let names = [
        "altitude",
        "downrange",
        "ground speed, body-fixed",
        "inertial speed",
        "flight-path angle, inertial",
        "Mach",
        "dynamic pressure",
        "sensed acceleration",
        "mass",
    ];
    let air = report.timeline.iter().any(|event| event.state.mach.is_some());
    let shown = |quantity: &Quantity| air || !matches!(quantity, Quantity::Mach | Quantity::DynamicPressure);
    let mut heads = Vec::new();
    for (quantity, name) in quantities.iter().zip(names).filter(|(quantity, _)| shown(quantity)) {
        let unit = show.unit(quantity.dimension(), quantity.customary_unit());
        heads.push(if unit.is_empty() { name.to_owned() } else { format!("{name}, {unit}") });
    }
    let mut table = Table::new(&["time, s", "event"], &heads);
    for event in &report.timeline {
        let mut cells = vec![format_fixed(event.state.time_s, 2), plain(&event.what)];
        for quantity in quantities.iter().filter(|quantity| shown(quantity)) {
            cells.push(
                of(&event.state, *quantity).map_or_else(String::new, |si| show.in_table(*quantity, si)),
            );
        }
        table.row(cells);
    }
    format!("## Timeline\n\n{}", table.render())
}

fn of(state: &State, quantity: Quantity) -> Option<f64> {
    match quantity {
        Quantity::Altitude => Some(state.altitude_m),
        Quantity::Downrange => Some(state.downrange_m),
        Quantity::GroundSpeed => Some(state.ground_speed_m_s),
        Quantity::InertialSpeed => Some(state.inertial_speed_m_s),
        Quantity::FlightPathAngle => Some(state.flight_path_angle_rad),
        Quantity::Mach => state.mach,
        Quantity::DynamicPressure => state.dynamic_pressure_pa,
        Quantity::Acceleration => Some(state.acceleration_m_s2),
        Quantity::Mass => Some(state.mass_kg),
        _ => None,
    }
}

pub fn peaks(report: &Report, show: &Show) -> String {
    let length = show.unit(Dimension::LENGTH, "km");
    let mut table = Table::new(
        &["quantity", "phase", "kind"],
        &["greatest".into(), "at, s".into(), format!("altitude, {length}")],
    );
    for peak in &report.peaks {
        let quantity = Quantity::ALL.iter().find(|quantity| quantity.name() == peak.quantity);
        let dimension = quantity.map_or(Dimension::NONE, |quantity| quantity.dimension());
        table.row(vec![
            peak.quantity.replace('_', " "),
            plain(&peak.phase),
            if peak.corner { "corner" } else { "smooth" }.to_owned(),
            show.with_unit(peak.value, show.unit(dimension, &peak.unit), DIGITS),
            format_fixed(peak.time_s, 2),
            show.number(peak.altitude_m, length, 5),
        ]);
    }
    if table.is_empty() {
        return String::new();
    }
    format!(
        "## Peaks\n\nA corner stands where something switches and the slope jumps. Ground speed is body-fixed.\n\n{}",
        table.render()
    )
}

pub fn end(report: &Report, show: &Show) -> String {
    let state = &report.end.state;
    let (length, speed) = (show.unit(Dimension::LENGTH, "km"), show.unit(Dimension::SPEED, "m/s"));
    let degrees = |radians: f64, decimals: usize| {
        format!("{} deg", format_fixed(radians * (180.0 / std::f64::consts::PI), decimals))
    };
    let km = |si: f64| show.with_unit(si, length, 7);
    let mut table = Table::new(&["at the end"], &["value".into()]);
    let mut row = |name: &str, value: String| table.row(vec![name.to_owned(), value]);
    row("time", format!("{} s", format_fixed(state.time_s, 2)));
    row("mass", show.with_unit(state.mass_kg, show.unit(Dimension::MASS, "kg"), 7));
    row("altitude", km(state.altitude_m));
    row("speed, inertial", show.with_unit(state.inertial_speed_m_s, speed, 7));
    row("speed over ground, body-fixed", show.with_unit(state.ground_speed_m_s, speed, 7));
    row(
        "gift of the ground's rotation at the start, inertial",
        show.with_unit(report.ledger.ground_speed_at_start_m_s, speed, 5),
    );
    row("flight-path angle, inertial", degrees(state.flight_path_angle_rad, 4));
    row("heading, body-fixed", degrees(state.heading_rad, 3));
    if let (Some(latitude), Some(longitude)) = (state.latitude_rad, state.longitude_rad) {
        row("latitude, geodetic", degrees(latitude, 4));
        row("longitude", degrees(longitude, 4));
    }
    let Some(orbit) = &report.end.orbit else { return format!("## Final state\n\n{}", table.render()) };
    row("apogee altitude", orbit.apogee_m.map_or_else(|| "none: it escapes".to_owned(), km));
    row("perigee altitude", km(orbit.perigee_m));
    row("semi-major axis", show.with_unit(orbit.semi_major_axis_m, length, 8));
    row("eccentricity", format_number(orbit.eccentricity, 6));
    row("inclination", degrees(orbit.inclination_rad, 4));
    row("right ascension of the ascending node", degrees(orbit.node_rad, 4));
    row("argument of perigee", degrees(orbit.argument_of_perigee_rad, 3));
    row("true anomaly", degrees(orbit.true_anomaly_rad, 3));
    if let Some(period) = orbit.period_s {
        row("period", format!("{} minute", format_fixed(period / 60.0, 3)));
    }
    if let Some(time) = orbit.mean_local_time_of_node_s {
        row("mean local time of the ascending node", clock(time));
    }
    format!(
        "## Final orbit\n\nElements are osculating, from the inertial state; apogee and perigee altitudes are radii less the equatorial radius.\n\n{}",
        table.render()
    )
}

/// Seconds after midnight as a clock shows them.
fn clock(time: f64) -> String {
    let whole = time.round().clamp(0.0, 86_399.0) as u32;
    format!("{:02}:{:02}:{:02}", whole / 3600, whole / 60 % 60, whole % 60)
}
