// What is said beside every time of the dump: the ends read zero while units are charged, so it is never leave to touch.

import { leftAfterDump } from "../bank/index.ts";
import { cornersOf } from "../search/index.ts";
import { said, up, wait } from "./cells.ts";
import type { Facts } from "./facts.ts";
import type { SheetInput } from "./input.ts";
import type { Cell } from "./model.ts";
import { recoveryOf } from "./recovery.ts";

type Bank = Pick<SheetInput, "layout" | "unit" | "brief">;

/** Most that a unit may keep after a dump, V, either sign, from equal sharing or from an endless hold; null when the tolerance is unknown. */
function keptOf({ layout, unit, brief }: Bank, { voltage }: Facts): number | null {
  if (layout.series === 1) return 0;
  if (unit.tolerance === undefined || layout.share.leftAfterDump === null) return null;
  const { low, high } = leftAfterDump(voltage, layout.series, unit.tolerance);
  const held = cornersOf({ result: layout, unit, brief }).dumpedFromHold?.voltage ?? 0;
  return Math.max(Math.abs(low), Math.abs(high), layout.share.leftAfterDump, Math.abs(held));
}

/** "then measure each unit and short it: units may keep 82.5 V, and 165 V may come back". */
export function afterDumpWords(bank: Bank, facts: Facts): string {
  const kept = keptOf(bank, facts);
  const back = recoveryOf(bank, facts);
  const keep = kept === 0 ? "" : `units may keep ${said(up(kept, "voltage"), "a voltage that is not known")}, and `;
  return `then measure each unit and short it: ${keep}${said(up(back?.high, "voltage"), "a voltage that is not known")} may come back`;
}

/** The time of the dump with those words; a blank where there is no dump. */
export function afterDump(seconds: number | null, bank: Bank, facts: Facts): Cell {
  const time = wait(seconds);
  return time === null ? null : `${time}, ${afterDumpWords(bank, facts)}`;
}
