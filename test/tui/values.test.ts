// Values in words: worst cases round up, limits down, unknown is told.
import { describe, expect, test } from "vitest";
import type { Finding } from "../../src/quantity/index.ts";
import type { LayoutResult } from "../../src/search/index.ts";
import * as values from "../../src/tui/values.ts";
import { BRIEF, engine } from "../support/stock.ts";

const read = engine.readBrief(BRIEF);
if (!read.ok) throw new Error("brief");
const base = engine.check(read.value, { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" }) as LayoutResult;
const withShare = (share: Partial<LayoutResult["share"]>): LayoutResult => ({
  ...base,
  share: { ...base.share, ...share },
});
const finding = (verdict: Finding["verdict"], id = "x"): Finding => ({
  id,
  state: "holding",
  verdict,
  value: null,
  limit: null,
  margin: null,
  unit: "V",
  source: "",
  note: "",
});

test("a worst case of 404.6 V under a limit of 404.9 V never looks within by rounding", () => {
  expect(values.shownWorst(404.6, "voltage")).toBe("405 V");
  expect(values.shownLimit(404.9, "voltage")).toBe("404 V");
  expect(values.shown(404.6, "voltage")).toBe("405 V");
});

test("null is told in words", () => {
  expect([
    values.shown(null, "mass"),
    values.shownWorst(null, "voltage"),
    values.shownLimit(null, "voltage"),
    values.shownMoney(null, "EUR"),
  ]).toEqual(["unknown", "not assessed", "unknown", "no price"]);
  expect(values.shownSpan({ low: null, nominal: 1e-3, high: null }, "capacitance")).toBe(
    "1 mF nominal, spread unknown",
  );
});

test("money has the digits of its currency (ISO 4217: yen none, dinar of Kuwait three)", () => {
  expect([values.shownMoney(12.5, "EUR"), values.shownMoney(12, "JPY"), values.shownMoney(1.5, "KWD")]).toEqual([
    "12.50 EUR",
    "12 JPY",
    "1.500 KWD",
  ]);
});

describe("worstVoltage(layout), shareOfLimit(layout)", () => {
  test("the higher of charging and holding; one unknown leaves it not assessed", () => {
    expect(values.worstVoltage(withShare({ charging: 3, holding: 5 }))).toBe(5);
    expect(values.worstVoltage(withShare({ charging: 7, holding: 5 }))).toBe(7);
    expect(values.worstVoltage(withShare({ charging: null, holding: 5 }))).toBeNull();
    expect(values.worstVoltage(withShare({ charging: 7, holding: null }))).toBeNull();
    expect(values.shareOfLimit(withShare({ charging: 3, holding: 5, limit: 10 }))).toBe(0.5);
    expect(values.shareOfLimit(withShare({ charging: null, holding: 5, limit: 10 }))).toBeNull();
    expect(values.shareOfLimit(withShare({ charging: 3, holding: 5, limit: 0 }))).toBeNull();
  });
});

describe("worstVerdict(layout), shownVerdict(layout)", () => {
  test.each([
    [[], "1 unknown", "not assessed"],
    [["pass"], "pass", "pass"],
    [["pass", "not assessed"], "1 unknown", "not assessed"],
    [["warn", "not assessed", "warn"], "2 warn", "warn"],
    [["warn", "fail", "pass"], "1 fail", "fail"],
  ] as const)("%j is %s", (verdicts, text, verdict) => {
    const layout = { ...base, findings: verdicts.map((one) => finding(one)) };
    expect(values.worstVerdict(layout).verdict).toBe(verdict);
    if (verdicts.length > 0) expect(values.shownVerdict(layout)).toBe(text);
    else expect(values.shownVerdict(layout)).not.toContain("pass");
  });
  test("bySeverity keeps the order within one verdict and does not touch its argument", () => {
    const list = [finding("pass", "a"), finding("fail", "b"), finding("pass", "c"), finding("warn", "d")];
    expect(values.bySeverity(list).map((f) => f.id)).toEqual(["b", "d", "a", "c"]);
    expect(list.map((f) => f.id)).toEqual(["a", "b", "c", "d"]);
  });
});

test("grouped(count): thousands apart by commas", () => {
  expect([0, 999, 1000, 65_536, 1_234_567].map(values.grouped)).toEqual(["0", "999", "1,000", "65,536", "1,234,567"]);
});
