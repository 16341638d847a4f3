// From one stage over to any stage over: what banks with two stages over at once take off the sum.
import { below, type Lattice, power } from "./tailLattice.ts";
import { type Stages, singleRisk } from "./tailStages.ts";

export interface Kept {
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

/** For when two at once are rare. */
export function pairShare(stages: Stages, kappa: number, n: number): Kept {
  if (stages.butTwoBelow === null || kappa <= 1) return { kept: 1, error: 0 };
  const chance = stages.butTwoBelow;
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
export function highestShare(stages: Stages, kappa: number, n: number): Kept {
  if (stages.butTwoBelow === null || kappa <= 1) return { kept: 1, error: 0 };
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
