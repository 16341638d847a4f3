// The real bundle, built by the package's own script into a temporary folder and run as a user runs it.
import { execFileSync, spawnSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync } from "node:fs";
import { constants, tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { planCommand } from "../src/cli/commands/plan.ts";
import { at, fakePorts, ROOT } from "./support/fakePorts.ts";

const PACKAGE = JSON.parse(readFileSync(at("package.json"), "utf8"));
const BRIEF = at("fixtures/briefs/flash-lamp.json");
const CATALOG = at("catalogs/electrolytic.csv");
let folder = "";
let main = "";

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "joulewright-"));
  mkdirSync(join(folder, "dist"));
  symlinkSync(at("catalogs"), join(folder, "catalogs"));
  main = join(folder, "dist/main.js");
  // The package's own build, without what only paper and types need.
  execFileSync(process.execPath, [at(".ci/build.mjs"), join(folder, "dist"), "bundle"], { cwd: ROOT });
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function run(argv: readonly string[], more: { readonly input?: string; readonly env?: Record<string, string> } = {}) {
  const env = { ...process.env, COLUMNS: "80", ...more.env };
  const ran = spawnSync(process.execPath, [main, ...argv], {
    encoding: "utf8",
    input: more.input ?? "",
    env,
    cwd: folder,
  });
  return { status: ran.status, out: ran.stdout, err: ran.stderr };
}
/** A line for bash, where $MAIN is the program. */
const shell = (line: string) => {
  const env = { ...process.env, MAIN: `${process.execPath} ${main}`, BRIEF, CATALOG };
  const ran = spawnSync("bash", ["-c", line], { encoding: "utf8", env });
  return { status: ran.status, out: ran.stdout, err: ran.stderr };
};

