/** A fenced block of a Markdown text: its language, and its lines with their place in the text. */
export interface Block {
  readonly language: string;
  readonly lines: readonly string[];
  /** Index of its first line, and of the fence that closes it, among the lines of the text. */
  readonly start: number;
  readonly end: number;
}

/** The fenced blocks of a Markdown text in their order. */
export function blocksOf(markdown: string): readonly Block[] {
  const lines = markdown.split('\n');
  const blocks: Block[] = [];
  for (let at = 0; at < lines.length; at++) {
    const language = /^```(\w+)$/.exec(lines[at] ?? '')?.[1];
    if (language === undefined) continue;
    const start = at + 1;
    const end = lines.indexOf('```', start);
    blocks.push({ language, lines: lines.slice(start, end), start, end });
    at = end;
  }
  return blocks;
}

/** The blocks of one language. */
export function blocksIn(markdown: string, language: string): readonly Block[] {
  return blocksOf(markdown).filter((block) => block.language === language);
}

/** The text with the lines of some blocks replaced. */
export function withBlocks(markdown: string, replaced: ReadonlyMap<Block, readonly string[]>): string {
  const lines = markdown.split('\n');
  for (const [{ start, end }, fresh] of [...replaced].sort(([one], [other]) => other.start - one.start)) {
    lines.splice(start, end - start, ...fresh);
  }
  return lines.join('\n');
}
