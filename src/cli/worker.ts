import { parentPort } from 'node:worker_threads';
import { errandRunner } from './every-command.ts';
import type { Errand } from './errands.ts';

/*
 * A worker thread: batches of recipes in, their parts out.
 */

const run = errandRunner();

parentPort?.on('message', (errand: Errand) => {
  parentPort?.postMessage(run(errand));
});
