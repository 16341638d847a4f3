// One shot of a bank into a circuit: the figures, where the energy goes, what the worst unit bears, and what was assumed.
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { recordedShot, steadyShot } from "./givenShot.ts";
import { alphaOf } from "./lampDrive.ts";
import { linearShot } from "./linearShot.ts";
import { type Circuit, checkCircuit } from "./load.ts";
import { type Bounds, boundsOf, meshOf, type PulseBank, unknownNotes, unknownsOf } from "./loopMesh.ts";
import { meshShot } from "./meshShot.ts";
import { noInductanceShot } from "./noInductanceShot.ts";
import { placedOf } from "./placed.ts";
import { checkLoop, dampingOf } from "./rlc.ts";
import { inductanceOf, type Mesh, resistanceOf, type Shot } from "./shot.ts";
import { shotFindings } from "./shotFindings.ts";
import { type UnitDuty, unitDutyOf } from "./unitDuty.ts";

/** Where the energy went [J]; `bank` and `bus` are null when their resistance is unknown, never zero for that. */
export interface DischargeEnergy {
  readonly stored: number;
  readonly load: number;
  readonly bank: number | null;
  readonly bus: number | null;
  /** In the resistors in series with the units. */
  readonly isolating: number;
  readonly switch: number;
  readonly clamp: number;
  readonly left: number;
}

/** One discharge. `bounds` says of each figure whether it is a value or a bound; `notes` say what was assumed. */
export interface Discharge {
  /** zeta of the whole loop; null without inductance, with a lamp or with a given current. */
  readonly damping: number | null;
  /** K0/sqrt(V Z0) of a lamp's loop; null without a lamp. */
  readonly lampAlpha: number | null;
  readonly peakCurrent: number;
  readonly peakTime: number;
  readonly reversal: number;
  /** null when lossless: it has no bound. */
  readonly action: number | null;
  readonly unitPeakCurrent: number;
  readonly unit: UnitDuty;
  readonly energy: DischargeEnergy;
  readonly bounds: Bounds;
  readonly findings: readonly Finding[];
  readonly notes: readonly string[];
  readonly method: Shot["method"];
  readonly duration: number;
  readonly at: Shot["at"];
}

/**
 * Whether a clamp has nothing to do: from critical damping up (di/dt)/i never falls below minus the slow root, so the
 * terminals stay above zero when the outer R/L is at least that root. Source: [methods-derived].
 */
function clampIdle(mesh: Mesh): boolean {
  const loop = { capacitance: mesh.capacitance, inductance: inductanceOf(mesh), resistance: resistanceOf(mesh) };
  const damping = dampingOf(loop);
  if (mesh.clamp === null || damping === null) return true;
  if (damping < 1) return false;
  const slow = 1 / (damping + Math.sqrt((damping - 1) * (damping + 1))) / Math.sqrt(loop.inductance * loop.capacitance);
  const outer = loop.resistance - mesh.bank.resistance;
  return outer >= slow * (loop.inductance - mesh.bank.inductance);
}

function shotOf(mesh: Mesh, { load }: Circuit): Read<Shot> {
  if (load.kind === "steady current") return steadyShot(mesh, load);
  if (load.kind === "recorded") return recordedShot(mesh, load.samples);
  if (inductanceOf(mesh) === 0) return noInductanceShot(mesh);
  const outer = mesh.bus.inductance + mesh.load.inductance;
  if (mesh.lampConstant > 0 || (outer > 0 && !clampIdle(mesh))) return meshShot(mesh);
  return linearShot(mesh);
}

/** Heat of the isolating resistors: the part of the bank branch's heat that is theirs, since one current passes both [J]. */
function inIsolating(mesh: Mesh, { isolating = 0 }: Circuit, heat: number): number {
  return isolating === 0 ? 0 : (heat * isolating) / mesh.bank.resistance;
}

