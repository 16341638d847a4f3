import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { headingsOf, tableKind } from "../../src/cli/kind.ts";
import { at } from "../support/fakePorts.ts";

test("tableKind(text): every shipped catalogue by its headings", () => {
  for (const name of readdirSync(at("catalogs")).filter((one) => one.endsWith(".csv"))) {
    const want = name === "resistors.csv" ? "resistors" : name === "fuses.csv" ? "fuses" : "capacitors";
    expect(tableKind(readFileSync(at(`catalogs/${name}`), "utf8")), name).toBe(want);
  }
  expect(tableKind(readFileSync(at("fixtures/units/lot-200.csv"), "utf8"))).toBe("measured units");
});

test("tableKind(text): JSON, nothing and nonsense", () => {
  expect(tableKind('\ufeff {"a": 1}')).toBe("json");
  expect(tableKind("")).toBe("capacitors");
  expect(tableKind("hello\nworld")).toBe("capacitors");
});

test("headingsOf(text): any separator, quotes and units off, a line without end bounded", () => {
  expect(headingsOf('"Part";Capacitance [uF]\tX\r\n1;2')).toEqual(["part", "capacitance", "x"]);
  expect(headingsOf("a".repeat(1e6))[0]?.length).toBe(20000);
});
