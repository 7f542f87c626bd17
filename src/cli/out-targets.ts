import { formatOf } from './formats.ts';
import { anchored, folderOf, join, nameOf, relative } from '../shelf/paths.ts';
import type { Shelf } from '../shelf/shelf.ts';
import type { Problem } from './problem.ts';

/**
 * What is wrong with the files that results are to be written to, seen after all links: one that is read by the same call, one
 * that ends otherwise than its format, as documents do, and two names of one file.
 */
export function outProblem(shelf: Shelf, paths: readonly string[], inputs: readonly string[]): Problem | undefined {
  const read = new Map(inputs.map((input) => [placeOf(shelf, input), input]));
  const written = new Map<string, string>();
  for (const path of paths) {
    const place = placeOf(shelf, path);
    const problem = linkProblem(shelf, path, place) ?? doubled(path, read.get(place), written.get(place));
    if (problem !== undefined) return problem;
    written.set(place, path);
  }
  return undefined;
}

/** Where a path leads, after all links; what is not there yet will be in the folder that it names. */
function placeOf(shelf: Shelf, path: string): string {
  const whole = anchored(shelf, path);
  const folder = folderOf(whole);
  return shelf.real(path) ?? join(shelf.real(folder) ?? folder, nameOf(whole));
}

function linkProblem(shelf: Shelf, path: string, place: string): Problem | undefined {
  const format = formatOf(path);
  if (format === undefined || formatOf(place) === format) return undefined;
  const target = relative(shelf.real('.') ?? '.', place);
  return { found: `--out ${path} is a link to '${target}', which is no ${format} file`, right: 'choose another path' };
}

function doubled(path: string, input: string | undefined, before: string | undefined): Problem | undefined {
  if (input !== undefined)
    return { found: `--out ${path} would replace ${input}, which is read`, right: 'choose another path' };
  if (before === undefined) return undefined;
  return before === path
    ? { found: `--out ${path} stands twice`, right: 'name each file once' }
    : { found: `--out ${before} and --out ${path} are one file`, right: 'name each file once' };
}
