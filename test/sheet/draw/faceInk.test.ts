import { describe, expect, test } from "vitest";
import { countsOf } from "../../../src/order/index.ts";
import { cellWidth, faceInk, farNode, potentialWords, spareInk } from "../../../src/sheet/draw/faceInk.ts";
import { facePieces } from "../../../src/sheet/draw/facePlan.ts";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { faceOf } from "../../support/faces.ts";

const inkOf = (change: Parameters<typeof faceOf>[0]) => {
  const props = faceOf(change);
  return together(facePieces(props).flatMap((piece) => faceInk(props, piece).inks));
};

describe("faceInk(props, piece)", () => {
  test("a cell to each position, and as many stick points as the order counts", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const ink = inkOf({ ties });
      expect(countOf(ink, "cell")).toBe(12);
      expect(ink.sticks).toHaveLength(countsOf({ series: 4, parallel: 3, ties }).stickPoints);
    }
  });

  test("bars are at every potential that units share: all when cross-tied, the two ends of strings", () => {
    expect(inkOf({ ties: "cross-tied" }).rails).toHaveLength(5);
    expect(inkOf({ ties: "strings" }).rails).toHaveLength(2);
  });

  test("each position tells its potential, each bar its own", () => {
    const words = inkOf({ ties: "cross-tied" }).words.map(({ text }) => text);
    expect(words.filter((text) => text === "1.6 kV")).toHaveLength(3 + 1);
    expect(words.filter((text) => text === "400 V")).toHaveLength(3 + 1);
    expect(words).toEqual(expect.arrayContaining(["TP0", "0 V", "TP4"]));
  });
});

test("farNode(props, row), potentialWords(props, node): of the terminal further from earth, a blank or words where not fixed", () => {
  const up = faceOf({ earth: "positive" });
  expect(potentialWords(up, farNode(up, 1))).toBe("-1.6 kV");
  expect(potentialWords(up, farNode(up, 4))).toBe("-400 V");
  expect(potentialWords(faceOf(), farNode(faceOf(), 4))).toBe("1.6 kV");
  expect(potentialWords(faceOf({ earth: "none" }), 2)).toBe("floats");
  expect(potentialWords(faceOf({ earth: "unknown" }), 2)).toBe("________ V");
  expect(potentialWords(faceOf({ chargeVoltage: null }), 2)).toBe("________ V");
});

test("spareInk(spares, first, columns): numbered on, in rows", () => {
  const ink = together(spareInk(["A", null, "C"], 9, 2).inks);
  expect(countOf(ink, "spare")).toBe(3);
  expect(ink.words.map(({ text }) => text)).toEqual(expect.arrayContaining(["S9", "S10", "S11", "A", "C"]));
  expect(ink.boxes[2]!.y).toBeGreaterThan(ink.boxes[1]!.y);
});

test("cellWidth(columns): wide where there is room, and never over the page", () => {
  expect(cellWidth(1)).toBe(cellWidth(2));
  expect(46 + 8 * cellWidth(8)).toBeLessThanOrEqual(510);
});
