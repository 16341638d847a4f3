// A measured lot of few values: stages as the separate values they can take, not smoothed over.
import { below, convolve, type Lattice, trimmed } from "./tailLattice.ts";
import type { TailCase } from "./tailLaw.ts";
import type { Stages } from "./tailStages.ts";

/** Values a sum can take, ascending, with the chance of each. */
interface Atoms {
  readonly values: Float64Array;
  readonly masses: Float64Array;
}

/** A stage with more values than this is as good as smooth; a sum of stages with more is put on a lattice. */
const MOST_STAGE = 800;
const MOST_SUM = 20000;
/** Cells over the sum of all others, and over one stage where a rough picture does. */
const SUM_CELLS = 30000;
const ROUGH_CELLS = 256;

/** The stages, and how far (1/F) the lattice may have moved a sum: 0 when every combination is kept. Null: not a lot of few values. */
export function lotStages(given: TailCase): { readonly stages: Stages; readonly blur: number } | null {
  const { law, n, p } = given;
  if (law.kind !== "lot") return null;
  const stage = atomPower(atomsOf(law.values), p, MOST_STAGE);
  if (stage === null) return null;
  const inverse: Atoms = { values: stage.values.map((c) => 1 / c).reverse(), masses: stage.masses.slice().reverse() };
  const victim = { values: inverse.values.slice().reverse(), masses: stage.masses };
  const other = onLattice(inverse, ROUGH_CELLS);
  const butTwo = n > 2 ? atomPower(inverse, n - 2, MOST_SUM) : inverse;
  const butOne = n > 2 && butTwo !== null ? atomSum(butTwo, inverse, MOST_SUM) : butTwo;
  if (butTwo !== null && butOne !== null) {
    const stages = { victim, other, butTwoBelow: n > 2 ? atomsBelow(butTwo) : null, butOneBelow: atomsBelow(butOne) };
    return { stages, blur: 0 };
  }
  const base = onLattice(inverse, Math.ceil(SUM_CELLS / (n - 1)));
  let sum = base;
  for (let count = 2; count <= n - 2; count++) sum = convolve(sum, base);
  const all = convolve(sum, base);
  const stages = { victim, other, butTwoBelow: below(sum), butOneBelow: below(all) };
  return { stages, blur: (base.step * Math.sqrt(n - 1)) / 2 };
}

const atomsOf = (values: readonly number[]): Atoms =>
  gathered(values.map((value) => ({ value, mass: 1 / values.length })));

function gathered(all: { value: number; mass: number }[]): Atoms {
  all.sort((x, y) => x.value - y.value);
  const kept: { value: number; mass: number }[] = [];
  for (const atom of all) {
    const last = kept.at(-1);
    if (last && atom.value - last.value <= 1e-13 * atom.value) last.mass += atom.mass;
    else kept.push({ ...atom });
  }
  return {
    values: Float64Array.from(kept, (atom) => atom.value),
    masses: Float64Array.from(kept, (atom) => atom.mass),
  };
}

function atomSum(a: Atoms, b: Atoms, most: number): Atoms | null {
  // Equal sums come in many orders; far more pairs than this cannot fold into few values.
  if (a.values.length * b.values.length > 40 * most) return null;
  const all: { value: number; mass: number }[] = [];
  for (const [i, x] of a.values.entries())
    for (const [j, y] of b.values.entries()) all.push({ value: x + y, mass: a.masses[i]! * b.masses[j]! });
  const sum = gathered(all);
  return sum.values.length > most ? null : sum;
}

function atomPower(base: Atoms, count: number, most: number): Atoms | null {
  let sum: Atoms | null = base.values.length > most ? null : base;
  for (let k = 2; k <= count && sum !== null; k++) sum = atomSum(sum, base, most);
  return sum;
}

/** Chance of less than a value; an equal sum is not less, so a share exactly at the limit is within it. */
function atomsBelow(atoms: Atoms): (value: number) => number {
  const sums = new Float64Array(atoms.values.length + 1);
  for (const [k, mass] of atoms.masses.entries()) sums[k + 1] = sums[k]! + mass;
  return (value) => {
    const limit = value * (1 - 1e-12);
    let low = 0;
    let high = atoms.values.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (atoms.values[middle]! < limit) low = middle + 1;
      else high = middle;
    }
    return sums[low]!;
  };
}

function onLattice(atoms: Atoms, cells: number): Lattice {
  const first = atoms.values[0]!;
  const last = atoms.values.at(-1)!;
  const step = (last - first) / cells;
  const masses = new Float64Array(cells + 1);
  for (const [k, value] of atoms.values.entries()) {
    const place = (value - first) / step;
    const node = Math.min(Math.floor(place), cells - 1);
    masses[node]! += atoms.masses[k]! * (1 - (place - node));
    masses[node + 1]! += atoms.masses[k]! * (place - node);
  }
  return trimmed({ first, step, masses });
}
