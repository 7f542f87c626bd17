import type { Given } from '../steps/given.ts';
import type { Dimension } from '../units/dimensions.ts';

/*
 * Values that the program itself lets stand in where nobody can be expected to know better. Each is a given like any
 * other: it is shown, it carries its uncertainty, and a site or step that states the value replaces it.
 */

interface Assumption {
  readonly value: number;
  /** Half-width of the limits between which the value surely lies; a standard uncertainty where `spread` is given. */
  readonly halfWidth?: number;
  readonly spread?: number;
  readonly dimension: Dimension;
  readonly unit: string;
  readonly because: string;
}

const ASSUMED: Readonly<Record<string, Assumption>> = {
  'assumed.gas-heating': {
    value: 150,
    halfWidth: 150,
    dimension: 'temperature-difference',
    unit: 'K',
    because: 'a plasma heats its gas 0 to 300 K above the wall (common practice)',
  },
  'assumed.gas-between': {
    value: 0.5,
    halfWidth: 0.5,
    dimension: 'fraction',
    unit: '',
    because:
      'gas between a wall and a wafer of another temperature: the middle of both, anything between them possible',
  },
  'assumed.pump-cooling': {
    value: 333.15,
    halfWidth: 40,
    dimension: 'temperature',
    unit: 'degC',
    because: 'hot gas cools to about 60 degC on its way to the pump (common practice)',
  },
  'assumed.residual.H2O': {
    value: 1,
    dimension: 'fraction',
    unit: '',
    because: 'the residual gas of an unbaked chamber is mostly water (common practice)',
  },
  'assumed.residual-sticking': {
    value: 0.55,
    halfWidth: 0.45,
    dimension: 'fraction',
    unit: '',
    because:
      'of the reactive residual molecules that hit a growing film a tenth to all stay (common practice; fewer on noble metals)',
  },
  'assumed.emission-spread': {
    value: 0,
    spread: 0.4,
    dimension: 'number',
    unit: '',
    because:
      'an emission energy anywhere in the sputter spectrum; standard uncertainty of its logarithm 0.4 (Thompson 1968)',
  },
  'accuracy.fast-path': {
    value: 1,
    spread: 0.2,
    dimension: 'number',
    unit: '',
    because: 'cross-sections of fast atoms are known to 20 % (standard uncertainty)',
  },
  'accuracy.left-out': {
    value: 0,
    spread: 1,
    dimension: 'number',
    unit: '',
    because: 'a gas without collision values is left out of the mixture; its mole fraction is the relative uncertainty',
  },
  'reactant.site_density': {
    value: 1e19,
    halfWidth: 0.5e19,
    dimension: 'site-density',
    unit: '1/m2',
    because: 'surfaces hold 0.5e19 to 1.5e19 sites per m2 (common practice)',
  },
};

/** The default of the program for an address, if it has one. */
export function assumedGiven(address: string): Given | undefined {
  const assumption = Object.hasOwn(ASSUMED, address) ? ASSUMED[address] : undefined;
  if (assumption === undefined) return undefined;
  const { value, halfWidth = 0, spread, dimension, unit, because } = assumption;
  const uncertainty = spread ?? halfWidth / Math.sqrt(3);
  return { address, value, uncertainty, dimension, unit, origin: { default: 'assumed', because } };
}

export function assumedAddresses(): readonly string[] {
  return Object.keys(ASSUMED);
}
