// The known word nearest to a mistyped one, for "did you mean".

/** Edit distance between two words: insertions, deletions, replacements and swaps of neighbours. */
function distance(a: string, b: string): number {
  const rows: number[][] = [Array.from({ length: b.length + 1 }, (_, j) => j)];
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let best = Math.min((rows[i - 1]?.[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (rows[i - 1]?.[j - 1] ?? 0) + same);
      if (a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) best = Math.min(best, (rows[i - 2]?.[j - 2] ?? 0) + 1);
      row.push(best);
    }
    rows.push(row);
  }
  return rows[a.length]?.[b.length] ?? 0;
}

/** The nearest of `known`, or null when none is near (more than a third of the letters differ). */
export function nearestWord(word: string, known: readonly string[]): string | null {
  const typed = word.toLowerCase().slice(0, 60);
  let best: string | null = null;
  let least = Math.max(1, Math.floor(typed.length / 3)) + 1;
  for (const candidate of known) {
    const d = distance(typed, candidate.toLowerCase());
    if (d < least) {
      least = d;
      best = candidate;
    }
  }
  return best;
}
