//! The syntax tree: what the text says, with the place of every part and every comment.
//!
//! Nothing here is checked. A [`Item::Broken`] or [`Statement::Broken`] has already been reported,
//! and later stages stay silent about it.

use crate::source::Span;

/// One file.
#[derive(Clone, Debug, Default)]
pub struct Tree {
    pub items: Vec<Item>,
    /// All comments of the file, in order of the text, blocks and expressions included.
    pub comments: Vec<Comment>,
}

/// `# …` up to the end of its line; the span includes the `#`.
#[derive(Clone, Debug)]
pub struct Comment {
    pub span: Span,
}

/// What can stand outside every block.
#[derive(Clone, Debug)]
pub enum Item {
    Bring(Bring),
    /// `unit smoot = 1.7018 m`
    Unit(UnitDefinition),
    /// `given lean 0.36 deg`
    Given(Given, Option<Because>),
    Block(Block),
    Broken(Span),
}

/// `bring Earth, Moon from builtin` or `bring Ember from "engines/ember.wright"`.
#[derive(Clone, Debug)]
pub struct Bring {
    pub span: Span,
    pub names: Vec<Name>,
    pub from: BringFrom,
}

#[derive(Clone, Debug)]
pub enum BringFrom {
    Builtin(Span),
    File(Quoted),
}

#[derive(Clone, Debug)]
pub struct UnitDefinition {
    pub span: Span,
    pub name: Name,
    pub value: Expr,
    pub because: Option<Because>,
}

