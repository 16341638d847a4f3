// The labels of one bank: a label for every unit, for every stage or string, and for every spare that lies beside it.

import type { Label } from "./draw/index.ts";
import { potentialOf } from "./draw/potential.ts";
import { factsOf } from "./facts.ts";
import { footerOf, titleOf } from "./heading.ts";
import type { SheetInput } from "./input.ts";
import { measuredOf } from "./measured.ts";
import { groupWord, type Spot, spotsOf } from "./names.ts";
import { sparesShown } from "./sections/placed.ts";

/** V to earth of the terminal further from it, between two of the bank's heights; null where that is not fixed. */
function toEarth(input: SheetInput, low: number, high: number): number | null {
  const { layout, earth } = input;
  const at = (node: number): number | null =>
    potentialOf({ series: layout.series, chargeVoltage: factsOf(input).voltage, earth }, node);
  const [below, above] = [at(low), at(high)];
  return below === null || above === null ? null : Math.abs(below) > Math.abs(above) ? below : above;
}

/** Ready to be written, with what is said on every page. */
export interface Labels {
  readonly title: string;
  readonly layout: string;
  readonly labels: readonly Label[];
  readonly footer: readonly string[];
}

export const labelsOf = (input: SheetInput): Labels => ({
  title: titleOf(input),
  layout: input.layout.id,
  labels: labelList(input),
  footer: footerOf(input),
});

/** Units group by group, then the stages or strings, then the spares. */
function labelList(input: SheetInput): readonly Label[] {
  const { layout, unit, placed, brief } = input;
  const { series, parallel, ties } = layout;
  const tied = ties === "cross-tied";
  const measured = measuredOf(input);
  const polarised = unit.polarised ?? null;
  const common = { part: unit.part, polarised, voltage: unit.voltage };
  const standing = new Map(placed?.positions.map((p) => [`${p.group}.${p.place}`, p]));
  const unitLabel = (spot: Spot): Label => {
    const found = standing.get(`${spot.group}.${spot.place}`);
    const height = tied ? spot.group : spot.place;
    return {
      ...common,
      kind: "unit",
      position: `${spot.group}.${spot.place}`,
      serial: found?.serial ?? null,
      capacitance: found?.capacitance ?? unit.capacitance,
      toEarth: toEarth(input, height - 1, height),
    };
  };
  const groupLabel = (group: number): Label => ({
    ...common,
    kind: groupWord(layout),
    position: String(group),
    voltage: tied ? unit.voltage : unit.voltage * series,
    capacitance: measured?.groups[group - 1] ?? (tied ? unit.capacitance * parallel : unit.capacitance / series),
    toEarth: tied ? toEarth(input, group - 1, group) : toEarth(input, 0, series),
  });
  const spares =
    placed === null ? [] : placed.positions.filter(({ use }) => use === "spare").slice(0, sparesShown(input));
  const blanks = Array.from({ length: placed === null ? brief.spares : 0 }, () => null);
  return [
    ...spotsOf(layout).map(unitLabel),
    ...Array.from({ length: tied ? series : parallel }, (_, g) => groupLabel(g + 1)),
    ...[...spares, ...blanks].map(
      (spare, i): Label => ({
        ...common,
        kind: "spare",
        position: String(i + 1),
        serial: spare?.serial ?? null,
        capacitance: spare?.capacitance ?? unit.capacitance,
      }),
    ),
  ];
}
