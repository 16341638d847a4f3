// The screen of blends changes: begun, on the way, stopped, found, ended.
import { describe, expect, test } from "vitest";
import { refused } from "../../../src/quantity/index.ts";
import { type BlendAnswer, type BlendState, NO_BLEND } from "../../../src/tui/blend/state.ts";
import { updateBlend } from "../../../src/tui/blend/update.ts";

const wanted = { what: "find", brief: {} as never, key: "k" } as const;
const answer: BlendAnswer = { plan: refused(), single: null, cautions: [] };
const begun = updateBlend(NO_BLEND, { type: "begun", key: "k" }, null).blend;

describe("updateBlend(blend, message, wanted)", () => {
  test("find asks for the brief in force; without one it says so", () => {
    expect(updateBlend(NO_BLEND, { type: "find" }, wanted)).toMatchObject({ effects: [wanted], notice: null });
    expect(updateBlend(NO_BLEND, { type: "find" }, null)).toMatchObject({ effects: [], notice: { tone: "warn" } });
  });

  test("begun drops what was found before; stages and seconds are kept", () => {
    const before: BlendState = { ...NO_BLEND, found: { key: "a", answer, seconds: 1, stopped: false } };
    expect(updateBlend(before, { type: "begun", key: "k" }, null).blend.found).toBeNull();
    const staged = updateBlend(begun, { type: "stage", stage: "ladder" }, null).blend;
    expect(updateBlend(staged, { type: "tick", seconds: 4 }, null).blend.running).toEqual({
      key: "k",
      stage: "ladder",
      seconds: 4,
      stopping: false,
    });
  });

  test("cancel stops a search and only one; what it then answers is said to be stopped", () => {
    expect(updateBlend(NO_BLEND, { type: "cancel" }, wanted).effects).toEqual([]);
    const stopping = updateBlend(begun, { type: "cancel" }, wanted);
    expect(stopping.effects).toEqual([{ what: "stop" }]);
    const done = updateBlend(stopping.blend, { type: "found", answer, seconds: 2 }, wanted);
    expect(done).toMatchObject({
      blend: { running: null, found: { key: "k", stopped: true, seconds: 2 } },
      notice: { tone: "warn", text: expect.stringMatching(/^Stopped/) },
    });
    expect(updateBlend(begun, { type: "found", answer, seconds: 2 }, wanted)).toMatchObject({
      blend: { found: { stopped: false } },
      notice: null,
    });
  });

  test("news of a search that is no more changes nothing; one that ended with nothing says why", () => {
    expect(updateBlend(NO_BLEND, { type: "found", answer, seconds: 2 }, null).blend).toBe(NO_BLEND);
    expect(updateBlend(NO_BLEND, { type: "tick", seconds: 2 }, null).blend).toBe(NO_BLEND);
    expect(updateBlend(begun, { type: "ended", key: "k", why: "cancelled" }, null)).toMatchObject({
      blend: { running: null, ended: { key: "k", why: "cancelled" } },
      notice: { text: expect.stringMatching(/^Cancelled/) },
    });
    expect(updateBlend(begun, { type: "ended", key: "k", why: "failed" }, null).notice).toBeNull();
  });
});
