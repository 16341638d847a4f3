// What was found as a screen: the proof, the layout of one part beside it, what stayed out, and why there is nothing.
import { describe, expect, test } from "vitest";
import { accepted, refused } from "../../../src/quantity/index.ts";
import type { BlendPlan } from "../../../src/search/index.ts";
import type { FoundBlends } from "../../../src/tui/blend/state.ts";
import type { State } from "../../../src/tui/state.ts";
import { foundPage } from "../../../src/tui/view/blendFound.ts";
import { flatOf, foundFor, plannedOn, withBlend } from "../../support/blendScreen.ts";
import { CATALOGUE, parts } from "../../support/stock.ts";

const state = plannedOn();
const found = await foundFor(state);
const plan = found.answer.plan.ok ? found.answer.plan.value : null;
if (plan === null) throw new Error("no plan");
const text = (at: FoundBlends, on: State = state): string => flatOf(withBlend(on, { found: at }));
const changed = (changes: Partial<BlendPlan>, more: Partial<FoundBlends> = {}): string =>
  text({ ...found, ...more, answer: { ...found.answer, plan: accepted({ ...plan, ...changes }) } });

describe("foundPage(found, state, room)", () => {
  test("proven: the cost, the proof in words, what one part costs more, parts left out with why, all cautions", () => {
    const shown = text(found);
    const [best] = plan.blends;
    expect(shown).toContain(`${best?.cost?.total.toFixed(2)} EUR`);
    expect(shown).toMatch(
      /The cheapest is proven \(own search\): its proof was checked by a separate verifier\. Took 1\.2 s\./,
    );
    const more = (found.answer.single?.cost?.total ?? 0) - (best?.cost?.total ?? 0);
    expect(more).toBeGreaterThan(0);
    expect(shown).toContain(
      `The cheapest layout of one part, ${found.answer.single?.id}, costs ${more.toFixed(2)} EUR more.`,
    );
    expect(shown).toContain("- snap-c: it has no price");
    expect(shown).toContain("film-d: its leakage is unknown");
    for (const caution of found.answer.cautions) expect(shown).toContain(caution);
  });

  test("no layout of one part to compare with: said", () => {
    expect(text({ ...found, answer: { ...found.answer, single: null } })).toContain(
      "No layout of one part fits, or none that does has a price to compare with.",
    );
  });

  test("stopped with a gap: the best found, its bound, and that Enter begins again; never called the cheapest", () => {
    const shown = changed({ status: "stopped", lowerBound: 500, gap: 0.0443 }, { stopped: true });
    expect(shown).toMatch(
      /Best blend found,.*NOT PROVEN: the best found by the time it was stopped\. No blend costs less than 500\.00 EUR: it is at most 4\.43 % too dear\. Stopped after 1\.2 s; Enter begins again\./,
    );
    expect(shown).not.toMatch(/Cheapest blend|solver-time/);
  });

  test("stopped with nothing in hand: nothing was found, and none is ruled out", async () => {
    const none = await foundFor(state, parts(), () => true);
    expect(none.answer.plan).toMatchObject({ ok: true, value: { status: "stopped" } });
    expect(changed({ status: "stopped", blends: [], gap: null, lowerBound: null }, { stopped: true })).toMatch(
      /No blend was found, and none was ruled out\..*Not settled by the time it was stopped/,
    );
  });

  test("nothing fits: proven, and what alone would let one in", async () => {
    const tight = plannedOn(undefined, {
      values: { energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %", maxUnits: "30" },
    });
    const shown = text(await foundFor(tight), tight);
    expect(shown).toMatch(
      /No blend fits within the limits\. Each of these alone would do, the least change first: - (raise|lower) /,
    );
    expect(shown).toContain("It is proven that none meets the need within the limits");
    expect(shown).not.toContain("Cheapest blend");
  });

  test("no part has a price: said first, with where to give one; nothing is called proven", async () => {
    const bare = parts(CATALOGUE.replace(/,(3\.10|5\.20|38\.00),EUR,\d*/g, ",,,"));
    const on = plannedOn(bare);
    const shown = text(await foundFor(on, bare), on);
    expect(shown).toMatch(
      /No part that could be used has a price, so none is the cheapest\. Give prices in the catalogue, or by hand on the parts screen \(9\)\./,
    );
    expect(shown).toContain("flash-a: it has no price");
    expect(shown).not.toMatch(/proven/);
  });

  test("two engines that disagree: said, and the proof is not claimed", () => {
    const shown = changed({ status: "stopped", gap: null, disagreements: [{ engine: "HiGHS", cost: 1, id: "x" }] });
    expect(shown).toContain("Two engines disagree, so nothing is proven.");
    expect(shown).not.toContain("The cheapest is proven");
  });

  test("more parts left out than are told are counted", () => {
    const leftOut = Array.from({ length: 33 }, (_, at) => ({
      ...plan.leftOut[0],
      part: `p${at}`,
    })) as BlendPlan["leftOut"];
    const shown = changed({ leftOut });
    expect(shown).toContain("Left out of the blends: 33");
    expect(shown).toContain("and 13 more; joulewright plan BRIEF --blend tells all.");
  });

  test("two currencies are refused in words", () => {
    const refusal = { code: "two-currencies", place: { field: "currency" }, read: "EUR, USD", want: "one currency" };
    const page = foundPage({ ...found, answer: { ...found.answer, plan: refused(refusal) } }, state, {
      columns: 80,
      rows: 20,
    });
    expect(page.rows[0]?.left[0]?.text).toMatch(/^! currency: prices are in different currencies/);
  });
});
