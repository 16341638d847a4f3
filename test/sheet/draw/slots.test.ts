import { describe, expect, test } from "vitest";
import { foldText, foldWords, hidden, piecesOf, slotsBetween, slotsOf } from "../../../src/sheet/draw/slots.ts";
import fc from "../../support/property.ts";

describe("slotsOf(count, most)", () => {
  test("all where they fit; the first two, a fold and the last; the first, a fold and the last in little room", () => {
    expect(slotsOf(1, 0)).toEqual(slotsBetween(1, 1));
    expect(slotsOf(2, 1)).toEqual(slotsBetween(1, 2));
    expect(slotsOf(5, 5)).toEqual(slotsBetween(1, 5));
    expect(slotsOf(40, 4)).toEqual([...slotsBetween(1, 2), { kind: "fold", from: 3, to: 39 }, ...slotsBetween(40, 40)]);
    expect(slotsOf(3, 2)).toEqual([...slotsBetween(1, 1), { kind: "fold", from: 2, to: 2 }, ...slotsBetween(3, 3)]);
  });

  test("drawn and hidden add up, and each number stands once, for any count and room", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 500 }), fc.integer({ min: 0, max: 60 }), (count, most) => {
        const numbers = slotsOf(count, most).flatMap((slot) =>
          slot.kind === "one"
            ? [slot.number]
            : slotsBetween(slot.from, slot.to).map((one) => (one.kind === "one" ? one.number : 0)),
        );
        expect(numbers).toEqual(Array.from({ length: count }, (_, index) => index + 1));
      }),
    );
  });
});

test("foldWords(slots, things), foldText(slot): say how many are not drawn", () => {
  expect(foldWords(slotsOf(3, 5), "strings")).toBeNull();
  expect(foldWords(slotsOf(40, 4), "strings")).toBe(
    "strings 1, 2 and 40 are drawn, 37 more alike between them are not",
  );
  expect(foldWords(slotsOf(3, 2), "stages")).toBe("stages 1 and 3 are drawn, 1 more alike between them is not");
  expect(hidden(slotsOf(40, 4))).toBe(37);
  expect(foldText({ kind: "fold", from: 3, to: 39 }, "stage")).toBe("37 more stages alike");
  expect(foldText({ kind: "fold", from: 2, to: 2 }, "stage")).toBe("1 more stage alike");
  expect(foldText({ kind: "fold", from: 3, to: 4 })).toBe("2 more alike");
});

test("piecesOf(count, most): in order, none too large, sizes that differ by one at most", () => {
  expect(piecesOf(1, 10)).toEqual([[1, 1]]);
  expect(piecesOf(40, 10)).toEqual([
    [1, 10],
    [11, 20],
    [21, 30],
    [31, 40],
  ]);
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 500 }), fc.integer({ min: 1, max: 60 }), (count, most) => {
      const pieces = piecesOf(count, most);
      const sizes = pieces.map(([from, to]) => to - from + 1);
      expect(pieces.map(([from]) => from)).toEqual([1, ...pieces.slice(0, -1).map(([, to]) => to + 1)]);
      expect(pieces.at(-1)![1]).toBe(count);
      expect(Math.max(...sizes)).toBeLessThanOrEqual(most);
      expect(Math.max(...sizes) - Math.min(...sizes)).toBeLessThanOrEqual(1);
    }),
  );
});
