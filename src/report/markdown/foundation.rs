//! What the numbers rest on, and what to be wary of.

use super::table::{Table, code, plain};
use crate::report::content::{Fact, Report};

pub fn assumptions(report: &Report) -> String {
    let listed = &report.assumptions;
    let mut text = String::from("## Assumptions\n");
    let mut list = |title: String, facts: &[Fact], reasons: bool| {
        if facts.is_empty() {
            return;
        }
        let mut table = Table::new(
            if reasons { &["fact", "value", "because", "place"] } else { &["fact", "value", "place"] },
            &[],
        );
        for fact in facts {
            let mut cells = vec![code(&fact.path), code(&fact.written)];
            if reasons {
                cells.push(fact.because.as_deref().map_or_else(String::new, plain));
            }
            cells.push(code(&fact.place));
            table.row(cells);
        }
        text.push_str(&format!("\n### {title}\n\n{}", table.render()));
    };
    list(format!("Facts with a reason ({})", listed.reasoned.len()), &listed.reasoned, true);
    list(format!("Facts without a reason ({})", listed.unreasoned.len()), &listed.unreasoned, false);
    list(format!("Defaults, which nobody wrote ({})", listed.defaults.len()), &listed.defaults, false);
    text.push_str("\n### Conventions in force\n\n");
    for convention in &listed.conventions {
        text.push_str(&format!("- {}\n", plain(convention)));
    }
    text
}

pub fn warnings(report: &Report) -> String {
    if report.warnings.is_empty() {
        return "## Warnings\n\nNone.\n".to_owned();
    }
    let lines: Vec<String> =
        report.warnings.iter().map(|warning| format!("- {}\n", plain(warning))).collect();
    format!("## Warnings\n\n{}", lines.concat())
}

pub fn caution(report: &Report) -> String {
    format!("## Caution\n\n{}\n", report.caution)
}
