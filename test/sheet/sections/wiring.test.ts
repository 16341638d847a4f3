import { Matrix, solve } from "ml-matrix";
import { describe, expect, test } from "vitest";
import { chargingShares } from "../../../src/bank/index.ts";
import { sectionWords, shotSection } from "../../../src/order/index.ts";
import { chainsOf } from "../../../src/place/index.ts";
import { parseQuantity } from "../../../src/quantity/index.ts";
import { type SheetInput, sheetOf, sheetText } from "../../../src/sheet/index.ts";
import { wiringSection } from "../../../src/sheet/sections/wiring.ts";
import { LOAD, placedIn, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

/** A part between two nodes, as it is read back from the paper. */
interface Part {
  readonly name: string;
  readonly a: string;
  readonly b: string;
  readonly value: number;
}

/** Rows of one table of the printed page, by its id. Nothing of the program but its HTML is used. */
function printedRows(html: string, id: string): readonly (readonly string[])[] {
  const table = new RegExp(`<table id="t-${id}">([\\s\\S]*?)</table>`).exec(html)?.[1] ?? "";
  const body = table.slice(table.indexOf("<tbody>"));
  return [...body.matchAll(/<tr>([\s\S]*?)<\/tr>/g)].map((row) =>
    [...(row[1] ?? "").matchAll(/<t[hd][^>]*?(?:\/>|>([\s\S]*?)<\/t[hd]>)/g)].map((cell) => cell[1] ?? ""),
  );
}

const quantity = (text: string, dimension: "capacitance" | "resistance"): number => {
  const read = parseQuantity(text, dimension);
  if (!read.ok) throw new Error(text);
  return read.value;
};

/** Joints to parts: terminals that are joined are one node; a part is what has two terminals of one name. */
function partsOf(html: string, kind: RegExp, readValue: (name: string) => number): readonly Part[] {
  const parent = new Map<string, string>();
  const find = (x: string): string => {
    let at = x;
    while ((parent.get(at) ?? at) !== at) at = parent.get(at) as string;
    return at;
  };
  const ends = new Map<string, Map<string, string>>();
  for (const [from, to] of printedRows(html, "wiring")) {
    parent.set(find(from as string), find(to as string));
    for (const end of [from, to] as string[]) {
      const terminal = /^(.+) ([-+ab])$/.exec(end);
      if (!terminal) continue;
      const [, name, side] = terminal as unknown as [string, string, string];
      ends.set(name, (ends.get(name) ?? new Map()).set(side, end));
    }
  }
  return [...ends].flatMap(([name, sides]) => {
    if (!kind.test(name)) return [];
    const low = sides.get("-") ?? sides.get("a");
    const high = sides.get("+") ?? sides.get("b");
    if (low === undefined || high === undefined) throw new Error(`${name} hangs by one end`);
    return [{ name, a: find(low), b: find(high), value: readValue(name) }];
  });
}

/** Node voltages of a net of conductances between two nodes held 1 V apart, by elimination; and what flows between them. */
function solved(parts: readonly Part[], ends: { readonly low: string; readonly high: string }) {
  const nodes = [...new Set(parts.flatMap(({ a, b }) => [a, b]))].filter((n) => n !== ends.low && n !== ends.high);
  const at = new Map(nodes.map((node, i) => [node, i]));
  const size = nodes.length;
  const matrix = Matrix.zeros(Math.max(size, 1), Math.max(size, 1));
  const right = Matrix.zeros(Math.max(size, 1), 1);
  for (const { a, b, value } of parts)
    for (const [here, there] of [
      [a, b],
      [b, a],
    ] as const) {
      const i = at.get(here);
      if (i === undefined) continue;
      matrix.set(i, i, matrix.get(i, i) + value);
      const j = at.get(there);
      if (j !== undefined) matrix.set(i, j, matrix.get(i, j) - value);
      else if (there === ends.high) right.set(i, 0, right.get(i, 0) + value);
    }
  const found = size === 0 ? null : solve(matrix, right);
  const volts = (node: string): number =>
    node === ends.low ? 0 : node === ends.high ? 1 : (found?.get(at.get(node) as number, 0) as number);
  const through = parts.reduce((sum, { a, b, value }) => {
    if (a === ends.high || b === ends.high) return sum + value * (1 - volts(a === ends.high ? b : a));
    return sum;
  }, 0);
  return { across: ({ a, b }: Part) => Math.abs(volts(b) - volts(a)), through };
}

/** The node of a bar, found again through a unit's terminal that is known to stand on it. */
const endsOf = (parts: readonly Part[], { layout }: SheetInput) => {
  const { series, parallel, ties } = layout;
  const last = ties === "cross-tied" ? `C${series}.${parallel}` : `C${parallel}.${series}`;
  const low = parts.find(({ name }) => name === "C1.1")?.a as string;
  return { low, high: parts.find(({ name }) => name === last)?.b as string };
};

const SHAPES = [
  { series: 1, parallel: 1, ties: "strings" },
  { series: 1, parallel: 3, ties: "strings" },
  { series: 4, parallel: 1, ties: "strings" },
  { series: 8, parallel: 2, ties: "cross-tied" },
  { series: 8, parallel: 2, ties: "strings" },
  { series: 5, parallel: 4, ties: "cross-tied" },
] as const;

const inputOf = (shape: (typeof SHAPES)[number]): SheetInput =>
  sheetInput({
    shape,
    brief: shape.series === 1 ? { voltage: "300 V", energy: "10 J" } : { voltage: `${250 * shape.series} V` },
  });

describe("wiringSection(input), the printed list read back as a graph", () => {
  test.each(SHAPES)(
    "nominal units: the bank's capacitance and even stages, $series in series $parallel in parallel, $ties",
    (shape) => {
      const input = inputOf(shape);
      const html = sheetText(sheetOf(input), "html");
      const each = printedRows(html, "unit").find(([label]) => label === "capacitance")?.[1] as string;
      const parts = partsOf(html, /^C\d/, () => quantity(each, "capacitance"));
      expect(parts).toHaveLength(shape.series * shape.parallel);
      const { through, across } = solved(parts, endsOf(parts, input));
      expect(through / input.layout.capacitance.nominal).toBeCloseTo(1, 9);
      for (const part of parts) expect(across(part) * input.brief.voltage).toBeCloseTo(input.layout.share.even, 6);
    },
  );

  test.each(SHAPES)("measured units in place: every voltage of the charge, $series x $parallel $ties", (shape) => {
    const bare = inputOf(shape);
    const input = { ...bare, placed: placedIn(bare) };
    const html = sheetText(sheetOf(input), "html");
    const capacitances = new Map(
      printedRows(html, "places").map((row) => [row[0], quantity(row[2] as string, "capacitance")]),
    );
    const parts = partsOf(html, /^C\d/, (name) => capacitances.get(name) as number);
    const { across } = solved(parts, endsOf(parts, input));
    const units = input.placed.groups.map((group) =>
      group.map((serial) => ({
        serial,
        capacitance: input.placed.positions.find((p) => p.serial === serial)!.capacitance,
      })),
    );
    const chains = chainsOf({
      groups: units,
      ties: shape.ties,
      leakageVoltage: 1,
      resistance: Number.POSITIVE_INFINITY,
    });
    for (const part of parts) {
      const [group, place] = /(\d+)\.(\d+)/.exec(part.name)!.slice(1).map(Number) as [number, number];
      const chain = chains[shape.ties === "cross-tied" ? 0 : group - 1]!;
      const share = chargingShares(chain)[(shape.ties === "cross-tied" ? group : place) - 1]!;
      // Seven figures are printed.
      expect(across(part) / share).toBeCloseTo(1, 5);
    }
  });

  test.each(SHAPES.filter(({ series }) => series > 1))(
    "balancing resistors: even stages after an endless hold, n R/chains across the ends, $series x $parallel $ties",
    (shape) => {
      const input = inputOf(shape);
      const html = sheetText(sheetOf(input), "html");
      const balance = input.layout.balance!;
      const value = printedRows(html, "resistors")
        .find(([name]) => name?.startsWith("balancing"))?.[2]
        ?.split(" +-")[0] as string;
      const elements = Number(/(\d+) in series in each/.exec(html)?.[1]);
      const parts = partsOf(html, /^RB/, () => 1 / (elements * quantity(value, "resistance")));
      expect(parts).toHaveLength(balance.positions);
      const units = partsOf(html, /^C\d/, () => 1);
      const { through, across } = solved(parts, endsOf(units, input));
      const chains = balance.positions / shape.series;
      expect(1 / through / ((shape.series * balance.resistance) / chains)).toBeCloseTo(1, 3);
      for (const part of parts) expect(across(part) * shape.series).toBeCloseTo(1, 9);
      // The resistors stand across the same places as the units whose voltage they even out.
      const pairs = new Set(units.map(({ a, b }) => `${a} ${b}`));
      for (const { a, b } of parts) expect(pairs.has(`${a} ${b}`)).toBe(true);
    },
  );
});

describe("wiringSection(input)", () => {
  test("joints of every bar are counted from the list; lengths follow from the unit's size alone", () => {
    const section = wiringSection(sheetInput());
    const bars = tableOf({ sections: [section] }, "bars");
    const wires = tableOf({ sections: [section] }, "wiring");
    const ends = wires.rows.flatMap((row) => row.slice(0, 2));
    for (const row of bars.rows) expect(Number(row[2])).toBe(ends.filter((end) => end === row[0]).length);
    expect(bars.rows[0]).toEqual(["TP0", "negative end", expect.any(String), null, "at least 70 mm", null]);
    const { diameter: _, ...sizeless } = sheetInput().unit;
    expect(tableOf({ sections: [wiringSection(sheetInput({ unit: sizeless }))] }, "bars").rows[0]?.[4]).toBeNull();
  });

  test("length, lug, torque and initials are blanks on every row, and it is said what they block", () => {
    const section = wiringSection(sheetInput({ brief: LOAD }));
    const { rows } = tableOf({ sections: [section] }, "wiring");
    expect(rows.every((row) => row.slice(3).every((cell) => cell === null))).toBe(true);
    expect(wordsIn(section)).toMatch(/without it no joint is signed off/);
    // The same section as on the order.
    const input = sheetInput({ brief: LOAD });
    const order = sectionWords(shotSection(input) ?? Number.NaN);
    expect(rows.find((row) => row[0] === "S1 b")?.[2]).toBe(order);
    expect(tableOf({ sections: [section] }, "bars").rows[0]?.[3]).toBe(order);
    expect(wordsIn(wiringSection(sheetInput()))).toMatch(/no action integral is known without a load/);
  });

  test("without a fuse chosen it is said that none stands in the list; with one they do", () => {
    expect(wordsIn(wiringSection(sheetInput()))).toMatch(/No fuse stands in this list: none is chosen/);
  });
});
