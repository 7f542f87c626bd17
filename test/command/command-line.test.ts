import { describe, expect, test } from 'vitest';
import { COMMANDS } from '../../src/cli/commands.ts';
import { readCommandLine } from '../../src/cli/command-line.ts';
import { VERSION } from '../../src/cli/version.ts';
import manifest from '../../package.json' with { type: 'json' };
import { regimen } from './run.ts';

describe('a wrong command line ends with 2 and one line that says what would be right', () => {
  test.each([
    [['chek'], "command 'chek' is unknown; did you mean check?"],
    [['checkeverything'], "command 'checkeverything' is unknown; one of check, table, derive, gas, list, start, help"],
    [['check', '--fromat', 'json'], 'option --fromat is unknown; did you mean --format?'],
    [['check', '--zzz'], 'option --zzz is unknown; regimen COMMAND --help lists its options'],
    [['check', '--out'], '--out has no value; --out FILE'],
    [['check', '--out', 'x.pdf'], 'the ending of --out x.pdf names no format; end it in .txt .md .csv .json'],
    [['check', '--out', 'x.md', '--out', 'x.md'], '--out x.md stands twice; name each file once'],
    [['check', '--format', 'jsn'], "--format 'jsn' is unknown; did you mean json?"],
    [['check', '--block-at', 'eror'], "--block-at 'eror' is unknown; did you mean error?"],
    [['check', '--color', 'sometimes'], "--color 'sometimes' is unknown; one of auto, always, never"],
    [['check', '--units', 'presure=Pa'], "dimension 'presure' is unknown; did you mean pressure?"],
    [['check', '--units', 'pressure'], '--units pressure names no unit; pressure=UNIT'],
    [['check', '--units', 'pressure=torr'], "unit 'torr' is unknown; did you mean Torr?"],
    [['check', '--jobs', '0'], '--jobs 0; a whole number from 1 to 64'],
    [['check', '--today', '2026-02-30'], '--today 2026-02-30 is no day; write YYYY-MM-DD'],
    [['table', '--columns', 'knudson.gap'], "no number is named 'knudson'; did you mean knudsen?"],
    [['table', '--format', 'json'], 'this command does not write json; one of text, markdown, csv'],
    [['derive', 'a.yaml'], 'STEP is missing; regimen derive PATH STEP WHAT'],
    [['derive', 'a', 'b', 'c', 'd'], "'d' is one argument too many; regimen derive PATH STEP WHAT"],
    [['gas'], 'NAME is missing; regimen gas NAME[=PARTS]...'],
    [['gas', 'Ar=-1'], "Ar=-1: '-1' is no share; parts above zero, Ar=4"],
    [['gas', 'Ar', '--pressure', '5'], expect.stringMatching(/^--pressure .*5/)],
    [
      ['gas', 'Ar', '--pressure', '0 Pa'],
      "--pressure '0 Pa' is not above zero; a gas has a pressure above 0 Pa: '1 Torr'",
    ],
    [['gas', 'Ar', '--temperature', '0 K'], expect.stringMatching(/^--temperature '0 K' is not above zero; /)],
    [['gas', 'Ar', '--temperature', '-273.15 degC'], expect.stringMatching(/^--temperature .*-273\.15 degC/)],
    [['gas', 'Ar', '--temperature', '-300 degC'], expect.stringMatching(/^--temperature .*-300 degC/)],
    [['gas', 'Ar', '--pressure', '-1 Pa'], expect.stringMatching(/^--pressure .*-1 Pa/)],
    [['list', 'gasses'], "list 'gasses' is unknown; did you mean gases?"],
  ])('%j', (args, message) => {
    const { code, out, err } = regimen(args);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(/^regimen: .*\n$/);
    expect(err.slice('regimen: '.length, -1)).toEqual(message);
  });
});

describe('help', () => {
  test('is given for no command, --help, -h and help, and ends with 0', () => {
    const [first, ...others] = [[], ['--help'], ['-h'], ['help']].map((args) => regimen(args));
    expect(first).toMatchObject({ code: 0, err: '' });
    expect(others).toEqual(others.map(() => first));
    for (const { name } of COMMANDS) expect(first?.out).toContain(`\n  ${name} `);
  });

  test.each(COMMANDS.map(({ name }) => name))('of %s names its options and an example', (name) => {
    const { code, out } = regimen([name, '--help']);
    expect(code).toBe(0);
    const command = COMMANDS.find((one) => one.name === name);
    for (const option of command?.options ?? []) expect(out).toContain(`--${option}`);
    for (const example of command?.examples ?? []) expect(out).toContain(example);
    expect(regimen(['help', name]).out).toBe(out);
  });

  test('no line is wider than 100 columns', () => {
    const texts = COMMANDS.map(({ name }) => regimen([name, '--help']).out);
    expect(Math.max(...texts.flatMap((text) => text.split('\n').map((line) => line.length)))).toBeLessThanOrEqual(100);
  });

  test('every example is a command line that can be read', () => {
    for (const { examples, name } of COMMANDS) {
      for (const example of examples) {
        const words = (example.match(/'[^']*'|\S+/g) ?? []).map((word) => word.replaceAll("'", ''));
        expect(readCommandLine(words.slice(1))).toMatchObject({ kind: 'run', command: { name } });
      }
    }
  });
});

test('--version is that of the package', () => {
  expect(VERSION).toBe(manifest.version);
  expect(regimen(['--version'])).toEqual({ code: 0, out: `${manifest.version}\n`, err: '' });
});
