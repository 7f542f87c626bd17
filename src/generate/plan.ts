import { isList, isMap, referred } from './schemas.ts';
import { SORTS } from '../documents/sort.ts';
import { isDimension } from '../units/dimensions.ts';
import type { Json, JsonMap, Located } from './schemas.ts';
import type { MeasurePlan, PlanNode } from '../documents/measure-plan.ts';

type Schemas = ReadonlyMap<string, JsonMap>;

/** The module that says where physical values stand in each sort of document. */
export function planModule(schemas: Schemas): string {
  const planner = new Map<string, number>();
  const nodes: PlanNode[] = [];
  const roots = SORTS.map((sort) => [sort, planOf(schemas, [located(schemas, `${sort}.json`)], planner, nodes)]);
  const kept = pruned(
    nodes,
    roots.map(([, index]) => Number(index)),
  );
  const rootLines = roots
    .map(([sort, index]) => `  ${String(sort)}: ${kept.indices.get(Number(index)) ?? 0},\n`)
    .join('');
  const nodeLines = kept.nodes.map((node) => `  ${JSON.stringify(node)},\n`).join('');
  return `${HEAD}export const ROOTS: Readonly<Record<Sort, number>> = {\n${rootLines}};\n
export const PLAN: readonly PlanNode[] = [\n${nodeLines}];\n`;
}

const HEAD = `// Made by \`npm run generate\` from schemas/. Do not edit.
import type { PlanNode } from '../measure-plan.ts';
import type { Sort } from '../sort.ts';

`;

function located(schemas: Schemas, file: string): Located {
  return referred(schemas, file, '#');
}

/** Index of the node for a place that all these schemas describe, whichever branches a value takes. */
function planOf(schemas: Schemas, start: readonly Located[], known: Map<string, number>, nodes: PlanNode[]): number {
  const applied = closure(schemas, start);
  const name = applied
    .map((one) => identity(one))
    .sort()
    .join(' ');
  const old = known.get(name);
  if (old !== undefined) return old;
  const index = nodes.push({}) - 1;
  known.set(name, index);
  const follow = (next: readonly Located[]): number | undefined =>
    next.length === 0 ? undefined : planOf(schemas, next, known, nodes);
  const keys = Object.fromEntries(keysOf(applied).map((key) => [key, follow(below(applied, key)) ?? 0]));
  const rest = follow(below(applied, undefined));
  const items = follow(applied.flatMap((one) => child(one, one.node.items)));
  const measure = measureOf(applied);
  nodes[index] = {
    ...(measure === undefined ? {} : { measure }),
    ...(Object.keys(keys).length === 0 ? {} : { keys }),
    ...(rest === undefined ? {} : { rest }),
    ...(items === undefined ? {} : { items }),
  };
  return index;
}

const identities = new Map<JsonMap, string>();

function identity({ node }: Located): string {
  const old = identities.get(node) ?? String(identities.size);
  identities.set(node, old);
  return old;
}

/** The schemas with all that they refer to and all their branches, each once. */
function closure(schemas: Schemas, start: readonly Located[]): readonly Located[] {
  const all = new Map<JsonMap, Located>();
  const add = (one: Located): void => {
    if (all.has(one.node)) return;
    all.set(one.node, one);
    if ('patternProperties' in one.node) throw new Error(`${one.file}: patternProperties are not planned for`);
    const { $ref: reference } = one.node;
    if (typeof reference === 'string') add(referred(schemas, one.file, reference));
    for (const branch of ['then', 'else']) child(one, one.node[branch]).forEach(add);
    for (const list of ['allOf', 'anyOf', 'oneOf'])
      listed(one.node[list])
        .flatMap((entry) => child(one, entry))
        .forEach(add);
  };
  start.forEach(add);
  return [...all.values()];
}

function listed(value: Json | undefined): readonly Json[] {
  return isList(value) ? value : [];
}

function child({ file }: Located, node: Json | undefined): readonly Located[] {
  return isMap(node) ? [{ file, node }] : [];
}

function keysOf(applied: readonly Located[]): readonly string[] {
  return [...new Set(applied.flatMap(({ node }) => Object.keys(propertiesOf(node))))];
}

