// The position list and as-measured table in one: a row a unit, the fitted first, in units that a bench reads.

import { csvText } from "../order/index.ts";
import type { Position, Ties } from "../place/index.ts";

interface CsvColumn {
  readonly heading: string;
  readonly cell: (position: Position) => string | number | null;
}

/** A value in another unit, without the dust that the change of unit leaves. */
const times = (value: number | null, factor: number): number | null =>
  value === null ? null : Number((value * factor).toPrecision(12));

const columns = (ties: Ties, voltage: number | null): readonly CsvColumn[] => [
  { heading: ties === "cross-tied" ? "stage" : "string", cell: (p) => p.group },
  { heading: "place", cell: (p) => p.place },
  { heading: "serial", cell: (p) => p.serial },
  { heading: "use", cell: (p) => p.use },
  { heading: "capacitance [uF]", cell: (p) => times(p.capacitance, 1e6) },
  { heading: "leakage [uA]", cell: (p) => times(p.leakage, 1e6) },
  { heading: "esr [mohm]", cell: (p) => times(p.esr, 1e3) },
  { heading: "lot", cell: (p) => p.lot },
  { heading: "part", cell: (p) => p.part },
  { heading: "share [%]", cell: (p) => (p.share === null ? null : Number((p.share * 100).toPrecision(9))) },
  {
    heading: "voltage [V]",
    cell: (p) => (p.share === null || voltage === null ? null : Number((p.share * voltage).toPrecision(9))),
  },
  { heading: "note", cell: (p) => p.note },
];

/** Lines end in CR LF. Read back by --positions. */
export function placeCsv(positions: readonly Position[], ties: Ties, voltage: number | null): string {
  const shown = columns(ties, voltage);
  const rows = positions.map((position) =>
    shown.map(({ cell }) => {
      const value = cell(position);
      return value === null ? "" : typeof value === "number" ? String(value) : csvText(value);
    }),
  );
  return `${[shown.map(({ heading }) => csvText(heading)), ...rows].map((row) => row.join(",")).join("\r\n")}\r\n`;
}
