import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { MeasureValues } from '../../shared/schemas/measures.ts';
import { AppError } from '../errors.ts';
import {
  countInRegister,
  findMeasures,
  insertMeasure,
  updateMeasure,
  type FoundMeasure,
} from '../models/measures.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

type Tools = Pick<Services, 'database'>;

/** What of a measure the trail keeps: its values, buildings by number. */
function told({ kind, title, detail, state, responsible, due, limit, ...rest }: MeasureValues) {
  return { kind, title, detail, state, responsible, due, limit, buildings: rest.buildings };
}

async function requireBuildings(
  { database }: Tools,
  { id }: Scheme,
  { buildings }: MeasureValues,
  transaction: Transaction,
): Promise<void> {
  const wanted = [...new Set(buildings)];
  if ((await countInRegister(database, id, wanted, transaction)) === wanted.length) return;
  const message = 'One of these buildings is not in the register.';
  throw new AppError('invalid-input', undefined, [{ path: 'buildings', message }]);
}

async function read({ database }: Tools, scheme: Scheme, id: string, transaction: Transaction) {
  const [found] = await findMeasures(database, scheme.id, { id }, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** Adds a protective measure to the register of measures. */
export async function addMeasure(
  services: Tools,
  by: Actor,
  scheme: Scheme,
  values: MeasureValues,
): Promise<FoundMeasure> {
  const { database } = services;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await requireBuildings(services, scheme, values, transaction);
    const id = randomUUID();
    await insertMeasure(database, { id, schemeId: scheme.id, by: by.id }, values, transaction);
    const subject = { kind: 'measure', id };
    const change = { by, schemeId: scheme.id, action: 'add measure', subject, after: told(values) };
    await recordChange(change, transaction);
    return read(services, scheme, id, transaction);
  });
}

/** Changes a protective measure, unless somebody else has changed it since it was seen. */
export async function changeMeasure(
  services: Tools,
  by: Actor,
  scheme: Scheme,
  asked: { readonly id: string; readonly version: number; readonly values: MeasureValues },
): Promise<FoundMeasure> {
  const { database } = services;
  const { id, version, values } = asked;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { buildings, ...kept } = await read(services, scheme, id, transaction);
    if (kept.version !== version) throw new AppError('conflict');
    await requireBuildings(services, scheme, values, transaction);
    await updateMeasure(database, { id, schemeId: scheme.id }, values, transaction);
    const before = told({ ...kept, buildings: buildings.map((one) => one.id) });
    const subject = { kind: 'measure', id };
    await recordChange(
      { by, schemeId: scheme.id, action: 'change measure', subject, before, after: told(values) },
      transaction,
    );
    return read(services, scheme, id, transaction);
  });
}
