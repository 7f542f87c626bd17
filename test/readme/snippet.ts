import { spawnSync } from 'node:child_process';
import { mkdirSync, symlinkSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { transformSync } from 'esbuild';
import { write } from '../command/run.ts';

/** What TypeScript says of a program that imports the package by its name; empty where nothing is wrong. */
export function typeFaults(program: string, folder: string): string {
  write(join(folder, 'program.ts'), program);
  offerPackage(folder);
  const types = ['--types', 'node', '--typeRoots', resolve('node_modules/@types')];
  const options = ['--strict', '--noEmit', '--target', 'es2023', '--module', 'nodenext', ...types];
  return nodeRun([resolve('node_modules/typescript/bin/tsc'), ...options, 'program.ts'], folder);
}

/** What the program prints. */
export function printed(program: string, folder: string): string {
  write(join(folder, 'program.js'), transformSync(program, { loader: 'ts', format: 'esm' }).code);
  offerPackage(folder);
  return nodeRun(['program.js'], folder);
}

/** As `npm install` would leave it. */
function offerPackage(folder: string): void {
  write(join(folder, 'package.json'), '{ "type": "module" }\n');
  mkdirSync(join(folder, 'node_modules'), { recursive: true });
  try {
    symlinkSync(resolve('.'), join(folder, 'node_modules/regimen'));
  } catch {
    // It is there already.
  }
}

function nodeRun(args: readonly string[], cwd: string): string {
  const { stdout, stderr } = spawnSync(process.execPath, args, { cwd, encoding: 'utf8' });
  return `${stdout}${stderr}`;
}
