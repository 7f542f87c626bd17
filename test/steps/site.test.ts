import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { readRecipe } from '../../src/documents/read.ts';
import { diskShelf } from '../../src/shelf/disk.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { resolveRecipe } from '../../src/steps/resolve.ts';
import { openSite } from '../../src/steps/site.ts';
import { HERON, open, resolveText, site, SITE, written } from './pilot.ts';

const recipe = (chamber: string) =>
  `regimen: recipe 1\nname: trial\nchamber: ${chamber}\nsteps: [{ name: one, process: soak }]\n`;

describe('a site', () => {
  test('knows its chambers by name and how it wants numbers shown', () => {
    const line = site({ 'regimen.yaml': `${SITE}show: { pressure: mT, bands: vacuum, coverage_factor: 3 }\n` });
    expect([line.name, line.chamberNames()]).toEqual(['marsh', ['heron']]);
    expect(line.show).toEqual({ units: new Map([['pressure', 'mTorr']]), bands: 'vacuum', coverageFactor: 3 });
  });

  test('is opened without faults', () => {
    expect(open().faults).toEqual([]);
  });

  test('need not be there', () => {
    const { value, faults } = openSite(mapShelf(new Map([['a/b.yaml', recipe('./heron.yaml')]])), 'a/b.yaml');
    expect(faults).toEqual([]);
    expect([value?.folder, value?.name, value?.show.coverageFactor]).toEqual(['a', undefined, 2]);
    expect(value?.process('soak')?.name).toBe('soak');
  });

  test('with a document at fault still has what is built in', () => {
    const { value, faults } = open({ 'regimen.yaml': 'regimen: site 1\nname: Marsh\n' });
    expect(faults).toHaveLength(1);
    expect(value?.library.gas('Ar')?.name).toBe('Ar');
  });

  test.each([
    [
      { 'chambers/egret.yaml': HERON },
      "chambers/heron.yaml:2:7 a second chamber 'heron', the first is in chambers/egret.yaml: a name of its own",
    ],
    [{ 'regimen.yaml': `${SITE}show: { pressure: mtorr }\n` }, "regimen.yaml:7:19 unit 'mtorr' is not known: 'mTorr'?"],
    [
      { 'regimen.yaml': `${SITE}ratios: { lean: { of: H3, to: O2, at_most: 1, level: error } }\n` },
      "regimen.yaml:7:23 gas 'H3' is not known",
    ],
    [
      { 'regimen.yaml': `${SITE}ratios: { lean: { of: H2, to: O2, at_most: 1, level: error, chambers: [herin] } }\n` },
      "regimen.yaml:7:72 chamber 'herin' is not known: 'heron'?",
    ],
    [
      { 'regimen.yaml': `${SITE}recipes: [../elsewhere/**]\n` },
      "regimen.yaml:7:11 the pattern '../elsewhere/**' leads upwards",
    ],
    [
      {
        'substances/a.yaml': 'regimen: substances 1\ngases: { XX: { formula: X } }\n',
        'substances/b.yaml': 'regimen: substances 1\ngases: { XX: { formula: X } }\n',
      },
      'substances/b.yaml:2:10 XX is also described in substances/a.yaml: one description of it',
    ],
  ])('faults: %j', (files, fault) => {
    const { faults } = open(files);
    expect(written(faults)).toHaveLength(1);
    expect(written(faults)[0]).toContain(fault);
  });
});

