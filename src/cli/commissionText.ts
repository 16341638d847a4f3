// The verdict on a charged bank as text: what to do first, then who is suspect, what to measure next, and the readings.

import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import type { Commissioned, Compared, Spot, SpotSuspect } from "./commissioned.ts";
import { findingsText } from "./layoutText.ts";
import { textTable } from "./table.ts";
import { bullet, wrap } from "./wrap.ts";

const VERDICT_WORDS = {
  agrees: "AGREES: the readings are what the measured units should show.",
  differs: "DIFFERS: do not go on to the next step before this is settled.",
  stop: "STOP.",
} as const;

const SERIALS_NAMED = 4;

export function spotWords({ position, string, serials }: Spot): string {
  const where = string === null ? `stage ${position}` : `string ${string}, place ${position}`;
  if (serials.length === 0) return where;
  const named = serials.slice(0, SERIALS_NAMED).map(visible).join(", ");
  return `${where} (${named}${serials.length > SERIALS_NAMED ? ", ..." : ""})`;
}

/** What the size of a fault means, in words; empty for a fault without one. */
export function sizeWords({ kind, size }: Pick<SpotSuspect, "kind" | "size">): string {
  const part = (x: number): string => formatQuantity(x, "fraction", { digits: 2 });
  const times = (x: number): string => formatQuantity(x, "count", { digits: 2 });
  if (kind === "low capacitance") return `about ${part(size)} less than measured`;
  if (kind === "high capacitance") return `about ${part(size)} more than measured`;
  if (kind === "leaky") return `some ${times(size)} times the current that it should pass, on top`;
  if (kind === "resistor wrong value") return `about ${times(size)} times its value`;
  return "";
}

const MEASURES = {
  capacitance: "measure its capacitance",
  leakage: "measure its leakage",
  resistor: "measure its balancing resistor",
  polarity: "look at its polarity marks and its wiring",
} as const;

/** The next measurement in a sentence. */
export function nextWords({ next, verdict }: Pick<Commissioned, "next" | "verdict">): string {
  if (next === null)
    return verdict === "stop"
      ? "nothing is read on the charged bank; when every stage is proven dead, measure what is suspect"
      : "nothing more needs to be read at this step";
  const where = next.position === undefined ? "" : spotWords(next as Spot);
  switch (next.action) {
    case "read stage": {
      const [first, second] = next.expect.map((v) => formatQuantity(v, "voltage", { digits: 4 }));
      return `read ${where} ${formatQuantity(next.seconds, "time", { digits: 3 })} after a charge: ${first} speaks for the first explanation, ${second} for the second`;
    }
    case "read after a hold":
      return `read every stage again after a hold of ${formatQuantity(next.seconds, "time", { digits: 2 })}: leakage has not had time to show`;
    case "check the meter":
      return "treat the bank as charged; check the meter and its leads on a known source of about the stage voltage, then read every stage again, each across its own two terminals";
    case "with the bank dead":
      return `discharge, prove every stage dead, then at ${where} ${MEASURES[next.measure]}`;
    case "change the leads and read again":
      return `change the meter's leads at ${where} and read again`;
  }
}

function goOnWords({ goOn, choices }: Commissioned): string {
  if (goOn === null || choices.next === null) return "";
  const step = formatQuantity(choices.next.bank, "voltage");
  const worst = `${formatQuantity(goOn.worst, "voltage", { digits: 4, rounding: "up" })} at ${spotWords(goOn)}`;
  if (goOn.safe === null) return `Next step, ${step}: worst ${worst}; the limit is not known, so not assessed.`;
  return goOn.safe
    ? `Next step, ${step}: may be taken; worst ${worst} under every explanation that is still likely.`
    : `Next step, ${step}: NOT to be taken; worst ${worst} under an explanation that is still likely, or this step is not settled.`;
}

function suspectsText({ suspects, unexplained, sound }: Commissioned, width: number): string {
  const chance = (x: number): string => formatQuantity(x, "fraction", { digits: 3, rounding: "down" });
  const lines = suspects.map((suspect) => {
    const size = sizeWords(suspect);
    return bullet(
      `${chance(suspect.likelihood)}  ${spotWords(suspect)}: ${suspect.kind}${size === "" ? "" : `, ${size}`}`,
      width,
    );
  });
  const open =
    unexplained && suspects.length > 0
      ? [
          bullet(
            "No single fault explains these readings: more than one thing is wrong, or the sheet is not of this bank.",
            width,
          ),
        ]
      : [];
  return [`Likelihoods by the meter, nothing wrong ${chance(sound)}`, ...lines, ...open].join("\n");
}

function comparedText({ compared }: Commissioned, width: number): string {
  const volts = (v: number): string => formatQuantity(v, "voltage", { digits: 5 });
  return textTable<Compared>(
    [
      { heading: "after", cell: (row) => formatQuantity(row.seconds, "time", { digits: 3 }), side: "right" },
      { heading: "charged to", cell: (row) => formatQuantity(row.bank, "voltage"), side: "right", rank: 1 },
      { heading: "place", cell: (row) => spotWords({ ...row, serials: [] }) },
      { heading: "read", cell: (row) => volts(row.read), side: "right" },
      { heading: "predicted", cell: (row) => volts(row.predicted), side: "right" },
      {
        heading: "off by",
        cell: (row) => `${((row.read / row.predicted - 1) * 100).toFixed(2)} %`,
        side: "right",
      },
    ],
    compared,
    width,
    "  ",
  );
}

export function commissionText(found: Commissioned, width: number): string {
  const { verdict, actions, findings, notes } = found;
  const blocks = [
    VERDICT_WORDS[verdict],
    actions.length === 0
      ? ""
      : `In this order\n${actions.map((text, i) => wrap(`${i + 1}. ${text}`, width, "  ")).join("\n")}`,
    findings.length === 0 ? "" : `Findings\n${findingsText(findings, width)}`,
    suspectsText(found, width),
    wrap(`Next: ${nextWords(found)}.`, width),
    wrap(goOnWords(found), width),
    `Readings\n${comparedText(found, width)}`,
    ...notes.map((note) => wrap(note, width)),
  ];
  return `${blocks.filter((block) => block.trim() !== "").join("\n\n")}\n`;
}
