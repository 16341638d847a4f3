// The screens whole, in process: real input bytes in, a real grid of cells out.
import { afterEach, beforeAll, describe, expect, test } from "vitest";
import { savedText } from "../../src/tui/saved.ts";
import { openScreens } from "../../src/tui/screens.ts";
import { SCREEN_KEYS, SCREENS } from "../../src/tui/state.ts";
import { foundFor, plannedOn } from "../support/blendScreen.ts";
import { BRIEF, type FakePorts, fakePorts, stateWith } from "../support/stock.ts";
import { type FakeThread, fakeThread } from "../support/threads.ts";

let ports: FakePorts;
let ended: Promise<number>;

function open(columns = 80, rows = 24, changes: Parameters<typeof fakePorts>[2] = {}): FakePorts {
  ports = fakePorts(columns, rows, changes);
  ended = openScreens(ports);
  return ports;
}
const type = (text: string): void => ports.stdin.type(text);
const until = (seen: (text: string) => boolean): Promise<void> => ports.screen.until(seen);

afterEach(async () => {
  ports.process.send("SIGTERM");
  await ended.catch(() => {});
});

describe("the form", () => {
  test("what fits follows as one types; a refusal names the way out", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x7f\x7f\x7f\x7f\x7f\x7f-5");
    await until((t) => t.includes('! not "-5"') && t.includes("No plan yet; to be mended: Energy of one pulse."));
    type("\x7f\x7f500 J");
    await until((t) => t.includes("500 J at 2.2 kV") && t.includes("layouts fit"));
  });

  test("several keys in one chunk each see the state that the one before left", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x1b[B\x7f\x7f\x7f\x7f\x7f\x7f1 kV");
    await until((t) => t.includes("> Charge voltage       [1 kV") && t.includes("2.4 kJ at 1 kV"));
  });

  test("a paste of several lines puts in its first, and none of it acts as keys", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x15\x1b[200~1.5 kJ\nq\x03\x1b[201~");
    await until((t) => t.includes("1.5 kJ at 2.2 kV"));
  });

  test("the terminal's caret stands in the field", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    expect(ports.screen.term.buffer.active.cursorY).toBe(3);
    expect(ports.screen.term.buffer.active.cursorX).toBe(24 + "2.4 kJ".length);
    type("\x1b[D");
    await ports.screen.until(() => ports.screen.term.buffer.active.cursorX === 24 + 5);
  });

  test("nothing fits: says so at once, and then the least changes", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x151 GJ");
    await until((t) => t.includes("Nothing fits") && t.includes("Energy of one pulse"));
    await until((t) => t.includes("in place of 1 GJ"));
  });

  test("no catalogue: says what to do", async () => {
    open(80, 24, { stock: { name: "", parts: 0, faults: 0, note: "" } });
    await until((t) => t.includes("There is no catalogue yet") && t.includes("joulewright --catalog FILE.csv"));
  });
});

describe("from the list to the order", () => {
  test("pin two, compare, choose, save the order, once more with a yes", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x1b[13~");
    await until((t) => t.includes("[2 layouts]"));
    type(" \x1b[B\x1b[B ");
    await until((t) => t.includes("2 of 4"));
    type("3");
    await until((t) => t.includes("[3 compare (2)]") && t.includes("^ best"));
    type("G");
    await until((t) => t.includes("Same in all"));
    type("\x1b[C\r");
    await until((t) => t.includes("[4 bank]") && /1 ┤├.* x\d+ +[█│·]+ \d+ V of \d+ V/.test(t));
    type("7e");
    await until((t) => t.includes("Save the order as: order-"));
    type("\x15bank.csv\r");
    await until((t) => t.includes("The order is saved in bank.csv."));
    type("e\x15bank.csv\r");
    await until((t) => t.includes("Replace the file that is there? bank.csv"));
    ports.files.set("bank.csv", "mine");
    type("n");
    await until((t) => t.includes("Save the order as: bank.csv"));
    expect(ports.files.get("bank.csv")).toBe("mine");
    type("\ry");
    await until((t) => t.includes("is saved in bank.csv"));
    expect(ports.files.get("bank.csv")).not.toBe("mine");
    type("e\x15/full/a.csv\r");
    await until((t) => t.includes("Not saved: the disk is full"));
  });

  test("the caution stands on every screen", async () => {
    open(60, 20);
    await until((t) => t.includes("layouts fit"));
    for (const screen of SCREENS) {
      type(`\x1b${SCREEN_KEYS[screen]}`);
      await until((t) => t.includes(`[${SCREEN_KEYS[screen]} ${screen}]`) && t.includes("energy can kill"));
    }
  });
});

