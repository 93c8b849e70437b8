//! How expressions are put together.

use super::{codes, read};
use crate::syntax::{Expr, ExprKind, Item, Operator};

/// An expression with every bracket written.
fn bracketed(expr: &Expr) -> String {
    match &expr.kind {
        ExprKind::Number(literal) => {
            let unit = literal.unit.as_ref().map_or(String::new(), |unit| format!(" {}", unit.text));
            format!("{}{unit}", literal.value)
        }
        ExprKind::Path(path) => {
            path.parts.iter().map(|part| part.text.as_str()).collect::<Vec<_>>().join(".")
        }
        ExprKind::Negate(inner) => format!("(-{})", bracketed(inner)),
        ExprKind::Binary { left, operator, right, .. } => {
            let mark = match operator {
                Operator::Add => "+",
                Operator::Subtract => "-",
                Operator::Multiply => "*",
                Operator::Divide => "/",
                Operator::Power => "^",
            };
            format!("({} {mark} {})", bracketed(left), bracketed(right))
        }
        ExprKind::Call { function, arguments } => {
            let arguments: Vec<String> = arguments.iter().map(bracketed).collect();
            format!("{}({})", function.text, arguments.join(", "))
        }
        ExprKind::Peak { quantity, phase } => {
            let phase = phase.as_ref().map_or(String::new(), |phase| format!(" in {}", phase.text));
            format!("<peak {}{phase}>", bracketed(quantity))
        }
        ExprKind::At { quantity, end, phase } => {
            let side = if *end { "end" } else { "start" };
            format!("<{} at {side} of {}>", bracketed(quantity), phase.text)
        }
        ExprKind::Broken => "broken".to_owned(),
    }
}

#[test]
fn operators_bind_as_in_mathematics() {
    for (text, expected) in [
        ("1 + 2 * 3", "(1 + (2 * 3))"),
        ("1 * 2 + 3", "((1 * 2) + 3)"),
        ("1 - 2 - 3", "((1 - 2) - 3)"),
        ("8 / 4 / 2", "((8 / 4) / 2)"),
        ("2 ^ 3 ^ 2", "(2 ^ (3 ^ 2))"),
        ("2 * 3 ^ 2 * 4", "((2 * (3 ^ 2)) * 4)"),
        ("-2 ^ 2", "(-(2 ^ 2))"),
        ("2 ^ -2", "(2 ^ (-2))"),
        ("2 ^ -3 ^ 2", "(2 ^ (-(3 ^ 2)))"),
        ("-a * -b", "((-a) * (-b))"),
        ("--a", "(-(-a))"),
        ("a - -b", "(a - (-b))"),
        ("(1 + 2) * 3", "((1 + 2) * 3)"),
        ("( a )", "a"),
        ("3 m / rate", "(3 m / rate)"),
        ("3 m/s + 4 km/s", "(3 m/s + 4 km/s)"),
        ("1 / 298.25", "(1 / 298.25)"),
        ("2 1/s * t", "(2 1/s * t)"),
        ("5 %", "5 %"),
        ("5kg", "5 kg"),
        ("1e3 m", "1000 m"),
        ("1.5E-3", "0.0015"),
        ("3 W/m^2", "3 W/m^2"),
        ("3 m^-1*kg", "3 m^-1*kg"),
        ("sin(pitch) * max( a, b + c )", "(sin(pitch) * max(a, (b + c)))"),
        ("now()", "now()"),
        ("Earth.air.density", "Earth.air.density"),
        ("peak a.b in Climb + 1", "(<peak a.b in Climb> + 1)"),
        ("peak (a + b) * 2", "(<peak (a + b)> * 2)"),
        ("peak", "peak"),
        ("Sorrel.left at end of Climb - 3 kg", "(<Sorrel.left at end of Climb> - 3 kg)"),
        ("(a - b) at start of Climb", "<(a - b) at start of Climb>"),
        ("-a at end of C ^ 2", "(-(<a at end of C> ^ 2))"),
    ] {
        let parsed = read(&format!("given x {text}\n"));
        assert_eq!(codes(&parsed), [""; 0], "{text}");
        let [Item::Given(given, None)] = parsed.tree.items.as_slice() else { panic!("{text}") };
        assert_eq!(bracketed(&given.value), expected, "{text}");
    }
}
