import { expect, test } from "vitest";
import { versionFault } from "../../src/quantity/index.ts";

const fault = (found: unknown, newest = 2) =>
  versionFault({ found, newest, place: { file: "a.json", field: "version" } });

test("versionFault({ found, newest, place }): none, the first and the newest are read", () => {
  expect([undefined, 1, 2].map((found) => fault(found))).toEqual([null, null, null]);
});

test("versionFault(...): a later one is refused as such, by its place", () => {
  expect(fault(3)).toEqual({
    code: "newer-version",
    place: { file: "a.json", field: "version" },
    read: "version 3",
    want: "a version from 1 to 2; a later program reads this file",
  });
  expect(fault(1e9, 1)?.want).toMatch(/^version 1;/);
});

test("versionFault(...): what is no version is refused as a value, not taken for old", () => {
  for (const odd of [0, -1, 1.5, "1", null, Number.NaN, Number.POSITIVE_INFINITY, {}, true])
    expect(fault(odd)?.code, JSON.stringify(odd)).toBe("bad-value");
});
