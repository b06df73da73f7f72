import { Op } from 'sequelize';
import { linkTokenHash } from '../authentication/link-token.ts';
import { AppError } from '../errors.ts';
import { Person } from './person.ts';
import { SingleUseLink } from './single-use-link.ts';

/** A link that can still be used, and whose it is; an unknown one answers like a used one. */
export async function findOpenLink(
  token: string,
): Promise<{ link: SingleUseLink; person: Person }> {
  const link = await SingleUseLink.findOne({
    where: {
      tokenHash: linkTokenHash(token),
      usedAt: null,
      expiresAt: { [Op.gt]: new Date() },
    },
  });
  const person = link && (await Person.findByPk(link.personId));
  if (!link || person?.shutOutAt !== null) throw new AppError('link-spent');
  return { link, person };
}
