/**
 * The candidate that was probably meant by a misspelt word: one that differs in case, `-`, `_` or blanks only, else the one
 * at the smallest edit distance, as long as that is small for the word's length. Of equally near ones, the one that
 * begins alike for longest. Undefined where none is near.
 */
export function nearest(word: string, candidates: Iterable<string>): string | undefined {
  if (word.length > LONGEST) return undefined;
  const folded = fold(word);
  let best: string | undefined;
  let distance = allowedDistance(folded) + 1;
  let shared = 0;
  for (const candidate of candidates) {
    if (candidate.length > LONGEST) continue;
    const other = fold(candidate);
    if (other === folded) return candidate;
    const found = editDistance(folded, other, distance);
    const start = sharedStart(folded, other);
    const nearer = found < distance || (found === distance && best !== undefined && start > shared);
    if (!nearer || found === Math.max(folded.length, other.length)) continue;
    best = candidate;
    distance = found;
    shared = start;
  }
  return best;
}

/** Names and keys are shorter; a longer word is not worth the time. */
const LONGEST = 64;

function fold(word: string): string {
  return word.toLowerCase().replaceAll('-', '_').replaceAll(' ', '_');
}

function allowedDistance(word: string): number {
  return word.length < 2 ? 0 : Math.min(3, Math.max(1, Math.floor(word.length / 3)));
}

/** How many characters both begin with. */
function sharedStart(a: string, b: string): number {
  let length = 0;
  while (length < a.length && a[length] === b[length]) length += 1;
  return length;
}

/**
 * Optimal string alignment distance: insertions, deletions, replacements and swaps of neighbours (Damerau 1964,
 * Levenshtein 1966). Given up with `limit + 1` once it is sure to exceed the limit.
 */
function editDistance(a: string, b: string, limit: number): number {
  if (Math.abs(a.length - b.length) > limit) return limit + 1;
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, column) => column);
  for (let row = 1; row <= a.length; row += 1) {
    const current = [row];
    let smallest = row;
    for (let column = 1; column <= b.length; column += 1) {
      const cost = stepCost(a, b, row, column, { beforeLast, last, current });
      current.push(cost);
      if (cost < smallest) smallest = cost;
    }
    if (smallest > limit) return limit + 1;
    beforeLast = last;
    last = current;
  }
  return last[b.length] ?? limit + 1;
}

interface Rows {
  readonly beforeLast: readonly number[];
  readonly last: readonly number[];
  readonly current: readonly number[];
}

function stepCost(a: string, b: string, row: number, column: number, { beforeLast, last, current }: Rows): number {
  const same = a[row - 1] === b[column - 1];
  const replaced = (last[column - 1] ?? Infinity) + (same ? 0 : 1);
  const removed = (last[column] ?? Infinity) + 1;
  const inserted = (current[column - 1] ?? Infinity) + 1;
  const swapped = row > 1 && column > 1 && a[row - 1] === b[column - 2] && a[row - 2] === b[column - 1];
  return Math.min(replaced, removed, inserted, swapped ? (beforeLast[column - 2] ?? Infinity) + 1 : Infinity);
}
