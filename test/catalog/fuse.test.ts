// Fuses as sold: ratings in SI, blanks unknown.
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { describe, expect, test } from "vitest";
import { readFuses } from "../../src/catalog/fuse.ts";

describe("readFuses(text, file)", () => {
  test("heading only: no fuse, said", () => {
    const made = readFuses("fuse,current [A]\n", "f.csv");
    expect(made.ok && [made.value.fuses, made.value.notes.map((n) => n.code)]).toEqual([[], ["no-rows"]]);
  });
  test("without the name column nothing can be read", () => {
    const made = readFuses("current [A]\n1\n", "f.csv");
    expect(!made.ok && made.refusals[0]?.code).toBe("missing-heading");
  });
  test("catalogs/fuses.csv: nine, the first melts at 1.2 A2s; the last has no clearing action", () => {
    const made = readFuses(readFileSync(resolve(import.meta.dirname, "../../catalogs/fuses.csv"), "utf8"), "fuses.csv");
    if (!made.ok) throw new Error("unreadable");
    expect(made.value.faults).toEqual([]);
    expect(made.value.fuses.length).toBe(9);
    expect(made.value.fuses[0]).toMatchObject({ current: 2, voltage: 500, melting: 1.2, clearing: 9, price: 190 });
    expect(made.value.fuses.at(-1)?.clearing).toBe(undefined);
  });
  test("kA2s in a cell; a voltage in the action column is refused", () => {
    const made = readFuses("fuse,melting action [A2s]\na,5.2 kA2s\nb,500 V\n", "f.csv");
    expect(made.ok && made.value.fuses.map((f) => f.melting)).toEqual([5200]);
    expect(made.ok && made.value.faults.map((f) => `${f.code} ${f.place.line}`)).toEqual(["wrong-unit 3"]);
  });
  // Two rows of one name cannot both be ordered.
  test("a name that stands twice is told", () => {
    const made = readFuses("fuse,current [A]\na,1\na,2\n", "f.csv");
    expect(made.ok && made.value.faults.map((f) => f.code)).toEqual(["duplicate-part"]);
  });
});
