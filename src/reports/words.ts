import type { Reference } from '../quantities/reference.ts';

/** What a number is called in a sentence: "Knudsen number over the gap", "mean free path of SiH4". */
export function numberWords(reference: Reference, subject?: string): string {
  const { id, length, of, at } = reference;
  if (id === 'setpoint' && of !== undefined) return of;
  if (id === 'length' && length !== undefined) return length;
  let words = idWords(id);
  if (length !== undefined) words += ` ${preposition(id, length)} the ${length}`;
  const whose = subject ?? of;
  if (whose !== undefined && whose !== 'worst')
    words += ` of ${whose.startsWith('target/') || whose.startsWith('melt/') ? whose.slice(whose.indexOf('/') + 1) : whose}`;
  if (at !== undefined) words += AT[at];
  return words;
}

/** "1 recipe", "8 recipes". */
export function counted(count: number, noun: string, plural = `${noun}s`): string {
  return `${count} ${count === 1 ? noun : plural}`;
}

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[]): string {
  if (items.length < 2) return items[0] ?? '';
  return `${items.slice(0, -1).join(', ')} and ${items.at(-1) ?? ''}`;
}

export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** A clause as a sentence. */
export function sentence(clause: string): string {
  const begun = capital(clause);
  return /[.?!]$/.test(begun) ? begun : `${begun}.`;
}

const AT = { start: ' at the start', end: ' at the end', mean: ', mean' } as const;

function idWords(id: string): string {
  return NAMED.get(id) ?? id.replaceAll('-', ' ');
}

/** Numbers that bear a person's name, or whose id does not read as words. */
const NAMED: ReadonlyMap<string, string> = new Map([
  ['knudsen', 'Knudsen number'],
  ['slowing-knudsen', 'slowing Knudsen number'],
  ['reynolds', 'Reynolds number'],
  ['peclet', 'Péclet number'],
  ['rayleigh', 'Rayleigh number'],
  ['thiele', 'Thiele modulus'],
  ['damkohler', 'Damköhler number'],
  ['collisions-straight', 'collisions on a straight flight'],
  ['collisions-walk', 'collisions on a random walk'],
  ['collisions-residence', 'collisions during the stay'],
  ['utilisation', 'utilisation'],
  ['pressure-distance', 'pressure times distance'],
]);

function preposition(id: string, length: string): string {
  if (id === 'pressure-distance') return 'of';
  return length === 'plasma' || (length === 'feature' && !OVER.has(id)) ? 'in' : 'over';
}

const OVER: ReadonlySet<string> = new Set(['knudsen', 'collisions-straight', 'collisions-walk', 'diffusion-time']);