function propertiesOf(node: JsonMap): JsonMap {
  const { properties } = node;
  return isMap(properties) ? properties : {};
}

/** What describes the value of a key; of any key that no schema names where it is undefined. */
function below(applied: readonly Located[], key: string | undefined): readonly Located[] {
  return applied.flatMap((one) => {
    const named = key === undefined ? undefined : propertiesOf(one.node)[key];
    return child(one, named ?? one.node.additionalProperties);
  });
}

function measureOf(applied: readonly Located[]): MeasurePlan | undefined {
  const nodes = applied.filter(({ node }) => node.dimension !== undefined);
  const [first, ...others] = nodes.map(({ file, node }) => toMeasure(file, node));
  const differs = others.some((other) => JSON.stringify(other) !== JSON.stringify(first));
  if (differs)
    throw new Error(`${nodes.map(({ file, node }) => `${file}: ${JSON.stringify(node)}`).join(' and ')} differ`);
  return first;
}

function toMeasure(file: string, node: JsonMap): MeasurePlan {
  const names = [node.dimension ?? ''].flat().map(String);
  const [dimension, ...more] = names.filter(isDimension);
  const forms = listed(node.forms).map(String);
  if (dimension === undefined || names.some((name) => name !== 'accuracy' && !isDimension(name))) {
    throw new Error(`${file}: no dimension ${names.join(', ')}`);
  }
  const words = forms.filter((form) => !FORMS.has(form));
  const { minimum, type } = node;
  return {
    dimensions: [dimension, ...more],
    ...(names.includes('accuracy') ? { accuracy: true } : {}),
    ...(forms.includes('tolerance') ? { tolerance: true } : {}),
    ...(forms.includes('ramp') ? { ramp: true } : {}),
    ...(forms.includes('range') ? { range: true } : {}),
    ...(words.length > 0 ? { words } : {}),
    ...(listed(type).includes('integer') ? { whole: true } : {}),
    ...(typeof minimum === 'number' ? { least: minimum } : {}),
  };
}

const FORMS: ReadonlySet<string> = new Set(['value', 'tolerance', 'ramp', 'range']);

interface Kept {
  readonly nodes: readonly PlanNode[];
  readonly indices: ReadonlyMap<number, number>;
}

/** The nodes from which a physical value can be reached, numbered anew. */
function pruned(nodes: readonly PlanNode[], roots: readonly number[]): Kept {
  const useful = new Set(nodes.flatMap((node, index) => (node.measure === undefined ? [] : [index])));
  for (let size = -1; size !== useful.size;) {
    size = useful.size;
    nodes.forEach((node, index) => {
      if (successors(node).some((next) => useful.has(next))) useful.add(index);
    });
  }
  // Beside `rest`, a key of its own without any value to read has to be told from the others.
  nodes.forEach(({ keys = {}, rest }, index) => {
    if (useful.has(index) && rest !== undefined && useful.has(rest))
      Object.values(keys).forEach((key) => useful.add(key));
  });
  for (const root of roots) useful.add(root);
  const indices = new Map([...useful].sort((a, b) => a - b).map((old, index) => [old, index]));
  return { nodes: [...indices.keys()].map((old) => renumbered(nodes[old] ?? {}, indices)), indices };
}

function successors({ keys = {}, rest, items }: PlanNode): readonly number[] {
  return [...Object.values(keys), rest, items].filter((next) => next !== undefined);
}

function renumbered({ measure, keys, rest, items }: PlanNode, indices: ReadonlyMap<number, number>): PlanNode {
  const named = Object.entries(keys ?? {}).flatMap(([key, old]): [string, number][] => {
    const index = indices.get(old);
    return index === undefined ? [] : [[key, index]];
  });
  const others = rest === undefined ? undefined : indices.get(rest);
  const entries = items === undefined ? undefined : indices.get(items);
  return {
    ...(measure === undefined ? {} : { measure }),
    ...(named.length === 0 ? {} : { keys: Object.fromEntries(named) }),
    ...(others === undefined ? {} : { rest: others }),
    ...(entries === undefined ? {} : { items: entries }),
  };
}
