// Text to numbers: codes of IEC 60062, prefixes, micro in three spellings, decimal commas, and every bad number with its refusal.

import { describe, expect, test } from "vitest";
import { DIMENSIONS, type Dimension } from "../../src/quantity/dimension.ts";
import { formatQuantity } from "../../src/quantity/format.ts";
import { example, parseQuantity } from "../../src/quantity/parse.ts";
import type { Refusal } from "../../src/quantity/refusal.ts";
import fc from "../support/property.ts";

const value = (text: string, dimension: Dimension, options = {}): number | string => {
  const read = parseQuantity(text, dimension, options);
  return read.ok ? read.value : (read.refusals[0]?.code ?? "none");
};

const refusal = (text: string, dimension: Dimension, options = {}): Refusal => {
  const read = parseQuantity(text, dimension, options);
  if (read.ok) throw new Error(`${text} was accepted`);
  return read.refusals[0]!;
};

describe("parseQuantity(text, dimension): bad numbers", () => {
  test.each([
    ["", "capacitance", "empty"],
    ["   ", "capacitance", "empty"],
    ["NaN", "capacitance", "not-a-number"],
    ["Infinity", "voltage", "not-a-number"],
    ["-Infinity", "voltage", "not-a-number"],
    ["∞", "voltage", "not-a-number"],
    ["ask", "capacitance", "not-a-number"],
    ["1e999 V", "voltage", "not-finite"],
    ["1e309", "voltage", "not-finite"],
    ["1,500uF", "capacitance", "ambiguous-comma"],
    ["4,700", "capacitance", "ambiguous-comma"],
    ["-1,500 V", "voltage", "ambiguous-comma"],
    ["1.500,5 V", "voltage", "not-a-number"],
    ["1,500,000 V", "voltage", "not-a-number"],
    ["1.5.5", "voltage", "not-a-number"],
    ["470/1000", "capacitance", "unknown-unit"],
    ["0x3E8", "capacitance", "unknown-unit"],
    ["1_000", "voltage", "unknown-unit"],
    ["450 V", "capacitance", "wrong-unit"],
    ["470 uF", "voltage", "wrong-unit"],
    ["2.4 kW", "energy", "wrong-unit"],
    ["470 jar", "capacitance", "unknown-unit"],
    ["470 uF 20 %", "capacitance", "unknown-unit"],
    ["5 V 5", "voltage", "unknown-unit"],
    ["e5", "voltage", "not-a-number"],
    ["--5 V", "voltage", "not-a-number"],
    ["4M7", "capacitance", "unknown-unit"],
    ["4R7", "capacitance", "unknown-unit"],
    ["470 kkF", "capacitance", "unknown-unit"],
    ["5 V\n6 V", "voltage", "not-a-number"],
    ["4K7/2", "resistance", "unknown-unit"],
    ["-4k7", "voltage", "unknown-unit"],
    ["4m7V", "capacitance", "unknown-unit"],
    ["4m7 uF", "capacitance", "unknown-unit"],
    ["2k2A", "voltage", "unknown-unit"],
    ["150,500 V", "voltage", "ambiguous-comma"],
    ["10,500", "voltage", "ambiguous-comma"],
    ["constructor", "voltage", "not-a-number"],
    ["5 constructor", "voltage", "unknown-unit"],
  ] as const)("%j as %s: %s", (text, dimension, code) => expect(value(text, dimension)).toBe(code));

  test("a bare number where a unit is needed: missing-unit", () =>
    expect(value("470", "capacitance", { bare: null })).toBe("missing-unit"));
  test("every refusal shows what was read, as a quoted string without raw control characters", () => {
    const read = parseQuantity("\u001b[2J1,500uF", "capacitance");
    expect(!read.ok && read.refusals[0]?.read).toBe('"\\u001b[2J1,500uF"');
  });
  // m is milli by the prefixes, but "5 m" of time is five minutes to everyone who writes it: five milliseconds hold no bank.
  test("5 m of time is refused: milliseconds or minutes, nobody can tell", () =>
    expect(typeof value("5 m", "time")).toBe("string"));
  // 1m30 is a minute and a half, 1m50 a metre and a half to those who write so; 4k7 of percent is nothing.
  test.each([
    ["1m30", "time"],
    ["1m50", "length"],
    ["2k2", "mass"],
    ["4k7", "fraction"],
    ["45u", "charge"],
    ["5 k", "count"],
  ] as const)("%s as %s is refused: no code", (text, dimension) =>
    expect(typeof value(text, dimension)).toBe("string"),
  );
  // Where commas are decimal marks, a point before three digits groups thousands.
  test.each(["1.500 V", "1.500", "-1.500"])("%s among decimal commas is refused", (text) =>
    expect(value(text, "voltage", { decimalComma: true })).toBe("ambiguous-comma"),
  );
  test.each([
    ["1,500", false, "comma"],
    ["1.500", true, "point"],
  ])(
    "%s, decimal comma %s: the refusal names both readings, each is accepted, and they are a thousand apart",
    (text, decimalComma, mark) => {
      const want = refusal(text, "voltage", { decimalComma }).want;
      const [, thousands = "", decimal = ""] = /^(\S+) if .* thousands, (\S+) if .* decimal mark$/.exec(want) ?? [];
      expect(value(thousands, "voltage", { decimalComma })).toBe(1500);
      expect(value(decimal, "voltage", { decimalComma })).toBe(1.5);
      expect(want).toContain(mark);
    },
  );
  test.each([
    ["2,2", 2.2],
    [",5", 0.5],
    ["22,", 22],
  ])("%s V in a table whose cells commas part: refused, and the number as shown there is accepted", (text, meant) => {
    const { code, want } = refusal(`${text} V`, "voltage", { decimalComma: "never" });
    expect(code).toBe("ambiguous-comma");
    expect(value(want.split(", with")[0]!, "voltage", { decimalComma: "never" })).toBe(meant);
  });
  test("a point in such a table is the decimal mark, also before three digits", () => {
    expect(value("2.2 kV", "voltage", { decimalComma: "never" })).toBe(2200);
    expect(value("1.500 V", "voltage", { decimalComma: "never" })).toBe(1.5);
  });
  test("a refused unit is named, with the quantity that it belongs to, and so is where a missing one may stand", () => {
    expect(refusal("470 jar", "capacitance").want).toContain('"jar"');
    expect(refusal("450 kV", "capacitance").want).toMatch(/"kV".*voltage/);
    expect(refusal("470", "capacitance", { bare: null }).want).toMatch(/heading.*square brackets/);
  });
  test.each(["", "ask", "470 jar", "450 kV", "1e999"])(
    "%j as capacitance: the refusal shows an accepted example",
    (text) => expect(value(/"(.*?)"/.exec(refusal(text, "capacitance").want)?.[1] ?? "", "capacitance")).toBe(470e-6),
  );
});

