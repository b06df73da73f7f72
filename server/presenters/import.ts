import type { z } from 'zod';
import type { ImportAnswer, importListSchema } from '../../shared/schemas/imports.ts';
import type { RegisterImport } from '../models/register-import.ts';

/** What leaves the server of an import, with the name of who sent it. */
export function presentImport(row: RegisterImport, by: string | null): ImportAnswer {
  return {
    id: row.id,
    version: row.version,
    state: row.state,
    fileName: row.fileName,
    format: row.format,
    kind: row.kind,
    layer: row.layer,
    layers: row.file === null ? [] : row.layers,
    by,
    at: row.at.toISOString(),
    progress: { done: row.done, of: row.of },
    columns: row.columns,
    options: row.options,
    remembered: row.remembered,
    place: row.place,
    missing: row.missing,
    counts: row.counts,
    bounds: row.bounds,
    fault: row.fault,
    changeId: row.changeId,
  };
}

/** An import in the list of its scheme's. */
export function presentListedImport(
  row: RegisterImport,
  by: string | null,
): z.infer<typeof importListSchema>[number] {
  const { id, state, fileName, at, counts } = row;
  return { id, state, fileName, by, at: at.toISOString(), counts };
}
