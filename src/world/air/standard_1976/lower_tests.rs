//! Against U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562), ISO 2533:1975 and ICAO Doc 7488.

use super::lower::{self, Layer};
use super::{JOINT, LAYER_ALTITUDES, TOP, at, temperature};
use crate::math::Scalar;

fn close(actual: f64, expected: f64, relative: f64, what: &str) {
    let miss = (actual / expected - 1.0).abs();
    assert!(miss <= relative, "{what}: {actual} for {expected}, {miss:e} off");
}

/// Table I, geometric altitude in km: K, Pa, kg/m³. The printed pressures at 10, 15, 60 and 80 km are
/// truncated; the digits here are those of the closed forms.
const TABLE_1: [(f64, f64, f64, f64); 16] = [
    (0.0, 288.150, 101325.0, 1.225),
    (0.5, 284.900, 95461.3, 1.1673),
    (1.0, 281.651, 89876.3, 1.1117),
    (5.0, 255.676, 54048.3, 0.73643),
    (10.0, 223.252, 26499.9, 0.41351),
    (15.0, 216.650, 12111.8, 0.19476),
    (20.0, 216.650, 5529.31, 0.08891),
    (25.0, 221.552, 2549.22, 0.040084),
    (30.0, 226.509, 1197.03, 0.01841),
    (40.0, 250.350, 287.144, 0.0039957),
    (50.0, 270.650, 79.7791, 0.0010269),
    (60.0, 247.021, 21.9587, 0.00030968),
    (70.0, 219.585, 5.2209, 8.2829e-05),
    (77.0, 204.493, 1.72861, 2.9448e-05),
    (80.0, 198.639, 1.05247, 1.8458e-05),
    (86.0, 186.867, 0.37338, 6.9578e-06),
];

#[test]
fn agrees_with_table_1_below_86_km() {
    for (km, kelvin, pressure, density) in TABLE_1 {
        let air = at(km * 1e3).unwrap();
        close(temperature(km * 1e3).unwrap(), kelvin, 1e-5, &format!("T at {km} km"));
        close(air.pressure, pressure, 1e-4, &format!("p at {km} km"));
        close(air.density, density, 1e-4, &format!("density at {km} km"));
    }
}

#[test]
fn bases_of_layers() {
    // USSA 1976 and ISO 2533:1975, geopotential m and Pa.
    let bases = [
        (11e3, 22632.064),
        (20e3, 5474.8887),
        (32e3, 868.01868),
        (47e3, 110.90631),
        (51e3, 66.938873),
        (71e3, 3.9564204),
        (84852.0, 0.37338359),
    ];
    for (height, pressure) in bases {
        let air = lower::at(lower::geometric(height));
        close(air.pressure, pressure, 1e-7, &format!("base at {height} m"));
    }
}

#[test]
fn each_layer_starts_where_the_one_below_ends() {
    for altitude in LAYER_ALTITUDES.into_iter().filter(|altitude| *altitude < JOINT) {
        let step = altitude * 1e-15;
        let (below, above) = (at(altitude - step).unwrap(), at(altitude + step).unwrap());
        close(above.pressure, below.pressure, 1e-13, &format!("pressure at {altitude} m"));
        close(above.density, below.density, 1e-13, &format!("density at {altitude} m"));
    }
}

#[test]
fn altitudes_of_the_layers_are_the_seams() {
    for altitude in LAYER_ALTITUDES.into_iter().filter(|altitude| *altitude < JOINT) {
        let Layer { base, .. } = lower::layer_at(lower::geopotential(altitude + 1e-6));
        assert!((lower::geopotential(altitude) - base).abs() < 1e-9);
        assert!(lower::layer_at(lower::geopotential(altitude - 1e-6)).base < *base);
    }
    assert!(LAYER_ALTITUDES.is_sorted());
}

#[test]
fn pressure_altitudes() {
    // ICAO Doc 7488 (3rd ed.): geopotential feet, hPa.
    let levels = [
        (5000.0, 843.0728),
        (10000.0, 696.8166),
        (18000.0, 505.9985),
        (39000.0, 196.7732),
        (50000.0, 115.9726),
    ];
    for (feet, hectopascal) in levels {
        let air = lower::at(lower::geometric(feet * 0.3048));
        close(air.pressure, hectopascal * 100.0, 1e-6, &format!("{feet} ft"));
    }
}

#[test]
fn below_sea_level_the_lowest_layer_goes_on() {
    // ISO 2533:1975, −2000 m geopotential.
    let altitude = lower::geometric(-2000.0);
    close(at(altitude).unwrap().pressure, 127773.7, 1e-6, "pressure at -2 km");
    close(temperature(altitude).unwrap(), 301.15, 1e-12, "temperature at -2 km");
    // USSA 1976, Table I: −5 km geometric, 1.7776e5 Pa and 320.676 K.
    close(at(-5000.0).unwrap().pressure, 1.7776e5, 1e-4, "pressure at -5 km");
    close(temperature(-5000.0).unwrap(), 320.676, 2e-6, "temperature at -5 km");
}

#[test]
fn speed_of_sound() {
    // Table I: 340.294 m/s at 0 km, 299.53 m/s at 10 km; 1116.45 ft/s in US units.
    close(at(0.0).unwrap().sound_speed, 340.2941, 1e-6, "0 km");
    close(at(10e3).unwrap().sound_speed, 299.532, 1e-5, "10 km");
    close(at(0.0).unwrap().sound_speed / 0.3048, 1116.45, 1e-5, "0 km in ft/s");
    // Half of gamma times the pressure is the dynamic pressure at Mach 1: 70 927.5 Pa.
    let air = at(0.0_f64).unwrap();
    close(air.density * air.sound_speed.square() / 2.0, 70927.5, 1e-7, "q at Mach 1");
}

#[test]
fn sea_level_in_us_units() {
    // Table I: 0.0023769 slug/ft³, 2116.22 lbf/ft².
    let air = at(0.0).unwrap();
    close(air.density / 515.378818393, 0.002376891, 1e-6, "slug/ft3");
    close(air.pressure / 47.8802589803, 2116.217, 1e-6, "psf");
}

#[test]
fn geopotential_of_the_joint() {
    // Eq. 18.
    assert!((lower::geopotential(86e3) - 84852.046).abs() < 1e-3);
}

#[test]
fn pressure_carries_the_weight_of_the_air_above() {
    // dp = −ρ g dZ with g = g0 (r0/(r0 + Z))² (eq. 17), by Simpson's rule within each layer.
    let weight = |altitude: f64| {
        let ratio = lower::EFFECTIVE_RADIUS / (lower::EFFECTIVE_RADIUS + altitude);
        lower::at(altitude).density * 9.80665 * ratio * ratio
    };
    let mut sum = lower::at(JOINT).pressure;
    let mut bottom = 0.0;
    for top in LAYER_ALTITUDES.into_iter().filter(|altitude| *altitude <= JOINT) {
        let cells = 2000;
        let cell = (top - bottom) / f64::from(cells);
        for i in 0..cells {
            let low = bottom + f64::from(i) * cell;
            // The layer above already rules at its base, with the same values.
            sum += cell / 6.0 * (weight(low) + 4.0 * weight(low + cell / 2.0) + weight(low + cell));
        }
        bottom = top;
    }
    close(sum, 101325.0, 1e-9, "weight of the column");
}

#[test]
fn nothing_above_the_top_and_nothing_for_nonsense() {
    assert!(at(TOP).is_some());
    assert!(at(TOP + 1e-3).is_none());
    assert!(at(f64::NAN).is_none());
    assert!(at(f64::INFINITY).is_none());
}
