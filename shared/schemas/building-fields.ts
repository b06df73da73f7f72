import { z } from 'zod';
import { writtenLine } from './written.ts';

/**
 * What is kept of a building beside its reference and footprint, in the order in which people read it.
 *
 * Units: in `unit`; levels are above the scheme's datum. Valid: least and most are where a slip of units
 * or of columns is certain. Source: [own].
 */
export const BUILDING_FIELDS = {
  name: { label: 'Name', kind: 'text' },
  address: { label: 'Address', kind: 'text' },
  use: { label: 'Use', kind: 'text' },
  storeys: { label: 'Storeys', kind: 'whole', least: 1, most: 200 },
  eavesHeight: { label: 'Eaves above ground', kind: 'number', unit: 'm', least: 0.5, most: 500 },
  groundLevel: { label: 'Ground level', kind: 'number', unit: 'm', least: -500, most: 9000 },
  foundingLevel: { label: 'Founding level', kind: 'number', unit: 'm', least: -600, most: 9000 },
  foundation: { label: 'Foundation', kind: 'text' },
  construction: { label: 'Construction', kind: 'text' },
  eOverG: { label: 'E/G', kind: 'number', least: 0.1, most: 1000 },
  poisson: { label: 'Poisson’s ratio', kind: 'number', least: 0, most: 0.5 },
  listedGrade: { label: 'Listing', kind: 'text' },
  condition: { label: 'Condition', kind: 'text' },
  inspected: { label: 'Inspected', kind: 'text' },
  structureScore: { label: 'Structure score', kind: 'whole', least: 0, most: 2 },
  structureReason: { label: 'Structure score because', kind: 'text' },
  featuresScore: { label: 'Features score', kind: 'whole', least: 0, most: 2 },
  featuresReason: { label: 'Features score because', kind: 'text' },
} as const satisfies Readonly<Record<string, BuildingFieldFacts>>;

/**
 * How a field is called, written and bounded.
 *
 * Units: in `unit`. Valid: bounds only for numbers. Source: [own].
 */
export type BuildingFieldFacts = {
  readonly label: string;
  readonly kind: 'text' | 'number' | 'whole';
  readonly unit?: string;
  readonly least?: number;
  readonly most?: number;
};

/**
 * The name of a field of the register.
 *
 * Units: none. Valid: a key of BUILDING_FIELDS. Source: [own].
 */
export type BuildingField = keyof typeof BUILDING_FIELDS;

/**
 * What a field may hold; null is unknown.
 *
 * Units: of its field. Valid: text for text, numbers for numbers. Source: [own].
 */
export type BuildingValue = string | number | null;

/**
 * The fields in order.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const BUILDING_FIELD_NAMES = Object.keys(BUILDING_FIELDS) as readonly BuildingField[];

/**
 * How long a reference and a text of the register may be.
 *
 * Units: letters. Valid: read only. Source: [own].
 */
export const BUILDING_TEXT = { reference: 60, text: 300 } as const;

/**
 * Words that lists of choices offer first; others are taken as they are written.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const BUILDING_WORDS: Readonly<Partial<Record<BuildingField, readonly string[]>>> = {
  foundation: ['strip', 'raft', 'piled'],
  construction: ['masonry', 'framed', 'steel framed', 'timber framed'],
  listedGrade: ['not listed', 'listed'],
  condition: ['good', 'fair', 'poor'],
  inspected: ['inside', 'outside', 'not inspected'],
};

function isEmpty(value: unknown): boolean {
  return typeof value === 'string' && value.trim() === '';
}

function valueSchema({ kind, least = -1e9, most = 1e9, unit }: BuildingFieldFacts) {
  if (kind === 'text') {
    return z.preprocess(
      (value) => (isEmpty(value) ? null : value),
      writtenLine(BUILDING_TEXT.text).nullable(),
    );
  }
  const bounds = `${least} to ${most}${unit === undefined ? '' : ` ${unit}`}`;
  const number = z
    .number('Write a number.')
    .min(least, `From ${bounds}.`)
    .max(most, `From ${bounds}.`);
  return (kind === 'whole' ? number.int('Write a whole number.') : number).nullable();
}

type FieldValue<F extends BuildingField> = (typeof BUILDING_FIELDS)[F]['kind'] extends 'text'
  ? string | null
  : number | null;

type AttributeShape = {
  readonly [F in BuildingField]: z.ZodOptional<z.ZodType<FieldValue<F>>>;
};

/**
 * Some fields of a building with their values; what is left out stays as it is, null is unknown.
 *
 * Units: of BUILDING_FIELDS. Valid: within their bounds; empty text counts as unknown. Source: [own].
 */
export const buildingAttributesSchema = z.strictObject(
  Object.fromEntries(
    BUILDING_FIELD_NAMES.map((field) => [field, valueSchema(BUILDING_FIELDS[field]).optional()]),
  ) as unknown as AttributeShape,
);

/**
 * Some fields of a building with their values.
 *
 * Units: as buildingAttributesSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingAttributes = z.infer<typeof buildingAttributesSchema>;

/**
 * What a building is called by, once in a scheme.
 *
 * Units: none. Valid: not empty, of one line. Source: [own].
 */
export const buildingReferenceSchema = writtenLine(BUILDING_TEXT.reference).min(
  1,
  'Give the building a reference.',
);

const position = z.tuple([z.number(), z.number()]);

/**
 * A footprint: parts, each an outer ring and its holes.
 *
 * Units: easting and northing m in the scheme's grid. Valid: rings repeat their first corner.
 * Source: [own].
 */
export const footprintSchema = z.array(z.array(z.array(position).readonly()).readonly()).readonly();

/**
 * A footprint as it is sent, drawn or changed by hand.
 *
 * Units: as footprintSchema. Valid: at most 100 parts, 10,000 corners; whether rings cross is checked
 * when it is kept. Source: [own].
 */
export const drawnFootprintSchema = footprintSchema
  .refine((parts) => parts.length > 0 && parts.length <= 100, 'Draw one to 100 parts.')
  .refine((parts) => parts.flat(2).length <= 10_000, 'At most 10,000 corners.');
