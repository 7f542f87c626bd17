import type { Pointer, RecipeDocument } from '../documents/document.ts';
import type { Cycle as CycleBlock, Recipe as RecipeBlock, Step as StepBlock } from '../documents/generated/types.ts';
import { success, type Fault, type Outcome } from '../shelf/fault.ts';
import { settleAmounts } from './amounts.ts';
import { STATED } from './accuracies.ts';
import type { ChamberFacts } from './chamber.ts';
import { putDefaults } from './defaults.ts';
import type { Given } from './given.ts';
import { Layer } from './layer.ts';
import { unknownName } from './names.ts';
import { placeIn, type Ground } from './ground.ts';
import { overlay } from './overlay.ts';
import type { ProcessSpec } from './process.ts';
import { ResolvedStep } from './resolved-step.ts';
import { setupOf } from './setup.ts';
import type { Site } from './site.ts';
import type { Cycle, Recipe, Step, Waiver } from './step.ts';
import { unmetWaivers, waiversAt, waiversOf } from './waivers.ts';
import { waivableNames } from './waivable.ts';
import { givenFrom, isWritten } from './written.ts';

/**
 * A recipe on its chamber: every step with all that it is given. Faults leave out the value they stand at, not the rest;
 * only without a chamber there is nothing to resolve.
 */
export function resolveRecipe(site: Site, document: RecipeDocument): Outcome<Recipe> {
  const { content } = document;
  const { value: chamber, faults } = site.facts(content.chamber, document);
  if (chamber === undefined) return { faults };
  const ground: Ground = { document, chamber, library: site.library, faults: [...faults] };
  const base = new Layer(chamber.layer);
  if (content.throughout !== undefined) overlay(base, content.throughout, ['throughout'], ground);
  if (content.wafer !== undefined) overlay(base, { wafer: content.wafer }, [], ground);
  const waivers = waiversAt(content.waivers, [], ground);
  const walk: Walk = { site, ground, cycles: [], steps: [] };
  const duration = resolveEntries(content.steps, { pointer: ['steps'], path: '', layer: base, waivers }, walk);
  hangWaivers(waivers, walk.steps, walk);
  return success(recipeFrom(document, chamber, walk, duration), ground.faults);
}

/** What a walk through the entries of a recipe gathers. */
interface Walk {
  readonly site: Site;
  readonly ground: Ground;
  readonly cycles: Cycle[];
  readonly steps: Step[];
}

/** Where a walk is: what holds there. */
interface Level {
  readonly pointer: Pointer;
  /** Names of the cycles so far, with a slash behind each. */
  readonly path: string;
  readonly layer: Layer;
  readonly waivers: readonly Waiver[];
}

/** Resolves entries in order; their whole time, undefined where one has none. */
function resolveEntries(entries: RecipeBlock['steps'], level: Level, walk: Walk): number | undefined {
  checkNames(entries, level.pointer, walk.ground);
  let duration: number | undefined = 0;
  for (const [index, entry] of entries.entries()) {
    const pointer = [...level.pointer, index];
    const time =
      'steps' in entry ? resolveCycle(entry, pointer, level, walk) : resolveStep(entry, pointer, level, walk);
    duration = duration === undefined || time === undefined ? undefined : duration + time;
  }
  return duration;
}

function resolveCycle(cycle: CycleBlock, pointer: Pointer, level: Level, walk: Walk): number | undefined {
  const { ground } = walk;
  const path = `${level.path}${cycle.name}`;
  const repeat = repeatOf(cycle, pointer, ground);
  if (repeat !== undefined) walk.cycles.push({ path, repeat });
  const layer = cycle.throughout === undefined ? level.layer : new Layer(level.layer);
  if (cycle.throughout !== undefined) overlay(layer, cycle.throughout, [...pointer, 'throughout'], ground);
  const own = waiversAt(cycle.waivers, pointer, ground);
  const waivers = own.length === 0 ? level.waivers : [...level.waivers, ...own];
  const first = walk.steps.length;
  const time = resolveEntries(cycle.steps, { pointer: [...pointer, 'steps'], path: `${path}/`, layer, waivers }, walk);
  hangWaivers(own, walk.steps.slice(first), walk);
  return time === undefined || repeat === undefined ? undefined : time * repeat.value;
}

