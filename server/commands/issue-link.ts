import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { LinkPurpose } from '../../shared/schemas/links.ts';
import { linkAddress } from '../authentication/link-token.ts';
import type { Env } from '../env.ts';
import { SingleUseLink } from '../models/single-use-link.ts';
import { endLinks } from './end-links.ts';

const HOUR = 60 * 60 * 1000;
const LIFETIMES: Readonly<Record<LinkPurpose, number>> = {
  invitation: 7 * 24 * HOUR,
  'password-reset': HOUR,
};

/** A link as it is given out; its address is kept nowhere. */
export type IssuedLink = { readonly id: string; readonly url: string; readonly until: Date };

/** Makes a link that sets a person's password once; older ones of the same purpose end. */
export async function issueLink(
  env: Pick<Env, 'PUBLIC_URL' | 'SESSION_SECRET'>,
  personId: string,
  purpose: LinkPurpose,
  transaction: Transaction,
  lifetime = LIFETIMES[purpose],
): Promise<IssuedLink> {
  await endLinks(personId, transaction, purpose);
  const id = randomUUID();
  const { url, tokenHash } = linkAddress(env, id);
  const expiresAt = new Date(Date.now() + lifetime);
  await SingleUseLink.create({ id, personId, purpose, tokenHash, expiresAt }, { transaction });
  return { id, url, until: expiresAt };
}