#[derive(Clone, Debug)]
pub struct Given {
    pub name: Name,
    pub value: Expr,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum BlockKind {
    World,
    Engine,
    Curve,
    Stage,
    Vehicle,
    Mission,
    Phase,
}

/// `engine EmberV like Ember { … }`
#[derive(Clone, Debug)]
pub struct Block {
    /// From the keyword to the closing brace.
    pub span: Span,
    pub kind: BlockKind,
    pub name: Name,
    pub like: Option<Name>,
    pub was: Option<Name>,
    pub lines: Vec<Line>,
}

/// One fact of a block, with its reason.
#[derive(Clone, Debug)]
pub struct Line {
    /// From the first to the last character of the fact, `because` included.
    pub span: Span,
    pub statement: Statement,
    pub because: Option<Because>,
}

/// `because "…"`
#[derive(Clone, Debug)]
pub struct Because {
    pub span: Span,
    pub text: Quoted,
}

/// The facts of blocks. The grammar accepts any of them in any block; the checker says which belong.
#[derive(Clone, Debug)]
pub enum Statement {
    /// A fact of the common shape: `thrust 43.0 kN in vacuum`, `dry 1420 kg growth 8 %`.
    Setting(Setting),
    /// `given lean 0.36 deg`
    Given(Given),
    /// `engines 7 of Ember`
    Engines {
        count: Expr,
        engine: Name,
    },
    /// `stack Bracken, Sorrel`
    Stack(Vec<Name>),
    /// `beside Bracken  Alder1 2 of Alder`
    Beside {
        carrier: Name,
        group: Name,
        count: Expr,
        stage: Name,
    },
    /// `shroud Calyx 74 kg`
    Shroud {
        name: Name,
        mass: Expr,
    },
    /// `start pad latitude 58.2 deg …`; the words and their values in order.
    Start {
        kind: StartKind,
        kind_span: Span,
        arguments: Vec<Argument>,
    },
    /// `phase Rise { … }` in a mission, `push` and the like later.
    Block(Block),
    /// `burn Bracken with 6 of 7 engines, Alder1` in a phase.
    Burn(Vec<Burn>),
    /// `light Alder2 at 18 s`: the time counts from the start of the phase.
    Light {
        part: Name,
        at: Expr,
        hot: bool,
    },
    /// `coast`
    Coast,
    Steer(Steer),
    /// `hold acceleration <= 5.5 g0 by throttle`
    Hold {
        quantity: Expr,
        limit: Expr,
    },
    /// `until A or B`
    Until(Vec<Condition>),
    /// `shed Calyx when heating <= 1135 W/m^2`
    Shed {
        part: Name,
        when: Option<Condition>,
    },
    /// `knob Sorrel.propellant between 2 t and 4 t`
    Knob {
        path: Path,
        low: Expr,
        high: Expr,
    },
    /// `aim radius at end of Climb = 6878.137 km within 1 km`
    Aim {
        quantity: Expr,
        target: Expr,
        within: Expr,
    },
    /// `most payload`, `least Spare`
    Objective {
        most: bool,
        quantity: Expr,
    },
    /// `demand MaxQ peak dynamic_pressure <= 32 kPa`
    Demand {
        name: Option<Name>,
        quantity: Expr,
        requirement: Requirement,
    },
    /// `figure Spare = Sorrel.left at end of Climb`
    Figure {
        name: Name,
        value: Expr,
    },
    /// `headline payload`
    Headline(Path),
    /// The header of a curve: `time [s] -> thrust [kN]`
    Header {
        inputs: Vec<Column>,
        output: Column,
    },
    /// A row of a curve.
    Row(Vec<Literal>),
    /// `from "tail.csv"` in a curve.
    From(Quoted),
    Broken,
}

/// A fact that starts with its key: `key [word] [value [.. upto]] [in vacuum] [name value]…`.
///
/// `gravity central 3.9e14 m^3/s^2` has the word `central`; in `air none` and `drag RowanDrag` the
/// value is a plain path, which the checker reads as a word or a name where it expects one.
#[derive(Clone, Debug)]
pub struct Setting {
    pub key: Name,
    /// A bare word directly before a value.
    pub word: Option<Name>,
    pub value: Option<Operand>,
    /// The end of a range: `throttle 55 % .. 100 %`.
    pub upto: Option<Expr>,
    /// `in vacuum` or `at sea_level`
    pub ambient: Option<(Ambient, Span)>,
    /// `growth 8 %`, `unusable 0.7 %`, `scale_height 8 km`
    pub arguments: Vec<Argument>,
}

/// The value of a setting.
#[derive(Clone, Debug)]
pub enum Operand {
    Expr(Expr),
    /// `2027-05-14T09:30:00Z`, as written.
    Instant(Span),
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Ambient {
    Vacuum,
    SeaLevel,
}

/// A named value within a fact.
#[derive(Clone, Debug)]
pub struct Argument {
    pub name: Name,
    pub value: Expr,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum StartKind {
    Pad,
    Orbit,
    /// `start state x … y … z … vx … vy … vz …`, inertial, from the body's centre (or on flat ground
    /// east, north, up from the origin).
    State,
}

/// One stage or strap-on group that a phase burns.
#[derive(Clone, Debug)]
pub struct Burn {
    pub part: Name,
    /// `with 6 of 7 engines`
    pub engines: Option<(Expr, Expr)>,
    /// `hot`: lit while what is below is still attached.
    pub hot: bool,
}

/// The attitude law of a phase.
#[derive(Clone, Debug)]
#[allow(clippy::large_enum_variant, reason = "a phase has one, and a box would make every use longer")]
pub enum Steer {
    Upright,
    /// `into airflow`
    IntoAirflow,
    /// `from airflow`
    FromAirflow,
    /// `along motion`, `against motion`, with `over ground`
    Motion {
        against: bool,
        over_ground: bool,
    },
    Keep,
    /// `pitch … heading … [frozen]`, `tangent a, b heading … [frozen]`
    Pitch {
        law: PitchLaw,
        heading: Expr,
        frozen: bool,
    },
}

#[derive(Clone, Debug)]
pub enum PitchLaw {
    /// `pitch P`
    Fixed(Expr),
    /// `pitch from P at R`: P + R·t
    Rate { from: Expr, rate: Expr },
    /// `pitch from P by D over T`: P + D·t/T, then held
    Over { from: Expr, by: Expr, over: Expr },
    /// `tangent a, b`: tan(pitch) = a + b·t
    Tangent { a: Expr, b: Expr },
}

/// What ends a phase or lets go of something.
#[derive(Clone, Debug)]
pub struct Condition {
    pub span: Span,
    pub kind: ConditionKind,
}

#[derive(Clone, Debug)]
pub enum ConditionKind {
    /// `until 6 s`
    After(Expr),
    /// `height >= 140 m`
    Compare {
        quantity: Expr,
        comparison: Comparison,
        limit: Expr,
    },
    /// `Bracken spent`
    Spent(Name),
    Apex,
    Touchdown,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Comparison {
    AtLeast,
    AtMost,
    RisesTo,
    FallsTo,
}

/// The right-hand side of a demand.
#[derive(Clone, Debug)]
pub enum Requirement {
    AtLeast(Expr),
    AtMost(Expr),
    Between(Expr, Expr),
    /// `= 97.4 deg within 0.01 deg`
    Within {
        target: Expr,
        tolerance: Expr,
    },
}

/// `mach`, `time [s]`
#[derive(Clone, Debug)]
pub struct Column {
    pub name: Name,
    pub unit: Option<UnitText>,
}

#[derive(Clone, Debug)]
pub struct Expr {
    pub span: Span,
    pub kind: ExprKind,
}

#[derive(Clone, Debug)]
pub enum ExprKind {
    Number(Literal),
    /// `lean`, `Sorrel.left`, `dynamic_pressure`
    Path(Path),
    Negate(Box<Expr>),
    Binary {
        left: Box<Expr>,
        operator: Operator,
        operator_span: Span,
        right: Box<Expr>,
    },
    /// `sin(pitch)`
    Call {
        function: Name,
        arguments: Vec<Expr>,
    },
    /// `peak dynamic_pressure`, `peak acceleration in Climb`
    Peak {
        quantity: Box<Expr>,
        phase: Option<Name>,
    },
    /// `Sorrel.left at end of Climb`
    At {
        quantity: Box<Expr>,
        end: bool,
        phase: Name,
    },
    /// Already reported.
    Broken,
}

/// A number as written, with its unit.
#[derive(Clone, Debug)]
pub struct Literal {
    pub span: Span,
    pub value: f64,
    /// The digits as written, sign included for the rows of a curve.
    pub digits: Span,
    pub unit: Option<UnitText>,
}

/// A unit as written after a number or in a curve's header, such as `W/m^2`.
#[derive(Clone, Debug)]
pub struct UnitText {
    pub span: Span,
    pub text: String,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Operator {
    Add,
    Subtract,
    Multiply,
    Divide,
    Power,
}

/// A dotted name.
#[derive(Clone, Debug)]
pub struct Path {
    pub span: Span,
    pub parts: Vec<Name>,
}

#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Name {
    pub span: Span,
    pub text: String,
}

/// A quoted text, without its quotes and with its escapes resolved.
#[derive(Clone, Debug)]
pub struct Quoted {
    pub span: Span,
    pub text: String,
}
