// The terminal taken and given back: every way of ending restores it, once, and says the right status.
import { describe, expect, test, vi } from "vitest";
import { ENTER, LEAVE, openSession } from "../../src/tui/session.ts";
import { Screen } from "../support/screen.ts";
import { FakeProcess } from "../support/tty.ts";

function open(platform = "linux") {
  const process = new FakeProcess(platform);
  const log: string[] = [];
  const ends: [number, unknown][] = [];
  let broken = false;
  const session = openSession({
    process,
    writeSync: (text) => {
      if (broken) throw new Error("EIO");
      log.push(text === ENTER ? "enter" : text === LEAVE ? "leave" : text);
    },
    startInput: () => log.push("start"),
    stopInput: () => log.push("stop"),
    redraw: () => log.push("redraw"),
    onEnd: (status, trouble) => {
      log.push("end");
      ends.push([status, trouble]);
    },
  });
  return { process, session, log, ends, breakTerminal: () => (broken = true) };
}

describe("ending", () => {
  test("end(status) leaves the screen before it tells, and only once", () => {
    const { session, log, ends } = open();
    session.enter();
    session.end(0);
    session.end(1);
    expect(log).toEqual(["enter", "start", "stop", "leave", "end"]);
    expect(ends).toEqual([[0, null]]);
  });

  test.each([
    ["SIGINT", 130],
    ["SIGQUIT", 131],
    ["SIGTERM", 143],
    ["SIGHUP", 129],
  ])("%s ends with %i", (signal, status) => {
    const { session, process, ends, log } = open();
    session.enter();
    process.send(signal);
    expect(ends).toEqual([[status, null]]);
    expect(log.at(-2)).toBe("leave");
  });

  test.each(["uncaughtException", "unhandledRejection"])(
    "%s leaves first, then hands the trouble on with 70",
    (event) => {
      const { session, process, ends, log } = open();
      session.enter();
      const trouble = new Error("planted");
      process.send(event, trouble);
      expect(ends).toEqual([[70, trouble]]);
      expect(log).toEqual(["enter", "start", "stop", "leave", "end"]);
    },
  );

  test("afterwards no listener is left on the process", () => {
    const { session, process } = open();
    session.enter();
    expect(process.eventNames().length).toBeGreaterThan(4);
    session.end(0);
    expect(process.eventNames()).toEqual([]);
  });

  test("a terminal that is gone does not stop the ending", () => {
    const { session, ends, breakTerminal } = open();
    session.enter();
    breakTerminal();
    session.end(129);
    expect(ends).toEqual([[129, null]]);
  });
});

describe("suspend()", () => {
  test("leaves, stops itself, and on SIGCONT enters again and redraws", () => {
    const { session, process, log } = open();
    session.enter();
    session.suspend();
    expect(process.sent).toEqual(["SIGTSTP"]);
    expect(log).toEqual(["enter", "start", "stop", "leave"]);
    process.send("SIGCONT");
    expect(log.slice(4)).toEqual(["enter", "start", "redraw"]);
    session.end(0);
  });

  test("SIGCONT after a stop from outside takes the terminal again: the shell had it meanwhile", () => {
    const { session, process, log } = open();
    session.enter();
    process.send("SIGCONT");
    expect(log).toEqual(["enter", "start", "stop", "enter", "start", "redraw"]);
    session.end(0);
  });

  test("SIGTSTP from outside gives the terminal back first, and stops with no listener in the way, each time", () => {
    const { session, process, log } = open();
    session.enter();
    for (const times of [1, 2]) {
      process.send("SIGTSTP");
      expect(process.sent).toHaveLength(times);
      expect(process.listenerCount("SIGTSTP")).toBe(0);
      expect(log.at(-1)).toBe("leave");
      process.send("SIGCONT");
      expect(process.listenerCount("SIGTSTP")).toBe(1);
      expect(log.at(-1)).toBe("redraw");
    }
    session.end(0);
  });

  test("a stop that the system ignores, as with no shell to wake us: the screens come back by themselves", () => {
    vi.useFakeTimers();
    const { session, log } = open();
    session.enter();
    session.suspend();
    vi.advanceTimersByTime(1000);
    expect(log).toEqual(["enter", "start", "stop", "leave", "enter", "start", "redraw"]);
    session.end(0);
    expect(vi.getTimerCount()).toBe(0);
    vi.useRealTimers();
  });

  test("killed while stopped: the screen is not left twice", () => {
    const { session, process, log, ends } = open();
    session.enter();
    session.suspend();
    process.send("SIGTERM");
    expect(log.filter((entry) => entry === "leave")).toHaveLength(1);
    expect(ends).toEqual([[143, null]]);
  });

  test("does nothing on win32, where there is no such signal", () => {
    const { session, process, log } = open("win32");
    session.enter();
    session.suspend();
    expect(process.sent).toEqual([]);
    expect(log).toEqual(["enter", "start"]);
    session.end(0);
  });
});

test("LEAVE undoes ENTER: main screen, its text, autowrap and cursor are back", async () => {
  const screen = new Screen(20, 4);
  screen.feed("$ before\r\n");
  screen.feed(ENTER);
  await screen.settle();
  expect(screen.isAlternate).toBe(true);
  expect(screen.term.modes.wraparoundMode).toBe(false);
  expect(screen.term.modes.bracketedPasteMode).toBe(true);
  screen.feed(`\x1b[2;2Hdrawn\x1b[1m${LEAVE}`);
  await screen.settle();
  expect(screen.isAlternate).toBe(false);
  expect(screen.line(0)).toBe("$ before");
  expect(screen.term.modes.wraparoundMode).toBe(true);
  expect(screen.term.modes.bracketedPasteMode).toBe(false);
});
