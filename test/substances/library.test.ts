import { describe, expect, test } from 'vitest';
import { readSubstances } from '../../src/documents/read.ts';
import { Source } from '../../src/shelf/place.ts';
import { BUILT_IN_SUBSTANCES } from '../../src/substances/built-in-substances.ts';
import { libraryOver } from '../../src/substances/library.ts';
import { siteSubstances } from '../../src/substances/site-substances.ts';

const TEXT = `regimen: substances 1
gases:
  Ar: { title: Our argon, formula: Ar, molar_mass: 39.948 g/mol }
  new-gas:
    formula: C2H6O
    molar_mass: 46.07 g/mol +/- 0.1 g/mol
    critical: { temperature: 514 K, pressure: 6.14 MPa, source: own }
    vapour_pressure: { a: 10.2, b: 1730, c: -40, from: 20 degC, to: 90 degC, source: own }
    heat_capacity: { at: [{ temperature: 300 K, is: 65 J/(mol K) }, { temperature: 400 K, is: 80 J/(mol K) }], source: own }
    flammable_range: { at_least: 3.3 %, source: own }
    hazards: [flammable]
    clings: true
    source: own
atoms:
  Xx:
    molar_mass: 50 g/mol
    pairs:
      Ar: { diameter: 3 angstrom, well_depth: 100 K, source: own }
      N2: { diameter: 3.1 angstrom, well_depth: 90 K, estimated: a guess, source: own }
  Yy: { molar_mass: 60 g/mol }
films:
  ours: { formula: SiO2, density: { is: 2.2 g/cm3 +/- 0.05 g/cm3, source: weighing }, molar_mass: 60.08 g/mol }
`;

function site() {
  const { value } = readSubstances(new Source('substances/site.yaml', TEXT));
  if (value === undefined) throw new Error('the document cannot be read');
  return libraryOver([siteSubstances([value]), BUILT_IN_SUBSTANCES]);
}

const builtIn = libraryOver([BUILT_IN_SUBSTANCES]);

describe('the library', () => {
  test("a site's block takes the place of the whole built-in one", () => {
    expect(site().gas('Ar')).toMatchObject({ title: 'Our argon', hasCollision: false });
    expect(site().datum('gases.Ar.collision.diameter')).toBeUndefined();
    expect(builtIn.datum('gases.Ar.collision.diameter')?.value).toBeCloseTo(3.5e-10, 10);
  });

  test('names are told once, the site first', () => {
    const names = site().gasNames();
    expect(names.slice(0, 2)).toEqual(['Ar', 'new-gas']);
    expect(names.filter((name) => name === 'Ar')).toHaveLength(1);
    expect(site().atomNames()).toContain('Ti');
    expect(site().filmNames()).toContain('ours');
  });

  test('unknown names and addresses have nothing', () => {
    for (const name of ['', 'nothing', 'constructor', '__proto__']) {
      expect(site().gas(name)).toBeUndefined();
      expect(site().datum(`gases.${name}.molar_mass`)).toBeUndefined();
    }
    for (const address of [
      '',
      'gases',
      'gases.Ar',
      'gases.Ar.colour',
      'gases.Ar.molar_mass.is.more',
      'stones.Ar.molar_mass',
      'accuracy.colour.Ar',
    ]) {
      expect(site().datum(address)).toBeUndefined();
    }
  });

  test('a gas tells what laws need to know of it', () => {
    const gas = site().gas('new-gas');
    expect(gas?.formula).toEqual(
      new Map([
        ['C', 2],
        ['H', 6],
        ['O', 1],
      ]),
    );
    expect(gas).toMatchObject({
      hazards: ['flammable'],
      clings: true,
      inert: false,
      polar: false,
      flammableRange: { atLeast: 0.033 },
      heatCapacity: [
        { temperature: 300, is: 65 },
        { temperature: 400, is: 80 },
      ],
      place: { file: 'substances/site.yaml', line: 4 },
    });
    expect(gas?.vapourPressure?.from).toBeCloseTo(293.15, 9);
    expect(gas?.sources).toMatchObject({ critical: 'own', source: 'own' });
  });
});

describe('values of substances', () => {
  test.each([
    ['gases.new-gas.molar_mass', 0.04607, 'molar-mass'],
    ['gases.new-gas.vapour_pressure.b', 1730, 'number'],
    ['gases.new-gas.heat_capacity.1.is', 80, 'heat-capacity'],
    ['gases.new-gas.heat_capacity.1.temperature', 400, 'temperature'],
    ['atoms.Xx.pairs.Ar.well_depth', 100, 'temperature'],
    ['films.ours.density', 2200, 'density'],
  ])('%s', (address, value, dimension) => {
    const datum = site().datum(address);
    expect(datum?.value).toBeCloseTo(value, 9);
    expect(datum).toMatchObject({ address, dimension, origin: { place: { file: 'substances/site.yaml' } } });
  });

  test('a tolerance is a half-width', () => {
    expect(site().datum('films.ours.density')?.uncertainty).toBeCloseTo(50 / Math.sqrt(3), 9);
  });

  test('the critical point gives an estimated pair (Bird, Stewart & Lightfoot)', () => {
    // 2.44 (514/60.597)^(1/3) = 4.976 angstrom, 0.77 × 514 = 395.8 K.
    expect(site().datum('gases.new-gas.collision.diameter')?.value).toBeCloseTo(4.976e-10, 13);
    expect(site().datum('gases.new-gas.collision.well_depth')?.value).toBeCloseTo(395.78, 9);
    expect(site().gas('new-gas')?.hasCollision).toBe(true);
    expect(site().gas('new-gas')?.estimated).toContain('Bird');
    expect(site().datum('accuracy.viscosity.new-gas')).toMatchObject({
      value: 1,
      uncertainty: 0.1,
      origin: { default: 'accuracy' },
    });
  });

  test('built-in gases tell how well their properties are known', () => {
    for (const name of builtIn.gasNames()) {
      for (const property of ['viscosity', 'diffusion']) {
        const datum = builtIn.datum(`accuracy.${property}.${name}`);
        expect(datum?.value).toBe(1);
        expect(datum?.uncertainty).toBeGreaterThan(0);
      }
    }
  });
});

describe('pairs of atoms with gases', () => {
  test('their own where there is one, else that of nitrogen', () => {
    const atom = site().atom('Xx');
    expect(atom?.pairFor('Ar')).toEqual({ partner: 'Ar' });
    expect(atom?.pairFor('CF4')).toEqual({ partner: 'N2', standsIn: true });
    expect(atom?.estimated('N2')).toBe('a guess');
    expect(atom?.estimated('Ar')).toBeUndefined();
  });

  test('none where not even nitrogen is known', () => {
    expect(site().atom('Yy')?.pairFor('Ar')).toBeUndefined();
  });
});
