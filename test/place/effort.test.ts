import { describe, expect, test } from "vitest";
import { effort, mayGoOn, settle, share } from "../../src/place/effort.ts";

describe("effort(moves, within) and mayGoOn(work, trials)", () => {
  test("stops once the trials are spent", () => {
    const work = effort(100);
    expect(mayGoOn(work, 60)).toBe(true);
    expect(mayGoOn(work, 60)).toBe(false);
    expect(work.spent).toBe(120);
  });
  test("asks the caller's time check now and then, and takes no for an answer from then on", () => {
    let asked = 0;
    const work = effort(1e9, () => ++asked < 3);
    let steps = 0;
    while (mayGoOn(work, 1000)) steps++;
    expect(asked).toBe(3);
    expect(steps).toBeGreaterThan(10);
    expect(mayGoOn(work, 1)).toBe(false);
  });
});

describe("share(work, moves) and settle(work, part)", () => {
  test("a part gets no more than is left and its spending counts", () => {
    const work = effort(100);
    mayGoOn(work, 70);
    const part = share(work, 1000);
    expect(part.moves).toBe(30);
    mayGoOn(part, 30);
    settle(work, part);
    expect(mayGoOn(work, 0)).toBe(false);
  });
});
