import { describe, expect, test } from 'vitest';
import { faults } from './schema-files.ts';
import type { Json, JsonMap } from '../../src/generate/schemas.ts';

const recipe = (keys: JsonMap): JsonMap => ({
  regimen: 'recipe 1',
  name: 'r',
  chamber: 'ruff',
  steps: [{ name: 's', process: 'soak' }],
  ...keys,
});
const step = (keys: JsonMap): JsonMap => recipe({ steps: [{ name: 's', process: 'soak', ...keys }] });
const entry = (keys: Json): JsonMap => recipe({ steps: [keys] });
const chamber = (keys: JsonMap): JsonMap => ({ regimen: 'chamber 1', name: 'c', ...keys });
const gas = (keys: JsonMap): JsonMap => ({ regimen: 'substances 1', gases: { X: { formula: 'XeF2', ...keys } } });
const process = (keys: JsonMap): JsonMap => ({ regimen: 'process 1', name: 'p', title: 'a process', ...keys });
const assumption = (keys: JsonMap): JsonMap =>
  process({
    assumptions: { a: { statement: 'It holds.', quantity: 'knudsen.gap', source: 'common practice', ...keys } },
  });
const site = (keys: JsonMap): JsonMap => ({ regimen: 'site 1', name: 's', ...keys });
const waiver = { assumption: 'a', reason: 'Seen.', approved_by: 'owner', until: '2030-01-31' };
const inner = [{ name: 'i', process: 'soak' }];

