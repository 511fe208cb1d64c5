/**
 * The word that is fewest single edits (insert, delete, replace, swap of neighbours) away from a misspelt
 * one; null where none is within a third of its length. Of equally near ones the first.
 */
export function nearestWord(misspelt: string, words: readonly string[]): string | null {
  if (misspelt.length > LONGEST) return null;
  let nearest: string | null = null;
  let fewest = Math.max(2, Math.floor(misspelt.length / 3)) + 1;
  for (const word of words) {
    if (Math.abs(word.length - misspelt.length) >= fewest) continue;
    const edits = editDistance(misspelt.toLowerCase(), word.toLowerCase());
    if (edits < fewest) [nearest, fewest] = [word, edits];
  }
  return nearest;
}

const LONGEST = 200;

/** Fewest insertions, deletions, replacements and swaps of neighbours that turn a into b (optimal string alignment). */
export function editDistance(a: string, b: string): number {
  let before: number[] = [];
  let above = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const replaced = above[j - 1] + (a[i - 1] === b[j - 1] ? 0 : 1);
      row[j] = Math.min(replaced, above[j] + 1, row[j - 1] + 1);
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) row[j] = Math.min(row[j], before[j - 2] + 1);
    }
    [before, above] = [above, row];
  }
  return above[b.length];
}
