import { describe, expect, test } from "vitest";
import { shotBlocks } from "../../src/cli/shotText.ts";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

function blocks(more: Record<string, unknown> = {}, unit = FILM): string {
  const brief = shotBrief(more);
  const shot = shotOf({ layout: shotLayout(brief, undefined, unit), unit, brief });
  if (!shot.ok) throw new Error(JSON.stringify(shot.refusals));
  return shotBlocks(shot.value, 80).join("\n\n");
}

describe("shotBlocks(report, width)", () => {
  test("figures, their spread, the energies as bars and the worst unit", () => {
    const text = blocks();
    expect(text).toMatch(/peak current +1\.445 kA +1\.472 kA +1\.495 kA/);
    expect(text).toMatch(/load +180 J +90 % +#{22}/);
    expect(text).toMatch(/bank +20 J +10 % +##$/m);
    expect(text).not.toMatch(/clamp|isolating/);
  });

  test("the place on the bus: why this unit, and how the others divide; none where it is not told", () => {
    const brief = shotBrief({
      load: { resistance: "20 mohm", inductance: "1 uH" },
      bus: { resistance: 0, inductance: 0, feed: "end", stepResistance: "1 mohm", stepInductance: "50 nH" },
    });
    const unit = { ...FILM, esr: 0.02, esl: 4e-8 };
    const shape = { series: 1, parallel: 4, ties: "strings" } as const;
    const shot = shotOf({ layout: shotLayout(brief, shape, unit), unit, brief });
    if (!shot.ok) throw new Error("the shot must be");
    const text = shotBlocks(shot.value, 80).join("\n").replace(/\s+/g, " ");
    expect(text).toMatch(/Position \d of 4 on a bus fed at one end: x \d\.\d+ by its place, x \d\.\d+ by the highest/);
    expect(text).toMatch(
      /along the bus alike units carry \S+ at position \d to \S+ at position \d of an even part; 1 mohm/,
    );
    expect(blocks()).not.toMatch(/along the bus/);
  });

  test("unknown and without bound say so", () => {
    const bare = { ...FILM, esr: undefined, esl: undefined } as unknown as typeof FILM;
    expect(blocks({}, bare)).toMatch(/ESR unknown, ESL unknown/);
    expect(blocks({}, bare)).toMatch(/bank +unknown: its resistance is not known/);
    expect(blocks({ load: { resistance: 0, inductance: 1e-6 } }, bare)).toMatch(/action +no bound/);
    expect(blocks({ load: { resistance: 1 } })).toMatch(/bus +unknown/);
    expect(blocks({ load: { current: 1, time: 0.01 } })).toMatch(/damping +the current is given/);
  });
});
