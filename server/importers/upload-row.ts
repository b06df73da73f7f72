import { cleanProperties } from './clean-properties.ts';
import { footprintOf } from './geometry/footprint-of.ts';
import { RowFault } from './geometry/row-fault.ts';
import type { Source, SourceRow } from './source.ts';
import type { UploadRow } from './upload.ts';

/** A row with its footprint, or with the reason why it has none. */
export function uploadRow(kind: Source['kind'], given: SourceRow): UploadRow {
  const { row, geometry, fault } = given;
  const properties = cleanProperties(given.properties);
  if (kind === 'values' || fault !== null) return { row, geometry: null, fault, properties };
  try {
    return { row, geometry: footprintOf(geometry), fault: null, properties };
  } catch (error) {
    if (!(error instanceof RowFault)) throw error;
    return { row, geometry: null, fault: error.message, properties };
  }
}