describe('one mistake in a document gives one fault, at its place', () => {
  const cases: [mistake: string, document: JsonMap, fault: string][] = [
    ['another version', recipe({ regimen: 'recipe 2' }), '/regimen const'],
    ['a misspelt key of the document', recipe({ chambre: 'ruff' }), ' additionalProperties chambre'],
    ['a misspelt key of a step', step({ presure: '4 mTorr' }), '/steps/0 additionalProperties presure'],
    ['no chamber', { regimen: 'recipe 1', name: 'r', steps: inner }, ' required chamber'],
    ['no steps', recipe({ steps: [] }), '/steps minItems'],
    ['a map for steps', recipe({ steps: {} }), '/steps type'],
    ['a text for a step', entry('settle'), '/steps/0 type'],
    ['a name with a capital', recipe({ name: 'Contact' }), '/name pattern'],
    ['a name that is a number', recipe({ name: 12 }), '/name type'],
    ['a bare revision', recipe({ revision: 1.1 }), '/revision type'],
    ['a step without process', entry({ name: 's' }), '/steps/0 required process'],
    ['a step without name', entry({ process: 'soak' }), '/steps/0 required name'],
    ['unassessed without reason', entry({ name: 's', process: 'unassessed' }), '/steps/0 required reason'],
    ['a step that repeats', step({ repeat: 3 }), '/steps/0 additionalProperties repeat'],
    ['a cycle without repeat', entry({ name: 'c', steps: inner }), '/steps/0 required repeat'],
    [
      'a cycle with a process',
      entry({ name: 'c', repeat: 2, steps: inner, process: 'soak' }),
      '/steps/0 additionalProperties process',
    ],
    [
      'a cycle with a setpoint',
      entry({ name: 'c', repeat: 2, steps: inner, time: '3 s' }),
      '/steps/0 additionalProperties time',
    ],
    ['a cycle of nothing', entry({ name: 'c', repeat: 2, steps: [] }), '/steps/0/steps minItems'],
    ['half a repeat', entry({ name: 'c', repeat: 1.5, steps: inner }), '/steps/0/repeat type'],
    ['no repeat at all', entry({ name: 'c', repeat: 0, steps: inner }), '/steps/0/repeat minimum'],
    [
      'a name of its own in throughout',
      recipe({ throughout: { name: 'x', time: '3 s' } }),
      '/throughout additionalProperties name',
    ],
    ['pressure beside throttle', step({ pressure: '4 mTorr', throttle: 'open' }), '/steps/0/pressure not'],
    ['a list for a pressure', step({ pressure: ['4 mTorr'] }), '/steps/0/pressure type'],
    ['an empty pressure', step({ pressure: null }), '/steps/0/pressure type'],
    ['a ramp without end', step({ pressure: { from: '4 mTorr' } }), '/steps/0/pressure required to'],
    [
      'a ramp over nothing known',
      step({ pressure: { from: '4 mTorr', to: '5 mTorr', over: 'lap' } }),
      '/steps/0/pressure/over enum',
    ],
    [
      'a misspelt limit',
      step({ time: { usually: '4 s', atleast: '3 s' } }),
      '/steps/0/time additionalProperties atleast',
    ],
    [
      'ramp and range at once',
      step({ time: { from: '4 s', to: '5 s', at_least: '3 s' } }),
      '/steps/0/time additionalProperties at_least',
    ],
    ['an empty range', step({ time: {} }), '/steps/0/time minProperties'],
    ['a line name with a blank', step({ flows: { 'Ar low': '4 sccm' } }), '/steps/0/flows pattern Ar low'],
    [
      'a wall with a misspelt zone',
      step({ temperatures: { wall: { zonen: ['4 degC'] } } }),
      '/steps/0/temperatures/wall additionalProperties zonen',
    ],
    [
      'a temperature of what has none',
      step({ temperatures: { walls: '4 degC' } }),
      '/steps/0/temperatures additionalProperties walls',
    ],
    ['etching and growing', step({ surface: { etches: 'Si', grows: 'SiO2' } }), '/steps/0/surface/grows not'],
    ['a reactant without gas', step({ reactant: { sticking: 0.1 } }), '/steps/0/reactant required gas'],
    ['a wafer as a text', recipe({ wafer: '200 mm' }), '/wafer enum'],
    ['a wafer as a list', recipe({ wafer: ['200 mm'] }), '/wafer enum'],
    ['a panel without length', recipe({ wafer: { width: '3 mm' } }), '/wafer dependentRequired length'],
    ['a round panel', recipe({ wafer: { diameter: '9 mm', length: '3 mm', width: '2 mm' } }), '/wafer/diameter not'],
    ['a feature of another shape', recipe({ wafer: { feature: { shape: 'slot' } } }), '/wafer/feature/shape enum'],
    ['backside without gas', step({ backside: { pressure: '9 Torr' } }), '/steps/0/backside required gas'],
    [
      'a waiver without end',
      step({ waivers: [{ assumption: 'a', reason: 'Seen.', approved_by: 'owner' }] }),
      '/steps/0/waivers/0 required until',
    ],
    ['a day that is none', step({ waivers: [{ ...waiver, until: '31.1.2030' }] }), '/steps/0/waivers/0/until pattern'],
    ['a month that is none', recipe({ waivers: [{ ...waiver, until: '2030-13-01' }] }), '/waivers/0/until pattern'],
    ['a misspelt key of the body', chamber({ body: { diametre: '4 mm' } }), '/body additionalProperties diametre'],
    ['a flow that is none', chamber({ body: { flow: 'stirred' } }), '/body/flow enum'],
    [
      'a line with two sources',
      chamber({ gas_lines: { Ar: { brings: 'Ar', draws: { gas: 'Ar' } } } }),
      '/gas_lines/Ar/draws not',
    ],
    [
      'a line that draws and bubbles',
      chamber({ gas_lines: { Ar: { draws: { gas: 'Ar' }, bubbles: { gas: 'Ar', carrier: 'N2' } } } }),
      '/gas_lines/Ar/bubbles not',
    ],
    ['a number for what a line brings', chamber({ gas_lines: { Ar: { brings: 4 } } }), '/gas_lines/Ar/brings type'],
    ['a gas with a colon', chamber({ gas_lines: { Ar: { brings: 'Ar:2' } } }), '/gas_lines/Ar/brings pattern'],
    ['a pump row without speed', chamber({ pump: { speed: [{ below: '4 Pa' }] } }), '/pump/speed/0 required is'],
    ['a pump speed that is none', chamber({ pump: { speed: true } }), '/pump/speed type'],
    [
      'a limit of no address',
      chamber({ limits: { 'lengths gap': { at_least: '3 mm' } } }),
      '/limits pattern lengths gap',
    ],
    ['an empty limit', chamber({ limits: { pressure: {} } }), '/limits/pressure minProperties'],
    ['a block without source', gas({ dipole: { is: '1 debye' } }), '/gases/X/dipole required source'],
    ['a switch for a value', gas({ dipole: true }), '/gases/X/dipole type'],
    [
      'another potential',
      gas({ collision: { diameter: '3 angstrom', well_depth: '9 K', form: 'morse', source: 's' } }),
      '/gases/X/collision/form enum',
    ],
    ['a hazard that is none', gas({ hazards: ['sticky'] }), '/gases/X/hazards/0 enum'],
    ['a formula in small letters', gas({ formula: 'xef2' }), '/gases/X/formula pattern'],
    ['an assumption without bound', assumption({}), '/assumptions/a required at_most'],
    ['a plain bound without level', assumption({ at_least: 3 }), '/assumptions/a required level'],
    ['a graded bound with level', assumption({ at_least: { warning: 3 }, level: 'error' }), '/assumptions/a/level not'],
    [
      'a grade that is none',
      assumption({ at_least: { warn: 3 } }),
      '/assumptions/a/at_least additionalProperties warn',
    ],
    ['a list for a bound', assumption({ at_least: [3], level: 'note' }), '/assumptions/a/at_least type'],
    ['a level that is none', assumption({ at_least: 3, level: 'fatal' }), '/assumptions/a/level enum'],
    [
      'a number that has no such name',
      assumption({ at_least: 3, level: 'note', quantity: 'Knudsen gap' }),
      '/assumptions/a/quantity pattern',
    ],
    [
      'an instant that is none',
      assumption({ at_least: 3, level: 'note', quantity: 'exchange@middle' }),
      '/assumptions/a/quantity pattern',
    ],
    ['when of another kind', assumption({ at_least: 3, level: 'note', when: 'always' }), '/assumptions/a/when const'],
    ['a process without title', { regimen: 'process 1', name: 'p' }, ' required title'],
    ['a stand-in as a list', process({ stands_in: { time: ['3 s'] } }), '/stands_in/time type'],
    ['one pattern for a list', site({ recipes: 'recipes/**' }), '/recipes type'],
    ['bands of another convention', site({ show: { bands: 'mean' } }), '/show/bands enum'],
    [
      'a ratio without divisor',
      site({ ratios: { r: { of: 'H2', at_most: 3, level: 'note' } } }),
      '/ratios/r required to',
    ],
    ['a ratio without bound', site({ ratios: { r: { of: 'H2', to: 'O2' } } }), '/ratios/r required at_most'],
  ];

  test.each(cases)('%s', (_, document, fault) => {
    expect(faults(document)).toEqual([fault]);
  });
});

describe('what is meant is accepted', () => {
  const sound: [what: string, document: JsonMap][] = [
    ['a step without any setpoint', step({})],
    ['no flow at all', step({ flows: {} })],
    ['a filled soak behind a shut valve', step({ throttle: 'closed', fill_to: '2 Torr' })],
    ['a bare number, which the reader answers with the units that fit', step({ pressure: 4 })],
    ['a lower and an upper bound at once', assumption({ at_least: { warning: 1 }, at_most: { warning: 3 } })],
    ['a process that only shows', process({ shows: ['paschen-voltage', 'diffusivity:SiH4/N2', 'time-ratio:coat'] })],
    ['a chamber with only a name', chamber({})],
  ];

  test.each(sound)('%s', (_, document) => {
    expect(faults(document)).toEqual([]);
  });
});

describe('patterns', () => {
  test('take time in proportion to the text', () => {
    const hostile = `${'a-'.repeat(50_000)}!`;
    const from = performance.now();
    expect(faults(recipe({ name: hostile }))).toEqual(['/name maxLength', '/name pattern']);
    expect(faults(assumption({ at_least: 3, level: 'note', quantity: hostile, over: hostile })).length).toBe(4);
    expect(performance.now() - from).toBeLessThan(1000);
  });
});
