import { describe, expect, test } from "vitest";
import { keepOrder } from "../../src/place/spareOrder.ts";

const unit = (serial: string, capacitance: number, leakage?: number, esr?: number) => ({
  serial,
  capacitance,
  ...(leakage === undefined ? {} : { leakage }),
  ...(esr === undefined ? {} : { esr }),
});

describe("keepOrder(units, outliers)", () => {
  test("only capacitance known: the largest are kept", () => {
    expect(keepOrder([unit("a", 1), unit("b", 3), unit("c", 2)], new Set())).toEqual([1, 2, 0]);
  });
  test("last come outliers, before them the worst of leakage and ESR, before them the smallest", () => {
    const lot = [
      unit("wild", 9, 1, 1),
      unit("leaky", 5, 4, 1),
      unit("resistive", 5, 1, 3),
      unit("small", 4, 1, 1),
      unit("good", 6, 1.2, 1.3),
    ];
    expect(keepOrder(lot, new Set(["wild"])).map((i) => lot[i]!.serial)).toEqual([
      "good",
      "small",
      "resistive",
      "leaky",
      "wild",
    ]);
  });
  test("a reading that was not taken does not count against a unit", () => {
    const lot = [unit("unread", 5), unit("leaky", 5, 9), unit("fine", 5, 3), unit("fine too", 5, 3)];
    expect(keepOrder(lot, new Set()).at(-1)).toBe(1);
  });
});
