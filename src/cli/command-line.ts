import { Command as Parser, CommanderError, Option } from 'commander';
import { COMMANDS, commandNamed } from './commands.ts';
import { COMMON, OPTIONS, optionFacts } from './options.ts';
import { unknownWord } from './problem.ts';
import { nearest } from '../units/suggest.ts';
import type { Command } from './commands.ts';
import type { OptionName } from './options.ts';
import type { Problem } from './problem.ts';

/** What a command line asks for. */
export type Asked =
  | { readonly kind: 'run'; readonly command: Command; readonly args: readonly string[]; readonly given: Given }
  | { readonly kind: 'help'; readonly command?: Command }
  | { readonly kind: 'version' }
  | { readonly kind: 'problem'; readonly command?: Command; readonly problem: Problem };

/** Options as they stand on the command line, by name; a switch has no texts. */
export type Given = ReadonlyMap<OptionName, readonly string[]>;

/** Reads a command line. The parser only takes it apart; what is wrong is worded here. */
export function readCommandLine(words: readonly string[]): Asked {
  const taken: Taken = { command: undefined, args: [], given: new Map() };
  const parser = parserFor(words, taken);
  try {
    parser.parse(words, { from: 'user' });
  } catch (error) {
    if (!(error instanceof CommanderError)) throw error;
    if (error.code !== 'commander.help') return problemAsked(problemOf(error), words);
  }
  if (parser.getOptionValue('version') === true) return { kind: 'version' };
  return askedBy(taken);
}

interface Taken {
  command: Command | undefined;
  args: readonly string[];
  readonly given: Map<OptionName, string[]>;
}

function askedBy({ command, args, given }: Taken): Asked {
  if (command === undefined) return { kind: 'help' };
  if (given.has('help')) return { kind: 'help', command };
  const problem = argumentProblem(command, args);
  return problem === undefined ? { kind: 'run', command, args, given } : { kind: 'problem', command, problem };
}

/** Whoever asks for help gets it, however wrong the rest is. */
function problemAsked(problem: Problem, words: readonly string[]): Asked {
  const command = COMMANDS.find(({ name }) => words.includes(name));
  const about = command === undefined ? {} : { command };
  return words.includes('--help') || words.includes('-h')
    ? { kind: 'help', ...about }
    : { kind: 'problem', ...about, problem };
}

function argumentProblem({ needs, most, takes, name }: Command, args: readonly string[]): Problem | undefined {
  const right = `regimen ${name} ${takes}`;
  const missing = needs[args.length];
  if (missing !== undefined) return { found: `${missing} is missing`, right };
  const extra = args[most];
  return extra === undefined ? undefined : { found: `'${extra}' is one argument too many`, right };
}

/** Only a command that stands among the words needs its options, and telling the parser of one takes its time. */
function parserFor(words: readonly string[], taken: Taken): Parser {
  const parser = silent(new Parser('regimen')).option('--version').helpCommand(false);
  for (const name of COMMON) addOption(parser, name, taken);
  for (const command of COMMANDS) {
    const sub = silent(parser.command(command.name)).argument('[argument...]');
    if (words.includes(command.name)) for (const name of [...command.options, ...COMMON]) addOption(sub, name, taken);
    sub.action((args: readonly string[]) => {
      taken.command = command;
      taken.args = args;
    });
  }
  return addHelpCommand(parser, taken);
}

function addHelpCommand(parser: Parser, taken: Taken): Parser {
  silent(parser.command('help'))
    .argument('[command]')
    .action((name?: string) => {
      taken.command = name === undefined ? undefined : commandNamed(name);
      taken.given.set('help', []);
    });
  return parser;
}

function silent(parser: Parser): Parser {
  const nothing = (): void => undefined;
  return parser
    .exitOverride()
    .helpOption(false)
    .showSuggestionAfterError(false)
    .configureOutput({ writeOut: nothing, writeErr: nothing });
}

function addOption(parser: Parser, name: OptionName, { given }: Taken): void {
  const { value, short, repeats } = optionFacts(name);
  const flags = `${short === undefined ? '' : `-${short}, `}--${name}${value === undefined ? '' : ` <${value}>`}`;
  parser.addOption(new Option(flags));
  parser.on(`option:${name}`, (text: string | null) => {
    const before = given.get(name) ?? [];
    given.set(name, text === null ? before : repeats === true ? [...before, text] : [text]);
  });
}

/** The parser tells what it stumbled over between quotes. */
function problemOf({ code, message }: CommanderError): Problem {
  const what = message.slice(message.indexOf("'") + 1, message.lastIndexOf("'"));
  switch (code) {
    case 'commander.unknownCommand':
      return unknownWord('command', what, [...COMMANDS.map(({ name }) => name), 'help']);
    case 'commander.optionMissingArgument':
      return { found: `${what.split(' ')[0] ?? what} has no value`, right: what.replace('<', '').replace('>', '') };
    case 'commander.unknownOption':
      return unknownOption(what);
    default:
      return { found: message.replace(/^error: /, ''), right: 'regimen --help tells what can be asked' };
  }
}

function unknownOption(flag: string): Problem {
  const names: readonly string[] = [...Object.keys(OPTIONS), 'version'];
  const meant = nearest(flag.replace(/^-+/, '').replace(/=.*$/, ''), names);
  const right = meant === undefined ? 'regimen COMMAND --help lists its options' : `did you mean --${meant}?`;
  return { found: `option ${flag} is unknown`, right };
}
