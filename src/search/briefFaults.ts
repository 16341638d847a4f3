// Faults that lie between the keys of a brief: one load at a time, whole shapes, chargers of one kind, limits that can be judged.

import type { Refusal } from "../quantity/index.ts";
import type { BusBrief, ChargerBrief, LoadBrief } from "./load.ts";

/** What of a brief is looked at. */
export interface CrossBrief {
  readonly load?: LoadBrief | undefined;
  readonly bus?: BusBrief | undefined;
  readonly charger?: ChargerBrief | undefined;
  readonly life?: { readonly halving?: number | undefined; readonly reference?: number | undefined } | undefined;
  readonly isolating?: number | undefined;
  readonly isolatingPrice?: number | undefined;
  readonly rate?: number | undefined;
  readonly maxPeakCurrent?: unknown;
  readonly maxSlew?: unknown;
  readonly maxReversal?: unknown;
  readonly maxRms?: unknown;
  readonly maxTemperatureRise?: unknown;
  readonly minLife?: unknown;
}

type Say = (code: "contradiction" | "missing-value", field: string, read: string, want: string) => void;

/** Lengths that each shape of bus is made of, besides its length. */
export const BUS_LENGTHS = {
  "flat bars": ["width", "gap", "thickness"],
  "wire pair": ["radius", "spacing"],
  coax: ["inner", "outer", "wall"],
} as const;

/** The kinds of load that a brief's load speaks of; exactly one may be. */
export function loadKinds(load: LoadBrief): readonly string[] {
  return [
    ...(load.lamp ? ["lamp"] : []),
    ...(load.short ? ["short"] : []),
    ...(load.current !== undefined || load.time !== undefined ? ["current"] : []),
    ...(load.recorded !== undefined ? ["recorded"] : []),
    ...(!load.lamp && (load.resistance !== undefined || load.inductance !== undefined) ? ["resistance"] : []),
  ];
}

function loadFaults(load: LoadBrief, say: Say): void {
  const kinds = loadKinds(load);
  const [first = "", second = ""] = kinds;
  if (kinds.length > 1) say("contradiction", `load.${second}`, `beside ${first}`, "one kind of load");
  const drive = load.width ?? load.damping;
  if (drive !== undefined && !load.lamp) say("contradiction", "load.width", "no lamp", "a lamp whose circuit it sizes");
  if (kinds.length === 0 && drive === undefined) {
    const want = "resistance, inductance, lamp, short, current with time, or recorded";
    say("missing-value", "load", "nothing in it", want);
  }
  if (load.current !== undefined && load.time === undefined)
    say("missing-value", "load.time", "nothing", 'how long the current flows, "1 ms"');
  if (load.time !== undefined && load.current === undefined)
    say("missing-value", "load.current", "nothing", 'the steady current, "100 A"');
}

/** How the units hang on the bus: told whole or not at all. */
function placeFaults({ shape, feed, pitch, stepResistance, stepInductance }: BusBrief, say: Say): void {
  const steps = stepResistance !== undefined || stepInductance !== undefined;
  if (feed === undefined) {
    if (pitch !== undefined || steps)
      say("missing-value", "bus.feed", "nothing", "where the load's leads join the units: end or centre");
    return;
  }
  if (shape !== undefined) {
    if (pitch === undefined)
      say("missing-value", "bus.pitch", "nothing", 'a length from one unit to the next, such as "80 mm"');
    if (steps)
      say("contradiction", "bus.stepInductance", "beside a shape", "the pitch alone; the shape gives the rest");
    return;
  }
  if (pitch !== undefined) say("contradiction", "bus.pitch", "no shape", "stepResistance and stepInductance");
  for (const [key, value, example] of [
    ["stepResistance", stepResistance, "50 uohm"],
    ["stepInductance", stepInductance, "10 nH"],
  ] as const)
    if (value === undefined)
      say("missing-value", `bus.${key}`, "nothing", `that of the bus from one unit to the next, "${example}"`);
}

function busFaults(bus: BusBrief, say: Say): void {
  placeFaults(bus, say);
  const { shape, resistance, inductance } = bus;
  if (shape === undefined) {
    if (inductance === undefined) say("missing-value", "bus.inductance", "nothing", "an inductance, or a shape");
    if (resistance === undefined) say("missing-value", "bus.resistance", "nothing", "a resistance, or a shape");
    return;
  }
  if (resistance !== undefined || inductance !== undefined)
    say("contradiction", "bus.shape", "also resistance or inductance", "either a shape or measured values");
  for (const length of ["length", ...BUS_LENGTHS[shape]] as const) {
    if (bus[length as keyof BusBrief] === undefined)
      say("missing-value", `bus.${length}`, "nothing", `a length such as "40 mm", for ${shape}`);
  }
}

function chargerFaults(charger: ChargerBrief, say: Say): void {
  const kinds = (["current", "power", "supply"] as const).filter((key) => charger[key] !== undefined);
  const [first = "", second = ""] = kinds;
  if (kinds.length > 1) say("contradiction", `charger.${second}`, `beside ${first}`, "one kind of charger");
  if (kinds.length === 0 && charger.resistance === undefined && charger.highest === undefined)
    say("missing-value", "charger", "nothing in it", "current; power and currentLimit; or supply and resistance");
  const pair = (one: "power" | "supply" | "resistance", other: keyof ChargerBrief): void => {
    if (charger[one] !== undefined && charger[other] === undefined)
      say("missing-value", `charger.${other}`, "nothing", `a value beside ${one}`);
  };
  pair("power", "currentLimit");
  pair("supply", "resistance");
  pair("resistance", "supply");
}

/** A limit that nothing in the brief lets us judge would pass unseen, so it is refused. */
function limitFaults(brief: CrossBrief, say: Say): void {
  const needs = (key: keyof CrossBrief, other: "load" | "rate" | "charger"): void => {
    if (brief[key] !== undefined && brief[other] === undefined)
      say("missing-value", other, "nothing", `a ${other}, without which ${String(key)} cannot be judged`);
  };
  for (const key of ["maxPeakCurrent", "maxSlew", "maxReversal", "maxRms", "maxTemperatureRise", "minLife"] as const)
    needs(key, "load");
  for (const key of ["maxRms", "maxTemperatureRise"] as const) {
    needs(key, "rate");
    needs(key, "charger");
  }
}

/** Every fault between keys; empty when the brief holds together. */
export function crossFaults(brief: CrossBrief, file?: string): readonly Refusal[] {
  const faults: Refusal[] = [];
  const say: Say = (code, field, read, want) => {
    if (faults.some((one) => one.place.field === field)) return;
    faults.push({ code, place: { ...(file ? { file } : {}), field }, read, want });
  };
  if (brief.load) loadFaults(brief.load, say);
  if (brief.bus) busFaults(brief.bus, say);
  if (brief.charger) chargerFaults(brief.charger, say);
  const { halving, reference } = brief.life ?? {};
  if ((halving === undefined) !== (reference === undefined)) {
    const field = halving === undefined ? "life.halving" : "life.reference";
    say("missing-value", field, "nothing", "halving and reference together");
  }
  if (brief.isolatingPrice !== undefined && brief.isolating === undefined)
    say("missing-value", "isolating", "nothing", "the resistor that the price is of");
  limitFaults(brief, say);
  return faults;
}
