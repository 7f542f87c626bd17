import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import stringWidth from 'fast-string-width';
import { csvHeader, csvRows } from '../../src/reports/formats/csv.ts';
import { drawMarkdown } from '../../src/reports/formats/markdown.ts';
import { drawText } from '../../src/reports/formats/text.ts';
import { widthOf, wrap } from '../../src/reports/formats/wrap.ts';
import { checkPart } from '../../src/reports/pages/check.ts';
import { tablePage } from '../../src/reports/pages/table.ts';
import type { Block, Table } from '../../src/reports/page.ts';
import { deposit, judged, runOf } from './run.ts';

const OPTIONS = { units: new Map(), fold: 'none', blockAt: 'error', unproven: false } as const;
const CHECK = checkPart(judged(deposit('5 mTorr')), OPTIONS).blocks;

const TABLE: Table = {
  kind: 'table',
  columns: [
    { title: 'step', align: 'left' },
    { title: 'p', align: 'right' },
    { title: 'why', align: 'left', wraps: true },
  ],
  rows: [['a', '5 mTorr', 'one two three four five six seven eight nine ten eleven twelve']],
  key: 1,
};

describe('text', () => {
  test.each([72, 100, 120])('keeps within %i columns', (width) => {
    const lines = drawText([...CHECK, TABLE], { width, colour: 0 }).split('\n');
    expect(Math.max(...lines.map((line) => stringWidth(line)))).toBeLessThanOrEqual(width);
  });

  test('has the kind as a word in the first column and no sign beside letters', () => {
    const text = drawText(CHECK, { width: 100, colour: 0 });
    expect(text).toMatch(/^ {4}fail {4}error {4}slowing/m);
    expect(text).not.toMatch(/[✓✔✗✘×•●○·…—–→]/u);
  });

  test('without colour has no escapes, with colour the same letters', () => {
    const plain = drawText(CHECK, { width: 100, colour: 0 });
    const coloured = drawText(CHECK, { width: 100, colour: 1 });
    expect(plain).not.toContain('\u001b');
    expect(coloured).toContain('\u001b[1m');
    expect(
      coloured
        .split('\u001b')
        .map((piece, index) => (index === 0 ? piece : piece.slice(piece.indexOf('m') + 1)))
        .join(''),
    ).toBe(plain);
  });

  test('draws a table that is too wide in pieces that repeat its key', () => {
    const columns = Array.from({ length: 8 }, (_, index) => ({ title: `column-${index}`, align: 'right' as const }));
    const wide: Table = {
      kind: 'table',
      columns: [{ title: 'step', align: 'left' }, ...columns],
      rows: [['settle', ...columns.map(({ title }) => title)]],
      key: 1,
    };
    const text = drawText([wide], { width: 60, colour: 0 });
    expect(text.match(/settle/g)?.length).toBeGreaterThan(1);
    for (const { title } of columns) expect(text).toContain(title);
  });
});

describe('wrapping', () => {
  test('loses no word and keeps to the width where words allow it', () => {
    fc.assert(
      fc.property(
        fc.array(fc.stringMatching(/^[a-z±λ]{1,12}$/), { minLength: 1, maxLength: 30 }),
        fc.integer({ min: 12, max: 60 }),
        (words, width) => {
          const lines = wrap(words.join(' '), width);
          expect(lines.join(' ')).toBe(words.join(' '));
          for (const line of lines) expect(widthOf(line)).toBeLessThanOrEqual(width);
        },
      ),
    );
  });

  test('counts columns as a terminal does', () => {
    for (const text of ['0.5 ± 0.1', 'Kn = λ/L', 'pression élevée', '圧力', 'm³'])
      expect(widthOf(text)).toBe(stringWidth(text));
  });
});

describe('CSV', () => {
  test('quotes what RFC 4180 asks for and ends records with CR LF', () => {
    expect(csvHeader({ columns: ['a', 'b'] })).toBe('a,b\r\n');
    expect(csvRows({ columns: ['a', 'b'], rows: [['x, "y"', 'line\nfeed']] })).toBe('"x, ""y""","line\nfeed"\r\n');
  });

  test('leaves negative numbers alone and sets formulas off', () => {
    expect(csvRows({ columns: ['a'], rows: [['-1.5'], ['=1+1']] })).toBe("-1.5\r\n'=1+1\r\n");
  });

  test('has as many cells in every row as in the header', () => {
    const sheets = [
      checkPart(judged(deposit('5 mTorr')), OPTIONS).sheet(),
      tablePage(runOf(deposit('5 mTorr')), { units: new Map() }).sheet(),
    ];
    for (const { columns, rows } of sheets) for (const row of rows) expect(row).toHaveLength(columns.length);
  });
});

describe('wrapping', () => {
  test('leaves a number, its uncertainty and its unit together', () => {
    expect(wrap('residual H2O 95 %, pressure 5.00 ± 0.12 mTorr', 17)).toEqual([
      'residual H2O',
      '95 %, pressure',
      '5.00 ± 0.12 mTorr',
    ]);
  });
});

describe('Markdown', () => {
  const text = drawMarkdown(CHECK);

  test('has the recipe as heading, the steps as table, a finding as item', () => {
    expect(text).toMatch(/^## sample$/m);
    expect(text).toMatch(/^\| +# \| step +\|/m);
    expect(text).toMatch(/^- \*\*fail\*\* \(error\): slowing Knudsen number/m);
  });

  test('lets no text of a recipe act as a mark', () => {
    const blocks: readonly Block[] = [{ kind: 'note', text: 'see <b>*this*</b> | `code` and snake_case' }];
    expect(drawMarkdown(blocks)).toBe('**Note:** see \\<b\\>\\*this\\*\\</b\\> \\| \\`code\\` and snake_case\n\n');
  });
});
