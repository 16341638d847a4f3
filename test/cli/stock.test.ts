import { describe, expect, test } from "vitest";
import { findPart, readStock } from "../../src/cli/stock.ts";
import { fakePorts } from "../support/fakePorts.ts";

const HEAD = "part,capacitance [uF],voltage [V]\n";
const texts = {
  "a.csv": `${HEAD}one,100,400\ntwo,200,400\n`,
  "b.csv": `${HEAD}two,300,400\nthree,x,400\n`,
  "near.csv": "part,capacitence [uF],voltage [V]\none,100,400\n",
  "bad.csv": `${HEAD}one,x,400\n`,
  "r.csv": "family,tolerance [%],power [W],voltage [V]\nr1,5,2,350\n",
  "rbad.csv": "family,tolerance [%],power [W],voltage [V]\nr1,x,2,350\n",
  "brief.json": '{"energy": 1}',
};
const stock = (catalog?: readonly string[], resistors?: string) =>
  readStock({ catalog, resistors }, fakePorts(texts).files);
const codes = (read: ReturnType<typeof stock>): string[] => (read.ok ? [] : read.refusals.map((one) => one.code));

describe("readStock(given, files)", () => {
  test("no catalogue is refused", () => {
    expect(codes(stock())).toEqual(["missing-option"]);
    expect(codes(stock([]))).toEqual(["missing-option"]);
  });

  test("several files make one stock; a part that an earlier file has is told and lost", () => {
    const read = stock(["a.csv", "b.csv"]);
    if (!read.ok) throw new Error("must read");
    expect(read.value.parts.map((part) => part.part)).toEqual(["one", "two"]);
    expect(read.value.parts[1]?.capacitance).toBeCloseTo(200e-6, 12);
    expect(read.value.sources[1]).toMatchObject({ file: "b.csv", read: 0 });
    expect(read.value.sources[1]?.faults.map((one) => one.code).sort()).toEqual(["duplicate-part", "not-a-number"]);
    expect(read.value.families[0]?.assumed).toBe(true);
  });

  test("resistors are read, and the assumed family is then gone", () => {
    const read = stock(["a.csv"], "r.csv");
    expect(read.ok && read.value.families.map((one) => one.family)).toEqual(["r1"]);
  });

  test("the wrong kind of file is named as what it is", () => {
    expect(codes(stock(["r.csv"]))).toEqual(["wrong-kind"]);
    expect(codes(stock(["a.csv"], "a.csv"))).toEqual(["wrong-kind"]);
    const brief = stock(["a.csv", "brief.json"]);
    expect(codes(brief)).toEqual(["wrong-kind"]);
    expect(brief.ok ? "" : brief.refusals[0]?.want).toMatch(/before --catalog/);
  });

  test("no good row at all is refused with the faults; every unreadable file is told", () => {
    expect(codes(stock(["bad.csv"]))).toEqual(["not-a-number", "no-parts"]);
    const near = stock(["near.csv"]);
    expect(codes(near)).toEqual(["missing-value", "unknown-heading", "no-parts"]);
    expect(near.ok ? "" : near.refusals[1]?.want).toMatch(/perhaps "capacitance"/);
    expect(codes(stock(["a.csv"], "rbad.csv")).at(-1)).toBe("no-parts");
    expect(codes(stock(["/none/1", "/none/2"]))).toEqual(["no-such-file", "no-such-file"]);
  });
});

test("findPart(name, parts, place): found, nearly, not at all", () => {
  const read = stock(["a.csv"]);
  if (!read.ok) throw new Error("must read");
  const { parts } = read.value;
  const want = (name: string): string => {
    const found = findPart(name, parts, { field: "--part" });
    return found.ok ? found.value.part : (found.refusals[0]?.want ?? "");
  };
  expect(want("two")).toBe("two");
  expect(want("tow")).toBe('perhaps "two"');
  expect(want("something else")).toBe("one of the 2 parts of the catalogues");
});
