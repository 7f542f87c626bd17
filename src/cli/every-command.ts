import { check } from './check.ts';
import { derive } from './derive.ts';
import { gas } from './gas.ts';
import { list } from './list.ts';
import { start } from './start.ts';
import { table } from './table.ts';
import type { Run } from './call.ts';
import type { CommandName } from './commands.ts';

/*
 * What all commands and their workers do, in one module: any of them loads it, `--help` and `--version` do not. The commands
 * share nearly all that they need, so that loading them one by one would only mean more files to find.
 */

export { errandRunner } from './errands.ts';
export { readOptions } from './read-options.ts';

export const RUNS: Readonly<Record<CommandName, Run>> = { check, table, derive, gas, list, start };
