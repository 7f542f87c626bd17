import { describe, expect, test } from 'vitest';
import { isMap } from '../../src/generate/schemas.ts';
import { SCHEMAS, isList, validator } from './schema-files.ts';
import { meant, schemaNodes } from './schema-walk.ts';
import type { SchemaNode } from './schema-walk.ts';

const NODES = schemaNodes();
const KEYS = NODES.filter(({ role }) => role === 'key' || role === 'root').filter(
  ({ file, role }) => file !== 'common.json' || role !== 'root',
);
const name = ({ file, pointer }: SchemaNode): string => `${file}#${pointer}`;
const text = (value: unknown): string => (typeof value === 'string' ? value : '');

describe('what an editor shows of a schema', () => {
  test('every schema compiles in strict mode', () => {
    for (const file of SCHEMAS.keys()) expect(validator(file), file).toBeTypeOf('function');
  });

  test('every key has a title', () => {
    expect(KEYS.filter((key) => text(meant(key).node.title) === '').map(name)).toEqual([]);
  });

  test('every key has a description that ends as a sentence does', () => {
    const bad = KEYS.filter((key) => !/^[A-Z`].{12,}\.$/u.test(text(meant(key).node.description)));
    expect(bad.map(name)).toEqual([]);
  });

  test('every key has an example', () => {
    const lacking = KEYS.filter((key) => {
      const { examples } = meant(key).node;
      return !isList(examples) || examples.length === 0;
    });
    expect(lacking.map(name)).toEqual([]);
  });

  test('every example is valid where it stands', () => {
    for (const node of NODES) {
      const examples = node.node.examples;
      if (!isList(examples)) continue;
      const validate = validator(node.file, node.pointer);
      for (const example of examples) {
        validate(example);
        expect(validate.errors ?? [], `${name(node)}: ${JSON.stringify(example)}`).toEqual([]);
      }
    }
  });
});

describe('how the schemas are built', () => {
  test('a map of fixed keys takes no others', () => {
    const open = NODES.filter(
      ({ node }) => isMap(node.properties) && node.type === 'object' && node.additionalProperties === undefined,
    );
    expect(open.map(name)).toEqual([]);
  });

  test('every required key is among the keys', () => {
    const bad = NODES.filter(({ node }) => {
      const { required, properties } = node;
      return (
        isList(required) &&
        !required.every((key) => typeof key === 'string' && isMap(properties) && Object.hasOwn(properties, key))
      );
    });
    expect(bad.map(name)).toEqual([]);
  });

  test('no title of a shared map is used twice among the documents', () => {
    const titles = NODES.filter(
      ({ file, role, node }) =>
        role === 'def' && file !== 'check.json' && file !== 'gas.json' && isMap(node.properties),
    ).map(({ node }) => text(node.title));
    expect(titles.filter((title, index) => titles.indexOf(title) !== index)).toEqual([]);
  });

  test('every shared definition is used', () => {
    const used = new Set<string>();
    for (const [file, schema] of SCHEMAS) {
      for (const [, target = ''] of JSON.stringify(schema).matchAll(/"\$ref":"([^"]+)"/g))
        used.add(target.startsWith('#') ? `${file}${target}` : target);
    }
    expect(
      NODES.filter(({ role }) => role === 'def')
        .map(name)
        .filter((def) => !used.has(def)),
    ).toEqual([]);
  });

  test('no keyword stands in them that reports one mistake more than once, or that only some validators know', () => {
    const refused = ['oneOf', 'format', '$dynamicRef', 'unevaluatedProperties', 'unevaluatedItems', '$data'];
    expect(NODES.filter(({ node }) => refused.some((word) => node[word] !== undefined)).map(name)).toEqual([]);
  });
});
