import { allQuantities } from '../../quantities/catalogue.ts';
import type { Quantity } from '../../quantities/quantity.ts';
import type { Library } from '../../substances/library.ts';
import { DIMENSIONS } from '../../units/dimensions.ts';
import type { Page } from '../page.ts';
import { needsLength, readsOf } from '../reads-of.ts';
import { listed, sentence } from '../words.ts';

/** Every number of the catalogue: what it is, its law, and what it is read from. */
export function listQuantities(library: Library): Page {
  const quantities = allQuantities().map((quantity) => ({ quantity, reads: readsOf(quantity, library) }));
  return {
    blocks: [
      {
        kind: 'entries',
        entries: quantities.map(({ quantity, reads }) => ({
          name: nameOf(quantity),
          aside: [quantity.symbol, DIMENSIONS[quantity.dimension].si].filter((text) => text !== '1').join('   '),
          lines: [
            { weight: 'first', text: quantity.statement },
            { weight: 'detail', text: sentence(`source: ${quantity.source}`) },
            ...(reads.length === 0 ? [] : [{ weight: 'detail' as const, text: `Read from ${listed(reads)}.` }]),
          ],
        })),
      },
    ],
    sheet: () => ({
      columns: ['id', 'symbol', 'unit', 'statement', 'source', 'reads'],
      rows: quantities.map(({ quantity, reads }) => [
        quantity.id,
        quantity.symbol,
        DIMENSIONS[quantity.dimension].si,
        quantity.statement,
        quantity.source,
        reads.join(' '),
      ]),
    }),
  };
}

/** The id with what may follow it: `knudsen.LENGTH[:SUBJECT]`. */
function nameOf({ id, lengths, subjects, whole }: Quantity): string {
  const subject = subjects === undefined ? '' : whole === true ? '[:SUBJECT]' : ':SUBJECT';
  const length = lengths === undefined ? '' : needsLength(id) ? '.LENGTH' : '[.LENGTH]';
  return `${id}${length}${subject}`;
}
