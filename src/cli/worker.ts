import { parentPort, workerData } from 'node:worker_threads';
import { diskShelf } from '../shelf/disk.ts';
import { makePart } from './make-part.ts';
import { sitesOn } from './sites.ts';
import type { Work } from './part.ts';
import type { Job } from './recipe-files.ts';

/*
 * A worker thread: batches of recipes in, their parts out, in order. The main thread tells faults of sites.
 */

const work: Work = workerData;
const sites = sitesOn(diskShelf(), work.site);

parentPort?.on('message', (batch: readonly Job[]) => {
  parentPort?.postMessage(batch.map((job) => makePart(job, work, sites)));
});
