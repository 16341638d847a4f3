// `plan`: brief and catalogues to ranked layouts.

import { visible } from "../../order/index.ts";
import { accepted, nearestWord, type Read, type Refusal, refused } from "../../quantity/index.ts";
import { briefJsonSchema, type PlanResult, plan, RANKINGS, type Ranking } from "../../search/index.ts";
import { cautionsOf } from "../cautions.ts";
import { EXIT } from "../exit.ts";
import { readFuseStock } from "../fuses.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { lampFits } from "../lampFits.ts";
import { LAYOUT_VERSION } from "../layoutInput.ts";
import { type LotPlanned, lotSentence, planLot } from "../lotPlan.ts";
import { type MeasuredPlanned, measuredJson, planMeasured, savedText } from "../measuredPlan.ts";
import { planText } from "../planText.ts";
import type { Ports } from "../ports.ts";
import { type Flags, type Settings, settle } from "../settings.ts";
import { readStock, type Stock } from "../stock.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { refusalWords } from "../words.ts";

export interface PlanFlags extends Flags {
  readonly catalog?: readonly string[];
  readonly resistors?: string;
  readonly fuses?: string;
  readonly limit?: string;
  readonly rank?: string;
  readonly json?: boolean;
  readonly briefSchema?: boolean;
  readonly measured?: string;
  readonly uncertainty?: string;
  readonly part?: string;
}

/** A plan and what it was made from. */
export interface Planned {
  readonly settings: Settings;
  readonly stock: Stock;
  readonly rank: Ranking;
  readonly result: PlanResult;
  /** With the measured basis: the lot, and what its units do. */
  readonly lot: MeasuredPlanned | null;
  /** With the statistical basis and a measured file: the lot that the units are drawn from. */
  readonly drawn: LotPlanned | null;
}

export function planCommand(brief: string | undefined, flags: PlanFlags, ports: Ports): number {
  if (flags.briefSchema) {
    ports.out(toJson(briefJsonSchema()));
    return EXIT.done;
  }
  const planned = planFrom(brief, flags, ports);
  if (!planned.ok) return tell(ports, planned.refusals, flags.json);
  const { result, stock } = planned.value;
  tellFaults(stock, ports);
  ports.out(flags.json ? toJson(planJson(planned.value)) : planWords(planned.value, ports.columns));
  return result.layouts.length > 0 ? EXIT.done : EXIT.unsafe;
}

