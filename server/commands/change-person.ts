import { Op, type Transaction } from 'sequelize';
import type { z } from 'zod';
import type { changePersonSchema } from '../../shared/schemas/people.ts';
import { AppError } from '../errors.ts';
import { Person } from '../models/person.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

/** Refuses to leave nobody who can give roles. The lock makes two who remove each other take turns. */
async function requireAnotherAdministrator(
  person: Person,
  transaction: Transaction,
): Promise<void> {
  const administrators = await Person.findAll({
    where: { isAdministrator: true, passwordHash: { [Op.ne]: null } },
    order: ['id'],
    lock: transaction.LOCK.NO_KEY_UPDATE,
    transaction,
  });
  if (administrators.some(({ id }) => id !== person.id)) return;
  throw new AppError('conflict', 'Nobody else is administrator. Make somebody one first.');
}

/** Changes a person's name or takes and gives the administrator's rights, which acts at once. */
export async function changePerson(
  { database }: Services,
  by: Actor,
  personId: string,
  { name, isAdministrator }: z.infer<typeof changePersonSchema>,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const person = await Person.findByPk(personId, { transaction });
    if (person === null) throw new AppError('not-found');
    if (person.isAdministrator && isAdministrator === false) {
      await requireAnotherAdministrator(person, transaction);
    }
    await person.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE });
    const before = { name: person.name, isAdministrator: person.isAdministrator };
    const after = {
      name: name ?? before.name,
      isAdministrator: isAdministrator ?? before.isAdministrator,
    };
    await person.update(after, { transaction });
    const subject = { kind: 'person', id: person.id };
    await recordChange({ by, action: 'change person', subject, before, after }, transaction);
  });
}
