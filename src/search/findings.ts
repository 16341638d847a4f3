// Every check of one arrangement at rest, in the order a reader wants them.

import type { Finding } from "../quantity/index.ts";
import { hazards, limits, oneShorted } from "./dangerFindings.ts";
import { balanceLoad, bleed, energy, steadySupply } from "./dutyFindings.ts";
import type { Cornered, FindingsInput } from "./findingsInput.ts";
import { cornersOf } from "./sharing/corners.ts";
import { chargingRisk, chargingShare, holdingShare, reverse } from "./sharingFindings.ts";

export type { FindingsInput };

export function findingsOf(given: FindingsInput): readonly Finding[] {
  const input: Cornered = { ...given, corners: cornersOf(given) };
  return [
    chargingShare(input),
    ...chargingRisk(input),
    holdingShare(input),
    ...balanceLoad(input),
    reverse(input),
    energy(input),
    ...steadySupply(input),
    bleed(input),
    ...hazards(input),
    ...oneShorted(input),
    ...limits(input),
  ];
}

/** The brief's own limits on shot, fault and life. */
function limits({ result, unit, brief, candidate }: FindingsInput): readonly Finding[] {
  const known = result.stress !== null && (result.series === 1 || candidate.leak !== null);
  const worst = known && result.stress !== null ? result.stress * unit.voltage : Number.POSITIVE_INFINITY;
  return limitFindings(brief, { unit, worst, ...result });
}

/** With the statistical basis: the chance against the brief's risk, its error counted against it. */
function chargingRisk({ result, brief }: FindingsInput): readonly Finding[] {
  if (result.risk === undefined) return [];
  const value = result.risk === null ? null : Math.min(1, result.risk.exceed + result.risk.error);
  const spread = result.risk?.law ?? "of unknown spread";
  const note = `Chance that any unit of the bank exceeds its limit while charging: units independent, each ${spread}; what a whole lot has in common cancels.`;
  const draft = { id: "charging-risk", state: "charging", value, limit: brief.risk, unit: "1" } as const;
  return [atMost({ ...draft, source: "methods-derived", note })];
}

