import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/** What the doc comment of one exported function of src/physics says, beside its signature. */
export interface Entry {
  readonly file: string;
  readonly name: string;
  /** Names in the signature, in order. */
  readonly parameters: readonly string[];
  /** What `@param` says of each, in the order of the comment. */
  readonly documented: readonly { readonly name: string; readonly unit: string | undefined }[];
  readonly returns: string | undefined;
  readonly source: string | undefined;
  /** Where the law holds. */
  readonly range: string | undefined;
  readonly examples: readonly Example[];
}

/** `@example name(arguments) -> result`, arguments and result as JSON. */
export interface Example {
  readonly arguments: readonly unknown[];
  /** As printed: its digits carry the tolerance. */
  readonly result: string;
}

const FOLDER = fileURLToPath(new URL('../../src/physics/', import.meta.url));
const FUNCTION = /(?:\/\*\*((?:(?!\*\/)[\s\S])*)\*\/\s*)?^export function (\w+)\(([\s\S]*?)\)(?:: [^{]+)? \{$/gm;

/** Names of the files of src/physics, without their ending. */
export function physicsFiles(): readonly string[] {
  return readdirSync(FOLDER)
    .filter((name) => name.endsWith('.ts'))
    .map((name) => name.slice(0, -3));
}

export function entriesOf(file: string): readonly Entry[] {
  const text = readFileSync(`${FOLDER}${file}.ts`, 'utf8');
  return [...text.matchAll(FUNCTION)].map(([, comment = '', name = '', parameters = '']) =>
    entry(file, name, parameters, comment),
  );
}

function entry(file: string, name: string, parameters: string, comment: string): Entry {
  const lines = comment.split('\n').map((line) => line.replace(/^\s*\* ?/, ''));
  const tagged = (tag: string) =>
    lines.filter((line) => line.startsWith(`@${tag} `)).map((line) => line.slice(tag.length + 2));
  return {
    file,
    name,
    parameters: namesIn(parameters),
    documented: tagged('param').map((line) => ({ name: line.split(' ')[0] ?? '', unit: unitIn(line) })),
    returns: tagged('returns').map(unitIn)[0],
    source: tagged('source')[0],
    range: lines.find((line) => line.startsWith('Range: ')),
    examples: tagged('example').map((line) => example(line, name)),
  };
}

function namesIn(parameters: string): readonly string[] {
  return parameters
    .split(',')
    .map((parameter) => /^\s*(\w+)/.exec(parameter)?.[1] ?? '')
    .filter((name) => name !== '');
}

function unitIn(line: string): string | undefined {
  return /\[([^\]]+)\]$/.exec(line)?.[1];
}

function example(line: string, name: string): Example {
  const match = /^(\w+)\((.*)\) -> (.+)$/.exec(line);
  const given: unknown = match?.[1] === name ? JSON.parse(`[${match[2] ?? ''}]`) : undefined;
  if (!Array.isArray(given)) return { arguments: [], result: `unreadable: ${line}` };
  return { arguments: given, result: match?.[3] ?? '' };
}

/** What a file of src/physics exports. */
export async function exportsOf(file: string): Promise<ReadonlyMap<string, unknown>> {
  const module: unknown = await import(`../../src/physics/${file}.ts`);
  return new Map(Object.entries(module ?? {}));
}

/** Half a unit of the last digit printed. */
export function halfLastDigit(printed: string): number {
  const match = /^-?\d+(?:\.(\d+))?(?:e([+-]?\d+))?$/.exec(printed);
  return match === null ? NaN : 0.5 * 10 ** (Number(match[2] ?? 0) - (match[1] ?? '').length);
}
