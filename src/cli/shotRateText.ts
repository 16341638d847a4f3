// Charging, firing again, life, a lamp's circuit, stated figures and fuses, in words; each block only where there is something to say.

import { visible } from "../order/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { FuseChoice, LampReport, LifeReport, ShotReport } from "../search/index.ts";
import { titleOf } from "./findingWords.ts";
import { hanging } from "./layoutText.ts";
import { wrap } from "./wrap.ts";

const show = (x: number | null, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 4 });
const unless = (x: number | null, text: (x: number) => string, or: string): string => (x === null ? or : text(x));

function chargeText({ charge, highestRate, drift, ripple }: ShotReport, width: number): string {
  const lines: string[] = [];
  if (charge !== null) {
    const { seconds, peakPower, meanPower, resistorHeat, efficiency } = charge;
    const powers = `${show(peakPower, "power")} at most, ${show(meanPower, "power")} in the mean`;
    lines.push(hanging("charging", `${show(seconds, "time")}, ${powers}`, width));
    if (resistorHeat > 0) {
      const text = `${show(resistorHeat, "energy")} a charge; ${show(efficiency, "fraction")} reaches the bank`;
      lines.push(hanging("charging resistor", text, width));
    }
    if (highestRate !== null) lines.push(hanging("highest rate", show(highestRate, "frequency"), width));
  }
  if (drift !== null)
    lines.push(
      hanging("at end of the hold", `${show(drift.voltage, "voltage")} with the charger off, leaking at worst`, width),
    );
  if (ripple !== null) lines.push(hanging("between recharges", `falls by ${show(ripple, "voltage")}`, width));
  return lines.length > 0 ? ["Charging", ...lines].join("\n") : "";
}

function heatText({ heating }: ShotReport, width: number): string {
  if (heating === null) return "";
  const { rms, power, unitRms, unitPower, unitRise } = heating;
  return [
    "At the rate",
    hanging(
      "bank",
      `${show(rms, "current")} rms, ${unless(power, (x) => show(x, "power"), "heat unknown without ESR")}`,
      width,
    ),
    hanging(
      "worst unit",
      `${show(unitRms, "current")} rms, ${unless(unitPower, (x) => show(x, "power"), "heat unknown without ESR")}, rise ${unless(unitRise, (x) => `${show(x, "count")} K`, "unknown")}`,
      width,
    ),
  ].join("\n");
}

function lifeText(life: LifeReport, width: number): string {
  const { ratio, voltage, reversal, temperature, missing, reference, notes } = life;
  const factor = (x: number | null): string => unless(x, (value) => show(value, "count"), "unknown");
  const shots = unless(reference.shots, (x) => ` of the ${show(x, "count")} shots rated`, "");
  const parts = `voltage x ${factor(voltage)}, reversal x ${factor(reversal)}, temperature x ${factor(temperature)}`;
  const text =
    ratio === null
      ? `not assessed: no exponent or reference for ${missing.join(", ")}`
      : `${show(ratio, "count")} times that at its ratings${shots}: ${parts}`;
  return [
    "Life of the worst unit",
    hanging("ratio", text, width),
    ...notes.map((note) => wrap(note, width, "  ")),
  ].join("\n");
}

