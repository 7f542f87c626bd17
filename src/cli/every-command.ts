/*
 * What all commands do, in one module: the first line of any command loads it, and `--help` and `--version` do not.
 * They share nearly all they need, so that loading them one by one would only mean more files to find.
 */

export { check } from './check.ts';
export { derive } from './derive.ts';
export { gas } from './gas.ts';
export { list } from './list.ts';
export { readOptions } from './read-options.ts';
export { start } from './start.ts';
export { table } from './table.ts';
