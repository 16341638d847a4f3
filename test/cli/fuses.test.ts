import { describe, expect, test } from "vitest";
import { readFuseStock } from "../../src/cli/fuses.ts";
import { fakePorts } from "../support/fakePorts.ts";
import { shotBrief } from "../support/shotBank.ts";

const HEAD = "fuse,voltage [V],melting action [A2s],price,currency";
const read = (text: string, currency: string | null = "EUR", more = {}) =>
  readFuseStock("f.csv", fakePorts({ "f.csv": text }).files, shotBrief(more), currency);

describe("readFuseStock(path, files, brief, currency)", () => {
  test("good rows, bad rows told", () => {
    const stock = read(`${HEAD}\na,500,10,1.50,EUR\nb,x,10,1,EUR\n`);
    expect(stock.ok && stock.value.fuses.map(({ fuse }) => fuse)).toEqual(["a"]);
    expect(stock.ok && stock.value.lost).toHaveLength(1);
  });

  test("prices come into the plan's currency, or are refused without a rate", () => {
    const text = `${HEAD}\na,500,10,2,USD\n`;
    expect(read(text).ok).toBe(false);
    const stock = read(text, "EUR", { exchange: { USD: 0.5 } });
    expect(stock.ok && stock.value.fuses[0]).toMatchObject({ price: 100, currency: "EUR" });
  });

  test("no file, another table, no good row", () => {
    expect(readFuseStock("none.csv", fakePorts().files, shotBrief(), null).ok).toBe(false);
    expect(read("part,capacitance [uF],voltage [V]\na,1,1\n").ok).toBe(false);
    expect(read(`${HEAD}\na,x,10,1,EUR\n`).ok).toBe(false);
  });
});
