import { describe, expect, test } from "vitest";
import { above, fromZero, part, plain, whole, word, yesNo } from "../../src/search/fields.ts";

type Schema = {
  safeParse: (raw: unknown) => { success: boolean; data?: unknown; error?: { issues: readonly { message: string }[] } };
};
const value = (schema: Schema, raw: unknown) => {
  const read = schema.safeParse(raw);
  return read.success ? read.data : read.error?.issues[0]?.message;
};

describe("fields of a brief", () => {
  test("above, fromZero: SI numbers or text; the edge is in or out", () => {
    expect(value(above("resistance"), "4R7")).toBe(4.7);
    expect(value(above("resistance"), 0)).toMatch(/above 0/);
    expect(value(fromZero("resistance"), 0)).toBe(0);
    expect(value(fromZero("inductance"), "25 uH")).toBe(25e-6);
    expect(value(fromZero("inductance"), "25 V")).toMatch(/unit/);
    expect(value(fromZero("inductance"), -1)).toMatch(/from 0/);
  });

  test("part: a fraction, hinting at percent", () => {
    expect(value(part(), "5 %")).toBe(0.05);
    expect(value(part(), 5)).toMatch(/write "5 %"/);
  });

  test("plain and whole numbers, also as text", () => {
    expect(value(plain({ least: 0, most: 10 }), "7.5")).toBe(7.5);
    expect(value(whole(1, 5), "3")).toBe(3);
    expect(value(whole(1, 5), 2.5)).toMatch(/whole/);
  });

  test("word: any case, hyphens; a near one is named", () => {
    const shapes = word(["flat bars", "wire pair"]);
    expect(value(shapes, "Flat-Bars")).toBe("flat bars");
    expect(value(shapes, "wire pear")).toMatch(/perhaps "wire pair"/);
  });

  test("yesNo", () => {
    expect([true, "yes", "true", false, "no"].map((raw) => value(yesNo, raw))).toEqual([
      true,
      true,
      true,
      false,
      false,
    ]);
    expect(value(yesNo, "maybe")).toBe("yes or no");
  });
});
