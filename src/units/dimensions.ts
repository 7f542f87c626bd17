/** What kind of physical value something is. Within one dimension all values are held in its SI unit. */
export type Dimension = keyof typeof FACTS;

/** Where two or more dimensions are allowed, the first that has the unit holds. */
export type Dimensions = Dimension | readonly Dimension[];

export interface DimensionFacts {
  /** The SI unit in which values are held, `1` where there is none. */
  readonly si: string;
  /** For messages: "a pressure". */
  readonly words: string;
  /** Names of the units that messages offer, the one to print in first; none where only a bare number fits. */
  readonly units: readonly string[];
  /** Lowest value that exists, in SI; a dimension without it may have either sign. */
  readonly atLeast?: number;
  /** A dimension of differences has the units of this one. */
  readonly unitsOf?: string;
}

const FACTS = {
  pressure: { si: 'Pa', words: 'a pressure', units: ['mTorr', 'Torr', 'Pa', 'mbar'], atLeast: 0 },
  length: { si: 'm', words: 'a length', units: ['mm', 'um', 'nm', 'cm', 'inch'], atLeast: 0 },
  area: { si: 'm2', words: 'an area', units: ['cm2', 'm2', 'mm2'], atLeast: 0 },
  volume: { si: 'm3', words: 'a volume', units: ['L', 'cm3', 'm3'], atLeast: 0 },
  temperature: { si: 'K', words: 'a temperature', units: ['degC', 'K'], atLeast: 0 },
  'temperature-difference': { si: 'K', words: 'a temperature difference', units: ['K', 'degC'] },
  time: { si: 's', words: 'a time', units: ['s', 'min', 'h', 'ms'], atLeast: 0 },
  flow: { si: '1/s', words: 'a flow', units: ['sccm', 'slm', 'Pa m3/s', 'umol/s'], atLeast: 0 },
  'flow-difference': { si: '1/s', words: 'a flow difference', units: ['sccm', 'slm', 'Pa m3/s'], unitsOf: 'flow' },
  amount: { si: 'mol', words: 'an amount', units: ['umol', 'nmol', 'mol'], atLeast: 0 },
  mass: { si: 'kg', words: 'a mass', units: ['g', 'kg', 'mg'], atLeast: 0 },
  speed: { si: 'm3/s', words: 'a pumping speed', units: ['L/s', 'm3/h', 'm3/s', 'cfm'], atLeast: 0 },
  'pressure-rate': { si: 'Pa/s', words: 'a pressure rate', units: ['mTorr/min', 'Pa/s', 'mbar/s'], atLeast: 0 },
  rate: { si: 'm/s', words: 'a growth or etch rate', units: ['nm/min', 'angstrom/min', 'um/min', 'nm/s'], atLeast: 0 },
  power: { si: 'W', words: 'a power', units: ['W', 'kW'], atLeast: 0 },
  'power-density': { si: 'W/m2', words: 'a power density', units: ['W/cm2', 'W/m2'], atLeast: 0 },
  voltage: { si: 'V', words: 'a voltage', units: ['V', 'kV'] },
  energy: { si: 'J', words: 'an energy', units: ['eV', 'keV', 'J'], atLeast: 0 },
  frequency: { si: 'Hz', words: 'a frequency', units: ['MHz', 'kHz', 'Hz'], atLeast: 0 },
  angle: { si: 'rad', words: 'an angle', units: ['deg', 'rad'] },
  fraction: { si: '1', words: 'a fraction', units: ['%', 'ppm'], atLeast: 0 },
  number: { si: '1', words: 'a plain number', units: [] },
  density: { si: 'kg/m3', words: 'a density', units: ['g/cm3', 'kg/m3'], atLeast: 0 },
  'number-density': { si: '1/m3', words: 'a number density', units: ['1/cm3', '1/m3'], atLeast: 0 },
  'site-density': { si: '1/m2', words: 'a number per area', units: ['1/cm2', '1/m2', '1/nm2'], atLeast: 0 },
  'molar-mass': { si: 'kg/mol', words: 'a molar mass', units: ['g/mol', 'kg/mol'], atLeast: 0 },
  dipole: { si: 'C m', words: 'a dipole moment', units: ['debye', 'C m'], atLeast: 0 },
  'current-density': { si: 'A/m2', words: 'a current density', units: ['mA/cm2', 'A/m2'], atLeast: 0 },
  'heat-capacity': { si: 'J/(mol K)', words: 'a molar heat capacity', units: ['J/(mol K)'], atLeast: 0 },
  'cross-section': { si: 'm2', words: 'a cross-section', units: ['angstrom2', 'cm2', 'm2'], atLeast: 0 },
  exposure: { si: 'Pa s', words: 'an exposure', units: ['Torr s', 'langmuir', 'Pa s'], atLeast: 0 },
  velocity: { si: 'm/s', words: 'a velocity', units: ['m/s', 'cm/s'], atLeast: 0 },
  flux: { si: '1/(m2 s)', words: 'a flux', units: ['1/(cm2 s)', '1/(m2 s)'], atLeast: 0 },
  conductance: { si: 'W/(m2 K)', words: 'a thermal conductance', units: ['W/(m2 K)'], atLeast: 0 },
  'thermal-conductivity': {
    si: 'W/(m K)',
    words: 'a thermal conductivity',
    units: ['mW/(m K)', 'W/(m K)'],
    atLeast: 0,
  },
  viscosity: { si: 'Pa s', words: 'a viscosity', units: ['uPa s', 'Pa s'], atLeast: 0 },
  diffusivity: { si: 'm2/s', words: 'a diffusivity', units: ['cm2/s', 'm2/s'], atLeast: 0 },
  'pressure-length': {
    si: 'Pa m',
    words: 'a pressure times length',
    units: ['mTorr cm', 'Torr cm', 'Pa m'],
    atLeast: 0,
  },
  'length-time': { si: 'm s', words: 'a length times time', units: ['mm s', 'm s'], atLeast: 0 },
} as const satisfies Record<string, DimensionFacts>;

/** Every dimension with its SI unit, its words and the units to offer. */
export const DIMENSIONS: Readonly<Record<Dimension, DimensionFacts>> = FACTS;

export function isDimension(name: string): name is Dimension {
  return Object.hasOwn(FACTS, name);
}

/** Names of all dimensions, in the order of the table. */
export const DIMENSION_NAMES: readonly Dimension[] = Object.keys(FACTS).filter(isDimension);
