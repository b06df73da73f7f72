import type { Sequelize } from 'sequelize';
import type { ImportAnswer, ImportOptions } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { WGS84 } from '../importers/named-crs.ts';
import type { Upload } from '../importers/upload.ts';
import { findExtent } from '../models/find-extent.ts';
import { findRememberedOptions } from '../models/remembered-options.ts';
import type { RegisterImport, SaidPlace } from '../models/register-import.ts';
import { Scheme } from '../models/scheme.ts';
import { axesOrder } from './axes-order.ts';
import { findPlace } from './find-place.ts';
import { guessColumns } from './guess-columns.ts';

/** What is chosen before anybody has chosen. */
export const NO_OPTIONS: ImportOptions = {
  place: { crs: null, exchangeAxes: false, shift: [0, 0] },
  columns: {},
  prefix: 'B-',
  mend: false,
  settle: { others: 'ask', rows: {} },
};

type Reading = {
  readonly columns: ImportAnswer['columns'];
  readonly points: readonly (readonly [number, number])[];
};

type Begun = Pick<RegisterImport, 'options' | 'said' | 'remembered'>;

async function place(
  database: Sequelize,
  scheme: Scheme,
  said: SaidPlace,
  remembered: ImportOptions['place'] | undefined,
  points: Reading['points'],
): Promise<{ place: ImportOptions['place']; axes: string | null }> {
  const crs = said.crs ?? remembered?.crs ?? null;
  if (crs === null) return { place: NO_OPTIONS.place, axes: null };
  // the shift that a person stated belongs to the system it was stated for
  const shift = remembered?.crs === crs ? remembered.shift : NO_OPTIONS.place.shift;
  const around = (await findExtent(database, scheme.id))?.bounds;
  const { isExchanged, words } = await axesOrder(points, crs, scheme.crs, around);
  return { place: { crs, exchangeAxes: isExchanged, shift }, axes: words };
}

/**
 * The options that a file begins with: its columns as the scheme's last file with the same columns had
 * them, or guessed by their names; its system as it says, or as the last one was said to be.
 */
export async function firstOptions(
  database: Sequelize,
  schemeId: string,
  upload: Pick<Upload, 'kind' | 'crs' | 'notes'>,
  { columns, points }: Reading,
): Promise<Begun> {
  const scheme = await Scheme.findByPk(schemeId);
  if (scheme === null) throw new AppError('not-found');
  const names = columns.map(({ name }) => name);
  const found = await findRememberedOptions(database, schemeId, upload.kind, names);
  const remembered = found && { at: found.at.toISOString(), fileName: found.fileName };
  const said = await findPlace(upload.crs, upload.crs === WGS84, upload.notes);
  const mapped = found?.options.columns ?? guessColumns(columns);
  const kept = { ...NO_OPTIONS, ...found?.options, columns: mapped, settle: NO_OPTIONS.settle };
  const begun = { remembered: remembered ?? null };
  if (upload.kind === 'values') {
    return { ...begun, options: { ...kept, place: NO_OPTIONS.place }, said: null };
  }
  const lies = await place(database, scheme, said, found?.options.place, points);
  return {
    ...begun,
    options: { ...kept, place: lies.place },
    said: { ...said, axes: lies.axes },
  };
}
