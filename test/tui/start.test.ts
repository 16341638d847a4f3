// The ports filled from files: a brief into the form, a session there and back, an unreadable one put aside.
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { filesOn } from "../../src/cli/index.ts";
import { portsOn, startScreens } from "../../src/tui/start.ts";
import { BRIEF, fakePorts, parts, STOCK } from "../support/stock.ts";

const folder = mkdtempSync(join(tmpdir(), "start-"));
afterAll(() => rmSync(folder, { recursive: true }));

const options = (sessionFile: string | null) => ({
  parts: parts(),
  families: [DEFAULT_FAMILY],
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
