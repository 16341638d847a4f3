// The brief's load, switch, bus and clamp as the pulse layer's circuit, for one bank; and one unit as a shot sees it.

import type { Layout } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import {
  type BusGeometry,
  type BusPath,
  type BusPlace,
  busOf,
  type Circuit,
  IDEAL_SWITCH,
  type Load,
  type PulseBank,
  pulseBankOf,
  RESISTIVITY,
  ringBus,
  taperOf,
} from "../pulse/index.ts";
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { lampOf } from "./lampDrive.ts";
import type { BusBrief, LoadBrief } from "./load.ts";

type Shape = Pick<Layout, "series" | "parallel" | "ties">;

/** The bank of a layout as a shot sees it. An unknown tolerance counts as none here; whoever judges must mind it. */
export function pulseBankFor(unit: Capacitor, { series, parallel, ties }: Shape): PulseBank {
  return pulseBankOf({
    series,
    parallel,
    ties,
    unit: {
      capacitance: unit.capacitance,
      toleranceLow: unit.tolerance?.low ?? 0,
      toleranceHigh: unit.tolerance?.high ?? 0,
      esr: unit.esr ?? null,
      esl: unit.esl ?? null,
      polarised: unit.polarised !== false,
      ratings: {
        peakCurrent: unit.peakCurrent ?? null,
        slew: unit.slew ?? null,
        reversal: unit.reversal ?? null,
        action: unit.action ?? null,
      },
    },
  });
}

/** The load in the pulse layer's words; null when the brief has none. */
export function loadOf(load: LoadBrief | undefined): Load | null {
  if (load === undefined) return null;
  const { resistance, inductance, lamp, current, time, recorded } = load;
  if (lamp) return { kind: "lamp", lamp: lampOf(lamp), resistance: resistance ?? 0, inductance: inductance ?? 0 };
  if (load.short) return { kind: "short" };
  if (current !== undefined && time !== undefined) return { kind: "steady current", current, seconds: time };
  if (Array.isArray(recorded))
    return { kind: "recorded", samples: recorded.map(([at, amperes]) => ({ time: at, current: amperes })) };
  if (inductance !== undefined) return { kind: "coil", resistance: resistance ?? 0, inductance };
  return resistance === undefined ? null : { kind: "resistor", resistance };
}

/** A shape of bus whose lengths are all given; crossFaults has seen to that. */
function geometryOf(bus: BusBrief): BusGeometry | null {
  const length = (key: keyof BusBrief): number => (bus[key] as number | undefined) ?? Number.NaN;
  const whole = length("length");
  switch (bus.shape) {
    case "flat bars":
      return {
        kind: "flat bars",
        width: length("width"),
        gap: length("gap"),
        thickness: length("thickness"),
        length: whole,
      };
    case "wire pair":
      return { kind: "wire pair", radius: length("radius"), spacing: length("spacing"), length: whole };
    case "coax":
      return { kind: "coax", inner: length("inner"), outer: length("outer"), wall: length("wall"), length: whole };
    default:
      return null;
  }
}

/** A bus with the frequency [Hz] that its skin depth was taken at; null for a bus of measured values. */
export interface BusFound {
  readonly path: BusPath | null;
  readonly frequency: number | null;
  readonly findings: readonly Finding[];
  readonly note: string | null;
  /** How the units hang on it; null: not told. Its taper is counted in `path`. */
  readonly place: BusPlace | null;
}

const COUNTED =
  "No bus was given: resistance and inductance of the load are taken to be those of everything between the bank's terminals.";

/**
 * The bus. Without one, the load's own figures stand for the whole outer circuit when both were given; else the bus is
 * unknown, and every figure that it bears on is a bound.
 */
