import { describe, expect, test } from "vitest";
import { askedLines, askedText } from "../../src/cli/askedText.ts";
import { briefOf } from "../support/bank.ts";

describe("askedText(brief, given, width)", () => {
  test("values as they were read, the defaults apart", () => {
    const text = askedText(briefOf({ ripple: "20 %" }), new Set(["energy", "voltage", "ripple"]), 80);
    expect(text).toMatch(/allowed fall +20 %\n/);
    expect(text).toMatch(/energy of one pulse +500 J/);
    expect(text.replace(/\s+/g, " ")).toMatch(/by default: .*derating 90 %.*hold for ever/);
  });

  test("what was given is not called a default", () => {
    const brief = briefOf({
      hold: "30 s",
      spares: 2,
      steady: { current: "1 A", frequency: "2 Hz" },
      touchSafeRule: "x\u0007",
    });
    const text = askedText(brief, new Set(["hold", "spares", "steady", "touchSafe"]), 80);
    expect(text).toMatch(/hold +30 s/);
    expect(text).toMatch(/spares +2/);
    expect(text).toMatch(/steady draw +1 A, recharged at 2 Hz/);
    expect(text).toMatch(/60 V \(x\\u\{7\}\)/);
  });
});

describe("askedLines(brief, given)", () => {
  test("one line a value, those of the defaults marked; what the brief has not is not there", () => {
    const lines = askedLines(briefOf({ spares: 2 }), new Set(["spares"]));
    expect(lines).toContainEqual({ label: "spares", value: "2", given: true });
    expect(lines).toContainEqual({ label: "derating", value: "90 %", given: false });
    expect(lines.map(({ label }) => label)).not.toContain("load");
  });
});
