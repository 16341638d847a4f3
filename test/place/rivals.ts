// Published quick rules, written out again for the tests: nobody may do better with them than with the tool.

const falling = (values: readonly number[]): number[] =>
  values.map((_, i) => i).sort((a, b) => values[b]! - values[a]!);

/** Snake order. */
export function snakeRival(values: readonly number[], stages: number): number[][] {
  const rows: number[][] = [];
  const order = falling(values);
  while (order.length > 0) rows.push(order.splice(0, stages));
  for (let r = 1; r < rows.length; r += 2) rows[r]!.reverse();
  return Array.from({ length: stages }, (_, j) => rows.map((row) => row[j]!));
}

/** Largest first into the lowest stage with room (Graham's rule, equal counts). */
export function largestFirstRival(values: readonly number[], stages: number): number[][] {
  const made = Array.from({ length: stages }, () => ({ sum: 0, units: [] as number[] }));
  for (const i of falling(values)) {
    const open = made.filter((stage) => stage.units.length < values.length / stages);
    const lowest = open.reduce((a, b) => (b.sum < a.sum ? b : a));
    lowest.units.push(i);
    lowest.sum += values[i]!;
  }
  return made.map((stage) => stage.units);
}

/** Balanced largest differencing (Yakir 1996; Michiels, Korst, Aarts, van Leeuwen 2003). */
export function differencingRival(values: readonly number[], stages: number): number[][] {
  type Stage = { sum: number; units: number[] };
  const order = falling(values);
  let rows: Stage[][] = [];
  while (order.length > 0) rows.push(order.splice(0, stages).map((i) => ({ sum: values[i]!, units: [i] })));
  const width = (row: readonly Stage[]): number =>
    Math.max(...row.map((s) => s.sum)) - Math.min(...row.map((s) => s.sum));
  while (rows.length > 1) {
    rows = rows.sort((a, b) => width(b) - width(a));
    const [first, second, ...rest] = rows;
    const up = [...first!].sort((a, b) => a.sum - b.sum);
    const down = [...second!].sort((a, b) => b.sum - a.sum);
    rows = [...rest, up.map((s, j) => ({ sum: s.sum + down[j]!.sum, units: [...s.units, ...down[j]!.units] }))];
  }
  return rows[0]!.map((s) => s.units);
}

/** Sort and cut, for strings. */
export function cutRival(values: readonly number[], series: number): number[][] {
  const order = falling(values);
  const strings: number[][] = [];
  while (order.length > 0) strings.push(order.splice(0, series));
  return strings;
}
