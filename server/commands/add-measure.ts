import { randomUUID } from 'node:crypto';
import type { MeasureValues } from '../../shared/schemas/measures.ts';
import { insertMeasure, type FoundMeasure } from '../models/measures.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readMeasure, requireInRegister, toldOfMeasure } from './kept-measure.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Adds a protective measure to the register of measures. */
export async function addMeasure(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  values: MeasureValues,
): Promise<FoundMeasure> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await requireInRegister(database, scheme.id, values, transaction);
    const id = randomUUID();
    await insertMeasure(database, { id, schemeId: scheme.id, by: by.id }, values, transaction);
    const subject = { kind: 'measure', id };
    const change = {
      by,
      schemeId: scheme.id,
      action: 'add measure',
      subject,
      after: toldOfMeasure(values),
    };
    await recordChange(change, transaction);
    return readMeasure(database, scheme.id, id, transaction);
  });
}
