/*
 * Where a unit sits on the bus: how the current of a shot divides among branches that hang on it one after the other.
 *
 *   symbol  name       unit    meaning
 *   m       branches   1       units of a stage (n = 1), else columns of n units: n ESR, n ESL, C/n each
 *   s_k     share      1       peak of branch k over the peak of their sum
 *   A_k     action     1       integral of i_k^2 over that of the sum's square
 *   taper   taper      ohm H   segments as the loop sees them under an even division: sum of (branches beyond/m)^2 of one
 *
 * Feed at one end, or at the centre (with an even count halfway between the two middle branches). At the start current divides
 * as inductance bids, late as capacitance does; the ladder is solved for the whole shot and not for either. Cross-ties carry
 * nothing while columns are alike in all their stages, and the worst column is taken so: high from end to end, the rest low.
 * Branches without mutual inductance. Source: [methods-derived], held against a circuit simulator.
 */

import { type BusPath, type BusPlace, NO_PATH, type PlaceShares, pathTimes } from "./busPath.ts";
import type { Ladder, LadderPlace } from "./ladder.ts";
import { type LadderDrive, type LadderFigures, ladderCourse } from "./ladderCourse.ts";

/** What of a bank its branches are made of. ESR and ESL must be known. */
export interface Branches {
  readonly unit: { readonly capacitance: number; readonly toleranceLow: number; readonly toleranceHigh: number };
  readonly esr: number;
  readonly esl: number;
  readonly series: number;
  readonly parallel: number;
}

/** Branches by position, put on arms that leave the feed; `order` tells the position of each in the ladder's own order. */
function laid(branches: readonly Omit<LadderPlace, "segment">[], { feed, segment }: BusPlace) {
  const count = branches.length;
  const arm = (positions: readonly number[], first: BusPath): readonly LadderPlace[] =>
    positions.map((position, k) => ({
      ...(branches[position] as LadderPlace),
      segment: k === 0 ? first : segment,
    }));
  const along = (from: number, to: number): readonly number[] => Array.from({ length: to - from }, (_, k) => from + k);
  const middle = Math.floor(count / 2);
  const arms: readonly { readonly positions: readonly number[]; readonly first: BusPath }[] =
    feed === "end"
      ? [{ positions: along(0, count), first: NO_PATH }]
      : count % 2 === 0
        ? [
            { positions: [...along(0, middle)].reverse(), first: pathTimes(segment, 0.5) },
            { positions: along(middle, count), first: pathTimes(segment, 0.5) },
          ]
        : [
            { positions: [middle], first: NO_PATH },
            { positions: [...along(0, middle)].reverse(), first: segment },
            { positions: along(middle + 1, count), first: segment },
          ];
  const used = arms.filter(({ positions }) => positions.length > 0);
  return {
    ladder: used.map(({ positions, first }) => arm(positions, first)) as Ladder,
    order: used.flatMap(({ positions }) => positions),
  };
}

/** One branch with its capacitance times `factor`. */
const branchOf = ({ unit, esr, esl, series }: Branches, factor: number): Omit<LadderPlace, "segment"> => ({
  capacitance: (unit.capacitance * factor) / series,
  resistance: esr * series,
  inductance: esl * series,
});

/** The segments as one loop sees them while all branches carry alike [ohm, H]. Source: [methods-derived] file head. */
export function taperOf(parallel: number, place: BusPlace): BusPath {
  const { ladder } = laid(
    Array.from({ length: parallel }, () => ({ capacitance: 1, resistance: 0, inductance: 0 })),
    place,
  );
  let [resistance, inductance] = [0, 0];
  for (const arm of ladder) {
    arm.forEach(({ segment }, k) => {
      const part = ((arm.length - k) / parallel) ** 2;
      resistance += part * segment.resistance;
      inductance += part * segment.inductance;
    });
  }
  return { resistance, inductance };
}

/** What is followed: charge voltage [V], what drives it, for how long [s], and whether it ends at the first current zero. */
export interface PlaceCourse {
  readonly voltage: number;
  readonly drive: LadderDrive;
  readonly seconds: number;
  readonly toZero: boolean;
}

