import { ownerPlace, type OwnerPlace } from '../../../shared/presentation/owner-words.ts';
import type { OwnBuilding } from '../../../shared/schemas/own.ts';
import type { OwnMatter } from '../../../shared/schemas/matter-answers.ts';
import type { CorrectedField, MatterKind } from '../../../shared/schemas/matters.ts';

/** What an owner's building is called on their page. */
export function placeOf({ use }: Pick<OwnBuilding, 'use'>): OwnerPlace {
  return ownerPlace(use);
}

/** A building by its address or name; one that has neither by what it is. */
export function addressOf(building: Pick<OwnBuilding, 'address' | 'name' | 'use'>): string {
  return building.address ?? building.name ?? `Your ${placeOf(building)}`;
}

type FormWords = {
  readonly link: string;
  readonly title: string;
  readonly about: string;
  readonly aboutHint: string;
  readonly text: string;
  readonly next: (days: string) => string;
  readonly send: string;
};

/** What each form says: the link that opens it, its fields, and what happens next. */
export const FORM_WORDS: Readonly<Record<MatterKind, FormWords>> = {
  question: {
    link: 'Ask a question',
    title: 'Ask a question',
    about: 'What is it about?',
    aboutHint: 'A few words, as “The day of the survey”.',
    text: 'Your question',
    next: (days) =>
      `Someone will answer within ${days}. You get the answer by mail, and it stays on this page.`,
    send: 'Send the question',
  },
  concern: {
    link: 'Report a crack or a worry',
    title: 'Report a crack or a worry',
    about: 'What is it?',
    aboutHint: 'A few words, as “Crack over the kitchen door”.',
    text: 'What do you see, where, and since when?',
    next: (days) =>
      `Someone looks at it within ${days} and answers you. If somebody could get hurt, leave the building and call the emergency number first.`,
    send: 'Send the report',
  },
  claim: {
    link: 'Make a claim',
    title: 'Make a claim for damage or cost',
    about: 'What is it for?',
    aboutHint: 'A few words, as “Repair of the garden wall”.',
    text: 'What happened, when, and what does it cost?',
    next: (days) =>
      `Someone will answer within ${days} and tell you what happens next. Keep your bills, please.`,
    send: 'Send the claim',
  },
  correction: {
    link: 'Something about my building is wrong',
    title: 'Put a fact about your building right',
    about: 'What is wrong?',
    aboutHint: 'A few words, as “It has three floors”.',
    text: 'How do you know? Anything that helps us.',
    next: (days) =>
      `Someone looks at it within ${days} and answers you. If it changes what we expect, we write to you.`,
    send: 'Send the correction',
  },
};

/** As "5 working days". */
export function workingDays(count: number): string {
  return count === 1 ? '1 working day' : `${count} working days`;
}

/** How an owner calls what the register keeps of a building. */
export const FIELD_WORDS: Readonly<Record<CorrectedField, string>> = {
  address: 'The address',
  name: 'The name of the building',
  use: 'What it is used for',
  storeys: 'How many floors it has',
  construction: 'What it is built of',
  foundation: 'What it stands on',
  listedGrade: 'Whether it is listed',
};

/** Where something that an owner brought up stands. */
export const STATE_WORDS: Readonly<Record<OwnMatter['state'], string>> = {
  open: 'With us',
  answered: 'Answered',
  closed: 'Closed',
};

const KINDS: Readonly<Record<MatterKind, string>> = {
  question: 'Your question',
  concern: 'Your report',
  claim: 'Your claim',
  correction: 'Your correction',
};

export function kindWords(kind: MatterKind): string {
  return KINDS[kind];
}

const MEASURES: Readonly<Record<OwnBuilding['measures'][number]['state'], string>> = {
  agreed: 'planned',
  'in place': 'in place now',
  done: 'done',
};

/** How far a measure is. */
export function measureState(state: OwnBuilding['measures'][number]['state']): string {
  return MEASURES[state];
}
