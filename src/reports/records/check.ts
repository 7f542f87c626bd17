import type { Reference } from '../../quantities/reference.ts';
import { parseReference } from '../../quantities/reference.ts';
import { quantityNamed } from '../../quantities/catalogue.ts';
import type { StepRun } from '../../quantities/run.ts';
import type { Fault } from '../../shelf/fault.ts';
import type { Site } from '../../steps/site.ts';
import { isDefault, type Given } from '../../steps/given.ts';
import { DIMENSIONS } from '../../units/dimensions.ts';
import type { JudgedStep, Judgement } from '../../verdicts/judgement.ts';
import { cautionTexts } from '../cautions.ts';
import { blocking, type BlockOptions, type Counts } from '../counts.ts';
import { noteText } from '../notes.ts';
import { shownFor, type Shown } from '../shown.ts';
import { regimeNumbers } from '../regime-numbers.ts';
import { inCatalogueOrder, quantityRecord } from './quantity.ts';
import { verdictRecord } from './verdict.ts';

/** All that was found of one recipe, in SI. It depends on nothing but that recipe. */
export function recipeRecord(judgement: Judgement) {
  const { run, steps, notes } = judgement;
  const { file, name, title, revision, chamber, duration, cycles } = run.recipe;
  const shown = shownFor(run);
  return {
    file,
    name,
    ...(title === undefined ? {} : { title }),
    ...(revision === undefined ? {} : { revision }),
    chamber: chamber.name,
    ...(chamber.revision === undefined ? {} : { chamber_revision: chamber.revision }),
    ...(duration === undefined ? {} : { duration }),
    ...conventionsRecord(run.site),
    cycles: cycles.map(({ path, repeat }) => ({ path, repeat: repeat.value })),
    steps: steps.map((step) => stepRecord(step, judgement, shown)),
    ...(notes.length === 0 ? {} : { notes: notes.map((note) => noteText(note, judgement)) }),
  };
}

/** What the numbers and regimes of a recipe are told by, which its site decides. */
function conventionsRecord({ name, show }: Site) {
  return { ...(name === undefined ? {} : { site: name }), coverage_factor: show.coverageFactor, bands: show.bands };
}

export function cautionRecords({ run, cautions }: Judgement) {
  return cautionTexts(cautions).map((caution) => ({ file: run.recipe.file, ...caution }));
}

export function faultRecord({ place, found, right }: Fault) {
  return { file: place.file, line: place.line, column: place.column, found, right };
}

export function summaryRecord(counts: Counts, options: BlockOptions) {
  const { recipes, steps, stepsByWorst, verdicts, waived, cautions, faults, passedOver } = counts;
  const { nothingJudged, ...byWorst } = stepsByWorst;
  const { notApplicable, ...byKind } = verdicts;
  return {
    recipes,
    steps,
    steps_by_worst: { ...byWorst, nothing_judged: nothingJudged },
    verdicts: { ...byKind, not_applicable: notApplicable },
    waived,
    blocking: blocking(counts, options),
    cautions,
    faults,
    passed_over: passedOver,
  };
}

function stepRecord({ run, verdicts }: JudgedStep, { run: recipe }: Judgement, shown: Shown) {
  const { path, name, process, place, reason } = run.step;
  return {
    path,
    name,
    process,
    line: place.line,
    ...(reason === undefined ? {} : { reason }),
    givens: [...run.givens.values()].map((given) => givenRecord(given, shown)),
    quantities: numbersOf(run, verdicts, recipe.site).map((reference) => quantityRecord(run, reference, shown)),
    verdicts: verdicts.map((verdict) => verdictRecord(verdict, run, shown)),
  };
}

/** What the regime table shows, what the process shows, and what was judged. */
function numbersOf(run: StepRun, verdicts: JudgedStep['verdicts'], site: Site): readonly Reference[] {
  const shows = site.process(run.step.process)?.shows ?? [];
  const shown = shows.flatMap((name) => parseReference(name) ?? []).filter(({ id }) => quantityNamed(id) !== undefined);
  const judged = verdicts.flatMap(({ reference, over }) => (over === undefined ? [reference] : [reference, over]));
  return inCatalogueOrder([...regimeNumbers(run, site), ...shown, ...judged]);
}

function givenRecord(given: Given, { coverage }: Shown) {
  const { address, value, dimension, uncertainty, origin, span } = given;
  return {
    address,
    value,
    unit: DIMENSIONS[dimension].si,
    uncertainty: coverage * uncertainty,
    ...spanRecord(span),
    origin: isDefault(origin)
      ? { default: origin.default, because: origin.because }
      : { file: origin.place.file, line: origin.place.line, column: origin.place.column },
  };
}

function spanRecord(span: Given['span']) {
  if (span === undefined) return {};
  if (span.kind === 'ramp') return { from: span.from, to: span.to, over: span.over };
  return {
    ...(span.atLeast === undefined ? {} : { at_least: span.atLeast }),
    ...(span.atMost === undefined ? {} : { at_most: span.atMost }),
  };
}
