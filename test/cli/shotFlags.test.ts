import { expect, test } from "vitest";
import { FLAG_GROUPS, SHOT_FLAGS } from "../../src/cli/shotFlags.ts";
import { briefJsonSchema } from "../../src/search/index.ts";

/** Every path of the brief's own schema. */
function paths(node: unknown, path = ""): readonly string[] {
  const { properties } = (node ?? {}) as { properties?: Record<string, unknown> };
  if (properties === undefined) return [path];
  return Object.entries(properties).flatMap(([key, below]) => paths(below, path === "" ? key : `${path}.${key}`));
}

test("every key of load and circuit in the brief's schema has one flag, and every flag a key", () => {
  const known = paths(briefJsonSchema());
  const keys = SHOT_FLAGS.map(({ key }) => key);
  expect(new Set(keys).size).toBe(keys.length);
  expect(keys.filter((key) => !known.includes(key))).toEqual([]);
  const heads = new Set(keys.map((key) => key.split(".")[0]));
  expect(known.filter((path) => heads.has(path.split(".")[0] as string) && !keys.includes(path))).toEqual([]);
});

test("every group has a heading", () => {
  expect(SHOT_FLAGS.every(({ group }) => group !== undefined && group in FLAG_GROUPS)).toBe(true);
});
