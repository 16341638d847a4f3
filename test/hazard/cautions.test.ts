// Cautions and deference: complete, printable, and called for by the right traits.
import { describe, expect, test } from "vitest";
import { CAUTIONS, cautionsFor, DEFERENCE } from "../../src/hazard/cautions.ts";

const ids = (traits: Parameters<typeof cautionsFor>[0]) => cautionsFor(traits).map((caution) => caution.id);
const standing = CAUTIONS.filter((caution) => caution.when === "always").map((caution) => caution.id);

describe("cautionsFor(traits)", () => {
  test("nothing known: all the standing ones, never none", () => {
    expect(ids({})).toEqual(standing);
    expect(standing).toEqual(
      expect.arrayContaining(["kills-when-off", "measure-then-short", "two-paths", "comes-back"]),
    );
  });
  test.each([
    ["seriesUnits", "ends-are-not-units"],
    ["polarised", "reverse"],
    ["arcBlast", "blast"],
    ["oilFilled", "old-oil"],
    ["homeMade", "home-made-air"],
    ["doubleLayer", "low-volts-burn"],
  ])("%s adds %s; false does not", (trait, id) => {
    expect(ids({ [trait]: true })).toEqual([...standing, id]);
    expect(ids({ [trait]: false })).toEqual(standing);
  });
});

test("every caution and deference has its own id, a short line of at most 78 plain characters and a longer text", () => {
  const all = [...CAUTIONS, ...DEFERENCE];
  expect(new Set(all.map((one) => one.id)).size).toBe(all.length);
  for (const one of all) {
    expect(one.short.length, one.short).toBeLessThanOrEqual(78);
    expect(one.short).toMatch(/^[ -~]+\.$/);
    expect(one.long.length).toBeGreaterThan(one.short.length);
  }
});

test("the standing cautions and the deference are these, by their ids", () => {
  expect(standing).toEqual(expect.arrayContaining(["eyes-and-ears", "not-alone"]));
  expect(DEFERENCE.map((one) => one.id)).toEqual(
    expect.arrayContaining(["not-approval", "rules-second-hand", "clearance-advice"]),
  );
});

test("deference names the standard, the data sheet and the person responsible", () => {
  const text = DEFERENCE.map((one) => one.long).join(" ");
  for (const word of ["standard", "data sheet", "responsible", "second hand", "memory"]) expect(text).toContain(word);
});
