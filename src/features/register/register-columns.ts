import { REGISTER_COLUMNS, type RegisterColumn } from '../../../shared/schemas/register.ts';

/** The columns that can be chosen; the reference and the building are always there. */
export const CHOOSABLE = REGISTER_COLUMNS.filter((column) => column !== 'reference');

/** What a desk shows before anybody chooses. */
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

/** What a phone shows before anybody chooses. */
export const FEW_COLUMNS: readonly RegisterColumn[] = ['storeys', 'eavesHeight', 'condition'];

/** Some columns in the order of the register. */
export function inOrder(columns: readonly RegisterColumn[]): readonly RegisterColumn[] {
  return CHOOSABLE.filter((column) => columns.includes(column));
}

/** Pixels that a column needs. */
export const WIDTHS: Readonly<Record<RegisterColumn, number>> = {
  reference: 84,
  area: 84,
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
  eavesHeight: 'Eaves',
  groundLevel: 'Ground',
  foundingLevel: 'Founding',
  poisson: 'Poisson',
};
