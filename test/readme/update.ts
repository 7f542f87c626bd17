import { readFileSync, writeFileSync } from 'node:fs';
import { clearFolders } from '../command/run.ts';
import { blocksIn, withBlocks, type Block } from './blocks.ts';
import { rerun, stage } from './console.ts';
import { printed } from './snippet.ts';

/*
 * `npm run build && npx tsx test/readme/update.ts`: rewrites the output blocks of the README from what the built command gives.
 */

const markdown = readFileSync('README.md', 'utf8');
const folder = stage();
const fresh = new Map<Block, readonly string[]>();
for (const block of blocksIn(markdown, 'console')) fresh.set(block, rerun(block, folder));
const [program] = blocksIn(markdown, 'ts');
const [output] = blocksIn(markdown, 'text');
if (program !== undefined && output !== undefined) {
  fresh.set(output, printed(program.lines.join('\n'), folder).trimEnd().split('\n'));
}
writeFileSync('README.md', withBlocks(markdown, fresh));
clearFolders();
