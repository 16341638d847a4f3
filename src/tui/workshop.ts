// All that is loaded after the first frame: the engine on parts that were read, the words of the commands, and saving an order.
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { clampWords, type Files, rateBlocks, refusalWords, titleOf, withoutBalanceWords } from "../cli/index.ts";
import { saveBill } from "./billFile.ts";
import { catalogEngine } from "./catalogEngine.ts";
import type { SharedWords, StockFacts, Workshop } from "./ports.ts";
import { unitsOn } from "./units/work.ts";

/** What was read from the catalogues. */
export interface ReadStock {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly stock: StockFacts;
}

export const SHARED_WORDS: SharedWords = { clampWords, rateBlocks, refusalWords, titleOf, withoutBalanceWords };

export const workshopOn = ({ parts, families, stock }: ReadStock, files: Pick<Files, "read" | "write">): Workshop => ({
  engine: catalogEngine({ parts, families }),
  stock,
  words: SHARED_WORDS,
  units: unitsOn(parts, files),
  exportBill: (bill, path, replace) => saveBill(files, bill, path, replace),
});
