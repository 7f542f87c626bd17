import { jsonReport } from './json-report.ts';
import { proseReport, sheetReport } from './report.ts';
import { tellFault } from './tell.ts';
import { faultKey, fromHere } from './told-fault.ts';
import type { Shelf } from '../shelf/shelf.ts';
import type { Site } from '../steps/site.ts';
import type { Out } from './out.ts';
import type { Outputs } from './outputs.ts';
import type { Part } from './part.ts';
import type { Closing, Report } from './report.ts';
import type { ToldFault } from './told-fault.ts';

/** All documents of a run, which grow together. */
export interface Reports {
  part(part: Part): void;
  /** Tells faults that were not told yet; how many those are. */
  faults(faults: readonly ToldFault[]): number;
  close(closing: Closing): void;
}

export function reportsOn(outputs: Outputs, shelf: Shelf, sites: readonly Site[], out: Out): Reports {
  const reports = outputs.each.map(({ sink, style }): Report => {
    if (style.format === 'json') return jsonReport(sink, sites);
    return style.format === 'csv' ? sheetReport(sink) : proseReport(sink, style);
  });
  const told = new Set<string>();
  return {
    part({ texts }) {
      for (const [index, drawn] of (texts ?? []).entries()) reports[index]?.part(drawn);
    },
    faults(faults) {
      const fresh = faults.filter((fault) => !told.has(faultKey(fault)));
      for (const fault of fresh) told.add(faultKey(fault));
      tellAll(fresh, reports, shelf, out);
      return fresh.length;
    },
    close(closing) {
      for (const report of reports) report.close(closing);
    },
  };
}

/** Standard error has them where no document of the run does. */
function tellAll(fresh: readonly ToldFault[], reports: readonly Report[], shelf: Shelf, out: Out): void {
  if (fresh.length === 0) return;
  const here = fresh.map((fault) => fromHere(shelf, fault));
  for (const report of reports) report.faults(fresh, here);
  if (reports[0]?.tellsFaults !== true) for (const fault of here) tellFault(out, fault);
}
