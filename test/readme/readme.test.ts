import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { afterAll, describe, expect, test } from 'vitest';
import manifest from '../../package.json' with { type: 'json' };
import { readDocument, readRecipe, readSubstances } from '../../src/documents/read.ts';
import { Source } from '../../src/shelf/place.ts';
import { clearFolders, folderWith, regimen } from '../command/run.ts';
import { blocksIn, type Block } from './blocks.ts';
import { rerun, stage, wordsOf } from './console.ts';
import { shows } from './elision.ts';
import { printed, typeFaults } from './snippet.ts';

/*
 * All that the README shows is what the program does. Where an output has changed on purpose, test/readme/update.ts rewrites it.
 */

const README = readFileSync('README.md', 'utf8');
const PROSE = README.replace(/\s+/g, ' ');

afterAll(clearFolders);

describe('commands', () => {
  const folder = stage();

  test.each(blocksIn(README, 'console').map((block) => [block.lines[0] ?? '', block] as const))('%s', (_, block) => {
    expect(block.lines).toEqual(rerun(block, folder));
  });
});

describe('documents', () => {
  const whole = blocksIn(README, 'yaml').flatMap((block) => {
    const file = /^# (\S+\.yaml)$/.exec(block.lines[0] ?? '')?.[1];
    return file === undefined ? [] : [[file, block] as const];
  });
  const files = Object.fromEntries(whole.map(([file, block]) => [file, textOf(block.lines)]));

  test.each(Object.entries(files))('%s is a sound document', (file, text) => {
    expect(readDocument(new Source(file, text)).faults).toEqual([]);
  });

  test('together they are a site that checks clean, even with everything blocking', () => {
    const cwd = folderWith(files);
    const { code, out, err } = regimen(['check', '--block-at', 'note', '--unproven'], { cwd });
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(out).toContain('2 pass.  Nothing blocks.');
  });

  test('its gas is marked as estimated', () => {
    const { code, out } = regimen(['gas', 'HMDSO'], { cwd: folderWith(files) });
    expect(code).toBe(0);
    expect(out).toMatch(/estimate/);
  });

  test('its process changes the bound of the one it is based on', () => {
    const { out } = regimen(['list', 'processes'], { cwd: folderWith(files) });
    expect(out).toMatch(
      /seed-dense {3}Dense titanium seed\n(?: {4}.*\n)*? {4}energetic-arrival: \S+ at most 1 \(warning\), 2 \(error\)/,
    );
    expect(out).toMatch(/seed-dense {3}Dense titanium seed\n(?: {4}.*\n)*? {4}clean-film: /);
  });

  test('a chamber needs nothing but its name', () => {
    expect(readDocument(new Source('chamber.yaml', 'regimen: chamber 1\nname: bare\n')).faults).toEqual([]);
  });

  test('every other YAML block can stand in a step of the recipe', () => {
    const shown = new Set(whole.map(([, block]) => block.start));
    const fragments = blocksIn(README, 'yaml').filter(({ start }) => !shown.has(start));
    expect(fragments.length).toBeGreaterThan(0);
    for (const { lines } of fragments) {
      const recipe = (files['recipes/titanium-seed.yaml'] ?? '') + textOf(lines.map((line) => `    ${line}`));
      expect(readRecipe(new Source('recipe.yaml', recipe)).faults).toEqual([]);
    }
  });
});

describe('in a repository of recipes', () => {
  const commands = blocksIn(README, 'sh')
    .flatMap((block) => block.lines)
    .filter((line) => line.startsWith('npx regimen '))
    .map((line) => line.slice('npx regimen '.length));

  test.each(commands)('%s does its job', (command) => {
    const cwd = stage();
    expect(regimen(wordsOf(command), { cwd: `${cwd}/recipes` }).code).toBe(1);
    expect(readdirSync(`${cwd}/recipes`)).toEqual(expect.arrayContaining(['report.md', 'report.json']));
  });

  test('the schemas that editors are to be told exist', () => {
    const paths = blocksIn(README, 'json').flatMap(({ lines }) => lines.join('').match(/schemas\/\w+\.json/g) ?? []);
    expect(paths.length).toBe(5);
    for (const path of paths) expect(existsSync(path), path).toBe(true);
  });

  test('the tarball has the name of this version', () => {
    const tarballs = README.match(/regimen-\d+\.\d+\.\d+\.tgz/g) ?? [];
    expect(new Set(tarballs)).toEqual(new Set([`regimen-${manifest.version}.tgz`]));
  });
});

describe('the library', () => {
  const [program] = blocksIn(README, 'ts');
  const text = textOf(program?.lines ?? []);

  test('its program compiles', () => {
    expect(typeFaults(text, stage())).toBe('');
  }, 120_000);

  test('its program prints what stands below it', () => {
    const [output] = blocksIn(README, 'text');
    expect(printed(text, stage())).toBe(textOf(output?.lines ?? []));
  });
});

describe('what is told in words', () => {
  const gases = builtIn('gases')?.gases ?? {};
  const names = Object.keys(gases);

  test('counts of what is built in', () => {
    const atoms = Object.keys(builtIn('atoms')?.atoms ?? {}).length;
    const films = Object.keys(builtIn('films')?.films ?? {}).length;
    expect(PROSE).toContain(`The ${names.length} gases, ${atoms} atoms and ${films} films that are built in`);
  });

  test('every gas whose collision values are estimated', () => {
    const told = /Collision values are estimated for ([^:]*):/.exec(PROSE)?.[1]?.split(/, | and /);
    expect(told).toEqual(names.filter((name) => gases[name]?.collision?.estimated !== undefined));
  });

  test('every gas without collision values', () => {
    const without = names.filter((name) => gases[name]?.collision === undefined);
    expect(PROSE).toContain(`${without.join(' and ')} has no collision values`);
  });

  test('every built-in process', () => {
    const [, judged = ''] = PROSE.split('What is judged in this release');
    for (const file of readdirSync('src/built-in/processes'))
      expect(judged).toContain(`\`${file.replace('.yaml', '')}\``);
  });

  test('the size of the demo line', () => {
    const recipes = /(\d+) recipes, /.exec(regimen(['check', 'recipes']).out)?.[1];
    expect(PROSE).toContain(`${readdirSync('recipes/chambers').length} chambers, ${recipes} recipes`);
  });

  test('every command and format', () => {
    const help = regimen(['--help']).out;
    for (const [, command] of help.matchAll(/^ {2}(\w+) {2,}\w/gm))
      expect(README).toMatch(new RegExp(`regimen ${command}\\b`));
    for (const ending of ['.json', '.csv', '.md', '.txt']) expect(README).toContain(`\`${ending}\``);
  });
});

describe('excerpts', () => {
  const whole = ['a', 'b', 'c', 'd', 'e'];

  test.each([
    [['a', '…', 'e'], true],
    [['…', 'c', '…'], true],
    [['a', 'b', '…'], true],
    [['a', 'c', '…'], false],
    [['a', 'b', 'c', 'd'], false],
    [['b', '…'], false],
  ])('%j is true to a, b, c, d, e: %s', (excerpt, expected) => {
    expect(shows(excerpt, whole)).toBe(expected);
  });
});

function textOf(lines: Block['lines']): string {
  return `${lines.join('\n')}\n`;
}

function builtIn(name: string) {
  const file = `src/built-in/${name}.yaml`;
  return readSubstances(new Source(file, readFileSync(file, 'utf8'))).value?.content;
}
