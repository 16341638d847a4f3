// Small random catalogues, resistor families and briefs, as the text and the keys that a user would write.
import type { BriefInput } from "../../src/search/index.ts";
import type { Chance } from "./random.ts";

const HEADING =
  "part;polarised;capacitance [uF];voltage [V];tolerance [%];derating;leakage [uA];insulation [Mohm];diameter [mm];length [mm];mass [g];" +
  "price;price breaks;currency;pack;minimum order;on hand;available";

const TOLERANCES = ["20", "10", "-10/+50", "-10/+20", "0/+20", "5", "", ""] as const;
/** Wider than any resistor of the same case, so that a larger resistor always shares worse. */
const WIDE = ["20", "10", "-10/+50", "-10/+20"] as const;

/** Two to four parts with gaps: no tolerance, no leakage, no size, no price, short stock, packs and breaks. */
export function smallCatalogue(c: Chance, wide = false): string {
  const rows = Array.from({ length: c.whole(2, 4) }, (_, i) => {
    const polar = c.pick(["yes", "no", ""]);
    const price = c.maybe(0.8) ? c.between(0.5, 30).toFixed(2) : "";
    const breaks = c.maybe(0.4)
      ? `${c.whole(5, 12)}: ${c.between(0.4, 20).toFixed(2)}; ${c.whole(20, 60)}: ${c.between(0.3, 12).toFixed(2)}`
      : "";
    return [
      `part-${i}`,
      polar,
      c.pick(["47", "100", "220", "330", "470", "1000"]),
      c.pick(["200", "350", "400", "450", "1100"]),
      c.pick(wide ? WIDE : TOLERANCES),
      c.pick(["", "", "0.85", "0.95"]),
      c.maybe(0.5) ? c.between(5, 2000).toFixed(0) : "",
      c.maybe(0.3) ? c.between(20, 5000).toFixed(0) : "",
      c.maybe(0.8) ? c.whole(20, 90) : "",
      c.maybe(0.9) ? c.whole(30, 140) : "",
      c.maybe(0.8) ? c.whole(20, 900) : "",
      price,
      breaks === "" ? "" : `"${breaks}"`,
      price === "" && breaks === "" ? "" : "EUR",
      c.pick(["", "", "4", "10"]),
      c.pick(["", "", "12"]),
      c.pick(["", "", "7", "30"]),
      c.pick(["", "", "40", "12", "0"]),
    ].join(";");
  });
  return [HEADING, ...rows].join("\n");
}

/** One or two families, one of them sometimes without a price. */
export function smallResistors(c: Chance, tolerances: readonly string[] = ["1", "5", "10"]): string {
  const rows = Array.from({ length: c.whole(1, 2) }, (_, i) => {
    const price = c.maybe(0.7) ? c.between(0.05, 2).toFixed(2) : "";
    return [
      `family-${i}`,
      c.pick(["E6", "E12", "E24"]),
      c.pick(["1", "100", "1000"]),
      c.pick(["10000", "220000", "1000000"]),
      c.pick(tolerances),
      c.pick(["0.5", "2", "10"]),
      c.pick(["0.5", "0.7"]),
      c.pick(["150", "350", "500"]),
      price,
      price === "" ? "" : "EUR",
      c.pick(["", "10"]),
    ].join(",");
  });
  return [
    "family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],derating,voltage [V],price,currency,pack",
    ...rows,
  ].join("\n");
}

/** A brief of a size that these parts can meet now and then; every rule of the search is drawn. */
export function smallBrief(c: Chance, holds: readonly string[]): BriefInput {
  return {
    energy: c.between(20, 600),
    voltage: c.pick([180, 360, 700, 900, 1600, 2200]),
    ripple: c.pick([1, 1, 0.5, 0.2]),
    basis: c.pick(["worst case", "worst case", "nominal"]),
    derating: c.pick([0.9, 0.8, 1]),
    overshoot: c.pick([0, 0, 0.05]),
    ageing: c.pick([0, 0, 0.1]),
    hold: c.pick(holds),
    maxSeries: c.whole(4, 12),
    maxUnits: c.whole(10, 80),
    spares: c.pick([0, 0, 1, 5]),
    ...(c.maybe(0.15) ? { maxCost: c.between(20, 400) } : {}),
    ...(c.maybe(0.15) ? { maxVolume: c.between(0.001, 0.01) } : {}),
    ...(c.maybe(0.15) ? { maxMass: c.between(1, 12) } : {}),
    ...(c.maybe(0.2) ? { steady: { current: c.between(0.5, 5), frequency: c.between(1, 20) } } : {}),
  };
}
