import type { Shares } from '../documents/generated/types.ts';
import type { ChamberDraft } from './chamber-draft.ts';
import { checkAtom, unknownName } from './names.ts';
import { putShares } from './shares.ts';
import type { Emitter } from './step.ts';

/** The sputter targets and melts of a chamber by name. */
export interface Emitters {
  readonly targets: ReadonlyMap<string, Emitter>;
  readonly melts: ReadonlyMap<string, Emitter>;
}

/** The chamber's targets and melts; their throws go to the addresses at which a step may set them. */
export function chamberEmitters(draft: ChamberDraft): Emitters {
  const targets = new Map<string, Emitter>();
  const melts = new Map<string, Emitter>();
  for (const [name, target] of Object.entries(draft.content.targets ?? {})) {
    targets.set(name, { name, atoms: atomsOf(['targets', name, 'material'], target.material, draft) });
    if (target.throw !== undefined) draft.layer.put(`targets.${name}.throw`, target.throw, draft.plain);
    if (target.generator !== undefined) checkGenerator(name, target.generator, draft);
  }
  for (const [name, melt] of Object.entries(draft.content.melts ?? {})) {
    melts.set(name, { name, atoms: atomsOf(['melts', name, 'material'], melt.material, draft) });
    if (melt.throw !== undefined) draft.layer.put(`melts.${name}.throw`, melt.throw, draft.plain);
  }
  return { targets, melts };
}

/** The atoms of a material, with the addresses of their shares where there are several. */
function atomsOf(pointer: readonly string[], material: string | Shares, draft: ChamberDraft): Emitter['atoms'] {
  const { document, layer, faults } = draft;
  if (typeof material === 'string') {
    checkAtom(material, () => document.place(pointer), draft);
    return [{ atom: material }];
  }
  const address = `chamber.${pointer.join('.')}`;
  const atoms = Object.keys(material);
  for (const atom of atoms) checkAtom(atom, () => document.place([...pointer, atom], 'key'), draft);
  faults.push(...putShares(layer, address, material));
  return atoms.map((atom) => ({ atom, share: `${address}.${atom}` }));
}

function checkGenerator(target: string, generator: string, { content, document, faults }: ChamberDraft): void {
  const known = Object.keys(content.generators ?? {});
  if (known.includes(generator)) return;
  const place = document.place(['targets', target, 'generator']);
  faults.push(unknownName(place, 'generator', generator, known, 'describe it under `generators` of the chamber'));
}
