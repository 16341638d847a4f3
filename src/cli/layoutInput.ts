// The one layout that a command is about: from flags, or from a file that holds one element of a plan's layouts.

import { type Layout, plainTies, type Ties } from "../bank/index.ts";
import {
  accepted,
  parseQuantity,
  parseTolerance,
  type Read,
  type Refusal,
  refused,
  versionFault,
} from "../quantity/index.ts";
import type { BalanceWish } from "../search/index.ts";
import type { Files } from "./files.ts";
import { readJson } from "./jsonText.ts";

export interface LayoutFlags {
  readonly part?: string;
  readonly series?: string;
  readonly parallel?: string;
  readonly ties?: string;
  readonly layout?: string;
  readonly balance?: string;
  readonly balanceTolerance?: string;
}

export interface LayoutInput {
  readonly layout: Layout;
  /** What the flags say of the balancing resistor; null when they say nothing. */
  readonly balance: BalanceWish | null;
  /** Resistor that the file's layout has: null for none; undefined when there is no file. */
  readonly filed: FiledBalance | null | undefined;
}

export interface FiledBalance {
  readonly resistance: number;
  readonly tolerance: number;
  readonly family: string | null;
  /** It came from the assumed family: nobody decided for it. */
  readonly assumed: boolean;
}

const MOST = 1e6;
/** Most in series or in parallel. */
export const MOST_COUNT = MOST;
/** Version of a layout in JSON, as plan and check write it. */
export const LAYOUT_VERSION = 1;
const refuse = (code: string, field: string, read: string, want: string): Refusal => ({
  code,
  place: { field },
  read,
  want,
});

/** Reads the layout. `defaultTolerance` is that of a fixed resistor whose tolerance is not given. */
export function readLayout(flags: LayoutFlags, files: Files, defaultTolerance: number): Read<LayoutInput> {
  const balance = readBalance(flags, defaultTolerance);
  if (!balance.ok) return balance;
  if (flags.layout === undefined) {
    const layout = fromFlags(flags);
    return layout.ok ? accepted({ layout: layout.value, balance: balance.value, filed: undefined }) : layout;
  }
  const extra = (["part", "series", "parallel", "ties"] as const).filter((name) => flags[name] !== undefined);
  if (extra.length > 0) {
    const want = "either --layout or --part, --series, --parallel, --ties";
    return refused(refuse("contradiction", "--layout", `also --${extra.join(", --")}`, want));
  }
  const filed = fromFile(flags.layout, files);
  return filed.ok ? accepted({ ...filed.value, balance: balance.value }) : filed;
}

function readBalance({ balance, balanceTolerance }: LayoutFlags, defaultTolerance: number): Read<BalanceWish | null> {
  const none = balance?.trim().toLowerCase() === "none";
  if (balanceTolerance !== undefined && (balance === undefined || none)) {
    const want = "--balance with a resistance beside it";
    return refused(refuse("missing-option", "--balance-tolerance", balanceTolerance, want));
  }
  if (balance === undefined) return accepted(null);
  if (none) return accepted({ kind: "none" });
  const resistance = parseQuantity(balance, "resistance");
  if (!resistance.ok || !(resistance.value > 0))
    return refused(
      refuse("bad-balance", "--balance", JSON.stringify(balance), 'a resistance such as "24 kohm", or none'),
    );
  if (balanceTolerance === undefined)
    return accepted({ kind: "fixed", resistance: resistance.value, tolerance: defaultTolerance });
  const tolerance = parseTolerance(balanceTolerance, null);
  if (!tolerance.ok)
    return refused(...tolerance.refusals.map((r) => ({ ...r, place: { field: "--balance-tolerance" } })));
  const widest = Math.max(tolerance.value.low, tolerance.value.high);
  if (widest >= 1)
    return refused(refuse("tolerance-range", "--balance-tolerance", balanceTolerance, "a tolerance below 100 %"));
  return accepted({ kind: "fixed", resistance: resistance.value, tolerance: widest });
}

