import { expect, test } from "vitest";
import { partNames, spanOf } from "../../../src/sheet/draw/partNames.ts";
import { schematicOf } from "../../support/drawn.ts";

test("partNames(props): each letter is counted through, no name stands twice", () => {
  const resistor = { resistance: null, words: null };
  const names = partNames(
    schematicOf({
      isolation: [
        { kind: "relay", ...resistor },
        { kind: "resistor", ...resistor },
        { kind: "diode", ...resistor },
      ],
      bleeds: [resistor, resistor],
    }),
  );
  expect(names).toEqual({
    isolation: ["K1", "R1", "D1"],
    dumpRelay: "K2",
    dump: "R2",
    bleeds: ["R3", "R4"],
    clamp: "D2",
  });
  expect(partNames(schematicOf({ dump: null, isolation: [] }))).toMatchObject({
    dump: "",
    bleeds: ["R1"],
    clamp: "D1",
  });
});

test("spanOf(letters, first, last): one, or from and to", () => {
  expect(spanOf("C", "1.1", "1.1")).toBe("C1.1");
  expect(spanOf("RB", "1", "6")).toBe("RB1 to RB6");
});
