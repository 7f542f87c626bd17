import type { Judgement } from '../../verdicts/judgement.ts';
import type { Verdict } from '../../verdicts/verdict.ts';
import type { StepRun } from '../../quantities/run.ts';
import { referenceName } from '../../quantities/reference.ts';
import { printNumber } from '../../units/display.ts';
import type { Sheet } from '../page.ts';
import { verdictDimension, verdictMessage, verdictUnit } from '../sentences.ts';
import { inUnit, spreadInUnit, type Shown } from '../shown.ts';

/** One row a verdict, its numbers in cells of their own. */
export function checkSheet({ run, steps }: Judgement, shown: Shown): Sheet {
  const { file, name } = run.recipe;
  const rows = steps.flatMap((step) =>
    step.verdicts.map((verdict) => [
      file,
      name,
      String(step.run.step.number),
      step.run.step.path,
      ...verdictCells(verdict, step.run, shown),
    ]),
  );
  return { columns: COLUMNS, rows };
}

const COLUMNS: readonly string[] = [
  'file',
  'recipe',
  'step_number',
  'step',
  'process',
  'assumption',
  'kind',
  'level',
  'waived_until',
  'number',
  'value',
  'uncertainty',
  'unit',
  'side',
  'limit',
  'line',
  'message',
];

function verdictCells(verdict: Verdict, run: StepRun, shown: Shown): readonly string[] {
  const { process, assumption, kind, level, waived, reference, over, value, uncertainty = 0, limit, place } = verdict;
  const dimension = verdictDimension(verdict);
  const unit = value === undefined ? '' : verdictUnit(verdict, value, run, shown);
  const cell = (si: number | undefined): string =>
    si === undefined ? '' : printNumber(inUnit(shown, si, unit, dimension));
  return [
    process,
    assumption,
    kind,
    level,
    waived?.until ?? '',
    over === undefined ? referenceName(reference) : `${referenceName(reference)} over ${referenceName(over)}`,
    cell(value),
    value === undefined ? '' : printNumber(spreadInUnit(shown, uncertainty, unit, dimension)),
    unit,
    limit?.side ?? '',
    cell(limit?.value),
    String(place.line),
    verdictMessage(verdict, run, shown),
  ];
}
