// How fast the blend search is beside HiGHS in wasm: same process, same instances, both proving, seeds of the caller's choice.
import { performance } from "node:perf_hooks";
import { allPairs, optionForm, runForm } from "../../src/search/blend/blendPrograms.ts";
import { settleBlend } from "../../src/search/blend/fallback.ts";
import { findBlend } from "../../src/search/blend/findBlend.ts";
import { solveWithHighs } from "../../src/search/highs.ts";
import { type Instance, inventInstance, optionOf, type Recipe } from "../support/blendInstances.ts";
import { tierProgram } from "../support/blendTiers.ts";
import { atLeast, atMost, type BenchRow, type Promised } from "./row.ts";

export interface BlendBenchSize {
  /** First seed; a release takes fresh ones. */
  readonly seed: number;
  readonly thousands: number;
  readonly hundreds: number;
  readonly hard: number;
}

const QUICK: BlendBenchSize = { seed: 20_000, thousands: 4, hundreds: 8, hard: 8 };

async function timed<T>(run: () => T | Promise<T>): Promise<{ readonly ms: number; readonly answer: T }> {
  const start = performance.now();
  const answer = await run();
  return { ms: performance.now() - start, answer };
}

const quantile = (values: readonly number[], p: number): number => {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(p * sorted.length))] ?? Number.NaN;
};

/** Cost tables made afresh from the price lists, then the search: what a caller waits for. */
const fromPrices = (instance: Instance) => {
  const options = instance.parts.map((part, at) => optionOf(part, instance.model.options[at]!.maxStrings, at));
  return findBlend({ ...instance.model, options });
};

interface Race {
  /** Fastest way of writing the programme for HiGHS, own search alone, and own search with its tables. */
  readonly highs: number;
  readonly own: number;
  readonly withTables: number;
  readonly agree: boolean;
}

/** Own: least of three warm calls. HiGHS: one call for each way of writing, least of those. */
async function race(instance: Instance): Promise<Race> {
  const { model } = instance;
  const own = [];
  const withTables = [];
  const { answer } = await timed(() => findBlend(model));
  for (let at = 0; at < 3; at += 1) {
    own.push((await timed(() => findBlend(model))).ms);
    withTables.push((await timed(() => fromPrices(instance))).ms);
  }
  const forms = [tierProgram(instance, false), tierProgram(instance, true)];
  if (model.options.length <= 100) forms.push(runForm(model).program, optionForm(model, allPairs(model)).program);
  const times: number[] = [];
  let agree = true;
  for (const program of forms) {
    const run = await timed(() => solveWithHighs(program, { seconds: 120 }));
    times.push(run.ms);
    const cost = run.answer.status === "optimal" ? Math.round(run.answer.cost) : null;
    agree &&= run.answer.status === answer.status && cost === (answer.best?.cost ?? null);
  }
  return { highs: Math.min(...times), own: Math.min(...own), withTables: Math.min(...withTables), agree };
}

async function regime(
  name: string,
  recipes: readonly Recipe[],
  promise: readonly [Promised, Promised],
): Promise<BenchRow[]> {
  const races: Race[] = [];
  for (const recipe of recipes) races.push(await race(inventInstance(recipe)));
  const ratios = races.map(({ highs, own }) => highs / own);
  const full = races.map(({ highs, withTables }) => highs / withTables);
  return [
    {
      what: `blend, ${name}: own search, median`,
      unit: "ms",
      value: quantile(
        races.map(({ own }) => own),
        0.5,
      ),
      promise: null,
    },
    { what: `blend, ${name}: times faster than HiGHS, median`, value: quantile(ratios, 0.5), promise: promise[0] },
    { what: `blend, ${name}: times faster than HiGHS, worst`, value: quantile(ratios, 0), promise: promise[1] },
    { what: `blend, ${name}: the same with tables made afresh, median`, value: quantile(full, 0.5), promise: null },
    { what: `blend, ${name}: the same with tables made afresh, worst`, value: quantile(full, 0), promise: null },
    {
      what: `blend, ${name}: answers that differ from HiGHS`,
      value: races.filter(({ agree }) => !agree).length,
      promise: atMost(0),
    },
  ];
}

const seeds = (first: number, count: number): number[] => Array.from({ length: count }, (_, at) => first + at);

