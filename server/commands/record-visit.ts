import { createHash } from 'node:crypto';
import { Op, UniqueConstraintError, type Transaction } from 'sequelize';
import type { BuildingAttributes } from '../../shared/schemas/building-fields.ts';
import type { NewVisit } from '../../shared/schemas/visits.ts';
import { AppError } from '../errors.ts';
import { Building } from '../models/building.ts';
import type { Scheme } from '../models/scheme.ts';
import { VisitPhotograph } from '../models/visit-photograph.ts';
import { Visit } from '../models/visit.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

type Recorded = NewVisit & { readonly buildingId: number };

function fingerprintOf(by: Actor, scheme: Scheme, visit: Recorded): string {
  const sent = JSON.stringify([scheme.id, by.id, visit]);
  return createHash('sha256').update(sent).digest('hex');
}

function otherContent(): AppError {
  return new AppError('already-exists', 'Another visit is recorded under this number already.');
}

/** Whether the same visit is recorded already; another one under its number is refused. */
async function isRecorded(id: string, fingerprint: string, transaction: Transaction) {
  const recorded = await Visit.findByPk(id, { transaction });
  if (recorded === null) return false;
  if (recorded.fingerprint !== fingerprint) throw otherContent();
  return true;
}

/** What the visit makes of the register: what it puts right, and that the building was inspected. */
async function valuesOf(visit: Recorded, transaction: Transaction): Promise<BuildingAttributes> {
  const { buildingId, visitedAt, part, changes } = visit;
  const later = { buildingId, visitedAt: { [Op.gt]: new Date(visitedAt) } };
  const isNewest = (await Visit.count({ where: later, transaction })) === 0;
  // the day where the building stands, as the phone wrote it
  const inspected = `${visitedAt.slice(0, 10)}, ${part}`;
  return { ...changes?.values, ...(isNewest && { inspected }) };
}

async function changeByVisit(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  visit: Recorded,
  transaction: Transaction,
): Promise<string | null> {
  const where = { id: visit.buildingId, schemeId: scheme.id };
  const building = await Building.findOne({ where, transaction, rejectOnEmpty: true });
  // of a building that was taken out there is nothing to put right
  if (building.removedAt !== null && visit.changes === null) return null;
  const attributes = await valuesOf(visit, transaction);
  if (Object.keys(attributes).length === 0) return null;
  const version = visit.changes?.version ?? building.version;
  const changed = [{ id: building.id, version, attributes }];
  const cause = { kind: 'visit', by } as const;
  return (await changeRegister(database, scheme, cause, { changed }, transaction)).changeId;
}

function photographsOf({ id, photographs }: Recorded) {
  return photographs.map(({ place, takenAt, ...photograph }, number) => ({
    ...photograph,
    visitId: id,
    number,
    takenAt: takenAt === null ? null : new Date(takenAt),
    longitude: place?.[0] ?? null,
    latitude: place?.[1] ?? null,
  }));
}

async function write(
  by: Actor,
  scheme: Scheme,
  visit: Recorded,
  kept: { readonly fingerprint: string; readonly changeId: string | null },
  transaction: Transaction,
): Promise<void> {
  const { id, buildingId, visitedAt, part, condition, construction, notes, defects } = visit;
  await Visit.create(
    {
      ...{ id, buildingId, part, condition, construction, notes, defects, ...kept },
      schemeId: scheme.id,
      visitedAt: new Date(visitedAt),
      visitedBy: by.id,
    },
    { transaction },
  );
  await VisitPhotograph.bulkCreate(photographsOf(visit), { transaction });
  const told = { defects: defects.length, photographs: visit.photographs.length };
  const after = { building: buildingId, visitedAt, part, ...told, registerChange: kept.changeId };
  const subject = { kind: 'visit', id };
  await recordChange(
    { by, schemeId: scheme.id, action: 'record visit', subject, after },
    transaction,
  );
}

/**
 * Records a visit with what it puts right in the register, all of it or nothing. The same visit sent again is
 * recorded once; tells whether it was recorded now.
 */
export async function recordVisit(
  services: Services,
  by: Actor,
  scheme: Scheme,
  visit: Recorded,
): Promise<boolean> {
  const fingerprint = fingerprintOf(by, scheme, visit);
  try {
    return await services.database.transaction(async (transaction) => {
      await lockScheme(scheme, transaction);
      if (await isRecorded(visit.id, fingerprint, transaction)) return false;
      const changeId = await changeByVisit(services, by, scheme, visit, transaction);
      await write(by, scheme, visit, { fingerprint, changeId }, transaction);
      return true;
    });
  } catch (error) {
    // a photograph that another visit told of, or a visit of another scheme at the same time
    if (error instanceof UniqueConstraintError) throw otherContent();
    throw error;
  }
}
