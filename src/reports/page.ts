import type { Kind, Level } from '../verdicts/verdict.ts';

/*
 * What a command has to say, in words and display units but without a layout: any format draws any page.
 */

/** `first` is what a reader must see; `detail` may be drawn fainter. */
export type Weight = 'first' | 'detail';

export interface Page {
  readonly blocks: readonly Block[];
  /** The same as flat rows, each number in a cell of its own. Made only where a format asks. */
  readonly sheet: () => Sheet;
}

/** Flat rows under one header: what CSV holds. */
export interface Sheet {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

export type Block = Heading | RecipeHead | Steps | Table | Entries | Chain | Sentence | Remark | FaultLine;

export interface Heading {
  readonly kind: 'heading';
  readonly text: string;
  /** What stands beside it in a lighter hand. */
  readonly aside?: string;
}

/** Which recipe on which chamber; how long, how many steps. */
export interface RecipeHead {
  readonly kind: 'recipe';
  readonly name: string;
  readonly revision?: string;
  readonly chamber: string;
  /** Absent where nothing in the file is spoken of. */
  readonly file?: string;
  readonly size: readonly string[];
  /** The whole outcome in a few words, where the recipe's steps are not shown. */
  readonly outcome?: string;
}

/** Steps of one recipe, drawn with common columns. */
export interface Steps {
  readonly kind: 'steps';
  readonly steps: readonly (StepBlock | CycleBlock)[];
}

export interface StepBlock {
  readonly kind: 'step';
  readonly number: number;
  readonly path: string;
  readonly process: string;
  readonly time: string;
  readonly pressure: string;
  /** Flows that share a unit together: `Ar 150, CHF3 40 sccm`. */
  readonly flows: string;
  /** Parts of the outcome that need no line of their own: `pass 9`, `nothing judged`. */
  readonly outcome: readonly string[];
  readonly findings: readonly Finding[];
}

export interface CycleBlock {
  readonly kind: 'cycle';
  readonly path: string;
  readonly repeat: string;
}

/** A verdict in words. */
export interface Finding {
  /** Word of the first column. */
  readonly word: Kind | 'waived';
  readonly level?: Level;
  /** What was found, what the bound is. */
  readonly lead: string;
  readonly sentences: readonly Told[];
  /** Where it stands: `free-throw`, `line 27`. */
  readonly where: readonly string[];
}

export interface Told {
  readonly weight: Weight;
  readonly text: string;
}

export interface Table {
  readonly kind: 'table';
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly string[])[];
  /** How many first columns are repeated where a table is too wide and is drawn in pieces. */
  readonly key: number;
}

export interface Column {
  readonly title: string;
  readonly align: 'left' | 'right';
  /** May be broken over lines. */
  readonly wraps?: boolean;
}

/** Names with what there is to know of each. */
export interface Entries {
  readonly kind: 'entries';
  readonly entries: readonly Entry[];
}

export interface Entry {
  readonly name: string;
  readonly aside?: string;
  readonly lines: readonly Told[];
}

/** How a number comes about: each line is read from lines above it. */
export interface Chain {
  readonly kind: 'chain';
  readonly links: readonly Link[];
}

export interface Link {
  readonly number: number;
  readonly symbol: string;
  readonly name: string;
  /** Value with expanded uncertainty in display units, or why there is none. */
  readonly value: string;
  /** The same in SI to five digits, for the pocket calculator; absent where the value is shown in SI. */
  readonly si?: string;
  /** Numbers of the links it is read from. */
  readonly from: readonly number[];
  /** The law and its source, or where the value stands. */
  readonly grounds: string;
  readonly remarks: readonly string[];
}

export interface Sentence {
  readonly kind: 'sentence';
  readonly weight: Weight;
  readonly text: string;
}

/** A caution or a note, told by its word. */
export interface Remark {
  readonly kind: 'note' | 'caution';
  readonly text: string;
}

export interface FaultLine {
  readonly kind: 'fault';
  /** `file:line:column`. */
  readonly where: string;
  readonly found: string;
  readonly right: string;
}
