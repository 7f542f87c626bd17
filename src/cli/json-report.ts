import { frameClosing, frameOpening } from '../reports/records/frame.ts';
import { faultRecord } from '../reports/records/check.ts';
import { VERSION } from './version.ts';
import type { Site } from '../steps/site.ts';
import type { Sink } from './out.ts';
import type { Report } from './report.ts';

/** For programs: one JSON document, its recipes written as they come. */
export function jsonReport(sink: Sink, sites: readonly Site[]): Report {
  const cautions: object[] = [];
  const faults: object[] = [];
  let any = false;
  sink.write(frameOpening(headOf(sites)));
  return {
    tellsFaults: true,
    part(drawn) {
      sink.write(`${any ? ',' : ''}${drawn.text}`);
      cautions.push(...drawn.cautions);
      any = true;
    },
    faults(told) {
      for (const { file, line, column, found, right } of told) {
        faults.push(faultRecord({ place: { file, line, column }, found, right }));
      }
    },
    close({ summary }) {
      sink.write(frameClosing({ cautions, faults, summary }, any));
    },
  };
}

/** Recipes of several sites have no site in common; the first one's conventions hold for all. */
function headOf(sites: readonly Site[]): Parameters<typeof frameOpening>[0] {
  const [first, ...others] = sites;
  const name = others.length === 0 ? first?.name : undefined;
  return {
    version: VERSION,
    ...(name === undefined ? {} : { site: name }),
    coverageFactor: first?.show.coverageFactor ?? 2,
    bands: first?.show.bands ?? 'gas-dynamics',
  };
}