describe("parseQuantity(text, dimension): IEC 60062 codes", () => {
  // Source: [IEC60062] resistors L R K M G, capacitors p n u m F in place of the decimal point.
  test.each([
    ["R47", "resistance", 0.47],
    ["4R7", "resistance", 4.7],
    ["470R", "resistance", 470],
    ["4K7", "resistance", 4700],
    ["47K3", "resistance", 47300],
    ["4M7", "resistance", 4.7e6],
    ["1G0", "resistance", 1e9],
    ["1T0", "resistance", 1e12],
    ["4L7", "resistance", 4.7e-3],
    ["4m7", "resistance", 4.7e-3],
    ["4.7k", "resistance", 4700],
    ["30u", "inductance", 30e-6],
    ["30μ", "inductance", 30e-6],
    ["4μ7", "inductance", 4.7e-6],
    ["2.2k", "voltage", 2200],
    ["50m", "current", 0.05],
    ["2.4k", "energy", 2400],
    ["2k", "power", 2000],
    ["4n7", "capacitance", 4.7e-9],
    ["1u0", "capacitance", 1e-6],
    ["p47", "capacitance", 0.47e-12],
    ["4m7", "capacitance", 4.7e-3],
    ["4µ7", "capacitance", 4.7e-6],
    ["4μ7", "capacitance", 4.7e-6],
    ["1F5", "capacitance", 1.5],
    ["470u", "capacitance", 470e-6],
    ["4m7F", "capacitance", 4.7e-3],
    ["4K7 ohm", "resistance", 4700],
    ["2k2", "voltage", 2200],
    ["2k2V", "voltage", 2200],
  ] as const)("%s as %s is %d, to the last bit", (text, dimension, si) => expect(value(text, dimension)).toBe(si));
  test("4e7 and 4E7 are powers of ten, not codes", () => {
    expect(value("4e7", "voltage")).toBe(4e7);
    expect(value("4E7", "resistance")).toBe(4e7);
  });
});