describe("the bundle", () => {
  test("the bare command without a terminal prints the plan of the demo brief, from any folder", () => {
    const { status, out, err } = run([]);
    expect([status, err]).toEqual([0, ""]);
    expect(out).toMatch(/Capacitance needed: 991\.8 µF/);
    expect(out).toMatch(/Best: /);
  });

  test("plan --json prints the same bytes as in process", () => {
    const ports = fakePorts();
    planCommand(BRIEF, { catalog: [CATALOG], json: true, limit: "20" }, ports);
    expect(run(["plan", BRIEF, "--catalog", CATALOG, "--json"]).out).toBe(ports.printed());
  });

  test("a brief through a pipe; an empty pipe is refused", () => {
    const brief = readFileSync(BRIEF, "utf8");
    expect(run(["plan", "-", "--catalog", CATALOG, "--limit", "1"], { input: brief }).status).toBe(0);
    expect(run(["plan", "-", "--catalog", CATALOG]).status).toBe(2);
  });

  test("exit 1 when nothing fits, 2 for wrong use, without a stack", () => {
    const none = run(["plan", at("fixtures/briefs/impossible/energy.json"), "--catalog", CATALOG]);
    expect([none.status, none.err]).toEqual([1, ""]);
    const wrong = run(["plan", at("fixtures/briefs/bad/not-json.json"), "--catalog", CATALOG]);
    expect(wrong.status).toBe(2);
    expect(wrong.err).not.toMatch(/\n\s+at /);
    expect(run(["plan", "--energi"]).status).toBe(2);
  });

  test("headless commands load neither ink nor react", () => {
    const coverage = join(folder, "coverage");
    expect(
      run(["plan", BRIEF, "--catalog", CATALOG, "--limit", "1"], { env: { NODE_V8_COVERAGE: coverage } }).status,
    ).toBe(0);
    const loaded = readdirSync(coverage)
      .flatMap((name) => JSON.parse(readFileSync(join(coverage, name), "utf8")).result as { url: string }[])
      .filter(({ url }) => url.startsWith("file:") && url.includes("/dist/"))
      .map(({ url }) => readFileSync(fileURLToPath(url), "utf8"))
      .join("\n");
    expect(loaded).toMatch(/^\/\/ \S*node_modules\/commander\//m);
    expect(loaded).not.toMatch(/^\/\/ \S*node_modules\/(ink|react|react-reconciler|yoga-layout)\//m);
  });

  test("a bug of ours ends with 70, the stack and how to report it (planted from outside)", () => {
    const plant = "data:text/javascript,JSON.stringify=()=>{throw%20new%20Error('planted')}";
    const { status, err } = run(["plan", BRIEF, "--catalog", CATALOG, "--json"], {
      env: { NODE_OPTIONS: `--import=${plant}` },
    });
    expect(status).toBe(70);
    expect(err).toMatch(/bug of ours[\s\S]*planted[\s\S]*\n\s+at [\s\S]*Please report/);
  });

  test("the package holds what the bare command needs", () => {
    expect(PACKAGE.files).toEqual(expect.arrayContaining(["dist", "catalogs"]));
    expect(readFileSync(main, "utf8").startsWith("#!/usr/bin/env node\n")).toBe(true);
  });
});

describe("the output", () => {
  test("a reader that goes away is no trouble", () => {
    const line = 'set -o pipefail; $MAIN plan "$BRIEF" --catalog "$CATALOG" --limit 0 --json | head -c 20';
    expect(shell(line)).toEqual({ status: 0, out: expect.stringMatching(/^\{[\s\S]{19}$/), err: "" });
  });

  test("a full disk is said, and ends with 1", () => {
    const { status, err } = shell('$MAIN plan "$BRIEF" --catalog "$CATALOG" >/dev/full');
    expect(status).toBe(1);
    expect(err).toMatch(/the output is not complete: the disk is full/);
    expect(err).not.toMatch(/\n\s+at /);
  });

  test("closed standard streams: input refused, output no crash", () => {
    expect(shell('$MAIN plan - --catalog "$CATALOG" <&-').status).toBe(2);
    expect(shell('$MAIN plan "$BRIEF" --catalog "$CATALOG" >&-').status).toBe(0);
    expect(shell('$MAIN plan "$BRIEF" 2>&-').status).toBe(2);
  });

  test("order writes a file from another folder, and not over it a second time", () => {
    const argv = [
      "order",
      BRIEF,
      "--catalog",
      CATALOG,
      "--part",
      "lab-pf-330-360",
      "--series",
      "9",
      "--parallel",
      "31",
    ];
    const all = [...argv, "--ties", "cross-tied", "--output", "bill.csv"];
    expect(run(all).status).toBe(0);
    expect(run(all).status).toBe(2);
    expect(run([...all, "--force"]).status).toBe(0);
    expect(execFileSync("head", ["-c", "5", join(folder, "bill.csv")], { encoding: "utf8" })).toBe("item,");
  });
});

describe("a terminal", () => {
  test("the bare command opens the screens, and Ctrl-C leaves them with the terminal as it was", async () => {
    const { spawn } = await import("@lydell/node-pty");
    const env = { ...process.env, TERM: "xterm-256color", JOULEWRIGHT_SESSION: join(folder, "session.json") };
    const terminal = spawn(process.execPath, [main], { cols: 80, rows: 24, env });
    let seen = "";
    const ended = new Promise<number>((resolve) => terminal.onExit(({ exitCode }) => resolve(exitCode)));
    await new Promise<void>((resolve) => {
      terminal.onData((data) => {
        seen += data;
        if (seen.includes("[?1049h") && seen.includes("2.4 kJ")) resolve();
      });
    });
    terminal.write("\u0003");
    expect(await ended).toBe(0);
    expect(seen).toMatch(/\[\?1049l/);
  }, 20_000);

  test("a terminal that goes away ends the screens as a hang-up does, not with node's abort", async () => {
    const { spawn } = await import("@lydell/node-pty");
    const env = { ...process.env, TERM: "xterm-256color", JOULEWRIGHT_SESSION: join(folder, "gone.json") };
    const terminal = spawn(process.execPath, [main], { cols: 80, rows: 24, env });
    const ended = new Promise<number | undefined>((resolve) => terminal.onExit(({ signal }) => resolve(signal)));
    let seen = "";
    await new Promise<void>((resolve) => {
      terminal.onData((data) => {
        seen += data;
        if (seen.includes("2.4 kJ")) resolve();
      });
    });
    // The window closes: its side of the terminal is gone.
    (terminal as unknown as { destroy: () => void }).destroy();
    expect(await ended).toBe(constants.signals.SIGHUP);
  }, 20_000);

  test("--resistors without --catalog is refused, not passed over", () => {
    const { status, err } = run(["--resistors", at("catalogs/resistors.csv")]);
    expect(status).toBe(2);
    expect(err).toMatch(/^--catalog: something needed was not given/);
  });

  test("TERM=dumb gets the plan of the demo as text", async () => {
    const { spawn } = await import("@lydell/node-pty");
    const terminal = spawn(process.execPath, [main], { cols: 80, rows: 24, env: { ...process.env, TERM: "dumb" } });
    let seen = "";
    terminal.onData((data) => {
      seen += data;
    });
    expect(await new Promise<number>((resolve) => terminal.onExit(({ exitCode }) => resolve(exitCode)))).toBe(0);
    expect(seen).toMatch(/Capacitance needed/);
    expect(seen).not.toContain("\u001b");
  }, 20_000);
});
