// What the screen of measured units asks of the layers below: a lot read, a search begun for a bank, a list saved.
import type { Capacitor } from "../../catalog/index.ts";
import { type Files, placeCsv, readMeasuredInput } from "../../cli/index.ts";
import { gapOfGroups, type PlaceRequest, placing, positionList } from "../../place/index.ts";
import { accepted, type Read } from "../../quantity/index.ts";
import type { LayoutResult } from "../../search/index.ts";
import { type SaveAnswer, saveText } from "../saveText.ts";
import type { Search } from "./placer.ts";
import type { Listed, Placed, UnitsLot } from "./state.ts";

export interface UnitsPort {
  /** Reads measured units; with units of other parts among them, those of `part` only. */
  readonly read: (path: string, part: string) => Read<UnitsLot>;
  readonly begin: (lot: UnitsLot, bank: LayoutResult, goOn: () => boolean) => Search;
  /** The places filled in the order of the file; null when the lot is too small. */
  readonly listed: (lot: UnitsLot, bank: LayoutResult) => Listed | null;
  readonly save: (lot: UnitsLot, placed: Placed, bank: LayoutResult | null, to: SaveTo) => SaveAnswer;
}

export interface SaveTo {
  readonly path: string;
  readonly replace: boolean;
}

/** Elementary trials: some tenths of a second. */
const MOVES = 2e7;

function requestFor(bank: LayoutResult, part: Capacitor | undefined): PlaceRequest {
  const { series, parallel, ties, balance } = bank;
  return {
    series,
    parallel,
    ties,
    moves: MOVES,
    goal: "both",
    leakageVoltage: part?.voltage ?? bank.share.even,
    ...(balance === null ? {} : { balanceConductance: 1 / balance.resistance }),
  };
}

export function unitsOn(parts: readonly Capacitor[], files: Pick<Files, "read" | "write">): UnitsPort {
  return {
    read: (path, part) => {
      const read = readMeasuredInput(path, part, files);
      return read.ok ? accepted({ path, units: read.value.units, faults: read.value.faults }) : read;
    },
    begin: (lot, bank, goOn) => {
      const part = parts.find((one) => one.part === bank.part);
      return { steps: placing(lot.units, { ...requestFor(bank, part), within: goOn }), moves: MOVES };
    },
    listed: ({ units }, bank) => {
      const { part, series, parallel, ties } = bank;
      const [count, size] = ties === "cross-tied" ? [series, parallel] : [parallel, series];
      if (units.length < count * size) return null;
      const groups = Array.from({ length: count }, (_, g) => units.slice(g * size, (g + 1) * size));
      return {
        bank: { part, series, parallel, ties },
        groups: groups.map((group) => group.map(({ serial }) => serial)),
        gap: gapOfGroups(
          ties,
          groups.map((group) => group.map(({ capacitance }) => capacitance)),
        ),
      };
    },
    save: (lot, { placing: made }, bank, { path, replace }) => {
      const voltage = bank === null ? null : bank.share.even * bank.series;
      return saveText(files, placeCsv(positionList(lot.units, made), made.ties, voltage), path, replace);
    },
  };
}
