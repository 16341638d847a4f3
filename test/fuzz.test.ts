// Every reader under a few thousand mutated inputs; the same at length is test/campaigns/fuzz.ts.
import { describe, expect, test } from "vitest";
import { TARGETS, tried } from "./support/fuzz.ts";
import { chance } from "./support/random.ts";

const RUNS = 700;

describe("a reader of files, given mutated ones", () => {
  test.each(TARGETS.map((target) => [target.name, target] as const))(
    "%s: never throws, accepts no value outside its range, places every fault",
    (_name, target) => {
      const c = chance(1);
      let accepted = 0;
      for (let run = 0; run < RUNS; run++) {
        const verdict = tried(target, c);
        if (verdict.accepted) accepted++;
        if (verdict.broken !== null) expect.fail(`${verdict.broken}\n${JSON.stringify(verdict.text)}`);
      }
      // A fuzz whose every input is refused whole would prove nothing about what is accepted.
      expect(accepted).toBeGreaterThan(5);
      expect(accepted).toBeLessThan(RUNS);
    },
  );
});
