//! Arguments in, exit status out.

use std::process::ExitCode;

fn main() -> ExitCode {
    stagewright::cli::run(std::env::args_os())
}
