// What is found about a blend as a whole: energy, steady supply, bleed and the hazards of all its capacitance together.

import { hazardFindings } from "../hazard/index.ts";
import { type Finding, formatQuantity, withinLeast } from "../quantity/index.ts";
import type { BlendResult } from "./blendResult.ts";
import type { Brief } from "./brief.ts";

export interface WholeBlend extends Pick<BlendResult, "capacitance" | "energy" | "bleed"> {
  readonly brief: Brief;
  /** Any part of it. */
  readonly polarised: boolean;
}

export function blendFindings(whole: WholeBlend): readonly Finding[] {
  const { capacitance, bleed, brief, polarised } = whole;
  const hazards = hazardFindings({
    capacitance: capacitance.high ?? capacitance.nominal,
    voltage: brief.voltage * (1 + brief.overshoot),
    safeVoltage: brief.touchSafe,
    polarised,
    bleedSeconds: bleed.seconds ?? Number.POSITIVE_INFINITY,
  });
  return [energy(whole), ...steady(whole), bleeding(whole), ...hazards.filter(({ id }) => id !== "bleed-time")];
}

function energy({ energy, brief }: WholeBlend): Finding {
  return withinLeast({
    id: "pulse-energy",
    state: "pulse",
    value: brief.basis === "nominal" ? energy.nominal : energy.low,
    limit: brief.energy,
    unit: "J",
    source: "joulewright-design",
    note: `Energy of one pulse of all strings together, by the ${brief.basis} basis.`,
  });
}

function steady({ capacitance, brief }: WholeBlend): readonly Finding[] {
  if (brief.steady === undefined) return [];
  const { current, frequency } = brief.steady;
  return [
    withinLeast({
      id: "steady-current",
      state: "pulse",
      value: brief.basis === "nominal" ? capacitance.nominal : capacitance.low,
      limit: current / (frequency * brief.ripple * brief.voltage),
      unit: "F",
      source: "joulewright-design",
      note: "Capacitance of all strings together that feeds the steady current from one recharge to the next.",
    }),
  ];
}

function bleeding({ bleed }: WholeBlend): Finding {
  const safe = formatQuantity(bleed.toVoltage, "voltage");
  const never = bleed.seconds === null;
  return {
    id: "bleed",
    state: "stored",
    verdict: never ? "warn" : "not assessed",
    value: bleed.seconds,
    limit: null,
    margin: null,
    unit: "s",
    source: "joulewright-design",
    note: never
      ? `A group without a balancing chain never empties to ${safe} once it is cut off from the rest: it needs a bleed resistor of its own, a dump and a shorting link.`
      : `Time to ${safe} of the slowest group through its own chains, should it be cut off from the rest. No limit was given to judge it by. Never trust it: dump, measure, short.`,
  };
}
