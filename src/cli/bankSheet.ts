// The bank that readings are compared with: from the JSON of a placing, or from one layout at its nominal values.

import type { Chain } from "../bank/index.ts";
import { assumedLeakage, type MeasuredUnit } from "../catalog/index.ts";
import { chainsOf, type PriorDoubt, type Ties } from "../place/index.ts";
import { accepted, type Read, refused, versionFault } from "../quantity/index.ts";
import type { Files } from "./files.ts";
import { readJson } from "./jsonText.ts";
import { LAYOUT_VERSION } from "./layoutInput.ts";

export interface BankSheet {
  readonly ties: Ties;
  readonly series: number;
  readonly parallel: number;
  /** One chain when cross-tied, one for each string. */
  readonly chains: readonly Chain[];
  /** Serials by stage or string; empty when the units are not known. */
  readonly groups: readonly (readonly string[])[];
  /** The measured units, spares too, as the sheet has them; empty when it has none. */
  readonly units: readonly MeasuredUnit[];
  /** Of a measured capacitance, relative. */
  readonly uncertainty: number;
  readonly doubt: PriorDoubt;
  /** V; null when not known. */
  readonly limit: number | null;
  readonly voltage: number | null;
  readonly polarised: boolean;
  readonly notes: readonly string[];
}

export interface SheetWishes {
  /** ohm; overrides that of the sheet. `none` for none. */
  readonly resistance?: number | "none";
  readonly limit?: number;
  /** Units measured anew since the sheet was written, by serial: the bank is what they are now. */
  readonly latest?: ReadonlyMap<string, Partial<MeasuredUnit>>;
}

/** Version of a placing in JSON, as place writes it. */
export const PLACING_VERSION = 1;

const SHEETS = "the JSON of place (place ... --json), or one layout of plan or check, not the sheet made from it";

type Facts = Readonly<Record<string, unknown>>;

const isFacts = (value: unknown): value is Facts =>
  typeof value === "object" && value !== null && !Array.isArray(value);
const numberOr = (value: unknown): number | null =>
  typeof value === "number" && Number.isFinite(value) && value > 0 ? value : null;

/** Leakage that nobody measured: against a time constant of 10,000 s, with a doubt of a factor of three or so. Common practice, no source. */
const UNKNOWN_SECONDS = 1e4;
const UNKNOWN_DOUBT = 1;
const DOUBT: PriorDoubt = { capacitance: 0.003, leakage: 0.3, resistance: 0.03, bank: 0.02 };

/** Reads a sheet. Refuses what is neither a placing nor a layout. */
export function readSheet(path: string, wishes: SheetWishes, files: Files): Read<BankSheet> {
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const json = readJson(text.value, file);
  if (!json.ok) return json;
  const no = (read: string, want: string): Read<never> => refused({ code: "bad-sheet", place: { file }, read, want });
  const facts = json.value.value;
  if (!isFacts(facts)) return no("no object", SHEETS);
  const newest = Array.isArray(facts.groups) ? PLACING_VERSION : LAYOUT_VERSION;
  const place = { ...(json.value.placeOf("version") ?? { file }), field: "version" };
  const old = versionFault({ found: facts.version, newest, place });
  if (old !== null) return refused(old);
  const { series, parallel, ties } = facts;
  const whole = (n: unknown): n is number => Number.isInteger(n) && (n as number) >= 1 && (n as number) <= 1e6;
  if (!whole(series) || !whole(parallel)) return no(`no series and parallel from 1 in it`, SHEETS);
  if (ties !== "cross-tied" && ties !== "strings")
    return no(JSON.stringify(ties) ?? "nothing", "cross-tied or strings");
  const shape: Shape = { series, parallel, ties };
  return Array.isArray(facts.groups) ? fromPlacing(facts, shape, wishes, no) : fromLayout(facts, shape, wishes, no);
}

type No = (read: string, want: string) => Read<never>;
type Shape = Pick<BankSheet, "ties" | "series" | "parallel">;

const resistanceOf = (wish: SheetWishes["resistance"], sheet: number | null): number =>
  wish === "none" ? Number.POSITIVE_INFINITY : (wish ?? sheet ?? Number.POSITIVE_INFINITY);

