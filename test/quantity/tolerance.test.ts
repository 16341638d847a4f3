// Tolerances as written on parts and in lists: signs, pairs and the letters of IEC 60062.
import { describe, expect, test } from "vitest";
import { parseTolerance, TOLERANCE_LETTERS } from "../../src/quantity/tolerance.ts";

const PERCENT = { exponent: -2, factor: 1 };
const tolerance = (text: string, bare: typeof PERCENT | null = PERCENT, comma = false): string => {
  const read = parseTolerance(text, bare, comma);
  const figure = (x: number): number => Number((x * 100).toPrecision(12));
  return read.ok ? `-${figure(read.value.low)}/+${figure(read.value.high)}` : (read.refusals[0]?.code ?? "none");
};

describe("parseTolerance(text, bare)", () => {
  test.each([
    ["20", "-20/+20"],
    ["20 %", "-20/+20"],
    ["20%", "-20/+20"],
    ["+-20 %", "-20/+20"],
    ["+/-20 %", "-20/+20"],
    ["±20%", "-20/+20"],
    ["-10/+50 %", "-10/+50"],
    ["+50/-10 %", "-10/+50"],
    ["-10 / +50", "-10/+50"],
    ["−10/+50 %", "-10/+50"],
    ["-10 +50 %", "-10/+50"],
    [" -10 %/+50 % ", "-10/+50"],
    ["-10% /+50%", "-10/+50"],
    [" M ", "-20/+20"],
    ["0 /+20", "-0/+20"],
    ["0/ + 20%", "-0/+20"],
    ["0/+20", "-0/+20"],
    ["-0/+20 %", "-0/+20"],
    ["0", "-0/+0"],
    ["0.5", "-0.5/+0.5"],
    ["100", "tolerance-range"],
    ["-100/+20", "tolerance-range"],
    ["-20/+101", "tolerance-range"],
    ["-99.9/+100", "-99.9/+100"],
    ["120 %", "tolerance-range"],
    ["-20 %", "tolerance-range"],
    ["+10/+20", "bad-tolerance"],
    ["-10/-20", "bad-tolerance"],
    ["+20/-10/5", "bad-tolerance"],
    ["", "bad-tolerance"],
    ["X", "bad-tolerance"],
    ["NaN", "bad-tolerance"],
    ["20 V", "bad-tolerance"],
    ["1±9 %", "bad-tolerance"],
    ["5 -10/+50", "bad-tolerance"],
    ["-10x/+50 %", "bad-tolerance"],
    ["-10%x/+50 %", "bad-tolerance"],
    ["10/+50 %", "bad-tolerance"],
    ["0x/+20 %", "bad-tolerance"],
    ["0/x+20 %", "bad-tolerance"],
    ["0/+20 %x", "bad-tolerance"],
    ["0/+20x%", "bad-tolerance"],
    ["0/+2.0.0", "bad-tolerance"],
    ["-1.0.0/+20", "bad-tolerance"],
  ])("%j below [%%]: %s", (text, read) => expect(tolerance(text)).toBe(read));

  test("without a unit anywhere, 20 may be 20 % or 20: missing-unit", () => {
    expect(tolerance("20", null)).toBe("missing-unit");
    expect(tolerance("20 %", null)).toBe("-20/+20");
    expect(tolerance("-10/+50 %", null)).toBe("-10/+50");
    expect(tolerance("0/+20 %", null)).toBe("-0/+20");
    expect(tolerance("-10/+50", null)).toBe("missing-unit");
    expect(tolerance("0/+20", null)).toBe("missing-unit");
    expect(tolerance("M", null)).toBe("-20/+20");
  });
  test("decimal commas", () => expect(tolerance("-2,5/+7,5 %")).toBe("-2.5/+7.5"));
  test("1.125 % is little more than one, unless commas are known to be decimal marks, when it may be 125 %", () => {
    expect(parseTolerance("1.125 %", null)).toEqual({ ok: true, value: { low: 0.01125, high: 0.01125 } });
    expect(tolerance("1.125 %", null, true)).toBe("bad-tolerance");
  });
  test("a refusal shows what was read, and every example it gives is accepted", () => {
    const read = parseTolerance("half", null);
    const want = read.ok ? "" : read.refusals[0]!.want;
    expect(read).toMatchObject({ ok: false, refusals: [{ read: '"half"' }] });
    const shown = [...want.matchAll(/"(.*?)"/g)].map(([, text = ""]) => text);
    expect(shown.map((text) => tolerance(text, null))).toEqual(["-20/+20", "-20/+20", "-10/+50"]);
    expect(tolerance(/letter such as (\w)/.exec(want)?.[1] ?? "", null)).toBe("-20/+20");
  });
});

describe("TOLERANCE_LETTERS", () => {
  // Source: [IEC60062] letter codes; F, K, M, Z read in published copies, the rest from memory.
  test.each(
    Object.entries({
      E: "0.005",
      L: "0.01",
      P: "0.02",
      W: "0.05",
      B: "0.1",
      C: "0.25",
      D: "0.5",
      F: "1",
      G: "2",
      H: "3",
      J: "5",
      K: "10",
      M: "20",
      N: "30",
    }),
  )("%s is %s %% either way", (letter, percent) => expect(tolerance(letter)).toBe(`-${percent}/+${percent}`));
  test.each([
    ["Q", "-10/+30"],
    ["T", "-10/+50"],
    ["S", "-20/+50"],
    ["Z", "-20/+80"],
  ])("%s is %s %%", (letter, read) => expect(tolerance(letter)).toBe(read));
  test.each(["constructor", "toString", "__proto__", "hasOwnProperty"])("%s is a word and no letter", (word) =>
    expect(parseTolerance(word, null).ok).toBe(false),
  );
  test("eighteen letters, no more", () => expect(Object.keys(TOLERANCE_LETTERS).length).toBe(18));
});
