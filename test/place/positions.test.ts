import { expect, test } from "vitest";
import { positionList } from "../../src/place/positions.ts";

const units = ["a", "b", "c", "d", "e"].map((serial, i) => ({ serial, capacitance: 1 + i }));

test("positionList: fitted in order of place with their share, then spares, set aside named; unknown is null", () => {
  const placed = {
    groups: [
      ["a", "d"],
      ["b", "c"],
    ],
    spares: ["e"],
    rejected: [],
  };
  const list = positionList(units, { ...placed, ties: "cross-tied" });
  expect(list.map(({ serial, group, place, use }) => [serial, group, place, use])).toEqual([
    ["a", 1, 1, "fitted"],
    ["d", 1, 2, "fitted"],
    ["b", 2, 1, "fitted"],
    ["c", 2, 2, "fitted"],
    ["e", null, null, "spare"],
  ]);
  expect(list.map((row) => row.share)).toEqual([0.5, 0.5, 0.5, 0.5, null]);
  expect(list[0]).toMatchObject({ leakage: null, esr: null, lot: null });
  const out = [{ serial: "e", quantity: "capacitance", value: 5, low: 0, high: 4 }] as const;
  expect(positionList(units, { ...placed, ties: "strings", rejected: out }).at(-1)?.use).toBe("set aside");
  expect(positionList(units, { ...placed, ties: "strings" })[0]?.share).toBeCloseTo(4 / 5, 12);
});
