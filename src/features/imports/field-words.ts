import { BUILDING_FIELDS, type BuildingField } from '../../../shared/schemas/building-fields.ts';
import type {
  IMPORT_FIELDS,
  ImportAnswer,
  ImportOptions,
} from '../../../shared/schemas/imports.ts';

export type ImportField = (typeof IMPORT_FIELDS)[number];

type FileColumn = ImportAnswer['columns'][number];

function isBuildingField(field: string): field is BuildingField {
  return Object.hasOwn(BUILDING_FIELDS, field);
}

function unitOf(field: string): string | undefined {
  if (!isBuildingField(field)) return undefined;
  const facts = BUILDING_FIELDS[field];
  return 'unit' in facts ? facts.unit : undefined;
}

/** What a field of the register is called, with its unit. */
export function fieldWords(field: string): { readonly label: string; readonly unit?: string } {
  if (field === 'reference') return { label: 'Reference' };
  if (field === 'footprint') return { label: 'Footprint' };
  if (field === 'area') return { label: 'Area', unit: 'm²' };
  if (!isBuildingField(field)) return { label: field };
  const unit = unitOf(field);
  const { label } = BUILDING_FIELDS[field];
  return unit === undefined ? { label } : { label, unit };
}

/** The columns of a file that fill nothing. */
export function unusedColumns(
  columns: readonly FileColumn[],
  chosen: ImportOptions['columns'],
): readonly FileColumn[] {
  const used = new Set(Object.values(chosen));
  return columns.filter(({ name }) => !used.has(name));
}

/** The columns with one field filled by another column, or by none. */
export function withColumn(
  chosen: ImportOptions['columns'],
  field: ImportField,
  column: string,
): ImportOptions['columns'] {
  const others = Object.entries(chosen).filter(([name]) => name !== field);
  return Object.fromEntries(column === '' ? others : [...others, [field, column]]);
}
