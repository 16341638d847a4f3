// Everything that `place` works on: the shape, the measured units, what is known of the bank, and the request.

import type { Layout } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import { anotherPart, DEFAULTS, type MeasuredUnit, ofPartFindings, type PlaceRequest } from "../place/index.ts";
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { assess, type LayoutResult, unitLimit } from "../search/index.ts";
import { type LayoutInput, readLayout, readShape } from "./layoutInput.ts";
import { readPins, readRooms } from "./listInput.ts";
import { type MeasuredInput, readMeasuredInput } from "./measuredInput.ts";
import { type PlaceChoices, type PlaceFlags, readPlaceFlags } from "./placeFlags.ts";
import type { Ports } from "./ports.ts";
import { type Settings, settle } from "./settings.ts";
import { findPart, readStock, type Stock } from "./stock.ts";

/** What is known of the bank beside its units; null is unknown. V, ohm, s. */
export interface BankKnown {
  readonly part: string | null;
  /** Charge voltage with its overshoot. */
  readonly voltage: number | null;
  /** Highest voltage of a unit, derating applied. */
  readonly limit: number | null;
  /** Balancing resistor of a stage (cross-tied) or unit (strings); null for none or unknown. */
  readonly resistance: number | null;
  readonly resistanceTolerance: number | null;
  /** Voltage on a unit at which leakage was read. */
  readonly leakageVoltage: number | null;
  readonly polarised: boolean | null;
  readonly hold: number;
}

export interface PlaceInput {
  readonly request: PlaceRequest;
  readonly units: readonly MeasuredUnit[];
  readonly measured: MeasuredInput;
  readonly bank: BankKnown;
  /** The layout assessed from its catalogue, where there is one and the voltage is known. */
  readonly assessed: LayoutResult | null;
  readonly settings: Settings;
  readonly stock: Stock | null;
  /** The measured units against the part they are said to be; none without a catalogue. */
  readonly ofPart: readonly Finding[];
  readonly notes: readonly string[];
}

/** Up to so many units a proof is always tried; beyond it the search ends at a gap that no meter could tell from the best. */
const SMALL = 40;
const SMALL_STOP = 1e-8;
/** Elementary trials: a second or two. */
export const MOVES = 1e8;

/** Placing needs no energy: where no brief says one, something stands in for what it does not use. */
function settingsOf(brief: string | undefined, flags: PlaceFlags, ports: Ports): Read<Settings> {
  const stand = brief === undefined ? { energy: "1 J", ripple: "100 %", voltage: "1 V" } : {};
  return settle(brief, { ...stand, ...flags }, ports.files);
}

/** Reads all inputs; every fault of every one is told at once. */
export function readPlaceInput(brief: string | undefined, flags: PlaceFlags, ports: Ports): Read<PlaceInput> {
  const { choices, faults } = readPlaceFlags(flags);
  const settings = settingsOf(brief, flags, ports);
  const stock = flags.catalog === undefined ? accepted(null) : readStock(flags, ports.files);
  const layout = readPlaceLayout(flags, ports, stock.ok ? stock.value : null);
  const part = layout.ok && layout.value.layout.part !== "" ? layout.value.layout.part : undefined;
  const measured = readMeasuredInput(flags.measured, part, ports.files);
  const pins = readPins(flags.pins ?? [], ports.files);
  const rooms = readRooms(flags.rooms ?? []);
  if (faults.length > 0 || !settings.ok || !stock.ok || !layout.ok || !measured.ok || !pins.ok || !rooms.ok) {
    const others = [settings, stock, layout, measured, pins, rooms].flatMap((read) => (read.ok ? [] : read.refusals));
    return refused(...faults, ...others);
  }
  let unit: Capacitor | null = null;
  if (stock.value !== null && part !== undefined) {
    const found = findPart(part, stock.value.parts, { field: flags.layout === undefined ? "--part" : flags.layout });
    if (!found.ok) return found;
    unit = found.value;
    const other = anotherPart(measured.value.units, unit, choices.uncertainty ?? DEFAULTS.uncertainty);
    if (other !== null) return refused(other);
  }
  const leaks = measured.value.units.some((unit) => unit.leakage !== undefined);
  const known = knownOf(layout.value, {
    choices,
    settings: settings.value,
    unit,
    stock: stock.value,
    flags,
    brief,
    leaks,
  });
  const { series, parallel, ties } = layout.value.layout;
  const large = measured.value.units.length > SMALL;
  const { unitLimit: _, leakageAt: __, ...asked } = choices;
  const request: PlaceRequest = {
    series,
    parallel,
    ties,
    moves: MOVES,
    ...asked,
    ...(flags.stopAtFloor === true ? { stopAtFloor: true } : large ? { stopAt: SMALL_STOP } : { stopAtFloor: false }),
    ...(pins.value.length > 0 ? { pins: pins.value } : {}),
    ...(rooms.value.length > 0 ? { rooms: rooms.value } : {}),
    ...(known.bank.resistance === null ? {} : { balanceConductance: 1 / known.bank.resistance }),
    ...(known.bank.leakageVoltage === null ? {} : { leakageVoltage: known.bank.leakageVoltage }),
  };
  return accepted({
    request,
    units: measured.value.units,
    measured: measured.value,
    settings: settings.value,
    stock: stock.value,
    ofPart:
      unit === null ? [] : ofPartFindings(measured.value.units, unit, choices.uncertainty ?? DEFAULTS.uncertainty),
    ...known,
  });
}

