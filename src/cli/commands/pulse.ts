// `pulse`: one arrangement fired into its load, once and again.

import { visible } from "../../order/index.ts";
import { accepted, type Finding, type Read, type Refusal, refused } from "../../quantity/index.ts";
import { type FuseChoice, fittedFuse, inductanceSweep, type ShotReport, shotOf } from "../../search/index.ts";
import { askedText } from "../askedText.ts";
import { cautionsOf } from "../cautions.ts";
import { type BankFlags, type Checked, checkedBank } from "../checked.ts";
import { EXIT } from "../exit.ts";
import { faultsText } from "../faultsText.ts";
import { readFuseStock } from "../fuses.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { findingsText } from "../layoutText.ts";
import type { Ports } from "../ports.ts";
import type { Nest } from "../settings.ts";
import { shotJson } from "../shotJson.ts";
import { fuseText, rateBlocks } from "../shotRateText.ts";
import { shotBlocks } from "../shotText.ts";
import { sweepText } from "../sweepText.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { waveformCsv } from "../waveform.ts";
import { bullet, wrap } from "../wrap.ts";

export type PulseFlags = BankFlags & {
  readonly fuses?: string;
  readonly waveform?: string;
  readonly force?: boolean;
};

/** Stands for an energy that nobody asked; no check of this command looks at it. */
const NO_ENERGY = 1e-9;

/** A shot needs no energy and no allowed fall to be asked, but a lamp's circuit is sized by its energy. */
function fill(input: Nest): Nest {
  const load = input.load as Nest | undefined;
  const sized = typeof load === "object" && load !== null && load.width !== undefined;
  return sized ? input : { energy: NO_ENERGY, ripple: 1, ...input };
}

interface Fired extends Checked {
  readonly report: ShotReport;
  readonly fuse: FuseChoice | null;
  readonly lost: readonly string[];
}

/** Faults of the load by the flags that would mend them. */
function asAsked(fault: Refusal): Refusal {
  const { field } = fault.place;
  if (field === "seconds") return { ...fault, place: { ...fault.place, field: "--load-time" } };
  if (field !== "load" || fault.code !== "missing-value") return fault;
  const want =
    "a load in the brief, or one of --load-resistance, --load-inductance, --load-current with --load-time, --load-recorded, --lamp-bore";
  return { ...fault, place: { ...fault.place, field: "--load-resistance" }, want };
}

function fire(brief: string | undefined, flags: PulseFlags, ports: Ports): Read<Fired> {
  const checked = checkedBank(brief, flags, ports, fill);
  if (!checked.ok) return checked;
  const { result: layout, unit, settings, currency } = checked.value;
  const stock = flags.fuses === undefined ? null : readFuseStock(flags.fuses, ports.files, settings.brief, currency);
  if (stock !== null && !stock.ok) return stock;
  const input = { layout, unit, brief: settings.brief };
  const fuse = stock === null ? null : fittedFuse(input, stock.value.fuses);
  const row = fuse?.chosen?.row;
  const rated =
    row === undefined
      ? null
      : { meltingAction: row.melting ?? null, clearingAction: row.clearing ?? null, dcVoltage: row.voltage ?? null };
  const report = shotOf({ ...input, fuse: rated });
  if (!report.ok) return refused(...report.refusals.map(asAsked));
  return accepted({ ...checked.value, report: report.value, fuse, lost: stock?.value.lost ?? [] });
}

const failed = (findings: readonly Finding[]): number => findings.filter(({ verdict }) => verdict === "fail").length;

export function pulseCommand(brief: string | undefined, flags: PulseFlags, ports: Ports): number {
  const fired = fire(brief, flags, ports);
  if (!fired.ok) return tell(ports, fired.refusals, flags.json);
  const { report, stock, lost } = fired.value;
  const lines = [...faultLines(stock), ...lost];
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  if (flags.waveform !== undefined && flags.waveform !== "-") {
    const written = ports.files.write(flags.waveform, waveformCsv(report), flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(flags.waveform)}: waveform written\n`);
  }
  if (flags.waveform === "-") ports.out(waveformCsv(report));
  else ports.out(flags.json ? pulseJson(fired.value) : pulseText(fired.value, ports.columns));
  return failed(report.findings) > 0 ? EXIT.unsafe : EXIT.done;
}

/** Said when the layout fails at rest, which this command does not look into. */
function restNotes({ result, settings }: Fired): readonly string[] {
  const fails = result.findings.filter(({ id, verdict }) => verdict === "fail" && id !== "pulse-energy").length;
  const asked = settings.given.has("energy") || settings.brief.energy !== NO_ENERGY;
  return [
    ...(fails > 0
      ? [`This bank FAILS ${fails} ${fails === 1 ? "check" : "checks"} at rest: see them with the check command.`]
      : []),
    ...(asked ? [] : ["No energy was asked, so none is checked."]),
  ];
}

/** Points of the sweep over the loop's inductance. */
const SWEPT = 21;

const sweepOf = ({ result: layout, unit, settings: { brief } }: Fired) =>
  inductanceSweep({ layout, unit, brief }, SWEPT);

function pulseJson(fired: Fired): string {
  const { result, unit, settings, stock, report, fuse } = fired;
  const { brief } = settings;
  return toJson({
    ...shotJson(result, report, sweepOf(fired)),
    fuse,
    notes: [...report.notes, ...restNotes(fired), ...fired.notes],
    brief: brief.energy === NO_ENERGY ? { ...brief, energy: null } : brief,
    cautions: cautionsOf(brief, { layout: result, unit }),
    inputs: inputsJson(settings, stock),
  });
}

function verdictWords(findings: readonly Finding[]): string {
  const fails = failed(findings);
  const open = findings.filter(({ verdict }) => verdict === "not assessed").length;
  if (fails > 0) return `${fails} CHECKS FAILED.`;
  return open > 0 ? `No check failed; ${open} could not be assessed.` : "No check failed.";
}

function pulseText(fired: Fired, width: number): string {
  const { result, unit, settings, stock, report, fuse } = fired;
  const { brief, given } = settings;
  const asked = new Set([...given, ...(brief.energy === NO_ENERGY ? ["energy"] : [])]);
  const askedLines = askedText(brief, asked, width)
    .split("\n")
    .filter((line) => brief.energy !== NO_ENERGY || !line.includes("energy of one pulse"));
  const blocks = [
    `${visible(result.id)}\n\nAsked\n${askedLines.join("\n")}`,
    ...shotBlocks(report, width),
    `Checks of the shot\n${findingsText(report.findings, width)}`,
    sweepText(sweepOf(fired), width),
    ...rateBlocks(report, width),
    `If one thing fails\n${faultsText(report.faults, width)}`,
    fuseText(fuse, width),
    verdictWords(report.findings),
    ...[...report.notes, ...restNotes(fired), ...inputSentences(stock), ...fired.notes].map((text) =>
      wrap(`Note: ${visible(text)}`, width),
    ),
    ["Cautions", ...cautionsOf(brief, { layout: result, unit }).map(({ text }) => bullet(text, width))].join("\n"),
  ];
  return `${blocks.filter((block) => block !== "").join("\n\n")}\n`;
}
