import { describe, expect, test } from 'vitest';
import type { Note } from '../../src/verdicts/verdict.ts';
import { byName, judged, tried, type Trial } from './trial.ts';

interface Terms {
  readonly assumption?: string;
  readonly until?: string;
  readonly holdsTo?: string;
}

function waiver(
  { assumption = 'energetic-arrival', until = '2026-12-31', holdsTo = '' }: Terms = {},
  indent = '      ',
): string {
  const limit = holdsTo === '' ? '' : `\n${indent}  holds_to: ${holdsTo}`;
  return `${indent}- assumption: ${assumption}${limit}
${indent}  reason: "Qualified on lot 41."
${indent}  approved_by: process integration
${indent}  until: ${until}
`;
}

/** Titanium over 60 mm at 60 mTorr: a thermalisation ratio near 6, at most 2. */
function film(waivers: string, { pressure = '60 mTorr', process = 'sputter' } = {}): string {
  return `  - name: film
    process: ${process}
    time: 60 s
    pressure: ${pressure}
    flows: { Ar: 200 sccm }
    targets: { ti: { voltage: 600 V } }
    surface: { grows: Ti, rate: 400 nm/min }
${waivers === '' ? '' : `    waivers:\n${waivers}`}`;
}

function outcome(steps: string, trial: Trial = {}) {
  const judgement = judged(steps, trial);
  const notes: readonly Note['kind'][] = judgement.notes.map(({ kind }) => kind);
  return { verdict: byName(judgement).get('sputter/energetic-arrival'), notes };
}

describe('a waiver', () => {
  test('is told with its finding, which stays what it is', () => {
    const { verdict, notes } = outcome(film(waiver()));
    expect(verdict).toMatchObject({
      kind: 'fail',
      waived: { reason: 'Qualified on lot 41.', approved_by: 'process integration', until: '2026-12-31' },
    });
    expect(notes).toEqual([]);
  });

  test('holds on its last day and not after', () => {
    expect(outcome(film(waiver()), { today: '2026-12-31' }).verdict?.waived).toBeDefined();
    const after = outcome(film(waiver()), { today: '2027-01-01' });
    expect(after.verdict?.waived).toBeUndefined();
    expect(after.notes).toEqual(['waiver-expired']);
  });

  test('may name its process too', () => {
    expect(outcome(film(waiver({ assumption: 'sputter/energetic-arrival' }))).verdict?.waived).toBeDefined();
  });

  test('holds up to the value for which it was granted, of an upper bound', () => {
    expect(outcome(film(waiver({ holdsTo: '7' }))).verdict?.waived).toMatchObject({ holds_to: 7 });
    const outgrown = outcome(film(waiver({ holdsTo: '4' })));
    expect(outgrown.verdict?.waived).toBeUndefined();
    expect(outgrown.notes).toEqual(['waiver-outgrown']);
  });

  test('holds down to the value for which it was granted, of a lower bound', () => {
    const line = (holdsTo: string) =>
      byName(
        judged(
          film(waiver({ assumption: 'free-throw', holdsTo }), {
            pressure: '10 mTorr',
            process: 'sputter-line-of-sight',
          }),
        ),
      ).get('sputter-line-of-sight/free-throw');
    const { value = NaN } = line('0.01') ?? {};
    expect(line('0.01')?.waived).toBeDefined();
    expect(line(String(value * 1.01))?.waived).toBeUndefined();
    expect(line(String(value))?.waived, 'the very value').toBeDefined();
  });

  test('with a value in a wrong unit is a fault, and waives nothing', () => {
    const { judgement, faults } = tried(film(waiver({ holdsTo: '5 mTorr' })));
    expect(faults.map(({ found }) => found)).toEqual([expect.stringMatching(/^holds_to: /)]);
    expect(byName(judgement).get('sputter/energetic-arrival')?.waived).toBeUndefined();
  });

  test('that meets no finding is a note', () => {
    expect(outcome(film(waiver(), { pressure: '5 mTorr' })).notes).toEqual(['waiver-unused']);
  });

  test('granted up to a value does not cover a number that nobody knows, one without a value does', () => {
    const unknown = outcome(film(waiver({ holdsTo: '7' }), { pressure: 'unknown' }));
    expect(unknown.verdict).toMatchObject({ kind: 'open' });
    expect(unknown.verdict?.waived).toBeUndefined();
    expect(outcome(film(waiver(), { pressure: 'unknown' })).verdict?.waived).toBeDefined();
  });

  test('that has ended leaves the place to a newer one', () => {
    const { verdict, notes } = outcome(film(waiver({ until: '2025-12-31' }) + waiver()));
    expect(verdict?.waived).toMatchObject({ until: '2026-12-31' });
    expect(notes).toEqual([]);
  });

  test('at the recipe stands for every step below, and is unused only where none meets it', () => {
    const head = `waivers:\n${waiver({}, '  ')}`;
    const two = film('') + film('').replace('name: film', 'name: again');
    const judgement = judged(two, { head });
    const waived = judgement.steps.map(({ verdicts }) => verdicts.filter((one) => one.waived !== undefined).length);
    expect(waived).toEqual([1, 1]);
    expect(judgement.notes).toEqual([]);
    expect(judged(film('', { pressure: '5 mTorr' }), { head }).notes.map(({ kind }) => kind)).toEqual([
      'waiver-unused',
    ]);
  });

  test('of a name that the step does not have is a fault', () => {
    const { faults } = tried(film(waiver({ assumption: 'energetic-arival' })));
    expect(faults).toHaveLength(1);
    expect(faults[0]?.right).toContain('energetic-arrival');
  });
});

test('a recipe qualified on another revision of its chamber is a note', () => {
  const head = "qualified_on: '1'\n";
  expect(judged(film('', { pressure: '5 mTorr' }), { head }).notes).toMatchObject([
    { kind: 'chamber-revision', qualifiedOn: '1', revision: '2' },
  ]);
  expect(judged(film('', { pressure: '5 mTorr' }), { head: "qualified_on: '2'\n" }).notes).toEqual([]);
});
