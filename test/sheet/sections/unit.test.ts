import { describe, expect, test } from "vitest";
import { unitSection } from "../../../src/sheet/sections/unit.ts";
import { BARE, RATED, sheetInput, tableOf } from "../../support/sheet.ts";

const rows = (unit = RATED) =>
  new Map(tableOf({ sections: [unitSection(sheetInput({ unit }))] }, "unit").rows.map((row) => [row[0], row]));

describe("unitSection(input)", () => {
  test("stated, measured, assumed with its rule, unknown: each value has its state", () => {
    const states = { esr: { state: "measured" }, leakage: { state: "assumed", rule: "0.01 C V" } } as const;
    const found = rows({ ...RATED, states });
    expect(found.get("capacitance")).toEqual(["capacitance", "1 mF", "stated", ""]);
    expect(found.get("ESR")?.[2]).toBe("measured");
    expect(found.get("leakage current, greatest")?.[2]).toBe("assumed: 0.01 C V");
    expect(found.get("slew")).toEqual(["slew", null, "unknown", expect.stringMatching(/shot/)]);
  });

  test("a value that is not known is a blank that says what it blocks; what stands there blocks nothing", () => {
    for (const row of rows(BARE).values()) {
      if (row[1] === null && row[0] !== "maker")
        expect([row[0], row[3] !== "" || ["length", "mass"].includes(row[0] ?? "")]).toEqual([row[0], true]);
      else expect(row[3]).toBe("");
    }
    expect(rows(BARE).get("polarity")).toEqual(["polarity", null, "unknown", "whether reverse voltage spoils it"]);
    expect(rows({ ...BARE, polarised: false }).get("polarity")?.[1]).toBe("not polarised");
  });

  test("a can has no width, a box no diameter: only sizes of its own shape are asked for", () => {
    expect(rows(BARE).has("width")).toBe(false);
    expect(rows({ ...BARE, width: 0.03, length: 0.06, height: 0.05 }).has("diameter")).toBe(false);
    expect(rows({ ...BARE, note: "<b>three years in store" }).get("note")?.[1]).toBe("<b>three years in store");
  });
});
