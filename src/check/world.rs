//! Worlds: gravity, surface, spin and air that go together.

use super::blocks::Bound;
use super::sheet::{Key, Sheet, Stated};
use super::{BlockId, Context, Want};
use crate::diagnostics::codes::inconsistent_world;
use crate::model::{Air, Gravity, Surface, Value, World};
use crate::quantity::Dimension;

const KEYS: &[Key] = &[
    Key::new("gravity", "gravity  central 3.986004418e14 m^3/s^2").words(&["central", "uniform"]),
    Key::new("j2", "j2  1.08262668e-3"),
    Key::new("surface", "surface  flat").words(&["flat"]),
    Key::new("equatorial_radius", "equatorial_radius  6378.137 km"),
    Key::new("flattening", "flattening  1 / 298.257223563"),
    Key::new("spin", "spin  7.292115e-5 rad/s"),
    Key::new("air", "air  standard_1976").words(&["none", "standard_1976", "exponential"]).arguments(&[
        "density",
        "pressure",
        "scale_height",
        "sound_speed",
    ]),
];

impl<'a> Context<'a> {
    /// The checked world, worked out on first use; None where it has errors, which have been reported.
    pub(crate) fn world(&mut self, block: BlockId) -> Option<World> {
        self.once_checked(block, |context| &mut context.worlds, Context::check_world)
    }

    fn check_world(&mut self, block: BlockId) -> Option<World> {
        let sheet = self.sheet(block, KEYS, &[], |_| false);
        let gravity = self.world_gravity(&sheet);
        let surface = self.world_surface(&sheet);
        let spin = match sheet.get("spin") {
            Some(stated) => self.number_of(&stated, &sheet.path("spin"), Dimension::ANGULAR_RATE, "the spin"),
            None => {
                Some(self.default(&sheet.path("spin"), 0.0, "rad/s", Dimension::ANGULAR_RATE, sheet.span))
            }
        };
        let air = self.world_air(&sheet);
        let (gravity, surface) = (gravity?, surface?);
        self.check_consistency(&sheet, &gravity, &surface)?;
        let place = self.place(sheet.span);
        Some(World { name: sheet.name.to_string(), place, gravity, surface, spin: spin?, air: air? })
    }

    fn world_gravity(&mut self, sheet: &Sheet<'a>) -> Option<Gravity> {
        let Some(stated) = sheet.get("gravity") else {
            self.missing(sheet.block, "its gravity", "gravity  uniform 1.62 m/s^2");
            return None;
        };
        let word = self.word_of(&stated, "a kind of gravity")?;
        let path = sheet.path("gravity");
        let j2 = sheet.get("j2");
        if word.text == "uniform" {
            let size = self.number_of(&stated, &path, Dimension::ACCELERATION, "uniform gravity");
            let size = self.bounded(size, Bound::Positive, "uniform gravity")?;
            if let Some(j2) = j2 {
                self.report(inconsistent_world::found(
                    j2.span,
                    "`j2` has a meaning only beside `gravity central`",
                    (stated.span, "the gravity is uniform"),
                ));
                return None;
            }
            return Some(Gravity::Uniform { size });
        }
        let mu =
            self.number_of(&stated, &path, Dimension::GRAVITATIONAL_PARAMETER, "the gravitational parameter");
        let mu = self.bounded(mu, Bound::Positive, "the gravitational parameter");
        let j2 = match j2 {
            Some(stated) => {
                let value = self.number_of(&stated, &sheet.path("j2"), Want::NUMBER, "J2");
                Some(self.bounded(value, Bound::Within(-1.0, 1.0), "J2")?)
            }
            None => None,
        };
        Some(Gravity::Central { mu: mu?, j2 })
    }

