import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { DEMO_CATALOGS, demoCommand } from "../../src/cli/demo.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

test("demoCommand(ports): the plan of the demo brief, and that its parts are invented", () => {
  const ports = fakePorts();
  expect(demoCommand(ports)).toBe(0);
  expect(ports.told()).toBe("");
  expect(ports.printed()).toMatch(/invented/);
  expect(ports.printed()).toMatch(/Capacitance needed: 991\.8 µF/);
  expect(ports.printed()).toMatch(/Best: /);
});

test("the shipped demo brief is the fixture's, and every shipped capacitor catalogue is in the demo", () => {
  expect(readFileSync(at("catalogs/demo-brief.json"), "utf8")).toBe(
    readFileSync(at("fixtures/briefs/flash-lamp.json"), "utf8"),
  );
  const shipped = readdirSync(at("catalogs")).filter((name) => name.endsWith(".csv"));
  expect([...DEMO_CATALOGS, "resistors.csv", "fuses.csv"].sort()).toEqual(shipped.sort());
});
