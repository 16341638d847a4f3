/*
 * The modes of a chain fed from a source: how its first rate of change falls apart into decaying exponentials.
 *
 * | symbol   | in code    | unit | meaning                                                       |
 * | -------- | ---------- | ---- | ------------------------------------------------------------- |
 * | d_i      | rates      | 1/s  | G_i/C_i, what a stage decays at on its own                    |
 * | w_i      | weights    | 1/F  | 1/C_i                                                         |
 * | R        | resistance | ohm  | between source and chain; 0 holds the chain's ends            |
 * | lambda_k | rates      | 1/s  | of the modes                                                  |
 * | s_ik     | slopes     | V/s  | part of dv_i/dt at t = 0 in mode k                            |
 *
 * dv_i/dt = -d_i v_i - I_i/C_i + w_i I, R I = V - sum(v): a diagonal plus a rank-one term. Its modes solve
 * R + sum(w_i / (d_i - lambda)) = 0, one root after each d_i (none after the last when R = 0). Then
 * v_i(t) = v_i(0) + sum_k s_ik (1 - exp(-lambda_k t))/lambda_k, where lambda = 0 means t: a steady drift.
 * Stages of equal d count as one in the equation; what moves between them moves at their own d.
 * Source: [Golub1973] section 5, roots; [GuEisenstat1994] weights recomputed from the roots, which keeps the modes at right angles.
 */

export interface Modes {
  readonly rates: Float64Array;
  /** Row i, mode k at [i * rates.length + k]. */
  readonly slopes: Float64Array;
}

interface Cluster {
  readonly rate: number;
  readonly members: readonly number[];
  readonly weight: number;
  /** Sum of the members' rates of change, V/s. */
  readonly slope: number;
}

/** Root of the secular equation as an offset from the pole it is nearest to, so that differences keep their digits. */
interface Root {
  readonly pole: number;
  readonly offset: number;
}

/** Two stages of rates nearer than this count as equal: a relative change of a rate that no reading can show. */
const SAME_RATE = 1e-13;

/** Modes of a chain whose ends are held (`resistance` = 0, slopes summing to zero) or fed through `resistance` (ohm). */
export function sourceModes(given: {
  readonly rates: readonly number[];
  readonly weights: readonly number[];
  readonly slopes: readonly number[];
  readonly resistance: number;
}): Modes {
  const clusters = clustersOf(given);
  const roots: Root[] = [];
  const count = given.resistance > 0 ? clusters.length : clusters.length - 1;
  for (let k = 0; k < count; k++) roots.push(rootAfter(clusters, k, given.resistance));
  const gap = (k: number, c: number): number => {
    const root = roots[k]!;
    return clusters[root.pole]!.rate - clusters[c]!.rate + root.offset;
  };
  const weights = clusters.map((_, c) => matchedWeight(clusters, c, given.resistance, gap, count));
  const mixed = clusters.flatMap((cluster, c) => (cluster.members.length > 1 ? [c] : []));
  const width = count + mixed.length;
  const rates = new Float64Array(width);
  const slopes = new Float64Array(given.rates.length * width);
  for (let k = 0; k < count; k++) {
    rates[k] = clusters[roots[k]!.pole]!.rate + roots[k]!.offset;
    let norm = 0;
    let amount = 0;
    for (const [c, cluster] of clusters.entries()) {
      norm += weights[c]! / gap(k, c) ** 2;
      amount += (cluster.slope * Math.sqrt(weights[c]! / cluster.weight)) / gap(k, c);
    }
    for (const [c, cluster] of clusters.entries()) {
      const part = ((amount / norm) * Math.sqrt(weights[c]! / cluster.weight)) / gap(k, c);
      for (const i of cluster.members) slopes[i * width + k] = part * given.weights[i]!;
    }
  }
  for (const [at, c] of mixed.entries()) {
    const cluster = clusters[c]!;
    const k = count + at;
    rates[k] = cluster.rate;
    for (const i of cluster.members) {
      const own = given.slopes[i]!;
      const mean = (cluster.slope * given.weights[i]!) / cluster.weight;
      // Rounding alone would otherwise drift for ever in a mode of rate zero.
      slopes[i * width + k] = Math.abs(own - mean) <= 1e-14 * (Math.abs(own) + Math.abs(mean)) ? 0 : own - mean;
    }
  }
  return { rates, slopes };
}

function clustersOf(given: {
  readonly rates: readonly number[];
  readonly weights: readonly number[];
  readonly slopes: readonly number[];
}): readonly Cluster[] {
  const order = given.rates.map((_, i) => i).sort((a, b) => given.rates[a]! - given.rates[b]!);
  const groups: number[][] = [];
  for (const i of order) {
    const last = groups.at(-1);
    if (last && given.rates[i]! - given.rates[last[0]!]! <= SAME_RATE * given.rates[i]!) last.push(i);
    else groups.push([i]);
  }
  return groups.map((members) => ({
    rate: given.rates[members[0]!]!,
    members,
    weight: members.reduce((sum, i) => sum + given.weights[i]!, 0),
    slope: members.reduce((sum, i) => sum + given.slopes[i]!, 0),
  }));
}

/** The root between pole k and the next (or beyond the last), by Newton's steps kept inside a shrinking bracket. */
function rootAfter(clusters: readonly Cluster[], k: number, resistance: number): Root {
  const left = clusters[k]!;
  const right = clusters[k + 1];
  const secular = (pole: number, offset: number, skip: number): { readonly value: number; readonly slope: number } => {
    let value = resistance;
    let slope = 0;
    for (const [c, cluster] of clusters.entries()) {
      if (c === skip) continue;
      const gap = cluster.rate - clusters[pole]!.rate - offset;
      value += cluster.weight / gap;
      slope += cluster.weight / gap ** 2;
    }
    return { value, slope };
  };
  let pole = k;
  let sign = 1;
  let high = clusters.reduce((sum, cluster) => sum + cluster.weight, 0) / resistance;
  if (right) {
    high = (right.rate - left.rate) / 2;
    if (secular(k, high, -1).value < 0) {
      pole = k + 1;
      sign = -1;
    }
  }
  // Times the offset, the nearest pole is gone: h(x) = x (R + sum over the others) - w, below zero at x = 0.
  const own = clusters[pole]!.weight;
  let low = 0;
  let x = high;
  for (let step = 0; step < 200; step++) {
    const rest = secular(pole, sign * x, pole);
    const h = sign * x * rest.value - own;
    const tilt = sign * rest.value + x * rest.slope;
    if (h < 0) low = x;
    else high = x;
    let next = x - h / tilt;
    if (!(next > low && next < high)) next = (low + high) / 2;
    if (Math.abs(next - x) <= 2e-16 * x || high - low <= 2e-16 * high) break;
    x = next;
  }
  return { pole, offset: sign * x };
}

/** The weight of pole c for which the roots found are exact. */
function matchedWeight(
  clusters: readonly Cluster[],
  c: number,
  resistance: number,
  gap: (k: number, c: number) => number,
  count: number,
): number {
  const here = clusters[c]!;
  let product = resistance > 0 ? resistance : clusters.reduce((sum, cluster) => sum + cluster.weight, 0);
  const others = clusters.flatMap((cluster, j) => (j === c ? [] : [cluster.rate - here.rate]));
  for (let k = 0; k < count; k++) product *= gap(k, c) / (others[k] ?? 1);
  return Math.abs(product);
}