function runFor(brief: Brief, bank: PulseBank, load: Load): Read<Omit<BusFound, "place">> {
  const { bus, load: keys } = brief;
  const given = load.kind === "steady current" || load.kind === "recorded";
  if (bus === undefined) {
    const told = keys?.resistance !== undefined && keys.inductance !== undefined;
    const counted = told || (load.kind === "lamp" && keys?.inductance !== undefined);
    if (!counted || given) return accepted({ path: null, frequency: null, findings: [], note: null });
    return accepted({ path: { resistance: 0, inductance: 0 }, frequency: null, findings: [], note: COUNTED });
  }
  const geometry = geometryOf(bus);
  if (geometry === null) {
    const path = { resistance: bus.resistance ?? 0, inductance: bus.inductance ?? 0 };
    return accepted({ path, frequency: null, findings: [], note: null });
  }
  const resistivity = RESISTIVITY[bus.metal];
  if (given) {
    const direct = busOf(geometry, { resistivity, frequency: 0 });
    if (!direct.ok) return direct;
    return accepted({ path: direct.value, frequency: 0, findings: direct.value.findings, note: null });
  }
  const outer = { resistance: keys?.resistance ?? 0, inductance: keys?.inductance ?? 0 };
  const rest = {
    capacitance: bank.capacitance,
    inductance: (bank.esl ?? 0) + outer.inductance,
    resistance: (bank.esr ?? 0) + outer.resistance + (brief.switch?.resistance ?? 0),
  };
  const ring = ringBus(geometry, rest, resistivity);
  if (!ring.ok) return ring;
  const { bus: found, frequency } = ring.value;
  return accepted({ path: found, frequency, findings: found.findings, note: null });
}

/** The piece of bus from one unit to the next, at the frequency of the run; null when the brief does not tell how units hang. */
function placeFor({ bus }: Brief, run: Omit<BusFound, "place">): Read<BusPlace | null> {
  if (bus?.feed === undefined) return accepted(null);
  const { feed, pitch, stepResistance = 0, stepInductance = 0 } = bus;
  const geometry = geometryOf(bus);
  if (geometry === null || pitch === undefined)
    return accepted({ feed, segment: { resistance: stepResistance, inductance: stepInductance } });
  const step = busOf(
    { ...geometry, length: pitch },
    { resistivity: RESISTIVITY[bus.metal], frequency: run.frequency ?? 0 },
  );
  if (!step.ok) return step;
  const { resistance, inductance } = step.value;
  return accepted({ feed, segment: { resistance, inductance } });
}

/** The whole bus: the run to the first unit, and along the row of units what the loop sees of it. */
function busFor(brief: Brief, bank: PulseBank, load: Load): Read<BusFound> {
  const run = runFor(brief, bank, load);
  if (!run.ok) return run;
  const place = placeFor(brief, run.value);
  if (!place.ok) return place;
  const { path } = run.value;
  if (place.value === null || path === null) return accepted({ ...run.value, place: null });
  const taper = taperOf(bank.parallel, place.value);
  const whole = {
    resistance: path.resistance + taper.resistance,
    inductance: path.inductance + taper.inductance,
  };
  return accepted({ ...run.value, path: whole, place: place.value });
}

/** The section inductance as the loop sees it: one to each unit that shares both ends with others, else one to each string. */
function sectionOf({ section }: Brief, { series, parallel, ties }: PulseBank): number {
  if (section === undefined) return 0;
  return (section.inductance * (ties === "cross-tied" ? series : 1)) / parallel;
}

/** A circuit, and what was found about its bus. */
export interface CircuitFound {
  readonly circuit: Circuit;
  readonly bus: BusFound;
}

/** The circuit of a brief around a bank. Refused: a brief without a load, and faults of the bus's numbers. */
export function circuitOf(brief: Brief, bank: PulseBank): Read<CircuitFound> {
  const load = loadOf(brief.load);
  if (load === null) {
    const unread = typeof brief.load?.recorded === "string";
    const want = unread ? "the samples of the record, read from its file" : "a load, such as a resistance";
    return refused({ code: "missing-value", place: { field: "load" }, read: "nothing", want });
  }
  const bus = busFor(brief, bank, load);
  if (!bus.ok) return bus;
  const { path } = bus.value;
  const circuit: Circuit = {
    load,
    bus: path === null ? null : { resistance: path.resistance, inductance: path.inductance },
    switch: brief.switch ?? IDEAL_SWITCH,
    clamp: brief.clamp ?? null,
    isolating: ((brief.isolating ?? 0) * bank.series) / bank.parallel,
    section: sectionOf(brief, bank),
    place: bus.value.place,
  };
  return accepted({ circuit, bus: bus.value });
}
