// The bundle as a process on a real pseudo-terminal: it comes up, and every way of ending gives the terminal back.
import { spawnSync } from "node:child_process";
import { readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { type IPty, spawn } from "@lydell/node-pty";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { bundle } from "../support/bundle.ts";
import { Screen } from "../support/screen.ts";

let folder = "";
beforeAll(async () => {
  folder = await bundle({ main: "src/main.ts" });
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const environment = (more: Readonly<Record<string, string>> = {}): Record<string, string> => ({
  PATH: process.env.PATH ?? "",
  TERM: "xterm-256color",
  JOULEWRIGHT_SESSION: join(folder, "session.json"),
  ...more,
});

interface Run {
  readonly screen: Screen;
  readonly terminal: IPty;
  readonly ended: Promise<{ exitCode: number; signal?: number | undefined }>;
}

function run(more: Readonly<Record<string, string>> = {}): Run {
  const screen = new Screen(80, 24);
  screen.feed("$ joulewright\r\n");
  const terminal = spawn(process.execPath, [join(folder, "dist/main.js")], {
    cols: 80,
    rows: 24,
    cwd: folder,
    env: environment(more),
  });
  terminal.onData((data) => screen.feed(data));
  const ended = new Promise<{ exitCode: number; signal?: number | undefined }>((done) => terminal.onExit(done));
  return { screen, terminal, ended };
}

const isRestored = async (screen: Screen): Promise<void> => {
  await screen.until(() => !screen.isAlternate);
  expect(screen.line(0)).toBe("$ joulewright");
  expect([screen.term.modes.wraparoundMode, screen.term.modes.bracketedPasteMode]).toEqual([true, false]);
  expect(screen.written.lastIndexOf("\x1b[?25h")).toBeGreaterThan(screen.written.lastIndexOf("\x1b[?25l"));
};

describe("on a pseudo-terminal", () => {
  test("comes up, follows the keys and a resize, saves on quit, ends with 0", async () => {
    const { screen, terminal, ended } = run({ CI: "true" });
    await screen.until((text) => text.includes("layouts fit"), 20_000);
    terminal.write("\x15500 J\x1b[B");
    await screen.until((text) => text.includes("500 J at 2.2 kV") && text.includes("> Charge voltage"), 20_000);
    screen.term.resize(100, 34);
    terminal.resize(100, 34);
    await screen.until((text) => text.includes("Title") && text.split("\n").length === 34, 20_000);
    terminal.write("\x11");
    expect((await ended).exitCode).toBe(0);
    await isRestored(screen);
    expect(readFileSync(join(folder, "session.json"), "utf8")).toContain("500 J");
  }, 60_000);

  test("SIGTERM: 143, and the screen is given back", async () => {
    const { screen, terminal, ended } = run();
    await screen.until((text) => text.includes("layouts fit"), 20_000);
    process.kill(terminal.pid, "SIGTERM");
    expect((await ended).exitCode).toBe(143);
    await isRestored(screen);
  }, 60_000);

  test("Ctrl-C while a value is typed: 0, and nothing is written after the screen is left", async () => {
    const { screen, terminal, ended } = run({ NO_COLOR: "1", DEV: "true" });
    await screen.until((text) => text.includes("layouts fit"), 20_000);
    terminal.write("9\x03");
    expect((await ended).exitCode).toBe(0);
    await isRestored(screen);
    expect(screen.written.endsWith("\x1b[?1049l")).toBe(true);
  }, 60_000);
});

test("without a terminal the flags of the screens are refused in one line, status 2", () => {
  const { status, stdout, stderr } = spawnSync(process.execPath, [join(folder, "dist/main.js"), "--ascii"], {
    env: environment(),
    encoding: "utf8",
  });
  expect([status, stdout, stderr.trimEnd().split("\n").length]).toEqual([2, "", 1]);
  expect(stderr).toContain("joulewright plan");
}, 30_000);
