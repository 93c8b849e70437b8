//! `explain`: what a diagnostic code means.

use super::arguments::ExplainCommand;
use super::{Status, output};
use crate::diagnostics;

pub fn run(command: &ExplainCommand) -> Status {
    let Some(name) = &command.code else {
        return output::print(&diagnostics::explain_index());
    };
    match diagnostics::codes::find(name) {
        Some(code) => output::print(&diagnostics::explain(code)),
        None => {
            let names = diagnostics::codes::ALL.iter().map(|code| code.name);
            let hint = diagnostics::nearest(name, names)
                .map_or_else(String::new, |near| format!("; did you mean `{near}`?"));
            output::complain(&format!(
                "no diagnostic has the code `{name}`{hint} (`stagewright explain` lists all)"
            ))
        }
    }
}
