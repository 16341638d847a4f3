// Which piece is worked out next, and for which brief and bank it holds.
import { describe, expect, test } from "vitest";
import { detailKey, detailsOf, wantedPiece, wantsSpread, withPiece } from "../../src/tui/detail.ts";
import { answerFor } from "../../src/tui/engine.ts";
import type { State } from "../../src/tui/state.ts";
import { LOAD } from "../support/detailed.ts";
import { BRIEF, engine, stateWith } from "../support/stock.ts";

const BANK = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;
const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith({ chosen: BANK, screen: "sharing", ...changes });
  return { ...state, answer: answerFor(state, engine, true) };
};
const withNext = (state: State): State => {
  const piece = wantedPiece(state);
  return piece === null ? state : { ...state, details: withPiece(state, piece, engine) };
};

describe("wantedPiece(state)", () => {
  test("sharing: the states at rest, then the margin; the spread only when wanted", () => {
    let state = planned();
    expect(wantedPiece(state)).toBe("rest");
    state = withNext(state);
    expect(wantedPiece(state)).toBe("margin");
    state = withNext(state);
    expect(wantedPiece(state)).toBeNull();
    expect(wantedPiece({ ...state, spread: true })).toBe("spread");
    state = withNext({ ...state, spread: true });
    expect(wantedPiece(state)).toBeNull();
    expect(Object.keys(state.details ?? {})).toEqual(["key", "rest", "margin", "spread"]);
  });
  test("the spread is wanted unasked on the statistical basis", () => {
    expect(wantsSpread(planned({ values: { ...BRIEF, basis: "statistical" } }))).toBe(true);
    expect(wantsSpread(planned())).toBe(false);
  });
  test("shot: nothing without a load", () => {
    expect(wantedPiece(planned({ screen: "shot" }))).toBeNull();
    expect(wantedPiece(planned({ screen: "shot", values: { ...BRIEF, ...LOAD } }))).toBe("shot");
  });
  test.each(["brief", "layouts", "compare", "bank", "order"] as const)("nothing on %s", (screen) => {
    expect(wantedPiece(planned({ screen, spread: true, values: { ...BRIEF, ...LOAD } }))).toBeNull();
  });
  test("nothing without a bank, without a plan, or while an answer is awaited", () => {
    expect(wantedPiece(planned({ chosen: null }))).toBeNull();
    expect(wantedPiece(planned({ values: {} }))).toBeNull();
    expect(wantedPiece({ ...planned(), asked: 5 })).toBeNull();
    expect(wantedPiece(planned({ chosen: { ...BANK, part: "gone" } }))).toBeNull();
  });
});

describe("detailsOf(state)", () => {
  test("pieces of another brief or bank do not hold; those of the same text do, whatever object holds it", () => {
    const state = withNext(planned());
    expect(detailsOf(state)?.rest?.rating).toBe(450);
    expect(detailsOf({ ...state, values: { ...state.values } })).toBe(state.details);
    expect(detailsOf({ ...state, values: { ...BRIEF, voltage: "2 kV" } })).toBeNull();
    expect(detailsOf({ ...state, extra: { rate: 1 } })).toBeNull();
    expect(detailsOf({ ...state, chosen: { ...BANK, parallel: 5 } })).toBeNull();
    expect(detailsOf({ ...state, chosen: null })).toBeNull();
  });
  test("detailKey(state): null without a chosen bank", () => {
    expect(detailKey(stateWith())).toBeNull();
  });
});

test("withPiece(state, piece, engine): null where there is no bank to look at", () => {
  expect(withPiece(planned({ chosen: null }), "rest", engine)).toBeNull();
});
