import { describe, expect, test } from "vitest";
import { barsOf, groupWord, pointsOf, positionsOf, positionWord, spotsOf, unitName } from "../../src/sheet/names.ts";

const TIED = { series: 3, parallel: 2, ties: "cross-tied" } as const;
const STRINGS = { series: 3, parallel: 2, ties: "strings" } as const;

describe("names of the places of a bank", () => {
  test("spotsOf(shape): every unit once, by stage or by string", () => {
    expect(spotsOf(TIED).map(unitName)).toEqual(["C1.1", "C1.2", "C2.1", "C2.2", "C3.1", "C3.2"]);
    expect(spotsOf(STRINGS).map(unitName)).toEqual(["C1.1", "C1.2", "C1.3", "C2.1", "C2.2", "C2.3"]);
  });

  test("barsOf and pointsOf: stages stand between bars, strings share only the two ends", () => {
    expect(barsOf(TIED)).toEqual(["TP0", "TP1", "TP2", "TP3"]);
    expect(barsOf(STRINGS)).toEqual(["TP0", "TP3"]);
    expect(pointsOf(TIED, { group: 2, place: 1 })).toEqual({ low: "TP1", high: "TP2" });
    expect(pointsOf(STRINGS, { group: 2, place: 1 })).toEqual({ low: "TP0", high: "TP2.1" });
    expect(pointsOf(STRINGS, { group: 2, place: 3 })).toEqual({ low: "TP2.2", high: "TP3" });
    expect(pointsOf({ series: 1, parallel: 2, ties: "strings" }, { group: 2, place: 1 })).toEqual({
      low: "TP0",
      high: "TP1",
    });
  });

  test("positionsOf(shape, letters): one a stage when cross-tied, one a unit in strings", () => {
    expect(positionsOf(TIED, "RB").map(({ name }) => name)).toEqual(["RB1", "RB2", "RB3"]);
    expect(positionsOf(STRINGS, "DC")[4]).toEqual({ name: "DC2.2", low: "TP2.1", high: "TP2.2" });
    expect([groupWord(TIED), positionWord(TIED), groupWord(STRINGS), positionWord(STRINGS)]).toEqual([
      "stage",
      "stage",
      "string",
      "unit",
    ]);
  });
});
