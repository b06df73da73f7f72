import { UniqueConstraintError } from 'sequelize';
import type { NewAppointment } from '../../shared/schemas/appointments.ts';
import { AppError } from '../errors.ts';
import {
  findAppointments,
  hasInterest,
  insertAppointment,
  type FoundAppointment,
} from '../models/appointments.ts';
import { heldSettings } from '../models/letter-settings.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import {
  readAppointment,
  requireToCome,
  requireWorkingDay,
  tellOfAppointment,
} from './kept-appointment.ts';
import { lockScheme } from './lock-scheme.ts';

function taken(): AppError {
  return new AppError('already-exists', 'Another appointment is kept under this number already.');
}

function isSame(found: FoundAppointment, asked: NewAppointment): boolean {
  const { building, party, purpose, startsAt, minutes, place } = found;
  return (
    building.id === asked.buildingId &&
    party.id === asked.partyId &&
    purpose === asked.purpose &&
    startsAt.getTime() === new Date(asked.startsAt).getTime() &&
    minutes === asked.minutes &&
    place === asked.place
  );
}

/**
 * Offers an appointment to a party at a building of theirs, by mail too. The same one sent again is offered
 * once; tells whether it was offered now.
 */
export async function offerAppointment(
  services: Services,
  by: Actor,
  scheme: Scheme,
  asked: NewAppointment,
): Promise<{ appointment: FoundAppointment; isNew: boolean }> {
  const { database } = services;
  const which = { id: asked.id };
  try {
    return await database.transaction(async (transaction) => {
      await lockScheme(scheme, transaction);
      const [same] = await findAppointments(database, scheme.id, which, transaction);
      if (same !== undefined) {
        if (!isSame(same, asked)) throw taken();
        return { appointment: same, isNew: false };
      }
      requireToCome(asked.startsAt);
      const { settings } = await heldSettings(database, scheme, transaction);
      requireWorkingDay(asked, settings);
      if (!(await hasInterest(database, scheme.id, asked, transaction))) {
        const message = 'Choose somebody who has a part in this building.';
        throw new AppError('invalid-input', undefined, [{ path: 'partyId', message }]);
      }
      const offered = { ...asked, schemeId: scheme.id, by: by.id };
      await insertAppointment(database, offered, transaction);
      const after = await readAppointment(database, scheme.id, which, transaction);
      const { timeZone } = settings;
      const told = { action: 'offer appointment', after, news: 'offered', timeZone } as const;
      await tellOfAppointment(services, by, scheme, told, transaction);
      return { appointment: after, isNew: true };
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw taken();
    throw error;
  }
}
