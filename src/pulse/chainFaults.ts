// Faults inside the chain: a unit shorted, a unit open, a whole row shorted.
import { formatQuantity } from "../quantity/index.ts";
import { atHigh, cornerShare, type FaultBank, shortCaseOf, worstBefore } from "./faultBank.ts";
import { faultAction, faultPeak, leastFaultAction, rowShortLoop, unitShortLoop } from "./faultCurrents.ts";
import { faultEnergy } from "./faultEnergy.ts";
import { heldWithOpen, heldWithShort } from "./faultHold.ts";
import { type Fault, row } from "./faultRow.ts";
import { fuseFindings } from "./fuse.ts";
import { shortedUnit } from "./shortedUnit.ts";
import { atMost } from "./verdict.ts";

/** What stands between a shorted unit and its neighbours. */
function guardOf({
  fuse = null,
  isolatingResistance = null,
  sectionInductance = null,
  shortResistance = null,
  parallel,
}: FaultBank): string {
  if (parallel === 1) return "No neighbours feed it; the charger's trip must open.";
  if (fuse !== null) return "The fuse of the shorted unit, if it clears; see its findings.";
  if (isolatingResistance !== null && isolatingResistance > 0)
    return shortResistance === null
      ? "The isolating resistors take part of the heat, how much rests on the short itself: state its resistance. Nothing opens."
      : "The isolating resistors take their part of the heat; nothing opens.";
  if (sectionInductance !== null && sectionInductance > 0)
    return "The section inductance holds the current down, not the joules; nothing opens.";
  return "Nothing given stops it: a fuse, an isolating resistor or smaller sections would.";
}

/** Action through the sound unit that carries most of the fault, against its rating; none where either is unknown. */
function soundFindings({ unit, series, parallel, ties }: FaultBank, action: number | null) {
  if (action === null || !unit.action) return [];
  // in strings the rest of the faulted string carries the whole of it
  const whole = ties === "strings" && series > 1;
  // of the neighbours one high among low ones carries most, by capacitance
  const { toleranceLow: low, toleranceHigh: high } = unit;
  const part = (1 + (high ?? 0)) / (1 + (high ?? 0) + (parallel - 2) * (1 - (low ?? 0)));
  const value = whole ? action : action * part * part;
  const note = "Action of the fault, every unit high, through the worst sound unit against its rating for one shot.";
  const claim = { id: "pulse.fault.action", state: "faulted", unit: "A2s", source: "methods-derived" } as const;
  const bound = low === undefined || high === undefined ? "lower bound" : "value";
  return [atMost({ ...claim, value, limit: unit.action, note, bound })];
}

/** One unit shorted: the others empty into it. */
export function unitShort(bank: FaultBank): Fault {
  const result = shortedUnit(shortCaseOf(bank));
  const loop = unitShortLoop(bank);
  const high = unitShortLoop(atHigh(bank));
  const n = bank.series;
  const energy = faultEnergy(bank, loop, result.neighbours);
  const duty = {
    normalAction: bank.shot?.unitAction ?? null,
    leastFaultAction: leastFaultAction(bank),
    voltage: worstBefore(bank),
  };
  const note =
    bank.ties === "strings"
      ? `With the charger on, the rest of its string stands at V/${n - 1}; alone, at ${formatQuantity(result.survivorAlone, "voltage", { rounding: "up" })}.`
      : `With the charger on, the other stages stand at V/${n - 1}; alone, they keep what they had.`;
  return row(bank, {
    id: "unit-short",
    volts: result.held,
    spread: n > 1 ? cornerShare(bank, { units: 1, others: 1, stages: n - 2 }) : 0,
    held: heldWithShort(bank),
    peak: faultPeak(loop),
    peakWorst: faultPeak(high),
    joules: energy.unit,
    own: result.own,
    isolating: energy.isolating,
    stops: guardOf(bank),
    note: n > 1 ? note : "The whole bank empties into the shorted unit; nothing is left standing.",
    findings: [...(bank.fuse ? fuseFindings(bank.fuse, duty) : []), ...soundFindings(bank, faultAction(high))],
  });
}

/** One unit open: its stage or string is short of it. */
export function unitOpen(bank: FaultBank): Fault {
  const { series: n, parallel: p, ties, voltage } = bank;
  const tied = ties === "cross-tied" || p === 1;
  const volts = tied ? (voltage * p) / (p + (n - 1) * (p - 1)) : worstBefore(bank);
  return row(bank, {
    id: "unit-open",
    volts,
    spread: tied ? cornerShare(bank, { units: p - 1, others: p, stages: n - 1 }) : volts,
    held: tied ? heldWithOpen(bank) : volts,
    peak: { amperes: 0, bound: "value" },
    joules: 0,
    stops: "Nothing opens; the stage voltages tell it while charging.",
    note: tied
      ? "On the next charge the stage that lost a unit takes more than its share."
      : "Its string is out and keeps its charge through a dump; the gap may stand off the whole voltage.",
  });
}

/** A whole row shorted; with strings, one string end to end. */
export function rowShort(bank: FaultBank): Fault {
  const { series: n, parallel: p, ties, unit, voltage } = bank;
  const tied = ties === "cross-tied" || n === 1;
  const poured = tied ? 0 : ((p - 1) * unit.capacitance * voltage * voltage) / (2 * n * n);
  const own = (unit.capacitance * worstBefore(bank) ** 2) / 2;
  return row(bank, {
    id: "row-short",
    volts: tied && n > 1 ? voltage / (n - 1) : 0,
    spread: tied && n > 1 ? cornerShare(bank, { units: 1, others: 1, stages: n - 2 }) : 0,
    held: tied ? heldWithShort(bank) : 0,
    peak: faultPeak(rowShortLoop(bank)),
    peakWorst: faultPeak(rowShortLoop(atHigh(bank))),
    joules: tied ? own : poured,
    own,
    alone: tied,
    stops: "The charger's trip; nothing inside the bank opens.",
    note: tied
      ? "Each unit of the row spends its own energy in the short; with the charger on the other rows take its share."
      : "Strings have no rows: taken as one string shorted end to end, fed by all the others.",
  });
}