function resolveStep(step: StepBlock, pointer: Pointer, level: Level, walk: Walk): number | undefined {
  const { site, ground } = walk;
  const layer = new Layer(level.layer);
  overlay(layer, step, pointer, ground);
  settleAmounts(layer, ground.faults);
  checkFill(layer, ground.faults);
  const setup = setupOf(layer, ground.chamber);
  putDefaults(layer, setup, processOf(step, pointer, walk));
  const own = waiversAt(step.waivers, pointer, ground);
  const above = own.length === 0 ? level.waivers : [...level.waivers, ...own];
  const waivers = waiversOf(step.process, above, (process) => waivableNames(site, process));
  const path = `${level.path}${step.name}`;
  const number = walk.steps.length + 1;
  const resolved = new ResolvedStep({ step, path, number, pointer, document: ground.document, layer, setup, waivers });
  walk.steps.push(resolved);
  hangWaivers(own, [resolved], walk);
  return layer.givens.get('time')?.value;
}

function processOf({ process }: StepBlock, pointer: Pointer, { site, ground }: Walk): ProcessSpec | undefined {
  const spec = site.process(process);
  if (spec !== undefined) return spec;
  const place = placeIn(ground, pointer, ['process']);
  ground.faults.push(
    unknownName(place, 'process', process, site.processNames(), 'the name of a process; `list processes` tells them'),
  );
  return undefined;
}

function hangWaivers(waivers: readonly Waiver[], steps: readonly Step[], { site, ground }: Walk): void {
  if (waivers.length > 0)
    ground.faults.push(...unmetWaivers(waivers, steps, (process) => waivableNames(site, process)));
}

function repeatOf({ repeat }: CycleBlock, pointer: Pointer, ground: Ground): Given | undefined {
  if (!isWritten(repeat)) return undefined;
  const given = givenFrom('repeat', repeat, STATED);
  const least = Math.min(given.value, given.span?.kind === 'range' ? (given.span.atLeast ?? given.value) : given.value);
  if (least >= 1) return given;
  ground.faults.push({
    place: placeIn(ground, pointer, ['repeat']),
    found: `a cycle that repeats ${least} times`,
    right: '1 or more',
  });
  return undefined;
}

/** Steps and cycles side by side have names of their own: a path names one step. */
function checkNames(entries: RecipeBlock['steps'], pointer: Pointer, ground: Ground): void {
  const lines = new Map<string, number>();
  for (const [index, { name }] of entries.entries()) {
    const first = lines.get(name);
    if (first === undefined) lines.set(name, index);
    else {
      const { line } = placeIn(ground, pointer, [first, 'name']);
      const place = placeIn(ground, pointer, [index, 'name']);
      ground.faults.push({ place, found: `'${name}' is also the step in line ${line}`, right: 'a name of its own' });
    }
  }
}

function checkFill({ givens, parts }: Layer, faults: Fault[]): void {
  const fill = givens.get('fill_to');
  if (fill === undefined || parts.throttle === 'closed' || !('place' in fill.origin)) return;
  faults.push({
    place: fill.origin.place,
    found: 'fill_to with the throttle not closed',
    right: 'throttle: closed beside it',
  });
}

function recipeFrom(document: RecipeDocument, chamber: ChamberFacts, walk: Walk, duration: number | undefined): Recipe {
  const { content, source } = document;
  const { title, revision, qualified_on } = content;
  return {
    file: source.file,
    name: content.name,
    place: document.place(['name']),
    ...(title === undefined ? {} : { title }),
    ...(revision === undefined ? {} : { revision }),
    ...(qualified_on === undefined ? {} : { qualifiedOn: qualified_on }),
    chamber: chamberName(chamber),
    cycles: walk.cycles,
    steps: walk.steps,
    ...(duration === undefined ? {} : { duration }),
  };
}

function chamberName({ document: { content, source } }: ChamberFacts): Recipe['chamber'] {
  const { name, title, revision } = content;
  return {
    name,
    file: source.file,
    ...(revision === undefined ? {} : { revision }),
    ...(title === undefined ? {} : { title }),
  };
}
