import { describe, expect, test } from "vitest";
import { lastLine } from "../../src/cli/lastLine.ts";

const of = (...verdicts: readonly ("pass" | "warn" | "fail" | "not assessed")[]) =>
  verdicts.map((verdict) => ({ verdict }));

describe("lastLine(findings, faults)", () => {
  test("checks as before where no fault fails or is open; a warning is neither", () => {
    expect(lastLine(of("pass"), of("pass", "warn"))).toBe("No check failed.");
    expect(lastLine(of("not assessed"), [])).toBe("No check failed; 1 could not be assessed.");
    expect([lastLine(of("fail"), []), lastLine(of("fail", "fail", "not assessed"), [])]).toEqual([
      "1 CHECK FAILED.",
      "2 CHECKS FAILED.",
    ]);
  });
  test("faults that fail are never passed over", () => {
    expect(lastLine(of("pass"), of("fail", "fail", "fail", "not assessed"))).toBe(
      "No check failed. OF THE FAULTS 3 FAIL, 1 could not be assessed.",
    );
    expect(lastLine([], of("fail"))).toBe("No check failed. OF THE FAULTS 1 FAILS.");
    expect(lastLine(of("not assessed"), of("not assessed"))).toBe(
      "No check failed; 1 could not be assessed. OF THE FAULTS 1 could not be assessed.",
    );
  });
});
