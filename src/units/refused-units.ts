import type { Dimension } from './dimensions.ts';

/** What to ask where a unit leaves open what is meant, or is not read for another reason. Case is ignored. */
export function refusedUnit(spelling: string, dimension: Dimension): string | undefined {
  return REFUSED.get(`${dimension} ${spelling.toLowerCase()}`);
}

const VOLUME_FLOW =
  'at which temperature and pressure is the volume counted? write sccm or slm for a standard volume, Pa m3/s or Torr L/s for pressure times volume';
const PSI = 'absolute or gauge? write the absolute pressure in kPa or Torr (1 psi is 6.895 kPa)';
const GAUGE = 'add the pressure outside; write the absolute pressure in kPa, bar or Torr';
const MERCURY = 'absolute, or below atmosphere? write the absolute pressure in Torr';
const WATER = 'absolute, or a difference? write the absolute pressure in Pa';
const FAHRENHEIT = 'write degC: subtract 32, divide by 1.8';

/** The dimension, its spellings in lower case, and the question. */
const LINES: readonly (readonly [Dimension, readonly string[], string])[] = [
  ['flow', ['l/min', 'lpm', 'ml/min', 'cm3/min', 'cc/min', 'ccm', 'l/h', 'cc/s', 'cm3/s', 'ml/s'], VOLUME_FLOW],
  ['flow', ['nl/min', 'nlpm', 'nm3/h', 'nml/min', 'scfm', 'scfh', 'slh', 'sccs'], 'write sccm or slm'],
  ['flow', ['g/min', 'mg/min', 'g/h', 'kg/h'], 'a mass flow: divide by the molar mass and write umol/s, or sccm'],
  ['amount', ['scc', 'sccm s', 'sl'], 'write umol: 1 scc at 0 degC and 101325 Pa is 44.62 umol'],
  ['pressure', ['psi', 'lbf/in2'], PSI],
  ['pressure', ['psia'], 'write kPa or Torr: 1 psi is 6.895 kPa'],
  ['pressure', ['psig', 'barg', 'bar(g)', 'mbarg', 'kpag'], GAUGE],
  ['pressure', ['bara', 'bar(a)'], 'write bar: every pressure is absolute'],
  ['pressure', ['cmhg', 'cm hg'], `${MERCURY} (1 cmHg is 10 Torr)`],
  ['pressure', ['mmhg', 'mm hg'], `${MERCURY} (1 mmHg is 1 Torr)`],
  ['pressure', ['inhg', 'in hg', 'in.hg'], `${MERCURY} (1 inHg is 25.4 Torr)`],
  ['pressure', ['cmh2o', 'mmh2o', 'inh2o', 'in h2o'], WATER],
  ['temperature', ['c', 'celsius', 'centigrade'], 'write degC'],
  ['temperature-difference', ['c', 'celsius'], 'write K'],
  ['temperature', ['f', 'degf', 'deg f', 'fahrenheit'], FAHRENHEIT],
  ['temperature-difference', ['f', 'degf', 'deg f'], 'write K: divide by 1.8'],
  ['time', ['m'], 'write min for minutes'],
  ['length', ['"', '″', 'ft', "'"], 'write inch, mm or cm'],
  [
    'fraction',
    ['vol%', 'vol %', 'mol%', 'mol %', '% vol', '%vol'],
    'write %: shares of a gas are shares of its molecules',
  ],
  ['fraction', ['wt%', 'wt %', 'mass%'], 'a share of the mass: divide by the molar masses and write %'],
];

const REFUSED: ReadonlyMap<string, string> = new Map(
  LINES.flatMap(([dimension, spellings, question]) =>
    spellings.map((spelling): [string, string] => [`${dimension} ${spelling}`, question]),
  ),
);
