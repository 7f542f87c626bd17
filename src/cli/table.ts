import { checkedReference } from './checked-reference.ts';
import { runRecipes } from './recipe-run.ts';
import { tellProblem } from './tell.ts';
import type { Call, ExitCode } from './call.ts';

/** Prints the regime of every step of recipes. */
export async function table(call: Call): Promise<ExitCode> {
  for (const name of call.options.columns) {
    const { problem } = checkedReference(name);
    if (problem !== undefined) return tellProblem(call.out, problem);
  }
  const { whole } = await runRecipes(call, {
    command: 'table',
    formats: ['text', 'markdown', 'csv'],
    closing: () => ({ blocks: [], summary: {} }),
  });
  return whole ? 0 : 2;
}