describe("the blend", () => {
  // The search is loaded when it is first asked for; what is seen here should not wait for that.
  beforeAll(() => foundFor(plannedOn()), 30_000);
  const BLEND_SIZES = [
    [60, 20],
    [80, 24],
    [200, 50],
  ] as const;
  test.each(BLEND_SIZES)(
    "at %i by %i: Enter finds it in a thread, the list is walked meanwhile, and it is shown",
    async (columns, rows) => {
      const threads: FakeThread[] = [];
      open(columns, rows, {
        env: { NO_COLOR: "1" },
        ascii: columns === 60,
        thread: () => {
          const thread = fakeThread();
          threads.push(thread);
          return thread;
        },
      });
      await until((t) => t.includes("layouts fit"));
      type("\x1bb");
      await until((t) => t.includes("[b blend]") && t.includes("No blend was sought for this brief yet"));
      expect(threads).toHaveLength(0);
      type("\r");
      await until((t) => t.includes("Working out") && t.includes("Esc stops with the best so far"));
      type("2");
      await until((t) => t.includes("[2 layouts]"));
      threads[0]?.work();
      type("b");
      await until((t) => t.includes("Cheapest blend, 120 units in 2 groups") && t.includes("523.20 EUR"));
      expect(ports.screen.text()).toMatch(/flash-a +8s6p +cross-tied +48 +0 +48 +148\.80 EUR/);
      type("G");
      await until((t) => t.includes("not an approval") && t.includes("energy can kill"));
      expect(ports.screen.written).not.toMatch(/\x1b\[(?:\d+;)*(?:3[0-8]|4[0-8]|9[0-7])(?:;\d+)*m/);
      if (columns === 60) expect(ports.screen.written.replace(/\x1b/g, "")).toMatch(/^[\x20-\x7e\r\n]*$/);
    },
  );

  test("Esc stops it with what is in hand; Esc again goes back to the layouts", async () => {
    const threads: FakeThread[] = [];
    open(80, 24, {
      thread: () => {
        const thread = fakeThread();
        threads.push(thread);
        return thread;
      },
    });
    await until((t) => t.includes("layouts fit"));
    type("\x1bb");
    await until((t) => t.includes("Enter finds it"));
    type("\r");
    await until((t) => t.includes("Working out"));
    type("\x1b");
    await until((t) => t.includes("Stopping; Esc again gives it up."));
    threads[0]?.work();
    await until(
      (t) =>
        t.includes("Best blend found, 176 units in 1 group") &&
        t.includes("No blend costs less than 522.14 EUR") &&
        t.includes("Stopped after"),
    );
    type("\x1b");
    await until((t) => t.includes("[2 layouts]"));
  });

  test("without a thread: says so, and which command finds it", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("\x1bb");
    await until((t) => t.includes("Enter finds it"));
    type("\r");
    await until((t) => t.includes("No thread can be had for it here") && t.includes("plan BRIEF --blend"));
  });
});