const isTies = (text: unknown): text is Ties => text === "cross-tied" || text === "strings";

function fromFlags(flags: LayoutFlags): Read<Layout> {
  const part = flags.part ?? "";
  const missing = refuse("missing-option", "--part", "nothing", "the name of a part of the catalogues");
  const shape = readShape(flags);
  if (part === "") return refused(missing, ...(shape.ok ? [] : shape.refusals));
  return shape.ok ? accepted(plainTies({ part, ...shape.value })) : shape;
}

/** Series, parallel and ties from the flags, as they were asked for. */
export function readShape(flags: LayoutFlags): Read<Omit<Layout, "part">> {
  const faults: Refusal[] = [];
  const count = (name: "series" | "parallel"): number => {
    const text = flags[name];
    const value = text !== undefined && /^\d+$/.test(text.trim()) ? Number(text) : Number.NaN;
    const want = `a whole number from 1 to ${MOST}`;
    if (text === undefined) faults.push(refuse("missing-option", `--${name}`, "nothing", want));
    else if (!(value >= 1 && value <= MOST)) faults.push(refuse("bad-count", `--${name}`, JSON.stringify(text), want));
    return value;
  };
  const series = count("series");
  const parallel = count("parallel");
  const alone = series === 1 || parallel === 1;
  const ties = flags.ties ?? (alone ? "strings" : undefined);
  const words = "cross-tied or strings";
  if (ties === undefined) faults.push(refuse("missing-option", "--ties", "nothing", words));
  else if (!isTies(ties)) faults.push(refuse("bad-choice", "--ties", JSON.stringify(ties), words));
  return faults.length > 0 || !isTies(ties) ? refused(...faults) : accepted({ series, parallel, ties });
}

function fromFile(path: string, files: Files): Read<Omit<LayoutInput, "balance">> {
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const json = readJson(text.value, file);
  if (!json.ok) return json;
  const no = (read: string, want: string, field?: string): Read<never> => {
    const place = (field === undefined ? undefined : json.value.placeOf(field)) ?? { file };
    return refused({ code: "bad-layout", place: field === undefined ? place : { ...place, field }, read, want });
  };
  const value = json.value.value as Readonly<Record<string, unknown>> | null;
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return no("no object", "one element of a plan's layouts");
  if (Array.isArray(value.layouts)) return no("a whole plan", "one element of its layouts");
  const old = versionFault({
    found: value.version,
    newest: LAYOUT_VERSION,
    place: { ...(json.value.placeOf("version") ?? { file }), field: "version" },
  });
  if (old !== null) return refused(old);
  const { part, ties, balance } = value;
  for (const key of ["series", "parallel"]) {
    const n = value[key];
    if (!Number.isInteger(n) || (n as number) < 1 || (n as number) > MOST)
      return no(JSON.stringify(n) ?? "nothing", `a whole number from 1 to ${MOST}`, key);
  }
  if (typeof part !== "string" || part === "")
    return no(JSON.stringify(part) ?? "nothing", "the name of a part", "part");
  if (!isTies(ties)) return no(JSON.stringify(ties) ?? "nothing", "cross-tied or strings", "ties");
  const layout = plainTies({ part, series: value.series as number, parallel: value.parallel as number, ties });
  if (balance === undefined) return accepted({ layout, filed: undefined });
  if (balance === null) return accepted({ layout, filed: null });
  const { resistance, tolerance, family, assumed } = balance as Readonly<Record<string, unknown>>;
  const good =
    typeof resistance === "number" &&
    resistance > 0 &&
    typeof tolerance === "number" &&
    tolerance >= 0 &&
    tolerance < 1;
  if (!good) return no(JSON.stringify(balance), "a balance with resistance and tolerance, or null", "balance");
  return accepted({
    layout,
    filed: { resistance, tolerance, family: typeof family === "string" ? family : null, assumed: assumed === true },
  });
}
