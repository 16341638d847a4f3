// What a blend costs against its room, its mass, its units, its worst stress, and against the energy asked of it.

import { requiredCapacitance } from "../bank/index.ts";
import { toMajor } from "../quantity/index.ts";
import { blendTotals } from "./blend/evaluate.ts";
import { type BlendLimits, findBlend } from "./blend/findBlend.ts";
import { costLadder } from "./blend/ladder.ts";
import type { FoundBlend } from "./blend/singles.ts";
import { sweepFront } from "./blend/sweep.ts";
import { type BlendDemand, type BlendWork, blendWork } from "./blendOptions.ts";
import type { BlendFront, BlendFrontPoint, BlendLadder, FrontName } from "./blendResult.ts";

export interface FrontQuestion {
  readonly demand: BlendDemand;
  readonly currency: string;
  readonly limits: BlendLimits;
  /** Names and measures a blend of a work. */
  readonly made: (
    blend: FoundBlend,
    work: BlendWork,
    demand: BlendDemand,
  ) => { readonly id: string; readonly stress: number | null };
}

const POINTS = 12;
const STEPS = 40;
/** Falls of the derating between two points of the stress front, and the lowest that is tried. */
const STRESS_STEP = 0.05;
const LEAST_STRESS = 0.3;

/** The fronts asked for, each point the cheapest under its ceiling. Parts of unknown size are left out of theirs. */
export const blendFronts = (names: readonly FrontName[], question: FrontQuestion): readonly BlendFront[] =>
  names.map((name) => (name === "stress" ? stressFront(question) : roomFront(name, question)));

function roomFront(name: Exclude<FrontName, "stress">, { demand, currency, limits, made }: FrontQuestion): BlendFront {
  const { brief } = demand.terms;
  // Sizes are in the model only where a ceiling asks for them.
  const open = { volume: { maxVolume: 1e9 }, mass: { maxMass: 1e9 }, units: {} }[name];
  const asked = { ...demand, terms: { ...demand.terms, brief: { ...open, ...brief } } };
  const work = blendWork(asked);
  const points = sweepFront(work.model, name, POINTS, limits).map(
    ({ amount, cost, counts, proven, lowerBound }): BlendFrontPoint => ({
      amount,
      cost: toMajor(cost, currency),
      lowerBound: toMajor(lowerBound, currency),
      id: made({ counts, cost }, work, asked).id,
      proven,
    }),
  );
  return { against: name, points };
}

/** A lower derating is a lower worst stress: more in series, or parts of a higher voltage. */
function stressFront({ demand, currency, limits, made }: FrontQuestion): BlendFront {
  const points: BlendFrontPoint[] = [];
  const { brief } = demand.terms;
  for (let at = 0; ; at += 1) {
    const derating = Math.round((brief.derating - at * STRESS_STEP) * 1e6) / 1e6;
    if (derating < LEAST_STRESS || limits.stop?.()) break;
    const asked = { ...demand, terms: { ...demand.terms, brief: { ...brief, derating } } };
    const work = blendWork(asked);
    const answer = findBlend(work.model, limits);
    if (answer.best === null) continue;
    const { id, stress } = made(answer.best, work, asked);
    if (stress === null) continue;
    points.push({
      amount: stress,
      cost: toMajor(answer.best.cost, currency),
      lowerBound: toMajor(answer.lowerBound, currency),
      id,
      proven: answer.status === "optimal",
    });
  }
  const best = points.filter(
    (one, at) =>
      !points.some(
        (other, place) =>
          other.cost <= one.cost &&
          other.amount <= one.amount &&
          (other.cost < one.cost || other.amount < one.amount || place < at),
      ),
  );
  return { against: "stress", points: best };
}

/** The cost ladder from less energy to more: `spread` 0.5 is from half of what is asked to half more. */
export function blendLadder(spread: number, { demand, currency, limits, made }: FrontQuestion): BlendLadder {
  const { brief } = demand.terms;
  // Tables must reach the far end.
  const far = { ...demand, required: demand.required * (1 + spread) };
  const work = blendWork(far);
  const from = Math.max(demand.required * (1 - spread), demand.required * 0.01);
  const { steps, end } = costLadder(work.model, { from, to: far.required, most: STEPS }, limits);
  const joules = brief.energy / requiredCapacitance({ ...brief, steady: undefined });
  return {
    end,
    steps: steps.map(({ from: low, to, cost, counts, proven }, at) => ({
      from: low,
      to,
      energy: { from: low * joules, to: to * joules },
      cost: toMajor(cost, currency),
      id: made({ counts, cost }, work, far).id,
      units: blendTotals(work.model, counts)!.units,
      proven,
      asked: to * (1 + 1e-9) >= demand.required && !(at > 0 && low * (1 + 1e-9) >= demand.required),
    })),
  };
}
