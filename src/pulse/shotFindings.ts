// What one computed shot must tell its reader: ratings of the worst unit, reversal into polarised units, lamp, bounds.
import type { Finding } from "../quantity/index.ts";
import { lampFindings } from "./lampLimits.ts";
import type { Circuit } from "./load.ts";
import type { Bounds, PulseBank } from "./loopMesh.ts";
import { inductanceOf, type Mesh, resistanceOf, type Shot } from "./shot.ts";
import { type UnitDuty, unitFindings } from "./unitDuty.ts";
import { atMost, type Bound, remark } from "./verdict.ts";

/** Everything the findings are drawn from. */
export interface ShotFacts {
  readonly bank: PulseBank;
  readonly circuit: Circuit;
  readonly mesh: Mesh;
  readonly shot: Shot;
  readonly unit: UnitDuty;
  readonly bounds: Bounds;
}

/** Reversal into a unit that has a polarity: none is allowed, unless the unit's own rating says otherwise. */
function polarityFindings({ bank, circuit, unit, bounds }: ShotFacts): readonly Finding[] {
  const { polarised, ratings } = bank.unit;
  if (!polarised || ratings.reversal !== null) return [];
  const mend =
    circuit.clamp === null
      ? "Raise the damping or put a clamp diode across the bank."
      : "The clamp's own drop remains.";
  const finding = atMost({
    id: "pulse.polarity",
    value: unit.reversal,
    limit: 0,
    unit: "1",
    source: "methods-derived",
    bound: bounds.reversal,
    note: `Polarised units must not reverse. ${mend}`,
  });
  return [circuit.clamp !== null && finding.verdict === "fail" ? { ...finding, verdict: "warn" } : finding];
}

/**
 * What a unit's reversal is where its place on the bus is told. The place can only add to the bank's; unknown ESR or ESL leave that
 * open, and behind a clamp the units are followed until it takes over, after which they may go on among themselves.
 */
export function reversalBound({
  bank,
  circuit,
  unit,
  bounds,
}: Pick<ShotFacts, "bank" | "circuit" | "unit" | "bounds">): Bound {
  const { place = null, clamp } = circuit;
  if (place === null || bank.parallel < 2) return bounds.reversal;
  if (unit.place !== null && clamp === null) return bounds.reversal;
  return bounds.reversal === "value" || bounds.reversal === "lower bound" ? "lower bound" : "side unknown";
}

/** All findings of one shot. */
export function shotFindings(facts: ShotFacts): readonly Finding[] {
  const { bank, circuit, mesh, shot, unit, bounds } = facts;
  const { load } = circuit;
  const given = load.kind === "steady current" || load.kind === "recorded";
  const told = { ...bounds, reversal: reversalBound(facts) };
  const found: Finding[] = [
    ...unitFindings(unit, bank.unit.ratings, told),
    ...polarityFindings({ ...facts, bounds: told }),
  ];
  if (load.kind === "lamp") {
    const width = 3 * Math.sqrt(inductanceOf(mesh) * mesh.capacitance);
    found.push(...lampFindings(load.lamp, { energy: shot.energy.load, width, peakCurrent: shot.peakCurrent }));
  }
  if (!given && inductanceOf(mesh) === 0) {
    found.push(
      remark(
        "pulse.bound.inductance",
        "warn",
        "methods-derived",
        "No inductance in the loop: the current is an upper bound.",
      ),
    );
  }
  if (!given && resistanceOf(mesh) === 0 && mesh.lampConstant === 0) {
    found.push(
      remark(
        "pulse.bound.lossless",
        "warn",
        "methods-derived",
        "No resistance in the loop: this is the lossless bound.",
      ),
    );
  }
  if (bounds.peakCurrent !== "value") {
    const note =
      "Parts of the loop are unknown and left out; measure ESR, ESL and the bus, or ring the bank into a short.";
    found.push(remark("pulse.bound.unknown", "not assessed", "methods-derived", note));
  }
  return found;
}
