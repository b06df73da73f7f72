import type { Transaction } from 'sequelize';
import type { LinkPurpose } from '../../shared/schemas/links.ts';
import { linkTokenHash, newLinkToken } from '../authentication/link-token.ts';
import type { Env } from '../env.ts';
import { SingleUseLink } from '../models/single-use-link.ts';
import { endLinks } from './end-links.ts';

const HOUR = 60 * 60 * 1000;
const LIFETIMES: Readonly<Record<LinkPurpose, number>> = {
  invitation: 7 * 24 * HOUR,
  'password-reset': HOUR,
};

/** A link as it goes into a letter; its address is kept nowhere else. */
export type IssuedLink = { readonly id: string; readonly url: string; readonly until: Date };

/** Makes a link that sets a person's password once; older ones of the same purpose end. */
export async function issueLink(
  { PUBLIC_URL }: Pick<Env, 'PUBLIC_URL'>,
  personId: string,
  purpose: LinkPurpose,
  transaction: Transaction,
): Promise<IssuedLink> {
  await endLinks(personId, transaction, purpose);
  const token = newLinkToken();
  const link = await SingleUseLink.create(
    {
      personId,
      purpose,
      tokenHash: linkTokenHash(token),
      expiresAt: new Date(Date.now() + LIFETIMES[purpose]),
    },
    { transaction },
  );
  const url = new URL(`/links/${token}`, PUBLIC_URL).href;
  return { id: link.id, url, until: link.expiresAt };
}
