import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { planModule } from './plan.ts';
import { ruleTextsModule } from './rule-texts.ts';
import { documentSchemas } from './schemas.ts';
import { typesModule } from './types.ts';
import { validatorsModule, validatorsTypes } from './validators.ts';

const ROOT = join(import.meta.dirname, '../..');
const DOCUMENTS = join(ROOT, 'src/documents/generated');

/** Writes what is made from the schemas and the built-in data; with `--check` only tells what differs from it. */
async function main(check: boolean): Promise<void> {
  const schemas = documentSchemas(join(ROOT, 'schemas'));
  const differing = put(check, [
    [join(DOCUMENTS, 'validators.js'), await validatorsModule(schemas)],
    [join(DOCUMENTS, 'validators.d.ts'), validatorsTypes()],
    [join(DOCUMENTS, 'types.ts'), await typesModule(schemas)],
    [join(DOCUMENTS, 'plan.ts'), planModule(schemas)],
    [join(DOCUMENTS, 'schemas.ts'), ruleTextsModule(schemas)],
  ]);
  if (!check || differing.length === 0) {
    // Imported late: it reads documents, by the modules that have just been written.
    const { dataModule } = await import('./data.ts');
    const data = dataModule(join(ROOT, 'src/built-in'));
    differing.push(...put(check, [[join(ROOT, 'src/built-in/generated/data.ts'), data]]));
  }
  if (!check || differing.length === 0) return;
  process.stderr.write(`Not as \`npm run generate\` makes it: ${differing.join(', ')}\n`);
  process.exitCode = 1;
}

/** Writes the files that differ, unless only asked which do; their paths from the project's folder. */
function put(check: boolean, files: readonly (readonly [string, string])[]): string[] {
  const differing = files.filter(([path, text]) => !existsSync(path) || readFileSync(path, 'utf8') !== text);
  for (const [path, text] of check ? [] : differing) {
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, text);
  }
  return differing.map(([path]) => relative(ROOT, path));
}

await main(process.argv.includes('--check'));
