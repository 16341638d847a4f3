import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { FINDINGS, findingFigures, titleOf, VERDICTS } from "../../src/cli/findingWords.ts";
import type { Finding } from "../../src/quantity/index.ts";
import { at } from "../support/fakePorts.ts";

const finding: Finding = {
  id: "charging-share",
  state: "charging",
  verdict: "pass",
  value: 323.72716,
  limit: 323.99999,
  margin: 0.00084,
  unit: "V",
  source: "s",
  note: "",
};

describe("FINDINGS", () => {
  test("every finding of a layout at rest has a title", () => {
    const source = ["sharing", "duty", "danger"]
      .map((what) => readFileSync(at(`src/search/${what}Findings.ts`), "utf8"))
      .join("\n");
    const ids = [...source.matchAll(/id: "([a-z-]+)"/g)].map((match) => match[1] as string);
    expect(ids.length).toBeGreaterThan(5);
    expect(ids.filter((id) => !(id in FINDINGS))).toEqual([]);
  });

  test("one without a title is still readable", () => {
    expect(titleOf("some-new-check")).toBe("some new check");
  });
});

describe("findingFigures(finding)", () => {
  test("against a most: the value rounds up, the limit down", () => {
    expect(findingFigures(finding)).toEqual({ value: "323.8 V", limit: "<= 323.9 V", margin: "0.084 %" });
  });

  test("against a least: the value rounds down, the limit up", () => {
    const least = { ...finding, id: "pulse-energy", unit: "J", value: 2468.49, limit: 2400.01 };
    expect(findingFigures(least)).toMatchObject({ value: "2.468 kJ", limit: ">= 2.401 kJ" });
  });

  test("a small chance is a power of ten, rounded up; a limit passed more than twice says how many times", () => {
    const chance = { ...finding, id: "charging-risk", unit: "1", value: 5.5961e-8, limit: 1e-4, margin: 0.999 };
    expect(findingFigures(chance)).toMatchObject({ value: "5.6e-8", limit: "<= 1e-4" });
    expect(findingFigures({ ...chance, value: 0 }).value).toBe("none found");
    expect(findingFigures({ ...finding, value: 1800, limit: 324, margin: (324 - 1800) / 324 }).margin).toBe("x 5.56");
    expect(findingFigures({ ...finding, value: 396, limit: 360, margin: -0.1 }).margin).toBe("-10 %");
  });

  test("unknown value or limit says so", () => {
    const open = { ...finding, value: null, limit: null, margin: null };
    expect(findingFigures(open)).toEqual({ value: "unknown", limit: "unknown", margin: "" });
  });
});

test("VERDICTS: four different words", () => {
  expect(new Set(Object.values(VERDICTS)).size).toBe(4);
});
