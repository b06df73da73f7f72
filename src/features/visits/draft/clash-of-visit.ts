import type { VisitedField } from '../../../../shared/schemas/visits.ts';
import type { Clash, EditedName } from '../../buildings/building-draft.ts';
import { correctedOf, type KeptVisit, type SeenBuilding } from './kept-visit.ts';

/** What somebody else made of the values that a visit puts right, beside what the visit found. */
export function clashOfVisit(visit: KeptVisit, fresh: SeenBuilding): Clash {
  const before = visit.seen?.values ?? {};
  const mine = correctedOf(visit).filter(([field, value]) => value !== fresh.values[field]);
  const isTheirs = (field: VisitedField) => fresh.values[field] !== before[field];
  return {
    both: mine
      .filter(([field]) => isTheirs(field))
      .map(([name, value]) => ({ name, mine: value, theirs: fresh.values[name] ?? null })),
    mineOnly: mine.filter(([field]) => !isTheirs(field)).map(([field]) => field),
    theirsOnly: [],
  };
}

/** The visit on top of the register as it is now, with what of mine was chosen; the rest stays theirs. */
export function settled(
  visit: KeptVisit,
  fresh: SeenBuilding | null,
  mine: readonly EditedName[],
): KeptVisit {
  const corrected = correctedOf(visit).map(([field]) => field);
  const left = corrected.filter((field) => !mine.includes(field));
  // what was found stays with the visit; only what it changes in the register is taken back
  const seen =
    fresh === null
      ? null
      : {
          version: fresh.version,
          values: {
            ...fresh.values,
            ...Object.fromEntries(correctedOf(visit).filter(([field]) => left.includes(field))),
          },
        };
  return { ...visit, seen, state: 'kept', fault: null };
}
