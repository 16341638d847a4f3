import { describe, expect, test } from "vitest";
import { cornersOf } from "../../src/search/index.ts";
import { afterDump, afterDumpWords } from "../../src/sheet/afterDump.ts";
import { factsOf } from "../../src/sheet/facts.ts";
import { BARE, sheetInput } from "../support/sheet.ts";

const words = (wishes: Parameters<typeof sheetInput>[0]) => {
  const input = sheetInput(wishes);
  return afterDumpWords(input, factsOf(input));
};

describe("afterDump(seconds, bank, facts)", () => {
  test("the time is followed by what units keep and what comes back; no dump is a blank", () => {
    const input = sheetInput({ brief: { hold: "30 s" } });
    // 8 of +-20 % at 2 kV: 250 - 2000*0.8/(0.8 + 7*1.2) = 76.09 V and 2000*1.2/(1.2 + 7*0.8) - 250 = 102.95 V; 15 % of 2 kV.
    expect(afterDump(0.2, input, factsOf(input))).toBe(
      "200 ms, then measure each unit and short it: units may keep 103 V, and 300 V may come back",
    );
    expect(afterDump(null, input, factsOf(input))).toBeNull();
  });
  test("never less than the corner of an endless hold leaves", () => {
    const input = sheetInput({ brief: { hold: "for ever" } });
    const held = Math.abs(
      cornersOf({ result: input.layout, unit: input.unit, brief: input.brief }).dumpedFromHold!.voltage,
    );
    const kept = Number.parseFloat(/keep ([\d.]+) V/.exec(words({ brief: { hold: "for ever" } }))![1]!);
    expect(kept).toBeGreaterThanOrEqual(held);
  });

  test("one stage keeps nothing of its own; without the tolerance nothing is known", () => {
    expect(words({ shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } })).toBe(
      "then measure each unit and short it: 45 V may come back",
    );
    expect(words({ unit: BARE })).toBe(
      "then measure each unit and short it: units may keep a voltage that is not known, and a voltage that is not known may come back",
    );
  });
});
