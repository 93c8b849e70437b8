//! Vehicles: stages in a stack, strap-ons beside them, a shroud, and the drag of it all.

use super::blocks::Bound;
use super::sheet::{Key, Sheet, Stated};
use super::{BlockId, Context, Inherited, Want};
use crate::diagnostics::codes::{duplicate_name, impossible_value, missing_fact, unfit_curve, unknown_name};
use crate::model::{Air, Curve, Drag, Part, Role, Value, Vehicle};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{BlockKind, Expr, Name, Statement};

const KEYS: &[Key] = &[
    Key::new("reference_area", "reference_area  1.13 m^2"),
    Key::new("drag", "drag  RowanDrag").words(&["none"]),
];

/// The statements of a vehicle that are not settings.
#[derive(Default)]
struct Assembly<'a> {
    stack: Option<(&'a [Name], Inherited<'a>)>,
    beside: Vec<Beside<'a>>,
    shroud: Option<(&'a Name, &'a Expr, Inherited<'a>)>,
}

struct Beside<'a> {
    carrier: &'a Name,
    group: &'a Name,
    count: &'a Expr,
    stage: &'a Name,
    line: Inherited<'a>,
}

impl<'a> Context<'a> {
    /// The checked vehicle, worked out on first use; None where it has errors, which have been reported.
    pub(crate) fn vehicle(&mut self, block: BlockId) -> Option<Vehicle> {
        self.once_checked(block, |context| &mut context.vehicles, Context::check_vehicle)
    }

    fn check_vehicle(&mut self, block: BlockId) -> Option<Vehicle> {
        let mut assembly = Assembly::default();
        let sheet = self.sheet(block, KEYS, &["stack", "beside", "shroud"], |line| {
            match &line.line.statement {
                Statement::Stack(names) => assembly.stack = Some((names, line)),
                Statement::Beside { carrier, group, count, stage } => {
                    assembly.beside.push(Beside { carrier, group, count, stage, line });
                }
                Statement::Shroud { name, mass } => assembly.shroud = Some((name, mass, line)),
                _ => return false,
            }
            true
        });
        let drag = self.drag(&sheet);
        let parts = self.parts(&sheet, &assembly);
        let place = self.place(sheet.span);
        Some(Vehicle { name: sheet.name.to_string(), place, parts: parts?, drag: drag? })
    }

    /// The parts in order; None if any of them has errors.
    fn parts(&mut self, sheet: &Sheet<'a>, assembly: &Assembly<'a>) -> Option<Vec<Part>> {
        let Some((stack, stack_line)) = assembly.stack else {
            self.missing(sheet.block, "its stages, bottom first", "stack  Bracken, Sorrel");
            return None;
        };
        self.check_part_names(stack, assembly);
        let mut parts = Vec::new();
        for (position, name) in stack.iter().enumerate() {
            let count = self.derived(
                &format!("{}.count", sheet.path(&name.text)),
                1.0,
                "",
                Dimension::NONE,
                name.span,
            );
            let role = Role::Stack { position: position as u32 };
            parts.push(self.stage_part(stack_line, name, name, role, Some(count)));
        }
        for beside in &assembly.beside {
            let path = format!("{}.count", sheet.path(&beside.group.text));
            let because = beside.line.line.because.as_ref();
            let what = "the number of strap-ons";
            let count = self.fact(beside.line.scope, &path, beside.count, Want::NUMBER, what, because);
            let count = self.bounded(count, Bound::WholeFrom(1.0), what);
            let carrier = stack.iter().position(|name| name.text == beside.carrier.text);
            if carrier.is_none() {
                let near = self
                    .nearest(&beside.carrier.text, |_| stack.iter().map(|name| name.text.as_str()).collect());
                let near = near.map(|near| (near, None));
                let kind = "a stage of the stack";
                self.report(unknown_name::found(beside.carrier.span, kind, &beside.carrier.text, near));
            }
            let role = carrier.map(|carrier| Role::Beside { carrier: carrier as u32 });
            let part =
                role.and_then(|role| self.stage_part(beside.line, beside.group, beside.stage, role, count));
            parts.push(part);
        }
        if let Some((name, mass, line)) = assembly.shroud {
            parts.push(self.shroud(sheet, name, mass, line));
        }
        parts.into_iter().collect()
    }

    fn stage_part(
        &mut self,
        line: Inherited<'a>,
        name: &Name,
        stage: &Name,
        role: Role,
        count: Option<Value>,
    ) -> Option<Part> {
        let block = self.find_block(line.scope, BlockKind::Stage, stage)?;
        let facts = self.stage(block)?;
        let definition = self.definition(block).block.name.text.clone();
        let place = self.place(name.span);
        Some(Part {
            name: name.text.clone(),
            definition,
            place,
            role,
            count: count?,
            dry: facts.dry,
            growth: facts.growth,
            propulsion: facts.propulsion,
        })
    }

