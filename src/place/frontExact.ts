// The exact front of a small lot: every division looked at, the two gaps of each from tables by group.
import type { Conductances } from "./conductance.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import { divisions } from "./enumerate.ts";
import { stageGap } from "./gap.ts";
import type { Ties } from "./unit.ts";

export interface ExactFrontTask {
  readonly ties: Ties;
  readonly series: number;
  readonly values: Float64Array;
  readonly conductances: Conductances & { readonly known: true };
  readonly groups: number;
  readonly size: number;
}

interface RawPoint {
  readonly charging: number;
  readonly holding: number;
  readonly groups: readonly (readonly number[])[];
}

const bits = (mask: number): number[] => Array.from({ length: 31 }, (_, i) => i).filter((i) => mask & (1 << i));

/** For every mask the sum of `weights` over its units. */
function sumTable(weights: Float64Array): Float64Array {
  const table = new Float64Array(1 << weights.length);
  for (let mask = 1; mask < table.length; mask++) {
    const low = mask & -mask;
    table[mask] = table[mask ^ low]! + weights[31 - Math.clz32(low)]!;
  }
  return table;
}

/** For every mask sum/max of the inverse `weights`: the evenness of a string. */
function evennessTable(weights: Float64Array): Float64Array {
  const inverse = Float64Array.from(weights, (w) => 1 / w);
  const sums = sumTable(inverse);
  const greatest = new Float64Array(sums.length);
  for (let mask = 1; mask < sums.length; mask++) {
    const low = mask & -mask;
    greatest[mask] = Math.max(greatest[mask ^ low]!, inverse[31 - Math.clz32(low)]!);
  }
  return sums.map((sum, mask) => sum / greatest[mask]!);
}

export function* exactFront(
  task: ExactFrontTask,
  work: Effort,
): Generator<void, { readonly complete: boolean; readonly points: readonly RawPoint[] }> {
  const { values, conductances, groups, size, series } = task;
  const cross = task.ties === "cross-tied";
  const tableC = cross ? sumTable(values) : evennessTable(values);
  const tableG = cross ? sumTable(conductances.perUnit) : evennessTable(conductances.perUnit);
  const bufferC = new Float64Array(groups);
  const bufferG = new Float64Array(groups);
  const gapOf = (buffer: Float64Array): number => {
    if (cross) return stageGap(buffer, groups);
    let least = buffer[0]!;
    for (let g = 1; g < groups; g++) if (buffer[g]! < least) least = buffer[g]!;
    return series / least - 1;
  };
  // Points kept in rising charging gap, falling holding gap.
  const kept: { charging: number; holding: number; masks: Int32Array }[] = [];

  const visit = (masks: Int32Array): void => {
    for (let g = 0; g < groups; g++) {
      bufferC[g] = tableC[masks[g]!]!;
      bufferG[g] = tableG[masks[g]!]! + conductances.perStage;
    }
    const charging = gapOf(bufferC);
    const holding = gapOf(bufferG);
    let low = 0;
    let high = kept.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (kept[middle]!.charging <= charging) low = middle + 1;
      else high = middle;
    }
    if (low > 0 && kept[low - 1]!.holding <= holding) return;
    let end = low;
    while (end < kept.length && kept[end]!.holding >= holding) end++;
    const from = low > 0 && kept[low - 1]!.charging === charging ? low - 1 : low;
    kept.splice(from, end - from, { charging, holding, masks: Int32Array.from(masks) });
  };

  const complete = yield* divisions({ units: values.length, groups, size }, visit, (count) => mayGoOn(work, count));
  return { complete, points: kept.map(({ masks, ...gaps }) => ({ ...gaps, groups: Array.from(masks, bits) })) };
}
