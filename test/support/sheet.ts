// Inputs of a build sheet: a small bank with every figure by hand, one about which nothing is known, and a large one.
import type { Capacitor } from "../../src/catalog/index.ts";
import { positionList } from "../../src/place/index.ts";
import { type AssessInput, type Brief, faultsOf, type ShotReport, shotOf } from "../../src/search/index.ts";
import type { PlacedUnits, Sheet, SheetInput, Table } from "../../src/sheet/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "./bank.ts";

export const LOAD = { load: { resistance: "0.9 ohm", inductance: "25 uH" } };

/** The small bank's unit with what a shot and a fault want to know. */
export const RATED: Capacitor = {
  ...UNIT,
  esr: 0.05,
  esl: 20e-9,
  peakCurrent: 3000,
  reversal: 0.1,
  ruptureEnergy: 500,
  ratedShots: 10000,
};

export const WORDS: SheetInput["words"] = {
  asked: [
    { label: "energy of one pulse", value: "500 J", given: true },
    { label: "derating", value: "90 %", given: false },
  ],
  findings: [
    {
      title: "worst unit while charging",
      verdict: "pass",
      value: "321 V",
      limit: "<= 360 V",
      margin: "10.8 %",
      source: "joulewright-design",
      note: "One low among high.",
    },
  ],
  cautions: [
    { id: "kills-when-off", text: "A charged bank can kill." },
    { id: "two-paths", text: "Two ways to discharge." },
    { id: "not-approval", text: "This is a calculation." },
    { id: "local-codes", text: "Follow the codes in force." },
  ],
  notes: [],
  charger: null,
  switch: null,
  load: null,
};

export interface SheetWishes extends Partial<Omit<SheetInput, "layout" | "brief">> {
  readonly brief?: Readonly<Record<string, unknown>>;
  readonly shape?: Partial<AssessInput["layout"]>;
}

/** The small bank, 8s2p cross-tied of 1000 uF units at 2 kV, with what is laid over it. */
export function sheetInput({ brief: keys = {}, shape = {}, unit = RATED, ...rest }: SheetWishes = {}): SheetInput {
  const brief: Brief = briefOf(keys);
  const layout = bankOf({
    unit,
    brief,
    layout: { part: unit.part, series: 8, parallel: 2, ties: "cross-tied", ...shape },
  });
  const fired = brief.load === undefined ? null : shotOf({ layout, unit, brief });
  const shot: ShotReport | null = fired?.ok ? fired.value : null;
  return {
    layout,
    unit,
    brief,
    families: FAMILIES,
    currency: "EUR",
    words: WORDS,
    shot,
    shotOpen: shot === null ? (fired === null ? "no load is in the brief" : "the load has no bound") : null,
    faults: shot?.faults ?? faultsOf({ result: layout, unit, brief }),
    fuse: null,
    alternatives: null,
    alternativesOpen: "none were searched",
    placed: null,
    rule: null,
    earth: "negative",
    date: null,
    revision: null,
    program: "joulewright test",
    ...rest,
  };
}

/** A unit of which only capacitance and rating are known. */
export const BARE: Capacitor = { part: "bare", capacitance: 1e-3, voltage: 400, states: {}, file: "bare.csv", line: 2 };

/** 20s40p with every chart. */
export const largeInput = (ties: "cross-tied" | "strings" = "cross-tied"): SheetInput =>
  sheetInput({
    shape: { series: 20, parallel: 40, ties },
    brief: { voltage: "5 kV", energy: "20 kJ", dumpResistance: "200 ohm", ...LOAD },
  });

/** Measured units in the places of a shape: serial s001 and on, 1000 uF with a spread that is written out. */
export function placedIn({ layout }: Pick<SheetInput, "layout">): PlacedUnits {
  const { series, parallel, ties } = layout;
  const [count, size] = ties === "cross-tied" ? [series, parallel] : [parallel, series];
  const units = Array.from({ length: count * size + 2 }, (_, i) => ({
    serial: `s${String(i + 1).padStart(3, "0")}`,
    capacitance: 1e-3 * (1 + (((i * 7919) % 41) - 20) / 200),
    leakage: 1e-5 * (i + 1),
  }));
  const groups = Array.from({ length: count }, (_, g) =>
    units.slice(g * size, (g + 1) * size).map(({ serial }) => serial),
  );
  const spares = units.slice(count * size).map(({ serial }) => serial);
  return {
    positions: positionList(units, { ties, groups, spares, rejected: [] }),
    groups,
    spares,
    plusMinus: 0.004,
    holding: 260,
  };
}

/** The table of that id; an error when the sheet has none. */
export function tableOf(sheet: Pick<Sheet, "sections">, id: string): Table {
  const found = sheet.sections
    .flatMap(({ blocks }) => blocks)
    .find((block) => block.kind === "table" && block.id === id);
  if (found?.kind !== "table") throw new Error(`no table ${id}`);
  return found;
}

/** Every word of a section's texts, lists and cells. */
export const wordsIn = (section: Sheet["sections"][number]): string =>
  section.blocks
    .map((block) => {
      if (block.kind === "text") return block.text;
      if (block.kind === "list") return block.items.join(" ");
      if (block.kind === "drawing") return block.words;
      return block.rows.map((row) => row.map((cell) => cell ?? "______").join(" | ")).join("\n");
    })
    .join("\n");

/** The family of the small bank with a pulse rating. */
export const FAMILIES_KNOWN = FAMILIES.map((family) => ({ ...family, pulseEnergy: 8 }));
