// What is kept between runs: there and back, and nothing trusted that could do harm.
import { describe, expect, test } from "vitest";
import { readSaved, savedText } from "../../src/tui/saved.ts";
import { stateWith } from "../support/stock.ts";

const pin = { part: "flash-a", series: 6, parallel: 3, ties: "cross-tied" } as const;

test("readSaved(savedText(state)) gives back brief, pins, choice and place", () => {
  const state = stateWith({
    pins: [pin],
    chosen: pin,
    rank: "mass",
    frontOnly: true,
    screen: "compare",
    selected: "x",
  });
  const { values, extra, pins, chosen, rank, frontOnly, screen, selected } = state;
  expect(readSaved(savedText(state))).toEqual({ values, extra, pins, chosen, rank, frontOnly, screen, selected });
});

describe("readSaved(text) of what is not ours", () => {
  test.each(["", "{", "null", "[]", "7", '{"version":2,"values":{}}', '{"version":1}', '{"version":1,"values":null}'])(
    "%j is null",
    (text) => {
      expect(readSaved(text)).toBeNull();
    },
  );
  test("odd parts fall back, good ones stay", () => {
    const text = JSON.stringify({
      version: 1,
      values: { energy: "1 kJ", voltage: 5, unknown: "x", title: "t".repeat(900) },
      pins: [
        pin,
        { ...pin, series: 0 },
        { ...pin, parallel: 1.5 },
        { ...pin, ties: "knots" },
        { ...pin, part: "" },
        7,
        null,
      ],
      chosen: "x",
      rank: "beauty",
      screen: "cellar",
      selected: 5,
    });
    const saved = readSaved(text);
    expect(saved?.values.energy).toBe("1 kJ");
    expect(Object.keys(saved?.values ?? {})).toEqual(["energy", "title"]);
    expect(saved?.values.title?.length).toBe(200);
    expect(saved?.pins).toEqual([pin]);
    expect([saved?.chosen, saved?.rank, saved?.frontOnly, saved?.screen, saved?.selected]).toEqual([
      null,
      "cost",
      false,
      "brief",
      null,
    ]);
  });
  test("at most four pins, and a poisoned prototype changes nothing", () => {
    const saved = readSaved(
      `{"version":1,"values":{"__proto__":{"energy":"evil"}},"pins":${JSON.stringify(Array(9).fill(pin))}}`,
    );
    expect(saved?.pins).toHaveLength(4);
    expect(saved?.values).toEqual({});
  });
});
