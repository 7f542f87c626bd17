import type { ProcessDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import { unknownName } from './names.ts';
import { basedOn, processFrom, type ProcessSpec } from './process.ts';

/** Processes by name: a site's own before the built-in ones. */
export interface Processes {
  named(name: string): ProcessSpec | undefined;
  names(): readonly string[];
}

/** The processes of a site over those below it. One that is based on its own name changes the one below. */
export function processesOver(
  documents: readonly ProcessDocument[],
  below: Processes,
): Processes & { readonly faults: readonly Fault[] } {
  const faults: Fault[] = [];
  const own = new Map<string, ProcessSpec>();
  for (const document of documents) {
    const { value, faults: wrong } = processFrom(document);
    faults.push(...wrong);
    if (value === undefined) continue;
    const first = own.get(value.name);
    if (first === undefined) own.set(value.name, value);
    else
      faults.push({
        place: value.place,
        found: `a second process '${value.name}', the first is in ${first.place.file}`,
        right: 'a name of its own',
      });
  }
  const names = [...new Set([...own.keys(), ...below.names()])];
  const bases: Bases = { own, below, names, faults };
  const whole = new Map([...own.values()].map((spec) => [spec.name, withBase(spec, bases, [])]));
  return { named: (name) => whole.get(name) ?? below.named(name), names: () => names, faults };
}

interface Bases {
  readonly own: ReadonlyMap<string, ProcessSpec>;
  readonly below: Processes;
  readonly names: readonly string[];
  readonly faults: Fault[];
}

function withBase(spec: ProcessSpec, bases: Bases, above: readonly string[]): ProcessSpec {
  const { basedOn: name } = spec;
  if (name === undefined) return spec;
  const way = [...above, spec.name];
  if (name !== spec.name && way.includes(name)) {
    // A loop is met from each of its members; one of them tells.
    if (way[0] === name && way.every((one) => name <= one)) bases.faults.push(loopFault(spec, way));
    return spec;
  }
  const base = name === spec.name ? undefined : bases.own.get(name);
  const found = base === undefined ? bases.below.named(name) : withBase(base, bases, way);
  if (found !== undefined) return basedOn(spec, found);
  if (above.length === 0)
    bases.faults.push(
      unknownName(spec.basedOnPlace ?? spec.place, 'process', name, bases.names, 'the name of a process'),
    );
  return spec;
}

function loopFault(spec: ProcessSpec, way: readonly string[]): Fault {
  const place = spec.basedOnPlace ?? spec.place;
  return { place, found: `processes based on each other: ${way.join(', ')}`, right: 'a base that stands by itself' };
}
