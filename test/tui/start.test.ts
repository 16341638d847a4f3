// The ports filled from files: a brief into the form, a session there and back, an unreadable one put aside.
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { filesOn } from "../../src/cli/index.ts";
import { accepted, refused } from "../../src/quantity/index.ts";
import { portsOn, startScreens } from "../../src/tui/start.ts";
import { BRIEF, CATALOGUE_FACTS, fakePorts, parts, STOCK } from "../support/stock.ts";

const folder = mkdtempSync(join(tmpdir(), "start-"));
afterAll(() => rmSync(folder, { recursive: true }));

const options = (sessionFile: string | null) => ({
  read: async () =>
    accepted({ parts: parts(), families: [DEFAULT_FAMILY], stock: STOCK, sources: CATALOGUE_FACTS.sources }),
  watch: () => () => {},
  stock: STOCK,
  brief: BRIEF,
  files: filesOn(),
  sessionFile,
  terminal: fakePorts(),
});

describe("portsOn(options)", () => {
  test("a session is written whole, and read back", () => {
    const path = join(folder, "session.json");
    const ports = portsOn(options(path));
    expect(ports.loadSession()).toBeNull();
    expect(ports.saveSession("one")).toBeNull();
    expect(ports.saveSession("two")).toBeNull();
    expect(ports.loadSession()).toBe("two");
    expect(ports.keepSession()).toBe(`${path}.unread`);
    expect(readFileSync(`${path}.unread`, "utf8")).toBe("two");
    expect(ports.loadSession()).toBeNull();
  });
  test("bytes that are no text are put aside as they are", () => {
    const path = join(folder, "latin.json");
    const bytes = Buffer.from([0x7b, 0xe9, 0xff, 0x7d]);
    writeFileSync(path, bytes);
    const ports = portsOn(options(path));
    expect(ports.loadSession()).toBe("");
    expect(ports.keepSession()).toBe(`${path}.unread`);
    expect(readFileSync(`${path}.unread`)).toEqual(bytes);
  });
  test("a place that cannot be written to is told in words", () => {
    expect(portsOn(options(join(folder, "none", "s.json"))).saveSession("x")).toMatch(/^no such file; needed: /);
    expect(portsOn(options(join(folder, "none", "s.json"))).keepSession()).toBeNull();
  });
  test("without a place nothing is kept and nothing is wrong", () => {
    const ports = portsOn(options(null));
    expect([ports.loadSession(), ports.saveSession("x"), ports.keepSession()]).toEqual([null, null, null]);
  });
});

test("startScreens(options) opens, and ends with the status of the quit", async () => {
  const given = options(null);
  const ended = startScreens(given);
  await given.terminal.screen.until((text) => text.includes("layouts fit"));
  given.terminal.stdin.type("\x11");
  expect(await ended).toBe(0);
});

test("startScreens(options): catalogues that cannot be read end the screens with 2, the terminal given back", async () => {
  const refusal = { code: "no-parts", place: {}, read: "nothing", want: "a part" };
  const given = { ...options(null), read: async () => refused(refusal) };
  expect(await startScreens(given)).toBe(2);
  await given.terminal.screen.settle();
  expect(given.terminal.screen.isAlternate).toBe(false);
});
