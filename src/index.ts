/*
 * The library face. Everything is synchronous, faults are values, files are read only through a shelf.
 * What is not exported here may change any day.
 */

export { openRun } from './quantities/open-run.ts';
export { parseReference, referenceName } from './quantities/reference.ts';
export { Source } from './shelf/place.ts';
export { diskShelf } from './shelf/disk.ts';
export { mapShelf } from './shelf/map.ts';
export { openSite } from './steps/site.ts';
export { judge } from './verdicts/judge.ts';

export type { Change, Run, StepRun as Step } from './quantities/run.ts';
export type { Inapplicable, Known, Missing, Reading } from './quantities/reading.ts';
export type { Reference } from './quantities/reference.ts';
export type { Fault, Outcome } from './shelf/fault.ts';
export type { Place } from './shelf/place.ts';
export type { Entry, Kind as EntryKind, Shelf } from './shelf/shelf.ts';
export type { Given, Origin, Span } from './steps/given.ts';
export type { Site } from './steps/site.ts';
export type { JudgedStep, Judgement } from './verdicts/judgement.ts';
export type { Bound, Caution, Grades, Kind, Level, Note, Verdict } from './verdicts/verdict.ts';
