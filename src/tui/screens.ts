// Joins state, keys, engine, painter and terminal, and runs the screens until they end: the one owner of the end.
import type { Capacitor, Overrides, ResistorFamily } from "../catalog/index.ts";
import { makeAsker } from "./asker.ts";
import { makeAutosave } from "./autosave.ts";
import { makeBlendRunner } from "./blend/runner.ts";
import { makeDetailer } from "./detailer.ts";
import { ASK_GROUND } from "./ground.ts";
import { openInput } from "./input.ts";
import { messageFor } from "./keys.ts";
import { makeLongWork } from "./longWork.ts";
import { MOUSE_OFF, MOUSE_ON } from "./mouse.ts";
import { PaintStream } from "./paint.ts";
import type { EnginePort, ScreenPorts, Workshop } from "./ports.ts";
import { startState } from "./restore.ts";
import { openSession } from "./session.ts";
import { ask, type Effect, type Message } from "./state.ts";
import { createStore } from "./store.ts";
import { screenTrouble } from "./terminal.ts";
import { makeUnitsRunner } from "./units/runner.ts";
import { update } from "./update/update.ts";
import type { Mounted } from "./view/mount.ts";
import { drawScreen } from "./view/screen.ts";

const WRONG_USE = 2;
const HANG_UP = 129;

