// Every layout the search keeps, as columns of numbers: a catalogue of 100,000 parts gives millions of rows.

export interface LayoutTable {
  count: number;
  part: Int32Array;
  series: Int16Array;
  parallel: Int32Array;
  /** 1 is cross-tied, 0 strings. */
  tied: Uint8Array;
  /** Index of the resistor family, -1 without balancing resistors. */
  family: Int16Array;
  /** Minor units; Infinity when the capacitors have no price. */
  cost: Float64Array;
  /** Infinity when unknown. */
  volume: Float64Array;
  mass: Float64Array;
  units: Float64Array;
  /** Worst unit voltage over rated voltage; Infinity when not assessed. */
  stress: Float64Array;
}

/** What layouts are compared by, least first; units and units of the columns above. */
export interface Figures {
  cost: number;
  volume: number;
  mass: number;
  units: number;
  stress: number;
}

export interface LayoutRow extends Omit<Figures, "units"> {
  part: number;
  series: number;
  parallel: number;
  tied: boolean;
  family: number;
}

export const newTable = (capacity = 4096): LayoutTable => ({
  count: 0,
  part: new Int32Array(capacity),
  series: new Int16Array(capacity),
  parallel: new Int32Array(capacity),
  tied: new Uint8Array(capacity),
  family: new Int16Array(capacity),
  cost: new Float64Array(capacity),
  volume: new Float64Array(capacity),
  mass: new Float64Array(capacity),
  units: new Float64Array(capacity),
  stress: new Float64Array(capacity),
});

function grow<T extends Int32Array | Int16Array | Uint8Array | Float64Array>(old: T, capacity: number): T {
  const next = new (old.constructor as new (n: number) => T)(capacity);
  next.set(old as never);
  return next;
}

function widen(table: LayoutTable): void {
  const capacity = table.part.length * 2;
  table.part = grow(table.part, capacity);
  table.series = grow(table.series, capacity);
  table.parallel = grow(table.parallel, capacity);
  table.tied = grow(table.tied, capacity);
  table.family = grow(table.family, capacity);
  table.cost = grow(table.cost, capacity);
  table.volume = grow(table.volume, capacity);
  table.mass = grow(table.mass, capacity);
  table.units = grow(table.units, capacity);
  table.stress = grow(table.stress, capacity);
}

export function pushRow(table: LayoutTable, row: Readonly<LayoutRow>): void {
  if (table.count === table.part.length) widen(table);
  const i = table.count++;
  table.part[i] = row.part;
  table.series[i] = row.series;
  table.parallel[i] = row.parallel;
  table.tied[i] = row.tied ? 1 : 0;
  table.family[i] = row.family;
  table.cost[i] = row.cost;
  table.volume[i] = row.volume;
  table.mass[i] = row.mass;
  table.units[i] = row.series * row.parallel;
  table.stress[i] = row.stress;
}

export const noFigures = (): Figures => ({ cost: 0, volume: 0, mass: 0, units: 0, stress: 0 });

/** The figures of one row, written into `figures`. */
export function figuresAt(table: LayoutTable, row: number, figures: Figures): Figures {
  figures.cost = table.cost[row] as number;
  figures.volume = table.volume[row] as number;
  figures.mass = table.mass[row] as number;
  figures.units = table.units[row] as number;
  figures.stress = table.stress[row] as number;
  return figures;
}
