import type { Pointer, RecipeDocument } from '../documents/document.ts';
import type { Step as StepBlock } from '../documents/generated/types.ts';
import type { Place } from '../shelf/place.ts';
import type { Given } from './given.ts';
import type { Layer } from './layer.ts';
import type { Setup, Step, Waiver } from './step.ts';

interface Parts {
  readonly step: StepBlock;
  readonly path: string;
  readonly number: number;
  readonly pointer: Pointer;
  readonly document: RecipeDocument;
  readonly layer: Layer;
  readonly setup: Setup;
  readonly waivers: readonly Waiver[];
}

/** A step that looks its places up only when they are asked for. */
export class ResolvedStep implements Step {
  readonly path: string;
  readonly name: string;
  readonly number: number;
  readonly process: string;
  readonly reason?: string;
  readonly endsOn?: string;
  readonly givens: ReadonlyMap<string, Given>;
  readonly unknown: ReadonlySet<string>;
  readonly none: ReadonlySet<string>;
  readonly setup: Setup;
  readonly waivers: readonly Waiver[];
  readonly #document: RecipeDocument;
  readonly #pointer: Pointer;
  #place: Place | undefined;

  constructor({ step, path, number, pointer, document, layer, setup, waivers }: Parts) {
    this.path = path;
    this.name = step.name;
    this.number = number;
    this.process = step.process;
    if (step.reason !== undefined) this.reason = step.reason;
    if (step.ends_on !== undefined) this.endsOn = step.ends_on;
    this.givens = layer.givens;
    this.unknown = layer.unknown;
    this.none = layer.none;
    this.setup = setup;
    this.waivers = waivers;
    this.#document = document;
    this.#pointer = pointer;
  }

  get place(): Place {
    this.#place ??= this.#document.place([...this.#pointer, 'name']);
    return this.#place;
  }

  get processPlace(): Place {
    return this.#document.place([...this.#pointer, 'process']);
  }
}