/** A plain shape needs no part; a layout's file has one. */
function readPlaceLayout(flags: PlaceFlags, ports: Ports, stock: Stock | null): Read<LayoutInput> {
  const tolerance = stock?.families[0]?.tolerance ?? 0.05;
  if (flags.layout !== undefined) return readLayout(flags, ports.files, tolerance);
  const shape = readShape(flags);
  if (!shape.ok) return shape;
  const read = readLayout({ ...flags, part: flags.part ?? "any" }, ports.files, tolerance);
  // The ties as asked: a single column of stages is still laid out stage by stage.
  return read.ok ? accepted({ ...read.value, layout: { part: flags.part ?? "", ...shape.value } }) : read;
}

interface Given {
  readonly choices: PlaceChoices;
  readonly settings: Settings;
  readonly unit: Capacitor | null;
  readonly stock: Stock | null;
  readonly flags: PlaceFlags;
  readonly brief: string | undefined;
  /** Some unit has its leakage measured. */
  readonly leaks: boolean;
}

function knownOf(
  { layout, balance, filed }: LayoutInput,
  { choices, settings, unit, stock, flags, brief, leaks }: Given,
): Pick<PlaceInput, "bank" | "assessed" | "notes"> {
  const asked = settings.brief;
  const voltage = brief === undefined && flags.voltage === undefined ? null : asked.voltage * (1 + asked.overshoot);
  const notes: string[] = [];
  const assessed =
    unit !== null && stock !== null && voltage !== null ? assessedOf(layout, unit, stock, settings) : null;
  let resistor: { readonly resistance: number; readonly tolerance: number } | null = null;
  if (balance?.kind === "fixed") resistor = balance;
  else if (balance === null && filed) resistor = filed;
  else if (balance === null && filed === undefined && assessed?.balance) {
    resistor = assessed.balance;
    notes.push("The balancing resistor is the one that check would choose; --balance sets another, or none.");
  }
  let leakageVoltage = choices.leakageAt ?? null;
  if (leakageVoltage === null && (unit !== null || voltage !== null)) {
    leakageVoltage = unit?.voltage ?? (voltage as number) / layout.series;
    const where = unit === null ? "the even share of a unit" : "the rated voltage";
    if (leaks) notes.push(`Leakage is taken as read at ${where}, assumed; --leakage-at says where it was read.`);
  }
  return {
    assessed,
    notes,
    bank: {
      part: layout.part === "" ? null : layout.part,
      voltage,
      limit: choices.unitLimit ?? (unit === null ? null : unitLimit(unit, asked)),
      resistance: resistor?.resistance ?? null,
      resistanceTolerance: resistor?.tolerance ?? null,
      leakageVoltage,
      polarised: unit?.polarised ?? null,
      hold: asked.hold,
    },
  };
}

const assessedOf = (layout: Layout, unit: Capacitor, stock: Stock, { brief }: Settings): LayoutResult =>
  assess({ unit, layout, brief, families: stock.families, currency: null });
