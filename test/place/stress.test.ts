import { expect, test } from "vitest";
import { stressFindings } from "../../src/place/stress.ts";

const stand = (voltage: number) => ({ voltage, group: 0, place: 0, seconds: 0 });
const course = { charging: stand(251), holding: stand(280), peak: stand(290), above: 290 / 280 - 1 };
const verdicts = (limit: number | null, known = true) =>
  stressFindings({
    voltage: 1000,
    limit,
    charging: { worst: 0.251, plusMinus: 0.004 },
    course: known ? course : null,
  }).map((finding) => finding.verdict);

test("stressFindings: the meter's doubt counts; without a limit or leakage nothing passes", () => {
  expect(verdicts(300)).toEqual(["pass", "pass", "pass"]);
  expect(verdicts(291)).toEqual(["pass", "pass", "fail"]);
  expect(verdicts(251.5)).toEqual(["fail", "fail", "fail"]);
  expect(verdicts(null)).toEqual(["not assessed", "not assessed", "not assessed"]);
  expect(verdicts(300, false)).toEqual(["pass", "not assessed", "not assessed"]);
});
