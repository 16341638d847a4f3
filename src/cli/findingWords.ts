// What each finding is about, and its figures as text rounded to the safe side.

import { type Dimension, type Finding, formatQuantity, type Verdict } from "../quantity/index.ts";

interface Title {
  readonly title: string;
  /** True when the limit is a least: then the value rounds down and the limit up. */
  readonly least?: boolean;
}

export const FINDINGS: Readonly<Record<string, Title>> = {
  "charging-share": { title: "worst unit while charging" },
  "holding-share": { title: "worst unit while holding" },
  "balance-power": { title: "power in a balancing element" },
  "balance-voltage": { title: "voltage on a balancing element" },
  "reverse-after-dump": { title: "reverse voltage left by a dump" },
  "pulse-energy": { title: "energy of one pulse", least: true },
  bleed: { title: "time to touch-safe by bleeding" },
};

const DIMENSION_OF: Readonly<Record<string, Dimension>> = {
  V: "voltage",
  W: "power",
  J: "energy",
  s: "time",
  A: "current",
  ohm: "resistance",
  F: "capacitance",
  C: "charge",
  kg: "mass",
  m: "length",
  A2s: "action",
  "%": "fraction",
  "1": "fraction",
};

/** The verdict as a word of fixed width, so that it never depends on colour. */
export const VERDICTS: Readonly<Record<Verdict, string>> = {
  pass: "pass",
  warn: "WARN",
  fail: "FAIL",
  "not assessed": "not assessed",
};

export const titleOf = (id: string): string => FINDINGS[id]?.title ?? id.replaceAll("-", " ");

/** Value, limit and margin as text; what is unknown says so. */
export function findingFigures({ id, value, limit, margin, unit }: Finding): {
  readonly value: string;
  readonly limit: string;
  readonly margin: string;
} {
  const least = FINDINGS[id]?.least === true;
  const dimension = DIMENSION_OF[unit] ?? "count";
  const show = (x: number | null, rounding: "up" | "down"): string => formatQuantity(x, dimension, { rounding });
  return {
    value: show(value, least ? "down" : "up"),
    limit: limit === null ? "unknown" : `${least ? ">=" : "<="} ${show(limit, least ? "up" : "down")}`,
    margin: margin === null ? "" : formatQuantity(margin, "fraction", { digits: 3, rounding: "down" }),
  };
}
