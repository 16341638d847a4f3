/*
 * One time step of a bank whose parallel branches sit one after the other along a bus: a ladder of R, L and C.
 *
 *   symbol    name                 unit        meaning
 *   C R L     branch               F ohm H     one unit of a stage, or one column of units in series
 *   R_s L_s   segment              ohm H       bus (go and return) from one branch to the next nearer the feed; 0 allowed
 *   s         frequency            rad/s       complex; a branch is the source v0/s + L i0 behind R + s L + 1/(s C)
 *   h         step                 s           > 0
 *
 * At one s the ladder folds from its far ends to the feed as sources in parallel and in series, and unfolds again: as many
 * sums as there are branches. A step is x(h) = -(1/h) sum of K_i X(z_i/h) over the poles z_i of the rational
 * (60 + 24 z + 3 z^2)/(60 - 36 z + 9 z^2 - z^3) that stands for e^z: order 5, damps what is too fast to follow, takes any R,
 * L or segment of zero. Source: [methods-derived] the fold; stepping by the
 * inverse transform is Vlach's and Singhal's way, from memory.
 */
import type { BusPath } from "./busPath.ts";

/** One branch and the piece of bus between it and the next thing nearer the feed. */
export interface LadderPlace {
  readonly segment: BusPath;
  readonly capacitance: number;
  readonly resistance: number;
  readonly inductance: number;
}

/** Arms that leave the feed, each from the feed outward. */
export type Ladder = readonly (readonly LadderPlace[])[];

/** Volts and amperes of each branch, arm by arm, and the sum of the currents. */
export interface LadderState {
  readonly voltages: Float64Array;
  readonly currents: Float64Array;
  readonly total: number;
}

/** What hangs at the feed: a load, or a current that is given as powers of the time from the step's start. */
export type LadderEnd =
  | { readonly kind: "load"; readonly load: BusPath }
  | { readonly kind: "given"; readonly powers: (step: number) => readonly number[] };

interface Pole {
  readonly re: number;
  readonly im: number;
  readonly weightRe: number;
  readonly weightIm: number;
}

/** A pole with its residue K = N(z)/D'(z); one of a pair counts twice its real part. */
function pole(re: number, im: number): Pole {
  const [squareRe, squareIm] = [re * re - im * im, 2 * re * im];
  const [topRe, topIm] = [60 + 24 * re + 3 * squareRe, 24 * im + 3 * squareIm];
  const [lowRe, lowIm] = [-36 + 18 * re - 3 * squareRe, 18 * im - 3 * squareIm];
  const size = lowRe * lowRe + lowIm * lowIm;
  const twice = im === 0 ? 1 : 2;
  return {
    re,
    im,
    weightRe: (twice * (topRe * lowRe + topIm * lowIm)) / size,
    weightIm: (twice * (topIm * lowRe - topRe * lowIm)) / size,
  };
}

/** Roots of 60 - 36 z + 9 z^2 - z^3. */
const POLES = [pole(3.637834252744496, 0), pole(2.681082873627752, 3.050430199247411)];
const FACTORIAL = [1, 1, 2, 6];

/** Per branch: source and impedance alone, with all beyond it (node), and seen from nearer the feed (arm), real and imaginary. */
const FIELDS = 12;