describe('the chamber of a recipe', () => {
  test('by name', () => {
    expect(resolveText(recipe('heron')).value?.chamber).toEqual({
      name: 'heron',
      file: 'chambers/heron.yaml',
      revision: '3',
    });
  });

  test('by path', () => {
    const { value, faults } = resolveText(recipe('chambers/heron.yaml'));
    expect([value?.chamber.name, faults]).toEqual(['heron', []]);
  });

  test.each([
    ['herron', "trial.yaml:3:10 chamber 'herron' is not known: 'heron'?"],
    ['../heron.yaml', "trial.yaml:3:10 the path '../heron.yaml' leads out of the site's folder: a chamber inside it"],
    ['./trial.yaml', "trial.yaml:3:10 the recipe itself as its chamber: the path of a chamber's document"],
    ['chambers/hern.yaml', "trial.yaml:3:10 chamber 'chambers/hern.yaml': nothing named 'hern.yaml' there"],
    ['./regimen.yaml', 'regimen.yaml:1:10 regimen: a site document: a chamber document is needed here'],
  ])('%s is answered', (chamber, fault) => {
    const { value, faults } = resolveText(recipe(chamber));
    expect(value).toBeUndefined();
    expect(written(faults)).toHaveLength(1);
    expect(written(faults)[0]).toContain(fault);
  });

  test('in braces is found by name too', () => {
    const files = { 'chambers/egret.yaml': '{ regimen: chamber 1, name: egret }\n' };
    expect(resolveText(recipe('egret'), files).value?.chamber.name).toBe('egret');
  });

  test('is made ready once, however many recipes run on it', () => {
    const line = site();
    const source = mapShelf(new Map([['trial.yaml', recipe('heron')]])).read('trial.yaml').value;
    const document = source === undefined ? undefined : readRecipe(source).value;
    if (document === undefined) throw new Error('the recipe cannot be read');
    expect(line.facts('heron', document)).toBe(line.facts('heron', document));
    const [a, b] = [resolveRecipe(line, document), resolveRecipe(line, document)];
    expect(a.value?.steps[0]?.givens.get('body.diameter')).toBe(b.value?.steps[0]?.givens.get('body.diameter'));
  });

  test.each([
    ['gas_lines: { argon: {} }', "gas 'argon' is not known: describe it in a substances document of the site"],
    ['gas_lines: { mix: { brings: { SiH4: 2 %, N2: 90 % } } }', 'the shares add up to 92 %'],
    [
      'gas_lines: { b: { bubbles: { gas: H2O, carrier: N2, temperature: 90 degC, pressure: 100 Torr } } }',
      'H2O boils in its vessel',
    ],
    ['pump: { speed: { Arr: 100 L/s } }', "gas 'Arr' is not known: 'Ar'?"],
    ['pump: { residual: { H2O: rest, N3: 10 % } }', "gas 'N3' is not known"],
    ['targets: { ti: { material: Tii } }', "atom 'Tii' is not known: 'Ti'?"],
    [
      'generators: { source: {} }\ntargets: { ti: { material: Ti, generator: sorce } }',
      "generator 'sorce' is not known: 'source'?",
    ],
    ['limits: { presure: { at_most: 1 Pa } }', "no step has a setpoint 'presure': 'pressure'?"],
    ['limits: { pressure: { at_most: 1 s } }', "limit '1 s'"],
    ['limits: { pressure: { at_least: 2 Pa, at_most: 1 Pa } }', 'limits that are not in order'],
  ])('at fault: %s', (chamber, fault) => {
    const { value, faults } = resolveText(recipe('egret'), {
      'chambers/egret.yaml': `regimen: chamber 1\nname: egret\n${chamber}\n`,
    });
    expect(written(faults)).toHaveLength(1);
    expect(written(faults)[0]).toMatch(/^chambers\/egret\.yaml:[34]:/);
    expect(written(faults)[0]).toContain(fault);
    expect(value?.steps).toHaveLength(1);
  });
});

describe('links on the disk', () => {
  let folder = '';
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'site-'));
    mkdirSync(join(folder, 'line'));
    writeFileSync(join(folder, 'outside.yaml'), HERON);
    writeFileSync(join(folder, 'line/regimen.yaml'), SITE);
    symlinkSync('loop.yaml', join(folder, 'line/loop.yaml'));
    symlinkSync('../outside.yaml', join(folder, 'line/linked.yaml'));
  });
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });

  test.each([
    ['./loop.yaml', "chamber './loop.yaml'"],
    ['./linked.yaml', "the path './linked.yaml' leads out of the site's folder"],
  ])('a chamber at %s is a fault', (chamber, fault) => {
    writeFileSync(join(folder, 'line/trial.yaml'), recipe(chamber));
    const shelf = diskShelf();
    const line = openSite(shelf, join(folder, 'line')).value;
    const source = shelf.read(join(folder, 'line/trial.yaml'), 'trial.yaml').value;
    const document = source === undefined ? undefined : readRecipe(source).value;
    if (line === undefined || document === undefined) throw new Error('the trial cannot be set up');
    const { value, faults } = resolveRecipe(line, document);
    expect(value).toBeUndefined();
    expect(written(faults)).toHaveLength(1);
    expect(written(faults)[0]).toContain(`trial.yaml:3:10 ${fault}`);
  });
});
