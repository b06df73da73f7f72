import { REGISTER_COLUMNS, type RegisterColumn } from '../../../shared/schemas/register.ts';

/** The columns that can be chosen; the reference and the building are always there. */
export const CHOOSABLE = REGISTER_COLUMNS.filter((column) => column !== 'reference');

/** What a desk shows before anybody chooses, where a run is complete. */
export const USUAL_RESULTS: readonly RegisterColumn[] = [
  'stage',
  'settlement',
  'category',
  'categoryHigh',
  'strain',
  'reserve',
  'heldBy',
  'state',
  'assignedTo',
];

/** What a desk shows before anybody chooses and before there is a run. */
export const USUAL_COLUMNS: readonly RegisterColumn[] = [
  'storeys',
  'eavesHeight',
  'groundLevel',
  'foundingLevel',
  'foundation',
  'construction',
  'eOverG',
  'listedGrade',
  'condition',
  'inspected',
];

/** What a phone shows before anybody chooses, with and without a run. */
export const FEW_RESULTS: readonly RegisterColumn[] = ['stage', 'category', 'state'];
export const FEW_COLUMNS: readonly RegisterColumn[] = ['storeys', 'eavesHeight', 'condition'];

/** Some columns in the order of the register. */
export function inOrder(columns: readonly RegisterColumn[]): readonly RegisterColumn[] {
  return CHOOSABLE.filter((column) => columns.includes(column));
}

/** Pixels that a column needs. */
export const WIDTHS: Readonly<Record<RegisterColumn, number>> = {
  reference: 84,
  area: 84,
  stage: 56,
  chainage: 84,
  offset: 68,
  categoryLow: 80,
  category: 80,
  categoryHigh: 80,
  strain: 76,
  settlement: 88,
  slope: 64,
  breakpoint: 88,
  reserve: 72,
  settled: 84,
  heldBy: 150,
  state: 136,
  decision: 140,
  assignedTo: 120,
  name: 150,
  address: 170,
  use: 120,
  storeys: 70,
  eavesHeight: 84,
  groundLevel: 76,
  foundingLevel: 80,
  foundation: 92,
  construction: 112,
  eOverG: 56,
  poisson: 70,
  listedGrade: 92,
  condition: 86,
  inspected: 100,
  structureScore: 76,
  structureReason: 170,
  featuresScore: 76,
  featuresReason: 170,
};

/** A letter of a reference, and the most that references may take of a desk and of a phone. */
const LETTER = 8;
const WIDEST_REFERENCE = { desk: 168, phone: 120 } as const;

/** Pixels that references need to be told apart. */
export function referenceWidth(
  references: readonly string[],
  on: keyof typeof WIDEST_REFERENCE,
): number {
  const longest = references.reduce((most, { length }) => Math.max(most, length), 0);
  return Math.max(WIDTHS.reference, Math.min(WIDEST_REFERENCE[on], 16 + LETTER * longest));
}

/** Headings that are shorter than the field's name. */
export const SHORT_HEADINGS: Readonly<Partial<Record<RegisterColumn, string>>> = {
  reference: 'Ref',
  area: 'Area',
  categoryLow: 'Category',
  category: 'Category',
  categoryHigh: 'Category',
  eavesHeight: 'Eaves',
  groundLevel: 'Ground',
  foundingLevel: 'Founding',
  poisson: 'Poisson',
  structureScore: 'Structure',
  structureReason: 'Structure because',
  featuresScore: 'Features',
  featuresReason: 'Features because',
};

/** What stands under a heading where the column has no unit. */
export const UNDER_HEADINGS: Readonly<Partial<Record<RegisterColumn, string>>> = {
  categoryLow: 'low',
  category: 'central',
  categoryHigh: 'high',
  structureScore: 'score',
  featuresScore: 'score',
};
