import type { Given } from './given.ts';
import type { Layer } from './layer.ts';
import type { ProcessSpec } from './process.ts';
import type { Setup } from './step.ts';

/** Puts what stands in where no document says anything: of the program for any step, of the process for its own. */
export function putDefaults(layer: Layer, setup: Setup, process: ProcessSpec | undefined): void {
  if (setup.wafer === 'disc' || setup.wafer === 'panel') {
    standIn(layer, ONE_WAFER);
    standIn(layer, ONE_FACE);
  }
  if (setup.surface !== undefined) standIn(layer, ALL_OPEN);
  if (process === undefined) return;
  for (const { given } of process.standsIn) {
    const address = ownAddress(given.address, setup);
    if (address !== undefined) standIn(layer, address === given.address ? given : { ...given, address });
  }
}

function standIn(layer: Layer, given: Given): void {
  const { address } = given;
  if (layer.givens.has(address) || isMarked(address, layer.unknown) || isMarked(address, layer.none)) return;
  layer.givens.set(given);
}

/** Whether the address, or the part that it belongs to, is marked. */
function isMarked(address: string, marked: ReadonlySet<string>): boolean {
  if (marked.size === 0) return false;
  for (let end = address.length; end > 0; end = address.lastIndexOf('.', end - 1)) {
    if (marked.has(address.slice(0, end))) return true;
  }
  return false;
}

/** `targets.energy` is that of the target that runs. */
function ownAddress(address: string, { target, melt }: Setup): string | undefined {
  const [family = '', key = '', more] = address.split('.');
  if (more !== undefined || (family !== 'targets' && family !== 'melts')) return address;
  const running = family === 'targets' ? target : melt;
  return running === undefined ? undefined : `${family}.${running.name}.${key}`;
}

const ONE_WAFER = rule('wafer.count', 1, 'number', '', 'one wafer where nothing else is said');
const ONE_FACE = rule('wafer.coated_faces', 1, 'number', '', 'one face takes part where nothing else is said');
const ALL_OPEN = rule('surface.open_area', 1, 'fraction', '%', 'the whole wafer takes part where nothing else is said');

function rule(address: string, value: number, dimension: Given['dimension'], unit: string, because: string): Given {
  return { address, value, uncertainty: 0, dimension, unit, origin: { default: 'rule', because } };
}
