import { afterAll, describe, expect, test } from 'vitest';
import { BROKEN, clearFolders, DEMO, FAILING, folderWith, regimen, siteWith, SOUND } from './run.ts';

afterAll(clearFolders);

/** Falls short of a bound graded warning, of none graded error: the flow is below a tenth of its line's range. */
const WARNING = SOUND.replaceAll('Ar: 40 sccm', 'Ar: 7 sccm').replaceAll('3 mTorr', '1 mTorr');
/** Lacks what the settling needs. */
const OPEN = SOUND.replace('time: 10 s', 'time: unknown');

describe('check ends with', () => {
  test('0 where nothing blocks', () => {
    const { code, out, err } = regimen(['check'], { cwd: siteWith({ 'sound.yaml': SOUND }) });
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(out).toMatch(/1 recipe, 4 steps: 4 pass\. {2}Nothing blocks\.\n$/);
  });

  test('1 where a verdict fails with grade error', () => {
    const { code, out, err } = regimen(['check'], { cwd: siteWith({ 'hasty.yaml': FAILING }) });
    expect({ code, err }).toEqual({ code: 1, err: '' });
    expect(out).toMatch(/fail +error +turnovers/);
  });

  test('0 where --block-at never, though a verdict fails', () => {
    expect(regimen(['check', '--block-at', 'never'], { cwd: siteWith({ 'hasty.yaml': FAILING }) }).code).toBe(0);
  });

  test('0 for a warning, 1 with --block-at warning or note', () => {
    const cwd = siteWith({ 'thin.yaml': WARNING });
    expect(regimen(['check'], { cwd }).out).toMatch(/fail +warning/);
    const codes = ['error', 'warning', 'note', 'never'].map(
      (level) => regimen(['check', '--block-at', level], { cwd }).code,
    );
    expect(codes).toEqual([0, 1, 1, 0]);
  });

  test('0 for what is open, 1 with --unproven', () => {
    const cwd = siteWith({ 'open.yaml': OPEN });
    expect(regimen(['check'], { cwd }).out).toMatch(/open .*needs time/);
    expect([regimen(['check'], { cwd }).code, regimen(['check', '--unproven'], { cwd }).code]).toEqual([0, 1]);
  });

  test('2 for a faulty document, and still judges the others', () => {
    const { code, out } = regimen(['check'], {
      cwd: siteWith({ 'a.yaml': BROKEN, 'b.yaml': FAILING, 'c.yaml': SOUND }),
    });
    expect(code).toBe(2);
    expect(out).toContain('recipes/a.yaml:22:11');
    expect(out).toMatch(/fail +error +turnovers/);
    expect(out).toContain('2 recipes, 8 steps');
  });

  test('2 where no recipe is found', () => {
    const cwd = folderWith({ 'notes.yaml': 'a: b\n' });
    const { code, err } = regimen(['check'], { cwd });
    expect(code).toBe(2);
    expect(err).toBe(
      "regimen: no recipe found here (1 other YAML file passed over); a recipe's first line is 'regimen: recipe 1'\n",
    );
  });

  test('2 for a path that is not there, one that is none of ours, and a document of another sort', () => {
    const cwd = siteWith({ 'sound.yaml': SOUND, 'other.yaml': 'a: b\n' });
    const found = ['recipes/sond.yaml', 'recipes/other.yaml', 'chambers/ruff.yaml'].map((path) =>
      regimen(['check', path], { cwd }),
    );
    expect(found.map(({ code }) => code)).toEqual([2, 2, 2]);
    expect(found[0]?.out).toContain("'sound.yaml' is there");
    expect(found[1]?.out).toContain('regimen: recipe 1');
    expect(found[2]?.out).toContain('a chamber document');
  });
});

describe('the other commands end with', () => {
  test('0 whatever they find', () => {
    const cwd = siteWith({ 'hasty.yaml': FAILING });
    const calls = [
      ['table'],
      ['derive', 'recipes/hasty.yaml', 'settle', 'replaced'],
      ['gas', 'Ar'],
      ['list', 'units'],
      ['--help'],
      ['--version'],
    ];
    expect(calls.map((args) => regimen(args, { cwd })).map(({ code, err }) => ({ code, err }))).toEqual(
      calls.map(() => ({ code: 0, err: '' })),
    );
  });

  test('2 where the job could not be done in full', () => {
    const cwd = siteWith({ 'broken.yaml': BROKEN });
    const calls = [
      ['table'],
      ['derive', 'recipes/broken.yaml', 'settle', 'turnovers'],
      ['gas', 'Unobtainium'],
      ['list', 'moods'],
      ['start', '.'],
    ];
    expect(calls.map((args) => regimen(args, { cwd }).code)).toEqual(calls.map(() => 2));
  });
});

test('the demo line blocks, and is done in full', () => {
  expect(regimen(['check', DEMO]).code).toBe(1);
});
