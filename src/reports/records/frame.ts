import type { BandConvention } from '../../physics/regime.ts';

/** What stands before the recipes of a result. */
export interface FrameHead {
  readonly version: string;
  /** Absent without a site, or where the recipes are of several. */
  readonly site?: string;
  /** Absent where the sites of the recipes differ in it. */
  readonly coverageFactor?: number;
  readonly bands?: BandConvention;
}

/** What stands behind them, known once the last recipe was judged. */
export interface FrameTail {
  readonly cautions: readonly object[];
  readonly faults: readonly object[];
  readonly summary: object;
}

/** The text of a check result up to its first recipe. */
export function frameOpening({ version, site, coverageFactor, bands }: FrameHead): string {
  const head = {
    format: 1,
    tool: { name: 'regimen', version },
    ...(site === undefined ? {} : { site }),
    ...(coverageFactor === undefined ? {} : { coverage_factor: coverageFactor }),
    ...(bands === undefined ? {} : { bands }),
  };
  return `${JSON.stringify(head, undefined, 2).slice(0, -2)},\n  "recipes": [`;
}

/** One recipe within the frame. */
export function frameRecipe(recipe: object, first: boolean): string {
  return `${first ? '' : ','}\n    ${indented(recipe, 4)}`;
}

/** The text behind the last recipe. */
export function frameClosing({ cautions, faults, summary }: FrameTail, anyRecipe: boolean): string {
  const tail = JSON.stringify({ cautions, faults, summary }, undefined, 2).slice(1);
  return `${anyRecipe ? '\n  ' : ''}],${tail}\n`;
}

function indented(value: object, by: number): string {
  return JSON.stringify(value, undefined, 2).replaceAll('\n', `\n${' '.repeat(by)}`);
}
