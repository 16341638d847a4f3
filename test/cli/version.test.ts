import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { VERSION } from "../../src/cli/version.ts";
import { at } from "../support/fakePorts.ts";

test("VERSION is the package's", () => {
  expect(VERSION).toBe(JSON.parse(readFileSync(at("package.json"), "utf8")).version);
});
