import { gasRun } from '../quantities/gas-run.ts';
import { gasPage } from '../reports/pages/gas.ts';
import { gasRecord } from '../reports/records/gas.ts';
import { shownOf } from '../reports/shown.ts';
import { diskShelf } from '../shelf/disk.ts';
import { nearest } from '../units/suggest.ts';
import { sitesOn } from './sites.ts';
import { tellFault, tellProblem } from './tell.ts';
import { fromHere, toldFault } from './told-fault.ts';
import { writePage } from './write-page.ts';
import type { GasState } from '../reports/pages/gas.ts';
import type { Library } from '../substances/library.ts';
import type { Call, ExitCode } from './call.ts';
import type { Problem } from './problem.ts';

/** Prints the kinetics of gases one by one, or of one mixture. */
export function gas({ args, options, out }: Call): ExitCode {
  const shelf = diskShelf();
  const { value: site, faults } = sitesOn(shelf, options.site).of('.');
  for (const fault of faults) tellFault(out, fromHere(shelf, toldFault(site?.folder ?? '.', fault)));
  if (site === undefined) return 2;
  const asked = askedGases(args, site.library);
  if ('problem' in asked) return tellProblem(out, asked.problem);
  const { temperature = ROOM, pressure = ONE_TORR } = options;
  const states: readonly GasState[] = asked.mixtures.map(({ name, parts }) => ({
    name,
    run: gasRun(site.library, { parts, temperature, pressure }),
  }));
  const shown = shownOf(site, options.units);
  const written = writePage({ options, out }, gasPage(states, shown), () => gasRecord(states, shown));
  return faults.length === 0 ? written : 2;
}

/** 20 degC. */
const ROOM = 293.15;
const ONE_TORR = 101325 / 760;

interface Mixture {
  readonly name: string;
  readonly parts: ReadonlyMap<string, number>;
}

type Asked = { readonly mixtures: readonly Mixture[] } | { readonly problem: Problem };

/** Names with parts make one mixture, which comes first; names without are listed one by one. */
function askedGases(args: readonly string[], library: Library): Asked {
  const parts = new Map<string, number>();
  const single: Mixture[] = [];
  for (const arg of args) {
    const { name, part, problem } = readGas(arg, library);
    if (problem !== undefined) return { problem };
    if (parts.has(name))
      return { problem: { found: `${name} stands twice`, right: 'name each gas of a mixture once' } };
    if (part === undefined) single.push({ name, parts: new Map([[name, 1]]) });
    else parts.set(name, part);
  }
  const name = [...parts].map(([gasName, part]) => `${gasName}=${part}`).join(' ');
  return { mixtures: parts.size === 0 ? single : [{ name, parts }, ...single] };
}

type GasAsked =
  | { readonly name: string; readonly part: number | undefined; readonly problem?: undefined }
  | { readonly name: string; readonly part?: undefined; readonly problem: Problem };

function readGas(arg: string, library: Library): GasAsked {
  const equals = arg.indexOf('=');
  const name = equals === -1 ? arg : arg.slice(0, equals);
  if (library.gas(name) === undefined) return { name, problem: unknownGas(name, library) };
  if (equals === -1) return { name, part: undefined };
  const text = arg.slice(equals + 1);
  const part = PART.test(text) ? Number(text) : 0;
  if (part > 0 && Number.isFinite(part)) return { name, part };
  return { name, problem: { found: `${arg}: '${text}' is no share`, right: `parts above zero, ${name}=4` } };
}

const PART = /^\d{1,9}(\.\d{1,9})?(e-?\d{1,2})?$/;

function unknownGas(name: string, library: Library): Problem {
  const meant = nearest(name, library.gasNames());
  const right = meant === undefined ? 'regimen list gases tells all; a site may add its own' : `did you mean ${meant}?`;
  return { found: `no gas is named '${name}'`, right };
}
