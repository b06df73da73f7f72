import type { Transaction } from 'sequelize';
import type { LinkPurpose } from '../../shared/schemas/links.ts';
import { SingleUseLink } from '../models/single-use-link.ts';

/** Ends the links of a person that were never used: of one purpose, or all. */
export async function endLinks(
  personId: string,
  transaction: Transaction,
  purpose?: LinkPurpose,
): Promise<void> {
  await SingleUseLink.update(
    { usedAt: new Date() },
    { where: { personId, usedAt: null, ...(purpose && { purpose }) }, transaction },
  );
}