describe("parseQuantity(text, dimension): units", () => {
  test.each([
    "470 uF",
    "470uF",
    "470 µF",
    "470 μF",
    "470 UF",
    "470u",
    "0.47 mF",
    "470e-6 F",
    "0.00047",
    "+470 uF",
    "470\u00a0uF",
    "470000 nF",
  ])("%s is 470e-6 F, to the last bit", (text) => expect(value(text, "capacitance")).toBe(470e-6));
  test.each([
    ["2.2kV", "voltage", 2200],
    ["2,2 kV", "voltage", 2200],
    ["450WV", "voltage", 450],
    ["450 VDC", "voltage", 450],
    ["1 500,5 V", "voltage", 1500.5],
    ["1 500 V", "voltage", 1500],
    ["-5 V", "voltage", -5],
    ["−5 V", "voltage", -5],
    [".5 V", "voltage", 0.5],
    [",5 V", "voltage", 0.5],
    ["0,500 V", "voltage", 0.5],
    ["00,500 V", "voltage", 0.5],
    [",500 V", "voltage", 0.5],
    ["1500,500 V", "voltage", 1500.5],
    ["5. V", "voltage", 5],
    ["4.7 kΩ", "resistance", 4700],
    ["4.7 kΩ", "resistance", 4700],
    ["1 MOhm", "resistance", 1e6],
    ["1 mohm", "resistance", 1e-3],
    ["20 %", "fraction", 0.2],
    ["20 percent", "fraction", 0.2],
    ["50 ppm", "fraction", 50e-6],
    ["0.2", "fraction", 0.2],
    ["2.4 kJ", "energy", 2400],
    ["1 min", "time", 60],
    ["2 h", "time", 7200],
    ["250 ms", "time", 0.25],
    ["120 cm2", "area", 0.012],
    ["35 mm", "length", 0.035],
    ["5 L", "volume", 5e-3],
    ["30 cm³", "volume", 30e-6],
    ["500 g", "mass", 0.5],
    ["2 kg", "mass", 2],
    ["1.5 t", "mass", 1500],
    ["30 kV/mm", "field", 30e6],
    ["50 V/us", "slew", 50e6],
    ["400 A2s", "action", 400],
    ["5.2 kA2s", "action", 5200],
    ["25 degC", "temperature", 25],
    ["-10 °C", "temperature", -10],
    ["6 1/min", "frequency", 0.1],
    ["12", "count", 12],
  ] as const)("%s as %s is %d", (text, dimension, si) => {
    const read = value(text, dimension);
    expect(typeof read).toBe("number");
    expect(Math.abs((read as number) - si)).toBeLessThanOrEqual(1e-15 * Math.abs(si));
  });
  test.each(["V/us", "V/µs", "V/μs"])("50 %s: micro in all three spellings", (unit) =>
    expect(value(`50 ${unit}`, "slew")).toBe(50e6),
  );
  test.each(["V/um", "V/µm", "V/μm"])("3 %s: micro in all three spellings", (unit) =>
    expect(value(`3 ${unit}`, "field")).toBe(3e6),
  );
  test("a bare number takes the scale of its heading", () => {
    expect(value("470", "capacitance", { bare: { exponent: -6, factor: 1 } })).toBe(470e-6);
    expect(value("2", "time", { bare: { exponent: 0, factor: 60 } })).toBe(120);
  });
  test("with decimal commas known, 1,500 is 1.5", () =>
    expect(value("1,500 V", "voltage", { decimalComma: true })).toBe(1.5));
  test("a count has no unit to give", () => expect(example("count")).not.toContain("unit"));
  test("every example that we give is accepted", () => {
    for (const dimension of Object.keys(DIMENSIONS) as Dimension[]) {
      const shown = /such as "?([^"]+)"?$/.exec(example(dimension))?.[1] ?? "none";
      expect(typeof value(shown, dimension), dimension).toBe("number");
    }
  });
});

