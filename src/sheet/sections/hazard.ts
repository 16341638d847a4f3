/*
 * The hazard file: the energy class, what every rule says and when the bank clears it, what comes back, how many ways there
 * are to empty it, the dump resistor, and distances as advice.
 *
 * The stricter tier holds, at or over counts, and arc blast is a flag apart. Limits from memory are to be confirmed.
 * Source: [methods-derived] 3.1 to 3.5, 12; the rules' own rows say how they were read.
 */

import {
  chargeChecks,
  clearanceAdvice,
  clearingOf,
  dumpDuty,
  dumpWindow,
  energyClass,
  type HowRead,
  RULES,
  recovery,
  ruleOf,
} from "../../hazard/index.ts";
import { cell, said, up, wait } from "../cells.ts";
import { type Facts, factsOf, ruleName, waysDown } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Block, type Cell, list, type Section, type Table, text } from "../model.ts";

/** What a reader is told of how far the text was read. */
const READ: Readonly<Record<HowRead, string>> = {
  read: "read",
  "second hand": "second hand",
  memory: "memory: confirm against the text",
};

const UNITS = {
  V: "voltage",
  C: "charge",
  J: "energy",
  s: "time",
  F: "capacitance",
  A: "current",
  "1": "fraction",
} as const;

function classTable(input: SheetInput, { voltage, stored, capacitance }: Facts): Table {
  const none = "not assessed: the tolerance is unknown";
  const found = stored === null ? null : energyClass({ energy: stored, voltage });
  const highest = input.brief.charger?.highest ?? input.brief.charger?.supply ?? null;
  const ran = capacitance === null || highest === null ? null : (capacitance * Math.max(highest, voltage) ** 2) / 2;
  const charges = capacitance === null ? [] : chargeChecks({ capacitance, voltage });
  const tier =
    found === null
      ? none
      : `${cell(found.threshold, "energy")} from ${cell(found.tier.fromVoltage, "voltage")} (${ruleName(found.ruleId)}; at or over counts)`;
  return {
    kind: "table",
    id: "classes",
    caption: "Classes at the highest voltage",
    columns: [{ heading: "what" }, { heading: "value" }, { heading: "limit" }, { heading: "class" }],
    rows: [
      [
        "stored energy, highest voltage",
        up(stored, "energy"),
        tier,
        found === null ? none : found.hazardous ? "HAZARDOUS by stored energy" : "below the threshold",
      ],
      [
        "arc blast, a flag apart",
        up(stored, "energy"),
        `10 kJ at 100 V and more (${ruleName("lbnl-arc-blast")})`,
        found === null ? none : found.arcBlast ? "ARC BLAST: remote control, exclusion, hearing" : "no flag",
      ],
      [
        "shock, the laxer figure",
        up(stored, "energy"),
        `10 J at 100 V and more (${ruleName("lbnl-shock")})`,
        found === null ? none : `${found.shockByTenJoule ? "over" : "under"}; the stricter tier above is what holds`,
      ],
      [
        "stored energy, charger run on",
        up(ran, "energy"),
        highest === null ? "the charger's highest voltage is not known" : cell(Math.max(highest, voltage), "voltage"),
        ran === null || highest === null
          ? null
          : energyClass({ energy: ran, voltage: Math.max(highest, voltage) }).arcBlast
            ? "arc blast"
            : "as above",
      ],
      [
        "voltage",
        up(voltage, "voltage"),
        `${cell(60, "voltage")} (${ruleName("iec-61010-touch")})`,
        voltage > 60 ? "over touch-safe" : "touch-safe",
      ],
      ...charges.map((one): readonly Cell[] => [
        `${one.quantity} held`,
        up(one.value, UNITS[one.unit]),
        `${cell(one.limit, UNITS[one.unit])} (${ruleName(one.ruleId)}${one.tag === "memory" ? "; confirm against the text" : ""})`,
        one.exceeded ? "over" : "within",
      ]),
    ],
  };
}

function ruleTable(input: SheetInput, facts: Facts): Table {
  const { rule } = input;
  const { capacitance, voltage, chain } = facts;
  return {
    kind: "table",
    id: "rules",
    caption: "Every rule, and when this bank clears it for good",
    columns: [
      { heading: "rule" },
      { heading: "read" },
      { heading: "what it asks" },
      { heading: "clears at", side: "right" },
      { heading: "bleed chains", side: "right" },
      { heading: "one open", side: "right" },
      { heading: "dump", side: "right" },
      { heading: "gives" },
    ],
    rows: RULES.map((one): readonly Cell[] => {
      const clearing = capacitance === null ? null : clearingOf(one, capacitance);
      const level = clearing?.voltage ?? null;
      const ways = level === null ? null : waysDown(facts, { from: voltage, to: level });
      const none = clearing !== null && level === null ? "no level" : null;
      const seconds = clearingOf(one, capacitance ?? 1).seconds;
      return [
        `${ruleName(one.id)}${one.id === rule ? " (GOVERNS HERE)" : ""}`,
        READ[one.tag],
        one.words,
        none ?? (level === Number.POSITIVE_INFINITY ? "never over it" : cell(level, "voltage")),
        none ?? (chain === null ? "no chain" : wait(ways?.chains ?? null)),
        none ?? (chain === null ? "no chain" : wait(ways?.oneOpen ?? null)),
        none ?? wait(ways?.dump ?? null),
        seconds === null ? "no time" : cell(seconds, "time"),
      ];
    }),
  };
}

