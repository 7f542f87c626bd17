import type { AssumptionSpec, GradedLimits, ProcessSpec, UsualRange } from '../../steps/process.ts';
import { isDefault, type Given } from '../../steps/given.ts';
import { printMeasure } from '../../units/display.ts';
import type { Entry, Page, Sheet, Told } from '../page.ts';
import { listed, sentence } from '../words.ts';

/** Every process with the assumptions that it makes, their bounds and sources. */
export function listProcesses(processes: readonly ProcessSpec[]): Page {
  return { blocks: [{ kind: 'entries', entries: processes.map(entryOf) }], sheet: () => sheetOf(processes) };
}

function entryOf({ name, title, remark, basedOn, assumptions, shows, usual, standsIn }: ProcessSpec): Entry {
  const lines: Told[] = [];
  if (remark !== undefined) lines.push({ weight: 'first', text: remark });
  if (basedOn !== undefined) lines.push({ weight: 'detail', text: `Based on ${basedOn}.` });
  for (const assumption of assumptions) lines.push(...assumptionLines(assumption));
  if (assumptions.length === 0) lines.push({ weight: 'first', text: 'Makes no assumption of its own.' });
  if (usual.length > 0) lines.push({ weight: 'detail', text: `Usually ${listed(usual.map(usualText))}.` });
  for (const { given } of standsIn) lines.push({ weight: 'detail', text: standsInText(given) });
  if (shows.length > 0) lines.push({ weight: 'detail', text: `Shows ${listed(shows)}.` });
  return { name, aside: title, lines };
}

function assumptionLines({ name, statement, source, cure, ...bound }: AssumptionSpec): readonly Told[] {
  const cured = cure.length === 0 ? '' : ` Moved by ${listed(cure)}.`;
  return [
    { weight: 'first', text: `${name}: ${boundText(bound)}. ${statement}` },
    { weight: 'detail', text: `${sentence(`source: ${source}`)}${cured}` },
  ];
}

/** The bound as the process states it: "knudsen.gap at most 0.05 (warning), 0.3 (error)". */
function boundText({
  quantity,
  over,
  atLeast,
  atMost,
  when,
}: Pick<AssumptionSpec, 'quantity' | 'over' | 'atLeast' | 'atMost' | 'when'>): string {
  const number = over === undefined ? quantity : `${quantity} over ${over}`;
  const sides = [...sideText('at least', atLeast), ...sideText('at most', atMost)];
  return `${number} ${listed(sides)}${when === undefined ? '' : ', where given'}`;
}

function sideText(side: string, limits: GradedLimits | undefined): readonly string[] {
  if (limits === undefined) return [];
  const graded = GRADES.flatMap((grade) => (limits[grade] === undefined ? [] : [`${limits[grade].is} (${grade})`]));
  return [`${side} ${graded.join(', ')}`];
}

const GRADES = ['note', 'warning', 'error'] as const;

function usualText({ address, atLeast, atMost }: UsualRange): string {
  if (atLeast !== undefined && atMost !== undefined) return `${address} from ${atLeast.is} to ${atMost.is}`;
  return atLeast === undefined ? `${address} at most ${atMost?.is ?? ''}` : `${address} at least ${atLeast.is}`;
}

function standsInText({ address, value, dimension, unit, uncertainty, origin }: Given): string {
  const because = isDefault(origin) ? `; ${origin.because}` : '';
  return sentence(
    `where nobody states it, ${address} is ${printMeasure(value, dimension, { unit, uncertainty: Math.sqrt(3) * uncertainty })}${because}`,
  );
}

function sheetOf(processes: readonly ProcessSpec[]): Sheet {
  const limits = (side: GradedLimits | undefined): readonly string[] =>
    GRADES.map((grade) => String(side?.[grade]?.is ?? ''));
  return {
    columns: [
      'process',
      'title',
      'assumption',
      'number',
      'over',
      'at_least_note',
      'at_least_warning',
      'at_least_error',
      'at_most_note',
      'at_most_warning',
      'at_most_error',
      'when',
      'statement',
      'source',
    ],
    rows: processes.flatMap(({ name, title, assumptions }) =>
      assumptions.map((one) => [
        name,
        title,
        one.name,
        one.quantity,
        one.over ?? '',
        ...limits(one.atLeast),
        ...limits(one.atMost),
        one.when ?? '',
        one.statement,
        one.source,
      ]),
    ),
  };
}
