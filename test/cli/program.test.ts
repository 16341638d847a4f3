// The whole command line in process: argv in, text and status out.
import { describe, expect, test } from "vitest";
import { run } from "../../src/cli/program.ts";
import { at, fakePorts, type Kept, UNSAFE } from "../support/fakePorts.ts";

async function cli(argv: readonly string[], ports: Kept = fakePorts()) {
  const status = await run(argv, ports);
  return { status, out: ports.printed(), err: ports.told(), ports };
}
const CATALOG = at("catalogs/electrolytic.csv");
const BRIEF = at("fixtures/briefs/flash-lamp.json");

describe("run(argv, ports)", () => {
  test("help and version end with 0 and show examples", async () => {
    for (const argv of [
      ["--help"],
      ["help"],
      ["plan", "--help"],
      ["check", "--help"],
      ["order", "-h"],
      ["help", "parts"],
    ]) {
      const { status, out, err } = await cli(argv);
      expect([status, err], argv.join(" ")).toEqual([0, ""]);
      expect(out).toMatch(/Examples:/);
    }
    expect((await cli(["--version"])).out).toMatch(/^\d+\.\d+\.\d+\n$/);
  });

  test("wrong use ends with 2 and names the nearest: command, option", async () => {
    const command = await cli(["plna"]);
    expect([command.status, command.out]).toEqual([2, ""]);
    expect(command.err).toMatch(/unknown command 'plna'[\s\S]*Did you mean plan\?/);
    for (const argv of [
      ["help", "plna"],
      ["plna", "--help"],
    ])
      expect(await cli(argv), argv.join(" ")).toMatchObject({ status: 2, out: "", err: command.err });
    const option = await cli(["plan", "--energi", "3"]);
    expect(option.status).toBe(2);
    expect(option.err).toMatch(/Did you mean --energy\?/);
    expect((await cli(["plan", "a", "b"])).status).toBe(2);
    expect((await cli(["parts"])).status).toBe(2);
    expect((await cli(["plan", "--energy"])).status).toBe(2);
  });

  test("what was typed is not echoed raw", async () => {
    for (const argv of [["\u001b[2J"], ["plan", "--\u202ex"], ["plan", "\u001b", "\u001b"]])
      expect(UNSAFE.test((await cli(argv)).err)).toBe(false);
  });

  test("--catalog is repeatable and takes several", async () => {
    const more = ["--catalog", CATALOG, at("catalogs/film.csv"), "--catalog", at("catalogs/drawer.csv")];
    const { status, out } = await cli(["plan", BRIEF, ...more, "--limit", "1", "--json"]);
    expect(status).toBe(0);
    expect(JSON.parse(out).searched.parts).toBe(31 + 17 + 9);
  });

  test("flags reach the brief, and beat it", async () => {
    const argv = [
      "plan",
      BRIEF,
      "--energy",
      "1 kJ",
      "--max-series",
      "12",
      "--basis",
      "nominal",
      "--touch-safe",
      "50 V",
    ];
    const { out } = await cli([...argv, "--catalog", CATALOG, "--limit", "1", "--json"]);
    expect(JSON.parse(out).brief).toMatchObject({ energy: 1000, maxSeries: 12, basis: "nominal", touchSafe: 50 });
  });

  test("- reads the brief or a catalogue from standard input", async () => {
    const brief = '{"energy": "2.4 kJ", "voltage": "2.2 kV", "ripple": "100 %"}';
    const { status, out } = await cli(["plan", "-", "--catalog", CATALOG, "--json"], fakePorts({ "-": brief }));
    expect(status).toBe(0);
    expect(JSON.parse(out).inputs.brief).toBe("standard input");
  });
});
