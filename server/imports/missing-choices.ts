import type { ImportAnswer, ImportOptions } from '../../shared/schemas/imports.ts';

/** What has to be chosen before an import can be checked. */
export function missingChoices({
  kind,
  options: { place, columns },
}: {
  readonly kind: ImportAnswer['kind'];
  readonly options: ImportOptions;
}): ImportAnswer['missing'] {
  if (kind === 'footprints') return place.crs === null ? ['crs'] : [];
  const missing: ImportAnswer['missing'] = [];
  if (columns.reference === undefined) missing.push('reference');
  const filled = Object.keys(columns).filter((field) => field !== 'reference');
  if (filled.length === 0) missing.push('columns');
  return missing;
}
