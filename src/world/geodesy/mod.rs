//! The shape of a body, its rotation, and the dates that fix its angle.

mod date;
mod earth_rotation;
mod ellipsoid;
mod spin;
mod surface;

pub use date::{DateError, DateTime};
pub use earth_rotation::earth_rotation_angle;
pub use ellipsoid::{Ellipsoid, Geodetic};
pub use spin::{Rotation, Spin};
pub use surface::{Axes, Local, Surface};

#[cfg(test)]
mod date_tests;
#[cfg(test)]
mod tests;
