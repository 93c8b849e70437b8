//! The facts of a rocket engine that follow from each other.
//!
//! F is thrust, I specific impulse, ṁ mass flow, Aₑ exit area, p₀ the pressure at sea level:
//! F_vacuum − F_sea = p₀·Aₑ, and F = ṁ·I·g₀ in vacuum and at sea level with the same ṁ
//! (Sutton and Biblarz, *Rocket Propulsion Elements*, 9th ed., chapter 2).

/// Pa, on any world.
pub(super) const SEA_LEVEL_PRESSURE: f64 = 101_325.0;
/// m/s²
pub(super) const G0: f64 = 9.80665;

/// The six quantities; the first ones are trusted first.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) enum Slot {
    ThrustVacuum,
    IspVacuum,
    ExitArea,
    ThrustSea,
    IspSea,
    MassFlow,
}

use Slot::{ExitArea, IspSea, IspVacuum, MassFlow, ThrustSea, ThrustVacuum};

/// In SI; None where unknown.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub(super) struct Facts([Option<f64>; 6]);

/// A stated value and half a unit of its last digit, both in SI.
#[derive(Clone, Copy, Debug)]
pub(super) struct Statement {
    pub slot: Slot,
    pub si: f64,
    pub half: f64,
}

impl Facts {
    pub(super) fn get(&self, slot: Slot) -> Option<f64> {
        self.0.get(slot as usize).copied().flatten()
    }

    fn set(&mut self, slot: Slot, value: Option<f64>) {
        if let (Some(place), Some(value)) =
            (self.0.get_mut(slot as usize), value.filter(|value| value.is_finite()))
        {
            place.get_or_insert(value);
        }
    }

    /// All that follows from what is known.
    fn complete(mut self) -> Self {
        loop {
            let before = self;
            let known = |slot| before.get(slot);
            let pressure = known(ExitArea).map(|area| area * SEA_LEVEL_PRESSURE);
            self.set(ThrustSea, both(known(ThrustVacuum), pressure, |thrust, pressure| thrust - pressure));
            self.set(ThrustVacuum, both(known(ThrustSea), pressure, |thrust, pressure| thrust + pressure));
            let area = both(known(ThrustVacuum), known(ThrustSea), |vacuum, sea| {
                (vacuum - sea) / SEA_LEVEL_PRESSURE
            });
            self.set(ExitArea, area);
            for (thrust, isp) in [(ThrustVacuum, IspVacuum), (ThrustSea, IspSea)] {
                self.set(thrust, both(known(MassFlow), known(isp), |flow, isp| flow * isp * G0));
                self.set(isp, both(known(thrust), known(MassFlow), |thrust, flow| thrust / (flow * G0)));
                self.set(MassFlow, both(known(thrust), known(isp), |thrust, isp| thrust / (isp * G0)));
            }
            if self == before {
                return self;
            }
        }
    }
}

fn both(a: Option<f64>, b: Option<f64>, of: impl Fn(f64, f64) -> f64) -> Option<f64> {
    Some(of(a?, b?))
}

/// The statements that are needed, in order of trust, without those that follow from them.
fn basis(statements: &[Statement]) -> Vec<Statement> {
    let mut order = statements.to_vec();
    order.sort_by_key(|statement| statement.slot as usize);
    let mut needed: Vec<Statement> = Vec::new();
    for statement in order {
        if facts(&needed).complete().get(statement.slot).is_none() {
            needed.push(statement);
        }
    }
    needed
}

fn facts(statements: &[Statement]) -> Facts {
    let mut facts = Facts::default();
    for statement in statements {
        facts.set(statement.slot, Some(statement.si));
    }
    facts
}

/// All six quantities, as far as the statements go.
pub(super) fn solve(statements: &[Statement]) -> Facts {
    facts(&basis(statements)).complete()
}

/// What the other statements make of one, where that differs by more than the digits allow: half a
/// unit of the last digit of each, carried through to first order.
pub(super) fn contradiction(statements: &[Statement], index: usize) -> Option<f64> {
    let statement = statements.get(index)?;
    let mut others = statements.to_vec();
    others.remove(index);
    let needed = basis(&others);
    let expected = facts(&needed).complete().get(statement.slot)?;
    let mut allowed = statement.half + 1e-9 * expected.abs();
    for at in 0..needed.len() {
        let mut moved = needed.clone();
        if let Some(one) = moved.get_mut(at) {
            one.si += one.half;
        }
        if let Some(other) = facts(&moved).complete().get(statement.slot) {
            allowed += (other - expected).abs();
        }
    }
    ((statement.si - expected).abs() > allowed).then_some(expected)
}
