import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { readAnyTable } from "../../src/cli/readAnyTable.ts";
import { at } from "../support/fakePorts.ts";

const read = (path: string) => readAnyTable(readFileSync(at(path), "utf8"), path);

describe("readAnyTable(text, file)", () => {
  test("each kind to its reader", () => {
    for (const [path, kind] of [
      ["catalogs/electrolytic.csv", "capacitors"],
      ["catalogs/resistors.csv", "resistors"],
      ["catalogs/fuses.csv", "fuses"],
      ["fixtures/units/lot-200.csv", "measured units"],
    ] as const) {
      const table = read(path);
      expect(table.ok && table.value.kind).toBe(kind);
      expect(table.ok && table.value.count).toBeGreaterThan(5);
      if (table.ok) expect(table.value.row(0).name).not.toBe("");
    }
  });

  test("a resistor's range and tolerance, a fuse's unknown clearing action", () => {
    const resistors = read("catalogs/resistors.csv");
    const texts = resistors.ok ? resistors.value.row(0).values.map((value) => `${value.heading} ${value.text}`) : [];
    expect(texts).toEqual(
      expect.arrayContaining(["lowest 1 ohm", "highest 10 Mohm", "tolerance +-5 %", "power 250 mW"]),
    );
    const fuses = read("catalogs/fuses.csv");
    const last = fuses.ok ? fuses.value.row(fuses.value.count - 1).values : [];
    expect(last.find((value) => value.key === "clearing")?.state).toBe("unknown");
  });

  test("JSON and nothing are refused", () => {
    const codes = [readAnyTable("{}", "a"), readAnyTable("", "a")].map((one) => (one.ok ? "" : one.refusals[0]?.code));
    expect(codes).toEqual(["wrong-kind", "empty-file"]);
  });
});
