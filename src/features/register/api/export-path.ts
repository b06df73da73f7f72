import type { EXPORT_FORMATS, RegisterColumn } from '../../../../shared/schemas/register.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { asQuery, type Which } from './which-buildings.ts';

export type ExportFormat = (typeof EXPORT_FORMATS)[number];

/** The address of a file with what is seen of the register. */
export function exportPath(
  schemeId: string,
  which: Which,
  format: ExportFormat,
  columns: readonly RegisterColumn[],
): string {
  const words = asQuery(which, { format, columns: JSON.stringify(columns) });
  return `${apiPath`/api/schemes/${schemeId}/register/export`}?${words}`;
}
