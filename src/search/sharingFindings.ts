// Findings on how the voltage divides: while charging, at a stated risk, while holding, and what a dump leaves reversed.

import { stateOf } from "../catalog/index.ts";
import { type Finding, formatQuantity, withinMost } from "../quantity/index.ts";
import type { Cornered, FindingsInput } from "./findingsInput.ts";
import { heldEndWords, heldWords } from "./sharing/corners.ts";
import { mendWords, widestTolerance } from "./sharing/mendWords.ts";

/** With the statistical basis: the chance against the brief's risk, its error counted against it. */
export function chargingRisk({ result, brief }: FindingsInput): readonly Finding[] {
  if (result.risk === undefined) return [];
  const value = result.risk === null ? null : Math.min(1, result.risk.exceed + result.risk.error);
  const spread = result.risk?.law ?? "of unknown spread";
  const note = `Chance that any unit of the bank exceeds its limit while charging: units independent, each ${spread}; what a whole lot has in common cancels.`;
  const draft = { id: "charging-risk", state: "charging", value, limit: brief.risk, unit: "1" } as const;
  return [withinMost({ ...draft, source: "methods-derived", note })];
}

export function chargingShare({ result, brief, corners }: Cornered): Finding {
  const unknown = result.share.charging === null;
  const widest = unknown
    ? widestTolerance(brief.voltage * (1 + brief.overshoot), result.series, result.share.limit)
    : null;
  return withinMost({
    id: "charging-share",
    state: "charging",
    value: result.share.charging,
    limit: result.share.limit,
    unit: "V",
    source: "joulewright-design",
    // The builder chose to bear a stated risk instead: the worst case is told, not refused.
    exceeded: brief.basis === "statistical" || brief.basis === "measured" ? "warn" : "fail",
    note: unknown
      ? `The tolerance is unknown, so how the voltage divides while charging is not known: measure the units or find the datasheet.${widest === null ? "" : ` Up to +-${formatQuantity(widest, "fraction", { digits: 3, rounding: "down" })} this number in series would pass.`}`
      : result.series === 1
        ? "One unit carries the whole voltage."
        : `Worst unit while charging: ${corners.charging?.words ?? "one at its lowest capacitance, the rest at their highest"}.`,
  });
}

export function holdingShare({ result, candidate, unit, brief, corners, mends }: Cornered): Finding {
  const leak = stateOf(unit, "leakage");
  // Where the start of the hold stands highest, the corner of its end is another one.
  const later = corners.holding !== null && corners.holding.hold > 0 ? corners.holding.words : null;
  const end = corners.holding === null ? null : (later ?? heldEndWords({ result, unit, brief }));
  let note = `Worst unit at the end of the hold: ${end ?? "one that does not leak with its resistor high, the rest leaking with theirs low"}.`;
  if (candidate.leak === null && result.series > 1) {
    note =
      "Leakage and insulation are unknown, so no balancing resistor can be sized: measure the leakage of each unit at the working voltage.";
  } else if (result.balance === null && result.series > 1) {
    note =
      brief.hold === Number.POSITIVE_INFINITY
        ? "Without a balancing resistor leakage decides how the voltage divides."
        : "No balancing resistor is fitted.";
    if (mends) note += ` ${mendWords(mends, result.series)}`;
  } else if (leak.state === "assumed") {
    note += ` Leakage assumed: ${leak.rule}.`;
  }
  return withinMost({
    id: "holding-share",
    state: "holding",
    value: result.share.holding,
    limit: result.share.limit,
    unit: "V",
    source: "joulewright-design",
    note,
  });
}

/** The worse of equal sharing and of what the brief's own hold makes of it. */
export function reverse({ result, unit, brief, corners }: Cornered): Finding {
  const { leftAfterDump, charging, limit: most } = result.share;
  const polarity = unit.polarised;
  const held = corners.dumpedFromHold;
  const worse = held !== null && leftAfterDump !== null && -held.voltage > leftAfterDump ? held : null;
  const base = {
    id: "reverse-after-dump",
    state: "dumped",
    value: worse === null ? leftAfterDump : -worse.voltage,
    unit: "V",
    source: "methods-derived",
  } as const;
  if (result.series === 1)
    return withinMost({ ...base, limit: 0, note: "One in series: a dump leaves nothing reversed." });
  const from =
    worse === null
      ? `After a hold that shares equally and a dump the low stage is left reversed by this much: ${corners.dumped?.words ?? "corner unknown"}.`
      : `After ${heldWords(worse.hold)} with unequal leakage and a dump the worst stage is left reversed by this much: ${worse.words}. From equal sharing it would be ${formatQuantity(leftAfterDump, "voltage", { rounding: "up" })}.`;
  const limit = polarity === false ? most : polarity === undefined ? null : (unit.reverseVoltage ?? null);
  const measure = "measure each stage after a dump: the ends read zero while units are charged.";
  const tail =
    polarity === false
      ? `The unit is not polarised. Still ${measure}`
      : `Fit a clamp diode across each stage, and ${measure}`;
  const unknown = polarity !== false && limit === null ? "The reverse rating is unknown. " : "";
  const found = withinMost({
    ...base,
    limit,
    ...(polarity === false ? {} : { exceeded: "warn" as const }),
    note: `${unknown}${from} ${tail}`,
  });
  // Unequal leakage can do no more than empty a stage, which a dump then reverses by all that it was charged to.
  const bounded = charging !== null && limit !== null && charging <= limit;
  if (held !== null || found.verdict !== "pass" || brief.hold === 0 || bounded) return found;
  const open = "The leakage is unknown, so what an unequal hold adds to this is not known.";
  return { ...found, verdict: "not assessed", note: `${found.note} ${open}` };
}
