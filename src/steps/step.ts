import type { Place } from '../shelf/place.ts';
import type { Given } from './given.ts';

/** A step as its recipe, chamber and site resolve it: what it is given, and what it is made of. */
export interface Step {
  /** Names of its cycles and its own, joined by `/`. */
  readonly path: string;
  readonly name: string;
  /** 1 for the first step of the recipe, in the order in which steps are written. */
  readonly number: number;
  /** Name of the intended process. */
  readonly process: string;
  /** Of the step's name. */
  readonly place: Place;
  readonly processPlace: Place;
  /** Why the step is `unassessed`. */
  readonly reason?: string;
  readonly endsOn?: string;
  /** Setpoints, facts of the chamber and defaults, by address. */
  readonly givens: ReadonlyMap<string, Given>;
  /** Addresses stated `unknown`: missing, whatever the default. */
  readonly unknown: ReadonlySet<string>;
  /** Addresses stated `none` (`wafer`, `wafer.feature`, `backside`): what depends on them does not apply. */
  readonly none: ReadonlySet<string>;
  readonly setup: Setup;
  readonly waivers: readonly Waiver[];
}

/** What a step is made of, apart from numbers: steps of one setup have the same numbers to read. */
export interface Setup {
  /** Gas lines that the step names, with the gases they bring. */
  readonly lines: readonly Line[];
  /** Every gas that the lines or the stated composition bring, each once, in order of first mention. */
  readonly gases: readonly string[];
  /** Whether the step states what the molecules meet, so that the feed does not stand for it. */
  readonly composition: boolean;
  /** Gases of the chamber's residual gas; empty where the chamber names none. */
  readonly residual: readonly string[];
  readonly flow: 'mixed' | 'radial' | 'axial';
  readonly pumpSpeed: 'none' | 'one' | 'by-gas' | 'by-pressure';
  /** Upper limits of the pump's table of speeds by pressure, as far as the number of its rows. */
  readonly pumpRows: number;
  readonly throttle: 'holds' | 'open' | 'closed' | 'position';
  readonly target?: Emitter;
  readonly melt?: Emitter;
  /** Film that grows or is etched. */
  readonly surface?: { readonly film: string; readonly mode: 'grows' | 'etches'; readonly product?: string };
  readonly reactant?: string;
  /** What the ions are, where the step says so. */
  readonly ion?: string;
  /** Gas behind the wafer. */
  readonly backside?: string;
  /** Material of the chamber's walls. */
  readonly walls?: string;
  readonly wafer: 'none' | 'disc' | 'panel' | 'unknown';
  readonly feature?: 'hole' | 'trench';
  /** Inlets of the chamber that have holes. */
  readonly inlets: readonly string[];
  readonly gauges: readonly string[];
  /** Generators that deliver power in this step. */
  readonly powered: readonly string[];
}

export interface Line {
  readonly name: string;
  /** Gases and where their shares stand: `chamber.gas_lines.NAME.brings.GAS`; a line of one gas has no address. */
  readonly brings: readonly { readonly gas: string; readonly share?: string }[];
}

/** A sputter target or a melt: its name and the atoms that leave it. */
export interface Emitter {
  readonly name: string;
  readonly atoms: readonly { readonly atom: string; readonly share?: string }[];
}

export interface Waiver {
  readonly assumption: string;
  readonly reason: string;
  readonly approvedBy: string;
  /** Last day on which it holds, as YYYY-MM-DD. */
  readonly until: string;
  /** Value up to which it was granted, as written. */
  readonly holdsTo?: string | number;
  readonly place: Place;
}

/** A cycle: steps that repeat. */
export interface Cycle {
  readonly path: string;
  readonly repeat: Given;
}

/** A recipe on its chamber. */
export interface Recipe {
  readonly file: string;
  readonly name: string;
  /** Of its name. */
  readonly place: Place;
  readonly title?: string;
  readonly revision?: string;
  readonly qualifiedOn?: string;
  readonly chamber: {
    readonly name: string;
    readonly file: string;
    readonly revision?: string;
    readonly title?: string;
  };
  readonly cycles: readonly Cycle[];
  readonly steps: readonly Step[];
  /** Whole time with its repeats at their usual values, seconds; undefined where a step has none. */
  readonly duration?: number;
}