/** A bank of at most so many branches is tried with the odd one at every place. */
const EVERY_PLACE = 4;

/** Which branches may be reversed most: all low, all high, and an odd one of either kind at the ends of the bus and at those that lead. */
function reversalCorners(of: {
  readonly parallel: number;
  readonly low: number;
  readonly high: number;
  readonly leads: readonly number[];
}): readonly { readonly at: number; readonly one: number; readonly rest: number }[] {
  const { parallel, low, high, leads } = of;
  const places =
    parallel <= EVERY_PLACE ? Array.from({ length: parallel }, (_, k) => k) : [...new Set([0, parallel - 1, ...leads])];
  return [
    { at: 0, one: low, rest: low },
    { at: 0, one: high, rest: high },
    ...places.flatMap((at) => [
      { at, one: low, rest: high },
      { at, one: high, rest: low },
    ]),
  ];
}

/** The division of one shot. Source: [methods-derived] file head. */
export function placeShares(branches: Branches, place: BusPlace, course: PlaceCourse): PlaceShares {
  const { parallel, unit } = branches;
  const run = (factors: readonly number[], on: BusPlace): LadderFigures & { readonly order: readonly number[] } => {
    const { ladder, order } = laid(
      factors.map((factor) => branchOf(branches, factor)),
      on,
    );
    return { ...ladderCourse({ ladder, ...course }), order };
  };
  const even = Array.from({ length: parallel }, () => 1);
  const byPosition = ({ peaks, totalPeak, order }: ReturnType<typeof run>): readonly number[] => {
    const shares = new Array<number>(parallel).fill(0);
    order.forEach((position, k) => {
      shares[position] = (peaks[k] as number) / totalPeak;
    });
    return shares;
  };
  const nominal = run(even, place);
  const alike = byPosition(nominal);
  const most = (values: readonly number[]): number => values.indexOf(Math.max(...values));
  const [low, high] = [1 - unit.toleranceLow, 1 + unit.toleranceHigh];
  // more capacitance draws more at every place, so the place that leads when all are alike is tried, and the nearest one
  const candidates = new Set([most(alike), nominal.order[0] as number, nominal.order[most(nominal.actions)] as number]);
  let worst = { position: 0, share: 0, action: 0 };
  let lowest = { position: 0, voltage: course.voltage };
  const lower = ({ lowest: found, order }: ReturnType<typeof run>): void => {
    order.forEach((position, k) => {
      const voltage = found[k] as number;
      if (voltage < lowest.voltage) lowest = { position, voltage };
    });
  };
  lower(nominal);
  for (const position of candidates) {
    const found = run(
      even.map((_, k) => (k === position ? high : low)),
      place,
    );
    if (course.drive.kind === "load") lower(found);
    const at = found.order.indexOf(position);
    const share = (found.peaks[at] as number) / found.totalPeak;
    const action = (found.actions[at] as number) / found.totalAction;
    worst = {
      position: share > worst.share ? position : worst.position,
      share: Math.max(share, worst.share),
      action: Math.max(action, worst.action),
    };
  }
  // A given current is that of the nominal bank: another capacitance under it would be emptied by a charge that is not its own.
  if (course.drive.kind === "load" && low < high)
    for (const { at, one, rest } of reversalCorners({ parallel, low, high, leads: [...candidates, lowest.position] }))
      lower(
        run(
          even.map((_, k) => (k === at ? one : rest)),
          place,
        ),
      );
  const other = run(even, { ...place, feed: place.feed === "end" ? "centre" : "end" });
  return {
    ...place,
    alike,
    position: worst.position + 1,
    share: worst.share,
    action: worst.action,
    byPlace: (alike[worst.position] as number) * parallel,
    byCapacitance: (high / (high + (parallel - 1) * low)) * parallel,
    otherFeed: Math.max(...byPosition(other)),
    lowest: lowest.voltage / course.voltage,
    lowestPosition: lowest.position + 1,
    seconds: nominal.seconds,
  };
}
