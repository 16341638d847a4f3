// The charts of the sheet as plain data: stage voltages against limits, bleed-down, the shot, and what more or fewer units cost.

import { isPriced } from "../catalog/index.ts";
import { voltageAfter } from "../hazard/index.ts";
import { traceOf, worstOfFault } from "../pulse/index.ts";
import { formatMoney } from "../quantity/index.ts";
import { cell, said, up } from "./cells.ts";
import { type BleedCurve, costSteps } from "./draw/index.ts";
import { factsOf } from "./facts.ts";
import type { SheetInput } from "./input.ts";
import type { Drawing } from "./model.ts";
import { positionWord } from "./names.ts";
import { waysDown } from "./ways.ts";

/** Worst voltages in each state, with the limit and the rating across. */
export function voltageChart(input: SheetInput): Drawing {
  const { layout, unit, faults, placed } = input;
  const { share } = layout;
  const short = faults.find(({ id }) => id === "unit-short") ?? null;
  const measured =
    placed === null ? null : Math.max(...placed.positions.map((p) => p.share ?? 0)) * factsOf(input).voltage;
  const bars = [
    { words: "charging", nominal: share.even, worst: share.charging },
    { words: "holding", nominal: share.even, worst: share.holding },
    ...(measured === null ? [] : [{ words: "charging, as measured and placed", nominal: share.even, worst: measured }]),
    ...(short === null ? [] : [{ words: "one unit shorted", nominal: short.worstVoltage, worst: worstOfFault(short) }]),
  ];
  const limits = [
    { words: "limit, derating in it", value: share.limit },
    { words: "rated", value: unit.voltage },
    ...(unit.surgeVoltage === undefined ? [] : [{ words: "surge", value: unit.surgeVoltage }]),
  ];
  const told = bars.map(
    ({ words, nominal, worst }) => `${words} ${said(cell(nominal, "voltage"))}, worst ${said(up(worst, "voltage"))}`,
  );
  const lines = limits.map(({ words, value }) => `${words} ${cell(value, "voltage")}`);
  return {
    kind: "drawing",
    drawn: {
      kind: "voltages",
      props: {
        id: "chart-voltages",
        title: `Voltage of a ${positionWord(layout)} against its limits`,
        bars,
        limits,
      },
    },
    words: `${told.join("; ")}. Limits: ${lines.join("; ")}.`,
  };
}

/** Each way of emptying the bank alone; null when the tolerance is not known or nothing empties it. */
export function bleedChart(input: SheetInput): Drawing | null {
  const facts = factsOf(input);
  const { capacitance, chain, chains, dump, voltage, clear } = facts;
  if (capacitance === null) return null;
  const floor = Math.min(clear, voltage) / 3;
  const curve = (words: string, resistance: number | null): readonly BleedCurve[] => {
    if (resistance === null || !Number.isFinite(resistance)) return [];
    const bank = { capacitance, voltage, resistance };
    const end = waysDown({ ...facts, chain: resistance, chains: 1 }, { from: voltage, to: floor }).chains ?? 0;
    if (!(end > 0)) return [];
    return [
      {
        words,
        points: [
          { time: 0, voltage },
          { time: end, voltage: voltageAfter(bank, end) },
        ],
      },
    ];
  };
  const curves = [
    ...curve("bleed chains", chain === null ? null : chain / chains),
    ...curve("one bleeder open", chain === null || chains < 2 ? null : chain / (chains - 1)),
    ...curve("dump resistor", dump),
  ];
  if (curves.length === 0) return null;
  const thresholds = [
    { words: "touch-safe by the brief", value: input.brief.touchSafe },
    ...(clear === input.brief.touchSafe ? [] : [{ words: "what a wait is for", value: clear }]),
  ];
  const ways = waysDown(facts, { from: voltage, to: clear });
  const told = [
    ...(chain === null ? [] : [`bleed chains ${said(up(ways.chains, "time"))}`]),
    ...(dump === null ? [] : [`dump resistor ${said(up(ways.dump, "time"))}`]),
  ];
  return {
    kind: "drawing",
    drawn: {
      kind: "bleed",
      props: { id: "chart-bleed", title: "Bleed-down from full, log scale", curves, thresholds },
    },
    words: `From ${cell(voltage, "voltage")} to ${cell(clear, "voltage")}: ${told.join("; ")}${chains === 1 ? "; with one bleeder open never, so that curve is not drawn" : ""}.`,
  };
}

/** Points of the curve; the peak is among them. */
const SAMPLES = 160;

export function shotChart({ shot }: SheetInput): Drawing | null {
  if (shot === null) return null;
  const { discharge, voltage } = shot;
  const rows = traceOf(discharge, SAMPLES);
  const lowest = rows.reduce((a, b) => (b.voltage < a.voltage ? b : a));
  const reverses = discharge.reversal > 0 && lowest.voltage < 0;
  return {
    kind: "drawing",
    drawn: {
      kind: "shot",
      props: {
        id: "chart-shot",
        title: "Discharge current and voltage",
        samples: rows.map(({ time, current, voltage: v }) => ({ time, current, voltage: v })),
        peak: { time: discharge.peakTime, current: discharge.peakCurrent },
        reversal: reverses ? { time: lowest.time, voltage: lowest.voltage } : null,
      },
    },
    words: `From ${cell(voltage, "voltage")}: peak ${cell(discharge.peakCurrent, "current")} at ${cell(discharge.peakTime, "time")}, reversal ${cell(discharge.reversal, "fraction")}, over after ${cell(discharge.duration, "time")}.`,
  };
}

/** What more or fewer units would cost, by the unit's own terms. */
export function costChart({ layout, unit, brief }: SheetInput): Drawing | null {
  const { currency } = unit;
  if (currency === undefined || !isPriced(unit)) return null;
  const needed = layout.units + brief.spares;
  const steps = costSteps(unit, needed);
  const here = steps.find((step) => needed >= step.from && needed <= step.to);
  if (here === undefined) return null;
  const price = here.cost === null ? "no price" : formatMoney(here.cost, currency);
  return {
    kind: "drawing",
    drawn: {
      kind: "cost",
      props: { id: "chart-cost", title: "Cost of the units by how many are needed", steps, needed, currency },
    },
    words: `${needed} units are needed, spares in them; ${here.bought} are bought, for ${price}.`,
  };
}