/** Runs the screens. Result: the exit status. Rejects with what went wrong when it is a bug of ours; the terminal is restored by then. */
export function openScreens(ports: ScreenPorts): Promise<number> {
  const { stdin, stdout, env, process, writeSync, complain } = ports;
  const trouble = screenTrouble({
    env,
    inputIsTerminal: stdin.isTTY === true,
    outputIsTerminal: stdout.isTTY === true,
  });
  if (trouble !== null) {
    complain(trouble);
    return Promise.resolve(WRONG_USE);
  }
  // With DEV set, ink would load developer tools and print into the screen.
  delete env.DEV;

  return new Promise((resolve, reject) => {
    const begun = ask(startState(ports)).state;
    let workshop: Workshop | null = null;
    let threadStock: { readonly parts: readonly Capacitor[]; readonly families: readonly ResistorFamily[] } | null =
      null;
    const engine = (): EnginePort | null => workshop?.engine ?? null;
    const paint = new PaintStream(begun, (text) => stdout.write(text));
    let mounted: Mounted | null = null;
    let frame: ReturnType<typeof setImmediate> | undefined;
    let over = false;
    let loading = false;
    let opening = false;
    /** The catalogues changed while they were read. */
    let again = false;

    const draw = (): void => {
      frame = undefined;
      asker.beforeFrame();
      detailer.beforeFrame();
      clearImmediate(frame);
      frame = undefined;
      const drawn = drawScreen(store.state());
      paint.caret = drawn.caret;
      // Until ink is loaded the rows, which need no layout, go to the painter by themselves: the first frame is not kept waiting.
      if (mounted === null) paint.paint(drawn.rows);
      else mounted.show(drawn.rows);
      paint.settle();
      detailer.afterFrame();
      if (workshop === null && !opening) openWorkshop();
      if (store.state().answer !== null) loadInk();
    };
    /** The catalogues are read, and the engine is loaded, once the first frame stands. */
    const openWorkshop = (): void => {
      if (opening) again = true;
      if (opening) return;
      opening = true;
      ports.open().then((read) => {
        opening = false;
        if (over) return;
        if (read.ok) {
          workshop = read.value;
          threadStock = { parts: workshop.catalogue.parts, families: workshop.families };
        }
        if (!read.ok && workshop === null) return session.end(WRONG_USE);
        if (!read.ok || workshop === null)
          return say("bad", `${ports.stock.name} cannot be read now; what was read before holds.`);
        const { stock, words, catalogue, overrides } = workshop;
        store.send({ type: "opened", stock, words, catalogue, overrides });
        if (again) openWorkshop();
        again = false;
      }, session.fail);
    };
    /** Ink is loaded once what fits is on screen: the first list does not wait for it either. */
    const loadInk = (): void => {
      if (loading) return;
      loading = true;
      if (ports.ground === undefined && store.state().look.colour) stdout.write(ASK_GROUND);
      import("./view/mount.ts").then(({ mount }) => {
        if (!over) mounted = mount(paint, stdin as NodeJS.ReadStream, drawScreen(store.state()).rows);
      }, session.fail);
    };
    const say = (tone: "warn" | "bad", text: string): void => store.send({ type: "say", notice: { tone, text } });
    const setByHand = (overrides: Overrides): void => {
      const answer = workshop?.saveOverrides(overrides);
      if (answer?.kind === "trouble") say("bad", `Not set, for it cannot be saved: ${answer.words}`);
      openWorkshop();
    };
    const run = (effect: Effect, send: (message: Message) => void): void => {
      if (effect.type === "ask" || effect.type === "stop") {
        longWork.stop();
        detailer.stopped();
      }
      if (effect.type === "stop") asker.stop();
      else if (effect.type === "ask") asker.ask();
      else if (effect.type === "quit") session.end(0);
      else if (effect.type === "suspend") session.suspend();
      else if (effect.type === "redraw") paint.redraw();
      else if (effect.type === "mouse") writeSync(effect.on ? MOUSE_ON : MOUSE_OFF);
      else if (effect.type === "overrides") setByHand(effect.overrides);
      else if (effect.type === "blend") blend.run(effect.effect);
      else if (effect.type === "units") {
        if (workshop !== null) units.run(effect.effect, workshop.units);
      } else if (workshop !== null)
        send({ type: "saved", answer: workshop.exportBill(effect.bill, effect.path, effect.replace) });
    };
    const store = createStore({
      initial: begun,
      update,
      run,
      changed: () => {
        if (!over) frame ??= setImmediate(draw);
        autosave.changed();
      },
    });
    const now = (): number => performance.now();
    const units = makeUnitsRunner({ state: store.state, send: store.send, now });
    // One object as long as the workshop is the same, so that a thread on other parts is known by it.
    const threads = { open: ports.thread ?? null, stock: () => threadStock, send: store.send, now };
    const longWork = makeLongWork(threads);
    const blend = makeBlendRunner(threads);
    const asker = makeAsker({ engine, state: store.state, send: store.send, now, longWork });
    const detailer = makeDetailer({ engine, state: store.state, send: store.send, longWork });
    const autosave = makeAutosave({
      state: store.state,
      save: ports.saveSession,
      onTrouble: (words) =>
        store.send({ type: "say", notice: { tone: "bad", text: `The brief and pins cannot be saved: ${words}` } }),
    });
    const onResize = (): void => {
      const size = { columns: stdout.columns || begun.columns, rows: stdout.rows || begun.rows };
      paint.resize(size);
      store.send({ type: "resized", ...size });
    };
    const onLost = (): void => session.end(HANG_UP);
    const input = openInput({
      stdin,
      onEvent: (event) => {
        const message = messageFor(store.state(), event);
        if (message !== null) store.send(message);
      },
      onGone: onLost,
    });
    const session = openSession({
      process,
      writeSync,
      startInput: input.start,
      stopInput: input.stop,
      redraw: () => {
        onResize();
        if (store.state().mouse) writeSync(MOUSE_ON);
        paint.redraw();
      },
      onEnd: (status, fault) => {
        over = true;
        clearImmediate(frame);
        asker.stop();
        detailer.stop();
        units.stop();
        blend.stop();
        unwatch();
        paint.close();
        stdout.off("resize", onResize);
        const unsaved = autosave.finish();
        mounted?.unmount();
        if (unsaved !== null) complain(`The brief and pins were not saved: ${unsaved}`);
        if (fault === null) resolve(status);
        else reject(fault);
      },
    });

    const unwatch = ports.watch(() => {
      say("warn", `${ports.stock.name} changed on disk and is read again.`);
      openWorkshop();
    });
    session.enter();
    stdout.on("resize", onResize);
    stdout.on("error", onLost);
    draw();
  });
}
