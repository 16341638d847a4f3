import { describe, expect, test } from "vitest";
import { readJson } from "../../src/cli/jsonText.ts";
import fc from "../support/property.ts";

const fault = (text: string) => {
  const read = readJson(text, "b.json");
  if (read.ok) throw new Error(`read: ${JSON.stringify(read.value.value)}`);
  const [first] = read.refusals;
  return `${first?.code} ${first?.place.line ?? ""}:${first?.place.column ?? ""} ${first?.read}`;
};
const good = (text: string) => {
  const read = readJson(text, "b.json");
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};

describe("readJson(text, file)", () => {
  test("faults with line, column and the word that stands there", () => {
    expect(fault("")).toBe("empty-file : nothing");
    expect(fault(" \n")).toBe("empty-file : nothing");
    expect(fault("energy = 2")).toBe("bad-json 1:1 energy");
    expect(fault('{\n  "a": 1,\n}')).toBe("bad-json 3:1 }");
    expect(fault('{"a": 1 "b": 2}')).toBe('bad-json 1:9 "b"');
    expect(fault('{"a" 1}')).toBe("bad-json 1:6 1");
    expect(fault("{'a': 1}")).toBe("bad-json 1:2 'a':");
    expect(fault('{"a": 1')).toBe("bad-json 1:8 the end of the text");
    expect(fault('{"a": "x\n"}')).toBe('bad-json 1:7 "x');
    expect(fault("[1, 2")).toBe("bad-json 1:6 the end of the text");
    expect(fault("{} {}")).toBe("bad-json 1:4 {");
    expect(fault("[01]")).toBe("bad-json 1:3 1");
    expect(fault('{"a": NaN}')).toBe("bad-json 1:7 NaN");
    expect(fault('{"a": .5}')).toBe("bad-json 1:7 .5");
  });

  test("columns count from the line's beginning, also after CR LF and a byte-order mark", () => {
    expect(fault('\ufeff{\r\n  "a": x}')).toBe("bad-json 2:8 x");
  });

  test("a key that stands twice, a number beyond the doubles, nesting without end", () => {
    expect(fault('{"a": 1, "b": {"a": 1}, "a": 2}')).toBe('duplicate-key 1:25 "a"');
    expect(fault('{"a": 1e999}')).toBe("not-finite 1:7 1e999");
    expect(fault("[".repeat(100_000))).toMatch(/^too-deep 1:66/);
    expect(fault('{"a":'.repeat(50_000))).toMatch(/^too-deep/);
  });

  test("a key named __proto__ is only a key", () => {
    const value = good('{"__proto__": {"polluted": true}}').value as Record<string, unknown>;
    expect(Object.keys(value)).toEqual(["__proto__"]);
    expect(({} as { polluted?: unknown }).polluted).toBeUndefined();
  });

  test("placeOf(path): where each value stands", () => {
    const read = good('{\n  "energy": "2 J",\n  "steady": {"current": 1},\n  "list": [1, 22]\n}');
    expect(read.placeOf("energy")).toEqual({ file: "b.json", line: 2, column: 13 });
    expect(read.placeOf("steady.current")).toEqual({ file: "b.json", line: 3, column: 25 });
    expect(read.placeOf("list.1")).toEqual({ file: "b.json", line: 4, column: 15 });
    expect(read.placeOf("none")).toBeUndefined();
  });

  test("any JSON value reads as the runtime's own reader reads it", () => {
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 6 }), fc.constantFrom(0, 1, 4), (value, indent) => {
        const text = JSON.stringify(value, null, indent);
        expect(good(text).value).toEqual(JSON.parse(text));
      }),
      { seed: 7, numRuns: 300 },
    );
  });

  test("any text that the runtime's own reader refuses is refused, and no other but for our three rules", () => {
    const ours = new Set(["duplicate-key", "not-finite", "too-deep", "empty-file"]);
    const bits = fc.constantFrom(
      "{",
      "}",
      "[",
      "]",
      ",",
      ":",
      '"',
      '"a"',
      "1",
      "-",
      ".",
      "e5",
      "true",
      "nul",
      " ",
      "\n",
      "\\",
    );
    fc.assert(
      fc.property(fc.array(bits, { maxLength: 12 }), (parts) => {
        const text = parts.join("");
        let fine = true;
        try {
          JSON.parse(text);
        } catch {
          fine = false;
        }
        const read = readJson(text, "b.json");
        const code = read.ok ? "" : (read.refusals[0]?.code ?? "");
        expect(read.ok || ours.has(code) ? true : !fine, text).toBe(true);
        if (!fine) expect(read.ok, text).toBe(false);
      }),
      { seed: 11, numRuns: 3000 },
    );
  });
});
