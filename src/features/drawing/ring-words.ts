import type { RingKind } from './drafts/edit-rings.ts';

type RingWords = {
  readonly title: string;
  readonly hint: string;
  readonly close: string;
  readonly area: string;
};

/** What is said while a ring is drawn. */
export const RING_WORDS: Readonly<Record<'outline' | RingKind, RingWords>> = {
  outline: {
    title: 'Draw a building',
    hint: 'Press the corners on the map one after another, or write them here. Corners and walls of neighbours are taken exactly.',
    close: 'Close the outline',
    area: 'Area if closed now',
  },
  courtyard: {
    title: 'Add a courtyard',
    hint: 'Press the corners of the courtyard inside the building one after another, or write them here.',
    close: 'Close the courtyard',
    area: 'Courtyard if closed now',
  },
  part: {
    title: 'Add a part',
    hint: 'Press the corners of another part beside the building one after another, or write them here. Both stay one building.',
    close: 'Close the part',
    area: 'Part if closed now',
  },
};
