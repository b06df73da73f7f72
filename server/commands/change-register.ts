import { UniqueConstraintError, type Sequelize, type Transaction } from 'sequelize';
import type { RegisterChange as RegisterChangeAnswer } from '../../shared/schemas/register-changes.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { refreshMarks } from '../decisions/refresh-marks.ts';
import { AppError } from '../errors.ts';
import { groundUnder } from '../ground/ground-under.ts';
import { RegisterChange } from '../models/register-change.ts';
import type { Scheme } from '../models/scheme.ts';
import { ahead } from '../register/ahead.ts';
import { changeBuildings } from '../register/change-buildings.ts';
import { createBuildings, placedBuildings } from '../register/create-buildings.ts';
import type { Editing } from '../register/editing.ts';
import { inBatches } from '../register/in-batches.ts';
import type { RegisterCause, RegisterEdits } from '../register/register-edits.ts';
import { removeBuildings, restoreBuildings } from '../register/remove-buildings.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

async function placeOnMap(scheme: Scheme): Promise<ReturnType<typeof toLonLat>> {
  return toLonLat((await crsOfScheme(scheme)).definition);
}

async function begin(
  database: Sequelize,
  scheme: Scheme,
  { kind, by, source, importId, undoes }: RegisterCause,
  transaction: Transaction,
): Promise<Editing> {
  await lockScheme(scheme, transaction);
  const told = { source: source ?? null, importId: importId ?? null, undoes: undoes ?? null };
  const change = await RegisterChange.create(
    { schemeId: scheme.id, personId: by?.id ?? null, kind, ...told },
    { transaction },
  );
  return {
    database,
    transaction,
    schemeId: scheme.id,
    changeId: change.id,
    kind,
    place: await placeOnMap(scheme),
    groundUnder: groundUnder(scheme, transaction),
  };
}

type Done = { readonly ids: number[]; created: number; changed: number; removed: number };

async function edit(editing: Editing, edits: RegisterEdits): Promise<Done> {
  const done: Done = { ids: [], created: 0, changed: 0, removed: 0 };
  for await (const some of inBatches(edits.removed)) {
    await removeBuildings(editing, some);
    done.removed += some.length;
  }
  for await (const some of ahead(inBatches(edits.changed))) {
    done.ids.push(...(await changeBuildings(editing, some)));
    done.changed += some.length;
  }
  for await (const some of inBatches(edits.restored)) {
    done.ids.push(...(await restoreBuildings(editing, some)));
    done.created += some.length;
  }
  for await (const some of ahead(placedBuildings(editing, inBatches(edits.created)))) {
    done.ids.push(...(await createBuildings(editing, some)));
    done.created += some.length;
  }
  return done;
}

/** Two buildings of one reference: the database finds the second. */
function twice(error: unknown): unknown {
  if (!(error instanceof UniqueConstraintError)) return error;
  const { reference } = error.fields;
  if (typeof reference !== 'string') return error;
  const message = `The reference ${reference} is in the register already.`;
  return new AppError('already-exists', message, [{ path: 'reference', message }]);
}

/**
 * Changes a register in a transaction of the caller's, all of it or nothing: the only way in which a
 * register changes. Locks the scheme, refuses what was changed meanwhile, derives what follows from
 * footprints, keeps the history, moves the register on by one version, marks decisions that rest on what was
 * changed and tells the audit trail.
 */
export async function changeRegister(
  database: Sequelize,
  scheme: Scheme,
  cause: RegisterCause,
  edits: RegisterEdits,
  transaction: Transaction,
): Promise<RegisterChangeAnswer> {
  const editing = await begin(database, scheme, cause, transaction);
  const { ids, ...counts } = await edit(editing, edits).catch((error: unknown) => {
    throw twice(error);
  });
  const version = scheme.registerVersion + 1;
  await scheme.update({ registerVersion: version }, { transaction });
  await refreshMarks(database, scheme, ids, transaction);
  const { changeId } = editing;
  const { kind, source } = cause;
  const after = {
    kind,
    ...counts,
    registerVersion: version,
    ...(source !== undefined && { source }),
  };
  const subject = { kind: 'register', id: changeId };
  await recordChange(
    { by: cause.by, schemeId: scheme.id, action: 'change register', subject, after },
    transaction,
  );
  return { changeId, version, buildingIds: ids };
}
