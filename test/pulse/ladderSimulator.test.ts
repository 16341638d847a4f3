// Branches along a bus against a general-purpose circuit simulator: every branch's peak within 1e-5 of the largest one.
// Needs no twin in src: it holds the ladder and the shares by place to something outside the project.
import { Simulation } from "eecircuit-engine";
import { beforeAll, describe, expect, test } from "vitest";
import type { Ladder, LadderPlace } from "../../src/pulse/ladder.ts";
import { ladderCourse } from "../../src/pulse/ladderCourse.ts";

interface Case {
  readonly name: string;
  readonly ladder: Ladder;
  readonly load: { readonly resistance: number; readonly inductance: number };
  /** sqrt(LC) of the whole [s]. */
  readonly scale: number;
}

const VOLTAGE = 2000;
const branch = (capacitance: number, resistance: number, inductance: number) => ({
  capacitance,
  resistance,
  inductance,
});
const on = (resistance: number, inductance: number) => ({ segment: { resistance, inductance } });
const none = on(0, 0);

/** Unlike branches, so that nothing is right by symmetry alone. */
const arm = (count: number, first: ReturnType<typeof on>, rest: ReturnType<typeof on>): readonly LadderPlace[] =>
  Array.from({ length: count }, (_, k) => ({
    ...branch(1e-4 * (1 + 0.1 * (k % 3)), 0.02 + 0.004 * (k % 2), 4e-8 + 1e-8 * (k % 4)),
    ...(k === 0 ? first : rest),
  }));

const CASES: readonly Case[] = [
  {
    name: "four branches fed at one end, ringing",
    ladder: [arm(4, none, on(5e-5, 2e-8))],
    load: { resistance: 0.02, inductance: 1e-6 },
    scale: 2e-5,
  },
  {
    name: "six branches fed at the centre, near critical",
    ladder: [arm(3, on(1e-4, 2e-8), on(2e-4, 4e-8)), arm(3, on(1e-4, 2e-8), on(2e-4, 4e-8))],
    load: { resistance: 0.09, inductance: 1e-6 },
    scale: 2.5e-5,
  },
  {
    name: "five branches on a bad bus, dead short",
    ladder: [arm(5, none, on(2e-3, 1e-7))],
    load: { resistance: 1e-3, inductance: 1e-7 },
    scale: 1.2e-5,
  },
  {
    name: "three branches and a middle one, overdamped",
    ladder: [arm(1, none, none), arm(1, on(1e-3, 5e-8), none), arm(1, on(1e-3, 5e-8), none)],
    load: { resistance: 0.5, inductance: 1e-6 },
    scale: 2e-5,
  },
];

/** Every branch by its arm and place, each with a meter of its own current. */
function netlist({ ladder, load, scale }: Case): string {
  const lines: string[] = ["branches along a bus"];
  ladder.forEach((places, a) => {
    let near = "feed";
    places.forEach(({ segment, capacitance, resistance, inductance }, k) => {
      const id = `${a}x${k}`;
      const node = segment.inductance > 0 ? `n${id}` : near;
      if (segment.inductance > 0)
        lines.push(`LS${id} ${node} s${id} ${segment.inductance} IC=0`, `RS${id} s${id} ${near} ${segment.resistance}`);
      lines.push(`C${id} c${id} 0 ${capacitance} IC=${VOLTAGE}`, `L${id} c${id} r${id} ${inductance} IC=0`);
      lines.push(`R${id} r${id} m${id} ${resistance}`, `VM${id} m${id} ${node} 0`);
      near = node;
    });
  });
  lines.push(`LO feed o ${load.inductance} IC=0`, "VMO o q 0", `RO q 0 ${load.resistance}`);
  lines.push(".options reltol=1e-6 abstol=1e-9 vntol=1e-9");
  const step = scale / 1500;
  lines.push(`.tran ${step} ${4 * scale} 0 ${step} uic`, ".end");
  return lines.join("\n");
}

interface Compared {
  readonly name: string;
  readonly worst: number;
  readonly spread: number;
  readonly action: number;
}

async function compare(simulation: Simulation, one: Case): Promise<Compared> {
  simulation.setNetList(netlist(one));
  const result = await simulation.runSim();
  expect(simulation.getError()).toEqual([]);
  if (result.dataType !== "real") throw new Error("a transient has real data");
  const column = (name: string): readonly number[] =>
    (result.data.find((found) => found.name.toLowerCase() === name)?.values as readonly number[] | undefined) ?? [];
  const times = column("time");
  const { ladder, load, scale } = one;
  const own = ladderCourse({ ladder, voltage: VOLTAGE, drive: { kind: "load", load }, seconds: 4 * scale });
  const ids = ladder.flatMap((places, a) => places.map((_, k) => `i(vm${a}x${k})`));
  const peakOf = (values: readonly number[]): number => Math.max(...values.map(Math.abs));
  const actionOf = (values: readonly number[]): number =>
    values.slice(1).reduce((sum, value, k) => {
      const before = values[k] as number;
      const dt = (times[k + 1] as number) - (times[k] as number);
      return sum + (dt * (value * value + value * before + before * before)) / 3;
    }, 0);
  const largest = Math.max(...own.peaks);
  const worst = Math.max(
    ...ids.map((id, k) => Math.abs(peakOf(column(id)) - (own.peaks[k] as number)) / largest),
    Math.abs(peakOf(column("i(vmo)")) / own.totalPeak - 1),
  );
  const action = Math.max(...ids.map((id, k) => Math.abs(actionOf(column(id)) / (own.actions[k] as number) - 1)));
  return { name: one.name, worst, spread: largest / Math.min(...own.peaks), action };
}

describe("ladderCourse(case) against a general-purpose circuit simulator", () => {
  const compared: Compared[] = [];
  beforeAll(async () => {
    const simulation = new Simulation();
    await simulation.start();
    for (const one of CASES) compared.push(await compare(simulation, one));
  }, 60_000);

  test("every branch of every ladder peaks within 1e-5 of the largest peak, the load within 1e-5 of its own", () => {
    for (const { name, worst } of compared) expect(worst, name).toBeLessThan(1e-5);
    expect(compared).toHaveLength(CASES.length);
  });

  test("the branches do differ, by a twentieth at the least: the comparison is not of equal parts", () => {
    for (const { name, spread } of compared) expect(spread, name).toBeGreaterThan(1.05);
  });

  test("actions agree to 1e-4, the simulator's own trapezoid counted", () => {
    for (const { name, action } of compared) expect(action, name).toBeLessThan(1e-4);
  });
});
