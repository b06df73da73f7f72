import type { Sequelize, Transaction } from 'sequelize';
import type { MeasureValues } from '../../shared/schemas/measures.ts';
import { AppError } from '../errors.ts';
import { countInRegister, findMeasures, type FoundMeasure } from '../models/measures.ts';

/** What of a measure the trail keeps: its values, buildings by number. */
export function toldOfMeasure(values: MeasureValues): object {
  const { kind, title, detail, state, responsible, due, limit, buildings } = values;
  return { kind, title, detail, state, responsible, due, limit, buildings };
}

/** Refuses buildings that are not in the register of the scheme. */
export async function requireInRegister(
  database: Sequelize,
  schemeId: string,
  { buildings }: MeasureValues,
  transaction: Transaction,
): Promise<void> {
  const wanted = [...new Set(buildings)];
  const found = await countInRegister(database, schemeId, wanted, transaction);
  if (found === wanted.length) return;
  const message = 'One of these buildings is not in the register.';
  throw new AppError('invalid-input', undefined, [{ path: 'buildings', message }]);
}

/** A measure of a scheme; of another scheme it is not there. */
export async function readMeasure(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction,
): Promise<FoundMeasure> {
  const [found] = await findMeasures(database, schemeId, { id }, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}
