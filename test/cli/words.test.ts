import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { placeWords, refusalWords, WORDS, wordsOf } from "../../src/cli/words.ts";
import { at, UNSAFE } from "../support/fakePorts.ts";

const sources = readdirSync(at("src"), { recursive: true, encoding: "utf8" })
  .filter((name) => /\.tsx?$/.test(name) && !/^tui[\\/]/.test(name))
  .map((name) => readFileSync(join(at("src"), name), "utf8"))
  .join("\n");

/** Codes as the sources write them: in a refusal, or handed to one of the small makers of refusals. */
const used = new Set(
  [
    /\bcode: "([a-z0-9-]+)"/g,
    /\bno\(\s*"([a-z]+(?:-[a-z0-9]+)+|empty)"/g,
    /\bfault\(\s*"([a-z]+-[a-z-]+|contradiction)"/g,
    /\brefusal\(\s*"([a-z-]+\.[a-z-]+)"/g,
    /\brefusal\(\s*`([a-z]+)\.\$\{/g,
    /\bcode: `([A-Za-z.]+)\.\$\{/g,
    /\brefuse(?:File)?\(\s*"([a-z0-9-]+)"/g,
    /\bE[A-Z]+: \["([a-z0-9-]+)"/g,
  ].flatMap((pattern) => [...sources.matchAll(pattern)].map((match) => match[1] as string)),
);
/** zod's own issue code, which becomes bad-value. */
used.delete("custom");

describe("WORDS", () => {
  test("every code used in the sources has words", () => {
    expect(used.size).toBeGreaterThan(40);
    expect([...used].filter((code) => wordsOf(code) === code).sort()).toEqual([]);
  });

  test("no words without a use", () => {
    expect(
      Object.keys(WORDS).filter((code) => ![`"${code}"`, `\`${code}.`].some((use) => sources.includes(use))),
    ).toEqual([]);
  });
});

describe("placeWords(place)", () => {
  test("file:line:column heading, as much as is known", () => {
    expect(placeWords({})).toBe("");
    expect(placeWords({ file: "a.csv" })).toBe("a.csv");
    expect(placeWords({ file: "a.csv", line: 3, column: 4, field: "voltage" })).toBe("a.csv:3:4 voltage");
    expect(placeWords({ file: "a.csv", line: 3, field: "voltage" })).toBe("a.csv:3 voltage");
    expect(placeWords({ field: "--energy" })).toBe("--energy");
    expect(placeWords({ file: "a", column: 4 })).toBe("a");
  });
});

describe("refusalWords(refusal)", () => {
  test("says where, what, what stood there and what would do", () => {
    const words = refusalWords({ code: "not-a-number", place: { file: "a", line: 2 }, read: '"x"', want: "a number" });
    expect(words).toBe('a:2: this is no number: read "x"; accepted: a number');
  });

  test("a very long piece of input is cut, and its length told", () => {
    const words = refusalWords({ code: "not-finite", place: {}, read: "9".repeat(5000), want: "a number" });
    expect(words.length).toBeLessThan(400);
    expect(words).toContain("999... (5000 characters)");
  });

  test("nothing of a file reaches the terminal raw", () => {
    const evil = "\u001b[2J\u202e\u0000\n";
    const words = refusalWords({ code: "not-a-number", place: { file: evil, field: evil }, read: evil, want: evil });
    expect(UNSAFE.test(words)).toBe(false);
    expect(words).not.toContain("\n");
  });
});
