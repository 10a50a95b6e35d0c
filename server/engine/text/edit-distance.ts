/** Steps of inserting, dropping, changing or swapping neighbours that lead from one to the other. */
export function editDistance(from: string, to: string): number {
  let before: number[] = [];
  let row = Array.from({ length: to.length + 1 }, (_, j) => j);
  for (let i = 1; i <= from.length; i += 1) {
    const next = [i];
    for (let j = 1; j <= to.length; j += 1) {
      const same = from[i - 1] === to[j - 1];
      // Thousands of designations are compared at a time: no list is made for each letter.
      let least = (row[j - 1] ?? 0) + (same ? 0 : 1);
      least = Math.min(least, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1);
      const swapped = i > 1 && j > 1 && from[i - 1] === to[j - 2] && from[i - 2] === to[j - 1];
      if (swapped) least = Math.min(least, (before[j - 2] ?? 0) + 1);
      next.push(least);
    }
    before = row;
    row = next;
  }
  return row[to.length] ?? 0;
}
