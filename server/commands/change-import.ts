import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { AppError, type FieldFault } from '../errors.ts';
import { axesOrder, wereExchanged } from '../imports/axes-order.ts';
import { placementOf } from '../imports/placement.ts';
import { createPointSample } from '../imports/point-sample.ts';
import { findExtent } from '../models/find-extent.ts';
import { RegisterImport } from '../models/register-import.ts';
import type { Scheme } from '../models/scheme.ts';
import { deleteStagedRows, findFirstCorners } from '../models/staged-rows.ts';
import type { Services } from '../services.ts';

type Chosen = Pick<RegisterImport, 'options' | 'said'>;

/** Columns that the file does not have. */
function columnFaults({ columns }: RegisterImport, options: ImportOptions): FieldFault[] {
  const names = new Set(columns.map(({ name }) => name));
  return Object.entries(options.columns)
    .filter(([, column]) => !names.has(column))
    .map(([field]) => ({
      path: `options.columns.${field}`,
      message: 'The file has no such column.',
    }));
}

/** Reads another layer of the file, with columns and a place of its own. */
async function readOther(
  { database, jobs }: Services,
  row: RegisterImport,
  version: number,
  layer: string,
): Promise<void> {
  const { id, schemeId, file, layers } = row;
  if (file === null || !layers.includes(layer)) {
    const message = 'The file has no such layer, or is not kept any more. Send it again.';
    throw new AppError('invalid-input', undefined, [{ path: 'options.layer', message }]);
  }
  const anew = { version: version + 1, state: 'reading', fault: null, done: 0, of: null } as const;
  const nothing = { columns: [], counts: null, bounds: null, place: null, missing: [] };
  const where = { id, version, state: ['asking', 'checking'] };
  const [changed] = await RegisterImport.update({ ...anew, ...nothing }, { where });
  if (changed !== 1) throw new AppError('conflict');
  await jobs.stop(id);
  await deleteStagedRows(database, id, { keepNoted: false });
  jobs.start({ kind: 'read', importId: id, schemeId, file, layer });
  await row.reload();
}

async function refuseWrong(row: RegisterImport, scheme: Scheme, options: ImportOptions) {
  const faults = columnFaults(row, options);
  if (faults.length > 0) throw new AppError('invalid-input', undefined, faults);
  const { crs } = options.place;
  if (crs !== null) await placementOf({ ...options.place, crs }, scheme.crs);
}

/** Whether somebody has said otherwise than was found of the order of the axes. */
function isOwnOrder({ options, said }: RegisterImport, { place }: ImportOptions): boolean {
  const { exchangeAxes } = options.place;
  const found = said !== null && wereExchanged(said);
  return place.exchangeAxes !== exchangeAxes || exchangeAxes !== found;
}

/** What was chosen; with another system the order of the axes that fits it, unless it was chosen too. */
async function withAxes(
  { database }: Services,
  scheme: Scheme,
  row: RegisterImport,
  options: ImportOptions,
): Promise<Chosen> {
  const { said } = row;
  const { crs } = options.place;
  if (said === null || crs === null || crs === row.options.place.crs) return { options, said };
  if (isOwnOrder(row, options)) {
    // nothing that was found of one system holds for another
    return { options, said: options.place.exchangeAxes ? { ...said, axes: null } : said };
  }
  const sample = createPointSample();
  for (const corner of await findFirstCorners(database, row.id)) sample.add(corner);
  const around = (await findExtent(database, scheme.id))?.bounds;
  const { isExchanged, words } = await axesOrder(sample.points(), crs, scheme.crs, around);
  const place = { ...options.place, exchangeAxes: isExchanged };
  return { options: { ...options, place }, said: { ...said, axes: words } };
}

/**
 * Chooses anew for an import, which is checked again, and read again where another layer is wanted; a check
 * of what was chosen before stops.
 */
export async function changeImport(
  services: Services,
  scheme: Scheme,
  row: RegisterImport,
  { version, options }: { readonly version: number; readonly options: ImportOptions },
): Promise<void> {
  if (options.layer !== undefined && options.layer !== row.layer) {
    await readOther(services, row, version, options.layer);
    return;
  }
  await refuseWrong(row, scheme, options);
  const { jobs } = services;
  const chosen = await withAxes(services, scheme, row, options);
  const [changed] = await RegisterImport.update(
    { ...chosen, version: version + 1, state: 'checking', fault: null, done: 0 },
    { where: { id: row.id, version, state: ['asking', 'checking'] } },
  );
  if (changed !== 1) throw new AppError('conflict');
  await jobs.stop(row.id);
  jobs.start({ kind: 'check', importId: row.id, schemeId: scheme.id });
  await row.reload();
}
