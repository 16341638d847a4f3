/*
 * The chance that any unit of a bank is above its limit while charging, true in relative terms far into the tail.
 *
 * | symbol | in code | unit | meaning                                                              |
 * | ------ | ------- | ---- | -------------------------------------------------------------------- |
 * | n, p   | n, p    | 1    | series and parallel count; stages of p units cross-tied, else strings  |
 * | s      | share   | 1    | limit voltage over bank voltage                                        |
 * | a_i    |         | 1/F  | 1/C_i of stage i; share_i = a_i/sum(a)                                 |
 * | k      | kappa   | 1    | (1 - s)/s: share_i > s when the other a sum to less than k a_i         |
 *
 * P(one) = E[F(k a_1)], F the distribution of the sum of n - 1 others, by convolution of the unit's law over the p units and of 1/C
 * over the stages. Only values of C that can take part in an excess are put on the lattice, so a corner of any smallness is resolved.
 * Any of n: n P(one) - C(n,2) P(two), between the bounds of Bonferroni and Hunter; where two at once are not rare, exactly, as
 * n P(one, and it is the highest). Strings: 1 - (1 - P(string))^p.
 * Two lattices, one twice as fine, give the extrapolated value and the error that is stated with it.
 * Units are independent. What a whole lot has in common (all 5 % high) divides out of every share.
 * Source: [methods-derived] 1.3; [Galambos1996] I.1, I.3 for the bounds of a union
 */
import { below, convolve, type Lattice, power, reciprocal, sigmasAcross, trimmed } from "./tailLattice.ts";
import { lawMasses, lawRange, type UnitLaw } from "./tailLaw.ts";

export interface TailCase {
  readonly law: UnitLaw;
  readonly ties: "cross-tied" | "strings";
  readonly n: number;
  readonly p: number;
  /** Unit limit over bank voltage, both in V. */
  readonly share: number;
}

export interface Tail {
  /** Chance that any unit of the bank exceeds its limit, 0 to 1. */
  readonly exceed: number;
  /** What `exceed` may be off by, either way; 0 when it is exact. */
  readonly error: number;
  /** Sum over all stages, which counts a bank with two stages over twice: an upper bound, and how far it is above `exceed`. */
  readonly unionBound: number;
  readonly unionExcess: number;
}

const exactly = (exceed: number): Tail => ({ exceed, error: 0, unionBound: exceed, unionExcess: 0 });

/** Above this sum over the stages two at once are not rare. */
const RARE = 0.02;
/** Fineness of the three lattices, each step half the one before. */
const LEVELS = [1, 2, 4];
/** At scale 1: cells of a stage's window, at least so many of a unit's, and so many to one sigma of 1/C. */
const STAGE_CELLS = 192;
const UNIT_CELLS = { uniform: 8, normal: 20, lot: 32 };
/** And never more cells of 1/C than this: a lot's stray value can stand any number of sigmas off. */
const MOST_CELLS = 400;
const SIGMA_CELLS = 6;
const ROUNDING = 1e-9;

/** Chance that any unit exceeds `share` of the bank's voltage while charging. Call with n >= 1, p >= 1, share > 0. */
export function exceedRisk(given: TailCase): Tail {
  const strings = given.ties === "strings" ? given.p : 1;
  const one = chainRisk({ ...given, p: given.ties === "strings" ? 1 : given.p });
  if (strings === 1 || one.exceed === 0 || one.exceed === 1) return one;
  const all = (chance: number): number => -Math.expm1(strings * Math.log1p(-Math.min(chance, 1)));
  const exceed = all(one.exceed);
  const unionBound = strings * one.unionBound;
  return {
    exceed,
    error: Math.max(all(one.exceed + one.error) - exceed, exceed - all(Math.max(0, one.exceed - one.error))),
    unionBound,
    unionExcess: unionBound - exceed,
  };
}

interface Window {
  readonly low: number;
  readonly high: number;
}

