import {
  AVOGADRO,
  BOLTZMANN,
  DEBYE,
  ELEMENTARY_CHARGE,
  STANDARD_PRESSURE,
  STANDARD_TEMPERATURE,
} from '../physics/constants.ts';
import { DIMENSION_NAMES } from './dimensions.ts';
import type { Dimension } from './dimensions.ts';

/**
 * One unit in one dimension: `SI value = number × factor + offset`.
 * A name stands once in each dimension, and may stand in several (`K`, `m/s`).
 */
export interface Unit extends Line {
  readonly dimension: Dimension;
  /** One over the factor, where that is a whole number: dividing by it loses no digit. */
  readonly divisor?: number;
}

interface Line {
  /** Empty for the bare number, where a dimension takes one. */
  readonly name: string;
  readonly factor: number;
  /** Added after the factor; only degC as a temperature has one. */
  readonly offset?: number;
  /** Where the factor comes from. */
  readonly source: string;
  /** Other accepted spellings. */
  readonly others?: readonly string[];
  /**
   * The flow depends on a reference. `volume`: a volume of gas counted at the reference temperature and pressure.
   * `pV`: pressure times volume, counted at the flow reference temperature. The factor holds at 0 degC and 101325 Pa.
   */
  readonly standard?: 'volume' | 'pV';
}

const SI = 'SI Brochure, 9th ed. 2019';
const SP811 = 'NIST SP 811, 2008 ed., appendix B.8';
const E12 = 'SEMI E12: 0 degC, 101325 Pa';
const PV = 'SI Brochure, 9th ed. 2019; counted at the flow reference temperature, 0 degC by SEMI E12';
const GREEN = 'IUPAC Green Book, 3rd ed. 2007';

/** Standard atmosphere and torr, in Pa. */
const ATM = 101325;
export const TORR = ATM / 760;
const INCH = 0.0254;
const CUBIC_FOOT = 0.3048 ** 3;
/** Molecules for each Pa m3, and in each m3, of gas at 0 degC and 101325 Pa. */
const PER_PV = 1 / (BOLTZMANN * STANDARD_TEMPERATURE);
const PER_VOLUME = STANDARD_PRESSURE * PER_PV;
/** Molecules a second in a standard cubic centimetre a minute. */
export const SCCM = (1e-6 / 60) * PER_VOLUME;

