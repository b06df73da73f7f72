import type { RUN_EXPORT_FORMATS } from '../../../../shared/schemas/run-export.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The address of a file with all that a run found. */
export function runExportPath(
  schemeId: string,
  runId: string,
  format: (typeof RUN_EXPORT_FORMATS)[number],
): string {
  return `${apiPath`/api/schemes/${schemeId}/runs/${runId}/export`}?format=${format}`;
}
