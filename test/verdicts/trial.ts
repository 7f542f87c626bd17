import { openRun } from '../../src/quantities/open-run.ts';
import type { Fault } from '../../src/shelf/fault.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { Source } from '../../src/shelf/place.ts';
import { openSite } from '../../src/steps/site.ts';
import { judge, processFaults } from '../../src/verdicts/judge.ts';
import type { Judgement } from '../../src/verdicts/judgement.ts';
import type { Verdict } from '../../src/verdicts/verdict.ts';

/** A sputter, plasma and evaporation chamber in one, without accuracies, so that verdicts do not hide behind them. */
export const PLOVER = `regimen: chamber 1
name: plover
revision: '2'
body: { diameter: 400 mm, height: 250 mm, flow: mixed }
lengths: { gap: 60 mm }
generators: { magnetron: { full_scale: 10 kW } }
targets:
  ti: { material: Ti, throw: 60 mm, generator: magnetron }
  wti: { material: { W: 70 %, Ti: rest }, throw: 60 mm, generator: magnetron }
melts: { al: { material: Al, throw: 500 mm } }
pump: { speed: 1500 L/s, lowest_speed: 2 L/s, base_pressure: 1e-7 Torr, temperature: 25 degC }
gas_lines:
  Ar: { full_scale: 500 sccm }
  N2: { full_scale: 500 sccm }
  O2: { full_scale: 500 sccm }
  H2: { full_scale: 500 sccm }
  SiH4: { full_scale: 500 sccm }
temperatures: { wall: 25 degC }
`;

export interface Trial {
  readonly chamber?: string;
  /** More keys of the site document. */
  readonly site?: string;
  /** More documents by name: `processes/NAME.yaml`. */
  readonly files?: Readonly<Record<string, string>>;
  /** Keys of the recipe before its steps. */
  readonly head?: string;
  readonly today?: string;
}

export interface Tried {
  readonly judgement: Judgement;
  readonly faults: readonly Fault[];
}

/** Judges a recipe of these steps (the items of the list) on a chamber called plover. */
export function tried(
  steps: string,
  { chamber = PLOVER, site = '', files = {}, head = '', today = '2026-06-01' }: Trial = {},
): Tried {
  const siteText = `regimen: site 1\nname: marsh\nchambers: [plover.yaml]\nprocesses: [processes/*.yaml]\nsubstances: [substances/*.yaml]\n${site}`;
  const shelf = mapShelf(new Map(Object.entries({ 'regimen.yaml': siteText, 'plover.yaml': chamber, ...files })));
  const opened = openSite(shelf, '.');
  if (opened.value === undefined) throw new Error('the site cannot be opened');
  const recipe = `regimen: recipe 1\nname: trial\nchamber: plover\n${head}steps:\n${steps}\n`;
  const run = openRun(opened.value, new Source('trial.yaml', recipe));
  const faults = [...opened.faults, ...processFaults(opened.value), ...run.faults];
  if (run.value === undefined) throw new Error(told(faults));
  const judgement = judge(run.value, today);
  return { judgement, faults: [...faults, ...judgement.faults] };
}

/** The same where nothing may be at fault. */
export function judged(steps: string, trial: Trial = {}): Judgement {
  const { judgement, faults } = tried(steps, trial);
  if (faults.length > 0) throw new Error(told(faults));
  return judgement;
}

/** The verdicts of the first step by name. */
export function verdicts(steps: string, trial: Trial = {}): ReadonlyMap<string, Verdict> {
  return byName(judged(steps, trial));
}

export function byName({ steps }: Judgement): ReadonlyMap<string, Verdict> {
  return new Map(steps[0]?.verdicts.map((verdict) => [verdict.name, verdict]));
}

/** One verdict of the first step. */
export function verdict(name: string, steps: string, trial: Trial = {}): Verdict {
  const found = verdicts(steps, trial).get(name);
  if (found === undefined) throw new Error(`no verdict ${name}`);
  return found;
}

/** Names of verdicts that are findings, with kind and grade: `fail warning sputter/clean-film`. */
export function findings({ steps }: Judgement): readonly string[] {
  return steps.flatMap(({ verdicts: all }) =>
    all
      .filter(({ kind, waived }) => kind !== 'pass' && kind !== 'notApplicable' && waived === undefined)
      .map(({ kind, level, name }) => `${kind} ${level} ${name}`),
  );
}

/** A step as one flow map: `name: one, process: soak, …`. */
export function step(process: string, keys: string, name = 'one'): string {
  return `  - { name: ${name}, process: ${process}, ${keys} }`;
}

export function told(faults: readonly Fault[]): string {
  return faults
    .map(({ place, found, right }) => `${place.file}:${place.line}:${place.column} ${found}: ${right}`)
    .join('\n');
}
