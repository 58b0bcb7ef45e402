/** Number of single-letter changes (insert, delete, replace) that turn one word into the other. */
export function editDistance(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, i) => i);
  for (let i = 1; i <= a.length; i++) {
    const current = [i];
    for (let j = 1; j <= b.length; j++) {
      const replaced = previous[j - 1]! + (a[i - 1] === b[j - 1] ? 0 : 1);
      current[j] = Math.min(replaced, previous[j]! + 1, current[j - 1]! + 1);
    }
    previous = current;
  }
  return previous[b.length]!;
}

/** The candidate nearest in spelling, ties by order; undefined without candidates. */
export function nearestOf(word: string, candidates: Iterable<string>): string | undefined {
  let best: string | undefined;
  let least = Infinity;
  for (const candidate of candidates) {
    const distance = editDistance(word.slice(0, 80).toLowerCase(), candidate);
    if (distance < least) [best, least] = [candidate, distance];
  }
  return best;
}
