import type { Batch } from '../../../shared/schemas/letter-batches.ts';
import { LETTER_KINDS, type LetterKind } from '../../../shared/schemas/letter-settings.ts';
import type { MatterKind } from '../../../shared/schemas/matters.ts';
import type { EarlierLetter, LetterReason, ListedLetter } from '../../../shared/schemas/letters.ts';
import { formatShortDay } from '../../lib/format-date.ts';
import type { State } from '../../components/ui/state-mark.tsx';

/** What each kind of letter is for. */
export const KIND_LABELS: Readonly<Record<LetterKind, string>> = {
  'first information': 'First information',
  'condition survey': 'Offer of a condition survey',
  'access request': 'Request for access',
  'when the tunnel passes': 'When the tunnel passes',
  'decision and measures': 'Decision and measures',
  'free text': 'Free text',
};

/** The kinds of letters to choose from. */
export const KIND_OPTIONS = LETTER_KINDS.map((kind) => ({
  value: kind,
  label: KIND_LABELS[kind],
}));

/** What owners bring up and are answered, as lists of it are headed. */
export const ANSWERED: readonly (readonly [MatterKind, string])[] = [
  ['concern', 'worries'],
  ['question', 'questions'],
  ['claim', 'claims'],
  ['correction', 'corrections'],
];

/** The shape that goes with where a batch stands. */
export const BATCH_SHAPES: Readonly<Record<Batch['state'], State>> = {
  'waiting for check': 'waiting',
  returned: 'not-started',
  withdrawn: 'not-started',
  checked: 'in-hand',
  sent: 'done',
};

/** The shape that goes with where a letter stands. */
export const DELIVERY_SHAPES: Readonly<Record<ListedLetter['delivery'], State>> = {
  'not sent': 'not-started',
  waiting: 'in-hand',
  sent: 'done',
  'sent again after a stop': 'done',
  failed: 'waiting',
  'to be printed': 'in-hand',
  printed: 'done',
};

const MOST_NAMED = 4;

/** Why somebody gets a letter: what each rule says, and of which buildings. */
export function reasonWords(reasons: readonly LetterReason[]): string {
  const buildings = new Map<string, string[]>();
  for (const { why, building } of reasons) {
    const named = buildings.get(why) ?? [];
    buildings.set(why, building === null ? named : [...named, building]);
  }
  return [...buildings]
    .map(([why, named]) => {
      const more = named.length - MOST_NAMED;
      const listed = named.slice(0, MOST_NAMED).join(', ');
      if (named.length === 0) return why;
      return `${why}: ${listed}${more > 0 ? ` and ${more} more` : ''}`;
    })
    .join('; ');
}

/** What somebody had already, or has waiting: as "on 2 Dec 2026 in batch 3, for 3 Middle Row". */
export function earlierWords(earlier: readonly EarlierLetter[]): string {
  return earlier
    .map(({ batchNumber, sentAt, buildings }) => {
      const how = sentAt === null ? 'waits' : `on ${formatShortDay(sentAt)}`;
      return `${how} in batch ${batchNumber}, for ${buildings.join(', ')}`;
    })
    .join('; ');
}

/** A number of letters, as "1 letter" or "1,204 letters". */
export function lettersWords(count: number): string {
  return count === 1 ? '1 letter' : `${count.toLocaleString('en-GB')} letters`;
}

/** How far the letters of a batch that was sent are. */
export function deliveryWords({ deliveries }: Pick<Batch, 'deliveries'>): string {
  if (deliveries === null) return '';
  const { waiting, sent, sentAgain, failed, post, acknowledged } = deliveries;
  const counts: readonly (readonly [number, string])[] = [
    [waiting, 'on the way'],
    [sent, 'sent by e-mail'],
    [sentAgain, 'of them sent again after a stop'],
    [post, 'by post'],
    [failed, 'failed'],
    [acknowledged, 'acknowledged'],
  ];
  return counts
    .filter(([count]) => count !== 0)
    .map(([count, words]) => `${count.toLocaleString('en-GB')} ${words}`)
    .join(', ');
}