/** Capacitances (F) of a unit that can take part in an excess: in the stage that is over, and in the others. Null: none can. */
function windows(given: TailCase, kappa: number): { readonly victim: Window; readonly other: Window } | null {
  const { n, p, law } = given;
  const { low, high } = lawRange(law);
  const largest = 1 / (p * low);
  const least = 1 / (p * high);
  if (kappa * largest <= (n - 1) * least * (1 + 1e-12)) return null;
  const stageMost = kappa / ((n - 1) * least);
  const stageLeast = 1 / (kappa * largest - (n - 2) * least);
  // A lot may leave a single value on one side; its window still needs a width.
  const hair = 1e-9 * low;
  return {
    victim: { low, high: Math.max(low + hair, Math.min(high, stageMost - (p - 1) * low)) },
    other: { low: Math.min(high - hair, Math.max(low, stageLeast - (p - 1) * high)), high },
  };
}

function chainRisk(given: TailCase): Tail {
  const { n, share, law } = given;
  const { low, high } = lawRange(law);
  if (share >= 1) return exactly(0);
  if (high - low <= 1e-9 * low) return exactly(1 / n > share ? 1 : 0);
  if (share < 1 / n) return exactly(1);
  const kappa = (1 - share) / share;
  const span = windows(given, kappa);
  if (span === null) return exactly(0);
  const levels = LEVELS.map((scale) => stagesOn(given, span, scale));
  const [rough, middle, fine] = levels.map((level) => singleRisk(level, kappa)) as [number, number, number];
  // The lattice is right to the square of its step for a smooth law; a lot's values fall where they fall.
  const smooth = law.kind !== "lot" && rough > 0;
  const single = smooth ? extrapolated(middle, fine) : fine;
  const before = smooth ? extrapolated(rough, middle) : middle;
  const off = Math.abs(single - before) + ROUNDING * single;
  const sum = n * single;
  const [, coarse] = levels as [Stages, Stages, Stages];
  const joint = sum > RARE ? highestShare(coarse, kappa, n) : pairShare(coarse, kappa, n);
  const exceed = Math.min(1, sum * joint.kept);
  return { exceed, error: n * off + sum * joint.error, unionBound: sum, unionExcess: sum - exceed };
}

/** A chance spans decades, so it is its logarithm that goes as the square of the step. */
const extrapolated = (coarse: number, fine: number): number => Math.exp((4 * Math.log(fine) - Math.log(coarse)) / 3);

interface Stages {
  /** 1/C of the stage that is over, at the nodes its capacitance has. */
  readonly victim: { readonly values: Float64Array; readonly masses: Float64Array };
  /** 1/C of one other stage, and the sum of n - 2 and n - 1 of them. */
  readonly other: Lattice;
  readonly butTwo: Lattice | null;
  readonly butOne: Lattice;
}

function stagesOn(given: TailCase, span: { readonly victim: Window; readonly other: Window }, scale: number): Stages {
  const { n, p, law } = given;
  const cells = scale * Math.max(Math.ceil(STAGE_CELLS / p), UNIT_CELLS[law.kind]);
  const stage = ({ low, high }: Window): Lattice =>
    power({ first: low, step: (high - low) / cells, masses: lawMasses(law, low, high, cells) }, p);
  const over = stage(span.victim);
  const company = stage(span.other);
  const wide = Math.max(STAGE_CELLS / (n - 1), SIGMA_CELLS * sigmasAcross(company));
  const other = trimmed(reciprocal(company, scale * Math.ceil(Math.min(wide, MOST_CELLS))));
  const butTwo = n > 2 ? power(other, n - 2) : null;
  return {
    victim: {
      values: over.masses.map((_, k) => 1 / (over.first + k * over.step)),
      masses: over.masses,
    },
    other,
    butTwo,
    butOne: butTwo === null ? other : convolve(butTwo, other),
  };
}

