import { readCommandLine } from './command-line.ts';
import { helpText } from './help.ts';
import { standardOut } from './out.ts';
import { failureOf } from './part.ts';
import { tellFailure, tellProblem } from './tell.ts';
import { VERSION } from './version.ts';
import type { ExitCode } from './call.ts';
import type { Asked } from './command-line.ts';
import type { Out } from './out.ts';

/** The command line from its words to the exit code. What the commands do is loaded only for one of them. */
export async function main(words: readonly string[]): Promise<void> {
  const out = standardOut();
  try {
    process.exitCode = await answer(readCommandLine(words), out);
  } catch (error) {
    process.exitCode = tellFailure(out, failureOf(error), words.includes('--trace') || isSet('REGIMEN_TRACE'));
  }
}

async function answer(asked: Asked, out: Out): Promise<ExitCode> {
  switch (asked.kind) {
    case 'version':
      out.write(`${VERSION}\n`);
      return 0;
    case 'help':
      out.write(helpText(asked.command));
      return 0;
    case 'problem':
      return tellProblem(out, asked.problem);
    case 'run': {
      const { readOptions, RUNS } = await import('./every-command.ts');
      const { options, problem } = readOptions(asked.given, asked.args);
      if (problem !== undefined) return tellProblem(out, problem);
      return RUNS[asked.command.name]({ args: asked.args, options, out });
    }
  }
}

function isSet(name: string): boolean {
  const { [name]: value = '' } = process.env;
  return value !== '';
}
