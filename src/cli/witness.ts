// The counted witness beside the statistical risk: what was asked of it, its counting with progress, and what it says.

import { availableParallelism } from "node:os";
import { countedRisk } from "../bank/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { tailCaseOf } from "../search/index.ts";
import type { Checked } from "./checked.ts";
import { countBanks } from "./jobs.ts";
import type { Ports } from "./ports.ts";

export interface WitnessFlags {
  readonly witness?: string;
  readonly seed?: string;
  readonly workers?: string;
}

export interface WitnessAsk {
  readonly banks: number;
  readonly seed: number;
  readonly workers: number;
}

export interface Witness {
  readonly banks: number;
  readonly seed: number;
  /** Banks in which some unit was over its limit. */
  readonly counted: number;
  readonly exceed: number;
  /** Standard error; with none counted, 3/banks. */
  readonly error: number;
  /** Within four standard errors and the stated error of the reckoned chance. */
  readonly agrees: boolean;
}

/** Fewer say nothing, more take hours. */
const LEAST = 1000;
const MOST = 1e11;

/** Plain digits or a power of ten such as 1e6; NaN for anything else. */
const whole = (text: string): number => (/^\d{1,16}(e\d{1,2})?$/i.test(text.trim()) ? Number(text) : Number.NaN);

/** Null when no witness is asked for. */
export function readWitness({ witness, seed, workers }: WitnessFlags): Read<WitnessAsk | null> {
  const faults: Refusal[] = [];
  const read = (field: string, text: string, least: number, most: number): number => {
    const value = whole(text);
    if (Number.isInteger(value) && value >= least && value <= most) return value;
    const want = `a whole number from ${least} to ${most}`;
    faults.push({ code: "bad-count", place: { field }, read: JSON.stringify(text), want });
    return least;
  };
  if (witness === undefined) {
    const alone = seed !== undefined ? "--seed" : workers !== undefined ? "--workers" : null;
    if (alone === null) return accepted(null);
    const want = "--witness with the number of banks to draw beside it";
    return refused({ code: "missing-option", place: { field: alone }, read: seed ?? workers ?? "", want });
  }
  const ask = {
    banks: read("--witness", witness, LEAST, MOST),
    seed: read("--seed", seed ?? "1", 0, Number.MAX_SAFE_INTEGER),
    workers: read("--workers", workers ?? String(availableParallelism()), 1, 256),
  };
  return faults.length > 0 ? refused(...faults) : accepted(ask);
}

/** Why there is nothing to draw; null when there is. */
export function unwitnessed({ result, unit, settings, lot }: Checked): string | null {
  if (settings.brief.basis !== "statistical") return 'a witness is drawn for the basis "statistical" only';
  if (result.series === 1) return "one in series divides nothing";
  return unit.tolerance === undefined && lot === undefined ? "the tolerance is unknown" : null;
}

/** Draws and counts; null when it was interrupted. Call when `unwitnessed` is null. */
export async function witnessOf(checked: Checked, ask: WitnessAsk, ports: Ports): Promise<Witness | null> {
  const { result, unit, settings, lot } = checked;
  const { brief } = settings;
  const { series, parallel, ties, share, risk } = result;
  const limit = share.limit / (brief.voltage * (1 + brief.overshoot));
  const tolerance = unit.tolerance ?? { low: 0, high: 0 };
  const given = tailCaseOf({ tolerance, series, parallel, ties, share: limit, ...(lot ? { lot } : {}) }, brief);
  const { entry = null, terminal = false, onInterrupt } = ports.background ?? {};
  const abort = new AbortController();
  const forget = onInterrupt?.(() => abort.abort());
  let told = -1;
  const onProgress = (banks: number): void => {
    const percent = Math.floor((100 * banks) / ask.banks);
    if (!terminal || percent === told) return;
    told = percent;
    ports.err(`\r${percent} % of ${ask.banks} banks drawn (Ctrl-C stops)`);
  };
  const counts = await countBanks({ given, ...ask, entry, onProgress, signal: abort.signal });
  forget?.();
  if (terminal && told >= 0) ports.err(`\r${" ".repeat(60)}\r`);
  if (counts === null) return null;
  const { exceed, error } = countedRisk(counts);
  const off = Math.abs((risk?.exceed ?? 0) - exceed);
  const agrees = off <= 4 * error + (risk?.error ?? 0);
  return { banks: counts.banks, seed: ask.seed, counted: counts.exceed, exceed, error, agrees };
}
