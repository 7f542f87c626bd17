import { Composer, Lexer, Parser } from 'yaml';
import { failure, success } from '../shelf/fault.ts';
import { forbiddenCharacters, oddBlanks } from './characters.ts';
import { fromYaml } from './from-yaml.ts';
import { readOrdinary } from './ordinary.ts';
import { syntaxFaults } from './syntax-faults.ts';
import { CHOICE } from './sort.ts';
import type { CST } from 'yaml';
import type { Fault, Outcome } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { Node } from './nodes.ts';

/** Collections within collections; deeper ones exhaust the stack of whatever walks them. */
const DEEPEST = 64;

/** The nodes of a text, and what cannot stand in it. An ordinary text has no fault of syntax. */
export function readNodes(source: Source): Outcome<Node> {
  const forbidden = forbiddenCharacters(source);
  if (forbidden.length > 0) return failure(...forbidden);
  const ordinary = readOrdinary(source.text);
  return ordinary === undefined ? readYaml(source) : success(ordinary);
}

/** The nodes of a YAML text: one document, without directives, not nested too deep, without errors of syntax. */
export function readYaml(source: Source): Outcome<Node> {
  const tokens = readTokens(source);
  if (tokens.value === undefined) return failure(...tokens.faults);
  const composer = new Composer(OPTIONS);
  for (const document of composer.compose(tokens.value)) {
    const problems = [...document.errors, ...document.warnings];
    if (problems.length > 0) return failure(...causes(source, syntaxFaults(source, problems)));
    if (document.contents === null || isNothing(document.contents.range, source)) break;
    const faults: Fault[] = [];
    return success(fromYaml(source, document.contents, faults), faults);
  }
  return failure({ place: source.place(0, 0), found: 'an empty file', right: CHOICE });
}

/** Positions of all nodes are kept; text stays text unless YAML 1.2's core schema makes it a number, yes-or-no or null. */
const OPTIONS = {
  schema: 'core',
  version: '1.2',
  strict: true,
  uniqueKeys: false,
  merge: false,
  resolveKnownTags: false,
  stringKeys: true,
  logLevel: 'silent',
  prettyErrors: false,
} as const;

/** Fed token by token, so that a text nested without end is given up at once. */
function readTokens(source: Source): Outcome<readonly CST.Token[]> {
  const parser = new Parser();
  const tokens: CST.Token[] = [];
  for (const lexeme of new Lexer().lex(source.text)) {
    for (const token of parser.next(lexeme)) tokens.push(token);
    if (parser.stack.length > DEEPEST + OUTSIDE) return failure(tooDeep(source, parser.offset));
  }
  for (const token of parser.end()) tokens.push(token);
  const extra = directiveFault(source, tokens) ?? secondDocumentFault(source, tokens);
  return extra === undefined ? success(tokens) : failure(extra);
}

/** The parser's stack holds the document and the scalar being read beside the collections. */
const OUTSIDE = 2;

function tooDeep(source: Source, offset: number): Fault {
  const place = source.place(Math.max(0, offset - 1), offset);
  return { place, found: `values nested deeper than ${DEEPEST}`, right: 'no document needs that; close what is open' };
}

function directiveFault(source: Source, tokens: readonly CST.Token[]): Fault | undefined {
  const token = tokens.find(({ type }) => type === 'directive');
  if (token === undefined) return undefined;
  const written = 'source' in token ? token.source.trim() : '%';
  const place = source.place(token.offset, token.offset + written.length);
  return { place, found: `the directive ${written.slice(0, 40)}`, right: 'remove it: YAML 1.2 is read as it stands' };
}

function secondDocumentFault(source: Source, tokens: readonly CST.Token[]): Fault | undefined {
  const [, second] = tokens.filter(({ type }) => type === 'document');
  if (second === undefined) return undefined;
  const place = source.place(second.offset, second.offset + 3);
  return { place, found: 'a second document in the file', right: 'one document a file: move it to a file of its own' };
}

/** Blanks that only look like blanks are told instead of the errors they cause. */
function causes(source: Source, faults: readonly Fault[]): readonly Fault[] {
  const blanks = oddBlanks(source);
  return blanks.length > 0 ? blanks : faults;
}

function isNothing([start, end]: readonly [number, number, number], source: Source): boolean {
  return source.text.slice(start, end).trim() === '';
}
