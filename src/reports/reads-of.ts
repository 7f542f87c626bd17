import type { Ingredient, Quantity } from '../quantities/quantity.ts';
import type { Reference } from '../quantities/reference.ts';
import { referenceName } from '../quantities/reference.ts';
import { Scope } from '../quantities/scope.ts';
import { ADDRESSES } from '../steps/addresses.ts';
import type { Given } from '../steps/given.ts';
import type { Setup, Step } from '../steps/step.ts';
import type { Library } from '../substances/library.ts';

/** What a number is read from in a step that has everything, names of gases and lines left open. */
export function readsOf(quantity: Quantity, library: Library): readonly string[] {
  const names = new Set<string>();
  for (const scope of samples(library)) {
    for (const reference of referencesOf(quantity, scope)) {
      const recipe = quantity.from(reference, scope);
      if (typeof recipe === 'object' && 'kind' in recipe) continue;
      const parts: readonly (Ingredient | readonly Ingredient[])[] = isList(recipe) ? recipe : [recipe];
      for (const part of parts.flat()) {
        const name = spelled(part);
        if (name !== undefined) names.add(name);
      }
    }
  }
  return [...names];
}

function isList(recipe: Ingredient | readonly (Ingredient | readonly Ingredient[])[]): recipe is readonly (Ingredient | readonly Ingredient[])[] {
  return Array.isArray(recipe);
}

function referencesOf({ id, lengths, subjects, whole }: Quantity, scope: Scope): readonly Reference[] {
  const [length] = lengths?.(scope) ?? [];
  const [of] = subjects?.(scope) ?? [];
  const plain = length === undefined ? { id } : { id, length };
  if (of === undefined) return [plain];
  return whole === true ? [plain, { ...plain, of }] : [{ ...plain, of }];
}

/** A name with what differs from step to step written large. */
function spelled(part: Ingredient): string | undefined {
  if (typeof part === 'number') return undefined;
  const name = typeof part === 'string' ? part : referenceName(part);
  return name
    .replace(/^(flows|composition|gases|atoms|films|power)\.[A-Za-z0-9-]+/, (_, family: string) => `${family}.${LARGE.get(family) ?? 'NAME'}`)
    .replace(/^(targets|melts)\.[a-z]+/, '$1.NAME')
    .replace(/^chamber\.(gas_lines|gauges|inlets)\.[A-Za-z]+/, 'chamber.$1.NAME')
    .replace(/^(accuracy\.(?:viscosity|diffusion))\.[A-Za-z0-9]+/, '$1.GAS')
    .replace(/(residual|speed|pairs|flows)\.(?:Ar|N2)\b/, '$1.GAS')
    .replace(/:(?:Ar|N2)\/(?:Ar|N2)$/, ':GAS/GAS')
    .replace(/:(?:Ar|N2|feed|plate)$/, ':SUBJECT');
}

const LARGE: ReadonlyMap<string, string> = new Map([
  ['flows', 'LINE'],
  ['composition', 'GAS'],
  ['gases', 'GAS'],
  ['atoms', 'ATOM'],
  ['films', 'FILM'],
  ['power', 'GENERATOR'],
]);

/** Steps that between them have whatever a number may be read from: one that sputters, one that evaporates, one with its throttle open. */
function samples(library: Library): readonly Scope[] {
  const { target, melt, ...plain } = SETUP;
  void [target, melt];
  const setups: readonly Setup[] = [SETUP, { ...plain, ...(melt === undefined ? {} : { melt }), powered: [] }, { ...plain, throttle: 'open' }];
  return setups.map((setup) => new Scope(stepOf(setup), library));
}

const SETUP: Setup = {
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
  target: { name: 'ti', atoms: [{ atom: 'Ti' }] },
  melt: { name: 'al', atoms: [{ atom: 'Al' }] },
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
    if (!pattern.includes('*')) return LEFT_OPEN.has(pattern) || (pattern === 'pressure' && setup.throttle === 'open') ? [] : [pattern];
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
const LEFT_OPEN: ReadonlySet<string> = new Set(['fill_to', 'throttle', 'temperatures.gas', 'body.volume', 'body.wall_area', 'targets.energy']);
const NOWHERE = { file: '', line: 1, column: 1 };

function givenAt(address: string): Given {
  return { address, value: 1, uncertainty: 0, dimension: 'number', unit: '', origin: { place: NOWHERE } };
}
