import { describe, expect, test, vi } from "vitest";
import { accepted, refused } from "../../../src/quantity/index.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { createStore } from "../../../src/tui/store.ts";
import { makeUnitsRunner, type UnitsRunner } from "../../../src/tui/units/runner.ts";
import { type UnitsPort, unitsOn } from "../../../src/tui/units/work.ts";
import { update } from "../../../src/tui/update/update.ts";
import { fakePorts } from "../../support/fakePorts.ts";
import { lotCsv } from "../../support/placeCli.ts";
import { engine, stateWith } from "../../support/stock.ts";

const chosen = { part: "flash-a", series: 8, parallel: 3, ties: "cross-tied" } as const;
const lot = lotCsv(Array.from({ length: 26 }, (_, i) => 460 + ((i * 7) % 23)));

/** The screen with its state, its keys as messages, and its effects run. */
function screen(port: UnitsPort) {
  const asked = stateWith({ chosen, screen: "units" });
  const state = { ...asked, answer: answerFor(asked, engine, true) };
  let runner: UnitsRunner | undefined;
  const store = createStore({
    initial: state,
    update,
    changed: () => {},
    run: (effect) => {
      if (effect.type === "units") runner?.run(effect.effect, port);
    },
  });
  runner = makeUnitsRunner({ state: store.state, send: store.send, now: () => performance.now() });
  const send = (message: Parameters<typeof store.send>[0]): void => store.send(message);
  const type = (text: string): void => {
    send({ type: "edit", edit: { edit: "clear" } });
    send({ type: "edit", edit: { edit: "insert", text } });
    send({ type: "units", message: { type: "confirm" } });
  };
  return { store, send, type, runner };
}

describe("makeUnitsRunner(options)", () => {
  test("a file named is read and placed; the list is saved under the name typed, and replaced only when told", async () => {
    const ports = fakePorts({ "l.csv": lot });
    const { store, send, type } = screen(unitsOn([], ports.files));
    send({ type: "units", message: { type: "name" } });
    type("none.csv");
    expect(store.state().units).toMatchObject({ typing: "path", refusals: [{ code: "no-such-file" }] });
    type("l.csv");
    expect(store.state().units.before?.bank).toEqual(chosen);
    await vi.waitFor(() => expect(store.state().units.placed).not.toBeNull(), { timeout: 10_000 });
    const { before, placed, running } = store.state().units;
    expect(running).toBeNull();
    expect(placed?.placing.charging.gap).toBeLessThan(before?.gap ?? 0);
    send({ type: "units", message: { type: "list" } });
    type("o.csv");
    expect(store.state().notice?.text).toMatch(/saved in o\.csv/);
    expect(ports.written.get("o.csv")).toMatch(/^stage,place,serial/);
  });

  test("a lot that is too small is refused in place; stopped at once, the best so far is shown as such", async () => {
    const port = unitsOn([], fakePorts({ "l.csv": lot, "few.csv": lotCsv([470, 471]) }).files);
    const { store, send, type } = screen(port);
    send({ type: "units", message: { type: "name" } });
    type("few.csv");
    await vi.waitFor(() => expect(store.state().units.refusals).toMatchObject([{ code: "place.too-few" }]));
    send({ type: "units", message: { type: "name" } });
    type("l.csv");
    send({ type: "units", message: { type: "cancel" } });
    await vi.waitFor(() => expect(store.state().units.placed?.stopped).toBe(true), { timeout: 10_000 });
  });

  test("ended: nothing is told any more; a refusal to save is said", async () => {
    const port: UnitsPort = {
      ...unitsOn([], fakePorts({ "l.csv": lot }).files),
      save: () => ({ kind: "trouble", words: "disk full" }),
      read: (path) => (path === "l.csv" ? accepted({ path, units: [], faults: [] }) : refused()),
    };
    const { store, runner, type, send } = screen(port);
    send({ type: "units", message: { type: "name" } });
    type("l.csv");
    runner?.stop();
    await new Promise((resolve) => setTimeout(resolve, 20));
    expect(store.state().units).toMatchObject({ placed: null, refusals: [] });
  });
});
