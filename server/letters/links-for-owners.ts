import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import { linkAddress } from '../authentication/link-token.ts';
import { SingleUseLink } from '../models/single-use-link.ts';
import type { OwnerAccount } from '../models/owner-accounts.ts';
import type { Services } from '../services.ts';

/** Letters lie about for a while before they are read. */
const LIFETIME_MS = 60 * 24 * 60 * 60 * 1000;

/**
 * Makes a link that sets a password for everybody who has none yet, in place of their older ones; gives the
 * number of each link by person.
 */
export async function linksForOwners(
  { env }: Pick<Services, 'env'>,
  accounts: readonly OwnerAccount[],
  transaction: Transaction,
): Promise<ReadonlyMap<string, string>> {
  const people = new Set(accounts.filter((one) => !one.canSignIn).map((one) => one.personId));
  const older = {
    personId: { [Op.in]: [...people] },
    purpose: 'invitation' as const,
    usedAt: null,
  };
  await SingleUseLink.update({ usedAt: new Date() }, { where: older, transaction });
  const expiresAt = new Date(Date.now() + LIFETIME_MS);
  const links = [...people].map((personId) => {
    const id = randomUUID();
    const { tokenHash } = linkAddress(env, id);
    return { id, personId, purpose: 'invitation' as const, tokenHash, expiresAt };
  });
  await SingleUseLink.bulkCreate(links, { transaction });
  return new Map(links.map(({ id, personId }) => [personId, id]));
}
