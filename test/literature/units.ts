import { ATOMIC_MASS, DEBYE, ELEMENTARY_CHARGE } from '../../src/physics/constants.ts';

const TORR = 101325 / 760;

/** What one of each unit is in SI. Written for the rows here, apart from the program's own table, so that each tests the other. */
const FACTORS: Readonly<Record<string, number>> = {
  '1': 1,
  '%': 0.01,
  Pa: 1,
  kPa: 1e3,
  MPa: 1e6,
  mbar: 100,
  bar: 1e5,
  atm: 101325,
  Torr: TORR,
  mTorr: TORR / 1000,
  K: 1,
  m: 1,
  cm: 1e-2,
  mm: 1e-3,
  nm: 1e-9,
  pm: 1e-12,
  angstrom: 1e-10,
  L: 1e-3,
  kg: 1,
  g: 1e-3,
  u: ATOMIC_MASS,
  mol: 1,
  s: 1,
  ps: 1e-12,
  min: 60,
  J: 1,
  eV: ELEMENTARY_CHARGE,
  W: 1,
  V: 1,
  uPa: 1e-6,
  debye: DEBYE,
  langmuir: 1e-6 * TORR,
  // cubic centimetres and litres a minute at the standard condition
  sccm: 1e-6 / 60,
  slm: 1e-3 / 60,
};

/** SI value of a number with its unit: `67.6 nm`, `1 1/(cm2 s)`, `20 degC`. */
export function si(text: string | number): number {
  if (typeof text === 'number') return text;
  const space = text.indexOf(' ');
  if (space === -1) return Number(text);
  const value = Number(text.slice(0, space));
  const unit = text.slice(space + 1);
  return unit === 'degC' ? value + 273.15 : value * factorOf(unit);
}

/** SI value of one of a unit. */
export function factorOf(unit: string): number {
  const [over = '', under = ''] = unit.split('/');
  return product(over) / product(under);
}

function product(symbols: string): number {
  let result = 1;
  for (const symbol of symbols.split(/[ ()]+/).filter((one) => one !== '')) {
    const [, name = symbol, power = '1'] = /^([A-Za-z]+)(\d.*)?$/.exec(symbol) ?? [];
    const factor = FACTORS[name];
    if (factor === undefined) throw new Error(`no factor for ${symbol}`);
    result *= factor ** Number(power);
  }
  return result;
}