/** The state after `step` [s]. `start.total` is the current that flows in the load at the start. */
export function ladderStep(ladder: Ladder, start: LadderState, step: number, end: LadderEnd): LadderState {
  const count = start.voltages.length;
  const voltages = new Float64Array(count);
  const currents = new Float64Array(count);
  let total = 0;
  const work = new Float64Array(count * FIELDS);
  const powers = end.kind === "given" ? end.powers(step) : [];
  for (const { re, im, weightRe, weightIm } of POLES) {
    const [a, b] = [re / step, im / step];
    const size = a * a + b * b;
    const [overRe, overIm] = [a / size, -b / size];
    let [sumRe, sumIm, flowRe, flowIm] = [0, 0, 0, 0];
    let base = 0;
    for (const arm of ladder) {
      let beyond = 0;
      for (let k = arm.length - 1; k >= 0; k--) {
        const place = arm[k] as LadderPlace;
        const at = (base + k) * FIELDS;
        const current = start.currents[base + k] as number;
        const volts = start.voltages[base + k] as number;
        beyond += current;
        const [eRe, eIm] = [volts * overRe + place.inductance * current, volts * overIm];
        const zRe = place.resistance + a * place.inductance + overRe / place.capacitance;
        const zIm = b * place.inductance + overIm / place.capacitance;
        let [nodeRe, nodeIm, viaRe, viaIm] = [eRe, eIm, zRe, zIm];
        if (k + 1 < arm.length) {
          // two sources in parallel: (e y + e' y')/(y + y') = (e z' + e' z)/(z + z')
          const [fRe, fIm] = [work[at + FIELDS + 8] as number, work[at + FIELDS + 9] as number];
          const [wRe, wIm] = [work[at + FIELDS + 10] as number, work[at + FIELDS + 11] as number];
          const [sRe, sIm] = [zRe + wRe, zIm + wIm];
          const d = sRe * sRe + sIm * sIm;
          const [tRe, tIm] = [
            eRe * wRe - eIm * wIm + fRe * zRe - fIm * zIm,
            eRe * wIm + eIm * wRe + fRe * zIm + fIm * zRe,
          ];
          [nodeRe, nodeIm] = [(tRe * sRe + tIm * sIm) / d, (tIm * sRe - tRe * sIm) / d];
          const [pRe, pIm] = [zRe * wRe - zIm * wIm, zRe * wIm + zIm * wRe];
          [viaRe, viaIm] = [(pRe * sRe + pIm * sIm) / d, (pIm * sRe - pRe * sIm) / d];
        }
        const { segment } = place;
        work.set([eRe, eIm, zRe, zIm, nodeRe, nodeIm, viaRe, viaIm], at);
        work[at + 8] = nodeRe + segment.inductance * beyond;
        work[at + 9] = nodeIm;
        work[at + 10] = viaRe + segment.resistance + a * segment.inductance;
        work[at + 11] = viaIm + b * segment.inductance;
      }
      const first = base * FIELDS;
      const [zRe, zIm] = [work[first + 10] as number, work[first + 11] as number];
      const d = zRe * zRe + zIm * zIm;
      const [eRe, eIm] = [work[first + 8] as number, work[first + 9] as number];
      sumRe += zRe / d;
      sumIm -= zIm / d;
      flowRe += (eRe * zRe + eIm * zIm) / d;
      flowIm += (eIm * zRe - eRe * zIm) / d;
      base += arm.length;
    }
    // feed voltage u: with a load (flow - u y) (R + s L) - L i0 = u; with a given current flow - u y = i
    let [uRe, uIm] = [0, 0];
    let [topRe, topIm, lowRe, lowIm] = [flowRe, flowIm, sumRe, sumIm];
    if (end.kind === "load") {
      const { resistance, inductance } = end.load;
      const [zRe, zIm] = [resistance + a * inductance, b * inductance];
      topRe = flowRe * zRe - flowIm * zIm - inductance * start.total;
      topIm = flowRe * zIm + flowIm * zRe;
      lowRe = 1 + sumRe * zRe - sumIm * zIm;
      lowIm = sumRe * zIm + sumIm * zRe;
    } else {
      let [qRe, qIm] = [overRe, overIm];
      powers.forEach((power, order) => {
        topRe -= power * (FACTORIAL[order] as number) * qRe;
        topIm -= power * (FACTORIAL[order] as number) * qIm;
        [qRe, qIm] = [qRe * overRe - qIm * overIm, qRe * overIm + qIm * overRe];
      });
    }
    const d = lowRe * lowRe + lowIm * lowIm;
    [uRe, uIm] = [(topRe * lowRe + topIm * lowIm) / d, (topIm * lowRe - topRe * lowIm) / d];
    base = 0;
    for (const arm of ladder) {
      let [nearRe, nearIm] = [uRe, uIm];
      for (let k = 0; k < arm.length; k++) {
        const at = (base + k) * FIELDS;
        const through = (offset: number): readonly [number, number] => {
          const [zRe, zIm] = [work[at + offset + 2] as number, work[at + offset + 3] as number];
          const [eRe, eIm] = [(work[at + offset] as number) - nearRe, (work[at + offset + 1] as number) - nearIm];
          const n = zRe * zRe + zIm * zIm;
          return [(eRe * zRe + eIm * zIm) / n, (eIm * zRe - eRe * zIm) / n];
        };
        const [jRe, jIm] = through(8);
        const [viaRe, viaIm] = [work[at + 6] as number, work[at + 7] as number];
        nearRe = (work[at + 4] as number) - (viaRe * jRe - viaIm * jIm);
        nearIm = (work[at + 5] as number) - (viaRe * jIm + viaIm * jRe);
        const [iRe, iIm] = through(0);
        const { capacitance } = arm[k] as LadderPlace;
        const [qRe, qIm] = [(start.voltages[base + k] as number) - iRe / capacitance, -iIm / capacitance];
        const [vRe, vIm] = [qRe * overRe - qIm * overIm, qRe * overIm + qIm * overRe];
        const share = (weightRe * iRe - weightIm * iIm) / -step;
        currents[base + k] = (currents[base + k] as number) + share;
        voltages[base + k] = (voltages[base + k] as number) + (weightRe * vRe - weightIm * vIm) / -step;
        total += share;
      }
      base += arm.length;
    }
  }
  return { voltages, currents, total };
}
