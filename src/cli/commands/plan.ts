// `plan`: brief and catalogues to ranked layouts.

import { accepted, nearestWord, type Refusal } from "../../quantity/index.ts";
import { briefJsonSchema, plan, RANKINGS, type Ranking } from "../../search/index.ts";
import { cautionsOf } from "../cautions.ts";
import { EXIT } from "../exit.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { lampFits } from "../lampFits.ts";
import { measuredJson, planMeasured, savedText } from "../measuredPlan.ts";
import { planText } from "../planText.ts";
import type { Ports } from "../ports.ts";
import { type Flags, settle } from "../settings.ts";
import { readStock } from "../stock.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { refusalWords } from "../words.ts";

export interface PlanFlags extends Flags {
  readonly catalog?: readonly string[];
  readonly resistors?: string;
  readonly limit?: string;
  readonly rank?: string;
  readonly json?: boolean;
  readonly briefSchema?: boolean;
  readonly measured?: string;
  readonly uncertainty?: string;
  readonly part?: string;
}

export function planCommand(brief: string | undefined, flags: PlanFlags, ports: Ports): number {
  if (flags.briefSchema) {
    ports.out(toJson(briefJsonSchema()));
    return EXIT.done;
  }
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
  if (!settings.ok || !stock.ok || typeof limit !== "number" || typeof rank !== "string")
    return tell(ports, faults, flags.json);
  const { parts, families } = stock.value;
  const lot =
    settings.value.brief.basis === "measured" || flags.measured !== undefined
      ? planMeasured(flags, { settings: settings.value, stock: stock.value, limit, rank }, ports)
      : null;
  if (lot !== null && !lot.ok) return tell(ports, lot.refusals, flags.json);
  const planned =
    lot === null ? plan({ brief: settings.value.brief, parts, families, limit, rank }) : accepted(lot.value.result);
  if (!planned.ok) return tell(ports, planned.refusals, flags.json);
  const result = planned.value;
  const best = result.layouts[0];
  const unit = best && parts.find((part) => part.part === best.part);
  const lines = [...faultLines(stock.value), ...(lot === null ? [] : lot.value.faults.map(refusalWords))];
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  if (flags.json) {
    const bank = best && unit ? { layout: best, unit } : undefined;
    const cautions = cautionsOf(result.brief, bank);
    const lamps = lampFits(result, parts);
    const measured = lot === null ? {} : { measured: measuredJson(lot.value) };
    ports.out(toJson({ ...result, ...measured, ...lamps, cautions, inputs: inputsJson(settings.value, stock.value) }));
  } else {
    const saved = lot === null ? [] : [savedText(lot.value)];
    const inputs = [...inputSentences(stock.value), ...saved];
    ports.out(planText({ result, parts, given: settings.value.given, rank, width: ports.columns, inputs }));
  }
  return result.layouts.length > 0 ? EXIT.done : EXIT.unsafe;
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