export function lampText({ ideal, built, coil, voltageForEnergy, fit, explosion }: LampReport, width: number): string {
  const ratio = (x: number): string => `x ${show(x, "count")}`;
  const times = (x: number | null): string => unless(x, (value) => show(value, "time"), "not within the pulse");
  const land = (got: number, wanted: number, dimension: Dimension): string =>
    `${show(got, dimension)} for ${show(wanted, dimension)} (${ratio(got / wanted)})`;
  return [
    "Lamp's circuit: what this bank gives for the ideal",
    hanging("capacitance", land(built.capacitance, ideal.capacitance, "capacitance"), width),
    hanging("inductance", land(built.inductance, ideal.inductance, "inductance"), width),
    hanging("voltage", land(built.voltage, ideal.voltage, "voltage"), width),
    hanging(
      "coil to wind",
      unless(
        coil,
        (x) => `${show(x, "inductance")}, the bank and bus have the rest`,
        "unknown: ESL or bus is not known",
      ),
      width,
    ),
    hanging("alpha", `${show(fit.alpha, "count")} for ${show(fit.idealAlpha, "count")}`, width),
    hanging("energy", `${ratio(fit.energyRatio)}; as asked at ${show(voltageForEnergy, "voltage")}`, width),
    hanging(
      "width",
      `${ratio(fit.widthRatio)}; at half maximum ${times(fit.halfWidth)} for ${times(fit.idealHalfWidth)}`,
      width,
    ),
    hanging(
      "peak",
      `${show(fit.peakCurrent, "current")} for ${show(fit.idealPeakCurrent, "current")}, lamp, coil and bank alone`,
      width,
    ),
    hanging(
      "explosion energy",
      `${show(explosion.used, "energy")} by ${explosion.usedForm}; by the other form ${show(Math.max(explosion.form90, explosion.form12000), "energy")}. The lamp's datasheet comes first.`,
      width,
    ),
  ].join("\n");
}

function statedText({ stated }: ShotReport, width: number): string {
  if (stated === null) return "";
  const { verdict, losslessPeak, largestInductance, leastFrequency, lossFraction } = stated;
  const lines = [
    hanging("verdict", verdict === "inconsistent" ? "INCONSISTENT: these figures cannot all be true" : verdict, width),
    losslessPeak === null ? "" : hanging("lossless peak", show(losslessPeak, "current"), width),
    largestInductance === null ? "" : hanging("inductance", `at most ${show(largestInductance, "inductance")}`, width),
    leastFrequency === null ? "" : hanging("ring frequency", `at least ${show(leastFrequency, "frequency")}`, width),
    lossFraction === null ? "" : hanging("loss", `${show(lossFraction, "fraction")} of what is stored`, width),
  ];
  return ["What is stated", ...lines.filter((line) => line !== "")].join("\n");
}

/** The fuse chosen, or why none. */
export function fuseText(choice: FuseChoice | null, width: number): string {
  if (choice === null) return "";
  const { chosen, count, sees, tried } = choice;
  const words = [
    `a normal shot ${unless(sees.normalAction, (x) => show(x, "action"), "unknown")}`,
    `a shorted unit at most ${unless(sees.faultAction, (x) => show(x, "action"), "unknown")}`,
    `at least ${unless(sees.leastFaultAction, (x) => formatQuantity(x, "action", { digits: 4, rounding: "down" }), "unknown")}`,
    `breaks ${unless(sees.voltage, (x) => show(x, "voltage"), "unknown")}`,
  ];
  const lines = [hanging("sees", words.join(", "), width)];
  if (count === 0) lines.push(hanging("fuse", "none: without neighbours there is nothing to cut off", width));
  else if (chosen !== null) lines.push(hanging("fuse", `${visible(chosen.row.fuse)}, ${count} of them`, width));
  else {
    lines.push(hanging("fuse", `none of ${tried.length} does`, width));
    for (const { fuse, findings } of tried) {
      const first =
        findings.find(({ verdict }) => verdict === "fail") ?? findings.find(({ verdict }) => verdict !== "pass");
      const why = first === undefined ? "not enough can be had" : `${first.verdict}, ${titleOf(first.id)}`;
      lines.push(wrap(`${visible(fuse)}: ${why}`, width, "    "));
    }
  }
  return ["Fuse for each unit", ...lines].join("\n");
}

/** The blocks beside the shot itself; empty ones are left out. */
export function rateBlocks(report: ShotReport, width: number): readonly string[] {
  const blocks = [
    chargeText(report, width),
    heatText(report, width),
    lifeText(report.life, width),
    report.lamp === null ? "" : lampText(report.lamp, width),
    statedText(report, width),
  ];
  return blocks.filter((block) => block !== "");
}
