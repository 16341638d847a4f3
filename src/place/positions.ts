// The list of what stands where, with what each unit was measured at and the share it bears: what is wired from and filed.
import { shares } from "./bankGaps.ts";
import type { Placing } from "./placing.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface Position {
  readonly use: "fitted" | "spare" | "set aside";
  /** Stage (cross-tied) or string, and place in it, from 1; null for a spare. */
  readonly group: number | null;
  readonly place: number | null;
  readonly serial: string;
  readonly capacitance: number;
  readonly leakage: number | null;
  readonly esr: number | null;
  readonly lot: string | null;
  readonly part: string | null;
  readonly note: string | null;
  /** Share of the bank's voltage while charging; null for a spare. */
  readonly share: number | null;
}

type Placed = Pick<Placing, "ties" | "groups" | "spares" | "rejected">;

/** Fitted units in the order of their positions, then the spares in the order of the placing. */
export function positionList(units: readonly MeasuredUnit[], { ties, groups, spares, rejected }: Placed): Position[] {
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const out = new Set(rejected.map((o) => o.serial));
  const row = (serial: string, rest: Pick<Position, "use" | "group" | "place" | "share">): Position => {
    const { capacitance, leakage = null, esr = null, lot = null, part = null, note = null } = bySerial.get(serial)!;
    return { ...rest, serial, capacitance, leakage, esr, lot, part, note };
  };
  const values = groups.map((group) => group.map((serial) => bySerial.get(serial)!.capacitance));
  const share = shares(ties, values);
  return [
    ...groups.flatMap((group, g) =>
      group.map((serial, k) =>
        row(serial, {
          use: "fitted",
          group: g + 1,
          place: k + 1,
          share: ties === "strings" ? share[g]![k]! : share[0]![g]!,
        }),
      ),
    ),
    ...spares.map((serial) =>
      row(serial, { use: out.has(serial) ? "set aside" : "spare", group: null, place: null, share: null }),
    ),
  ];
}
