// What comes after the first frame, made of parts that were read.
import { expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { SHARED_WORDS, workshopOn } from "../../src/tui/workshop.ts";
import { BRIEF, CATALOGUE_FACTS, parts, STOCK } from "../support/stock.ts";

test("workshopOn(read, files): an engine that plans, the words of the commands, an order saved where it was said", () => {
  const written = new Map<string, string>();
  const files = {
    read: () => ({ ok: false as const, refusals: [] }),
    write: (path: string, text: string) => {
      written.set(path, text);
      return { ok: true as const, value: path };
    },
  };
  const { engine, stock, words, exportBill } = workshopOn(
    { parts: parts(), families: [DEFAULT_FAMILY], stock: STOCK, sources: CATALOGUE_FACTS.sources },
    files,
  );
  expect([stock, words]).toEqual([STOCK, SHARED_WORDS]);
  expect(words.titleOf("bleed")).toBe("time to touch-safe by bleeding");
  const brief = engine.readBrief(BRIEF);
  const layout = brief.ok
    ? engine.check(brief.value, { part: "flash-a", series: 7, parallel: 4, ties: "strings" })
    : null;
  const bill = brief.ok && layout !== null ? engine.bill(brief.value, layout) : null;
  if (bill === null) throw new Error("no bill");
  expect(exportBill(bill, "o.csv", false)).toEqual({ kind: "saved", path: "o.csv" });
  expect(written.get("o.csv")).toContain("flash-a");
});
