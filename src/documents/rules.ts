import { SCHEMAS } from './generated/schemas.ts';
import type { Pointer } from './document.ts';
import type { Value } from './plain.ts';
import type { Sort } from './sort.ts';

/** What a schema says at one place, as far as messages need it. */
export interface Rule {
  readonly description?: string;
  /** A value that could stand there, where a single one can be shown. */
  readonly example?: string | number | boolean;
  readonly type?: string | readonly string[];
  readonly const?: unknown;
  readonly pattern?: string;
  readonly required?: readonly string[];
  readonly properties?: Readonly<Record<string, Rule | boolean>>;
  readonly additionalProperties?: Rule | boolean;
  readonly propertyNames?: Rule;
  readonly items?: Rule;
  readonly not?: Rule;
  readonly anyOf?: readonly Rule[];
  readonly allOf?: readonly Rule[];
  readonly $ref?: string;
  readonly if?: Rule;
  readonly then?: Rule;
  readonly else?: Rule;
}

/** The rules that hold at a place of a content, those nearest to it first. Needed for messages only, so read late. */
export function rulesAt(sort: Sort, content: Value, pointer: Pointer): readonly Rule[] {
  let value: Value | undefined = content;
  let rules = expanded([referred(`${sort}.json#`)], value);
  for (const step of pointer) {
    value = childOf(value, step);
    rules = expanded(
      rules.flatMap((rule) => below(rule, step)),
      value,
    );
  }
  return rules;
}

/** The rule for the keys of a map, where it has one. */
export function keyRule(rules: readonly Rule[]): Rule | undefined {
  const all = expanded(
    rules.flatMap((rule) => asRules(rule.propertyNames)),
    '',
  );
  return all.find(({ description }) => description !== undefined);
}

/** The value at one step of a pointer. */
export function childOf(value: Value | undefined, step: string | number): Value | undefined {
  if (Array.isArray(value)) return value[Number(step)];
  return isOwn(value, String(step)) ? value[step] : undefined;
}

let schemas: unknown;

function referred(reference: string): Rule {
  schemas ??= JSON.parse(SCHEMAS);
  const [file = '', pointer = ''] = reference.split('#');
  let node: unknown = schemas;
  for (const step of [file, ...pointer.split('/').slice(1)]) node = isRecord(node) ? node[step] : undefined;
  return isRecord(node) ? node : {};
}

function below(rule: Rule, step: string | number): readonly Rule[] {
  if (typeof step === 'number') return asRules(rule.items);
  const { properties, additionalProperties } = rule;
  return asRules(properties !== undefined && Object.hasOwn(properties, step) ? properties[step] : additionalProperties);
}

function asRules(rule: Rule | boolean | undefined): readonly Rule[] {
  return typeof rule === 'object' ? [rule] : [];
}

/** The rules with all that they refer to and all branches that the value takes. */
function expanded(rules: readonly Rule[], value: Value | undefined): readonly Rule[] {
  return rules.flatMap((rule) => [rule, ...expanded(implied(rule, value), value)]);
}

function implied(rule: Rule, value: Value | undefined): readonly Rule[] {
  const branch = rule.if === undefined ? undefined : holds(rule.if, value) ? rule.then : rule.else;
  return [
    ...(rule.$ref === undefined ? [] : [referred(rule.$ref)]),
    ...(rule.allOf ?? []),
    ...(branch === undefined ? [] : [branch]),
  ];
}

/** Whether a value meets a condition; the keywords are those that conditions of the schemas use. */
function holds(condition: Rule | boolean, value: Value | undefined): boolean {
  if (typeof condition === 'boolean') return condition;
  if (condition.type !== undefined && condition.type !== typeOf(value)) return false;
  if ('const' in condition && condition.const !== value) return false;
  if (condition.required?.some((key) => !isOwn(value, key)) === true) return false;
  if (condition.anyOf?.some((one) => holds(one, value)) === false) return false;
  return Object.entries(condition.properties ?? {}).every(
    ([key, rule]) => !isOwn(value, key) || holds(rule, value[key]),
  );
}

function typeOf(value: Value | undefined): string {
  if (Array.isArray(value)) return 'array';
  return value === null ? 'null' : typeof value;
}

function isOwn(value: Value | undefined, key: string): value is Record<string, Value> {
  return typeof value === 'object' && value !== null && !Array.isArray(value) && Object.hasOwn(value, key);
}

function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null;
}
