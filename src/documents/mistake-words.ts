import { nearest } from '../units/suggest.ts';
import { either, quoted } from '../units/unit-fault.ts';
import type { SchemaError } from './generated/validators.js';
import type { Value } from './plain.ts';
import type { Rule } from './rules.ts';

/** A value that breaks a rule. */
export interface WrongValue {
  /** The key it stands at. */
  readonly name: string;
  readonly value: Value | undefined;
  /** As it stands in the text. */
  readonly written: string;
  readonly error: SchemaError;
  readonly rules: readonly Rule[];
}

export interface Wording {
  readonly found: string;
  readonly right: string;
}

/** What is wrong with a value, by the keyword of the rule that it breaks. */
export function wrongValue(wrong: WrongValue): Wording {
  const { name, value, error, rules } = wrong;
  const limit = String(error.params.limit);
  switch (error.keyword) {
    case 'type':
      return wrongType(wrong);
    case 'enum':
      return wrongChoice(wrong, listOf(error.params.allowedValues));
    case 'const':
      return wrongChoice(wrong, [String(error.params.allowedValue)]);
    case 'minLength':
      return { found: `${name}: an empty text`, right: `write some text${suchAs(rules)}` };
    case 'maxLength':
      return { found: `${name}: a text of more than ${limit} characters`, right: 'shorten it' };
    case 'minItems':
    case 'minProperties':
      if (limit === '1')
        return {
          found: `${name}: an empty ${Array.isArray(value) ? 'list' : 'map'}`,
          right: 'write at least one entry',
        };
      return { found: `${name}: ${kindOf(value)} of too few entries`, right: `at least ${limit} are needed` };
    case 'maxItems':
    case 'maxProperties':
      return { found: `${name}: ${kindOf(value)} of too many entries`, right: `at most ${limit} can stand here` };
    case 'uniqueItems':
      return { found: `${name}: a list that says the same twice`, right: 'leave one of both out' };
    case 'minimum':
      return { found: `${name}: ${wrong.written}`, right: `a number of at least ${limit} is needed` };
    case 'maximum':
      return { found: `${name}: ${wrong.written}`, right: `a number of at most ${limit} is needed` };
    default:
      return {
        found: `${name}: ${shown(wrong)}`,
        right: described(ruleFor(error.keyword, rules)) ?? `another value is needed${suchAs(rules)}`,
      };
  }
}

/** What to add where a key is missing. */
export function absence(key: string, rules: readonly Rule[]): string {
  const example = exampleOf(rules);
  if (example !== undefined) return `add it, such as ${key}: ${example}`;
  const about = described(rules.find(({ description }) => description !== undefined));
  return about === undefined ? `add ${key}` : `add it: ${about}`;
}

/** The first sentence of a rule's description as a clause. */
export function described(rule: Rule | undefined): string | undefined {
  const text = rule?.description?.replace(/\.(?:\s.*)?$/s, '');
  if (text === undefined) return undefined;
  return /^[A-Z](?![A-Z0-9])/.test(text) ? text.charAt(0).toLowerCase() + text.slice(1) : text;
}

function wrongType(wrong: WrongValue): Wording {
  const { name, value, error, rules } = wrong;
  const types = listOf(error.params.type);
  const found = `${name}: ${shown(wrong)}`;
  if (types.length === 1 && types[0] === 'string' && (typeof value === 'number' || typeof value === 'boolean')) {
    return { found: `${name}: ${wrong.written} without quotes is ${kindOf(value)}`, right: inQuotes(wrong) };
  }
  return { found, right: `${either(types.map((type) => KINDS.get(type) ?? type))} is needed${suchAs(rules)}` };
}

function inQuotes({ value, written }: WrongValue): string {
  const lost = typeof value === 'number' && String(value) !== written ? `, since ${written} is read as ${value}` : '';
  return `write "${written}"${lost}`;
}

function wrongChoice(wrong: WrongValue, choices: readonly string[]): Wording {
  const meant = typeof wrong.value === 'string' ? nearest(wrong.value, choices) : undefined;
  return { found: `${wrong.name}: ${shown(wrong)}`, right: `write ${meant ?? either(choices)}` };
}

function shown({ value, written }: WrongValue): string {
  return typeof value === 'string' ? quoted(value) : typeof value === 'number' ? written : kindOf(value);
}

function kindOf(value: Value | undefined): string {
  if (value === null || value === undefined) return 'no value';
  if (Array.isArray(value)) return 'a list';
  return typeof value === 'object' ? 'a map' : (KINDS.get(typeof value) ?? 'a value');
}

const KINDS: ReadonlyMap<string, string> = new Map([
  ['string', 'text'],
  ['number', 'a number'],
  ['integer', 'a whole number'],
  ['boolean', 'yes or no (true or false)'],
  ['array', 'a list'],
  ['object', 'a map of keys and values'],
]);

function ruleFor(keyword: string, rules: readonly Rule[]): Rule | undefined {
  return rules.find((rule) => Object.hasOwn(rule, keyword) && rule.description !== undefined) ?? rules[0];
}

function suchAs(rules: readonly Rule[]): string {
  const example = exampleOf(rules);
  return example === undefined ? '' : `, such as ${example}`;
}

function exampleOf(rules: readonly Rule[]): string | undefined {
  const example = rules.find((rule) => rule.example !== undefined)?.example;
  return example === undefined ? undefined : String(example);
}

function listOf(parameter: unknown): readonly string[] {
  return Array.isArray(parameter) ? parameter.map(String) : [String(parameter)];
}
