// Speed of reading, planning and ranking: ratios to the CSV library in one run, and the compute of one changed field.
import { spawnSync } from "node:child_process";
import { parse } from "csv-parse/sync";
import { readCapacitors } from "../../src/catalog/index.ts";
import { type Brief, plan, readBrief } from "../../src/search/index.ts";
import { bigCatalogue } from "../support/bigCatalogue.ts";
import { atMost, type BenchRow } from "./row.ts";

const brief = (over: object = {}): Brief => {
  const read = readBrief({ energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %", ...over });
  if (!read.ok) throw new Error("the bench's own brief is refused");
  return read.value;
};

const milliseconds = (work: () => unknown): number => {
  const begun = performance.now();
  work();
  return performance.now() - begun;
};

const median = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1] as number;

/** 100,000 rows: the library alone, then reading, then planning, taking turns; medians of the ratios of each turn. */
function largeRows(turns: number): readonly BenchRow[] {
  const text = bigCatalogue(100_000, 1);
  const all: number[] = [];
  const planning: number[] = [];
  for (let turn = 0; turn < turns; turn++) {
    const library = milliseconds(() => parse(text));
    let parts: Parameters<typeof plan>[0]["parts"] = [];
    const reading = milliseconds(() => {
      const read = readCapacitors(text, "big.csv");
      if (read.ok) parts = read.value.parts;
    });
    const planned = milliseconds(() => plan({ brief: brief(), parts }));
    all.push((reading + planned) / library);
    planning.push(planned / library);
  }
  return [
    {
      what: "100,000 rows: reading, planning and ranking, times csv-parse alone",
      value: median(all),
      promise: atMost(3),
    },
    {
      what: "100,000 rows: planning alone, times csv-parse alone",
      value: median(planning),
      promise: atMost(0.5),
    },
  ];
}

/** 1,000 parts: one field of the brief changes, the ranked list is made anew, as the form does it at every key. */
function changedField(): BenchRow {
  const read = readCapacitors(bigCatalogue(1000, 2), "small.csv");
  if (!read.ok) throw new Error("the bench's own catalogue is refused");
  const { parts } = read.value;
  const times = Array.from({ length: 41 }, (_, k) =>
    milliseconds(() => plan({ brief: brief({ energy: 2000 + 37 * k }), parts, quick: true })),
  );
  return {
    what: "1,000 parts: one field changed, new ranked list, median",
    value: median(times),
    unit: "ms",
    promise: atMost(16),
  };
}

/** Process time of the headless demo plan over a bare node plus what loading zod and commander adds to it. */
function startUp(): BenchRow {
  const time = (args: readonly string[]): number =>
    milliseconds(() => spawnSync(process.execPath, args, { stdio: "ignore" }));
  const works = {
    bare: ["--input-type=module", "-e", "await import('zod'); await import('commander')"],
    plan: ["dist/main.js", "plan", "catalogs/demo-brief.json", "--catalog", "catalogs/electrolytic.csv"],
  };
  const ratios = Array.from({ length: 9 }, () => time(works.plan) / time(works.bare));
  return {
    what: "headless plan of the demo, times node with zod and commander loaded",
    value: median(ratios),
    promise: atMost(2),
  };
}

export const benchSearch = (turns = 5): readonly BenchRow[] => [changedField(), ...largeRows(turns), startUp()];
