import { expect, test } from "vitest";
import { READ, ruleName, toldRule } from "../../src/sheet/rules.ts";

test("ruleName(id): body, clause and edition, as much of them as is known", () => {
  expect(ruleName("nfpa-70e-360")).toBe("NFPA 70E Article 360 (2021, 2024)");
  expect(ruleName("iec-60831-decay")).toBe("IEC 60831-1");
});

test("toldRule(id) and READ: what was not read says so, memory asks to be confirmed", () => {
  expect(toldRule("nec-460-28")).toMatch(/460\.28, from memory: confirm against the text$/);
  expect(toldRule("nec-460-6")).toMatch(/, second hand$/);
  expect(toldRule("lbnl-thermal")).toBe(ruleName("lbnl-thermal"));
  expect(READ.memory).toMatch(/confirm against the text/);
});
