// When nothing fits: the least change of each single demand that would make something fit, each found by trying.

import { requiredCapacitance } from "../bank/index.ts";
import { type Capacitor, purchase } from "../catalog/index.ts";
import { minorDigits, power, tenTo } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { idOf } from "./rank.ts";
import type { Change } from "./result.ts";
import { type SweepInput, sweep } from "./sweep.ts";

interface Fit {
  /** The first layout that fits. */
  readonly layout: string;
  /** All parts that give one. */
  readonly parts: readonly Capacitor[];
}

/** What fits under a changed brief, or null. */
function fits(input: SweepInput, change: Partial<Brief>): Fit | null {
  const brief = { ...input.brief, ...change };
  const changed = { ...input, brief, required: requiredCapacitance(brief) };
  const parts: Capacitor[] = [];
  let layout: string | null = null;
  for (const unit of input.parts) {
    const { table } = sweep({ ...changed, parts: [unit] }, { stopAtFirst: true });
    if (table.count === 0) continue;
    parts.push(unit);
    layout ??= idOf(table, [unit], 0);
  }
  return layout === null ? null : { layout, parts };
}

/** The last value between one that does not fit and one that does. Only parts that fit so far are tried again: nothing else comes nearer. */
function narrow(
  input: SweepInput,
  key: keyof Brief,
  span: { readonly no: number; readonly yes: number; readonly fit: Fit },
  middleOf: (no: number, yes: number) => number | null,
): { readonly to: number; readonly layout: string } {
  let { no, yes, fit } = span;
  for (let middle = middleOf(no, yes); middle !== null; middle = middleOf(no, yes)) {
    const found = fits({ ...input, parts: fit.parts }, { [key]: middle });
    if (found === null) no = middle;
    else {
      yes = middle;
      fit = found;
    }
  }
  return { to: yes, layout: fit.layout };
}

/** Between a value that does not fit and one that does, the last that still fits, to 0.01 %. Both positive. */
function edge(
  input: SweepInput,
  key: "energy" | "voltage" | "ripple" | "derating",
  bad: number,
  good: number,
): Change | null {
  const fit = fits(input, { [key]: good });
  if (fit === null) return null;
  const found = narrow(input, key, { no: bad, yes: good, fit }, (no, yes) =>
    Math.abs(Math.log(yes / no)) > 1e-4 ? Math.sqrt(no * yes) : null,
  );
  return { field: key, from: input.brief[key], to: safeSide(found.to, good < bad), layout: found.layout, note: "" };
}

/** Four figures, rounded to the side that still fits. */
function safeSide(value: number, down: boolean): number {
  const power = Math.floor(Math.log10(value)) - 3;
  const scaled = Number(`${value}e${-power}`);
  return Number(`${down ? Math.floor(scaled) : Math.ceil(scaled)}e${power}`);
}

/** Steps of the search for a voltage: 5 % up to a factor of four, then a quarter, up to a factor of about a thousand. */
const ratioAt = (step: number): number => power(1.05, Math.min(step, 28)) * power(1.25, Math.max(0, step - 28));

/** A voltage that fits nearest to the wanted one, looked for each way. */
function voltageChange(input: SweepInput): Change | null {
  const { voltage } = input.brief;
  for (let step = 1; step <= 53; step++) {
    for (const ratio of [1 / ratioAt(step), ratioAt(step)]) {
      if (fits(input, { voltage: voltage * ratio }) === null) continue;
      const inner = ratio < 1 ? 1 / ratioAt(step - 1) : ratioAt(step - 1);
      return edge(input, "voltage", voltage * inner, voltage * ratio);
    }
  }
  return null;
}

function energyChange(input: SweepInput): Change | null {
  for (let power = 1; power <= 9; power++) {
    const change = edge(input, "energy", input.brief.energy, input.brief.energy * tenTo(-power));
    if (change !== null) return change;
  }
  return null;
}

/** The least whole limit that fits, up to `most`. */
function wholeChange(input: SweepInput, key: "maxSeries" | "maxUnits", most: number): Change | null {
  const from = input.brief[key];
  const fit = fits(input, { [key]: most });
  if (fit === null) return null;
  const found = narrow(input, key, { no: from, yes: most, fit }, (no, yes) =>
    yes - no > 1 ? Math.floor((no + yes) / 2) : null,
  );
  return { field: key, from, ...found, note: "" };
}

/** The smallest addition to one part's stock that gives a layout. */
function stockChange(input: SweepInput): Change | null {
  let best: Change | null = null;
  let least = Number.POSITIVE_INFINITY;
  for (const unit of input.parts) {
    if (unit.available === undefined) continue;
    const { available, ...unlimited } = unit;
    const { table } = sweep({ ...input, parts: [unlimited] }, { stopAtFirst: true });
    if (table.count === 0) continue;
    // The cheapest purchase may hold more than is needed, for a price break: it surely does, and less may do too.
    const bought = purchase(unlimited, (table.units[0] as number) + input.brief.spares)?.bought ?? 0;
    const fitting = (stock: number): string | null => {
      const parts = [{ ...unit, available: stock }];
      const found = sweep({ ...input, parts }, { stopAtFirst: true }).table;
      return found.count > 0 ? idOf(found, parts, 0) : null;
    };
    let [no, yes] = [available, bought];
    while (yes - no > 1) {
      const middle = Math.floor((no + yes) / 2);
      if (fitting(middle) === null) no = middle;
      else yes = middle;
    }
    if (yes - available >= least) continue;
    least = yes - available;
    best = { field: "available", from: available, to: yes, layout: fitting(yes) as string, note: unit.part };
  }
  return best;
}

/** Drops one ceiling; the value that would do is the least seen among all layouts without it. */
function ceilingChange(input: SweepInput, key: "maxCost" | "maxVolume" | "maxMass"): Change | null {
  const from = input.brief[key];
  if (from === undefined) return null;
  const { [key]: _dropped, ...rest } = input.brief;
  const { table } = sweep({ ...input, brief: rest as Brief });
  const column = key === "maxCost" ? table.cost : key === "maxVolume" ? table.volume : table.mass;
  let best = -1;
  for (let row = 0; row < table.count; row++) {
    const value = column[row] as number;
    if (Number.isFinite(value) && (best < 0 || value < (column[best] as number))) best = row;
  }
  if (best < 0) return null;
  const raw = column[best] as number;
  const to = key === "maxCost" ? raw / tenTo(minorDigits(input.currency ?? "")) : raw;
  return { field: key, from, to: safeSide(to, false), layout: idOf(table, input.parts, best), note: "" };
}

/** All single changes that would do, in the order a builder would think of them. */
export function leastChanges(input: SweepInput): readonly Change[] {
  const { brief } = input;
  const found = [
    brief.ripple < 1 ? edge(input, "ripple", brief.ripple, 1) : null,
    voltageChange(input),
    energyChange(input),
    brief.derating < 1 ? edge(input, "derating", brief.derating, 1) : null,
    wholeChange(input, "maxSeries", 1000),
    wholeChange(input, "maxUnits", 100000),
    stockChange(input),
    ceilingChange(input, "maxCost"),
    ceilingChange(input, "maxVolume"),
    ceilingChange(input, "maxMass"),
  ];
  return found.filter((change): change is Change => change !== null);
}
