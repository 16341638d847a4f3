// One question to the engine: refused, nothing fits, planned.
import { describe, expect, test } from "vitest";
import { answerFor, mostListed } from "../../src/tui/engine.ts";
import { update } from "../../src/tui/update/update.ts";
import { engine, stateWith } from "../support/stock.ts";

describe("answerFor(state, engine, quick)", () => {
  test("a brief that cannot be read is refused, each refusal with its field", () => {
    const answer = answerFor(stateWith({ values: { energy: "-1 J", voltage: "", ripple: "20" } }), engine, true);
    if (answer.kind !== "refused") throw new Error(answer.kind);
    expect(answer.refusals.map((r) => [r.place.field, r.code])).toEqual([
      ["energy", "bad-value"],
      ["voltage", "missing-value"],
      ["ripple", "bad-value"],
    ]);
  });
  test("nothing fits: the quick answer leaves the changes unsought, the whole one has them", () => {
    const state = stateWith({ values: { energy: "1 GJ", voltage: "2.2 kV", ripple: "100 %" } });
    const quick = answerFor(state, engine, true);
    const whole = answerFor(state, engine, false);
    if (quick.kind !== "planned" || whole.kind !== "planned") throw new Error("refused");
    expect([quick.plan.layouts.length, quick.changesSought, quick.plan.changes.length]).toEqual([0, false, 0]);
    expect(whole.changesSought).toBe(true);
    expect(whole.plan.changes.map((c) => c.field)).toContain("energy");
  });
  test("pins and the chosen bank are assessed under the brief as it is now; a part that is gone is null", () => {
    const pin = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;
    const answer = answerFor(stateWith({ pins: [pin, { ...pin, part: "gone" }], chosen: pin }), engine, true);
    if (answer.kind !== "planned") throw new Error(answer.kind);
    expect(answer.pinned.map((l) => l?.id ?? null)).toEqual(["flash-a 7s4p cross-tied", null]);
    expect(answer.chosen?.units).toBe(28);
    expect(answer.bill?.lines[0]?.needed).toBe(28);
  });
  test("without a chosen bank nothing is counted", () => {
    const answer = answerFor(stateWith(), engine, true);
    expect(answer.kind === "planned" && [answer.chosen, answer.bill]).toEqual([null, null]);
  });
});

test("mostListed(state): short beside the form, long on the list, and going there asks for the rest", () => {
  expect([mostListed(stateWith()), mostListed(stateWith({ screen: "layouts" }))]).toEqual([50, 200]);
  expect(update(stateWith(), { type: "go", screen: "layouts" }).effects).toEqual([{ type: "ask", asked: 1 }]);
  expect(update(stateWith({ screen: "layouts" }), { type: "go", screen: "brief" }).effects).toEqual([]);
});
