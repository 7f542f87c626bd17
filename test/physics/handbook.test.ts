import { describe, expect, test } from 'vitest';
import { entriesOf, exportsOf, halfLastDigit, physicsFiles, type Entry } from './handbook.ts';

/** Units that doc comments may use: powers and products of these, of SI and of nothing else. */
const SYMBOL = /^(?:1|none|any|(?:m|kg|s|K|mol|A|J|Pa|W|V|C|F)(?:\d+(?:\.\d+)?)?)$/;

const filesOfLaws = physicsFiles().filter((file) => entriesOf(file).length > 0);

describe.each(filesOfLaws)('%s.ts', (file) => {
  const entries = entriesOf(file);

  test.each(entries)('$name documents its parameters in order', ({ parameters, documented }) => {
    expect(documented.map(({ name }) => name)).toEqual(parameters);
  });

  test.each(entries)('$name states an SI unit for each parameter and its result', ({ documented, returns }) => {
    for (const unit of [...documented.map((parameter) => parameter.unit), returns]) {
      for (const part of unit?.split(', ') ?? ['']) expect(part.split(/[ /()]+/).filter(Boolean)).toSatisfy(allSymbols);
    }
  });

  test.each(entries)('$name names its source and says where it holds', ({ source, range }) => {
    expect(source ?? '').not.toBe('');
    expect(range ?? '').not.toBe('');
  });

  test.each(entries)('$name gives its worked values to the printed digits', async (entry) => {
    expect(entry.examples).not.toEqual([]);
    const law = await lawOf(entry);
    for (const { arguments: given, result } of entry.examples) expectPrinted(law(...given), result);
  });
});

test('every exported function is found by the reader of doc comments', async () => {
  for (const file of physicsFiles()) {
    const functions = [...(await exportsOf(file))].filter(([, value]) => typeof value === 'function');
    expect(namesOf(entriesOf(file))).toEqual(namesOf(functions.map(([name]) => ({ name }))));
  }
});

test('half of the last printed digit is the tolerance', () => {
  expect(halfLastDigit('397.5')).toBeCloseTo(0.05, 12);
  expect(halfLastDigit('2.47e20')).toBeCloseTo(0.5e18, -5);
  expect(halfLastDigit('12')).toBe(0.5);
});

function allSymbols(parts: readonly string[]): boolean {
  return parts.length > 0 && parts.every((part) => SYMBOL.test(part));
}

function namesOf(entries: readonly { readonly name: string }[]): readonly string[] {
  return entries.map(({ name }) => name).sort();
}

async function lawOf({ file, name }: Entry): Promise<(...given: readonly unknown[]) => unknown> {
  const law = (await exportsOf(file)).get(name);
  if (typeof law !== 'function') throw new Error(`${file} exports no ${name}`);
  return (...given): unknown => Reflect.apply(law, undefined, given);
}

/** A number must agree to the printed digits; of an object each member; a text exactly. */
function expectPrinted(actual: unknown, printed: string): void {
  if (typeof actual === 'object' && actual !== null) {
    const members = [...printed.matchAll(/"(\w+)": ([^,}]+)/g)];
    expect(Object.keys(actual)).toEqual(members.map(([, name]) => name));
    for (const [, name = '', member = ''] of members) expectPrinted(Reflect.get(actual, name), member);
  } else if (typeof actual === 'string') {
    expect(JSON.stringify(actual)).toBe(printed);
  } else {
    const gap = Math.abs(Number(actual) - Number(printed));
    expect(gap, `${String(actual)} against ${printed}`).toBeLessThanOrEqual(halfLastDigit(printed) * (1 + 1e-9));
  }
}
