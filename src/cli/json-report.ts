import { frameClosing, frameOpening } from '../reports/records/frame.ts';
import { faultRecord } from '../reports/records/check.ts';
import { PLAIN_SHOW } from '../steps/show.ts';
import { VERSION } from './version.ts';
import type { FrameHead } from '../reports/records/frame.ts';
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

/** What all recipes have in common; each recipe states its own as well. */
function headOf(sites: readonly Site[]): FrameHead {
  const [first, second] = sites;
  const site = second === undefined ? first?.name : undefined;
  const shows = sites.length === 0 ? [PLAIN_SHOW] : sites.map(({ show }) => show);
  const coverageFactor = common(shows.map((show) => show.coverageFactor));
  const bands = common(shows.map((show) => show.bands));
  return {
    version: VERSION,
    ...(site === undefined ? {} : { site }),
    ...(coverageFactor === undefined ? {} : { coverageFactor }),
    ...(bands === undefined ? {} : { bands }),
  };
}

/** What all of several are; undefined where they differ. */
function common<T>([first, ...others]: readonly T[]): T | undefined {
  return others.every((other) => other === first) ? first : undefined;
}
