// The engine behind the screens against the search itself.
import { describe, expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { accepted, refused } from "../../src/quantity/index.ts";
import { plan, readBrief } from "../../src/search/index.ts";
import { arrangementNamed, catalogEngine } from "../../src/tui/catalogEngine.ts";
import { BRIEF, engine, parts } from "../support/stock.ts";

const brief = (() => {
  const read = readBrief(BRIEF);
  if (!read.ok) throw new Error("brief");
  return read.value;
})();
const all = plan({ brief, parts: parts(), families: [DEFAULT_FAMILY], limit: 0 });
if (!all.ok) throw new Error("plan");
const request = { rank: "cost", most: 70, frontOnly: false, quick: true } as const;

describe("plan(brief, request)", () => {
  test("lists the search's own layouts in its order, at most as many as asked", () => {
    const planned = engine.plan(brief, request);
    expect(planned.ok && planned.value.layouts.map((l) => l.id)).toEqual(
      all.value.layouts.slice(0, 70).map((l) => l.id),
    );
  });
  test("only the unbeaten: exactly the front, each as the search assesses it", () => {
    const planned = engine.plan(brief, { ...request, frontOnly: true });
    const byId = new Map(all.value.layouts.map((l) => [l.id, l]));
    expect(planned.ok && planned.value.layouts).toEqual(all.value.front.map((id) => byId.get(id)));
  });
  test("two currencies without a rate are refused", () => {
    const mixed = parts().map((unit, i) => (i === 0 ? { ...unit, currency: "USD" } : unit));
    const planned = catalogEngine({ parts: mixed, families: [DEFAULT_FAMILY] }).plan(brief, request);
    expect(!planned.ok && planned.refusals.map((r) => r.code)).toEqual(["two-currencies"]);
  });
});

describe("check(brief, arrangement), bill(brief, layout)", () => {
  test("check gives the layout that the plan gives", () => {
    const [first] = all.value.layouts;
    if (first === undefined) throw new Error("no layout");
    expect(engine.check(brief, first)).toEqual(first);
    expect(engine.check(brief, { ...first, part: "gone" })).toBeNull();
  });
  test("the bill counts the layout's own units and spends what the layout says, without the lines that have no price", () => {
    for (const layout of all.value.layouts.slice(0, 30)) {
      const bill = engine.bill(brief, layout);
      const units = bill?.lines.find(({ line }) => line === "units");
      expect([bill?.layout, units?.needed]).toEqual([layout.id, layout.units]);
      expect(units?.purchase ?? null).toBe(layout.cost?.capacitors ?? null);
      const resistors = bill?.lines.find(({ line }) => line === "balancing resistors");
      const count = layout.balance === null ? undefined : layout.balance.positions * layout.balance.elements;
      expect(resistors?.needed).toBe(count);
      expect(bill?.totals.purchase ?? null).toBe(layout.cost?.capacitors ?? null);
      expect(bill?.cautions.join(" ")).toContain("can kill");
    }
  });
  test("of a part that the catalogue does not have there is none", () => {
    const [first] = all.value.layouts;
    if (first === undefined) throw new Error("no layout");
    expect(engine.bill(brief, { ...first, part: "gone" })).toBeNull();
  });
});

test.each([
  ["a 6s10p cross-tied", { part: "a", series: 6, parallel: 10, ties: "cross-tied" }],
  ["a 6s10p strings 2s1p strings", { part: "a 6s10p strings", series: 2, parallel: 1, ties: "strings" }],
  ["a\nb 1s1p strings", { part: "a\nb", series: 1, parallel: 1, ties: "strings" }],
  ["a 6s10p", null],
])("arrangementNamed(%j)", (id, want) => {
  expect(arrangementNamed(id)).toEqual(want);
});

describe("readBrief(values) with files", () => {
  const files = {
    read: (path: string) =>
      path === "shot.csv"
        ? accepted("time [ms],current [A]\n0,0\n1,100\n2,0\n")
        : refused({ code: "no-file", place: { file: path }, read: path, want: "a file that can be read" }),
  };
  const own = catalogEngine({ parts: parts(), families: [DEFAULT_FAMILY], files });

  test("a recorded current named on the form is read, and its shot is reckoned", () => {
    const values = { ...BRIEF, load: { recorded: "shot.csv" } };
    const found = own.readBrief(values);
    expect(found.ok && found.value.load?.recorded).toEqual([
      [0, 0],
      [0.001, 100],
      [0.002, 0],
    ]);
    const planned = found.ok ? own.plan(found.value, request) : found;
    const first = planned.ok ? planned.value.layouts[0] : undefined;
    const shot = found.ok && first ? own.shot(found.value, first) : null;
    expect(shot?.report.ok && shot.report.value.discharge.peakCurrent).toBe(100);
  });

  test("a file that is not there is refused at its field; without files at all the path stays unread", () => {
    const found = own.readBrief({ ...BRIEF, load: { recorded: "gone.csv" } });
    expect(found.ok ? [] : found.refusals.map(({ place }) => place.field)).toEqual(["load.recorded"]);
    expect(engine.readBrief({ ...BRIEF, load: { recorded: "gone.csv" } }).ok).toBe(true);
  });
});