/** Reads what was given and plans. */
export function planFrom(brief: string | undefined, flags: PlanFlags, ports: Ports): Read<Planned> {
  const settings = settle(brief, flags, ports.files);
  const stock = readStock(flags, ports.files);
  const limit = readLimit(flags.limit);
  const rank = readRank(flags.rank);
  const faults: Refusal[] = [
    ...(settings.ok ? [] : settings.refusals),
    ...(stock.ok ? [] : stock.refusals),
    ...(typeof limit === "number" ? [] : [limit]),
    ...(typeof rank === "string" ? [] : [rank]),
  ];
  if (!settings.ok || !stock.ok || typeof limit !== "number" || typeof rank !== "string") return refused(...faults);
  const { parts, families } = stock.value;
  const given = { settings: settings.value, stock: stock.value, rank };
  const { basis } = settings.value.brief;
  if (flags.measured !== undefined && (flags.fuses !== undefined || settings.value.brief.fused === true)) {
    const want = "fuses counted by the order or the pulse of the bank chosen; a plan on a measured lot leaves them out";
    return refused({ code: "contradiction", place: { field: "--fuses" }, read: "beside --measured", want });
  }
  if (basis === "statistical" && flags.measured !== undefined) {
    const lot = planLot(flags, { ...given, limit }, ports);
    if (!lot.ok) return lot;
    if (lot.value.faults.length > 0) ports.err(`${lot.value.faults.map(refusalWords).join("\n")}\n`);
    return accepted({ ...given, result: lot.value.result, lot: null, drawn: lot.value });
  }
  if (basis !== "measured" && flags.measured !== undefined) {
    const want =
      "--basis measured beside it, where the units themselves decide, or --basis statistical, drawn from them";
    return refused({ code: "contradiction", place: { field: "--measured" }, read: `basis ${basis}`, want });
  }
  if (basis === "measured") {
    const lot = planMeasured(flags, { ...given, limit }, ports);
    if (!lot.ok) return lot;
    if (lot.value.faults.length > 0) ports.err(`${lot.value.faults.map(refusalWords).join("\n")}\n`);
    return accepted({ ...given, result: lot.value.result, lot: lot.value, drawn: null });
  }
  const fuses = flags.fuses === undefined ? null : readFuseStock(flags.fuses, ports.files, settings.value.brief, null);
  if (fuses !== null && !fuses.ok) return fuses;
  if (fuses !== null && fuses.value.lost.length > 0) ports.err(`${fuses.value.lost.join("\n")}\n`);
  // a fuse catalogue that is named is meant to be used
  const asked = fuses === null ? settings.value.brief : { ...settings.value.brief, fused: true };
  const planned = plan({ brief: asked, parts, families, fuses: fuses?.value.fuses ?? null, limit, rank });
  if (!planned.ok) return planned;
  return accepted({
    ...given,
    settings: { ...settings.value, brief: asked },
    result: planned.value,
    lot: null,
    drawn: null,
  });
}

/** Rows that were lost, on the error stream. */
export function tellFaults(stock: Stock, ports: Ports): void {
  const lines = faultLines(stock);
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
}

export function planJson({ settings, stock, result, lot, drawn }: Planned): object {
  const best = result.layouts[0];
  const unit = best && stock.parts.find((part) => part.part === best.part);
  const cautions = cautionsOf(result.brief, best && unit ? { layout: best, unit } : undefined);
  const measured =
    lot !== null
      ? { measured: measuredJson(lot) }
      : drawn !== null
        ? { measured: { part: drawn.part, units: drawn.units, findings: drawn.findings } }
        : {};
  const layouts = result.layouts.map((layout) => ({ version: LAYOUT_VERSION, ...layout }));
  return {
    ...result,
    layouts,
    ...measured,
    ...lampFits(result, stock.parts),
    cautions,
    inputs: inputsJson(settings, stock),
  };
}

export function planWords({ settings, stock, rank, result, lot, drawn }: Planned, width: number): string {
  const { given } = settings;
  const inputs = [
    ...inputSentences(stock),
    ...[...(lot?.findings ?? []), ...(drawn?.findings ?? [])].map(
      ({ verdict, note }) => `${verdict}: ${visible(note)}`,
    ),
    ...(lot === null ? [] : [savedText(lot)]),
    ...(drawn === null ? [] : [lotSentence(drawn)]),
  ];
  const placedEnergy = new Map(lot?.placed.map(({ id, energy }) => [id, energy]) ?? []);
  return planText({
    result,
    parts: stock.parts,
    given,
    rank,
    width,
    inputs,
    lot: drawn?.units ?? null,
    placedEnergy,
  });
}

function readLimit(text = "20"): number | Refusal {
  if (/^\d{1,7}$/.test(text)) return Number(text);
  const want = "a whole number; 0 for all";
  return { code: "bad-count", place: { field: "--limit" }, read: JSON.stringify(text), want };
}

function readRank(text = "cost"): Ranking | Refusal {
  const found = RANKINGS.find((one) => one === text);
  if (found !== undefined) return found;
  const near = nearestWord(text, RANKINGS);
  const want = near === null ? RANKINGS.join(", ") : `perhaps ${JSON.stringify(near)}; one of ${RANKINGS.join(", ")}`;
  return { code: "bad-choice", place: { field: "--rank" }, read: JSON.stringify(text), want };
}
