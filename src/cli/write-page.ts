import { drawHeader, drawPage } from './draw.ts';
import { openOutputs } from './outputs.ts';
import { tellUnwritten } from './tell.ts';
import type { Page } from '../reports/page.ts';
import type { Call, ExitCode } from './call.ts';

/** Writes one page wherever the call wants it; as JSON what `record` makes, where there is such a format. */
export function writePage(
  { options, out }: Pick<Call, 'options' | 'out'>,
  page: Page,
  record?: () => unknown,
): ExitCode {
  const outputs = openOutputs(out, options);
  for (const { sink, style } of outputs.each) {
    if (style.format === 'json' && record !== undefined) sink.write(`${JSON.stringify(record(), undefined, 2)}\n`);
    else sink.write(drawHeader(page, style) + drawPage(page, style));
  }
  const faults = [...outputs.faults, ...outputs.finish(true)];
  for (const fault of faults) tellUnwritten(out, fault);
  return faults.length === 0 ? 0 : 2;
}
