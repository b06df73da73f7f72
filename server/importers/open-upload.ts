import { readFile, stat } from 'node:fs/promises';
import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { WGS84 } from './named-crs.ts';
import { openSource } from './open-source.ts';
import { pacedRows } from './paced-rows.ts';
import type { Source } from './source.ts';
import { survey, type Survey } from './survey.ts';
import { uploadRow } from './upload-row.ts';
import type { Upload, UploadRow } from './upload.ts';

async function* rowsOf(source: Source): AsyncGenerator<UploadRow> {
  for await (const row of pacedRows(source)) yield uploadRow(source.kind, row);
}

/** GeoJSON that names no system is in degrees by its standard, but often is in metres all the same. */
function judgedCrs(
  { crs, notes }: Source,
  { count, offGlobe }: Survey,
): Pick<Source, 'crs' | 'notes'> {
  if (crs !== WGS84 || offGlobe * 2 < count) return { crs, notes };
  const which =
    offGlobe === count
      ? 'this one'
      : offGlobe * 2 === count
        ? 'half of this one'
        : 'most of this one';
  const note = `GeoJSON without a \`crs\` should be in longitude and latitude, and ${which} is not.`;
  return { crs: null, notes: [...notes, note] };
}

/**
 * Opens a file of buildings by what it holds and looks through it once, so that what is taken can be
 * read to its end; of several layers the one that is wanted. Refuses it with a sentence for people.
 */
export async function openUpload(file: string, layer?: string): Promise<Upload> {
  const { size } = await stat(file);
  if (size > IMPORT_LIMITS.bytes) {
    throw new AppError('too-large', 'The file is larger than 200 MB. Split it into several files.');
  }
  const source = await openSource(await readFile(file), layer);
  const found = await survey(source);
  return {
    format: source.format,
    kind: source.kind,
    layer: source.layer,
    layers: source.layers ?? [],
    ...judgedCrs(source, found),
    columns: found.columns,
    count: found.count,
    rows: () => rowsOf(source),
  };
}
