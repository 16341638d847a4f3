// Balanced largest differencing: the quick first placing, with every stage given the same number of units.

interface Row {
  readonly sums: number[];
  readonly members: number[][];
}

const spread = (row: Row): number => row.sums[row.sums.length - 1]! - row.sums[0]!;

/** Adds the stages of two rows, largest to smallest, and sorts the result rising. */
function fold(a: Row, b: Row): Row {
  const stages = a.sums.length;
  const order = a.sums
    .map((sum, j) => ({ sum: sum + b.sums[stages - 1 - j]!, j }))
    .sort((x, y) => x.sum - y.sum || x.j - y.j);
  return {
    sums: order.map(({ sum }) => sum),
    members: order.map(({ j }) => [...a.members[j]!, ...b.members[stages - 1 - j]!]),
  };
}

/**
 * Divides the units into `stages` groups of equal count: rows of neighbours in size, the two rows of widest spread folded
 * onto each other until one is left. Returns indices into `values`; the number of values is a multiple of `stages`.
 * Source: [Yakir1996] for two groups, [Michiels2003] for more.
 */
export function largestDifferencing(values: ArrayLike<number>, stages: number): number[][] {
  const order = Array.from({ length: values.length }, (_, i) => i).sort((a, b) => values[a]! - values[b]! || a - b);
  const rows: Row[] = [];
  for (let at = 0; at < order.length; at += stages) {
    const row = order.slice(at, at + stages);
    rows.push({ sums: row.map((i) => values[i]!), members: row.map((i) => [i]) });
  }
  rows.sort((a, b) => spread(a) - spread(b));
  while (rows.length > 1) {
    const made = fold(rows.pop()!, rows.pop()!);
    // After those of the same spread, as a stable sort of the whole would put it.
    let at = rows.length;
    while (at > 0 && spread(rows[at - 1]!) > spread(made)) at--;
    rows.splice(at, 0, made);
  }
  return rows[0]!.members;
}
