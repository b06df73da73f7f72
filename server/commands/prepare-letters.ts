import { randomUUID } from 'node:crypto';
import type { NewBatch } from '../../shared/schemas/letter-batches.ts';
import { LETTER_LIMITS } from '../../shared/schemas/letter-limits.ts';
import { AppError } from '../errors.ts';
import { composeLetter } from '../letters/compose-letters.ts';
import { findMaterial } from '../letters/find-material.ts';
import { findRecipients } from '../letters/find-recipients.ts';
import { refuseBadMarks } from '../letters/refuse-bad-marks.ts';
import { insertBatch } from '../models/letter-batches.ts';
import { insertExceptions } from '../models/letter-exceptions.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { heldTemplate } from '../models/letter-templates.ts';
import { insertLetters } from '../models/letters.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/**
 * Writes the letters of a batch to everybody whom the rules name or who was chosen, but those left out.
 * Refused where that is another number by now than was seen. Nothing is sent yet.
 */
export async function prepareLetters(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: NewBatch,
): Promise<string> {
  if (asked.text !== null) refuseBadMarks(asked.text, 'text.');
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const held = await heldSettings(database, scheme, transaction);
    const template = await heldTemplate(database, scheme.id, asked.kind, transaction);
    const found = await findRecipients(database, scheme.id, held.settings, asked, transaction);
    const getting = found.recipients.filter(({ leftOut }) => leftOut === null);
    if (getting.length !== asked.expected) {
      const message = `By now ${getting.length} would get the letter, not ${asked.expected}. Look at the list again.`;
      throw new AppError('conflict', message);
    }
    if (getting.length > LETTER_LIMITS.letters) {
      throw new AppError('invalid-input', `At most ${LETTER_LIMITS.letters} letters at once.`);
    }
    const words = asked.text ?? template;
    const material = await findMaterial(scheme, held.settings, words, found, transaction);
    const letters = getting.map((recipient) => composeLetter(material, recipient));
    const batch = { id: randomUUID(), schemeId: scheme.id, kind: asked.kind };
    const versions = { templateVersion: template.version, settingsVersion: held.version };
    const about = { ...batch, ...versions, runId: found.runId, letters: letters.length };
    await insertBatch(database, { ...about, text: asked.text, by: by.id }, transaction);
    await insertLetters(database, batch, letters, transaction);
    const leftOut = found.recipients.flatMap(({ party, reasons, leftOut: why }) =>
      why === null ? [] : [{ partyId: party.partyId, reasons, why }],
    );
    await insertExceptions(database, batch.id, leftOut, transaction);
    const subject = { kind: 'letters', id: batch.id };
    const after = { kind: asked.kind, letters: letters.length, leftOut: leftOut.length };
    const change = { by, schemeId: scheme.id, action: 'prepare letters', subject, after };
    await recordChange(change, transaction);
    return batch.id;
  });
}
