import { BUILDING_FIELDS, type BuildingFieldFacts } from './building-fields.ts';
import type { RegisterColumn } from './register.ts';
import { RESULT_COLUMNS } from './result-columns.ts';
import { STANDING_COLUMNS } from './standing-columns.ts';

/**
 * How each column of the register is called and written.
 *
 * Units: in `unit`. Valid: read only. Source: [own].
 */
export const COLUMN_FACTS: Readonly<Record<RegisterColumn, BuildingFieldFacts>> = {
  reference: { label: 'Reference', kind: 'text' },
  area: { label: 'Area in plan', kind: 'number', unit: 'm²' },
  ...RESULT_COLUMNS,
  ...STANDING_COLUMNS,
  ...BUILDING_FIELDS,
};
