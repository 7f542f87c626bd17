import { describe, expect, test } from 'vitest';
import { quantityNamed } from '../../src/quantities/catalogue.ts';
import { parseReference } from '../../src/quantities/reference.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { dimensionOf } from '../../src/steps/addresses.ts';
import { openSite } from '../../src/steps/site.ts';
import { assumptionsOf } from '../../src/verdicts/assumption.ts';
import { processFaults } from '../../src/verdicts/judge.ts';
import { usualRanges } from '../../src/verdicts/stated-limits.ts';
import { step, verdicts } from './trial.ts';

const { value: site } = openSite(mapShelf(new Map([['regimen.yaml', 'regimen: site 1\nname: marsh\n']])), '.');
if (site === undefined) throw new Error('the site cannot be opened');

const PROCESSES = site.processNames().flatMap((name) => site.process(name) ?? []);
const ASSUMPTIONS = PROCESSES.flatMap((process) => assumptionsOf(process).value ?? []);

test('the built-in processes are all there', () => {
  expect(PROCESSES.map(({ name }) => name).sort()).toEqual(
    [
      ...['chamber-fit', 'evaporation', 'evaporation-reactive', 'idle', 'load', 'pecvd', 'pecvd-low-pressure', 'purge'],
      ...[
        'ramp',
        'season',
        'settle',
        'soak',
        'sputter',
        'sputter-line-of-sight',
        'sputter-thermalised',
        'unassessed',
        'vent',
      ],
    ].sort(),
  );
});

test('no built-in process has a fault', () => {
  expect(processFaults(site)).toEqual([]);
});

describe.each(ASSUMPTIONS.map((assumption) => [`${assumption.process}/${assumption.name}`, assumption] as const))(
  '%s',
  (_, { reference, over, bound, limits, statement, source, cure }) => {
    test('speaks of numbers of the catalogue', () => {
      expect(quantityNamed(reference.id)).toBeDefined();
      if (over !== undefined) expect(quantityNamed(over.id)).toBeDefined();
    });

    test('has a bound in grades, each graver one farther out', () => {
      expect(limits.length).toBeGreaterThan(0);
      const { at_least: least = {}, at_most: most = {} } = bound;
      const outwards = (grades: readonly (number | undefined)[]) => grades.filter((one) => one !== undefined);
      const down = outwards([least.note, least.warning, least.error]);
      const up = outwards([most.note, most.warning, most.error]);
      expect(down).toEqual(down.toSorted((a, b) => b - a));
      expect(up).toEqual(up.toSorted((a, b) => a - b));
    });

    test('states what is assumed and where its bound comes from', () => {
      expect(statement).toMatch(/^[A-Z].*\.$/);
      expect(source).not.toBe('');
    });

    test('is cured by setpoints that there are', () => {
      for (const address of cure) expect(address === 'flows' || dimensionOf(address) !== undefined, address).toBe(true);
    });
  },
);

test('a plain bound states its grade, a graded one none', () => {
  for (const { name, assumptions } of PROCESSES) {
    for (const { name: own, atLeast = {}, atMost = {} } of assumptions) {
      expect(Object.keys(atLeast).length + Object.keys(atMost).length, `${name}/${own}`).toBeGreaterThan(0);
    }
  }
});

test('every number that a process shows can be read, is missing or does not apply with a reason', () => {
  const running = [...verdicts(step('soak', 'time: 1 s')).keys()];
  expect(running.length).toBeGreaterThan(0);
  for (const { name, shows } of PROCESSES) {
    for (const shown of shows) {
      const reference = parseReference(shown);
      expect(reference, `${name}: ${shown}`).toBeDefined();
      const quantity = quantityNamed(reference?.id ?? '');
      expect(quantity, `${name}: ${shown}`).toBeDefined();
      if (reference?.length !== undefined) expect(quantity?.lengths, `${name}: ${shown}`).toBeDefined();
      if (reference?.of !== undefined) expect(quantity?.subjects, `${name}: ${shown}`).toBeDefined();
    }
  }
});

test('usual ranges are widened by ten and are notes', () => {
  for (const process of PROCESSES) {
    for (const { bound, nominal, name } of usualRanges(process)) {
      expect(nominal, name).toBe(true);
      const grades = [...Object.keys(bound.at_least ?? {}), ...Object.keys(bound.at_most ?? {})];
      expect(new Set(grades), name).toEqual(new Set(['note']));
    }
  }
  const sputter = PROCESSES.find(({ name }) => name === 'sputter');
  const [pressure] = sputter === undefined ? [] : usualRanges(sputter);
  // 0.5 to 100 mTorr, widened.
  expect(pressure?.bound.at_least?.note).toBeCloseTo(0.05 * 0.1333224, 6);
  expect(pressure?.bound.at_most?.note).toBeCloseTo(133.3224, 3);
});
