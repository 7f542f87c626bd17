import { DIMENSIONS, DIMENSION_NAMES } from '../../units/dimensions.ts';
import { unitsOf } from '../../units/lookup.ts';
import type { Unit } from '../../units/table.ts';
import type { Page } from '../page.ts';

/** Every unit that a document may be written in, by dimension, with its factor and where that comes from. */
export function listUnits(): Page {
  const rows = DIMENSION_NAMES.flatMap((dimension) =>
    unitsOf(dimension)
      .filter(({ name }) => name !== '')
      .map((unit, index) => ({ first: index === 0, dimension, unit })),
  );
  return {
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'dimension', align: 'left' },
          { title: 'unit', align: 'left' },
          { title: 'in SI', align: 'left' },
          { title: 'also spelled', align: 'left', wraps: true },
          { title: 'source', align: 'left', wraps: true },
        ],
        rows: rows.map(({ first, dimension, unit }) => [
          first ? dimension : '',
          unit.name,
          factorText(unit),
          (unit.others ?? []).join(', '),
          unit.source,
        ]),
        key: 2,
      },
    ],
    sheet: () => ({
      columns: ['dimension', 'unit', 'factor', 'offset', 'si', 'also', 'source'],
      rows: rows.map(({ dimension, unit }) => [
        dimension,
        unit.name,
        String(unit.factor),
        String(unit.offset ?? 0),
        DIMENSIONS[dimension].si,
        (unit.others ?? []).join(' '),
        unit.source,
      ]),
    }),
  };
}

function factorText({ factor, offset, dimension }: Unit): string {
  const { si } = DIMENSIONS[dimension];
  const unit = si === '1' ? '' : ` ${si}`;
  return `${exact(factor)}${unit}${offset === undefined ? '' : ` + ${offset}${unit}`}`;
}

/** Factors are exact, or quotients of exact numbers, which ten digits tell as well as anybody can use. */
function exact(factor: number): string {
  return String(Number(factor.toPrecision(10))).replace('e+', 'e');
}
