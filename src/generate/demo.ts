import { spawnSync } from 'node:child_process';

/*
 * `npm run demo`: the built command checks the demo line, as a user would run it. Findings are what the demo is there to
 * show, so that it ends with 0 whether they block or not; only a job that was not done in full is a failure.
 */

const MEANINGS: ReadonlyMap<number | null, string> = new Map<number | null, string>([
  [0, 'nothing blocks'],
  [1, 'at least one assumption fails with grade error, and in a repository of recipes this would block the change'],
  [2, 'the job could not be done in full'],
]);

function demo(): number {
  const command = ['dist/regimen.js', 'check', 'recipes'];
  console.log('$ regimen check recipes\n');
  const { status, signal } = spawnSync(process.execPath, command, { stdio: 'inherit' });
  const meaning = MEANINGS.get(status) ?? `it did not end by itself (${signal ?? 'no code'})`;
  console.log(`\ncheck gave exit code ${status ?? 'none'}: ${meaning}.`);
  if (status !== 0 && status !== 1) return 1;
  console.log('The demo itself ends with 0.');
  return 0;
}

process.exitCode = demo();
