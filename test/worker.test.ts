// The built worker beside the built program: the same bytes at any number of threads, and an interrupt that ends it.
import { spawn, spawnSync } from "node:child_process";
import { existsSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { bundle } from "./support/bundle.ts";
import { at } from "./support/fakePorts.ts";

let folder = "";
beforeAll(async () => {
  folder = await bundle({ main: "src/main.ts", worker: "src/worker.ts" });
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const ARGV = [
  "check",
  ...["--energy", "2 kJ", "--voltage", "2.2 kV", "--ripple", "100 %", "--basis", "statistical"],
  ...["--part", "lab-pf-330-360", "--series", "7", "--parallel", "6", "--ties", "strings", "--derating", "0.95"],
  ...["--catalog", at("catalogs/electrolytic.csv"), "--seed", "7"],
];
const main = (): string => join(folder, "dist/main.js");
const run = (more: readonly string[]) => spawnSync(process.execPath, [main(), ...ARGV, ...more], { encoding: "utf8" });

describe("the worker of the bundle", () => {
  test("the package's build script makes it", () => {
    const { scripts } = JSON.parse(readFileSync(at("package.json"), "utf8"));
    expect(scripts.build).toBe("node .ci/build.mjs");
    expect(readFileSync(at(".ci/build.mjs"), "utf8")).toContain('"src/worker.ts"');
    expect(existsSync(join(folder, "dist/worker.js"))).toBe(true);
  });

  test("one, two and five threads print the same bytes, and so does this thread alone when the worker is gone", async () => {
    const outs = [1, 2, 5].map((workers) => run(["--json", "--witness", "100000", "--workers", String(workers)]));
    expect(outs.map(({ stderr }) => stderr)).toEqual(["", "", ""]);
    const [first] = outs.map(({ stdout }) => JSON.parse(stdout).witness);
    expect(first).toMatchObject({ banks: 100000, seed: 7, agrees: true });
    expect(first.counted).toBeGreaterThan(100);
    expect(new Set(outs.map(({ stdout }) => stdout)).size).toBe(1);
    rmSync(join(folder, "dist/worker.js"));
    expect(run(["--json", "--witness", "100000", "--workers", "2"]).stdout).toBe(outs[0]?.stdout);
  }, 60_000);

  test("SIGINT ends a long drawing with 1, with words and with no result", async () => {
    const long = spawn(process.execPath, [main(), ...ARGV, "--witness", "1e11"]);
    let [out, err] = ["", ""];
    long.stdout.on("data", (text) => {
      out += text;
    });
    long.stderr.on("data", (text) => {
      err += text;
    });
    setTimeout(() => long.kill("SIGINT"), 2500);
    expect(await new Promise((resolve) => long.on("exit", resolve))).toBe(1);
    expect(out).toBe("");
    expect(err).toMatch(/Interrupted: the witness is not complete/);
  }, 30_000);
});
