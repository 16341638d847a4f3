// The time course against a general-purpose circuit simulator (eecircuit-engine, an ngspice build): every phase, both ties, faults.
import { beforeAll, describe, expect, test } from "vitest";
import { type Chain, type ChainUnit, chargingShares, crossTiedChain, leftAfterDump } from "../../src/bank/chain.ts";
import { afterShortHeld, withOpen, withoutUnit, withShort } from "../../src/bank/chainFaults.ts";
import { phaseFrom } from "../../src/bank/coursePhase.ts";
import type { Drive } from "../../src/bank/courseSegment.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";
import { type SimulatedChain, simulate, startSimulator } from "./simulate.ts";

const V = 1000;
const draw = uniformFrom(streamState(20240, 0));
const between = (low: number, high: number): number => low + (high - low) * draw();
const whole = (low: number, high: number): number => Math.floor(between(low, high + 1));

/** One chain, and the units it was made of. Rates of some per second, so that one step suits all. */
interface Case {
  readonly ties: "cross-tied" | "strings";
  readonly units: readonly (readonly ChainUnit[])[];
  readonly resistances: readonly number[];
  readonly chain: Chain;
}

function someCase(k: number): Case {
  const ties = k % 2 === 0 ? "cross-tied" : "strings";
  const n = whole(2, 6);
  const p = ties === "strings" ? 1 : whole(2, 4);
  const bare = k % 5 === 0;
  const units = Array.from({ length: n }, () =>
    Array.from({ length: p }, () => ({
      capacitance: between(0.7e-3, 1.3e-3),
      leakageCurrent: k % 3 === 0 ? 0 : between(0, 0.05),
      conductance: k % 4 === 0 ? 0 : between(0, 1e-3),
    })),
  );
  const resistances = units.map(() => (bare ? Number.POSITIVE_INFINITY : between(400, 3000) / p));
  return { ties, units, resistances, chain: crossTiedChain(units, resistances) };
}

const CASES = Array.from({ length: 48 }, (_, k) => someCase(k));
const charged = (chain: Chain): readonly number[] => chargingShares(chain).map((share) => share * V);

type Posed = { readonly one: Case; readonly start: readonly number[]; readonly drive: Drive };

const posed = (one: Case, start: readonly number[], drive: Drive): Posed => ({ one, start, drive });

let simulator: Awaited<ReturnType<typeof startSimulator>>;
beforeAll(async () => {
  simulator = await startSimulator();
}, 60_000);

/** Largest difference over all chains, stages and instants, as a share of the bank's voltage. */
async function worstDifference(all: readonly Posed[], stops = false): Promise<number> {
  const chains = all.map(
    ({ one, start, drive }): SimulatedChain => ({
      drive,
      stages: one.units.map((units, i) => ({ units, resistance: one.resistances[i]!, start: start[i]! })),
    }),
  );
  const found = await simulate(simulator, chains, { seconds: stops ? 0.2 : 0.5, step: stops ? 4e-4 : 5e-4, stops });
  expect(simulator.getError()).toEqual([]);
  expect(found.seconds.length).toBeGreaterThan(stops ? 450 : 900);
  let worst = 0;
  for (const [c, { one, start, drive }] of all.entries()) {
    const phase = phaseFrom({ name: "hold", chain: one.chain, drive, start, seconds: 1 });
    for (const [k, seconds] of found.seconds.entries()) {
      const ours = phase.voltagesAt(seconds);
      for (const [i, v] of ours.entries()) worst = Math.max(worst, Math.abs(v - found.voltages[c]![i]![k]!) / V);
    }
  }
  return worst;
}

const TOLERANCE = 1e-5;

describe("phaseFrom(...) against the simulator, 48 random chains, both ties", { timeout: 60_000 }, () => {
  test("there are at least 20 of each ties", () => {
    expect(CASES.filter((one) => one.ties === "strings")).toHaveLength(24);
    expect(CASES.filter((one) => one.ties === "cross-tied")).toHaveLength(24);
  });

  test("charge by a steady current", async () => {
    const all = CASES.map((one) =>
      posed(
        one,
        one.chain.map(() => 5),
        { kind: "current", current: 0.8 },
      ),
    );
    expect(await worstDifference(all)).toBeLessThan(TOLERANCE);
  });

  test("charge through a resistor", async () => {
    const all = CASES.map((one) =>
      posed(
        one,
        one.chain.map(() => 5),
        { kind: "source", voltage: 1.1 * V, resistance: 400 },
      ),
    );
    expect(await worstDifference(all)).toBeLessThan(TOLERANCE);
  });

  test("hold", async () => {
    const all = CASES.map((one) => posed(one, charged(one.chain), { kind: "source", voltage: V, resistance: 0 }));
    expect(await worstDifference(all)).toBeLessThan(TOLERANCE);
  });

  test("dump through a resistor, leakage stopping where a stage passes zero", async () => {
    const all = CASES.map((one) => {
      const even = one.chain.map(() => V / one.chain.length);
      return posed(one, even, { kind: "source", voltage: 0, resistance: 150 });
    });
    const reversed = all.filter(({ one, start, drive }) =>
      phaseFrom({ name: "dump", chain: one.chain, drive, start, seconds: 0.2 }).end.some((v) => v < -1),
    );
    expect(reversed.length).toBeGreaterThan(20);
    expect(await worstDifference(all, true)).toBeLessThan(TOLERANCE);
  });

  test("rest with open ends after an instant dump, some stages in reverse", async () => {
    const all = CASES.map((one) => {
      const left = leftAfterDump(
        one.chain,
        one.chain.map(() => V / one.chain.length),
      );
      return posed(one, left, { kind: "current", current: 0 });
    });
    expect(await worstDifference(all, true)).toBeLessThan(TOLERANCE);
  });

  test("hold with one stage short: the rest take its voltage, then drift", async () => {
    const all = CASES.map((one) => {
      const k = 1;
      const rest = withShort(one.chain, k);
      const start = afterShortHeld(one.chain, charged(one.chain), k);
      const left = { ...one, chain: rest.chain, units: one.units.filter((_, i) => i !== k) };
      const resistances = one.resistances.filter((_, i) => i !== k);
      return posed({ ...left, resistances }, start, { kind: "source", voltage: V, resistance: 0 });
    });
    expect(await worstDifference(all)).toBeLessThan(TOLERANCE);
  });

  test("hold with one unit open: a weaker stage cross-tied, a string fed through the resistor across the gap", async () => {
    const all = CASES.filter((one) => one.resistances[0]! < 1e9).map((one) => {
      if (one.ties === "cross-tied") {
        const units = withoutUnit(one.units, { stage: 0, unit: 0 });
        const chain = crossTiedChain(units, one.resistances);
        return posed({ ...one, units, chain }, charged(chain), { kind: "source", voltage: V, resistance: 0 });
      }
      const rest = withOpen(one.chain, 0);
      const start = charged(one.chain).slice(1);
      const left = { ...one, chain: rest.chain, units: one.units.slice(1), resistances: one.resistances.slice(1) };
      return posed(left, start, { kind: "source", voltage: V, resistance: rest.seriesResistance });
    });
    expect(all.length).toBeGreaterThan(30);
    expect(await worstDifference(all)).toBeLessThan(TOLERANCE);
  });
});
