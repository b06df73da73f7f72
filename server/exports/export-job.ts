import type { RegisterColumn } from '../../shared/schemas/register.ts';
import { BUILDING_FIELDS, type BuildingValue } from '../../shared/schemas/building-fields.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';

/** A building on its way out; lonLat only where a format draws it. */
export type ExportedBuilding = {
  readonly building: ListedBuilding;
  readonly lonLat: FootprintRings | undefined;
};

/** What is exported: which columns, the buildings one after the other, and what is said about them. */
export type ExportJob = {
  readonly columns: readonly RegisterColumn[];
  readonly buildings: AsyncIterable<ExportedBuilding>;
  /** What is said, in pairs: Scheme, date, filter, who. */
  readonly about: readonly (readonly [label: string, words: string])[];
};

const REFERENCE = { label: 'Reference', kind: 'text' } as const;
const AREA = { label: 'Area', kind: 'number', unit: 'm²' } as const;

function factsOf(column: RegisterColumn): {
  readonly label: string;
  readonly kind: 'text' | 'number' | 'whole';
  readonly unit?: string;
} {
  if (column === 'reference') return REFERENCE;
  return column === 'area' ? AREA : BUILDING_FIELDS[column];
}

/** What stands over a column, with its unit. */
export function headingOf(column: RegisterColumn): string {
  const { label, unit } = factsOf(column);
  return unit === undefined ? label : `${label} (${unit})`;
}

/** Whether a column holds texts, whole numbers or others. */
export function kindOf(column: RegisterColumn): 'text' | 'number' | 'whole' {
  return factsOf(column).kind;
}

/** The value of a column; an area to the square decimetre. */
export function valueOf(building: ListedBuilding, column: RegisterColumn): BuildingValue {
  return column === 'area' ? Math.round(building.area * 100) / 100 : building[column];
}
