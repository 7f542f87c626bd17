import { failure, success } from '../shelf/fault.ts';
import { Source } from '../shelf/place.ts';
import { limited } from './fault-list.ts';
import { sortOfNodes } from './heading.ts';
import { placeOf } from './pointers.ts';
import { plainValue } from './plain.ts';
import { readNodes } from './syntax.ts';
import { isSound } from './validate.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';
import type { AnyDocument, Document } from './document.ts';
import type { Node } from './nodes.ts';
import type { Sort } from './sort.ts';
import type { Report } from './validate.ts';

/** The document that a text spells, or everything that is wrong with it, each fault at its place. */
export function readDocument(source: Source): Outcome<AnyDocument> {
  const text = withoutMark(source);
  const { value: root, faults } = readNodes(text);
  if (root === undefined) return limited(faults);
  const sort = sortOfNodes(text, root);
  return typeof sort === 'string' ? documentOf(text, root, faults, sort) : withoutSort(sort, faults);
}

export function readRecipe(source: Source): Outcome<Document<'recipe'>> {
  return readAs(source, 'recipe');
}

export function readChamber(source: Source): Outcome<Document<'chamber'>> {
  return readAs(source, 'chamber');
}

export function readSubstances(source: Source): Outcome<Document<'substances'>> {
  return readAs(source, 'substances');
}

export function readProcess(source: Source): Outcome<Document<'process'>> {
  return readAs(source, 'process');
}

export function readSite(source: Source): Outcome<Document<'site'>> {
  return readAs(source, 'site');
}

function readAs<S extends Sort>(given: Source, wanted: S): Outcome<Document<S>> {
  const source = withoutMark(given);
  const { value: root, faults } = readNodes(source);
  if (root === undefined) return limited(faults);
  const sort = sortOfNodes(source, root);
  if (typeof sort !== 'string') return withoutSort(sort, faults);
  if (sort === wanted) return toDocument(source, root, faults, wanted);
  const place = placeOf(source, root, ['regimen']);
  return failure({ place, found: `regimen: a ${sort} document`, right: `a ${wanted} document is needed here` });
}

/** A fault found before may be why the heading is none: `{regimen:recipe 1}`. */
function withoutSort(heading: Fault, before: readonly Fault[]): Outcome<never> {
  return before.length > 0 ? limited(before) : failure(heading);
}

/** A byte order mark at the start is no part of the text and of no column. */
function withoutMark(source: Source): Source {
  return source.text.startsWith('\uFEFF') ? new Source(source.file, source.text.slice(1)) : source;
}

function documentOf(source: Source, root: Node, faults: readonly Fault[], sort: Sort): Outcome<AnyDocument> {
  switch (sort) {
    case 'recipe':
      return toDocument(source, root, faults, sort);
    case 'chamber':
      return toDocument(source, root, faults, sort);
    case 'substances':
      return toDocument(source, root, faults, sort);
    case 'process':
      return toDocument(source, root, faults, sort);
    case 'site':
      return toDocument(source, root, faults, sort);
  }
}

function toDocument<S extends Sort>(
  source: Source,
  root: Node,
  faults: readonly Fault[],
  sort: S,
): Outcome<Document<S>> {
  const report: Report = { faults: [...faults], more: 0 };
  const content = plainValue(source, root, report.faults);
  if (!isSound({ source, root, sort, content }, sort, content, report)) return limited(report.faults, report.more);
  return success({ sort, source, content, place: (pointer, part) => placeOf(source, root, pointer, part) });
}
