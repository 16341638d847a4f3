// Distances through air as advice, with the factor for altitude. Source: [IEC60664-1] by way of hazard's tables, from memory.

import { clearanceAdvice } from "../../hazard/index.ts";
import { up } from "../cells.ts";
import { type Block, type Cell, type Table, text } from "../model.ts";

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

/** The advice with its standing; where the tables end, that they do. */
export function clearanceBlocks(voltage: number): readonly Block[] {
  const table = clearanceTable(voltage);
  if (table === null) return [text("Clearances: no advice, the voltage is beyond the tables here.")];
  return [
    text(
      "Distances through air, advice only; the standard decides. The table is from memory: confirm against the text. The altitude factors are second hand, the bench rule of 3 mm a kilovolt is common practice without a source.",
    ),
    table,
  ];
}