/** Plain sentences on the limits that the mesh stands at. */
function limitNotes(mesh: Mesh, given: boolean): readonly string[] {
  if (given) return ["the current is given, so inductance has no say"];
  const [inductance, resistance] = [inductanceOf(mesh), resistanceOf(mesh)];
  const outer = mesh.bus.inductance + mesh.load.inductance;
  return [
    ...(inductance === 0 ? ["no inductance in the loop: the current starts at its peak, an upper bound"] : []),
    ...(resistance === 0 && mesh.lampConstant === 0 ? ["no resistance in the loop: the lossless bound"] : []),
    ...(mesh.clamp !== null && outer === 0
      ? ["all known inductance is inside the bank, where a clamp across it cannot keep the units from reversing"]
      : []),
    ...(mesh.lampConstant > 0 ? ["the lamp's law is followed down to a thousandth of the peak current"] : []),
  ];
}

/** What the shares by place leave out, or why there are none. */
function placeNotes(
  { parallel, esr, esl }: PulseBank,
  { place = null, clamp }: Circuit,
  placed: boolean,
): readonly string[] {
  if (parallel < 2 || place === null) return [];
  const lacking = [...(esr === null ? ["ESR"] : []), ...(esl === null ? ["ESL"] : [])].join(" and ");
  if (!placed) return [`place on the bus not assessed: the units' ${lacking || "bus"} is unknown`];
  return clamp === null ? [] : ["shares by place on the bus are those until the clamp takes over"];
}

/**
 * The discharge of `bank` from `voltage` [V] into `circuit`. zeta, peak and energies are of the whole loop: bank, bus, switch
 * and load. Unknown ESR, ESL or bus are left out only as a bound that `bounds` and `notes` name. Refused: faults of the
 * circuit, the bank's own numbers, and a loop left with neither resistance nor inductance (pulse.loop.none).
 */
export function dischargeOf(bank: PulseBank, circuit: Circuit, voltage: number): Read<Discharge> {
  const checked = checkCircuit(circuit);
  if (!checked.ok) return checked;
  const mesh = meshOf(bank, circuit, voltage);
  const given = circuit.load.kind === "steady current" || circuit.load.kind === "recorded";
  const unknown = unknownsOf(bank, circuit);
  const loop = { capacitance: mesh.capacitance, inductance: inductanceOf(mesh), resistance: resistanceOf(mesh) };
  const nonlinear = given || mesh.lampConstant > 0;
  const sound = checkLoop(loop, voltage);
  if (!sound.ok) {
    const faults = sound.refusals.filter(({ code }) => !(nonlinear && code === "pulse.loop.none"));
    if (faults.length > 0) return refused(...faults);
  }
  const read = shotOf(mesh, circuit);
  if (!read.ok) return read;
  const shot = read.value;
  const bounds = boundsOf(unknown, given);
  const place = placedOf(bank, circuit, shot, mesh);
  const duty = { peakCurrent: shot.peakCurrent, action: shot.bankAction, reversal: shot.reversal };
  const unit = unitDutyOf(bank, duty, place);
  const isolating = inIsolating(mesh, circuit, shot.energy.bank);
  const hasAlpha = mesh.lampConstant > 0 && loop.inductance > 0;
  return accepted({
    damping: nonlinear ? null : dampingOf(loop),
    lampAlpha: hasAlpha ? alphaOf({ constant: mesh.lampConstant, voltage, ...loop }) : null,
    peakCurrent: shot.peakCurrent,
    peakTime: shot.peakTime,
    reversal: shot.reversal,
    action: shot.action,
    unitPeakCurrent: unit.peakCurrent,
    unit,
    energy: {
      ...shot.energy,
      bank: unknown.esr ? null : shot.energy.bank - isolating,
      bus: unknown.bus ? null : shot.energy.bus,
      isolating,
    },
    bounds,
    findings: shotFindings({ bank, circuit, mesh, shot, unit, bounds }),
    notes: [...unknownNotes(unknown), ...limitNotes(mesh, given), ...placeNotes(bank, circuit, place !== null)],
    method: shot.method,
    duration: shot.duration,
    at: shot.at,
  });
}
