import { expect, test } from "vitest";
import { demoCommand } from "../../src/cli/demo.ts";
import { fakePorts } from "../support/fakePorts.ts";

test("demoCommand(ports): the plan of the demo brief, and that its parts are invented", () => {
  const ports = fakePorts();
  expect(demoCommand(ports)).toBe(0);
  expect(ports.told()).toBe("");
  expect(ports.printed()).toMatch(/invented/);
  expect(ports.printed()).toMatch(/Capacitance needed: 991\.8 µF/);
  expect(ports.printed()).toMatch(/Best: /);
});
