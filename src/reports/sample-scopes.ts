import { Scope } from '../quantities/scope.ts';
import { ADDRESSES } from '../steps/addresses.ts';
import type { Given } from '../steps/given.ts';
import type { Emitter, Setup, Step } from '../steps/step.ts';
import type { Library } from '../substances/library.ts';

/** Steps that between them have whatever a number may be read from: one that sputters, one that evaporates, one with its throttle open. */
export function sampleScopes(library: Library): readonly Scope[] {
  const setups: readonly Setup[] = [
    { ...PLAIN, target: TARGET, melt: MELT },
    { ...PLAIN, melt: MELT, powered: [] },
    { ...PLAIN, throttle: 'open' },
  ];
  return setups.map((setup) => new Scope(stepOf(setup), library));
}

const TARGET: Emitter = { name: 'ti', atoms: [{ atom: 'Ti' }] };
const MELT: Emitter = { name: 'al', atoms: [{ atom: 'Al' }] };

const PLAIN: Setup = {
  lines: [
    { name: 'Ar', brings: [{ gas: 'Ar' }] },
    { name: 'N2', brings: [{ gas: 'N2' }] },
  ],
  gases: ['Ar', 'N2'],
  composition: false,
  residual: ['N2'],
  flow: 'axial',
  pumpSpeed: 'one',
  pumpRows: 0,
  throttle: 'holds',
  surface: { film: 'TiN', mode: 'grows' },
  reactant: 'N2',
  wafer: 'disc',
  feature: 'hole',
  inlets: ['plate'],
  gauges: ['process'],
  powered: ['source'],
};

const FACTS: readonly string[] = [
  'chamber.pump.speed',
  'chamber.pump.lowest_speed',
  'chamber.pump.base_pressure',
  'chamber.pump.leak_up_rate',
  'chamber.pump.temperature',
  'chamber.pump.residual.N2',
  'chamber.pump.reference.pressure',
  'chamber.pump.reference.flows.Ar',
  'chamber.gas_lines.Ar.full_scale',
  'chamber.gas_lines.N2.full_scale',
  'chamber.gauges.process.full_scale',
  'chamber.gauges.process.usable_from',
  'chamber.inlets.plate.holes',
  'chamber.inlets.plate.diameter',
  'chamber.inlets.plate.thickness',
  'chamber.electrode.diameter',
];

const NAMES: ReadonlyMap<string, readonly string[]> = new Map([
  ['flows.*', ['Ar', 'N2']],
  ['lengths.*', ['gap']],
  ['power.*', ['source']],
  ['targets.*.voltage', ['ti']],
  ['targets.*.throw', ['ti']],
  ['melts.*.temperature', ['al']],
  ['melts.*.throw', ['al']],
]);

function stepOf(setup: Setup): Step {
  const addresses = ADDRESSES.flatMap(({ pattern }) => {
    if (!pattern.includes('*'))
      return LEFT_OPEN.has(pattern) || (pattern === 'pressure' && setup.throttle === 'open') ? [] : [pattern];
    return (NAMES.get(pattern) ?? []).map((name) => pattern.replace('*', name));
  });
  return {
    path: 'sample',
    name: 'sample',
    number: 1,
    process: 'unassessed',
    place: NOWHERE,
    processPlace: NOWHERE,
    givens: new Map([...addresses, ...FACTS].map((address) => [address, givenAt(address)])),
    unknown: new Set(),
    none: new Set(),
    setup,
    waivers: [],
  };
}

/** Setpoints that, where given, stand for what most steps work out. */
const LEFT_OPEN: ReadonlySet<string> = new Set([
  'fill_to',
  'throttle',
  'temperatures.gas',
  'body.volume',
  'body.wall_area',
  'targets.energy',
]);
const NOWHERE = { file: '', line: 1, column: 1 };

function givenAt(address: string): Given {
  return { address, value: 1, uncertainty: 0, dimension: 'number', unit: '', origin: { place: NOWHERE } };
}
