// The package as it ships, as a process on a real pseudo-terminal: what if, the catalogue by hand, long work in its thread, recovery.
import { spawnSync } from "node:child_process";
import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { type IPty, spawn } from "@lydell/node-pty";
import { afterAll, beforeAll, expect, test } from "vitest";
import { type Packed, packed } from "../support/packed.ts";
import { Screen } from "../support/screen.ts";
import { CATALOGUE } from "../support/stock.ts";

let at: Packed;
beforeAll(() => {
  at = packed();
}, 180_000);
afterAll(() => rmSync(at.folder, { recursive: true, force: true }));

const SLOW = 60_000;
const program = (): string => join(at.installed, "dist/main.js");
const file = (name: string): string => join(at.folder, name);
const environment = (session: string): Record<string, string> => ({
  PATH: process.env.PATH ?? "",
  TERM: "xterm-256color",
  JOULEWRIGHT_SESSION: file(session),
});

interface Run {
  readonly screen: Screen;
  readonly terminal: IPty;
  readonly ended: Promise<number>;
  readonly until: (text: string) => Promise<void>;
}

function run(session: string, argv: readonly string[] = []): Run {
  const screen = new Screen(100, 30);
  const terminal = spawn(process.execPath, [program(), ...argv], {
    cols: 100,
    rows: 30,
    cwd: at.folder,
    env: environment(session),
  });
  terminal.onData((data) => screen.feed(data));
  const ended = new Promise<number>((done) => terminal.onExit(({ exitCode }) => done(exitCode)));
  return { screen, terminal, ended, until: (text) => screen.until((all) => all.includes(text), SLOW) };
}

test("a value stepped on the map, taken back on the trail, and a quit that restores the terminal", async () => {
  const { screen, terminal, ended, until } = run("one.json");
  await until("layouts fit");
  terminal.write("\x1b8]");
  await until("unbeaten layouts");
  terminal.write("+");
  await until("in hand: Charge voltage 2.4 kV");
  terminal.write("t");
  await until("Charge voltage 2.2 kV to 2.4 kV");
  terminal.write("u");
  await until("Taken back: Charge voltage 2.2 kV to 2.4 kV.");
  await until("2.4 kJ at 2.2 kV");
  terminal.write("q");
  expect(await ended).toBe(0);
  await screen.settle();
  expect(screen.isAlternate).toBe(false);
}, 180_000);

test("a value set by hand stands beside the catalogue, never in it; a changed catalogue is read again", async () => {
  const catalogue = file("own.csv");
  writeFileSync(catalogue, CATALOGUE);
  const { terminal, ended, until } = run("two.json", ["--catalog", catalogue]);
  await until("4 parts");
  terminal.write("\x1b9");
  await until("4 parts of 1 file");
  terminal.write("\r");
  await until("polarised of flash-a");
  terminal.write("no\r");
  await until("1 value by hand");
  expect(JSON.parse(readFileSync(`${catalogue}.overrides.json`, "utf8")).parts).toEqual({
    "flash-a": { polarised: "no" },
  });
  expect(readFileSync(catalogue, "utf8")).toBe(CATALOGUE);
  writeFileSync(catalogue, `${CATALOGUE}bad,x,400\nfine,100,400\n`);
  await until("5 parts of 1 file, 1 fault");
  terminal.write("\x11");
  expect(await ended).toBe(0);
}, 180_000);

test("a statistical plan leaves the keys free, tells how far it is, and stops at once", async () => {
  const { terminal, ended, until } = run("three.json");
  await until("layouts fit");
  terminal.write("\x1b[B\x1b[B\x1b[B\x1b[C\x1b[C");
  await until("left; Esc stops it");
  terminal.write("\x1b[A");
  await until("> Allowed fall");
  terminal.write("\x1b");
  await until("Stopped: what is listed is of the brief before.");
  terminal.write("\x11");
  expect(await ended).toBe(0);
}, 180_000);

test("killed outright, the next start has what was typed; a session that is no text is put aside whole", async () => {
  const { terminal, ended, until } = run("four.json");
  await until("layouts fit");
  terminal.write("\x15777 J");
  await until("777 J at 2.2 kV");
  for (let waited = 0; waited < SLOW && !existsSync(file("four.json")); waited += 50)
    await new Promise((go) => setTimeout(go, 50));
  terminal.kill("SIGKILL");
  await ended;
  const again = run("four.json");
  await again.until("777 J at 2.2 kV");
  again.terminal.write("\x11");
  expect(await again.ended).toBe(0);
  const bytes = Buffer.from([0xff, 0x00, 0xe9]);
  writeFileSync(file("five.json"), bytes);
  const third = run("five.json");
  await third.until("five.json.unread");
  third.terminal.write("\x11");
  await third.ended;
  expect(readFileSync(file("five.json.unread"))).toEqual(bytes);
}, 240_000);

test("a flag without its file is told in one line, status 2", () => {
  const { status, stderr } = spawnSync(process.execPath, [program(), "--catalog"], {
    encoding: "utf8",
    env: environment("six.json"),
  });
  expect([status, stderr]).toEqual([
    2,
    "--catalog needs a file after it, and there is none: joulewright --catalog FILE\n",
  ]);
}, 60_000);
