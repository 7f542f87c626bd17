import { absence, described, wrongValue } from './mistake-words.ts';
import { nameAt, ownerName, placeOf, pointerOf, within } from './pointers.ts';
import { childOf, keyRule, rulesAt } from './rules.ts';
import { nearest } from '../units/suggest.ts';
import { quoted } from '../units/unit-fault.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { Pointer } from './document.ts';
import type { SchemaError } from './generated/validators.js';
import type { Node } from './nodes.ts';
import type { Value } from './plain.ts';
import type { Rule } from './rules.ts';
import type { Sort } from './sort.ts';

/** A content that does not meet its schema, with the nodes it was read from. */
export interface Rejected {
  readonly source: Source;
  readonly root: Node;
  readonly sort: Sort;
  readonly content: Value;
}

export interface Mistakes {
  /** Wrong keys and values, each at its place. */
  readonly present: readonly Fault[];
  /** What is missing, at the key of the map that lacks it. */
  readonly absent: readonly Fault[];
  /** How many more there are that nobody will read. */
  readonly more: number;
}

/** The errors of a validator in our words, one for each mistake. */
export function mistakes(rejected: Rejected, errors: readonly SchemaError[]): Mistakes {
  const telling = errors.filter(({ keyword }) => !FRAMES.has(keyword));
  const meant = new Set<string>();
  const present: Fault[] = [];
  const absences: SchemaError[] = [];
  for (const error of telling.slice(0, MOST)) {
    if (ABSENCES.has(error.keyword)) absences.push(error);
    else present.push(presentFault(rejected, error, meant));
  }
  // A key that is missing because it is misspelt has been told.
  const untold = absences.filter(
    ({ instancePath, params }) => !meant.has(`${instancePath}/${text(params.missingProperty)}`),
  );
  const absent = untold.map((error) => absentFault(rejected, error));
  return { present, absent, more: Math.max(0, telling.length - MOST) };
}

/** Far more than are told; looking up places and names for any number of them would take seconds. */
const MOST = 100;

/** Keywords whose errors only say that one of another keyword was found further in. */
const FRAMES: ReadonlySet<string> = new Set(['if', 'propertyNames', 'allOf', 'anyOf']);
const ABSENCES: ReadonlySet<string> = new Set(['required', 'dependentRequired']);

function presentFault(rejected: Rejected, error: SchemaError, meant: Set<string>): Fault {
  const { source, root, sort, content } = rejected;
  const pointer = pointerOf(content, error.instancePath);
  const rules = rulesAt(sort, content, pointer);
  if (error.keyword === 'additionalProperties') return unknownKey(rejected, pointer, error, rules, meant);
  if (error.propertyName !== undefined) return wrongName(rejected, pointer, error.propertyName, rules);
  if (error.keyword === 'not') return excluded(rejected, pointer, rules);
  const value = pointer.reduce<Value | undefined>(childOf, content);
  const place = placeOf(source, root, pointer);
  const written = source.text.slice(place.start, place.end);
  return { place, ...wrongValue({ name: nameAt(pointer, sort), value, written, error, rules }) };
}

function unknownKey(
  rejected: Rejected,
  pointer: Pointer,
  error: SchemaError,
  rules: readonly Rule[],
  meant: Set<string>,
): Fault {
  const key = text(error.params.additionalProperty);
  const owner = pointer.reduce<Value | undefined>(childOf, rejected.content);
  const allowed = [...new Set(rules.flatMap(allowedKeys))];
  const free = allowed.filter((name) => childOf(owner, name) === undefined);
  const best = nearest(key, free) ?? nearest(key, allowed);
  if (best !== undefined) meant.add(`${error.instancePath}/${best}`);
  return {
    place: placeOf(rejected.source, rejected.root, [...pointer, key], 'key'),
    found: `unknown key ${quoted(key)}${within(owner, pointer, rejected.sort)}`,
    right: best === undefined ? `keys that can stand here: ${free.join(', ')}` : `write ${best}`,
  };
}

function allowedKeys({ properties = {} }: Rule): readonly string[] {
  return Object.keys(properties).filter((key) => {
    const rule = properties[key];
    return typeof rule !== 'object' || rule.not === undefined;
  });
}

function wrongName(
  { source, root, sort, content }: Rejected,
  pointer: Pointer,
  name: string,
  rules: readonly Rule[],
): Fault {
  const place = placeOf(source, root, [...pointer, name], 'key');
  const owner = pointer.reduce<Value | undefined>(childOf, content);
  const right = described(keyRule(rules)) ?? 'write a plain name';
  return { place, found: `the name ${quoted(name)}${within(owner, pointer, sort)}`, right };
}

function excluded({ source, root, sort }: Rejected, pointer: Pointer, rules: readonly Rule[]): Fault {
  const rule = rules.find(({ not }) => not !== undefined);
  const place = placeOf(source, root, pointer, 'key');
  return { place, found: `${nameAt(pointer, sort)} beside what excludes it`, right: described(rule) ?? 'leave it out' };
}

function absentFault({ source, root, sort, content }: Rejected, { instancePath, params }: SchemaError): Fault {
  const pointer = pointerOf(content, instancePath);
  const key = text(params.missingProperty);
  const owner = pointer.reduce<Value | undefined>(childOf, content);
  const place = placeOf(source, root, pointer, typeof pointer.at(-1) === 'string' ? 'key' : 'value');
  const found = `no ${key} in ${ownerName(owner, pointer, sort)}`;
  return { place, found, right: absence(key, rulesAt(sort, content, [...pointer, key])) };
}

function text(parameter: unknown): string {
  return typeof parameter === 'string' ? parameter : '';
}
