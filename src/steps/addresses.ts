import { nearest } from '../units/suggest.ts';
import type { Dimension } from '../units/dimensions.ts';

/** What may stand at an address of a step. `*` stands for one name: of a line, a gas, a length, a target. */
export interface AddressFacts {
  readonly pattern: string;
  readonly dimension: Dimension;
  /** For messages and lists: "flow of a gas line". */
  readonly says: string;
}

/** The dimension of what stands at an address; undefined where a step has no such setpoint. */
export function dimensionOf(address: string): Dimension | undefined {
  return addressFacts(address)?.dimension;
}

export function addressFacts(address: string): AddressFacts | undefined {
  const plain = BY_PATTERN.get(address);
  if (plain !== undefined) return plain;
  const [first = '', second = '', third, ...more] = address.split('.');
  if (second === '' || more.length > 0) return undefined;
  return BY_PATTERN.get(third === undefined ? `${first}.*` : `${first}.*.${third}`);
}

/** The address that was probably meant by an unknown one, its names kept. */
export function nearestAddress(address: string): string | undefined {
  const [first = '', second, third] = address.split('.');
  const family = nearest(first, FAMILIES);
  if (family === undefined || second === undefined) return nearest(address, PLAIN_PATTERNS);
  const tail = third === undefined ? second : `${second}.${third}`;
  const named = `${family}.${tail}`;
  if (dimensionOf(named) !== undefined) return named;
  if (third === undefined) return nearest(named, PLAIN_PATTERNS);
  const key = nearest(third, keysBelow(`${family}.*.`));
  return key === undefined ? nearest(named, PLAIN_PATTERNS) : `${family}.${second}.${key}`;
}

/** Every address that a step, a limit, a usual range or a stand-in may name. */
export const ADDRESSES: readonly AddressFacts[] = [
  { pattern: 'time', dimension: 'time', says: 'time of the step' },
  { pattern: 'pressure', dimension: 'pressure', says: 'pressure that the throttle holds' },
  { pattern: 'throttle', dimension: 'fraction', says: 'how far the throttle is open' },
  { pattern: 'fill_to', dimension: 'pressure', says: 'pressure at which a soak with the valve shut begins' },
  { pattern: 'flows.*', dimension: 'flow', says: 'flow of a gas line' },
  { pattern: 'composition.*', dimension: 'fraction', says: 'share of a gas that the molecules meet' },
  { pattern: 'temperatures.wall', dimension: 'temperature', says: 'temperature of the wall' },
  { pattern: 'temperatures.wafer', dimension: 'temperature', says: 'temperature of the wafer' },
  { pattern: 'temperatures.gas', dimension: 'temperature', says: 'temperature of the gas' },
  { pattern: 'temperatures.chuck', dimension: 'temperature', says: 'temperature of the chuck' },
  { pattern: 'lengths.*', dimension: 'length', says: 'a length that Knudsen numbers are taken against' },
  { pattern: 'power.*', dimension: 'power', says: 'power of a generator' },
  { pattern: 'duty.*', dimension: 'fraction', says: 'share of the time in which a generator delivers' },
  { pattern: 'plasma.bias_voltage', dimension: 'voltage', says: 'voltage between plasma-facing electrode and ground' },
  { pattern: 'plasma.electron_temperature', dimension: 'energy', says: 'temperature of the electrons' },
  { pattern: 'plasma.electron_density', dimension: 'number-density', says: 'density of the electrons' },
  { pattern: 'plasma.sheath', dimension: 'length', says: 'thickness of the sheath, where measured' },
  { pattern: 'plasma.ion_current', dimension: 'current-density', says: 'current density of the ions' },
  { pattern: 'surface.rate', dimension: 'rate', says: 'rate at which the film grows or is etched' },
  { pattern: 'surface.open_area', dimension: 'fraction', says: 'share of the wafer that takes part' },
  { pattern: 'surface.coverage', dimension: 'fraction', says: 'coverage that counts as saturated' },
  { pattern: 'surface.enhancement', dimension: 'number', says: 'real area of the wafer over its flat area' },
  { pattern: 'reactant.sticking', dimension: 'fraction', says: 'sticking of the reactant' },
  { pattern: 'reactant.site_density', dimension: 'site-density', says: 'molecules that a surface takes up' },
  { pattern: 'targets.voltage', dimension: 'voltage', says: 'voltage of the target that runs' },
  { pattern: 'targets.energy', dimension: 'energy', says: 'energy at which atoms leave the target that runs' },
  { pattern: 'targets.throw', dimension: 'length', says: 'throw of the target that runs' },
  { pattern: 'targets.*.voltage', dimension: 'voltage', says: 'voltage of a target' },
  { pattern: 'targets.*.energy', dimension: 'energy', says: 'energy at which atoms leave a target' },
  { pattern: 'targets.*.throw', dimension: 'length', says: 'distance from a target to the wafer' },
  { pattern: 'melts.temperature', dimension: 'temperature', says: 'temperature of the melt that runs' },
  { pattern: 'melts.throw', dimension: 'length', says: 'throw of the melt that runs' },
  { pattern: 'melts.*.temperature', dimension: 'temperature', says: 'temperature of a melt' },
  { pattern: 'melts.*.throw', dimension: 'length', says: 'distance from a melt to the wafer' },
  { pattern: 'wafer.diameter', dimension: 'length', says: 'diameter of a wafer' },
  { pattern: 'wafer.width', dimension: 'length', says: 'width of a panel' },
  { pattern: 'wafer.length', dimension: 'length', says: 'length of a panel' },
  { pattern: 'wafer.thickness', dimension: 'length', says: 'thickness of a wafer' },
  { pattern: 'wafer.count', dimension: 'number', says: 'wafers in the chamber' },
  { pattern: 'wafer.coated_faces', dimension: 'number', says: 'faces of a wafer that take part' },
  { pattern: 'wafer.feature.width', dimension: 'length', says: 'width of the hole or trench' },
  { pattern: 'wafer.feature.depth', dimension: 'length', says: 'depth of the hole or trench' },
  { pattern: 'backside.pressure', dimension: 'pressure', says: 'pressure of the gas behind the wafer' },
  { pattern: 'backside.heat_load', dimension: 'power', says: 'heat that the wafer takes up' },
  { pattern: 'body.diameter', dimension: 'length', says: 'inner diameter of the chamber' },
  { pattern: 'body.height', dimension: 'length', says: 'inner height of the chamber' },
  { pattern: 'body.length', dimension: 'length', says: 'inner length of the tube' },
  { pattern: 'body.volume', dimension: 'volume', says: 'gas volume of the chamber' },
  { pattern: 'body.wall_area', dimension: 'area', says: 'area of the chamber that gas touches' },
];

const BY_PATTERN: ReadonlyMap<string, AddressFacts> = new Map(ADDRESSES.map((facts) => [facts.pattern, facts]));
const PATTERNS: readonly string[] = [...BY_PATTERN.keys()];
const PLAIN_PATTERNS: readonly string[] = PATTERNS.filter((pattern) => !pattern.includes('*'));
const FAMILIES: readonly string[] = [...new Set(PATTERNS.map((pattern) => pattern.split('.')[0] ?? ''))];

function keysBelow(start: string): readonly string[] {
  return PATTERNS.filter((pattern) => pattern.startsWith(start)).map((pattern) => pattern.slice(start.length));
}