/** Chance that one given stage is over. */
function singleRisk(stages: Stages, kappa: number): number {
  const chance = below(stages.butOne);
  let sum = 0;
  for (const [k, mass] of stages.victim.masses.entries()) sum += mass * chance(kappa * stages.victim.values[k]!);
  return sum;
}

interface Kept {
  /** Share of the sum over stages that remains once a bank with two stages over counts once. */
  readonly kept: number;
  readonly error: number;
}

/** Points that stand for the stage that is over, where pairs or maxima of stages are summed. */
const POINTS = 96;

function victimPoints(stages: Stages): Lattice {
  const { values, masses } = stages.victim;
  const first = values.at(-1)!;
  const step = (values[0]! - first) / POINTS;
  const points = new Float64Array(POINTS + 1);
  for (const [k, mass] of masses.entries()) {
    const place = (values[k]! - first) / step;
    const node = Math.min(Math.floor(place), POINTS - 1);
    points[node]! += mass * (1 - (place - node));
    points[node + 1]! += mass * (place - node);
  }
  return { first, step, masses: points };
}

function pairShare(stages: Stages, kappa: number, n: number): Kept {
  if (stages.butTwo === null || kappa <= 1) return { kept: 1, error: 0 };
  const chance = below(stages.butTwo);
  const { first, step, masses } = victimPoints(stages);
  let pairs = 0;
  for (let i = 0; i < masses.length; i++) {
    const x = first + i * step;
    for (let j = 0; j <= i; j++) {
      const y = first + j * step;
      pairs += (i === j ? 1 : 2) * masses[i]! * masses[j]! * chance(kappa * y - x);
    }
  }
  // Two at once, against the sum over stages: Bonferroni below, Hunter above.
  const lost = ((n - 1) / 2) * (pairs / singleRisk(stages, kappa));
  return { kept: 1 - lost, error: lost * (1 - 2 / n) };
}

/** Of the banks in which a given stage is over, those in which it is the highest. */
function highestShare(stages: Stages, kappa: number, n: number): Kept {
  if (stages.butTwo === null || kappa <= 1) return { kept: 1, error: 0 };
  const { first, step, masses } = victimPoints(stages);
  const thin = thinned(stages.other, 128);
  const free = below(power(thin, n - 1));
  let all = 0;
  let highest = 0;
  for (const [i, mass] of masses.entries()) {
    const x = first + i * step;
    const limit = kappa * x;
    const chance = mass * free(limit);
    if (chance <= 1e-7 * all) continue;
    all += chance;
    highest += mass * Math.min(free(limit), below(power(cutAt(thin, x), n - 1))(limit));
  }
  const kept = highest / all;
  return { kept, error: 0.02 * (1 - kept) };
}

function thinned(lattice: Lattice, cells: number): Lattice {
  if (lattice.masses.length <= cells + 1) return lattice;
  const step = ((lattice.masses.length - 1) * lattice.step) / cells;
  const masses = new Float64Array(cells + 1);
  for (const [k, mass] of lattice.masses.entries()) {
    const place = (k * lattice.step) / step;
    const node = Math.min(Math.floor(place), cells - 1);
    masses[node]! += mass * (1 - (place - node));
    masses[node + 1]! += mass * (place - node);
  }
  return { first: lattice.first, step, masses };
}

/** The part of a lattice at or below a value; the node astride it in proportion. */
function cutAt(lattice: Lattice, value: number): Lattice {
  const place = (value - lattice.first) / lattice.step + 0.5;
  const whole = Math.min(Math.max(Math.floor(place), 0), lattice.masses.length);
  const masses = lattice.masses.slice(0, Math.min(whole + 1, lattice.masses.length));
  if (whole < lattice.masses.length) masses[whole]! *= Math.max(0, place - whole);
  return {
    first: lattice.first,
    step: lattice.step,
    masses: masses.length > 1 ? masses : Float64Array.of(masses[0] ?? 0, 0),
  };
}
