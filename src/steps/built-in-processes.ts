import { builtInNames, builtInProcess } from '../documents/built-in.ts';
import { processFrom, type ProcessSpec } from './process.ts';
import type { Processes } from './processes.ts';

/** The processes that the program knows without a site, each read when it is first asked for. */
export const BUILT_IN_PROCESSES: Processes = {
  named: (name) => {
    const known = kept.get(name);
    if (known !== undefined) return known;
    const document = builtInProcess(name);
    const spec = document === undefined ? undefined : processFrom(document).value;
    if (spec !== undefined) kept.set(name, spec);
    return spec;
  },
  names: () => builtInNames('processes'),
};

const kept = new Map<string, ProcessSpec>();
