import { describe, expect, test } from "vitest";
import { type LayoutFlags, readLayout } from "../../src/cli/layoutInput.ts";
import { fakePorts } from "../support/fakePorts.ts";

const read = (flags: LayoutFlags, text = "") => readLayout(flags, fakePorts({ "l.json": text }).files, 0.05);
const codes = (flags: LayoutFlags, text = ""): string[] => {
  const found = read(flags, text);
  return found.ok ? [] : found.refusals.map((one) => `${one.code} ${one.place.field ?? ""}`);
};
const value = (flags: LayoutFlags, text = "") => {
  const found = read(flags, text);
  if (!found.ok) throw new Error(JSON.stringify(found.refusals));
  return found.value;
};
const FLAGS: LayoutFlags = { part: "p", series: "6", parallel: "10", ties: "cross-tied" };

describe("readLayout(flags, files, tolerance) from flags", () => {
  test("nothing: every missing flag is told", () => {
    expect(codes({})).toEqual([
      "missing-option --part",
      "missing-option --series",
      "missing-option --parallel",
      "missing-option --ties",
    ]);
  });

  test("counts that are none: zero, negative, fraction, words, beyond a million", () => {
    for (const series of ["0", "-1", "1.5", "six", "1e3", "1000001", ""])
      expect(codes({ ...FLAGS, series }), series).toEqual(["bad-count --series"]);
  });

  test("6s10p; with one in series or parallel the ties may be left out and are strings", () => {
    expect(value(FLAGS).layout).toEqual({ part: "p", series: 6, parallel: 10, ties: "cross-tied" });
    expect(value({ part: "p", series: "1", parallel: "3" }).layout.ties).toBe("strings");
    expect(value({ ...FLAGS, parallel: "1" }).layout.ties).toBe("strings");
    expect(codes({ ...FLAGS, ties: "tied" })).toEqual(["bad-choice --ties"]);
  });

  test("balance: none, fixed with its tolerance or the family's, refused otherwise", () => {
    expect(value(FLAGS).balance).toBeNull();
    expect(value({ ...FLAGS, balance: " None" }).balance).toEqual({ kind: "none" });
    expect(value({ ...FLAGS, balance: "24 kohm", balanceTolerance: "1 %" }).balance).toEqual({
      kind: "fixed",
      resistance: 24000,
      tolerance: 0.01,
    });
    expect(value({ ...FLAGS, balance: "24k" }).balance).toMatchObject({ tolerance: 0.05 });
    expect(value({ ...FLAGS, balance: "24k", balanceTolerance: "K" }).balance).toMatchObject({ tolerance: 0.1 });
    for (const balance of ["0", "-24k", "2 V", "big"])
      expect(codes({ ...FLAGS, balance }), balance).toEqual(["bad-balance --balance"]);
    expect(codes({ ...FLAGS, balanceTolerance: "5 %" })).toEqual(["missing-option --balance-tolerance"]);
    expect(codes({ ...FLAGS, balance: "24k", balanceTolerance: "5" })).toEqual(["missing-unit --balance-tolerance"]);
  });
});

describe("readLayout from a file", () => {
  const FILE = '{"part": "p", "series": 6, "parallel": 10, "ties": "cross-tied"}';

  test("one element of a plan's layouts", () => {
    expect(value({ layout: "l.json" }, FILE)).toEqual({
      layout: { part: "p", series: 6, parallel: 10, ties: "cross-tied" },
      balance: null,
      filed: undefined,
    });
    expect(value({ layout: "l.json" }, FILE.replace("}", ', "balance": null}')).filed).toBeNull();
    const balance = '{"resistance": 24000, "tolerance": 0.05, "family": "f", "assumed": true}';
    expect(value({ layout: "l.json" }, FILE.replace("}", `, "balance": ${balance}}`)).filed).toEqual({
      resistance: 24000,
      tolerance: 0.05,
      family: "f",
      assumed: true,
    });
  });

  test("file and flags together are refused", () => {
    expect(codes({ layout: "l.json", part: "p" }, FILE)).toEqual(["contradiction --layout"]);
  });

  test("what is no layout is refused at its key", () => {
    for (const [text, want] of [
      ["[]", "bad-layout "],
      ["null", "bad-layout "],
      ['{"layouts": []}', "bad-layout "],
      [FILE.replace("6", "6.5"), "bad-layout series"],
      [FILE.replace("6", '"6"'), "bad-layout series"],
      [FILE.replace("10", "0"), "bad-layout parallel"],
      [FILE.replace('"p"', '""'), "bad-layout part"],
      [FILE.replace("cross-tied", "tied"), "bad-layout ties"],
      [FILE.replace("}", ', "balance": {"resistance": -1, "tolerance": 0}}'), "bad-layout balance"],
      [FILE.replace("}", ', "balance": 3}'), "bad-layout balance"],
    ] as const)
      expect(codes({ layout: "l.json" }, text), text).toEqual([want]);
    expect(codes({ layout: "/none" })).toEqual(["no-such-file "]);
  });
});
