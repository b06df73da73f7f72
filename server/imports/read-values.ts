import {
  BUILDING_FIELD_NAMES,
  BUILDING_TEXT,
  type BuildingField,
  type BuildingValue,
} from '../../shared/schemas/building-fields.ts';
import type { ImportOptions } from '../../shared/schemas/imports.ts';
import type { Properties } from '../importers/source.ts';
import { oneLine, parseValue } from './parse-value.ts';
import { REMARKS } from './remarks.ts';

type Columns = ImportOptions['columns'];

export type ReadValues = {
  /** By field, what the file says; what could not be read is not in it. */
  readonly values: Readonly<Partial<Record<BuildingField, BuildingValue>>>;
  readonly remarks: readonly string[];
};

/** The values of a row's mapped columns. */
export function readValues(properties: Properties, columns: Columns): ReadValues {
  const values: Partial<Record<BuildingField, BuildingValue>> = {};
  const remarks: string[] = [];
  for (const field of BUILDING_FIELD_NAMES) {
    const column = columns[field];
    if (column === undefined) continue;
    const { value, remark } = parseValue(field, column, properties[column] ?? null);
    if (value !== undefined) values[field] = value;
    if (remark !== undefined) remarks.push(remark);
  }
  return { values, remarks };
}

/** The reference in a row, or why it cannot be one. */
export function readReference(
  properties: Properties,
  column: string,
): { readonly reference: string } | { readonly fault: string; readonly reference: string | null } {
  const reference = oneLine(String(properties[column] ?? ''));
  if (reference === '') return { reference: null, fault: REMARKS.noReference };
  if (reference.length <= BUILDING_TEXT.reference) return { reference };
  return { reference: null, fault: REMARKS.longReference };
}
