import type { Pointer } from '../documents/document.ts';
import type { Waivers } from '../documents/generated/types.ts';
import type { Fault } from '../shelf/fault.ts';
import { unknownName } from './names.ts';
import { placeIn, type Ground } from './ground.ts';
import type { Step, Waiver } from './step.ts';

/** The waivers that stand at a recipe, cycle or step. */
export function waiversAt(waivers: Waivers | undefined, pointer: Pointer, ground: Ground): readonly Waiver[] {
  if (waivers === undefined) return NO_WAIVERS;
  return waivers.map((waiver, index) => {
    const at = [...pointer, 'waivers', index];
    if (!isDay(waiver.until)) {
      const place = placeIn(ground, at, ['until']);
      ground.faults.push({
        place,
        found: `there is no day ${waiver.until}`,
        right: 'a day of the calendar, as in 2027-06-30',
      });
    }
    return {
      assumption: waiver.assumption,
      reason: waiver.reason,
      approvedBy: waiver.approved_by,
      until: waiver.until,
      ...(waiver.holds_to === undefined ? {} : { holdsTo: waiver.holds_to }),
      place: placeIn(ground, at, ['assumption']),
    };
  });
}

/** The names under which findings of a step of a process can be waived. */
export type Waivable = (process: string) => readonly string[];

/** Those of the waivers above a step that name an assumption of it. */
export function waiversOf(process: string, above: readonly Waiver[], waivable: Waivable): readonly Waiver[] {
  if (above.length === 0) return NO_WAIVERS;
  const names = waivable(process);
  return above.filter(({ assumption }) => names.includes(assumption));
}

/** Faults of waivers that no step below them has an assumption for. */
export function unmetWaivers(waivers: readonly Waiver[], steps: readonly Step[], waivable: Waivable): readonly Fault[] {
  const unmet = waivers.filter((waiver) => !steps.some((step) => step.waivers.includes(waiver)));
  if (unmet.length === 0) return [];
  const names = [...new Set(steps.flatMap(({ process }) => waivable(process)))];
  return unmet.map(({ place, assumption }) =>
    unknownName(place, 'assumption', assumption, names, 'the name of an assumption of the step'),
  );
}

const NO_WAIVERS: readonly Waiver[] = [];

function isDay(text: string): boolean {
  const day = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
}
