// Writes a blend as a linear programme for an outside engine: one binary an option and count, or one a run of equal steps.
import { capacityNeeded, roomUnder } from "./evaluate.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import { usefulStrings } from "./pool.ts";
import type { Program, ProgramColumn, ProgramRow } from "./program.ts";

export interface BlendProgram {
  readonly program: Program;
  /** Reads a point of the programme back as a blend. */
  readonly read: (values: ArrayLike<number>) => readonly BlendCount[];
}

/** Strings of one column: `base` when its binary is 1, and so many more as its counter says. */
interface Run {
  readonly option: number;
  readonly base: number;
  readonly last: number;
  readonly step: number;
}

/** Every (option, count) pair of use. */
export function allPairs(model: BlendModel): BlendCount[] {
  return model.options.flatMap((option, at) =>
    Array.from({ length: usefulStrings(model, option) }, (_, x) => ({ option: at, strings: x + 1 })),
  );
}

/** One binary for each pair, its cost taken from the table. Made for small cores. */
export const optionForm = (model: BlendModel, pairs: readonly BlendCount[]): BlendProgram =>
  write(
    model,
    pairs.map(({ option, strings }) => ({ option, base: strings, last: strings, step: 0 })),
  );

/** One binary for each run of counts over which the table rises by equal steps, and a counter within it. */
export function runForm(model: BlendModel, options: readonly number[] | null = null): BlendProgram {
  const runs: Run[] = [];
  for (const option of options ?? model.options.keys()) {
    const from = model.options[option]!;
    const most = usefulStrings(model, from);
    let base = 1;
    while (base <= most) {
      let last = base;
      const step = base < most ? from.costs[base + 1]! - from.costs[base]! : 0;
      while (last < most && from.costs[last + 1]! - from.costs[last]! === step) last += 1;
      runs.push({ option, base, last, step });
      base = last + 1;
    }
  }
  return write(model, runs);
}

function write(model: BlendModel, runs: readonly Run[]): BlendProgram {
  const columns: ProgramColumn[] = [];
  const capacity: [number, number][] = [];
  const ceilings = (["volume", "mass", "units"] as const)
    .filter((name) => model.ceilings[name] < Number.POSITIVE_INFINITY)
    .map((name) => ({ name, room: roomUnder(model.ceilings[name]), terms: [] as [number, number][] }));
  const types: [number, number][] = [];
  const perPart = new Map<number, [number, number][]>();
  const uses = new Map<number, [number, number][]>();
  const rows: ProgramRow[] = [];
  const strings: { option: number; each: number }[] = [];
  const need = capacityNeeded(model.requirement);
  const column = (option: number, each: number, cost: number, most: number): number => {
    const from = model.options[option]!;
    const at = columns.push({ cost, most, whole: true }) - 1;
    strings.push({ option, each });
    capacity.push([at, (from.capacity * each) / need]);
    for (const { name, room, terms } of ceilings)
      if (from[name] > 0) terms.push([at, (from[name] * each) / (room || 1)]);
    return at;
  };
  for (const run of runs) {
    const from = model.options[run.option]!;
    const chosen = column(run.option, run.base, from.costs[run.base]!, 1);
    types.push([chosen, 1]);
    uses.set(run.option, [...(uses.get(run.option) ?? []), [chosen, 1]]);
    perPart.set(from.partIndex, [...(perPart.get(from.partIndex) ?? []), [chosen, 1]]);
    if (run.last === run.base) continue;
    const span = run.last - run.base;
    const more = column(run.option, 1, run.step, span);
    rows.push({
      terms: [
        [more, 1],
        [chosen, -span],
      ],
      least: Number.NEGATIVE_INFINITY,
      most: 0,
    });
  }
  rows.push({ terms: capacity, least: 1, most: Number.POSITIVE_INFINITY });
  for (const { terms, room } of ceilings) rows.push({ terms, least: Number.NEGATIVE_INFINITY, most: room > 0 ? 1 : 0 });
  rows.push({ terms: types, least: Number.NEGATIVE_INFINITY, most: model.maxTypes });
  for (const terms of perPart.values()) rows.push({ terms, least: Number.NEGATIVE_INFINITY, most: 1 });
  addShipments(model, uses, columns, rows);
  return { program: { columns, rows }, read: (values) => readCounts(strings, values) };
}

/** A binary for each shipment that costs something, 1 as soon as an option that needs it is used. Last, for they bring no strings. */
function addShipments(
  model: BlendModel,
  uses: ReadonlyMap<number, readonly (readonly [number, number])[]>,
  columns: ProgramColumn[],
  rows: ProgramRow[],
): void {
  const sent = new Map<number, number>();
  for (const [option, chosen] of uses) {
    for (const supplier of model.options[option]!.suppliers ?? []) {
      const cost = model.shipments![supplier]!;
      if (cost === 0) continue;
      let at = sent.get(supplier);
      if (at === undefined) {
        at = columns.push({ cost, most: 1, whole: true }) - 1;
        sent.set(supplier, at);
      }
      rows.push({ terms: [...chosen, [at, -1]], least: Number.NEGATIVE_INFINITY, most: 0 });
    }
  }
}

function readCounts(
  strings: readonly { option: number; each: number }[],
  values: ArrayLike<number>,
): readonly BlendCount[] {
  const sum = new Map<number, number>();
  strings.forEach(({ option, each }, at) => {
    const count = Math.round(values[at]!) * each;
    if (count !== 0) sum.set(option, (sum.get(option) ?? 0) + count);
  });
  return [...sum].map(([option, count]) => ({ option, strings: count })).sort((a, b) => a.option - b.option);
}
