import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { quotedText } from './rule-texts.ts';
import { encodedPlace } from '../documents/encoded.ts';
import { readDocument } from '../documents/read.ts';
import { Source, TextPlace } from '../shelf/place.ts';
import type { AnyDocument, Pointer } from '../documents/document.ts';
import type { Encoded, EncodedFixed, EncodedTolerance } from '../documents/encoded.ts';
import type { Fixed, None, Range, Rest, Unknown } from '../documents/setpoint.ts';

const MAPS = ['gases', 'atoms', 'films', 'ions', 'walls'] as const;

/** The module that holds the built-in documents, one text for each gas, atom, film, ion, wall and process. */
export function dataModule(folder: string): string {
  const documents = [...filesOf(folder, ''), ...filesOf(folder, 'processes')].map((path) => readFile(folder, path));
  const files = documents.map(({ source }) => source.file);
  const maps = MAPS.map((map) =>
    mapCode(
      map,
      documents.flatMap((document, file) => substancesOf(document, file, map)),
    ),
  );
  const processes = mapCode('processes', documents.flatMap(processOf));
  const list = files.map((file) => `  ${quotedText(file)},\n`).join('');
  return `${HEAD}export const FILES: readonly string[] = [\n${list}];\n\n${[...maps, processes].join('\n')}`;
}

const HEAD = `// Made by \`npm run generate\` from the YAML files of this room. Do not edit.

/** Index of the file, and the value with its places as JSON. */
export type Entry = readonly [file: number, json: string];

`;

type Named = readonly [name: string, file: number, value: Encoded];

function filesOf(folder: string, room: string): readonly string[] {
  const names = readdirSync(join(folder, room)).filter((name) => name.endsWith('.yaml'));
  return names.sort().map((name) => (room === '' ? name : `${room}/${name}`));
}

function readFile(folder: string, path: string): AnyDocument {
  const { value, faults } = readDocument(new Source(`built-in/${path}`, readFileSync(join(folder, path), 'utf8')));
  if (value !== undefined) return value;
  const lines = faults.map(
    ({ place, found, right }) => `${place.file}:${place.line}:${place.column} ${found}; ${right}`,
  );
  throw new Error(lines.join('\n'));
}

function substancesOf(document: AnyDocument, file: number, map: (typeof MAPS)[number]): readonly Named[] {
  if (document.sort !== 'substances') return [];
  const entries = Object.entries(document.content[map] ?? {});
  return entries.map(([name, content]) => [name, file, encode(document, content, [map, name])]);
}

function processOf(document: AnyDocument, file: number): readonly Named[] {
  return document.sort === 'process' ? [[document.content.name, file, encode(document, document.content, [])]] : [];
}

function mapCode(map: string, entries: readonly Named[]): string {
  const names = entries.map(([name]) => name);
  const twice = names.find((name, index) => names.indexOf(name) !== index);
  if (twice !== undefined) throw new Error(`${map}: ${twice} stands there twice`);
  const lines = entries.map(
    ([name, file, value]) => `  [${quotedText(name)}, [${file}, ${quotedText(JSON.stringify(value))}]],\n`,
  );
  return `export const ${map.toUpperCase()}: ReadonlyMap<string, Entry> = new Map<string, Entry>([\n${lines.join('')}]);\n`;
}

function encode(document: AnyDocument, value: unknown, pointer: Pointer): Encoded {
  if (typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean') {
    return [placeIn(document, pointer, 'value'), value];
  }
  if (Array.isArray(value)) {
    const entries = value.map((one, index) => encode(document, one, [...pointer, index]));
    return [placeIn(document, pointer, 'key'), 'list', entries];
  }
  if (typeof value !== 'object' || value === null)
    throw new Error(`${document.source.file}: ${pointer.join('.')} is empty`);
  if (isRead(value)) return encodeRead(value);
  const values = Object.entries(value).map(([key, one]): [string, Encoded] => [
    key,
    encode(document, one, [...pointer, key]),
  ]);
  return [placeIn(document, pointer, 'key'), 'map', Object.fromEntries(values)];
}

function placeIn(document: AnyDocument, pointer: Pointer, part: 'key' | 'value'): number {
  const { line, column } = document.place(pointer, part);
  if (column > 999) throw new Error(`${document.source.file}:${line} is too long a line`);
  return encodedPlace(line, column);
}

type Read = Fixed | Range | Unknown | None | Rest;

/** Values of the measure pass, which alone hold a place. */
function isRead(value: object): value is Read {
  return 'place' in value && value.place instanceof TextPlace;
}

function encodeRead(value: Read): Encoded {
  const place = encodedPlace(value.place.line, value.place.column);
  if (value.kind === 'fixed') return encodeFixed(value);
  if (value.kind !== 'range') return [place, 'word', value.kind];
  const [usually, least, most] = [value.usually, value.at_least, value.at_most].map((end) =>
    end === undefined ? 0 : encodeFixed(end),
  );
  return [place, 'range', usually ?? 0, least ?? 0, most ?? 0];
}

function encodeFixed({ measure, place }: Fixed): EncodedFixed {
  const { value, dimension, unit, tolerance } = measure;
  const width: EncodedTolerance | 0 = tolerance === undefined ? 0 : [tolerance.value, tolerance.of];
  return [encodedPlace(place.line, place.column), 'fixed', value, dimension, unit, width];
}