describe("ending", () => {
  test("quit saves first, leaves the screen, and the shell's text is back", async () => {
    open();
    ports.screen.feed("");
    await until((t) => t.includes("layouts fit"));
    expect(ports.screen.isAlternate).toBe(true);
    type("\x1b");
    await until((t) => t.includes("[2 layouts]"));
    type("q");
    expect(await ended).toBe(0);
    await ports.screen.settle();
    expect(ports.screen.isAlternate).toBe(false);
    expect(ports.kept.session).toContain('"screen": "layouts"');
    expect([ports.stdin.raw, ports.stdin.flowing]).toEqual([false, false]);
    const written = ports.screen.written;
    await new Promise((later) => setTimeout(later, 60));
    expect(ports.screen.written).toBe(written);
  });

  test("what was saved is there again", async () => {
    const pins = [{ part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const];
    open(80, 24, {
      loadSession: () => savedText(stateWith({ values: { ...BRIEF, energy: "1 kJ" }, pins, screen: "compare" })),
    });
    await until(
      (t) =>
        t.includes("[3 compare (1)]") && t.includes("1 kJ at 2.2 kV") && t.includes("7s4p") && t.includes("cross-tied"),
    );
  });

  test("a failing save is told after the screen is left", async () => {
    open(80, 24, { saveSession: () => "read-only folder" });
    await until((t) => t.includes("layouts fit"));
    type("x\x03");
    expect(await ended).toBe(0);
    expect(ports.complaints).toEqual(["The brief and pins were not saved: read-only folder"]);
  });

  test.each([
    ["SIGINT", 130],
    ["SIGTERM", 143],
    ["SIGHUP", 129],
  ])("%s saves, restores and ends with %i", async (signal, status) => {
    open();
    await until((t) => t.includes("layouts fit"));
    type("9");
    ports.process.send(signal);
    expect(await ended).toBe(status);
    await ports.screen.settle();
    expect(ports.screen.isAlternate).toBe(false);
    expect(ports.kept.session).toContain("2.4 kJ9");
  });

  test("the keyboard's end is a hang-up", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    ports.stdin.emit("end");
    expect(await ended).toBe(129);
  });

  test("an exception of ours restores the terminal and is handed on", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    const fault = new Error("planted");
    ports.process.send("uncaughtException", fault);
    await expect(ended).rejects.toBe(fault);
    await ports.screen.settle();
    expect(ports.screen.isAlternate).toBe(false);
  });

  test("without a terminal: one line, status 2, not one byte of escape", async () => {
    open(80, 24, { env: { TERM: "dumb" } });
    expect(await ended).toBe(2);
    expect(ports.complaints).toHaveLength(1);
    expect(ports.screen.written).toBe("");
  });
});

describe("the terminal's moods", () => {
  test("a resize at any moment draws the new size whole; too small says one sentence and comes back", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    ports.stdout.resize(200, 50);
    await until((t) => t.includes("│ ") && t.includes("of limit") && t.includes("bleeds in"));
    ports.stdout.resize(40, 8);
    await until((t) => t.includes("joulewright needs 60 columns by 16") && !t.includes("Energy"));
    ports.stdout.resize(60, 20);
    await until((t) => t.includes("> Energy of one pulse") && t.includes("layouts fit"));
  });

  test("Ctrl-L draws over rubbish", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    const good = ports.screen.text();
    ports.screen.feed("\x1b[5;5Hrubbish\x1b[20;1Hmore");
    type("\x0c");
    await until((t) => t === good);
  });

  test("suspend gives the screen back and takes it again", async () => {
    open();
    await until((t) => t.includes("layouts fit"));
    const good = ports.screen.text();
    type("\x1a");
    await ports.screen.settle();
    expect(ports.process.sent).toEqual(["SIGTSTP"]);
    expect(ports.screen.isAlternate).toBe(false);
    ports.screen.feed("$ fg\r\n");
    ports.process.send("SIGCONT");
    await until((t) => t === good);
    expect(ports.screen.isAlternate).toBe(true);
  });

  test("NO_COLOR: not one colour code is written; without it there are some", async () => {
    open(80, 24, { env: { NO_COLOR: "1" } });
    await until((t) => t.includes("layouts fit"));
    const colours = /\x1b\[(?:\d+;)*(?:3[0-8]|4[0-8]|9[0-7]|10[0-7])(?:;\d+)*m/;
    expect(ports.screen.written).not.toMatch(colours);
    ports.process.send("SIGTERM");
    await ended;
    open(80, 24, { env: { TERM: "xterm-256color" } });
    await until((t) => t.includes("layouts fit"));
    expect(ports.screen.written).toMatch(colours);
  });

  test("ASCII mode: nothing but ASCII is written", async () => {
    open(80, 24, { ascii: true });
    await until((t) => t.includes("layouts fit") && t.includes("uF"));
    type("\x1b4");
    await until((t) => t.includes("[4 bank]") && t.includes("]["));
    expect(ports.screen.written.replace(/\x1b/g, "")).toMatch(/^[\x20-\x7e\r\n]*$/);
  });

  test("DEV in the environment is taken out before ink is loaded", async () => {
    const env: Record<string, string | undefined> = { DEV: "true" };
    open(80, 24, { env });
    await until((t) => t.includes("layouts fit"));
    expect("DEV" in env).toBe(false);
  });
});
