import { openRun } from '../../src/quantities/open-run.ts';
import type { StepRun } from '../../src/quantities/run.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { Source } from '../../src/shelf/place.ts';
import { openSite } from '../../src/steps/site.ts';

const SITE = `regimen: site 1
name: test
chambers: [avocet.yaml]
`;

export const CHAMBER = `regimen: chamber 1
name: avocet
body: { diameter: 460 mm, height: 300 mm, flow: mixed }
lengths: { gap: 30 mm }
electrode: { diameter: 260 mm }
generators: { source: { frequency: 13.56 MHz, full_scale: 3 kW } }
pump: { speed: 1100 L/s, lowest_speed: 20 L/s, base_pressure: 2e-7 Torr, leak_up_rate: 0.2 mTorr/min, temperature: 40 degC }
gauges: { process: { full_scale: 100 mTorr, accuracy: 0.25 % of reading, usable_from: 0.5 % } }
gas_lines:
  Ar: { full_scale: 500 sccm, accuracy: 1 % of full scale }
  N2: { full_scale: 500 sccm, accuracy: 1 % of full scale }
  CF4: { full_scale: 200 sccm, accuracy: 1 % of reading }
  O2: { full_scale: 200 sccm, accuracy: 1 % of full scale }
  silane: { brings: { SiH4: 2 %, N2: rest }, full_scale: 2 slm, accuracy: 1 % of full scale }
temperatures: { wall: 60 degC }
targets: { ti: { material: Ti, throw: 270 mm, generator: source } }
`;

/** The first step of a recipe on a chamber, ready to be read. Throws with the first fault where there is one. */
export function stepOf(step: string, chamber = CHAMBER, head = ''): StepRun {
  const recipe = `regimen: recipe 1\nname: sample\nchamber: avocet\n${head}steps:\n  - name: step\n${step}`;
  const shelf = mapShelf(
    new Map([
      ['/line/regimen.yaml', SITE],
      ['/line/avocet.yaml', chamber],
    ]),
  );
  const site = openSite(shelf, '/line/recipe.yaml');
  if (site.value === undefined) throw new Error('the site can not be opened');
  const run = openRun(site.value, new Source('recipe.yaml', recipe));
  const [fault] = [...site.faults, ...run.faults];
  if (fault !== undefined)
    throw new Error(`${fault.place.file}:${fault.place.line}:${fault.place.column} ${fault.found}: ${fault.right}`);
  const [first] = run.value?.steps ?? [];
  if (first === undefined) throw new Error('the recipe has no step');
  return first;
}

/** The keys of a step, one a line, as a recipe would hold them. */
export function keys(values: Readonly<Record<string, string>>): string {
  return Object.entries(values)
    .map(([key, value]) => `    ${key}: ${value}\n`)
    .join('');
}

export const SPUTTER = keys({
  process: 'sputter',
  time: '85 s +/- 1 s',
  pressure: '5 mTorr +/- 2 %',
  flows: '{ Ar: 120 sccm, N2: 60 sccm }',
  power: '{ source: 2.4 kW }',
  surface: '{ grows: TiN, rate: 40 nm/min +/- 5 % }',
});

export const PLASMA = keys({
  process: 'pecvd',
  time: '60 s',
  pressure: '90 mTorr',
  flows: '{ silane: 1.2 slm, O2: 150 sccm, Ar: 100 sccm, CF4: 80 sccm }',
  power: '{ source: 500 W }',
  temperatures: '{ wafer: 300 degC }',
  reactant: '{ gas: SiH4 }',
  surface: '{ grows: SiO2, rate: 20 nm/min }',
  wafer: '{ diameter: 200 mm, count: 1, feature: { shape: hole, width: 400 nm, depth: 1 um } }',
});