function fromPlacing(facts: Facts, shape: Shape, wishes: SheetWishes, no: No): Read<BankSheet> {
  const { groups, units, bank } = facts;
  const count = shape.ties === "cross-tied" ? shape.series : shape.parallel;
  const size = shape.ties === "cross-tied" ? shape.parallel : shape.series;
  const lists = groups as readonly unknown[];
  const fits = lists.length === count && lists.every((g) => Array.isArray(g) && g.length === size);
  if (!fits) return no(`${lists.length} groups`, `${count} groups of ${size} serials`);
  if (!Array.isArray(units) || !isFacts(bank)) return no("a placing without units and bank", "the whole JSON of place");
  const bySerial = new Map<unknown, MeasuredUnit>();
  for (const unit of units)
    if (isFacts(unit) && numberOr(unit.capacitance) !== null) bySerial.set(unit.serial, unit as never);
  const stray = lists.flat().find((serial) => !bySerial.has(serial));
  if (stray !== undefined) return no(JSON.stringify(stray), "a serial among the sheet's units");
  const voltage = numberOr(bank.voltage);
  const leakageVoltage = numberOr(bank.leakageVoltage);
  const placed = lists.map((group) =>
    (group as string[]).map(
      (serial): MeasuredUnit => ({ ...(bySerial.get(serial) as MeasuredUnit), ...wishes.latest?.get(serial) }),
    ),
  );
  const known = leakageVoltage !== null && placed.flat().every((unit) => numberOr(unit.leakage) !== null);
  const at = leakageVoltage ?? 1;
  const filled = placed.map((group) =>
    group.map((unit) => (known ? unit : { ...unit, leakage: (unit.capacitance * at) / UNKNOWN_SECONDS })),
  );
  const resistance = resistanceOf(wishes.resistance, numberOr(bank.resistance));
  const u = numberOr(facts.uncertainty) ?? DOUBT.capacitance;
  return accepted({
    ...shape,
    chains: chainsOf({ groups: filled, ties: shape.ties, leakageVoltage: at, resistance }),
    groups: lists as readonly string[][],
    units: [...bySerial.values()],
    uncertainty: u,
    doubt: {
      ...DOUBT,
      capacitance: u / Math.sqrt(shape.ties === "cross-tied" ? shape.parallel : 1),
      leakage: known ? DOUBT.leakage : UNKNOWN_DOUBT,
      resistance: (numberOr(bank.resistanceTolerance) ?? 0.05) / Math.sqrt(3),
    },
    limit: wishes.limit ?? numberOr(bank.limit),
    voltage,
    polarised: bank.polarised !== false,
    notes: known ? [] : ["Leakage is not known: 10,000 s to empty is taken for every unit, with a wide doubt."],
  });
}

/** Nominal values alone: the tolerance of the units is the doubt. */
function fromLayout(facts: Facts, shape: Shape, wishes: SheetWishes, no: No): Read<BankSheet> {
  const { capacitance, share, balance } = facts;
  const bank = isFacts(capacitance) ? numberOr(capacitance.nominal) : null;
  if (bank === null || !isFacts(capacitance)) return no("no capacitance", SHEETS);
  const { series, parallel, ties } = shape;
  const low = numberOr(capacitance.low) ?? bank;
  const high = numberOr(capacitance.high) ?? bank;
  const unit = (bank * series) / parallel;
  const limit = wishes.limit ?? (isFacts(share) ? numberOr(share.limit) : null);
  const even = isFacts(share) ? numberOr(share.even) : null;
  const voltage = even === null ? null : even * series;
  const resistance = resistanceOf(wishes.resistance, isFacts(balance) ? numberOr(balance.resistance) : null);
  const leakageVoltage = limit ?? even ?? 1;
  const leakage = even === null ? (unit * leakageVoltage) / UNKNOWN_SECONDS : assumedLeakage(unit, leakageVoltage);
  const group = (length: number) => Array.from({ length }, () => ({ serial: "", capacitance: unit, leakage }));
  const cross = ties === "cross-tied";
  const groups = Array.from({ length: cross ? series : parallel }, () => group(cross ? parallel : series));
  const spread = Math.max((high - low) / (2 * bank * Math.sqrt(3)), DOUBT.capacitance);
  const tolerance = isFacts(balance) ? numberOr(balance.tolerance) : null;
  return accepted({
    ...shape,
    chains: chainsOf({ groups, ties, leakageVoltage, resistance }),
    groups: [],
    units: [],
    uncertainty: DOUBT.capacitance,
    doubt: {
      ...DOUBT,
      capacitance: spread / Math.sqrt(cross ? parallel : 1),
      leakage: UNKNOWN_DOUBT,
      resistance: (tolerance ?? 0.05) / Math.sqrt(3),
    },
    limit,
    voltage,
    polarised: true,
    notes: ["The sheet has no measured units: every unit is taken at nominal, and its tolerance is the doubt."],
  });
}
