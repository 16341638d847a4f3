import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { DEMO_CATALOGS, demoCommand, demoStock } from "../../src/cli/demo.ts";
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

test("demoStock(ports): brief and stock for the screens, refused when the package is not whole", () => {
  const demo = demoStock(fakePorts());
  expect(demo.ok && demo.value.parts.length).toBeGreaterThan(60);
  expect(demo.ok && demo.value.brief).toMatchObject({ energy: "2.4 kJ" });
  expect(demoStock({ ...fakePorts(), catalogs: "/none" }).ok).toBe(false);
});
