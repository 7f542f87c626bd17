import type { OptionName } from './options.ts';

export type CommandName = 'check' | 'table' | 'derive' | 'gas' | 'list' | 'start';

/** A command as its user sees it. */
export interface Command {
  readonly name: CommandName;
  /** What follows the name: `[PATH]...`. */
  readonly takes: string;
  /** Names of its arguments that must be there, in order. */
  readonly needs: readonly string[];
  /** How many arguments it takes at most. */
  readonly most: number;
  /** One line for the list of commands. */
  readonly summary: string;
  /** Paragraphs for its own help. */
  readonly says: readonly string[];
  readonly options: readonly OptionName[];
  readonly examples: readonly string[];
}

const PATHS =
  'PATH is a recipe, a folder of them or - for standard input; without one, the recipes of the site are taken.';
const OUTPUT = ['out', 'format', 'units'] as const;

export const COMMANDS: readonly Command[] = [
  {
    name: 'check',
    takes: '[PATH]...',
    needs: [],
    most: Infinity,
    summary: 'judge every step of recipes against its intended process',
    says: [
      'Reads recipes, computes the gas kinetics of their steps and tells which steps do not fit their intended process.',
      PATHS,
      'Ends with 0 where nothing blocks, 1 where a verdict does (see --block-at), 2 where the job could not be done in full.',
    ],
    options: [...OUTPUT, 'block-at', 'unproven', 'site', 'at', 'jobs', 'today'],
    examples: [
      'regimen check',
      'regimen check recipes/etch --block-at warning',
      'regimen check --out report.md --out report.json',
    ],
  },
  {
    name: 'table',
    takes: '[PATH]...',
    needs: [],
    most: Infinity,
    summary: 'print the regime of every step: mean free path, Knudsen numbers, residence time, ...',
    says: ['Prints a table of numbers for every step of the recipes.', PATHS],
    options: [...OUTPUT, 'columns', 'site', 'at', 'jobs'],
    examples: ['regimen table liner.yaml', 'regimen table liner.yaml --columns pressure,knudsen.throw:target'],
  },
  {
    name: 'derive',
    takes: 'PATH STEP WHAT',
    needs: ['PATH', 'STEP', 'WHAT'],
    most: 3,
    summary: 'show how a number or a verdict of a step comes about, law by law',
    says: [
      'Prints the way from the lines of the documents through each law, with its source, to a number of one step.',
      "WHAT is a number's name (knudsen.gap) or an assumption's (free-throw). STEP is a step's path (cycle/step) or its number.",
    ],
    options: [...OUTPUT, 'site', 'at'],
    examples: ['regimen derive liner.yaml titanium knudsen.throw:target', 'regimen derive liner.yaml 3 free-throw'],
  },
  {
    name: 'gas',
    takes: 'NAME[=PARTS]...',
    needs: ['NAME'],
    most: Infinity,
    summary: 'print the kinetics of gases or of a mixture, outside any recipe',
    says: ['Names with parts make one mixture (Ar=4 CF4=1), names without are listed one by one.'],
    options: ['temperature', 'pressure', ...OUTPUT, 'site'],
    examples: ['regimen gas Ar He', "regimen gas Ar=4 CF4=1 --pressure '30 mTorr'"],
  },
  {
    name: 'list',
    takes: 'WHAT',
    needs: ['WHAT'],
    most: 1,
    summary: 'list what there is: quantities, processes, gases, films or units',
    says: [
      'WHAT is quantities, processes, gases, films or units; what the site of the working folder adds is listed too.',
    ],
    options: ['out', 'format', 'site'],
    examples: ['regimen list processes', 'regimen list gases'],
  },
  {
    name: 'start',
    takes: 'FOLDER',
    needs: ['FOLDER'],
    most: 1,
    summary: 'write a small commented site to begin from',
    says: [
      'Writes a site document, a chamber and a recipe that checks clean into FOLDER. Nothing that is there is overwritten.',
    ],
    options: [],
    examples: ['regimen start my-line'],
  },
];

export function commandNamed(name: string): Command | undefined {
  return COMMANDS.find((command) => command.name === name);
}
