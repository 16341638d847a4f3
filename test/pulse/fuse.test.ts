// fuse: unknown data prove nothing; the worked bank's fuse lives, clears, and must bear the volts.
import { describe, expect, test } from "vitest";
import { type Fuse, type FuseDuty, fuseFindings } from "../../src/pulse/fuse.ts";

const fuse: Fuse = { meltingAction: 10000, clearingAction: 15000, dcVoltage: 450 };
// a bank of 56 250 A^2 s with five units a stage puts 2250 A^2 s through each
const duty: FuseDuty = { normalAction: 2250, leastFaultAction: 16896, voltage: 400 };
const verdicts = (f: Partial<Fuse>, d: Partial<FuseDuty> = {}, part?: number) =>
  fuseFindings({ ...fuse, ...f }, { ...duty, ...d }, part).map(({ verdict }) => verdict);

describe("fuseFindings(fuse, duty, part)", () => {
  test("anything unknown is not assessed", () => {
    expect(verdicts({ meltingAction: null, clearingAction: null, dcVoltage: null })).toEqual(
      Array(3).fill("not assessed"),
    );
    expect(verdicts({}, { normalAction: null, leastFaultAction: null, voltage: null })).toEqual(
      Array(3).fill("not assessed"),
    );
  });

  test("worked: 2250 of 10 000 A^2 s is within a quarter, 16 896 clears 15 000, 400 V within 450 V", () => {
    expect(verdicts({})).toEqual(["pass", "pass", "pass"]);
  });

  test("a smaller fuse tires, a larger never clears, an ac one may not break the arc", () => {
    expect(verdicts({ meltingAction: 8000 })[0]).toBe("fail");
    expect(verdicts({ clearingAction: 20000 })[1]).toBe("fail");
    expect(verdicts({ dcVoltage: 250 })[2]).toBe("fail");
  });

  test("each finding compares its own value with its own limit, and says which way to mend it", () => {
    const found = fuseFindings(fuse, duty);
    expect(found.map(({ id, state, value, limit, unit, source }) => [id, state, value, limit, unit, source])).toEqual([
      ["pulse.fuse.lives", "pulse", 2250, 2500, "A2s", "common-practice"],
      ["pulse.fuse.clears", "faulted", 16896, 15000, "A2s", "methods-derived"],
      ["pulse.fuse.voltage", "faulted", 400, 450, "V", "methods-derived"],
    ]);
    expect(found.map(({ note }) => note)).toEqual([
      expect.stringMatching(/0\.25 of melting.*larger fuse/),
      expect.stringMatching(/needs to clear/),
      expect.stringMatching(/an ac rating does not count/),
    ]);
  });

  test("the part of melting is the user's when given", () =>
    expect(verdicts({ meltingAction: 8000 }, {}, 0.3)[0]).toBe("pass"));
});
