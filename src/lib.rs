//! Stagewright: a declarative language for the performance of rocket-propelled vehicles, and its
//! compiler.
//!
//! The pipeline, each stage with types of its own:
//!
//! 1. [`source`]: files, places in them, lines;
//! 2. [`syntax`]: text → [`syntax::Tree`]; it never fails, and broken parts stay in the tree;
//! 3. [`check`]: trees → [`model::Model`], the only maker of one; every fault of every file at once;
//! 4. [`flight`]: a mission of the model → [`flight::Flight`], in the force environments of [`world`];
//! 5. [`report`]: a flight → [`report::Report`], and from it Markdown, JSON and pictures;
//! 6. [`cli`]: files in, files and exit statuses out.
//!
//! Beside it stand [`quantity`] (dimensions and units), [`diagnostics`] (what the compiler says, one
//! file for each code) and [`math`] (elementary functions with the same bits everywhere).
//!
//! ```
//! use stagewright::{check, flight};
//!
//! struct Page(&'static str);
//!
//! impl check::Reader for Page {
//!     fn read(&self, _: &str) -> Result<Vec<u8>, check::ReadError> {
//!         Ok(self.0.as_bytes().to_vec())
//!     }
//! }
//!
//! let page = Page(
//!     "world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
//!      engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
//!      stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
//!      vehicle Heron { stack Sedge; drag none }
//!      mission Hop {
//!          flies Heron
//!          within Slate
//!          start pad altitude 0 m
//!          payload 100 kg
//!          phase Up { burn Sedge; steer upright; until 6 s }
//!          demand height at end of Up >= 100 m
//!      }",
//! );
//! let compiled = check::compile("hop.wright", &page);
//! assert!(compiled.diagnostics.is_empty());
//! let model = compiled.model.unwrap();
//! let flight = flight::fly(&model.missions[0], &flight::Settings::default());
//! assert!(flight.demands[0].met);
//! ```

pub mod check;
pub mod cli;
pub mod diagnostics;
pub mod flight;
pub mod math;
pub mod model;
pub mod quantity;
pub mod report;
pub mod source;
pub mod syntax;
pub mod world;
