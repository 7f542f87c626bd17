import { formatOf } from './formats.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Options } from './call.ts';
import type { Format } from './formats.ts';
import type { Out } from './out.ts';
import type { Failure } from './part.ts';
import type { Problem } from './problem.ts';

/** A problem of the command line, on standard error. */
export function tellProblem(out: Out, { found, right }: Problem): 2 {
  out.tell(`regimen: ${found}; ${right}`);
  return 2;
}

/** A fault where no report has room for it. */
export function tellFault(out: Out, { place, found, right }: Fault): 2 {
  out.tell(`regimen: ${place.file}:${place.line}:${place.column}: ${found}; ${right}`);
  return 2;
}

/** A fault of a file that could not be written. */
export function tellUnwritten(out: Out, { place, found, right }: Fault): 2 {
  out.tell(`regimen: ${place.file}: ${found}; ${right}`);
  return 2;
}

/** The program itself failed: one line, and where it did on request. */
export function tellFailure(out: Out, { message, stack }: Failure, trace: boolean): 2 {
  out.tell(`regimen: a fault of the program: ${message.split('\n')[0] ?? ''}; ${REPORT}`);
  if (trace) out.tell(stack);
  return 2;
}

const REPORT =
  'please report it with the command line and the documents that led to it (--trace or REGIMEN_TRACE=1 tells where it happened)';

/** The problem of a format that a command does not write. */
export function formatProblem({ format, out }: Options, formats: readonly Format[]): Problem | undefined {
  const asked = [format, ...out.flatMap((path) => formatOf(path) ?? [])];
  const wrong = asked.find((one) => !formats.includes(one));
  if (wrong === undefined) return undefined;
  return { found: `this command does not write ${wrong}`, right: `one of ${formats.join(', ')}` };
}
