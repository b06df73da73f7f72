import {
  batchSchema,
  recipientsSchema,
  type Batch,
  type BatchDetail,
  type Recipients,
} from '../../shared/schemas/letter-batches.ts';
import {
  heldLetterSettingsSchema,
  type HeldLetterSettings,
} from '../../shared/schemas/letter-settings.ts';
import { templateSchema, type Template } from '../../shared/schemas/letter-templates.ts';
import {
  letterSchema,
  listedLetterSchema,
  type EarlierLetter,
  type Letter,
  type ListedLetter,
} from '../../shared/schemas/letters.ts';
import { addresseeOf } from '../letters/compose-letters.ts';
import type { FoundRecipients } from '../letters/find-recipients.ts';
import type { FoundEarlier } from '../models/earlier-letters.ts';
import { groupBy } from '../models/group-by.ts';
import type { FoundBatch } from '../models/letter-batches.ts';
import type { HeldSettings } from '../models/letter-settings.ts';
import type { HeldTemplate } from '../models/letter-templates.ts';
import type { FoundLetter } from '../models/letters.ts';
import type { Actor } from '../policies/actor.ts';
import { isHiddenFrom } from '../policies/is-hidden-from.ts';

/** What leaves the server of the settings of letters. */
export function presentLetterSettings(held: HeldSettings): HeldLetterSettings {
  const { version, settings, by, at } = held;
  return heldLetterSettingsSchema.parse({ version, settings, by, at: at?.toISOString() ?? null });
}

/** What leaves the server of a template. */
export function presentTemplate({ kind, version, subject, body, by, at }: HeldTemplate): Template {
  return templateSchema.parse({ kind, version, subject, body, by, at: at?.toISOString() ?? null });
}

function presentHad(earlier: readonly FoundEarlier[] = []): EarlierLetter[] {
  return earlier.map(({ batchNumber, sentAt, buildings }) => ({
    ...{ batchNumber, sentAt: sentAt?.toISOString() ?? null, buildings: [...buildings] },
  }));
}

/** Who would get a letter, and why, and who had it already. */
export function presentRecipients(
  found: FoundRecipients,
  runNumber: number | null,
  earlier: readonly FoundEarlier[],
): Recipients {
  const had = groupBy(earlier, ({ partyId }) => partyId);
  const getting = found.recipients.filter(({ leftOut }) => leftOut === null);
  const byPost = getting.filter(({ party }) => addresseeOf(party).channel === 'post').length;
  return recipientsSchema.parse({
    letters: getting.length,
    byMail: getting.length - byPost,
    byPost,
    runNumber,
    without: found.without,
    recipients: found.recipients.map(({ party, reasons, leftOut }) => ({
      partyId: party.partyId,
      name: addresseeOf(party).name,
      channel: addresseeOf(party).channel,
      reasons,
      leftOut,
      earlier: presentHad(had.get(party.partyId)),
    })),
  });
}

/** What leaves the server of a batch. */
export function presentBatch(batch: FoundBatch): Batch {
  const { preparedAt, checkedAt, sentAt, printedAt, deliveries, ...others } = batch;
  return batchSchema.parse({
    ...others,
    preparedAt: preparedAt.toISOString(),
    checkedAt: checkedAt?.toISOString() ?? null,
    sentAt: sentAt?.toISOString() ?? null,
    printedAt: printedAt?.toISOString() ?? null,
    deliveries: sentAt === null ? null : deliveries,
  });
}

/** Where a letter stands, as lists and the whole letter tell it. */
function standingOf(letter: FoundLetter) {
  const { id, number, name, channel, delivery, serverWords, answerBy } = letter;
  return {
    ...{ id, number, name, channel, delivery, serverWords, answerBy },
    acknowledgedAt: letter.acknowledgedAt?.toISOString() ?? null,
    remindedAt: letter.remindedAt?.toISOString() ?? null,
  };
}

/** What leaves the server of a letter in a list. */
export function presentListedLetter(letter: FoundLetter, actor: Actor): ListedLetter {
  const { batchId, batchNumber, kind } = letter;
  // words of a mail server name the address
  const hidden = isHiddenFrom(actor, letter.isErased) ? { name: '', serverWords: null } : {};
  return listedLetterSchema.parse({
    ...standingOf(letter),
    ...hidden,
    ...{ batchId, batchNumber, kind },
  });
}

/** Which letters of a batch go to somebody who had one like it. */
export function presentEarlier(
  letters: readonly FoundLetter[],
  earlier: readonly FoundEarlier[],
): BatchDetail['earlier'] {
  const had = groupBy(earlier, ({ partyId }) => partyId);
  return letters
    .filter(({ partyId }) => had.has(partyId))
    .map(({ id, partyId }) => ({ letterId: id, had: presentHad(had.get(partyId)) }));
}

/** What leaves the server of a letter, whole; null where the caller may not see it any more. */
export function presentLetter(letter: FoundLetter, actor: Actor): Letter | null {
  if (isHiddenFrom(actor, letter.isErased)) return null;
  const { address, email, subject, parts, reasons } = letter;
  const written = { address, email, subject, parts, reasons };
  return letterSchema.parse({ ...standingOf(letter), ...written });
}
