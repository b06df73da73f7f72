import { randomUUID } from 'node:crypto';
import {
  letterSubject,
  letterText,
  type LetterTextPart,
  type LetterWords,
} from '../../shared/presentation/letter-text.ts';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import type { LetterReason } from '../../shared/schemas/letters.ts';
import type { Interested } from '../models/find-interested.ts';
import type { Told } from '../models/find-told.ts';
import type { Recipient } from './find-recipients.ts';
import { toldOfBuilding } from './told-of-building.ts';
import { valuesOfLetter, type ToldBuilding } from './values-of-letter.ts';

/** A letter as it is kept: what it says, to whom it goes, and what it was written from. */
export type Composed = {
  readonly id: string;
  readonly partyId: string;
  readonly channel: 'e-mail' | 'post';
  readonly name: string;
  readonly address: string;
  readonly email: string | null;
  readonly subject: string;
  readonly body: string;
  readonly facts: { readonly parts: readonly LetterTextPart[]; readonly buildings: object[] };
  readonly reasons: readonly LetterReason[];
  readonly answerBy: string;
  readonly buildings: readonly number[];
};

/** What all letters of a batch are written from. */
export type Material = {
  readonly schemeName: string;
  readonly template: LetterWords;
  readonly settings: LetterSettings;
  readonly design: AlignmentDesign | null;
  readonly told: ReadonlyMap<number, Told>;
  readonly answerBy: string;
};

/** Whom a letter to a party goes to: their representative, where they have one. */
export function addresseeOf({ representative, ...party }: Interested) {
  if (representative === null) {
    return {
      ...{ name: party.name, address: party.address, email: party.email },
      ...{ channel: party.channel, partyId: party.partyId, personId: party.personId },
    };
  }
  const { id, personId, address, email, channel } = representative;
  const name = `${representative.name}, for ${party.name}`;
  return { name, address, email, channel, partyId: id, personId };
}

function asText(part: LetterTextPart): string {
  if (typeof part === 'string') return part;
  return 'list' in part ? part.list.map((item) => `- ${item}`).join('\n') : '';
}

function factsOfBuilding({ building, facts }: ToldBuilding): object {
  const { id, reference, address, decision, measures } = building;
  return { id, reference, address, decision, measures, facts };
}

/** Writes one letter. What it says never changes afterwards, whatever becomes of the run or the register. */
export function composeLetter(
  { schemeName, template, settings, design, told, answerBy }: Material,
  { party, reasons }: Pick<Recipient, 'party' | 'reasons'>,
): Composed {
  const buildings = party.buildings.flatMap((id): ToldBuilding[] => {
    const building = told.get(id);
    if (building === undefined) return [];
    const { found } = building;
    const isKnown = found !== null && design !== null;
    return [{ building, facts: isKnown ? toldOfBuilding(found, design).facts : null }];
  });
  const { name, address, email, channel } = addresseeOf(party);
  const about = { name, scheme: schemeName, answerBy, settings, buildings };
  const values = valuesOfLetter(about);
  const parts = letterText(template.body, values);
  return {
    ...{ id: randomUUID(), partyId: party.partyId },
    ...{ name, address, email, channel, reasons, answerBy },
    subject: letterSubject(template.subject, values),
    body: parts
      .map(asText)
      .filter((text) => text !== '')
      .join('\n\n'),
    facts: { parts, buildings: buildings.map(factsOfBuilding) },
    buildings: party.buildings,
  };
}
