// The drift of a built bank as text: the log in a line, the units nearest their end of life, the findings.

import type { Due, UnitDrift } from "../place/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import { findingsText } from "./layoutText.ts";
import { textTable } from "./table.ts";
import type { Watched } from "./watched.ts";
import { wrap } from "./wrap.ts";

const LISTED = 12;
/** A straight line is not drawn further than this many times what was watched. Common practice, no source. */
const FARTHEST = 10;
const NAMES = { capacitance: "capacitance", esr: "ESR", leakage: "leakage" } as const;

/** The last day of year 9999: later ones have no date of four figures. */
const LAST_DAY = 2_932_896;

/** 2026-03-09 of days since 1970; null beyond year 9999. */
export const dateOf = (day: number): string | null =>
  day > LAST_DAY ? null : new Date(Math.round(day) * 86_400_000).toISOString().slice(0, 10);

/** Due is said early rather than late: down, but for the latest. */
const at = (value: number, axis: Due["axis"], rounding: "up" | "down"): string =>
  axis === "day"
    ? (dateOf(rounding === "up" ? Math.ceil(value) : Math.floor(value)) ?? "after the year 9999")
    : formatQuantity(value, "count", { digits: 3, rounding });

/** When a unit is due by one axis, with what the readings leave open. */
export function dueWords({ axis, best, soonest, latest, stretch }: Due): string {
  if (stretch === null) return axis === "day" ? "" : "no drift towards it";
  if (stretch > FARTHEST) return `not within ${FARTHEST} times what was watched`;
  if (best === null) return soonest === null ? "" : `not before ${at(soonest, axis, "down")}`;
  const early = soonest === null ? "" : at(soonest, axis, "down");
  const late = latest === null ? "no telling how late" : at(latest, axis, "up");
  return `${at(best, axis, "down")} (${early} to ${late})`;
}

function changeWords({ kind, change, plusMinus }: UnitDrift): string {
  const grown = `${change >= 0 ? "+" : "-"}${formatQuantity(Math.abs(change), "fraction", { digits: 3 })}`;
  const doubt = formatQuantity(plusMinus, "fraction", { digits: 2, rounding: "up" });
  return `${kind === "capacitance" || change < 10 ? grown : "over tenfold"} +-${doubt}`;
}

const dueCell = (one: UnitDrift, axis: Due["axis"]): string => {
  if (one.verdict === "fail") return "DUE";
  if (one.verdict === "not assessed") return "not assessed";
  const due = one.due.find((by) => by.axis === axis);
  if (due === undefined) return "no telling";
  return one.straight ? dueWords(due) : `${dueWords(due)}; not a straight line`;
};

export function watchedText(found: Watched, width: number): string {
  const { units, shots, from, to, findings, notes } = found;
  const log = `${shots === null ? "shots not counted" : `${formatQuantity(shots, "count", { digits: 12 })} shots`}, ${dateOf(from)} to ${dateOf(to)}`;
  const again = units.filter((one) => one.readings > 1);
  const shown = again.slice(0, LISTED);
  const has = (axis: Due["axis"]): boolean => again.some((one) => one.due.some((due) => due.axis === axis));
  const table = textTable<UnitDrift>(
    [
      { heading: "unit", cell: (one) => one.serial, least: 6 },
      { heading: "of", cell: (one) => NAMES[one.kind] },
      { heading: "change (95 %)", cell: changeWords, side: "right" },
      { heading: "real", cell: (one) => (one.real ? "yes" : "no"), rank: 1 },
      ...(shots === null
        ? []
        : [{ heading: "due at shots (95 %)", cell: (one: UnitDrift) => dueCell(one, "shots"), least: 24 }]),
      ...(has("day") || shots === null
        ? [
            {
              heading: "due on (95 %)",
              cell: (one: UnitDrift) => dueCell(one, "day"),
              least: 20,
              rank: shots === null ? 0 : 2,
            },
          ]
        : []),
    ],
    shown,
    width,
    "  ",
  );
  const more =
    units.length > shown.length ? `${units.length - shown.length} more are further from it; --json lists all.` : "";
  const blocks = [
    wrap(`Log: ${log}`, width),
    units.length === 0
      ? "No unit was measured again."
      : `Drift since the first reading, nearest the end of life first\n${table}`,
    more,
    findings.length === 0 ? "" : `Findings\n${findingsText(findings, width)}`,
    ...notes.map((note) => wrap(note, width)),
  ];
  return `${blocks.filter((block) => block !== "").join("\n\n")}\n`;
}