/** Scarce stock, large banks, many types: own search with its fallback, against HiGHS alone on the tier programme. */
async function hardRegime(size: BlendBenchSize): Promise<BenchRow[]> {
  const kinds = [
    { parts: 20, maxTypes: 4, ceiling: 1.2 },
    { parts: 20, maxTypes: 8, ceiling: 1.2 },
    { parts: 20, maxTypes: 20, ceiling: 1.2 },
    { parts: 100, maxTypes: 4, ceiling: 1.2 },
    { parts: 100, maxTypes: 6, ceiling: 1.2 },
    { parts: 100, maxTypes: 8, ceiling: 1.2 },
    { parts: 100, maxTypes: 6, ceiling: 0.95 },
    { parts: 100, maxTypes: 6, ceiling: 0.8 },
  ];
  const ratios: number[] = [];
  let unproven = 0;
  let differ = 0;
  for (const seed of seeds(size.seed, size.hard)) {
    const instance = inventInstance({
      ...kinds[seed % kinds.length]!,
      seed,
      energy: [20, 200],
      stock: 0.3,
      mostStrings: 400,
    });
    const own = await timed(() => settleBlend(instance.model, { seconds: 60 }));
    const natural = await timed(() => solveWithHighs(tierProgram(instance, false), { seconds: 60 }));
    const tight = await timed(() => solveWithHighs(tierProgram(instance, true), { seconds: 60 }));
    ratios.push(Math.min(natural.ms, tight.ms) / own.ms);
    if (own.answer.provenBy === null) unproven += 1;
    const cost = tight.answer.status === "optimal" ? Math.round(tight.answer.cost) : null;
    if (tight.answer.status !== "unknown" && cost !== (own.answer.best?.cost ?? null)) differ += 1;
  }
  return [
    { what: "blend, hard: times faster than HiGHS, median", value: quantile(ratios, 0.5), promise: atLeast(20) },
    {
      what: "blend, hard: times faster than HiGHS, worst (first calls)",
      value: quantile(ratios, 0),
      promise: atLeast(0.5),
    },
    {
      what: "blend, hard: slower than HiGHS, share",
      value: ratios.filter((r) => r < 1).length / ratios.length,
      promise: null,
    },
    { what: "blend, hard: unproven", value: unproven, promise: atMost(0) },
    { what: "blend, hard: answers that differ from HiGHS", value: differ, promise: atMost(0) },
  ];
}

/** All rows. The first call of each engine is a warm-up and not counted. */
export async function benchBlend(size: BlendBenchSize = QUICK): Promise<readonly BenchRow[]> {
  const warm = inventInstance({ parts: 100, seed: size.seed - 1 });
  for (let at = 0; at < 20; at += 1) findBlend(warm.model);
  await race(warm);
  return [
    ...(await regime(
      "100 parts",
      seeds(size.seed, size.hundreds).map((seed) => ({ parts: 100, seed })),
      [atLeast(150), atLeast(15)],
    )),
    ...(await regime(
      "1,000 parts",
      seeds(size.seed, size.thousands).map((seed) => ({ parts: 1000, seed })),
      [atLeast(500), atLeast(50)],
    )),
    ...(await hardRegime(size)),
    ...(await large(size.seed)),
  ];
}

/** 100,000 parts with lazy tables: a floor of the least unit price, the table when asked for. */
async function large(first: number): Promise<BenchRow[]> {
  const { hugeModel } = await import("../support/blendHuge.ts");
  const times: number[] = [];
  let worstGap = 0;
  let unbounded = 0;
  for (const seed of seeds(first, 5)) {
    const model = hugeModel(100_000, seed);
    const run = await timed(() => findBlend(model, { work: 5e6 }));
    times.push(run.ms);
    if (run.answer.gap === null) unbounded += 1;
    else worstGap = Math.max(worstGap, run.answer.gap);
  }
  return [
    {
      what: "blend, 100,000 parts: first calls, median (promised on a quiet core)",
      unit: "ms",
      value: quantile(times, 0.5),
      promise: atMost(300),
    },
    { what: "blend, 100,000 parts: first calls, worst", unit: "ms", value: quantile(times, 1), promise: null },
    { what: "blend, 100,000 parts: answers without a bound", value: unbounded, promise: atMost(0) },
    { what: "blend, 100,000 parts: largest gap left", value: worstGap, promise: null },
  ];
}
