/**
 * The known name that a mistyped one most likely means.
 *
 * Letter case is ignored; a known name that begins the word, or that the word begins, counts as near ('monday' for 'mon').
 *
 * @param name any text; longer than 60 characters nothing is near
 * @param known names to choose from
 * @returns the nearest known name at most a third of the word's letters away (at least one), or undefined
 * @example nearestName('heatLos', ['heatLoss', 'house']) // 'heatLoss'
 *
 * Reference: distance of optimal string alignment (insert, delete, replace, exchange of neighbours), Damerau 1964.
 */
export function nearestName(name: string, known: Iterable<string>): string | undefined {
  const word = name.toLowerCase();
  if (word.length > 60) return undefined;
  let best: string | undefined;
  let least = Math.max(1, Math.floor(word.length / 3)) + 0.5;
  for (const candidate of known) {
    const other = candidate.toLowerCase();
    const shorter = Math.min(word.length, other.length);
    const begins = shorter >= 3 && (word.startsWith(other) || other.startsWith(word));
    const distance = begins ? Math.min(1, Math.abs(word.length - other.length)) : editDistance(word, other);
    if (distance < least) {
      least = distance;
      best = candidate;
    }
  }
  return best;
}

/**
 * Number of single-letter edits, exchanges of neighbours included, that turn one text into the other.
 *
 * @returns a whole number from 0 to the longer text's length
 * @example editDistance('flow', 'folw') // 1
 */
export function editDistance(a: string, b: string): number {
  let older: number[] = [];
  let before = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1];
      let steps = Math.min((before[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (before[j - 1] ?? 0) + (same ? 0 : 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        steps = Math.min(steps, (older[j - 2] ?? 0) + 1);
      row.push(steps);
    }
    older = before;
    before = row;
  }
  return before[b.length] ?? 0;
}
