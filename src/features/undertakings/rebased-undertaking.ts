import { changesBetween, type ValueChange } from '../../lib/changes-between.ts';
import { formatDay } from '../../lib/format-date.ts';
import { placeName } from '../matters/matter-words.ts';
import type { Undertaking } from '../../../shared/schemas/undertakings.ts';
import type { UndertakingDraft } from './undertaking-draft.ts';
import { madeToWords, stretchWords } from './undertaking-words.ts';

/** What belongs together: a party is one of its building, an end is beyond its start. */
const TOGETHER: readonly (readonly (keyof UndertakingDraft)[])[] = [
  ['promise'],
  ['building', 'partyId', 'madeTo'],
  ['from', 'to'],
  ['source'],
  ['responsible'],
  ['due'],
  ['doneOn', 'evidence'],
];

/** A draft begun from one version, laid on another: what was written on stays as written. */
export function rebasedUndertaking(
  mine: UndertakingDraft,
  from: UndertakingDraft,
  onto: UndertakingDraft,
): UndertakingDraft {
  const written = TOGETHER.filter((names) =>
    names.some((name) => JSON.stringify(mine[name]) !== JSON.stringify(from[name])),
  ).flat();
  const kept = Object.fromEntries(written.map((name) => [name, mine[name]]));
  return { ...onto, ...kept };
}

function day(at: string | null): string {
  return at === null ? '' : formatDay(at);
}

function inWords(undertaking: Undertaking) {
  const { promise, source, building, stretch, due, responsible, doneOn, evidence } = undertaking;
  return {
    Promise: promise,
    'Made to': madeToWords(undertaking),
    Source: source,
    Building: building === null ? '' : placeName(building),
    Stretch: stretch === null ? '' : stretchWords(stretch),
    'Who sees to it': responsible,
    Due: day(due),
    'Done on': day(doneOn),
    Evidence: evidence,
  };
}

/** What somebody else changed of an undertaking. */
export function undertakingChanges(before: Undertaking, after: Undertaking): ValueChange[] {
  return changesBetween(inWords(before), inWords(after));
}
