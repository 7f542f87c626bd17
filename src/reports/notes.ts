import type { Judgement } from '../verdicts/judgement.ts';
import type { Note } from '../verdicts/verdict.ts';

/** A note in words, with the place that it speaks of. */
export interface NoteText {
  readonly path?: string;
  readonly line: number;
  readonly column: number;
  readonly text: string;
}

export function noteText(note: Note, { run }: Judgement): NoteText {
  if (note.kind === 'chamber-revision') {
    const { name } = run.recipe.chamber;
    const now = note.revision === undefined ? 'states no revision' : `is at revision ${note.revision}`;
    return { ...lineOf(note.place), text: `Qualified on ${name} revision ${note.qualifiedOn}; ${name} ${now}.` };
  }
  const { step, waiver } = note;
  return { path: step, ...lineOf(waiver.place), text: waiverText(note.kind, step, waiver) };
}

function waiverText(
  kind: WaiverNote['kind'],
  step: string,
  { assumption, until, holdsTo }: WaiverNote['waiver'],
): string {
  const waiver = `${step}: the waiver for ${assumption}`;
  switch (kind) {
    case 'waiver-unused':
      return `${waiver} meets no finding; it can go.`;
    case 'waiver-expired':
      return `${waiver} ended on ${until}; the finding is back.`;
    case 'waiver-outgrown':
      return `${waiver} was granted up to ${holdsTo ?? 'another value'}; the value is beyond it and the finding is back.`;
  }
}

type WaiverNote = Exclude<Note, { kind: 'chamber-revision' }>;

function lineOf({ line, column }: { readonly line: number; readonly column: number }): {
  line: number;
  column: number;
} {
  return { line, column };
}
