import { openRun } from '../../src/quantities/open-run.ts';
import type { Run } from '../../src/quantities/run.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { openSite } from '../../src/steps/site.ts';
import { judge } from '../../src/verdicts/judge.ts';
import type { Judgement } from '../../src/verdicts/judgement.ts';

/** The chamber that the tests of reports run on. */
const STINT = `regimen: chamber 1
name: stint
title: Magnetron sputter, 200 mm
revision: '4'
body: { diameter: 400 mm, height: 300 mm, flow: mixed }
lengths: { gap: 60 mm }
generators: { magnetron: { full_scale: 10 kW } }
targets: { ti: { material: Ti, throw: 200 mm, generator: magnetron } }
pump:
  speed: 1500 L/s
  lowest_speed: 20 L/s
  base_pressure: 3e-8 Torr
  residual: { H2O: 100 % }
  temperature: 25 degC
gauges: { process: { full_scale: 100 mTorr, accuracy: 0.25 % of reading, usable_from: 0.1 % } }
gas_lines:
  Ar: { full_scale: 100 sccm, accuracy: 1 % of full scale }
  N2: { full_scale: 100 sccm, accuracy: 1 % of full scale }
  SiH4: { full_scale: 100 sccm, accuracy: 1 % of full scale }
  O2: { full_scale: 100 sccm, accuracy: 1 % of full scale }
temperatures: { wall: 50 degC }
`;

const SITE = `regimen: site 1
name: saltmarsh
chambers: [chambers/*.yaml]
recipes: [recipes/**]
show: { pressure: mTorr, length: mm }
`;

/** A recipe of these steps (YAML of the list) on that chamber, run and judged. */
export function judged(steps: string, { head = '', today = '2026-01-01' } = {}): Judgement {
  return judge(runOf(steps, head), today);
}

export function runOf(steps: string, head = ''): Run {
  const recipe = `regimen: recipe 1\nname: sample\nrevision: '2'\nchamber: stint\n${head}steps:\n${steps}`;
  const shelf = mapShelf(
    new Map([
      ['site/regimen.yaml', SITE],
      ['site/chambers/stint.yaml', STINT],
      ['site/recipes/sample.yaml', recipe],
    ]),
  );
  const site = openSite(shelf, 'site/recipes').value;
  const source = shelf.read('site/recipes/sample.yaml', 'recipes/sample.yaml').value;
  if (site === undefined || source === undefined) throw new Error('the site of the tests cannot be read');
  const { value, faults } = openRun(site, source);
  if (value === undefined) throw new Error(JSON.stringify(faults.map(({ found, right }) => `${found}; ${right}`)));
  return value;
}

/** Sputter deposition at a pressure, from a target that runs. */
export function deposit(pressure: string, more = ''): string {
  return `  - name: deposit
    process: sputter-line-of-sight
    time: 30 s
    pressure: ${pressure}
    flows: { Ar: 40 sccm }
    power: { magnetron: 4 kW }
    targets: { ti: { voltage: 400 V } }
    surface: { grows: Ti, rate: 40 nm/min }
    wafer: { diameter: 200 mm }
${more}`;
}
