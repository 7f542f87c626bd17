import { parentPort } from 'node:worker_threads';
import { diskShelf } from '../shelf/disk.ts';
import { makePart } from './make-part.ts';
import { sitesOn } from './sites.ts';
import type { Errand } from './pool.ts';
import type { Sites } from './sites.ts';

/*
 * A worker thread: batches of recipes in, their parts out, in order. The main thread tells faults of sites.
 */

let sites: Sites | undefined;

parentPort?.on('message', ({ work, batch }: Errand) => {
  const opened = (sites ??= sitesOn(diskShelf(), work.site));
  parentPort?.postMessage(batch.map((job) => makePart(job, work, opened)));
});
