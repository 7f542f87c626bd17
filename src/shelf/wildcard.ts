/**
 * Whether a row of items meets a row of parts, where a star part stands for any number of items and every other part for
 * one that fits. Only the latest star is ever widened, since an earlier one can gain nothing by it: the work is bounded by
 * the product of both lengths.
 */
export function meets<Part, Item>(
  parts: ArrayLike<Part>,
  items: ArrayLike<Item>,
  isStar: (part: Part | undefined) => boolean,
  fits: (part: Part, item: Item) => boolean,
): boolean {
  let part = 0;
  let item = 0;
  let afterStar = -1;
  let resume = 0;
  while (item < items.length) {
    if (isStar(parts[part])) {
      part += 1;
      afterStar = part;
      resume = item;
    } else if (fitsAt(parts, part, items, item, fits)) {
      part += 1;
      item += 1;
    } else if (afterStar !== -1) {
      resume += 1;
      part = afterStar;
      item = resume;
    } else return false;
  }
  while (isStar(parts[part])) part += 1;
  return part === parts.length;
}

function fitsAt<Part, Item>(
  parts: ArrayLike<Part>,
  part: number,
  items: ArrayLike<Item>,
  item: number,
  fits: (part: Part, item: Item) => boolean,
): boolean {
  const one = parts[part];
  const other = items[item];
  return one !== undefined && other !== undefined && fits(one, other);
}

/** Whether a name meets a pattern of characters, `*` (any number of them) and `?` (one). */
export function nameMeets(pattern: string, name: string): boolean {
  return meets(pattern, name, isAsterisk, characterFits);
}

function isAsterisk(part: string | undefined): boolean {
  return part === '*';
}

function characterFits(part: string, character: string): boolean {
  return part === character || part === '?';
}
