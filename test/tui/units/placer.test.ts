import { describe, expect, test, vi } from "vitest";
import type { Placing, SearchStep } from "../../../src/place/index.ts";
import { accepted, type Read } from "../../../src/quantity/index.ts";
import { makePlacer } from "../../../src/tui/units/placer.ts";

/** A search of so many steps, 5 ms each by the clock handed in. */
function* search(
  clock: { at: number },
  goOn: () => boolean,
  steps: number,
): Generator<SearchStep<string>, Read<Placing>> {
  for (let k = 0; k < steps && goOn(); k++) {
    clock.at += 5;
    yield { phase: "exchange", gap: 1 / (k + 1), moves: k, standing: () => [[String(k)]] };
  }
  return accepted({ moves: clock.at } as unknown as Placing);
}

function placerOn(clock: { at: number }) {
  const progress = vi.fn();
  const done = vi.fn();
  return { progress, done, placer: makePlacer({ now: () => clock.at, progress, done }) };
}

describe("makePlacer({ now, progress, done })", () => {
  test("works in slices, tells at most every 60 ms, and ends", () => {
    vi.useFakeTimers();
    const clock = { at: 0 };
    const { placer, progress, done } = placerOn(clock);
    placer.begin((goOn) => ({ steps: search(clock, goOn, 100), moves: 100 }));
    expect(progress).not.toHaveBeenCalled();
    vi.advanceTimersToNextTimer();
    expect(clock.at).toBeLessThan(30);
    vi.runAllTimers();
    expect(done).toHaveBeenCalledExactlyOnceWith(expect.objectContaining({ ok: true }), false);
    expect(progress.mock.calls.length).toBeGreaterThan(5);
    expect(progress.mock.calls.length).toBeLessThan(10);
    expect(progress.mock.calls[1]?.[0]).toMatchObject({ phase: "exchange", part: 0.12, groups: [["12"]] });
    vi.useRealTimers();
  });

  test("stopped: the search is told and its best is handed on; dropped, or begun anew: nothing more is told of it", () => {
    vi.useFakeTimers();
    const clock = { at: 0 };
    const { placer, done } = placerOn(clock);
    placer.begin((goOn) => ({ steps: search(clock, goOn, 100), moves: 100 }));
    vi.advanceTimersToNextTimer();
    placer.stop();
    vi.runAllTimers();
    expect(done).toHaveBeenCalledExactlyOnceWith(expect.objectContaining({ ok: true }), true);
    expect(clock.at).toBeLessThan(50);
    placer.begin((goOn) => ({ steps: search(clock, goOn, 100), moves: 100 }));
    vi.advanceTimersToNextTimer();
    placer.begin((goOn) => ({ steps: search(clock, goOn, 1), moves: 1 }));
    vi.runAllTimers();
    expect(done).toHaveBeenCalledTimes(2);
    expect(done.mock.calls[1]?.[1]).toBe(false);
    placer.begin((goOn) => ({ steps: search(clock, goOn, 100), moves: 100 }));
    placer.drop();
    vi.runAllTimers();
    expect(done).toHaveBeenCalledTimes(2);
    vi.useRealTimers();
  });
});