    fn shroud(
        &mut self,
        sheet: &Sheet<'a>,
        name: &Name,
        mass: &'a Expr,
        line: Inherited<'a>,
    ) -> Option<Part> {
        let because = line.line.because.as_ref();
        let what = "the mass of the shroud";
        let dry = self.fact(line.scope, &format!("{}.dry", name.text), mass, Dimension::MASS, what, because);
        let dry = self.bounded(dry, Bound::NotNegative, what)?;
        let count =
            self.derived(&format!("{}.count", sheet.path(&name.text)), 1.0, "", Dimension::NONE, name.span);
        let growth = self.default(&format!("{}.growth", name.text), 0.0, "%", Dimension::NONE, name.span);
        let place = self.place(name.span);
        let text = name.text.clone();
        Some(Part {
            name: text.clone(),
            definition: text,
            place,
            role: Role::Shroud,
            count,
            dry,
            growth,
            propulsion: None,
        })
    }

    /// Each part has a name of its own, by which phases burn and shed it.
    fn check_part_names(&mut self, stack: &[Name], assembly: &Assembly<'a>) {
        let groups = assembly.beside.iter().map(|beside| beside.group);
        let shroud = assembly.shroud.map(|(name, _, _)| name);
        let mut first: std::collections::BTreeMap<&str, Span> = std::collections::BTreeMap::new();
        for name in stack.iter().chain(groups).chain(shroud) {
            match first.get(name.text.as_str()) {
                Some(before) => {
                    self.report(duplicate_name::part(name.span, &name.text, *before));
                }
                None => {
                    first.insert(&name.text, name.span);
                }
            }
        }
    }

    fn drag(&mut self, sheet: &Sheet<'a>) -> Option<Drag> {
        let area = match sheet.get("reference_area") {
            Some(stated) => {
                let what = "the reference area";
                let area = self.number_of(&stated, &sheet.path("reference_area"), Dimension::AREA, what);
                Some(self.bounded(area, Bound::Positive, what)?)
            }
            None => None,
        };
        let Some(stated) = sheet.get("drag") else {
            self.without_drag.insert(sheet.block);
            return Some(Drag::None);
        };
        let name = stated.name().filter(|name| self.find_given(stated.scope, &name.text).is_none());
        if name.is_some_and(|name| name.text == "none") {
            return Some(Drag::None);
        }
        if area.is_none() {
            self.report(missing_fact::beside(
                stated.span,
                "the reference area of the drag",
                "reference_area  1.13 m^2",
            ));
        }
        match name {
            Some(name) => {
                let curve = self
                    .find_block(stated.scope, BlockKind::Curve, name)
                    .and_then(|curve| self.curve(curve))?;
                self.check_drag_curve(&stated, &curve)?;
                Some(Drag::Curve { curve, reference_area: area? })
            }
            None => {
                let what = "the drag coefficient";
                let coefficient = self.number_of(&stated, &sheet.path("drag"), Want::NUMBER, what);
                let coefficient = self.bounded(coefficient, Bound::NotNegative, what)?;
                Some(Drag::Steady { coefficient, reference_area: area? })
            }
        }
    }

    /// Over `mach`, or over `mach` first and one of altitude and angle of attack; the coefficient is a
    /// pure number, nowhere below zero.
    fn check_drag_curve(&mut self, stated: &Stated<'a>, curve: &Curve) -> Option<()> {
        let axes: Vec<_> = curve.axes.iter().map(|axis| (axis.name.as_str(), axis.dimension)).collect();
        let fits = match axes.as_slice() {
            [("mach", Dimension::NONE)] => true,
            [("mach", Dimension::NONE), other] => {
                [("altitude", Dimension::LENGTH), ("angle_of_attack", Dimension::ANGLE)].contains(other)
            }
            _ => false,
        };
        if !fits || curve.output_dimension != Dimension::NONE {
            let example = "mach -> cd` or `mach, altitude [km] -> cd";
            self.report(unfit_curve::found(stated.span, &curve.name, "a drag coefficient", example));
            return None;
        }
        if curve.values.iter().any(|value| *value < 0.0) {
            let found = format!("`{}` has a drag coefficient below zero", curve.name);
            self.report(impossible_value::found(stated.span, &found, "zero or more"));
            return None;
        }
        Some(())
    }

    /// For a mission in a world with air: reports each engine of the vehicle that says nothing
    /// about sea level, and a vehicle that says nothing about drag. `flies` is the place of the
    /// mission's `flies` fact.
    pub(crate) fn check_in_air(&mut self, vehicle: BlockId, world: BlockId, flies: Span) {
        if self.world(world).is_none_or(|world| world.air == Air::None) {
            return;
        }
        let engines: Vec<_> =
            self.blocks_of(vehicle).into_iter().filter(|block| self.vacuum_only.contains(block)).collect();
        for engine in engines {
            let name = &self.definition(engine).block.name;
            self.report(missing_fact::sea_level(name.span, &name.text, flies));
        }
        if self.without_drag.contains(&vehicle) {
            let name = &self.definition(vehicle).block.name;
            self.report(missing_fact::drag(name.span, &name.text, flies));
        }
    }
}
