import type { Pointer } from '../documents/document.ts';
import type { Throughout } from '../documents/generated/types.ts';
import type { Layer } from './layer.ts';
import { checkFilm, checkGas, unknownName } from './names.ts';
import { placeIn, type Ground } from './ground.ts';

type Block<K extends keyof Throughout> = NonNullable<Throughout[K]>;

/** Puts what grows or is etched. Another film takes nothing over from the one below but the open area, which is the wafer's. */
export function putSurface(layer: Layer, block: Block<'surface'>, pointer: Pointer, ground: Ground): void {
  const below = layer.parts.surface;
  const film = block.etches ?? block.grows ?? below?.film;
  if (film !== undefined) {
    const stated = block.etches ?? block.grows;
    const mode = block.etches !== undefined ? 'etches' : block.grows !== undefined ? 'grows' : (below?.mode ?? 'grows');
    const other = below !== undefined && (below.film !== film || below.mode !== mode);
    if (other) for (const key of OF_THE_FILM) layer.drop(`surface.${key}`);
    const product = block.product ?? (other ? undefined : below?.product);
    layer.parts.surface = { film, mode, ...(product === undefined ? {} : { product }) };
    if (stated !== undefined)
      checkFilm(
        stated,
        () => placeIn(ground, pointer, ['surface', block.etches === undefined ? 'grows' : 'etches']),
        ground,
      );
  }
  layer.putAll('surface', block, ground.chamber.plain);
}

const OF_THE_FILM = ['rate', 'coverage', 'enhancement'];

/** Puts the reactant. Another one takes nothing over from the one below. */
export function putReactant(layer: Layer, block: Block<'reactant'>, pointer: Pointer, ground: Ground): void {
  const { reactant } = layer.parts;
  if (reactant !== undefined && reactant !== block.gas) layer.forget('reactant');
  checkGas(block.gas, () => placeIn(ground, pointer, ['reactant', 'gas']), ground);
  layer.putAll('reactant', block, ground.chamber.plain);
  layer.parts.reactant = block.gas;
}

/** Puts what a step sets on a target or melt, which thereby runs. */
export function putRunning(
  layer: Layer,
  key: 'targets' | 'melts',
  block: Readonly<Record<string, object>>,
  pointer: Pointer,
  ground: Ground,
): void {
  const known = ground.chamber[key];
  const running: string[] = [];
  for (const [name, setpoints] of Object.entries(block)) {
    if (known.has(name)) {
      layer.putAll(`${key}.${name}`, setpoints, ground.chamber.plain);
      running.push(name);
    } else {
      const sort = key === 'targets' ? 'target' : 'melt';
      const place = placeIn(ground, pointer, [key, name], 'key');
      ground.faults.push(
        unknownName(place, sort, name, [...known.keys()], `describe it under \`${key}\` of the chamber`),
      );
    }
  }
  const [, second] = running;
  if (second !== undefined) {
    const place = placeIn(ground, pointer, [key, second], 'key');
    ground.faults.push({ place, found: `${running.join(' and ')} in one step`, right: 'the one that runs' });
  }
  if (running.length > 0) layer.parts[key] = running;
}
