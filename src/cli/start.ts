import { STARTER_CHAMBER } from './start/chamber.ts';
import { STARTER_RECIPE } from './start/recipe.ts';
import { STARTER_SITE } from './start/site.ts';
import { tellUnwritten } from './tell.ts';
import type { Call, ExitCode } from './call.ts';

/** Writes a small commented site that checks clean; nothing that is there is overwritten. */
export function start({ args: [folder = ''], out }: Call): ExitCode {
  const fault = out.writeNew(folder, STARTER);
  if (fault !== undefined) return tellUnwritten(out, fault);
  const names = [...STARTER.keys()].map((name) => `  ${name}\n`).join('');
  out.write(`${folder} now holds\n${names}Next: regimen check ${folder}\n`);
  return 0;
}

const STARTER: ReadonlyMap<string, string> = new Map([
  ['regimen.yaml', STARTER_SITE],
  ['chambers/ruff.yaml', STARTER_CHAMBER],
  ['recipes/titanium-seed.yaml', STARTER_RECIPE],
]);
