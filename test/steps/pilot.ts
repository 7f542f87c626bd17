import { readRecipe } from '../../src/documents/read.ts';
import type { Fault, Outcome } from '../../src/shelf/fault.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { resolveRecipe } from '../../src/steps/resolve.ts';
import { openSite, type Site } from '../../src/steps/site.ts';
import type { Recipe, Step } from '../../src/steps/step.ts';

/** A small line to try documents on: one chamber, `heron`, and whatever a test adds or changes. */
export const HERON = `regimen: chamber 1
name: heron
revision: "3"
body: { diameter: 300 mm, height: 100 mm, flow: radial }
lengths: { gap: 25 mm }
generators: { source: { full_scale: 2 kW }, bias: { full_scale: 1 kW } }
targets:
  ti: { material: Ti, throw: 60 mm, generator: source }
  alloy: { material: { Ti: 40 %, Al: rest }, throw: 70 mm }
melts: { al: { material: Al, throw: 400 mm } }
pump: { speed: 800 L/s, lowest_speed: 20 L/s, base_pressure: 1e-6 Torr, residual: { H2O: 80 %, N2: rest } }
gauges:
  fine: { full_scale: 100 mTorr, accuracy: 1 % of full scale, usable_from: 0.5 % }
  coarse: { full_scale: 10 Torr, accuracy: 2 % of reading }
gas_lines:
  Ar: { full_scale: 200 sccm, accuracy: 1 % of full scale }
  N2: { full_scale: 500 sccm, accuracy: 2 % of reading }
  dilute: { brings: { SiH4: 2 %, N2: rest }, full_scale: 1 slm }
  tuned: { brings: O2, full_scale: 100 sccm, delivers: { gain: 1.04, offset: 0.5 sccm } }
  water: { draws: { gas: H2O, temperature: 24 degC } }
  metal: { bubbles: { gas: H2O, temperature: 60 degC, pressure: 80 kPa, carrier: N2 }, full_scale: 200 sccm }
limits: { pressure: { at_least: 1 mTorr, at_most: 100 mTorr }, lengths.gap: { at_least: 20 mm } }
temperatures: { wall: 60 degC }
`;

export const SITE = `regimen: site 1
name: marsh
chambers: [chambers/*.yaml]
substances: [substances/*.yaml]
processes: [processes/*.yaml]
tolerances: { time: 0.2 s, temperature: 5 K, pressure: 3 % of reading }
`;

export type Files = Readonly<Record<string, string>>;

const LINE: Files = { 'regimen.yaml': SITE, 'chambers/heron.yaml': HERON };

export function open(files: Files = {}): Outcome<Site> {
  return openSite(mapShelf(new Map(Object.entries({ ...LINE, ...files }))), '.');
}

export function site(files: Files = {}): Site {
  const { value } = open(files);
  if (value === undefined) throw new Error('the site cannot be opened');
  return value;
}

/** Resolves the steps of a recipe on heron. `head` stands before them. */
export function resolve(
  steps: string,
  { head = '', files = {} }: { head?: string; files?: Files } = {},
): Outcome<Recipe> {
  return resolveText(`regimen: recipe 1\nname: trial\nchamber: heron\n${head}steps:\n${steps}\n`, files);
}

export function resolveText(text: string, files: Files = {}): Outcome<Recipe> {
  const line = site({ ...files, 'trial.yaml': text });
  const source = line.shelf.read('trial.yaml').value;
  const document = source === undefined ? { faults: [] } : readRecipe(source);
  if (document.value === undefined) throw new Error(written(document.faults).join('\n'));
  return resolveRecipe(line, document.value);
}

/** The first step of a recipe without faults. */
export function onlyStep(step: string, options: { head?: string; files?: Files } = {}): Step {
  const { value, faults } = resolve(`  - { name: one, process: soak, ${step} }`, options);
  const first = value?.steps[0];
  if (first === undefined || faults.length > 0) throw new Error(written(faults).join('\n'));
  return first;
}

export function written(faults: readonly Fault[]): readonly string[] {
  return faults.map(({ place, found, right }) => `${place.file}:${place.line}:${place.column} ${found}: ${right}`);
}
