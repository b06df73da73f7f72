import { AppError } from '../../errors.ts';
import { dayInWords } from '../../mail/letters/day-in-words.ts';
import { ownerHomeUrl } from '../../mail/letters/owner-home-url.ts';
import { heldSettings } from '../../models/letter-settings.ts';
import { findLetters, type FoundLetter } from '../../models/letters.ts';
import { Scheme } from '../../models/scheme.ts';
import type { Services } from '../../services.ts';
import type { LettersMaterial } from './letter-material.ts';

type Drawing = Pick<Services, 'database' | 'env' | 'runs'>;

/** Letters as a PDF, drawn beside the event loop. */
export async function lettersPdf(
  { database, env, runs }: Drawing,
  schemeId: string,
  letters: readonly FoundLetter[],
  hasManifest: boolean,
): Promise<Uint8Array> {
  const scheme = await Scheme.findByPk(schemeId, { rejectOnEmpty: true });
  const { settings } = await heldSettings(database, scheme);
  const { name, address, email, phone } = settings.contact;
  const material: LettersMaterial = {
    schemeName: scheme.name,
    sender: [name, ...address, email, phone].filter((line) => line !== ''),
    day: dayInWords(letters[0]?.sentAt ?? new Date(), settings.timeZone),
    page: ownerHomeUrl(env.PUBLIC_URL, schemeId),
    letters: letters.map((letter) => ({
      mark: `${letter.batchNumber}-${letter.number}`,
      ...{ name: letter.name, address: letter.address },
      ...{ subject: letter.subject, parts: letter.parts },
    })),
    hasManifest,
  };
  return runs.compute({ kind: 'letters', material });
}

/** One letter as a PDF. */
export async function letterPdf(
  tools: Drawing,
  { schemeId, letterId }: { readonly schemeId: string; readonly letterId: string },
): Promise<Uint8Array> {
  const letters = await findLetters(tools.database, schemeId, { letterId });
  if (letters.length === 0) throw new AppError('not-found');
  return lettersPdf(tools, schemeId, letters, false);
}
