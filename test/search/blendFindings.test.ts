// Findings of a blend as a whole.
import { expect, test } from "vitest";
import { blendFindings } from "../../src/search/blendFindings.ts";
import { briefOf } from "../support/labParts.ts";

const span = (low: number | null, nominal: number, high: number | null) => ({ low, nominal, high });
const whole = {
  brief: briefOf({ energy: 80, voltage: 400, steady: { current: 1, frequency: 10 } }),
  polarised: false,
  capacitance: span(1e-3, 1.1e-3, 1.2e-3),
  energy: span(80, 88, 96),
  bleed: { seconds: 20, together: 15, toVoltage: 60 },
};
const found = (over: object) => {
  const all = blendFindings({ ...whole, ...over });
  return (id: string) => all.find((one) => one.id === id);
};

test("blendFindings(whole): energy and steady supply against their needs, by the basis", () => {
  expect(found({})("pulse-energy")).toMatchObject({ verdict: "pass", value: 80, limit: 80 });
  expect(found({ energy: span(79.9, 88, 96) })("pulse-energy")?.verdict).toBe("fail");
  expect(found({ energy: span(null, 88, null) })("pulse-energy")?.verdict).toBe("not assessed");
  const nominal = { ...whole.brief, basis: "nominal" as const };
  expect(found({ energy: span(79.9, 88, 96), brief: nominal })("pulse-energy")?.verdict).toBe("pass");
  // I/(f r V) = 1/(10 x 1 x 400) = 250 uF.
  expect(found({})("steady-current")).toMatchObject({ verdict: "pass", limit: 2.5e-4, value: 1e-3 });
});
test("bleed without a limit is not assessed; a group that never empties is a warning", () => {
  expect(found({})("bleed")).toMatchObject({ verdict: "not assessed", value: 20 });
  expect(found({ bleed: { seconds: null, together: 3, toVoltage: 60 } })("bleed")).toMatchObject({
    verdict: "warn",
    value: null,
  });
});
test("hazards count all the capacitance at its high end", () =>
  expect(found({})("energy-class")?.value).toBeCloseTo((1.2e-3 * 400 ** 2) / 2, 9));
