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

  test("unknown and without bound say so", () => {
    const bare = { ...FILM, esr: undefined, esl: undefined } as unknown as typeof FILM;
    expect(blocks({}, bare)).toMatch(/ESR unknown, ESL unknown/);
    expect(blocks({}, bare)).toMatch(/bank +unknown: its resistance is not known/);
    expect(blocks({ load: { resistance: 0, inductance: 1e-6 } }, bare)).toMatch(/action +no bound/);
    expect(blocks({ load: { resistance: 1 } })).toMatch(/bus +unknown/);
    expect(blocks({ load: { current: 1, time: 0.01 } })).toMatch(/damping +the current is given/);
  });
});
