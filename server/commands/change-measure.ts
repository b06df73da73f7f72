import type { MeasureValues } from '../../shared/schemas/measures.ts';
import { AppError } from '../errors.ts';
import { updateMeasure, type FoundMeasure } from '../models/measures.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readMeasure, requireInRegister, toldOfMeasure } from './kept-measure.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Changes a protective measure, unless somebody else has changed it since it was seen. */
export async function changeMeasure(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: { readonly id: string; readonly version: number; readonly values: MeasureValues },
): Promise<FoundMeasure> {
  const { id, version, values } = asked;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { buildings, ...kept } = await readMeasure(database, scheme.id, id, transaction);
    if (kept.version !== version) throw new AppError('conflict');
    await requireInRegister(database, scheme.id, values, transaction);
    await updateMeasure(database, { id, schemeId: scheme.id }, values, transaction);
    const before = toldOfMeasure({ ...kept, buildings: buildings.map((one) => one.id) });
    const subject = { kind: 'measure', id };
    await recordChange(
      {
        by,
        schemeId: scheme.id,
        action: 'change measure',
        subject,
        before,
        after: toldOfMeasure(values),
      },
      transaction,
    );
    return readMeasure(database, scheme.id, id, transaction);
  });
}
