/**
 * Elements of a chemical formula with their counts: `C8H20O4Si`, `Hf(N(CH3)2)4`. Undefined where the text is no formula.
 * That an element exists is not checked: a gas may be named after what its molecules are called.
 */
export function countElements(formula: string): ReadonlyMap<string, number> | undefined {
  if (formula.length === 0 || formula.length > LONGEST) return undefined;
  const open: Counts[] = [new Map<string, number>()];
  let end = 0;
  for (const { 0: whole, 1: symbol, 2: bracket, 3: digits, index } of formula.matchAll(PART)) {
    if (index !== end || !take(open, symbol, bracket, digits === '' ? 1 : Number(digits))) return undefined;
    end = index + whole.length;
  }
  const [counts] = open;
  return end === formula.length && open.length === 1 ? counts : undefined;
}

type Counts = Map<string, number>;

const LONGEST = 120;
/** An element or a bracket, and how many of it. */
const PART = /(?:([A-Z][a-z]?)|([()]))(\d{0,4})/g;

/** Takes one part into the innermost open bracket; false where brackets or counts make no sense. */
function take(open: Counts[], symbol: string | undefined, bracket: string | undefined, count: number): boolean {
  const inner = open.at(-1);
  if (inner === undefined || count === 0) return false;
  if (symbol !== undefined) {
    inner.set(symbol, (inner.get(symbol) ?? 0) + count);
    return true;
  }
  if (bracket === '(') {
    open.push(new Map());
    return count === 1;
  }
  open.pop();
  const outer = open.at(-1);
  if (outer === undefined) return false;
  for (const [element, number] of inner) outer.set(element, (outer.get(element) ?? 0) + number * count);
  return inner.size > 0;
}
