// Everything that a sheet of one bank is made from: the bank checked, fired, placed and compared, and the words for it.

import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { type FuseChoice, faultsOf, fittedFuse, plan, shotOf } from "../search/index.ts";
import { type FindingLine, governedOf, type SheetInput } from "../sheet/index.ts";
import { askedLines } from "./askedText.ts";
import { cautionsOf } from "./cautions.ts";
import { type Checked, checkedBank } from "./checked.ts";
import { chargerWords, loadWords, switchWords } from "./circuitWords.ts";
import { findingFigures, titleOf } from "./findingWords.ts";
import { readFuseStock } from "./fuses.ts";
import { faultLines, inputSentences } from "./inputNotes.ts";
import { placesOf } from "./placedUnits.ts";
import type { Ports } from "./ports.ts";
import { readOnce } from "./readOnce.ts";
import { readSheetFlags, type SheetChoices, type SheetFlags } from "./sheetFlags.ts";
import { VERSION } from "./version.ts";
import { refusalWords } from "./words.ts";

export interface ReadSheet {
  readonly input: SheetInput;
  readonly choices: SheetChoices;
  /** What was lost on the way, for the error stream. */
  readonly lost: readonly string[];
  readonly failed: boolean;
}

/** Layouts of the same brief that are worked out to stand beside this one. */
const BESIDE = 20;

const findingLine = (finding: Finding): FindingLine => ({
  title: titleOf(finding.id),
  verdict: finding.verdict,
  ...findingFigures(finding),
  source: finding.source,
  note: finding.note,
});

/** `beside`: also what the same brief and catalogues give beside this layout. Reads and reckons; every fault of every input is told at once where they can be told apart. */
export function sheetInput(brief: string | undefined, flags: SheetFlags, ports: Ports, beside = true): Read<ReadSheet> {
  const once: Ports = { ...ports, files: readOnce(ports.files) };
  const choices = readSheetFlags(flags);
  const { measured, ...rest } = flags;
  // A lot that places the units is not the lot that the statistical basis draws from.
  const checked = checkedBank(brief, rest, once);
  if (!choices.ok || !checked.ok)
    return refused(...[choices, checked].flatMap((read) => (read.ok ? [] : read.refusals)));
  const bank = checked.value;
  const fuse = fuseFor(flags.fuses, bank, once);
  const placed = measured === undefined ? null : placesOf(brief, flags, once);
  const faults = [fuse, placed].flatMap((read) => (read === null || read.ok ? [] : read.refusals));
  if (faults.length > 0) return refused(...faults);
  const found = fuse?.ok ? fuse.value : null;
  const units = placed?.ok ? placed.value : null;
  const { paper: _, ...chosen } = choices.value;
  const { input, findings } = joined(bank, found?.choice ?? null, { beside, rule: choices.value.rule });
  return accepted({
    choices: choices.value,
    lost: [...faultLines(bank.stock), ...(found?.lost ?? []), ...(units?.lost ?? [])],
    failed: findings.some(({ verdict }) => verdict === "fail"),
    input: {
      ...input,
      ...chosen,
      placed: units?.placed ?? null,
      program: `joulewright ${VERSION}`,
      words: {
        ...input.words,
        notes: [...input.words.notes, ...(units?.notes ?? []), ...(flags.earth === undefined ? [EARTH_NOTE] : [])],
      },
    },
  });
}

const EARTH_NOTE = "The negative end is taken to be at the one earth point, assumed: --earth says otherwise.";

type Joined = Omit<SheetInput, "placed" | "rule" | "earth" | "date" | "revision" | "program">;

/** The bank with its shot, its faults, its alternatives and the words of all of them. */
function joined(
  bank: Checked,
  fuse: FuseChoice | null,
  { beside, rule }: { readonly beside: boolean } & Pick<SheetInput, "rule">,
): { readonly input: Joined; readonly findings: readonly Finding[] } {
  const { result: layout, unit, settings, stock, currency, notes } = bank;
  const { brief, given } = settings;
  const row = fuse?.chosen?.row;
  const rated =
    row === undefined
      ? null
      : { meltingAction: row.melting ?? null, clearingAction: row.clearing ?? null, dcVoltage: row.voltage ?? null };
  const shot = brief.load === undefined ? null : shotOf({ layout, unit, brief, fuse: rated });
  const report = shot?.ok ? shot.value : null;
  const others = beside
    ? plan({ brief, parts: stock.parts, families: stock.families, limit: BESIDE, quick: true })
    : null;
  const governed = governedOf({ layout, brief, rule });
  // The governing rule's own time is the limit of the bleed, where the bank's finding had none.
  const timed = governed.some(({ id }) => id === "rule-time");
  const own = layout.findings.filter(({ id, limit }) => !(timed && id === "bleed" && limit === null));
  const findings = [...own, ...governed, ...(report?.findings ?? [])];
  return {
    findings,
    input: {
      layout,
      unit,
      brief,
      families: stock.families,
      currency,
      fuse,
      shot: report,
      shotOpen: shot === null ? "no load is in the brief" : shot.ok ? null : shot.refusals.map(refusalWords).join("; "),
      faults: report?.faults ?? faultsOf({ result: layout, unit, brief }),
      alternatives: others?.ok
        ? {
            layouts: others.value.layouts,
            count: others.value.searched.layouts,
            rank: "cost",
            front: others.value.front,
          }
        : null,
      alternativesOpen:
        others === null ? "they were not asked for" : others.ok ? null : others.refusals.map(refusalWords).join("; "),
      words: {
        asked: askedLines(brief, given),
        findings: findings.map(findingLine),
        cautions: cautionsOf(brief, { layout, unit }),
        notes: [...inputSentences(stock), ...notes, ...(report?.notes ?? [])],
        charger: chargerWords(brief),
        switch: switchWords(brief),
        load: loadWords(brief),
      },
    },
  };
}

function fuseFor(
  path: string | undefined,
  { result: layout, unit, settings, currency }: Checked,
  ports: Ports,
): Read<{ readonly choice: FuseChoice; readonly lost: readonly string[] }> | null {
  if (path === undefined) return null;
  const stock = readFuseStock(path, ports.files, settings.brief, currency);
  if (!stock.ok) return stock;
  return accepted({
    choice: fittedFuse({ layout, unit, brief: settings.brief }, stock.value.fuses),
    lost: stock.value.lost,
  });
}
