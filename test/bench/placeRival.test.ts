import { describe, expect, test } from "vitest";
import { place } from "../../src/place/place.ts";
import { solveWithHighs } from "../../src/search/highs.ts";
import { wholes } from "../place/lots.ts";
import { stagesProgramme } from "./placeRival.ts";

describe("stagesProgramme(values, stages)", () => {
  // Two stages: the largest least sum is the least gap, so a general solver that proves must end where ours does.
  test("two stages of 4, 6 lots: the proven least sum is that of the proven placing", { timeout: 60_000 }, async () => {
    for (let seed = 1; seed <= 6; seed++) {
      const used = wholes(8, seed, 900, 1100);
      const programme = stagesProgramme(used, 2);
      const answer = await solveWithHighs(programme, { seconds: 20, gap: 1e-9 });
      if (answer.status !== "optimal") throw new Error(answer.status);
      const read = place(
        used.map((capacitance, i) => ({ serial: String(i), capacitance })),
        { series: 2, parallel: 4, ties: "cross-tied" },
      );
      if (!read.ok) throw new Error();
      const least = Math.min(
        ...read.value.groups.map((group) => group.reduce((sum, serial) => sum + used[Number(serial)]!, 0)),
      );
      const mean = used.reduce((sum, v) => sum + v, 0) / used.length;
      expect(-answer.cost * mean).toBeCloseTo(least, 3);
    }
  });
});
