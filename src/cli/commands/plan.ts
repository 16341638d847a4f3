// `plan`: brief and catalogues to ranked layouts.

import { nearestWord, type Refusal } from "../../quantity/index.ts";
import { briefJsonSchema, plan, RANKINGS, type Ranking } from "../../search/index.ts";
import { cautionsOf } from "../cautions.ts";
import { EXIT } from "../exit.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { lampFits } from "../lampFits.ts";
import { planText } from "../planText.ts";
import type { Ports } from "../ports.ts";
import { type Flags, settle } from "../settings.ts";
import { readStock } from "../stock.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";

export interface PlanFlags extends Flags {
  readonly catalog?: readonly string[];
  readonly resistors?: string;
  readonly limit?: string;
  readonly rank?: string;
  readonly json?: boolean;
  readonly briefSchema?: boolean;
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
  const planned = plan({ brief: settings.value.brief, parts, families, limit, rank });
  if (!planned.ok) return tell(ports, planned.refusals, flags.json);
  const result = planned.value;
  const best = result.layouts[0];
  const unit = best && parts.find((part) => part.part === best.part);
  const lines = faultLines(stock.value);
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  if (flags.json) {
    const bank = best && unit ? { layout: best, unit } : undefined;
    const cautions = cautionsOf(result.brief, bank);
    const lamps = lampFits(result, parts);
    ports.out(toJson({ ...result, ...lamps, cautions, inputs: inputsJson(settings.value, stock.value) }));
  } else {
    const inputs = inputSentences(stock.value);
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
