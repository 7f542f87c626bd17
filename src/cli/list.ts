import { listProcesses } from '../reports/pages/list-processes.ts';
import { listQuantities } from '../reports/pages/list-quantities.ts';
import { listFilms, listGases } from '../reports/pages/list-substances.ts';
import { listUnits } from '../reports/pages/list-units.ts';
import { diskShelf } from '../shelf/disk.ts';
import { unknownWord } from './problem.ts';
import { sitesOn } from './sites.ts';
import { formatProblem, tellFault, tellProblem } from './tell.ts';
import { fromHere, toldFault } from './told-fault.ts';
import { writePage } from './write-page.ts';
import type { Page } from '../reports/page.ts';
import type { Site } from '../steps/site.ts';
import type { Call, ExitCode } from './call.ts';

/** Lists what there is, what the working folder's site adds included. */
export function list({ args: [what = ''], options, out }: Call): ExitCode {
  const make = LISTS.get(what);
  const problem =
    make === undefined
      ? unknownWord('list', what, [...LISTS.keys()])
      : formatProblem(options, ['text', 'markdown', 'csv']);
  if (make === undefined || problem !== undefined) return problem === undefined ? 2 : tellProblem(out, problem);
  const shelf = diskShelf();
  const { value: site, faults } = sitesOn(shelf, options.site).of('.');
  for (const fault of faults) tellFault(out, fromHere(shelf, toldFault(site?.folder ?? '.', fault)));
  if (site === undefined) return 2;
  const written = writePage({ options, out }, make(site));
  return faults.length === 0 ? written : 2;
}

const LISTS: ReadonlyMap<string, (site: Site) => Page> = new Map([
  ['quantities', ({ library }: Site) => listQuantities(library)],
  ['processes', (site: Site) => listProcesses(site.processNames().flatMap((name) => site.process(name) ?? []))],
  ['gases', ({ library }: Site) => listGases(library)],
  ['films', ({ library }: Site) => listFilms(library)],
  ['units', () => listUnits()],
]);
