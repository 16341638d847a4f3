// Full enumeration by the plainest recursion, independent of the searches it checks.

/** Calls `visit` with every division of 0..count-1 into `groups` unnumbered groups of `size`, leaving the rest as spares. */
export function everyDivision(
  count: number,
  { groups, size }: { readonly groups: number; readonly size: number },
  visit: (groups: readonly (readonly number[])[]) => void,
): number {
  let seen = 0;
  const made: number[][] = [];
  const step = (i: number): void => {
    const missing = made.reduce((sum, group) => sum + size - group.length, 0) + (groups - made.length) * size;
    if (missing === 0) {
      seen++;
      visit(made);
      return;
    }
    if (count - i < missing) return;
    for (const group of made) {
      if (group.length === size) continue;
      group.push(i);
      step(i + 1);
      group.pop();
    }
    if (made.length < groups) {
      made.push([i]);
      step(i + 1);
      made.pop();
    }
    step(i + 1);
  };
  step(0);
  return seen;
}

/** n V_max/V - 1 straight from charge division. */
export function stagesGap(values: readonly number[], groups: readonly (readonly number[])[]): number {
  const inverse = groups.map((group) => 1 / group.reduce((sum, i) => sum + values[i]!, 0));
  return (groups.length * Math.max(...inverse)) / inverse.reduce((sum, x) => sum + x, 0) - 1;
}

export function stringsGap(values: readonly number[], groups: readonly (readonly number[])[]): number {
  return Math.max(
    ...groups.map((group) =>
      stagesGap(
        values,
        group.map((i) => [i]),
      ),
    ),
  );
}

/** The least gap over every division. */
export function bestGap(
  values: readonly number[],
  shape: { readonly groups: number; readonly size: number },
  gap: typeof stagesGap,
): number {
  let best = Number.POSITIVE_INFINITY;
  everyDivision(values.length, shape, (groups) => {
    best = Math.min(best, gap(values, groups));
  });
  return best;
}