    fn world_surface(&mut self, sheet: &Sheet<'a>) -> Option<Surface> {
        let radius = sheet.get("equatorial_radius");
        let flattening = sheet.get("flattening");
        if let Some(stated) = sheet.get("surface") {
            self.word_of(&stated, "a kind of surface")?;
            if let Some(other) = radius.or(flattening) {
                self.report(inconsistent_world::found(
                    other.span,
                    "a flat surface has neither radius nor flattening",
                    (stated.span, "the surface is flat"),
                ));
                return None;
            }
            return Some(Surface::Flat);
        }
        let Some(radius) = radius else {
            self.missing(sheet.block, "its surface", "equatorial_radius  6378.137 km` or `surface  flat");
            return None;
        };
        let what = "the equatorial radius";
        let equatorial_radius =
            self.number_of(&radius, &sheet.path("equatorial_radius"), Dimension::LENGTH, what);
        let equatorial_radius = self.bounded(equatorial_radius, Bound::Positive, what);
        let path = sheet.path("flattening");
        let flattening = match flattening {
            Some(stated) => {
                let value = self.number_of(&stated, &path, Want::NUMBER, "the flattening");
                self.bounded(value, Bound::Within(0.0, 0.5), "the flattening")
            }
            None => Some(self.default(&path, 0.0, "", Dimension::NONE, sheet.span)),
        };
        Some(Surface::Ellipsoid { equatorial_radius: equatorial_radius?, flattening: flattening? })
    }

    fn world_air(&mut self, sheet: &Sheet<'a>) -> Option<Air> {
        let Some(stated) = sheet.get("air") else {
            self.missing(sheet.block, "its air", "air  none");
            return None;
        };
        let word = self.word_of(&stated, "a kind of air")?;
        if word.text == "exponential" {
            let density = self.air_fact(sheet, &stated, "density", "1.2 kg/m^3", Dimension::DENSITY);
            let pressure = self.air_fact(sheet, &stated, "pressure", "101 kPa", Dimension::PRESSURE);
            let scale_height = self.air_fact(sheet, &stated, "scale_height", "8 km", Dimension::LENGTH);
            let sound_speed = self.air_fact(sheet, &stated, "sound_speed", "340 m/s", Dimension::SPEED);
            return Some(Air::Exponential {
                density: density?,
                pressure: pressure?,
                scale_height: scale_height?,
                sound_speed: sound_speed?,
            });
        }
        if let Some(argument) = stated.setting.arguments.first() {
            self.report(inconsistent_world::found(
                argument.name.span,
                &format!("`{}` belongs to `air exponential`", argument.name.text),
                (word.span, "this air has no such fact"),
            ));
            return None;
        }
        Some(if word.text == "none" { Air::None } else { Air::Standard1976 })
    }

    fn air_fact(
        &mut self,
        sheet: &Sheet<'a>,
        stated: &Stated<'a>,
        name: &str,
        example: &str,
        dimension: Dimension,
    ) -> Option<Value> {
        let what = format!("the {} of the air", name.replace('_', " "));
        let Some(argument) = stated.argument(name) else {
            self.missing(sheet.block, &what, &format!("air  exponential … {name} {example}"));
            return None;
        };
        let path = sheet.path(&format!("air.{name}"));
        let value = self.fact(stated.scope, &path, &argument.value, dimension, &what, stated.because);
        self.bounded(value, Bound::Positive, &what)
    }

    /// Flat ground goes with uniform gravity, a round body with central gravity.
    fn check_consistency(&mut self, sheet: &Sheet<'a>, gravity: &Gravity, surface: &Surface) -> Option<()> {
        let (message, label) = match (gravity, surface) {
            (Gravity::Central { .. }, Surface::Flat) => (
                "a flat surface needs uniform gravity",
                "central gravity has a centre, which a flat world lacks",
            ),
            (Gravity::Uniform { .. }, Surface::Ellipsoid { .. }) => {
                ("a round body needs central gravity", "uniform gravity belongs to a flat world")
            }
            _ => return Some(()),
        };
        let surface = sheet.get("surface").or_else(|| sheet.get("equatorial_radius"))?;
        let gravity = sheet.get("gravity")?;
        self.report(inconsistent_world::found(surface.span, message, (gravity.span, label)));
        None
    }
}
