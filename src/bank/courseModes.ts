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
 * Source: [Golub1973] section 5, roots (place from memory); [GuEisenstat1994] weights recomputed from the roots, which keeps the modes at right angles.
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
  const poles = Float64Array.from(clusters, (cluster) => cluster.rate);
  const secular: Secular = {
    poles,
    weights: Float64Array.from(clusters, (cluster) => cluster.weight),
    resistance: given.resistance,
  };
  const count = given.resistance > 0 ? poles.length : poles.length - 1;
  const gaps: Float64Array[] = [];
  const mixed = clusters.flatMap((cluster, c) => (cluster.members.length > 1 ? [c] : []));
  const width = count + mixed.length;
  const rates = new Float64Array(width);
  const slopes = new Float64Array(given.rates.length * width);
  for (let k = 0; k < count; k++) {
    const { pole, offset } = rootAfter(secular, k);
    rates[k] = poles[pole]! + offset;
    gaps.push(poles.map((rate) => poles[pole]! - rate + offset));
  }
  const weights = poles.map((_, c) => matchedWeight(secular, c, gaps));
  // Matched over given weight: the length of a cluster's own direction, corrected alike.
  const trims = weights.map((weight, c) => Math.sqrt(weight / secular.weights[c]!));
  for (const [k, gap] of gaps.entries()) {
    let norm = 0;
    let amount = 0;
    for (let c = 0; c < poles.length; c++) {
      norm += weights[c]! / (gap[c]! * gap[c]!);
      amount += (clusters[c]!.slope * trims[c]!) / gap[c]!;
    }
    for (let c = 0; c < poles.length; c++) {
      const part = ((amount / norm) * trims[c]!) / gap[c]!;
      for (const i of clusters[c]!.members) slopes[i * width + k] = part * given.weights[i]!;
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

/** R + sum(w_c / (d_c - lambda)), poles ascending. */
interface Secular {
  readonly poles: Float64Array;
  readonly weights: Float64Array;
  readonly resistance: number;
}

/** The root between pole k and the next (or beyond the last), by Newton's steps kept inside a shrinking bracket. */
function rootAfter({ poles, weights, resistance }: Secular, k: number): Root {
  let pole = k;
  let sign = 1;
  let high = weights.reduce((sum, weight) => sum + weight, 0) / resistance;
  if (k + 1 < poles.length) {
    high = (poles[k + 1]! - poles[k]!) / 2;
    let value = resistance;
    for (let c = 0; c < poles.length; c++) value += weights[c]! / (poles[c]! - poles[k]! - high);
    if (value < 0) {
      pole = k + 1;
      sign = -1;
    }
  }
  // Times the offset, the nearest pole is gone: h(x) = x (R + sum over the others) - w, below zero at x = 0.
  const own = weights[pole]!;
  const origin = poles[pole]!;
  let low = 0;
  let x = high;
  for (let step = 0; step < 200; step++) {
    let value = resistance;
    let slope = 0;
    for (let c = 0; c < poles.length; c++) {
      if (c === pole) continue;
      const gap = poles[c]! - origin - sign * x;
      const part = weights[c]! / gap;
      value += part;
      slope += part / gap;
    }
    const h = sign * x * value - own;
    const tilt = sign * value + x * slope;
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
function matchedWeight({ poles, weights, resistance }: Secular, c: number, gaps: readonly Float64Array[]): number {
  let product = resistance > 0 ? resistance : weights.reduce((sum, weight) => sum + weight, 0);
  for (let k = 0, other = 0; k < gaps.length; k++, other++) {
    if (other === c) other++;
    // Taken in turns, so that nothing overflows on the way.
    product *= gaps[k]![c]! / (other < poles.length ? poles[other]! - poles[c]! : 1);
  }
  return Math.abs(product);
}
