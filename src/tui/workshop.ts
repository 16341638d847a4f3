// All that is loaded after the first frame: the engine on parts that were read, the words of the commands, and saving an order.
import {
  type Capacitor,
  OVERRIDABLE,
  type Overrides,
  overridden,
  type ResistorFamily,
  stateOf,
} from "../catalog/index.ts";
import {
  besideWords,
  clampWords,
  type Files,
  loosenWords,
  proofSentence,
  rateBlocks,
  reasonWords,
  refusalWords,
  type Source,
  saveOverrides,
  titleOf,
  valueText,
  withoutBalanceWords,
} from "../cli/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import { saveBill } from "./billFile.ts";
import { catalogEngine } from "./catalogEngine.ts";
import type { PartValue, SaveAnswer, SharedWords, StockFacts, Workshop } from "./ports.ts";
import { unitsOn } from "./units/work.ts";

/** What was read from the catalogues. */
export interface ReadStock {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly stock: StockFacts;
  readonly sources: readonly Source[];
}

const majorOf = (minor: number, currency: string | undefined): number => minor / tenTo(minorDigits(currency ?? "EUR"));

/** Every value that can be set by hand, as it stands. A blank of a word or of a term of purchase is unknown too. */
const valuesOf = (unit: Capacitor): readonly PartValue[] =>
  OVERRIDABLE.map((column): PartValue => {
    const key = column.key as keyof Capacitor;
    const state = stateOf(unit, key);
    const value = unit[key];
    const text = valueText(value, column, unit.currency);
    return {
      heading: column.heading,
      text,
      state: state.state,
      ...(state.state === "assumed" ? { rule: state.rule } : {}),
    };
  });

export const SHARED_WORDS: SharedWords = {
  besideWords,
  clampWords,
  loosenWords,
  proofSentence,
  reasonWords,
  rateBlocks,
  refusalWords,
  titleOf,
  withoutBalanceWords,
  headings: OVERRIDABLE.map(({ heading }) => heading),
  valuesOf,
  majorOf,
  overrideTrouble: (unit, texts) => {
    const read = overridden(unit, texts);
    return read.ok ? null : refusalWords(read.refusals[0] as (typeof read.refusals)[number]);
  },
};

/** What is set by hand for one catalogue: of its own parts as given, of parts that it lacks as its file has them. */
function overridesFor(source: Source, parts: readonly Capacitor[], overrides: Overrides): Overrides {
  const own = new Set(parts.filter(({ file }) => file === source.file).map(({ part }) => part));
  const kept = Object.entries(source.overrides ?? {}).filter(([part]) => !own.has(part));
  return Object.fromEntries([...kept, ...Object.entries(overrides).filter(([part]) => own.has(part))]);
}

function saveAll({ parts, sources }: ReadStock, files: Pick<Files, "write">, overrides: Overrides): SaveAnswer {
  let path = "";
  for (const source of sources.filter(({ kind }) => kind === "capacitors")) {
    const wanted = overridesFor(source, parts, overrides);
    if (JSON.stringify(wanted) === JSON.stringify(source.overrides ?? {})) continue;
    const written = saveOverrides(source.file === "standard input" ? "-" : source.file, wanted, files);
    if (!written.ok) return { kind: "trouble", words: written.refusals.map(refusalWords).join(" ") };
    path = written.value;
  }
  return { kind: "saved", path };
}

export const workshopOn = (read: ReadStock, files: Pick<Files, "read" | "write">): Workshop => ({
  engine: catalogEngine({ ...read, files }),
  families: read.families,
  stock: read.stock,
  units: unitsOn(read.parts, files),
  catalogue: { parts: read.parts, sources: read.sources },
  overrides: Object.assign({}, ...read.sources.map(({ overrides }) => overrides ?? {})),
  saveOverrides: (overrides) => saveAll(read, files, overrides),
  words: SHARED_WORDS,
  exportBill: (bill, path, replace) => saveBill(files, bill, path, replace),
});
