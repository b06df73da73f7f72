import { CATEGORIES } from '../../../shared/damage/categories.ts';
import type { RegisterField } from '../../../shared/schemas/register.ts';
import { isBesideColumn } from '../../../shared/schemas/standing-columns.ts';

/** One value of a field as a filter names it; null where there is none. */
export function choiceWords(field: RegisterField, value: string | null): string {
  if (value === null) return isBesideColumn(field) ? 'none' : 'not known';
  if (!field.startsWith('category')) return value;
  const row = CATEGORIES.find(({ category }) => category === Number(value));
  return row === undefined ? value : `${row.label} ${row.name}`;
}
