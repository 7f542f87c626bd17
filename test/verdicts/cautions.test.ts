import { describe, expect, test } from 'vitest';
import { judged, PLOVER, step, type Trial } from './trial.ts';

const CHAMBER: Trial = {
  chamber: PLOVER.replace(
    '  SiH4:',
    '  diluted: { brings: { SiH4: 2 %, N2: rest }, full_scale: 2 slm }\n  NH3: { full_scale: 500 sccm }\n  SiH4:',
  ),
};

function cautions(...flows: readonly string[]) {
  const steps = flows.map((one, index) =>
    step('soak', `time: 60 s, pressure: 100 mTorr, flows: { ${one} }`, `step-${String(index)}`),
  );
  return judged(steps.join('\n'), CHAMBER).cautions;
}

describe('cautions', () => {
  test('name each hazard once, with its gases and the steps that use them', () => {
    expect(cautions('H2: 100 sccm', 'H2: 50 sccm, Ar: 100 sccm')).toEqual([
      { kind: 'hazard', hazard: 'flammable', gases: ['H2'], steps: ['step-0', 'step-1'] },
    ]);
  });

  test('know what a diluted cylinder brings', () => {
    const hazards = cautions('diluted: 1 slm').map((one) => (one.kind === 'hazard' ? one.hazard : one.kind));
    expect(hazards).toContain('pyrophoric');
  });

  test('tell of a fuel with an oxidiser in one step', () => {
    const [first] = cautions('SiH4: 20 sccm, NH3: 100 sccm, O2: 200 sccm');
    expect(first).toEqual({ kind: 'fuel-with-oxidiser', fuels: ['NH3', 'SiH4'], oxidisers: ['O2'], steps: ['step-0'] });
  });

  test('do not call a fuel and an oxidiser of two steps one', () => {
    expect(cautions('H2: 100 sccm', 'O2: 100 sccm').some(({ kind }) => kind === 'fuel-with-oxidiser')).toBe(false);
  });

  test('count a flow that nobody knows, and not one that is shut', () => {
    expect(cautions('H2: unknown, O2: 100 sccm')[0]).toMatchObject({ kind: 'fuel-with-oxidiser' });
    expect(cautions('H2: 0 sccm, O2: 100 sccm').map((one) => one.kind)).toEqual(['hazard']);
    expect(cautions('H2: { from: 0 sccm, to: 100 sccm }, O2: 100 sccm')[0]).toMatchObject({
      kind: 'fuel-with-oxidiser',
    });
  });

  test('are silent for gases without hazards', () => {
    expect(cautions('Ar: 100 sccm, N2: 100 sccm')).toEqual([]);
  });

  test('never change a verdict: the same flow of a harmless gas is judged the same', () => {
    const kinds = (gas: string) =>
      judged(step('soak', `time: 60 s, pressure: 100 mTorr, flows: { ${gas}: 200 sccm }`)).steps[0]?.verdicts.map(
        ({ name, kind, level }) => `${name} ${kind} ${level}`,
      );
    expect(kinds('H2')).toEqual(kinds('Ar'));
    expect(kinds('O2')).toEqual(kinds('Ar'));
  });
});
