//! A small SVG writer: concrete light colours as attributes, dark ones by one media query.

use std::fmt::Write;

use crate::report::inert::is_harmful;

/// What something is painted as: its light colour, and its dark one.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Paint {
    Paper,
    Ink,
    Faint,
    Grid,
    Band,
    /// Series, told apart by people who see few colours too: dark blue, ochre, teal.
    First,
    Second,
    Third,
}

impl Paint {
    const ALL: [Paint; 8] = [
        Paint::Paper,
        Paint::Ink,
        Paint::Faint,
        Paint::Grid,
        Paint::Band,
        Paint::First,
        Paint::Second,
        Paint::Third,
    ];

    /// Name of the class, light colour, dark colour.
    fn of(self) -> (&'static str, &'static str, &'static str) {
        match self {
            Paint::Paper => ("p", "#fdfcf9", "#16191d"),
            Paint::Ink => ("i", "#22262b", "#e4e2da"),
            Paint::Faint => ("f", "#5c626a", "#a3a7ad"),
            Paint::Grid => ("g", "#dad7cd", "#383d44"),
            Paint::Band => ("b", "#f2efe6", "#1f242a"),
            Paint::First => ("s1", "#1d4e89", "#7fb2e8"),
            Paint::Second => ("s2", "#b35c00", "#f0a04b"),
            Paint::Third => ("s3", "#12756a", "#5cc9b7"),
        }
    }
}

/// Where a text is anchored.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Anchor {
    Start,
    Middle,
    End,
}

/// A picture being drawn.
pub struct Svg {
    body: String,
    width: f64,
    height: f64,
    title: String,
    description: String,
}

impl Svg {
    pub fn new(width: f64, height: f64, title: &str, description: &str) -> Self {
        let mut svg = Svg {
            body: String::new(),
            width,
            height,
            title: title.to_owned(),
            description: description.to_owned(),
        };
        svg.rect((0.0, 0.0), (width, height), Paint::Paper);
        svg
    }

    pub fn rect(&mut self, (x, y): (f64, f64), (width, height): (f64, f64), paint: Paint) {
        let (class, light, _) = paint.of();
        self.put(format_args!(
            "<rect class=\"{class}\" x=\"{}\" y=\"{}\" width=\"{}\" height=\"{}\" fill=\"{light}\"/>",
            tenths(x),
            tenths(y),
            tenths(width),
            tenths(height)
        ));
    }

    pub fn line(&mut self, (x1, y1): (f64, f64), (x2, y2): (f64, f64), paint: Paint, width: f64) {
        let (class, light, _) = paint.of();
        self.put(format_args!(
            "<path class=\"{class}l\" d=\"M{} {}L{} {}\" stroke=\"{light}\" stroke-width=\"{}\" fill=\"none\"/>",
            tenths(x1),
            tenths(y1),
            tenths(x2),
            tenths(y2),
            tenths(width)
        ));
    }

    /// A line through points; `dashed` for the second of two series.
    pub fn trace(&mut self, points: &[(f64, f64)], paint: Paint, dashed: bool) {
        if points.len() < 2 {
            return;
        }
        let (class, light, _) = paint.of();
        let mut path = String::new();
        for (index, (x, y)) in points.iter().enumerate() {
            // Writing into a string cannot fail.
            let _ = write!(path, "{}{} {}", if index == 0 { 'M' } else { 'L' }, tenths(*x), tenths(*y));
        }
        let dash = if dashed { " stroke-dasharray=\"6 3\"" } else { "" };
        self.put(format_args!(
            "<path class=\"{class}l\" d=\"{path}\" stroke=\"{light}\" stroke-width=\"1.8\" fill=\"none\" \
             stroke-linejoin=\"round\"{dash}/>"
        ));
    }

    pub fn dot(&mut self, (x, y): (f64, f64), paint: Paint) {
        let (class, light, _) = paint.of();
        self.put(format_args!(
            "<circle class=\"{class}\" cx=\"{}\" cy=\"{}\" r=\"3.2\" fill=\"{light}\"/>",
            tenths(x),
            tenths(y)
        ));
    }

    pub fn text(&mut self, (x, y): (f64, f64), anchor: Anchor, paint: Paint, size: u32, text: &str) {
        let (class, light, _) = paint.of();
        let anchor = match anchor {
            Anchor::Start => "start",
            Anchor::Middle => "middle",
            Anchor::End => "end",
        };
        self.put(format_args!(
            "<text class=\"{class}\" x=\"{}\" y=\"{}\" text-anchor=\"{anchor}\" font-size=\"{size}\" fill=\"{light}\">{}</text>",
            tenths(x),
            tenths(y),
            escape(text)
        ));
    }

    fn put(&mut self, element: std::fmt::Arguments) {
        // Writing into a string cannot fail.
        let _ = writeln!(self.body, "{element}");
    }

    pub fn finish(self) -> String {
        let mut dark = String::new();
        for paint in Paint::ALL {
            let (class, _, colour) = paint.of();
            let _ = write!(dark, ".{class}{{fill:{colour}}}.{class}l{{stroke:{colour}}}");
        }
        let (width, height) = (tenths(self.width), tenths(self.height));
        format!(
            "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {width} {height}\" width=\"{width}\" \
             height=\"{height}\" role=\"img\" font-family=\"sans-serif\">\n<title>{}</title>\n<desc>{}</desc>\n\
             <style>@media (prefers-color-scheme: dark){{{dark}}}</style>\n{}</svg>\n",
            escape(&self.title),
            escape(&self.description),
            self.body
        )
    }
}

/// A length in tenths, without a fraction that says nothing.
fn tenths(value: f64) -> String {
    let tenths = (value * 10.0).round() as i64;
    match tenths % 10 {
        0 => (tenths / 10).to_string(),
        rest => format!("{}{}.{}", if tenths < 0 { "-" } else { "" }, tenths.abs() / 10, rest.abs()),
    }
}

/// Text as XML content, with what no XML may hold replaced.
fn escape(text: &str) -> String {
    let mut safe = String::with_capacity(text.len());
    for c in text.chars() {
        match c {
            '&' => safe.push_str("&amp;"),
            '<' => safe.push_str("&lt;"),
            '>' => safe.push_str("&gt;"),
            '"' => safe.push_str("&quot;"),
            _ if is_harmful(c) || matches!(c, '\u{fffe}' | '\u{ffff}') => safe.push('\u{fffd}'),
            _ => safe.push(c),
        }
    }
    safe
}
