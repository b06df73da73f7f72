import type { RegisterChange } from '../../shared/schemas/register-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { VersionedBuilding } from '../register/register-edits.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';

/** Takes a building out of the register; its history stays. */
export async function removeBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  building: VersionedBuilding,
): Promise<RegisterChange> {
  const removed = [building];
  return database.transaction((transaction) =>
    changeRegister(database, scheme, { kind: 'remove', by }, { removed }, transaction),
  );
}
