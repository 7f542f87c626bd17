import type { Place } from '../shelf/place.ts';
import type { Reference } from '../quantities/reference.ts';
import type { Waiver } from '../steps/step.ts';
import type { Hazard } from '../substances/gas.ts';

/** Kinds of a verdict, those of SARIF. */
export type Kind = 'pass' | 'review' | 'fail' | 'open' | 'notApplicable';
/** Grades of a bound, the levels of SARIF, gravest first. */
export type Level = 'error' | 'warning' | 'note';

/** Limits of a bound by grade, in SI. */
export type Grades = Readonly<Partial<Record<Level, number>>>;
export interface Bound {
  readonly at_least?: Grades;
  readonly at_most?: Grades;
}

/** One assumption of a step's process held against its number. */
export interface Verdict {
  /** `process/assumption`. */
  readonly name: string;
  readonly process: string;
  readonly assumption: string;
  readonly statement: string;
  /** Source of the bound. */
  readonly source: string;
  readonly reference: Reference;
  readonly over?: Reference;
  readonly kind: Kind;
  /** Grade crossed, unsure or open; the gravest of the bound for a pass. */
  readonly level: Level;
  readonly value?: number;
  /** Expanded, absolute. */
  readonly uncertainty?: number;
  readonly bound: Bound;
  /** The limit that decides: of the grade crossed or unsure, or the nearest for a pass. */
  readonly limit?: { readonly side: 'at_least' | 'at_most'; readonly value: number };
  /** Factor by which the value is on the good side of the limit; below one it is beyond it. */
  readonly margin?: number;
  /** For a fail: a graver grade that the uncertainty does not rule out. */
  readonly perhaps?: Level;
  /** The gas or atom that `worst` or a role stands for. */
  readonly subject?: string;
  /** At which instant of a changing step, or at which end of a range, the worst value stands. */
  readonly instance?: Instance;
  /** Of an open verdict. */
  readonly needs?: readonly string[];
  /** Of a verdict that does not apply. */
  readonly because?: string;
  readonly remarks: readonly string[];
  /** Defaults that entered the value: address and reason. */
  readonly assumed: readonly Assumed[];
  readonly cure: readonly string[];
  readonly place: Place;
  readonly waived?: {
    readonly reason: string;
    readonly approved_by: string;
    readonly until: string;
    readonly holds_to?: number;
  };
}

export interface Assumed {
  readonly address: string;
  readonly value: number;
  readonly uncertainty: number;
  readonly unit: string;
  readonly because: string;
  /** Share of the value's variance that this default causes, 0 to 1. */
  readonly share: number;
}

/** Where in a changing step, or at which limit of a range, a value was read. */
export type Instance =
  | { readonly kind: 'ramp'; readonly fraction: number; readonly time?: number; readonly over: 'step' | 'laps' }
  | { readonly kind: 'range'; readonly address: string; readonly limit: 'at_least' | 'at_most' };

/** A remark that hazards call for: it never passes or fails anything. Its words are made by the reports. */
export type Caution = GasHazard | FuelWithOxidiser;

/** Gases of one hazard that the recipe uses. */
export interface GasHazard {
  readonly kind: 'hazard';
  readonly hazard: Hazard;
  readonly gases: readonly string[];
  /** Paths of the steps that use them. */
  readonly steps: readonly string[];
}

/** A fuel and an oxidiser that flow in one step. */
export interface FuelWithOxidiser {
  readonly kind: 'fuel-with-oxidiser';
  readonly fuels: readonly string[];
  readonly oxidisers: readonly string[];
  readonly steps: readonly string[];
}

/** Something worth knowing that no assumption judges. Its words are made by the reports. */
export type Note =
  | {
      readonly kind: 'waiver-unused' | 'waiver-expired' | 'waiver-outgrown';
      readonly step: string;
      readonly waiver: Waiver;
    }
  | {
      readonly kind: 'chamber-revision';
      readonly qualifiedOn: string;
      readonly revision: string | undefined;
      readonly place: Place;
    };
