//! What can be written on the command line.

use std::path::PathBuf;

use clap::{Args, Parser, Subcommand, ValueEnum};

/// Compile a rocket mission's text, fly it, and report its performance.
#[derive(Debug, Parser)]
#[command(name = "stagewright", version, after_help = AFTER)]
pub struct Arguments {
    #[command(subcommand)]
    pub command: Command,
}

const AFTER: &str = "Exit status: 0 all well; 1 a demand is unmet, an aim is missed or a verified report is \
    stale; 2 wrong usage or a file that cannot be read or written; 3 the source has errors; 4 a flight could \
    not be completed.\n\nA performance estimate, not a flight-safety analysis.";

#[derive(Debug, Subcommand)]
pub enum Command {
    /// Print diagnostics only
    Check(CheckCommand),
    /// Fly missions; print their ledger and timeline
    Fly(FlyCommand),
    /// Write the performance report, with its plots beside it
    Report(ReportCommand),
    /// Print the checked model as JSON
    Model(ModelCommand),
    /// Say what a diagnostic code means, with an example and its mend
    Explain(ExplainCommand),
    /// Print the definitions that `bring … from builtin` offers
    Builtin,
    /// Print a completion script for a shell
    Completions(CompletionsCommand),
    /// Write manual pages into a folder
    Manpages(ManpagesCommand),
}

/// How diagnostics are printed.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, ValueEnum)]
pub enum Format {
    /// For people
    #[default]
    Text,
    /// One JSON object a line
    Json,
}

/// The files to compile and the form of what is said about them.
#[derive(Debug, Args)]
pub struct Inputs {
    /// Source files (.wright)
    #[arg(required = true, value_name = "FILE")]
    pub files: Vec<PathBuf>,
    /// Form of the diagnostics
    #[arg(long, value_enum, default_value_t)]
    pub format: Format,
}

/// How to fly.
#[derive(Debug, Args)]
pub struct Flying {
    /// Relative tolerance of the integration
    #[arg(long, default_value_t = 1e-9, value_name = "NUMBER", value_parser = tolerance)]
    pub tolerance: f64,
    /// Frame of the ledger; otherwise body-fixed from the ground and inertial from an orbit
    #[arg(long, value_enum, value_name = "FRAME")]
    pub ledger: Option<LedgerFrame>,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, ValueEnum)]
pub enum LedgerFrame {
    BodyFixed,
    Inertial,
}

/// The units that a report is written in.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, ValueEnum)]
pub enum Units {
    /// Each number in the unit that its author wrote
    #[default]
    Written,
    Si,
    /// US customary
    Us,
}

#[derive(Debug, Args)]
pub struct CheckCommand {
    #[command(flatten)]
    pub inputs: Inputs,
}

#[derive(Debug, Args)]
pub struct FlyCommand {
    #[command(flatten)]
    pub inputs: Inputs,
    #[command(flatten)]
    pub flying: Flying,
    /// Write the flight's states to this file, as comma-separated values
    #[arg(long, value_name = "CSV")]
    pub trajectory: Option<PathBuf>,
}

#[derive(Debug, Args)]
pub struct ReportCommand {
    #[command(flatten)]
    pub inputs: Inputs,
    #[command(flatten)]
    pub flying: Flying,
    /// Folder to write to; otherwise `NAME.report` beside the source
    #[arg(long, value_name = "FOLDER")]
    pub out: Option<PathBuf>,
    /// Write nothing; fail where the written report is not what the source gives now
    #[arg(long)]
    pub verify: bool,
    /// Units of the report
    #[arg(long, value_enum, default_value_t)]
    pub units: Units,
}

#[derive(Debug, Args)]
pub struct ModelCommand {
    /// Source files (.wright)
    #[arg(required_unless_present = "schema", value_name = "FILE")]
    pub files: Vec<PathBuf>,
    /// Form of the diagnostics
    #[arg(long, value_enum, default_value_t)]
    pub format: Format,
    /// Print a JSON Schema instead
    #[arg(long, value_enum, value_name = "OF")]
    pub schema: Option<Schema>,
}

/// What has a JSON Schema.
#[derive(Clone, Copy, Debug, PartialEq, Eq, ValueEnum)]
pub enum Schema {
    Model,
    Report,
    Diagnostic,
}

#[derive(Debug, Args)]
pub struct ExplainCommand {
    /// A code such as `unknown-name`; without one, all codes are listed
    pub code: Option<String>,
}

#[derive(Debug, Args)]
pub struct CompletionsCommand {
    #[arg(value_enum)]
    pub shell: clap_complete::Shell,
}

#[derive(Debug, Args)]
pub struct ManpagesCommand {
    /// Folder to write to
    pub folder: PathBuf,
}

fn tolerance(text: &str) -> Result<f64, String> {
    match text.parse::<f64>() {
        Ok(value) if (1e-14..=1e-3).contains(&value) => Ok(value),
        Ok(_) => Err("give a tolerance between 1e-14 and 1e-3".to_owned()),
        Err(error) => Err(error.to_string()),
    }
}
