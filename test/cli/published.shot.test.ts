// Source: fixtures/published-banks.json, two coil sources of a review table: (a) plausible, (b) more current than can be.
import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { pulseCommand } from "../../src/cli/commands/pulse.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

interface Stated {
  readonly what: string;
  readonly value: number;
}
const { banks } = JSON.parse(readFileSync(at("fixtures/published-banks.json"), "utf8"));
const page = banks.find(({ id }: { id: string }) => id === "two-stimulators");
const said = (what: string): string => String(page.stated.find((one: Stated) => one.what === what)?.value);

function pulse(which: "a" | "b", more: Record<string, string>) {
  const catalog = `part,capacitance [F],voltage [V]\nu,${said(`(${which}) capacitance`)},5000\n`;
  const ports = fakePorts({ "c.csv": catalog });
  const flags = {
    catalog: ["c.csv"],
    part: "u",
    series: "1",
    parallel: "1",
    loadResistance: "20 mohm",
    loadInductance: "12 uH",
    voltage: said(`(${which}) voltage`),
    statedPeak: said(`(${which}) peak current`),
    statedLoss: said(`(${which}) loss in a pulse`),
    json: true,
    ...more,
  };
  const status = pulseCommand(undefined, flags, ports);
  return { status, ...JSON.parse(ports.printed()) };
}

describe("published discharges through `pulse --stated-...`", () => {
  test("(a) is plausible; its inductance, least frequency and loss are as worked by hand", () => {
    const { stated, energy, status } = pulse("a", {});
    expect(stated.verdict).toBe("plausible");
    expect(stated.largestInductance).toBeCloseTo(page.expect.largestInductance, 12);
    expect(stated.leastFrequency).toBeCloseTo(page.expect.lowestFrequency, 4);
    expect(stated.lossFraction).toBeCloseTo(page.expect.lossShare, 8);
    expect(energy.stored).toBeCloseTo(page.expect.energy, 9);
    expect(status).toBe(0);
  });

  test("(b) is called inconsistent: more than omega C V", () => {
    const { stated, status } = pulse("b", { statedFrequency: said("(b) frequency") });
    expect(stated.verdict).toBe("inconsistent");
    expect(stated.losslessPeak).toBeCloseTo(page.expect.secondLosslessPeak, 4);
    expect(status).toBe(1);
  });
});
