/** Stands alone in a line for any number of lines that are not shown. */
const ELIDED = '…';

/** Whether a shown excerpt is true to the whole: its runs of lines stand in it, in their order, and nothing is left out unmarked. */
export function shows(excerpt: readonly string[], whole: readonly string[]): boolean {
  return sameLines(excerpt, refreshed(excerpt, whole));
}

/**
 * The excerpt anew, from what the whole is now: every run of lines is looked for where most of it still stands. An empty
 * excerpt shows the whole.
 */
export function refreshed(excerpt: readonly string[], whole: readonly string[]): readonly string[] {
  const runs = runsOf(excerpt);
  if (runs.length <= 1) return whole;
  let from = 0;
  return runs.flatMap((run, index) => {
    const mark = index === 0 ? [] : [ELIDED];
    if (run.length === 0) return mark;
    const start = index === 0 ? 0 : index === runs.length - 1 ? whole.length - run.length : placeOf(run, whole, from);
    from = start + run.length;
    return [...mark, ...whole.slice(start, from)];
  });
}

/** The runs of lines between the marks; empty at an end where the excerpt starts or ends with a mark. */
function runsOf(excerpt: readonly string[]): readonly (readonly string[])[] {
  const runs: string[][] = [[]];
  for (const line of excerpt) {
    if (line.trim() === ELIDED) runs.push([]);
    else runs.at(-1)?.push(line);
  }
  return runs;
}

function placeOf(run: readonly string[], whole: readonly string[], from: number): number {
  let best = from;
  let most = 0;
  for (let start = from; start + run.length <= whole.length; start++) {
    const same = run.filter((line, index) => line === whole[start + index]).length;
    if (same > most) [best, most] = [start, same];
  }
  if (most === 0) throw new Error(`nothing of this run of lines is left in the output:\n${run.join('\n')}`);
  return best;
}

function sameLines(one: readonly string[], other: readonly string[]): boolean {
  return one.length === other.length && one.every((line, index) => line.trim() === other[index]?.trim());
}
