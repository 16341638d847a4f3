import { describe, expect, test } from "vitest";
import { settle } from "../../src/cli/settings.ts";
import { fakePorts } from "../support/fakePorts.ts";

const BRIEF = '{\n  "energy": "2.4 kJ",\n  "voltage": "2.2 kV",\n  "ripple": "100 %",\n  "derating": 0.8\n}';
const settled = (flags: Record<string, unknown>, text: string | null = BRIEF) =>
  settle(text === null ? undefined : "b.json", flags, fakePorts({ "b.json": text ?? "" }).files);
const good = (flags: Record<string, unknown>, text: string | null = BRIEF) => {
  const read = settled(flags, text);
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};
const faults = (flags: Record<string, unknown>, text: string | null = BRIEF) => {
  const read = settled(flags, text);
  return read.ok ? [] : read.refusals;
};

describe("settle(file, flags, files)", () => {
  test("a flag beats the file, the file beats the default", () => {
    expect(good({}, BRIEF).brief).toMatchObject({ energy: 2400, derating: 0.8, maxSeries: 40 });
    expect(good({ derating: "70 %", maxSeries: "12" }).brief).toMatchObject({ derating: 0.7, maxSeries: 12 });
  });

  test("flags alone make a brief", () => {
    const { brief, file, flags } = good({ energy: "1 kJ", voltage: "1 kV", ripple: "50 %" }, null);
    expect(brief).toMatchObject({ energy: 1000, voltage: 1000, ripple: 0.5, basis: "worst case" });
    expect([file, flags]).toEqual([null, ["--energy", "--voltage", "--ripple"]]);
  });

  test("what was given is known apart from what was not", () => {
    const { given } = good({ steadyCurrent: "1 A", steadyFrequency: "2 Hz" });
    expect([...given].sort()).toEqual(
      ["derating", "energy", "ripple", "steady", "steady.current", "steady.frequency", "voltage"].sort(),
    );
  });

  test("one half of a nested key from the file, the other from a flag", () => {
    const text = BRIEF.replace('"derating": 0.8', '"steady": {"current": "1 A", "frequency": "1 Hz"}');
    expect(good({ steadyFrequency: "4 Hz" }, text).brief.steady).toEqual({ current: 1, frequency: 4 });
  });

  test("a fault stands at its flag, or at its line and column", () => {
    expect(faults({ ripple: "120 %" })[0]?.place).toEqual({ field: "--ripple" });
    expect(faults({}, BRIEF.replace("100 %", "0 %"))[0]?.place).toEqual({
      file: "b.json",
      line: 4,
      column: 13,
      field: "ripple",
    });
    expect(faults({}, null).map((one) => one.place.field)).toEqual(["--energy", "--voltage", "--ripple"]);
  });

  test("rates of exchange are read; a wrong one is refused", () => {
    expect(good({ exchange: ["USD=0.92", "GBP=1.2"] }).brief.exchange).toEqual({ USD: 0.92, GBP: 1.2 });
    for (const wrong of ["USD", "usd=1", "USD=0", "USD=-1", "USD=x"])
      expect(faults({ exchange: [wrong] })[0], wrong).toMatchObject({
        code: "bad-value",
        place: { field: "--exchange" },
      });
  });

  test("a list is no brief, and a key of the prototype is not taken for a value", () => {
    expect(faults({}, "[1]")[0]?.code).toBe("bad-brief");
    expect(faults({}, BRIEF.replace('"derating"', '"__proto__"'))[0]?.code).toBe("unknown-key");
  });
});
