import { diskShelf } from '../shelf/disk.ts';
import { makePart } from './make-part.ts';
import { sitesOn } from './sites.ts';
import type { Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';
import type { Sites } from './sites.ts';

/** What a worker is sent for. */
export interface Errand {
  readonly work: Work;
  readonly batch: readonly Job[];
}

/** Makes the parts of a batch, in order, for one errand after another. The main thread tells faults of sites. */
export function errandRunner(): (errand: Errand) => readonly Part[] {
  let sites: Sites | undefined;
  return ({ work, batch }) => {
    const opened = (sites ??= sitesOn(diskShelf(), work.site));
    return batch.map((job) => makePart(job, work, opened));
  };
}
