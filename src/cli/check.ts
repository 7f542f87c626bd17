import { blocking } from '../reports/counts.ts';
import { checkClosing } from '../reports/pages/closing.ts';
import { summaryRecord } from '../reports/records/check.ts';
import { runRecipes } from './recipe-run.ts';
import type { Call, ExitCode } from './call.ts';

/** Judges every step of recipes. Ends with 1 where a verdict blocks. */
export async function check(call: Call): Promise<ExitCode> {
  const result = await runRecipes(call, {
    command: 'check',
    formats: ['text', 'markdown', 'csv', 'json'],
    closing: (counts, { check: options }) => ({
      blocks: checkClosing(counts, options),
      summary: summaryRecord(counts, options),
    }),
  });
  if (!result.whole) return 2;
  return blocking(result.counts, call.options) > 0 ? 1 : 0;
}
