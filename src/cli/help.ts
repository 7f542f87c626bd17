import { COMMANDS } from './commands.ts';
import { COMMON, optionFacts } from './options.ts';
import type { Command } from './commands.ts';
import type { OptionName } from './options.ts';

/** What `--help` prints: for one command, or for the program. */
export function helpText(command?: Command): string {
  return command === undefined ? programHelp() : commandHelp(command);
}

const MARGIN = '  ';
const WIDTH = 100;

function programHelp(): string {
  return sections([
    'regimen checks process recipes: it computes the gas kinetics of every step and tells\nwhich steps do not fit their intended process.',
    titled('Use', ['regimen COMMAND [options]']),
    titled('Commands', rows(COMMANDS.map(({ name, summary }) => [name, summary]))),
    titled('Options', rows([...COMMON.map(optionRow), ['--version', 'the version of the program']])),
    `${MARGIN}regimen COMMAND --help tells more of a command.`,
  ]);
}

function commandHelp({ name, takes, says, options, examples }: Command): string {
  return sections([
    titled('Use', [`regimen ${name} ${takes} [options]`]),
    says.map((paragraph) => filled(paragraph, WIDTH).join('\n')).join('\n'),
    titled('Options', rows([...options, ...COMMON].map(optionRow))),
    titled('Examples', examples),
  ]);
}

function sections(texts: readonly string[]): string {
  return `${texts.join('\n\n')}\n`;
}

function titled(title: string, lines: readonly string[]): string {
  return [title, ...lines.map((line) => MARGIN + line)].join('\n');
}

function optionRow(name: OptionName): readonly [string, string] {
  const { value, short, says } = optionFacts(name);
  return [`${short === undefined ? '' : `-${short}, `}--${name}${value === undefined ? '' : ` ${value}`}`, says];
}

/** Two columns; the second is broken over lines. */
function rows(pairs: readonly (readonly [string, string])[]): string[] {
  const width = Math.max(...pairs.map(([name]) => name.length)) + 3;
  return pairs.flatMap(([name, text]) => {
    const lines = filled(text, WIDTH - width);
    return lines.map((line, index) => (index === 0 ? name : '').padEnd(width) + line);
  });
}

function filled(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    if (line !== '' && line.length + 1 + word.length > width) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line];
}
