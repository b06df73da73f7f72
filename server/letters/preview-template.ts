import type { Sequelize } from 'sequelize';
import type { z } from 'zod';
import { faultsOfMarks } from '../../shared/presentation/letter-text.ts';
import type { LetterKind, LetterSettings } from '../../shared/schemas/letter-settings.ts';
import {
  previewedTemplateSchema,
  type PreviewedTemplate,
  type templatePreviewSchema,
} from '../../shared/schemas/letter-templates.ts';
import { heldSettings } from '../models/letter-settings.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import { composeLetter } from './compose-letters.ts';
import { findMaterial } from './find-material.ts';
import { findRecipients, type FoundRecipients } from './find-recipients.ts';

type Asked = z.infer<typeof templatePreviewSchema> & { readonly kind: LetterKind };

/** So many parties are offered to look at a template with. */
const MOST = 50;

/** Free text mostly has no rules of its own: while it has no readers, it is looked at with whoever is told first. */
async function findReaders(
  database: Sequelize,
  schemeId: string,
  settings: LetterSettings,
  asked: Pick<Asked, 'kind' | 'leftOut' | 'chosen'>,
): Promise<FoundRecipients> {
  const found = await findRecipients(database, schemeId, settings, asked, null);
  if (asked.kind !== 'free text' || found.recipients.length > 0) return found;
  const first = { ...asked, kind: 'first information' } as const;
  return findRecipients(database, schemeId, settings, first, null);
}

/** A letter as a party who gets it would read it; nothing is kept. */
export async function previewTemplate(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  { kind, leftOut, chosen, subject, body, partyId }: Asked,
): Promise<PreviewedTemplate> {
  const faults = [...faultsOfMarks(subject), ...faultsOfMarks(body)];
  const { settings } = await heldSettings(database, scheme);
  const asked = { kind, leftOut, chosen };
  const found = await findReaders(database, scheme.id, settings, asked);
  const readers = found.recipients.filter((one) => one.leftOut === null);
  const recipient = readers.find(({ party }) => party.partyId === partyId) ?? readers[0];
  const parties = readers
    .slice(0, MOST)
    .map(({ party }) => ({ id: party.partyId, name: party.name }));
  if (recipient === undefined || faults.length > 0) {
    return previewedTemplateSchema.parse({ faults, parties, letter: null });
  }
  const material = await findMaterial(scheme, settings, { subject, body }, found);
  const letter = composeLetter(material, recipient);
  const { name, subject: title, facts } = letter;
  return previewedTemplateSchema.parse({
    ...{ faults, parties },
    letter: { name, subject: title, parts: facts.parts },
  });
}
