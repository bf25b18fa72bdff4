/**
 * The candidates that a mistyped name most likely meant, best first: those that differ only in case, then those
 * few slips away. Equal ones keep the order of the candidates, so list the likeliest first.
 */
export function nearestNames(name: string, candidates: Iterable<string>, most = 3): string[] {
  const allowed = allowedSlips(name.length);
  const folded = name.toLowerCase();
  const near: { candidate: string; slips: number }[] = [];
  for (const candidate of new Set(candidates)) {
    if (candidate === name || Math.abs(candidate.length - name.length) > allowed) continue;
    const slips = candidate.toLowerCase() === folded ? 0 : countSlips(name, candidate);
    // Replacing every letter is not a slip.
    if (slips <= allowed && slips < Math.max(name.length, candidate.length)) near.push({ candidate, slips });
  }
  return near
    .sort((a, b) => a.slips - b.slips)
    .slice(0, most)
    .map(({ candidate }) => candidate);
}

function allowedSlips(length: number): number {
  if (length <= 4) return 1;
  return length <= 8 ? 2 : 3;
}

/** Damerau–Levenshtein distance: insertions, deletions, replacements and swaps of neighbours. A change of case is half a slip. */
function countSlips(a: string, b: string): number {
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      let best = Math.min(at(last, j) + 1, at(row, j - 1) + 1, at(last, j - 1) + replacement(a, i - 1, b, j - 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        best = Math.min(best, at(beforeLast, j - 2) + 1);
      row.push(best);
    }
    beforeLast = last;
    last = row;
  }
  return at(last, b.length);
}

function replacement(a: string, i: number, b: string, j: number): number {
  const from = a.charAt(i);
  const to = b.charAt(j);
  if (from === to) return 0;
  return from.toLowerCase() === to.toLowerCase() ? 0.5 : 1;
}

function at(row: readonly number[], index: number): number {
  return row[index] ?? Infinity;
}
