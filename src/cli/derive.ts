import { openRun } from '../quantities/open-run.ts';
import { derivePage } from '../reports/pages/derive.ts';
import { failure } from '../shelf/fault.ts';
import { anchored, relative } from '../shelf/paths.ts';
import { nearest } from '../units/suggest.ts';
import { judge } from '../verdicts/judge.ts';
import { checkedReference } from './checked-reference.ts';
import { givenShelf } from './given-shelf.ts';
import { sitesOn } from './sites.ts';
import { formatProblem, tellFault, tellProblem } from './tell.ts';
import { fromHere, toldFault } from './told-fault.ts';
import { writePage } from './write-page.ts';
import type { Run } from '../quantities/run.ts';
import type { Derived } from '../reports/pages/derive.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';
import type { JudgedStep, Judgement } from '../verdicts/judgement.ts';
import type { Call, ExitCode } from './call.ts';
import type { Problem } from './problem.ts';

/** Shows how a number or a verdict of one step comes about. */
export function derive({ args: [path = '', step = '', what = ''], options, out }: Call): ExitCode {
  const unwritten = formatProblem(options, ['text', 'markdown', 'csv']);
  if (unwritten !== undefined) return tellProblem(out, unwritten);
  const { value: run, faults } = runAt(path, options);
  for (const fault of faults) tellFault(out, fault);
  if (run === undefined) return 2;
  const judgement = judge(run, options.today);
  const judged = stepAsked(judgement, step);
  if ('problem' in judged) return tellProblem(out, judged.problem);
  const derived = derivedAsked(judged, what);
  if ('problem' in derived) return tellProblem(out, derived.problem);
  const written = writePage({ options, out }, derivePage(judgement, judged.run, derived, options.units));
  return faults.length === 0 ? written : 2;
}

function runAt(path: string, { at, site: chosen }: Call['options']): Outcome<Run> {
  const { shelf, paths, faults: unread } = givenShelf([path], at);
  const [name] = paths;
  if (name === undefined) return { faults: unread };
  const { value: site, faults: ofSite } = sitesOn(shelf, chosen).of(name);
  if (site === undefined) return { faults: ofSite };
  const here = (fault: Fault): Fault => fromHere(shelf, toldFault(site.folder, fault));
  const source = shelf.read(name, relative(site.folder, anchored(shelf, name)));
  const run = source.value === undefined ? failure(...source.faults) : openRun(site, source.value);
  return { ...run, faults: [...ofSite, ...run.faults].map(here) };
}

/** A step by its path, its number, or its name where only one step has it. */
function stepAsked({ steps }: Judgement, asked: string): JudgedStep | { readonly problem: Problem } {
  const named = steps.filter(({ run }) => run.step.path === asked || String(run.step.number) === asked);
  const alike = named.length > 0 ? named : steps.filter(({ run }) => run.step.name === asked);
  const [only, second] = alike;
  if (only !== undefined && second === undefined) return only;
  if (only !== undefined)
    return { problem: { found: `several steps are named '${asked}'`, right: `one of ${pathsOf(alike)}` } };
  const meant = nearest(
    asked,
    steps.map(({ run }) => run.step.path),
  );
  return {
    problem: {
      found: `no step is named '${asked}'`,
      right: meant === undefined ? `one of ${pathsOf(steps)}` : `did you mean ${meant}?`,
    },
  };
}

function pathsOf(steps: readonly JudgedStep[]): string {
  return steps.map(({ run }) => run.step.path).join(', ');
}

/** What a step judges comes before the numbers of the catalogue: an assumption's own name is asked for to see its verdict. */
function derivedAsked({ verdicts }: JudgedStep, what: string): Derived | { readonly problem: Problem } {
  const verdict = verdicts.find(({ name, assumption }) => name === what || assumption === what);
  if (verdict !== undefined) return { verdict };
  const { reference, problem } = checkedReference(what);
  if (problem === undefined) return { reference };
  const meant = nearest(
    what,
    verdicts.flatMap(({ name, assumption }) => [assumption, name]),
  );
  const judged = verdicts
    .filter(({ process, reference }) => process !== 'chamber-fit' && reference.id !== 'setpoint')
    .map(({ assumption }) => assumption);
  const names = judged.length === 0 ? problem.right : `the step judges ${judged.join(', ')}; or name a number`;
  return { problem: { found: problem.found, right: meant === undefined ? names : `did you mean ${meant}?` } };
}
