import { openRun } from '../quantities/open-run.ts';
import { parseReference } from '../quantities/reference.ts';
import { NO_COUNTS } from '../reports/counts.ts';
import { checkPart } from '../reports/pages/check.ts';
import { tablePage } from '../reports/pages/table.ts';
import { cautionRecords, recipeRecord } from '../reports/records/check.ts';
import { frameRecipe } from '../reports/records/frame.ts';
import { Source } from '../shelf/place.ts';
import { judge } from '../verdicts/judge.ts';
import { drawHeader, drawPage } from './draw.ts';
import { failureOf } from './part.ts';
import { toldFault } from './told-fault.ts';
import type { Run } from '../quantities/run.ts';
import type { Counts } from '../reports/counts.ts';
import type { Page } from '../reports/page.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Judgement } from '../verdicts/judgement.ts';
import type { Drawn, Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';
import type { Sites } from './sites.ts';

/** One recipe, from its text to what is printed of it. It depends on nothing but that recipe, its chamber and its site. */
export function makePart(job: Job, work: Work, sites: Sites): Part {
  try {
    return partOf(job, work, sites);
  } catch (error) {
    return { counts: NO_COUNTS, faults: [], failure: failureOf(error) };
  }
}

function partOf({ file, path, text }: Job, work: Work, sites: Sites): Part {
  const { value: site, faults: siteFaults } = sites.of(path);
  if (site === undefined) return { counts: NO_COUNTS, faults: siteFaults.map((fault) => toldFault('', fault)) };
  const { value: run, faults } = openRun(site, new Source(file, text));
  const made = run === undefined ? NOTHING : MAKERS[work.command](run, work);
  return { ...made, faults: [...faults, ...made.faults].map((fault) => toldFault(site.folder, fault)) };
}

interface Made {
  readonly texts?: readonly Drawn[];
  readonly counts: Counts;
  readonly faults: readonly Fault[];
}

const NOTHING: Made = { counts: NO_COUNTS, faults: [] };

const MAKERS: Readonly<Record<Work['command'], (run: Run, work: Work) => Made>> = {
  check(run, work) {
    const judgement = judge(run, work.today);
    const page = checkPart(judgement, work.check);
    return { texts: drawn(page, work, () => jsonPart(judgement)), counts: page.counts, faults: judgement.faults };
  },
  table(run, work) {
    const columns = work.columns.flatMap((name) => parseReference(name) ?? []);
    const page = tablePage(run, { units: work.check.units, ...(columns.length === 0 ? {} : { columns }) });
    return { texts: drawn(page, work), counts: { ...NO_COUNTS, recipes: 1, steps: run.steps.length }, faults: [] };
  },
};

function drawn(page: Page, { styles }: Work, record?: () => JsonPart): readonly Drawn[] {
  return styles.map((style) => {
    if (style.format === 'json' && record !== undefined) return { header: '', ...record() };
    return { header: drawHeader(page, style), text: drawPage(page, style), cautions: [] };
  });
}

type JsonPart = Pick<Drawn, 'text' | 'cautions'>;

function jsonPart(judgement: Judgement): JsonPart {
  return { text: frameRecipe(recipeRecord(judgement), true), cautions: cautionRecords(judgement) };
}