describe("properties", () => {
  const dimensions = [
    "capacitance",
    "voltage",
    "resistance",
    "inductance",
    "current",
    "energy",
    "power",
    "charge",
  ] as const;
  const number = fc.double({ min: 1e-14, max: 9e14, noNaN: true });

  test("printing to 15 figures and reading again gives the number to 1e-14, 1000 times", () => {
    fc.assert(
      fc.property(number, fc.constantFrom(...dimensions), (si, dimension) => {
        const back = value(formatQuantity(si, dimension, { digits: 15 }), dimension);
        expect(Math.abs((back as number) / si - 1)).toBeLessThan(1e-14);
      }),
      { numRuns: 1000, seed: 1 },
    );
  });
  test("printing what was read of a printed text changes nothing, all dimensions, 1000 times", () => {
    const all = Object.keys(DIMENSIONS).filter((d) => d !== "temperature") as Dimension[];
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 1e9, noNaN: true }), fc.constantFrom(...all), (si, dimension) => {
        const once = formatQuantity(si, dimension);
        const read = value(once, dimension);
        expect(typeof read, once).toBe("number");
        expect(formatQuantity(read as number, dimension)).toBe(once);
      }),
      { numRuns: 1000, seed: 2 },
    );
  });
  test("a decimal number with a prefix is the double nearest to it: the same as the literal, 1000 times", () => {
    const prefixes = [
      ["p", -12],
      ["n", -9],
      ["u", -6],
      ["m", -3],
      ["", 0],
      ["k", 3],
      ["M", 6],
      ["G", 9],
    ] as const;
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 999999 }),
        fc.integer({ min: 0, max: 4 }),
        fc.constantFrom(...prefixes),
        (digits, places, [prefix, power]) => {
          const text = (digits / 10 ** places).toFixed(places);
          expect(value(`${text} ${prefix}F`, "capacitance")).toBe(Number(`${text}e${power}`));
        },
      ),
      { numRuns: 1000, seed: 3 },
    );
  });
  test("any text at all gives a finite number or a refusal, never a throw, 3000 times", () => {
    const soup = fc
      .array(fc.constantFrom(..."0123456789.,+-−eEkKmMuµμnpRFVΩ% \u00a0\u001b\u202e/x"), { maxLength: 12 })
      .map((a) => a.join(""));
    fc.assert(
      fc.property(
        fc.oneof(soup, fc.string()),
        fc.constantFrom(...(Object.keys(DIMENSIONS) as Dimension[])),
        (text, dimension) => {
          const read = parseQuantity(text, dimension);
          if (read.ok) expect(Number.isFinite(read.value)).toBe(true);
          else expect(read.refusals.length).toBeGreaterThan(0);
        },
      ),
      { numRuns: 3000, seed: 4 },
    );
  });
});