/** How many ways empty the bank without a hand, and which. */
export function pathCount({ chains, dump }: Facts): { readonly count: number; readonly words: string } {
  const count = (chains > 0 ? 1 : 0) + (dump === null ? 0 : 1);
  const chain =
    chains === 0
      ? "no bleed chain"
      : chains === 1
        ? "one bleed chain (one open resistor ends it)"
        : `${chains} bleed chains side by side, counted as one way`;
  return {
    count,
    words: `${chain}; ${dump === null ? "dump not stated" : "a dump resistor"}; the stick is a hand's, and is not counted`,
  };
}

function dumpBlock({ capacitance, voltage, clear, allowed, dump, stored }: Facts): Block {
  if (capacitance === null || stored === null)
    return text("Dump resistor: not sized, because the tolerance of the unit is not known.");
  const needs = `It must bear ${up(stored, "energy")} in one go and ${up(voltage, "voltage")}; it is chosen by joules and volts, not by watts.`;
  if (dump !== null) {
    const duty = dumpDuty({ capacitance, voltage, resistance: dump });
    return text(
      `Dump resistor of ${cell(dump, "resistance")}: ${up(duty.energy, "energy")} in one go, ${up(duty.peakCurrent, "current")} and ${up(duty.peakVoltage, "voltage")} at its first moment, ${up(duty.peakPower, "power")} for that moment, time constant ${up(duty.timeConstant, "time")}. ${needs}`,
    );
  }
  if (allowed === null || !Number.isFinite(clear))
    return text(`Dump resistor: its resistance is blank, and the governing rule gives no time to size it by. ${needs}`);
  const window = dumpWindow({
    capacitance,
    voltage,
    safeVoltage: clear,
    seconds: allowed,
    peakCurrent: Number.MAX_VALUE,
  });
  return text(
    `Dump resistor: its resistance is blank. To reach ${cell(clear, "voltage")} within ${cell(allowed, "time")} it is at most ${cell(window?.most, "resistance", "down")}; its peak current is the voltage over it. ${needs}`,
  );
}

function clearanceTable(voltage: number): Table | null {
  const rows = [0, 2000, 3000, 4000, 5000].flatMap((altitude): readonly (readonly Cell[])[] => {
    const read = clearanceAdvice({ voltage, altitude });
    if (!read.ok) return [];
    const { byTable, factor, byBench, advised, extrapolated } = read.value;
    return [
      [
        altitude === 0 ? "up to 2 000 m" : `${altitude} m`,
        String(Number(factor.toPrecision(3))),
        up(byTable, "length"),
        up(byBench, "length"),
        up(advised, "length"),
        extrapolated ? "beyond the table's scope" : "within its scope",
      ],
    ];
  });
  if (rows.length === 0) return null;
  return {
    kind: "table",
    id: "clearances",
    caption: "Clearance through air, advice only",
    columns: [
      { heading: "altitude" },
      { heading: "factor", side: "right" },
      { heading: "by table", side: "right" },
      { heading: "by bench rule", side: "right" },
      { heading: "advised", side: "right" },
      { heading: "scope" },
    ],
    // At 0 m and at 2 000 m the factor is the same: one row says both.
    rows: rows.filter((_, i) => i !== 1),
  };
}

export function hazardSection(input: SheetInput): Section {
  const facts = factsOf(input);
  const { voltage, capacitance } = facts;
  const back =
    capacitance === null ? null : recovery({ soak: voltage, capacitance, polarised: input.unit.polarised !== false });
  const paths = pathCount(facts);
  const clearances = clearanceTable(voltage);
  const chosen = input.rule === null ? null : ruleOf(input.rule);
  const governs =
    chosen === null
      ? `No rule was chosen: ${facts.rule}, ${cell(input.brief.touchSafe, "voltage")}, governs the times on this sheet. The person responsible chooses the rule that applies.`
      : `${ruleName(chosen.id as NonNullable<typeof input.rule>)} governs the times on this sheet, by the user's choice (${READ[chosen.tag]}). Whether it is the right rule for this place is for the person responsible to say.`;
  return {
    id: "hazard",
    title: "Hazard file",
    ownPage: true,
    blocks: [
      text(governs),
      classTable(input, facts),
      text(
        back === null
          ? "Recovery voltage after a short: not assessed, because the tolerance of the unit is not known."
          : `Recovery voltage after a short: ${back.low === null ? "up to" : `${up(back.low, "voltage")} to`} ${up(back.high, "voltage")}, ${said(up(back.energy, "energy"))} at the most${back.hazardous ? ", HAZARDOUS by stored energy" : ""}. ${ruleOf(back.ruleId).words} (${back.tag})`,
      ),
      text(
        `Ways to empty the bank without a hand: ${paths.count}. ${paths.words}. Two independent ways are wanted, each proven with the power off; neither is trusted.`,
      ),
      dumpBlock(facts),
      ruleTable(input, facts),
      ...(clearances === null
        ? [text("Clearances: no advice, the voltage is beyond the tables here.")]
        : [
            text(
              "Distances through air, advice only; the standard decides. The table is from memory: confirm against the text. The altitude factors are second hand, the bench rule of 3 mm a kilovolt is common practice without a source.",
            ),
            clearances,
          ]),
      list([
        "Second hand: read in a public page that quotes the text. Memory: neither. Neither may stand in a safety file unread.",
        "Limits and classes differ between bodies; where two tiers hold the stricter is taken.",
      ]),
    ],
  };
}