/** The units that documents may be written in. To add a unit is to add a line. */
const LINES: Readonly<Record<Dimension, readonly Line[]>> = {
  pressure: [
    { name: 'Pa', factor: 1, source: SI },
    { name: 'mPa', factor: 1e-3, source: SI },
    { name: 'hPa', factor: 1e2, source: SI },
    { name: 'kPa', factor: 1e3, source: SI },
    { name: 'MPa', factor: 1e6, source: SI },
    { name: 'ubar', factor: 0.1, source: SP811 },
    { name: 'mbar', factor: 1e2, source: SP811 },
    { name: 'bar', factor: 1e5, source: SP811 },
    { name: 'atm', factor: ATM, source: SP811 },
    { name: 'Torr', factor: TORR, source: SP811 },
    { name: 'mTorr', factor: 1e-3 * TORR, source: SP811, others: ['mT', 'micron', 'microns'] },
  ],
  length: [
    { name: 'pm', factor: 1e-12, source: SI },
    { name: 'angstrom', factor: 1e-10, source: SP811, others: ['A', 'angstroms'] },
    { name: 'nm', factor: 1e-9, source: SI },
    { name: 'um', factor: 1e-6, source: SI, others: ['micron', 'microns'] },
    { name: 'mil', factor: INCH / 1000, source: SP811, others: ['mils'] },
    { name: 'mm', factor: 1e-3, source: SI },
    { name: 'cm', factor: 1e-2, source: SI },
    { name: 'inch', factor: INCH, source: SP811, others: ['in', 'inches'] },
    { name: 'm', factor: 1, source: SI },
    { name: 'km', factor: 1e3, source: SI },
  ],
  area: [
    { name: 'um2', factor: 1e-12, source: SI },
    { name: 'mm2', factor: 1e-6, source: SI },
    { name: 'cm2', factor: 1e-4, source: SI },
    { name: 'inch2', factor: INCH ** 2, source: SP811, others: ['in2'] },
    { name: 'm2', factor: 1, source: SI },
  ],
  volume: [
    { name: 'mm3', factor: 1e-9, source: SI },
    { name: 'cm3', factor: 1e-6, source: SI, others: ['mL', 'ml', 'cc'] },
    { name: 'L', factor: 1e-3, source: SI, others: ['l', 'dm3', 'litre', 'litres', 'liter', 'liters'] },
    { name: 'm3', factor: 1, source: SI },
  ],
  temperature: [
    { name: 'K', factor: 1, source: SI },
    { name: 'degC', factor: 1, offset: 273.15, source: SI, others: ['deg C'] },
  ],
  'temperature-difference': [
    { name: 'K', factor: 1, source: SI },
    { name: 'degC', factor: 1, source: SI, others: ['deg C'] },
  ],
  time: [
    { name: 'ns', factor: 1e-9, source: SI },
    { name: 'us', factor: 1e-6, source: SI },
    { name: 'ms', factor: 1e-3, source: SI },
    { name: 's', factor: 1, source: SI, others: ['sec', 'second', 'seconds'] },
    { name: 'min', factor: 60, source: SI, others: ['minute', 'minutes'] },
    { name: 'h', factor: 3600, source: SI, others: ['hr', 'hour', 'hours'] },
    { name: 'd', factor: 86400, source: SI, others: ['day', 'days'] },
  ],
  flow: [
    { name: 'sccm', factor: SCCM, source: E12, standard: 'volume' },
    { name: 'slm', factor: (1e-3 / 60) * PER_VOLUME, source: E12, standard: 'volume', others: ['slpm'] },
    { name: 'Pa m3/s', factor: PER_PV, source: PV, standard: 'pV' },
    { name: 'Pa L/s', factor: 1e-3 * PER_PV, source: PV, standard: 'pV', others: ['Pa l/s'] },
    { name: 'Torr L/s', factor: 1e-3 * TORR * PER_PV, source: PV, standard: 'pV', others: ['Torr l/s'] },
    { name: 'mTorr L/s', factor: 1e-6 * TORR * PER_PV, source: PV, standard: 'pV', others: ['mTorr l/s'] },
    { name: 'mbar L/s', factor: 0.1 * PER_PV, source: PV, standard: 'pV', others: ['mbar l/s'] },
    { name: '1/s', factor: 1, source: SI, others: ['s-1'] },
    { name: 'mol/s', factor: AVOGADRO, source: SI },
    { name: 'mmol/min', factor: (1e-3 / 60) * AVOGADRO, source: SI },
    { name: 'umol/s', factor: 1e-6 * AVOGADRO, source: SI },
    { name: 'umol/min', factor: (1e-6 / 60) * AVOGADRO, source: SI },
  ],
  'flow-difference': [],
  amount: [
    { name: 'nmol', factor: 1e-9, source: SI },
    { name: 'umol', factor: 1e-6, source: SI },
    { name: 'mmol', factor: 1e-3, source: SI },
    { name: 'mol', factor: 1, source: SI },
  ],
  mass: [
    { name: 'mg', factor: 1e-6, source: SI },
    { name: 'g', factor: 1e-3, source: SI },
    { name: 'kg', factor: 1, source: SI },
  ],
  speed: [
    { name: 'L/s', factor: 1e-3, source: SI, others: ['l/s'] },
    { name: 'L/min', factor: 1e-3 / 60, source: SI, others: ['l/min'] },
    { name: 'm3/h', factor: 1 / 3600, source: SI, others: ['m3/hr'] },
    { name: 'm3/s', factor: 1, source: SI },
    { name: 'cfm', factor: CUBIC_FOOT / 60, source: SP811, others: ['ft3/min'] },
  ],
  'pressure-rate': [
    { name: 'Pa/s', factor: 1, source: SI },
    { name: 'Pa/min', factor: 1 / 60, source: SI },
    { name: 'mTorr/s', factor: 1e-3 * TORR, source: SP811, others: ['mT/s'] },
    { name: 'mTorr/min', factor: (1e-3 * TORR) / 60, source: SP811, others: ['mT/min', 'micron/min'] },
    { name: 'mTorr/h', factor: (1e-3 * TORR) / 3600, source: SP811, others: ['mT/h'] },
    { name: 'Torr/s', factor: TORR, source: SP811 },
    { name: 'Torr/min', factor: TORR / 60, source: SP811 },
    { name: 'mbar/s', factor: 1e2, source: SP811 },
    { name: 'mbar/min', factor: 1e2 / 60, source: SP811 },
  ],
  rate: [
    { name: 'angstrom/s', factor: 1e-10, source: SP811, others: ['A/s'] },
    { name: 'angstrom/min', factor: 1e-10 / 60, source: SP811, others: ['A/min'] },
    { name: 'nm/s', factor: 1e-9, source: SI },
    { name: 'nm/min', factor: 1e-9 / 60, source: SI },
    { name: 'nm/h', factor: 1e-9 / 3600, source: SI, others: ['nm/hr'] },
    { name: 'um/s', factor: 1e-6, source: SI, others: ['micron/s'] },
    { name: 'um/min', factor: 1e-6 / 60, source: SI, others: ['micron/min'] },
    { name: 'um/h', factor: 1e-6 / 3600, source: SI, others: ['um/hr', 'micron/h'] },
    { name: 'm/s', factor: 1, source: SI },
  ],
  power: [
    { name: 'mW', factor: 1e-3, source: SI },
    { name: 'W', factor: 1, source: SI },
    { name: 'kW', factor: 1e3, source: SI },
    { name: 'MW', factor: 1e6, source: SI },
  ],
  'power-density': [
    { name: 'mW/cm2', factor: 10, source: SI },
    { name: 'W/cm2', factor: 1e4, source: SI },
    { name: 'W/m2', factor: 1, source: SI },
    { name: 'kW/m2', factor: 1e3, source: SI },
  ],
  voltage: [
    { name: 'mV', factor: 1e-3, source: SI },
    { name: 'V', factor: 1, source: SI },
    { name: 'kV', factor: 1e3, source: SI },
    { name: 'MV', factor: 1e6, source: SI },
  ],
  energy: [
    { name: 'meV', factor: 1e-3 * ELEMENTARY_CHARGE, source: SI },
    { name: 'eV', factor: ELEMENTARY_CHARGE, source: SI },
    { name: 'keV', factor: 1e3 * ELEMENTARY_CHARGE, source: SI },
    { name: 'MeV', factor: 1e6 * ELEMENTARY_CHARGE, source: SI },
    { name: 'J', factor: 1, source: SI },
    { name: 'kJ/mol', factor: 1e3 / AVOGADRO, source: SI },
  ],
  frequency: [
    { name: 'Hz', factor: 1, source: SI },
    { name: 'kHz', factor: 1e3, source: SI },
    { name: 'MHz', factor: 1e6, source: SI },
    { name: 'GHz', factor: 1e9, source: SI },
    { name: '1/s', factor: 1, source: SI, others: ['s-1'] },
  ],
  angle: [
    { name: 'deg', factor: Math.PI / 180, source: SI, others: ['degree', 'degrees'] },
    { name: 'mrad', factor: 1e-3, source: SI },
    { name: 'rad', factor: 1, source: SI },
  ],
  fraction: [
    { name: '%', factor: 1e-2, source: SI, others: ['percent', 'pct'] },
    { name: 'ppm', factor: 1e-6, source: SI },
    { name: 'ppb', factor: 1e-9, source: SI },
    { name: '', factor: 1, source: SI },
  ],
  number: [{ name: '', factor: 1, source: SI }],
  density: [
    { name: 'kg/m3', factor: 1, source: SI },
    { name: 'g/L', factor: 1, source: SI, others: ['g/l'] },
    { name: 'g/cm3', factor: 1e3, source: SI, others: ['g/cc', 'g/mL', 'g/ml', 'g cm-3'] },
  ],
  'number-density': [
    { name: '1/m3', factor: 1, source: SI, others: ['m-3'] },
    { name: '1/cm3', factor: 1e6, source: SI, others: ['cm-3', '1/cc'] },
  ],
  'site-density': [
    { name: '1/m2', factor: 1, source: SI, others: ['m-2'] },
    { name: '1/cm2', factor: 1e4, source: SI, others: ['cm-2'] },
    { name: '1/nm2', factor: 1e18, source: SI, others: ['nm-2'] },
  ],
  'molar-mass': [
    { name: 'kg/mol', factor: 1, source: SI },
    { name: 'g/mol', factor: 1e-3, source: SI },
  ],
  dipole: [
    { name: 'C m', factor: 1, source: SI },
    { name: 'debye', factor: DEBYE, source: GREEN, others: ['D'] },
  ],
  'current-density': [
    { name: 'uA/cm2', factor: 1e-2, source: SI },
    { name: 'mA/cm2', factor: 10, source: SI },
    { name: 'A/cm2', factor: 1e4, source: SI },
    { name: 'A/m2', factor: 1, source: SI },
  ],
  'heat-capacity': [{ name: 'J/(mol K)', factor: 1, source: SI, others: ['J/mol/K', 'J/mol K', 'J mol-1 K-1'] }],
  'cross-section': [
    { name: 'angstrom2', factor: 1e-20, source: SP811, others: ['A2'] },
    { name: 'nm2', factor: 1e-18, source: SI },
    { name: 'cm2', factor: 1e-4, source: SI },
    { name: 'm2', factor: 1, source: SI },
  ],
  exposure: [
    { name: 'Pa s', factor: 1, source: SI },
    { name: 'mbar s', factor: 1e2, source: SP811 },
    { name: 'mTorr s', factor: 1e-3 * TORR, source: SP811 },
    { name: 'Torr s', factor: TORR, source: SP811 },
    { name: 'langmuir', factor: 1e-6 * TORR, source: '1e-6 Torr s, common practice', others: ['L'] },
  ],
  velocity: [
    { name: 'mm/s', factor: 1e-3, source: SI },
    { name: 'cm/s', factor: 1e-2, source: SI },
    { name: 'm/s', factor: 1, source: SI },
    { name: 'km/s', factor: 1e3, source: SI },
  ],
  flux: [
    { name: '1/(m2 s)', factor: 1, source: SI, others: ['1/m2/s', '1/m2 s', 'm-2 s-1'] },
    { name: '1/(cm2 s)', factor: 1e4, source: SI, others: ['1/cm2/s', '1/cm2 s', 'cm-2 s-1'] },
    { name: 'sccm/cm2', factor: (1e-2 / 60) * PER_VOLUME, source: E12, standard: 'volume' },
  ],
  conductance: [
    { name: 'W/(m2 K)', factor: 1, source: SI, others: ['W/m2/K', 'W/m2 K', 'W m-2 K-1'] },
    { name: 'W/(cm2 K)', factor: 1e4, source: SI, others: ['W/cm2/K', 'W/cm2 K'] },
  ],
  'thermal-conductivity': [
    { name: 'W/(m K)', factor: 1, source: SI, others: ['W/m/K', 'W/m K', 'W m-1 K-1'] },
    { name: 'mW/(m K)', factor: 1e-3, source: SI, others: ['mW/m/K', 'mW/m K'] },
  ],
  viscosity: [
    { name: 'uPa s', factor: 1e-6, source: SI },
    { name: 'mPa s', factor: 1e-3, source: SI },
    { name: 'Pa s', factor: 1, source: SI },
  ],
  diffusivity: [
    { name: 'mm2/s', factor: 1e-6, source: SI },
    { name: 'cm2/s', factor: 1e-4, source: SI },
    { name: 'm2/s', factor: 1, source: SI },
  ],
  'pressure-length': [
    { name: 'Pa m', factor: 1, source: SI },
    { name: 'Pa cm', factor: 1e-2, source: SI },
    { name: 'Pa mm', factor: 1e-3, source: SI },
    { name: 'mbar cm', factor: 1, source: SP811 },
    { name: 'mTorr cm', factor: 1e-5 * TORR, source: SP811 },
    { name: 'Torr cm', factor: 1e-2 * TORR, source: SP811 },
  ],
  'length-time': [
    { name: 'mm s', factor: 1e-3, source: SI },
    { name: 'm s', factor: 1, source: SI },
  ],
};

/** All units, dimension by dimension. */
export const UNITS: readonly Unit[] = DIMENSION_NAMES.flatMap((dimension) =>
  LINES[dimension].map((line) => ({ ...line, dimension, ...divisor(line.factor) })),
);

function divisor(factor: number): { divisor?: number } {
  const whole = Math.round(1 / factor);
  return factor < 1 && whole <= Number.MAX_SAFE_INTEGER && 1 / whole === factor ? { divisor: whole } : {};
}
