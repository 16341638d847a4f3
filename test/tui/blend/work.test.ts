// The thread's side: the same blend as the search itself, the layout that the command compares with, stages in order, and a stop.
import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../../src/catalog/index.ts";
import { plan, planBlends } from "../../../src/search/index.ts";
import { type BlendAsk, blendAnswer, LADDER, WITHIN } from "../../../src/tui/blend/work.ts";
import { briefOf } from "../../support/labParts.ts";
import { parts } from "../../support/stock.ts";

const brief = briefOf({ energy: 2400, voltage: 2200, ripple: 1 });
const families = [DEFAULT_FAMILY];
const ask = (changes: Partial<BlendAsk> = {}): Promise<Awaited<ReturnType<typeof blendAnswer>>> =>
  blendAnswer({ brief, parts: parts(), families, told: () => {}, stop: () => false, now: () => 0, ...changes });

test("blendAnswer(ask): what planBlends and plan say, each stage told once and in order, cautions once each", async () => {
  const stages: string[] = [];
  const { plan: read, single, cautions } = await ask({ told: (stage) => stages.push(stage) });
  const same = await planBlends({ brief, parts: parts(), families, within: WITHIN, ladder: LADDER, clock: () => 0 });
  expect(read).toEqual(same);
  const layouts = plan({ brief, parts: parts(), families, rank: "cost" });
  expect(layouts.ok && layouts.value.layouts[0]?.id).toBe(single?.id);
  expect(stages).toEqual(["one part", "cheapest", "kinds", "ladder"]);
  expect(read.ok && read.value.ladder?.steps.some(({ asked }) => asked)).toBe(true);
  expect(new Set(cautions).size).toBe(cautions.length);
  expect(cautions.length).toBeGreaterThan(3);
});

test("stopped at once: the best so far and a bound between which the cheapest lies; the cautions stand", async () => {
  const whole = await ask();
  const cheapest = (whole.plan.ok && whole.plan.value.blends[0]?.cost?.total) || Number.NaN;
  for (const most of [0]) {
    let polls = 0;
    const { plan: read, cautions } = await ask({ stop: () => ++polls > most });
    if (!read.ok) throw new Error("refused");
    const { status, blends, lowerBound, gap, ladder } = read.value;
    const cost = blends[0]?.cost?.total ?? 0;
    expect(status).toBe("stopped");
    expect(lowerBound).toBeGreaterThan(0);
    expect(lowerBound).toBeLessThanOrEqual(cheapest);
    expect(cost).toBeGreaterThanOrEqual(cheapest);
    expect(gap).toBeCloseTo((cost - (lowerBound ?? 0)) / cost, 9);
    expect(ladder?.end).not.toBe("complete");
    expect(cautions).toEqual(expect.arrayContaining(["This is a calculation, not an approval."]));
  }
});

test("nothing has a price: no blend, no layout to compare with, the parts left out by name", async () => {
  const bare = parts().map(({ price: _, currency: __, onHand: ___, ...part }) => part);
  const { plan: read, single } = await ask({ parts: bare });
  expect(single).toBeNull();
  expect(read).toMatchObject({ ok: true, value: { blends: [], compared: 0 } });
  expect(read.ok && read.value.leftOut.map(({ reason }) => reason)).toContain("price-missing");
});

/** All files that one reaches by imports that are taken at once; types vanish before. */
function reached(file: string, seen = new Set<string>()): ReadonlySet<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  for (const [, from = ""] of readFileSync(file, "utf8").matchAll(
    /^(?:import|export) (?!type\b)[^;]*?from "(\.[^"]+)"/gm,
  ))
    reached(join(dirname(file), from), seen);
  return seen;
}

test("the first frame loads nothing of the search: neither it nor the thread's side is reached from the start but by need", () => {
  const files = [...reached("src/tui/start.ts")];
  expect(files).toContain("src/tui/view/blendFound.ts");
  expect(
    files.filter((file) => /search\/blends\.ts|tui\/blend\/work\.ts|tui\/thread\.ts|search\/solve\.ts/.test(file)),
  ).toEqual([]);
  expect(reached("src/search/blends.ts")).toContain("src/search/blend/findBlend.ts");
});
