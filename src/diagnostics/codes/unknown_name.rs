//! `unknown-name`: a name that nothing defines.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unknown-name",
    severity: Severity::Error,
    title: "a name that nothing in reach defines",
    explanation: "Every name has to be defined in the same file, or brought from another file or from \
        `builtin` with `bring`. Names are case-sensitive. The nearest defined name is offered where one is close.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n    exit_area  0.05 m^2\n}\n\
        stage Bracken {\n    engines  1 of Embr\n    dry  100 kg\n    propellant  900 kg\n}\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n    exit_area  0.05 m^2\n}\n\
        stage Bracken {\n    engines  1 of Ember\n    dry  100 kg\n    propellant  900 kg\n}\n",
};

/// `kind` says what was looked for ("an engine", "a flight quantity"); `nearest` is a defined name
/// of that kind that is close to it.
pub fn found(span: Span, kind: &str, name: &str, nearest: Option<(&str, Option<Span>)>) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("`{name}` is not the name of {kind} here"), "nothing defines this name");
    match nearest {
        Some((near, Some(defined))) => {
            diagnostic.and(defined, format!("`{near}` is defined here")).help(format!("did you mean `{near}`?"))
        }
        Some((near, None)) => diagnostic.help(format!("did you mean `{near}`?")),
        None => diagnostic.help("define it in this file, or bring it: `bring Name from \"file.wright\"`"),
    }
}