function chargingShare({ result, brief, corners }: Cornered): Finding {
  const unknown = result.share.charging === null;
  const widest = unknown
    ? widestTolerance(brief.voltage * (1 + brief.overshoot), result.series, result.share.limit)
    : null;
  return atMost({
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

function holdingShare({ result, candidate, unit, brief, corners, mends }: Cornered): Finding {
  const leak = stateOf(unit, "leakage");
  let note = `Worst unit at the end of the hold: ${corners.holding?.words ?? "one that does not leak with its resistor high, the rest leaking with theirs low"}.`;
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
  return atMost({
    id: "holding-share",
    state: "holding",
    value: result.share.holding,
    limit: result.share.limit,
    unit: "V",
    source: "joulewright-design",
    note,
  });
}

function balanceLoad({ result, family }: FindingsInput): readonly Finding[] {
  const { balance } = result;
  if (balance === null || family === null) return [];
  const from = balance.assumed ? " The resistor's limits are assumed, not from a datasheet." : "";
  return [
    atMost({
      id: "balance-power",
      state: "holding",
      value: balance.powerEach,
      limit: family.power * family.derating,
      unit: "W",
      source: "joulewright-design",
      note: `Power in the worst element against ${formatQuantity(family.derating, "fraction")} of its rating.${from}`,
    }),
    atMost({
      id: "balance-voltage",
      state: "holding",
      value: balance.voltageEach,
      limit: family.voltage,
      unit: "V",
      source: "joulewright-design",
      note: `Voltage across the worst element against its working voltage.${from}`,
    }),
  ];
}

function reverse({ result, unit, corners }: Cornered): Finding {
  const { leftAfterDump } = result.share;
  const polarity = unit.polarised;
  const base = {
    id: "reverse-after-dump",
    state: "dumped",
    value: leftAfterDump,
    unit: "V",
    source: "methods-1.4",
  } as const;
  if (result.series === 1) return atMost({ ...base, limit: 0, note: "One in series: a dump leaves nothing reversed." });
  if (polarity === false) {
    return atMost({
      ...base,
      limit: result.share.limit,
      note: "The low stage keeps this with the other sign after a dump; the unit is not polarised. The ends read zero while units are charged: measure each stage.",
    });
  }
  const limit = unit.reverseVoltage ?? null;
  const held = corners.dumpedFromHold;
  const fromHold =
    held !== null && leftAfterDump !== null && -held.voltage > leftAfterDump
      ? ` After an endless hold with unequal leakage it may be ${formatQuantity(-held.voltage, "voltage", { rounding: "up" })}: ${held.words}.`
      : "";
  const clamp =
    "Fit a clamp diode across each stage, and measure each stage after a dump: the ends read zero while units are charged.";
  return atMost({
    ...base,
    limit: polarity === undefined ? null : limit,
    exceeded: "warn",
    note: `${limit === null ? "The reverse rating is unknown. " : ""}After a hold and a dump the low stage is left reversed by this much: ${corners.dumped?.words ?? "corner unknown"}.${fromHold} ${clamp}`,
  });
}

function energy({ result, brief }: FindingsInput): Finding {
  // The part of the measured basis is the lot itself, whose mean a placing meets; the placing's own energy is told beside.
  const middle = brief.basis === "nominal" || brief.basis === "measured";
  const value = middle ? result.energy.nominal : result.energy.low;
  return atLeast({
    id: "pulse-energy",
    state: "pulse",
    value,
    limit: brief.energy,
    unit: "J",
    source: "joulewright-design",
    note:
      value === null
        ? "The tolerance is unknown, so the least energy of a pulse is not known."
        : `Energy of one pulse from ${formatQuantity(brief.voltage, "voltage")} with an allowed fall of ${formatQuantity(brief.ripple, "fraction")}, by the ${brief.basis} basis.`,
  });
}

/** With a steady current drawn between recharges: the capacitance that keeps the fall within the brief's. */
function steadySupply({ result, brief }: FindingsInput): readonly Finding[] {
  if (brief.steady === undefined) return [];
  const { current, frequency } = brief.steady;
  const limit = current / (frequency * brief.ripple * brief.voltage);
  const value = brief.basis === "nominal" ? result.capacitance.nominal : result.capacitance.low;
  const note = "Capacitance that feeds the steady current from one recharge to the next within the allowed fall.";
  return [
    atLeast({ id: "steady-current", state: "pulse", value, limit, unit: "F", source: "joulewright-design", note }),
  ];
}

function bleed({ result }: FindingsInput): Finding {
  const { seconds, toVoltage } = result.bleed;
  const safe = formatQuantity(toVoltage, "voltage");
  const draft = {
    id: "bleed",
    state: "stored",
    value: seconds,
    limit: null,
    unit: "s",
    source: "joulewright-design",
  } as const;
  if (seconds === null && result.balance !== null) {
    const note = `The tolerance is unknown, so the longest time to ${safe} is not known.`;
    return { ...draft, verdict: "not assessed", margin: null, note };
  }
  if (seconds === null) {
    const note = `No balancing chain drains this bank to ${safe}: it needs a bleed resistor of its own, a dump and a shorting link.`;
    return { ...draft, verdict: "warn", margin: null, note };
  }
  const note = `Time to ${safe} through the balancing chain alone, high capacitance and high resistance. No limit was given to judge it by. Never trust it: dump, measure, short.`;
  return { ...draft, verdict: "not assessed", margin: null, note };
}

/** What can hurt, by the rules of the hazard layer; its own bleed finding is the one above. */
function hazards({ result, unit, brief }: FindingsInput): readonly Finding[] {
  const findings = hazardFindings({
    capacitance: result.capacitance.high ?? result.capacitance.nominal,
    voltage: brief.voltage * (1 + brief.overshoot),
    safeVoltage: brief.touchSafe,
    polarised: unit.polarised !== false,
    bleedSeconds: result.bleed.seconds ?? Number.POSITIVE_INFINITY,
  });
  return findings.filter((finding) => finding.id !== "bleed-time");
}

/** One unit shorted with the charger still on: what the sound ones then see. A warning, because it takes a fault to get there. */
function oneShorted({ result, unit, brief }: FindingsInput): readonly Finding[] {
  if (result.series === 1) return [];
  const fault = unitShort(faultBankOf({ result, unit, brief }));
  const value = fault.worstVoltageSpread;
  const note = `One unit shorted with the charger still on: the sound ones against their ${unit.surgeVoltage === undefined ? "rated" : "surge"} voltage. ${fault.stops}`;
  const limit = unit.surgeVoltage ?? unit.voltage;
  return [
    atMost({
      id: "unit-short",
      state: "faulted",
      value,
      limit,
      unit: "V",
      source: "methods-8",
      exceeded: "warn",
      note,
    }),
  ];
}
